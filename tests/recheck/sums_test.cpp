// Codes made of other codes: product, direct sum, (u, u + v), and inner codes that differ from position to position.
#include <numeric>

#include "expect.hpp"

namespace assize::recheck::test {
namespace {

Value of_two(const PlainField& f, const std::string& family, const Value& first, const Value& second,
             const std::vector<Value>& steps = {}) {
  return description_value(f, {{"family", text(family)}, {"first", first}, {"second", second}}, steps);
}

/// All words, the zero word included.
Rows all_words(const PlainField& f, const Rows& rows) {
  Rows words{Vector(rows[0].size(), 0)};
  for (const Vector& row : rows) {
    const std::size_t so_far = words.size();
    for (unsigned a = 1; a < f.order(); ++a)
      for (std::size_t i = 0; i < so_far; ++i) {
        Vector next = words[i];
        for (std::size_t c = 0; c < next.size(); ++c) next[c] = f.add(next[c], f.mul(a, row[c]));
        words.push_back(next);
      }
  }
  return words;
}

const Rows even3{{1, 1, 0}, {0, 1, 1}};
const Rows even4{{1, 1, 0, 0}, {0, 1, 1, 0}, {0, 0, 1, 1}};
const Rows repeated4{{1, 1, 1, 1}};

TEST(Sums, Product) {
  Rows rows;
  for (const Vector& u : all_words(prime(2), even3))
    for (const Vector& v : all_words(prime(2), even3)) {
      Vector array;
      for (const unsigned a : u)
        for (const unsigned b : v) array.push_back(a * b);
      rows.push_back(array);
    }
  const Value part = matrix_description(prime(2), even3);
  expect_code({of_two(prime(2), "product", part, part), prime(2), rows}, 4, 4, "[9,4,4]");
}

TEST(Sums, ProductKeepsItsSides) {
  // Columns of the first, rows of the second code: the position of row i, column j is i n_2 + j.
  const Rows first{{1, 2, 0}};
  const Rows second{{1, 0, 3, 1}, {0, 1, 1, 2}};
  Rows rows;
  for (const Vector& v : second) {
    Vector array;
    for (const unsigned a : first[0])
      for (const unsigned b : v) array.push_back(gf4.mul(a, b));
    rows.push_back(array);
  }
  const Value a = matrix_description(gf4, first);
  const Value b = matrix_description(gf4, second);
  expect_code({of_two(gf4, "product", a, b), gf4, rows}, 2, 4, "[12,2,4] over GF(4)");
  expect_other_code({of_two(gf4, "product", b, a), gf4, rows});
}

TEST(Sums, DirectSum) {
  Rows rows;
  for (const Vector& u : all_words(prime(2), even3))
    for (Vector v : all_words(prime(2), repeated4)) {
      v.insert(v.begin(), u.begin(), u.end());
      rows.push_back(v);
    }
  const Value a = matrix_description(prime(2), even3);
  const Value b = matrix_description(prime(2), repeated4);
  expect_code({of_two(prime(2), "direct-sum", a, b), prime(2), rows}, 3, 2, "[7,3,2]");
  expect_other_code({of_two(prime(2), "direct-sum", b, a), prime(2), rows});
}

TEST(Sums, Plotkin) {
  Rows rows;
  for (const Vector& u : all_words(prime(2), even4))
    for (const Vector& v : all_words(prime(2), repeated4)) {
      Vector both = u;
      for (std::size_t i = 0; i < 4; ++i) both.push_back(u[i] ^ v[i]);
      rows.push_back(both);
    }
  const Value a = matrix_description(prime(2), even4);
  const Value b = matrix_description(prime(2), repeated4);
  expect_code({of_two(prime(2), "plotkin-sum", a, b), prime(2), rows}, 4, 4, "[8,4,4]");
  const Rows thirds{{1, 2, 0}, {0, 1, 1}};
  Rows ternary;
  for (const Vector& u : all_words(prime(3), thirds))
    for (const Vector& v : all_words(prime(3), {{1, 1, 1}})) {
      Vector both = u;
      for (std::size_t i = 0; i < 3; ++i) both.push_back((u[i] + v[i]) % 3);
      ternary.push_back(both);
    }
  expect_code(
      {of_two(prime(3), "plotkin-sum", matrix_description(prime(3), thirds), matrix_description(prime(3), {{1, 1, 1}})),
       prime(3), ternary},
      3, 3, "[6,3,3] over GF(3)");
}

TEST(Sums, NestedWithSteps) {
  const Value even = matrix_description(prime(2), repeated4, {step("dual")});
  const Value inside = of_two(prime(2), "plotkin-sum", even, matrix_description(prime(2), repeated4));
  const Value whole = of_two(prime(2), "direct-sum", inside, matrix_description(prime(2), {{1}}), {step("extend")});
  Rows rows;
  for (const Vector& u : even4) {
    Vector row = u;
    row.insert(row.end(), u.begin(), u.end());
    row.insert(row.end(), {0, 0});
    rows.push_back(row);
  }
  rows.push_back({0, 0, 0, 0, 1, 1, 1, 1, 0, 0});
  rows.push_back({0, 0, 0, 0, 0, 0, 0, 0, 1, 1});
  expect_code({whole, prime(2), rows}, 5, 2, "nested");
}

TEST(Sums, Refused) {
  const Value three = matrix_description(prime(2), even3);
  const Value four = matrix_description(prime(2), even4);
  const Value ternary = matrix_description(prime(3), even3);
  expect_refused(of_two(prime(2), "plotkin-sum", three, four), ".code", "differ in length");
  for (const char* family : {"product", "direct-sum", "plotkin-sum"}) {
    expect_refused(of_two(prime(2), family, three, ternary), ".code.second", "not over the field");
    expect_refused(of_two(prime(2), family, ternary, three), ".code.first", "not over the field");
    expect_refused(of_two(prime(3), family, three, three), ".code.first", "not over the field");
    expect_refused(of_two(prime(2), family, matrix_description(prime(2), {{0, 0}}), four), ".code.first",
                   "dimension 0");
    expect_refused(description_value(prime(2), {{"family", text(family)}, {"first", three}}), ".code.second",
                   "missing");
  }
  // The same order, another modulus.
  const PlainField other{2, {1, 0, 1, 1}};
  const Value a = matrix_description(gf8, {{1, 2}});
  const Value b = matrix_description(other, {{1, 2}});
  expect_refused(of_two(gf8, "direct-sum", a, b), ".code.second", "not over the field");
}

TEST(Sums, TooLarge) {
  const auto random = [](std::uint64_t n, std::uint64_t k) {
    return description_value(prime(2), {{"family", text("random-linear")},
                                        {"codeword_length", number(n)},
                                        {"dimension", number(k)},
                                        {"seed", number(1)}});
  };
  expect_refused(of_two(prime(2), "product", random(1025, 1), random(1024, 1)), ".code", "2^20");
  expect_refused(of_two(prime(2), "product", random(1024, 20), random(1024, 20)), ".code", "2^27");
  expect_refused(of_two(prime(2), "direct-sum", random(1 << 20, 1), random(20, 1)), ".code", "2^20");
  expect_refused(of_two(prime(2), "plotkin-sum", random(1 << 20, 1), random(1 << 20, 1)), ".code", "2^20");
  Value deep = random(1 << 7, 1);
  for (int i = 0; i < 5; ++i) deep = of_two(prime(2), "product", deep, deep);
  expect_refused(deep, ".code.first.code.first.code.first.code", "2^20");
}

// ---- inner codes by position ----------------------------------------------------------------------------------------

/// Inner codes of 8 words and distances 1, 3, 2, 4, 2; the last but one is written with rows in disorder.
std::vector<Rows> five_inner_codes() {
  return {{{1, 0, 0}, {0, 1, 0}, {0, 0, 1}},
          {{1, 0, 0, 1, 1, 0}, {0, 1, 0, 1, 0, 1}, {0, 0, 1, 0, 1, 1}},
          {{1, 0, 0, 1}, {0, 1, 0, 1}, {0, 0, 1, 1}},
          {{1, 0, 1, 0, 1, 0, 1}, {0, 0, 0, 1, 1, 1, 1}, {0, 1, 1, 0, 0, 1, 1}},
          {{1, 1, 1, 1}, {1, 0, 1, 0}, {0, 1, 1, 0}}};
}

const Vector five_points{0, 1, 2, 3, 4};

Value by_position(const std::vector<Value>& inner, const Value& outer, const PlainField& f = prime(2)) {
  return description_value(f,
                           {{"family", text("concatenated")}, {"outer", outer}, {"inner_by_position", array(inner)}});
}

std::vector<Value> inner_values(const std::vector<Rows>& codes) {
  std::vector<Value> values;
  for (const Rows& rows : codes) values.push_back(matrix_description(prime(2), rows));
  return values;
}

const Value five_outer = reed_solomon_description(gf8, five_points, Vector(5, 1), 2);

Draft five() {
  const std::vector<Rows> inner = five_inner_codes();
  Rows rows;
  for (const Vector& row : evaluation_rows(gf8, five_points, Vector(5, 1), 2))
    for (unsigned t = 0; t < 3; ++t) {
      Vector image;
      for (std::size_t i = 0; i < 5; ++i)
        for (const unsigned bit : combine(prime(2), inner[i], bits_of(gf8.mul(1U << t, row[i]), 3)))
          image.push_back(bit);
      rows.push_back(image);
    }
  return {by_position(inner_values(inner), five_outer), prime(2), rows};
}

TEST(InnerByPosition, CodeAndTheorem) {
  Draft draft = five();
  EXPECT_EQ(draft.length, 24U);
  EXPECT_EQ(draft.dimension, 6U);
  state_everything(draft, 3);
  const std::vector<std::uint64_t> inner{1, 3, 2, 4, 2};
  draft.evidence.push_back(concatenation_fact(4, "maximum-distance-separable", inner, 8));
  draft.evidence.push_back(concatenation_fact(4, "enumeration", inner, 8));
  const Report report = recheck(draft.bytes(), {});
  EXPECT_EQ(report.outcome, Outcome::proven) << report.reason;

  const auto refused = [&](const Value& fact, const std::string& place) {
    Draft forged = draft;
    forged.evidence[1] = fact;
    const Report found = recheck(forged.bytes(), {});
    EXPECT_EQ(found.outcome, Outcome::rejected);
    EXPECT_NE(found.reason.find(place), std::string::npos) << found.reason;
  };
  const std::string mds = "maximum-distance-separable";
  refused(concatenation_fact(4, mds, {3, 1, 2, 4, 2}, 8), "evidence[1].inner_distances[0]");
  refused(concatenation_fact(4, mds, {1, 3, 2, 4, 3}, 8), "evidence[1].inner_distances[4]");
  refused(concatenation_fact(4, mds, {1}, 4), "evidence[1].inner_distances");
  refused(concatenation_fact(4, mds, {1, 3, 2, 4, 2, 2}, 8), "evidence[1].inner_distances");
  refused(concatenation_fact(4, mds, inner, 9), "evidence[1].at_least");
  refused(concatenation_fact(4, mds, inner, 12), "evidence[1].at_least");
  refused(concatenation_fact(5, mds, inner, 12), "evidence[1].outer_distance");
}

TEST(InnerByPosition, OverAnExtensionField) {
  const PlainField gf16{2, {1, 1, 0, 0, 1}};
  const unsigned embedding = 6;
  const Vector basis{1, 2};
  const std::vector<Rows> inner{{{1, 0}, {0, 1}}, {{1, 0, 1}, {0, 1, 2}}};
  Rows rows;
  for (const unsigned scalar : {1U, 2U, 4U, 8U}) {
    Vector image;
    for (std::size_t i = 0; i < 2; ++i)
      for (unsigned pair = 0; pair < 16; ++pair) {
        const Vector digits{pair % 4, pair / 4};
        unsigned sum = 0;
        for (unsigned j = 0; j < 2; ++j)
          sum = gf16.add(sum, gf16.mul(gf16.add(digits[j] & 1, gf16.mul(digits[j] >> 1, embedding)), basis[j]));
        if (sum == gf16.mul(scalar, i == 0 ? 1 : 11))
          for (const unsigned s : combine(gf4, inner[i], digits)) image.push_back(s);
      }
    rows.push_back(image);
  }
  Draft draft{description_value(gf4, {{"family", text("concatenated")},
                                      {"outer", matrix_description(gf16, {{1, 11}})},
                                      {"inner_by_position",
                                       array({matrix_description(gf4, inner[0]), matrix_description(gf4, inner[1])})},
                                      {"embedding", text("6")},
                                      {"symbol_basis", text("1 2")}}),
              gf4, rows};
  expect_code(draft, 2, 3, "[5,2,3] over GF(4)");
}

TEST(InnerByPosition, Refused) {
  std::vector<Value> list = inner_values(five_inner_codes());
  const std::string place = ".code.inner_by_position";
  const auto with = [&](std::size_t i, const Value& other) {
    std::vector<Value> changed = list;
    changed[i] = other;
    return by_position(changed, five_outer);
  };
  expect_refused(with(3, matrix_description(prime(2), even3)), place + "[3]", "as many elements");
  expect_refused(with(4, matrix_description(prime(2), {{1, 0, 1}, {0, 1, 1}, {1, 1, 0}})), place + "[4]", "dependent");
  expect_refused(with(0, matrix_description(prime(3), even4)), place + "[0]", "field");
  expect_refused(with(1, text("code")), place + "[1]", "an object");
  expect_refused(with(2, matrix_description(prime(2), {{1, 0}, {0}})), place + "[2].code.rows[1]", "differ in length");
  list.pop_back();
  expect_refused(by_position(list, five_outer), place, "one inner code for each");
  expect_refused(by_position({}, five_outer), place, "one inner code for each");
  const Value reduced_inner = matrix_description(prime(2), even4);
  expect_refused(description_value(prime(2), {{"family", text("concatenated")},
                                              {"outer", five_outer},
                                              {"inner", reduced_inner},
                                              {"inner_by_position", array({reduced_inner})}}),
                 place, "unknown");
  const Value wide = description_value(prime(2), {{"family", text("random-linear")},
                                                  {"codeword_length", number(1 << 18)},
                                                  {"dimension", number(3)},
                                                  {"seed", number(1)}});
  expect_refused(by_position({wide, wide, wide, wide, wide}, five_outer), place, "2^20");
}

}  // namespace
}  // namespace assize::recheck::test
