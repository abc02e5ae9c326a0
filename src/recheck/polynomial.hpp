// Polynomials over GF(q), lowest coefficient first, as far as codes made of their multiples need them.
#pragma once
#include <optional>
#include <vector>

#include "recheck/reduction.hpp"

namespace assize::recheck {

using Polynomial = std::vector<Symbol>;

Polynomial multiply(const Field& field, const Polynomial& a, const Polynomial& b);

/// (x^length - 1) / divisor; nothing if the divisor, of degree <= length and with a non-zero last coefficient, does not
/// divide it.
std::optional<Polynomial> circle_quotient(const Field& field, const Polynomial& divisor, std::size_t length);

/// A basis of all multiples of the generator of degree < length: row i is the multiple whose leading coefficients are
/// those of x^(length-1-i) alone.  Position i carries the coefficient of x^(length-1-i).
Matrix polynomial_multiples(const Field& field, const Polynomial& generator, std::size_t length);

}  // namespace assize::recheck
