// Text: one row a line.  Over GF(2) a line may be bits without separators; bits in groups are refused, since a group
// is more often a number in another notation.
#include "sheet/matrix_readers.hpp"
#include "sheet/row_collector.hpp"

namespace assize::sheet {

namespace {

/// "0110" over GF(2): the only piece of its line.
Result<Elements> read_bits(std::string_view bits, int line, const RowCollector& rows) {
  Elements row;
  row.reserve(bits.size());
  for (const char bit : bits) {
    if (bit != '0' && bit != '1')
      return rows.bad_symbol(row.size() + 1, line,
                             {"", in_quotes(std::string_view(&bit, 1)) + " is not an element of GF(2)",
                              "write 0 and 1, or state another [field] in the sheet"});
    row.push_back(bit == '1' ? 1 : 0);
  }
  return row;
}

std::string cure_of(std::string_view piece, const field::Field& field, const std::string& cure) {
  if (piece.find('#') != std::string_view::npos) return "put a comment on a line of its own";
  if (piece.find_first_of(",;") != std::string_view::npos)
    return "separate symbols by blanks, or name the format in the sheet: layout = \"csv\"";
  if (field.order() == 2 && piece.size() > 1 && piece.find_first_not_of("01") == std::string_view::npos)
    return "separate all bits of the row by blanks, or none";
  if (piece.size() > 1 && piece.find_first_not_of("0123456789") == std::string_view::npos)
    return cure + "; symbols are separated by blanks";
  return cure;
}

Result<Elements> read_row(const Line& line, const MatrixSource& source, const RowCollector& rows) {
  const std::string_view text = trimmed(line.text);
  const auto pieces = split_at_blanks(text, largest_length);
  const bool bits = source.field.order() == 2 && pieces.size() == 1;
  if (pieces.size() > largest_length || (bits && text.size() > largest_length))
    return source.at_line(line.number, "the row has more than " + std::to_string(largest_length) + " symbols",
                          size_cure());
  if (bits && text.size() > 1 && text.find_first_not_of("0123456789") == std::string_view::npos)
    return read_bits(text, line.number, rows);
  Elements row;
  row.reserve(pieces.size());
  for (const std::string_view piece : pieces) {
    const auto element = parse_symbol(piece, source.field);
    if (!element) {
      Failure failure = element.error();
      failure.cure = cure_of(piece, source.field, failure.cure);
      return rows.bad_symbol(row.size() + 1, line.number, failure);
    }
    row.push_back(*element);
  }
  return row;
}

}  // namespace

Result<FileMatrix> read_text_matrix(const MatrixSource& source) {
  if (const auto fine = check_text(source); !fine) return fine.error();
  RowCollector rows(source);
  LineCursor lines(source.bytes);
  while (const auto line = lines.next_filled('#')) {
    const auto row = read_row(*line, source, rows);
    if (!row) return row.error();
    if (const auto added = rows.add(*row, line->number); !added) return added.error();
  }
  return std::move(rows).finish();
}

}  // namespace assize::sheet
