// The bigger a shard, the more shards there may be.
//
// A shard of 2^18 units takes a fraction of a millisecond: less is not worth a second shard.  Evidence lists every
// shard with its counts, so their number stays small until shards take so long that sharing and stopping matter more.
#include "plan/split.hpp"

#include <algorithm>
#include <array>

#include "base/contract.hpp"
#include "base/integers.hpp"
#include "evidence/enumeration.hpp"
#include "plan/cost.hpp"

namespace assize::plan {

namespace {

struct Step {
  std::uint64_t units_below;  ///< a shard that costs less than this ...
  std::uint64_t most_shards;  ///< ... is acceptable if there are at most so many
};
constexpr std::array<Step, 3> steps{{
    {std::uint64_t{1} << 18U, 1},
    {std::uint64_t{1} << 22U, 64},
    {std::uint64_t{1} << 28U, 1024},
}};
constexpr std::uint64_t most_shards_of_all = 8192;

/// Room for all shards in a certificate, whose size is limited to 16 MiB, and upper bounds for what they take there.
constexpr std::uint64_t room_for_shards = std::uint64_t{14} << 20U;
constexpr std::uint64_t bytes_of_shard = 256;
constexpr std::uint64_t bytes_of_count = 24;

std::uint64_t saturated_product(std::uint64_t a, std::uint64_t b) noexcept {
  std::uint64_t product = 0;
  return __builtin_mul_overflow(a, b, &product) ? UINT64_MAX : product;
}

}  // namespace

std::uint32_t free_rows(std::uint32_t order, std::uint32_t length, std::uint32_t dimension) noexcept {
  contract(dimension >= 1, "a code has words");
  const std::uint64_t per_message = cost_per_message(Method::exhaust, order, length);
  for (std::uint32_t rows = 0; rows < dimension; ++rows) {
    const auto shards = evidence::shard_count(order, dimension, rows);
    if (!shards) continue;
    const std::uint64_t messages = power_if_fits(order, rows).value_or(UINT64_MAX);
    const std::uint64_t units = saturated_product(messages, per_message);
    const auto* step = std::ranges::find_if(steps, [units](const Step& s) { return units < s.units_below; });
    std::uint64_t most_shards = most_shards_of_all;
    if (step != steps.end()) most_shards = step->most_shards;
    // Over a large field the next choice may be a single coset, which could not be shared: two fixed digits are in
    // order.
    if (units >= steps.front().units_below)
      most_shards = std::clamp<std::uint64_t>(order + 2, most_shards, most_shards_of_all);
    const std::uint64_t counts = std::min<std::uint64_t>(messages, std::uint64_t{length} + 1);
    const std::uint64_t bytes = saturated_product(*shards, bytes_of_shard + bytes_of_count * counts);
    if (*shards <= most_shards && bytes <= room_for_shards) return rows;
  }
  return dimension;
}

}  // namespace assize::plan
