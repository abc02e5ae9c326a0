// [code] tables, one reader for each family.
#include <algorithm>
#include <functional>

#include "sheet/elements.hpp"
#include "sheet/family_reading.hpp"
#include "sheet/polynomial_notation.hpp"
#include "sheet/rows_from_file.hpp"

namespace assize::sheet {

Result<Located<Elements>> located_elements(Reading& in, std::string_view key, const field::Field& field,
                                           std::string_view example) {
  const auto node = in.table.required(key, example);
  if (!node) return node.error();
  auto elements = read_elements(**node, field, in.context.source, key);
  if (!elements) return elements.error();
  return Located<Elements>{*std::move(elements), (*node)->line};
}

Result<Located<Element>> located_element(Reading& in, std::string_view key, const field::Field& field,
                                         std::string_view example) {
  const auto node = in.table.required(key, example);
  if (!node) return node.error();
  const auto element = read_element(**node, field, in.context.source, key);
  if (!element) return element.error();
  return Located<Element>{*element, (*node)->line};
}

Result<Located<std::uint64_t>> codeword_length(Reading& in) {
  return in.table.integer("codeword_length", 1, largest_length, "codeword_length = 1016");
}

namespace {

Result<Family> read_matrix(Reading& in, bool parity_check) {
  auto from_file = rows_from_file(in.table, in.context, in.field());
  if (!from_file) return from_file.error();
  if (from_file->has_value()) {
    (*from_file)->parity_check = parity_check;
    return Family(**std::move(from_file));
  }
  MatrixRows out;
  out.parity_check = parity_check;
  const auto node = in.table.required("rows", R"(rows = ["1 0 1", "0 1 1"] or file = "matrix.txt")");
  if (!node) return node.error();
  const auto* array = std::get_if<Array>(&(*node)->value);
  if (array == nullptr || array->empty())
    return in.table.failure((*node)->line, "rows is not a list of rows",
                            R"(write, for example: rows = ["1 0 1", "0 1 1"])");
  for (const Node& entry : *array) {
    auto row = read_elements(entry, in.field(), in.context.source, "row " + std::to_string(out.rows.size() + 1));
    if (!row) return row.error();
    if (row->empty()) return in.table.failure(entry.line, "a row is empty", "write its symbols with blanks between");
    if (!out.rows.empty() && row->size() != out.rows.front().value.size())
      return in.table.failure(entry.line,
                              "row " + std::to_string(out.rows.size() + 1) + " has " + std::to_string(row->size()) +
                                  " symbols, the first row has " + std::to_string(out.rows.front().value.size()),
                              "give all rows the same length");
    out.rows.push_back({*std::move(row), entry.line});
  }
  return Family(std::move(out));
}

Result<Family> read_cyclic(Reading& in, bool shortened) {
  Cyclic out;
  out.shortened = shortened;
  const auto node = in.table.required("generator", R"(generator = { algebra = "x^3 + x + 1" })");
  if (!node) return node.error();
  auto generator = read_polynomial(**node, in.field(), in.context.source, "generator");
  if (!generator) return generator.error();
  out.generator = {std::move(generator->coefficients), (*node)->line};
  out.generator_as_written = std::move(generator->as_written);
  if (shortened && in.table.has("data_length")) {
    const auto data = in.table.integer("data_length", 1, largest_length, "data_length = 1000");
    if (!data) return data.error();
    if (const Node* both = in.table.optional("codeword_length"))
      return in.table.failure(both->line, "codeword_length and data_length are both given",
                              "keep one; codeword_length counts the check symbols, data_length does not");
    out.codeword_length = {data->value + out.generator.value.size() - 1, data->line};
    return Family(std::move(out));
  }
  const auto length = codeword_length(in);
  if (!length) return length.error();
  out.codeword_length = *length;
  return Family(std::move(out));
}

Result<Family> read_reed_muller(Reading& in) {
  if (in.field().order() != 2)
    return in.table.failure(in.description.field_line, "reed-muller is over GF(2)", "leave the [field] table out");
  const auto order = in.table.integer("order", 0, 20, "order = 1");
  if (!order) return order.error();
  const auto variables = in.table.integer("variables", 0, 20, "variables = 5");
  if (!variables) return variables.error();
  return Family(ReedMuller{*order, *variables});
}

/// A list, or "powers" = a^0, a^1, ... or "all" = 0 and then those; `count` of them.
Result<Located<Elements>> read_points(Reading& in, std::uint64_t count, Element powers_of, std::string_view base_name) {
  const auto node = in.table.required("evaluation_points", "evaluation_points = \"powers\"");
  if (!node) return node.error();
  Located<Elements> out{{}, (*node)->line};
  const field::Field& field = in.field();
  const auto* word = std::get_if<std::string>(&(*node)->value);
  if (word != nullptr && (*word == "powers" || *word == "all")) {
    if (!field.is_primitive(powers_of))
      return in.table.failure(out.line,
                              std::string(base_name) + " is not primitive, so its powers do not reach every element",
                              "list the evaluation points");
    const std::uint64_t available = field.order() - (*word == "powers" ? 1U : 0U);
    if (count > available)
      return in.table.failure(
          out.line,
          "\"" + *word + "\" are " + std::to_string(available) + " points, " + std::to_string(count) + " are needed",
          "make the code shorter or the field larger");
    if (*word == "all") out.value.push_back(0);
    for (Element power = 1; out.value.size() < count; power = field.multiply(power, powers_of))
      out.value.push_back(power);
    return out;
  }
  auto listed = read_elements(**node, field, in.context.source, "evaluation_points");
  if (!listed) return listed.error();
  out.value = *std::move(listed);
  return out;
}

Result<Family> read_reed_solomon(Reading& in) {
  const auto length = codeword_length(in);
  if (!length) return length.error();
  const auto dimension = in.table.integer("dimension", 1, largest_length, "dimension = 5");
  if (!dimension) return dimension.error();
  if (in.table.has("first_root") || in.table.has("root_step")) {
    const auto first = in.table.integer("first_root", 0, field::largest_order, "first_root = 1");
    if (!first) return first.error();
    const auto step = in.table.integer("root_step", 1, field::largest_order, "root_step = 1");
    if (!step) return step.error();
    const auto primitive = located_element(in, "primitive_element", in.field(), "primitive_element = 2");
    if (!primitive) return primitive.error();
    return Family(ReedSolomonByRoots{*length, *dimension, *first, *step, *primitive});
  }
  Element powers_of = 0;
  const Node* points = in.table.optional("evaluation_points");
  const bool listed =
      points != nullptr &&
      !(std::holds_alternative<std::string>(points->value) &&
        (std::get<std::string>(points->value) == "powers" || std::get<std::string>(points->value) == "all"));
  if (!listed) {  // the named lists need to know whose powers
    const auto primitive = located_element(in, "primitive_element", in.field(), "primitive_element = 2");
    if (!primitive) return primitive.error();
    powers_of = primitive->value;
  }
  ReedSolomonByPoints out{*length, *dimension, {}, {}};
  auto read = read_points(in, length->value, powers_of, "primitive_element");
  if (!read) return read.error();
  out.evaluation_points = *std::move(read);
  if (in.table.has("multipliers")) {
    auto multipliers = located_elements(in, "multipliers", in.field(), "");
    if (!multipliers) return multipliers.error();
    out.multipliers = *std::move(multipliers);
  } else {
    out.multipliers.value.assign(length->value, 1);
  }
  return Family(std::move(out));
}

Result<Family> read_justesen(Reading& in) {
  const field::Field& field = in.field();
  if (field.characteristic() != 2 || field.order() == 2)
    return in.table.failure(in.description.field_stated ? in.description.field_line : in.table.line(),
                            "justesen needs the outer field GF(2^m), m > 1",
                            "write [field] with, for example, order = 8 and modulus = \"x^3 + x + 1\"");
  Justesen out;
  const auto length = in.table.integer("outer_length", 1, field::largest_order, "outer_length = 7");
  if (!length) return length.error();
  out.outer_length = *length;
  const auto dimension = in.table.integer("outer_dimension", 1, field::largest_order, "outer_dimension = 3");
  if (!dimension) return dimension.error();
  out.outer_dimension = *dimension;
  auto points = read_points(in, length->value, field.class_of_x(), "the class of x");
  if (!points) return points.error();
  out.evaluation_points = *std::move(points);
  const auto primitive = located_element(in, "primitive_element", field, "primitive_element = 2");
  if (!primitive) return primitive.error();
  out.primitive_element = *primitive;
  const auto first = in.table.integer_or("first_exponent", 0, field::largest_order, 0);
  if (!first) return first.error();
  out.first_exponent = *first;
  if (in.table.has("image")) {
    const auto image = in.table.string("image", "image = \"bits\"");
    if (!image) return image.error();
    if (image->value != "bits" && image->value != "symbols")
      return in.table.failure(image->line, "\"" + image->value + "\" is not an image",
                              "write image = \"bits\" or \"symbols\"");
    out.bits = image->value == "bits";
  }
  return Family(std::move(out));
}

Result<Family> read_random_linear(Reading& in) {
  const auto length = codeword_length(in);
  if (!length) return length.error();
  const auto dimension = in.table.integer("dimension", 1, length->value, "dimension = 12");
  if (!dimension) return dimension.error();
  const auto seed = in.table.integer("seed", 0, (1ULL << 53) - 1, "seed = 1");
  if (!seed) return seed.error();
  return Family(RandomLinear{*length, *dimension, *seed});
}

using FamilyReader = std::function<Result<Family>(Reading&)>;

const std::vector<std::pair<std::string_view, FamilyReader>>& families() {
  static const std::vector<std::pair<std::string_view, FamilyReader>> table = {
      {"generator-matrix", [](Reading& in) { return read_matrix(in, false); }},
      {"parity-check-matrix", [](Reading& in) { return read_matrix(in, true); }},
      {"cyclic", [](Reading& in) { return read_cyclic(in, false); }},
      {"shortened-cyclic", [](Reading& in) { return read_cyclic(in, true); }},
      {"bch", read_bch},
      {"quadratic-residue", read_quadratic_residue},
      {"quasi-cyclic", read_quasi_cyclic},
      {"reed-muller", read_reed_muller},
      {"reed-solomon", read_reed_solomon},
      {"concatenated", read_concatenated},
      {"justesen", read_justesen},
      {"product", [](Reading& in) { return read_pair(in, Pair::Kind::product); }},
      {"direct-sum", [](Reading& in) { return read_pair(in, Pair::Kind::direct_sum); }},
      {"plotkin-sum", [](Reading& in) { return read_pair(in, Pair::Kind::plotkin_sum); }},
      {"random-linear", read_random_linear},
  };
  return table;
}

}  // namespace

Result<Family> read_family(const Table& entries, int line, const Context& context, Description& description) {
  TableReader table(entries, context.source, line, "[code]");
  const auto name = table.string("family", "family = \"cyclic\"");
  if (!name) return name.error();
  const auto known =
      std::ranges::find(families(), name->value, [](const auto& entry) { return std::string(entry.first); });
  if (known == families().end()) {
    std::string names;
    for (const auto& [spelling, reader] : families()) names += (names.empty() ? "" : ", ") + std::string(spelling);
    return table.failure(name->line, "\"" + name->value + "\" is not a family", "write one of " + names);
  }
  Reading in{table, context, description};
  auto family = known->second(in);
  if (!family) return family.error();
  if (const auto done = table.finish(); !done) return done.error();
  return family;
}

}  // namespace assize::sheet
