// CSV: symbols between commas or between semicolons, one kind in a file.
//
// Spreadsheets like to add a header line and quotation marks; neither is skipped, because what is not an element may
// as well be a damaged row.
#include "sheet/matrix_readers.hpp"
#include "sheet/row_collector.hpp"

namespace assize::sheet {

namespace {

bool has_letter(std::string_view text) noexcept {
  for (const char c : text)
    if ((c >= 'a' && c <= 'z') || (c >= 'A' && c <= 'Z')) return true;
  return false;
}

std::string cure_of(std::string_view symbol, bool first_row, const std::string& cure) {
  if (first_row && has_letter(symbol)) return "if this is a header line, delete it; " + cure;
  if (symbol.empty()) return "write a symbol between any two separators, and no separator at the end of a line";
  if (symbol.find('"') != std::string_view::npos || symbol.find('\'') != std::string_view::npos)
    return "leave quotation marks out";
  if (symbol.find_first_of(" \t") != std::string_view::npos || symbol.find_first_not_of("01") == std::string_view::npos)
    return cure + "; if symbols are not separated by commas, name the format in the sheet: layout = \"text\"";
  return cure;
}

Result<Elements> read_row(const Line& line, char separator, const MatrixSource& source, const RowCollector& rows) {
  const char other = separator == ',' ? ';' : ',';
  if (line.text.find(other) != std::string_view::npos)
    return source.at_line(line.number, "commas and semicolons are mixed", "separate symbols by one of them");
  Elements row;
  std::string_view rest = line.text;
  while (true) {
    const std::size_t end = rest.find(separator);
    const std::string_view symbol = trimmed(rest.substr(0, end));
    if (row.size() == largest_length)
      return source.at_line(line.number, "the row has more than " + std::to_string(largest_length) + " symbols",
                            size_cure());
    auto element = parse_symbol(symbol, source.field);
    if (!element) {
      Failure failure = element.error();
      if (symbol.empty()) failure.what = "there is no symbol";
      failure.cure = cure_of(symbol, rows.next_number() == 1, failure.cure);
      return rows.bad_symbol(row.size() + 1, line.number, failure);
    }
    row.push_back(*element);
    if (end == std::string_view::npos) return row;
    rest.remove_prefix(end + 1);
  }
}

}  // namespace

Result<FileMatrix> read_csv_matrix(const MatrixSource& source) {
  if (const auto fine = check_text(source); !fine) return fine.error();
  RowCollector rows(source);
  LineCursor lines(source.bytes);
  std::optional<char> separator;
  while (const auto line = lines.next_filled('#')) {
    if (!separator) {
      const std::size_t found = line->text.find_first_of(",;");
      separator = found == std::string_view::npos ? ',' : line->text[found];
    }
    const auto row = read_row(*line, *separator, source, rows);
    if (!row) return row.error();
    if (const auto added = rows.add(*row, line->number); !added) return added.error();
  }
  return std::move(rows).finish();
}

}  // namespace assize::sheet
