// Polynomials: algebra on random ones, and irreducible and primitive ones counted against the published formulas.
#include <algorithm>
#include <initializer_list>

#include "base/integers.hpp"
#include "field_support.hpp"

namespace assize::field::testing {
namespace {

Polynomial from_exponents(std::initializer_list<std::size_t> exponents) {
  Polynomial result(*exponents.begin() + 1);
  for (const std::size_t exponent : exponents) result[exponent] = 1;
  return result;
}

std::uint64_t monics(const Field& field, std::size_t degree) { return power_if_fits(field.order(), degree).value(); }

/// The Moebius function.
int moebius(std::uint64_t n) {
  int sign = 1;
  for (const std::uint64_t prime : prime_factors(n)) {
    if (n % (prime * prime) == 0) return 0;
    sign = -sign;
  }
  return sign;
}

struct Range {
  std::uint32_t order;
  std::size_t largest_degree;
};
constexpr Range counted[] = {{2, 10}, {3, 5}, {4, 4}, {5, 3}, {7, 3}, {8, 3}, {9, 2}};

// R. Lidl, H. Niederreiter, Finite Fields, theorem 3.25: (1/m) sum over d | m of moebius(d) q^(m/d).
TEST(Polynomials, IrreducibleOnesAreAsManyAsTheNecklaceFormulaSays) {
  for (const auto& [q, largest_degree] : counted) {
    const Field field = some_field(q);
    for (std::size_t m = 1; m <= largest_degree; ++m) {
      std::int64_t expected = 0;
      for (std::size_t d = 1; d <= m; ++d)
        if (m % d == 0) expected += moebius(d) * static_cast<std::int64_t>(monics(field, m / d));
      std::int64_t found = 0;
      for (std::uint64_t number = 0; number < monics(field, m); ++number)
        found += is_irreducible(field, nth_monic(field, m, number)) ? 1 : 0;
      EXPECT_EQ(found * static_cast<std::int64_t>(m), expected) << "degree " << m << " over " << describe(field);
    }
  }
}

// R. Lidl, H. Niederreiter, Finite Fields, theorem 3.5 with e = q^m - 1: phi(q^m - 1) / m of them.
TEST(Polynomials, PrimitiveOnesAreAsManyAsPhiSays) {
  for (const auto& [q, largest_degree] : counted) {
    const Field field = some_field(q);
    for (std::size_t m = 1; m <= largest_degree; ++m) {
      std::uint64_t found = 0;
      for (std::uint64_t number = 0; number < monics(field, m); ++number)
        found += is_primitive(field, nth_monic(field, m, number)) ? 1U : 0U;
      EXPECT_EQ(found * m, euler_phi(monics(field, m) - 1)) << "degree " << m << " over " << describe(field);
    }
  }
}

// Independent computation: trial division instead of Rabin's test, stepping instead of powers.
TEST(Polynomials, IrreducibleAndPrimitiveAgreeWithTrialDivisionAndStepping) {
  for (const auto& [q, largest_degree] : counted) {
    const Field field = some_field(q);
    for (std::size_t m = 1; m <= std::min<std::size_t>(largest_degree, 8); ++m)
      for (std::uint64_t number = 0; number < monics(field, m); ++number) {
        const Polynomial a = nth_monic(field, m, number);
        const Polynomial factor = least_factor(field, a);
        const bool irreducible = is_irreducible(field, a);
        ASSERT_EQ(factor == a, irreducible) << to_algebra(a);
        ASSERT_TRUE(is_irreducible(field, factor) && remainder(field, a, factor).empty()) << to_algebra(a);
        if (!irreducible || a.front() == 0) continue;
        const std::uint64_t group_order = monics(field, m) - 1;
        const auto order = order_of_x(field, a, group_order);
        ASSERT_TRUE(order.has_value() && group_order % *order == 0);
        ASSERT_EQ(is_primitive(field, a), *order == group_order) << to_algebra(a);
      }
  }
}

// S. Lin, D. J. Costello, Error Control Coding, table of primitive polynomials over GF(2).
TEST(Polynomials, TabulatedPrimitiveOnes) {
  for (const auto& a :
       {from_exponents({3, 1, 0}), from_exponents({4, 1, 0}), from_exponents({5, 2, 0}), from_exponents({6, 1, 0}),
        from_exponents({7, 3, 0}), from_exponents({8, 4, 3, 2, 0}), from_exponents({9, 4, 0}),
        from_exponents({10, 3, 0}), from_exponents({11, 2, 0}), from_exponents({12, 6, 4, 1, 0}),
        from_exponents({13, 4, 3, 1, 0}), from_exponents({14, 10, 6, 1, 0}), from_exponents({15, 1, 0}),
        from_exponents({16, 12, 3, 1, 0})})
    EXPECT_TRUE(is_primitive(Field::binary(), a)) << to_algebra(a);
}

// FIPS 197, Advanced Encryption Standard, section 4.2: x^8 + x^4 + x^3 + x + 1 is irreducible.  That x has order 51
// modulo it, so that it is not primitive: independent computation.
TEST(Polynomials, TheAesPolynomialIsIrreducibleButNotPrimitive) {
  const Polynomial aes = from_exponents({8, 4, 3, 1, 0});
  EXPECT_TRUE(is_irreducible(Field::binary(), aes));
  EXPECT_FALSE(is_primitive(Field::binary(), aes));
  EXPECT_EQ(order_of_x(Field::binary(), aes, 255), 51U);
  EXPECT_EQ(order_of_x(Field::binary(), aes, 51), 51U);
  EXPECT_EQ(order_of_x(Field::binary(), aes, 50), std::nullopt);
}

// R. Lidl, H. Niederreiter, Finite Fields, theorems 3.8 and 3.9: the order of a power and of a product of coprimes.
TEST(Polynomials, OrdersModuloReducibleOnes) {
  const Field& f = Field::binary();
  const Polynomial first = from_exponents({2, 1, 0});   // order 3
  const Polynomial second = from_exponents({3, 1, 0});  // order 7
  EXPECT_EQ(order_of_x(f, multiply(f, first, second), 100), 21U);
  EXPECT_EQ(order_of_x(f, multiply(f, first, first), 100), 6U);
  EXPECT_EQ(order_of_x(f, multiply(f, multiply(f, first, first), first), 100), 12U);
  for (std::size_t n = 1; n < 40; ++n) EXPECT_EQ(order_of_x(f, from_exponents({n, 0}), 100), n);
  EXPECT_EQ(order_of_x(f, {1}, 100), 1U);
  EXPECT_EQ(order_of_x(f, {1}, 0), std::nullopt);
  // Over GF(7): x = 3 modulo 2*x + 1 (2 * 3 + 1 = 0), and 3 is primitive.
  EXPECT_EQ(order_of_x(prime_field(7), {1, 2}, 100), 6U);
}

// Common practice, no source: the defining properties of division, greatest common divisors and powers.
TEST(Polynomials, DivisionGcdAndPowers) {
  Chance chance(20240511);
  for (const std::uint32_t q : {2U, 3U, 4U, 9U, 16U, 25U, 31U, 243U, 256U, 65521U}) {
    const Field f = some_field(q);
    for (int i = 0; i < 300; ++i) {
      const Polynomial a = chance.polynomial(f, 14);
      const Polynomial b = chance.polynomial(f, 8);
      const Polynomial c = chance.polynomial(f, 5);
      ASSERT_EQ(multiply(f, a, b), multiply(f, b, a));
      ASSERT_EQ(multiply(f, a, add(f, b, c)), add(f, multiply(f, a, b), multiply(f, a, c)));
      ASSERT_EQ(add(f, subtract(f, a, b), b), a);
      const Element x = chance.element(f);
      ASSERT_EQ(evaluate(f, multiply(f, a, b), x), f.multiply(evaluate(f, a, x), evaluate(f, b, x)));
      const Polynomial divisor = gcd(f, multiply(f, a, c), multiply(f, b, c));
      ASSERT_EQ(divisor, monic(f, multiply(f, gcd(f, a, b), c)));
      if (b.empty()) continue;
      const auto [quotient, rest] = divide(f, a, b);
      ASSERT_EQ(add(f, multiply(f, quotient, b), rest), a);
      ASSERT_LT(rest.size(), b.size());
      ASSERT_EQ(remainder(f, a, b), rest);
      Polynomial power = remainder(f, {1}, b);
      for (std::uint64_t e = 0; e < 12; ++e) {
        ASSERT_EQ(power_modulo(f, a, e, b), power);
        power = remainder(f, multiply(f, power, a), b);
      }
    }
  }
}

// Common practice, no source.
TEST(Polynomials, Spelling) {
  EXPECT_EQ(to_algebra({}), "0");
  EXPECT_EQ(to_algebra({1}), "1");
  EXPECT_EQ(to_algebra({7}), "7");
  EXPECT_EQ(to_algebra({0, 1}), "x");
  EXPECT_EQ(to_algebra({0, 3}), "3*x");
  EXPECT_EQ(to_algebra({1, 2, 0, 1}), "x^3 + 2*x + 1");
  EXPECT_EQ(to_algebra({0, 0, 5}), "5*x^2");
}

// Common practice, no source: constants, and the polynomial x itself.
TEST(Polynomials, Borders) {
  const Field f = prime_field(3);
  EXPECT_FALSE(is_irreducible(f, {}));
  EXPECT_FALSE(is_irreducible(f, {2}));
  EXPECT_TRUE(is_irreducible(f, {0, 1}));
  EXPECT_FALSE(is_primitive(f, {0, 1}));
  EXPECT_EQ(degree({}), std::nullopt);
  EXPECT_EQ(gcd(f, {}, {}), Polynomial{});
  EXPECT_EQ(gcd(f, {}, {0, 2}), (Polynomial{0, 1}));
  EXPECT_EQ(monic(f, {}), Polynomial{});
  EXPECT_EQ(power_modulo(f, {1, 1}, 0, {2}), Polynomial{});
  EXPECT_EQ(least_factor(f, {2, 0, 2}), (Polynomial{1, 0, 1}));
}

// Common practice, no source: promises between rooms end the program with exit code 4.
TEST(PolynomialDeathTest, BrokenContracts) {
  const Field f = prime_field(3);
  EXPECT_EXIT(static_cast<void>(divide(f, {1}, {})), ::testing::ExitedWithCode(4), "not divided by zero");
  EXPECT_EXIT(static_cast<void>(degree({1, 0})), ::testing::ExitedWithCode(4), "no zero leading coefficient");
  EXPECT_EXIT(order_of_x(f, {0, 1}, 9), ::testing::ExitedWithCode(4), "with a constant term");
  EXPECT_EXIT(least_factor(f, {1}), ::testing::ExitedWithCode(4), "of positive degree");
  EXPECT_EXIT(nth_monic(f, 2, 9), ::testing::ExitedWithCode(4), "below q\\^degree");
}

}  // namespace
}  // namespace assize::field::testing
