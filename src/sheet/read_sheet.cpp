// The frame of a sheet: title, field, code, steps; and sub-sheets of the same shape.
#include "sheet/read_sheet.hpp"

#include "base/integers.hpp"
#include "field/number_theory.hpp"
#include "sheet/elements.hpp"
#include "sheet/polynomial_notation.hpp"
#include "sheet/read_parts.hpp"

namespace assize::sheet {

namespace {

constexpr std::string_view code_example = "[code]\nfamily = \"cyclic\"";

Result<const Table*> as_table(const Node& node, const std::string& source, std::string_view name) {
  if (const auto* table = std::get_if<Table>(&node.value)) return table;
  return Failure{source + ":" + std::to_string(node.line),
                 std::string(name) + " is " + std::string(kind_of(node)) + ", not a table",
                 "begin a table with [" + std::string(name) + "] on a line of its own"};
}

}  // namespace

// order = q and, for q = p^m with m > 1, modulus; the modulus is written like any other polynomial, over GF(p).
Result<field::Field> read_field(const Node& node, const std::string& source) {
  const auto entries = as_table(node, source, "field");
  if (!entries) return entries.error();
  TableReader table(**entries, source, node.line, "[field]");
  const auto order = table.integer("order", 2, field::largest_order, "order = 8");
  if (!order) return order.error();
  const auto power = field::as_prime_power(order->value);
  if (!power)
    return table.failure(order->line,
                         std::to_string(order->value) + " is not a power of a prime, so there is no such field",
                         "write 2, 3, 4, 5, 7, 8, 9, 11, 13, 16, ...");
  Elements modulus;
  int line = order->line;
  if (const Node* written = table.optional("modulus")) {
    line = written->line;
    const auto prime = field::Field::prime(power->prime);
    if (!prime) return table.failure(line, prime.error().what, prime.error().cure);
    const auto read = read_modulus(*written, *prime, source, "modulus");
    if (!read) return read.error();
    modulus = read->coefficients;
  }
  if (const auto done = table.finish(); !done) return done.error();
  auto field = field::Field::create(static_cast<std::uint32_t>(order->value), modulus);
  if (!field) return table.failure(line, field.error().what, field.error().cure);
  return field;
}

namespace {

/// A root modulus that was filled in fixes the code only up to a permutation of positions.
bool positions_are_open(const Description& description) {
  if (const auto* bch = std::get_if<Bch>(&description.family)) return bch->root_modulus.line == 0;
  if (const auto* concatenated = std::get_if<Concatenated>(&description.family)) {
    bool open = positions_are_open(*concatenated->outer);
    for (const SubDescription& inner : concatenated->inner) open = open || positions_are_open(*inner);
    return open;
  }
  if (const auto* pair = std::get_if<Pair>(&description.family))
    return positions_are_open(*pair->first) || positions_are_open(*pair->second);
  return false;
}

Result<void> check_positions_are_fixed(const Description& description) {
  for (const Step& step : description.steps) {
    const bool names_positions = std::holds_alternative<Puncture>(step.what) ||
                                 std::holds_alternative<Shorten>(step.what) ||
                                 std::holds_alternative<Permute>(step.what);
    if (names_positions && positions_are_open(description))
      return Failure{description.place(step.line), "this step names positions, but the BCH code has no root_modulus",
                     "state root_modulus: other moduli give the same code with its positions in another order"};
  }
  return {};
}

}  // namespace

Result<Description> read_description(const Table& entries, int line, const Context& context) {
  if (context.depth > deepest_nesting)
    return Failure{context.source + ":" + std::to_string(line),
                   "sheets are nested more than " + std::to_string(deepest_nesting) + " deep",
                   "use fewer levels; perhaps a sheet names itself"};
  if (--*context.sheets_left < 0)
    return Failure{context.source + ":" + std::to_string(line),
                   "there are more than " + std::to_string(most_sheets) + " sub-sheets", "use fewer"};
  TableReader table(entries, context.source, line, "the sheet");
  Description description;
  description.source = context.source;
  if (table.has("title")) {
    const auto title = table.string("title", "title = \"Cabin telegram\"");
    if (!title) return title.error();
    description.title = title->value;
  }
  if (const Node* node = table.optional("field")) {
    auto field = read_field(*node, context.source);
    if (!field) return field.error();
    description.field = *std::move(field);
    description.field_line = node->line;
    description.field_stated = true;
  }
  const auto code = table.required("code", code_example);
  if (!code) return code.error();
  const auto family_table = as_table(**code, context.source, "code");
  if (!family_table) return family_table.error();
  description.code_line = (*code)->line;
  auto family = read_family(**family_table, (*code)->line, context, description);
  if (!family) return family.error();
  description.family = *std::move(family);
  if (const Node* then = table.optional("then")) {
    auto steps = read_steps(*then, family_field(description.family, description.field), context.source);
    if (!steps) return steps.error();
    description.steps = *std::move(steps);
  }
  if (const Node* node = table.optional("symmetry")) {
    auto symmetries = read_symmetries(*node, word_field(description), context.source);
    if (!symmetries) return symmetries.error();
    description.symmetries = *std::move(symmetries);
  }
  if (const Node* node = table.optional("transmission")) {
    auto transmission = read_transmission(*node, context.source);
    if (!transmission) return transmission.error();
    description.transmission = *std::move(transmission);
  }
  if (const auto done = table.finish(); !done) return done.error();
  if (const auto fixed = check_positions_are_fixed(description); !fixed) return fixed.error();
  return description;
}

Result<Description> read_sheet(std::string_view text, const std::string& source, const Fetch& fetch) {
  const auto document = parse_document(text, source);
  if (!document) return document.error();
  int sheets_left = most_sheets;
  return read_description(std::get<Table>(document->value), 1, {source, &fetch, &sheets_left, 0});
}

}  // namespace assize::sheet
