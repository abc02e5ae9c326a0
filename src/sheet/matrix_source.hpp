// A matrix file while it is being read: its name for messages, its bytes, and the small tools all readers share.
#pragma once
#include <cstddef>
#include <optional>
#include <string>
#include <string_view>
#include <vector>

#include "sheet/description.hpp"
#include "sheet/matrix_file.hpp"

namespace assize::sheet {

struct MatrixSource {
  const std::string& name;
  std::string_view bytes;
  const field::Field& field;

  [[nodiscard]] Failure at_line(int line, std::string what, std::string cure) const {
    return {name + ":" + std::to_string(line), std::move(what), std::move(cure)};
  }
  [[nodiscard]] Failure at_byte(std::size_t byte, std::string what, std::string cure) const {
    return {name + ", byte " + std::to_string(byte), std::move(what), std::move(cure)};
  }
};

struct Line {
  std::string_view text;  ///< without its line end
  int number = 0;         ///< from 1
};

/// Goes through the lines of a text; "\n" and "\r\n" end a line.
class LineCursor {
 public:
  explicit LineCursor(std::string_view bytes) : rest_(bytes) {}
  std::optional<Line> next();
  /// The next line that is neither blank nor begins with `comment`.
  std::optional<Line> next_filled(char comment);
  [[nodiscard]] int last_number() const noexcept { return number_; }  ///< of the line returned last

 private:
  std::string_view rest_;
  int number_ = 0;
};

/// Pieces between blanks and tabs; gives up after most + 1 of them, so that a hostile line costs no memory.
std::vector<std::string_view> split_at_blanks(std::string_view text, std::size_t most);
/// Without blanks and tabs at both ends.
std::string_view trimmed(std::string_view text) noexcept;
/// In quotation marks, shortened, and without bytes that a terminal would not show.
std::string in_quotes(std::string_view text);

/// Refuses what is no text: nothing at all, byte order marks, zero bytes, carriage returns without line feed.
Result<void> check_text(const MatrixSource& source);
/// Nothing, or what is wrong with that many rows and columns.
std::optional<std::string> size_objection(std::uint64_t rows, std::uint64_t columns);
/// The cure for a matrix that is too large.
std::string size_cure();

/// An element spelled as in a sheet; the failure's `where` is empty.
Result<Element> parse_symbol(std::string_view text, const field::Field& field);
/// An element spelled as a number only.
Result<Element> parse_element_number(std::string_view text, const field::Field& field);

/// Adds a notice if the file has no final line end and its last number, at most `largest`, could have lost digits.
void notice_open_end(const MatrixSource& source, std::uint64_t largest, std::vector<std::string>& notices);

}  // namespace assize::sheet
