// Messages of the strict table reader: each names the line, what stands there, and what to write.
#include "sheet/table_reader.hpp"

#include <algorithm>

namespace assize::sheet {

namespace {

/// What people write by habit, and why it is not taken.
std::string cure_for_habit(std::string_view key) {
  if (key == "length" || key == "n" || key == "k")
    return "a bare length is ambiguous: write codeword_length (check symbols included) or data_length (without them)";
  if (key == "polynomial" || key == "poly")
    return "write generator = { notation = \"full-hex\", value = \"0x11021\" } or generator = { algebra = \"x^3 + x + "
           "1\" }";
  return "";
}

}  // namespace

bool TableReader::has(std::string_view key) { return optional(key) != nullptr; }

const Node* TableReader::optional(std::string_view key) {
  if (std::ranges::find(asked_, key) == asked_.end()) asked_.emplace_back(key);
  const auto entry = std::ranges::find(*table_, key, [](const auto& e) -> std::string_view { return e.first; });
  return entry == table_->end() ? nullptr : &entry->second;
}

Result<const Node*> TableReader::required(std::string_view key, std::string_view example) {
  if (const Node* node = optional(key)) return node;
  for (const auto& entry : *table_)  // a habit may explain what is missing
    if (const std::string cure = cure_for_habit(entry.first); !cure.empty())
      return failure(entry.second.line, "\"" + entry.first + "\" is not a key of " + what_, cure);
  return failure(line_, what_ + " lacks the key \"" + std::string(key) + "\"",
                 "write, for example: " + std::string(example));
}

Result<Located<std::string>> TableReader::string(std::string_view key, std::string_view example) {
  const auto node = required(key, example);
  if (!node) return node.error();
  if (const auto* text = std::get_if<std::string>(&(*node)->value)) return Located<std::string>{*text, (*node)->line};
  return failure((*node)->line, "\"" + std::string(key) + "\" is " + std::string(kind_of(**node)) + ", not a string",
                 "write, for example: " + std::string(example));
}

Result<std::uint64_t> integer_in(const Node& node, const std::string& source, std::string_view name,
                                 std::uint64_t least, std::uint64_t largest) {
  const std::string where = source + ":" + std::to_string(node.line);
  const auto* number = std::get_if<std::int64_t>(&node.value);
  if (number == nullptr)
    return Failure{where, std::string(name) + " is " + std::string(kind_of(node)) + ", not an integer",
                   "write a plain number without quotes"};
  if (*number < 0 || std::cmp_less(*number, least) || std::cmp_greater(*number, largest))
    return Failure{where, std::string(name) + " is " + std::to_string(*number) + ", which is out of range",
                   "write a number from " + std::to_string(least) + " to " + std::to_string(largest)};
  return static_cast<std::uint64_t>(*number);
}

Result<Located<std::uint64_t>> TableReader::integer(std::string_view key, std::uint64_t least, std::uint64_t largest,
                                                    std::string_view example) {
  const auto node = required(key, example);
  if (!node) return node.error();
  const auto number = integer_in(**node, source_, "\"" + std::string(key) + "\"", least, largest);
  if (!number) return number.error();
  return Located<std::uint64_t>{*number, (*node)->line};
}

Result<Located<std::uint64_t>> TableReader::integer_or(std::string_view key, std::uint64_t least, std::uint64_t largest,
                                                       std::uint64_t otherwise) {
  if (!has(key)) return Located<std::uint64_t>{otherwise, 0};
  return integer(key, least, largest, "");
}

Result<void> TableReader::finish() const {
  for (const auto& [key, node] : *table_) {
    if (std::ranges::find(asked_, key) != asked_.end()) continue;
    std::string cure = cure_for_habit(key);
    if (cure.empty()) {
      cure = "keys that are known here:";
      for (const std::string& known : asked_) cure += " " + known;
    }
    return failure(node.line, "\"" + key + "\" is not a key of " + what_, cure);
  }
  return {};
}

}  // namespace assize::sheet
