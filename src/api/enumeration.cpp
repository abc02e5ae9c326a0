// The 24-hour rule and the forecast.
#include "api/enumeration.hpp"

#include <algorithm>

namespace assize::api {

namespace {

constexpr double longest_unasked = 24 * 3600;

engine::RunOptions run_options(World& world, const Run& run, std::optional<std::uint32_t> at_least) {
  engine::RunOptions options;
  options.threads = world.threads;
  options.kernel = world.kernel;
  options.stop = &world.stop;
  options.clock = &world.clock;
  options.progress = &world.progress;
  options.at_least = at_least;
  if (run.within_seconds) {
    // The budget counts from the start of the command; a budget of 0 means "none" to the engine.
    options.budget_seconds = std::max(1e-9, *run.within_seconds - world.elapsed());
  }
  return options;
}

/// The largest dimension whose enumeration would take at most the given time at this rate.
std::uint32_t feasible_dimension(const code::LinearCode& code, double messages_per_second, double seconds) {
  std::uint32_t k = 0;
  double messages = 1;
  while (messages * code.order() <= messages_per_second * seconds) {
    messages *= code.order();
    ++k;
  }
  return k;
}

std::string not_started(const Subject& subject, const plan::Plan& plan, const engine::Forecast& forecast) {
  const std::uint32_t q = subject.code.order();
  std::string text =
      "not started: " + std::string(plan::name(plan.method)) + " would encode " +
      (plan.messages < BigInteger(1) << 80
           ? grouped_decimal(plan.messages)
           : "about " + std::to_string(q) + "^" + std::to_string(subject.code.dimension() - (q > 2 ? 1 : 0))) +
      " messages";
  if (forecast.seconds > 0) text += ", " + report::duration_text(forecast.seconds) + " on this machine";
  const std::uint32_t k = feasible_dimension(subject.code, forecast.messages_per_second, longest_unasked);
  if (k > 0) text += "; at this length a dimension up to about " + std::to_string(k) + " is feasible within a day";
  if (plan.enumeration) text += "; --within DURATION starts it all the same";
  return text;
}

}  // namespace

Result<Enumerated> run_enumeration(const Subject& subject, const plan::Plan& plan, World& world, const Run& run,
                                   std::optional<std::uint32_t> at_least) {
  const engine::RunOptions options = run_options(world, run, at_least);
  const engine::Forecast forecast = engine::forecast(subject.code, plan, options);
  if (!plan.enumeration || (forecast.seconds > longest_unasked && !run.within_seconds))
    return Enumerated{std::nullopt, not_started(subject, plan, forecast)};
  auto outcome = engine::enumerate(subject.code, plan, options);
  if (!outcome) return outcome.error();
  std::string remark;
  if (outcome->ending == engine::Ending::budget) remark = "the time given by --within ended the run";
  if (outcome->ending == engine::Ending::interrupted) remark = "the run was interrupted";
  return Enumerated{*std::move(outcome), remark};
}

report::Document forecast_document(const Subject& subject, const plan::Plan& chosen, World& world) {
  std::vector<report::PlanLine> lines;
  for (const plan::Plan& plan : plan::applicable(subject.code)) {
    report::PlanLine line;
    line.method = plan::name(plan.method);
    line.messages = plan.messages;
    line.operations = plan.operations;
    line.memory_bytes = plan.memory_bytes;
    line.chosen = plan.method == chosen.method;
    if (plan.enumeration) {
      line.shards = plan.enumeration->shards;
      line.seconds = engine::forecast(subject.code, plan, run_options(world, {}, std::nullopt)).seconds;
    }
    lines.push_back(std::move(line));
  }
  return report::plan(subject.parameters(), lines, world.threads);
}

}  // namespace assize::api
