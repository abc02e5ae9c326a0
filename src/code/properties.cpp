// Divisors: even rows make an even binary code; rows of weights divisible by 4 that are orthogonal to each other make a
// doubly-even one; self-orthogonal ternary and Hermitian self-orthogonal quaternary codes have weights divisible by 3
// and 2 (A. M. Gleason; F. J. MacWilliams, N. J. A. Sloane, The Theory of Error-Correcting Codes, 1977, ch. 19).
#include "code/properties.hpp"

#include <algorithm>

namespace assize::code {

using field::Element;

namespace {

constexpr std::uint64_t most_operations = 1ULL << 32;

/// Square root of the order, where the field has one.
std::optional<std::uint32_t> conjugation(const field::Field& field) {
  if (field.degree() % 2 != 0) return std::nullopt;
  std::uint32_t power = 1;
  for (std::uint32_t i = 0; i < field.degree() / 2; ++i) power *= field.characteristic();
  return power;
}

bool orthogonal(const field::Field& field, std::span<const Element> a, std::span<const Element> b) {
  Element sum = 0;
  for (std::size_t i = 0; i < a.size(); ++i) sum = field.add(sum, field.multiply(a[i], b[i]));
  return sum == 0;
}

/// Every row of `rows` is orthogonal to every row of `others`.
bool all_orthogonal(const field::Field& field, const field::Matrix& rows, const field::Matrix& others) {
  for (std::size_t i = 0; i < rows.rows(); ++i)
    for (std::size_t j = 0; j < others.rows(); ++j)
      if (!orthogonal(field, rows.row(i), others.row(j))) return false;
  return true;
}

std::uint32_t divisor_of(const LinearCode& code, const field::Matrix& rows, const Properties& known) {
  const auto every_weight = [&rows](std::uint32_t divisor) {
    for (std::size_t i = 0; i < rows.rows(); ++i)
      if (weight(rows.row(i)) % divisor != 0) return false;
    return true;
  };
  if (code.order() == 2) return known.self_orthogonal && every_weight(4) ? 4 : every_weight(2) ? 2 : 1;
  if (code.order() == 3 && known.self_orthogonal) return 3;
  if (code.order() == 4 && known.hermitian_self_orthogonal) return 2;
  return 1;
}

}  // namespace

std::optional<Properties> properties(const LinearCode& code) {
  const std::uint64_t k = code.dimension();
  if (k * k > most_operations / code.length()) return std::nullopt;
  const field::Field& field = code.field();
  const field::Matrix rows = code.generator();
  Properties out;
  out.self_orthogonal = all_orthogonal(field, rows, rows);
  out.self_dual = out.self_orthogonal && 2 * k == code.length();
  if (const auto exponent = conjugation(field)) {
    field::Matrix conjugated = rows;
    for (std::size_t i = 0; i < rows.rows(); ++i)
      for (Element& symbol : conjugated.row(i)) symbol = field.power(symbol, *exponent);
    out.hermitian_self_orthogonal = all_orthogonal(field, rows, conjugated);
    out.hermitian_self_dual = out.hermitian_self_orthogonal && 2 * k == code.length();
  }
  out.all_one = code.contains(std::vector<Element>(code.length(), 1));
  out.divisor = divisor_of(code, rows, out);
  return out;
}

}  // namespace assize::code
