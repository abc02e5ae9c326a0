// Rendering of `assize show`.
#include "report/show.hpp"

#include "base/json.hpp"
#include "sheet/canonical.hpp"
#include "sheet/explain.hpp"

namespace assize::report {

Document show(const sheet::Description& description, const CodeFacts& facts) {
  const std::uint32_t redundancy = facts.length - facts.dimension;
  Page page(parameters(facts.order, facts.length, facts.dimension));
  page.line("title", description.title).line("sheet", description.source);
  for (const auto& [name, value] : sheet::explain(description)) page.line(name, value);
  page.line("codeword length n", std::to_string(facts.length));
  page.line("dimension k", std::to_string(facts.dimension) + " data symbols");
  page.line("redundancy r", std::to_string(redundancy) + " check symbols");
  page.line("rate", std::to_string(facts.dimension) + "/" + std::to_string(facts.length));
  if (!facts.guaranteed_by.empty())
    page.line("guaranteed", "minimum distance at least " + std::to_string(facts.guaranteed) +
                                " (theorem: " + facts.guaranteed_by + ")");
  page.line("structure", joined(facts.structure)).line("symmetries", joined(facts.symmetries));
  page.line("notices", joined(facts.notices));
  page.line("sheet digest", facts.sheet_digest).line("description digest", facts.description_digest);
  page.line("generator digest", facts.reduced_generator_digest + " (reduced generator)");

  Json::Object json{{"order", Json::integer(facts.order)},
                    {"length", Json::integer(facts.length)},
                    {"dimension", Json::integer(facts.dimension)},
                    {"redundancy", Json::integer(redundancy)},
                    {"title", description.title},
                    {"description", sheet::to_json(description)}};
  Json::Object understood;
  for (const auto& [name, value] : sheet::explain(description))
    if (!value.empty()) understood.emplace_back(name, value);
  json.emplace_back("understood", understood);
  json.emplace_back("field_filled_in", Json::boolean(!description.field_stated));
  json.emplace_back("guaranteed_distance", Json::integer(facts.guaranteed));
  json.emplace_back("structure", strings(facts.structure));
  json.emplace_back("symmetries", strings(facts.symmetries));
  json.emplace_back("notices", strings(facts.notices));
  json.emplace_back("sheet_digest", facts.sheet_digest);
  json.emplace_back("description_digest", facts.description_digest);
  json.emplace_back("reduced_generator_digest", facts.reduced_generator_digest);
  return {page.text(), Json(json).text() + "\n"};
}

}  // namespace assize::report
