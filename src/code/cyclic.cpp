// Cyclic and shortened cyclic codes: multiples of a generator polynomial, highest power first.
#include "code/families.hpp"
#include "field/polynomial.hpp"

namespace assize::code {

using field::Element;
using field::Polynomial;

LinearCode polynomial_code(const field::Field& field, std::uint32_t length, const Polynomial& generator) {
  const auto r = static_cast<std::uint32_t>(generator.size() - 1);
  const std::uint32_t k = length - r;
  ReducedGenerator out;
  out.length = length;
  for (std::uint32_t i = 0; i < k; ++i) out.pivots.push_back(i);
  for (std::uint32_t j = k; j < length; ++j) out.others.push_back(j);
  out.tail = field::Matrix(k, r);
  const Polynomial unit = field::monic(field, generator);
  // x^e modulo the generator for e = r, r + 1, ...: multiply by x, subtract a multiple of the generator.
  std::vector<Element> rest(r, 0);
  for (std::uint32_t e = r; e < length; ++e) {
    Element carry = 1;
    if (e > r && r > 0) {
      carry = rest[r - 1];
      for (std::uint32_t j = r - 1; j > 0; --j) rest[j] = rest[j - 1];
      rest[0] = 0;
    }
    for (std::uint32_t j = 0; j < r; ++j) rest[j] = field.subtract(rest[j], field.multiply(carry, unit[j]));
    // The word x^e - rest: position i carries the coefficient of x^(length-1-i).
    for (std::uint32_t j = 0; j < r; ++j) out.tail.at(length - 1 - e, j) = field.negate(rest[r - 1 - j]);
  }
  return {field, std::move(out)};
}

Result<LinearCode> build(const sheet::Cyclic& family, const sheet::Description& in) {
  const Polynomial& generator = family.generator.value;
  const std::uint64_t n = family.codeword_length.value;
  const std::uint64_t r = generator.size() - 1;
  const std::string where = in.place(family.generator.line);
  if (n > sheet::largest_length)
    return Failure{in.place(family.codeword_length.line), "the words would have " + std::to_string(n) + " symbols",
                   "lengths up to " + std::to_string(sheet::largest_length) + " are taken"};
  if (r >= n)
    return Failure{
        in.place(family.codeword_length.line),
        "a generator of degree " + std::to_string(r) + " leaves no data in " + std::to_string(n) + " symbols",
        "codeword_length counts the check symbols; make it more than " + std::to_string(r) + ", or write data_length"};
  if (generator.front() == 0)
    return Failure{where, "the generator " + field::to_algebra(generator) + " is divisible by x", "divide it by x"};
  if (const auto fits = check_size(in, family.codeword_length.line, n - r, n); !fits) return fits.error();
  if (!family.shortened) {
    // x^n mod g by repeated squaring; 1 exactly when g divides x^n - 1.
    const Polynomial power = field::power_modulo(in.field, {0, 1}, n, generator);
    const Polynomial one = field::remainder(in.field, {1}, generator);
    if (power != one)
      return Failure{where, field::to_algebra(generator) + " does not divide x^" + std::to_string(n) + " - 1",
                     "a cyclic code needs that; for any other length write family = \"shortened-cyclic\""};
  }
  return polynomial_code(in.field, static_cast<std::uint32_t>(n), generator);
}

}  // namespace assize::code
