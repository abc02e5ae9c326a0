// Which field the words of a description are over.
#include "sheet/description.hpp"

#include "sheet/read_parts.hpp"

namespace assize::sheet {

field::Field family_field(const Family& family, const field::Field& field) {
  if (const auto* justesen = std::get_if<Justesen>(&family); justesen != nullptr && justesen->bits)
    return field::Field::binary();
  if (const auto* concatenated = std::get_if<Concatenated>(&family)) return word_field(*concatenated->inner);
  return field;
}

field::Field word_field(const Description& description) {
  for (const Step& step : description.steps)
    if (std::holds_alternative<BinaryImage>(step.what)) return field::Field::binary();
  return family_field(description.family, description.field);
}

}  // namespace assize::sheet
