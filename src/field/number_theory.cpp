// Trial division is enough: every argument is below 2^32.
//
// The order of q modulo n is not found by stepping but from phi(n), which it divides, so that a length in the
// billions costs no more than a small one.
#include "field/number_theory.hpp"

#include <numeric>

#include "base/contract.hpp"

namespace assize::field {

namespace {

void require_small(std::uint64_t n) noexcept { contract(n >> 32U == 0, "number theory is asked about less than 2^32"); }

/// The least prime factor of n >= 2.
std::uint64_t least_prime_factor(std::uint64_t n) noexcept {
  if (n % 2 == 0) return 2;
  for (std::uint64_t d = 3; d * d <= n; d += 2)
    if (n % d == 0) return d;
  return n;
}

/// base^exponent modulo n, for n < 2^32: products fit 64 bits.
std::uint64_t power_modulo(std::uint64_t base, std::uint64_t exponent, std::uint64_t n) noexcept {
  std::uint64_t result = 1 % n;
  for (base %= n; exponent != 0; exponent >>= 1U) {
    if ((exponent & 1U) != 0) result = result * base % n;
    base = base * base % n;
  }
  return result;
}

}  // namespace

bool is_prime(std::uint64_t n) noexcept {
  require_small(n);
  return n >= 2 && least_prime_factor(n) == n;
}

std::optional<PrimePower> as_prime_power(std::uint64_t q) noexcept {
  require_small(q);
  if (q < 2) return std::nullopt;
  const std::uint64_t prime = least_prime_factor(q);
  std::uint32_t exponent = 0;
  for (; q % prime == 0; q /= prime) ++exponent;
  if (q != 1) return std::nullopt;
  return PrimePower{static_cast<std::uint32_t>(prime), exponent};
}

std::vector<std::uint64_t> prime_factors(std::uint64_t n) {
  require_small(n);
  std::vector<std::uint64_t> primes;
  while (n >= 2) {
    const std::uint64_t prime = least_prime_factor(n);
    primes.push_back(prime);
    while (n % prime == 0) n /= prime;
  }
  return primes;
}

std::uint64_t euler_phi(std::uint64_t n) {
  contract(n != 0, "phi is asked about a positive number");
  std::uint64_t phi = n;
  for (const std::uint64_t prime : prime_factors(n)) phi -= phi / prime;
  return phi;
}

int moebius(std::uint64_t n) {
  contract(n != 0, "the Moebius function is asked about a positive number");
  int sign = 1;
  for (const std::uint64_t prime : prime_factors(n)) {
    if (n / prime % prime == 0) return 0;
    sign = -sign;
  }
  return sign;
}

std::optional<std::uint32_t> multiplicative_order(std::uint64_t q, std::uint64_t n) noexcept {
  require_small(q);
  require_small(n);
  contract(n != 0, "an order is taken modulo a positive number");
  if (std::gcd(q, n) != 1) return std::nullopt;
  std::uint64_t order = euler_phi(n);
  for (const std::uint64_t prime : prime_factors(order))
    while (order % prime == 0 && power_modulo(q, order / prime, n) == 1 % n) order /= prime;
  return static_cast<std::uint32_t>(order);
}

}  // namespace assize::field
