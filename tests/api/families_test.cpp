// The algebraic and composed families, and every step, against published parameters.
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

const std::string gf3 = "[field]\norder = 3\n";
const std::string gf4 = "[field]\norder = 4\nmodulus = \"x^2 + x + 1\"\n";
const std::string extend = "[[then]]\nstep = \"extend\"\n";

std::string bch(int n, int designed, const std::string& rest = "", int first = 1) {
  return "[code]\nfamily = \"bch\"\ncodeword_length = " + std::to_string(n) +
         "\ndesigned_distance = " + std::to_string(designed) + "\nfirst_exponent = " + std::to_string(first) + "\n" +
         rest;
}

/// Weights by enumerating the code or, if that is smaller, its dual.
Weights weights_either_way(const code::LinearCode& code) {
  if (code.dimension() <= code.redundancy() || code.redundancy() == 0) return weights_of(code);
  const auto weights = bound::dual_distribution(weights_of(code::dual(code)), code.length(), code.order());
  EXPECT_TRUE(weights);
  return weights.value_or(Weights{{0, 1}, {0, 1}});
}

// Primitive narrow-sense BCH codes: dimension -> true minimum distance.
TEST(Bch, PublishedDistancesUpToLength63) {
  const std::map<int, std::map<std::uint32_t, std::uint32_t>> published = {
      {15, {{11, 3}, {7, 5}, {5, 7}, {1, 15}}},
      {31, {{26, 3}, {21, 5}, {16, 7}, {11, 11}, {6, 15}, {1, 31}}},
      {63,
       {{57, 3},
        {51, 5},
        {45, 7},
        {39, 9},
        {36, 11},
        {30, 13},
        {24, 15},
        {18, 21},
        {16, 23},
        {10, 27},
        {7, 31},
        {1, 63}}},
  };
  for (const auto& [n, codes] : published) {
    std::map<std::uint32_t, std::uint32_t> found;
    for (int designed = 3; designed <= n; designed += 2) {
      const Subject code = subject(bch(n, designed));
      const std::uint32_t k = code.code.dimension();
      if (found.contains(k)) continue;
      found[k] = 0;
      ASSERT_TRUE(codes.contains(k)) << n << "," << k;
      // What is left is for bounded certification.
      if (std::min(k, code.code.redundancy()) > 24) continue;
      EXPECT_EQ(distance_of(weights_either_way(code.code)), codes.at(k)) << n << "," << k;
    }
    EXPECT_EQ(found.size(), codes.size()) << n;
  }
}

// The dimensions of all primitive narrow-sense BCH codes of lengths 127 and 255, and their designed distances
// (W. W. Peterson, E. J. Weldon, Error-Correcting Codes, 1972, appendix D; values from memory).
TEST(Bch, DimensionsOfLengths127And255) {
  const std::map<int, std::vector<std::pair<int, std::uint32_t>>> published = {
      {127,
       {{3, 120},
        {5, 113},
        {7, 106},
        {9, 99},
        {11, 92},
        {13, 85},
        {15, 78},
        {19, 71},
        {21, 64},
        {23, 57},
        {27, 50},
        {29, 43},
        {31, 36},
        {43, 29},
        {47, 22},
        {55, 15},
        {63, 8}}},
      {255, {{3, 247},  {5, 239},  {7, 231},  {9, 223},  {11, 215}, {13, 207}, {15, 199}, {17, 191}, {19, 187},
             {21, 179}, {23, 171}, {25, 163}, {27, 155}, {29, 147}, {31, 139}, {37, 131}, {39, 123}, {43, 115},
             {45, 107}, {47, 99},  {51, 91},  {53, 87},  {55, 79},  {59, 71},  {61, 63},  {63, 55},  {85, 47},
             {87, 45},  {91, 37},  {95, 29},  {111, 21}, {119, 13}, {127, 9}}},
  };
  for (const auto& [n, codes] : published)
    for (const auto& [designed, k] : codes) {
      EXPECT_EQ(subject(bch(n, designed)).code.dimension(), k) << n << ", designed " << designed;
      // The Bose distance: two more zeros cost dimension.
      EXPECT_LT(subject(bch(n, designed + 1)).code.dimension(), k) << n << ", designed " << designed;
    }
}

