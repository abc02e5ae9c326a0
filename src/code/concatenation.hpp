// An outer code whose symbols are encoded again: by one inner code, or by one that varies with the position (Justesen).
#pragma once
#include <optional>
#include <vector>

#include "base/result.hpp"
#include "code/coordinates.hpp"
#include "code/linear_code.hpp"
#include "sheet/description.hpp"

namespace assize::code {

/// The parts from which the concatenated code and the theorem about its distance are both made.
struct Concatenation {
  LinearCode outer;
  field::Field inner_field;
  Coordinates coordinates;                      ///< of outer symbols over the inner field
  std::vector<field::Matrix> inner_generators;  ///< one, or one for each outer position; rows: coordinates

  [[nodiscard]] const field::Matrix& inner(std::uint32_t position) const {
    return inner_generators.size() == 1 ? inner_generators.front() : inner_generators[position];
  }
};

/// The parts of a description whose family is `concatenated` or `justesen`; its steps are not looked at.
/// Nothing for other families.
std::optional<Result<Concatenation>> concatenation_parts(const sheet::Description& description);

/// The code of all inner encodings of outer words.
Result<LinearCode> concatenate(const Concatenation& parts, const sheet::Description& in, int line);

}  // namespace assize::code
