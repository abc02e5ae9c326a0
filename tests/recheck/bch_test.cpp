// BCH codes with published parameters, against generators multiplied out over all zeros; and descriptions of none.
#include <set>

#include "expect.hpp"

namespace assize::recheck::test {
namespace {

Value bch_description(const PlainField& f, std::uint64_t n, std::uint64_t delta, std::uint64_t b,
                      const std::string& modulus, const std::vector<Value>& steps = {}) {
  return description_value(f,
                           {{"family", text("bch")},
                            {"codeword_length", number(n)},
                            {"designed_distance", number(delta)},
                            {"first_exponent", number(b)},
                            {"root_modulus", text(modulus)}},
                           steps);
}

Draft bch(const PlainField& f, unsigned n, unsigned delta, std::uint64_t b, const Vector& modulus) {
  const PlainField roots{f.p, modulus};
  const unsigned x = roots.degree() == 1 ? roots.negative(modulus[0]) : roots.p;
  std::set<unsigned> zeros;
  for (unsigned i = 0; i + 1 < delta; ++i)
    for (unsigned j = static_cast<unsigned>((b + i) % n); zeros.insert(j).second;) j = j * f.order() % n;
  const Vector g = polynomial_of_zeros(roots, roots.power(x, (roots.order() - 1) / n),
                                       std::vector<unsigned>(zeros.begin(), zeros.end()), images_of(f, roots));
  return {bch_description(f, n, delta, b, word(prime(f.p), modulus)), f, multiples(g, n)};
}

const Vector gf16_modulus{1, 1, 0, 0, 1};
const Vector gf32_modulus{1, 0, 1, 0, 0, 1};
const Vector gf64_modulus{1, 1, 0, 0, 0, 0, 1};

// F. J. MacWilliams, N. J. A. Sloane, The Theory of Error-Correcting Codes, chapter 9.
TEST(Bch, BinaryOfLength15And31) {
  expect_code(bch(prime(2), 7, 3, 1, {1, 1, 0, 1}), 4, 3, "[7,4,3]");
  expect_code(bch(prime(2), 15, 5, 1, gf16_modulus), 7, 5, "[15,7,5]");
  expect_code(bch(prime(2), 15, 7, 1, gf16_modulus), 5, 7, "[15,5,7]");
  expect_code(bch(prime(2), 15, 15, 1, gf16_modulus), 1, 15, "[15,1,15]");
  expect_code(bch(prime(2), 31, 11, 1, gf32_modulus), 11, 11, "[31,11,11]");
  expect_code(bch(prime(2), 31, 7, 1, gf32_modulus), 16, 7, "[31,16,7]");
  expect_code(bch(prime(2), 15, 6, 0, gf16_modulus), 6, 6, "[15,6,6]");
}

TEST(Bch, FirstExponentIsTakenModuloTheLength) {
  expect_code(bch(prime(2), 15, 4, 14, gf16_modulus), 6, 6, "zeros at -1, 0, 1");
  expect_code(bch(prime(2), 15, 3, (std::uint64_t{1} << 53) - 1, gf16_modulus), 11, 3, "a giant first exponent");
}

TEST(Bch, BinaryOfLength63) {
  expect_replayed(bch(prime(2), 63, 13, 1, gf64_modulus), 30, "[63,30,13]");
  expect_replayed(bch(prime(2), 63, 3, 1, gf64_modulus), 57, "[63,57,3]");
  expect_code(bch(prime(2), 63, 27, 1, gf64_modulus), 10, 27, "[63,10,27]");
}

TEST(Bch, RootsThatAreNotPowersOfAPrimitiveElement) {
  expect_code(bch(prime(2), 21, 5, 1, gf64_modulus), 12, 5, "[21,12,5]");
  expect_code(bch(prime(2), 5, 2, 1, {1, 1, 1, 1, 1}), 1, 5, "X of order 5 in GF(16)");
}

TEST(Bch, Ternary) {
  const Vector gf9_modulus{2, 1, 1};
  const Vector gf27_modulus{1, 2, 0, 1};
  expect_code(bch(prime(3), 8, 3, 1, gf9_modulus), 4, 4, "[8,4,4], zeros 1, 2, 3, 6");
  expect_code(bch(prime(3), 8, 5, 1, gf9_modulus), 3, 5, "[8,3,5]");
  expect_code(bch(prime(3), 26, 14, 1, gf27_modulus), 7, 14, "[26,7,14]");
  expect_replayed(bch(prime(3), 26, 5, 1, gf27_modulus), 17, "[26,17,5]");
  expect_code(bch(prime(3), 13, 6, 1, gf27_modulus), 4, 7, "[13,4,7]");
}

TEST(Bch, OverFieldsWithTheRootsInside) {
  expect_code(bch(prime(7), 6, 4, 1, {4, 1}), 3, 4, "a Reed-Solomon code over GF(7)");  // X = 3
  expect_code(bch(prime(7), 3, 2, 1, {4, 1}), 2, 2, "[3,2,2] over GF(7)");
  expect_code(bch(gf4, 3, 2, 1, {1, 1, 1}), 2, 2, "[3,2,2] over GF(4)");
  expect_code(bch(gf8, 7, 5, 0, {1, 0, 1, 1}), 3, 5, "a Reed-Solomon code over GF(8), roots by another modulus");
}

TEST(Bch, OverFieldsOfPrimePowers) {
  expect_code(bch(gf4, 15, 5, 1, gf16_modulus), 9, 5, "[15,9,5] over GF(4)");
  expect_code(bch(gf4, 15, 7, 1, {1, 0, 0, 1, 1}), 6, 7, "[15,6,7] over GF(4)");
  expect_code(bch(gf4, 5, 2, 1, gf16_modulus), 3, 3, "[5,3,3] over GF(4)");
  expect_code(bch(gf9, 10, 5, 1, {2, 1, 0, 0, 1}), 2, 5, "[10,2,5] over GF(9)");
  expect_code(bch({2, {1, 0, 1, 1}}, 9, 4, 1, gf64_modulus), 3, 7, "[9,3,7] over GF(8)");
}

/// 2 has order 32 modulo 65537, so the root field is as large as the format lets it be.
TEST(Bch, TheLargestRootField) {
  const std::string modulus = "111000000000000000000010000000001";
  const unsigned n = 65537;
  expect_replayed({bch_description(prime(2), n, n, 1, modulus), prime(2), {Vector(n, 1)}}, 1, "[65537,1]");
  expect_refused(bch_description(prime(2), n, 3, 1, modulus), ".code", "2^27");
  expect_refused(bch_description(prime(2), 65539, 3, 1, modulus), ".code.codeword_length", "2^32");
  expect_refused(bch_description(prime(2), n, n, 1, "1010000000000000000000000000000001"), ".code.root_modulus",
                 "degree 32");
}

TEST(Bch, RefusedLengthsAndDistances) {
  const std::string good = word(prime(2), gf16_modulus);
  expect_refused(bch_description(prime(2), 14, 3, 1, good), ".code.codeword_length", "factor in common");
  expect_refused(bch_description(prime(2), 1, 2, 1, good), ".code.codeword_length", "from 2 to");
  expect_refused(bch_description(prime(2), (1U << 20) + 1, 2, 1, good), ".code.codeword_length", "from 2 to 1048576");
  expect_refused(bch_description(prime(2), 15, 1, 1, good), ".code.designed_distance", "from 2 to 15");
  expect_refused(bch_description(prime(2), 15, 16, 1, good), ".code.designed_distance", "from 2 to 15");
  expect_refused(bch_description(prime(2), 15, 15, 0, good), "", "code has dimension 0");
}

TEST(Bch, RefusedRootModuli) {
  const auto refused = [](const PlainField& f, std::uint64_t n, const std::string& modulus, const std::string& why) {
    expect_refused(bch_description(f, n, 3, 1, modulus), ".code.root_modulus", why);
  };
  refused(prime(2), 15, "10001", "reducible");     // (x + 1)^4
  refused(prime(2), 15, "10101", "reducible");     // (x^2 + x + 1)^2
  refused(prime(2), 15, "101001", "degree 4");     // irreducible of degree 5
  refused(prime(2), 15, "111", "degree 4");        // a smaller field
  refused(prime(2), 15, "11111", "order n = 15");  // X has order 5
  refused(prime(2), 15, "1100", "not zero");
  refused(prime(2), 15, "", "not zero");
  refused(prime(2), 15, "1 1 0 0 1", "0 and 1");
  refused(prime(3), 8, "2 1 2", "monic");
  refused(prime(3), 8, "1 0 1", "order n = 8");  // X has order 4
  refused(prime(3), 8, "2 1 3", "below 3");
  refused(prime(7), 6, "0 1", "order n = 6");  // X = 0
  refused(prime(7), 6, "6 1", "order n = 6");  // X = 1
  refused(gf4, 5, "11111", "no power of X");   // the powers of X are five, without the roots of x^2 + x + 1
  refused(gf4, 15, "111", "degree 4");
}

TEST(Bch, OtherZerosAreAnotherCode) {
  Draft other = bch(prime(2), 15, 5, 1, {1, 0, 0, 1, 1});  // the reciprocal modulus
  other.description = bch_description(prime(2), 15, 5, 1, word(prime(2), gf16_modulus));
  expect_other_code(other);
  Draft from = bch(gf4, 5, 2, 1, gf16_modulus);
  from.description = bch_description(gf4, 5, 2, 2, word(prime(2), gf16_modulus));
  expect_other_code(from);
}

}  // namespace
}  // namespace assize::recheck::test
