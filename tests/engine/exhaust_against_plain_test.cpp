// The staircase: both engines give the same evidence and the same witness, and both agree with the definition.
#include <gtest/gtest.h>

#include "engine/engine_support.hpp"

namespace assize::engine {
namespace {

using namespace testing;
using plan::Method;

/// Both methods, all ways of cutting shards up to `most_shards`.
void compare(const code::LinearCode& code, std::uint64_t most_shards = 300) {
  const auto expected = distribution_by_definition(code);
  for (std::uint32_t s = 0; s <= code.dimension(); ++s) {
    if (evidence::shard_count(code.order(), code.dimension(), s).value() > most_shards) continue;
    const auto plain = run(code, plan_for(code, Method::plain, s));
    EXPECT_EQ(plain.ending, Ending::complete);
    EXPECT_EQ(evidence::distribution(plain.enumeration), expected);
    ASSERT_TRUE(plain.lightest.has_value());
    EXPECT_EQ(plain.lightest->weight, std::next(expected.begin())->first);
    EXPECT_TRUE(code.contains(plain.lightest->word));
    if (code.order() <= 256) expect_equal(run(code, plan_for(code, Method::exhaust, s)), plain);
    if (::testing::Test::HasFailure()) return;
  }
}

/// Every matrix in reduced form with these dimensions, hence every code exactly once.
void compare_all_codes(const field::Field& field, std::uint32_t n, std::uint32_t k) {
  std::vector<std::vector<Element>> rows(k, std::vector<Element>(n, 0));
  std::uint64_t codes = 0;
  for (bool more = true; more && !::testing::Test::HasFailure();) {
    const auto code = code_of(field, rows);
    bool reduced = code.dimension() == k;
    for (std::uint32_t i = 0; i < k && reduced; ++i) reduced = code.row(i) == rows[i];
    if (reduced) {
      ++codes;
      compare(code);
    }
    more = false;
    for (std::uint32_t place = 0; place < n * k && !more; ++place) {
      Element& symbol = rows[place / n][place % n];
      symbol = static_cast<Element>((symbol + 1U) % field.order());
      more = symbol != 0;
    }
  }
  // The number of k-dimensional subspaces, for all k <= 3: the loop has missed none.
  BigInteger subspaces = 1;
  for (std::uint32_t i = 0; i < k; ++i) subspaces *= power(field.order(), n - i) - 1;
  for (std::uint32_t i = 1; i <= k; ++i) subspaces /= power(field.order(), i) - 1;
  EXPECT_EQ(codes, subspaces);
}

TEST(ExhaustAgainstPlain, AllTinyBinaryCodes) {
  for (std::uint32_t n = 1; n <= 5; ++n)
    for (std::uint32_t k = 1; k <= std::min(n, 3U); ++k) compare_all_codes(field::Field::binary(), n, k);
}

TEST(ExhaustAgainstPlain, AllTinyTernaryAndQuaternaryCodes) {
  for (const std::uint32_t q : {3U, 4U, 5U})
    for (std::uint32_t n = 1; n <= 3; ++n)
      for (std::uint32_t k = 1; k <= std::min(n, 2U); ++k) compare_all_codes(some_field(q), n, k);
}

TEST(ExhaustAgainstPlain, RandomBinaryCodesAroundLaneBoundaries) {
  Chance chance(11);
  for (const std::uint32_t n : {7U, 23U, 31U, 32U, 33U, 63U, 64U, 65U, 127U, 128U, 129U, 192U, 193U, 256U, 257U, 400U})
    compare(random_code(chance, field::Field::binary(), n, std::min(n, 9U)));
}

TEST(ExhaustAgainstPlain, RandomCodesOverManyFields) {
  Chance chance(12);
  for (const std::uint32_t q :
       {3U, 4U, 5U, 7U, 8U, 9U, 16U, 25U, 27U, 31U, 49U, 64U, 81U, 101U, 125U, 128U, 169U, 243U, 251U, 256U}) {
    SCOPED_TRACE("q = " + std::to_string(q));
    const std::uint32_t k = q <= 5 ? 5 : q <= 9 ? 4 : q <= 16 ? 3 : q <= 31 ? 2 : 1 + chance.below(2) % 2;
    for (const std::uint32_t n : {k + 1, 17U, 40U}) compare(random_code(chance, some_field(q), n, k));
  }
}

TEST(ExhaustAgainstPlain, LongWordsOverALargeAlphabet) {
  Chance chance(13);
  for (const std::uint32_t n : {255U, 256U, 511U, 700U}) compare(random_code(chance, some_field(9), n, 3));
  compare(random_code(chance, some_field(256), 255, 2), 1000);
}

TEST(Plain, WorksOverFieldsThatExhaustDoesNotKnow) {
  Chance chance(14);
  for (const std::uint32_t q : {257U, 512U}) compare(random_code(chance, some_field(q), 6, 2), 1000);
  const auto large = random_code(chance, some_field(65536), 12, 1);
  compare(large);
}

TEST(Exhaust, BlocksAndStepsMeetOnLargerCodes) {
  // Large enough for several blocks in a shard: more free rows than fit the block table.
  Chance chance(15);
  for (const auto& [q, n, k] :
       {std::array{2U, 40U, 14U}, std::array{2U, 130U, 13U}, std::array{3U, 30U, 9U}, std::array{4U, 20U, 7U},
        std::array{16U, 20U, 4U}, std::array{31U, 40U, 3U}, std::array{256U, 20U, 2U}}) {
    const auto code = random_code(chance, some_field(q), n, k);
    const std::uint32_t d = code.dimension();
    for (const std::uint32_t s : {d, d - 1, d - std::min(d, 2U)})
      if (evidence::shard_count(q, d, s).value() < 1000)
        expect_equal(run(code, plan_for(code, Method::exhaust, s)), run(code, plan_for(code, Method::plain, s)));
  }
}

TEST(Enumerate, TheWitnessHasTheLeastMessageOfTheLeastShard) {
  Chance chance(16);
  for (const std::uint32_t q : {2U, 3U, 4U, 7U}) {
    const auto code = random_code(chance, some_field(q), 12, q == 2 ? 8 : 4);
    std::optional<evidence::Witness> least;
    for_each_message(code, [&](const std::vector<Element>& message) {
      const auto lead = std::ranges::find_if(message, [](Element a) { return a != 0; });
      if (lead == message.end() || *lead != 1) return;
      std::vector<Element> word = code.encode(message);
      const std::uint32_t weight = code::weight(word);
      if (!least || weight < least->weight) least = {weight, std::move(word)};
    });
    for (std::uint32_t s = 0; s <= code.dimension(); ++s)
      for (const Method method : {Method::plain, Method::exhaust})
        EXPECT_EQ(run(code, plan_for(code, method, s)).lightest, least);
  }
}

}  // namespace
}  // namespace assize::engine
