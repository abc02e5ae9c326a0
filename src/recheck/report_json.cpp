// The report for programs: one JSON document, in the spelling of the certificates.
#include <algorithm>

#include "recheck/json.hpp"
#include "recheck/limits.hpp"
#include "recheck/recheck.hpp"

namespace assize::recheck {
namespace {

Json text(std::string_view value) { return Json{std::string(value)}; }
Json number(std::uint64_t value) { return Json{value}; }

}  // namespace

std::string to_json(const Report& report) {
  Json::Array findings;
  for (const Finding& finding : report.findings)
    findings.push_back(Json{Json::Object{{"statement", text(finding.statement)},
                                         {"status", text(name(finding.status))},
                                         {"because", text(finding.because)}}});
  Json::Array cautions;
  for (const std::string& caution : report.cautions) cautions.push_back(text(caution));
  Json::Object shards{{"total", number(report.shards_total)},
                      {"present", number(report.shards_present)},
                      {"reexecuted", number(report.shards_reexecuted)}};
  return spell(Json{Json::Object{{"verdict", text(name(report.outcome))},
                                 {"reason", text(report.reason)},
                                 {"title", text(report.title)},
                                 {"order", number(report.order)},
                                 {"length", number(report.length)},
                                 {"dimension", number(report.dimension)},
                                 {"description_digest", text(report.description_digest)},
                                 {"sheet_digest", text(report.sheet_digest)},
                                 {"findings", Json{std::move(findings)}},
                                 {"depth", text(name(report.depth))},
                                 {"seed", number(report.seed)},
                                 {"shards", Json{std::move(shards)}},
                                 {"catch_probability", text(report.catch_probability)},
                                 {"ended_early", Json{report.ended_early}},
                                 {"cautions", Json{std::move(cautions)}}}}) +
         "\n";
}

}  // namespace assize::recheck
