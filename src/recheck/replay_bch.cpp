// BCH codes (R. C. Bose, D. K. Ray-Chaudhuri 1960; A. Hocquenghem 1959), given by consecutive powers of a root of
// unity.
//
// Minimal polynomials are found as the first linear relation among the powers of a root, never as products over
// conjugates: the relation of the reduced echelon form has the digits of the coefficients as its entries.
#include <algorithm>
#include <numeric>

#include "recheck/polynomial.hpp"
#include "recheck/replay.hpp"
#include "recheck/root_field.hpp"
#include "recheck/word.hpp"

namespace assize::recheck {
namespace {

constexpr std::uint64_t largest_root_field = std::uint64_t{1} << 32;

/// The least t >= 1 with q^t = 1 modulo n; nothing if q^t is above 2^32.
std::optional<std::size_t> extension_degree(std::uint64_t q, std::uint64_t n) {
  std::uint64_t size = q;
  std::size_t t = 1;
  for (std::uint64_t rest = q % n; rest != 1; rest = rest * q % n) {
    if (size > largest_root_field / q) return std::nullopt;
    size *= q;
    ++t;
  }
  return t;
}

/// Marks i, i q, i q^2, ... modulo n.
void mark_coset(std::vector<bool>& marks, std::uint64_t i, std::uint64_t q) {
  for (; !marks[i]; i = i * q % marks.size()) marks[i] = true;
}

/// GF(q) inside the root field, and what is needed to find minimal polynomials over it.
struct Tower {
  const RootField& roots;
  FieldPtr base;                            ///< GF(p)
  std::vector<RootField::Element> scalars;  ///< 1, x, x^2, ... of GF(q)
  [[nodiscard]] Polynomial minimal_polynomial(const RootField::Element& root, const Brake& brake) const;
};

Polynomial Tower::minimal_polynomial(const RootField::Element& root, const Brake& brake) const {
  const std::size_t m = scalars.size();
  const std::size_t t = roots.degree() / m;
  Matrix powers(roots.degree(), m * (t + 1));  // column m j + a holds the digits of x^a root^j
  RootField::Element power = roots.one();
  for (std::size_t j = 0; j <= t; ++j, power = roots.multiply(power, root))
    for (std::size_t a = 0; a < m; ++a) {
      const RootField::Element element = roots.multiply(scalars[a], power);
      for (std::size_t digit = 0; digit < element.size(); ++digit) powers.row(digit)[m * j + a] = element[digit];
    }
  const Reduced relations = reduce(*base, std::move(powers), brake);
  std::size_t degree = 0;  // root^degree is the first power that depends on those before it
  while (m * degree < relations.pivots.size() && relations.pivots[m * degree] == m * degree) ++degree;
  Polynomial result(degree + 1, 1);
  for (std::size_t j = 0; j < degree; ++j) {
    std::uint32_t number = 0;
    for (std::size_t a = m; a-- > 0;)
      number = number * base->order() + base->negate(relations.generator.row(m * j + a)[m * degree]);
    result[j] = static_cast<Symbol>(number);
  }
  return result;
}

Result<std::vector<Symbol>> read_root_modulus(const std::string& text, const Field& field, std::size_t degree,
                                              const std::string& where) {
  const std::uint32_t p = field.characteristic();
  auto modulus = read_polynomial(text, p, where);
  if (!modulus) return modulus;
  if (modulus->size() != degree + 1 || modulus->back() != 1)
    return Failure{where, "the root modulus must be monic of degree " + std::to_string(degree), ""};
  if (!irreducible(*modulus, p)) return Failure{where, "the root modulus is reducible", ""};
  return modulus;
}

/// The product of the minimal polynomials of beta^i over all i that are not marked in `done`.
Polynomial product_of_rest(const Field& field, const Tower& tower, const RootField::Element& beta,
                           std::vector<bool> done, const Brake& brake) {
  Polynomial product{1};
  for (std::size_t i = 0; i < done.size(); ++i) {
    if (done[i]) continue;
    brake.poll();
    mark_coset(done, i, field.order());
    product = multiply(field, product, tower.minimal_polynomial(tower.roots.power(beta, i), brake));
  }
  return product;
}

}  // namespace

Result<Built> build_bch(Keys& code, const FieldPtr& field, const Brake& brake) {
  const std::uint64_t length = code.integer("codeword_length", 2, max_length);
  const std::uint64_t designed = code.integer("designed_distance", 2, length);
  const std::uint64_t first = code.integer("first_exponent");
  const std::string modulus_text = code.text("root_modulus");
  if (auto end = code.end(); !end) return end.error();
  const std::string at = code.at("root_modulus");
  const std::uint64_t q = field->order();
  if (std::gcd(length, q) != 1)
    return Failure{code.at("codeword_length"), "the length has a factor in common with the order of the field", ""};
  const auto t = extension_degree(q, length);
  if (!t) return Failure{code.at("codeword_length"), "the root field has more than 2^32 elements", ""};

  std::vector<bool> zeros(length, false);
  for (std::uint64_t i = 0; i + 1 < designed; ++i) mark_coset(zeros, (first + i) % length, q);
  const auto degree = static_cast<std::size_t>(std::count(zeros.begin(), zeros.end(), true));
  if (auto fits = matrix_fits(length - degree, length, code.path()); !fits) return fits.error();

  auto modulus = read_root_modulus(modulus_text, *field, *t * field->degree(), at);
  if (!modulus) return modulus.error();
  const RootField roots(field->characteristic(), std::move(*modulus));
  const RootField::Element beta = roots.power(roots.x(), (roots.order() - 1) / length);
  if (roots.multiplicative_order(beta) != length)
    return Failure{at, "X^((q^t - 1)/n) does not have order n = " + std::to_string(length), ""};
  Tower tower{roots, field, {roots.one()}};
  if (field->degree() > 1) {
    auto base = Field::make(field->characteristic(), {}, code.path());
    if (!base) return base.error();
    tower.base = std::move(*base);
    const auto image = roots.least_power_rooting(*field, brake);
    if (!image) return Failure{at, "no power of X is a root of the modulus of the field", ""};
    while (tower.scalars.size() < field->degree())
      tower.scalars.push_back(roots.multiply(tower.scalars.back(), *image));
  }

  // Of the two factors of x^n - 1 the one of lower degree is made, so that the work is bounded by the matrix.
  const bool few_zeros = degree <= length - degree;
  std::vector<bool> done = zeros;
  if (few_zeros) done.flip();
  Polynomial generator = product_of_rest(*field, tower, beta, std::move(done), brake);
  auto cofactor = circle_quotient(*field, generator, length);
  if (!cofactor) return Failure{code.path(), "the minimal polynomials do not divide x^n - 1", ""};
  if (!few_zeros) generator.swap(*cofactor);
  return Built{field, polynomial_multiples(*field, generator, length), {}};
}

}  // namespace assize::recheck
