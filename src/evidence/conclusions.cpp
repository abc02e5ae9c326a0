// Drawing conclusions: the best bounds among the items, and the fewest items that each statement needs.
#include "evidence/conclusions.hpp"

#include <algorithm>

#include "base/overloaded.hpp"

namespace assize::evidence {

std::string_view evidence_class(const Item& item) noexcept {
  return std::visit(Overloaded{
                        [](const Witness&) { return std::string_view("witness"); },
                        [](const MaximumDistanceSeparable&) { return std::string_view("theorem"); },
                        [](const Concatenation&) { return std::string_view("theorem"); },
                        [](const Enumeration&) { return std::string_view("re-run"); },
                    },
                    item);
}

Conclusions Conclusions::from(std::span<const Item> items, Wish wish) {
  Conclusions result;
  std::optional<std::uint32_t> complete_item;
  const auto raise = [&](std::uint32_t bound, std::uint32_t index) {
    if (bound <= result.at_least_) return;
    result.at_least_ = bound;
    result.lower_item_ = index;
  };
  const auto lower = [&](std::uint32_t bound, std::uint32_t index) {
    if (result.at_most_ && bound >= *result.at_most_) return;
    result.at_most_ = bound;
    result.upper_item_ = index;
  };
  for (std::uint32_t index = 0; index < items.size(); ++index)
    std::visit(Overloaded{
                   [&](const Witness& witness) {
                     contract(witness.weight > 0, "a witness is not the zero word");
                     lower(witness.weight, index);
                   },
                   [&](const MaximumDistanceSeparable& theorem) { raise(theorem.at_least, index); },
                   [&](const Concatenation& theorem) { raise(theorem.at_least, index); },
                   [&](const Enumeration& enumeration) {
                     if (complete_item || !enumeration.complete()) return;
                     complete_item = index;
                     result.distribution_ = evidence::distribution(enumeration);
                     const auto lightest = std::next(result.distribution_->begin());
                     contract(lightest != result.distribution_->end(), "a complete enumeration has words");
                     result.minimum_words_ = lightest->second;
                     raise(lightest->first, index);
                     lower(lightest->first, index);
                   },
               },
               items[index]);
  contract(!result.at_most_ || *result.at_most_ >= result.at_least_, "no word is lighter than a proved lower bound");

  const auto state = [&](Statement::Content content, std::vector<std::uint32_t> evidence) {
    std::ranges::sort(evidence);
    result.statements_.push_back(Statement(std::move(content), std::move(evidence)));
  };
  if (complete_item) {
    state(MinimumDistance{Relation::exactly, result.at_least_}, {*complete_item});
  } else if (result.bounds_meet()) {
    std::vector<std::uint32_t> evidence{*result.upper_item_};
    if (result.lower_item_) evidence.push_back(*result.lower_item_);  // at least 1 needs no item
    state(MinimumDistance{Relation::exactly, result.at_least_}, std::move(evidence));
  } else {
    if (result.lower_item_) state(MinimumDistance{Relation::at_least, result.at_least_}, {*result.lower_item_});
    if (result.upper_item_) state(MinimumDistance{Relation::at_most, *result.at_most_}, {*result.upper_item_});
  }
  if (complete_item && wish.minimum_words)
    state(MinimumWords{result.at_least_, *result.minimum_words_}, {*complete_item});
  if (complete_item && wish.distribution) state(CompleteDistribution{*result.distribution_}, {*complete_item});
  return result;
}

}  // namespace assize::evidence
