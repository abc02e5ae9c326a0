// Which field the words of a description are over.
#include "sheet/description.hpp"

#include "sheet/read_parts.hpp"

namespace assize::sheet {

field::Field family_field(const Family& family, const field::Field& field) {
  if (const auto* justesen = std::get_if<Justesen>(&family); justesen != nullptr && justesen->bits)
    return field::Field::binary();
  if (const auto* concatenated = std::get_if<Concatenated>(&family)) return word_field(*concatenated->inner.front());
  if (const auto* pair = std::get_if<Pair>(&family)) return word_field(*pair->first);
  return field;
}

field::Field field_after(const Step& step, const field::Field& before) {
  if (std::holds_alternative<BinaryImage>(step.what)) return field::Field::binary();
  if (const auto* subcode = std::get_if<SubfieldSubcode>(&step.what)) return subcode->field;
  return before;
}

field::Field word_field(const Description& description) {
  field::Field words = family_field(description.family, description.field);
  for (const Step& step : description.steps) words = field_after(step, words);
  return words;
}

}  // namespace assize::sheet
