// Power moments of the weights in a coset, in closed form: what the counts of a shard must add up to.
//
// Over v + span(g_1..g_s) a position where some g_j is not zero ("free") takes every symbol equally often, and two free
// positions do so together unless their columns are proportional.  Columns are sorted into classes once; after that a
// shard costs a walk over the positions.
#pragma once
#include <array>
#include <cstdint>
#include <span>
#include <vector>

#include "base/integers.hpp"
#include "code/linear_code.hpp"

namespace assize::engine {

class CosetMoments {
 public:
  /// The last `free_rows` rows of the reduced generator are g_1..g_s.
  CosetMoments(const code::LinearCode& code, std::uint32_t free_rows);

  /// Sums of w and w^2 over v + span(g_1..g_s).
  [[nodiscard]] std::array<BigInteger, 2> of_coset(std::span<const field::Element> v) const;
  /// The same over one scalar multiple of each non-zero word of span(g_1..g_s).
  [[nodiscard]] std::array<BigInteger, 2> of_normalised_span() const;

 private:
  static constexpr std::uint32_t not_free = UINT32_MAX;
  struct Position {
    std::uint32_t column_class = not_free;  ///< equal for proportional columns
    field::Element scale = 1;               ///< inverse of the column's first non-zero symbol
  };
  field::Field field_;
  std::uint32_t free_rows_;
  std::vector<Position> positions_;
  std::uint64_t free_positions_ = 0;
  std::uint64_t proportional_pairs_ = 0;  ///< ordered pairs of free positions in one class
};

}  // namespace assize::engine
