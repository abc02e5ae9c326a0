// A hand-written parser: the grammar is one line, and its errors must teach it.
#include "sheet/algebra.hpp"

#include <algorithm>
#include <optional>

#include "base/integers.hpp"

namespace assize::sheet {

namespace {

struct Term {
  std::uint64_t coefficient;
  std::uint64_t exponent;
};

std::string without_blanks(std::string_view text) {
  std::string out;
  std::ranges::copy_if(text, std::back_inserter(out), [](char c) { return c != ' '; });
  return out;
}

std::optional<Term> parse_term(std::string_view term, std::uint32_t order, std::uint64_t largest_degree) {
  Term out{1, 0};
  const std::size_t x = term.find('x');
  if (x == std::string_view::npos) {
    const auto constant = parse_decimal(term, order - 1);
    if (!constant) return std::nullopt;
    return Term{*constant, 0};
  }
  if (x > 0) {
    if (term[x - 1] != '*') return std::nullopt;
    const auto coefficient = parse_decimal(term.substr(0, x - 1), order - 1);
    if (!coefficient) return std::nullopt;
    out.coefficient = *coefficient;
  }
  const std::string_view power = term.substr(x + 1);
  out.exponent = 1;
  if (power.empty()) return out;
  if (power.front() != '^') return std::nullopt;
  const auto exponent = parse_decimal(power.substr(1), largest_degree);
  if (!exponent) return std::nullopt;
  out.exponent = *exponent;
  return out;
}

}  // namespace

Result<field::Polynomial> parse_algebra(std::string_view text, std::uint32_t order, std::uint64_t largest_degree) {
  const Failure malformed{
      "", "\"" + std::string(text) + "\" is not a polynomial in x",
      "write terms such as x^3 + x + 1" +
          std::string(order > 2 ? " or x^2 + 2*x + 1, coefficients below " + std::to_string(order) : "") +
          ", exponents up to " + std::to_string(largest_degree)};
  std::string_view rest = text;
  field::Polynomial out;
  std::vector<bool> seen;
  while (true) {
    const std::size_t plus = std::min(rest.find('+'), rest.size());
    const std::string compact = without_blanks(rest.substr(0, plus));
    const auto term = parse_term(compact, order, largest_degree);
    if (!term) return malformed;
    const auto exponent = static_cast<std::size_t>(term->exponent);
    if (out.size() <= exponent) {
      out.resize(exponent + 1, 0);
      seen.resize(exponent + 1, false);
    }
    if (seen[exponent])
      return Failure{"", "\"" + std::string(text) + "\" has the power x^" + std::to_string(exponent) + " twice",
                     "write each power once"};
    seen[exponent] = true;
    out[exponent] = static_cast<field::Element>(term->coefficient);
    if (plus == rest.size()) break;
    rest.remove_prefix(plus + 1);
  }
  field::trim(out);
  return out;
}

}  // namespace assize::sheet
