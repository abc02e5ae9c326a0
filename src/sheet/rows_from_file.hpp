// The keys `file` and `layout` of a matrix in a sheet.
#pragma once
#include "sheet/read_parts.hpp"

namespace assize::sheet {

/// The rows of the file that the sheet names, each with the line of the key `file`; nothing if the sheet names none.
/// Refuses a sheet that has the key `rows` as well, or `layout` without `file`.
Result<std::optional<MatrixRows>> rows_from_file(TableReader& table, const Context& context, const field::Field& field);

}  // namespace assize::sheet
