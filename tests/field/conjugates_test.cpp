// Cosets, conjugates and minimal polynomials: against published tables, against their definitions, and against NTL.
#include "field/conjugates.hpp"

#include <NTL/GF2X.h>
#include <NTL/GF2XFactoring.h>
#include <NTL/ZZ_p.h>
#include <NTL/ZZ_pX.h>

#include <algorithm>
#include <map>
#include <set>

#include "field_support.hpp"

namespace assize::field::testing {
namespace {

using Cosets = std::vector<std::vector<std::uint32_t>>;

// F. J. MacWilliams, N. J. A. Sloane, The Theory of Error-Correcting Codes, chapters 4 and 7.
TEST(Cosets, PublishedOnesModuloSmallNumbers) {
  EXPECT_EQ(cyclotomic_cosets(2, 7), (Cosets{{0}, {1, 2, 4}, {3, 6, 5}}));
  EXPECT_EQ(cyclotomic_cosets(2, 15), (Cosets{{0}, {1, 2, 4, 8}, {3, 6, 12, 9}, {5, 10}, {7, 14, 13, 11}}));
  EXPECT_EQ(cyclotomic_cosets(2, 31), (Cosets{{0},
                                              {1, 2, 4, 8, 16},
                                              {3, 6, 12, 24, 17},
                                              {5, 10, 20, 9, 18},
                                              {7, 14, 28, 25, 19},
                                              {11, 22, 13, 26, 21},
                                              {15, 30, 29, 27, 23}}));
  EXPECT_EQ(cyclotomic_cosets(3, 11), (Cosets{{0}, {1, 3, 9, 5, 4}, {2, 6, 7, 10, 8}}));
}

// The same chapters.
TEST(Cosets, PublishedSizesModulo63) {
  const std::map<std::uint32_t, std::size_t> sizes = {{0, 1},  {1, 6},  {3, 6},  {5, 6},  {7, 6},  {9, 3}, {11, 6},
                                                      {13, 6}, {15, 6}, {21, 2}, {23, 6}, {27, 3}, {31, 6}};
  std::map<std::uint32_t, std::size_t> found;
  for (const auto& coset : cyclotomic_cosets(2, 63)) found[coset.front()] = coset.size();
  EXPECT_EQ(found, sizes);
}

// By definition.  The size of the coset of 1 is the order of q.
TEST(Cosets, PartTheIntegersAndAreClosed) {
  for (const std::uint64_t q : {2U, 3U, 4U, 5U, 9U, 65536U})
    for (std::uint32_t n = 1; n <= 120; ++n) {
      const auto order = multiplicative_order(q, n);
      if (!order) continue;
      std::set<std::uint32_t> seen;
      std::uint32_t last = 0;
      for (const auto& coset : cyclotomic_cosets(q, n)) {
        EXPECT_EQ(coset.front(), std::ranges::min(coset));
        EXPECT_TRUE(seen.empty() || coset.front() > last);
        last = coset.front();
        for (std::size_t i = 0; i < coset.size(); ++i) {
          EXPECT_EQ(coset[i] * q % n, coset[(i + 1) % coset.size()]) << q << " modulo " << n;
          EXPECT_TRUE(seen.insert(coset[i]).second);
        }
        EXPECT_TRUE(coset.front() != 1 % n || coset.size() == *order);
      }
      EXPECT_EQ(seen.size(), n);
    }
}

// Common practice, no source: promises between rooms end the program with exit code 4.
TEST(CosetsDeathTest, CommonFactorsBreakTheContract) {
  EXPECT_EXIT(cyclotomic_cosets(2, 6), ::testing::ExitedWithCode(4), "coprime");
  EXPECT_EXIT(cyclotomic_cosets(2, 0), ::testing::ExitedWithCode(4), "coprime");
}

// F. J. MacWilliams, N. J. A. Sloane, chapters 4 and 7: GF(16) with x^4 + x + 1.
TEST(MinimalPolynomials, PublishedOnesOverSixteenElements) {
  const Field f = Field::create(16, Polynomial{1, 1, 0, 0, 1}).value();
  const auto of_power = [&f](std::uint64_t e) { return to_algebra(minimal_polynomial(f, f.power(2, e))); };
  EXPECT_EQ(to_algebra(minimal_polynomial(f, 0)), "x");
  EXPECT_EQ(of_power(0), "x + 1");
  for (const std::uint64_t e : {1U, 2U, 4U, 8U}) EXPECT_EQ(of_power(e), "x^4 + x + 1");
  for (const std::uint64_t e : {3U, 6U, 12U, 9U}) EXPECT_EQ(of_power(e), "x^4 + x^3 + x^2 + x + 1");
  for (const std::uint64_t e : {5U, 10U}) EXPECT_EQ(of_power(e), "x^2 + x + 1");
  for (const std::uint64_t e : {7U, 14U, 13U, 11U}) EXPECT_EQ(of_power(e), "x^4 + x^3 + 1");
  EXPECT_EQ(conjugacy_class(f, 2), (std::vector<Element>{2, 4, 3, 5}));
  EXPECT_EQ(conjugacy_class(f, 0), std::vector<Element>{0});
}

// R. Lidl, H. Niederreiter, Finite Fields, theorem 3.20: x^q - x is the product of all of them.
TEST(MinimalPolynomials, MultiplyToXToTheQMinusX) {
  for (const std::uint32_t q : {2U, 3U, 7U, 4U, 8U, 9U, 16U, 25U, 27U, 64U, 81U, 121U, 243U, 256U}) {
    const Field f = some_field(q);
    const Field ground = prime_field(f.characteristic());
    Polynomial product{1};
    std::set<Element> seen;
    for (std::uint32_t number = 0; number < q; ++number) {
      const auto a = static_cast<Element>(number);
      const Polynomial minimal = minimal_polynomial(f, a);
      EXPECT_EQ(evaluate(f, minimal, a), 0) << describe(f);
      EXPECT_TRUE(is_irreducible(ground, minimal)) << describe(f);
      EXPECT_EQ(minimal.size(), conjugacy_class(f, a).size() + 1);
      if (seen.contains(a)) continue;
      for (const Element c : conjugacy_class(f, a)) EXPECT_TRUE(seen.insert(c).second);
      product = multiply(ground, product, minimal);
    }
    Polynomial expected(q + 1);
    expected[q] = 1;
    expected[1] = ground.negate(1);
    EXPECT_EQ(product, expected) << describe(f);
  }
}

// Exponents of conjugates are a coset.
TEST(MinimalPolynomials, ClassesOfConjugatesAreCosetsOfExponents) {
  const Field f = some_field(243);
  for (const auto& coset : cyclotomic_cosets(3, 242)) {
    std::vector<Element> powers;
    for (const std::uint32_t e : coset) powers.push_back(f.power(f.least_primitive_element(), e));
    EXPECT_EQ(conjugacy_class(f, powers.front()), powers);
  }
}

// Independent computation: every monic polynomial is tried.
TEST(IrreduciblePolynomials, AreTheOnesThatTheTestAccepts) {
  for (const std::uint32_t q : {4U, 8U, 9U, 16U, 25U, 27U, 32U, 64U, 81U, 125U, 169U, 243U, 256U, 1024U}) {
    const Field f = some_field(q);
    const Field ground = prime_field(f.characteristic());
    std::vector<std::string> expected;
    for (std::uint32_t number = 0; number < q; ++number) {
      const Polynomial a = nth_monic(ground, f.degree(), number);
      if (is_irreducible(ground, a)) expected.push_back(to_algebra(a));
    }
    std::vector<std::string> found;
    for (const auto& [polynomial, order] : irreducible_polynomials(f)) {
      found.push_back(to_algebra(polynomial));
      EXPECT_EQ(order, order_of_x(ground, polynomial, q)) << found.back();
      EXPECT_EQ(order == q - 1, is_primitive(ground, polynomial)) << found.back();
    }
    EXPECT_EQ(found, expected);
    EXPECT_EQ(found.size(), number_of_irreducible_polynomials(f.characteristic(), f.degree()));
  }
}

// They do not depend on the field in which they are found.
TEST(IrreduciblePolynomials, AreTheSameForEveryModulus) {
  std::set<std::string> lists;
  for (const Field& f : all_fields(81)) {
    std::string list;
    for (const auto& one : irreducible_polynomials(f)) list += to_algebra(one.polynomial) + "\n";
    lists.insert(list);
  }
  EXPECT_EQ(lists.size(), 1U);
}

// S. W. Golomb, Shift Register Sequences, table of the numbers of irreducible binary polynomials by degree.
TEST(IrreduciblePolynomials, PublishedNumbers) {
  const std::uint64_t binary[] = {2, 1, 2, 3, 6, 9, 18, 30, 56, 99, 186, 335, 630, 1161, 2182, 4080};
  for (std::uint32_t degree = 1; degree <= 16; ++degree)
    EXPECT_EQ(number_of_irreducible_polynomials(2, degree), binary[degree - 1]);
  EXPECT_EQ(number_of_irreducible_polynomials(3, 2), 3U);  // independent computation
  EXPECT_EQ(number_of_irreducible_polynomials(4, 2), 6U);  // (16 - 4) / 2
}

NTL::GF2X to_gf2x(std::span<const Element> coefficients) {
  NTL::GF2X result;
  for (std::size_t i = 0; i < coefficients.size(); ++i)
    NTL::SetCoeff(result, static_cast<long>(i), static_cast<long>(coefficients[i]));
  return result;
}

NTL::ZZ_pX to_zzpx(std::span<const Element> coefficients) {
  NTL::ZZ_pX result;
  for (std::size_t i = 0; i < coefficients.size(); ++i)
    NTL::SetCoeff(result, static_cast<long>(i), static_cast<long>(coefficients[i]));
  return result;
}

TEST(ConjugatesAgainstNtl, MinimalPolynomialsOfBinaryExtensions) {
  Chance chance(20240540);
  for (std::uint32_t m = 2; m <= 16; ++m) {
    const Field f = some_field(1U << m);
    const NTL::GF2XModulus modulus(to_gf2x(f.modulus()));
    for (int i = 0; i < 200; ++i) {
      const Element a = chance.element(f);
      ASSERT_EQ(to_gf2x(minimal_polynomial(f, a)), NTL::MinPolyMod(to_gf2x(f.digits(a)), modulus))
          << describe(f) << ", element " << a;
    }
  }
}

TEST(ConjugatesAgainstNtl, MinimalPolynomialsOfOddExtensions) {
  for (const std::uint32_t q : {9U, 25U, 27U, 81U, 121U, 125U, 243U}) {
    const Field f = some_field(q);
    NTL::ZZ_p::init(NTL::ZZ(static_cast<long>(f.characteristic())));
    const NTL::ZZ_pXModulus modulus(to_zzpx(f.modulus()));
    for (std::uint32_t a = 0; a < q; ++a) {
      const auto element = static_cast<Element>(a);
      ASSERT_EQ(to_zzpx(minimal_polynomial(f, element)), NTL::IrredPolyMod(to_zzpx(f.digits(element)), modulus))
          << describe(f) << ", element " << a;
    }
  }
}

// The factors of x^(q-1) - 1 over GF(2) are the minimal polynomials of the nonzero elements.
TEST(ConjugatesAgainstNtl, FactorsOfXToTheQMinusOneMinusOne) {
  for (std::uint32_t m = 2; m <= 10; ++m) {
    const Field f = some_field(1U << m);
    NTL::GF2X whole;
    NTL::SetCoeff(whole, static_cast<long>(f.order() - 1));
    NTL::SetCoeff(whole, 0);
    const auto factors = NTL::CanZass(whole);
    std::multiset<std::vector<Element>> theirs;
    for (long i = 0; i < factors.length(); ++i) {
      EXPECT_EQ(factors[i].b, 1);
      Polynomial factor;
      for (long j = 0; j <= NTL::deg(factors[i].a); ++j)
        factor.push_back(NTL::IsOne(NTL::coeff(factors[i].a, j)) ? 1 : 0);
      theirs.insert(factor);
    }
    std::multiset<std::vector<Element>> ours;
    for (const auto& coset : cyclotomic_cosets(2, f.order() - 1))
      ours.insert(minimal_polynomial(f, f.power(f.least_primitive_element(), coset.front())));
    EXPECT_EQ(ours, theirs) << describe(f);
  }
}

TEST(ConjugatesAgainstNtl, IrreducibleBinaryPolynomialsOfDegreeSixteen) {
  std::vector<Polynomial> theirs;
  for (std::uint64_t number = 0; number < 1U << 16U; ++number) {
    const Polynomial a = nth_monic(Field::binary(), 16, number);
    if (a.front() != 0 && NTL::IterIrredTest(to_gf2x(a)) != 0) theirs.push_back(a);
  }
  std::vector<Polynomial> ours;
  for (const auto& one : irreducible_polynomials(some_field(1U << 16U))) ours.push_back(one.polynomial);
  EXPECT_EQ(ours, theirs);
}

}  // namespace
}  // namespace assize::field::testing
