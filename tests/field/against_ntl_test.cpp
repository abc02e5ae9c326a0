// The whole room against an outside library: NTL, by V. Shoup, "A library for doing number theory".
//
// Products in extension fields, irreducibility, remainders and greatest common divisors, ranks of matrices.
#include <NTL/GF2E.h>
#include <NTL/GF2X.h>
#include <NTL/GF2XFactoring.h>
#include <NTL/ZZ_p.h>
#include <NTL/ZZ_pE.h>
#include <NTL/ZZ_pX.h>
#include <NTL/ZZ_pXFactoring.h>
#include <NTL/mat_GF2.h>
#include <NTL/mat_GF2E.h>
#include <NTL/mat_ZZ_p.h>

#include "field_support.hpp"

namespace assize::field::testing {
namespace {

NTL::GF2X to_gf2x(std::span<const Element> coefficients) {
  NTL::GF2X result;
  for (std::size_t i = 0; i < coefficients.size(); ++i)
    NTL::SetCoeff(result, static_cast<long>(i), static_cast<long>(coefficients[i]));
  return result;
}

Polynomial from_gf2x(const NTL::GF2X& a) {
  Polynomial result;
  for (long i = 0; i <= NTL::deg(a); ++i) result.push_back(NTL::IsOne(NTL::coeff(a, i)) ? 1 : 0);
  return result;
}

NTL::ZZ_pX to_zzpx(std::span<const Element> coefficients) {
  NTL::ZZ_pX result;
  for (std::size_t i = 0; i < coefficients.size(); ++i)
    NTL::SetCoeff(result, static_cast<long>(i), static_cast<long>(coefficients[i]));
  return result;
}

Polynomial from_zzpx(const NTL::ZZ_pX& a) {
  Polynomial result;
  for (long i = 0; i <= NTL::deg(a); ++i)
    result.push_back(static_cast<Element>(NTL::conv<long>(NTL::rep(NTL::coeff(a, i)))));
  return result;
}

void use_prime(std::uint32_t p) { NTL::ZZ_p::init(NTL::ZZ(static_cast<long>(p))); }

TEST(AgainstNtl, ProductsAndInversesInBinaryExtensions) {
  Chance chance(20240531);
  for (std::uint32_t m = 2; m <= 16; ++m) {
    const Field f = some_field(1U << m);
    NTL::GF2E::init(to_gf2x(f.modulus()));
    for (int i = 0; i < 2000; ++i) {
      const Element a = chance.nonzero(f);
      const Element b = chance.nonzero(f);
      const auto x = NTL::conv<NTL::GF2E>(to_gf2x(f.digits(a)));
      const auto y = NTL::conv<NTL::GF2E>(to_gf2x(f.digits(b)));
      ASSERT_EQ(f.multiply(a, b), f.from_digits(from_gf2x(NTL::rep(x * y)))) << describe(f);
      ASSERT_EQ(f.divide(a, b), f.from_digits(from_gf2x(NTL::rep(x / y)))) << describe(f);
      ASSERT_EQ(f.add(a, b), f.from_digits(from_gf2x(NTL::rep(x + y)))) << describe(f);
    }
  }
}

TEST(AgainstNtl, ProductsAndInversesInOddExtensions) {
  Chance chance(20240532);
  for (const std::uint32_t q : {9U, 25U, 27U, 49U, 81U, 121U, 125U, 169U, 243U})
    for (const Field& f : all_fields(q)) {
      use_prime(f.characteristic());
      NTL::ZZ_pE::init(to_zzpx(f.modulus()));
      for (int i = 0; i < 100; ++i) {
        const Element a = chance.nonzero(f);
        const Element b = chance.nonzero(f);
        const auto x = NTL::conv<NTL::ZZ_pE>(to_zzpx(f.digits(a)));
        const auto y = NTL::conv<NTL::ZZ_pE>(to_zzpx(f.digits(b)));
        ASSERT_EQ(f.multiply(a, b), f.from_digits(from_zzpx(NTL::rep(x * y)))) << describe(f);
        ASSERT_EQ(f.divide(a, b), f.from_digits(from_zzpx(NTL::rep(x / y)))) << describe(f);
        ASSERT_EQ(f.subtract(a, b), f.from_digits(from_zzpx(NTL::rep(x - y)))) << describe(f);
      }
    }
}

TEST(AgainstNtl, IrreducibleBinaryPolynomialsUpToDegreeTen) {
  for (std::size_t m = 1; m <= 10; ++m)
    for (std::uint64_t number = 0; number < 1U << m; ++number) {
      const Polynomial a = nth_monic(Field::binary(), m, number);
      ASSERT_EQ(is_irreducible(Field::binary(), a), NTL::IterIrredTest(to_gf2x(a)) != 0) << to_algebra(a);
    }
}

TEST(AgainstNtl, IrreduciblePolynomialsOverOddPrimes) {
  for (const auto& [p, largest_degree] : {std::pair{3U, 5U}, std::pair{5U, 3U}, std::pair{13U, 2U}}) {
    use_prime(p);
    const Field f = prime_field(p);
    std::uint64_t count = 1;
    for (std::size_t m = 1; m <= largest_degree; ++m) {
      count *= p;
      for (std::uint64_t number = 0; number < count; ++number) {
        const Polynomial a = nth_monic(f, m, number);
        ASSERT_EQ(is_irreducible(f, a), NTL::DetIrredTest(to_zzpx(a)) != 0) << to_algebra(a) << " over " << describe(f);
      }
    }
  }
}

TEST(AgainstNtl, BinaryRemaindersAndGcds) {
  Chance chance(20240533);
  const Field& f = Field::binary();
  for (int i = 0; i < 2000; ++i) {
    const Polynomial common = chance.polynomial(f, 20);
    const Polynomial a = multiply(f, common, chance.polynomial(f, 80));
    const Polynomial b = multiply(f, common, chance.polynomial(f, 50));
    ASSERT_EQ(gcd(f, a, b), from_gf2x(NTL::GCD(to_gf2x(a), to_gf2x(b))));
    if (b.empty()) continue;
    ASSERT_EQ(divide(f, a, b).first, from_gf2x(to_gf2x(a) / to_gf2x(b)));
    ASSERT_EQ(remainder(f, a, b), from_gf2x(to_gf2x(a) % to_gf2x(b)));
  }
}

TEST(AgainstNtl, RemaindersGcdsAndPowersOverOddPrimes) {
  Chance chance(20240534);
  for (const std::uint32_t p : {3U, 5U, 13U, 251U, 65521U}) {
    use_prime(p);
    const Field f = prime_field(p);
    for (int i = 0; i < 200; ++i) {
      const Polynomial common = chance.polynomial(f, 10);
      const Polynomial a = multiply(f, common, chance.polynomial(f, 40));
      const Polynomial b = multiply(f, common, chance.polynomial(f, 20));
      ASSERT_EQ(gcd(f, a, b), from_zzpx(NTL::GCD(to_zzpx(a), to_zzpx(b))));
      if (b.empty()) continue;
      ASSERT_EQ(divide(f, a, b).first, from_zzpx(to_zzpx(a) / to_zzpx(b)));
      ASSERT_EQ(remainder(f, a, b), from_zzpx(to_zzpx(a) % to_zzpx(b)));
      const Polynomial modulus = monic(f, b);  // NTL takes powers modulo monic polynomials of positive degree only
      if (modulus.size() < 2) continue;
      const std::uint64_t exponent = chance.below(1U << 30U);
      const NTL::ZZ_pX power = NTL::PowerMod(to_zzpx(remainder(f, a, modulus)), static_cast<long>(exponent),
                                             NTL::ZZ_pXModulus(to_zzpx(modulus)));
      ASSERT_EQ(power_modulo(f, a, exponent, b), from_zzpx(power));
    }
  }
}

struct Size {
  std::size_t rows;
  std::size_t columns;
  std::size_t rank;
};
constexpr Size sizes[] = {{10, 10, 10}, {20, 33, 11}, {64, 40, 40}, {70, 130, 70}, {100, 100, 99}};

/// The rank that NTL's elimination finds, after every element has been set by `convert`.
template <class NtlMatrix, class Convert>
long ntl_rank(const Matrix& a, Convert convert) {
  NtlMatrix copy;
  copy.SetDims(static_cast<long>(a.rows()), static_cast<long>(a.columns()));
  for (std::size_t i = 0; i < a.rows(); ++i)
    for (std::size_t j = 0; j < a.columns(); ++j)
      copy.put(static_cast<long>(i), static_cast<long>(j), convert(a.at(i, j)));
  return NTL::gauss(copy);
}

TEST(AgainstNtl, RanksOverPrimeFieldsAndBinaryExtensions) {
  Chance chance(20240535);
  for (const std::uint32_t q : {2U, 3U, 7U, 251U, 65521U, 4U, 256U, 65536U}) {
    const Field f = some_field(q);
    for (const auto& [rows, columns, rank] : sizes) {
      Matrix a = chance.matrix(f, rows, columns, rank);
      long expected = 0;
      if (q == 2) {
        expected = ntl_rank<NTL::mat_GF2>(a, [](Element e) { return NTL::GF2(static_cast<long>(e)); });
      } else if (f.characteristic() == 2) {
        NTL::GF2E::init(to_gf2x(f.modulus()));
        expected = ntl_rank<NTL::mat_GF2E>(a, [&](Element e) { return NTL::conv<NTL::GF2E>(to_gf2x(f.digits(e))); });
      } else {
        use_prime(q);
        expected = ntl_rank<NTL::mat_ZZ_p>(a, [](Element e) { return NTL::ZZ_p(static_cast<long>(e)); });
      }
      ASSERT_EQ(static_cast<long>(reduce_rows(f, a).size()), expected) << describe(f);
    }
  }
}

}  // namespace
}  // namespace assize::field::testing
