// Flags may stand before or after the certificate; a flag's value follows it or is joined to it with "=".
#include "recheck/command_line.hpp"

#include "base/integers.hpp"
#include "recheck/keys.hpp"
#include "recheck/limits.hpp"

namespace assize::recheck {
namespace {

const std::string see_help = "see assize-recheck --help";

Result<void> set_value(CommandLine& line, const std::string& flag, const std::string& value) {
  const std::string where = "flag " + flag;
  if (flag == "--depth") {
    for (const Depth depth : {Depth::quick, Depth::spot, Depth::full})
      if (value == name(depth)) {
        line.options.depth = depth;
        return {};
      }
    return Failure{where, "\"" + value + "\" is not a depth", "write quick, spot or full"};
  }
  if (flag == "--for") {
    if (!is_digest(value))
      return Failure{where, "\"" + value + "\" is not a description digest", "write 64 lower-case hexadecimal digits"};
    line.options.expected_description_digest = value;
    return {};
  }
  if (flag == "--within") {
    const auto seconds = read_duration(value);
    if (!seconds) return seconds.error();
    line.options.budget_seconds = static_cast<double>(*seconds);
    return {};
  }
  const bool is_seed = flag == "--seed";
  const auto number = parse_decimal(value, is_seed ? max_integer : 256);
  if (!number || (!is_seed && *number == 0))
    return Failure{where, "\"" + value + "\" is not a number that fits here",
                   is_seed ? "write a number from 0 to 2^53 - 1" : "write a number from 1 to 256"};
  if (is_seed)
    line.options.seed = *number;
  else
    line.options.threads = static_cast<unsigned>(*number);
  return {};
}

bool set_switch(CommandLine& line, const std::string& flag) {
  if (flag == "--json")
    line.json = true;
  else if (flag == "--quiet")
    line.quiet = true;
  else if (flag == "--help" || flag == "-h")
    line.help = true;
  else if (flag == "--version")
    line.version = true;
  else
    return false;
  return true;
}

bool takes_value(std::string_view flag) {
  return flag == "--depth" || flag == "--seed" || flag == "--threads" || flag == "--within" || flag == "--for";
}

}  // namespace

Result<std::uint64_t> read_duration(std::string_view text) {
  const Failure failure{"flag --within", "\"" + std::string(text) + "\" is not a duration",
                        "write a whole number and a unit: 30s, 10m, 2h, 1d"};
  if (text.empty()) return failure;
  std::uint64_t unit = 0;
  switch (text.back()) {
    case 's':
      unit = 1;
      break;
    case 'm':
      unit = 60;
      break;
    case 'h':
      unit = 3600;
      break;
    case 'd':
      unit = 24 * 3600;
      break;
    default:  // a character, not an enumeration
      return failure;
  }
  const auto number = parse_decimal(text.substr(0, text.size() - 1), 1'000'000'000);
  if (!number || *number == 0) return failure;
  return *number * unit;
}

Result<CommandLine> read_command_line(const std::vector<std::string>& arguments) {
  CommandLine line;
  bool only_paths = false;
  bool named = false;
  for (std::size_t i = 0; i < arguments.size(); ++i) {
    const std::string& argument = arguments[i];
    if (!only_paths && argument == "--") {
      only_paths = true;
    } else if (!only_paths && argument.size() > 1 && argument.front() == '-') {
      const std::size_t equals = argument.find('=');
      const std::string flag = argument.substr(0, equals);
      if (takes_value(flag)) {
        if (equals == std::string::npos && i + 1 == arguments.size())
          return Failure{"flag " + flag, "the value is missing", see_help};
        const std::string value = equals == std::string::npos ? arguments[++i] : argument.substr(equals + 1);
        if (auto set = set_value(line, flag, value); !set) return set.error();
      } else if (!set_switch(line, argument)) {
        return Failure{"flag " + argument, "this flag is unknown", see_help};
      }
    } else if (named) {
      return Failure{argument, "only one certificate can be checked at a time", see_help};
    } else {
      line.certificate = argument;
      named = true;
    }
  }
  if (!named && !line.help && !line.version) return Failure{"", "no certificate is named", see_help};
  return line;
}

std::string_view help_page() noexcept {
  return R"(assize-recheck: checks a certificate of a linear code, independently of the program that wrote it.

Usage: assize-recheck CERTIFICATE [flags]

Flags:
  --depth quick|spot|full  quick: no enumeration is executed again
                           spot:  some shards, drawn with the seed
                           full:  everything (the default)
  --seed S                 seed of the spot draw (1)
  --threads N              threads for executing shards (1)
  --within DURATION        end after 30s, 10m, 2h, 1d
  --for DIGEST             reject a certificate about another description
  --json                   the report as one JSON document
  --quiet                  print the first line only, and no progress
  --help, --version

Exit codes: 0 PROVEN, 1 REJECTED, 2 the check could not be run, 3 CONSISTENT (nothing wrong, not everything executed).

Examples:
  The code that protects the telegrams between ropeway station and cabin, everything executed again:
    assize-recheck cabin-telegram.certificate.json
  A first look, without executing any enumeration:
    assize-recheck cabin-telegram.certificate.json --depth quick
  A sample of the shards with the assessor's own seed, at most ten minutes:
    assize-recheck cabin-telegram.certificate.json --depth spot --seed 2718 --within 10m
  For a build script of the ropeway control:
    assize-recheck cabin-telegram.certificate.json --threads 4 --json
)";
}

}  // namespace assize::recheck
