// `assize field`: first lines, counts, refusals, and the shapes of its CSV and JSON.
#include <algorithm>

#include "cli/program.hpp"

namespace assize::cli {
namespace {

class FieldCommand : public InFolder {
 protected:
  /// Standard output of a call that must succeed.
  [[nodiscard]] std::string out(std::vector<std::string> words) const {
    words.insert(words.begin(), "field");
    const Ran ran = assize(words);
    EXPECT_EQ(ran.code, 0) << ran.err;
    EXPECT_EQ(ran.err, "");
    return ran.out;
  }
  [[nodiscard]] std::string first_line(const std::vector<std::string>& words) const {
    const std::string text = out(words);
    return text.substr(0, text.find('\n'));
  }
};

std::size_t lines(const std::string& text) { return static_cast<std::size_t>(std::ranges::count(text, '\n')); }

std::size_t times(const std::string& text, const std::string& part) {
  std::size_t count = 0;
  for (std::size_t at = text.find(part); at != std::string::npos; at = text.find(part, at + 1)) ++count;
  return count;
}

TEST_F(FieldCommand, HelpIsThere) {
  const Ran page = assize({"field", "--help"});
  EXPECT_EQ(page.code, 0);
  EXPECT_NE(page.out.find("examples:"), std::string::npos);
  EXPECT_NE(assize({"--help"}).out.find("  field Q "), std::string::npos);
}

// Numbers of irreducible and primitive polynomials: the formulas, which the program states; 4080 and 2048 of degree 16,
// 30 and 16 of degree 8 are in S. W. Golomb, Shift Register Sequences.
TEST_F(FieldCommand, FirstLines) {
  EXPECT_EQ(first_line({"4"}),
            "GF(4) = GF(2^2): 1 monic irreducible polynomial of degree 2 over GF(2), 1 of them primitive");
  EXPECT_EQ(first_line({"256"}),
            "GF(256) = GF(2^8): 30 monic irreducible polynomials of degree 8 over GF(2), 16 of them primitive");
  EXPECT_EQ(first_line({"65536"}),
            "GF(65536) = GF(2^16): 4080 monic irreducible polynomials of degree 16 over GF(2), 2048 of them primitive");
  EXPECT_EQ(first_line({"9"}),
            "GF(9) = GF(3^2): 3 monic irreducible polynomials of degree 2 over GF(3), 2 of them primitive");
  EXPECT_EQ(first_line({"2"}), "GF(2): 1 primitive element");
  EXPECT_EQ(first_line({"65521"}), "GF(65521): 13824 primitive elements");
  EXPECT_EQ(first_line({"16", "--modulus", "x^4 + x + 1"}),
            "GF(16) = GF(2^4), modulus x^4 + x + 1: 8 primitive elements in 2 classes of conjugates");
  EXPECT_EQ(first_line({"8", "--modulus", "x^3+x+1", "--table"}),
            "GF(8) = GF(2^3), modulus x^3 + x + 1: logarithms to x");
  EXPECT_EQ(first_line({"7", "--table"}), "GF(7): logarithms to 3");
  EXPECT_EQ(out({"7", "--quiet"}), "GF(7): 2 primitive elements\n");
}

TEST_F(FieldCommand, CountsStandBesideTheirFormulas) {
  const std::string text = out({"64"});
  EXPECT_NE(text.find("  irreducible  9 found; by formula (2^6 - 2^3 - 2^2 + 2)/6 = 9\n"), std::string::npos) << text;
  EXPECT_NE(text.find("  primitive    6 found; by formula phi(63)/6 = 6\n"), std::string::npos) << text;
}

// F. J. MacWilliams, N. J. A. Sloane, The Theory of Error-Correcting Codes, chapters 4 and 7.
TEST_F(FieldCommand, ClassesOfConjugatesAreThePublishedOnes) {
  EXPECT_EQ(out({"16", "--modulus", "x^4 + x + 1", "--csv"}),
            "order,minimal_polynomial,exponents,elements,primitive\n"
            "1,x + 1,0,1,\n"
            "15,x^4 + x + 1,1 2 4 8,2 4 3 5,primitive\n"
            "5,x^4 + x^3 + x^2 + x + 1,3 6 12 9,8 12 15 10,\n"
            "3,x^2 + x + 1,5 10,6 7,\n"
            "15,x^4 + x^3 + 1,7 14 13 11,11 9 13 14,primitive\n");
}

// FIPS 197: the modulus x^8 + x^4 + x^3 + x + 1; x has order 51 there.
TEST_F(FieldCommand, WhereXIsNotPrimitiveTheLeastPrimitiveElementIsUsedAndSaid) {
  const std::string text = out({"256", "--modulus", "x^8 + x^4 + x^3 + x + 1"});
  EXPECT_NE(text.find("  exponents           modulo 255, of x + 1 (element 3), the least primitive element: x is not "
                      "primitive, its order is 51\n"),
            std::string::npos)
      << text;
  const std::string table = out({"256", "--modulus", "x^8 + x^4 + x^3 + x + 1", "--table"});
  EXPECT_TRUE(
      table.starts_with("GF(256) = GF(2^8), modulus x^8 + x^4 + x^3 + x + 1: logarithms to x + 1\n"
                        "  base   x + 1 (element 3), the least primitive element: x is not primitive, its "
                        "order is 51\n"))
      << table;
}

TEST_F(FieldCommand, LongListsAreCutAndSaySo) {
  const std::string polynomials = out({"65536"});
  EXPECT_NE(polynomials.find("               ... 4016 more; --csv lists all\n"), std::string::npos);
  EXPECT_LT(lines(polynomials), 80U);
  const std::string table = out({"256", "--modulus", "x^8+x^4+x^3+x^2+1", "--table"});
  EXPECT_NE(table.find("         ... 191 more; --csv lists all\n"), std::string::npos);
  EXPECT_NE(out({"257"}).find("                      ... 64 more; --csv lists all\n"), std::string::npos);
  EXPECT_EQ(out({"256"}).find(" more; "), std::string::npos);
}

TEST_F(FieldCommand, CsvIsWholeUnderOneHeaderLine) {
  const std::string polynomials = out({"256", "--csv"});
  EXPECT_TRUE(
      polynomials.starts_with("polynomial,coefficients,order_of_x,primitive\n"
                              "x^8 + x^4 + x^3 + x + 1,1 1 0 1 1 0 0 0 1,51,\n"
                              "x^8 + x^4 + x^3 + x^2 + 1,1 0 1 1 1 0 0 0 1,255,primitive\n"))
      << polynomials;
  EXPECT_EQ(lines(polynomials), 31U);
  EXPECT_EQ(times(polynomials, ",primitive\n"), 17U) << "16 and the header";
  EXPECT_EQ(lines(out({"65536", "--csv"})), 4081U);
  EXPECT_EQ(out({"7", "--csv"}), "primitive_element\n3\n5\n");
  EXPECT_EQ(lines(out({"65521", "--csv"})), 13825U);
  EXPECT_EQ(lines(out({"65536", "--modulus", "x^16+x^5+x^3+x^2+1", "--table", "--csv"})), 65536U);
  EXPECT_EQ(out({"4", "--modulus", "x^2+x+1", "--table", "--csv"}),
            "exponent,element,polynomial,digits\n0,1,1,1 0\n1,2,x,0 1\n2,3,x + 1,1 1\n");
}

TEST_F(FieldCommand, JsonIsOneDocument) {
  EXPECT_EQ(out({"4", "--json"}),
            "{\n\"order\":4,\n\"characteristic\":2,\n\"degree\":2,\n\"modulus\":null,\n"
            "\"irreducible\":{\"count\":1,\"formula\":\"(2^2 - 2)/2 = 1\"},\n"
            "\"primitive\":{\"count\":1,\"formula\":\"phi(3)/2 = 1\"},\n"
            "\"polynomials\":[\n{\n\"polynomial\":\"x^2 + x + 1\",\n\"coefficients\":[1,1,1],\n\"order_of_x\":3,\n"
            "\"primitive\":true}]}\n");
  EXPECT_EQ(out({"7", "--json"}),
            "{\n\"order\":7,\n\"characteristic\":7,\n\"degree\":1,\n\"modulus\":null,\n"
            "\"base\":{\"element\":3,\"polynomial\":\"3\",\"is_x\":false,\"order_of_x\":null},\n"
            "\"primitive\":{\"count\":2,\"formula\":\"phi(6) = 2\"},\n\"primitive_elements\":[3,5]}\n");
  const std::string classes = out({"256", "--modulus", "x^8+x^4+x^3+x^2+1", "--json"});
  EXPECT_NE(classes.find("\"modulus\":\"x^8 + x^4 + x^3 + x^2 + 1\",\n"
                         "\"base\":{\"element\":2,\"polynomial\":\"x\",\"is_x\":true,\"order_of_x\":255},\n"
                         "\"primitive\":{\"count\":128,\"formula\":\"phi(255) = 128\"},\n"),
            std::string::npos);
  EXPECT_EQ(times(classes, "\"minimal_polynomial\":"), 35U) << "as many as there are cosets modulo 255";
  EXPECT_EQ(times(classes, "\"primitive\":true"), 16U);
  const std::string table = out({"9", "--modulus", "x^2+x+2", "--table", "--json"});
  EXPECT_EQ(times(table, "\"exponent\":"), 8U);
  EXPECT_NE(table.find("{\n\"exponent\":2,\n\"element\":7,\n\"polynomial\":\"2*x + 1\",\n\"digits\":[1,2]}"),
            std::string::npos)
      << table;
}

TEST_F(FieldCommand, RefusalsAreExitCodeTwoWithACure) {
  const std::string covered = "\n  use a prime power up to 256, or a prime or a power of 2 up to 65536\n";
  const std::string example =
      "\n  state a monic irreducible polynomial of degree 3 over GF(2), for example x^3 + x + 1\n";
  const std::vector<std::pair<std::vector<std::string>, std::string>> refused = {
      {{"6"}, "assize: 6 is not a prime power\n  give the order of a field; the nearest ones are 5 and 7\n"},
      {{"0"}, "assize: 0 is not the order of a field\n  give a prime power from 2 up, for example 2\n"},
      {{"1"}, "assize: 1 is not the order of a field\n  give a prime power from 2 up, for example 2\n"},
      {{"x"}, "assize: \"x\" is not the order of a field\n  write a prime power in plain digits, for example 8\n"},
      {{"2^3"}, "assize: \"2^3\" is not the order of a field\n  write a prime power in plain digits, for example 8\n"},
      {{"99999999999999999999"},
       "assize: 99999999999999999999 is above the largest order of a field that can be worked in" + covered},
      {{"729"}, "assize: GF(729) = GF(3^6) is not among the fields that can be worked in" + covered},
      {{"65537"}, "assize: GF(65537) is not among the fields that can be worked in" + covered},
      {{"131072"}, "assize: GF(131072) = GF(2^17) is not among the fields that can be worked in" + covered},
      {{"8", "--table"}, "assize: --modulus: GF(8) = GF(2^3) needs a modulus and none is given" + example},
      {{"8", "--modulus", "x^3 + 1"},
       "assize: --modulus: the modulus x^3 + 1 is reducible over GF(2): it is divisible by x + 1" + example},
      {{"8", "--modulus", "x^4 + x + 1"},
       "assize: --modulus: the modulus x^4 + x + 1 has degree 4, but GF(8) = GF(2^3) needs degree 3" + example},
      {{"8", "--modulus", "0"}, "assize: --modulus: the modulus is the zero polynomial" + example},
      {{"8", "--modulus", "y"}, "assize: --modulus: \"y\" is not a polynomial in x"},
      {{"8", "--modulus", ""}, "assize: --modulus: the modulus is empty"},
      {{"7", "--modulus", "x + 1"}, "assize: --modulus: GF(7) is a prime field and takes no modulus"},
      {{}, "assize: command line: assize field needs a Q"},
      {{"8", "--at-least", "3"}, "is not a flag of assize field"},
      {{"8", "--csv", "--quiet"}, "assize: command line: --csv and --quiet exclude each other"},
  };
  for (const auto& [tail, says] : refused) {
    std::vector<std::string> words = {"field"};
    words.insert(words.end(), tail.begin(), tail.end());
    const Ran ran = assize(words);
    EXPECT_EQ(ran.code, 2) << says;
    EXPECT_EQ(ran.out, "") << says;
    EXPECT_NE(ran.err.find(says), std::string::npos) << ran.err;
    words.emplace_back("--json");
    const Ran json = assize(words);
    EXPECT_EQ(json.code, 2) << says;
    EXPECT_TRUE(json.out.starts_with("{\n\"error\":{\"what\":\"")) << json.out;
  }
}

TEST_F(FieldCommand, EveryCoveredOrderUpTo256IsAnswered) {
  std::size_t answered = 0;
  for (int q = 2; q <= 256; ++q) {
    const int code = assize({"field", std::to_string(q), "--csv"}).code;
    EXPECT_TRUE(code == 0 || code == 2) << q;
    answered += code == 0 ? 1U : 0U;
  }
  EXPECT_EQ(answered, 70U) << "54 primes and 16 proper prime powers";
}

}  // namespace
}  // namespace assize::cli
