// Every flag once: name, value, default, help.  The parser and the help pages are both made from these records.
#pragma once
#include <span>
#include <string_view>
#include <vector>

namespace assize::cli {

struct Flag {
  std::string_view name;      ///< "--at-least"
  std::string_view letter;    ///< "-o" or empty
  std::string_view value;     ///< meta-variable; empty for a switch
  std::string_view standard;  ///< what holds without it; may be empty
  std::string_view help;      ///< one line
};

/// All flags of all commands.
std::span<const Flag> all_flags();
/// The record of a flag; it must exist.
const Flag& flag(std::string_view name);

struct Example {
  std::string_view line;
  std::string_view says;
};

struct Command {
  std::string_view name;
  std::string_view argument;  ///< meta-variable of the one positional argument; empty if there is none
  std::string_view summary;   ///< one line
  std::string_view about;     ///< paragraphs of the help page
  std::vector<std::string_view> flags;
  std::vector<Example> examples;
  std::string_view exit_codes;
};

std::span<const Command> all_commands();
const Command* find_command(std::string_view name);

}  // namespace assize::cli
