// Generator polynomials in the notations of the trade, each named by the user, never guessed.
//
// A wrong reading of one hexadecimal number is the commonest source of wrong distances, so a bare number is refused
// with all its readings shown side by side.
#pragma once
#include <string>

#include "field/polynomial.hpp"
#include "sheet/document.hpp"

namespace assize::sheet {

struct PolynomialText {
  field::Polynomial coefficients;  ///< lowest first, not zero
  std::string as_written;          ///< "full-hex 0x11021", "exponents [16, 12, 5, 0]"
};

/// Largest degree of a polynomial in a sheet.
inline constexpr std::uint64_t largest_polynomial_degree = 65536;

/// Reads { notation = "...", value = "0x..." [, degree = r] }, { exponents = [...] }, { algebra = "..." },
/// { coefficients = [...] } or { factors = ["...", ...] } over `field`; the hexadecimal notations are for GF(2) only.
Result<PolynomialText> read_polynomial(const Node& node, const field::Field& field, const std::string& source,
                                       std::string_view name);

/// A modulus: as read_polynomial, and also as a plain string in x.
Result<PolynomialText> read_modulus(const Node& node, const field::Field& field, const std::string& source,
                                    std::string_view name);

/// A polynomial over GF(2) written in each hexadecimal notation, one line each, for people.
std::string every_notation(const field::Polynomial& polynomial);

}  // namespace assize::sheet
