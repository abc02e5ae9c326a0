// From a plan to the evidence: runs the shards, checks each one, and folds the results in the order of the shards.
#include "engine/enumerate.hpp"

#include <atomic>
#include <vector>

#include "engine/fault_checks.hpp"
#include "engine/run_watch.hpp"
#include "engine/runner.hpp"
#include "engine/shard_engine.hpp"

namespace assize::engine {

namespace {

struct Slot {
  Finding finding;
  std::optional<std::string> fault;
};

std::unique_ptr<ShardEngine> make_engine(const code::LinearCode& code, const plan::Plan& plan,
                                         const RunOptions& options) {
  switch (plan.method) {
    case plan::Method::plain:
      return make_plain(code, *plan.enumeration);
    case plan::Method::exhaust:
      return make_exhaust(code, *plan.enumeration, *options.kernel);
  }
  return nullptr;
}

/// The least shard with a word that is too light, or a fault: none above it is needed.
class Bound {
 public:
  void lower(std::uint64_t shard) noexcept {
    std::uint64_t current = least_.load(std::memory_order_relaxed);
    while (shard < current && !least_.compare_exchange_weak(current, shard, std::memory_order_relaxed)) {
    }
  }
  [[nodiscard]] bool excludes(std::uint64_t shard) const noexcept {
    return shard > least_.load(std::memory_order_relaxed);
  }

 private:
  std::atomic<std::uint64_t> least_{UINT64_MAX};
};

evidence::Witness witness_of(const code::LinearCode& code, const evidence::EnumerationPlan& plan, std::uint64_t shard,
                             const Finding& finding) {
  return {finding.lightest_weight, code.encode(message_in_shard(plan, shard, finding.lightest_tail))};
}

}  // namespace

std::string_view name(Ending ending) noexcept {
  switch (ending) {
    case Ending::complete:
      return "complete";
    case Ending::refuted:
      return "refuted";
    case Ending::budget:
      return "budget";
    case Ending::interrupted:
      return "interrupted";
  }
  return "";
}

Result<EnumerationOutcome> enumerate(const code::LinearCode& code, const plan::Plan& plan, const RunOptions& options) {
  contract(plan.enumeration.has_value(), "a plan that is run has shards");
  contract(options.clock != nullptr && options.kernel != nullptr, "a run has a clock and a kernel");
  const evidence::EnumerationPlan& shards = *plan.enumeration;
  const std::unique_ptr<ShardEngine> engine = make_engine(code, plan, options);
  const FaultChecks checks(code, shards);
  const std::uint32_t wanted = options.at_least.value_or(0);

  std::vector<Slot> slots(shards.shards);
  Bound bound;
  RunWatch watch(options, static_cast<std::uint64_t>(plan.messages));
  const std::uint64_t done = run_numbered(
      shards.shards, options.threads, [&](std::uint64_t shard) { return !bound.excludes(shard) && !watch.must_end(); },
      [&](std::uint64_t shard) {
        Slot& slot = slots[shard];
        slot.finding = engine->run(shard, [&watch] { return watch.must_give_up(); });
        if (slot.finding.given_up) return;
        slot.fault = checks.fault_of_shard(shard, slot.finding);
        if (slot.fault || slot.finding.lightest_weight < wanted) bound.lower(shard);
        watch.finished(shard_size(shards, shard), slot.finding.lightest_weight);
      });
  watch.close();

  EnumerationOutcome outcome;
  outcome.enumeration.plan = shards;
  outcome.ending = watch.reason().value_or(Ending::complete);
  const Finding* lightest = nullptr;
  std::uint64_t lightest_shard = 0;
  for (std::uint64_t shard = 0; shard < done; ++shard) {
    Slot& slot = slots[shard];
    if (slot.finding.given_up) continue;
    if (slot.fault) return self_check_failure("shard " + std::to_string(shard), *slot.fault);
    if (slot.finding.lightest_weight < (lightest != nullptr ? lightest->lightest_weight : UINT32_MAX)) {
      lightest = &slot.finding;
      lightest_shard = shard;
    }
    std::array<BigInteger, 2> moments = evidence::moments_of(slot.finding.counts);
    outcome.enumeration.shards.push_back({shard, std::move(slot.finding.counts), std::move(moments)});
    if (slot.finding.lightest_weight < wanted) {
      outcome.ending = Ending::refuted;
      break;
    }
  }
  if (lightest != nullptr) outcome.lightest = witness_of(code, shards, lightest_shard, *lightest);
  if (outcome.enumeration.complete())
    if (const auto fault = checks.fault_of_total(outcome.enumeration)) return self_check_failure("all shards", *fault);
  return outcome;
}

}  // namespace assize::engine
