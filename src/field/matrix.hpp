// Dense matrices over a Field and their row reduction.
//
// Elements are stored one by one, not packed: matrices here are read, reduced and multiplied once, while the engines
// that enumerate words keep their own packed form.
#pragma once
#include <cstddef>
#include <span>
#include <vector>

#include "field/field.hpp"
#include "field/row.hpp"

namespace assize::field {

/// rows x columns elements, row after row.
class Matrix {
 public:
  Matrix() = default;
  Matrix(std::size_t rows, std::size_t columns) : rows_(rows), columns_(columns), elements_(rows * columns) {}

  [[nodiscard]] std::size_t rows() const noexcept { return rows_; }
  [[nodiscard]] std::size_t columns() const noexcept { return columns_; }
  [[nodiscard]] std::span<Element> row(std::size_t i) noexcept { return {elements_.data() + i * columns_, columns_}; }
  [[nodiscard]] std::span<const Element> row(std::size_t i) const noexcept {
    return {elements_.data() + i * columns_, columns_};
  }
  [[nodiscard]] Element& at(std::size_t i, std::size_t j) noexcept { return elements_[i * columns_ + j]; }
  [[nodiscard]] Element at(std::size_t i, std::size_t j) const noexcept { return elements_[i * columns_ + j]; }
  void resize_rows(std::size_t rows) {
    rows_ = rows;
    elements_.resize(rows * columns_);
  }
  friend bool operator==(const Matrix&, const Matrix&) = default;

 private:
  std::size_t rows_ = 0;
  std::size_t columns_ = 0;
  std::vector<Element> elements_;
};

/// Brings `matrix` to reduced row echelon form with the leftmost possible pivots, drops zero rows, and returns the
/// pivot columns, ascending; their number is the rank.
std::vector<std::size_t> reduce_rows(const Field& field, Matrix& matrix);

/// Matrix product a * b (contract: a.columns() == b.rows()).
Matrix multiply(const Field& field, const Matrix& a, const Matrix& b);
Matrix transpose(const Matrix& a);
/// Rows span the right null space { v : a v^T = 0 }, in the form read off the reduced matrix: one row for each column
/// without pivot, ascending, with 1 there and 0 in the other such columns.
Matrix null_space(const Field& field, const Matrix& a);

}  // namespace assize::field
