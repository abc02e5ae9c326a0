// A list is as many entries as its weight says, then nothing but zeros.
#include "sheet/sparse_half.hpp"

#include <algorithm>
#include <span>

#include "base/integers.hpp"

namespace assize::sheet {

namespace {

std::optional<std::uint32_t> repeated_position(std::span<const SparseEntry> entries) {
  std::vector<std::uint32_t> positions;
  for (const SparseEntry& entry : entries) positions.push_back(entry.position);
  std::ranges::sort(positions);
  const auto twice = std::ranges::adjacent_find(positions);
  if (twice == positions.end()) return std::nullopt;
  return *twice;
}

}  // namespace

/// Position and value as numbers; the position becomes one less, except that of padding, which has the value 0.
Result<SparseEntry> SparseHalf::read_entry(const MatrixSource& source, const Line& line, const std::string& label,
                                           std::string_view position, std::string_view value) const {
  const auto at = parse_decimal(position, positions);
  if (!at)
    return source.at_line(
        line.number, label + ": " + in_quotes(position) + " is not the number of a " + other,
        other + "s are numbered from 1 to " + std::to_string(positions) + "; 0 fills the end of a list");
  SparseEntry out;
  out.value = *at > 0 ? 1 : 0;
  if (valued) {
    const auto read = parse_element_number(value, source.field);
    if (!read) return source.at_line(line.number, label + ": " + read.error().what, read.error().cure);
    out.value = *read;
  }
  if ((*at == 0) != (out.value == 0))
    return source.at_line(
        line.number, label + ": the position " + std::to_string(*at) + " has the value " + std::to_string(out.value),
        "give each position from 1 on a nonzero value; 0 0 fills the end of a list");
  out.position = *at == 0 ? 0 : static_cast<std::uint32_t>(*at - 1);
  return out;
}

Result<void> SparseHalf::read_list(const MatrixSource& source, std::uint32_t list, const Line& line) {
  const std::string label = name + " " + std::to_string(list + 1);
  const std::size_t width = valued ? 2 : 1;
  const auto pieces = split_at_blanks(line.text, most * width);
  if (pieces.size() > most * width)
    return source.at_line(line.number, label + " lists more than " + std::to_string(most) + " entries",
                          "line 2 states the largest weights; correct it or this line");
  if (pieces.size() % width != 0)
    return source.at_line(line.number, label + ": " + std::to_string(pieces.size()) + " numbers are not pairs",
                          "write each position with its value; a list over GF(2) may do without, if its first line "
                          "has two numbers only");
  const std::size_t begin = entries.size();
  bool padding = false;
  for (std::size_t i = 0; i < pieces.size(); i += width) {
    auto entry = read_entry(source, line, label, pieces[i], valued ? pieces[i + 1] : "");
    if (!entry) return entry.error();
    if (entry->value == 0) {
      padding = true;
      continue;
    }
    if (padding)
      return source.at_line(line.number, label + ": an entry follows the zeros that fill the list",
                            "list the entries first, then zeros only");
    entry->list = list;
    entries.push_back(*entry);
  }
  unpadded = unpadded || pieces.size() < most * width;
  const std::size_t found = entries.size() - begin;
  if (found != weights[list])
    return source.at_line(line.number,
                          label + " lists " + std::to_string(found) + " entries, its weight in line " +
                              std::to_string(weights_line) + " is " + std::to_string(weights[list]),
                          "correct one of the two lines");
  if (const auto twice = repeated_position({entries.begin() + static_cast<std::ptrdiff_t>(begin), entries.end()}))
    return source.at_line(line.number, label + " lists " + other + " " + std::to_string(*twice + 1) + " twice",
                          "list each entry once");
  return {};
}

}  // namespace assize::sheet
