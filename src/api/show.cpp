// `show`: nothing is run but the cheap theorems.
#include "report/show.hpp"

#include "api/assize.hpp"
#include "api/subject.hpp"
#include "api/world.hpp"
#include "base/overloaded.hpp"
#include "bound/theorems.hpp"
#include "sheet/canonical.hpp"

namespace assize::api {

Answer<Reply> show(const std::string& sheet) {
  const auto subject = load(sheet);
  if (!subject) return to_problem(subject.error());
  const code::LinearCode& code = subject->code;
  report::CodeFacts facts;
  facts.order = code.order();
  facts.length = code.length();
  facts.dimension = code.dimension();
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
