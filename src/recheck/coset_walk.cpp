// What the two walks have in common: whole codes as unions of cosets, and a cautious estimate of the time.
#include "recheck/coset_walk.hpp"

namespace assize::recheck {

std::unique_ptr<CosetWalk> make_coset_walk(const Field& field, const Matrix& rows) {
  return field.characteristic() == 2 ? make_binary_walk(field, rows) : make_odd_walk(field, rows);
}

bool count_normalised(const CosetWalk& walk, const Matrix& rows, std::vector<std::uint64_t>& counts,
                      const Stopped& stopped) {
  for (std::size_t r = 0; r < rows.rows; ++r)
    if (!walk.count(rows.row(r), rows.rows - 1 - r, counts, stopped)) return false;
  return true;
}

std::uint64_t least_weight(const Field& field, const Matrix& rows, const Brake& brake) {
  std::vector<std::uint64_t> counts(rows.columns + 1, 0);
  const auto walk = make_coset_walk(field, rows);
  if (!count_normalised(*walk, rows, counts, [&] { return brake.pulled(); })) throw Ended{};
  std::uint64_t weight = 0;
  while (weight < rows.columns && counts[weight] == 0) ++weight;
  return weight;
}

std::uint64_t word_cost_picoseconds(const Field& field, std::size_t length) noexcept {
  const std::uint64_t digits = std::uint64_t{length} * field.degree();
  if (field.characteristic() == 2) return 3000 + 3000 * field.degree() * ((length + 63) / 64);
  return 8000 + (field.characteristic() < 128 ? 200 : 1500) * digits;
}

}  // namespace assize::recheck
