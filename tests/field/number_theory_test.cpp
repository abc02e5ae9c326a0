// Small integers against a sieve, against stepping, and against a few published values.
#include "field/number_theory.hpp"

#include <gtest/gtest.h>

#include <numeric>
#include <vector>

namespace assize::field {
namespace {

// Independent computation: the sieve of Eratosthenes.
TEST(NumberTheory, PrimesAgreeWithASieve) {
  constexpr std::size_t bound = 70000;
  std::vector<bool> composite(bound);
  composite[0] = composite[1] = true;
  for (std::size_t i = 2; i * i < bound; ++i)
    if (!composite[i])
      for (std::size_t j = i * i; j < bound; j += i) composite[j] = true;
  for (std::size_t n = 0; n < bound; ++n) ASSERT_EQ(is_prime(n), !composite[n]) << n;
}

// Common practice, no source: 2^32 - 5 and 2^16 - 15 are the largest primes below 2^32 and 2^16, 65537 is a Fermat
// prime, 561 is the least Carmichael number.
TEST(NumberTheory, KnownPrimesAndComposites) {
  EXPECT_TRUE(is_prime(4294967291U));
  EXPECT_FALSE(is_prime(4294967295U));
  EXPECT_TRUE(is_prime(65537));
  EXPECT_TRUE(is_prime(65521));
  EXPECT_FALSE(is_prime(561));
}

// Independent computation: powers of every base, collected.
TEST(NumberTheory, PrimePowersAreExactlyThePowersOfPrimes) {
  constexpr std::uint32_t bound = 70000;
  std::vector<std::uint32_t> prime_of(bound);
  std::vector<std::uint32_t> exponent_of(bound);
  for (std::uint32_t p = 2; p < bound; ++p) {
    if (!is_prime(p)) continue;
    std::uint32_t exponent = 1;
    for (std::uint64_t power = p; power < bound; power *= p) {
      prime_of[power] = p;
      exponent_of[power] = exponent++;
    }
  }
  for (std::uint32_t q = 0; q < bound; ++q) {
    const auto found = as_prime_power(q);
    ASSERT_EQ(found.has_value(), prime_of[q] != 0) << q;
    if (!found) continue;
    ASSERT_EQ(found->prime, prime_of[q]);
    ASSERT_EQ(found->exponent, exponent_of[q]);
  }
  EXPECT_EQ(as_prime_power(1U << 31U)->exponent, 31U);
  EXPECT_FALSE(as_prime_power(4294967295U));
}

// Independent computation: counting coprime residues, dividing by hand.
TEST(NumberTheory, PrimeFactorsAndPhi) {
  using Factors = std::vector<std::uint64_t>;
  EXPECT_EQ(prime_factors(0), Factors{});
  EXPECT_EQ(prime_factors(1), Factors{});
  EXPECT_EQ(prime_factors(4294967295U), (Factors{3, 5, 17, 257, 65537}));  // 2^32 - 1 = F_0 F_1 F_2 F_3 F_4, L. Euler
  EXPECT_EQ(prime_factors(720), (Factors{2, 3, 5}));
  for (std::uint64_t n = 1; n < 600; ++n) {
    std::uint64_t coprime = 0;
    for (std::uint64_t a = 1; a <= n; ++a) coprime += std::gcd(a, n) == 1 ? 1U : 0U;
    ASSERT_EQ(euler_phi(n), coprime) << n;
  }
}

// R. Lidl, H. Niederreiter, Finite Fields, lemma 3.23: the sum of moebius(d) over d | n is 1 for n = 1, otherwise 0.
TEST(NumberTheory, MoebiusSumsOverDivisorsVanish) {
  for (std::uint64_t n = 1; n < 600; ++n) {
    int sum = 0;
    for (std::uint64_t d = 1; d <= n; ++d)
      if (n % d == 0) sum += moebius(d);
    ASSERT_EQ(sum, n == 1 ? 1 : 0) << n;
  }
}

// Independent computation: stepping through the powers.
TEST(NumberTheory, OrdersAgreeWithStepping) {
  for (std::uint64_t n = 1; n < 400; ++n)
    for (std::uint64_t q = 0; q < 30; ++q) {
      const auto order = multiplicative_order(q, n);
      ASSERT_EQ(order.has_value(), std::gcd(q, n) == 1) << q << " modulo " << n;
      if (!order) continue;
      std::uint64_t power = q % n;
      std::uint32_t steps = 1;
      for (; power != 1 % n; power = power * q % n) ++steps;
      ASSERT_EQ(*order, steps) << q << " modulo " << n;
    }
}

// F. J. MacWilliams, N. J. A. Sloane, The Theory of Error-Correcting Codes, chapter 7: the cyclotomic cosets that give
// the binary Golay code of length 23 have 11 elements, those of the ternary one of length 11 have 5.
TEST(NumberTheory, OrdersBehindTheGolayCodes) {
  EXPECT_EQ(multiplicative_order(2, 23), 11U);
  EXPECT_EQ(multiplicative_order(3, 11), 5U);
  EXPECT_EQ(multiplicative_order(2, 4294967295U), 32U);  // independent computation: 2^32 = 1 modulo 2^32 - 1
}

// Common practice, no source: promises between rooms end the program with exit code 4.
TEST(NumberTheoryDeathTest, LargeAndZeroArgumentsBreakTheContract) {
  EXPECT_EXIT(is_prime(std::uint64_t{1} << 32U), ::testing::ExitedWithCode(4), "less than 2\\^32");
  EXPECT_EXIT(multiplicative_order(2, 0), ::testing::ExitedWithCode(4), "positive number");
  EXPECT_EXIT(euler_phi(0), ::testing::ExitedWithCode(4), "positive number");
}

}  // namespace
}  // namespace assize::field
