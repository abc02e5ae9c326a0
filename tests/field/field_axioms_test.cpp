// The axioms of a field and its logarithms, over every prime power up to 256 and over larger fields of each kind.
//
// GF(4), GF(8), GF(9), GF(16) and GF(27) are tried over every irreducible modulus.  Triples are exhaustive up to
// order 16 and seeded above; pairs are exhaustive up to 256.
#include <algorithm>
#include <set>

#include "field_support.hpp"

namespace assize::field::testing {
namespace {

std::vector<Field> every_small_field() {
  const std::set<std::uint32_t> over_every_modulus{4, 8, 9, 16, 27};
  std::vector<Field> fields;
  for (std::uint32_t q = 2; q <= 256; ++q) {
    if (!as_prime_power(q)) continue;
    if (over_every_modulus.contains(q)) {
      for (const Field& field : all_fields(q)) fields.push_back(field);
    } else {
      fields.push_back(some_field(q));
    }
  }
  return fields;
}

/// Moduli: S. Lin, D. J. Costello, Error Control Coding, table of primitive polynomials over GF(2).
std::vector<Field> larger_fields() {
  const std::vector<std::vector<std::size_t>> exponents{
      {9, 4, 0},        {10, 3, 0},        {11, 2, 0}, {12, 6, 4, 1, 0},
      {13, 4, 3, 1, 0}, {14, 10, 6, 1, 0}, {15, 1, 0}, {16, 12, 3, 1, 0},
  };
  std::vector<Field> fields;
  for (const auto& terms : exponents) {
    Polynomial modulus(terms.front() + 1);
    for (const std::size_t exponent : terms) modulus[exponent] = 1;
    fields.push_back(Field::create(1U << terms.front(), modulus).value());
  }
  for (const std::uint32_t p : {257U, 263U, 1021U, 4099U, 32749U, 32771U, 65519U, 65521U})
    fields.push_back(prime_field(p));
  return fields;
}

std::string test_name(const ::testing::TestParamInfo<Field>& info) {
  std::string name = "GF" + std::to_string(info.param.order());
  if (info.param.degree() > 1) name += "_modulus_";
  for (std::size_t i = info.param.modulus().size(); i-- > 0;) {
    name += std::to_string(info.param.modulus()[i]);
    if (info.param.characteristic() > 10 && i > 0) name += '_';
  }
  return name;
}

class FieldAxioms : public ::testing::TestWithParam<Field> {
 protected:
  /// Calls visit(a, b): all pairs up to order 256, seeded ones above.
  template <class Visit>
  void for_pairs(std::uint64_t seed, Visit visit) {
    const Field& field = GetParam();
    if (field.order() <= 256) {
      for (std::uint32_t a = 0; a < field.order(); ++a)
        for (std::uint32_t b = 0; b < field.order(); ++b) visit(static_cast<Element>(a), static_cast<Element>(b));
    } else {
      Chance chance(seed);
      for (int i = 0; i < 20000; ++i) visit(chance.element(field), chance.element(field));
    }
  }
  /// Calls visit(a, b, c): all triples up to order 16, seeded ones above.
  template <class Visit>
  void for_triples(std::uint64_t seed, Visit visit) {
    const Field& field = GetParam();
    const std::uint32_t q = field.order();
    if (q <= 16) {
      for (std::uint32_t n = 0; n < q * q * q; ++n)
        visit(static_cast<Element>(n % q), static_cast<Element>(n / q % q), static_cast<Element>(n / q / q));
    } else {
      Chance chance(seed);
      for (int i = 0; i < 5000; ++i) visit(chance.element(field), chance.element(field), chance.element(field));
    }
  }
};

// Common practice, no source: the definition of a field.
TEST_P(FieldAxioms, AssociativeAndDistributive) {
  const Field& f = GetParam();
  for_triples(20240501, [&](Element a, Element b, Element c) {
    ASSERT_EQ(f.add(f.add(a, b), c), f.add(a, f.add(b, c)));
    ASSERT_EQ(f.multiply(f.multiply(a, b), c), f.multiply(a, f.multiply(b, c)));
    ASSERT_EQ(f.multiply(a, f.add(b, c)), f.add(f.multiply(a, b), f.multiply(a, c)));
  });
}

// Common practice, no source: the definition of a field, and subtraction and division by it.
TEST_P(FieldAxioms, ClosedCommutativeWithInverses) {
  const Field& f = GetParam();
  for_pairs(20240502, [&](Element a, Element b) {
    ASSERT_TRUE(f.contains(f.add(a, b)) && f.contains(f.multiply(a, b)));
    ASSERT_EQ(f.add(a, b), f.add(b, a));
    ASSERT_EQ(f.multiply(a, b), f.multiply(b, a));
    ASSERT_EQ(f.add(f.subtract(a, b), b), a);
    if (b != 0) {
      ASSERT_EQ(f.multiply(f.divide(a, b), b), a);
    }
    if (b != 0) {
      ASSERT_EQ(f.multiplier(b)(a), f.multiply(b, a));
    }
    if (a != 0 && b != 0) {
      ASSERT_NE(f.multiply(a, b), 0);
    }
  });
  for (std::uint32_t n = 0; n < f.order(); ++n) {
    const auto a = static_cast<Element>(n);
    ASSERT_EQ(f.add(a, 0), a);
    ASSERT_EQ(f.multiply(a, 1), a);
    ASSERT_EQ(f.multiply(a, 0), 0);
    ASSERT_EQ(f.add(a, f.negate(a)), 0);
    if (a != 0) {
      ASSERT_EQ(f.multiply(a, f.inverse(a)), 1);
    }
  }
}

// Independent computation: the definition by digits and by polynomial arithmetic modulo the modulus.
TEST_P(FieldAxioms, TablesFollowTheDefinition) {
  const Field& f = GetParam();
  const Field ground = prime_field(f.characteristic());
  const std::uint32_t p = f.characteristic();
  for_pairs(20240503, [&](Element a, Element b) {
    ASSERT_EQ(f.multiply(a, b), product_by_definition(f, ground, a, b)) << describe(f) << ": " << a << " * " << b;
    std::uint32_t sum = 0;
    for (std::uint32_t place = 1; place < f.order(); place *= p) sum += (a / place % p + b / place % p) % p * place;
    ASSERT_EQ(f.add(a, b), sum) << describe(f) << ": " << a << " + " << b;
  });
}

// R. Lidl, H. Niederreiter, Finite Fields, theorem 2.8: the multiplicative group is cyclic, of order q - 1.
TEST_P(FieldAxioms, OrdersLogarithmsAndPrimitiveElements) {
  const Field& f = GetParam();
  const std::uint32_t group_order = f.order() - 1;
  const Element base = f.least_primitive_element();
  std::size_t primitive = 0;
  for (std::uint32_t n = 1; n < f.order(); ++n) {
    const auto a = static_cast<Element>(n);
    const std::uint32_t order = f.order_of(a);
    ASSERT_EQ(group_order % order, 0U);
    ASSERT_EQ(f.power(a, order), 1);
    ASSERT_LT(f.logarithm(a), std::max(group_order, 1U));
    ASSERT_EQ(f.power(base, f.logarithm(a)), a);
    ASSERT_EQ(f.is_primitive(a), order == group_order);
    if (f.is_primitive(a) && primitive++ == 0) {
      ASSERT_EQ(a, base);
    }
    if (f.order() > 256) continue;
    Element power = a;  // independent computation: the order by stepping
    std::uint32_t steps = 1;
    for (; power != 1; power = f.multiply(power, a)) ++steps;
    ASSERT_EQ(order, steps);
  }
  EXPECT_EQ(primitive, euler_phi(group_order));
  const std::vector<Element> listed = f.primitive_elements();
  EXPECT_EQ(listed.size(), primitive);
  EXPECT_TRUE(std::is_sorted(listed.begin(), listed.end()));
  EXPECT_FALSE(f.is_primitive(0));
}

// R. Lidl, H. Niederreiter, Finite Fields, theorem 2.21: a -> a^p is an automorphism, and a^q = a.
TEST_P(FieldAxioms, Frobenius) {
  const Field& f = GetParam();
  const std::uint64_t p = f.characteristic();
  for_pairs(20240504, [&](Element a, Element b) {
    ASSERT_EQ(f.power(f.add(a, b), p), f.add(f.power(a, p), f.power(b, p)));
    ASSERT_EQ(f.power(f.multiply(a, b), p), f.multiply(f.power(a, p), f.power(b, p)));
  });
  std::uint32_t fixed = 0;
  for (std::uint32_t n = 0; n < f.order(); ++n) {
    const auto a = static_cast<Element>(n);
    ASSERT_EQ(f.power(a, f.order()), a);
    fixed += f.power(a, p) == a ? 1U : 0U;
  }
  EXPECT_EQ(fixed, p);
}

// Common practice, no source: the representation of elements as stated in the header.
TEST_P(FieldAxioms, DigitsAndPowers) {
  const Field& f = GetParam();
  for (std::uint32_t n = 0; n < f.order(); ++n) {
    const auto a = static_cast<Element>(n);
    ASSERT_EQ(f.digits(a).size(), f.degree());
    ASSERT_EQ(f.from_digits(f.digits(a)), a);
    ASSERT_EQ(f.power(a, 0), 1);
    ASSERT_EQ(f.power(a, 1), a);
    ASSERT_EQ(f.power(a, 5), f.multiply(a, f.multiply(f.multiply(a, a), f.multiply(a, a))));
  }
  EXPECT_EQ(f.power(1, UINT64_MAX), 1);
  EXPECT_EQ(f.power(0, UINT64_MAX), 0);
  EXPECT_FALSE(f.contains(f.order()));
  if (f.degree() == 1) return;
  // The class of x is a root of the modulus.
  const Polynomial modulus(f.modulus().begin(), f.modulus().end());
  EXPECT_EQ(evaluate(f, modulus, f.class_of_x()), 0);
  EXPECT_EQ(f.digits(f.class_of_x())[1], 1);
}

INSTANTIATE_TEST_SUITE_P(UpTo256, FieldAxioms, ::testing::ValuesIn(every_small_field()), test_name);
INSTANTIATE_TEST_SUITE_P(Above256, FieldAxioms, ::testing::ValuesIn(larger_fields()), test_name);

// R. Lidl, H. Niederreiter, Finite Fields, theorem 3.25: how many irreducible moduli there are.
TEST(Fields, EveryIrreducibleModulusIsTried) {
  EXPECT_EQ(all_fields(4).size(), 1U);
  EXPECT_EQ(all_fields(8).size(), 2U);
  EXPECT_EQ(all_fields(9).size(), 3U);
  EXPECT_EQ(all_fields(16).size(), 3U);
  EXPECT_EQ(all_fields(27).size(), 8U);
}

}  // namespace
}  // namespace assize::field::testing
