// One polynomial, every notation; and the canonical spelling of a description.
#include <gtest/gtest.h>

#include "sheet/canonical.hpp"
#include "sheet/polynomial_notation.hpp"
#include "sheet/sheet_support.hpp"

namespace assize::sheet {
namespace {

/// The generator of a shortened cyclic sheet, as coefficients.
field::Polynomial generator(const std::string& written, const std::string& field = "") {
  const auto read =
      read_text(field + "[code]\nfamily = \"shortened-cyclic\"\ncodeword_length = 40\ngenerator = " + written + "\n");
  EXPECT_TRUE(read) << read.error().what;
  return std::get<Cyclic>(read->family).generator.value;
}

// The notations of x^8 + x^5 + x^3 + x^2 + x + 1: common practice of the trade, no source.
TEST(Notations, AllMeanTheSamePolynomial) {
  const field::Polynomial wanted{1, 1, 1, 1, 0, 1, 0, 0, 1};
  for (const char* written : {
           R"({ notation = "full-hex", value = "0x12F" })",
           R"({ notation = "full-hex", value = "0x012f" })",
           R"({ notation = "implicit-top-hex", value = "0x2F", degree = 8 })",
           R"({ notation = "implicit-one-hex", value = "0x97" })",
           R"({ notation = "reversed-hex", value = "0xF4", degree = 8 })",
           R"({ exponents = [8, 5, 3, 2, 1, 0] })",
           R"({ algebra = "x^8+x^5 + x^3+x^2+x+1" })",
           R"({ coefficients = [1, 1, 1, 1, 0, 1, 0, 0, 1] })",
           R"({ coefficients = "111101001" })",
       })
    EXPECT_EQ(generator(written), wanted) << written;
}

// IEEE 802.3 clause 3.2.9 gives the exponents; the hexadecimal forms are common practice, no source.
TEST(Notations, EthernetFrameCheck) {
  const auto exponents = generator("{ exponents = [32, 26, 23, 22, 16, 12, 11, 10, 8, 7, 5, 4, 2, 1, 0] }");
  EXPECT_EQ(generator(R"({ notation = "implicit-top-hex", value = "0x04C11DB7", degree = 32 })"), exponents);
  EXPECT_EQ(generator(R"({ notation = "reversed-hex", value = "0xEDB88320", degree = 32 })"), exponents);
  EXPECT_EQ(generator(R"({ notation = "full-hex", value = "0x104C11DB7" })"), exponents);
  EXPECT_EQ(every_notation(exponents),
            "full-hex 0x104C11DB7\nimplicit-top-hex 0x4C11DB7, degree 32\nimplicit-one-hex 0x82608EDB\n"
            "reversed-hex 0xEDB88320, degree 32");
}

// CCSDS 231.0-B: x^7 + x^6 + x^2 + 1 = (x + 1)(x^6 + x + 1).
TEST(Notations, Factors) {
  EXPECT_EQ(generator(R"({ factors = ["x + 1", "x^6 + x + 1"] })"), generator("{ exponents = [7, 6, 2, 0] }"));
}

TEST(Notations, OtherFields) {
  EXPECT_EQ(generator(R"({ algebra = "x^2 + 2*x + 1" })", "[field]\norder = 3\n"), (field::Polynomial{1, 2, 1}));
  EXPECT_EQ(generator(R"({ coefficients = [1, "x", "x^2"] })", "[field]\norder = 8\nmodulus = \"x^3 + x + 1\"\n"),
            (field::Polynomial{1, 2, 4}));
  EXPECT_EQ(
      generator(R"({ coefficients = ["x^3", "x^7", "x^2+1"] })", "[field]\norder = 8\nmodulus = \"x^3 + x + 1\"\n"),
      (field::Polynomial{3, 1, 5}));
}

TEST(Canonical, DoesNotDependOnHowTheSheetIsWritten) {
  const auto a = read_text(
      "title = \"one\"\n[code]\nfamily = \"shortened-cyclic\"\ncodeword_length = 20\n"
      "generator = { exponents = [3, 1, 0] }\n");
  const auto b = read_text(
      "# two\n[field]\norder = 2\n[code]\ngenerator = { notation = \"full-hex\", value = \"0xB\" }\n"
      "data_length = 17\nfamily = \"shortened-cyclic\"\n");
  ASSERT_TRUE(a && b);
  EXPECT_EQ(to_json(*a).text(),
            "{\n\"field\":{\"order\":2},\n\"code\":{\"family\":\"shortened-cyclic\",\"codeword_length\":20,"
            "\"generator\":\"1101\"}}");
  EXPECT_EQ(description_digest(*a), description_digest(*b));
}

TEST(Canonical, FillsInEveryDefault) {
  const auto read = read_text(
      "[field]\norder = 8\nmodulus = { exponents = [3, 1, 0] }\n[code]\nfamily = \"justesen\"\nouter_length = 7\n"
      "outer_dimension = 3\nevaluation_points = \"powers\"\nprimitive_element = \"x^2\"\n"
      "[[then]]\nstep = \"extend\"\n");
  ASSERT_TRUE(read) << read.error().what;
  EXPECT_EQ(
      to_json(*read).text(),
      "{\n\"field\":{\"order\":8,\"modulus\":\"1101\"},\n\"code\":{\"family\":\"justesen\",\"outer_length\":7,"
      "\"outer_dimension\":3,\"evaluation_points\":\"1 2 4 3 6 7 5\",\"primitive_element\":\"4\",\"first_exponent\":0,"
      "\"image\":\"bits\"},\n\"then\":[\n{\"step\":\"extend\"}]}");
}

}  // namespace
}  // namespace assize::sheet
