// The notations and the refusal of bare numbers.
#include "sheet/polynomial_notation.hpp"

#include <algorithm>
#include <optional>

#include "base/integers.hpp"
#include "field/polynomial.hpp"
#include "sheet/algebra.hpp"
#include "sheet/elements.hpp"
#include "sheet/table_reader.hpp"

namespace assize::sheet {

namespace {

using field::Polynomial;
using Bits = std::vector<field::Element>;  // lowest first

constexpr std::string_view example = R"(generator = { notation = "full-hex", value = "0x11021" })";

/// "0x1021" -> bits, lowest first, four for each digit; nothing unless 0x and hexadecimal digits.
std::optional<Bits> parse_hex(std::string_view text) {
  if (!text.starts_with("0x") || text.size() < 3 || text.size() > 2 + largest_polynomial_degree / 4 + 1)
    return std::nullopt;
  Bits bits;
  for (auto digit = text.rbegin(); digit != text.rend() - 2; ++digit) {
    unsigned value = 0;
    if (*digit >= '0' && *digit <= '9')
      value = static_cast<unsigned>(*digit - '0');
    else if (*digit >= 'a' && *digit <= 'f')
      value = static_cast<unsigned>(*digit - 'a' + 10);
    else if (*digit >= 'A' && *digit <= 'F')
      value = static_cast<unsigned>(*digit - 'A' + 10);
    else
      return std::nullopt;
    for (unsigned bit = 0; bit < 4; ++bit) bits.push_back(static_cast<field::Element>((value >> bit) & 1U));
  }
  return bits;
}

std::string to_hex(Bits bits) {
  while (bits.size() % 4 != 0) bits.push_back(0);
  std::string digits;
  for (std::size_t i = bits.size(); i >= 4; i -= 4) {
    const unsigned value = bits[i - 4] + 2U * bits[i - 3] + 4U * bits[i - 2] + 8U * bits[i - 1];
    digits += "0123456789ABCDEF"[value];
  }
  const std::size_t first = digits.find_first_not_of('0');
  return "0x" + (first == std::string::npos ? "0" : digits.substr(first));
}

enum class HexNotation { full, implicit_top, implicit_one, reversed };

constexpr std::pair<std::string_view, HexNotation> hex_notations[] = {
    {"full-hex", HexNotation::full},
    {"implicit-top-hex", HexNotation::implicit_top},
    {"implicit-one-hex", HexNotation::implicit_one},
    {"reversed-hex", HexNotation::reversed},
};

/// The polynomial that the bits mean; nothing if they do not fit the degree.
std::optional<Polynomial> interpret(HexNotation notation, Bits bits, std::uint64_t degree) {
  field::trim(bits);
  switch (notation) {
    case HexNotation::full:
      return bits;
    case HexNotation::implicit_one:
      bits.insert(bits.begin(), 1);
      return bits;
    case HexNotation::implicit_top:
    case HexNotation::reversed:
      if (bits.size() > degree) return std::nullopt;
      bits.resize(degree, 0);
      if (notation == HexNotation::reversed) std::ranges::reverse(bits);
      bits.push_back(1);
      return bits;
  }
  return std::nullopt;
}

Failure bare_number(const Node& node, const std::string& source, std::string_view name) {
  Failure failure{source + ":" + std::to_string(node.line),
                  std::string(name) + " is a bare number, which has several readings", "write the one that you mean:"};
  std::string text;
  if (const auto* string = std::get_if<std::string>(&node.value)) {
    text = *string;
  } else {
    static constexpr char digits[] = "0123456789ABCDEF";
    const std::int64_t number = std::get<std::int64_t>(node.value);
    if (number < 0) {
      failure.what = std::string(name) + " is negative";
      failure.cure = "write " + std::string(example);
      return failure;
    }
    auto value = static_cast<std::uint64_t>(number);
    for (; value != 0; value >>= 4) text.insert(text.begin(), digits[value & 15]);
    text = "0x" + (text.empty() ? "0" : text);
  }
  const auto bits = parse_hex(text);
  if (!bits || bits->size() > 256) {
    failure.cure = "write " + std::string(example) + " or generator = { algebra = \"x^16 + x^12 + x^5 + 1\" }";
    return failure;
  }
  Bits trimmed = *bits;
  field::trim(trimmed);
  if (trimmed.empty()) {
    failure.what = std::string(name) + " is zero";
    failure.cure = "write " + std::string(example);
    return failure;
  }
  for (const auto& [spelling, notation] : hex_notations) {
    const bool with_degree = notation == HexNotation::implicit_top || notation == HexNotation::reversed;
    const std::uint64_t degree =
        with_degree ? bits->size() : 0;  // four for each digit: what such a number usually means
    const auto polynomial = interpret(notation, *bits, degree);
    if (!polynomial) continue;
    failure.cure += "\n  { notation = \"" + std::string(spelling) + "\", value = \"" + text + "\"" +
                    (with_degree ? ", degree = " + std::to_string(degree) : "") + " }  means  " +
                    field::to_algebra(*polynomial);
  }
  return failure;
}

Result<Polynomial> read_hex(TableReader& table) {
  const auto notation = table.string("notation", R"(notation = "full-hex")");
  if (!notation) return notation.error();
  const auto known =
      std::ranges::find(hex_notations, notation->value, [](const auto& entry) { return std::string(entry.first); });
  if (known == std::end(hex_notations))
    return table.failure(
        notation->line, "\"" + notation->value + "\" is not a notation",
        "write full-hex, implicit-top-hex, implicit-one-hex or reversed-hex; or use exponents = [...], "
        "algebra = \"...\", coefficients = [...] or factors = [...]");
  const auto value = table.string("value", R"(value = "0x11021")");
  if (!value) return value.error();
  const auto bits = parse_hex(value->value);
  if (!bits)
    return table.failure(value->line, "\"" + value->value + "\" is not a hexadecimal number",
                         "write 0x and the digits in quotes: value = \"0x11021\"");
  std::uint64_t degree = 0;
  if (known->second == HexNotation::implicit_top || known->second == HexNotation::reversed) {
    const auto stated = table.integer("degree", 1, largest_polynomial_degree, "degree = 16");
    if (!stated) return stated.error();
    degree = stated->value;
  }
  auto polynomial = interpret(known->second, *bits, degree);
  if (!polynomial)
    return table.failure(value->line, value->value + " does not fit a polynomial of degree " + std::to_string(degree),
                         "in this notation the top coefficient is not written: the value stays below 2^degree");
  return *std::move(polynomial);
}

Result<Polynomial> read_exponents(const Node& node, const std::string& source) {
  const auto* array = std::get_if<Array>(&node.value);
  const std::string where = source + ":" + std::to_string(node.line);
  if (array == nullptr)
    return Failure{where, "exponents is not a list", "write, for example: exponents = [16, 12, 5, 0]"};
  Polynomial out;
  for (const Node& entry : *array) {
    const auto exponent = integer_in(entry, source, "an exponent", 0, largest_polynomial_degree);
    if (!exponent) return exponent.error();
    if (out.size() <= *exponent) out.resize(*exponent + 1, 0);
    if (out[*exponent] != 0)
      return Failure{where, "the exponent " + std::to_string(*exponent) + " stands twice", "write each power once"};
    out[*exponent] = 1;
  }
  return out;
}

Result<Polynomial> read_algebra(const Node& node, const field::Field& field, const std::string& source) {
  const std::string where = source + ":" + std::to_string(node.line);
  const auto* text = std::get_if<std::string>(&node.value);
  if (text == nullptr)
    return Failure{where, "a polynomial in x is written as a string", R"(write, for example: "x^3 + x + 1")"};
  auto polynomial = parse_algebra(*text, field.order(), largest_polynomial_degree);
  if (!polynomial) return Failure{where, polynomial.error().what, polynomial.error().cure};
  return polynomial;
}

Result<Polynomial> read_factors(const Node& node, const field::Field& field, const std::string& source) {
  const auto* array = std::get_if<Array>(&node.value);
  const std::string where = source + ":" + std::to_string(node.line);
  if (array == nullptr || array->empty())
    return Failure{where, "factors is not a list of polynomials",
                   R"(write, for example: factors = ["x + 1", "x^4 + x + 1"])"};
  Polynomial product{1};
  for (const Node& entry : *array) {
    const auto factor = read_algebra(entry, field, source);
    if (!factor) return factor.error();
    product = field::multiply(field, product, *factor);
    if (product.size() > largest_polynomial_degree + 1)
      return Failure{where, "the product of the factors has too high a degree",
                     "degrees up to " + std::to_string(largest_polynomial_degree) + " are taken"};
  }
  return product;
}

std::string list_text(const Node& node) {
  const auto* array = std::get_if<Array>(&node.value);
  if (array == nullptr) {
    const auto* text = std::get_if<std::string>(&node.value);
    return text == nullptr ? "" : "\"" + *text + "\"";
  }
  std::string out = "[";
  for (const Node& entry : *array) {
    if (out.size() > 1) out += ", ";
    if (const auto* number = std::get_if<std::int64_t>(&entry.value)) out += std::to_string(*number);
    if (const auto* string = std::get_if<std::string>(&entry.value)) out += "\"" + *string + "\"";
  }
  return out + "]";
}

}  // namespace

Result<PolynomialText> read_polynomial(const Node& node, const field::Field& field, const std::string& source,
                                       std::string_view name) {
  if (const auto* text = std::get_if<std::string>(&node.value);
      text != nullptr && !text->starts_with("0x") && text->find('x') != std::string::npos)
    return Failure{source + ":" + std::to_string(node.line), std::string(name) + " is a plain string",
                   "write " + std::string(name) + " = { algebra = \"" + *text + "\" }"};
  if (std::holds_alternative<std::int64_t>(node.value) || std::holds_alternative<std::string>(node.value))
    return bare_number(node, source, name);
  const auto* entries = std::get_if<Table>(&node.value);
  if (entries == nullptr)
    return Failure{source + ":" + std::to_string(node.line), std::string(name) + " is " + std::string(kind_of(node)),
                   "write " + std::string(example)};
  TableReader table(*entries, source, node.line, std::string(name));
  PolynomialText out;
  std::optional<Result<Polynomial>> read;
  const auto note = [&out](std::string_view notation, const Node& value) {
    out.as_written = std::string(notation) + " " + list_text(value);
  };
  if (const Node* exponents = table.optional("exponents")) {
    read = read_exponents(*exponents, source);
    note("exponents", *exponents);
  } else if (const Node* algebra = table.optional("algebra")) {
    read = read_algebra(*algebra, field, source);
    note("algebra", *algebra);
  } else if (const Node* coefficients = table.optional("coefficients")) {
    read = read_elements(*coefficients, field, source, "coefficients");
    note("coefficients", *coefficients);
  } else if (const Node* factors = table.optional("factors")) {
    read = read_factors(*factors, field, source);
    note("factors", *factors);
  } else {
    if (field.order() != 2)
      return table.failure(node.line, "hexadecimal notations are for GF(2) only",
                           "write algebra = \"x^2 + 2*x + 1\" or coefficients = [1, 2, 1]");
    read = read_hex(table);
    if (read->has_value())
      out.as_written = table.string("notation", "")->value + " " + table.string("value", "")->value;
  }
  if (!*read) return read->error();
  if (const auto done = table.finish(); !done) return done.error();
  out.coefficients = **read;
  field::trim(out.coefficients);
  if (out.coefficients.empty())
    return table.failure(node.line, std::string(name) + " is the zero polynomial", "write " + std::string(example));
  return out;
}

Result<PolynomialText> read_modulus(const Node& node, const field::Field& field, const std::string& source,
                                    std::string_view name) {
  const auto* text = std::get_if<std::string>(&node.value);
  if (text == nullptr || text->starts_with("0x") || text->find('x') == std::string::npos)
    return read_polynomial(node, field, source, name);
  return read_polynomial(Node{Table{{"algebra", node}}, node.line}, field, source, name);
}

std::string every_notation(const field::Polynomial& polynomial) {
  if (polynomial.size() < 2) return "";
  const std::size_t degree = polynomial.size() - 1;
  std::string out = "full-hex " + to_hex(polynomial);
  const Bits low(polynomial.begin(), polynomial.end() - 1);
  out += "\nimplicit-top-hex " + to_hex(low) + ", degree " + std::to_string(degree);
  if (polynomial.front() == 1) out += "\nimplicit-one-hex " + to_hex(Bits(polynomial.begin() + 1, polynomial.end()));
  out += "\nreversed-hex " + to_hex(Bits(low.rbegin(), low.rend())) + ", degree " + std::to_string(degree);
  return out;
}

}  // namespace assize::sheet