TEST(Bch, AnyRootModulusGivesTheSameWeights) {
  const Weights least = weights_of(bch(15, 5));
  EXPECT_EQ(weights_of(bch(15, 5, "root_modulus = \"x^4 + x^3 + 1\"\n")), least);
  EXPECT_NE(subject(bch(15, 5, "root_modulus = \"x^4 + x^3 + 1\"\n")).code.reduced_generator_digest(),
            subject(bch(15, 5)).code.reduced_generator_digest());
  EXPECT_EQ(subject(bch(15, 5, "root_modulus = \"x^4 + x + 1\"\n")).code.reduced_generator_digest(),
            subject(bch(15, 5)).code.reduced_generator_digest());
}

TEST(Bch, OtherFields) {
  // The ternary Golay code has the zeros beta, beta^3, beta^4, beta^5, beta^9: b = 3, designed distance 4.
  const Subject golay = subject(gf3 + bch(11, 4, "", 3));
  EXPECT_EQ(golay.code.dimension(), 6U);
  EXPECT_EQ(distance_of(weights_of(golay.code)), 5U);
  // Over GF(q), n = q - 1, a BCH code is a Reed-Solomon code.
  const std::string gf8 = "[field]\norder = 8\nmodulus = \"x^3 + x + 1\"\n";
  const Subject as_bch = subject(gf8 + bch(7, 5));
  const Subject as_rs =
      subject(gf8 +
              "[code]\nfamily = \"reed-solomon\"\ncodeword_length = 7\ndimension = 3\nfirst_root = 1\nroot_step = 1\n"
              "primitive_element = 2\n");
  EXPECT_EQ(as_bch.code.reduced_generator_digest(), as_rs.code.reduced_generator_digest());
  // Quaternary, length 15, designed distance 5 (zeros alpha .. alpha^4: cosets {1,4}, {2,8}, {3,12}): k = 9.
  EXPECT_EQ(subject(gf4 + bch(15, 5)).code.dimension(), 9U);
}

// The subfield subcode of a Reed-Solomon code is the BCH code with the same zeros (ch. 10).
TEST(Steps, SubfieldSubcodeOfReedSolomonIsBch) {
  const std::string rs =
      "[field]\norder = 16\nmodulus = \"x^4 + x + 1\"\n[code]\nfamily = \"reed-solomon\"\ncodeword_length = "
      "15\ndimension = 11\n"
      "first_root = 1\nroot_step = 1\nprimitive_element = 2\n[[then]]\nstep = \"subfield-subcode\"\nsubfield = ";
  EXPECT_EQ(subject(rs + "2\n").code.reduced_generator_digest(), subject(bch(15, 5)).code.reduced_generator_digest());
  EXPECT_EQ(subject(rs + "4\nmodulus = \"x^2 + x + 1\"\n").code.reduced_generator_digest(),
            subject(gf4 + bch(15, 5)).code.reduced_generator_digest());
}

std::string residue(int p, const std::string& rest = "") {
  return "[code]\nfamily = \"quadratic-residue\"\nprime = " + std::to_string(p) + "\n" + rest;
}

// Independent computation for p = 41; the others in ch. 16.
TEST(QuadraticResidue, Binary) {
  EXPECT_EQ(weights_of(residue(17, extend)), (Weights{{0, 1}, {6, 102}, {8, 153}, {10, 153}, {12, 102}, {18, 1}}));
  EXPECT_EQ(weights_of(residue(23)).at(7), 253);
  EXPECT_EQ(distance_of(weights_of(residue(31))), 7U);
  EXPECT_EQ(weights_of(residue(31, extend)), symmetric(32, {{8, 620}, {12, 13888}, {16, 36518}}));
  EXPECT_EQ(weights_of(residue(41, extend)),
            symmetric(42, {{10, 1722}, {12, 10619}, {14, 49815}, {16, 157563}, {18, 341530}, {20, 487326}}));
  EXPECT_EQ(distance_of(weights_of(residue(47))), 11U);
  EXPECT_EQ(weights_of(residue(47, extend)), symmetric(48, {{12, 17296}, {16, 535095}, {20, 3995376}, {24, 7681680}}));
}

