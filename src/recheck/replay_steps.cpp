// The steps of `then`: reads which one it is; a parity symbol, the dual code, the binary image.
#include "recheck/replay.hpp"
#include "recheck/word.hpp"

namespace assize::recheck {
namespace {

Result<Built> extend(const FieldPtr& field, const Matrix& g, const std::string& path) {
  if (auto fits = matrix_fits(g.rows, g.columns + 1, path); !fits) return fits.error();
  Matrix rows(g.rows, g.columns + 1);
  for (std::size_t r = 0; r < g.rows; ++r) {
    Symbol sum = 0;
    for (std::size_t c = 0; c < g.columns; ++c) {
      rows.row(r)[c] = g.row(r)[c];
      sum = field->add(sum, g.row(r)[c]);
    }
    rows.row(r)[g.columns] = field->negate(sum);
  }
  return Built{field, std::move(rows), {}};
}

/// The coordinates of every element over the basis, as bits of a number; fails unless it is a basis.
Result<std::vector<std::uint32_t>> coordinates(const Field& field, const std::vector<Symbol>& basis,
                                               const std::string& where) {
  std::vector<std::uint32_t> result(field.order());
  std::vector<bool> hit(field.order(), false);
  for (std::uint32_t set = 0; set < field.order(); ++set) {
    Symbol element = 0;
    for (std::size_t t = 0; t < basis.size(); ++t)
      if ((set >> t & 1) != 0) element = field.add(element, basis[t]);
    if (hit[element]) return Failure{where, "the elements are not a basis over GF(2)", ""};
    hit[element] = true;
    result[element] = set;
  }
  return result;
}

Result<Built> binary_image(Keys& keys, const FieldPtr& field, const Matrix& g) {
  const std::string text = keys.text("basis");
  if (auto end = keys.end(); !end) return end.error();
  const std::size_t m = field->degree();
  if (field->characteristic() != 2) return Failure{keys.path(), "only a field of order 2^m has a binary image", ""};
  const auto basis = read_word(text, field->order(), keys.at("basis"));
  if (!basis) return basis.error();
  if (basis->size() != m) return Failure{keys.at("basis"), "a basis has " + std::to_string(m) + " elements", ""};
  const auto bits = coordinates(*field, *basis, keys.at("basis"));
  if (!bits) return bits.error();
  if (auto fits = matrix_fits(g.rows * m, g.columns * m, keys.path()); !fits) return fits.error();
  Matrix rows(g.rows * m, g.columns * m);
  for (std::size_t r = 0; r < g.rows; ++r)
    for (std::size_t j = 0; j < m; ++j)
      for (std::size_t c = 0; c < g.columns; ++c) {
        const std::uint32_t set = (*bits)[field->multiply((*basis)[j], g.row(r)[c])];
        for (std::size_t t = 0; t < m; ++t) rows.row(r * m + j)[c * m + t] = static_cast<Symbol>(set >> t & 1);
      }
  auto binary = Field::make(2, {}, keys.path());
  if (!binary) return binary.error();
  return Built{*binary, std::move(rows), {}};
}

}  // namespace

Result<Built> apply_step(const Json& step, const std::string& path, const FieldPtr& field, const Reduced& code,
                         const Brake& brake) {
  Keys keys(step, path);
  const std::string kind = keys.text("step");
  if (!keys.ok()) return keys.failure();
  if (kind == "binary-image") return binary_image(keys, field, code.generator);
  if (kind == "puncture" || kind == "shorten" || kind == "permute" || kind == "repeat")
    return step_on_positions(keys, kind, field, code, brake);
  if (kind == "expurgate" || kind == "augment" || kind == "subfield-subcode")
    return step_to_other_words(keys, kind, field, code, brake);
  if (kind != "extend" && kind != "dual") return Failure{keys.at("step"), "the step \"" + kind + "\" is unknown", ""};
  if (auto end = keys.end(); !end) return end.error();
  if (kind == "extend") return extend(field, code.generator, path);
  const Matrix& g = code.generator;
  if (auto fits = matrix_fits(g.columns - g.rows, g.columns, path); !fits) return fits.error();
  return Built{field, null_space(*field, code), {}};
}

}  // namespace assize::recheck
