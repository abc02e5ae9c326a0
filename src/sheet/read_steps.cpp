// [[then]] tables: what is done to a code after its construction.
#include <algorithm>
#include <functional>

#include "sheet/bases.hpp"
#include "sheet/elements.hpp"
#include "sheet/read_parts.hpp"

namespace assize::sheet {

Result<std::vector<std::uint32_t>> read_positions(TableReader& table, std::string_view key) {
  const std::string example = std::string(key) + " = [0, 5, 9]";
  const auto node = table.required(key, example);
  if (!node) return node.error();
  const auto* array = std::get_if<Array>(&(*node)->value);
  if (array == nullptr || array->empty())
    return table.failure((*node)->line, std::string(key) + " is not a list of positions",
                         "write, for example: " + example);
  std::vector<std::uint32_t> positions;
  for (const Node& entry : *array) {
    const auto position = integer_in(entry, table.source(), "a position", 0, largest_length - 1);
    if (!position) return position.error();
    positions.push_back(static_cast<std::uint32_t>(*position));
  }
  std::vector<std::uint32_t> ascending = positions;
  std::ranges::sort(ascending);
  if (const auto twice = std::ranges::adjacent_find(ascending); twice != ascending.end())
    return table.failure((*node)->line, "the position " + std::to_string(*twice) + " stands twice",
                         "name each position once");
  return positions;
}

namespace {

using What = decltype(Step::what);

Result<std::vector<std::uint32_t>> read_ascending(TableReader& table) {
  auto positions = read_positions(table, "positions");
  if (positions) std::ranges::sort(*positions);
  return positions;
}

Result<What> read_puncture(TableReader& table, const field::Field&) {
  auto positions = read_ascending(table);
  if (!positions) return positions.error();
  return What(Puncture{*std::move(positions)});
}

Result<What> read_shorten(TableReader& table, const field::Field&) {
  auto positions = read_ascending(table);
  if (!positions) return positions.error();
  return What(Shorten{*std::move(positions)});
}

Result<What> read_permute(TableReader& table, const field::Field&) {
  auto order = read_positions(table, "order");
  if (!order) return order.error();
  return What(Permute{*std::move(order)});
}

Result<What> read_repeat(TableReader& table, const field::Field&) {
  const auto times = table.integer("times", 1, largest_length, "times = 3");
  if (!times) return times.error();
  return What(Repeat{times->value});
}

Result<What> read_binary_image(TableReader& table, const field::Field& words) {
  if (words.characteristic() != 2 || words.order() == 2)
    return table.failure(table.line(),
                         "only codes over GF(2^m), m > 1, have a binary image; here words are over GF(" +
                             std::to_string(words.order()) + ")",
                         "leave the step out");
  const auto node = table.required("basis", "basis = \"polynomial\"");
  if (!node) return node.error();
  auto image = read_basis(**node, words, table.source());
  if (!image) return image.error();
  return What(*std::move(image));
}

Result<What> read_subfield_subcode(TableReader& table, const field::Field& words) {
  const auto order = table.integer("subfield", 2, field::largest_order, "subfield = 2");
  if (!order) return order.error();
  std::uint64_t power = order->value;
  while (power < words.order()) power *= order->value;
  if (power != words.order())
    return table.failure(
        order->line,
        "GF(" + std::to_string(order->value) + ") is no subfield of GF(" + std::to_string(words.order()) + ")",
        "write an order of which " + std::to_string(words.order()) + " is a power");
  Table entries{{"order", Node{static_cast<std::int64_t>(order->value), order->line}}};
  if (const Node* modulus = table.optional("modulus")) entries.emplace_back("modulus", *modulus);
  auto field = read_field(Node{std::move(entries), order->line}, table.source());
  if (!field) return field.error();
  return What(SubfieldSubcode{*std::move(field)});
}

using StepReader = std::function<Result<What>(TableReader&, const field::Field&)>;

template <class Bare>
StepReader bare() {
  return [](TableReader&, const field::Field&) -> Result<What> { return What(Bare{}); };
}

const std::vector<std::pair<std::string_view, StepReader>>& readers() {
  static const std::vector<std::pair<std::string_view, StepReader>> table = {
      {"extend", bare<Extend>()},          {"puncture", read_puncture},
      {"shorten", read_shorten},           {"expurgate", bare<Expurgate>()},
      {"augment", bare<Augment>()},        {"dual", bare<Dual>()},
      {"binary-image", read_binary_image}, {"subfield-subcode", read_subfield_subcode},
      {"permute", read_permute},           {"repeat", read_repeat},
  };
  return table;
}

Result<Step> read_step(const Node& node, const field::Field& words, const std::string& source) {
  const auto* entries = std::get_if<Table>(&node.value);
  if (entries == nullptr)
    return Failure{source + ":" + std::to_string(node.line),
                   "a step is " + std::string(kind_of(node)) + ", not a table",
                   "write [[then]] and below it step = \"extend\""};
  // A step is named by its own line, not by that of its [[then]].
  TableReader naming(*entries, source, node.line, "[[then]]");
  const auto name = naming.string("step", "step = \"extend\"");
  if (!name) return name.error();
  TableReader table(*entries, source, name->line, "[[then]]");
  static_cast<void>(table.optional("step"));
  const auto known =
      std::ranges::find(readers(), name->value, [](const auto& entry) { return std::string(entry.first); });
  if (known == readers().end()) {
    std::string names;
    for (const auto& [spelling, reader] : readers()) names += (names.empty() ? "" : ", ") + std::string(spelling);
    return table.failure(name->line, "\"" + name->value + "\" is not a step", "write one of " + names);
  }
  auto what = known->second(table, words);
  if (!what) return what.error();
  if (const auto done = table.finish(); !done) return done.error();
  return Step{*std::move(what), name->line};
}

}  // namespace

Result<std::vector<Step>> read_steps(const Node& node, const field::Field& words, const std::string& source) {
  const auto* array = std::get_if<Array>(&node.value);
  if (array == nullptr)
    return Failure{source + ":" + std::to_string(node.line), "\"then\" is " + std::string(kind_of(node)),
                   "steps are written as [[then]] with two brackets, each with step = \"...\" below"};
  std::vector<Step> steps;
  field::Field now = words;
  for (const Node& entry : *array) {
    auto step = read_step(entry, now, source);
    if (!step) return step.error();
    now = field_after(*step, now);
    steps.push_back(*std::move(step));
  }
  return steps;
}

}  // namespace assize::sheet
