// Quadratic residue codes: the generator is recorded and every property that defines it is verified.
//
// The zeros of a divisor g of x^p - 1 with g(1) != 0, of degree (p-1)/2, are the residues or the non-residues exactly
// if they are closed under multiplication of their exponents by one generator r of the group of squares: g divides
// g(x^r).
#include <algorithm>

#include "recheck/numbers.hpp"
#include "recheck/polynomial.hpp"
#include "recheck/replay.hpp"
#include "recheck/word.hpp"

namespace assize::recheck {
namespace {

bool is_square_modulo(std::uint64_t number, std::uint64_t p) {
  for (std::uint64_t root = 1; root < p; ++root)
    if (root * root % p == number % p) return true;
  return false;
}

/// A number whose powers modulo p are all (p-1)/2 non-zero squares.
std::uint64_t generator_of_squares(std::uint64_t p) {
  for (std::uint64_t root = 1;; ++root) {
    const std::uint64_t square = root * root % p;
    std::uint64_t order = 1;
    for (std::uint64_t power = square; power != 1; power = power * square % p) ++order;
    if (order == (p - 1) / 2) return square;
  }
}

/// The polynomial of degree < p, modulo the monic g, is zero.
bool is_multiple(const Field& field, Polynomial dividend, const Polynomial& g) {
  for (std::size_t shift = dividend.size() - g.size() + 1; shift-- > 0;)
    add_multiple(field, std::span(dividend).subspan(shift, g.size()), field.negate(dividend[shift + g.size() - 1]), g);
  return std::all_of(dividend.begin(), dividend.end(), [](Symbol symbol) { return symbol == 0; });
}

Result<void> check_generator(const Field& field, const Polynomial& g, std::uint64_t p, const std::string& where) {
  if (g.size() != (p - 1) / 2 + 1 || g.back() != 1)
    return Failure{where, "the generator must be monic of degree (p-1)/2", ""};
  const auto cofactor = circle_quotient(field, g, p);
  if (!cofactor) return Failure{where, "the generator does not divide x^p - 1", ""};
  Symbol at_one = 0;
  for (const Symbol coefficient : g) at_one = field.add(at_one, coefficient);
  if (at_one == 0) return Failure{where, "the generator is divisible by x - 1", ""};
  const std::uint64_t r = generator_of_squares(p);
  Polynomial moved(p, 0);  // g(x^r) modulo x^p - 1
  for (std::size_t i = 0; i < g.size(); ++i) moved[i * r % p] = g[i];
  if (!is_multiple(field, std::move(moved), g))
    return Failure{where, "the zeros of the generator are neither the residues nor the non-residues", ""};
  // cofactor = (x - 1) other: divided from the top.
  Polynomial other(g.size(), 0);
  Symbol carried = 0;
  for (std::size_t i = g.size(); i-- > 0;) other[i] = carried = field.add(carried, (*cofactor)[i + 1]);
  if (std::lexicographical_compare(other.rbegin(), other.rend(), g.rbegin(), g.rend()))
    return Failure{where, "the generator is the greater of the two", ""};
  return {};
}

}  // namespace

Result<Built> build_quadratic_residue(Keys& code, const FieldPtr& field) {
  const std::uint64_t p = code.integer("prime", 3, max_length);
  const std::string text = code.text("generator");
  if (auto end = code.end(); !end) return end.error();
  if (field->order() > 4) return Failure{code.path(), "a quadratic residue code is over GF(2), GF(3) or GF(4)", ""};
  const std::string at = code.at("prime");
  if (p == 2 || !is_prime(p)) return Failure{at, "an odd prime is expected here", ""};
  if (p == field->characteristic()) return Failure{at, "the prime is the characteristic of the field", ""};
  if (!is_square_modulo(field->order(), p)) return Failure{at, "the order of the field is not a square modulo p", ""};
  if (auto fits = matrix_fits((p + 1) / 2, p, code.path()); !fits) return fits.error();
  const auto generator = read_polynomial(text, field->order(), code.at("generator"));
  if (!generator) return generator.error();
  if (auto right = check_generator(*field, *generator, p, code.at("generator")); !right) return right.error();
  return Built{field, polynomial_multiples(*field, *generator, p), {}};
}

}  // namespace assize::recheck
