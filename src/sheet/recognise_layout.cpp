// Magic words and the ending of the name decide; they must not contradict each other.
//
// A sparse list begins with two or three numbers in its first line and two in its second, and so does a text matrix of
// two columns.  Where the numbers could mean both, the sheet must say which.
#include "sheet/recognise_layout.hpp"

#include <algorithm>
#include <array>

#include "base/integers.hpp"
#include "sheet/matrix_readers.hpp"

namespace assize::sheet {

namespace {

constexpr std::string_view npy_magic = "\x93NUMPY";
constexpr std::string_view market_magic = "%%matrixmarket";

std::string lower(std::string_view text) {
  std::string out(text);
  for (char& c : out)
    if (c >= 'A' && c <= 'Z') c = static_cast<char>(c - 'A' + 'a');
  return out;
}

std::optional<Layout> by_magic(std::string_view bytes) {
  if (bytes.starts_with(npy_magic)) return Layout::npy;
  if (lower(bytes.substr(0, market_magic.size())) == market_magic) return Layout::matrix_market;
  return std::nullopt;
}

std::optional<Layout> by_ending(const std::string& name) {
  constexpr std::array<std::pair<std::string_view, Layout>, 4> endings{
      {{".csv", Layout::csv}, {".mtx", Layout::matrix_market}, {".alist", Layout::sparse_list}, {".npy", Layout::npy}}};
  const std::string lowered = lower(name);
  for (const auto& [ending, layout] : endings)
    if (lowered.ends_with(ending)) return layout;
  return std::nullopt;
}

/// The numbers of the first two lines, if they are as many as a sparse list has there.
struct Head {
  std::vector<std::uint64_t> first;
  std::vector<std::uint64_t> second;
  bool two_columns = false;  ///< the first three lines have two pieces each, as far as there are so many lines
};

std::vector<std::uint64_t> numbers_of(const std::optional<Line>& line) {
  std::vector<std::uint64_t> numbers;
  if (!line) return numbers;
  for (const std::string_view piece : split_at_blanks(line->text, 3)) {
    const auto number = parse_decimal(piece);
    if (!number) return {};
    numbers.push_back(*number);
  }
  return numbers;
}

std::optional<Head> head_of_list(std::string_view bytes) {
  LineCursor lines(bytes);
  Head head;
  head.first = numbers_of(lines.next());
  head.second = numbers_of(lines.next());
  if ((head.first.size() != 2 && head.first.size() != 3) || head.second.size() != 2) return std::nullopt;
  const auto third = lines.next_filled('#');
  head.two_columns = head.first.size() == 2 && (!third || split_at_blanks(third->text, 2).size() == 2);
  return head;
}

/// Whether the maxima fit the sizes, one way round or the other.
bool plausible(const Head& head) {
  const std::uint64_t columns = head.first[0];
  const std::uint64_t rows = head.first[1];
  const std::uint64_t a = head.second[0];
  const std::uint64_t b = head.second[1];
  if (columns == 0 || rows == 0 || (a == 0) != (b == 0) || (head.first.size() == 3 && head.first[2] < 2)) return false;
  return (a <= rows && b <= columns) || (a <= columns && b <= rows);
}

bool all_elements(const Head& head, const field::Field& field) {
  const auto inside = [&field](std::uint64_t number) { return field.contains(number); };
  return std::ranges::all_of(head.first, inside) && std::ranges::all_of(head.second, inside);
}

}  // namespace

Result<Recognised> recognise_layout(const MatrixSource& source) {
  const auto magic = by_magic(source.bytes);
  const auto ending = by_ending(source.name);
  if (magic && ending && *magic != *ending)
    return Failure{
        source.name,
        "the file begins like " + std::string(layout_name(*magic)) + ", its name ends like " +
            std::string(layout_name(*ending)),
        "change the ending, or name the format in the sheet: layout = \"" + std::string(layout_name(*magic)) + "\""};
  if (ending) return Recognised{*ending, true};
  if (magic) return Recognised{*magic, false};
  LineCursor lines(source.bytes);
  const auto first = lines.next_filled('#');
  if (first && first->text.find_first_of(",;") != std::string_view::npos) return Recognised{Layout::csv, false};
  const auto head = head_of_list(source.bytes);
  if (!head) return Recognised{Layout::text, false};
  if (!plausible(*head)) {
    const bool text = all_elements(*head, source.field) || head->two_columns;
    return Recognised{text ? Layout::text : Layout::sparse_list, false};
  }
  if (read_text_matrix(source))
    return source.at_line(1, "this may be a text matrix of two columns, or the beginning of a sparse list",
                          "name the format in the sheet: layout = \"text\" or layout = \"sparse-list\"");
  return Recognised{Layout::sparse_list, false};
}

}  // namespace assize::sheet
