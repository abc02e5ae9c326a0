// A word of the code: its symbols at the pivots are its message, so one encoding decides whether it belongs.
#include <algorithm>

#include "recheck/evidence.hpp"
#include "recheck/word.hpp"

namespace assize::recheck {

Result<void> check_witness(Keys& keys, const Subject& subject, Item& item) {
  const std::uint64_t weight = keys.integer("weight", 1);
  const std::string text = keys.text("word");
  if (auto end = keys.end(); !end) return end.error();
  const Field& field = *subject.code.field;
  const auto word = read_word(text, field.order(), keys.at("word"));
  if (!word) return word.error();
  if (word->size() != subject.length()) return Failure{keys.at("word"), "the word does not have the code's length", ""};

  std::vector<Symbol> encoded(word->size(), 0);
  const Reduced& code = subject.code.reduced;
  for (std::size_t r = 0; r < code.pivots.size(); ++r)
    add_multiple(field, encoded, (*word)[code.pivots[r]], code.generator.row(r));
  if (encoded != *word) return Failure{keys.at("word"), "the word does not belong to the code", ""};
  const auto zeros = static_cast<std::uint64_t>(std::count(word->begin(), word->end(), Symbol{0}));
  if (word->size() - zeros != weight)
    return Failure{keys.at("weight"), "the word has weight " + std::to_string(word->size() - zeros), ""};
  item.at_most = weight;
  item.done = "a word of weight " + std::to_string(weight) + " belongs to the code";
  return {};
}

}  // namespace assize::recheck
