// Rows that arrive line by line and must all have the same length.
#pragma once
#include <span>

#include "sheet/matrix_source.hpp"

namespace assize::sheet {

class RowCollector {
 public:
  explicit RowCollector(const MatrixSource& source) : source_(source) {}
  /// Number of the row that would be added next, from 1.
  [[nodiscard]] std::size_t next_number() const noexcept { return out_.row_lines.size() + 1; }
  Result<void> add(std::span<const Element> row, int line);
  /// What was collected, with the notice of an open end; a failure if there is no row.
  Result<FileMatrix> finish() &&;
  /// "row 3, column 5: ..." at the line.
  [[nodiscard]] Failure bad_symbol(std::size_t column, int line, const Failure& failure) const;

 private:
  const MatrixSource& source_;
  FileMatrix out_;
};

}  // namespace assize::sheet
