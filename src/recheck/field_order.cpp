// Which orders and moduli make a field: factors the order and tries every possible divisor of the modulus.
#include <algorithm>

#include "recheck/small_field.hpp"

namespace assize::recheck {
namespace {

/// Remainder of `dividend` by the monic `divisor` over GF(p) is zero.
bool divides(const std::vector<std::uint64_t>& divisor, std::vector<std::uint64_t> dividend, std::uint64_t p) {
  while (dividend.size() >= divisor.size()) {
    const std::uint64_t lead = dividend.back();
    const std::size_t shift = dividend.size() - divisor.size();
    for (std::size_t i = 0; i < divisor.size(); ++i)
      dividend[shift + i] = (dividend[shift + i] + (p - lead) * divisor[i]) % p;
    dividend.pop_back();
  }
  return std::all_of(dividend.begin(), dividend.end(), [](std::uint64_t c) { return c == 0; });
}

}  // namespace

bool irreducible(const std::vector<Symbol>& modulus, std::uint64_t p) {
  const std::vector<std::uint64_t> whole(modulus.begin(), modulus.end());
  const std::size_t degree = whole.size() - 1;
  for (std::size_t d = 1; d <= degree / 2; ++d) {
    std::vector<std::uint64_t> divisor(d + 1, 0);
    divisor[d] = 1;
    while (true) {  // counts through all lower coefficients
      if (divides(divisor, whole, p)) return false;
      std::size_t i = 0;
      while (i < d && divisor[i] == p - 1) divisor[i++] = 0;
      if (i == d) break;
      ++divisor[i];
    }
  }
  return true;
}

Result<FieldPtr> Field::make(std::uint64_t order, std::vector<Symbol> modulus, const std::string& where) {
  if (order < 2 || order > 65536) return Failure{where, "the order of a field is from 2 to 65536", ""};
  std::uint64_t p = 2;
  while (order % p != 0) ++p;
  std::uint32_t degree = 0;
  std::uint64_t rest = order;
  for (; rest % p == 0; rest /= p) ++degree;
  if (rest != 1) return Failure{where, "the order of a field is a power of a prime", ""};
  if (order > 256 && degree > 1 && p != 2)
    return Failure{where, "above 256 only primes and powers of 2 are orders in this format", ""};
  if (degree == 1 && !modulus.empty()) return Failure{where, "a prime order has no modulus", ""};
  if (degree > 1) {
    if (modulus.size() != degree + 1 || modulus.back() != 1)
      return Failure{where, "the modulus must be monic of degree " + std::to_string(degree), ""};
    if (std::any_of(modulus.begin(), modulus.end(), [p](Symbol c) { return c >= p; }))
      return Failure{where, "a coefficient of the modulus is not below " + std::to_string(p), ""};
    if (!irreducible(modulus, p)) return Failure{where, "the modulus is reducible", ""};
  }
  return FieldPtr(
      new Field(static_cast<std::uint32_t>(order), static_cast<std::uint32_t>(p), degree, std::move(modulus)));
}

}  // namespace assize::recheck
