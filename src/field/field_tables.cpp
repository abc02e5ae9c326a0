// How the tables of a Field come about.
//
// Before there are logarithms, elements are multiplied as polynomials: Horner's scheme over the digits of one factor,
// reducing by x^m = -(lower terms of the modulus) at each step.  That finds the least primitive element, whose powers
// then fill the tables.
#include <utility>

#include "field/field.hpp"
#include "field/number_theory.hpp"

namespace assize::field {

namespace {

/// Arithmetic by the definition, slow and without tables except for the sums of odd extension fields.
class Schoolbook {
 public:
  Schoolbook(std::uint32_t p, std::uint32_t m, std::span<const Element> modulus) : p_(p), m_(m) {
    for (std::uint32_t i = 1; i < m; ++i) top_place_ *= p;
    order_ = top_place_ * p;
    if (m > 1 && p > 2) fill_sums();
    for (std::size_t i = m; m > 1 && i-- > 0;) x_power_m_ = x_power_m_ * p + (p - modulus[i]) % p;
  }

  [[nodiscard]] std::uint32_t order() const { return order_; }
  std::vector<Element>&& take_sums() { return std::move(sum_); }

  [[nodiscard]] std::uint32_t multiply(std::uint32_t a, std::uint32_t b) const {
    if (m_ == 1) return static_cast<std::uint32_t>(std::uint64_t{a} * b % p_);
    std::uint32_t place = 1;
    while (place <= b / p_) place *= p_;
    std::uint32_t product = 0;
    for (; place != 0; place /= p_) product = add(times_x(product), times_digit(b / place % p_, a));
    return product;
  }

  [[nodiscard]] std::uint32_t power(std::uint32_t a, std::uint64_t exponent) const {
    std::uint32_t result = 1;
    for (; exponent != 0; exponent >>= 1U) {
      if ((exponent & 1U) != 0) result = multiply(result, a);
      a = multiply(a, a);
    }
    return result;
  }

 private:
  void fill_sums() {
    sum_.resize(std::size_t{order_} * order_);
    for (std::uint32_t a = 0; a < order_; ++a)
      for (std::uint32_t b = 0; b < order_; ++b) {
        const std::uint32_t upper = a + b == 0 ? 0 : add(a / p_, b / p_);  // an earlier entry
        sum_[std::size_t{a} * order_ + b] = static_cast<Element>(upper * p_ + (a % p_ + b % p_) % p_);
      }
  }

  [[nodiscard]] std::uint32_t add(std::uint32_t a, std::uint32_t b) const {
    return p_ == 2 ? a ^ b : sum_[std::size_t{a} * order_ + b];
  }

  [[nodiscard]] std::uint32_t times_digit(std::uint32_t digit, std::uint32_t a) const {
    std::uint32_t result = 0;
    for (; digit != 0; --digit) result = add(result, a);
    return result;
  }

  [[nodiscard]] std::uint32_t times_x(std::uint32_t a) const {
    return add(a % top_place_ * p_, times_digit(a / top_place_, x_power_m_));
  }

  std::uint32_t p_;
  std::uint32_t m_;
  std::uint32_t top_place_ = 1;  ///< p^(m-1), the number of x^(m-1)
  std::uint32_t order_ = 0;
  std::uint32_t x_power_m_ = 0;  ///< x^m reduced
  std::vector<Element> sum_;
};

/// The least element whose order is q-1 and not a proper divisor of it.
std::uint32_t find_least_primitive(const Schoolbook& arithmetic) {
  const std::uint32_t group_order = arithmetic.order() - 1;
  const std::vector<std::uint64_t> primes = prime_factors(group_order);
  for (std::uint32_t candidate = 1; candidate <= group_order; ++candidate) {
    bool generates = true;
    for (const std::uint64_t prime : primes)
      generates = generates && arithmetic.power(candidate, group_order / prime) != 1;
    if (generates) return candidate;
  }
  broken_contract("a finite field has a primitive element", std::source_location::current());
}

}  // namespace

Field Field::from_checked(std::uint32_t p, std::uint32_t m, std::span<const Element> modulus) {
  Schoolbook arithmetic(p, m, modulus);
  const std::uint32_t q = arithmetic.order();
  const std::uint32_t group_order = q - 1;
  const std::uint32_t base = find_least_primitive(arithmetic);

  Tables t;
  t.order = q;
  t.characteristic = p;
  t.degree = m;
  t.least_primitive = static_cast<Element>(base);
  t.modulus.assign(modulus.begin(), modulus.end());
  t.logarithm.resize(q);
  t.antilog.resize(2 * std::size_t{group_order});
  t.inverse.resize(q);
  std::uint32_t power = 1;
  for (std::uint32_t e = 0; e < group_order; ++e) {
    t.logarithm[power] = static_cast<Element>(e);
    t.antilog[e] = t.antilog[e + group_order] = static_cast<Element>(power);
    power = arithmetic.multiply(power, base);
  }
  contract(power == 1, "the powers of a primitive element return to 1 after q-1 steps");
  for (std::uint32_t e = 0; e < group_order; ++e) t.inverse[t.antilog[e]] = t.antilog[group_order - e];

  t.sum = arithmetic.take_sums();
  if (!t.sum.empty()) {
    t.negative.resize(q);
    for (std::uint32_t a = 0; a < q; ++a)
      for (std::uint32_t b = 0; b < q; ++b)
        if (t.sum[std::size_t{a} * q + b] == 0) t.negative[a] = static_cast<Element>(b);
  }
  return Field(std::make_shared<const Tables>(std::move(t)));
}

}  // namespace assize::field
