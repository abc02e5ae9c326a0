// What the depths, the budget, the stop flag and unknown evidence make of a right certificate.
#include <gtest/gtest.h>

#include <atomic>

#include "builder.hpp"
#include "recheck/draw.hpp"
#include "recheck/recheck.hpp"

namespace assize::recheck::test {
namespace {

std::string golay_certificate(std::size_t free_rows) {
  Draft draft = golay();
  state_everything(draft, free_rows);
  return draft.bytes();
}

Options at(Depth depth) {
  Options options;
  options.depth = depth;
  return options;
}

TEST(Depths, QuickLeavesShardsOpen) {
  const Report report = recheck(golay_certificate(6), at(Depth::quick));
  EXPECT_EQ(report.outcome, Outcome::consistent);
  EXPECT_EQ(exit_code(report.outcome), 3);
  EXPECT_EQ(report.shards_total, 64U);
  EXPECT_EQ(report.shards_present, 64U);
  EXPECT_EQ(report.shards_reexecuted, 0U);
  EXPECT_EQ(report.catch_probability, "0/64");
  for (const Finding& finding : report.findings) EXPECT_EQ(finding.status, Status::consistent);
}

TEST(Depths, SpotTellsItsProbability) {
  const Report report = recheck(golay_certificate(6), at(Depth::spot));
  EXPECT_EQ(report.outcome, Outcome::consistent);
  EXPECT_EQ(report.shards_reexecuted, 12U);
  EXPECT_EQ(report.catch_probability, "12/64");
  const Report few = recheck(golay_certificate(9), at(Depth::spot));  // 8 shards: all of them are drawn
  EXPECT_EQ(few.outcome, Outcome::proven);
  EXPECT_EQ(few.catch_probability, "8/8");
}

TEST(Depths, SpotCatchesWithTheSeedsThatDrawTheBadShard) {
  Draft draft = golay();
  EnumerationDraft enumeration = enumerate(draft.field, draft.generator, 6);
  std::size_t bad = 0;
  while (!disguise(enumeration.shards[bad])) ++bad;
  draft.evidence = {enumeration.value()};
  draft.statements = {distance("exactly", 7, {0})};
  const std::string bytes = draft.bytes();
  const std::string closing = bytes.substr(bytes.size() - 67, 64);
  unsigned caught = 0;
  for (std::uint64_t seed = 0; seed < 40; ++seed) {
    Options options = at(Depth::spot);
    options.seed = seed;
    const std::vector<std::size_t> drawn = draw(64, spot_size(64), seed, closing);
    const bool in_sample = std::find(drawn.begin(), drawn.end(), bad) != drawn.end();
    EXPECT_EQ(recheck(bytes, options).outcome, in_sample ? Outcome::rejected : Outcome::consistent) << seed;
    caught += in_sample ? 1U : 0U;
  }
  EXPECT_GT(caught, 0U);
  EXPECT_LT(caught, 40U);
}

TEST(Depths, DrawsAreDistinctAndFair) {
  std::vector<unsigned> hits(20, 0);
  for (std::uint64_t seed = 0; seed < 2000; ++seed) {
    const std::vector<std::size_t> drawn = draw(20, 5, seed, "x");
    ASSERT_EQ(drawn.size(), 5U);
    for (std::size_t i = 0; i < 5; ++i) {
      ++hits[drawn[i]];
      if (i > 0) {
        ASSERT_LT(drawn[i - 1], drawn[i]);
      }
    }
  }
  for (const unsigned hit : hits) {  // 500 expected
    EXPECT_GT(hit, 400U);
    EXPECT_LT(hit, 600U);
  }
}

TEST(Depths, ThreadsDoNotChangeTheReport) {
  Draft draft = golay();
  EnumerationDraft enumeration = enumerate(draft.field, draft.generator, 6);
  std::size_t disguised = 0;
  for (std::size_t i = 20; i < 64 && disguised < 4; ++i) disguised += disguise(enumeration.shards[i]) ? 1U : 0U;
  ASSERT_GE(disguised, 2U);
  draft.evidence = {enumeration.value()};
  draft.statements = {distance("exactly", 7, {0})};
  for (const std::string& bytes : {golay_certificate(6), draft.bytes()}) {
    const std::string one = to_json(recheck(bytes, {}));
    for (const unsigned threads : {2U, 3U, 8U, 1000U, 0U}) {
      Options options;
      options.threads = threads;
      for (int round = 0; round < 5; ++round) EXPECT_EQ(to_json(recheck(bytes, options)), one);
    }
  }
}

TEST(Depths, IncompleteEnumerationIsLegalWhereNothingNeedsIt) {
  Draft draft = golay();
  EnumerationDraft enumeration = enumerate(draft.field, draft.generator, 6);
  enumeration.shards.resize(40);
  enumeration.shards.erase(enumeration.shards.begin() + 3);
  draft.evidence = {enumeration.value(), witness(prime(2), 7, multiples(golay_generator, 23)[0])};
  draft.statements = {distance("at-most", 7, {0, 1})};
  const Report report = recheck(draft.bytes(), {});
  EXPECT_EQ(report.outcome, Outcome::proven) << report.reason;
  EXPECT_EQ(report.shards_total, 64U);
  EXPECT_EQ(report.shards_present, 39U);
  EXPECT_EQ(report.shards_reexecuted, 39U);
  EXPECT_EQ(recheck(draft.bytes(), at(Depth::quick)).outcome, Outcome::proven);  // the witness suffices

  std::size_t bad = 10;
  while (!disguise(enumeration.shards[bad])) ++bad;
  draft.evidence[0] = enumeration.value();
  const Report wrong = recheck(draft.bytes(), {});
  EXPECT_EQ(wrong.outcome, Outcome::rejected);
  EXPECT_NE(wrong.reason.find("evidence[0].shards[" + std::to_string(bad) + "]"), std::string::npos) << wrong.reason;
}

TEST(Depths, UnknownEvidenceIsNotChecked) {
  const Value unknown = object({{"kind", text("oracle")},
                                {"version", number(1)},
                                {"class", text("theorem")},
                                {"anything", array({number(1), text("x"), object({{"y", number(2)}})})}});
  Draft draft = golay();
  draft.evidence = {unknown, witness(prime(2), 7, multiples(golay_generator, 23)[0])};
  draft.statements = {distance("exactly", 7, {0, 1})};
  const Report report = recheck(draft.bytes(), {});
  EXPECT_EQ(report.outcome, Outcome::consistent) << report.reason;
  EXPECT_EQ(report.findings.at(0).status, Status::not_checked);
  draft.statements = {distance("at-most", 7, {0, 1})};  // does not need it
  EXPECT_EQ(recheck(draft.bytes(), {}).outcome, Outcome::proven);
  draft.statements = {distance("exactly", 8, {0, 1})};  // the witness refutes it
  EXPECT_EQ(recheck(draft.bytes(), {}).outcome, Outcome::rejected);
  Value later = witness(prime(2), 7, multiples(golay_generator, 23)[0]);
  later.text.replace(later.text.find("\"version\":1"), 11, "\"version\":2");
  draft.evidence = {later};
  draft.statements = {distance("at-most", 7, {0})};
  EXPECT_EQ(recheck(draft.bytes(), {}).findings.at(0).status, Status::not_checked);
}

TEST(Depths, StopBeforeAnythingElse) {
  StopFlag stop;
  stop.request();
  Options options;
  options.stop = &stop;
  const Report report = recheck(golay_certificate(6), options);
  EXPECT_EQ(report.outcome, Outcome::consistent);
  EXPECT_TRUE(report.ended_early);
  for (const Finding& finding : report.findings) EXPECT_EQ(finding.status, Status::not_checked);
}

/// Requests a stop after some shards.
class StopAfter final : public Progress {
 public:
  void update(const ProgressState& state) override {
    EXPECT_LE(state.done, state.total);
    if (++calls_ == 5) stop.request();
  }
  StopFlag stop;

