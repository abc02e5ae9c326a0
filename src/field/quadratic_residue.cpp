// No root field is needed: the sum of x^r over the residues r, or the Gauss sum for GF(3), takes a known value t in the
// field itself at the zeros of one factor, so the factor is gcd(x^p - 1, that sum - t).
#include "field/quadratic_residue.hpp"

#include <algorithm>

#include "field/number_theory.hpp"

namespace assize::field {

namespace {

std::vector<bool> residues(std::uint32_t p) {
  std::vector<bool> out(p, false);
  for (std::uint64_t i = 1; i < p; ++i) out[i * i % p] = true;
  return out;
}

/// gcd with x^p - 1, without the factor x - 1.
Polynomial factor_at(const Field& field, const Polynomial& unity, Polynomial sum, Element value) {
  sum[0] = field.subtract(sum[0], value);
  trim(sum);
  if (sum.empty()) return {};
  Polynomial factor = gcd(field, unity, sum);
  while (factor.size() > 1 && evaluate(field, factor, 1) == 0)
    factor = divide(field, factor, {field.negate(1), 1}).first;
  return factor;
}

}  // namespace

std::optional<Polynomial> quadratic_residue_generator(const Field& field, std::uint32_t p) {
  const std::uint32_t q = field.order();
  contract(q >= 2 && q <= 4 && is_prime(p) && p > 2 && p % field.characteristic() != 0,
           "a quadratic residue code exists");
  const std::vector<bool> square = residues(p);
  if (!square[q % p]) return std::nullopt;
  Polynomial unity(p + 1, 0);
  unity[p] = 1;
  unity[0] = field.negate(1);
  Polynomial sum(p, 0);
  std::vector<Element> values;
  if (q == 3) {
    for (std::uint32_t i = 1; i < p; ++i) sum[i] = square[i] ? 1 : 2;
    values = {1, 2};
  } else {
    for (std::uint32_t i = 1; i < p; ++i) sum[i] = square[i] ? 1 : 0;
    // t^2 + t + (1 - p*)/4 = 0, p* = (-1)^((p-1)/2) p.
    const std::uint32_t quarter = p % 4 == 1 ? (p - 1) / 4 : (p + 1) / 4;
    const auto constant = static_cast<Element>(quarter % 2);
    for (std::uint32_t t = 0; t < q; ++t) {
      const auto e = static_cast<Element>(t);
      if (field.add(field.add(field.multiply(e, e), e), constant) == 0) values.push_back(e);
    }
  }
  std::optional<Polynomial> least;
  for (const Element value : values) {
    Polynomial factor = factor_at(field, unity, sum, value);
    contract(factor.size() == (p - 1) / 2 + 1, "the factors of a quadratic residue code have degree (p-1)/2");
    if (!least || std::lexicographical_compare(factor.rbegin(), factor.rend(), least->rbegin(), least->rend()))
      least = std::move(factor);
  }
  contract(least.has_value(), "one of the values is taken");
  return least;
}

}  // namespace assize::field
