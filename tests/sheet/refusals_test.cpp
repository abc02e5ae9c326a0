// Every refusal names the line, says what stands there, and says what to write instead.
#include <gtest/gtest.h>

#include "sheet/sheet_support.hpp"

namespace assize::sheet {
namespace {

struct Refusal {
  const char* name;
  const char* text;
  const char* where;
  const char* what;  ///< part of the message
  const char* cure;  ///< part of the cure
};

void PrintTo(const Refusal& refusal, std::ostream* out) { *out << refusal.name; }

class Refusals : public testing::TestWithParam<Refusal> {};

TEST_P(Refusals, NameTheLineAndTheCure) {
  const Refusal& wanted = GetParam();
  const auto read = read_text(wanted.text);
  ASSERT_FALSE(read) << "was accepted";
  EXPECT_EQ(read.error().where, wanted.where);
  EXPECT_NE(read.error().what.find(wanted.what), std::string::npos) << read.error().what;
  EXPECT_NE(read.error().cure.find(wanted.cure), std::string::npos) << read.error().cure;
}

constexpr Refusal refusals[] = {
    {"Empty", "", "t.toml", "the sheet is empty", "[code]"},
    {"NoCode", "title = \"x\"\n", "t.toml:1", "lacks the key \"code\"", "[code]"},
    {"NotToml", "[code]\nfamily = cyclic\n", "t.toml:2", "this is not TOML", "double quotes"},
    {"DuplicateKey", "title = \"a\"\ntitle = \"b\"\n[code]\n", "t.toml:2", "this is not TOML", ""},
    {"ByteOrderMark", "\xef\xbb\xbf[code]\n", "t.toml:1", "byte order mark", "plain UTF-8"},
    {"UnknownTopKey", "[code]\nfamily = \"reed-muller\"\norder = 1\nvariables = 3\n[cod]\n", "t.toml:5",
     "\"cod\" is not a key of the sheet", "title field code then"},
    {"UnknownKey", "[code]\nfamily = \"reed-muller\"\norder = 1\nvariables = 3\nvariable = 3\n", "t.toml:5",
     "\"variable\" is not a key of [code]", "variables"},
    {"AmbiguousLength", "[code]\nfamily = \"shortened-cyclic\"\nlength = 20\ngenerator = { exponents = [3, 1, 0] }\n",
     "t.toml:3", "\"length\" is not a key", "codeword_length (check symbols included) or data_length"},
    {"BothLengths",
     "[code]\nfamily = \"shortened-cyclic\"\ncodeword_length = 20\ndata_length = 17\ngenerator = { exponents = [3, 1, "
     "0] }\n",
     "t.toml:3", "both given", "keep one"},
    {"UnknownFamily", "[code]\nfamily = \"turbo\"\n", "t.toml:2", "\"turbo\" is not a family", "generator-matrix"},
    {"FamilyNotText", "[code]\nfamily = 3\n", "t.toml:2", "is an integer, not a string", "family = \"cyclic\""},
    {"OrderNoPrimePower", "[field]\norder = 6\n[code]\n", "t.toml:2", "6 is not a power of a prime", "2, 3, 4, 5"},
    {"OrderHuge", "[field]\norder = 99999999999999\n[code]\n", "t.toml:2", "out of range", "2 to 65536"},
    {"ModulusMissing", "[field]\norder = 8\n[code]\n", "t.toml:2", "modulus", "x^3 + x + 1"},
    {"ModulusReducible", "[field]\norder = 8\nmodulus = \"x^3 + x^2 + x + 1\"\n[code]\n", "t.toml:3",
     "x^3 + x^2 + x + 1 is reducible over GF(2): it is divisible by x + 1", "irreducible"},
    {"ModulusWrongDegree", "[field]\norder = 8\nmodulus = \"x^4 + x + 1\"\n[code]\n", "t.toml:3", "degree", "degree 3"},
    {"ModulusBareNumber", "[field]\norder = 8\nmodulus = \"0xB\"\n[code]\n", "t.toml:3", "bare number", "full-hex"},
    {"ModulusOfPrimeField", "[field]\norder = 7\nmodulus = \"x + 1\"\n[code]\n", "t.toml:3", "modulus", "leave"},
    {"RowsMissing", "[code]\nfamily = \"generator-matrix\"\n", "t.toml:1", "lacks the key \"rows\"", "rows = ["},
    {"RowsEmpty", "[code]\nfamily = \"generator-matrix\"\nrows = []\n", "t.toml:3", "not a list of rows", "rows = ["},
    {"RowEmpty", "[code]\nfamily = \"generator-matrix\"\nrows = [\"\"]\n", "t.toml:3", "a row is empty", "symbols"},
    {"Ragged", "[code]\nfamily = \"generator-matrix\"\nrows = [\n\"101\",\n\"0110\",\n]\n", "t.toml:5",
     "row 2 has 4 symbols, the first row has 3", "same length"},
    {"ElementOutOfRange", "[field]\norder = 3\n[code]\nfamily = \"generator-matrix\"\nrows = [\"1 0 3\"]\n", "t.toml:5",
     "3 is not an element of GF(3)", "0 to 2"},
    {"ElementNegative", "[field]\norder = 3\n[code]\nfamily = \"generator-matrix\"\nrows = [[1, -1]]\n", "t.toml:5",
     "\"-1\" is not an element", "0 to 2"},
    {"SymbolsNotSeparated", "[field]\norder = 5\n[code]\nfamily = \"generator-matrix\"\nrows = [\"10024\"]\n",
     "t.toml:5", "10024 is not an element of GF(5)", "separated by blanks"},
    {"PowerInPrimeField", "[field]\norder = 5\n[code]\nfamily = \"generator-matrix\"\nrows = [\"1 x^2\"]\n", "t.toml:5",
     "\"x^2\" is not an element", "0 to 4"},
    {"BarePolynomial", "[code]\nfamily = \"shortened-cyclic\"\ncodeword_length = 30\ngenerator = 0x97\n", "t.toml:4",
     "generator is a bare number", "implicit-one-hex"},
    {"BarePolynomialText", "[code]\nfamily = \"shortened-cyclic\"\ncodeword_length = 30\ngenerator = \"0x1021\"\n",
     "t.toml:4", "generator is a bare number", "degree = 16 }  means  x^16 + x^12 + x^5 + 1"},
    {"UnknownNotation",
     "[code]\nfamily = \"cyclic\"\ncodeword_length = 7\ngenerator = { notation = \"hex\", value = \"0xB\" }\n",
     "t.toml:4", "\"hex\" is not a notation", "full-hex"},
    {"NotationWithoutDegree",
     "[code]\nfamily = \"cyclic\"\ncodeword_length = 7\ngenerator = { notation = \"reversed-hex\", value = \"0xB\" }\n",
     "t.toml:4", "lacks the key \"degree\"", "degree = 16"},
    {"TooLargeForDegree",
     "[code]\nfamily = \"cyclic\"\ncodeword_length = 7\ngenerator = { notation = \"implicit-top-hex\", value = "
     "\"0xB\", degree = 3 }\n",
     "t.toml:4", "does not fit", "2^degree"},
    {"NotHex",
     "[code]\nfamily = \"cyclic\"\ncodeword_length = 7\ngenerator = { notation = \"full-hex\", value = \"B\" }\n",
     "t.toml:4", "not a hexadecimal number", "0x"},
    {"ZeroPolynomial", "[code]\nfamily = \"cyclic\"\ncodeword_length = 7\ngenerator = { coefficients = [0, 0] }\n",
     "t.toml:4", "zero polynomial", ""},
    {"AlgebraTwice", "[code]\nfamily = \"cyclic\"\ncodeword_length = 7\ngenerator = { algebra = \"x + x\" }\n",
     "t.toml:4", "has the power x^1 twice", "once"},
    {"AlgebraForeign", "[code]\nfamily = \"cyclic\"\ncodeword_length = 7\ngenerator = { algebra = \"D^3 + D + 1\" }\n",
     "t.toml:4", "not a polynomial in x", "x^3 + x + 1"},
    {"ExponentTwice", "[code]\nfamily = \"cyclic\"\ncodeword_length = 7\ngenerator = { exponents = [3, 1, 1] }\n",
     "t.toml:4", "the exponent 1 stands twice", "once"},
    {"ExponentHuge", "[code]\nfamily = \"cyclic\"\ncodeword_length = 7\ngenerator = { exponents = [99999999] }\n",
     "t.toml:4", "out of range", "65536"},
    {"HexOverOtherField",
     "[field]\norder = 3\n[code]\nfamily = \"cyclic\"\ncodeword_length = 8\ngenerator = { notation = \"full-hex\", "
     "value = \"0xB\" }\n",
     "t.toml:6", "for GF(2) only", "algebra"},
    {"LengthZero", "[code]\nfamily = \"cyclic\"\ncodeword_length = 0\ngenerator = { exponents = [0] }\n", "t.toml:3",
     "out of range", "1 to"},
    {"LengthHuge", "[code]\nfamily = \"cyclic\"\ncodeword_length = 9999999999\ngenerator = { exponents = [0] }\n",
     "t.toml:3", "out of range", "1048576"},
    {"LengthFraction", "[code]\nfamily = \"cyclic\"\ncodeword_length = 7.5\ngenerator = { exponents = [0] }\n",
     "t.toml:3", "a number with a fraction", "plain number"},
    {"DimensionAboveLength", "[code]\nfamily = \"random-linear\"\ncodeword_length = 5\ndimension = 6\nseed = 1\n",
     "t.toml:4", "out of range", "1 to 5"},
    {"UnknownStep", "[code]\nfamily = \"reed-muller\"\norder = 1\nvariables = 3\n[[then]]\nstep = \"double\"\n",
     "t.toml:6", "\"double\" is not a step", "extend"},
    {"StepTable", "[code]\nfamily = \"reed-muller\"\norder = 1\nvariables = 3\n[then]\nstep = \"extend\"\n", "t.toml:5",
     "\"then\" is a table", "[[then]]"},
    {"ImageOfBinary", "[code]\nfamily = \"reed-muller\"\norder = 1\nvariables = 3\n[[then]]\nstep = \"binary-image\"\n",
     "t.toml:6", "only codes over GF(2^m)", "leave"},
    {"JustesenOverPrime", "[field]\norder = 7\n[code]\nfamily = \"justesen\"\n", "t.toml:1", "GF(2^m)", "order = 8"},
    {"PowersOfNonPrimitive",
     "[field]\norder = 16\nmodulus = \"x^4 + x^3 + x^2 + x + 1\"\n[code]\nfamily = \"justesen\"\nouter_length = 7\n"
     "outer_dimension = 3\nevaluation_points = \"powers\"\nprimitive_element = 3\n",
     "t.toml:8", "the class of x is not primitive", "list the evaluation points"},
    {"TooManyPowers",
     "[field]\norder = 8\nmodulus = \"x^3 + x + 1\"\n[code]\nfamily = \"justesen\"\nouter_length = 8\n"
     "outer_dimension = 3\nevaluation_points = \"powers\"\nprimitive_element = 3\n",
     "t.toml:8", "are 7 points, 8 are needed", "shorter"},
    {"MissingSubSheet", "[code]\nfamily = \"concatenated\"\nouter = \"outer.toml\"\ninner = \"inner.toml\"\n",
     "t.toml:3", "outer.toml: there is no such file", "check the name"},
    {"NestedError",
     "[code]\nfamily = \"concatenated\"\ninner = \"inner.toml\"\n[code.outer.code]\nfamily = \"cyclic\"\n", "t.toml:4",
     "lacks the key \"generator\"", "generator ="},
};

INSTANTIATE_TEST_SUITE_P(Sheet, Refusals, testing::ValuesIn(refusals),
                         [](const auto& each) { return each.param.name; });

TEST(Refusals, HopelessBytes) {
  EXPECT_NE(read_text(std::string("a = 1\n\0", 7)).error().what.find("zero byte"), std::string::npos);
  EXPECT_NE(read_text(std::string(largest_sheet + 1, ' ')).error().what.find("larger than"), std::string::npos);
  EXPECT_FALSE(read_text("a" + std::string(100000, '.') + "b = 1"));
  EXPECT_FALSE(read_text("a = " + std::string(100000, '[')));
  EXPECT_FALSE(
      read_text("\x7f"
                "ELF\x02\x01\x01"));
  std::string nested = "[code]\nfamily = \"concatenated\"\n";
  std::string path = "code.outer";
  for (int i = 0; i < 12; ++i, path += ".code.outer") nested += "[" + path + ".code]\nfamily = \"concatenated\"\n";
  EXPECT_NE(read_text(nested).error().what.find("nested more than"), std::string::npos);
}

}  // namespace
}  // namespace assize::sheet