TEST(QuadraticResidue, Ternary) {
  EXPECT_EQ(weights_of(gf3 + residue(11, extend)), (Weights{{0, 1}, {6, 264}, {9, 440}, {12, 24}}));
  // V. Pless, J. Combin. Theory A 12, 1972.
  EXPECT_EQ(weights_of(gf3 + residue(23, extend)),
            (Weights{{0, 1}, {9, 4048}, {12, 61824}, {15, 242880}, {18, 198352}, {21, 24288}, {24, 48}}));
}

// Hermitian self-dual codes over GF(4): F. J. MacWilliams, A. M. Odlyzko, N. J. A. Sloane, H. N. Ward, J. Combin.
// Theory A 25, 1978.
TEST(QuadraticResidue, Quaternary) {
  EXPECT_EQ(weights_of(gf4 + residue(5, extend)), (Weights{{0, 1}, {4, 45}, {6, 18}}));
  EXPECT_EQ(weights_of(gf4 + residue(13, extend)),
            (Weights{{0, 1}, {6, 273}, {8, 2457}, {10, 7098}, {12, 6006}, {14, 549}}));
  // Length 30; the number of minimum words is from memory.
  const Weights thirty = weights_of(gf4 + residue(29, extend));
  EXPECT_EQ(distance_of(thirty), 12U);
  EXPECT_EQ(thirty.at(12), 118755);
  for (const auto& [weight, count] : thirty) EXPECT_EQ(weight % 2, 0U);
  // For p = 3 modulo 8 the extended code is self-dual in the plain, not the Hermitian sense, and has odd weights too.
  const Subject twenty = subject(gf4 + residue(19, extend));
  EXPECT_EQ(code::dual(twenty.code).reduced_generator_digest(), twenty.code.reduced_generator_digest());
  // Where 2 is a square already, the code over GF(4) is the binary one, lifted: [18,9,6].
  const Subject lifted = subject(gf4 + residue(17, extend));
  const Subject binary = subject(residue(17, extend));
  EXPECT_EQ(distance_of(weights_of(lifted.code)), 6U);
  EXPECT_EQ(lifted.code.generator(), binary.code.generator());
}

// The extended Golay code as a bordered double circulant code (ch. 16, fig. 16.7: residues modulo 11).
TEST(QuasiCyclic, BorderedDoubleCirculantGolay) {
  for (const char* shift : {"right", "left"}) {
    const std::string sheet =
        "[code]\nfamily = \"quasi-cyclic\"\nform = \"bordered\"\ncorner = 0\nborder = 1\nshift = \"" +
        std::string(shift) + "\"\nfirst_rows = [\"11011100010\"]\n";
    EXPECT_EQ(weights_of(sheet), (Weights{{0, 1}, {8, 759}, {12, 2576}, {16, 759}, {24, 1}})) << shift;
  }
}

TEST(QuasiCyclic, FormsOfOneCode) {
  // [I | R] written as blocks, as a polynomial, and as the double form.
  const std::string head = "[code]\nfamily = \"quasi-cyclic\"\nshift = \"right\"\n";
  const Subject blocks = subject(head + "form = \"blocks\"\nfirst_rows = [[\"1000000\", \"1101000\"]]\n");
  const Subject polynomial =
      subject(head + "form = \"blocks\"\nblock_size = 7\nfirst_rows = [[\"1000000\", \"x^3 + x + 1\"]]\n");
  const Subject twice = subject(head + "form = \"double\"\nfirst_rows = [\"1101000\"]\n");
  EXPECT_EQ(blocks.code.reduced_generator_digest(), twice.code.reduced_generator_digest());
  EXPECT_EQ(polynomial.code.reduced_generator_digest(), twice.code.reduced_generator_digest());
  const Subject left =
      subject("[code]\nfamily = \"quasi-cyclic\"\nshift = \"left\"\nform = \"double\"\nfirst_rows = [\"1101000\"]\n");
  EXPECT_NE(left.code.reduced_generator_digest(), twice.code.reduced_generator_digest());
}

