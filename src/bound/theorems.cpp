// The Singleton bound met by Reed-Solomon codes, and the concatenation argument in its finite form.
#include "bound/theorems.hpp"

#include <algorithm>
#include <numeric>

#include "base/integers.hpp"
#include "bound/small_distance.hpp"
#include "code/concatenation.hpp"

namespace assize::bound {

namespace {

/// Symbol operations that may be spent on the inner codes of one concatenation.
constexpr std::uint64_t most_side_work = 1ULL << 28;

std::optional<std::vector<std::uint32_t>> inner_distances(const code::Concatenation& parts) {
  const std::uint64_t codes = parts.inner_generators.size();
  const field::Matrix& first = parts.inner_generators.front();
  const auto words = power_if_fits(parts.inner_field.order(), first.rows());
  if (!words || *words > most_side_words || *words * first.columns() > most_side_work / codes) return std::nullopt;
  std::vector<std::uint32_t> distances;
  for (const field::Matrix& generator : parts.inner_generators) {
    const auto distance = small_distance(parts.inner_field, generator);
    if (!distance) return std::nullopt;
    distances.push_back(*distance);
  }
  if (codes == 1) distances.assign(parts.outer.length(), distances.front());
  return distances;
}

/// The sum of the D smallest inner distances (Forney 1966; Justesen 1972).
std::optional<evidence::Concatenation> concatenation(const sheet::Description& description) {
  if (!description.steps.empty()) return std::nullopt;
  const auto parts = code::concatenation_parts(description);
  if (!parts || !*parts) return std::nullopt;
  const code::LinearCode& outer = (*parts)->outer;
  evidence::Concatenation fact;
  if (outer.structure.reed_solomon) {
    fact.outer_reason = evidence::Concatenation::OuterReason::maximum_distance_separable;
    fact.outer_distance = outer.redundancy() + 1;
  } else {
    const auto words = power_if_fits(outer.order(), outer.dimension());
    if (!words || *words > most_side_work / outer.length()) return std::nullopt;
    const auto distance = small_distance(outer.field(), outer.generator());
    if (!distance) return std::nullopt;
    fact.outer_reason = evidence::Concatenation::OuterReason::enumeration;
    fact.outer_distance = *distance;
  }
  auto distances = inner_distances(**parts);
  if (!distances) return std::nullopt;
  fact.inner_distances = *std::move(distances);
  std::vector<std::uint32_t> ascending = fact.inner_distances;
  std::ranges::sort(ascending);
  fact.at_least = std::accumulate(ascending.begin(), ascending.begin() + fact.outer_distance, std::uint32_t{0});
  return fact;
}

}  // namespace

std::vector<evidence::Item> theorems(const sheet::Description& description, const code::LinearCode& code) {
  std::vector<evidence::Item> items;
  if (code.structure.reed_solomon) items.emplace_back(evidence::MaximumDistanceSeparable{code.redundancy() + 1});
  if (const auto fact = concatenation(description)) items.emplace_back(*fact);
  return items;
}

}  // namespace assize::bound
