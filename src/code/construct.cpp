// The way from a description to a code, and the notices that a user should see.
#include "code/construct.hpp"

#include <algorithm>
#include <map>

#include "code/families.hpp"
#include "code/steps.hpp"
#include "code/symmetry.hpp"

namespace assize::code {

namespace {

/// Positions that are zero in every word, and groups of positions that are multiples of one another.
void notice_columns(LinearCode& code) {
  const field::Field& field = code.field();
  std::vector<std::uint32_t> zero;
  std::map<std::vector<field::Element>, std::vector<std::uint32_t>> same;  // by the column scaled to leading 1
  const ReducedGenerator& reduced = code.reduced();
  for (std::size_t j = 0; j < reduced.others.size(); ++j) {
    std::vector<field::Element> column(code.dimension());
    field::Element scale = 0;
    for (std::uint32_t i = 0; i < code.dimension(); ++i) {
      const field::Element entry = reduced.tail.at(i, j);
      if (scale == 0 && entry != 0) scale = field.inverse(entry);
      column[i] = field.multiply(entry, scale);
    }
    if (scale == 0)
      zero.push_back(reduced.others[j]);
    else
      same[std::move(column)].push_back(reduced.others[j]);
  }
  for (std::uint32_t i = 0; i < code.dimension(); ++i) {
    std::vector<field::Element> unit(code.dimension(), 0);
    unit[i] = 1;
    if (const auto found = same.find(unit); found != same.end()) found->second.push_back(reduced.pivots[i]);
  }
  const auto listed = [](const std::vector<std::uint32_t>& positions) {
    std::string out;
    for (std::size_t i = 0; i < positions.size() && i < 8; ++i)
      out += (i == 0 ? "" : ", ") + std::to_string(positions[i]);
    return positions.size() > 8 ? out + ", ..." : out;
  };
  if (!zero.empty())
    code.structure.notices.push_back("zero in every word: " + std::to_string(zero.size()) +
                                     " position(s): " + listed(zero));
  std::uint64_t groups = 0;
  std::vector<std::uint32_t> first;
  for (auto& [column, positions] : same) {
    if (positions.size() < 2) continue;
    std::ranges::sort(positions);
    if (groups++ == 0) first = positions;
  }
  if (groups > 0)
    code.structure.notices.push_back("multiples of one another: " + std::to_string(groups) +
                                     " group(s) of positions; one of them: " + listed(first));
}

/// The columns of large codes are not compared: it would take longer than the rest.
constexpr std::uint64_t largest_column_comparison = 1ULL << 22;

/// Maps of the sheet must hold; they come first.
Result<void> add_stated_symmetries(const sheet::Description& description, LinearCode& code) {
  std::vector<MonomialMap> stated;
  for (const sheet::StatedSymmetry& symmetry : description.symmetries) {
    MonomialMap map{"stated in line " + std::to_string(symmetry.line), symmetry.permutation, symmetry.multipliers};
    if (map.permutation.size() != code.length() ||
        (!map.multipliers.empty() && map.multipliers.size() != code.length()))
      return Failure{description.place(symmetry.line),
                     "the map does not name each of the " + std::to_string(code.length()) + " positions once",
                     "list all positions from 0 to " + std::to_string(code.length() - 1)};
    if (*std::ranges::max_element(map.permutation) >= code.length() || !is_symmetry(code, map))
      return Failure{description.place(symmetry.line), "the map does not carry the code onto itself",
                     "new position i takes multipliers[i] times the symbol of old position permutation[i]"};
    stated.push_back(std::move(map));
  }
  code.structure.symmetries.insert(code.structure.symmetries.begin(), stated.begin(), stated.end());
  return {};
}

}  // namespace

Result<void> check_size(const sheet::Description& in, int line, std::uint64_t rows, std::uint64_t columns) {
  if (columns > sheet::largest_length)
    return Failure{in.place(line), "the words would have " + std::to_string(columns) + " symbols",
                   "lengths up to " + std::to_string(sheet::largest_length) + " are taken"};
  if (rows != 0 && columns > largest_matrix / rows)
    return Failure{in.place(line),
                   "the matrix would have " + std::to_string(rows) + " x " + std::to_string(columns) + " elements",
                   "up to " + std::to_string(largest_matrix) + " are taken"};
  return {};
}

Result<LinearCode> construct(const sheet::Description& description) {
  auto code = std::visit([&](const auto& family) { return build(family, description); }, description.family);
  for (const sheet::Step& step : description.steps) {
    if (!code) return code;
    code = apply(step, *code, description);
  }
  if (!code) return code;
  if (code->dimension() == 0)
    return Failure{description.place(description.code_line),
                   "the code has dimension 0: it has no word but the zero word",
                   "a distance is stated for codes of dimension at least 1"};
  if (std::uint64_t{code->dimension()} * code->redundancy() <= largest_column_comparison) {
    notice_columns(*code);
    code->structure.symmetries = known_symmetries(description, *code);
  }
  if (const auto fine = add_stated_symmetries(description, *code); !fine) return fine.error();
  return code;
}

}  // namespace assize::code
