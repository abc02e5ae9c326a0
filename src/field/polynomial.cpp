// Polynomial arithmetic by the schoolbook, row by row: degrees here are those of moduli and generator polynomials.
#include "field/polynomial.hpp"

#include <algorithm>

#include "field/row.hpp"

namespace assize::field {

namespace {

/// Leaves a modulo b in `a`; writes the quotient where one is wanted.
void reduce_by(const Field& field, Polynomial& a, const Polynomial& b, Polynomial* quotient) {
  const auto divisor_degree = degree(b);
  contract(divisor_degree.has_value(), "a polynomial is not divided by zero");
  if (quotient != nullptr) quotient->assign(a.size() < b.size() ? 0 : a.size() - b.size() + 1, 0);
  const Element lead_inverse = field.inverse(b.back());
  for (std::size_t top = a.size(); top >= b.size(); --top) {
    const std::size_t shift = top - b.size();
    const Element factor = field.multiply(a[top - 1], lead_inverse);
    add_multiple(field, std::span(a).subspan(shift, b.size()), field.negate(factor), b);
    if (quotient != nullptr) (*quotient)[shift] = factor;
  }
  trim(a);
}

}  // namespace

void trim(Polynomial& a) noexcept {
  while (!a.empty() && a.back() == 0) a.pop_back();
}

std::optional<std::size_t> degree(const Polynomial& a) noexcept {
  if (a.empty()) return std::nullopt;
  contract(a.back() != 0, "a polynomial has no zero leading coefficient");
  return a.size() - 1;
}

Polynomial add(const Field& field, const Polynomial& a, const Polynomial& b) {
  Polynomial sum = a;
  sum.resize(std::max(a.size(), b.size()));
  add_multiple(field, std::span(sum).first(b.size()), 1, b);
  trim(sum);
  return sum;
}

Polynomial subtract(const Field& field, const Polynomial& a, const Polynomial& b) {
  Polynomial difference = a;
  difference.resize(std::max(a.size(), b.size()));
  add_multiple(field, std::span(difference).first(b.size()), field.negate(1), b);
  trim(difference);
  return difference;
}

Polynomial multiply(const Field& field, const Polynomial& a, const Polynomial& b) {
  if (!degree(a) || !degree(b)) return {};
  Polynomial product(a.size() + b.size() - 1);
  for (std::size_t i = 0; i < a.size(); ++i) add_multiple(field, std::span(product).subspan(i, b.size()), a[i], b);
  return product;
}

std::pair<Polynomial, Polynomial> divide(const Field& field, const Polynomial& a, const Polynomial& b) {
  Polynomial quotient;
  Polynomial rest = a;
  reduce_by(field, rest, b, &quotient);
  trim(quotient);
  return {std::move(quotient), std::move(rest)};
}

Polynomial remainder(const Field& field, const Polynomial& a, const Polynomial& b) {
  Polynomial rest = a;
  reduce_by(field, rest, b, nullptr);
  return rest;
}

Polynomial gcd(const Field& field, Polynomial a, Polynomial b) {
  while (!b.empty()) {
    reduce_by(field, a, b, nullptr);
    a.swap(b);
  }
  return monic(field, a);
}

Polynomial monic(const Field& field, const Polynomial& a) {
  if (!degree(a)) return {};
  Polynomial result = a;
  scale(field, result, field.inverse(a.back()));
  return result;
}

Polynomial power_modulo(const Field& field, const Polynomial& a, std::uint64_t exponent, const Polynomial& modulus) {
  Polynomial square = remainder(field, a, modulus);
  Polynomial result = remainder(field, {1}, modulus);
  while (true) {
    if ((exponent & 1U) != 0) result = remainder(field, multiply(field, result, square), modulus);
    exponent >>= 1U;
    if (exponent == 0) return result;
    square = remainder(field, multiply(field, square, square), modulus);
  }
}

Element evaluate(const Field& field, const Polynomial& a, Element x) noexcept {
  Element value = 0;
  for (std::size_t i = a.size(); i-- > 0;) value = field.add(field.multiply(value, x), a[i]);
  return value;
}

std::string to_algebra(const Polynomial& a) {
  std::string text;
  for (std::size_t i = a.size(); i-- > 0;) {
    if (a[i] == 0) continue;
    if (!text.empty()) text += " + ";
    if (i == 0 || a[i] != 1) text += std::to_string(a[i]);
    if (i > 0 && a[i] != 1) text += '*';
    if (i > 0) text += 'x';
    if (i > 1) text += '^' + std::to_string(i);
  }
  return text.empty() ? "0" : text;
}

}  // namespace assize::field
