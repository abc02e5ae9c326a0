// Both constructions reduce to an outer code, coordinates, and inner generators.
#include "code/concatenation.hpp"

#include <algorithm>

#include "base/integers.hpp"
#include "code/families.hpp"
#include "code/reed_solomon.hpp"

namespace assize::code {

using field::Element;
using field::Matrix;

namespace {

/// The rows as written for a generator matrix without steps, the reduced rows otherwise.
Result<Matrix> inner_generator(const sheet::Description& inner) {
  const auto code = construct(inner);
  if (!code) return code.error();
  const auto* rows = std::get_if<sheet::MatrixRows>(&inner.family);
  if (rows == nullptr || rows->parity_check || !inner.steps.empty()) return code->generator();
  if (code->dimension() != rows->rows.size())
    return Failure{inner.place(rows->rows.front().line), "the rows of an inner generator matrix depend on one another",
                   "coordinates go with rows: drop the dependent rows"};
  Matrix written(rows->rows.size(), code->length());
  for (std::size_t i = 0; i < written.rows(); ++i) std::ranges::copy(rows->rows[i].value, written.row(i).begin());
  return written;
}

Result<std::vector<Matrix>> inner_generators(const sheet::Concatenated& family, const sheet::Description& in,
                                             std::uint32_t outer_length) {
  if (family.by_position && family.inner.size() != outer_length)
    return Failure{in.place(family.inner_line),
                   "inner_by_position has " + std::to_string(family.inner.size()) + " codes, the outer words have " +
                       std::to_string(outer_length) + " positions",
                   "write one for each position"};
  std::vector<Matrix> out;
  for (const sheet::SubDescription& inner : family.inner) {
    auto generator = inner_generator(*inner);
    if (!generator) return generator.error();
    if (!out.empty() && generator->rows() != out.front().rows())
      return Failure{in.place(family.inner_line), "the inner codes have different dimensions",
                     "each must have as many words as there are outer symbols"};
    out.push_back(*std::move(generator));
  }
  return out;
}

Result<Concatenation> parts_of(const sheet::Concatenated& family, const sheet::Description& in) {
  auto outer = construct(*family.outer);
  if (!outer) return outer.error();
  auto inner = inner_generators(family, in, outer->length());
  if (!inner) return inner.error();
  const field::Field small = sheet::word_field(*family.inner.front());
  const field::Field& large = outer->field();
  const std::size_t rows = inner->front().rows();
  if (power_if_fits(small.order(), rows) != large.order())
    return Failure{in.place(family.inner_line),
                   "the inner code has " + std::to_string(small.order()) + "^" + std::to_string(rows) +
                       " words, the outer symbols are " + std::to_string(large.order()),
                   "inner words and outer symbols must be equally many: q^(inner dimension) = Q"};
  if (small.degree() == 1)
    return Concatenation{*std::move(outer), small, Coordinates::digits(large), *std::move(inner)};
  contract(family.embedding && family.symbol_basis, "the reader demands embedding and symbol_basis");
  const int line = family.symbol_basis->line;
  if (family.symbol_basis->value.size() != rows)
    return Failure{in.place(line),
                   "symbol_basis has " + std::to_string(family.symbol_basis->value.size()) + " elements",
                   "list " + std::to_string(rows) + ", one for each row of the inner generator"};
  auto coordinates = Coordinates::create(small, large, family.embedding->value, family.symbol_basis->value);
  if (!coordinates) return Failure{in.place(line), coordinates.error().what, coordinates.error().cure};
  return Concatenation{*std::move(outer), small, *std::move(coordinates), *std::move(inner)};
}

/// Row j of the inner generator of a position: the pair (x^j, factor x^j) as bits, or (1, factor) as symbols.
Matrix pair_generator(const field::Field& field, Element factor, bool bits) {
  if (!bits) {
    Matrix out(1, 2);
    out.at(0, 0) = 1;
    out.at(0, 1) = factor;
    return out;
  }
  const std::uint32_t m = field.degree();
  Matrix out(m, 2 * m);
  for (std::uint32_t j = 0; j < m; ++j) {
    const auto power = static_cast<Element>(1U << j);
    out.at(j, j) = 1;
    const auto digits = field.digits(field.multiply(factor, power));
    std::ranges::copy(digits, out.row(j).begin() + m);
  }
  return out;
}

Result<Concatenation> parts_of(const sheet::Justesen& family, const sheet::Description& in) {
  const field::Field& field = in.field;
  const std::uint64_t length = family.outer_length.value;
  if (family.outer_dimension.value > length)
    return Failure{in.place(family.outer_dimension.line),
                   "the outer dimension " + std::to_string(family.outer_dimension.value) +
                       " is larger than the outer length " + std::to_string(length),
                   "write a dimension from 1 to " + std::to_string(length)};
  if (const auto fine =
          check_points(field, family.evaluation_points.value, length, in.place(family.evaluation_points.line));
      !fine)
    return fine.error();
  if (!field.is_primitive(family.primitive_element.value))
    return Failure{in.place(family.primitive_element.line),
                   std::to_string(family.primitive_element.value) + " is not a primitive element",
                   "the least primitive element is " + std::to_string(field.least_primitive_element())};
  const std::vector<Element> ones(length, 1);
  LinearCode outer = evaluation_code(field, static_cast<std::uint32_t>(family.outer_dimension.value),
                                     family.evaluation_points.value, ones);
  outer.structure.reed_solomon = true;
  Concatenation parts{std::move(outer),
                      family.bits ? field::Field::binary() : field,
                      family.bits ? Coordinates::digits(field) : Coordinates::identity(field),
                      {}};
  for (std::uint64_t i = 0; i < length; ++i)
    parts.inner_generators.push_back(pair_generator(
        field, field.power(family.primitive_element.value, i + family.first_exponent.value), family.bits));
  return parts;
}

}  // namespace

std::optional<Result<Concatenation>> concatenation_parts(const sheet::Description& description) {
  if (const auto* family = std::get_if<sheet::Concatenated>(&description.family)) return parts_of(*family, description);
  if (const auto* family = std::get_if<sheet::Justesen>(&description.family)) return parts_of(*family, description);
  return std::nullopt;
}

Result<LinearCode> concatenate(const Concatenation& parts, const sheet::Description& in, int line) {
  const LinearCode& outer = parts.outer;
  const std::uint32_t m = parts.coordinates.count();
  std::vector<std::uint64_t> starts(outer.length() + 1, 0);
  for (std::uint32_t i = 0; i < outer.length(); ++i) starts[i + 1] = starts[i] + parts.inner(i).columns();
  if (const auto fits = check_size(in, line, std::uint64_t{m} * outer.dimension(), starts.back()); !fits)
    return fits.error();
  Matrix generator(std::size_t{m} * outer.dimension(), starts.back());
  for (std::uint32_t i = 0; i < outer.dimension(); ++i) {
    const auto outer_row = outer.row(i);
    for (std::uint32_t l = 0; l < m; ++l) {  // the row times each basis element: together they span the code over GF(q)
      const auto row = generator.row(std::size_t{i} * m + l);
      for (std::uint32_t position = 0; position < outer.length(); ++position) {
        const Element symbol = outer.field().multiply(parts.coordinates.basis()[l], outer_row[position]);
        const auto coordinates = parts.coordinates.of(symbol);
        const Matrix& inner = parts.inner(position);
        const auto block = row.subspan(starts[position], inner.columns());
        for (std::uint32_t j = 0; j < m; ++j)
          field::add_multiple(parts.inner_field, block, coordinates[j], inner.row(j));
      }
    }
  }
  return LinearCode(parts.inner_field, reduce(parts.inner_field, std::move(generator)));
}

Result<LinearCode> build(const sheet::Concatenated& family, const sheet::Description& in) {
  const auto parts = parts_of(family, in);
  if (!parts) return parts.error();
  return concatenate(*parts, in, family.inner_line);
}

Result<LinearCode> build(const sheet::Justesen& family, const sheet::Description& in) {
  const auto length = check_size(in, family.outer_length.line, 1, 2 * family.outer_length.value * in.field.degree());
  if (!length) return length.error();
  const auto parts = parts_of(family, in);
  if (!parts) return parts.error();
  return concatenate(*parts, in, family.outer_length.line);
}

}  // namespace assize::code
