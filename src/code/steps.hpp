// What [[then]] does to a code; private to this room.
#pragma once
#include "base/result.hpp"
#include "code/linear_code.hpp"
#include "sheet/description.hpp"

namespace assize::code {

/// The code after one step.  Structure that theorems rest on does not survive a step; notices do.
Result<LinearCode> apply(const sheet::Step& step, const LinearCode& code, const sheet::Description& in);

}  // namespace assize::code
