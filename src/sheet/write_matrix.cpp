// One writer for each layout.
//
// Text begins with a comment line, which no sparse list has: so a matrix of two columns is not taken for one.
#include "sheet/write_matrix.hpp"

#include <algorithm>

#include "base/contract.hpp"
#include "base/word.hpp"

namespace assize::sheet {

namespace {

using field::Element;
using field::Matrix;

std::string write_text(const field::Field& field, const Matrix& matrix) {
  std::string out = "# " + std::to_string(matrix.rows()) + " x " + std::to_string(matrix.columns()) + " over GF(" +
                    std::to_string(field.order()) + ")\n";
  for (std::size_t i = 0; i < matrix.rows(); ++i) out += spell_word(field.order(), matrix.row(i)) + "\n";
  return out;
}

std::string write_csv(const Matrix& matrix) {
  std::string out;
  for (std::size_t i = 0; i < matrix.rows(); ++i)
    for (std::size_t j = 0; j < matrix.columns(); ++j)
      out += std::to_string(matrix.at(i, j)) + (j + 1 < matrix.columns() ? ',' : '\n');
  return out;
}

std::string write_matrix_market(const field::Field& field, const Matrix& matrix) {
  const bool pattern = field.order() == 2;
  std::string entries;
  std::size_t count = 0;
  for (std::size_t i = 0; i < matrix.rows(); ++i)
    for (std::size_t j = 0; j < matrix.columns(); ++j) {
      const Element value = matrix.at(i, j);
      if (value == 0) continue;
      ++count;
      entries += std::to_string(i + 1) + " " + std::to_string(j + 1);
      if (!pattern) entries += " " + std::to_string(value);
      entries += '\n';
    }
  return "%%MatrixMarket matrix coordinate " + std::string(pattern ? "pattern" : "integer") + " general\n" +
         std::to_string(matrix.rows()) + " " + std::to_string(matrix.columns()) + " " + std::to_string(count) + "\n" +
         entries;
}

std::vector<std::size_t> row_weights(const Matrix& matrix) {
  std::vector<std::size_t> weights;
  for (std::size_t i = 0; i < matrix.rows(); ++i) {
    const auto row = matrix.row(i);
    weights.push_back(row.size() - static_cast<std::size_t>(std::ranges::count(row, Element{0})));
  }
  return weights;
}

std::string numbers_line(const std::vector<std::size_t>& numbers) {
  std::string line;
  for (const std::size_t number : numbers) line += (line.empty() ? "" : " ") + std::to_string(number);
  return line + "\n";
}

/// For each row the columns of its nonzero entries, filled up with zeros to `most`.
std::string lists(const Matrix& matrix, std::size_t most, bool valued) {
  std::string out;
  for (std::size_t i = 0; i < matrix.rows(); ++i) {
    std::vector<std::size_t> numbers;
    for (std::size_t j = 0; j < matrix.columns(); ++j) {
      if (matrix.at(i, j) == 0) continue;
      numbers.push_back(j + 1);
      if (valued) numbers.push_back(matrix.at(i, j));
    }
    numbers.resize(most * (valued ? 2 : 1), 0);
    out += numbers_line(numbers);
  }
  return out;
}

std::string write_sparse_list(const field::Field& field, const Matrix& matrix) {
  const bool valued = field.order() > 2;
  const Matrix transposed = field::transpose(matrix);
  const auto of_columns = row_weights(transposed);
  const auto of_rows = row_weights(matrix);
  const std::size_t most_in_column = std::ranges::max(of_columns);
  const std::size_t most_in_row = std::ranges::max(of_rows);
  std::vector<std::size_t> sizes{matrix.columns(), matrix.rows()};
  if (valued) sizes.push_back(field.order());
  return numbers_line(sizes) + numbers_line({most_in_column, most_in_row}) + numbers_line(of_columns) +
         numbers_line(of_rows) + lists(transposed, most_in_column, valued) + lists(matrix, most_in_row, valued);
}

std::string write_npy(const field::Field& field, const Matrix& matrix) {
  const bool wide = field.order() > 256;
  std::string header = "{'descr': '" + std::string(wide ? "<u2" : "|u1") + "', 'fortran_order': False, 'shape': (" +
                       std::to_string(matrix.rows()) + ", " + std::to_string(matrix.columns()) + "), }";
  constexpr std::size_t before = 10;
  while ((before + header.size() + 1) % 64 != 0) header += ' ';
  header += '\n';
  std::string out = "\x93NUMPY";
  out += '\x01';
  out += '\0';
  out += static_cast<char>(header.size() % 256);
  out += static_cast<char>(header.size() / 256);
  out += header;
  for (std::size_t i = 0; i < matrix.rows(); ++i)
    for (const Element value : matrix.row(i)) {
      out += static_cast<char>(value & 0xff);
      if (wide) out += static_cast<char>(value >> 8);
    }
  return out;
}

}  // namespace

std::string write_matrix(const field::Field& field, const Matrix& matrix, Layout layout) {
  contract(matrix.rows() > 0 && matrix.columns() > 0, "a matrix that is written has rows and columns");
  switch (layout) {
    case Layout::text:
      return write_text(field, matrix);
    case Layout::csv:
      return write_csv(matrix);
    case Layout::matrix_market:
      return write_matrix_market(field, matrix);
    case Layout::sparse_list:
      return write_sparse_list(field, matrix);
    case Layout::npy:
      return write_npy(field, matrix);
  }
  return {};
}

}  // namespace assize::sheet
