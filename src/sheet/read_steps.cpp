// [[then]] tables: what is done to a code after its construction.
#include "sheet/elements.hpp"
#include "sheet/read_parts.hpp"

namespace assize::sheet {

namespace {

/// A basis of GF(2^m) over GF(2): "polynomial", or m listed elements.
Result<BinaryImage> read_basis(TableReader& table, const field::Field& words, const std::string& source) {
  const auto node = table.required("basis", "basis = \"polynomial\"");
  if (!node) return node.error();
  BinaryImage image;
  if (const auto* text = std::get_if<std::string>(&(*node)->value); text != nullptr && *text == "polynomial") {
    for (std::uint32_t i = 0; i < words.degree(); ++i) image.basis.push_back(static_cast<Element>(1U << i));
    image.as_written = "polynomial";
    return image;
  }
  auto elements = read_elements(**node, words, source, "basis");
  if (!elements) return elements.error();
  if (elements->size() != words.degree())
    return table.failure((*node)->line,
                         "a basis of GF(" + std::to_string(words.order()) + ") over GF(2) has " +
                             std::to_string(words.degree()) + " elements, not " + std::to_string(elements->size()),
                         "write basis = \"polynomial\" or list the elements");
  image.basis = *std::move(elements);
  image.as_written = "as listed";
  return image;
}

Result<Step> read_step(const Node& node, const field::Field& words, const std::string& source) {
  const auto* entries = std::get_if<Table>(&node.value);
  if (entries == nullptr)
    return Failure{source + ":" + std::to_string(node.line),
                   "a step is " + std::string(kind_of(node)) + ", not a table",
                   "write [[then]] and below it step = \"extend\""};
  TableReader table(*entries, source, node.line, "[[then]]");
  const auto name = table.string("step", "step = \"extend\"");
  if (!name) return name.error();
  Step step;
  step.line = name->line;
  if (name->value == "extend") {
    step.what = Extend{};
  } else if (name->value == "dual") {
    step.what = Dual{};
  } else if (name->value == "binary-image") {
    if (words.characteristic() != 2 || words.order() == 2)
      return table.failure(name->line,
                           "only codes over GF(2^m), m > 1, have a binary image; here words are over GF(" +
                               std::to_string(words.order()) + ")",
                           "leave the step out");
    auto image = read_basis(table, words, source);
    if (!image) return image.error();
    step.what = *std::move(image);
  } else {
    return table.failure(name->line, "\"" + name->value + "\" is not a step", "write extend, dual or binary-image");
  }
  if (const auto done = table.finish(); !done) return done.error();
  return step;
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
    if (std::holds_alternative<BinaryImage>(step->what)) now = field::Field::binary();
    steps.push_back(*std::move(step));
  }
  return steps;
}

}  // namespace assize::sheet
