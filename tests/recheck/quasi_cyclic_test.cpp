// Quasi-cyclic codes in all four forms, both ways of shifting, and what is none.
#include "expect.hpp"

namespace assize::recheck::test {
namespace {

using Members = std::vector<std::pair<std::string, Value>>;

Value quasi_cyclic(const PlainField& f, const std::string& form, Members rest, const std::string& shift = "right") {
  rest.insert(rest.begin(), {{"family", text("quasi-cyclic")}, {"form", text(form)}});
  rest.emplace_back("shift", text(shift));
  return description_value(f, rest);
}

/// Row after row moved by one place.
Rows circulant(const Vector& first, const std::string& shift) {
  Rows rows{first};
  while (rows.size() < first.size()) {
    Vector next = rows.back();
    if (shift == "right")
      std::rotate(next.begin(), next.end() - 1, next.end());
    else
      std::rotate(next.begin(), next.begin() + 1, next.end());
    rows.push_back(next);
  }
  return rows;
}

Rows beside(Rows left, const Rows& right) {
  for (std::size_t r = 0; r < left.size(); ++r) left[r].insert(left[r].end(), right[r].begin(), right[r].end());
  return left;
}

Rows above(Rows top, const Rows& bottom) {
  top.insert(top.end(), bottom.begin(), bottom.end());
  return top;
}

Rows identity(std::size_t size) {
  Rows rows(size, Vector(size, 0));
  for (std::size_t i = 0; i < size; ++i) rows[i][i] = 1;
  return rows;
}

const std::vector<std::string> both_ways{"right", "left"};

TEST(QuasiCyclic, Double) {
  for (const std::string& shift : both_ways) {
    const auto draft = [&](const PlainField& f, const Vector& first) {
      return Draft{quasi_cyclic(f, "double", {{"first_row", text(word(f, first))}}, shift), f,
                   beside(identity(first.size()), circulant(first, shift))};
    };
    expect_code(draft(prime(2), {0, 1, 1, 1}), 4, 4, "[8,4,4]");
    expect_code(draft(prime(2), {1, 1, 1, 0, 1, 0}), 6, 4, "[12,6,4]");
    expect_code(draft(prime(3), {0, 1, 2}), 3, 3, "[6,3,3] over GF(3)");
    expect_code(draft(prime(2), {1}), 1, 2, "[2,1,2]");
  }
  Draft wrong{quasi_cyclic(prime(2), "double", {{"first_row", text("111010")}}, "left"), prime(2),
              beside(identity(6), circulant({1, 1, 1, 0, 1, 0}, "right"))};
  expect_other_code(wrong);
}

TEST(QuasiCyclic, BorderedGolay) {
  // F. J. MacWilliams, N. J. A. Sloane, The Theory of Error-Correcting Codes, chapter 2.
  const Vector first{1, 1, 0, 1, 1, 1, 0, 0, 0, 1, 0};
  for (const std::string& shift : both_ways) {
    const Rows square = above({Vector(12, 1)}, beside(Rows(11, Vector(1, 1)), circulant(first, shift)));
    Rows bordered = square;
    bordered[0][0] = 0;
    Draft draft{
        quasi_cyclic(prime(2), "bordered",
                     {{"corner", text("0")}, {"border", text("1")}, {"first_row", text(word(prime(2), first))}}, shift),
        prime(2), beside(identity(12), bordered)};
    expect_code(draft, 12, 8, "extended Golay");
    state_everything(draft, 6);
    EXPECT_EQ(draft.statements[1].text, minimum_words(8, 759, {0}).text);
  }
}

TEST(QuasiCyclic, BorderedOverOtherFields) {
  const Rows square{{0, 1, 1, 1, 1, 1}, {1, 0, 1, 2, 2, 1}, {1, 1, 0, 1, 2, 2},
                    {1, 2, 1, 0, 1, 2}, {1, 2, 2, 1, 0, 1}, {1, 1, 2, 2, 1, 0}};
  expect_code({quasi_cyclic(prime(3), "bordered",
                            {{"corner", text("0")}, {"border", text("1")}, {"first_row", text("0 1 2 2 1")}}),
               prime(3), beside(identity(6), square)},
              6, 6, "extended ternary Golay");
  expect_code(
      {quasi_cyclic(gf4, "bordered", {{"corner", text("3")}, {"border", text("2")}, {"first_row", text("1")}}, "left"),
       gf4,
       {{1, 0, 3, 2}, {0, 1, 2, 1}}},
      2, 2, "one symbol inside the border");
}

TEST(QuasiCyclic, Blocks) {
  for (const std::string& shift : both_ways) {
    const Vector a{1, 0, 2};
    const Vector b{0, 1, 1};
    const Vector c{2, 2, 1};
    const Vector d{0, 0, 1};
    const Vector zero{0, 0, 0};
    const auto w = [](const Vector& v) { return word(prime(3), v); };
    const Rows rows = above(beside(beside(circulant(a, shift), circulant(b, shift)), circulant(c, shift)),
                            beside(beside(circulant(zero, shift), circulant(d, shift)), circulant(a, shift)));
    const Draft draft{
        quasi_cyclic(prime(3), "blocks",
                     {{"first_rows", array({texts({w(a), w(b), w(c)}), texts({w(zero), w(d), w(a)})})}}, shift),
        prime(3), rows};
    expect_code(draft, 6, 2, "two rows of three circulants");
  }
  expect_code({quasi_cyclic(prime(2), "blocks", {{"first_rows", array({texts({"1101000"})})}}), prime(2),
               circulant({1, 1, 0, 1, 0, 0, 0}, "right")},
              4, 3, "one circulant: a cyclic code");
}

/// All words orthogonal to the rows, found by trying every vector.
Rows orthogonal(const Rows& checks, unsigned q) {
  Rows found;
  std::uint64_t words = 1;
  for (std::size_t i = 0; i < checks[0].size(); ++i) words *= q;
  for (std::uint64_t value = 1; value < words; ++value) {
    Vector v;
    for (std::uint64_t rest = value; v.size() < checks[0].size(); rest /= q)
      v.push_back(static_cast<unsigned>(rest % q));
    if (std::all_of(checks.begin(), checks.end(), [&](const Vector& row) {
          unsigned sum = 0;
          for (std::size_t c = 0; c < v.size(); ++c) sum += v[c] * row[c];
          return sum % q == 0;
        }))
      found.push_back(v);
  }
  return found;
}

TEST(QuasiCyclic, Exponents) {
  for (const std::string& shift : both_ways) {
    const unsigned z = 3;
    const std::vector<std::vector<int>> table{{0, 1, -1, 2}, {2, 0, 1, -1}};
    Rows checks(2 * z, Vector(4 * z, 0));
    for (unsigned i = 0; i < 2; ++i)
      for (unsigned j = 0; j < 4; ++j)
        for (unsigned r = 0; r < z && table[i][j] >= 0; ++r) {
          const auto e = static_cast<unsigned>(table[i][j]);
          checks[i * z + r][j * z + (shift == "right" ? r + e : r + z - e) % z] = 1;
        }
    const Value list = texts({"0 1 - 2", "2 0 1 -"});
    expect_code({quasi_cyclic(prime(2), "exponents", {{"lifting", number(z)}, {"shift_exponents", list}}, shift),
                 prime(2), orthogonal(checks, 2)},
                6, 2, "over GF(2)");
    expect_replayed({quasi_cyclic(prime(3), "exponents", {{"lifting", number(z)}, {"shift_exponents", list}}, shift),
                     prime(3), orthogonal(checks, 3)},
                    6, "over GF(3)");
  }
}

TEST(QuasiCyclic, TheBlockOfExponents) {
  // One row of blocks: e and 0.  Row i checks position (i + e) mod 4 of the first and position i of the second block.
  for (const std::string& shift : both_ways) {
    Rows rows;
    for (unsigned i = 0; i < 4; ++i) {
      Vector row(8, 0);
      row[(shift == "right" ? i + 1 : i + 3) % 4] = 1;
      row[4 + i] = 1;
      rows.push_back(row);
    }
    expect_code(
        {quasi_cyclic(prime(2), "exponents", {{"lifting", number(4)}, {"shift_exponents", texts({"1 0"})}}, shift),
         prime(2), rows},
        4, 2, "pairs of positions");
  }
}

TEST(QuasiCyclic, Refused) {
  const auto refused = [](const std::string& form, const Members& members, const std::string& place,
                          const std::string& why, const std::string& shift = "right") {
    expect_refused(quasi_cyclic(prime(2), form, members, shift), place, why);
  };
  refused("triple", {}, ".code.form", "blocks, double, bordered or exponents");
  refused("double", {{"first_row", text("101")}}, ".code.shift", "right or left", "up");
  refused("double", {{"first_row", text("")}}, ".code.first_row", "at least one symbol");
  refused("double", {{"first_row", text("102")}}, ".code.first_row", "0 and 1");
  refused("double", {{"first_rows", texts({"101"})}}, ".code.first_rows", "first_row");
  refused("double", {{"first_row", text(std::string(8193, '1'))}}, ".code", "2^27");
  refused("bordered", {{"corner", text("2")}, {"border", text("1")}, {"first_row", text("1")}}, ".code.corner",
          "below 2");
  refused("bordered", {{"corner", text("0")}, {"border", text("")}, {"first_row", text("1")}}, ".code.border",
          "below 2");
  refused("bordered", {{"corner", text("0")}, {"border", text("1")}, {"first_row", text("")}}, ".code.first_row",
          "at least one symbol");
  refused("bordered", {{"corner", number(0)}, {"border", text("1")}, {"first_row", text("1")}}, ".code.corner",
          "a string");
  const auto grid = [](const std::vector<std::vector<std::string>>& lines) {
    std::vector<Value> values;
    for (const auto& line : lines) values.push_back(texts(line));
    return Members{{"first_rows", array(values)}};
  };
  refused("blocks", grid({}), ".code.first_rows", "at least one row");
  refused("blocks", grid({{}}), ".code.first_rows[0]", "non-empty array");
  refused("blocks", grid({{""}}), ".code.first_rows[0][0]", "at least one symbol");
  refused("blocks", grid({{"10", "1"}}), ".code.first_rows[0][1]", "differ in size");
  refused("blocks", grid({{"10", "11"}, {"10"}}), ".code.first_rows[1]", "differ in length");
  refused("blocks", {{"first_rows", array({text("10")})}}, ".code.first_rows[0]", "non-empty array");
  refused("blocks", {{"first_rows", array({numbers({1})})}}, ".code.first_rows[0][0]", "a word");
  refused("blocks", grid({{std::string(20000, '1')}}), ".code", "2^27");
}

TEST(QuasiCyclic, RefusedExponents) {
  const auto refused = [](std::uint64_t lifting, const std::vector<std::string>& lines, const std::string& place,
                          const std::string& why) {
    expect_refused(
        quasi_cyclic(prime(2), "exponents", {{"lifting", number(lifting)}, {"shift_exponents", texts(lines)}}), place,
        why);
  };
  const std::string list = ".code.shift_exponents";
  refused(0, {"0 0"}, ".code.lifting", "from 1 to 1048576");
  refused((1U << 20) + 1, {"0 0"}, ".code.lifting", "from 1 to 1048576");
  refused(3, {}, list, "at least one row");
  for (const char* line : {"0 3", "0  1", " 0 1", "0 1 ", "0 01", "", "0 --", "0 -1", "0 +1", "0 18446744073709551616"})
    refused(3, {line}, list + "[0]", "entry");
  refused(3, {"0 1", "0 1 2"}, list + "[1]", "differ in length");
  refused(1U << 20, {"0"}, ".code", "2^27");
  refused(1U << 10, std::vector<std::string>(200, "0"), ".code", "2^27");
  refused(1U << 19, {"0 0 0"}, ".code", "2^20");
  refused(3, {"0"}, "", "code has dimension 0");
  expect_refused(quasi_cyclic(prime(2), "exponents", {{"lifting", number(3)}, {"shift_exponents", numbers({1})}}),
                 list + "[0]", "a string of exponents");
}

}  // namespace
}  // namespace assize::recheck::test
