// Objects that map weights to counts: in shards and in the weight-distribution statement.
#pragma once
#include <cstdint>
#include <map>
#include <string>

#include "base/integers.hpp"
#include "recheck/json.hpp"

namespace assize::recheck {

using Counts = std::map<std::uint64_t, BigInteger>;

/// Weights from `smallest` to `largest`, ascending; no count is zero.
Result<Counts> read_counts(const Json& json, const std::string& path, std::uint64_t smallest, std::uint64_t largest);

/// "7: 253, 8: 506, ..."; at most sixteen weights are listed.
std::string describe(const Counts& counts);

}  // namespace assize::recheck
