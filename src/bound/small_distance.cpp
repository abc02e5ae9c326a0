// Depth first over the rows; combinations whose first coefficient is 1 represent their scalar multiples.
#include "bound/small_distance.hpp"

#include <algorithm>

#include "base/integers.hpp"
#include "code/linear_code.hpp"

namespace assize::bound {

using field::Element;

namespace {

/// Least weight of word + any combination of the rows from `row` on.
std::uint32_t least_weight(const field::Field& field, const field::Matrix& rows, std::size_t row,
                           const std::vector<Element>& word) {
  if (row == rows.rows()) return code::weight(word);
  std::uint32_t least = UINT32_MAX;
  for (std::uint32_t factor = 0; factor < field.order(); ++factor) {
    std::vector<Element> next = word;
    field::add_multiple(field, next, static_cast<Element>(factor), rows.row(row));
    least = std::min(least, least_weight(field, rows, row + 1, next));
  }
  return least;
}

}  // namespace

std::optional<std::uint32_t> small_distance(const field::Field& field, const field::Matrix& rows) {
  const auto words = power_if_fits(field.order(), rows.rows());
  if (!words || *words > most_side_words) return std::nullopt;
  std::uint32_t least = UINT32_MAX;
  for (std::size_t lead = 0; lead < rows.rows(); ++lead) {
    const auto row = rows.row(lead);
    least = std::min(least, least_weight(field, rows, lead + 1, {row.begin(), row.end()}));
  }
  return least;
}

}  // namespace assize::bound
