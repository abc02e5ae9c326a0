// Lower bounds that need no enumeration of the code: which theorems apply to a description, with their facts.
#pragma once
#include <vector>

#include "code/linear_code.hpp"
#include "evidence/conclusions.hpp"
#include "sheet/description.hpp"

namespace assize::bound {

/// Every theorem item that holds for the code; `code` must be the one constructed from `description`.
std::vector<evidence::Item> theorems(const sheet::Description& description, const code::LinearCode& code);

}  // namespace assize::bound
