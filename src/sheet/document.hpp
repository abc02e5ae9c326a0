// A parsed sheet as plain values that remember their line: the only thing the other files of this room see of TOML.
#pragma once
#include <cstdint>
#include <string>
#include <string_view>
#include <utility>
#include <variant>
#include <vector>

#include "base/result.hpp"

namespace assize::sheet {

/// Longest sheet that is read, in bytes.
inline constexpr std::uint64_t largest_sheet = 4U << 20;

struct Node;
using Table = std::vector<std::pair<std::string, Node>>;  ///< in the order of the lines
using Array = std::vector<Node>;

/// A value of the sheet.  Numbers with a fraction and dates never mean anything in a sheet; they arrive as Unusable.
struct Node {
  struct Unusable {
    std::string kind;  ///< "a number with a fraction", "a date"
  };
  std::variant<std::string, std::int64_t, bool, Array, Table, Unusable> value;
  int line = 0;
};

/// "a string", "an integer", ...: for messages.
std::string_view kind_of(const Node& node) noexcept;

/// Parses TOML text.  `source` is the name used in messages.
Result<Node> parse_document(std::string_view text, const std::string& source);

}  // namespace assize::sheet
