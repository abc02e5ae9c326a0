// Words as text and back.
#include "base/word.hpp"

#include "base/integers.hpp"

namespace assize {

std::string spell_word(std::uint32_t order, std::span<const std::uint16_t> word) {
  std::string text;
  for (const std::uint16_t symbol : word) {
    if (order != 2 && !text.empty()) text += ' ';
    text += std::to_string(symbol);
  }
  return text;
}

std::optional<std::vector<std::uint16_t>> parse_word(std::uint32_t order, std::string_view text) {
  std::vector<std::uint16_t> word;
  if (text.empty()) return word;
  while (true) {
    const std::size_t end = order == 2 ? 1 : std::min(text.find(' '), text.size());
    const auto symbol = parse_decimal(text.substr(0, end), order - 1);
    if (!symbol) return std::nullopt;
    word.push_back(static_cast<std::uint16_t>(*symbol));
    if (end == text.size()) return word;
    text.remove_prefix(order == 2 ? end : end + 1);
  }
}

}  // namespace assize
