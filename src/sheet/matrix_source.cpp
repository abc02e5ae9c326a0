// Lines, pieces of lines and the checks that come before any reading.
#include "sheet/matrix_source.hpp"

#include "base/integers.hpp"
#include "sheet/elements.hpp"

namespace assize::sheet {

namespace {

constexpr std::string_view blanks = " \t";
/// No element has a longer spelling worth writing.
constexpr std::size_t longest_symbol = 256;

bool shows(char c) noexcept { return c >= ' ' && c <= '~'; }

bool all_shows(std::string_view text) noexcept {
  for (const char c : text)
    if (!shows(c)) return false;
  return true;
}

Failure no_element(std::string_view text, const field::Field& field) {
  return {"", in_quotes(text) + " is not an element of GF(" + std::to_string(field.order()) + ")",
          "elements are " + element_range(field)};
}

}  // namespace

std::optional<Line> LineCursor::next() {
  if (rest_.empty()) return std::nullopt;
  const std::size_t end = rest_.find('\n');
  std::string_view text = rest_.substr(0, end);
  rest_.remove_prefix(end == std::string_view::npos ? rest_.size() : end + 1);
  if (text.ends_with('\r')) text.remove_suffix(1);
  return Line{text, ++number_};
}

std::optional<Line> LineCursor::next_filled(char comment) {
  while (const auto line = next()) {
    const std::string_view text = trimmed(line->text);
    if (!text.empty() && text.front() != comment) return line;
  }
  return std::nullopt;
}

std::vector<std::string_view> split_at_blanks(std::string_view text, std::size_t most) {
  std::vector<std::string_view> pieces;
  std::size_t begin = text.find_first_not_of(blanks);
  while (begin != std::string_view::npos && pieces.size() <= most) {
    const std::size_t end = text.find_first_of(blanks, begin);
    pieces.push_back(text.substr(begin, end == std::string_view::npos ? end : end - begin));
    begin = text.find_first_not_of(blanks, end);
  }
  return pieces;
}

std::string_view trimmed(std::string_view text) noexcept {
  const std::size_t begin = text.find_first_not_of(blanks);
  if (begin == std::string_view::npos) return {};
  return text.substr(begin, text.find_last_not_of(blanks) - begin + 1);
}

std::string in_quotes(std::string_view text) {
  constexpr std::size_t most = 40;
  std::string out = "\"";
  for (const char c : text.substr(0, most)) out += shows(c) ? c : '?';
  return out + (text.size() > most ? "...\"" : "\"");
}

Result<void> check_text(const MatrixSource& source) {
  const std::string_view bytes = source.bytes;
  if (bytes.starts_with("\xef\xbb\xbf"))
    return source.at_line(1, "the file begins with a byte order mark", "save it as plain UTF-8");
  int line = 1;
  for (std::size_t i = 0; i < bytes.size(); ++i) {
    if (bytes[i] == '\n') ++line;
    if (bytes[i] == 0)
      return source.at_line(line, "the file holds a zero byte: this is not text",
                            "save the matrix as plain text, or name its format in the sheet: layout = \"npy\"");
    if (bytes[i] == '\r' && (i + 1 == bytes.size() || bytes[i + 1] != '\n'))
      return source.at_line(line, "a carriage return stands without a line feed", "end each line with a line feed");
  }
  return {};
}

std::optional<std::string> size_objection(std::uint64_t rows, std::uint64_t columns) {
  if (rows == 0 || columns == 0)
    return "a matrix of " + std::to_string(rows) + " rows and " + std::to_string(columns) + " columns is empty";
  if (columns > largest_length) return std::to_string(columns) + " columns are too many";
  if (rows > largest_matrix / columns)
    return "a matrix of " + std::to_string(rows) + " rows and " + std::to_string(columns) + " columns is too large";
  return std::nullopt;
}

std::string size_cure() {
  return "at least 1 row and 1 column, at most " + std::to_string(largest_length) + " columns and " +
         std::to_string(largest_matrix) + " symbols in all are read";
}

Result<Element> parse_symbol(std::string_view text, const field::Field& field) {
  if (text.size() > longest_symbol || !all_shows(text)) return no_element(text, field);
  return parse_element(text, field);
}

Result<Element> parse_element_number(std::string_view text, const field::Field& field) {
  const auto number = parse_decimal(text, field.order() - 1);
  if (!number)
    return Failure{"", in_quotes(text) + " is not an element of GF(" + std::to_string(field.order()) + ")",
                   "elements are here the numbers 0 to " + std::to_string(field.order() - 1)};
  return static_cast<Element>(*number);
}

void notice_open_end(const MatrixSource& source, std::uint64_t largest, std::vector<std::string>& notices) {
  if (source.bytes.ends_with('\n') || largest < 10) return;
  notices.push_back("the last line of " + source.name +
                    " has no line end: if the file was cut off, its last number may lack digits");
}

}  // namespace assize::sheet
