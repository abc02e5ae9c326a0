// Fields, reduction, closed forms and walks against definitions tried out by brute force.
#include <gtest/gtest.h>

#include "builder.hpp"
#include "recheck/coset_walk.hpp"
#include "recheck/json.hpp"
#include "recheck/small_field.hpp"
#include "recheck/word.hpp"

namespace assize::recheck::test {
namespace {

FieldPtr checker_field(const PlainField& f) {
  std::vector<Symbol> modulus;
  if (f.degree() > 1)
    for (const unsigned c : f.modulus) modulus.push_back(static_cast<Symbol>(c));
  auto made = Field::make(f.order(), modulus, "here");
  EXPECT_TRUE(made.has_value());
  return *made;
}

TEST(Arithmetic, FieldsAgreeWithTheDefinition) {
  const std::vector<PlainField> fields{prime(2), prime(3), prime(13), gf4, gf8, gf9, {3, {1, 2, 0, 1}}, {5, {2, 1, 1}}};
  for (const PlainField& f : fields) {
    const FieldPtr field = checker_field(f);
    for (unsigned a = 0; a < f.order(); ++a)
      for (unsigned b = 0; b < f.order(); ++b) {
        const auto x = static_cast<Symbol>(a);
        const auto y = static_cast<Symbol>(b);
        ASSERT_EQ(field->add(x, y), f.add(a, b));
        ASSERT_EQ(field->multiply(x, y), f.mul(a, b)) << f.order() << ": " << a << " * " << b;
        ASSERT_EQ(field->multiply_by_definition(x, y), f.mul(a, b));
        ASSERT_EQ(field->add(field->subtract(x, y), y), x);
        if (b != 0) {
          ASSERT_EQ(field->multiply(field->inverse(y), y), 1);
        }
        ASSERT_EQ(field->power(x, b), f.power(a, b));
      }
  }
}

TEST(Arithmetic, LargeFields) {
  for (const std::uint64_t order : {65521U, 257U, 32749U}) {
    const auto field = Field::make(order, {}, "here");
    ASSERT_TRUE(field.has_value());
    const auto top = static_cast<Symbol>(order - 1);
    EXPECT_EQ((*field)->multiply(top, top), 1);
    EXPECT_EQ((*field)->add(top, top), top - 1);
    EXPECT_EQ((*field)->multiply((*field)->inverse(12), 12), 1);
  }
  const auto large = Field::make(65536, {1, 0, 1, 1, 0, 1, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 1}, "here");
  ASSERT_TRUE(large.has_value());
  EXPECT_TRUE((*large)->is_primitive(2));
  EXPECT_FALSE((*large)->is_primitive(1));
  EXPECT_FALSE((*large)->is_primitive(0));
  EXPECT_FALSE((*large)->is_primitive((*large)->power(2, 3)));
  for (unsigned a = 1; a < 65536; a += 977) {
    const auto x = static_cast<Symbol>(a);
    EXPECT_EQ((*large)->multiply(x, (*large)->inverse(x)), 1);
    EXPECT_EQ((*large)->multiply(x, x), (*large)->multiply_by_definition(x, x));
  }
}

TEST(Arithmetic, EveryPrimePowerTo256) {
  for (unsigned q = 2; q <= 256; ++q) {
    unsigned p = 2;
    while (q % p != 0) ++p;
    unsigned degree = 0;
    unsigned rest = q;
    for (; rest % p == 0; rest /= p) ++degree;
    if (rest != 1) {
      EXPECT_FALSE(Field::make(q, {}, "here").has_value()) << q;
      continue;
    }
    unsigned accepted = 0;
    unsigned tried = 0;
    for (unsigned low = 0; low < q && degree > 1; ++low) {
      std::vector<Symbol> modulus;
      for (unsigned i = 0, v = low; i < degree; ++i, v /= p) modulus.push_back(static_cast<Symbol>(v % p));
      modulus.push_back(1);
      accepted += Field::make(q, modulus, "here").has_value() ? 1U : 0U;
      ++tried;
    }
    // Gauss: the number of monic irreducible polynomials is the sum of mu(d) p^(m/d) over m.
    const auto power = [p](unsigned e) {
      unsigned value = 1;
      for (unsigned i = 0; i < e; ++i) value *= p;
      return value;
    };
    unsigned expected = 0;
    for (unsigned d = 1; d <= degree; ++d) {
      if (degree % d != 0) continue;
      const int mu = d == 1 ? 1 : d == 6 ? 1 : d == 4 || d == 8 ? 0 : -1;
      expected = static_cast<unsigned>(static_cast<int>(expected) + mu * static_cast<int>(power(degree / d)));
    }
    if (degree == 1) {
      EXPECT_TRUE(Field::make(q, {}, "here").has_value());
    } else {
      EXPECT_EQ(accepted, expected / degree) << q << " of " << tried;
    }
  }
}

TEST(Arithmetic, WalksCountEveryWordOnce) {
  const std::vector<PlainField> fields{prime(2), prime(3), prime(7), gf4, gf8, gf9, {5, {2, 1, 1}}, prime(131)};
  for (const PlainField& f : fields)
    for (const std::size_t length : {1U, 15U, 16U, 17U, 63U, 64U, 65U, 130U}) {
      const std::size_t rows = f.order() < 10 ? 3 : 2;
      Rows plain;
      Matrix matrix(rows, length);
      Vector offset(length);
      unsigned state = f.order();
      const auto next = [&] { return (state = (state * 1103515245U + 12345U) & 0x7fffffff) >> 8; };
      for (std::size_t r = 0; r < rows; ++r) {
        Vector row(length);
        for (std::size_t c = 0; c < length; ++c) {
          row[c] = next() % 3 == 0 ? 0 : next() % f.order();
          matrix.row(r)[c] = static_cast<Symbol>(row[c]);
        }
        plain.push_back(row);
      }
      for (unsigned& s : offset) s = next() % f.order();
      const std::vector<Symbol> start(offset.begin(), offset.end());
      std::vector<std::uint64_t> counts(length + 1, 0);
      const std::size_t free = length % 2 == 0 ? rows : rows - 1;
      if (f.order() > 100 && free > 1) continue;
      ASSERT_TRUE(make_coset_walk(*checker_field(f), matrix)->count(start, free, counts, [] { return false; }));
      std::vector<std::uint64_t> expected(length + 1, 0);
      Vector message(rows, 0);
      while (true) {
        Vector word = combine(f, plain, message);
        for (std::size_t c = 0; c < length; ++c) word[c] = f.add(word[c], offset[c]);
        ++expected[weight(word)];
        std::size_t i = rows - free;
        while (i < rows && message[i] == f.order() - 1) message[i++] = 0;
        if (i == rows) break;
        ++message[i];
      }
      ASSERT_EQ(counts, expected) << f.order() << " " << length;
    }
}

TEST(Arithmetic, WordsAreReadStrictly) {
  EXPECT_EQ(*read_word("0110", 2, ""), (std::vector<Symbol>{0, 1, 1, 0}));
  EXPECT_EQ(*read_word("0 12 3", 13, ""), (std::vector<Symbol>{0, 12, 3}));
  for (const char* bad : {"0  1", " 0", "0 ", "13", "01", "+1", "1,2", "-1", "1\t2", "18446744073709551616"})
    EXPECT_FALSE(read_word(bad, 13, "").has_value()) << bad;
  for (const char* bad : {"0 1", "2", "a"}) EXPECT_FALSE(read_word(bad, 2, "").has_value()) << bad;
  EXPECT_FALSE(read_polynomial("", 2, "").has_value());
  EXPECT_FALSE(read_polynomial("10", 2, "").has_value());
}

TEST(Arithmetic, SpellingOfValues) {
  const auto again = [](const std::string& text) { return spell(*parse(text)); };
  EXPECT_EQ(again("{\"a\" : [ 1 , 2 ] , \"b\" : {}}"), "{\n\"a\":[1,2],\n\"b\":{}}");
  EXPECT_EQ(again("[[],{ },true]"), "[\n[],\n{},\ntrue]");
  EXPECT_EQ(again("\"\\u00e9\\/\\n\\u007f\\\"\\\\\\t\""), "\"\xc3\xa9/\\u000a\\u007f\\\"\\\\\\u0009\"");
}

}  // namespace
}  // namespace assize::recheck::test
