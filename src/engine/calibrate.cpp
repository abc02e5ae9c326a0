// The measurement: shards of a trial plan with fewer free rows, larger and larger until they take long enough to time.
#include "engine/calibrate.hpp"

#include <algorithm>

#include "engine/shard_engine.hpp"
#include "plan/cost.hpp"

namespace assize::engine {

namespace {

/// Plans below this many units end before a measurement would.
constexpr std::uint64_t units_not_worth_measuring = std::uint64_t{1} << 23U;
constexpr double enough_seconds = 0.001;
constexpr double most_seconds = 0.010;
constexpr std::uint64_t most_units = std::uint64_t{1} << 25U;  // whatever the clock says

/// The least trial plan with these free rows: its shard 1 is an ordinary coset.
evidence::EnumerationPlan trial_plan(const code::LinearCode& code, std::uint32_t free_rows) {
  evidence::EnumerationPlan trial;
  trial.order = code.order();
  trial.dimension = code.dimension();
  trial.free_rows = free_rows;
  trial.shards = 2;  // only the first two are ever run
  return trial;
}

std::unique_ptr<ShardEngine> trial_engine(const code::LinearCode& code, plan::Method method,
                                          const kernel::KernelSet& kernel, std::uint32_t free_rows) {
  switch (method) {
    case plan::Method::plain:
      return make_plain(code, trial_plan(code, free_rows));
    case plan::Method::exhaust:
      return make_exhaust(code, trial_plan(code, free_rows), kernel);
  }
  return nullptr;
}

/// Trials are made twice and the quicker one counts: the machine may have been busy with something else.
double seconds_of_trial(const ShardEngine& engine, const Clock& clock) {
  const double start = clock.seconds();
  static_cast<void>(engine.run(1));
  return clock.seconds() - start;
}

}  // namespace

Forecast forecast(const code::LinearCode& code, const plan::Plan& plan, const RunOptions& options) {
  contract(options.clock != nullptr && options.kernel != nullptr, "a forecast needs a clock and a kernel");
  if (plan.operations < units_not_worth_measuring) return {};
  double rate = 0;
  for (std::uint32_t rows = 0; rows < code.dimension(); ++rows) {
    const auto messages = power_if_fits(code.order(), rows);
    if (!messages || *messages > most_units / plan::cost_per_message(plan.method, code.order(), code.length())) break;
    const auto engine = trial_engine(code, plan.method, *options.kernel, rows);
    const double seconds =
        std::min(seconds_of_trial(*engine, *options.clock), seconds_of_trial(*engine, *options.clock));
    if (seconds > 0) rate = std::max(rate, static_cast<double>(*messages) / seconds);
    if (seconds >= enough_seconds || seconds * code.order() > most_seconds) break;
  }
  if (rate <= 0) return {};
  const std::uint64_t shards = plan.enumeration ? plan.enumeration->shards : UINT64_MAX;
  rate *= static_cast<double>(std::clamp<std::uint64_t>(options.threads, 1, shards));
  return {.seconds = plan.messages.convert_to<double>() / rate, .messages_per_second = rate};
}

}  // namespace assize::engine
