// The closed forms of the moments against counting, on codes with zero, repeated and proportional columns.
#include "engine/moments.hpp"

#include <gtest/gtest.h>

#include "engine/engine_support.hpp"

namespace assize::engine {
namespace {

using namespace testing;

TEST(CosetMoments, EqualTheSumsOverEveryShard) {
  Chance chance(31);
  for (const std::uint32_t q : {2U, 3U, 4U, 5U, 9U, 27U})
    for (int round = 0; round < (q < 9 ? 30 : 6); ++round) {
      const auto code =
          random_code(chance, some_field(q), 1 + static_cast<std::uint32_t>(chance.below(14)), q < 9 ? 4 : 2);
      for (std::uint32_t s = 0; s <= code.dimension(); ++s) {
        const CosetMoments moments(code, s);
        const auto outcome = run(code, plan_for(code, plan::Method::plain, s));
        for (const evidence::Shard& shard : outcome.enumeration.shards) {
          std::vector<Element> message = evidence::shard_prefix(outcome.enumeration.plan, shard.number);
          message.resize(code.dimension(), 0);
          EXPECT_EQ(shard.number == 0 ? moments.of_normalised_span() : moments.of_coset(code.encode(message)),
                    shard.moments);
        }
      }
    }
}

TEST(CosetMoments, AreExactFarBeyond64Bits) {
  // The whole space: weights are binomial.
  const std::uint32_t n = 60;
  std::vector<std::vector<Element>> rows(n, std::vector<Element>(n, 0));
  for (std::uint32_t i = 0; i < n; ++i) rows[i][i] = 1;
  const auto moments = CosetMoments(code_of(some_field(3), rows), n).of_coset(std::vector<Element>(n, 0));
  EXPECT_EQ(moments[0], power(3, n - 1) * 2 * n);
  EXPECT_EQ(moments[1], power(3, n - 1) * 2 * n + power(3, n - 2) * 4 * n * (n - 1));
}

}  // namespace
}  // namespace assize::engine
