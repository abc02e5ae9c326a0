// Justesen codes (J. Justesen, IEEE Trans. Inf. Theory 18, 1972): a Reed-Solomon word whose position i with symbol b
// becomes the pair (b, g^(i+e) b).
#include "recheck/replay.hpp"
#include "recheck/word.hpp"

namespace assize::recheck {
namespace {

struct Shape {
  const Field& outer;
  bool bits;
  [[nodiscard]] std::size_t half() const { return bits ? outer.degree() : 1; }

  /// Writes the pair of position factor `multiplier` and symbol b.
  void write(std::span<Symbol> pair, Symbol b, Symbol multiplier) const {
    const Symbol partner = outer.multiply(multiplier, b);
    if (!bits) {
      pair[0] = b;
      pair[1] = partner;
      return;
    }
    for (std::size_t t = 0; t < half(); ++t) {
      pair[t] = static_cast<Symbol>(b >> t & 1);
      pair[half() + t] = static_cast<Symbol>(partner >> t & 1);
    }
  }
};

Matrix expand(const Shape& shape, const Matrix& outer, const std::vector<Symbol>& factors, const Brake& brake) {
  const std::size_t half = shape.half();
  Matrix rows(outer.rows * half, outer.columns * 2 * half);
  for (std::size_t r = 0; r < outer.rows; ++r) {
    brake.poll();
    for (std::size_t t = 0; t < half; ++t)  // times x^t, so that all binary combinations are spanned
      for (std::size_t i = 0; i < outer.columns; ++i)
        shape.write(rows.row(r * half + t).subspan(i * 2 * half, 2 * half),
                    shape.outer.multiply(outer.row(r)[i], static_cast<Symbol>(1U << t)), factors[i]);
  }
  return rows;
}

}  // namespace

Result<Built> build_justesen(Keys& code, const FieldPtr& field, const Brake& brake) {
  const std::uint64_t length = code.integer("outer_length", 1, field->order());
  const std::uint64_t dimension = code.integer("outer_dimension", 1, length);
  const std::string points_text = code.text("evaluation_points");
  const std::string element_text = code.text("primitive_element");
  const std::uint64_t first = code.integer("first_exponent");
  const std::string image = code.text("image");
  if (auto end = code.end(); !end) return end.error();
  if (field->characteristic() != 2) return Failure{code.path(), "a Justesen code has a field of order 2^m", ""};
  if (image != "bits" && image != "symbols") return Failure{code.at("image"), "the image is bits or symbols", ""};
  const auto points = read_word(points_text, field->order(), code.at("evaluation_points"));
  if (!points) return points.error();
  if (points->size() != length)
    return Failure{code.at("evaluation_points"), "there must be one point for each position", ""};
  std::vector<bool> seen(field->order(), false);
  for (const Symbol point : *points) {
    if (seen[point]) return Failure{code.at("evaluation_points"), "the points are not distinct", ""};
    seen[point] = true;
  }
  const auto element = read_element(element_text, field->order(), code.at("primitive_element"));
  if (!element) return element.error();
  if (!field->is_primitive(*element)) return Failure{code.at("primitive_element"), "the element is not primitive", ""};

  const Shape shape{*field, image == "bits"};
  const std::size_t half = shape.half();
  if (auto fits = matrix_fits(dimension * half, length * 2 * half, code.path()); !fits) return fits.error();
  std::vector<Symbol> factors;
  for (std::uint64_t i = 0; i < length; ++i)
    factors.push_back(field->power(*element, first % (field->order() - 1) + i));
  Parts parts;
  parts.outer_field = field;
  parts.outer_is_reed_solomon = true;
  Matrix outer = powers_of_points(*field, *points, dimension);
  Built built{field, expand(shape, outer, factors, brake), {}};
  if (shape.bits && field->order() != 2) {
    const auto binary = Field::make(2, {}, code.path());
    if (!binary) return binary.error();
    built.field = *binary;
  }
  parts.inner_field = built.field;
  for (const Symbol factor : factors) {
    Matrix pairs(half, 2 * half);
    for (std::size_t t = 0; t < half; ++t) shape.write(pairs.row(t), static_cast<Symbol>(1U << t), factor);
    parts.inner.push_back(std::move(pairs));
  }
  parts.outer = reduce(*field, std::move(outer), brake);
  built.parts = std::move(parts);
  return built;
}

}  // namespace assize::recheck
