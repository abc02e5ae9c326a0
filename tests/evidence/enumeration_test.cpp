// Shards: their numbers, sizes and prefixes tile the normalised messages, each exactly once.
#include "evidence/enumeration.hpp"

#include <gtest/gtest.h>

#include <algorithm>

namespace assize::evidence {
namespace {

EnumerationPlan plan_of(std::uint32_t order, std::uint32_t dimension, std::uint32_t free_rows) {
  return {"", order, dimension, free_rows, shard_count(order, dimension, free_rows).value()};
}

std::uint64_t value_of(const std::vector<std::uint16_t>& digits, std::uint32_t order) {
  std::uint64_t value = 0;
  for (const std::uint16_t digit : digits) value = value * order + digit;
  return value;
}

TEST(Shards, PrefixesAscendAreNormalisedAndAreAllThatThereAre) {
  for (const std::uint32_t order : {2U, 3U, 4U, 5U, 9U, 16U})
    for (std::uint32_t dimension = 1; dimension <= (order == 2 ? 9U : 4U); ++dimension)
      for (std::uint32_t free_rows = 0; free_rows <= dimension; ++free_rows) {
        const EnumerationPlan plan = plan_of(order, dimension, free_rows);
        EXPECT_EQ(shard_prefix(plan, 0), std::vector<std::uint16_t>(dimension - free_rows, 0));
        std::uint64_t normalised = 0;  // by trying every prefix
        const std::uint64_t prefixes = power_if_fits(order, dimension - free_rows).value();
        for (std::uint64_t value = 1; value < prefixes; ++value) {
          std::uint64_t lead = value;
          while (lead >= order) lead /= order;
          if (lead != 1) continue;
          ++normalised;
          ASSERT_LT(normalised, plan.shards);
          const auto prefix = shard_prefix(plan, normalised);
          EXPECT_EQ(prefix.size(), dimension - free_rows);
          EXPECT_EQ(value_of(prefix, order), value);
        }
        EXPECT_EQ(plan.shards, normalised + 1);
      }
}

TEST(Shards, SizesAddUpToAllNormalisedMessages) {
  for (const std::uint32_t order : {2U, 3U, 7U, 256U})
    for (std::uint32_t dimension = 1; dimension <= 3; ++dimension)
      for (std::uint32_t free_rows = 0; free_rows <= dimension; ++free_rows) {
        const EnumerationPlan plan = plan_of(order, dimension, free_rows);
        BigInteger sum = 0;
        for (std::uint64_t number = 0; number < plan.shards; ++number) sum += shard_size(plan, number);
        EXPECT_EQ(sum, (power(order, dimension) - 1) / (order - 1));
      }
}

TEST(Shards, TheNumberOfShardsIsNothingWhenItDoesNotFit) {
  EXPECT_EQ(shard_count(2, 63, 0), std::uint64_t{1} << 63U);
  EXPECT_EQ(shard_count(2, 64, 0), std::nullopt);  // 2^64
  EXPECT_EQ(shard_count(2, 64, 1), std::uint64_t{1} << 63U);
  EXPECT_EQ(shard_count(3, 41, 0), std::uint64_t{18236498188585393202U});
  EXPECT_EQ(shard_count(3, 42, 0), std::nullopt);
  EXPECT_EQ(shard_count(65536, 5, 1), 1 + (std::uint64_t{1} << 48U) + (std::uint64_t{1} << 32U) + 65536 + 1);
  EXPECT_EQ(shard_count(2, 5000, 5000), 1U);
}

TEST(Shards, FarPrefixesAreExact) {
  const EnumerationPlan binary = plan_of(2, 62, 0);
  EXPECT_EQ(value_of(shard_prefix(binary, (std::uint64_t{1} << 62U) - 1), 2), (std::uint64_t{1} << 62U) - 1);
  const EnumerationPlan ternary = plan_of(3, 30, 0);
  EXPECT_EQ(shard_prefix(ternary, ternary.shards - 1).front(), 1);
  EXPECT_EQ(value_of(shard_prefix(ternary, ternary.shards - 1), 3), 2 * power_if_fits(3, 29).value() - 1);
}

TEST(Shards, MomentsAreSumsOverTheCounts) {
  EXPECT_EQ(moments_of({}), (std::array<BigInteger, 2>{0, 0}));
  EXPECT_EQ(moments_of({{3, 4}, {5, 1}}), (std::array<BigInteger, 2>{17, 61}));
  const std::uint64_t many = std::uint64_t{1} << 62U;
  EXPECT_EQ(moments_of({{65535, many}})[1], BigInteger(65535) * 65535 * many);
}

TEST(Enumeration, IsCompleteWithEveryShardOnceInOrder) {
  Enumeration enumeration{plan_of(3, 2, 1), {{0, {{2, 1}}, {}}, {1, {{2, 2}, {3, 1}}, {}}}};
  EXPECT_TRUE(enumeration.complete());
  EXPECT_EQ(distribution(enumeration), (WeightDistribution{{0, 1}, {2, 6}, {3, 2}}));
  std::swap(enumeration.shards[0], enumeration.shards[1]);
  EXPECT_FALSE(enumeration.complete());
  enumeration.shards[0] = enumeration.shards[1];
  EXPECT_FALSE(enumeration.complete());
  enumeration.shards.pop_back();
  EXPECT_FALSE(enumeration.complete());
}

TEST(EnumerationDeathTest, OnlyACompleteEnumerationHasADistribution) {
  const Enumeration partial{plan_of(2, 2, 1), {{0, {{2, 1}}, {}}}};
  EXPECT_DEATH(static_cast<void>(distribution(partial)), "complete enumeration");
  EXPECT_DEATH(static_cast<void>(shard_size(partial.plan, 2)), "belongs to the plan");
}

}  // namespace
}  // namespace assize::evidence
