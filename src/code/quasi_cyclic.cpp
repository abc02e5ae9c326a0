// Circulant blocks, written out.
#include <algorithm>

#include "code/families.hpp"

namespace assize::code {

using field::Element;
using field::Matrix;

namespace {

/// Column of symbol j of the first row in row i.
std::size_t moved(std::size_t j, std::size_t i, std::size_t size, bool right) {
  return right ? (j + i) % size : (j + size - i) % size;
}

void write_circulant(Matrix& matrix, std::size_t top, std::size_t left, const sheet::Elements& first_row, bool right) {
  const std::size_t size = first_row.size();
  for (std::size_t i = 0; i < size; ++i)
    for (std::size_t j = 0; j < size; ++j) matrix.at(top + i, left + moved(j, i, size, right)) = first_row[j];
}

Result<LinearCode> from_parity_check(const sheet::QuasiCyclic& family, const sheet::Description& in) {
  const std::uint64_t z = family.lifting;
  const std::uint64_t rows = family.shifts.size() * z;
  const std::uint64_t columns = family.shifts.front().size() * z;
  if (const auto fits = check_size(in, family.line, std::max(rows, columns), columns); !fits) return fits.error();
  Matrix check(rows, columns);
  for (std::size_t block_row = 0; block_row < family.shifts.size(); ++block_row)
    for (std::size_t block = 0; block < family.shifts[block_row].size(); ++block)
      if (const auto shift = family.shifts[block_row][block])
        for (std::size_t i = 0; i < z; ++i)
          check.at(block_row * z + i, block * z + moved(family.right ? *shift : (z - *shift) % z, i, z, true)) = 1;
  const LinearCode orthogonal(in.field, reduce(in.field, std::move(check)));
  LinearCode code = dual(orthogonal);
  if (orthogonal.dimension() < rows)
    code.structure.notices.push_back("the " + std::to_string(rows) + " rows of the parity-check matrix have rank " +
                                     std::to_string(orthogonal.dimension()));
  return code;
}

}  // namespace

Result<LinearCode> build(const sheet::QuasiCyclic& family, const sheet::Description& in) {
  if (family.form == sheet::QuasiCyclic::Form::exponents) return from_parity_check(family, in);
  const sheet::Elements& first = family.first_rows.front().front();
  const std::size_t size = first.size();
  const std::size_t border = family.form == sheet::QuasiCyclic::Form::bordered ? 1 : 0;
  const bool blocks = family.form == sheet::QuasiCyclic::Form::blocks;
  const std::size_t rows = blocks ? family.first_rows.size() * size : size + border;
  const std::size_t columns = blocks ? family.first_rows.front().size() * size : 2 * rows;
  if (const auto fits = check_size(in, family.line, rows, columns); !fits) return fits.error();
  Matrix generator(rows, columns);
  if (blocks) {
    for (std::size_t i = 0; i < family.first_rows.size(); ++i)
      for (std::size_t j = 0; j < family.first_rows[i].size(); ++j)
        write_circulant(generator, i * size, j * size, family.first_rows[i][j], family.right);
  } else {
    for (std::size_t i = 0; i < rows; ++i) generator.at(i, i) = 1;
    if (border == 1) {
      generator.at(0, rows) = family.corner;
      for (std::size_t i = 1; i < rows; ++i) generator.at(0, rows + i) = generator.at(i, rows) = family.border;
    }
    write_circulant(generator, border, rows + border, first, family.right);
  }
  LinearCode code(in.field, reduce(in.field, std::move(generator)));
  if (code.dimension() < rows)
    code.structure.notices.push_back("the " + std::to_string(rows) + " rows have rank " +
                                     std::to_string(code.dimension()));
  return code;
}

}  // namespace assize::code
