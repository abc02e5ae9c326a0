// `selftest`: published weights by every kernel and by the plain engine, threads against one thread, and the checker.
#include <algorithm>

#include "api/assize.hpp"
#include "api/enumeration.hpp"
#include "api/known_answers.hpp"
#include "api/subject.hpp"
#include "api/world.hpp"
#include "base/json.hpp"
#include "report/document.hpp"

namespace assize::api {

namespace {

/// The plain engine takes part where it needs less than a second.
constexpr std::uint32_t largest_plain_dimension = 12;

evidence::WeightDistribution expected(const KnownAnswer& answer) {
  evidence::WeightDistribution out{{0, 1}};
  for (const auto& [weight, count] : answer.weights) out[weight] = count;
  return out;
}

/// Empty if the enumeration gives the published weights, otherwise what is wrong.
std::string fault(const Subject& subject, const KnownAnswer& answer, const kernel::KernelSet& kernel,
                  plan::Method method, unsigned threads, const Clock& clock) {
  const auto plan = plan::choose(subject.code, {.method = method});
  if (!plan) return plan.error().what;
  engine::RunOptions options;
  options.threads = threads;
  options.kernel = &kernel;
  options.clock = &clock;
  const auto outcome = engine::enumerate(subject.code, *plan, options);
  if (!outcome) return outcome.error().what;
  return evidence::distribution(outcome->enumeration) == expected(answer) ? ""
                                                                          : "other weights than the published ones";
}

struct Line {
  std::string what;
  std::string fault;
};

}  // namespace

Answer<Reply> selftest(const Run& run) {
  World world(run);
  if (const auto fine = settle(run, world); !fine) return to_problem(fine.error());
  std::vector<Line> lines;
  for (const KnownAnswer& answer : known_answers()) {
    const auto subject = load_text(answer.sheet, std::string(answer.name));
    if (!subject) {
      lines.push_back({std::string(answer.name), subject.error().what});
      continue;
    }
    for (const kernel::KernelSet* kernel : kernel::runnable_here())
      for (const unsigned threads : {1U, world.threads})
        lines.push_back({std::string(answer.name) + ", exhaust, kernel " + std::string(kernel->name) + ", threads " +
                             std::to_string(threads),
                         fault(*subject, answer, *kernel, plan::Method::exhaust, threads, world.clock)});
    if (subject->code.dimension() <= largest_plain_dimension)
      lines.push_back({std::string(answer.name) + ", plain",
                       fault(*subject, answer, kernel::reference(), plan::Method::plain, 1, world.clock)});
  }
  std::string compiled;
  for (const std::string_view name : kernel::compiled_names())
    compiled += (compiled.empty() ? "" : " ") + std::string(name);
  std::string ran;
  for (const std::string& name : kernel_names()) ran += (ran.empty() ? "" : " ") + name;

  const auto bad = std::ranges::find_if(lines, [](const Line& line) { return !line.fault.empty(); });
  if (bad != lines.end())
    return Problem{bad->what, "self-check failed: " + bad->fault, "do not trust results of this machine or build",
                   true};
  report::Page page("all right  " + std::to_string(lines.size()) + " known answers, " + program_name());
  page.line("kernels compiled", compiled).line("kernels run", ran);
  for (const Line& line : lines) page.line("right", line.what);
  page.line("time", report::duration_text(world.elapsed()));
  Json::Array checks;
  for (const Line& line : lines) checks.emplace_back(line.what);
  const Json json = Json::Object{{"verdict", "all right"},
                                 {"program", program_name()},
                                 {"kernels_compiled", compiled},
                                 {"kernels_run", ran},
                                 {"right", checks}};
  return Reply{Holds::yes, page.text(), json.text() + "\n"};
}

}  // namespace assize::api
