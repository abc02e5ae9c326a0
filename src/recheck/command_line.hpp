// The command line of assize-recheck, read strictly and without any library.
#pragma once
#include <string>
#include <string_view>
#include <vector>

#include "recheck/recheck.hpp"

namespace assize::recheck {

struct CommandLine {
  std::string certificate;
  Options options;
  bool json = false;
  bool quiet = false;
  bool help = false;
  bool version = false;
};

Result<CommandLine> read_command_line(const std::vector<std::string>& arguments);

/// "30s", "10m", "2h", "1d" in seconds.
Result<std::uint64_t> read_duration(std::string_view text);

/// The page of --help.
std::string_view help_page() noexcept;

}  // namespace assize::recheck
