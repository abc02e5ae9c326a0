// Univariate polynomials over a Field: dense coefficients, lowest degree first, no trailing zero (zero is empty).
//
// Everything but trim() takes trimmed polynomials (contract) and gives trimmed ones back.
#pragma once
#include <cstddef>
#include <cstdint>
#include <optional>
#include <string>
#include <utility>
#include <vector>

#include "field/field.hpp"

namespace assize::field {

using Polynomial = std::vector<Element>;

void trim(Polynomial& a) noexcept;                                ///< drops zero leading coefficients
std::optional<std::size_t> degree(const Polynomial& a) noexcept;  ///< nothing for the zero polynomial

Polynomial add(const Field& field, const Polynomial& a, const Polynomial& b);
Polynomial subtract(const Field& field, const Polynomial& a, const Polynomial& b);
Polynomial multiply(const Field& field, const Polynomial& a, const Polynomial& b);
/// Quotient and remainder; the divisor must not be zero (contract).
std::pair<Polynomial, Polynomial> divide(const Field& field, const Polynomial& a, const Polynomial& b);
Polynomial remainder(const Field& field, const Polynomial& a, const Polynomial& b);
/// Monic greatest common divisor; zero only if both are.
Polynomial gcd(const Field& field, Polynomial a, Polynomial b);
Polynomial monic(const Field& field, const Polynomial& a);  ///< zero stays zero
/// a^exponent modulo m, which must not be zero (contract).
Polynomial power_modulo(const Field& field, const Polynomial& a, std::uint64_t exponent, const Polynomial& modulus);
Element evaluate(const Field& field, const Polynomial& a, Element x) noexcept;

/// The monic polynomial of this degree whose other coefficients are the base-q digits of `number`, lowest first.
/// Numbers from 0 to q^degree - 1 count every monic polynomial of the degree once; larger ones break the contract.
Polynomial nth_monic(const Field& field, std::size_t degree, std::uint64_t number);

/// No factor of lower degree.  Rabin's test (M. O. Rabin, SIAM J. Comput. 9, 1980).  False for constants.
bool is_irreducible(const Field& field, const Polynomial& a);
/// The first irreducible polynomial of this degree >= 1 in the order of nth_monic.
Polynomial least_irreducible(const Field& field, std::size_t degree);
/// Monic irreducible factor of least degree, the first in the order of nth_monic; monic(a) if a is irreducible.  By
/// trial division, up to q^(degree / 2) of them.  `a` must not be constant (contract).
Polynomial least_factor(const Field& field, const Polynomial& a);
/// Irreducible, and x generates the multiplicative group of the quotient field.  q^degree at most 2^32 (contract).
bool is_primitive(const Field& field, const Polynomial& a);
/// Smallest e >= 1 with x^e = 1 modulo a, by stepping; nothing if e would exceed `limit`.  Any a with a(0) != 0
/// (contract), whether or not it is irreducible or square-free.
std::optional<std::uint64_t> order_of_x(const Field& field, const Polynomial& a, std::uint64_t limit);

/// "x^3 + 2*x + 1": terms from the top, coefficients as element numbers, 1 left out before x; zero is "0".
std::string to_algebra(const Polynomial& a);

}  // namespace assize::field
