// The sparse parity-check list of the trade: where the nonzero entries are, by columns and once more by rows.
//
//   columns rows [q]            then the weights of the columns and of the rows, each in one line,
//   most-in-column most-in-row  then for each column its row numbers, for each row its column numbers,
// numbered from 1 and padded with 0 up to the maximum; with q each number is followed by the value.  There is no
// standard; files that miss the padding are read, files whose sizes stand the wrong way round are named as such.
#include <algorithm>

#include "base/integers.hpp"
#include "sheet/matrix_readers.hpp"
#include "sheet/sparse_half.hpp"

namespace assize::sheet {

namespace {

/// How the two pairs of numbers at the beginning are understood.
struct Orientation {
  bool sizes_swapped = false;
  bool maxima_swapped = false;
};

class ListReader {
 public:
  ListReader(const MatrixSource& source, Orientation orientation)
      : source_(source), orientation_(orientation), lines_(source.bytes) {}
  Result<FileMatrix> read();

 private:
  Result<std::vector<std::uint64_t>> numbers(std::size_t least, std::size_t most, const std::string& meaning);
  Result<void> read_sizes();
  Result<void> read_weights(SparseHalf& half);
  Result<void> read_lists(SparseHalf& half);
  Result<void> refuse_rest();
  Result<field::Matrix> cross_check();
  [[nodiscard]] std::vector<std::string> notices() const;

