// The one spelling of a word: bits without separators over GF(2), decimal element numbers with single blanks otherwise.
#pragma once
#include <cstdint>
#include <optional>
#include <span>
#include <string>
#include <string_view>
#include <vector>

namespace assize {

/// "0110" for order 2, "0 12 3" otherwise.
std::string spell_word(std::uint32_t order, std::span<const std::uint16_t> word);

/// The strict inverse of spell_word; nothing if a symbol is out of range or a blank is out of place.
std::optional<std::vector<std::uint16_t>> parse_word(std::uint32_t order, std::string_view text);

}  // namespace assize
