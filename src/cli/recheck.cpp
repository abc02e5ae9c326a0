// assize recheck CERT
#include "cli/commands.hpp"
#include "cli/terminal.hpp"

namespace assize::cli {

namespace {

Result<api::Depth> read_depth(const Arguments& arguments) {
  const std::string depth = arguments.value("--depth").value_or("full");
  if (depth == "quick") return api::Depth::quick;
  if (depth == "spot") return api::Depth::spot;
  if (depth == "full") return api::Depth::full;
  return Failure{"--depth", "\"" + depth + "\" is not a depth", "write quick, spot or full"};
}

}  // namespace

api::Answer<api::Reply> run_recheck(const Arguments& arguments) {
  api::RecheckRequest request;
  request.certificate = arguments.argument;
  auto run = read_run(arguments);
  if (!run) return to_problem(run.error());
  request.run = *std::move(run);
  const auto depth = read_depth(arguments);
  if (!depth) return to_problem(depth.error());
  request.depth = *depth;
  const auto seed = arguments.integer("--seed", 0, (1ULL << 53) - 1);
  if (!seed) return to_problem(seed.error());
  request.seed = seed->value_or(1);
  request.for_sheet = arguments.value("--for").value_or("");
  ProgressBar bar(arguments.has("--progress"), arguments.has("--quiet"));
  request.run.on_progress = bar.listener();
  request.run.stop = &watch_signals();
  return api::recheck(request);
}

}  // namespace assize::cli
