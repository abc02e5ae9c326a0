// Matrix Market exchange format (Boisvert, Pozo, Remington, NISTIR 5935, 1996): the kinds that can hold field elements.
//
// Symmetric kinds store half of the entries and real kinds store fractions; both are refused rather than guessed at.
#include <algorithm>
#include <tuple>

#include "base/integers.hpp"
#include "sheet/matrix_readers.hpp"

namespace assize::sheet {

namespace {

struct Banner {
  bool coordinate = true;
  bool pattern = false;
};

struct Entry {
  std::uint32_t row;
  std::uint32_t column;
  Element value;
  int line;
};

std::string lower(std::string_view text) {
  std::string out(text);
  for (char& c : out)
    if (c >= 'A' && c <= 'Z') c = static_cast<char>(c - 'A' + 'a');
  return out;
}

Result<Banner> read_banner(const MatrixSource& source, const std::optional<Line>& line) {
  const std::string example = "write, for example: %%MatrixMarket matrix coordinate integer general";
  std::vector<std::string> words;
  if (line)
    for (const std::string_view word : split_at_blanks(line->text, 6)) words.push_back(lower(word));
  if (words.empty() || words.front() != "%%matrixmarket")
    return source.at_line(1, "the first line does not begin with %%MatrixMarket", example);
  if (words.size() != 5 || words[1] != "matrix")
    return source.at_line(1, "the first line is not the five words of a matrix", example);
  if (words[2] != "coordinate" && words[2] != "array")
    return source.at_line(1, in_quotes(words[2]) + " is neither coordinate nor array", example);
  if (words[3] == "real" || words[3] == "double" || words[3] == "complex")
    return source.at_line(1, "the entries are " + words[3] + " numbers, not elements of a field",
                          "write the entries as integers and the word integer in the first line");
  if (words[3] != "integer" && words[3] != "pattern")
    return source.at_line(1, in_quotes(words[3]) + " is neither integer nor pattern", example);
  if (words[4] != "general")
    return source.at_line(1, in_quotes(words[4]) + " matrices store only a part of their entries",
                          "write out all entries and the word general in the first line");
  if (words[2] == "array" && words[3] == "pattern")
    return source.at_line(1, "an array has no pattern: it lists every entry", "write array integer, or coordinate");
  return Banner{words[2] == "coordinate", words[3] == "pattern"};
}

/// `count` numbers of a line, each up to 2^53.
Result<std::vector<std::uint64_t>> read_sizes(const MatrixSource& source, const std::optional<Line>& line,
                                              std::size_t count, const std::string& meaning) {
  if (!line) return Failure{source.name, "the file ends before the line with " + meaning, "write " + meaning};
  std::vector<std::uint64_t> numbers;
  for (const std::string_view piece : split_at_blanks(line->text, count)) {
    const auto number = parse_decimal(piece, 1ULL << 53);
    if (!number) return source.at_line(line->number, in_quotes(piece) + " is not a number", "write " + meaning);
    numbers.push_back(*number);
  }
  if (numbers.size() != count)
    return source.at_line(line->number, "this line does not hold " + std::to_string(count) + " numbers",
                          "write " + meaning);
  if (const auto objection = size_objection(numbers[0], numbers[1]))
    return source.at_line(line->number, *objection, size_cure());
  return numbers;
}

/// Every entry takes at least `least_bytes`, so a count that the file cannot hold is refused before it costs memory.
Result<void> check_count(const MatrixSource& source, int line, std::uint64_t count, std::uint64_t least_bytes) {
  if (count <= source.bytes.size() / least_bytes) return {};
  return source.at_line(line, std::to_string(count) + " entries are stated, more than a file of this size can hold",
                        "check the numbers of this line, and that the file is complete");
}

Failure too_few(const MatrixSource& source, int line, std::uint64_t stated, std::uint64_t found) {
  return source.at_line(line, std::to_string(stated) + " entries are stated, " + std::to_string(found) + " follow",
                        "check that the file is complete");
}

Result<std::uint32_t> read_index(const MatrixSource& source, int line, std::string_view text, std::uint64_t size,
                                 const std::string& name) {
  const auto number = parse_decimal(text, size);
  if (!number || *number == 0)
    return source.at_line(line, in_quotes(text) + " is not the number of a " + name,
                          name + "s are numbered from 1 to " + std::to_string(size));
  return static_cast<std::uint32_t>(*number - 1);
}

Result<Entry> read_entry(const MatrixSource& source, const Line& line, bool pattern,
                         const std::vector<std::uint64_t>& sizes) {
  const auto pieces = split_at_blanks(line.text, 3);
  if (pieces.size() != (pattern ? 2U : 3U))
    return source.at_line(line.number, "this line is not an entry",
                          pattern ? "write: row column" : "write: row column value");
  const auto row = read_index(source, line.number, pieces[0], sizes[0], "row");
  if (!row) return row.error();
  const auto column = read_index(source, line.number, pieces[1], sizes[1], "column");
  if (!column) return column.error();
  if (pattern) return Entry{*row, *column, 1, line.number};
  const auto value = parse_element_number(pieces[2], source.field);
  if (!value) return source.at_line(line.number, value.error().what, value.error().cure);
  return Entry{*row, *column, *value, line.number};
}

Result<void> refuse_duplicates(const MatrixSource& source, std::vector<Entry>& entries) {
  std::ranges::sort(entries, {}, [](const Entry& e) { return std::tuple(e.row, e.column, e.line); });
  const Entry* repeated = nullptr;
  for (std::size_t i = 1; i < entries.size(); ++i)
    if (entries[i].row == entries[i - 1].row && entries[i].column == entries[i - 1].column &&
        (repeated == nullptr || entries[i].line < repeated->line))
      repeated = &entries[i];
  if (repeated == nullptr) return {};
  return source.at_line(repeated->line,
                        "row " + std::to_string(repeated->row + 1) + ", column " +
                            std::to_string(repeated->column + 1) + " is given a second time",
                        "give each entry once; entries are not added up");
}

Result<FileMatrix> read_coordinates(const MatrixSource& source, LineCursor& lines, bool pattern) {
  const auto size_line = lines.next_filled('%');
  const auto sizes = read_sizes(source, size_line, 3, "rows, columns and the number of entries");
  if (!sizes) return sizes.error();
  const std::uint64_t count = (*sizes)[2];
  if (const auto fits = check_count(source, size_line->number, count, 4); !fits) return fits.error();
  std::vector<Entry> entries;
  entries.reserve(count);
  while (const auto line = lines.next_filled('%')) {
    if (entries.size() == count)
      return source.at_line(line->number, "more than the stated " + std::to_string(count) + " entries follow",
                            "correct the number of entries in line " + std::to_string(size_line->number));
    const auto entry = read_entry(source, *line, pattern, *sizes);
    if (!entry) return entry.error();
    entries.push_back(*entry);
  }
  if (entries.size() != count) return too_few(source, size_line->number, count, entries.size());
  if (const auto single = refuse_duplicates(source, entries); !single) return single.error();
  FileMatrix out;
  out.matrix = field::Matrix((*sizes)[0], (*sizes)[1]);
  for (const Entry& entry : entries) out.matrix.at(entry.row, entry.column) = entry.value;
  notice_open_end(source, pattern ? (*sizes)[1] : source.field.order() - 1, out.notices);
  return out;
}

Result<FileMatrix> read_array(const MatrixSource& source, LineCursor& lines) {
  const auto size_line = lines.next_filled('%');
  const auto sizes = read_sizes(source, size_line, 2, "rows and columns");
  if (!sizes) return sizes.error();
  const std::size_t rows = (*sizes)[0];
  const std::size_t count = rows * (*sizes)[1];
  if (const auto fits = check_count(source, size_line->number, count, 2); !fits) return fits.error();
  FileMatrix out;
  out.matrix = field::Matrix(rows, (*sizes)[1]);
  std::size_t found = 0;
  while (const auto line = lines.next_filled('%')) {
    if (found == count)
      return source.at_line(line->number, "more than " + std::to_string(count) + " entries follow",
                            "correct the rows and columns in line " + std::to_string(size_line->number));
    const std::string_view text = trimmed(line->text);
    if (text.find_first_of(" \t") != std::string_view::npos)
      return source.at_line(line->number, "this line holds several entries",
                            "write one entry a line, column by column");
    const auto value = parse_element_number(text, source.field);
    if (!value) return source.at_line(line->number, value.error().what, value.error().cure);
    out.matrix.at(found % rows, found / rows) = *value;
    ++found;
  }
  if (found != count) return too_few(source, size_line->number, count, found);
  notice_open_end(source, source.field.order() - 1, out.notices);
  return out;
}

}  // namespace

Result<FileMatrix> read_matrix_market(const MatrixSource& source) {
  if (const auto fine = check_text(source); !fine) return fine.error();
  LineCursor lines(source.bytes);
  const auto banner = read_banner(source, lines.next());
  if (!banner) return banner.error();
  auto out = banner->coordinate ? read_coordinates(source, lines, banner->pattern) : read_array(source, lines);
  if (out) out->row_lines.assign(out->matrix.rows(), 0);
  return out;
}

}  // namespace assize::sheet
