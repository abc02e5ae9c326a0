// Field elements as people write them: numbers, polynomials in x, powers of x.
#pragma once
#include <string>
#include <vector>

#include "field/field.hpp"
#include "sheet/description.hpp"
#include "sheet/document.hpp"

namespace assize::sheet {

/// "6", "x^2+x" or "x^5", the latter two in GF(p^m), m > 1, where x is the class of x.  The failure's `where` is empty.
Result<Element> parse_element(std::string_view text, const field::Field& field);

/// An element written as an integer or a string.
Result<Element> read_element(const Node& node, const field::Field& field, const std::string& source,
                             std::string_view name);

/// A list of elements: an array of integers and strings, or one string with blanks between (over GF(2) also without).
Result<Elements> read_elements(const Node& node, const field::Field& field, const std::string& source,
                               std::string_view name);

/// "0 1 ... 7": which element numbers a field has, for messages.
std::string element_range(const field::Field& field);

}  // namespace assize::sheet
