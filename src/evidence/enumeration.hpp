// An exhaustive enumeration cut into numbered shards: what was counted, and which part of the whole it covers.
//
// The vocabulary of certs/FORMAT.md, kind "enumeration".  A message is normalised if its first non-zero symbol is 1;
// shard 0 holds the normalised messages of the last `free_rows` rows, shards 1, 2, ... one coset of their span for each
// other normalised prefix, ascending.  Nothing here depends on threads, kernels or time.
#pragma once
#include <array>
#include <cstdint>
#include <map>
#include <optional>
#include <string>
#include <vector>

#include "base/integers.hpp"

namespace assize::evidence {

/// Normalised messages by the weight of their word; no zero counts.
using WeightCounts = std::map<std::uint32_t, std::uint64_t>;

/// Complete distribution: number of words of each weight, the zero word included; no zero counts.
using WeightDistribution = std::map<std::uint32_t, BigInteger>;

/// Which enumeration: a function of the code and the wish alone.
struct EnumerationPlan {
  std::string reduced_generator_digest;
  std::uint32_t order = 2;      ///< q
  std::uint32_t dimension = 0;  ///< k
  std::uint32_t free_rows = 0;  ///< s: the last s rows of the reduced generator run freely inside a shard
  std::uint64_t shards = 0;     ///< 1 + (q^(k-s) - 1)/(q - 1)
  friend bool operator==(const EnumerationPlan&, const EnumerationPlan&) = default;
};

/// Number of shards for the given split, or nothing if it does not fit 64 bits.
std::optional<std::uint64_t> shard_count(std::uint32_t order, std::uint32_t dimension,
                                         std::uint32_t free_rows) noexcept;

/// Messages in a shard: (q^s - 1)/(q - 1) for shard 0, q^s for the others.  Must fit 64 bits (contract).
std::uint64_t shard_size(const EnumerationPlan& plan, std::uint64_t number) noexcept;

/// The prefix of a shard: k - s symbols, all zero for shard 0, otherwise with first non-zero symbol 1.
std::vector<std::uint16_t> shard_prefix(const EnumerationPlan& plan, std::uint64_t number);

/// What one shard found.
struct Shard {
  std::uint64_t number = 0;
  WeightCounts counts;
  std::array<BigInteger, 2> moments;  ///< sums of w and of w^2 over its messages
  friend bool operator==(const Shard&, const Shard&) = default;
};

/// Sums of w and w^2 over the counts.
std::array<BigInteger, 2> moments_of(const WeightCounts& counts);

/// The completed shards, ascending by number.
struct Enumeration {
  EnumerationPlan plan;
  std::vector<Shard> shards;
  /// Every shard of the plan is there exactly once.
  [[nodiscard]] bool complete() const noexcept;
};

/// A_w = (q - 1) * counts for w > 0, A_0 = 1.  The enumeration must be complete (contract).
WeightDistribution distribution(const Enumeration& enumeration);

}  // namespace assize::evidence