TEST(QuasiCyclic, ShiftExponents) {
  // The parity-check matrix written out by hand: lifting 3, exponents 1 and 2, one zero block.
  const std::string head =
      "[code]\nfamily = \"quasi-cyclic\"\nlifting = 3\nshift_exponents = [[0, 1, -1], [-1, 2, 0]]\n";
  const Subject right = subject(head + "shift = \"right\"\n");
  const Subject by_hand = subject(
      "[code]\nfamily = \"parity-check-matrix\"\nrows = [\"100010000\", \"010001000\", \"001100000\", \"000001100\", "
      "\"000100010\", "
      "\"000010001\"]\n");
  EXPECT_EQ(right.code.reduced_generator_digest(), by_hand.code.reduced_generator_digest());
  const Subject left = subject(head + "shift = \"left\"\n");
  EXPECT_NE(left.code.reduced_generator_digest(), right.code.reduced_generator_digest());
}

std::string sub(const std::string& name, const std::string& rows) {
  return "[code." + name + ".code]\nfamily = \"generator-matrix\"\nrows = [" + rows + "]\n";
}
const std::string even3 = "\"101\", \"011\"";
const std::string even4 = "\"1001\", \"0101\", \"0011\"";

TEST(Composed, ProductSumAndPlotkin) {
  // Distances multiply, take the minimum, and min(2 d_1, d_2) (ch. 2 and ch. 18).
  const Subject product = subject("[code]\nfamily = \"product\"\n" + sub("first", even3) + sub("second", even4));
  EXPECT_EQ(product.code.length(), 12U);
  EXPECT_EQ(product.code.dimension(), 6U);
  EXPECT_EQ(distance_of(weights_of(product.code)), 4U);
  const Subject sum = subject("[code]\nfamily = \"direct-sum\"\n" + sub("first", even3) + sub("second", "\"1111\""));
  EXPECT_EQ(weights_of(sum.code), (Weights{{0, 1}, {2, 3}, {4, 1}, {6, 3}}));
  // RM(1,3) from RM(1,2) and RM(0,2).
  const Subject plotkin =
      subject("[code]\nfamily = \"plotkin-sum\"\n" + sub("first", even4) + sub("second", "\"1111\""));
  EXPECT_EQ(weights_of(plotkin.code), (Weights{{0, 1}, {4, 14}, {8, 1}}));
}

TEST(Composed, JustesenIsConcatenationByPosition) {
  // The pairs (b, g^i b) of the Justesen code, each written out as an inner generator matrix.
  std::string inner;
  const auto field = field::Field::create(8, std::vector<field::Element>{1, 1, 0, 1});
  ASSERT_TRUE(field);
  for (std::uint32_t i = 0; i < 7; ++i) {
    std::string rows;
    for (std::uint32_t j = 0; j < 3; ++j) {
      std::string row;
      for (const auto bit : field->digits(static_cast<field::Element>(1U << j))) row += std::to_string(bit);
      for (const auto bit : field->digits(field->multiply(field->power(3, i), static_cast<field::Element>(1U << j))))
        row += std::to_string(bit);
      rows += (rows.empty() ? "\"" : ", \"") + row + "\"";
    }
    inner += "{ code = { family = \"generator-matrix\", rows = [" + rows + "] } }, ";
  }
  const Subject written = subject(
      "[code]\nfamily = \"concatenated\"\ninner_by_position = [" + inner +
      "]\n[code.outer.field]\norder = 8\nmodulus = \"x^3 + x + 1\"\n[code.outer.code]\nfamily = \"reed-solomon\"\n"
      "codeword_length = 7\ndimension = 3\nevaluation_points = \"powers\"\nprimitive_element = 2\n");
  const Subject justesen = subject(
      "[field]\norder = 8\nmodulus = \"x^3 + x + 1\"\n[code]\nfamily = \"justesen\"\nouter_length = 7\nouter_dimension "
      "= 3\n"
      "evaluation_points = \"powers\"\nprimitive_element = 3\n");
  EXPECT_EQ(written.code.reduced_generator_digest(), justesen.code.reduced_generator_digest());
  const auto left = bound::theorems(written.description, written.code);
  const auto right = bound::theorems(justesen.description, justesen.code);
  ASSERT_EQ(left.size(), 1U);
  ASSERT_EQ(right.size(), 1U);
  EXPECT_EQ(std::get<evidence::Concatenation>(left.front()).inner_distances,
            std::get<evidence::Concatenation>(right.front()).inner_distances);
}

