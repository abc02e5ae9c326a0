// Rendering of results.  The first line is the verdict.
#include "report/result.hpp"

#include "base/json.hpp"

namespace assize::report {

namespace {

std::string distance_text(const evidence::Conclusions& conclusions) {
  const std::string at_least = std::to_string(conclusions.at_least());
  if (conclusions.bounds_meet()) return "minimum distance exactly " + at_least;
  std::string text = "minimum distance at least " + at_least;
  if (conclusions.at_most()) text += " and at most " + std::to_string(*conclusions.at_most());
  return text;
}

/// The classes of the items that a statement rests on: "re-run", "theorem + witness".
std::string class_text(const evidence::Statement& statement, const std::vector<evidence::Item>& items) {
  std::string text;
  for (const std::uint32_t index : statement.evidence()) {
    const std::string_view name = evidence::evidence_class(items[index]);
    if (text.find(name) == std::string::npos) text += (text.empty() ? "" : " + ") + std::string(name);
  }
  return text;
}

template <class Content>
std::string class_of(const evidence::Conclusions& conclusions, const std::vector<evidence::Item>& items) {
  std::string text;
  for (const evidence::Statement& statement : conclusions.statements()) {
    if (!std::holds_alternative<Content>(statement.content())) continue;
    const std::string name = class_text(statement, items);
    if (text.find(name) == std::string::npos) text += (text.empty() ? "" : " + ") + name;
  }
  return text;
}

std::string with_class(const std::string& value, const std::string& evidence) {
  return evidence.empty() ? value : value + "   (" + evidence + ")";
}

template <class Content>
const Content* stated(const evidence::Conclusions& conclusions) {
  for (const evidence::Statement& statement : conclusions.statements())
    if (const auto* content = std::get_if<Content>(&statement.content())) return content;
  return nullptr;
}

std::string counts_text(const evidence::WeightDistribution& counts) {
  std::size_t width = 0;
  std::size_t digits = 0;
  for (const auto& [weight, count] : counts) {
    width = std::max(width, std::to_string(weight).size());
    digits = std::max(digits, grouped_decimal(count).size());
  }
  std::string text;
  for (const auto& [weight, count] : counts) {
    const std::string w = std::to_string(weight);
    const std::string c = grouped_decimal(count);
    text += (text.empty() ? "" : "\n") + std::string(width - w.size(), ' ') + w + "  " +
            std::string(digits - c.size(), ' ') + c;
  }
  return text;
}

Json counts_json(const evidence::WeightDistribution& counts) {
  Json::Object out;
  for (const auto& [weight, count] : counts) out.emplace_back(std::to_string(weight), to_decimal(count));
  return out;
}

void add_parameters(Json::Object& json, const Parameters& code) {
  json.emplace_back("order", Json::integer(code.order));
  json.emplace_back("length", Json::integer(code.length));
  json.emplace_back("dimension", Json::integer(code.dimension));
}

std::string shards_text(std::uint64_t done, std::uint64_t planned) {
  return planned == 0 ? "" : std::to_string(done) + " of " + std::to_string(planned);
}

}  // namespace

Document certify(const CertifyFacts& facts, const evidence::Conclusions& conclusions,
                 const std::vector<evidence::Item>& items) {
  const std::string verdict(evidence::name(facts.verdict));
  std::string wanted = facts.wanted ? ", asked: at least " + std::to_string(*facts.wanted) : "";
  if (facts.weights_missing) wanted += ", asked: all weights";
  Page page(verdict + "  " + parameters(facts.code.order, facts.code.length, facts.code.dimension) + ": " +
            distance_text(conclusions) + wanted);
  const std::string distance_class = class_of<evidence::MinimumDistance>(conclusions, items);
  page.line("distance", with_class(distance_text(conclusions), distance_class));
  const auto* words = stated<evidence::MinimumWords>(conclusions);
  if (words != nullptr)
    page.line("words of that weight",
              with_class(grouped_decimal(words->count), class_of<evidence::MinimumWords>(conclusions, items)));
  if (const auto* complete = stated<evidence::CompleteDistribution>(conclusions))
    page.line("weights", "all of them   (" + class_of<evidence::CompleteDistribution>(conclusions, items) + ")\n" +
                             counts_text(complete->counts));
  page.line("a lightest word known", facts.witness);
  page.line("method", facts.method).line("shards", shards_text(facts.shards_done, facts.shards_planned));
  page.line("note", facts.remark).line("notices", joined(facts.notices));
  page.line("certificate", facts.certificate).line("time", duration_text(facts.seconds));

  Json::Object json{{"verdict", verdict}};
  add_parameters(json, facts.code);
  json.emplace_back("distance", Json::Object{{"at_least", Json::integer(conclusions.at_least())},
                                             {"at_most", conclusions.at_most() ? Json::integer(*conclusions.at_most())
                                                                               : Json::null()}});
  json.emplace_back("minimum_words", words != nullptr ? Json(to_decimal(words->count)) : Json::null());
  json.emplace_back("witness", facts.witness);
  json.emplace_back("method", facts.method);
  json.emplace_back("evidence_class", distance_class);
  json.emplace_back("certificate", facts.certificate.empty() ? Json::null() : Json(facts.certificate));
  json.emplace_back("seconds", Json::fixed(facts.seconds, 3));
  json.emplace_back("note", facts.remark);
  json.emplace_back("notices", strings(facts.notices));
  if (const auto* complete = stated<evidence::CompleteDistribution>(conclusions))
    json.emplace_back("counts", counts_json(complete->counts));
  return {page.text(), Json(json).text() + "\n"};
}

Document weights(const WeightsFacts& facts, bool complete, const evidence::WeightDistribution& counts) {
  Page page((complete ? "complete  " : "partial  ") +
            parameters(facts.code.order, facts.code.length, facts.code.dimension) +
            (complete ? ": words by weight" : ": words by weight in the completed shards only"));
  if (!counts.empty())
    page.line("weights",
              counts_text(counts) + (complete ? "" : "\n(a part of the words: no statement about the code)"));
  page.line("evidence class", complete ? "re-run" : "").line("method", facts.method);
  page.line("shards", shards_text(facts.shards_done, facts.shards_planned)).line("note", facts.remark);
  page.line("time", duration_text(facts.seconds));
  Json::Object json;
  add_parameters(json, facts.code);
  json.emplace_back("complete", Json::boolean(complete));
  json.emplace_back("counts", counts_json(counts));
  if (!facts.remark.empty()) json.emplace_back("note", facts.remark);
  return {page.text(), Json(json).text() + "\n"};
}

Document plan(const Parameters& code, const std::vector<PlanLine>& lines, unsigned threads) {
  Page page("plan  " + parameters(code.order, code.length, code.dimension) + ": nothing was run");
  Json::Array methods;
  for (const PlanLine& line : lines) {
    const std::string time = line.seconds ? "about " + duration_text(*line.seconds) + " on " + std::to_string(threads) +
                                                (threads == 1 ? " thread" : " threads")
                                          : "out of reach of any machine";
    page.line(line.method + (line.chosen ? " (chosen)" : ""),
              readable(line.messages) + " messages up to scalars" +
                  (line.shards > 0 ? " in " + std::to_string(line.shards) + " shards" : "") + "\n" +
                  readable(line.operations) + " operations, " + std::to_string((line.memory_bytes >> 20) + 1) +
                  " MB at most\n" + time);
    Json::Object entry{{"method", line.method},
                       {"chosen", Json::boolean(line.chosen)},
                       {"messages", to_decimal(line.messages)},
                       {"operations", to_decimal(line.operations)},
                       {"memory_bytes", std::to_string(line.memory_bytes)},
                       {"shards", line.shards > 0 ? Json(std::to_string(line.shards)) : Json::null()}};
    entry.emplace_back("forecast_seconds", line.seconds ? Json::fixed(*line.seconds, 3) : Json::null());
    methods.emplace_back(entry);
  }
  Json::Object json;
  add_parameters(json, code);
  json.emplace_back("threads", Json::integer(threads));
  json.emplace_back("methods", methods);
  return {page.text(), Json(json).text() + "\n"};
}

}  // namespace assize::report
