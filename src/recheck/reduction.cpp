// Gauss-Jordan elimination, plain for every field and word-wide for GF(2).
#include "recheck/reduction.hpp"

#include <algorithm>

namespace assize::recheck {
namespace {

using Word = std::uint64_t;

std::vector<std::size_t> eliminate(const Field& field, Matrix& m, const Brake& brake) {
  std::vector<std::size_t> pivots;
  for (std::size_t column = 0; column < m.columns && pivots.size() < m.rows; ++column) {
    const std::size_t top = pivots.size();
    std::size_t found = top;
    while (found < m.rows && m.row(found)[column] == 0) ++found;
    if (found == m.rows) continue;
    brake.poll();
    if (found != top) std::swap_ranges(m.row(found).begin(), m.row(found).end(), m.row(top).begin());
    const Symbol scale = field.inverse(m.row(top)[column]);
    if (scale != 1)
      for (Symbol& symbol : m.row(top)) symbol = field.multiply(symbol, scale);
    for (std::size_t r = 0; r < m.rows; ++r)
      if (r != top && m.row(r)[column] != 0)
        add_multiple(field, m.row(r).subspan(column), field.negate(m.row(r)[column]), m.row(top).subspan(column));
    pivots.push_back(column);
  }
  return pivots;
}

std::vector<std::size_t> eliminate_bits(Matrix& m, const Brake& brake) {
  const std::size_t width = (m.columns + 63) / 64;
  std::vector<Word> bits(m.rows * width, 0);
  for (std::size_t r = 0; r < m.rows; ++r)
    for (std::size_t c = 0; c < m.columns; ++c) bits[r * width + c / 64] |= Word{m.row(r)[c]} << (c % 64);
  const auto bit = [&](std::size_t r, std::size_t c) { return (bits[r * width + c / 64] >> (c % 64) & 1) != 0; };

  std::vector<std::size_t> pivots;
  for (std::size_t column = 0; column < m.columns && pivots.size() < m.rows; ++column) {
    const std::size_t top = pivots.size();
    std::size_t found = top;
    while (found < m.rows && !bit(found, column)) ++found;
    if (found == m.rows) continue;
    brake.poll();
    Word* const pivot = bits.data() + top * width;
    if (found != top) std::swap_ranges(pivot, pivot + width, bits.data() + found * width);
    for (std::size_t r = 0; r < m.rows; ++r)
      if (r != top && bit(r, column))
        for (std::size_t w = column / 64; w < width; ++w) bits[r * width + w] ^= pivot[w];
    pivots.push_back(column);
  }
  for (std::size_t r = 0; r < m.rows; ++r)
    for (std::size_t c = 0; c < m.columns; ++c) m.row(r)[c] = bit(r, c) ? 1 : 0;
  return pivots;
}

}  // namespace

void add_multiple(const Field& field, std::span<Symbol> target, Symbol factor, std::span<const Symbol> source) {
  if (factor == 0) return;
  for (std::size_t i = 0; i < source.size(); ++i)
    if (source[i] != 0) target[i] = field.add(target[i], field.multiply(factor, source[i]));
}

Reduced reduce(const Field& field, Matrix rows, const Brake& brake) {
  Reduced result;
  result.pivots = field.order() == 2 ? eliminate_bits(rows, brake) : eliminate(field, rows, brake);
  rows.rows = result.pivots.size();
  rows.symbols.resize(rows.rows * rows.columns);
  result.generator = std::move(rows);
  return result;
}

Matrix null_space(const Field& field, const Reduced& reduced) {
  const Matrix& g = reduced.generator;
  Matrix dual(g.columns - g.rows, g.columns);
  std::size_t row = 0;
  std::size_t next_pivot = 0;
  for (std::size_t column = 0; column < g.columns; ++column) {
    if (next_pivot < reduced.pivots.size() && reduced.pivots[next_pivot] == column) {
      ++next_pivot;
      continue;
    }
    dual.row(row)[column] = 1;
    for (std::size_t i = 0; i < g.rows; ++i) dual.row(row)[reduced.pivots[i]] = field.negate(g.row(i)[column]);
    ++row;
  }
  return dual;
}

}  // namespace assize::recheck
