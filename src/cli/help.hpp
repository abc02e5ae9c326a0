// Help pages, made from the records of flags.hpp.
#pragma once
#include <string>

#include "cli/flags.hpp"

namespace assize::cli {

std::string overview();
std::string page(const Command& command);

}  // namespace assize::cli
