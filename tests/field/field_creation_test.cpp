// Which fields can be made, what is said about those that cannot, and published products.
#include "field_support.hpp"

namespace assize::field::testing {
namespace {

using Coefficients = std::vector<Element>;

void expect_refused(std::uint32_t order, const Coefficients& modulus, const std::string& what,
                    const std::string& cure) {
  const auto made = Field::create(order, modulus);
  ASSERT_FALSE(made) << what;
  EXPECT_EQ(made.error().what, what);
  EXPECT_EQ(made.error().cure, cure);
  EXPECT_EQ(made.error().where, "");
}

// FIPS 197, Advanced Encryption Standard, sections 4.2 and 4.2.1: {57} * {83} = {c1}, {57} * {13} = {fe}, and the
// multiples of {57} by powers of x.
TEST(FieldProducts, Fips197) {
  const Field aes = Field::create(256, Coefficients{1, 1, 0, 1, 1, 0, 0, 0, 1}).value();
  EXPECT_EQ(aes.multiply(0x57, 0x83), 0xc1);
  EXPECT_EQ(aes.multiply(0x57, 0x13), 0xfe);
  EXPECT_EQ(aes.multiply(0x57, 0x02), 0xae);
  EXPECT_EQ(aes.multiply(0x57, 0x04), 0x47);
  EXPECT_EQ(aes.multiply(0x57, 0x08), 0x8e);
  EXPECT_EQ(aes.multiply(0x57, 0x10), 0x07);
  EXPECT_EQ(aes.add(0x57, 0x83), 0xd4);  // section 4.1
  // Independent computation: x is not primitive there (order 51 = 255 / 5), x + 1 is.
  EXPECT_EQ(aes.order_of(aes.class_of_x()), 51U);
  EXPECT_EQ(aes.least_primitive_element(), 3);
}

// Common practice, no source: GF(4) = {0, 1, w, w + 1} with w^2 = w + 1, the field of the hexacode.
TEST(FieldProducts, FieldOfFourElements) {
  const Field f = some_field(4);
  EXPECT_EQ(f.multiply(2, 2), 3);
  EXPECT_EQ(f.multiply(2, 3), 1);
  EXPECT_EQ(f.add(2, 1), 3);
}

// Common practice, no source.
TEST(FieldCreation, PropertiesAndEquality) {
  EXPECT_EQ(Field::binary(), prime_field(2));
  EXPECT_EQ(Field::create(2, {}).value(), Field::binary());
  EXPECT_EQ(some_field(8), Field::create(8, Coefficients{1, 1, 0, 1}).value());
  EXPECT_NE(some_field(8), Field::create(8, Coefficients{1, 0, 1, 1}).value());
  EXPECT_NE(prime_field(3), prime_field(5));
  EXPECT_NE(prime_field(2), some_field(4));
  const Field f = some_field(81);
  EXPECT_EQ(f.order(), 81U);
  EXPECT_EQ(f.characteristic(), 3U);
  EXPECT_EQ(f.degree(), 4U);
  EXPECT_EQ(f.modulus().size(), 5U);
  EXPECT_TRUE(prime_field(7).modulus().empty());
}

// Common practice, no source: a moved-from field is still a field.
TEST(FieldCreation, MovingLeavesTheFieldUsable) {
  Field first = some_field(9);
  const Field second = std::move(first);
  EXPECT_EQ(first, second);  // NOLINT: on purpose
}

// Common practice, no source: refusals are whole sentences with something to do.
TEST(FieldCreation, OrdersThatAreRefused) {
  expect_refused(6, {}, "6 is not a prime power", "give the order of a field; the nearest ones are 5 and 7");
  expect_refused(100, {1, 1}, "100 is not a prime power", "give the order of a field; the nearest ones are 97 and 101");
  expect_refused(0, {}, "0 is not the order of a field", "give a prime power from 2 up, for example 2");
  expect_refused(1, {}, "1 is not the order of a field", "give a prime power from 2 up, for example 2");
  const std::string cure = "use a prime power up to 256, or a prime or a power of 2 up to 65536";
  expect_refused(729, {}, "GF(729) = GF(3^6) is not among the fields that can be worked in", cure);
  expect_refused(289, {}, "GF(289) = GF(17^2) is not among the fields that can be worked in", cure);
  expect_refused(65537, {}, "GF(65537) is not among the fields that can be worked in", cure);
  expect_refused(131072, {}, "GF(131072) = GF(2^17) is not among the fields that can be worked in", cure);
  expect_refused(UINT32_MAX, {}, "4294967295 is not a prime power", cure);
  // The neighbours that are named can be made: not 289 = 17^2, which is nearer.
  expect_refused(290, {}, "290 is not a prime power", "give the order of a field; the nearest ones are 283 and 293");
}

TEST(FieldCreation, PrimesThatAreRefused) {
  EXPECT_EQ(Field::prime(9).error().what, "9 is not prime, but a power of 3");
  EXPECT_EQ(Field::prime(9).error().cure, "give a prime, or the modulus of GF(9) = GF(3^2)");
  EXPECT_EQ(Field::prime(15).error().what, "15 is not a prime power");
  EXPECT_EQ(Field::prime(65537).error().what, "GF(65537) is not among the fields that can be worked in");
}

// Common practice, no source; that the named example is irreducible is checked in the last test of this file.
TEST(FieldCreation, ModuliThatAreRefused) {
  const std::string of_8 = "state a monic irreducible polynomial of degree 3 over GF(2), for example x^3 + x + 1";
  const std::string of_9 = "state a monic irreducible polynomial of degree 2 over GF(3), for example x^2 + 1";
  expect_refused(8, {}, "GF(8) = GF(2^3) needs a modulus and none is given", of_8);
  expect_refused(8, {1, 1, 1}, "the modulus x^2 + x + 1 has degree 2, but GF(8) = GF(2^3) needs degree 3", of_8);
  expect_refused(8, {1, 1, 1, 0}, "the modulus x^2 + x + 1 has degree 2, but GF(8) = GF(2^3) needs degree 3", of_8);
  expect_refused(8, {1, 1, 0, 1, 0}, "the modulus x^3 + x + 1 is given with 5 coefficients, some of them leading zeros",
                 "give exactly 4 coefficients, the leading one being 1");
  expect_refused(8, {0, 0, 0, 0}, "the modulus is the zero polynomial", of_8);
  expect_refused(8, {1, 1, 1, 1}, "the modulus x^3 + x^2 + x + 1 is reducible over GF(2): it is divisible by x + 1",
                 of_8);
  expect_refused(8, {1, 2, 0, 1}, "the modulus has the coefficient 2, which is not in GF(2)",
                 "write coefficients from 0 to 1");
  expect_refused(9, {2, 0, 2}, "the modulus 2*x^2 + 2 is not monic", "divide it by its leading coefficient: x^2 + 1");
  expect_refused(9, {2, 0, 1}, "the modulus x^2 + 2 is reducible over GF(3): it is divisible by x + 1", of_9);
  expect_refused(7, {1, 1}, "GF(7) is a prime field and takes no modulus", "leave the modulus out");
}

// Independent computation: every example that a cure can name makes the field it is named for.
TEST(FieldCreation, ExamplesNamedInCuresAreGood) {
  for (const std::uint32_t q : {4U, 8U, 9U, 25U, 49U, 81U, 121U, 125U, 169U, 243U, 256U, 4096U, 65536U}) {
    const Field f = some_field(q);
    const Polynomial modulus(f.modulus().begin(), f.modulus().end());
    EXPECT_NE(Field::create(q, {}).error().cure.find(", for example " + to_algebra(modulus)), std::string::npos);
  }
}

// Common practice, no source: promises between rooms end the program with exit code 4.
TEST(FieldDeathTest, BrokenContracts) {
  const Field f = prime_field(5);
  EXPECT_EXIT(static_cast<void>(f.inverse(0)), ::testing::ExitedWithCode(4), "only a nonzero element is inverted");
  EXPECT_EXIT(static_cast<void>(f.divide(1, 0)), ::testing::ExitedWithCode(4), "only a nonzero element is inverted");
  EXPECT_EXIT(static_cast<void>(f.logarithm(0)), ::testing::ExitedWithCode(4),
              "only a nonzero element has a logarithm");
  EXPECT_EXIT(static_cast<void>(f.order_of(0)), ::testing::ExitedWithCode(4), "only a nonzero element has a logarithm");
  EXPECT_EXIT(static_cast<void>(f.multiplier(0)), ::testing::ExitedWithCode(4), "a multiplier is not 0");
  EXPECT_EXIT(static_cast<void>(f.class_of_x()), ::testing::ExitedWithCode(4),
              "only an extension field has a class of x");
  EXPECT_EXIT(static_cast<void>(f.from_digits(Coefficients{1, 2})), ::testing::ExitedWithCode(4), "at most m digits");
  EXPECT_EXIT(static_cast<void>(f.from_digits(Coefficients{5})), ::testing::ExitedWithCode(4),
              "a digit of an element is below p");
}

}  // namespace
}  // namespace assize::field::testing
