// What the tests of the field room share: reproducible chance, and fields to be had without stating a modulus.
#pragma once
#include <gtest/gtest.h>

#include <cstdint>
#include <iostream>
#include <random>
#include <string>
#include <vector>

#include "field/field.hpp"
#include "field/matrix.hpp"
#include "field/number_theory.hpp"
#include "field/polynomial.hpp"

namespace assize::field::testing {

/// A fixed seed, printed, and integers below a bound made the same way on every platform.
class Chance {
 public:
  explicit Chance(std::uint64_t seed) : engine_(seed) { std::cout << "[ seed     ] " << seed << '\n'; }
  std::uint64_t below(std::uint64_t bound) { return engine_() % bound; }
  Element element(const Field& field) { return static_cast<Element>(below(field.order())); }
  Element nonzero(const Field& field) { return static_cast<Element>(1 + below(field.order() - 1)); }
  /// Any polynomial with at most this many coefficients.
  Polynomial polynomial(const Field& field, std::size_t most) {
    Polynomial result(below(most + 1));
    for (Element& coefficient : result) coefficient = element(field);
    trim(result);
    return result;
  }
  /// A matrix of rank at most `rank`: the product of two random ones.
  Matrix matrix(const Field& field, std::size_t rows, std::size_t columns, std::size_t rank) {
    Matrix left(rows, rank);
    Matrix right(rank, columns);
    for (std::size_t i = 0; i < rows; ++i)
      for (Element& element_of_row : left.row(i)) element_of_row = element(field);
    for (std::size_t i = 0; i < rank; ++i)
      for (Element& element_of_row : right.row(i)) element_of_row = element(field);
    return multiply(field, left, right);
  }

 private:
  std::mt19937_64 engine_;
};

/// GF(p), for p known to be prime.
inline Field prime_field(std::uint32_t p) { return Field::prime(p).value(); }

/// GF(q) with the first irreducible modulus that the polynomial code finds.
inline Field some_field(std::uint32_t q) {
  const PrimePower power = as_prime_power(q).value();
  if (power.exponent == 1) return prime_field(q);
  return Field::create(q, least_irreducible(prime_field(power.prime), power.exponent)).value();
}

/// GF(q) over every monic irreducible modulus.
inline std::vector<Field> all_fields(std::uint32_t q) {
  const PrimePower power = as_prime_power(q).value();
  const Field ground = prime_field(power.prime);
  std::vector<Field> result;
  for (std::uint32_t number = 0; number < q; ++number) {
    const Polynomial modulus = nth_monic(ground, power.exponent, number);
    if (is_irreducible(ground, modulus)) result.push_back(Field::create(q, modulus).value());
  }
  return result;
}

/// a * b by polynomial multiplication and division over the prime field, as the definition of the field has it.
inline Element product_by_definition(const Field& field, const Field& ground, Element a, Element b) {
  if (field.degree() == 1) return static_cast<Element>(std::uint64_t{a} * b % field.order());
  Polynomial first = field.digits(a);
  Polynomial second = field.digits(b);
  trim(first);
  trim(second);
  const Polynomial modulus(field.modulus().begin(), field.modulus().end());
  return field.from_digits(remainder(ground, multiply(ground, first, second), modulus));
}

/// "GF(9) modulo x^2 + 1"
inline std::string describe(const Field& field) {
  std::string text = "GF(" + std::to_string(field.order()) + ")";
  if (field.degree() > 1) text += " modulo " + to_algebra({field.modulus().begin(), field.modulus().end()});
  return text;
}

}  // namespace assize::field::testing

namespace assize::field {

/// How GoogleTest spells a Field.
inline void PrintTo(const Field& field, std::ostream* out) { *out << testing::describe(field); }

}  // namespace assize::field
