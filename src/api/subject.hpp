// A sheet read, understood and built: what every command begins with.
#pragma once
#include <string>

#include "base/result.hpp"
#include "code/linear_code.hpp"
#include "report/result.hpp"
#include "sheet/description.hpp"

namespace assize::api {

struct Subject {
  std::string stem;  ///< file name of the sheet without folder and .toml
  std::string sheet_digest;
  sheet::Description description;
  code::LinearCode code;
  [[nodiscard]] report::Parameters parameters() const { return {code.order(), code.length(), code.dimension()}; }
};

/// Reads the sheet only.
struct ReadSheet {
  std::string bytes_digest;
  sheet::Description description;
};
Result<ReadSheet> read_sheet_file(const std::string& path);

/// Reads the sheet and constructs the code.
Result<Subject> load(const std::string& path);

/// The same for text that is at hand; sub-sheets in files of their own are refused.
Result<Subject> load_text(std::string_view text, const std::string& name);

}  // namespace assize::api
