// The only file that includes the command-line library.
#include "cli/parse.hpp"

#include <CLI/CLI.hpp>

#include "base/integers.hpp"

namespace assize::cli {

std::optional<std::string> Arguments::value(std::string_view name) const {
  const auto entry = values.find(name);
  if (entry == values.end()) return std::nullopt;
  return entry->second;
}

Result<std::optional<std::uint64_t>> Arguments::integer(std::string_view name, std::uint64_t least,
                                                        std::uint64_t largest) const {
  const auto text = value(name);
  if (!text) return std::optional<std::uint64_t>{};
  const auto number = parse_decimal(*text, largest);
  if (!number || *number < least)
    return Failure{std::string(name),
                   "\"" + *text + "\" is not a number from " + std::to_string(least) + " to " + std::to_string(largest),
                   "write it in plain digits"};
  return std::optional<std::uint64_t>{*number};
}

Result<std::optional<double>> Arguments::duration(std::string_view name) const {
  const auto text = value(name);
  if (!text) return std::optional<double>{};
  constexpr std::uint64_t longest = 1000000;
  double unit = 0;
  if (text->ends_with('s')) unit = 1;
  if (text->ends_with('m')) unit = 60;
  if (text->ends_with('h')) unit = 3600;
  const auto number =
      text->empty() ? std::nullopt : parse_decimal(std::string_view(*text).substr(0, text->size() - 1), longest);
  if (unit == 0 || !number || *number == 0)
    return Failure{std::string(name), "\"" + *text + "\" is not a duration",
                   "write a number and s, m or h: 30s, 10m, 2h"};
  return std::optional<double>{static_cast<double>(*number) * unit};
}

Result<Arguments> parse(const Command& command, const std::vector<std::string>& words) {
  Arguments out;
  out.command = &command;
  CLI::App app;
  app.set_help_flag();
  std::map<std::string, std::string, std::less<>> values;
  std::map<std::string, bool, std::less<>> switches;
  std::vector<std::string> positional;
  for (const std::string_view name : command.flags) {
    const Flag& record = flag(name);
    std::string spelling(record.name);
    if (!record.letter.empty()) spelling = std::string(record.letter) + "," + spelling;
    if (record.value.empty())
      app.add_flag(spelling, switches[std::string(name)]);
    else
      app.add_option(spelling, values[std::string(name)])->take_last();
  }
  app.add_option("argument", positional);
  const std::string help = "see assize " + std::string(command.name) + " --help";
  try {
    std::vector<std::string> reversed(words.rbegin(), words.rend());
    app.parse(reversed);
  } catch (const CLI::ExtrasError&) {
    for (const std::string& word : app.remaining())
      return Failure{"command line", "\"" + word + "\" is not a flag of assize " + std::string(command.name), help};
    return Failure{"command line", "there are too many words", help};
  } catch (const CLI::ArgumentMismatch& error) {
    const std::string text = error.what();
    return Failure{"command line", text.substr(0, text.find(':')) + " needs a value", help};
  } catch (const CLI::ParseError& error) {
    return Failure{"command line", error.what(), help};
  }
  for (const std::string_view name : command.flags) {
    const std::string key(name);
    if (app.count(key) == 0) continue;
    out.values[key] = flag(name).value.empty() ? std::string() : values[key];
  }
  if (out.has("--help")) return out;
  const std::size_t wanted = command.argument.empty() ? 0 : 1;
  if (positional.size() < wanted)
    return Failure{"command line", "assize " + std::string(command.name) + " needs a " + std::string(command.argument),
                   command.examples.empty() ? help : "for example: " + std::string(command.examples.front().line)};
  if (positional.size() > wanted)
    return Failure{"command line", "\"" + positional[wanted] + "\" is one word too many", help};
  if (wanted == 1) out.argument = positional.front();
  return out;
}

}  // namespace assize::cli
