// Exact integers: checked 64-bit sums and products, 128 bits, and unbounded counts.
//
// Every number that a claim rests on goes through here; an overflow is a broken contract, never a wrapped value.
#pragma once
#include <boost/multiprecision/cpp_int.hpp>
#include <cstdint>
#include <optional>
#include <string>
#include <string_view>

#include "base/contract.hpp"

namespace assize {

__extension__ typedef unsigned __int128 Uint128;  // pedantic-clean spelling

/// Unbounded integer: counts of words, powers of q.
using BigInteger = boost::multiprecision::cpp_int;

/// a + b, which must fit.
inline std::uint64_t add_exact(std::uint64_t a, std::uint64_t b) noexcept {
  std::uint64_t sum = 0;
  contract(!__builtin_add_overflow(a, b, &sum), "a sum fits 64 bits");
  return sum;
}

/// a * b, which must fit.
inline std::uint64_t mul_exact(std::uint64_t a, std::uint64_t b) noexcept {
  std::uint64_t product = 0;
  contract(!__builtin_mul_overflow(a, b, &product), "a product fits 64 bits");
  return product;
}

/// base^exponent, or nothing where that does not fit 64 bits.
std::optional<std::uint64_t> power_if_fits(std::uint64_t base, std::uint64_t exponent) noexcept;

/// base^exponent, unbounded.
BigInteger power(std::uint64_t base, std::uint64_t exponent);

/// Decimal digits only: no sign, no blank, no leading zero, at most `largest`.  Nothing else is a number.
std::optional<std::uint64_t> parse_decimal(std::string_view text, std::uint64_t largest = UINT64_MAX) noexcept;

/// The unbounded form of parse_decimal; texts of more than 4,096 digits are refused.
std::optional<BigInteger> parse_big_decimal(std::string_view text);

/// Decimal spelling.
std::string to_decimal(const BigInteger& value);

/// Decimal spelling with a comma between groups of three digits, for people: 1234567 -> "1,234,567".
std::string grouped_decimal(const BigInteger& value);

}  // namespace assize
