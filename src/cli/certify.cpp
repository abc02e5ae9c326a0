// assize certify SHEET
#include "cli/commands.hpp"
#include "cli/terminal.hpp"

namespace assize::cli {

namespace {

Result<api::Claim> read_claim(const Arguments& arguments) {
  const auto claim = arguments.value("--claim");
  if (!claim) return api::Claim::automatic;
  if (*claim == "distance") return api::Claim::distance;
  if (*claim == "weights") return api::Claim::weights;
  if (*claim == "all") return api::Claim::all;
  return Failure{"--claim", "\"" + *claim + "\" is not something to claim", "write distance, weights or all"};
}

}  // namespace

api::Answer<api::Reply> run_certify(const Arguments& arguments) {
  api::CertifyRequest request;
  request.sheet = arguments.argument;
  auto run = read_run(arguments);
  if (!run) return to_problem(run.error());
  request.run = *std::move(run);
  const auto at_least = arguments.integer("--at-least", 1, 1U << 20);
  if (!at_least) return to_problem(at_least.error());
  if (*at_least) request.at_least = static_cast<std::uint32_t>(**at_least);
  const auto claim = read_claim(arguments);
  if (!claim) return to_problem(claim.error());
  request.claim = *claim;
  request.output = arguments.value("--output").value_or("");
  request.replace = arguments.has("--replace");
  request.plan_only = arguments.has("--plan");
  ProgressBar bar(arguments.has("--progress"), arguments.has("--quiet"));
  request.run.on_progress = bar.listener();
  request.run.stop = &watch_signals();
  auto reply = api::certify(request);
  if (!reply) return reply.problem();
  return api::Reply(*reply);
}

}  // namespace assize::cli
