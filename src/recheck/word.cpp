// Strict reading of words: whole string, no blank too many, every element below the order.
#include "recheck/word.hpp"

#include "base/integers.hpp"

namespace assize::recheck {

Result<std::vector<Symbol>> read_word(std::string_view text, std::uint32_t order, const std::string& where) {
  std::vector<Symbol> symbols;
  if (text.empty()) return symbols;
  if (order == 2) {
    symbols.reserve(text.size());
    for (const char c : text) {
      if (c != '0' && c != '1') return Failure{where, "a word over GF(2) consists of 0 and 1 only", ""};
      symbols.push_back(static_cast<Symbol>(c - '0'));
    }
    return symbols;
  }
  std::size_t start = 0;
  while (true) {
    const std::size_t blank = text.find(' ', start);
    const auto element = parse_decimal(text.substr(start, blank - start), order - 1);
    if (!element)
      return Failure{where,
                     "symbol " + std::to_string(symbols.size()) + " is not an element number below " +
                         std::to_string(order) + ", or the blanks are wrong",
                     ""};
    symbols.push_back(static_cast<Symbol>(*element));
    if (blank == std::string_view::npos) return symbols;
    start = blank + 1;
  }
}

Result<std::vector<Symbol>> read_polynomial(std::string_view text, std::uint32_t order, const std::string& where) {
  auto coefficients = read_word(text, order, where);
  if (coefficients && (coefficients->empty() || coefficients->back() == 0))
    return Failure{where, "the last coefficient of a polynomial is not zero", ""};
  return coefficients;
}

Result<Symbol> read_element(std::string_view text, std::uint32_t order, const std::string& where) {
  const auto element = parse_decimal(text, order - 1);
  if (!element) return Failure{where, "an element number below " + std::to_string(order) + " is expected here", ""};
  return static_cast<Symbol>(*element);
}

void append_symbol(std::string& text, Symbol symbol, std::uint32_t order, bool first) {
  if (order == 2) {
    text += symbol == 0 ? '0' : '1';
    return;
  }
  if (!first) text += ' ';
  text += std::to_string(symbol);
}

}  // namespace assize::recheck
