// Codes written out as matrices: the span of the rows, or everything orthogonal to them.
#include "recheck/replay.hpp"
#include "recheck/word.hpp"

namespace assize::recheck {
namespace {

Result<Matrix> read_rows(Keys& code, const Field& field) {
  const Json::Array& rows = code.array("rows");
  if (auto end = code.end(); !end) return end.error();
  const std::string path = code.at("rows");
  if (rows.empty()) return Failure{path, "a matrix has at least one row", ""};
  Matrix matrix;
  for (std::size_t r = 0; r < rows.size(); ++r) {
    const std::string at = path + "[" + std::to_string(r) + "]";
    if (rows[r].text() == nullptr) return Failure{at, "a word (a string) is expected here", ""};
    const auto word = read_word(*rows[r].text(), field.order(), at);
    if (!word) return word.error();
    if (r == 0) {
      if (word->empty()) return Failure{at, "a row has at least one symbol", ""};
      if (auto fits = matrix_fits(rows.size(), word->size(), at); !fits) return fits.error();
      matrix = Matrix(rows.size(), word->size());
    }
    if (word->size() != matrix.columns) return Failure{at, "the rows differ in length", ""};
    std::copy(word->begin(), word->end(), matrix.row(r).begin());
  }
  return matrix;
}

}  // namespace

Result<Built> build_generator_matrix(Keys& code, const FieldPtr& field) {
  auto rows = read_rows(code, *field);
  if (!rows) return rows.error();
  return Built{field, std::move(*rows), {}};
}

Result<Built> build_parity_check_matrix(Keys& code, const FieldPtr& field, const Brake& brake) {
  auto rows = read_rows(code, *field);
  if (!rows) return rows.error();
  const Reduced checks = reduce(*field, std::move(*rows), brake);
  const Matrix& h = checks.generator;
  if (auto fits = matrix_fits(h.columns - h.rows, h.columns, code.path()); !fits) return fits.error();
  return Built{field, null_space(*field, checks), {}};
}

}  // namespace assize::recheck
