// Everything is found by walking orbits: of exponents under multiplication by q, of elements under the p-th power.
//
// A minimal polynomial is the product of (x - c) over a class of conjugates.  That its coefficients lie in GF(p) is a
// theorem, and is checked each time.
#include "field/conjugates.hpp"

#include <algorithm>
#include <numeric>

#include "base/integers.hpp"
#include "field/number_theory.hpp"

namespace assize::field {

std::vector<std::vector<std::uint32_t>> cyclotomic_cosets(std::uint64_t q, std::uint32_t n) {
  contract(n > 0 && std::gcd(q, std::uint64_t{n}) == 1, "cosets are taken modulo a number coprime to q");
  const std::uint64_t factor = q % n;
  std::vector<std::vector<std::uint32_t>> cosets;
  std::vector<bool> seen(n);
  for (std::uint32_t least = 0; least < n; ++least) {
    if (seen[least]) continue;
    std::vector<std::uint32_t>& coset = cosets.emplace_back();
    for (std::uint32_t s = least; !seen[s]; s = static_cast<std::uint32_t>(s * factor % n)) {
      seen[s] = true;
      coset.push_back(s);
    }
  }
  return cosets;
}

std::vector<Element> conjugacy_class(const Field& field, Element a) {
  std::vector<Element> result{a};
  for (Element c = field.power(a, field.characteristic()); c != a; c = field.power(c, field.characteristic()))
    result.push_back(c);
  return result;
}

Polynomial minimal_polynomial(const Field& field, Element a) {
  Polynomial product{1};
  for (const Element c : conjugacy_class(field, a)) {
    const Element minus_c = field.negate(c);
    product.push_back(product.back());
    for (std::size_t i = product.size() - 2; i > 0; --i)
      product[i] = field.add(product[i - 1], field.multiply(minus_c, product[i]));
    product[0] = field.multiply(minus_c, product[0]);
  }
  for (const Element coefficient : product)
    contract(coefficient < field.characteristic(), "a minimal polynomial has coefficients in the prime field");
  return product;
}

std::vector<IrreduciblePolynomial> irreducible_polynomials(const Field& field) {
  contract(field.degree() > 1, "irreducible polynomials are found in an extension field");
  std::vector<IrreduciblePolynomial> result;
  for (const auto& coset : cyclotomic_cosets(field.characteristic(), field.order() - 1)) {
    if (coset.size() != field.degree()) continue;
    const Element root = field.power(field.least_primitive_element(), coset.front());
    result.push_back({minimal_polynomial(field, root), field.order_of(root)});
  }
  std::ranges::sort(result, [](const auto& a, const auto& b) {
    return std::ranges::lexicographical_compare(a.polynomial.rbegin(), a.polynomial.rend(), b.polynomial.rbegin(),
                                                b.polynomial.rend());
  });
  return result;
}

std::uint64_t number_of_irreducible_polynomials(std::uint32_t q, std::uint32_t degree) {
  contract(degree > 0 && power_if_fits(q, degree).has_value(), "polynomials of a degree are counted in 64 bits");
  std::uint64_t plus = 0;
  std::uint64_t minus = 0;
  for (std::uint32_t d = 1; d <= degree; ++d) {
    if (degree % d != 0) continue;
    const int sign = moebius(d);
    if (sign > 0) plus = add_exact(plus, *power_if_fits(q, degree / d));
    if (sign < 0) minus = add_exact(minus, *power_if_fits(q, degree / d));
  }
  return (plus - minus) / degree;
}

}  // namespace assize::field