std::string then(const std::string& step, const std::string& keys = "") {
  return "[[then]]\nstep = \"" + step + "\"\n" + keys;
}

TEST(Steps, GolayUpAndDown) {
  const std::string golay = residue(23);
  const std::string digest = subject(golay).code.reduced_generator_digest();
  EXPECT_EQ(subject(golay + extend + then("puncture", "positions = [23]\n")).code.reduced_generator_digest(), digest);
  EXPECT_EQ(subject(golay + then("dual") + then("dual")).code.reduced_generator_digest(), digest);
  // Expurgated: the even words; augmented again: the whole code.
  EXPECT_EQ(weights_of(golay + then("expurgate")), (Weights{{0, 1}, {8, 506}, {12, 1288}, {16, 253}}));
  EXPECT_EQ(subject(golay + then("expurgate") + then("augment")).code.reduced_generator_digest(), digest);
  // Shortened once: [22,11,8 or 7]; the extended code shortened once is [23,11,8].
  const Subject shortened = subject(golay + extend + then("shorten", "positions = [0]\n"));
  EXPECT_EQ(shortened.code.length(), 23U);
  EXPECT_EQ(shortened.code.dimension(), 11U);
  EXPECT_EQ(weights_of(shortened.code), (Weights{{0, 1}, {8, 506}, {12, 1288}, {16, 253}}));
}

TEST(Steps, ShorteningACyclicCodeIsTheShortenedFamily) {
  const std::string cyclic =
      "[code]\nfamily = \"cyclic\"\ncodeword_length = 15\ngenerator = { algebra = \"x^4 + x + 1\" }\n" +
      then("shorten", "positions = [0, 1, 2]\n");
  const std::string shortened =
      "[code]\nfamily = \"shortened-cyclic\"\ncodeword_length = 12\ngenerator = { algebra = \"x^4 + x + 1\" }\n";
  EXPECT_EQ(subject(cyclic).code.reduced_generator_digest(), subject(shortened).code.reduced_generator_digest());
}

TEST(Steps, PuncturingAndShorteningAreDual) {
  const std::string code = gf3 + residue(11);
  const std::string positions = "positions = [9, 0, 4]\n";
  EXPECT_EQ(subject(code + then("puncture", positions) + then("dual")).code.reduced_generator_digest(),
            subject(code + then("dual") + then("shorten", positions)).code.reduced_generator_digest());
}

TEST(Steps, PermuteAndRepeat) {
  const std::string code = "[code]\nfamily = \"generator-matrix\"\nrows = [\"1100\", \"0111\"]\n";
  const Subject reversed = subject(code + then("permute", "order = [3, 2, 1, 0]\n"));
  EXPECT_EQ(
      reversed.code.reduced_generator_digest(),
      subject("[code]\nfamily = \"generator-matrix\"\nrows = [\"0011\", \"1110\"]\n").code.reduced_generator_digest());
  // Moved one place on: new position i takes the old position order[i].
  EXPECT_EQ(
      subject(code + then("permute", "order = [3, 0, 1, 2]\n")).code.reduced_generator_digest(),
      subject("[code]\nfamily = \"generator-matrix\"\nrows = [\"0110\", \"1011\"]\n").code.reduced_generator_digest());
  const Subject repeated = subject(code + then("repeat", "times = 3\n"));
  EXPECT_EQ(repeated.code.length(), 12U);
  EXPECT_EQ(weights_of(repeated.code), (Weights{{0, 1}, {6, 1}, {9, 2}}));
}

