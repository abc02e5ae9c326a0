// Words: lists of field elements inside strings (format text, section 1, "Spellings inside strings").
#pragma once
#include <string>
#include <string_view>
#include <vector>

#include "recheck/small_field.hpp"

namespace assize::recheck {

/// The symbols of `text` over GF(order); over GF(2) bits, otherwise decimal numbers with single blanks between.
Result<std::vector<Symbol>> read_word(std::string_view text, std::uint32_t order, const std::string& where);

/// A word that is a polynomial: not empty, last coefficient not zero.
Result<std::vector<Symbol>> read_polynomial(std::string_view text, std::uint32_t order, const std::string& where);

/// One element as a decimal number.
Result<Symbol> read_element(std::string_view text, std::uint32_t order, const std::string& where);

/// Appends the spelling of one more symbol of a word.
void append_symbol(std::string& text, Symbol symbol, std::uint32_t order, bool first);

}  // namespace assize::recheck
