// `show`: nothing is run but the cheap theorems.
#include "report/show.hpp"

#include "api/assize.hpp"
#include "api/subject.hpp"
#include "api/world.hpp"
#include "base/json.hpp"
#include "base/overloaded.hpp"
#include "base/word.hpp"
#include "bound/theorems.hpp"
#include "code/properties.hpp"
#include "code/symmetry.hpp"
#include "sheet/canonical.hpp"
#include "sheet/layout.hpp"
#include "sheet/write_matrix.hpp"

namespace assize::api {

namespace {

std::vector<std::string> structure_of(const code::LinearCode& code) {
  std::vector<std::string> out;
  const auto known = code::properties(code);
  if (!known) return {"not examined: the code is too large"};
  if (known->divisor > 1) out.push_back("every weight is divisible by " + std::to_string(known->divisor));
  if (known->self_orthogonal) out.emplace_back(known->self_dual ? "self-dual" : "self-orthogonal");
  if (known->hermitian_self_orthogonal)
    out.emplace_back(known->hermitian_self_dual ? "Hermitian self-dual" : "Hermitian self-orthogonal");
  if (known->all_one) out.emplace_back("the all-one word belongs to the code");
  return out;
}

std::vector<std::string> symmetries_of(const code::LinearCode& code) {
  std::vector<std::string> out;
  for (const code::MonomialMap& map : code.structure.symmetries) out.push_back(map.name);
  if (!out.empty()) {
    const std::uint32_t orbits = code::orbits(code.length(), code.structure.symmetries);
    out.push_back(orbits == 1 ? "together they reach every position from every other"
                              : "together they leave " + std::to_string(orbits) + " orbits of positions");
  }
  return out;
}

/// A matrix alone, in a layout that sheets can name.
Answer<Reply> matrix_of(const Subject& subject, const ShowRequest& request) {
  const code::LinearCode& code = subject.code;
  const auto layout = sheet::find_layout(request.layout.empty() ? "text" : request.layout);
  if (!layout)
    return Problem{"--layout", "\"" + request.layout + "\" is not a layout", "write one of " + sheet::layout_names(),
                   false};
  const bool parity = request.matrix == "parity";
  if (!parity && request.matrix != "generator" && request.matrix != "reduced")
    return Problem{"--matrix", "\"" + request.matrix + "\" is not a matrix",
                   "write reduced (or generator, which is the same) or parity", false};
  if (parity && code.redundancy() == 0)
    return Problem{"--matrix", "the code has no check symbols, so its parity-check matrix is empty", "", false};
  const field::Matrix matrix = parity ? code.parity_check() : code.generator();
  const std::string bytes = sheet::write_matrix(code.field(), matrix, *layout);
  Json::Array rows;
  for (std::size_t i = 0; i < matrix.rows(); ++i) rows.emplace_back(spell_word(code.order(), matrix.row(i)));
  const Json json = Json::Object{{"matrix", request.matrix}, {"order", Json::integer(code.order())}, {"rows", rows}};
  return Reply{Holds::yes, bytes, json.text() + "\n"};
}

}  // namespace

Answer<Reply> show(const ShowRequest& request) {
  const auto subject = load(request.sheet);
  if (!subject) return to_problem(subject.error());
  if (!request.matrix.empty()) return matrix_of(*subject, request);
  const code::LinearCode& code = subject->code;
  report::CodeFacts facts;
  facts.order = code.order();
  facts.length = code.length();
  facts.dimension = code.dimension();
  facts.structure = structure_of(code);
  facts.symmetries = symmetries_of(code);
  facts.notices = code.structure.notices;
  facts.sheet_digest = subject->sheet_digest;
  facts.description_digest = sheet::description_digest(subject->description);
  facts.reduced_generator_digest = code.reduced_generator_digest();
  const auto items = bound::theorems(subject->description, code);
  const auto conclusions = evidence::Conclusions::from(items, {});
  facts.guaranteed = conclusions.at_least();
  if (const auto item = conclusions.lower_bound_item())
    facts.guaranteed_by = std::visit(Overloaded{
                                         [](const evidence::MaximumDistanceSeparable&) -> std::string {
                                           return "Reed-Solomon codes meet the Singleton bound";
                                         },
                                         [](const evidence::Concatenation& fact) -> std::string {
                                           return "concatenation: the sum of the " +
                                                  std::to_string(fact.outer_distance) + " smallest inner distances";
                                         },
                                         [](const auto&) -> std::string { return ""; },
                                     },
                                     items[*item]);
  const report::Document document = report::show(subject->description, facts);
  return Reply{Holds::yes, document.text, document.json};
}

}  // namespace assize::api
