// Distances found on the side, for inner and small outer codes.
#include "bound/small_distance.hpp"

#include <gtest/gtest.h>

#include <algorithm>

namespace assize::bound {
namespace {

field::Matrix rows(std::initializer_list<std::initializer_list<field::Element>> lines) {
  field::Matrix out(lines.size(), lines.begin()->size());
  std::size_t i = 0;
  for (const auto& line : lines) std::ranges::copy(line, out.row(i++).begin());
  return out;
}

// The tetracode [4,2,3] (J. H. Conway, N. J. A. Sloane, Sphere Packings, Lattices and Groups, 1988, ch. 3).
TEST(SmallDistance, KnownCodes) {
  const auto three = field::Field::prime(3);
  EXPECT_EQ(small_distance(*three, rows({{1, 1, 1, 0}, {0, 1, 2, 1}})), 3U);
  EXPECT_EQ(small_distance(field::Field::binary(), rows({{1, 0, 0, 1}, {0, 1, 0, 1}, {0, 0, 1, 1}})), 2U);
  EXPECT_EQ(small_distance(field::Field::binary(), rows({{1, 1, 1, 1, 1}})), 5U);
}

TEST(SmallDistance, TooManyWordsAreNotTried) {
  field::Matrix unit(25, 25);
  for (std::size_t i = 0; i < 25; ++i) unit.at(i, i) = 1;
  EXPECT_FALSE(small_distance(field::Field::binary(), unit));
}

}  // namespace
}  // namespace assize::bound
