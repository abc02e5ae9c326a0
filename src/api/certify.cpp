// `certify`: cheap bounds first, an enumeration where it is needed or cheap, then the certificate.
#include <algorithm>
#include <cstdio>

#include "api/assize.hpp"
#include "api/destination.hpp"
#include "api/enumeration.hpp"
#include "api/subject.hpp"
#include "api/world.hpp"
#include "base/word.hpp"
#include "bound/theorems.hpp"
#include "certificate/certificate.hpp"
#include "report/cautions.hpp"
#include "sheet/canonical.hpp"

namespace assize::api {

namespace {

/// Enumerations up to this many operations are run for the weights alone: some seconds.
const BigInteger cheap_operations = BigInteger(1) << 33;

/// The lightest row of the reduced generator: an upper bound from the first moment on.
evidence::Witness lightest_row(const code::LinearCode& code) {
  evidence::Witness best;
  for (std::uint32_t i = 0; i < code.dimension(); ++i) {
    auto row = code.row(i);
    const std::uint32_t weight = code::weight(row);
    if (best.weight == 0 || weight < best.weight) best = {weight, std::move(row)};
  }
  return best;
}

/// What has been found so far, and what follows from it.
struct Findings {
  std::vector<evidence::Item> items;
  evidence::Conclusions conclusions;

