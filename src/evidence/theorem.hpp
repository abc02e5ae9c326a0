// Theorems that bound a distance, each with the facts that a checker has to verify.
#pragma once
#include <cstdint>
#include <vector>

namespace assize::evidence {

/// A Reed-Solomon code meets the Singleton bound: d = n - k + 1.
struct MaximumDistanceSeparable {
  std::uint32_t at_least = 0;
};

/// Concatenation, one inner code or one for each position: the sum of the D smallest inner distances.
/// G. D. Forney, Concatenated Codes, 1966; J. Justesen, IEEE Trans. Inf. Theory 18, 1972.
struct Concatenation {
  enum class OuterReason { maximum_distance_separable, enumeration };
  std::uint32_t outer_distance = 0;
  OuterReason outer_reason = OuterReason::maximum_distance_separable;
  std::vector<std::uint32_t> inner_distances;  ///< one for each outer position
  std::uint32_t at_least = 0;
};

}  // namespace assize::evidence
