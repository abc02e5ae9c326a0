// [[symmetry]] tables: maps that the user knows of, to be verified on the code.
#include <algorithm>

#include "sheet/elements.hpp"
#include "sheet/read_parts.hpp"

namespace assize::sheet {

Result<std::vector<StatedSymmetry>> read_symmetries(const Node& node, const field::Field& words,
                                                    const std::string& source) {
  const auto* array = std::get_if<Array>(&node.value);
  if (array == nullptr)
    return Failure{source + ":" + std::to_string(node.line), "\"symmetry\" is " + std::string(kind_of(node)),
                   "symmetries are written as [[symmetry]] with two brackets, each with permutation = [...] below"};
  std::vector<StatedSymmetry> out;
  for (const Node& entry : *array) {
    const auto* entries = std::get_if<Table>(&entry.value);
    if (entries == nullptr)
      return Failure{source + ":" + std::to_string(entry.line),
                     "a symmetry is " + std::string(kind_of(entry)) + ", not a table",
                     "write [[symmetry]] and below it permutation = [1, 2, 0]"};
    TableReader table(*entries, source, entry.line, "[[symmetry]]");
    auto permutation = read_positions(table, "permutation");
    if (!permutation) return permutation.error();
    StatedSymmetry symmetry{*std::move(permutation), {}, entry.line};
    if (const Node* multipliers = table.optional("multipliers")) {
      auto read = read_elements(*multipliers, words, source, "multipliers");
      if (!read) return read.error();
      if (std::ranges::find(*read, Element{0}) != read->end())
        return table.failure(multipliers->line, "a multiplier is 0", "multipliers must not be 0");
      symmetry.multipliers = *std::move(read);
    }
    if (const auto done = table.finish(); !done) return done.error();
    out.push_back(std::move(symmetry));
  }
  return out;
}

}  // namespace assize::sheet
