// Arithmetic of the root field by the definition; orders of elements by the factors of the group's order.
#include "recheck/root_field.hpp"

#include <algorithm>
#include <array>
#include <numeric>

#include "recheck/numbers.hpp"

namespace assize::recheck {

RootField::RootField(std::uint32_t p, std::vector<Symbol> modulus) : p_(p), modulus_(std::move(modulus)) {
  for (std::size_t i = 0; i < degree(); ++i) order_ *= p_;
}

RootField::Element RootField::one() const {
  Element element(degree(), 0);
  element[0] = 1;
  return element;
}

RootField::Element RootField::x() const {
  Element element(degree(), 0);
  if (degree() > 1)
    element[1] = 1;
  else
    element[0] = static_cast<Symbol>((p_ - modulus_[0]) % p_);
  return element;
}

RootField::Element RootField::multiply(const Element& a, const Element& b) const {
  const std::size_t d = degree();
  std::array<std::uint64_t, 64> product{};  // every sum has less than 2^7 terms below 2^32
  for (std::size_t i = 0; i < d; ++i)
    for (std::size_t j = 0; j < d; ++j) product[i + j] += std::uint64_t{a[i]} * b[j];
  for (std::size_t top = 2 * d - 1; top-- > d;) {  // X^top = -(lower part of the modulus) X^(top-d)
    const std::uint64_t lead = product[top] % p_;
    if (lead == 0) continue;
    for (std::size_t j = 0; j < d; ++j) product[top - d + j] += (p_ - lead) * modulus_[j];
  }
  Element result(d);
  for (std::size_t i = 0; i < d; ++i) result[i] = static_cast<Symbol>(product[i] % p_);
  return result;
}

RootField::Element RootField::power(const Element& a, std::uint64_t exponent) const {
  Element result = one();
  Element square = a;
  for (; exponent != 0; exponent >>= 1) {
    if ((exponent & 1) != 0) result = multiply(result, square);
    square = multiply(square, square);
  }
  return result;
}

std::uint64_t RootField::multiplicative_order(const Element& a) const {
  if (std::all_of(a.begin(), a.end(), [](Symbol digit) { return digit == 0; })) return 0;
  std::uint64_t order = order_ - 1;
  for (const std::uint64_t factor : prime_factors(order_ - 1))
    while (order % factor == 0 && power(a, order / factor) == one()) order /= factor;
  return order;
}

std::optional<RootField::Element> RootField::least_power_rooting(const Field& small, const Brake& brake) const {
  const std::uint64_t cycle = multiplicative_order(x());
  if (cycle == 0) return std::nullopt;
  // X^e lies in GF(q) exactly if e is a multiple of this stride; roots lie nowhere else.
  const std::uint64_t inside = std::gcd(cycle, std::uint64_t{small.order()} - 1);
  const Element stride = power(x(), cycle / inside);
  const std::vector<Symbol>& modulus = small.modulus();
  Element candidate = one();
  for (std::uint64_t i = 0; i < inside; ++i, candidate = multiply(candidate, stride)) {
    brake.poll();
    Element value(degree(), 0);
    for (std::size_t c = modulus.size(); c-- > 0;) {  // Horner; the coefficients lie in GF(p)
      value = multiply(value, candidate);
      value[0] = static_cast<Symbol>((value[0] + std::uint64_t{modulus[c]}) % p_);
    }
    if (std::all_of(value.begin(), value.end(), [](Symbol digit) { return digit == 0; })) return candidate;
  }
  return std::nullopt;
}

}  // namespace assize::recheck
