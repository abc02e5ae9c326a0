// Steps that leave out, move or repeat positions: puncture, shorten, permute, repeat.
#include <algorithm>

#include "recheck/replay.hpp"

namespace assize::recheck {
namespace {

/// Distinct positions of a code of this length, in the order given.
Result<std::vector<std::size_t>> read_positions(const Json::Array& list, std::size_t length, const std::string& path,
                                                bool ascending) {
  std::vector<std::size_t> positions;
  std::vector<bool> seen(length, false);
  for (std::size_t i = 0; i < list.size(); ++i) {
    const std::string at = path + "[" + std::to_string(i) + "]";
    const std::uint64_t* position = list[i].integer();
    if (position == nullptr || *position >= length)
      return Failure{at, "a position below " + std::to_string(length) + " is expected here", ""};
    if (seen[*position]) return Failure{at, "the position stands here twice", ""};
    if (ascending && i > 0 && *position < positions.back()) return Failure{at, "the positions are not ascending", ""};
    seen[*position] = true;
    positions.push_back(*position);
  }
  return positions;
}

/// New column i is old column order[i].
Matrix pick_columns(const Matrix& g, const std::vector<std::size_t>& order) {
  Matrix rows(g.rows, order.size());
  for (std::size_t r = 0; r < g.rows; ++r)
    for (std::size_t i = 0; i < order.size(); ++i) rows.row(r)[i] = g.row(r)[order[i]];
  return rows;
}

/// The positions that are not in the ascending list.
std::vector<std::size_t> others(const std::vector<std::size_t>& positions, std::size_t length) {
  std::vector<std::size_t> rest;
  for (std::size_t i = 0; i < length; ++i)
    if (!std::binary_search(positions.begin(), positions.end(), i)) rest.push_back(i);
  return rest;
}

/// With the positions moved to the front, the rows of the echelon form whose pivot lies behind them span all words
/// that are zero there; the other positions keep their order.
Matrix shorten(const Field& field, const Matrix& g, std::vector<std::size_t> positions, const Brake& brake) {
  const std::size_t front = positions.size();
  for (const std::size_t position : others(positions, g.columns)) positions.push_back(position);
  const Reduced moved = reduce(field, pick_columns(g, positions), brake);
  const auto first = std::lower_bound(moved.pivots.begin(), moved.pivots.end(), front);
  const auto skipped = static_cast<std::size_t>(first - moved.pivots.begin());
  Matrix rows(moved.generator.rows - skipped, g.columns - front);
  for (std::size_t r = 0; r < rows.rows; ++r) {
    const auto source = moved.generator.row(skipped + r).subspan(front);
    std::copy(source.begin(), source.end(), rows.row(r).begin());
  }
  return rows;
}

Matrix repeat(const Matrix& g, std::size_t times) {
  Matrix rows(g.rows, g.columns * times);
  for (std::size_t r = 0; r < g.rows; ++r)
    for (std::size_t i = 0; i < times; ++i)
      std::copy(g.row(r).begin(), g.row(r).end(), rows.row(r).subspan(i * g.columns).begin());
  return rows;
}

}  // namespace

Result<Built> step_on_positions(Keys& keys, const std::string& kind, const FieldPtr& field, const Reduced& code,
                                const Brake& brake) {
  const Matrix& g = code.generator;
  if (kind == "repeat") {
    const std::uint64_t times = keys.integer("times", 1, max_length);
    if (auto end = keys.end(); !end) return end.error();
    if (auto fits = matrix_fits(g.rows, g.columns * times, keys.path()); !fits) return fits.error();
    return Built{field, repeat(g, times), {}};
  }
  const bool moves = kind == "permute";
  const std::string key = moves ? "order" : "positions";
  const Json::Array& list = keys.array(key);
  if (auto end = keys.end(); !end) return end.error();
  auto positions = read_positions(list, g.columns, keys.at(key), !moves);
  if (!positions) return positions.error();
  const bool all = positions->size() == g.columns;
  if (moves && !all) return Failure{keys.at(key), "every position must stand here once", ""};
  if (moves) return Built{field, pick_columns(g, *positions), {}};
  if (all) return Failure{keys.at(key), "not all positions can be left out", ""};
  if (kind == "puncture") return Built{field, pick_columns(g, others(*positions, g.columns)), {}};
  return Built{field, shorten(*field, g, std::move(*positions), brake), {}};
}

}  // namespace assize::recheck
