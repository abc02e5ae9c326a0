// Symmetries, divisors and duality: found where the literature says they are, refused where they do not hold.
//
// F. J. MacWilliams, N. J. A. Sloane, The Theory of Error-Correcting Codes, 1977, ch. 8, 16 and 19.
#include <gtest/gtest.h>

#include <algorithm>
#include <numeric>

#include "code/construct.hpp"
#include "code/properties.hpp"
#include "code/symmetry.hpp"
#include "sheet/sheet_support.hpp"

namespace assize::code {
namespace {

LinearCode build(const std::string& sheet) {
  const auto description = sheet::read_text(sheet);
  EXPECT_TRUE(description) << description.error().what;
  auto code = construct(*description);
  EXPECT_TRUE(code) << code.error().what;
  return *std::move(code);
}

std::vector<std::string> names(const LinearCode& code) {
  std::vector<std::string> out;
  for (const MonomialMap& map : code.structure.symmetries) out.push_back(map.name);
  return out;
}

const std::string extend = "[[then]]\nstep = \"extend\"\n";
const std::string golay = "[code]\nfamily = \"quadratic-residue\"\nprime = 23\n";

TEST(Symmetry, CyclicCodesShiftAndMultiply) {
  const LinearCode code = build(golay);
  EXPECT_EQ(names(code), (std::vector<std::string>{"cyclic shift", "multiplier 2"}));
  EXPECT_EQ(orbits(23, code.structure.symmetries), 1U);
}

TEST(Symmetry, ExtendedCodesAreTransitive) {
  const LinearCode binary = build(golay + extend);
  EXPECT_EQ(names(binary), (std::vector<std::string>{"cyclic shift", "multiplier 2", "inversion"}));
  EXPECT_EQ(orbits(24, binary.structure.symmetries), 1U);
  const LinearCode ternary = build("[field]\norder = 3\n[code]\nfamily = \"quadratic-residue\"\nprime = 11\n" + extend);
  EXPECT_EQ(orbits(12, ternary.structure.symmetries), 1U) << "a monomial map with signs";
  const LinearCode hexacode = build(
      "[field]\norder = 4\nmodulus = \"x^2 + x + 1\"\n[code]\nfamily = \"quadratic-residue\"\nprime = 5\n" + extend);
  EXPECT_EQ(orbits(6, hexacode.structure.symmetries), 1U);
  const LinearCode bch =
      build("[code]\nfamily = \"bch\"\ncodeword_length = 31\ndesigned_distance = 5\nfirst_exponent = 1\n" + extend);
  EXPECT_EQ(names(bch), (std::vector<std::string>{"cyclic shift", "multiplier 2", "translation"}));
  EXPECT_EQ(orbits(32, bch.structure.symmetries), 1U);
}

TEST(Symmetry, QuasiCyclicBlocks) {
  const LinearCode code = build(
      "[code]\nfamily = \"quasi-cyclic\"\nform = \"bordered\"\ncorner = 0\nborder = 1\nshift = \"right\"\n"
      "first_rows = [\"11011100010\"]\n");
  EXPECT_EQ(names(code), std::vector<std::string>{"quasi-cyclic shift by blocks of 11"});
  EXPECT_EQ(orbits(24, code.structure.symmetries), 4U);
}

TEST(Symmetry, ShortenedCodesHaveNoneOfTheirOwn) {
  EXPECT_TRUE(names(build("[code]\nfamily = \"shortened-cyclic\"\ncodeword_length = 12\ngenerator = { algebra = \"x^4 "
                          "+ x + 1\" }\n"))
                  .empty());
}

TEST(Symmetry, StatedMapsAreVerified) {
  const std::string even = "[code]\nfamily = \"generator-matrix\"\nrows = [\"1001\", \"0101\", \"0011\"]\n";
  const LinearCode code = build(even + "[[symmetry]]\npermutation = [1, 2, 3, 0]\n");
  EXPECT_EQ(names(code), std::vector<std::string>{"stated in line 4"});
  const std::string other = "[code]\nfamily = \"generator-matrix\"\nrows = [\"1100\", \"0110\"]\n";
  const auto refused = construct(*sheet::read_text(other + "[[symmetry]]\npermutation = [1, 2, 3, 0]\n"));
  ASSERT_FALSE(refused);
  EXPECT_EQ(refused.error().where, "t.toml:4");
  EXPECT_NE(refused.error().what.find("does not carry the code onto itself"), std::string::npos);
  EXPECT_FALSE(construct(*sheet::read_text(even + "[[symmetry]]\npermutation = [1, 0]\n")));
  EXPECT_FALSE(construct(*sheet::read_text(even + "[[symmetry]]\npermutation = [1, 0, 2, 7]\n")));
  // Over GF(3) the multipliers decide.
  const std::string signs =
      "[field]\norder = 3\n[code]\nfamily = \"generator-matrix\"\nrows = [\"1 2\"]\n[[symmetry]]\npermutation = [1, "
      "0]\n";
  EXPECT_TRUE(construct(*sheet::read_text(signs + "multipliers = [1, 1]\n"))) << "(2,1) is twice (1,2)";
  EXPECT_FALSE(construct(*sheet::read_text(signs + "multipliers = [1, 2]\n")));
}

TEST(Symmetry, AMapThatHoldsNowhereIsNotFound) {
  const LinearCode code = build(golay);
  MonomialMap swap{"swap", std::vector<std::uint32_t>(23), {}};
  std::iota(swap.permutation.begin(), swap.permutation.end(), 0U);
  std::swap(swap.permutation[0], swap.permutation[1]);
  EXPECT_FALSE(is_symmetry(code, swap));
}

TEST(Properties, DivisorsAndDuality) {
  const auto doubly_even = properties(build(golay + extend));
  ASSERT_TRUE(doubly_even);
  EXPECT_EQ(doubly_even->divisor, 4U);
  EXPECT_TRUE(doubly_even->self_dual);
  EXPECT_TRUE(doubly_even->all_one);
  const auto odd = properties(build(golay));
  EXPECT_EQ(odd->divisor, 1U);
  EXPECT_FALSE(odd->self_orthogonal);
  const auto even = properties(build("[code]\nfamily = \"generator-matrix\"\nrows = [\"1001\", \"0101\", \"0011\"]\n"));
  EXPECT_EQ(even->divisor, 2U);
  // Weights 4 but not orthogonal to each other: their sum has weight 6.
  const auto trap = properties(build("[code]\nfamily = \"generator-matrix\"\nrows = [\"1111000\", \"0001111\"]\n"));
  EXPECT_EQ(trap->divisor, 2U);
  const auto ternary =
      properties(build("[field]\norder = 3\n[code]\nfamily = \"quadratic-residue\"\nprime = 11\n" + extend));
  EXPECT_EQ(ternary->divisor, 3U);
  EXPECT_TRUE(ternary->self_dual);
  const auto hexacode = properties(build(
      "[field]\norder = 4\nmodulus = \"x^2 + x + 1\"\n[code]\nfamily = \"quadratic-residue\"\nprime = 5\n" + extend));
  EXPECT_EQ(hexacode->divisor, 2U);
  EXPECT_TRUE(hexacode->hermitian_self_dual);
  EXPECT_FALSE(hexacode->self_orthogonal);
}

}  // namespace
}  // namespace assize::code
