// Which polynomials are irreducible or primitive, and the order of x modulo any of them.
#include "base/integers.hpp"
#include "field/number_theory.hpp"
#include "field/polynomial.hpp"
#include "field/row.hpp"

namespace assize::field {

namespace {

/// How many monic polynomials of this degree there are.
std::uint64_t number_of_monics(const Field& field, std::size_t degree) {
  const auto count = power_if_fits(field.order(), degree);
  contract(count.has_value(), "the monic polynomials of a degree can be counted in 64 bits");
  return *count;
}

}  // namespace

Polynomial nth_monic(const Field& field, std::size_t degree, std::uint64_t number) {
  Polynomial result(degree + 1);
  for (std::size_t i = 0; i < degree; ++i) {
    result[i] = static_cast<Element>(number % field.order());
    number /= field.order();
  }
  contract(number == 0, "the number of a monic polynomial is below q^degree");
  result[degree] = 1;
  return result;
}

bool is_irreducible(const Field& field, const Polynomial& a) {
  const auto n = degree(a);
  if (!n || *n == 0) return false;
  if (*n == 1) return true;
  // frobenius[i] = x^(q^i) modulo a
  const Polynomial x{0, 1};
  std::vector<Polynomial> frobenius{x};
  for (std::size_t i = 1; i <= *n; ++i) frobenius.push_back(power_modulo(field, frobenius.back(), field.order(), a));
  if (frobenius[*n] != x) return false;
  for (const std::uint64_t prime : prime_factors(*n)) {
    const Polynomial difference = subtract(field, frobenius[*n / prime], x);
    if (degree(gcd(field, a, difference)) != std::size_t{0}) return false;
  }
  return true;
}

Polynomial least_irreducible(const Field& field, std::size_t degree) {
  contract(degree >= 1, "an irreducible polynomial has a positive degree");
  for (std::uint64_t number = 0;; ++number) {
    Polynomial candidate = nth_monic(field, degree, number);
    if (is_irreducible(field, candidate)) return candidate;
  }
}

Polynomial least_factor(const Field& field, const Polynomial& a) {
  const auto n = degree(a);
  contract(n.has_value() && *n >= 1, "only a polynomial of positive degree is factored");
  for (std::size_t d = 1; d <= *n / 2; ++d) {
    const std::uint64_t count = number_of_monics(field, d);
    for (std::uint64_t number = 0; number < count; ++number) {
      Polynomial candidate = nth_monic(field, d, number);
      if (remainder(field, a, candidate).empty()) return candidate;
    }
  }
  return monic(field, a);
}

bool is_primitive(const Field& field, const Polynomial& a) {
  if (!is_irreducible(field, a) || a.front() == 0) return false;
  const std::uint64_t group_order = number_of_monics(field, *degree(a)) - 1;
  contract(group_order >> 32U == 0, "primitivity is asked of polynomials with q^degree at most 2^32");
  for (const std::uint64_t prime : prime_factors(group_order))
    if (power_modulo(field, {0, 1}, group_order / prime, a) == Polynomial{1}) return false;
  return true;
}

std::optional<std::uint64_t> order_of_x(const Field& field, const Polynomial& a, std::uint64_t limit) {
  const auto n = degree(a);
  contract(n.has_value() && a.front() != 0, "x has an order only modulo a polynomial with a constant term");
  if (limit == 0) return std::nullopt;
  if (*n == 0) return 1;  // modulo a unit everything is 1
  Polynomial x_power_n(a.begin(), a.end() - 1);
  scale(field, x_power_n, field.negate(field.inverse(a.back())));
  Polynomial one(*n);
  one[0] = 1;
  Polynomial power = one;
  for (std::uint64_t e = 1; e <= limit; ++e) {
    const Element top = power.back();
    power.insert(power.begin(), 0);
    power.pop_back();
    add_multiple(field, power, top, x_power_n);
    if (power == one) return e;
  }
  return std::nullopt;
}

}  // namespace assize::field
