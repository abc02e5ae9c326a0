// The arithmetic of shards: numbers, sizes and prefixes as certs/FORMAT.md defines them, and the fold of all shards.
#include "evidence/enumeration.hpp"

#include <algorithm>

namespace assize::evidence {

namespace {

/// (q^exponent - 1)/(q - 1): the normalised vectors of that length; nothing if it does not fit 64 bits.
std::optional<std::uint64_t> normalised_vectors(std::uint32_t order, std::uint32_t exponent) noexcept {
  std::uint64_t sum = 0;
  for (std::uint32_t i = 0; i < exponent; ++i)
    if (__builtin_mul_overflow(sum, std::uint64_t{order}, &sum) || __builtin_add_overflow(sum, std::uint64_t{1}, &sum))
      return std::nullopt;
  return sum;
}

}  // namespace

std::optional<std::uint64_t> shard_count(std::uint32_t order, std::uint32_t dimension,
                                         std::uint32_t free_rows) noexcept {
  contract(order >= 2 && free_rows <= dimension, "a shard leaves at most all rows free");
  const auto prefixes = normalised_vectors(order, dimension - free_rows);
  if (!prefixes || *prefixes == UINT64_MAX) return std::nullopt;
  return 1 + *prefixes;
}

std::uint64_t shard_size(const EnumerationPlan& plan, std::uint64_t number) noexcept {
  contract(number < plan.shards, "a shard belongs to the plan");
  const auto size =
      number == 0 ? normalised_vectors(plan.order, plan.free_rows) : power_if_fits(plan.order, plan.free_rows);
  contract(size.has_value(), "the size of a shard fits 64 bits");
  return *size;
}

std::vector<std::uint16_t> shard_prefix(const EnumerationPlan& plan, std::uint64_t number) {
  contract(number < plan.shards, "a shard belongs to the plan");
  const std::uint32_t length = plan.dimension - plan.free_rows;
  std::vector<std::uint16_t> prefix(length, 0);
  if (number == 0) return prefix;
  // Prefixes with the leading 1 at place f, counted from the end, number q^f: they follow those of all lower places.
  std::uint64_t rank = number - 1;
  std::uint64_t with_this_lead = 1;
  std::uint32_t place = 0;
  while (rank >= with_this_lead) {
    rank -= with_this_lead;
    with_this_lead = mul_exact(with_this_lead, plan.order);
    ++place;
  }
  contract(place < length, "a shard number has a prefix");
  prefix[length - 1 - place] = 1;
  for (std::uint32_t i = length; rank != 0; rank /= plan.order)
    prefix[--i] = static_cast<std::uint16_t>(rank % plan.order);
  return prefix;
}

std::array<BigInteger, 2> moments_of(const WeightCounts& counts) {
  std::array<BigInteger, 2> moments;
  for (const auto& [weight, count] : counts) {
    const BigInteger sum = BigInteger(count) * weight;
    moments[0] += sum;
    moments[1] += sum * weight;
  }
  return moments;
}

bool Enumeration::complete() const noexcept {
  if (shards.size() != plan.shards) return false;
  for (std::uint64_t i = 0; i < plan.shards; ++i)
    if (shards[i].number != i) return false;
  return true;
}

WeightDistribution distribution(const Enumeration& enumeration) {
  contract(enumeration.complete(), "only a complete enumeration has a distribution");
  WeightDistribution totals;
  for (const Shard& shard : enumeration.shards)
    for (const auto& [weight, count] : shard.counts) {
      contract(weight > 0, "the word of a normalised message is not zero");
      totals[weight] += count;
    }
  for (auto& [weight, count] : totals) count *= enumeration.plan.order - 1;
  totals[0] = 1;
  return totals;
}

}  // namespace assize::evidence
