// One function for each family; steps are in explain_steps.cpp.
#include "sheet/explain.hpp"

#include "base/word.hpp"
#include "field/polynomial.hpp"
#include "sheet/canonical.hpp"
#include "sheet/polynomial_notation.hpp"

namespace assize::sheet {

namespace {

constexpr std::string_view highest_power_first = "highest power first: position i carries the coefficient of x^(n-1-i)";

bool made_of_others(const Family& family) {
  return std::holds_alternative<Concatenated>(family) || std::holds_alternative<Pair>(family);
}

std::string field_text(const Description& description) {
  const field::Field& field = description.field;
  std::string text = "GF(" + std::to_string(field.order()) + ")";
  if (field.degree() > 1) {
    const field::Polynomial modulus(field.modulus().begin(), field.modulus().end());
    text += ", modulus " + field::to_algebra(modulus);
    text += "; x has order " + std::to_string(field.order_of(field.class_of_x())) +
            (field.is_primitive(field.class_of_x()) ? ", primitive" : ", not primitive");
  }
  if (!description.field_stated)
    text += made_of_others(description.family) ? " (that of its parts)" : " (filled in: the sheet has no [field])";
  return text;
}

std::string element_text(const field::Field& field, Element element) {
  return std::to_string(element) + (element == 0 ? "" : ", of order " + std::to_string(field.order_of(element)));
}

std::string short_list(const field::Field& field, const Elements& elements) {
  constexpr std::size_t shown = 32;
  if (elements.size() <= shown) return spell_word(field.order(), elements);
  const Elements head(elements.begin(), elements.begin() + shown);
  return spell_word(field.order(), head) + " ... (" + std::to_string(elements.size()) + " in all)";
}

std::string part_text(const Description& part) {
  return std::string(family_name(part.family)) + " over GF(" + std::to_string(word_field(part).order()) + ")" +
         (part.title.empty() ? "" : ", \"" + part.title + "\"");
}

/// Adds what is particular to a family.
struct FamilyLines {
  Lines& lines;
  const Description& in;

  void add(std::string name, std::string value) const { lines.emplace_back(std::move(name), std::move(value)); }

  void operator()(const MatrixRows& code) const {
    add("rows", std::to_string(code.rows.size()));
    if (code.file.empty()) return;
    std::string file = code.file + ", read as " + code.file_layout;
    for (const std::string& notice : code.notices) file += "\n" + notice;
    add("matrix file", std::move(file));
  }
  void operator()(const Cyclic& code) const {
    add("generator", code.generator_as_written + " (as written)\n" + field::to_algebra(code.generator.value) +
                         (in.field.order() == 2 ? "\n" + every_notation(code.generator.value) : ""));
    add("order of positions", std::string(highest_power_first));
  }
  void operator()(const Bch& code) const {
    const std::uint64_t last = code.first_exponent.value + code.designed_distance.value - 2;
    add("designed distance", std::to_string(code.designed_distance.value) + ": zeros beta^" +
                                 std::to_string(code.first_exponent.value) + " .. beta^" + std::to_string(last));
    add("root modulus", field::to_algebra(code.root_modulus.value) +
                            (code.root_modulus.line == 0 ? " (filled in: the least primitive polynomial)" : ""));
    add("order of positions", std::string(highest_power_first));
  }
  void operator()(const QuadraticResidue& code) const {
    add("prime", std::to_string(code.prime.value));
    add("generator", field::to_algebra(code.generator) + " (filled in: the lesser of the two)");
    add("order of positions", std::string(highest_power_first));
  }
  void operator()(const QuasiCyclic& code) const {
    add("form", std::string(form_name(code.form)));
    add("shift", code.right ? "right: each row is the one above, moved one place to the right"
                            : "left: each row is the one above, moved one place to the left");
    if (code.form == QuasiCyclic::Form::exponents) {
      add("blocks", std::to_string(code.shifts.size()) + " x " + std::to_string(code.shifts.front().size()) +
                        " of size " + std::to_string(code.lifting) + ", a parity-check matrix");
    } else {
      add("blocks", std::to_string(code.first_rows.size()) + " x " + std::to_string(code.first_rows.front().size()) +
                        " of size " + std::to_string(code.first_rows.front().front().size()) + ", a generator matrix");
    }
  }
  void operator()(const ReedMuller& code) const {
    add("order and variables", std::to_string(code.order.value) + ", " + std::to_string(code.variables.value));
    add("order of positions", "position i is the point whose binary digits are i");
  }
  void operator()(const ReedSolomonByPoints& code) const {
    add("evaluation points", short_list(in.field, code.evaluation_points.value));
    add("multipliers", code.multipliers.line > 0 ? short_list(in.field, code.multipliers.value) : "all 1 (filled in)");
  }
  void operator()(const ReedSolomonByRoots& code) const {
    const std::uint64_t roots = code.codeword_length.value - code.dimension.value;
    add("primitive element", element_text(in.field, code.primitive_element.value));
    add("roots", roots == 0 ? "none"
                            : "(a^" + std::to_string(code.root_step.value) +
                                  ")^j for j = " + std::to_string(code.first_root.value) + " .. " +
                                  std::to_string(code.first_root.value + roots - 1));
    add("order of positions", std::string(highest_power_first));
  }
  void operator()(const Concatenated& code) const {
    add("outer", part_text(*code.outer));
    add("inner", part_text(*code.inner.front()) + (code.by_position ? ", and " + std::to_string(code.inner.size() - 1) +
                                                                          " more, one for each position"
                                                                    : ""));
  }
  void operator()(const Justesen& code) const {
    add("outer code", "Reed-Solomon [" + std::to_string(code.outer_length.value) + "," +
                          std::to_string(code.outer_dimension.value) + "]");
    add("evaluation points", short_list(in.field, code.evaluation_points.value));
    add("primitive element g", element_text(in.field, code.primitive_element.value) + ", of the inner maps");
    add("inner maps", "position i: b -> (b, g^(i+" + std::to_string(code.first_exponent.value) + ") b)" +
                          (code.first_exponent.line == 0 ? " (first exponent filled in)" : ""));
    add("image", code.bits ? "bits, lowest coefficient first, b before its partner" : "symbols");
  }
  void operator()(const Pair& code) const {
    add("first", part_text(*code.first));
    add("second", part_text(*code.second));
  }
  void operator()(const RandomLinear& code) const { add("seed", std::to_string(code.seed.value)); }
};

std::string transmission_text(const Transmission& transmission) {
  std::string text;
  for (const auto& [name, value] : transmission) text += name + " = " + value + "\n";
  if (text.empty()) return text;
  return text +
         "set aside: between frames of one fixed length these add the same word to every frame, or reorder its bits, "
         "so no\n"
         "distance changes. They matter for stuck lines, all-zero frames, leading zeros and frames whose length "
         "varies.";
}

}  // namespace

Lines explain(const Description& description) {
  Lines lines;
  lines.emplace_back("family", family_name(description.family));
  lines.emplace_back("field", field_text(description));
  std::visit(FamilyLines{lines, description}, description.family);
  lines.emplace_back("then", explain_steps(description));
  lines.emplace_back("transmission", transmission_text(description.transmission));
  return lines;
}

}  // namespace assize::sheet
