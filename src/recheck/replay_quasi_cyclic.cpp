// Quasi-cyclic codes: matrices made of circulants, as generators in three forms and as parity checks in one.
#include "base/integers.hpp"
#include "recheck/replay.hpp"
#include "recheck/word.hpp"

namespace assize::recheck {
namespace {

/// Reads the key `shift`; true means to the right.
bool read_shift(Keys& code) {
  const std::string shift = code.text("shift");
  if (code.ok() && shift != "right" && shift != "left") code.refuse("shift", "right or left is expected here");
  return shift == "right";
}

/// Writes the circulant of `first` with its top left corner at (top, left).
void write_circulant(Matrix& target, std::size_t top, std::size_t left, const std::vector<Symbol>& first, bool right) {
  const std::size_t m = first.size();
  for (std::size_t r = 0; r < m; ++r)
    for (std::size_t c = 0; c < m; ++c) target.row(top + r)[left + (right ? c + r : c + m - r) % m] = first[c];
}

Result<std::vector<Symbol>> read_first_row(const std::string& text, const Field& field, const std::string& where) {
  auto word = read_word(text, field.order(), where);
  if (word && word->empty()) return Failure{where, "a circulant has at least one symbol", ""};
  return word;
}

Result<Built> blocks(Keys& code, const FieldPtr& field) {
  const Json::Array& grid = code.array("first_rows");
  const bool right = read_shift(code);
  if (auto end = code.end(); !end) return end.error();
  if (grid.empty()) return Failure{code.at("first_rows"), "a grid has at least one row of circulants", ""};
  Matrix rows;
  std::size_t size = 0;
  std::size_t across = 0;
  for (std::size_t i = 0; i < grid.size(); ++i) {
    const std::string at_row = code.at("first_rows") + "[" + std::to_string(i) + "]";
    const Json::Array* line = grid[i].array();
    if (line == nullptr || line->empty()) return Failure{at_row, "a non-empty array of words is expected here", ""};
    if (i == 0) across = line->size();
    if (line->size() != across) return Failure{at_row, "the rows of the grid differ in length", ""};
    for (std::size_t j = 0; j < across; ++j) {
      const std::string at = at_row + "[" + std::to_string(j) + "]";
      if ((*line)[j].text() == nullptr) return Failure{at, "a word (a string) is expected here", ""};
      const auto first = read_first_row(*(*line)[j].text(), *field, at);
      if (!first) return first.error();
      if (i == 0 && j == 0) {
        size = first->size();
        if (auto fits = matrix_fits(grid.size() * size, across * size, code.path()); !fits) return fits.error();
        rows = Matrix(grid.size() * size, across * size);
      }
      if (first->size() != size) return Failure{at, "the circulants differ in size", ""};
      write_circulant(rows, i * size, j * size, *first, right);
    }
  }
  return Built{field, std::move(rows), {}};
}

Result<Built> twice(Keys& code, const FieldPtr& field) {
  const std::string text = code.text("first_row");
  const bool right = read_shift(code);
  if (auto end = code.end(); !end) return end.error();
  const auto first = read_first_row(text, *field, code.at("first_row"));
  if (!first) return first.error();
  const std::size_t m = first->size();
  if (auto fits = matrix_fits(m, 2 * m, code.path()); !fits) return fits.error();
  Matrix rows(m, 2 * m);
  for (std::size_t r = 0; r < m; ++r) rows.row(r)[r] = 1;
  write_circulant(rows, 0, m, *first, right);
  return Built{field, std::move(rows), {}};
}

Result<Built> bordered(Keys& code, const FieldPtr& field) {
  const std::string corner_text = code.text("corner");
  const std::string border_text = code.text("border");
  const std::string text = code.text("first_row");
  const bool right = read_shift(code);
  if (auto end = code.end(); !end) return end.error();
  const auto corner = read_element(corner_text, field->order(), code.at("corner"));
  if (!corner) return corner.error();
  const auto border = read_element(border_text, field->order(), code.at("border"));
  if (!border) return border.error();
  const auto first = read_first_row(text, *field, code.at("first_row"));
  if (!first) return first.error();
  const std::size_t half = first->size() + 1;
  if (auto fits = matrix_fits(half, 2 * half, code.path()); !fits) return fits.error();
  Matrix rows(half, 2 * half);
  for (std::size_t r = 0; r < half; ++r) {
    rows.row(r)[r] = 1;
    rows.row(r)[half] = *border;
    rows.row(0)[half + r] = *border;
  }
  rows.row(0)[half] = *corner;
  write_circulant(rows, 1, half + 1, *first, right);
  return Built{field, std::move(rows), {}};
}

/// The exponents of one row of blocks; nothing for a zero block.
Result<std::vector<std::optional<std::uint64_t>>> read_exponents(std::string_view text, std::uint64_t lifting,
                                                                 const std::string& where) {
  std::vector<std::optional<std::uint64_t>> exponents;
  while (true) {
    const std::size_t blank = text.find(' ');
    const std::string_view entry = text.substr(0, blank);
    const auto exponent = parse_decimal(entry, lifting - 1);
    if (!exponent && entry != "-")
      return Failure{where,
                     "entry " + std::to_string(exponents.size()) + " is neither - nor a number below the lifting, or " +
                         "the blanks are wrong",
                     ""};
    exponents.push_back(exponent ? std::optional<std::uint64_t>(*exponent) : std::nullopt);
    if (blank == std::string_view::npos) return exponents;
    text.remove_prefix(blank + 1);
  }
}

Result<Built> exponents(Keys& code, const FieldPtr& field, const Brake& brake) {
  const std::uint64_t lifting = code.integer("lifting", 1, max_length);
  const Json::Array& lines = code.array("shift_exponents");
  const bool right = read_shift(code);
  if (auto end = code.end(); !end) return end.error();
  if (lines.empty()) return Failure{code.at("shift_exponents"), "a matrix has at least one row of blocks", ""};
  Matrix checks;
  std::size_t across = 0;
  for (std::size_t i = 0; i < lines.size(); ++i) {
    const std::string at = code.at("shift_exponents") + "[" + std::to_string(i) + "]";
    if (lines[i].text() == nullptr) return Failure{at, "a string of exponents is expected here", ""};
    const auto line = read_exponents(*lines[i].text(), lifting, at);
    if (!line) return line.error();
    if (i == 0) {
      across = line->size();
      if (auto fits = matrix_fits(lines.size() * lifting, across * lifting, code.path()); !fits) return fits.error();
      checks = Matrix(lines.size() * lifting, across * lifting);
    }
    if (line->size() != across) return Failure{at, "the rows of blocks differ in length", ""};
    for (std::size_t j = 0; j < across; ++j)
      for (std::uint64_t r = 0; (*line)[j] && r < lifting; ++r)
        checks.row(i * lifting + r)[j * lifting + (r + (right ? *(*line)[j] : lifting - *(*line)[j])) % lifting] = 1;
  }
  const Reduced reduced = reduce(*field, std::move(checks), brake);
  const Matrix& h = reduced.generator;
  if (auto fits = matrix_fits(h.columns - h.rows, h.columns, code.path()); !fits) return fits.error();
  return Built{field, null_space(*field, reduced), {}};
}

}  // namespace

Result<Built> build_quasi_cyclic(Keys& code, const FieldPtr& field, const Brake& brake) {
  const std::string form = code.text("form");
  if (!code.ok()) return code.failure();
  if (form == "blocks") return blocks(code, field);
  if (form == "double") return twice(code, field);
  if (form == "bordered") return bordered(code, field);
  if (form == "exponents") return exponents(code, field, brake);
  return Failure{code.at("form"), "blocks, double, bordered or exponents is expected here", ""};
}

}  // namespace assize::recheck
