// Facts that follow from theorems: maximum distance separable codes and concatenation.  Their premises are derived
// again from the description at every depth; nothing in the item is believed.
#include <algorithm>
#include <numeric>

#include "recheck/coset_walk.hpp"
#include "recheck/evidence.hpp"

namespace assize::recheck {
namespace {

Result<std::uint64_t> distance_by_enumeration(const Field& field, const Matrix& rows, const Brake& brake,
                                              const std::string& where) {
  const auto words = power_if_fits(field.order(), rows.rows);
  if (!words || *words > max_enumerated_words)
    return Failure{where, "a component code has more than 2^24 words and is not enumerated", ""};
  return least_weight(field, rows, brake);
}

Result<void> check_outer(const Parts& parts, const std::string& from, std::uint64_t claimed, const Keys& keys,
                         const Brake& brake, ComponentDistances& known) {
  const Matrix& g = parts.outer.generator;
  std::uint64_t distance = 0;
  if (from == "maximum-distance-separable") {
    if (!parts.outer_is_reed_solomon)
      return Failure{keys.at("outer_distance_from"), "the outer code is not a Reed-Solomon code without steps", ""};
    distance = g.columns - g.rows + 1;
  } else if (from == "enumeration") {
    if (!known.outer) {
      const auto found = distance_by_enumeration(*parts.outer_field, g, brake, keys.at("outer_distance_from"));
      if (!found) return found.error();
      known.outer = *found;
    }
    distance = *known.outer;
  } else {
    return Failure{keys.at("outer_distance_from"), "maximum-distance-separable or enumeration is expected here", ""};
  }
  if (distance == claimed) return {};
  return Failure{keys.at("outer_distance"), "the outer distance is " + std::to_string(distance), ""};
}

Result<std::vector<std::uint64_t>> inner_distances(const Parts& parts, const Brake& brake, const std::string& where,
                                                   ComponentDistances& known) {
  if (known.inner) return *known.inner;
  std::vector<std::uint64_t> found;
  for (const Matrix& inner : parts.inner) {
    brake.poll();
    const auto distance = distance_by_enumeration(*parts.inner_field, inner, brake, where);
    if (!distance) return distance.error();
    found.push_back(*distance);
  }
  if (found.size() == 1) found.resize(parts.outer.generator.columns, found.front());
  known.inner = found;
  return found;
}

}  // namespace

Result<void> check_maximum_distance_separable(Keys& keys, const Subject& subject, Item& item) {
  const std::uint64_t at_least = keys.integer("at_least");
  if (auto end = keys.end(); !end) return end.error();
  if (subject.code.family != "reed-solomon" || subject.code.has_steps)
    return Failure{keys.path(), "the description is not a Reed-Solomon code without steps", ""};
  const std::uint64_t distance = subject.length() - subject.dimension() + 1;
  if (at_least != distance) return Failure{keys.at("at_least"), "n - k + 1 is " + std::to_string(distance), ""};
  item.at_least = at_least;
  item.done = "a Reed-Solomon code has distance n - k + 1 = " + std::to_string(distance);
  return {};
}

Result<void> check_concatenation(Keys& keys, const Subject& subject, const Brake& brake, ComponentDistances& known,
                                 Item& item) {
  const std::uint64_t outer_distance = keys.integer("outer_distance", 1);
  const std::string from = keys.text("outer_distance_from");
  const Json::Array& inner_json = keys.array("inner_distances");
  const std::uint64_t at_least = keys.integer("at_least");
  if (auto end = keys.end(); !end) return end.error();
  if (!subject.code.parts)
    return Failure{keys.path(), "the description is not a concatenated or Justesen code without steps", ""};
  const Parts& parts = *subject.code.parts;
  if (auto right = check_outer(parts, from, outer_distance, keys, brake, known); !right) return right.error();

  const std::string at_inner = keys.at("inner_distances");
  auto distances = inner_distances(parts, brake, at_inner, known);
  if (!distances) return distances.error();
  if (inner_json.size() != distances->size())
    return Failure{at_inner, "there must be one distance for each outer position", ""};
  for (std::size_t i = 0; i < inner_json.size(); ++i)
    if (inner_json[i].integer() == nullptr || *inner_json[i].integer() != (*distances)[i])
      return Failure{at_inner + "[" + std::to_string(i) + "]",
                     "the inner distance is " + std::to_string((*distances)[i]), ""};
  std::sort(distances->begin(), distances->end());
  const std::uint64_t sum = std::accumulate(
      distances->begin(), distances->begin() + static_cast<std::ptrdiff_t>(outer_distance), std::uint64_t{0});
  if (at_least != sum)
    return Failure{keys.at("at_least"), "the smallest inner distances add up to " + std::to_string(sum), ""};
  item.at_least = at_least;
  item.done = "the " + std::to_string(outer_distance) + " smallest inner distances add up to " + std::to_string(sum);
  return {};
}

}  // namespace assize::recheck
