// One of the two halves of a sparse list: the entries said column by column, or said row by row.
#pragma once
#include "sheet/matrix_source.hpp"

namespace assize::sheet {

struct SparseEntry {
  std::uint32_t list = 0;      ///< which column, or which row; from 0
  std::uint32_t position = 0;  ///< which row in that column, or which column in that row; from 0
  Element value = 0;
};

struct SparseHalf {
  std::string name;   ///< "column", or "row"
  std::string other;  ///< "row", or "column"
  bool valued = false;
  std::uint64_t lists = 0;      ///< how many columns
  std::uint64_t positions = 0;  ///< how many rows
  std::uint64_t most = 0;       ///< largest weight
  std::vector<std::uint64_t> weights = {};
  int weights_line = 0;
  int first_line = 0;  ///< of the lists
  std::vector<SparseEntry> entries = {};
  bool unpadded = false;  ///< some list is short and not filled up with zeros

  [[nodiscard]] int line_of(std::uint64_t list) const { return first_line + static_cast<int>(list); }
  /// Reads the line of one list; the members up to first_line must be known.
  Result<void> read_list(const MatrixSource& source, std::uint32_t list, const Line& line);

 private:
  Result<SparseEntry> read_entry(const MatrixSource& source, const Line& line, const std::string& label,
                                 std::string_view position, std::string_view value) const;
};

}  // namespace assize::sheet
