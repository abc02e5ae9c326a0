// Concatenated codes: every symbol of an outer word is replaced by a word of the inner code of its position.
#include "recheck/replay.hpp"
#include "recheck/word.hpp"

namespace assize::recheck {
namespace {

/// The coordinates over GF(q) of every element of GF(Q), `width` symbols each.
struct Coordinates {
  std::size_t width = 0;
  std::vector<Symbol> all;
  std::vector<Symbol> basis;
  [[nodiscard]] std::span<const Symbol> of(Symbol element) const {
    return {all.data() + std::size_t{element} * width, width};
  }
};

Coordinates base_digits(const Field& outer, std::uint32_t q, std::size_t width) {
  Coordinates result{width, std::vector<Symbol>(outer.order() * width), {}};
  std::uint32_t weight = 1;
  for (std::size_t j = 0; j < width; ++j, weight *= q) {
    result.basis.push_back(static_cast<Symbol>(weight));
    for (std::uint32_t a = 0; a < outer.order(); ++a) result.all[a * width + j] = static_cast<Symbol>(a / weight % q);
  }
  return result;
}

/// The images in GF(Q) of all elements of GF(q) when x goes to `embedding`; fails unless that is a root of the modulus.
Result<std::vector<Symbol>> embed(const Field& outer, const Field& inner, Symbol embedding, const std::string& where) {
  const std::vector<Symbol>& modulus = inner.modulus();
  const std::uint32_t p = inner.characteristic();
  Symbol at_embedding = 0;
  for (std::size_t i = 0; i < modulus.size(); ++i)
    at_embedding = outer.add(at_embedding, outer.multiply(modulus[i], outer.power(embedding, i)));
  if (at_embedding != 0) return Failure{where, "the element is not a root of the inner field's modulus", ""};
  std::vector<Symbol> images;
  for (std::uint32_t a = 0; a < inner.order(); ++a) {
    Symbol image = 0;
    std::uint32_t rest = a;
    for (std::uint32_t i = 0; i < inner.degree(); ++i, rest /= p)
      image = outer.add(image, outer.multiply(static_cast<Symbol>(rest % p), outer.power(embedding, i)));
    images.push_back(image);
  }
  return images;
}

Result<Coordinates> over_basis(const Field& outer, const std::vector<Symbol>& images, std::vector<Symbol> basis,
                               const std::string& where) {
  const std::size_t width = basis.size();
  Coordinates result{width, std::vector<Symbol>(outer.order() * width), std::move(basis)};
  std::vector<bool> hit(outer.order(), false);
  for (std::uint32_t number = 0; number < outer.order(); ++number) {  // its base-q digits are the coordinates
    Symbol element = 0;
    std::uint32_t rest = number;
    const auto q = static_cast<std::uint32_t>(images.size());
    for (std::size_t j = 0; j < width; ++j, rest /= q)
      element = outer.add(element, outer.multiply(images[rest % q], result.basis[j]));
    if (hit[element]) return Failure{where, "the elements are not a basis over the inner field", ""};
    hit[element] = true;
    rest = number;
    for (std::size_t j = 0; j < width; ++j, rest /= q) result.all[element * width + j] = static_cast<Symbol>(rest % q);
  }
  return result;
}

Result<Coordinates> read_coordinates(Keys& code, const Field& outer, const Field& inner, std::size_t width) {
  if (inner.degree() == 1) {
    if (auto end = code.end(); !end) return end.error();
    return base_digits(outer, inner.order(), width);
  }
  const std::string embedding_text = code.text("embedding");
  const std::string basis_text = code.text("symbol_basis");
  if (auto end = code.end(); !end) return end.error();
  const auto embedding = read_element(embedding_text, outer.order(), code.at("embedding"));
  if (!embedding) return embedding.error();
  auto basis = read_word(basis_text, outer.order(), code.at("symbol_basis"));
  if (!basis) return basis.error();
  if (basis->size() != width)
    return Failure{code.at("symbol_basis"), "there must be one element for each inner dimension", ""};
  const auto images = embed(outer, inner, *embedding, code.at("embedding"));
  if (!images) return images.error();
  return over_basis(outer, *images, std::move(*basis), code.at("symbol_basis"));
}

/// One inner generator for all outer positions or one for each.
struct Inner {
  std::vector<Matrix> generators;
  std::uint64_t length = 0;  ///< over all outer positions
  [[nodiscard]] const Matrix& at(std::size_t position) const {
    return generators.size() == 1 ? generators[0] : generators[position];
  }
};

/// The generator of an inner code: as written, or reduced.
Result<Matrix> replay_inner(const Json& json, const std::string& path, const Field& field, std::uint64_t words,
                            const std::string& whole, const Brake& brake) {
  auto inner = replay_description(json, path, brake);
  if (!inner) return inner.error();
  if (!inner->field->same_as(field))
    return Failure{whole, "the field of the description is not the field of the inner code's words", ""};
  Matrix& generator = inner->as_written ? *inner->as_written : inner->reduced.generator;
  if (generator.rows != inner->reduced.pivots.size())
    return Failure{path, "the rows of the inner generator matrix are dependent", ""};
  const auto symbols = power_if_fits(field.order(), generator.rows);
  if (!symbols || *symbols != words)
    return Failure{whole, "the outer field does not have as many elements as the inner code has words", ""};
  return std::move(generator);
}

Result<Inner> replay_inner_by_position(const Json::Array& list, const std::string& path, const Field& field,
                                       const Replayed& outer, const Brake& brake) {
  if (list.size() != outer.reduced.generator.columns)
    return Failure{path, "there must be one inner code for each outer position", ""};
  Inner inner;
  for (std::size_t i = 0; i < list.size(); ++i) {
    const std::string at = path + "[" + std::to_string(i) + "]";
    auto generator = replay_inner(list[i], at, field, outer.field->order(), at, brake);
    if (!generator) return generator.error();
    inner.length += generator->columns;
    if (auto fits = matrix_fits(generator->rows, inner.length, path); !fits) return fits.error();
    inner.generators.push_back(std::move(*generator));
  }
  return inner;
}

Matrix expand(const Reduced& outer, const Field& outer_field, const Inner& inner, const Field& inner_field,
              const Coordinates& coordinates, const Brake& brake) {
  const Matrix& g = outer.generator;
  Matrix rows(g.rows * coordinates.width, inner.length);
  for (std::size_t r = 0; r < g.rows; ++r) {
    brake.poll();
    for (std::size_t j = 0; j < coordinates.width; ++j) {
      std::size_t start = 0;
      for (std::size_t i = 0; i < g.columns; ++i) {
        const Matrix& generator = inner.at(i);
        const auto digits = coordinates.of(outer_field.multiply(coordinates.basis[j], g.row(r)[i]));
        const auto target = rows.row(r * coordinates.width + j).subspan(start, generator.columns);
        for (std::size_t d = 0; d < generator.rows; ++d) add_multiple(inner_field, target, digits[d], generator.row(d));
        start += generator.columns;
      }
    }
  }
  return rows;
}

}  // namespace

Result<Built> build_concatenated(Keys& code, const FieldPtr& field, const Brake& brake) {
  const Json& outer_json = code.object("outer");
  const bool by_position = code.next_is("inner_by_position");
  const Json::Array no_list;
  const Json::Array& list = by_position ? code.array("inner_by_position") : no_list;
  const Json* one_for_all = by_position ? nullptr : &code.object("inner");
  if (!code.ok()) return code.failure();
  auto outer = replay_description(outer_json, code.at("outer"), brake);
  if (!outer) return outer.error();
  const Matrix& g = outer->reduced.generator;
  Inner inner;
  if (by_position) {
    auto read = replay_inner_by_position(list, code.at("inner_by_position"), *field, *outer, brake);
    if (!read) return read.error();
    inner = std::move(*read);
  } else {
    auto read = replay_inner(*one_for_all, code.at("inner"), *field, outer->field->order(), code.path(), brake);
    if (!read) return read.error();
    inner.length = std::uint64_t{g.columns} * read->columns;
    inner.generators.push_back(std::move(*read));
  }
  const std::size_t width = inner.generators[0].rows;
  const auto coordinates = read_coordinates(code, *outer->field, *field, width);
  if (!coordinates) return coordinates.error();
  if (auto fits = matrix_fits(std::uint64_t{g.rows} * width, inner.length, code.path()); !fits) return fits.error();
  Built built{field, expand(outer->reduced, *outer->field, inner, *field, *coordinates, brake), Parts{}};
  built.parts->outer_is_reed_solomon = outer->family == "reed-solomon" && !outer->has_steps;
  built.parts->inner = std::move(inner.generators);
  built.parts->inner_field = field;
  built.parts->outer_field = outer->field;
  built.parts->outer = std::move(outer->reduced);
  return built;
}

}  // namespace assize::recheck
