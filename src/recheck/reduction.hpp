// Matrices, their reduced row echelon form, and the digest by which a claim names the code (section 3).
#pragma once
#include <cstddef>
#include <span>
#include <string>
#include <vector>

#include "recheck/brake.hpp"
#include "recheck/small_field.hpp"

namespace assize::recheck {

struct Matrix {
  Matrix() = default;
  Matrix(std::size_t row_count, std::size_t column_count)
      : rows(row_count), columns(column_count), symbols(row_count * column_count, 0) {}

  [[nodiscard]] std::span<Symbol> row(std::size_t r) { return {symbols.data() + r * columns, columns}; }
  [[nodiscard]] std::span<const Symbol> row(std::size_t r) const { return {symbols.data() + r * columns, columns}; }

  std::size_t rows = 0;
  std::size_t columns = 0;
  std::vector<Symbol> symbols;
};

/// Row echelon form with leading ones, zeros above and below them, and no zero row.
struct Reduced {
  Matrix generator;
  std::vector<std::size_t> pivots;  ///< ascending, one for each row
};

/// The reduced form of the span of the rows.
Reduced reduce(const Field& field, Matrix rows, const Brake& brake);

/// All words orthogonal to the span; `reduced.generator.columns` minus its dimension many rows.
Matrix null_space(const Field& field, const Reduced& reduced);

/// target += factor * source.
void add_multiple(const Field& field, std::span<Symbol> target, Symbol factor, std::span<const Symbol> source);

/// The digest of section 3, "Reduced generator".
std::string reduced_generator_digest(const Field& field, const Reduced& reduced);

}  // namespace assize::recheck
