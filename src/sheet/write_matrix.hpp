// A matrix as the bytes of a file, in any layout that is read; what is written is read back equal.
#pragma once
#include <string>

#include "field/matrix.hpp"
#include "sheet/layout.hpp"

namespace assize::sheet {

/// The matrix must have a row and a column (contract).
std::string write_matrix(const field::Field& field, const field::Matrix& matrix, Layout layout);

}  // namespace assize::sheet
