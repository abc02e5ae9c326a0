// Codes that cannot be built, and what is said about them: always the line of the value that is to blame.
#include <gtest/gtest.h>

#include "code/construct.hpp"
#include "sheet/sheet_support.hpp"

namespace assize::code {
namespace {

struct Refusal {
  const char* name;
  const char* text;
  const char* where;
  const char* what;
  const char* cure;
};

void PrintTo(const Refusal& refusal, std::ostream* out) { *out << refusal.name; }

class Constructions : public testing::TestWithParam<Refusal> {};

TEST_P(Constructions, NameTheLineAndTheCure) {
  const Refusal& wanted = GetParam();
  const auto description = sheet::read_text(wanted.text);
  ASSERT_TRUE(description) << description.error().what;
  const auto code = construct(*description);
  ASSERT_FALSE(code) << "was accepted";
  EXPECT_EQ(code.error().where, wanted.where);
  EXPECT_NE(code.error().what.find(wanted.what), std::string::npos) << code.error().what;
  EXPECT_NE(code.error().cure.find(wanted.cure), std::string::npos) << code.error().cure;
}

#define GF8 "[field]\norder = 8\nmodulus = \"x^3 + x + 1\"\n"

constexpr Refusal refusals[] = {
    {"ZeroMatrix", "[code]\nfamily = \"generator-matrix\"\nrows = [\"000\", \"000\"]\n", "t.toml:1", "dimension 0",
     "at least 1"},
    {"FullParityCheck", "[code]\nfamily = \"parity-check-matrix\"\nrows = [\"10\", \"01\"]\n", "t.toml:1",
     "dimension 0", "at least 1"},
    {"DualOfEverything", "[code]\nfamily = \"generator-matrix\"\nrows = [\"10\", \"01\"]\n[[then]]\nstep = \"dual\"\n",
     "t.toml:1", "dimension 0", "at least 1"},
    {"NoDivisor", "[code]\nfamily = \"cyclic\"\ncodeword_length = 8\ngenerator = { algebra = \"x^3 + x + 1\" }\n",
     "t.toml:4", "x^3 + x + 1 does not divide x^8 - 1", "shortened-cyclic"},
    {"NoData",
     "[code]\nfamily = \"shortened-cyclic\"\ncodeword_length = 3\ngenerator = { algebra = \"x^3 + x + 1\" }\n",
     "t.toml:3", "leaves no data", "more than 3"},
    {"DivisibleByX",
     "[code]\nfamily = \"shortened-cyclic\"\ncodeword_length = 9\ngenerator = { algebra = \"x^3 + x\" }\n", "t.toml:4",
     "divisible by x", "divide it by x"},
    {"OrderAboveVariables", "[code]\nfamily = \"reed-muller\"\norder = 4\nvariables = 3\n", "t.toml:3", "the order 4",
     "0 to 3"},
    {"MatrixTooLarge", "[code]\nfamily = \"reed-muller\"\norder = 10\nvariables = 20\n", "t.toml:4", "elements",
     "are taken"},
    {"DimensionAboveLength",
     GF8 "[code]\nfamily = \"reed-solomon\"\ncodeword_length = 3\ndimension = 4\nevaluation_points = [0, 1, 2]\n",
     "t.toml:7", "the dimension 4 is larger than the length 3", "1 to 3"},
    {"PointTwice",
     GF8 "[code]\nfamily = \"reed-solomon\"\ncodeword_length = 3\ndimension = 2\nevaluation_points = [0, 1, 1]\n",
     "t.toml:8", "the evaluation point 1 stands twice", "distinct"},
    {"TooFewPoints",
     GF8 "[code]\nfamily = \"reed-solomon\"\ncodeword_length = 4\ndimension = 2\nevaluation_points = [0, 1, 3]\n",
     "t.toml:8", "3 evaluation points are listed, 4 are needed", "each position"},
    {"MultiplierZero",
     GF8 "[code]\nfamily = \"reed-solomon\"\ncodeword_length = 3\ndimension = 2\nevaluation_points = [0, 1, "
         "2]\nmultipliers = "
         "[1, 0, 1]\n",
     "t.toml:9", "a multiplier is 0", "must not"},
    {"NonPrimitiveOfRoots",
     "[field]\norder = 31\n[code]\nfamily = \"reed-solomon\"\ncodeword_length = 30\ndimension = 4\nfirst_root = "
     "1\nroot_step = "
     "1\nprimitive_element = 2\n",
     "t.toml:9", "2 is not a primitive element", "least primitive element is 3"},
    {"StepNotCoprime",
     "[field]\norder = 31\n[code]\nfamily = \"reed-solomon\"\ncodeword_length = 30\ndimension = 4\nfirst_root = "
     "1\nroot_step = "
     "5\nprimitive_element = 3\n",
     "t.toml:8", "root_step 5 has a factor in common with 30", "repeat"},
    {"TooLongForRoots",
     GF8 "[code]\nfamily = \"reed-solomon\"\ncodeword_length = 8\ndimension = 4\nfirst_root = 1\nroot_step = 1\n"
         "primitive_element = 2\n",
     "t.toml:6", "at most 7 symbols, not 8", "smaller"},
    {"NonPrimitiveInnerMaps",
     "[field]\norder = 16\nmodulus = \"x^4 + x + 1\"\n[code]\nfamily = \"justesen\"\nouter_length = 7\nouter_dimension "
     "= 3\n"
     "evaluation_points = \"powers\"\nprimitive_element = 8\n",
     "t.toml:9", "8 is not a primitive element", "least primitive element"},
    {"OuterDimension",
     GF8 "[code]\nfamily = \"justesen\"\nouter_length = 5\nouter_dimension = 6\nevaluation_points = \"powers\"\n"
         "primitive_element = 2\n",
     "t.toml:7", "the outer dimension 6", "1 to 5"},
    {"InnerAndOuterDoNotFit",
     "[code]\nfamily = \"concatenated\"\n[code.inner.code]\nfamily = \"generator-matrix\"\nrows = [\"101\", \"011\"]\n"
     "[code.outer.field]\norder = 8\nmodulus = \"x^3 + x + 1\"\n[code.outer.code]\nfamily = \"reed-solomon\"\n"
     "codeword_length = 7\ndimension = 3\nfirst_root = 1\nroot_step = 1\nprimitive_element = 2\n",
     "t.toml:3", "2^2 words, the outer symbols are 8", "equally many"},
    {"InnerRowsDepend",
     "[code]\nfamily = \"concatenated\"\n[code.inner.code]\nfamily = \"generator-matrix\"\nrows = [\"101\", \"101\", "
     "\"000\"]\n"
     "[code.outer.field]\norder = 8\nmodulus = \"x^3 + x + 1\"\n[code.outer.code]\nfamily = \"reed-solomon\"\n"
     "codeword_length = 7\ndimension = 3\nfirst_root = 1\nroot_step = 1\nprimitive_element = 2\n",
     "t.toml:5", "depend on one another", "drop"},
    {"NoBasis",
     GF8 "[code]\nfamily = \"reed-solomon\"\ncodeword_length = 3\ndimension = 2\nevaluation_points = [0, 1, "
         "2]\n[[then]]\nstep = "
         "\"binary-image\"\nbasis = [1, 2, 3]\n",
     "t.toml:10", "no basis", "linearly independent"},
};

INSTANTIATE_TEST_SUITE_P(Code, Constructions, testing::ValuesIn(refusals),
                         [](const auto& each) { return each.param.name; });

}  // namespace
}  // namespace assize::code
