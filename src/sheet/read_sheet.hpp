// Text of a code sheet -> Description.
#pragma once
#include <functional>
#include <string>
#include <string_view>

#include "base/result.hpp"
#include "sheet/description.hpp"

namespace assize::sheet {

/// Fetches the bytes of a file that a sheet names; the room itself opens nothing.  Arguments: the name as written, and
/// the source of the sheet that names it.  Returns the source name of the fetched file and its bytes.
struct Fetched {
  std::string source;
  std::string bytes;
};
using Fetch = std::function<Result<Fetched>(const std::string& name, const std::string& from)>;

/// Reads a whole sheet.  Every failure names `source` and the line, what stands there, and what to write instead.
Result<Description> read_sheet(std::string_view text, const std::string& source, const Fetch& fetch);

}  // namespace assize::sheet
