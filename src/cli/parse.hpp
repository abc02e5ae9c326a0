// The words of the command line -> a command, its argument and its flags.
#pragma once
#include <map>
#include <optional>
#include <string>
#include <vector>

#include "base/result.hpp"
#include "cli/flags.hpp"

namespace assize::cli {

class Arguments {
 public:
  const Command* command = nullptr;
  std::string argument;
  std::map<std::string, std::string, std::less<>> values;  ///< by flag name; switches have an empty value

  [[nodiscard]] bool has(std::string_view name) const { return values.contains(name); }
  [[nodiscard]] std::optional<std::string> value(std::string_view name) const;
  /// Value as an integer within limits.
  [[nodiscard]] Result<std::optional<std::uint64_t>> integer(std::string_view name, std::uint64_t least,
                                                             std::uint64_t largest) const;
  /// Value as a duration in seconds: a decimal number and s, m or h.
  [[nodiscard]] Result<std::optional<double>> duration(std::string_view name) const;
};

/// `words` without the program's name.  The command must be known.
Result<Arguments> parse(const Command& command, const std::vector<std::string>& words);

}  // namespace assize::cli
