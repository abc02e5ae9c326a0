// One reader for each layout; private to this room.  Each leaves `format` to its caller.
#pragma once
#include "sheet/matrix_source.hpp"

namespace assize::sheet {

/// One row a line, symbols separated by blanks, over GF(2) also without; '#' begins a comment line.
Result<FileMatrix> read_text_matrix(const MatrixSource& source);
/// One row a line, symbols separated by commas or by semicolons.
Result<FileMatrix> read_csv_matrix(const MatrixSource& source);
/// "%%MatrixMarket matrix coordinate|array integer|pattern general".
Result<FileMatrix> read_matrix_market(const MatrixSource& source);
/// Positions of the nonzero entries, by columns and once more by rows.
Result<FileMatrix> read_sparse_list(const MatrixSource& source);
/// Array files, versions 1.0 and 2.0.
Result<FileMatrix> read_npy(const MatrixSource& source);

}  // namespace assize::sheet
