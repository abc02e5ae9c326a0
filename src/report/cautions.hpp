// What every certificate says about its own limits.
#pragma once
#include <string>
#include <vector>

#include "sheet/description.hpp"

namespace assize::report {

/// Cautions that apply to any statement about distances and weights, and those that the kind of code calls for.
std::vector<std::string> cautions(const sheet::Description& description);

}  // namespace assize::report