  [[nodiscard]] const evidence::Witness& witness() const { return std::get<evidence::Witness>(items.front()); }
};

evidence::Verdict judge(const evidence::Conclusions& conclusions, std::optional<std::uint32_t> wanted) {
  if (!wanted) return conclusions.bounds_meet() ? evidence::Verdict::proved : evidence::Verdict::undecided;
  if (conclusions.at_least() >= *wanted) return evidence::Verdict::proved;
  if (conclusions.at_most() && *conclusions.at_most() < *wanted) return evidence::Verdict::refuted;
  return evidence::Verdict::undecided;
}

Holds to_holds(evidence::Verdict verdict) {
  switch (verdict) {
    case evidence::Verdict::proved:
      return Holds::yes;
    case evidence::Verdict::refuted:
      return Holds::no;
    case evidence::Verdict::undecided:
      return Holds::undecided;
  }
  return Holds::undecided;
}

evidence::Wish wish_of(Claim claim) { return {.minimum_words = true, .distribution = claim != Claim::distance}; }

/// Adds what an enumeration found.  A lighter witness takes the place of the generator row.  An enumeration that was
/// ended by a refutation proves nothing beyond its witness and is left out; one cut short by time names the shards it
/// completed.
void add_outcome(Findings& findings, engine::EnumerationOutcome outcome, const code::LinearCode& code, Claim claim) {
  if (outcome.lightest && outcome.lightest->weight <= findings.witness().weight) {
    contract(code.contains(outcome.lightest->word), "a witness is a word of the code");
    findings.items.front() = *outcome.lightest;
  }
  if (outcome.ending != engine::Ending::refuted && !outcome.enumeration.shards.empty())
    findings.items.emplace_back(std::move(outcome.enumeration));
  findings.conclusions = evidence::Conclusions::from(findings.items, wish_of(claim));
}

std::string seconds_text(double seconds) {
  char text[32];
  std::snprintf(text, sizeof text, "%.3f", seconds);
  return text;
}

certificate::Certificate make_certificate(const Subject& subject, const Findings& findings, const World& world,
                                          std::string method, std::string ended, std::string started) {
  const code::LinearCode& code = subject.code;
  certificate::Certificate out;
  out.title = subject.description.title;
  out.code = {sheet::to_json(subject.description),
              sheet::description_digest(subject.description),
              subject.sheet_digest,
              code.order(),
              code.length(),
              code.dimension(),
              code.reduced_generator_digest()};
  out.statements = findings.conclusions.statements();
  out.evidence = findings.items;
  out.cautions = report::cautions(subject.description);
  out.context = {program_name(),  std::move(method),  std::string(world.kernel->name),
                 world.threads,   std::move(started), seconds_text(world.elapsed()),
                 std::move(ended)};
  return out;
}

/// Whether the enumeration has to run: the bound is still open, or the weights are asked for or cheap.
bool enumeration_wanted(const CertifyRequest& request, const evidence::Conclusions& cheap, const plan::Plan& plan) {
  if (judge(cheap, request.at_least) == evidence::Verdict::undecided) return true;
  switch (request.claim) {
    case Claim::automatic:
      return !request.at_least && plan.enumeration && plan.operations <= cheap_operations;
    case Claim::distance:
      return false;
    case Claim::weights:
    case Claim::all:
      return true;
  }
  return true;
}

/// A failure to write at the end must not lose what was found.
Problem with_result(const Failure& failure, const Findings& findings) {
  Problem problem = to_problem(failure);
  problem.cure += (problem.cure.empty() ? "" : "\n  ") +
                  ("what was found: minimum distance at least " + std::to_string(findings.conclusions.at_least()));
  if (const auto most = findings.conclusions.at_most()) problem.cure += " and at most " + std::to_string(*most);
  return problem;
}

CertifyReply make_reply(const report::CertifyFacts& facts, const Findings& findings) {
  const report::Document document = report::certify(facts, findings.conclusions, findings.items);
  CertifyReply reply;
  reply.holds = to_holds(facts.verdict);
  reply.text = document.text;
  reply.json = document.json;
  reply.order = facts.code.order;
  reply.length = facts.code.length;
  reply.dimension = facts.code.dimension;
  reply.at_least = findings.conclusions.at_least();
  reply.at_most = findings.conclusions.at_most();
  if (const auto& words = findings.conclusions.minimum_words()) reply.minimum_words = to_decimal(*words);
  reply.certificate = facts.certificate;
  return reply;
}

}  // namespace

Answer<CertifyReply> certify(const CertifyRequest& request) {
  World world(request.run);
  const std::string started = utc_now();
  if (const auto fine = settle(request.run, world); !fine) return to_problem(fine.error());
  const auto subject = load(request.sheet);
  if (!subject) return to_problem(subject.error());
  const code::LinearCode& code = subject->code;
  const auto plan = plan::choose(code, world.goal);
  if (!plan) return to_problem(plan.error());
  if (request.plan_only) {
    const report::Document document = forecast_document(*subject, *plan, world);
    CertifyReply reply;
    reply.text = document.text;
    reply.json = document.json;
    return reply;
  }
  // Asked before the work as well as after it: nobody waits an hour to be told that the name is taken.
  const std::string path = certificate_path(request.output, subject->stem);
  const std::string digest = sheet::description_digest(subject->description);
  if (const auto free = may_write(path, request.sheet, digest, request.replace); !free) return to_problem(free.error());

  Findings findings;
  findings.items.emplace_back(lightest_row(code));
  for (evidence::Item& item : bound::theorems(subject->description, code)) findings.items.push_back(std::move(item));
  findings.conclusions = evidence::Conclusions::from(findings.items, wish_of(request.claim));

  report::CertifyFacts facts;
  facts.code = subject->parameters();
  facts.wanted = request.at_least;
  facts.method = findings.conclusions.lower_bound_item() ? "theorem" : "generator row";
  std::string ended = "complete";
  if (enumeration_wanted(request, findings.conclusions, *plan)) {
    // Where the weights are wanted too, a word that is too light does not end the run.
    const bool only_the_bound = request.claim == Claim::automatic || request.claim == Claim::distance;
    auto enumerated =
        run_enumeration(*subject, *plan, world, request.run, only_the_bound ? request.at_least : std::nullopt);
    if (!enumerated) return to_problem(enumerated.error());
    facts.remark = enumerated->remark;
    if (enumerated->outcome) {
      facts.method = plan::name(plan->method);
      facts.shards_done = enumerated->outcome->enumeration.shards.size();
      facts.shards_planned = plan->enumeration->shards;
      ended = engine::name(enumerated->outcome->ending);
      add_outcome(findings, *std::move(enumerated->outcome), code, request.claim);
    }
  }
  facts.verdict = judge(findings.conclusions, request.at_least);
  if (request.claim != Claim::automatic && request.claim != Claim::distance && !findings.conclusions.distribution())
    facts.weights_missing = true;
  if (facts.weights_missing) facts.verdict = evidence::Verdict::undecided;
  facts.notices = code.structure.notices;
  facts.witness = spell_word(code.order(), findings.witness().word);

  const auto certificate = make_certificate(*subject, findings, world, facts.method, ended, started);
  const auto existing = may_write(path, request.sheet, digest, request.replace);
  if (!existing) return with_result(existing.error(), findings);
  const std::string bytes = certificate::to_bytes(certificate);
  if (bytes.size() > certificate::largest_certificate)
    return Problem{path,
                   "the certificate would have " + std::to_string(bytes.size()) + " bytes, more than a checker reads",
                   "use --claim distance", false};
  if (const auto written = store::write_file(path, bytes, *existing); !written)
    return with_result(written.error(), findings);
  facts.certificate = path;
  facts.seconds = world.elapsed();
  return make_reply(facts, findings);
}

}  // namespace assize::api
