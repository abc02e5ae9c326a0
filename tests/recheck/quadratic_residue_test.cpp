// Quadratic residue codes of known distance, and generators that are none or the wrong one of the two.
#include "expect.hpp"

namespace assize::recheck::test {
namespace {

Value residue_description(const PlainField& f, std::uint64_t p, const std::string& g,
                          const std::vector<Value>& steps = {}) {
  return description_value(f, {{"family", text("quadratic-residue")}, {"prime", number(p)}, {"generator", text(g)}},
                           steps);
}

Draft residue(const PlainField& f, unsigned p, const Vector& g) {
  return {residue_description(f, p, word(f, g)), f, multiples(g, p)};
}

const Vector lesser_17{1, 0, 0, 1, 1, 1, 0, 0, 1};
const Vector greater_17{1, 1, 1, 0, 1, 0, 1, 1, 1};

TEST(QuadraticResidue, Binary) {
  expect_code(residue(prime(2), 7, {1, 1, 0, 1}), 4, 3, "[7,4,3]");
  expect_code(residue(prime(2), 17, lesser_17), 9, 5, "[17,9,5]");
  expect_code(residue(prime(2), 23, golay_generator), 12, 7, "Golay");
  Draft golay_code = residue(prime(2), 23, golay_generator);
  state_everything(golay_code, 6);
  EXPECT_EQ(golay_code.statements[1].text, minimum_words(7, 253, {0}).text);
}

TEST(QuadraticResidue, Ternary) {
  expect_code(residue(prime(3), 11, {2, 2, 1, 2, 0, 1}), 6, 5, "ternary Golay");
  expect_code(residue(prime(3), 13, {1, 0, 2, 2, 2, 0, 1}), 7, 5, "[13,7,5]");
}

TEST(QuadraticResidue, Quaternary) {
  expect_code(residue(gf4, 3, {2, 1}), 2, 2, "[3,2,2]");
  expect_code(residue(gf4, 5, {1, 2, 1}), 3, 3, "[5,3,3]");
  Rows extended = multiples({1, 2, 1}, 5);
  for (Vector& row : extended) {
    unsigned sum = 0;
    for (const unsigned s : row) sum ^= s;
    row.push_back(sum);
  }
  expect_code({residue_description(gf4, 5, "1 2 1", {step("extend")}), gf4, extended}, 3, 4, "hexacode");
  expect_code(residue(gf4, 7, {1, 1, 0, 1}), 4, 3, "[7,4,3] over GF(4)");
}

TEST(QuadraticResidue, QuaternaryByItsZeros) {
  const PlainField roots{2, {1, 1, 0, 0, 1, 0, 1, 0, 0, 0, 0, 0, 1}};  // x^12 + x^6 + x^4 + x + 1, irreducible
  const unsigned beta = roots.power(2, 4095 / 13);
  ASSERT_NE(beta, 1U);
  std::vector<Vector> both;
  for (const std::vector<unsigned>& zeros : {std::vector<unsigned>{1, 3, 4, 9, 10, 12}, {2, 5, 6, 7, 8, 11}}) {
    std::vector<unsigned> images{0, 1, roots.power(2, 4095 / 3)};
    images.push_back(images[2] ^ 1U);
    both.push_back(polynomial_of_zeros(roots, beta, zeros, images));
  }
  if (std::lexicographical_compare(both[1].rbegin(), both[1].rend(), both[0].rbegin(), both[0].rend()))
    std::swap(both[0], both[1]);
  expect_code(residue(gf4, 13, both[0]), 7, 5, "[13,7,5] over GF(4)");
  expect_refused(residue_description(gf4, 13, word(gf4, both[1])), ".code.generator", "greater of the two");
}

TEST(QuadraticResidue, TheGreaterOfTheTwo) {
  const auto greater = [](const PlainField& f, unsigned p, const Vector& g) {
    expect_refused(residue_description(f, p, word(f, g)), ".code.generator", "greater of the two");
  };
  greater(prime(2), 7, {1, 0, 1, 1});
  greater(prime(2), 17, greater_17);
  greater(prime(2), 23, {1, 0, 1, 0, 1, 1, 1, 0, 0, 0, 1, 1});
  greater(prime(3), 11, {2, 0, 1, 2, 1, 1});
  greater(gf4, 5, {1, 3, 1});
  greater(gf4, 3, {3, 1});
}

TEST(QuadraticResidue, WrongGenerators) {
  const auto wrong = [](const PlainField& f, unsigned p, const std::string& g, const std::string& why) {
    expect_refused(residue_description(f, p, g), ".code.generator", why);
  };
  wrong(prime(2), 17, "100111011", "does not divide");
  wrong(prime(2), 17, "1001110010", "not zero");
  wrong(prime(2), 17, "1111", "degree");
  wrong(prime(2), 17, "11111111111111111", "degree");
  wrong(prime(2), 17, "", "not zero");
  wrong(prime(3), 11, "1 1 2 1 0 2", "monic");
  wrong(gf4, 3, "1 1", "x - 1");
  // x^31 - 1 has six factors of degree 5; the zeros 1, 3, 5 and those conjugate to them are a BCH code's.
  const PlainField roots{2, {1, 0, 1, 0, 0, 1}};
  const Vector g = polynomial_of_zeros(roots, 2, {1, 2, 4, 8, 16, 3, 6, 12, 24, 17, 5, 10, 20, 9, 18}, {0, 1});
  wrong(prime(2), 31, word(prime(2), g), "neither the residues nor the non-residues");
}

TEST(QuadraticResidue, WrongPrimesAndFields) {
  const auto wrong = [](const PlainField& f, std::uint64_t p, const std::string& why) {
    expect_refused(residue_description(f, p, "1"), ".code.prime", why);
  };
  wrong(prime(2), 15, "odd prime");
  wrong(prime(2), 16, "odd prime");
  wrong(prime(2), 2, "from 3 to 1048576");
  wrong(prime(2), 0, "from 3 to 1048576");
  wrong(prime(2), 1 << 20, "odd prime");
  wrong(prime(2), (1 << 20) + 7, "from 3 to 1048576");
  wrong(prime(2), 1021 * 1021, "odd prime");
  wrong(prime(3), 3, "characteristic");
  wrong(prime(2), 5, "not a square");
  wrong(prime(3), 7, "not a square");
  expect_refused(residue_description(prime(5), 11, "1"), ".code", "GF(2), GF(3) or GF(4)");
  expect_refused(residue_description(prime(2), 1048573, "1"), ".code.prime", "not a square");
  expect_refused(residue_description(gf4, 1048573, "1"), ".code", "2^27");
}

}  // namespace
}  // namespace assize::recheck::test
