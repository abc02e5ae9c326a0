// The MacWilliams identity: the weight distribution of the dual code, exactly.
#pragma once
#include <cstdint>
#include <optional>

#include "evidence/enumeration.hpp"

namespace assize::bound {

/// B_j = q^-k Sum_i A_i K_j(i), K_j the Krawtchouk polynomials (F. J. MacWilliams, 1963), for a linear code of length n
/// over GF(q).  Nothing if a B_j would not be a non-negative integer: then A is the distribution of no linear code.
std::optional<evidence::WeightDistribution> dual_distribution(const evidence::WeightDistribution& distribution,
                                                              std::uint32_t length, std::uint32_t order);

}  // namespace assize::bound
