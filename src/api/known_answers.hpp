// Codes whose weights are published: what `selftest` measures this machine against.
#pragma once
#include <cstdint>
#include <map>
#include <span>
#include <string_view>
#include <vector>

namespace assize::api {

struct KnownAnswer {
  std::string_view name;
  std::string_view source;  ///< where the weights are published
  std::string_view sheet;
  std::map<std::uint32_t, std::uint64_t> weights;  ///< the zero word left out
};

std::span<const KnownAnswer> known_answers();

}  // namespace assize::api
