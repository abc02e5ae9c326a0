// A description in words: every number, every reading, every default, as a person wants to compare it with the data
// sheet.
#pragma once
#include <string>
#include <utility>
#include <vector>

#include "sheet/description.hpp"

namespace assize::sheet {

/// Name and value of each thing that was understood; values may have several lines.
using Lines = std::vector<std::pair<std::string, std::string>>;
Lines explain(const Description& description);

/// The steps, one a line.
std::string explain_steps(const Description& description);

}  // namespace assize::sheet
