// Circulant blocks by first rows or polynomials, double and bordered double circulant codes, shift exponents.
#include "base/integers.hpp"
#include "sheet/algebra.hpp"
#include "sheet/elements.hpp"
#include "sheet/family_reading.hpp"

namespace assize::sheet {

namespace {

Result<bool> read_shift(Reading& in) {
  const auto shift = in.table.string("shift", "shift = \"right\"");
  if (!shift) return shift.error();
  if (shift->value == "right") return true;
  if (shift->value == "left") return false;
  return in.table.failure(
      shift->line, "\"" + shift->value + "\" is not a direction",
      "write shift = \"right\" (each row is the one above, moved one place to the right) or \"left\"");
}

/// A first row as elements, or, with block_size, a polynomial in x whose coefficient of x^j is symbol j.
Result<Elements> read_first_row(Reading& in, const Node& node, std::uint64_t block_size) {
  const auto* text = std::get_if<std::string>(&node.value);
  if (text == nullptr || block_size == 0 || text->find('x') == std::string::npos)
    return read_elements(node, in.field(), in.context.source, "first_rows");
  auto polynomial = parse_algebra(*text, in.field().order(), block_size - 1);
  if (!polynomial) return in.table.failure(node.line, polynomial.error().what, polynomial.error().cure);
  polynomial->resize(block_size, 0);
  return *std::move(polynomial);
}

Result<std::vector<std::vector<Elements>>> read_grid(Reading& in) {
  constexpr std::string_view example = R"(first_rows = [["1011000", "1110100"]])";
  const auto size = in.table.integer_or("block_size", 1, largest_length, 0);
  if (!size) return size.error();
  const auto node = in.table.required("first_rows", example);
  if (!node) return node.error();
  const Failure no_grid = in.table.failure((*node)->line, "first_rows is not a grid of first rows",
                                           "write, for example: " + std::string(example));
  const auto* lines = std::get_if<Array>(&(*node)->value);
  if (lines == nullptr || lines->empty()) return no_grid;
  Array single;  // a plain list of words is one line of the grid
  if (!std::holds_alternative<Array>(lines->front().value)) {
    single.push_back(**node);
    lines = &single;
  }
  std::vector<std::vector<Elements>> grid;
  for (const Node& line : *lines) {
    const auto* words = std::get_if<Array>(&line.value);
    if (words == nullptr || words->empty()) return no_grid;
    grid.emplace_back();
    for (const Node& word : *words) {
      auto row = read_first_row(in, word, size->value);
      if (!row) return row.error();
      const std::size_t wanted = grid.front().empty() ? row->size() : grid.front().front().size();
      if (row->empty() || row->size() != wanted || (size->value != 0 && row->size() != size->value))
        return in.table.failure(word.line, "the first rows do not all have the same length",
                                "circulant blocks are square and of one size");
      grid.back().push_back(*std::move(row));
    }
    if (grid.back().size() != grid.front().size())
      return in.table.failure(line.line, "the lines of the grid have different numbers of blocks",
                              "give each line the same number");
  }
  return grid;
}

Result<Family> read_exponents(Reading& in, QuasiCyclic out) {
  const auto lifting = in.table.integer("lifting", 1, largest_length, "lifting = 31");
  if (!lifting) return lifting.error();
  out.lifting = lifting->value;
  const auto node = in.table.required("shift_exponents", "shift_exponents = [[0, 3, -1], [1, 0, 5]]");
  if (!node) return node.error();
  const auto* lines = std::get_if<Array>(&(*node)->value);
  const Failure no_grid =
      in.table.failure((*node)->line, "shift_exponents is not a grid of numbers",
                       "write, for example: shift_exponents = [[0, 3, -1], [1, 0, 5]]; -1 is the zero block");
  if (lines == nullptr || lines->empty()) return no_grid;
  for (const Node& line : *lines) {
    const auto* entries = std::get_if<Array>(&line.value);
    if (entries == nullptr || entries->empty()) return no_grid;
    out.shifts.emplace_back();
    for (const Node& entry : *entries) {
      const auto* number = std::get_if<std::int64_t>(&entry.value);
      if (number == nullptr) return no_grid;
      if (*number < -1 || std::cmp_greater_equal(*number, out.lifting))
        return in.table.failure(entry.line, "the shift " + std::to_string(*number) + " is out of range",
                                "write -1 for a zero block, or a shift from 0 to " + std::to_string(out.lifting - 1));
      out.shifts.back().push_back(*number < 0 ? std::nullopt : std::optional(static_cast<std::uint32_t>(*number)));
    }
    if (out.shifts.back().size() != out.shifts.front().size())
      return in.table.failure(line.line, "the lines of shift_exponents have different lengths",
                              "give each line the same number of blocks");
  }
  return Family(std::move(out));
}

}  // namespace

Result<Family> read_quasi_cyclic(Reading& in) {
  QuasiCyclic out;
  out.line = in.table.line();
  const auto right = read_shift(in);
  if (!right) return right.error();
  out.right = *right;
  if (in.table.has("shift_exponents") || in.table.has("lifting")) {
    out.form = QuasiCyclic::Form::exponents;
    return read_exponents(in, std::move(out));
  }
  const auto form = in.table.string("form", "form = \"double\"");
  if (!form) return form.error();
  auto grid = read_grid(in);
  if (!grid) return grid.error();
  out.first_rows = *std::move(grid);
  if (form->value == "blocks") return Family(std::move(out));
  if (form->value != "double" && form->value != "bordered")
    return in.table.failure(form->line, "\"" + form->value + "\" is not a form",
                            "write blocks, double or bordered; or give shift_exponents and lifting");
  if (out.first_rows.size() != 1 || out.first_rows.front().size() != 1)
    return in.table.failure(form->line, "a " + form->value + " circulant code has one first row",
                            "write first_rows = [\"1011000\"]");
  if (form->value == "double") {
    out.form = QuasiCyclic::Form::double_circulant;
    return Family(std::move(out));
  }
  out.form = QuasiCyclic::Form::bordered;
  const auto corner = located_element(in, "corner", in.field(), "corner = 0");
  if (!corner) return corner.error();
  out.corner = corner->value;
  const auto border = located_element(in, "border", in.field(), "border = 1");
  if (!border) return border.error();
  out.border = border->value;
  return Family(std::move(out));
}

}  // namespace assize::sheet
