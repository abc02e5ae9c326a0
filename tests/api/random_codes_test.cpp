// Laws that hold for every code, tried on random codes over many fields.
#include <gtest/gtest.h>

#include <random>

#include "api/code_support.hpp"
#include "base/integers.hpp"
#include "bound/macwilliams.hpp"

namespace assize::api {
namespace {

using evidence::WeightDistribution;
using field::Element;

struct Shape {
  const char* field;
  std::uint32_t length;
  std::uint32_t dimension;
};

void PrintTo(const Shape& shape, std::ostream* out) {
  *out << "[" << shape.length << "," << shape.dimension << "] "
       << std::string(shape.field).substr(0, std::string(shape.field).find('\n'));
}

// Both k and n - k stay small, so that code and dual are enumerated in no time.
constexpr Shape shapes[] = {
    {"order = 2", 9, 4},
    {"order = 2", 14, 7},
    {"order = 2", 20, 11},
    {"order = 2", 70, 9},
    {"order = 3", 10, 5},
    {"order = 4\nmodulus = \"x^2 + x + 1\"", 9, 4},
    {"order = 5", 8, 4},
    {"order = 7", 7, 3},
    {"order = 8\nmodulus = \"x^3 + x^2 + 1\"", 7, 3},
    {"order = 9\nmodulus = \"x^2 + x + 2\"", 7, 4},
    {"order = 13", 6, 3},
    {"order = 16\nmodulus = \"x^4 + x^3 + 1\"", 6, 3},
    {"order = 25\nmodulus = \"x^2 + x + 2\"", 5, 3},
    {"order = 27\nmodulus = \"x^3 + 2*x + 1\"", 5, 2},
    {"order = 49\nmodulus = \"x^2 + x + 3\"", 4, 2},
    {"order = 64\nmodulus = \"x^6 + x + 1\"", 5, 2},
    {"order = 127", 4, 2},
    {"order = 128\nmodulus = \"x^7 + x + 1\"", 4, 2},
    {"order = 251", 4, 2},
    {"order = 256\nmodulus = \"x^8 + x^4 + x^3 + x^2 + 1\"", 4, 2},
    {"order = 257", 4, 2},
    {"order = 512\nmodulus = \"x^9 + x^4 + 1\"", 3, 1},
};

std::string sheet_of(const Shape& shape, int seed) {
  return "[field]\n" + std::string(shape.field) +
         "\n[code]\nfamily = \"random-linear\"\ncodeword_length = " + std::to_string(shape.length) +
         "\ndimension = " + std::to_string(shape.dimension) + "\nseed = " + std::to_string(seed) + "\n";
}

class RandomCodes : public testing::TestWithParam<Shape> {
 protected:
  static constexpr int seeds = 3;
};

BigInteger total(const WeightDistribution& weights) {
  BigInteger sum = 0;
  for (const auto& [weight, count] : weights) sum += count;
  return sum;
}

TEST_P(RandomCodes, CountsAddUpAndTheDualFollowsBothWays) {
  for (int seed = 1; seed <= seeds; ++seed) {
    const Subject code = subject(sheet_of(GetParam(), seed));
    const std::uint32_t q = code.code.order();
    const std::uint32_t n = code.code.length();
    const auto weights = weights_of(code.code);
    EXPECT_EQ(total(weights), power(q, code.code.dimension()));
    if (code.code.redundancy() == 0) continue;
    const code::LinearCode dual = code::dual(code.code);
    if (n > 20) continue;  // the dual of the long one is too large to enumerate
    const auto dual_weights = weights_of(dual);
    EXPECT_EQ(total(dual_weights), power(q, dual.dimension()));
    EXPECT_EQ(bound::dual_distribution(weights, n, q), dual_weights) << "seed " << seed;
    EXPECT_EQ(bound::dual_distribution(dual_weights, n, q), weights) << "seed " << seed;
  }
}

TEST_P(RandomCodes, TheDualOfTheDualIsTheCode) {
  for (int seed = 1; seed <= seeds; ++seed) {
    const Subject code = subject(sheet_of(GetParam(), seed));
    if (code.code.redundancy() == 0) continue;
    const code::LinearCode dual = code::dual(code.code);
    EXPECT_EQ(dual.dimension(), code.code.redundancy());
    EXPECT_EQ(code::dual(dual).reduced_generator_digest(), code.code.reduced_generator_digest());
  }
}

TEST_P(RandomCodes, PermutedAndScaledColumnsKeepTheWeights) {
  for (int seed = 1; seed <= seeds; ++seed) {
    const Subject code = subject(sheet_of(GetParam(), seed));
    std::mt19937_64 random(static_cast<std::uint64_t>(seed));
    const auto original = code.code.generator();
    field::Matrix changed(original.rows(), original.columns());
    std::vector<std::size_t> order(original.columns());
    std::iota(order.begin(), order.end(), std::size_t{0});
    std::ranges::shuffle(order, random);
    for (std::size_t j = 0; j < order.size(); ++j) {
      const auto scale = static_cast<Element>(1 + random() % (code.code.order() - 1));
      for (std::size_t i = 0; i < original.rows(); ++i)
        changed.at(i, j) = code.code.field().multiply(scale, original.at(i, order[j]));
    }
    const code::LinearCode other(code.code.field(), code::reduce(code.code.field(), std::move(changed)));
    EXPECT_EQ(weights_of(other), weights_of(code.code)) << "seed " << seed;
  }
}

TEST_P(RandomCodes, PlainAndExhaustAgree) {
  for (int seed = 1; seed <= seeds; ++seed) {
    const Subject code = subject(sheet_of(GetParam(), seed));
    if (code.code.order() > 256) continue;
    EXPECT_EQ(weights_of(code.code, plan::Method::plain), weights_of(code.code, plan::Method::exhaust))
        << "seed " << seed;
  }
}

TEST_P(RandomCodes, WordsOfTheGeneratorAreOrthogonalToTheParityCheck) {
  for (int seed = 1; seed <= seeds; ++seed) {
    const Subject code = subject(sheet_of(GetParam(), seed));
    const auto product =
        field::multiply(code.code.field(), code.code.generator(), field::transpose(code.code.parity_check()));
    for (std::size_t i = 0; i < product.rows(); ++i)
      for (const Element entry : product.row(i)) EXPECT_EQ(entry, 0);
  }
}

INSTANTIATE_TEST_SUITE_P(Many, RandomCodes, testing::ValuesIn(shapes));

TEST(DualDistribution, RefusesWhatIsNoDistributionOfALinearCode) {
  EXPECT_FALSE(bound::dual_distribution(
      {{0, 1}, {7, 254}, {8, 505}, {11, 1288}, {12, 1288}, {15, 506}, {16, 253}, {23, 1}}, 23, 2));
  EXPECT_FALSE(bound::dual_distribution({}, 5, 2));
  EXPECT_FALSE(bound::dual_distribution({{6, 1}}, 5, 2));
}

}  // namespace
}  // namespace assize::api
