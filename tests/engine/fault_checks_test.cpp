// Faults put in on purpose must be noticed: in the counts of a shard, and in a kernel that lies.
#include "engine/fault_checks.hpp"

#include <gtest/gtest.h>

#include <algorithm>

#include "engine/engine_support.hpp"

namespace assize::engine {
namespace {

using namespace testing;
using plan::Method;

code::LinearCode extended_hamming() {
  return code_of(
      field::Field::binary(),
      {{1, 0, 0, 0, 0, 1, 1, 1}, {0, 1, 0, 0, 1, 0, 1, 1}, {0, 0, 1, 0, 1, 1, 0, 1}, {0, 0, 0, 1, 1, 1, 1, 0}});
}

TEST(FaultChecks, SoundFindingsPass) {
  Chance chance(41);
  for (const std::uint32_t q : {2U, 3U, 4U}) {
    const auto code = random_code(chance, some_field(q), 15, 5);
    const auto plan = *plan_for(code, Method::plain, code.dimension() - 1).enumeration;
    const auto engine = make_plain(code, plan);
    const FaultChecks checks(code, plan);
    for (std::uint64_t shard = 0; shard < plan.shards; ++shard)
      EXPECT_EQ(checks.fault_of_shard(shard, engine->run(shard)), std::nullopt);
  }
}

TEST(FaultChecks, MovedLostAndRepeatedWordsAreNoticed) {
  Chance chance(42);
  for (const std::uint32_t q : {2U, 3U, 4U, 9U}) {
    const auto code = random_code(chance, some_field(q), 15, 4);
    const auto plan = *plan_for(code, Method::plain, std::min(code.dimension(), 3U)).enumeration;
    const auto engine = make_plain(code, plan);
    const FaultChecks checks(code, plan);
    const std::uint64_t shard = plan.shards - 1;
    const Finding sound = engine->run(shard);
    ASSERT_EQ(checks.fault_of_shard(shard, sound), std::nullopt);
    for (const auto& [from, count] : sound.counts) {
      Finding lost = sound;
      if (--lost.counts[from] == 0) lost.counts.erase(from);
      EXPECT_NE(checks.fault_of_shard(shard, lost), std::nullopt);
      Finding repeated = sound;
      ++repeated.counts[from];
      EXPECT_NE(checks.fault_of_shard(shard, repeated), std::nullopt);
      for (std::uint32_t to = 0; to <= code.length() + 1; ++to) {
        if (to == from) continue;
        Finding moved = lost;
        ++moved.counts[to];
        EXPECT_NE(checks.fault_of_shard(shard, moved), std::nullopt) << "from " << from << " to " << to;
      }
    }
    // Two words moved apart leave the sum of the weights as it was: the second moment notices.
    for (std::uint32_t w = 2; w + 2 <= code.length(); ++w)
      if (sound.counts.contains(w) && sound.counts.at(w) > 2) {
        Finding spread = sound;
        spread.counts[w] -= 2;
        ++spread.counts[w - 1];
        ++spread.counts[w + 1];
        EXPECT_NE(checks.fault_of_shard(shard, spread), std::nullopt);
      }
    Finding wrong_word = sound;
    wrong_word.lightest_weight += 1;
    EXPECT_NE(checks.fault_of_shard(shard, wrong_word), std::nullopt);
    wrong_word = sound;
    wrong_word.lightest_tail = UINT64_MAX;
    EXPECT_NE(checks.fault_of_shard(shard, wrong_word), std::nullopt);
    Finding told = sound;
    told.fault = "told so";
    EXPECT_EQ(checks.fault_of_shard(shard, told), "told so");
  }
}

TEST(FaultChecks, WeightsOfADoublyEvenCodeAreDivisibleByFour) {
  const auto code = extended_hamming();
  const auto plan = *plan_for(code, Method::plain, 4).enumeration;
  const FaultChecks checks(code, plan);
  Finding finding{.counts = {{4, 14}, {8, 1}}, .lightest_weight = 4, .lightest_tail = 1, .fault = {}};
  EXPECT_EQ(checks.fault_of_shard(0, finding), std::nullopt);
  finding.counts = {{4, 13}, {6, 1}, {8, 1}};
  EXPECT_EQ(checks.fault_of_shard(0, finding), "a word has weight 6, but all weights are divisible by 4");
}

TEST(FaultChecks, EvenCodesThatAreNotDoublyEvenPass) {
  // Rows of weight 4 that meet in one position: their sum has weight 6.
  const auto code = code_of(field::Field::binary(), {{1, 1, 1, 1, 0, 0, 0}, {0, 0, 0, 1, 1, 1, 1}});
  EXPECT_EQ(run(code).ending, Ending::complete);
}

TEST(FaultChecks, ATotalIsWholeAndSymmetricUnderTheAllOneWord) {
  const auto code = extended_hamming();
  const auto plan = *plan_for(code, Method::plain, 4).enumeration;
  const FaultChecks checks(code, plan);
  const auto total = [&](const evidence::WeightCounts& counts) {
    return checks.fault_of_total({plan, {{0, counts, evidence::moments_of(counts)}}});
  };
  EXPECT_EQ(total({{4, 14}, {8, 1}}), std::nullopt);
  EXPECT_EQ(total({{4, 13}, {8, 2}}), "the code has the all-one word, but its distribution is not symmetric");
  EXPECT_EQ(total({{4, 13}, {8, 1}}), "the number of words is not q^k");
  EXPECT_EQ(checks.fault_of_total({plan, {}}), "shards are missing or repeated");
}

// Kernels that lie: a plain function each, since kernels are plain functions.
kernel::Lightest moves_a_count(std::span<std::uint64_t> base, const kernel::BinaryTables& tables, std::size_t size,
                               std::size_t digits, std::span<std::uint64_t> counts) noexcept {
  const auto lightest = kernel::reference().binary_walk(base, tables, size, digits, counts);
  const auto from = std::ranges::max_element(counts) - counts.begin();
  --counts[static_cast<std::size_t>(from)];
  ++counts[static_cast<std::size_t>(from) + (from > 1 ? -1UL : 1UL)];
  return lightest;
}
kernel::Lightest flips_a_bit(std::span<std::uint64_t> base, const kernel::BinaryTables& tables, std::size_t size,
                             std::size_t digits, std::span<std::uint64_t> counts) noexcept {
  const auto lightest = kernel::reference().binary_walk(base, tables, size, digits, counts);
  base[0] ^= 2;
  return lightest;
}
kernel::Lightest names_another_word(std::span<std::uint64_t> base, const kernel::BinaryTables& tables, std::size_t size,
                                    std::size_t digits, std::span<std::uint64_t> counts) noexcept {
  auto lightest = kernel::reference().binary_walk(base, tables, size, digits, counts);
  lightest.weight -= lightest.weight > 1 ? 1 : 0;
  return lightest;
}
kernel::Lightest flips_a_symbol(std::span<std::uint8_t> base, const kernel::SymbolTables& tables, std::size_t size,
                                std::size_t digits, std::span<std::uint64_t> counts) noexcept {
  base[0] = base[0] == 0 ? 1 : 0;
  return kernel::reference().symbol_walk(base, tables, size, digits, counts);
}

TEST(FaultChecks, ALyingKernelIsAFailureThatNamesTheLeastShard) {
  const FakeClock clock;
  const auto expect_failure = [&clock](const kernel::KernelSet& liar, std::uint32_t q) {
    Chance chance(43);
    const auto code = random_code(chance, some_field(q), 20, 6);
    for (const unsigned threads : {1U, 3U}) {
      const auto outcome = enumerate(code, plan_for(code, Method::exhaust, code.dimension() - 2),
                                     {.threads = threads, .kernel = &liar, .clock = &clock});
      ASSERT_FALSE(outcome);
      EXPECT_EQ(outcome.error().where, "shard 0");
      EXPECT_TRUE(is_self_check_failure(outcome.error())) << outcome.error().what;
      EXPECT_EQ(outcome.error().cure, "run again; if it repeats, the machine or the program is faulty");
    }
  };
  const auto symbols = kernel::reference().symbol_walk;
  expect_failure({"liar", &moves_a_count, symbols}, 2);
  expect_failure({"liar", &flips_a_bit, symbols}, 2);
  expect_failure({"liar", &names_another_word, symbols}, 2);
  expect_failure({"liar", kernel::reference().binary_walk, &flips_a_symbol}, 3);
  EXPECT_FALSE(is_self_check_failure({"flag --threads", "not a number", ""}));
}

}  // namespace
}  // namespace assize::engine
