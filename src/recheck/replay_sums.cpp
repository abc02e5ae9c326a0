// Codes made of two codes over one field: product, direct sum, and Plotkin's (u, u + v).
#include <algorithm>

#include "recheck/replay.hpp"

namespace assize::recheck {
namespace {

Matrix product(const Field& field, const Matrix& a, const Matrix& b) {
  Matrix rows(a.rows * b.rows, a.columns * b.columns);
  for (std::size_t r = 0; r < a.rows; ++r)
    for (std::size_t s = 0; s < b.rows; ++s)
      for (std::size_t i = 0; i < a.columns; ++i)
        add_multiple(field, rows.row(r * b.rows + s).subspan(i * b.columns, b.columns), a.row(r)[i], b.row(s));
  return rows;
}

/// (u, v) or, with `repeated`, (u, u + v).
Matrix sum(const Matrix& a, const Matrix& b, bool repeated) {
  Matrix rows(a.rows + b.rows, a.columns + b.columns);
  for (std::size_t r = 0; r < a.rows; ++r) {
    std::copy(a.row(r).begin(), a.row(r).end(), rows.row(r).begin());
    if (repeated) std::copy(a.row(r).begin(), a.row(r).end(), rows.row(r).subspan(a.columns).begin());
  }
  for (std::size_t r = 0; r < b.rows; ++r)
    std::copy(b.row(r).begin(), b.row(r).end(), rows.row(a.rows + r).subspan(a.columns).begin());
  return rows;
}

}  // namespace

Result<Built> build_of_two(Keys& code, const std::string& family, const FieldPtr& field, const Brake& brake) {
  const Json& first_json = code.object("first");
  const Json& second_json = code.object("second");
  if (auto end = code.end(); !end) return end.error();
  const auto first = replay_description(first_json, code.at("first"), brake);
  if (!first) return first.error();
  const auto second = replay_description(second_json, code.at("second"), brake);
  if (!second) return second.error();
  for (const auto* part : {&first, &second})
    if (!(*part)->field->same_as(*field))
      return Failure{code.at(part == &first ? "first" : "second"), "the code is not over the field of the description",
                     ""};
  const Matrix& a = first->reduced.generator;
  const Matrix& b = second->reduced.generator;
  if (family == "product") {
    if (auto fits = matrix_fits(a.rows * b.rows, a.columns * b.columns, code.path()); !fits) return fits.error();
    return Built{field, product(*field, a, b), {}};
  }
  const bool plotkin = family == "plotkin-sum";
  if (plotkin && a.columns != b.columns) return Failure{code.path(), "the two codes differ in length", ""};
  if (auto fits = matrix_fits(a.rows + b.rows, a.columns + b.columns, code.path()); !fits) return fits.error();
  return Built{field, sum(a, b, plotkin), {}};
}

}  // namespace assize::recheck
