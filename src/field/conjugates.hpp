// Conjugate elements, their minimal polynomials, and the cosets of exponents behind them.
//
// The conjugates of a in GF(p^m) are a, a^p, a^(p^2), ...: the roots of one irreducible polynomial over GF(p).  Written
// as powers of a primitive element, their exponents are a cyclotomic coset modulo p^m - 1.
#pragma once
#include <cstdint>
#include <vector>

#include "field/field.hpp"
#include "field/polynomial.hpp"

namespace assize::field {

/// The integers modulo n, parted into the orbits of multiplication by q: each is s, s*q, s*q^2, ... from its least
/// member s on, and they come in ascending order of s.  n > 0 and gcd(q, n) = 1 (contract).
std::vector<std::vector<std::uint32_t>> cyclotomic_cosets(std::uint64_t q, std::uint32_t n);

/// a, a^p, a^(p^2), ..., each once.
std::vector<Element> conjugacy_class(const Field& field, Element a);

/// The monic polynomial of least degree over GF(p) that has the root a.
Polynomial minimal_polynomial(const Field& field, Element a);

/// A monic irreducible polynomial and the order of x modulo it.
struct IrreduciblePolynomial {
  Polynomial polynomial;
  std::uint32_t order = 0;
};

/// All monic irreducible polynomials of degree m over GF(p), in the order of nth_monic, as minimal polynomials of
/// elements of a GF(p^m), m > 1 (contract); they are the same for every modulus.
std::vector<IrreduciblePolynomial> irreducible_polynomials(const Field& field);

/// How many they are over GF(q), q^degree below 2^64 (contract): (1/m) sum over d | m of moebius(d) q^(m/d)
/// (R. Lidl, H. Niederreiter, Finite Fields, theorem 3.25).
std::uint64_t number_of_irreducible_polynomials(std::uint32_t q, std::uint32_t degree);

}  // namespace assize::field
