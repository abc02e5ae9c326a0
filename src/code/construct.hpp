// Description -> LinearCode: a family builds, steps transform, and everything that does not fit is named with its line.
#pragma once
#include "base/result.hpp"
#include "code/linear_code.hpp"
#include "sheet/description.hpp"

namespace assize::code {

/// Most elements that a matrix built on the way may have.
inline constexpr std::uint64_t largest_matrix = 1ULL << 27;

/// Builds the code.  Failures: a code of dimension 0, parameters that contradict each other, sizes beyond the limits.
Result<LinearCode> construct(const sheet::Description& description);

}  // namespace assize::code
