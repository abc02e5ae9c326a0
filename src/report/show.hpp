// What was understood of a sheet: every number, every reading, every default.
#pragma once
#include <string>
#include <vector>

#include "report/document.hpp"
#include "sheet/description.hpp"

namespace assize::report {

/// Facts about a constructed code, for showing it.
struct CodeFacts {
  std::uint32_t order = 2;
  std::uint32_t length = 0;
  std::uint32_t dimension = 0;
  std::uint32_t guaranteed = 1;         ///< distance proved by theorems alone
  std::string guaranteed_by;            ///< name of the theorem, empty if there is none
  std::vector<std::string> structure;   ///< what holds for all words: "self-dual", "every weight is divisible by 4"
  std::vector<std::string> symmetries;  ///< verified on the code
  std::vector<std::string> notices;
  std::string sheet_digest;
  std::string description_digest;
  std::string reduced_generator_digest;
};

Document show(const sheet::Description& description, const CodeFacts& facts);

}  // namespace assize::report
