// Reading counts strictly, and showing them to people.
#include "recheck/counts.hpp"

namespace assize::recheck {

Result<Counts> read_counts(const Json& json, const std::string& path, std::uint64_t smallest, std::uint64_t largest) {
  Counts counts;
  if (json.object() == nullptr) return Failure{path, "an object is expected here", ""};
  for (const Member& member : *json.object()) {
    const std::string at = path + "." + member.key;
    const auto weight = parse_decimal(member.key, largest);
    if (!weight || *weight < smallest)
      return Failure{
          at, "a weight is a decimal number from " + std::to_string(smallest) + " to " + std::to_string(largest), ""};
    if (!counts.empty() && *weight <= counts.rbegin()->first) return Failure{at, "the weights do not ascend", ""};
    const auto count = member.value.text() != nullptr ? parse_big_decimal(*member.value.text()) : std::nullopt;
    if (!count) return Failure{at, "a count (a string of at most 4096 decimal digits) is expected here", ""};
    if (*count == 0) return Failure{at, "zero counts are left out", ""};
    counts.emplace_hint(counts.end(), *weight, *count);
  }
  return counts;
}

std::string describe(const Counts& counts) {
  std::string text;
  std::size_t listed = 0;
  for (const auto& [weight, count] : counts) {
    if (listed++ == 16) return text + ", and " + std::to_string(counts.size() - 16) + " more weights";
    text += (text.empty() ? "" : ", ") + std::to_string(weight) + ": " + grouped_decimal(count);
  }
  return text;
}

}  // namespace assize::recheck