 private:
  int calls_ = 0;
};

TEST(Depths, StopBetweenShards) {
  StopAfter progress;
  Options options;
  options.progress = &progress;
  options.stop = &progress.stop;
  const Report report = recheck(golay_certificate(6), options);
  EXPECT_EQ(report.outcome, Outcome::consistent);
  EXPECT_TRUE(report.ended_early);
  EXPECT_EQ(report.shards_reexecuted, 5U);
  EXPECT_EQ(report.catch_probability, "5/64");
}

/// A clock that moves on by one second whenever somebody looks.
class StepClock final : public Clock {
 public:
  [[nodiscard]] double seconds() const override { return static_cast<double>(now_.fetch_add(1)); }

 private:
  mutable std::atomic<int> now_{0};
};

TEST(Depths, BudgetEndsTheRun) {
  for (const double budget : {1.0, 10.0, 40.0, 100.0}) {
    const StepClock clock;
    Options options;
    options.clock = &clock;
    options.budget_seconds = budget;
    const Report report = recheck(golay_certificate(6), options);
    EXPECT_EQ(report.outcome, Outcome::consistent);
    EXPECT_TRUE(report.ended_early);
    EXPECT_LT(report.shards_reexecuted, 64U);
  }
}

/// A certificate whose enumeration nobody can repeat: [70,66], one giant shard with right moments is not needed to be
/// present; the plan alone is legal.  With a shard of 2^40 words the forecast exceeds a day.
TEST(Depths, MoreThanADayIsNotBegun) {
  Rows rows;
  for (unsigned r = 0; r < 50; ++r) {
    Vector row(50, 0);
    row[r] = 1;
    rows.push_back(row);
  }
  Draft draft{matrix_description(prime(2), rows), prime(2), rows};
  // The whole space: binomial counts.  46 free rows, only shard 1: offset of weight 1 plus 46 free places.
  std::vector<std::uint64_t> binomial{1};
  for (unsigned n = 0; n < 46; ++n) {
    binomial.push_back(0);
    for (std::size_t i = binomial.size(); --i > 0;) binomial[i] += binomial[i - 1];
  }
  Weights counts;
  for (unsigned i = 0; i <= 46; ++i) counts[i + 1] = binomial[i];
  EnumerationDraft enumeration{generator_digest(prime(2), rows), 46, "16", {}, {{"1", counts, {}, {}}}};
  Vector lightest(50, 0);
  lightest[7] = 1;
  draft.evidence = {enumeration.value(), witness(prime(2), 1, lightest)};
  draft.statements = {distance("at-most", 1, {0, 1})};
  const Report report = recheck(draft.bytes(), {});
  EXPECT_EQ(report.outcome, Outcome::proven) << report.reason;  // the witness suffices
  EXPECT_EQ(report.shards_reexecuted, 0U);
  EXPECT_NE(report.reason.find("forecast"), std::string::npos) << report.reason;

  const StepClock clock;
  Options options;
  options.clock = &clock;
  options.budget_seconds = 1000;  // begun, and ended by the budget
  const Report begun = recheck(draft.bytes(), options);
  EXPECT_TRUE(begun.ended_early);
  EXPECT_EQ(begun.reason.find("forecast"), std::string::npos) << begun.reason;
}

TEST(Depths, ForecastMakesItConsistent) {
  Rows rows;
  for (unsigned r = 0; r < 50; ++r) {
    Vector row(50, 0);
    row[r] = 1;
    rows.push_back(row);
  }
  Draft draft{matrix_description(prime(2), rows), prime(2), rows};
  std::vector<std::uint64_t> binomial{1};
  for (unsigned n = 0; n < 50; ++n) {
    binomial.push_back(0);
    for (std::size_t i = binomial.size(); --i > 0;) binomial[i] += binomial[i - 1];
  }
  Weights counts;
  for (unsigned i = 1; i <= 50; ++i) counts[i] = binomial[i];
  EnumerationDraft enumeration{generator_digest(prime(2), rows), 50, "1", {}, {{"0", counts, {}, {}}}};
  draft.evidence = {enumeration.value()};
  draft.statements = {distance("exactly", 1, {0}), minimum_words(1, 50, {0})};
  const Report report = recheck(draft.bytes(), {});
  EXPECT_EQ(report.outcome, Outcome::consistent) << report.reason;
  EXPECT_NE(report.reason.find("hours"), std::string::npos) << report.reason;
}

}  // namespace
}  // namespace assize::recheck::test