  const MatrixSource& source_;
  Orientation orientation_;
  LineCursor lines_;
  SparseHalf columns_{"column", "row"};
  SparseHalf rows_{"row", "column"};
};

Result<std::vector<std::uint64_t>> ListReader::numbers(std::size_t least, std::size_t most,
                                                       const std::string& meaning) {
  const auto line = lines_.next();
  if (!line)
    return source_.at_line(lines_.last_number(), "the file ends after this line, before " + meaning,
                           "check that the file is complete");
  std::vector<std::uint64_t> out;
  for (const std::string_view piece : split_at_blanks(line->text, most)) {
    const auto number = parse_decimal(piece, 1ULL << 32);
    if (!number) return source_.at_line(line->number, in_quotes(piece) + " is not a number", "write here " + meaning);
    out.push_back(*number);
  }
  if (out.size() < least || out.size() > most)
    return source_.at_line(line->number,
                           "this line holds " +
                               (out.size() > most ? "more than " + std::to_string(most) : std::to_string(out.size())) +
                               " numbers, expected are " + meaning,
                           "write here " + meaning);
  return out;
}

Result<void> ListReader::read_sizes() {
  auto sizes = numbers(2, 3, "the number of columns, the number of rows and, over other fields than GF(2), the order");
  if (!sizes) return sizes.error();
  if (orientation_.sizes_swapped) std::swap((*sizes)[0], (*sizes)[1]);
  if (const auto objection = size_objection((*sizes)[1], (*sizes)[0]))
    return source_.at_line(1, *objection, size_cure());
  columns_.valued = rows_.valued = sizes->size() == 3;
  if (rows_.valued && (*sizes)[2] != source_.field.order())
    return source_.at_line(1,
                           "the list is over GF(" + std::to_string((*sizes)[2]) + "), the sheet over GF(" +
                               std::to_string(source_.field.order()) + ")",
                           "state the field of the list in the table [field] of the sheet");
  columns_.lists = rows_.positions = (*sizes)[0];
  columns_.positions = rows_.lists = (*sizes)[1];
  auto maxima = numbers(2, 2, "the largest column weight and the largest row weight");
  if (!maxima) return maxima.error();
  if (orientation_.maxima_swapped) std::swap((*maxima)[0], (*maxima)[1]);
  columns_.most = (*maxima)[0];
  rows_.most = (*maxima)[1];
  for (const SparseHalf* half : {&columns_, &rows_})
    if (half->most > half->positions)
      return source_.at_line(2,
                             "the largest " + half->name + " weight is " + std::to_string(half->most) + ", but a " +
                                 half->name + " has " + std::to_string(half->positions) + " entries",
                             "write here the largest column weight and the largest row weight");
  return {};
}

Result<void> ListReader::read_weights(SparseHalf& half) {
  auto weights =
      numbers(half.lists, half.lists, "the weights of the " + std::to_string(half.lists) + " " + half.name + "s");
  if (!weights) return weights.error();
  half.weights = *std::move(weights);
  half.weights_line = lines_.last_number();
  const std::uint64_t largest = std::ranges::max(half.weights);
  if (largest != half.most)
    return source_.at_line(half.weights_line,
                           "the largest " + half.name + " weight is " + std::to_string(largest) + " here and " +
                               std::to_string(half.most) + " in line 2",
                           "correct one of the two lines");
  return {};
}

Result<void> ListReader::read_lists(SparseHalf& half) {
  half.first_line = lines_.last_number() + 1;
  for (std::uint32_t list = 0; list < half.lists; ++list) {
    const auto line = lines_.next();
    if (!line)
      return source_.at_line(
          lines_.last_number(),
          "the file ends after this line: the list of " + half.name + " " + std::to_string(list + 1) + " is missing",
          "check that the file is complete");
    if (const auto read = half.read_list(source_, list, *line); !read) return read.error();
  }
  return {};
}

Result<void> ListReader::refuse_rest() {
  while (const auto line = lines_.next())
    if (!trimmed(line->text).empty())
      return source_.at_line(line->number, "text follows the list of the last row",
                             "delete it, or correct the sizes in line 1");
  return {};
}

/// The matrix of the columns, if that of the rows is the same.
Result<field::Matrix> ListReader::cross_check() {
  field::Matrix matrix(rows_.lists, columns_.lists);
  for (const SparseEntry& entry : columns_.entries) matrix.at(entry.position, entry.list) = entry.value;
  Elements row(columns_.lists);
  auto next = rows_.entries.cbegin();
  for (std::uint32_t i = 0; i < rows_.lists; ++i) {
    std::ranges::fill(row, Element{0});
    for (; next != rows_.entries.cend() && next->list == i; ++next) row[next->position] = next->value;
    const auto [in_row, in_column] = std::ranges::mismatch(row, matrix.row(i));
    if (in_row == row.end()) continue;
    const auto j = static_cast<std::uint64_t>(in_row - row.begin());
    const std::string row_name = "row " + std::to_string(i + 1);
    const std::string column_name = "column " + std::to_string(j + 1);
    const std::string column_place = column_name + " (line " + std::to_string(columns_.line_of(j)) + ")";
    std::string what = "the halves disagree: ";
    if (*in_column == 0)
      what += row_name + " lists " + column_name + ", but " + column_place + " does not list " + row_name;
    else if (*in_row == 0)
      what += row_name + " does not list " + column_name + ", but " + column_place + " lists " + row_name;
    else
      what += row_name + " gives " + column_name + " the value " + std::to_string(*in_row) + ", but " + column_place +
              " gives " + row_name + " the value " + std::to_string(*in_column);
    return source_.at_line(rows_.line_of(i), what, "find out which of the two lines is right");
  }
  return matrix;
}

std::vector<std::string> ListReader::notices() const {
  std::vector<std::string> out;
  if (rows_.lists > columns_.lists)
    out.push_back("the list has more rows (" + std::to_string(rows_.lists) + ") than columns (" +
                  std::to_string(columns_.lists) + "): its columns are the symbols of the code; if its rows were " +
                  "meant, the list is transposed");
  if (rows_.unpadded || columns_.unpadded)
    out.emplace_back("some lists are shorter than the largest weight and not filled up with zeros");
  if (!rows_.valued && source_.field.order() > 2) out.emplace_back("the list has no values: every entry was read as 1");
  if (rows_.valued && source_.field.degree() > 1)
    out.emplace_back("values were read as element numbers, not as exponents of a primitive element");
  return out;
}

Result<FileMatrix> ListReader::read() {
  if (const auto read = read_sizes(); !read) return read.error();
  if (const auto read = read_weights(columns_); !read) return read.error();
  if (const auto read = read_weights(rows_); !read) return read.error();
  if (const auto read = read_lists(columns_); !read) return read.error();
  if (const auto read = read_lists(rows_); !read) return read.error();
  if (const auto done = refuse_rest(); !done) return done.error();
  auto matrix = cross_check();
  if (!matrix) return matrix.error();
  FileMatrix out;
  out.matrix = *std::move(matrix);
  for (std::uint64_t i = 0; i < rows_.lists; ++i) out.row_lines.push_back(rows_.line_of(i));
  out.notices = notices();
  return out;
}

/// The message for a list that reads well once its first numbers are exchanged.
Failure wrong_way_round(const MatrixSource& source, Orientation orientation) {
  const std::string maxima = "the largest column weight and the largest row weight";
  if (!orientation.sizes_swapped)
    return source.at_line(2, maxima + " only fit the other way round", "exchange the two numbers of this line");
  const std::string also = orientation.maxima_swapped ? " and those of line 2" : "";
  return source.at_line(1,
                        "the numbers of columns and of rows only fit the other way round" +
                            (also.empty() ? "" : ", and so do " + maxima + " in line 2"),
                        "columns come first everywhere: exchange the two numbers of line 1" + also +
                            ", or, if the rows are listed first, the halves");
}

}  // namespace

Result<FileMatrix> read_sparse_list(const MatrixSource& source) {
  if (const auto fine = check_text(source); !fine) return fine.error();
  auto read = ListReader(source, {}).read();
  if (read) return read;
  for (const Orientation other : {Orientation{true, false}, Orientation{true, true}, Orientation{false, true}})
    if (ListReader(source, other).read()) return wrong_way_round(source, other);
  return read;
}

}  // namespace assize::sheet
