// [transmission]: what users are given beside a generator polynomial.  It is echoed, and said to change no distance.
#include "sheet/read_parts.hpp"

namespace assize::sheet {

namespace {

constexpr std::string_view known_keys[] = {"initial_value", "final_xor", "input_reflected", "output_reflected"};

Result<std::string> value_text(const Node& node, std::string_view key, const TableReader& table) {
  if (const auto* text = std::get_if<std::string>(&node.value)) return *text;
  if (const auto* flag = std::get_if<bool>(&node.value)) return std::string(*flag ? "true" : "false");
  if (const auto* number = std::get_if<std::int64_t>(&node.value)) return std::to_string(*number);
  return table.failure(node.line, "\"" + std::string(key) + "\" is " + std::string(kind_of(node)),
                       "write a string such as \"0xFFFF\", a number, true or false");
}

}  // namespace

Result<Transmission> read_transmission(const Node& node, const std::string& source) {
  const auto* entries = std::get_if<Table>(&node.value);
  if (entries == nullptr)
    return Failure{source + ":" + std::to_string(node.line), "\"transmission\" is " + std::string(kind_of(node)),
                   "write [transmission] and below it, for example, initial_value = \"0xFFFF\""};
  TableReader table(*entries, source, node.line, "[transmission]");
  Transmission out;
  for (const std::string_view key : known_keys) {
    const Node* value = table.optional(key);
    if (value == nullptr) continue;
    auto text = value_text(*value, key, table);
    if (!text) return text.error();
    out.emplace_back(key, *std::move(text));
  }
  if (const auto done = table.finish(); !done) return done.error();
  return out;
}

}  // namespace assize::sheet
