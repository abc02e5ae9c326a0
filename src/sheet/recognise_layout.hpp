// Which layout a matrix file has: decided by content and ending, never by a guess.
#pragma once
#include "sheet/matrix_source.hpp"

namespace assize::sheet {

struct Recognised {
  Layout layout = Layout::text;
  bool by_ending = false;  ///< false: by content
};

/// The layout, or a failure that says what to write into the sheet.
Result<Recognised> recognise_layout(const MatrixSource& source);

}  // namespace assize::sheet
