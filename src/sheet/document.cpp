// The only file that includes the TOML library.
//
// Its parser recurses over dotted keys and accepts a byte order mark, so size, dots and marks are checked beforehand.
#include "sheet/document.hpp"

#include <toml++/toml.h>

#include <algorithm>
#include <sstream>

namespace assize::sheet {

namespace {

std::string place(const std::string& source, int line) { return source + ":" + std::to_string(line); }

int line_of(const toml::node& node) { return static_cast<int>(node.source().begin.line); }

Node convert(const toml::node& node) {
  Node out;
  out.line = line_of(node);
  switch (node.type()) {
    case toml::node_type::string:
      out.value = std::string(node.ref<std::string>());
      break;
    case toml::node_type::integer:
      out.value = node.ref<std::int64_t>();
      break;
    case toml::node_type::boolean:
      out.value = node.ref<bool>();
      break;
    case toml::node_type::array: {
      Array array;
      for (const toml::node& element : *node.as_array()) array.push_back(convert(element));
      out.value = std::move(array);
      break;
    }
    case toml::node_type::table: {
      Table table;
      for (const auto& [key, value] : *node.as_table()) {
        table.emplace_back(std::string(key.str()), convert(value));
        // An inline value may begin on a later line than its key; the key's line is what a user looks for.
        table.back().second.line = static_cast<int>(key.source().begin.line);
      }
      std::ranges::stable_sort(table, {}, [](const auto& entry) { return entry.second.line; });
      out.value = std::move(table);
      break;
    }
    case toml::node_type::floating_point:
      out.value = Node::Unusable{"a number with a fraction"};
      break;
    case toml::node_type::date:
    case toml::node_type::time:
    case toml::node_type::date_time:
      out.value = Node::Unusable{"a date or time"};
      break;
    case toml::node_type::none:
      out.value = Node::Unusable{"nothing"};
      break;
  }
  return out;
}

/// What would overwhelm the parser, or would be read other than it looks.
Result<void> refuse_hopeless(std::string_view text, const std::string& source) {
  if (text.size() > largest_sheet)
    return Failure{source, "the sheet is larger than " + std::to_string(largest_sheet) + " bytes",
                   "put large matrices into a file of their own"};
  if (text.empty()) return Failure{source, "the sheet is empty", "begin with a [code] table; see `assize show --help`"};
  if (text.starts_with("\xef\xbb\xbf"))
    return Failure{place(source, 1), "the sheet begins with a byte order mark", "save it as plain UTF-8"};
  int line = 1;
  int dots = 0;
  int brackets = 0;
  for (const char c : text) {
    const auto byte = static_cast<unsigned char>(c);
    if (byte == 0)
      return Failure{place(source, line), "the sheet holds a zero byte: this is not text", "name a TOML file"};
    if (c == '\n') {
      ++line;
      dots = 0;
    }
    dots += c == '.' ? 1 : 0;
    brackets += c == '[' || c == '{' ? 1 : 0;
    brackets -= c == ']' || c == '}' ? 1 : 0;
    if (dots > 100) return Failure{place(source, line), "more than 100 dots in one line", "shorten the line"};
    if (brackets > 100) return Failure{place(source, line), "brackets nested more than 100 deep", "use fewer levels"};
  }
  return {};
}

}  // namespace

std::string_view kind_of(const Node& node) noexcept {
  struct Kind {
    std::string_view operator()(const std::string&) const { return "a string"; }
    std::string_view operator()(std::int64_t) const { return "an integer"; }
    std::string_view operator()(bool) const { return "true or false"; }
    std::string_view operator()(const Array&) const { return "an array"; }
    std::string_view operator()(const Table&) const { return "a table"; }
    std::string_view operator()(const Node::Unusable& unusable) const { return unusable.kind; }
  };
  return std::visit(Kind{}, node.value);
}

Result<Node> parse_document(std::string_view text, const std::string& source) {
  if (const auto fine = refuse_hopeless(text, source); !fine) return fine.error();
  try {
    const toml::table table = toml::parse(text, source);
    return convert(table);
  } catch (const toml::parse_error& error) {
    const std::string description(error.description());
    return Failure{place(source, static_cast<int>(error.source().begin.line)), "this is not TOML: " + description,
                   "strings stand in double quotes, tables begin with [name], one key = value a line"};
  }
}

}  // namespace assize::sheet
