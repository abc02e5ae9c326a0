// `recheck`: hands the bytes to the independent checker and passes its judgement on.
#include "recheck/recheck.hpp"

#include "api/assize.hpp"
#include "api/subject.hpp"
#include "api/world.hpp"
#include "sheet/canonical.hpp"

namespace assize::api {

namespace {

recheck::Depth to_depth(Depth depth) {
  switch (depth) {
    case Depth::quick:
      return recheck::Depth::quick;
    case Depth::spot:
      return recheck::Depth::spot;
    case Depth::full:
      return recheck::Depth::full;
  }
  return recheck::Depth::full;
}

Holds to_holds(recheck::Outcome outcome) {
  switch (outcome) {
    case recheck::Outcome::proven:
      return Holds::yes;
    case recheck::Outcome::rejected:
      return Holds::no;
    case recheck::Outcome::consistent:
      return Holds::undecided;
  }
  return Holds::undecided;
}

}  // namespace

Answer<Reply> recheck(const RecheckRequest& request) {
  World world(request.run);
  if (const auto fine = settle(request.run, world); !fine) return to_problem(fine.error());
  recheck::Options options;
  options.depth = to_depth(request.depth);
  options.seed = request.seed;
  options.threads = world.threads;
  options.stop = &world.stop;
  options.clock = &world.clock;
  options.budget_seconds = request.run.within_seconds.value_or(0);
  options.progress = &world.progress;
  if (!request.for_sheet.empty()) {
    const auto sheet = read_sheet_file(request.for_sheet);
    if (!sheet) return to_problem(sheet.error());
    options.expected_description_digest = sheet::description_digest(sheet->description);
  }
  const auto bytes = recheck::read_certificate_file(request.certificate);
  if (!bytes) return to_problem(bytes.error());
  const recheck::Report report = recheck::recheck(*bytes, options);
  return Reply{to_holds(report.outcome), recheck::to_text(report), recheck::to_json(report)};
}

}  // namespace assize::api
