// Key by key in the order of certs/FORMAT.md.
#include "sheet/canonical.hpp"

#include "base/digest.hpp"
#include "base/overloaded.hpp"
#include "base/word.hpp"
#include "sheet/read_parts.hpp"

namespace assize::sheet {

namespace {

Json integer(const Located<std::uint64_t>& value) { return Json::integer(value.value); }

Json field_json(const field::Field& field) {
  Json::Object out{{"order", Json::integer(field.order())}};
  if (field.degree() > 1) out.emplace_back("modulus", spell_word(field.characteristic(), field.modulus()));
  return out;
}

/// Spells the members of a family; q is the order of the description's field.
struct FamilySpelling {
  std::uint32_t q;

  [[nodiscard]] Json word(const Elements& elements) const { return spell_word(q, elements); }
  [[nodiscard]] static Json element(const Located<Element>& element) { return std::to_string(element.value); }

  Json::Object operator()(const MatrixRows& code) const {
    Json::Array rows;
    for (const auto& row : code.rows) rows.emplace_back(word(row.value));
    return {{"rows", rows}};
  }
  Json::Object operator()(const Cyclic& code) const {
    return {{"codeword_length", integer(code.codeword_length)}, {"generator", word(code.generator.value)}};
  }
  Json::Object operator()(const ReedMuller& code) const {
    return {{"order", integer(code.order)}, {"variables", integer(code.variables)}};
  }
  Json::Object operator()(const ReedSolomonByPoints& code) const {
    return {{"codeword_length", integer(code.codeword_length)},
            {"dimension", integer(code.dimension)},
            {"evaluation_points", word(code.evaluation_points.value)},
            {"multipliers", word(code.multipliers.value)}};
  }
  Json::Object operator()(const ReedSolomonByRoots& code) const {
    return {{"codeword_length", integer(code.codeword_length)},
            {"dimension", integer(code.dimension)},
            {"first_root", integer(code.first_root)},
            {"root_step", integer(code.root_step)},
            {"primitive_element", element(code.primitive_element)}};
  }
  Json::Object operator()(const Concatenated& code) const {
    Json::Object out{{"outer", to_json(*code.outer)}, {"inner", to_json(*code.inner)}};
    if (code.embedding) out.emplace_back("embedding", element(*code.embedding));
    if (code.symbol_basis)
      out.emplace_back("symbol_basis", spell_word(word_field(*code.outer).order(), code.symbol_basis->value));
    return out;
  }
  Json::Object operator()(const Justesen& code) const {
    return {{"outer_length", integer(code.outer_length)},
            {"outer_dimension", integer(code.outer_dimension)},
            {"evaluation_points", word(code.evaluation_points.value)},
            {"primitive_element", element(code.primitive_element)},
            {"first_exponent", integer(code.first_exponent)},
            {"image", code.bits ? "bits" : "symbols"}};
  }
  Json::Object operator()(const RandomLinear& code) const {
    return {{"codeword_length", integer(code.codeword_length)},
            {"dimension", integer(code.dimension)},
            {"seed", integer(code.seed)}};
  }
};

Json step_json(const Step& step, const field::Field& words) {
  return std::visit(
      Overloaded{
          [](const Extend&) {
            return Json::Object{{"step", "extend"}};
          },
          [](const Dual&) {
            return Json::Object{{"step", "dual"}};
          },
          [&words](const BinaryImage& image) {
            return Json::Object{{"step", "binary-image"}, {"basis", spell_word(words.order(), image.basis)}};
          },
      },
      step.what);
}

}  // namespace

std::string_view family_name(const Family& family) noexcept {
  return std::visit(
      Overloaded{
          [](const MatrixRows& code) -> std::string_view {
            return code.parity_check ? "parity-check-matrix" : "generator-matrix";
          },
          [](const Cyclic& code) -> std::string_view { return code.shortened ? "shortened-cyclic" : "cyclic"; },
          [](const ReedMuller&) -> std::string_view { return "reed-muller"; },
          [](const ReedSolomonByPoints&) -> std::string_view { return "reed-solomon"; },
          [](const ReedSolomonByRoots&) -> std::string_view { return "reed-solomon"; },
          [](const Concatenated&) -> std::string_view { return "concatenated"; },
          [](const Justesen&) -> std::string_view { return "justesen"; },
          [](const RandomLinear&) -> std::string_view { return "random-linear"; },
      },
      family);
}

Json to_json(const Description& description) {
  Json::Object code{{"family", family_name(description.family)}};
  for (auto& member : std::visit(FamilySpelling{description.field.order()}, description.family))
    code.push_back(std::move(member));
  Json::Object out{{"field", field_json(description.field)}, {"code", code}};
  if (!description.steps.empty()) {
    Json::Array steps;
    for (const Step& step : description.steps)  // only binary-image names elements, and it can stand only once
      steps.emplace_back(step_json(step, family_field(description.family, description.field)));
    out.emplace_back("then", steps);
  }
  return out;
}

std::string description_digest(const Description& description) { return digest_hex(to_json(description).text()); }

}  // namespace assize::sheet
