// Threads, budgets, stops and refutations: what a run leaves behind, and that none of it depends on luck.
#include <gtest/gtest.h>

#include <functional>

#include "engine/engine_support.hpp"

namespace assize::engine {
namespace {

using namespace testing;
using plan::Method;

constexpr std::array thread_counts{1U, 2U, 3U, 7U};

class Watcher final : public Progress {
 public:
  explicit Watcher(std::function<void(const ProgressState&)> see) : see_(std::move(see)) {}
  void update(const ProgressState& state) override { see_(state); }

 private:
  std::function<void(const ProgressState&)> see_;
};

/// The first shards of `whole` and nothing else.
void expect_prefix(const EnumerationOutcome& part, const EnumerationOutcome& whole) {
  ASSERT_LE(part.enumeration.shards.size(), whole.enumeration.shards.size());
  EXPECT_EQ(part.enumeration.plan, whole.enumeration.plan);
  EXPECT_TRUE(std::ranges::equal(part.enumeration.shards,
                                 std::span(whole.enumeration.shards).first(part.enumeration.shards.size())));
}

TEST(Enumerate, OutcomeDoesNotDependOnThreads) {
  Chance chance(21);
  for (const std::uint32_t q : {2U, 3U, 8U}) {
    const auto code = random_code(chance, some_field(q), 20, q == 2 ? 10 : 5);
    for (std::uint32_t s = code.dimension() < 4 ? 0 : code.dimension() - 3; s <= code.dimension(); ++s)
      for (const Method method : {Method::plain, Method::exhaust}) {
        const auto plan = plan_for(code, method, s);
        const auto alone = run(code, plan);
        for (const unsigned threads : thread_counts) expect_equal(run(code, plan, {.threads = threads}), alone);
      }
  }
}

TEST(Enumerate, StopsAtOnceWhenAskedBeforehand) {
  Chance chance(22);
  const auto code = random_code(chance, field::Field::binary(), 20, 10);
  StopFlag stop;
  stop.request();
  for (const unsigned threads : thread_counts) {
    const auto outcome = run(code, plan_for(code, Method::exhaust, 3), {.threads = threads, .stop = &stop});
    EXPECT_EQ(outcome.ending, Ending::interrupted);
    EXPECT_TRUE(outcome.enumeration.shards.empty());
    EXPECT_EQ(outcome.lightest, std::nullopt);
  }
}

TEST(Enumerate, AStopLeavesTheShardsBegunSoFar) {
  Chance chance(23);
  const auto code = random_code(chance, field::Field::binary(), 24, 12);
  const auto plan = plan_for(code, Method::exhaust, code.dimension() - 5);
  const auto whole = run(code, plan);
  for (const unsigned threads : thread_counts) {
    StopFlag stop;
    int updates = 0;
    Watcher watcher([&](const ProgressState&) {
      if (++updates == 3) stop.request();
    });
    const FakeClock clock(1);
    const auto part = run(code, plan, {.threads = threads, .stop = &stop, .clock = &clock, .progress = &watcher});
    EXPECT_EQ(part.ending, Ending::interrupted);
    EXPECT_GE(part.enumeration.shards.size(), 3U);
    EXPECT_LE(part.enumeration.shards.size(), 3U + threads);
    EXPECT_FALSE(part.enumeration.complete());
    expect_prefix(part, whole);
  }
}

TEST(Enumerate, NoShardIsBegunAfterTheBudget) {
  Chance chance(24);
  const auto code = random_code(chance, field::Field::binary(), 24, 12);
  const auto plan = plan_for(code, Method::exhaust, code.dimension() - 5);
  const auto whole = run(code, plan);
  for (const unsigned threads : thread_counts) {
    const FakeClock clock(1);
    const auto part = run(code, plan, {.threads = threads, .clock = &clock, .budget_seconds = 10});
    EXPECT_EQ(part.ending, Ending::budget);
    EXPECT_EQ(part.enumeration.shards.size(), 9U);  // readings 1 to 9 are within the budget, whoever makes them
    expect_prefix(part, whole);
  }
  const FakeClock slow(1e-9);
  expect_equal(run(code, plan, {.threads = 2, .clock = &slow, .budget_seconds = 10}), whole);
}

TEST(Enumerate, AStopAfterTheLastShardChangesNothing) {
  Chance chance(25);
  const auto code = random_code(chance, field::Field::binary(), 12, 6);
  StopFlag stop;
  Watcher watcher([&](const ProgressState& state) {
    if (state.done == state.total) stop.request();
  });
  EXPECT_EQ(run(code, plan_for(code, Method::exhaust, 3), {.stop = &stop, .progress = &watcher}).ending,
            Ending::complete);
}

TEST(Enumerate, ARefutationEndsWithTheLeastShardThatHasALighterWord) {
  Chance chance(26);
  for (const std::uint32_t q : {2U, 3U, 5U}) {
    const auto code = random_code(chance, some_field(q), 18, q == 2 ? 8 : 4);
    for (std::uint32_t s = code.dimension() < 3 ? 0 : code.dimension() - 3; s <= code.dimension(); ++s) {
      const auto plan = plan_for(code, Method::exhaust, s);
      const auto whole = run(code, plan);
      for (std::uint32_t at_least = 0; at_least <= 19; at_least += at_least < 9 ? 1 : 5) {
        std::size_t expected = 0;
        const auto& shards = whole.enumeration.shards;
        while (expected < shards.size() &&
               (shards[expected].counts.empty() || shards[expected].counts.begin()->first >= at_least))
          ++expected;
        const bool refuted = expected < shards.size();
        std::optional<EnumerationOutcome> first;
        for (const unsigned threads : thread_counts) {
          const auto outcome = run(code, plan, {.threads = threads, .at_least = at_least});
          EXPECT_EQ(outcome.ending, refuted ? Ending::refuted : Ending::complete);
          EXPECT_EQ(outcome.enumeration.shards.size(), refuted ? expected + 1 : shards.size());
          expect_prefix(outcome, whole);
          EXPECT_EQ(refuted, outcome.lightest.value().weight < at_least);
          if (!first) first = outcome;
          expect_equal(outcome, *first);
        }
        const auto plain = plan_for(code, Method::plain, s);
        expect_equal(run(code, plain, {.at_least = at_least}), *first);
      }
    }
  }
}

TEST(Enumerate, ProgressCountsUpToTheWholeAndIsNotTooFrequent) {
  Chance chance(27);
  const auto code = random_code(chance, field::Field::binary(), 20, 10);
  const auto plan = plan_for(code, Method::exhaust, code.dimension() - 5);
  std::vector<ProgressState> seen;
  Watcher watcher([&](const ProgressState& state) { seen.push_back(state); });
  const FakeClock clock(0.01);
  const auto outcome = run(code, plan, {.threads = 3, .clock = &clock, .progress = &watcher});
  ASSERT_FALSE(seen.empty());
  EXPECT_LE(seen.size(), 8U);  // some 34 readings of the clock make 0.34 seconds
  for (std::size_t i = 1; i < seen.size(); ++i) {
    EXPECT_GE(seen[i].done, seen[i - 1].done);
    EXPECT_LE(seen[i].at_most.value(), seen[i - 1].at_most.value());
  }
  EXPECT_EQ(BigInteger(seen.back().done), plan.messages);
  EXPECT_EQ(BigInteger(seen.back().total), plan.messages);
  EXPECT_EQ(seen.back().at_most, outcome.lightest.value().weight);
}

TEST(Enumerate, EndingsHaveNames) {
  EXPECT_EQ(name(Ending::complete), "complete");
  EXPECT_EQ(name(Ending::refuted), "refuted");
  EXPECT_EQ(name(Ending::budget), "budget");
  EXPECT_EQ(name(Ending::interrupted), "interrupted");
}

}  // namespace
}  // namespace assize::engine
