// Reading elements and lists of them.
#include "sheet/elements.hpp"

#include <algorithm>

#include "base/integers.hpp"
#include "sheet/algebra.hpp"

namespace assize::sheet {

namespace {

constexpr std::uint64_t largest_power_of_x = 1000000;

Failure at(const Node& node, const std::string& source, std::string_view name, const Failure& failure) {
  return {source + ":" + std::to_string(node.line), std::string(name) + ": " + failure.what, failure.cure};
}

std::vector<std::string> split(std::string_view text, const field::Field& field) {
  std::vector<std::string> tokens;
  if (field.order() == 2 && text.find_first_not_of("01") == std::string_view::npos) {
    for (const char bit : text) tokens.emplace_back(1, bit);
    return tokens;
  }
  std::string token;
  for (const char c : text) {
    if (c == ' ' || c == '\t' || c == '\n' || c == '\r') {
      if (!token.empty()) tokens.push_back(std::move(token));
      token.clear();
    } else {
      token += c;
    }
  }
  if (!token.empty()) tokens.push_back(std::move(token));
  return tokens;
}

}  // namespace

std::string element_range(const field::Field& field) {
  std::string range = "0 to " + std::to_string(field.order() - 1);
  if (field.degree() > 1) range += ", or a polynomial such as \"x+1\", or a power such as \"x^5\"";
  return range;
}

Result<Element> parse_element(std::string_view text, const field::Field& field) {
  if (const auto number = parse_decimal(text)) {
    if (field.contains(*number)) return static_cast<Element>(*number);
    return Failure{"", std::string(text) + " is not an element of GF(" + std::to_string(field.order()) + ")",
                   "elements are " + element_range(field)};
  }
  if (field.degree() == 1 || text.find('x') == std::string_view::npos)
    return Failure{"", "\"" + std::string(text) + "\" is not an element of GF(" + std::to_string(field.order()) + ")",
                   "elements are " + element_range(field)};
  const auto polynomial = parse_algebra(text, field.characteristic(), largest_power_of_x);
  if (!polynomial) return polynomial.error();
  Element sum = 0;
  for (std::size_t i = 0; i < polynomial->size(); ++i) {
    if ((*polynomial)[i] == 0) continue;
    const Element term = field.multiply((*polynomial)[i], field.power(field.class_of_x(), i));
    sum = field.add(sum, term);
  }
  return sum;
}

Result<Element> read_element(const Node& node, const field::Field& field, const std::string& source,
                             std::string_view name) {
  std::string text;
  if (const auto* string = std::get_if<std::string>(&node.value)) {
    text = *string;
  } else if (const auto* number = std::get_if<std::int64_t>(&node.value)) {
    text = std::to_string(*number);
  } else {
    return at(node, source, name,
              {"", std::string(kind_of(node)) + " is not an element", "elements are " + element_range(field)});
  }
  auto element = parse_element(text, field);
  if (!element) return at(node, source, name, element.error());
  return element;
}

Result<Elements> read_elements(const Node& node, const field::Field& field, const std::string& source,
                               std::string_view name) {
  Elements out;
  if (const auto* array = std::get_if<Array>(&node.value)) {
    for (const Node& entry : *array) {
      const auto element = read_element(entry, field, source, name);
      if (!element) return element.error();
      out.push_back(*element);
    }
    return out;
  }
  const auto* text = std::get_if<std::string>(&node.value);
  if (text == nullptr)
    return at(
        node, source, name,
        {"", std::string(kind_of(node)) + " is not a list of elements", "write, for example: [1, 0, 1] or \"1 0 1\""});
  for (const std::string& token : split(*text, field)) {
    const auto element = parse_element(token, field);
    if (!element) {
      Failure failure = element.error();
      if (field.order() > 2 && token.size() > 1 && token.find_first_not_of("0123456789") == std::string::npos)
        failure.cure += "; symbols are separated by blanks";
      return at(node, source, name, failure);
    }
    out.push_back(*element);
  }
  return out;
}

}  // namespace assize::sheet
