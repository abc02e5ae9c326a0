// Bytes of a file that a sheet names -> matrix over the field of the sheet.
//
// The layout is taken from the content and the ending of the name; where both leave a doubt, the file is refused and
// the sheet has to state it (key `layout`), because a matrix read in a wrong way is a different code.  A size stated
// inside a file is believed only once the bytes that it calls for have been seen.
#pragma once
#include <cstdint>
#include <optional>
#include <string>
#include <string_view>
#include <vector>

#include "base/result.hpp"
#include "field/matrix.hpp"
#include "sheet/layout.hpp"

namespace assize::sheet {

/// Largest file and largest matrix (rows times columns) that are taken on.
inline constexpr std::uint64_t largest_matrix_file = 1U << 30;
inline constexpr std::uint64_t largest_matrix = 1U << 27;

struct FileMatrix {
  field::Matrix matrix;
  std::vector<int> row_lines;        ///< line of each row in the file; 0 where the layout has no line for a row
  std::vector<std::string> notices;  ///< what was read well but may not be what was meant
  std::string format;                ///< layout_name of what the file was read as
};

/// Reads a file whose layout is recognised.  A failure's `where` is "name:line", or "name, byte N" counted from 0.
Result<FileMatrix> read_matrix_file(const std::string& name, std::string_view bytes, const field::Field& field);

/// Reads a file as `layout` if that is given.
Result<FileMatrix> read_matrix_file(const std::string& name, std::string_view bytes, const field::Field& field,
                                    std::optional<Layout> layout);

}  // namespace assize::sheet
