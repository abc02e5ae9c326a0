// Reed-Muller codes: the values of the monomials of low degree at all points of GF(2)^m.
#include <bit>

#include "recheck/replay.hpp"

namespace assize::recheck {

Result<Built> build_reed_muller(Keys& code, const FieldPtr& field) {
  const std::uint64_t degree = code.integer("order", 0, 20);
  const std::uint64_t variables = code.integer("variables", degree, 20);
  if (auto end = code.end(); !end) return end.error();
  if (field->order() != 2) return Failure{code.path(), "a Reed-Muller code is over GF(2)", ""};
  const std::uint32_t length = std::uint32_t{1} << variables;
  // A monomial is the set of its variables; it is 1 at the points that contain this set.
  std::vector<std::uint32_t> monomials;
  for (std::uint32_t set = 0; set < length; ++set)
    if (std::popcount(set) <= static_cast<int>(degree)) monomials.push_back(set);
  if (auto fits = matrix_fits(monomials.size(), length, code.path()); !fits) return fits.error();
  Matrix rows(monomials.size(), length);
  for (std::size_t r = 0; r < rows.rows; ++r)
    for (std::uint32_t point = 0; point < length; ++point)
      rows.row(r)[point] = (point & monomials[r]) == monomials[r] ? 1 : 0;
  return Built{field, std::move(rows), {}};
}

}  // namespace assize::recheck
