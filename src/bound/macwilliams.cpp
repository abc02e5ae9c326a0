// As polynomials: Sum_j B_j z^j = q^-k Sum_i A_i (1 - z)^i (1 + (q-1) z)^(n-i).
//
// The row of coefficients for i + 1 follows from that for i by one division by 1 + (q-1) z and one product with 1 - z,
// so the whole transform takes n^2 operations on integers of about n log2 q bits.
#include "bound/macwilliams.hpp"

#include <vector>

namespace assize::bound {

std::optional<evidence::WeightDistribution> dual_distribution(const evidence::WeightDistribution& distribution,
                                                              std::uint32_t length, std::uint32_t order) {
  BigInteger words = 0;
  for (const auto& [weight, count] : distribution) {
    if (weight > length || count < 0) return std::nullopt;
    words += count;
  }
  if (words == 0) return std::nullopt;
  const BigInteger step = order - 1;
  // row = (1 + (q-1) z)^n to begin with.
  std::vector<BigInteger> row(length + 1);
  row[0] = 1;
  for (std::uint32_t j = 1; j <= length; ++j) row[j] = row[j - 1] * (length - j + 1) / j * step;
  std::vector<BigInteger> sum(length + 1);
  for (std::uint32_t i = 0; i <= length; ++i) {
    if (const auto entry = distribution.find(i); entry != distribution.end())
      for (std::uint32_t j = 0; j <= length; ++j) sum[j] += entry->second * row[j];
    if (i == length) break;
    for (std::uint32_t j = 1; j <= length; ++j) row[j] -= step * row[j - 1];  // exact: the factor is there
    for (std::uint32_t j = length; j >= 1; --j) row[j] -= row[j - 1];
  }
  evidence::WeightDistribution dual;
  for (std::uint32_t j = 0; j <= length; ++j) {
    if (sum[j] < 0 || sum[j] % words != 0) return std::nullopt;
    if (sum[j] != 0) dual[j] = sum[j] / words;
  }
  return dual;
}

}  // namespace assize::bound
