// What the readers of the families share; private to this room.
#pragma once
#include "sheet/read_parts.hpp"

namespace assize::sheet {

/// What a family reader works with.
struct Reading {
  TableReader& table;
  const Context& context;
  Description& description;  ///< its field is set; a code made of others sets it
  [[nodiscard]] const field::Field& field() const { return description.field; }
};

Result<Located<Elements>> located_elements(Reading& in, std::string_view key, const field::Field& field,
                                           std::string_view example);
Result<Located<Element>> located_element(Reading& in, std::string_view key, const field::Field& field,
                                         std::string_view example);
Result<Located<std::uint64_t>> codeword_length(Reading& in);

// read_algebraic.cpp
Result<Family> read_bch(Reading& in);
Result<Family> read_quadratic_residue(Reading& in);
// read_quasi_cyclic.cpp
Result<Family> read_quasi_cyclic(Reading& in);
// read_composed.cpp
Result<Family> read_concatenated(Reading& in);
Result<Family> read_pair(Reading& in, Pair::Kind kind);

}  // namespace assize::sheet
