// Reed-Solomon codes, by evaluation points or by consecutive roots of the generator polynomial.
#include <numeric>

#include "recheck/polynomial.hpp"
#include "recheck/replay.hpp"
#include "recheck/word.hpp"

namespace assize::recheck {
namespace {

Result<Built> by_points(Keys& code, const FieldPtr& field, std::uint64_t length, std::uint64_t dimension) {
  const std::string points_text = code.text("evaluation_points");
  const std::string multipliers_text = code.text("multipliers");
  if (auto end = code.end(); !end) return end.error();
  const std::string at_points = code.at("evaluation_points");
  const std::string at_multipliers = code.at("multipliers");
  const auto points = read_word(points_text, field->order(), at_points);
  if (!points) return points.error();
  const auto multipliers = read_word(multipliers_text, field->order(), at_multipliers);
  if (!multipliers) return multipliers.error();
  if (points->size() != length) return Failure{at_points, "there must be one point for each position", ""};
  if (multipliers->size() != length)
    return Failure{at_multipliers, "there must be one multiplier for each position", ""};
  std::vector<bool> seen(field->order(), false);
  for (const Symbol point : *points) {
    if (seen[point]) return Failure{at_points, "the points are not distinct", ""};
    seen[point] = true;
  }
  for (const Symbol multiplier : *multipliers)
    if (multiplier == 0) return Failure{at_multipliers, "a multiplier is zero", ""};
  Matrix rows = powers_of_points(*field, *points, dimension);
  for (std::size_t r = 0; r < rows.rows; ++r)
    for (std::size_t c = 0; c < rows.columns; ++c) rows.row(r)[c] = field->multiply(rows.row(r)[c], (*multipliers)[c]);
  return Built{field, std::move(rows), {}};
}

Result<Built> by_roots(Keys& code, const FieldPtr& field, std::uint64_t length, std::uint64_t dimension) {
  const std::uint64_t first = code.integer("first_root");
  const std::uint64_t step = code.integer("root_step");
  const std::string element_text = code.text("primitive_element");
  if (auto end = code.end(); !end) return end.error();
  const std::uint64_t cycle = field->order() - 1;
  const auto element = read_element(element_text, field->order(), code.at("primitive_element"));
  if (!element) return element.error();
  if (!field->is_primitive(*element)) return Failure{code.at("primitive_element"), "the element is not primitive", ""};
  if (std::gcd(step, cycle) != 1)
    return Failure{code.at("root_step"), "the step has a factor in common with q - 1", ""};
  if (length > cycle) return Failure{code.at("codeword_length"), "the length is above q - 1", ""};
  const Symbol root_of_step = field->power(*element, step);
  std::vector<Symbol> generator{1};
  for (std::uint64_t i = 0; i < length - dimension; ++i) {
    const Symbol minus_root = field->negate(field->power(root_of_step, first % cycle + i));
    generator.push_back(0);  // times (x - root)
    for (std::size_t c = generator.size(); c-- > 0;)
      generator[c] = field->add(field->multiply(generator[c], minus_root), c > 0 ? generator[c - 1] : Symbol{0});
  }
  return Built{field, polynomial_multiples(*field, generator, length), {}};
}

}  // namespace

Matrix powers_of_points(const Field& field, const std::vector<Symbol>& points, std::size_t dimension) {
  Matrix rows(dimension, points.size());
  for (std::size_t r = 0; r < dimension; ++r)
    for (std::size_t c = 0; c < points.size(); ++c) rows.row(r)[c] = field.power(points[c], r);
  return rows;
}

Result<Built> build_reed_solomon(Keys& code, const FieldPtr& field) {
  const std::uint64_t length = code.integer("codeword_length", 1, field->order());
  const std::uint64_t dimension = code.integer("dimension", 1, length);
  if (!code.ok()) return code.failure();
  if (auto fits = matrix_fits(dimension, length, code.path()); !fits) return fits.error();
  return code.next_is("first_root") ? by_roots(code, field, length, dimension)
                                    : by_points(code, field, length, dimension);
}

}  // namespace assize::recheck
