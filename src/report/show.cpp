// Rendering of `assize show`.
#include "report/show.hpp"

#include "base/json.hpp"
#include "base/overloaded.hpp"
#include "base/word.hpp"
#include "field/polynomial.hpp"
#include "sheet/canonical.hpp"
#include "sheet/polynomial_notation.hpp"

namespace assize::report {

namespace {

std::string field_text(const sheet::Description& description) {
  const field::Field& field = description.field;
  std::string text = "GF(" + std::to_string(field.order()) + ")";
  if (field.degree() > 1) {
    const field::Polynomial modulus(field.modulus().begin(), field.modulus().end());
    text += ", modulus " + field::to_algebra(modulus);
    text += "; x has order " + std::to_string(field.order_of(field.class_of_x())) +
            (field.is_primitive(field.class_of_x()) ? ", primitive" : ", not primitive");
  }
  if (!description.field_stated && !std::holds_alternative<sheet::Concatenated>(description.family))
    text += " (filled in: the sheet has no [field])";
  return text;
}

std::string element_text(const field::Field& field, sheet::Element element) {
  return std::to_string(element) + ", of order " + std::to_string(field.order_of(element));
}

std::string short_list(const field::Field& field, const sheet::Elements& elements) {
  constexpr std::size_t shown = 32;
  if (elements.size() <= shown) return spell_word(field.order(), elements);
  const sheet::Elements head(elements.begin(), elements.begin() + shown);
  return spell_word(field.order(), head) + " ... (" + std::to_string(elements.size()) + " in all)";
}

/// Adds what is particular to a family.
struct FamilyLines {
  Page& page;
  const sheet::Description& in;

  void operator()(const sheet::MatrixRows& code) const { page.line("rows", std::to_string(code.rows.size())); }
  void operator()(const sheet::Cyclic& code) const {
    page.line("generator", code.generator_as_written + " (as written)\n" + field::to_algebra(code.generator.value) +
                               (in.field.order() == 2 ? "\n" + sheet::every_notation(code.generator.value) : ""));
    page.line("order of positions", "highest power first: position i carries the coefficient of x^(n-1-i)");
  }
  void operator()(const sheet::ReedMuller& code) const {
    page.line("order and variables", std::to_string(code.order.value) + ", " + std::to_string(code.variables.value));
    page.line("order of positions", "position i is the point whose binary digits are i");
  }
  void operator()(const sheet::ReedSolomonByPoints& code) const {
    page.line("evaluation points", short_list(in.field, code.evaluation_points.value));
    page.line("multipliers",
              code.multipliers.line > 0 ? short_list(in.field, code.multipliers.value) : "all 1 (filled in)");
  }
  void operator()(const sheet::ReedSolomonByRoots& code) const {
    page.line("primitive element", element_text(in.field, code.primitive_element.value));
    page.line("roots",
              "(a^" + std::to_string(code.root_step.value) + ")^j for j = " + std::to_string(code.first_root.value) +
                  " .. " +
                  std::to_string(code.first_root.value + code.codeword_length.value - code.dimension.value - 1));
    page.line("order of positions", "highest power first: position i carries the coefficient of x^(n-1-i)");
  }
  void operator()(const sheet::Concatenated& code) const {
    page.line("outer", std::string(sheet::family_name(code.outer->family)) + " over GF(" +
                           std::to_string(sheet::word_field(*code.outer).order()) + ")");
    page.line("inner", std::string(sheet::family_name(code.inner->family)) + " over GF(" +
                           std::to_string(sheet::word_field(*code.inner).order()) + ")");
  }
  void operator()(const sheet::Justesen& code) const {
    page.line("outer code", "Reed-Solomon [" + std::to_string(code.outer_length.value) + "," +
                                std::to_string(code.outer_dimension.value) + "]");
    page.line("evaluation points", short_list(in.field, code.evaluation_points.value));
    page.line("primitive element g", element_text(in.field, code.primitive_element.value) + ", of the inner maps");
    page.line("inner maps", "position i: b -> (b, g^(i+" + std::to_string(code.first_exponent.value) + ") b)" +
                                (code.first_exponent.line == 0 ? " (first exponent filled in)" : ""));
    page.line("image", code.bits ? "bits, lowest coefficient first, b before its partner" : "symbols");
  }
  void operator()(const sheet::RandomLinear& code) const { page.line("seed", std::to_string(code.seed.value)); }
};

std::string steps_text(const sheet::Description& description) {
  std::string text;
  for (const sheet::Step& step : description.steps) {
    if (!text.empty()) text += '\n';
    text += std::visit(
        Overloaded{
            [](const sheet::Extend&) -> std::string { return "extend: append minus the sum of all symbols"; },
            [](const sheet::Dual&) -> std::string { return "dual"; },
            [](const sheet::BinaryImage& image) -> std::string {
              std::string basis;
              for (const sheet::Element element : image.basis) basis += " " + std::to_string(element);
              return "binary-image, basis " + image.as_written + ":" + basis;
            },
        },
        step.what);
  }
  return text;
}

std::string joined(const std::vector<std::string>& lines) {
  std::string text;
  for (const std::string& line : lines) text += (text.empty() ? "" : "\n") + line;
  return text;
}

}  // namespace

Document show(const sheet::Description& description, const CodeFacts& facts) {
  const std::uint32_t redundancy = facts.length - facts.dimension;
  Page page(parameters(facts.order, facts.length, facts.dimension));
  page.line("title", description.title).line("sheet", description.source);
  page.line("family", sheet::family_name(description.family)).line("field", field_text(description));
  std::visit(FamilyLines{page, description}, description.family);
  page.line("then", steps_text(description));
  page.line("codeword length n", std::to_string(facts.length));
  page.line("dimension k", std::to_string(facts.dimension) + " data symbols");
  page.line("redundancy r", std::to_string(redundancy) + " check symbols");
  page.line("rate", std::to_string(facts.dimension) + "/" + std::to_string(facts.length));
  if (!facts.guaranteed_by.empty())
    page.line("guaranteed", "minimum distance at least " + std::to_string(facts.guaranteed) +
                                " (theorem: " + facts.guaranteed_by + ")");
  page.line("notices", joined(facts.notices));
  page.line("sheet digest", facts.sheet_digest).line("description digest", facts.description_digest);
  page.line("generator digest", facts.reduced_generator_digest + " (reduced generator)");

  Json::Array notices;
  for (const std::string& notice : facts.notices) notices.emplace_back(notice);
  Json::Object json{{"order", Json::integer(facts.order)},
                    {"length", Json::integer(facts.length)},
                    {"dimension", Json::integer(facts.dimension)},
                    {"redundancy", Json::integer(redundancy)},
                    {"title", description.title},
                    {"description", sheet::to_json(description)}};
  if (const auto* cyclic = std::get_if<sheet::Cyclic>(&description.family)) {
    json.emplace_back("generator_as_written", cyclic->generator_as_written);
    json.emplace_back("generator_algebra", field::to_algebra(cyclic->generator.value));
  }
  json.emplace_back("field_filled_in", Json::boolean(!description.field_stated));
  json.emplace_back("guaranteed_distance", Json::integer(facts.guaranteed));
  json.emplace_back("notices", notices);
  json.emplace_back("sheet_digest", facts.sheet_digest);
  json.emplace_back("description_digest", facts.description_digest);
  json.emplace_back("reduced_generator_digest", facts.reduced_generator_digest);
  return {page.text(), Json(json).text() + "\n"};
}

}  // namespace assize::report
