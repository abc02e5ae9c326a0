// assize weights SHEET
#include "cli/commands.hpp"
#include "cli/terminal.hpp"

namespace assize::cli {

api::Answer<api::Reply> run_weights(const Arguments& arguments) {
  api::WeightsRequest request;
  request.sheet = arguments.argument;
  auto run = read_run(arguments);
  if (!run) return to_problem(run.error());
  request.run = *std::move(run);
  request.plan_only = arguments.has("--plan");
  ProgressBar bar(arguments.has("--progress"), arguments.has("--quiet"));
  request.run.on_progress = bar.listener();
  request.run.stop = &watch_signals();
  return api::weights(request);
}

}  // namespace assize::cli
