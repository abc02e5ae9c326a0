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
  std::uint32_t characteristic;

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
  Json::Object operator()(const Bch& code) const {
    return {{"codeword_length", integer(code.codeword_length)},
            {"designed_distance", integer(code.designed_distance)},
            {"first_exponent", integer(code.first_exponent)},
            {"root_modulus", spell_word(characteristic, code.root_modulus.value)}};
  }
  Json::Object operator()(const QuadraticResidue& code) const {
    return {{"prime", integer(code.prime)}, {"generator", word(code.generator)}};
  }
  Json::Object operator()(const QuasiCyclic& code) const;
  Json::Object operator()(const Pair& code) const {
    return {{"first", to_json(*code.first)}, {"second", to_json(*code.second)}};
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
    Json::Object out{{"outer", to_json(*code.outer)}};
    if (code.by_position) {
      Json::Array inner;
      for (const SubDescription& description : code.inner) inner.push_back(to_json(*description));
      out.emplace_back("inner_by_position", inner);
    } else {
      out.emplace_back("inner", to_json(*code.inner.front()));
    }
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

Json::Object FamilySpelling::operator()(const QuasiCyclic& code) const {
  const Json shift = code.right ? "right" : "left";
  switch (code.form) {
    case QuasiCyclic::Form::blocks: {
      Json::Array grid;
      for (const auto& line : code.first_rows) {
        Json::Array words;
        for (const Elements& first_row : line) words.emplace_back(word(first_row));
        grid.emplace_back(words);
      }
      return {{"form", form_name(code.form)}, {"first_rows", grid}, {"shift", shift}};
    }
    case QuasiCyclic::Form::double_circulant:
      return {{"form", form_name(code.form)}, {"first_row", word(code.first_rows.front().front())}, {"shift", shift}};
    case QuasiCyclic::Form::bordered:
      return {{"form", form_name(code.form)},
              {"corner", std::to_string(code.corner)},
              {"border", std::to_string(code.border)},
              {"first_row", word(code.first_rows.front().front())},
              {"shift", shift}};
    case QuasiCyclic::Form::exponents: {
      Json::Array lines;
      for (const auto& row : code.shifts) {
        std::string line;
        for (const auto& exponent : row)
          line += (line.empty() ? "" : " ") + (exponent ? std::to_string(*exponent) : std::string("-"));
        lines.emplace_back(line);
      }
      return {{"form", form_name(code.form)},
              {"lifting", Json::integer(code.lifting)},
              {"shift_exponents", lines},
              {"shift", shift}};
    }
  }
  return {};
}

Json step_json(const Step& step, const field::Field& words) {
  return std::visit(
      Overloaded{
          [](const Extend&) {
            return Json::Object{{"step", "extend"}};
          },
          [](const Dual&) {
            return Json::Object{{"step", "dual"}};
          },
          [](const Expurgate&) {
            return Json::Object{{"step", "expurgate"}};
          },
          [](const Augment&) {
            return Json::Object{{"step", "augment"}};
          },
          [](const Puncture& each) {
            return Json::Object{{"step", "puncture"}, {"positions", Json::integers(each.positions)}};
          },
          [](const Shorten& each) {
            return Json::Object{{"step", "shorten"}, {"positions", Json::integers(each.positions)}};
          },
          [](const Permute& each) {
            return Json::Object{{"step", "permute"}, {"order", Json::integers(each.order)}};
          },
          [](const Repeat& each) {
            return Json::Object{{"step", "repeat"}, {"times", Json::integer(each.times)}};
          },
          [](const SubfieldSubcode& each) {
            return Json::Object{{"step", "subfield-subcode"}, {"field", field_json(each.field)}};
          },
          [&words](const BinaryImage& image) {
            return Json::Object{{"step", "binary-image"}, {"basis", spell_word(words.order(), image.basis)}};
          },
      },
      step.what);
}

std::string_view pair_name(Pair::Kind kind) {
  switch (kind) {
    case Pair::Kind::product:
      return "product";
    case Pair::Kind::direct_sum:
      return "direct-sum";
    case Pair::Kind::plotkin_sum:
      return "plotkin-sum";
  }
  return "";
}

}  // namespace

std::string_view form_name(QuasiCyclic::Form form) noexcept {
  switch (form) {
    case QuasiCyclic::Form::blocks:
      return "blocks";
    case QuasiCyclic::Form::double_circulant:
      return "double";
    case QuasiCyclic::Form::bordered:
      return "bordered";
    case QuasiCyclic::Form::exponents:
      return "exponents";
  }
  return "";
}

std::string_view family_name(const Family& family) noexcept {
  return std::visit(
      Overloaded{
          [](const MatrixRows& code) -> std::string_view {
            return code.parity_check ? "parity-check-matrix" : "generator-matrix";
          },
          [](const Cyclic& code) -> std::string_view { return code.shortened ? "shortened-cyclic" : "cyclic"; },
          [](const Bch&) -> std::string_view { return "bch"; },
          [](const QuadraticResidue&) -> std::string_view { return "quadratic-residue"; },
          [](const QuasiCyclic&) -> std::string_view { return "quasi-cyclic"; },
          [](const Pair& pair) { return pair_name(pair.kind); },
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
  for (auto& member :
       std::visit(FamilySpelling{description.field.order(), description.field.characteristic()}, description.family))
    code.push_back(std::move(member));
  Json::Object out{{"field", field_json(description.field)}, {"code", code}};
  if (!description.steps.empty()) {
    Json::Array steps;
    field::Field words = family_field(description.family, description.field);
    for (const Step& step : description.steps) {
      steps.emplace_back(step_json(step, words));
      words = field_after(step, words);
    }
    out.emplace_back("then", steps);
  }
  return out;
}

std::string description_digest(const Description& description) { return digest_hex(to_json(description).text()); }

}  // namespace assize::sheet
