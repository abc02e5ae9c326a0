// The order of the checks: spelling, claim, code, evidence, statements, and only then the expensive execution of
// shards.
#include "recheck/recheck.hpp"

#include <algorithm>
#include <exception>

#include "base/digest.hpp"
#include "recheck/claim.hpp"
#include "recheck/envelope.hpp"
#include "recheck/reexecution.hpp"
#include "recheck/verdict.hpp"

namespace assize::recheck {
namespace {

/// A rejected certificate proves nothing, so no finding of it stays better than "not checked".
void reject(Report& report, const Failure& failure) {
  report.outcome = Outcome::rejected;
  report.reason = failure.where.empty() ? failure.what : failure.where + ": " + failure.what;
  for (Finding& finding : report.findings)
    if (finding.status != Status::rejected)
      finding = Finding{finding.statement, Status::not_checked, "the certificate as a whole is rejected"};
}

/// Nothing wrong was found, and something is left to do.
void leave_open(Report& report, std::string why) {
  report.outcome = Outcome::consistent;
  report.reason = std::move(why);
}

Result<void> check_code(const Claim& claim, const Replayed& code, const std::string& generator_digest) {
  const std::uint64_t order = code.field->order();
  const Matrix& g = code.reduced.generator;
  if (claim.order != order)
    return Failure{"claim.code.order", "the description gives a code over GF(" + std::to_string(order) + ")", ""};
  if (claim.length != g.columns)
    return Failure{"claim.code.length", "the description gives length " + std::to_string(g.columns), ""};
  if (claim.dimension != g.rows)
    return Failure{"claim.code.dimension", "the description gives dimension " + std::to_string(g.rows), ""};
  if (claim.reduced_generator_digest != generator_digest)
    return Failure{"claim.code.reduced_generator_digest", "the digest is not that of the described code", ""};
  return {};
}

void count_shards(const std::vector<Item>& items, Report& report) {
  BigInteger total = 0;
  for (const Item& item : items)
    if (item.enumeration) {
      total += item.enumeration->forms->shards();
      report.shards_present += item.enumeration->shards.size();
    }
  report.shards_total = total < max_integer ? static_cast<std::uint64_t>(total) : max_integer;
}

void judge_all(const Claim& claim, const std::vector<Item>& items, const std::vector<std::size_t>& executed,
               Report& report) {
  report.findings.clear();
  for (const Statement& statement : claim.statements) report.findings.push_back(judge(statement, items, executed));
  report.outcome = outcome_of(report.findings);
  if (report.outcome != Outcome::rejected) return;
  const auto wrong = std::find_if(report.findings.begin(), report.findings.end(),
                                  [](const Finding& finding) { return finding.status == Status::rejected; });
  reject(report, Failure{"", wrong->because, ""});
}

std::string reason_for(const Report& report, const Rerun& rerun) {
  if (report.outcome == Outcome::proven)
    return "every statement follows from evidence that was derived again" +
           (rerun.not_started.empty() ? "" : "; " + rerun.not_started);
  if (!rerun.not_started.empty()) return "nothing wrong was found; " + rerun.not_started;
  const bool unknown = std::any_of(report.findings.begin(), report.findings.end(),
                                   [](const Finding& finding) { return finding.status == Status::not_checked; });
  if (unknown) return "nothing wrong was found; a statement rests on evidence of a kind unknown to this checker";
  return "nothing wrong was found; " + std::to_string(report.shards_reexecuted) + " of " +
         std::to_string(report.shards_present) + " shards were executed again" +
         (rerun.ended_early ? " before the time was up or a stop was requested" : "");
}

void run(std::string_view bytes, const Options& options, const Brake& brake, Report& report) {
  const auto envelope = read_envelope(bytes);
  if (!envelope) return reject(report, envelope.error());
  report.title = envelope->title;
  report.cautions = envelope->cautions;

  const auto claim = read_claim(envelope->claim(), envelope->evidence().size());
  if (!claim) return reject(report, claim.error());
  report.order = claim->order;
  report.length = claim->length;
  report.dimension = claim->dimension;
  report.description_digest = claim->description_digest;
  report.sheet_digest = claim->sheet_digest;
  for (const Statement& statement : claim->statements)
    report.findings.push_back(Finding{statement.sentence(), Status::not_checked, "the run ended before"});
  if (digest_hex(spell(*claim->description)) != claim->description_digest)
    return reject(report, Failure{"claim.code.description_digest", "the digest is not that of the description", ""});
  if (options.expected_description_digest && *options.expected_description_digest != claim->description_digest)
    return reject(report, Failure{"claim.code.description_digest",
                                  "the certificate is about another code: " + *options.expected_description_digest +
                                      " was asked for",
                                  ""});

  const auto code = replay_description(*claim->description, "claim.code.description", brake);
  if (!code) return reject(report, code.error());
  const Subject subject{*code, reduced_generator_digest(*code->field, code->reduced)};
  if (auto right = check_code(*claim, *code, subject.reduced_generator_digest); !right)
    return reject(report, right.error());

  const auto items = check_evidence(envelope->evidence(), subject, brake);
  if (!items) return reject(report, items.error());
  count_shards(*items, report);
  if (const auto conflict = contradiction(*items)) return reject(report, *conflict);
  judge_all(*claim, *items, std::vector<std::size_t>(items->size(), 0), report);
  if (report.outcome == Outcome::rejected) return;  // no need to execute anything

  const std::string& closing = *envelope->whole.object()->back().value.text();
  const Rerun rerun = reexecute(*items, closing, options, brake);
  report.shards_reexecuted = rerun.executed;
  report.ended_early = rerun.ended_early;
  if (report.shards_present > 0)
    report.catch_probability = std::to_string(rerun.executed) + "/" + std::to_string(report.shards_present);
  if (rerun.wrong) return reject(report, *rerun.wrong);
  judge_all(*claim, *items, rerun.done, report);
  report.reason = reason_for(report, rerun);
}

}  // namespace

int exit_code(Outcome outcome) noexcept {
  switch (outcome) {
    case Outcome::proven:
      return 0;
    case Outcome::consistent:
      return 3;
    case Outcome::rejected:
      return 1;
  }
  return 1;
}

std::string_view name(Outcome outcome) noexcept {
  switch (outcome) {
    case Outcome::proven:
      return "PROVEN";
    case Outcome::consistent:
      return "CONSISTENT";
    case Outcome::rejected:
      return "REJECTED";
  }
  return "REJECTED";
}

std::string_view name(Depth depth) noexcept {
  switch (depth) {
    case Depth::quick:
      return "quick";
    case Depth::spot:
      return "spot";
    case Depth::full:
      return "full";
  }
  return "";
}

std::string_view name(Status status) noexcept {
  switch (status) {
    case Status::proven:
      return "proven";
    case Status::consistent:
      return "consistent";
    case Status::rejected:
      return "rejected";
    case Status::not_checked:
      return "not checked";
  }
  return "";
}

Report recheck(std::string_view certificate_bytes, const Options& options) noexcept {
  Report report;
  report.depth = options.depth;
  report.seed = options.seed;
  Options bounded = options;
  bounded.threads = std::clamp(options.threads, 1U, 256U);
  try {
    const Brake brake(bounded);
    run(certificate_bytes, bounded, brake, report);
  } catch (const Ended&) {
    report.ended_early = true;
    leave_open(report,
               "nothing wrong was found before the time was up or a stop was requested; no statement was checked");
  } catch (const std::bad_alloc&) {
    reject(report, Failure{"", "the memory of this machine does not suffice to check the certificate", ""});
  } catch (const std::exception& error) {
    reject(report, Failure{"", std::string("the check could not be carried out: ") + error.what(), ""});
  }
  return report;
}

}  // namespace assize::recheck
