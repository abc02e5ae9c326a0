// Gauss-Jordan elimination and what follows from it.
//
// A pivot row is zero left of its pivot, so every row operation starts at the pivot column.
#include "field/matrix.hpp"

#include <algorithm>

namespace assize::field {

std::vector<std::size_t> reduce_rows(const Field& field, Matrix& matrix) {
  std::vector<std::size_t> pivots;
  for (std::size_t column = 0; column < matrix.columns() && pivots.size() < matrix.rows(); ++column) {
    const std::size_t target = pivots.size();
    std::size_t found = target;
    while (found < matrix.rows() && matrix.at(found, column) == 0) ++found;
    if (found == matrix.rows()) continue;
    if (found != target)
      std::swap_ranges(matrix.row(found).begin(), matrix.row(found).end(), matrix.row(target).begin());
    const std::span<Element> pivot_row = matrix.row(target).subspan(column);
    scale(field, pivot_row, field.inverse(pivot_row.front()));
    for (std::size_t i = 0; i < matrix.rows(); ++i)
      if (i != target) {
        const std::span<Element> row = matrix.row(i).subspan(column);
        add_multiple(field, row, field.negate(row.front()), pivot_row);
      }
    pivots.push_back(column);
  }
  matrix.resize_rows(pivots.size());
  return pivots;
}

Matrix multiply(const Field& field, const Matrix& a, const Matrix& b) {
  contract(a.columns() == b.rows(), "the shapes of two matrices fit their product");
  Matrix product(a.rows(), b.columns());
  for (std::size_t i = 0; i < a.rows(); ++i)
    for (std::size_t j = 0; j < a.columns(); ++j) add_multiple(field, product.row(i), a.at(i, j), b.row(j));
  return product;
}

Matrix transpose(const Matrix& a) {
  Matrix result(a.columns(), a.rows());
  for (std::size_t i = 0; i < a.rows(); ++i)
    for (std::size_t j = 0; j < a.columns(); ++j) result.at(j, i) = a.at(i, j);
  return result;
}

Matrix null_space(const Field& field, const Matrix& a) {
  Matrix reduced = a;
  const std::vector<std::size_t> pivots = reduce_rows(field, reduced);
  Matrix result(a.columns() - pivots.size(), a.columns());
  std::size_t pivots_before = 0;  // pivots left of the current column
  for (std::size_t column = 0; column < a.columns(); ++column) {
    if (pivots_before < pivots.size() && pivots[pivots_before] == column) {
      ++pivots_before;
      continue;
    }
    const std::size_t row = column - pivots_before;
    result.at(row, column) = 1;
    for (std::size_t i = 0; i < pivots_before; ++i) result.at(row, pivots[i]) = field.negate(reduced.at(i, column));
  }
  return result;
}

}  // namespace assize::field
