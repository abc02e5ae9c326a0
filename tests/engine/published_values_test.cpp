// Weight distributions from the literature: F. J. MacWilliams and N. J. A. Sloane, The Theory of Error-Correcting
// Codes, 1977 (Golay codes, hexacode, simplex codes).
#include <gtest/gtest.h>

#include "engine/engine_support.hpp"

namespace assize::engine {
namespace {

using namespace testing;
using plan::Method;

void expect_distribution(const code::LinearCode& code, const evidence::WeightDistribution& expected) {
  for (const Method method : {Method::plain, Method::exhaust})
    EXPECT_EQ(evidence::distribution(run(code, method).enumeration), expected) << plan::name(method);
}

/// Shifts of one word: the cyclic code of a generator polynomial, lowest coefficient first.
std::vector<std::vector<Element>> shifts(std::size_t n, const std::vector<Element>& generator) {
  std::vector<std::vector<Element>> rows;
  for (std::size_t i = 0; i + generator.size() <= n; ++i) {
    rows.emplace_back(n, 0);
    std::ranges::copy(generator, rows.back().begin() + static_cast<std::ptrdiff_t>(i));
  }
  return rows;
}

/// Appends minus the sum of each row.
std::vector<std::vector<Element>> extended(const field::Field& field, std::vector<std::vector<Element>> rows) {
  for (auto& row : rows) {
    Element sum = 0;
    for (const Element symbol : row) sum = field.add(sum, symbol);
    row.push_back(field.negate(sum));
  }
  return rows;
}

TEST(PublishedValues, BinaryGolayCodes) {
  const auto rows = shifts(23, {1, 1, 0, 0, 0, 1, 1, 1, 0, 1, 0, 1});  // x^11 + x^9 + x^7 + x^6 + x^5 + x + 1
  const auto& field = field::Field::binary();
  expect_distribution(code_of(field, rows),
                      {{0, 1}, {7, 253}, {8, 506}, {11, 1288}, {12, 1288}, {15, 506}, {16, 253}, {23, 1}});
  expect_distribution(code_of(field, extended(field, rows)), {{0, 1}, {8, 759}, {12, 2576}, {16, 759}, {24, 1}});
}

TEST(PublishedValues, TernaryGolayCodes) {
  const auto rows = shifts(11, {2, 0, 1, 2, 1, 1});  // x^5 + x^4 - x^3 + x^2 - 1
  const auto field = some_field(3);
  expect_distribution(code_of(field, rows), {{0, 1}, {5, 132}, {6, 132}, {8, 330}, {9, 110}, {11, 24}});
  expect_distribution(code_of(field, extended(field, rows)), {{0, 1}, {6, 264}, {9, 440}, {12, 24}});
}

TEST(PublishedValues, Hexacode) {
  expect_distribution(code_of(some_field(4), {{1, 0, 0, 1, 3, 2}, {0, 1, 0, 1, 2, 3}, {0, 0, 1, 1, 1, 1}}),
                      {{0, 1}, {4, 45}, {6, 18}});
}

TEST(PublishedValues, AllWordsOfASimplexCodeHaveTheSameWeight) {
  for (const auto& [q, m] : {std::array{2U, 8U}, std::array{3U, 5U}, std::array{4U, 4U}, std::array{5U, 3U},
                             std::array{8U, 3U}, std::array{9U, 3U}, std::array{16U, 2U}}) {
    std::vector<std::vector<Element>> rows(m);
    const evidence::EnumerationPlan columns{"", q, m, 0, evidence::shard_count(q, m, 0).value()};
    for (std::uint64_t number = 1; number < columns.shards; ++number) {
      const auto column = evidence::shard_prefix(columns, number);
      for (std::uint32_t i = 0; i < m; ++i) rows[i].push_back(column[i]);
    }
    expect_distribution(code_of(some_field(q), rows),
                        {{0, 1}, {static_cast<std::uint32_t>(power_if_fits(q, m - 1).value()), power(q, m) - 1}});
  }
}

}  // namespace
}  // namespace assize::engine
