// Executes shards again and compares (format text, section 5, "Depths").
#pragma once
#include <optional>
#include <string>
#include <string_view>
#include <vector>

#include "recheck/brake.hpp"
#include "recheck/evidence.hpp"
#include "recheck/recheck.hpp"

namespace assize::recheck {

/// One shard of one evidence item.
struct ShardRef {
  std::size_t item = 0;
  std::size_t shard = 0;
};

struct Rerun {
  std::vector<std::size_t> done;  ///< for each item: how many of its shards were executed and found right
  std::uint64_t executed = 0;     ///< for a wrong shard: up to and including it
  std::optional<Failure> wrong;   ///< the first wrong shard
  std::string not_started;        ///< why nothing was executed, if so
  bool ended_early = false;
};

/// All shards of all items, in order.
std::vector<ShardRef> all_shards(const std::vector<Item>& items);

/// An upper estimate of the seconds that executing `chosen` takes.
BigInteger forecast_seconds(const std::vector<Item>& items, const std::vector<ShardRef>& chosen, unsigned threads);

/// Executes the shards that the options ask for, on several threads; the result does not depend on their number.
Rerun reexecute(const std::vector<Item>& items, std::string_view closing_digest, const Options& options,
                const Brake& brake);

}  // namespace assize::recheck
