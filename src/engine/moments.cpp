// Counting pairs of positions that are both non-zero, by the rank of their two columns.
#include "engine/moments.hpp"

#include <algorithm>
#include <map>

namespace assize::engine {

using field::Element;

CosetMoments::CosetMoments(const code::LinearCode& code, std::uint32_t free_rows)
    : field_(code.field()), free_rows_(free_rows), positions_(code.length()) {
  std::vector<std::vector<Element>> columns(code.length());
  for (std::uint32_t i = code.dimension() - free_rows; i < code.dimension(); ++i) {
    const std::vector<Element> row = code.row(i);
    for (std::size_t j = 0; j < row.size(); ++j) columns[j].push_back(row[j]);
  }
  std::map<std::vector<Element>, std::uint32_t> classes;
  std::vector<std::uint64_t> sizes;
  for (std::size_t j = 0; j < columns.size(); ++j) {
    const auto first = std::ranges::find_if(columns[j], [](Element a) { return a != 0; });
    if (first == columns[j].end()) continue;
    positions_[j].scale = field_.inverse(*first);
    field::scale(field_, columns[j], positions_[j].scale);
    const auto [place, is_new] = classes.try_emplace(std::move(columns[j]), static_cast<std::uint32_t>(classes.size()));
    if (is_new) sizes.push_back(0);
    positions_[j].column_class = place->second;
    ++sizes[place->second];
    ++free_positions_;
  }
  for (const std::uint64_t size : sizes) proportional_pairs_ += size * size;
}

std::array<BigInteger, 2> CosetMoments::of_coset(std::span<const Element> v) const {
  contract(v.size() == positions_.size(), "a word has one symbol for each position");
  // Free positions as (class, scaled symbol of v): equal ones are zero in the same words.
  std::vector<std::uint64_t> zero_together;
  zero_together.reserve(free_positions_);
  std::uint64_t fixed = 0;  // positions that are non-zero throughout
  for (std::size_t j = 0; j < v.size(); ++j) {
    if (positions_[j].column_class == not_free)
      fixed += v[j] != 0 ? 1U : 0U;
    else
      zero_together.push_back((std::uint64_t{positions_[j].column_class} << 32U) |
                              field_.multiply(positions_[j].scale, v[j]));
  }
  std::ranges::sort(zero_together);
  std::uint64_t pairs_together = 0;
  for (auto first = zero_together.begin(); first != zero_together.end();) {
    const auto last = std::upper_bound(first, zero_together.end(), *first);
    const auto size = static_cast<std::uint64_t>(last - first);
    pairs_together += size * size;
    first = last;
  }

  const BigInteger all = power(field_.order(), free_rows_);
  const BigInteger share = all / field_.order();  // words in which a given free position is zero (unused if s = 0)
  const BigInteger nonzero = all - share;
  const BigInteger free = free_positions_;
  const BigInteger independent_pairs = free * free - proportional_pairs_;
  BigInteger first_moment = all * fixed;
  BigInteger second_moment = all * fixed * fixed;
  if (free_positions_ > 0) {
    first_moment += nonzero * free;
    second_moment += 2 * nonzero * fixed * free;
    second_moment += nonzero * pairs_together;
    second_moment += (nonzero - share) * (proportional_pairs_ - pairs_together);
    second_moment += independent_pairs * (nonzero * (field_.order() - 1) / field_.order());
  }
  return {first_moment, second_moment};
}

std::array<BigInteger, 2> CosetMoments::of_normalised_span() const {
  std::array<BigInteger, 2> moments = of_coset(std::vector<Element>(positions_.size(), 0));
  for (BigInteger& moment : moments) moment /= field_.order() - 1;
  return moments;
}

}  // namespace assize::engine
