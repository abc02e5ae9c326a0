// Plans: the same shards whatever the method, sensible sizes, and a clear refusal.
#include "plan/plan.hpp"

#include <gtest/gtest.h>

#include "plan/cost.hpp"
#include "plan/split.hpp"

namespace assize::plan {
namespace {

/// [n, k] over GF(p): unit vectors followed by ones.
code::LinearCode some_code(std::uint32_t p, std::uint32_t n, std::uint32_t k) {
  field::Matrix generator(k, n);
  for (std::uint32_t i = 0; i < k; ++i)
    for (std::uint32_t j = 0; j < n; ++j) generator.at(i, j) = j < k ? (i == j ? 1 : 0) : 1;
  const field::Field field = field::Field::prime(p).value();
  return {field, code::reduce(field, generator)};
}

TEST(Plan, BothMethodsCutTheSameShards) {
  for (const auto& [p, n, k] : {std::array{2U, 30U, 20U}, std::array{3U, 20U, 15U}, std::array{251U, 8U, 4U}}) {
    const auto code = some_code(p, n, k);
    const Plan plain = choose(code, {Method::plain}).value();
    const Plan exhaust = choose(code, {Method::exhaust}).value();
    EXPECT_EQ(plain.method, Method::plain);
    EXPECT_EQ(exhaust.method, Method::exhaust);
    ASSERT_TRUE(plain.enumeration && exhaust.enumeration);
    EXPECT_EQ(*plain.enumeration, *exhaust.enumeration);
    EXPECT_EQ(plain.enumeration->reduced_generator_digest, code.reduced_generator_digest());
    EXPECT_EQ(plain.messages, (power(p, k) - 1) / (p - 1));
    EXPECT_LT(exhaust.operations, plain.operations);
    EXPECT_EQ(choose(code, {}).value().method, Method::exhaust);
  }
}

TEST(Plan, ExhaustIsRefusedOverLargeFieldsWithACure) {
  const auto code = some_code(257, 5, 2);
  const auto refused = choose(code, {Method::exhaust});
  ASSERT_FALSE(refused);
  EXPECT_EQ(refused.error().what,
            "method exhaust works over fields of at most 256 elements, and this code is over GF(257)");
  EXPECT_EQ(refused.error().cure, "use --method plain");
  EXPECT_EQ(choose(code, {}).value().method, Method::plain);
  EXPECT_EQ(applicable(code).size(), 1U);
}

TEST(Plan, TooManyMessagesLeaveNoShards) {
  EXPECT_TRUE(choose(some_code(2, 70, 62), {}).value().enumeration.has_value());
  const Plan beyond = choose(some_code(2, 70, 63), {}).value();
  EXPECT_FALSE(beyond.enumeration.has_value());
  EXPECT_EQ(beyond.messages, (BigInteger(1) << 63U) - 1);
  EXPECT_GE(beyond.operations, beyond.messages);
}

TEST(Plan, MethodNamesGoThereAndBack) {
  EXPECT_EQ(method_names(), (std::vector<std::string_view>{"exhaust", "plain"}));
  for (const auto text : method_names()) EXPECT_EQ(name(find_method(text).value()), text);
  EXPECT_EQ(find_method("Exhaust"), std::nullopt);
  EXPECT_EQ(find_method(""), std::nullopt);
}

TEST(Split, SmallCodesAreOneShardAndTheRestIsSharedOut) {
  EXPECT_EQ(free_rows(2, 24, 12), 12U);
  EXPECT_EQ(free_rows(2, 64, 16), 16U);
  EXPECT_EQ(free_rows(65521, 10, 1), 1U);
  for (const std::uint32_t order : {2U, 3U, 4U, 5U, 9U, 16U, 31U, 251U, 256U, 65536U})
    for (const std::uint32_t n : {10U, 64U, 255U, 4096U})
      for (std::uint32_t k = 1; k <= 62; ++k) {
        const BigInteger messages = (power(order, k) - 1) / (order - 1);
        if (messages > BigInteger(1) << 62U) break;
        const std::uint32_t s = free_rows(order, n, k);
        ASSERT_LE(s, k);
        const auto shards = evidence::shard_count(order, k, s);
        ASSERT_TRUE(shards.has_value());
        EXPECT_LE(*shards, 8192U) << order << " " << n << " " << k;
        EXPECT_LE(*shards * std::min<std::uint64_t>(n + 1, power_if_fits(order, s).value_or(UINT64_MAX)) * 24,
                  std::uint64_t{16} << 20U)
            << "evidence of that size cannot be written";
        const BigInteger units = power(order, s) * cost_per_message(Method::exhaust, order, n);
        const BigInteger least_units = BigInteger(1) << (*shards == 1 ? 0U : *shards <= 1024 ? 18U : 28U);
        EXPECT_GE(units, least_units) << order << " " << n << " " << k;
      }
}

TEST(Split, KnownCasesStayAsTheyAre) {
  // Evidence that people keep was cut this way; a change here changes every certificate.
  EXPECT_EQ(free_rows(2, 64, 20), 17U);
  EXPECT_EQ(free_rows(2, 64, 28), 21U);
  EXPECT_EQ(free_rows(2, 64, 36), 26U);
  EXPECT_EQ(free_rows(2, 64, 40), 28U);
  EXPECT_EQ(free_rows(2, 64, 48), 36U);
  EXPECT_EQ(free_rows(2, 12144, 32), 27U);
  EXPECT_EQ(free_rows(3, 40, 20), 14U);
  EXPECT_EQ(free_rows(4, 30, 13), 10U);
  EXPECT_EQ(free_rows(256, 255, 4), 2U);
}

TEST(Plan, MemoryIsPredictedModestly) {
  EXPECT_LT(choose(some_code(2, 64, 28), {}).value().memory_bytes, 32U << 20U);
  EXPECT_GT(choose(some_code(2, 64, 28), {}).value().memory_bytes, 1U << 15U);
  EXPECT_LT(choose(some_code(251, 255, 5), {}).value().memory_bytes, 256U << 20U);
}

}  // namespace
}  // namespace assize::plan
