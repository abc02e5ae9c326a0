// The matrix grows with the rows that were really there.
#include "sheet/row_collector.hpp"

#include <algorithm>

namespace assize::sheet {

Result<void> RowCollector::add(std::span<const Element> row, int line) {
  const std::size_t number = next_number();
  if (number == 1) out_.matrix = field::Matrix(0, row.size());
  if (row.size() != out_.matrix.columns())
    return source_.at_line(line,
                           "row " + std::to_string(number) + " has " + std::to_string(row.size()) +
                               " symbols, row 1 (line " + std::to_string(out_.row_lines.front()) + ") has " +
                               std::to_string(out_.matrix.columns()),
                           "give all rows the same length");
  if (const auto objection = size_objection(number, row.size())) return source_.at_line(line, *objection, size_cure());
  out_.matrix.resize_rows(number);
  std::ranges::copy(row, out_.matrix.row(number - 1).begin());
  out_.row_lines.push_back(line);
  return {};
}

Result<FileMatrix> RowCollector::finish() && {
  if (out_.row_lines.empty())
    return Failure{source_.name, "the file holds no row", "write one row of the matrix on each line"};
  // Elements of an extension field may be written as polynomials, which a cut shortens as it does numbers.
  const std::uint32_t order = source_.field.order();
  notice_open_end(source_, source_.field.degree() > 1 ? std::max(order, 10U) : order - 1, out_.notices);
  return std::move(out_);
}

Failure RowCollector::bad_symbol(std::size_t column, int line, const Failure& failure) const {
  return source_.at_line(
      line, "row " + std::to_string(next_number()) + ", column " + std::to_string(column) + ": " + failure.what,
      failure.cure);
}

}  // namespace assize::sheet
