// The little number theory that root fields and quadratic residues need, by trial division.
#pragma once
#include <cstdint>
#include <vector>

namespace assize::recheck {

/// The distinct prime factors of a number >= 1, ascending; at most sqrt(number) steps.
inline std::vector<std::uint64_t> prime_factors(std::uint64_t number) {
  std::vector<std::uint64_t> factors;
  for (std::uint64_t divisor = 2; divisor * divisor <= number; ++divisor) {
    if (number % divisor != 0) continue;
    factors.push_back(divisor);
    while (number % divisor == 0) number /= divisor;
  }
  if (number > 1) factors.push_back(number);
  return factors;
}

inline bool is_prime(std::uint64_t number) {
  return number >= 2 && prime_factors(number) == std::vector<std::uint64_t>{number};
}

}  // namespace assize::recheck
