// Layout of the help pages.
#include "cli/help.hpp"

#include <algorithm>

namespace assize::cli {

namespace {

std::string padded(std::string text, std::size_t width) {
  text.resize(std::max(width, text.size()), ' ');
  return text;
}

std::string indented(std::string_view text, std::string_view margin) {
  std::string out(margin);
  for (const char c : text) {
    out += c;
    if (c == '\n') out += margin;
  }
  return out + "\n";
}

}  // namespace

std::string overview() {
  std::string out =
      "assize certifies the minimum distance and the weights of linear error-control codes.\n\n"
      "usage: assize COMMAND ...\n\n";
  for (const Command& command : all_commands())
    out += "  " + padded(std::string(command.name) + " " + std::string(command.argument), 16) +
           std::string(command.summary) + "\n";
  out +=
      "\nassize COMMAND --help explains a command, with examples. assize --version prints the version.\n"
      "A code sheet is a TOML file, for example:\n\n"
      "  title = \"Event recorder block\"\n"
      "  [code]\n"
      "  family = \"cyclic\"\n"
      "  codeword_length = 23\n"
      "  generator = { algebra = \"x^11 + x^9 + x^7 + x^6 + x^5 + x + 1\" }\n\n"
      "Exit codes: 0 yes   1 no   2 cannot run   3 undecided or cut short   4 self-check failed\n"
      "The first Ctrl-C (or SIGTERM) ends a run in order, a second one at once, with 128 + the number of the signal.\n";
  return out;
}

std::string page(const Command& command) {
  std::string out = "assize " + std::string(command.name) + ": " + std::string(command.summary) + "\n\nusage: assize " +
                    std::string(command.name) + (command.argument.empty() ? "" : " " + std::string(command.argument)) +
                    " [flags]\n\n" + std::string(command.about) + "\n\nflags:\n";
  for (const std::string_view name : command.flags) {
    const Flag& record = flag(name);
    std::string left(record.letter);
    left += (left.empty() ? "" : ", ") + std::string(record.name);
    if (!record.value.empty()) left += " " + std::string(record.value);
    out += "  " + padded(left, 22) + std::string(record.help);
    if (!record.standard.empty()) out += " [" + std::string(record.standard) + "]";
    out += "\n";
  }
  out += "\nexamples:\n";
  std::size_t width = 0;
  for (const Example& example : command.examples) width = std::max(width, example.line.size());
  for (const Example& example : command.examples)
    out += "  " + padded(std::string(example.line), width + 3) + std::string(example.says) + "\n";
  out += "\nexit codes:\n" + indented(command.exit_codes, "  ");
  return out;
}

}  // namespace assize::cli
