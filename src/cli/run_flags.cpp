// Flags that several commands share.
#include "cli/commands.hpp"

namespace assize::cli {

api::Problem to_problem(const Failure& failure) { return {failure.where, failure.what, failure.cure, false}; }

Result<api::Run> read_run(const Arguments& arguments) {
  api::Run run;
  const auto threads = arguments.integer("--threads", 1, 4096);
  if (!threads) return threads.error();
  run.threads = static_cast<unsigned>(threads->value_or(0));
  run.kernel = arguments.value("--kernel").value_or("");
  run.method = arguments.value("--method").value_or("");
  const auto within = arguments.duration("--within");
  if (!within) return within.error();
  run.within_seconds = *within;
  return run;
}

}  // namespace assize::cli
