// Reading a sheet from text in tests.
#pragma once
#include <string>

#include "sheet/read_sheet.hpp"

namespace assize::sheet {

inline Result<Description> read_text(const std::string& text) {
  const Fetch nothing = [](const std::string& name, const std::string&) -> Result<Fetched> {
    return Failure{name, "there is no such file", "check the name"};
  };
  return read_sheet(text, "t.toml", nothing);
}

}  // namespace assize::sheet