// A basis and its dual: the image of the dual code in the dual basis is the dual of the image (ch. 10).
TEST(Steps, DualBases) {
  const std::string rs =
      "[field]\norder = 8\nmodulus = \"x^3 + x + 1\"\n[code]\nfamily = \"reed-solomon\"\ncodeword_length = "
      "7\ndimension = 3\n"
      "first_root = 1\nroot_step = 1\nprimitive_element = 2\n";
  for (const std::string basis : {"\"polynomial\"", "{ normal = 3 }", "[1, 3, 6]"}) {
    const Subject image_then_dual = subject(rs + then("binary-image", "basis = " + basis + "\n") + then("dual"));
    const Subject dual_then_image =
        subject(rs + then("dual") + then("binary-image", "basis = { dual_of = " + basis + " }\n"));
    EXPECT_EQ(image_then_dual.code.reduced_generator_digest(), dual_then_image.code.reduced_generator_digest())
        << basis;
  }
}

TEST(Steps, TheBasisMattersForTheBits) {
  const std::string rs =
      "[field]\norder = 8\nmodulus = \"x^3 + x + 1\"\n[code]\nfamily = \"reed-solomon\"\ncodeword_length = "
      "7\ndimension = 2\n"
      "first_root = 1\nroot_step = 1\nprimitive_element = 2\n";
  EXPECT_NE(subject(rs + then("binary-image", "basis = \"polynomial\"\n")).code.reduced_generator_digest(),
            subject(rs + then("binary-image", "basis = { normal = 3 }\n")).code.reduced_generator_digest());
}

// CCSDS 131.0-B: the (255,223) and (255,239) codes, first roots 112 and 120 of alpha^11.
TEST(Standards, SpaceReedSolomonCodes) {
  for (const auto& [k, first] : {std::pair(223, 112), std::pair(239, 120)}) {
    const Subject code = subject(
        "[field]\norder = 256\nmodulus = \"x^8 + x^7 + x^2 + x + 1\"\n[code]\nfamily = "
        "\"reed-solomon\"\ncodeword_length = 255\n"
        "dimension = " +
        std::to_string(k) + "\nfirst_root = " + std::to_string(first) +
        "\nroot_step = 11\nprimitive_element = \"x\"\n");
    const auto items = bound::theorems(code.description, code.code);
    EXPECT_EQ(evidence::Conclusions::from(items, {}).at_least(), static_cast<std::uint32_t>(256 - k));
    // The generator polynomial is its own reciprocal: roots come in pairs with product 1.
    const auto row = code.code.row(static_cast<std::uint32_t>(k - 1));
    for (int j = 0; j <= 255 - k; ++j)
      EXPECT_EQ(row[static_cast<std::size_t>(k - 1 + j)], row[static_cast<std::size_t>(254 - j)]) << j;
  }
}

// (15,10): (D + 1)(D^4 + D + 1), shortened from the even-weight Hamming code; weights by independent computation.
TEST(Standards, RadioShortenedCode) {
  const Weights weights = weights_of(
      "[code]\nfamily = \"shortened-cyclic\"\ncodeword_length = 15\ngenerator = { factors = [\"x + 1\", \"x^4 + x + "
      "1\"] }\n");
  EXPECT_EQ(weights, (Weights{{0, 1}, {4, 105}, {6, 280}, {8, 435}, {10, 168}, {12, 35}}));
}

}  // namespace
}  // namespace assize::api
