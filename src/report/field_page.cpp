// Rendering of `assize field`: each table is made once and written twice, as aligned columns and as CSV.
#include "report/field_page.hpp"

#include <algorithm>
#include <span>

#include "base/json.hpp"

namespace assize::report {

namespace {

constexpr std::size_t most_in_text = 64;

struct Column {
  std::string heading;  ///< of the text
  std::string name;     ///< of the CSV
  bool number = false;  ///< aligned to the right
};

struct Table {
  std::vector<Column> columns;
  std::vector<std::vector<std::string>> rows;
};

std::string left_out(std::size_t count) {
  return count <= most_in_text ? "" : "\n... " + std::to_string(count - most_in_text) + " more; --csv lists all";
}

/// Aligned columns under their headings, without a final line break; empty without rows.
std::string text_of(const Table& table) {
  if (table.rows.empty()) return "";
  const auto shown = std::span(table.rows).first(std::min(table.rows.size(), most_in_text));
  std::vector<std::size_t> widths;
  for (std::size_t j = 0; j < table.columns.size(); ++j) {
    widths.push_back(table.columns[j].heading.size());
    for (const auto& row : shown) widths[j] = std::max(widths[j], row[j].size());
  }
  std::string out;
  const auto append = [&](const auto& cell_of) {
    std::string line;
    for (std::size_t j = 0; j < widths.size(); ++j) {
      const std::string& cell = cell_of(j);
      const std::string padding(widths[j] - cell.size(), ' ');
      line += (j == 0 ? "" : "  ") + (table.columns[j].number ? padding + cell : cell + padding);
    }
    line.erase(line.find_last_not_of(' ') + 1);
    out += (out.empty() ? "" : "\n") + line;
  };
  append([&](std::size_t j) -> const std::string& { return table.columns[j].heading; });
  for (const auto& row : shown) append([&row](std::size_t j) -> const std::string& { return row[j]; });
  return out + left_out(table.rows.size());
}

/// No cell holds a comma, a quotation mark or a line break.
std::string csv_of(const Table& table) {
  std::string out;
  for (const Column& column : table.columns) out += (out.empty() ? "" : ",") + column.name;
  out += '\n';
  for (const auto& row : table.rows) {
    for (std::size_t j = 0; j < row.size(); ++j) out += (j == 0 ? "" : ",") + row[j];
    out += '\n';
  }
  return out;
}

std::string spelled(const std::vector<std::uint32_t>& numbers) {
  std::string out;
  for (const std::uint32_t number : numbers) out += (out.empty() ? "" : " ") + std::to_string(number);
  return out;
}

/// Sixteen numbers a line.
std::string short_list(const std::vector<std::uint32_t>& numbers) {
  constexpr std::size_t in_line = 16;
  std::string out;
  for (std::size_t i = 0; i < std::min(numbers.size(), most_in_text); ++i)
    out += (i == 0 ? "" : i % in_line == 0 ? "\n" : " ") + std::to_string(numbers[i]);
  return out + left_out(numbers.size());
}

std::string counted(std::uint64_t count, const std::string& singular, const std::string& plural) {
  return std::to_string(count) + " " + (count == 1 ? singular : plural);
}

std::string with_formula(const CountFacts& count) {
  return std::to_string(count.count) + " found; by formula " + count.formula;
}

/// "GF(16) = GF(2^4), modulus x^4 + x + 1"
std::string name_of(const FieldFacts& field) {
  std::string name = "GF(" + std::to_string(field.order) + ")";
  if (field.degree > 1)
    name += " = GF(" + std::to_string(field.characteristic) + "^" + std::to_string(field.degree) + ")";
  return field.modulus.empty() ? name : name + ", modulus " + field.modulus;
}

/// "x (element 2), which is primitive"
std::string base_text(const FieldFacts& field, const BaseFacts& base) {
  if (field.degree == 1) return std::to_string(base.element) + ", the least primitive element";
  const std::string element = base.polynomial + " (element " + std::to_string(base.element) + ")";
  if (base.is_x) return element + ", which is primitive";
  return element + ", the least primitive element: x is not primitive, its order is " + std::to_string(base.order_of_x);
}

Json::Object json_of(const FieldFacts& field) {
  return {{"order", Json::integer(field.order)},
          {"characteristic", Json::integer(field.characteristic)},
          {"degree", Json::integer(field.degree)},
          {"modulus", field.modulus.empty() ? Json::null() : Json(field.modulus)}};
}

Json json_of(const CountFacts& count) {
  return Json::Object{{"count", Json::integer(count.count)}, {"formula", count.formula}};
}

Json json_of(const BaseFacts& base) {
  return Json::Object{{"element", Json::integer(base.element)},
                      {"polynomial", base.polynomial},
                      {"is_x", Json::boolean(base.is_x)},
                      {"order_of_x", base.order_of_x == 0 ? Json::null() : Json::integer(base.order_of_x)}};
}

FieldDocument finished(const Page& page, const Json::Object& json, const Table& csv) {
  return {{page.text(), Json(json).text() + "\n"}, csv_of(csv)};
}

const std::string primitive_mark = "primitive";

Table table_of(const std::vector<PolynomialFacts>& polynomials) {
  Table table{{{"polynomial", "polynomial"},
               {"coefficients", "coefficients"},
               {"order of x", "order_of_x", true},
               {"", "primitive"}},
              {}};
  for (const PolynomialFacts& one : polynomials)
    table.rows.push_back({one.polynomial, spelled(one.coefficients), std::to_string(one.order_of_x),
                          one.primitive ? primitive_mark : ""});
  return table;
}

template <class Wanted>
Table table_of(const std::vector<ClassFacts>& classes, Wanted wanted) {
  Table table{{{"order", "order", true},
               {"minimal polynomial", "minimal_polynomial"},
               {"exponents", "exponents"},
               {"elements", "elements"},
               {"", "primitive"}},
              {}};
  for (const ClassFacts& one : classes)
    if (wanted(one))
      table.rows.push_back({std::to_string(one.order), one.minimal_polynomial, spelled(one.exponents),
                            spelled(one.elements), one.primitive ? primitive_mark : ""});
  return table;
}

Table table_of(const std::vector<LogarithmFacts>& powers) {
  Table table{{{"exponent", "exponent", true},
               {"element", "element", true},
               {"polynomial", "polynomial"},
               {"digits", "digits"}},
              {}};
  for (std::size_t e = 0; e < powers.size(); ++e)
    table.rows.push_back(
        {std::to_string(e), std::to_string(powers[e].element), powers[e].polynomial, spelled(powers[e].digits)});
  return table;
}

}  // namespace

FieldDocument irreducible_polynomials(const IrreducibleFacts& facts) {
  const FieldFacts& field = facts.field;
  const std::string ground = "GF(" + std::to_string(field.characteristic) + ")";
  const Table table = table_of(facts.polynomials);
  Page page(name_of(field) + ": " +
            counted(facts.irreducible.count, "monic irreducible polynomial", "monic irreducible polynomials") +
            " of degree " + std::to_string(field.degree) + " over " + ground + ", " +
            std::to_string(facts.primitive.count) + " of them primitive");
  page.line("irreducible", with_formula(facts.irreducible)).line("primitive", with_formula(facts.primitive));
  page.line("polynomials", text_of(table) + "\n(coefficients are written lowest first)");
  page.line("next", "--modulus POLY shows the elements of the field with that modulus");

  Json::Array polynomials;
  for (const PolynomialFacts& one : facts.polynomials)
    polynomials.emplace_back(Json::Object{{"polynomial", one.polynomial},
                                          {"coefficients", Json::integers(one.coefficients)},
                                          {"order_of_x", Json::integer(one.order_of_x)},
                                          {"primitive", Json::boolean(one.primitive)}});
  Json::Object json = json_of(field);
  json.emplace_back("irreducible", json_of(facts.irreducible));
  json.emplace_back("primitive", json_of(facts.primitive));
  json.emplace_back("polynomials", polynomials);
  return finished(page, json, table);
}

FieldDocument field_elements(const ElementsFacts& facts) {
  const FieldFacts& field = facts.field;
  const auto primitive_classes = std::ranges::count_if(facts.classes, &ClassFacts::primitive);
  std::string headline =
      name_of(field) + ": " + counted(facts.primitive.count, "primitive element", "primitive elements");
  if (field.degree > 1)
    headline +=
        " in " + counted(static_cast<std::uint64_t>(primitive_classes), "class of conjugates", "classes of conjugates");
  Page page(headline);
  page.line("primitive elements", short_list(facts.primitive_elements));
  page.line("their number", with_formula(facts.primitive));
  if (field.degree > 1) {
    page.line("exponents", "modulo " + std::to_string(field.order - 1) + ", of " + base_text(field, facts.base));
    page.line("primitive classes", text_of(table_of(facts.classes, [](const auto& one) { return one.primitive; })));
    page.line("other classes", text_of(table_of(facts.classes, [](const auto& one) { return !one.primitive; })));
  } else {
    page.line("least", std::to_string(facts.base.element));
  }

  Json::Object json = json_of(field);
  json.emplace_back("base", json_of(facts.base));
  json.emplace_back("primitive", json_of(facts.primitive));
  json.emplace_back("primitive_elements", Json::integers(facts.primitive_elements));
  Json::Array classes;
  for (const ClassFacts& one : facts.classes)
    classes.emplace_back(Json::Object{{"order", Json::integer(one.order)},
                                      {"minimal_polynomial", one.minimal_polynomial},
                                      {"exponents", Json::integers(one.exponents)},
                                      {"elements", Json::integers(one.elements)},
                                      {"primitive", Json::boolean(one.primitive)}});
  if (field.degree > 1) {
    json.emplace_back("classes", classes);
    return finished(page, json, table_of(facts.classes, [](const auto&) { return true; }));
  }
  Table csv{{{"", "primitive_element"}}, {}};
  for (const std::uint32_t element : facts.primitive_elements) csv.rows.push_back({std::to_string(element)});
  return finished(page, json, csv);
}

FieldDocument table_of_logarithms(const TableFacts& facts) {
  const FieldFacts& field = facts.field;
  const Table table = table_of(facts.powers);
  Page page(name_of(field) + ": logarithms to " +
            (field.degree > 1 ? facts.base.polynomial : std::to_string(facts.base.element)));
  page.line("base", base_text(field, facts.base));
  page.line("table", text_of(table) + (field.degree > 1 ? "\n(digits are written lowest first)" : ""));

  Json::Array rows;
  for (std::size_t e = 0; e < facts.powers.size(); ++e)
    rows.emplace_back(Json::Object{{"exponent", Json::integer(e)},
                                   {"element", Json::integer(facts.powers[e].element)},
                                   {"polynomial", facts.powers[e].polynomial},
                                   {"digits", Json::integers(facts.powers[e].digits)}});
  Json::Object json = json_of(field);
  json.emplace_back("base", json_of(facts.base));
  json.emplace_back("table", rows);
  return finished(page, json, table);
}

}  // namespace assize::report
