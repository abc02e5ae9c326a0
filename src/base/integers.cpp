// Powers and decimal spellings; the checked operations themselves are inline in the header.
#include "base/integers.hpp"

#include <charconv>

namespace assize {

std::optional<std::uint64_t> power_if_fits(std::uint64_t base, std::uint64_t exponent) noexcept {
  std::uint64_t result = 1;
  if (base <= 1) return exponent == 0 ? 1 : base;
  for (std::uint64_t i = 0; i < exponent; ++i)
    if (__builtin_mul_overflow(result, base, &result)) return std::nullopt;
  return result;
}

BigInteger power(std::uint64_t base, std::uint64_t exponent) {
  contract(exponent <= (1U << 24), "a power stays within reason");
  return boost::multiprecision::pow(BigInteger(base), static_cast<unsigned>(exponent));
}

namespace {
bool plain_digits(std::string_view text) noexcept {
  if (text.empty() || (text.size() > 1 && text.front() == '0')) return false;
  return text.find_first_not_of("0123456789") == std::string_view::npos;
}
}  // namespace

std::optional<std::uint64_t> parse_decimal(std::string_view text, std::uint64_t largest) noexcept {
  if (!plain_digits(text)) return std::nullopt;
  std::uint64_t value = 0;
  const auto [end, error] = std::from_chars(text.data(), text.data() + text.size(), value);
  if (error != std::errc{} || end != text.data() + text.size() || value > largest) return std::nullopt;
  return value;
}

std::optional<BigInteger> parse_big_decimal(std::string_view text) {
  if (!plain_digits(text) || text.size() > 4096) return std::nullopt;
  return BigInteger(std::string(text));
}

std::string to_decimal(const BigInteger& value) { return value.str(); }

std::string grouped_decimal(const BigInteger& value) {
  std::string digits = to_decimal(value);
  for (std::size_t from_end = 3; from_end < digits.size(); from_end += 4)
    digits.insert(digits.size() - from_end, 1, ',');
  return digits;
}

}  // namespace assize
