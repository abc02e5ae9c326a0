// Steps that take words away or add some: expurgate, augment, subfield-subcode.
#include <algorithm>

#include "recheck/replay.hpp"

namespace assize::recheck {
namespace {

Symbol sum_of(const Field& field, std::span<const Symbol> word) {
  Symbol sum = 0;
  for (const Symbol symbol : word) sum = field.add(sum, symbol);
  return sum;
}

/// One row whose sum is not zero mends the others and goes.
Matrix expurgate(const Field& field, Matrix rows) {
  std::size_t kept = 0;
  std::optional<std::size_t> mender;
  Symbol scale = 0;
  for (std::size_t r = 0; r < rows.rows; ++r) {
    const Symbol sum = sum_of(field, rows.row(r));
    if (sum != 0 && !mender) {
      mender = r;
      scale = field.negate(field.inverse(sum));
      continue;
    }
    if (sum != 0) add_multiple(field, rows.row(r), field.multiply(sum, scale), rows.row(*mender));
  }
  for (std::size_t r = 0; r < rows.rows; ++r) {
    if (r == mender) continue;
    if (kept != r) std::copy(rows.row(r).begin(), rows.row(r).end(), rows.row(kept).begin());
    ++kept;
  }
  rows.rows = kept;
  rows.symbols.resize(kept * rows.columns);
  return rows;
}

Result<Built> augment(const FieldPtr& field, const Matrix& g, const std::string& path) {
  // The only word with a one at every pivot is the sum of the rows of the reduced generator.
  std::vector<Symbol> sum(g.columns, 0);
  for (std::size_t r = 0; r < g.rows; ++r) add_multiple(*field, sum, 1, g.row(r));
  if (std::all_of(sum.begin(), sum.end(), [](Symbol symbol) { return symbol == 1; })) return Built{field, g, {}};
  if (auto fits = matrix_fits(g.rows + 1, g.columns, path); !fits) return fits.error();
  Matrix rows = g;
  rows.symbols.resize(rows.symbols.size() + rows.columns, 1);
  ++rows.rows;
  return Built{field, std::move(rows), {}};
}

/// GF(r) in GF(q): the image of every element of GF(r), and for every element of GF(q) its coordinates over GF(r) with
/// respect to 1, x, x^2, ..., the first of which is 0.
struct Subfield {
  std::size_t width = 0;
  std::vector<Symbol> image;
  std::vector<Symbol> coordinates;
  [[nodiscard]] Symbol coordinate(Symbol element, std::size_t j) const { return coordinates[element * width + j]; }
};

/// The least root of the modulus of `small` in `field`; every modulus of a subfield has one.
std::optional<Symbol> least_root(const Field& field, const std::vector<Symbol>& modulus) {
  for (std::uint32_t a = 0; a < field.order(); ++a) {
    Symbol value = 0;
    for (std::size_t i = modulus.size(); i-- > 0;)
      value = field.add(field.multiply(value, static_cast<Symbol>(a)), modulus[i]);
    if (value == 0) return static_cast<Symbol>(a);
  }
  return std::nullopt;
}

Result<Subfield> find_subfield(const Field& field, const Field& small, const std::string& where) {
  const std::uint32_t p = field.characteristic();
  if (small.characteristic() != p || field.degree() % small.degree() != 0)
    return Failure{where, "the order of the code's field is not a power of the order of this one", ""};
  const auto root = small.degree() == 1 ? std::optional<Symbol>(0) : least_root(field, small.modulus());
  if (!root) return Failure{where, "the modulus has no root in the field of the code", ""};
  Subfield result;
  result.width = field.degree() / small.degree();
  for (std::uint32_t a = 0; a < small.order(); ++a) {
    Symbol image = 0;
    std::uint32_t rest = a;
    for (std::uint32_t i = 0; i < small.degree(); ++i, rest /= p)
      image = field.add(image, field.multiply(static_cast<Symbol>(rest % p), field.power(*root, i)));
    result.image.push_back(image);
  }
  result.coordinates.resize(std::size_t{field.order()} * result.width);
  for (std::uint32_t number = 0; number < field.order(); ++number) {  // its base-r digits are the coordinates
    Symbol element = 0;
    std::uint32_t rest = number;
    for (std::size_t j = 0; j < result.width; ++j, rest /= small.order())
      element = field.add(element, field.multiply(result.image[rest % small.order()], field.power(Symbol(p), j)));
    rest = number;
    for (std::size_t j = 0; j < result.width; ++j, rest /= small.order())
      result.coordinates[element * result.width + j] = static_cast<Symbol>(rest % small.order());
  }
  return result;
}

/// A word over GF(r) has symbols of GF(r) at the pivots, so it is a combination over GF(r) of the rows.  Each further
/// coordinate at each position is one linear condition, which one row that violates it mends for all the others.
Matrix subcode(const Field& field, const Field& small, const Subfield& subfield, Matrix rows, const Brake& brake) {
  std::vector<std::size_t> alive(rows.rows);
  for (std::size_t r = 0; r < rows.rows; ++r) alive[r] = r;
  for (std::size_t column = 0; column < rows.columns; ++column)
    for (std::size_t j = 1; j < subfield.width; ++j) {
      const auto digit = [&](std::size_t r) { return subfield.coordinate(rows.row(r)[column], j); };
      const auto violating = std::find_if(alive.begin(), alive.end(), [&](std::size_t r) { return digit(r) != 0; });
      if (violating == alive.end()) continue;
      brake.poll();
      const std::size_t mender = *violating;
      alive.erase(violating);
      const Symbol scale = small.negate(small.inverse(digit(mender)));
      for (const std::size_t r : alive)
        if (const Symbol wrong = digit(r); wrong != 0)
          add_multiple(field, rows.row(r), subfield.image[small.multiply(wrong, scale)], rows.row(mender));
    }
  Matrix result(alive.size(), rows.columns);
  for (std::size_t i = 0; i < alive.size(); ++i)
    for (std::size_t c = 0; c < rows.columns; ++c) result.row(i)[c] = subfield.coordinate(rows.row(alive[i])[c], 0);
  return result;
}

Result<Built> subfield_subcode(Keys& keys, const FieldPtr& field, const Matrix& g, const Brake& brake) {
  const Json& field_json = keys.object("field");
  if (auto end = keys.end(); !end) return end.error();
  const auto small = read_field(field_json, keys.at("field"));
  if (!small) return small.error();
  const auto subfield = find_subfield(*field, **small, keys.at("field"));
  if (!subfield) return subfield.error();
  return Built{*small, subcode(*field, **small, *subfield, g, brake), {}};
}

}  // namespace

Result<Built> step_to_other_words(Keys& keys, const std::string& kind, const FieldPtr& field, const Reduced& code,
                                  const Brake& brake) {
  if (kind == "subfield-subcode") return subfield_subcode(keys, field, code.generator, brake);
  if (auto end = keys.end(); !end) return end.error();
  if (kind == "augment") return augment(field, code.generator, keys.path());
  return Built{field, expurgate(*field, code.generator), {}};
}

}  // namespace assize::recheck
