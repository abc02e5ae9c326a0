// Sheets of well-known codes against their published weight distributions.
//
// Unless another source stands beside a test, the values are from F. J. MacWilliams, N. J. A. Sloane, The Theory of
// Error-Correcting Codes, North-Holland 1977.
#include <gtest/gtest.h>

#include "api/code_support.hpp"
#include "base/integers.hpp"
#include "bound/macwilliams.hpp"
#include "bound/theorems.hpp"

namespace assize::api {
namespace {

using Weights = evidence::WeightDistribution;

std::string cyclic(std::uint32_t length, const std::string& generator, const std::string& rest = "") {
  return "[code]\nfamily = \"cyclic\"\ncodeword_length = " + std::to_string(length) + "\ngenerator = { algebra = \"" +
         generator + "\" }\n" + rest;
}
const std::string extend = "[[then]]\nstep = \"extend\"\n";
const std::string take_dual = "[[then]]\nstep = \"dual\"\n";
const std::string gf3 = "[field]\norder = 3\n";
const std::string gf4 = "[field]\norder = 4\nmodulus = \"x^2 + x + 1\"\n";
const std::string gf8 = "[field]\norder = 8\nmodulus = \"x^3 + x + 1\"\n";
const std::string gf16 = "[field]\norder = 16\nmodulus = \"x^4 + x + 1\"\n";

TEST(Published, BinaryGolay) {
  const std::string generator = "x^11 + x^9 + x^7 + x^6 + x^5 + x + 1";
  EXPECT_EQ(weights_of(cyclic(23, generator)),
            (Weights{{0, 1}, {7, 253}, {8, 506}, {11, 1288}, {12, 1288}, {15, 506}, {16, 253}, {23, 1}}));
  EXPECT_EQ(weights_of(cyclic(23, generator, extend)), (Weights{{0, 1}, {8, 759}, {12, 2576}, {16, 759}, {24, 1}}));
}

TEST(Published, TernaryGolay) {
  const std::string generator = "x^5 + x^4 + 2*x^3 + x^2 + 2";
  EXPECT_EQ(weights_of(gf3 + cyclic(11, generator)),
            (Weights{{0, 1}, {5, 132}, {6, 132}, {8, 330}, {9, 110}, {11, 24}}));
  EXPECT_EQ(weights_of(gf3 + cyclic(11, generator, extend)), (Weights{{0, 1}, {6, 264}, {9, 440}, {12, 24}}));
}

TEST(Published, Hexacode) {
  EXPECT_EQ(
      weights_of(gf4 +
                 "[code]\nfamily = \"generator-matrix\"\nrows = [\"1 0 0 1 2 2\", \"0 1 0 2 1 2\", \"0 0 1 2 2 1\"]\n"),
      (Weights{{0, 1}, {4, 45}, {6, 18}}));
}

TEST(Published, Hamming) {
  // All words by enumeration for [15,11]; [31,26] has 2^26 of them.
  const Weights fifteen = symmetric(15, {{3, 35}, {4, 105}, {5, 168}, {6, 280}, {7, 435}});
  EXPECT_EQ(weights_of(cyclic(15, "x^4 + x + 1")), fifteen);
  const Weights thirty_one = weights_of(cyclic(31, "x^5 + x^2 + 1"));
  EXPECT_EQ(thirty_one.at(3), 155);
  EXPECT_EQ(thirty_one.at(4), 1085);
  EXPECT_EQ(thirty_one.at(5), 5208);
  EXPECT_EQ(thirty_one.at(6), 22568);
  EXPECT_EQ(distance_of(thirty_one), 3U);
}

TEST(Published, SimplexCodesHaveOneWeight) {
  // The dual of a Hamming code over GF(q): every non-zero word has weight q^(m-1).
  EXPECT_EQ(weights_of(cyclic(63, "x^6 + x + 1", take_dual)), (Weights{{0, 1}, {32, 63}}));
  EXPECT_EQ(weights_of(gf3 + "[code]\nfamily = \"generator-matrix\"\nrows = [\"1 1 1 1 1 1 1 1 1 0 0 0 0\", "
                             "\"0 0 0 1 1 1 2 2 2 1 1 1 0\", \"0 1 2 0 1 2 0 1 2 0 1 2 1\"]\n"),
            (Weights{{0, 1}, {9, 26}}));
  EXPECT_EQ(weights_of(gf4 + "[code]\nfamily = \"generator-matrix\"\nrows = [\"1 0 1 1 1\", \"0 1 1 2 3\"]\n"),
            (Weights{{0, 1}, {4, 15}}));
}

std::string reed_muller(int order, int variables) {
  return "[code]\nfamily = \"reed-muller\"\norder = " + std::to_string(order) +
         "\nvariables = " + std::to_string(variables) + "\n";
}

TEST(Published, ReedMullerOfFirstOrder) {
  for (int m = 2; m <= 5; ++m) {
    const std::uint32_t n = 1U << m;
    EXPECT_EQ(weights_of(reed_muller(1, m)), (Weights{{0, 1}, {n / 2, 2 * n - 2}, {n, 1}})) << m;
  }
}

// N. J. A. Sloane, E. R. Berlekamp, IEEE Trans. Inf. Theory 16, 1970: weights of the second-order codes.
TEST(Published, ReedMullerOfSecondOrder) {
  EXPECT_EQ(weights_of(reed_muller(2, 4)), symmetric(16, {{4, 140}, {6, 448}, {8, 870}}));
  EXPECT_EQ(weights_of(reed_muller(2, 5)), symmetric(32, {{8, 620}, {12, 13888}, {16, 36518}}));
  EXPECT_EQ(weights_of(reed_muller(2, 6)), symmetric(64, {{16, 2604}, {24, 291648}, {28, 888832}, {32, 1828134}}));
}

// MacWilliams, Sloane 1977, p. 129.
TEST(Published, ReedMullerOfThirdOrder) {
  EXPECT_EQ(weights_of(reed_muller(3, 4)), symmetric(16, {{2, 120}, {4, 1820}, {6, 8008}, {8, 12870}}));
  EXPECT_EQ(
      weights_of(reed_muller(3, 5)),
      symmetric(32,
                {{4, 1240}, {6, 27776}, {8, 330460}, {10, 2011776}, {12, 7063784}, {14, 14721280}, {16, 18796230}}));
}

/// A_w = C(n,w) Sum_j (-1)^j C(w,j) (q^(w-d+1-j) - 1): the weights of a maximum distance separable code (ch. 11, th.
/// 6).
Weights separable(std::uint32_t q, std::uint32_t n, std::uint32_t k) {
  const auto choose = [](std::uint32_t a, std::uint32_t b) {
    BigInteger c = 1;
    for (std::uint32_t i = 1; i <= b; ++i) c = c * (a - b + i) / i;
    return c;
  };
  const std::uint32_t d = n - k + 1;
  Weights out{{0, 1}};
  for (std::uint32_t w = d; w <= n; ++w) {
    BigInteger sum = 0;
    for (std::uint32_t j = 0; j + d <= w; ++j) {
      const BigInteger term = choose(w, j) * (power(q, w - d + 1 - j) - 1);
      sum += j % 2 == 0 ? term : -term;
    }
    if (sum != 0) out[w] = choose(n, w) * sum;
  }
  return out;
}

std::string by_roots(const std::string& field, int n, int k, const std::string& a, int first, int step) {
  return field + "[code]\nfamily = \"reed-solomon\"\ncodeword_length = " + std::to_string(n) +
         "\ndimension = " + std::to_string(k) + "\nprimitive_element = " + a +
         "\nfirst_root = " + std::to_string(first) + "\nroot_step = " + std::to_string(step) + "\n";
}
std::string by_points(const std::string& field, int n, int k, const std::string& points, const std::string& rest = "") {
  return field + "[code]\nfamily = \"reed-solomon\"\ncodeword_length = " + std::to_string(n) +
         "\ndimension = " + std::to_string(k) + "\nevaluation_points = " + points + "\n" + rest;
}

TEST(Published, ReedSolomonCodesAreSeparable) {
  for (int k = 1; k <= 7; ++k) {
    EXPECT_EQ(weights_of(by_roots(gf8, 7, k, "2", 1, 1)), separable(8, 7, static_cast<std::uint32_t>(k))) << k;
    EXPECT_EQ(weights_of(by_points(gf8, 8, k, "\"all\"", "primitive_element = 3\n")),
              separable(8, 8, static_cast<std::uint32_t>(k)))
        << k;
  }
  for (int k = 1; k <= 4; ++k) {
    EXPECT_EQ(weights_of(by_roots(gf16, 15, k, "2", 0, 1)), separable(16, 15, static_cast<std::uint32_t>(k))) << k;
    EXPECT_EQ(weights_of(by_roots(gf16, 15, k, "\"x\"", 3, 7)), separable(16, 15, static_cast<std::uint32_t>(k))) << k;
    EXPECT_EQ(weights_of(by_roots("[field]\norder = 31\n", 30, k, "3", 1, 1)),
              separable(31, 30, static_cast<std::uint32_t>(k)))
        << k;
    EXPECT_EQ(weights_of(by_points("[field]\norder = 31\n", 12, k, "[0, 1, 2, 3, 5, 8, 13, 21, 30, 29, 17, 4]",
                                   "multipliers = [1, 2, 3, 4, 5, 6, 7, 8, 9, 10, 11, 12]\n")),
              separable(31, 12, static_cast<std::uint32_t>(k)))
        << k;
  }
}

TEST(Published, RootsAndPointsDescribeTheSameCode) {
  // Zeros a^1 .. a^(n-k) are the evaluation code at a^0, a^-1, ... in the order that puts x^(n-1) first.
  const Subject roots = subject(by_roots(gf8, 7, 3, "2", 1, 1));
  const Subject points = subject(by_points(gf8, 7, 3, "[\"x^6\", \"x^5\", \"x^4\", \"x^3\", \"x^2\", \"x\", 1]"));
  EXPECT_EQ(roots.code.reduced_generator_digest(), points.code.reduced_generator_digest());
}

std::string justesen(const std::string& field, int length, int dimension, int element, const std::string& rest = "") {
  return field + "[code]\nfamily = \"justesen\"\nouter_length = " + std::to_string(length) +
         "\nouter_dimension = " + std::to_string(dimension) +
         "\nevaluation_points = \"powers\"\nprimitive_element = " + std::to_string(element) + "\n" + rest;
}

std::uint32_t guaranteed(const Subject& subject) {
  const auto items = bound::theorems(subject.description, subject.code);
  return evidence::Conclusions::from(items, {}).at_least();
}

// Independent computation: the true distance depends on the primitive element of the inner maps.
TEST(Published, JustesenOverEight) {
  const std::map<int, std::uint32_t> distances{{2, 12}, {4, 13}, {6, 12}, {3, 13}, {7, 12}, {5, 11}};
  for (const auto& [element, distance] : distances) {
    const Subject code = subject(justesen(gf8, 7, 3, element));
    EXPECT_EQ(code.code.length(), 42U);
    EXPECT_EQ(code.code.dimension(), 9U);
    const Weights plain = weights_of(code.code, plan::Method::plain);
    EXPECT_EQ(distance_of(plain), distance) << element;
    EXPECT_EQ(weights_of(code.code, plan::Method::exhaust), plain) << element;
    EXPECT_LE(guaranteed(code), distance) << element;
    EXPECT_GT(guaranteed(code), 1U) << element;
  }
}

TEST(Published, JustesenOverSixteen) {
  std::set<std::uint32_t> distances;
  for (const int element : {2, 3, 4, 5, 9, 11, 13, 14}) {
    const Subject code = subject(justesen(gf16, 15, 3, element));
    EXPECT_EQ(code.code.length(), 120U);
    EXPECT_EQ(code.code.dimension(), 12U);
    const Weights plain = weights_of(code.code, plan::Method::plain);
    EXPECT_EQ(weights_of(code.code, plan::Method::exhaust), plain) << element;
    EXPECT_LE(guaranteed(code), distance_of(plain)) << element;
    distances.insert(distance_of(plain));
  }
  EXPECT_GT(distances.size(), 1U) << "the element matters here too";
}

TEST(Published, JustesenConventionsMakeDifferentCodes) {
  const Subject usual = subject(justesen(gf8, 7, 3, 2));
  EXPECT_NE(usual.code.reduced_generator_digest(),
            subject(justesen(gf8, 7, 3, 2, "first_exponent = 1\n")).code.reduced_generator_digest());
  const Subject symbols = subject(justesen(gf8, 7, 3, 2, "image = \"symbols\"\n"));
  EXPECT_EQ(symbols.code.length(), 14U);
  EXPECT_EQ(symbols.code.order(), 8U);
  // Every non-zero outer symbol becomes two non-zero symbols, so the distance is twice that of the outer code.
  EXPECT_EQ(distance_of(weights_of(symbols.code)), 10U);
  EXPECT_EQ(guaranteed(symbols), 10U);
}

TEST(Published, TheBitImageOfTheSymbolsIsTheOtherImage) {
  const Subject bits = subject(justesen(gf8, 7, 3, 2));
  const Subject image = subject(
      justesen(gf8, 7, 3, 2, "image = \"symbols\"\n[[then]]\nstep = \"binary-image\"\nbasis = \"polynomial\"\n"));
  EXPECT_EQ(bits.code.reduced_generator_digest(), image.code.reduced_generator_digest());
}

TEST(Concatenation, GuaranteedAndTrueDistance) {
  // Reed-Solomon [7,3,5] over GF(8) and the even-weight code [4,3,2]: at least 5 * 2.
  const Subject code = subject(
      "[code]\nfamily = \"concatenated\"\n[code.inner.code]\nfamily = \"generator-matrix\"\nrows = [\"1001\", "
      "\"0101\", \"0011\"]\n"
      "[code.outer.field]\norder = 8\nmodulus = \"x^3 + x + 1\"\n[code.outer.code]\nfamily = \"reed-solomon\"\n"
      "codeword_length = 7\ndimension = 3\nfirst_root = 1\nroot_step = 1\nprimitive_element = 2\n");
  EXPECT_EQ(code.code.length(), 28U);
  EXPECT_EQ(code.code.dimension(), 9U);
  EXPECT_EQ(guaranteed(code), 10U);
  const Weights plain = weights_of(code.code, plan::Method::plain);
  EXPECT_EQ(plain, weights_of(code.code));
  EXPECT_GE(distance_of(plain), 10U);
  const auto items = bound::theorems(code.description, code.code);
  ASSERT_EQ(items.size(), 1U);
  const auto& fact = std::get<evidence::Concatenation>(items.front());
  EXPECT_EQ(fact.outer_distance, 5U);
  EXPECT_EQ(fact.inner_distances, std::vector<std::uint32_t>(7, 2));
}

TEST(Concatenation, OverAFieldThatIsNotPrime) {
  // GF(16) over GF(4): the hexacode has dimension 3, so a [3,2,2] inner code is used with an [15,2,14] outer code.
  const std::string sheet =
      "[code]\nfamily = \"concatenated\"\nembedding = \"x^5\"\nsymbol_basis = [1, 2]\n"
      "[code.inner.field]\norder = 4\nmodulus = \"x^2 + x + 1\"\n"
      "[code.inner.code]\nfamily = \"generator-matrix\"\nrows = [\"1 0 1\", \"0 1 1\"]\n"
      "[code.outer.field]\norder = 16\nmodulus = \"x^4 + x + 1\"\n[code.outer.code]\nfamily = \"reed-solomon\"\n"
      "codeword_length = 15\ndimension = 2\nevaluation_points = \"powers\"\nprimitive_element = 2\n";
  const Subject code = subject(sheet);
  EXPECT_EQ(code.code.order(), 4U);
  EXPECT_EQ(code.code.length(), 45U);
  EXPECT_EQ(code.code.dimension(), 4U);
  EXPECT_EQ(guaranteed(code), 28U);
  EXPECT_GE(distance_of(weights_of(code.code)), 28U);
}

TEST(Concatenation, AnOuterCodeThatIsNoReedSolomonCodeIsEnumerated) {
  const Subject code = subject(
      "[code]\nfamily = \"concatenated\"\n[code.inner.code]\nfamily = \"generator-matrix\"\nrows = [\"101\", \"011\"]\n"
      "[code.outer.field]\norder = 4\nmodulus = \"x^2 + x + 1\"\n[code.outer.code]\nfamily = \"generator-matrix\"\n"
      "rows = [\"1 0 0 1 2 2\", \"0 1 0 2 1 2\", \"0 0 1 2 2 1\"]\n");
  const auto items = bound::theorems(code.description, code.code);
  ASSERT_EQ(items.size(), 1U);
  EXPECT_EQ(std::get<evidence::Concatenation>(items.front()).at_least, 8U);
  // The hexacode concatenated with [3,2,2] is a [18,6,8] code.
  EXPECT_EQ(distance_of(weights_of(code.code)), 8U);
}

// The weights of a code and of its dual determine each other (F. J. MacWilliams, 1963).
TEST(Published, DualDistributionsFollow) {
  const Weights simplex = weights_of(cyclic(31, "x^5 + x^2 + 1", take_dual));
  EXPECT_EQ(bound::dual_distribution(simplex, 31, 2), weights_of(cyclic(31, "x^5 + x^2 + 1")));
  // Hamming [63,57], values of MacWilliams, Sloane: 3:651 4:9765 5:109368 6:1057224 7:8649279 8:60544953.
  const auto hamming = bound::dual_distribution(weights_of(cyclic(63, "x^6 + x + 1", take_dual)), 63, 2);
  ASSERT_TRUE(hamming);
  EXPECT_EQ(hamming->at(3), 651);
  EXPECT_EQ(hamming->at(5), 109368);
  EXPECT_EQ(hamming->at(8), 60544953);
}

// CCSDS 231.0-B: the telecommand code (63,56), distance 4; counts by independent computation.
TEST(Published, TelecommandCode) {
  const auto weights = bound::dual_distribution(weights_of(cyclic(63, "x^7 + x^6 + x^2 + 1", take_dual)), 63, 2);
  ASSERT_TRUE(weights);
  EXPECT_EQ(distance_of(*weights), 4U);
  EXPECT_EQ(weights->at(4), 9765);
  EXPECT_EQ(weights->at(6), 1057224);
}

// P. Koopman, T. Chakravarty, DSN 2004, and independent computation: x^16 + x^12 + x^5 + 1 at 48 data bits and at n =
// 1016.
TEST(Published, FrameCheckThroughItsDual) {
  const auto frame = [](const std::string& length) {
    const auto sheet = "[code]\nfamily = \"shortened-cyclic\"\n" + length +
                       "\ngenerator = { notation = \"full-hex\", value = \"0x11021\" }\n" + take_dual;
    const Subject dual = subject(sheet);
    return bound::dual_distribution(weights_of(dual.code), dual.code.length(), 2);
  };
  const auto small = frame("data_length = 48");
  ASSERT_TRUE(small);
  EXPECT_EQ(small->at(4), 84);
  EXPECT_EQ(small->at(6), 2430);
  const auto large = frame("codeword_length = 1016");
  ASSERT_TRUE(large);
  EXPECT_EQ(distance_of(*large), 4U);
  EXPECT_EQ(large->at(4), 1360037);
  EXPECT_EQ(large->at(6), BigInteger("45932425268"));
}

}  // namespace
}  // namespace assize::api
