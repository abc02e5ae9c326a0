// Small integers: primes, prime powers, divisors, orders.
//
// All arguments stay below 2^32 (contract), which keeps trial division below 2^16 steps.
#pragma once
#include <cstdint>
#include <optional>
#include <vector>

namespace assize::field {

bool is_prime(std::uint64_t n) noexcept;

/// q = p^m with p prime and m >= 1.
struct PrimePower {
  std::uint32_t prime;
  std::uint32_t exponent;
};
std::optional<PrimePower> as_prime_power(std::uint64_t q) noexcept;

/// Distinct prime factors, ascending; none for 0 and 1.
std::vector<std::uint64_t> prime_factors(std::uint64_t n);

/// Number of integers in 1..n coprime to n; n must not be 0 (contract).
std::uint64_t euler_phi(std::uint64_t n);

/// The Moebius function: 0 if a square > 1 divides n, otherwise (-1)^(number of prime factors); n must not be 0
/// (contract).
int moebius(std::uint64_t n);

/// Smallest t >= 1 with q^t = 1 modulo n; nothing if gcd(q, n) > 1.  n must not be 0 (contract); modulo 1 it is 1.
std::optional<std::uint32_t> multiplicative_order(std::uint64_t q, std::uint64_t n) noexcept;

}  // namespace assize::field
