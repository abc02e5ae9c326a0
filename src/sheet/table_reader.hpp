// Strict access to one table of a sheet: wrong types, missing keys and unknown keys become errors with their line.
#pragma once
#include <cstdint>
#include <initializer_list>
#include <string>
#include <string_view>
#include <vector>

#include "sheet/document.hpp"

namespace assize::sheet {

/// A value and the line it stands on; 0 if it was not written but follows from something else.
template <class T>
struct Located {
  T value{};
  int line = 0;
};

/// Reads keys by name and remembers which were asked for; finish() refuses the others.
class TableReader {
 public:
  /// `what` names the table in messages: "[code]".
  TableReader(const Table& table, std::string source, int line, std::string what)
      : table_(&table), source_(std::move(source)), line_(line), what_(std::move(what)) {}

  [[nodiscard]] bool has(std::string_view key);
  [[nodiscard]] const Node* optional(std::string_view key);
  /// `example` is a whole line that would be right.
  [[nodiscard]] Result<const Node*> required(std::string_view key, std::string_view example);

  Result<Located<std::string>> string(std::string_view key, std::string_view example);
  Result<Located<std::uint64_t>> integer(std::string_view key, std::uint64_t least, std::uint64_t largest,
                                         std::string_view example);
  Result<Located<std::uint64_t>> integer_or(std::string_view key, std::uint64_t least, std::uint64_t largest,
                                            std::uint64_t otherwise);

  /// Refuses every key that was never asked for.
  [[nodiscard]] Result<void> finish() const;

  [[nodiscard]] Failure failure(int line, std::string what, std::string cure) const {
    return {source_ + ":" + std::to_string(line), std::move(what), std::move(cure)};
  }
  [[nodiscard]] int line() const noexcept { return line_; }
  [[nodiscard]] const std::string& source() const noexcept { return source_; }

 private:
  const Table* table_;
  std::string source_;
  int line_;
  std::string what_;
  std::vector<std::string> asked_;
};

/// An integer node within limits; shared by readers of arrays.
Result<std::uint64_t> integer_in(const Node& node, const std::string& source, std::string_view name,
                                 std::uint64_t least, std::uint64_t largest);

}  // namespace assize::sheet
