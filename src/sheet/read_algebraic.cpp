// Families whose generator follows from zeros in a larger field: BCH and quadratic residue codes.
#include "base/integers.hpp"
#include "field/number_theory.hpp"
#include "field/quadratic_residue.hpp"
#include "sheet/family_reading.hpp"
#include "sheet/polynomial_notation.hpp"

namespace assize::sheet {

namespace {

/// Largest length of a quadratic residue code: its generator matrix stays within the limit of codes.
constexpr std::uint64_t largest_residue_prime = 16381;
constexpr std::uint64_t largest_root_field = 1ULL << 32;

/// The first primitive polynomial, coefficients compared as numbers from the top.
field::Polynomial least_primitive(const field::Field& prime, std::size_t degree) {
  for (std::uint64_t number = 0;; ++number) {
    field::Polynomial candidate = field::nth_monic(prime, degree, number);
    if (field::is_primitive(prime, candidate)) return candidate;
  }
}

}  // namespace

Result<Family> read_bch(Reading& in) {
  Bch out;
  const auto length = codeword_length(in);
  if (!length) return length.error();
  out.codeword_length = *length;
  if (length->value < 2)
    return in.table.failure(length->line, "a BCH code has at least 2 symbols", "write a larger codeword_length");
  const auto designed = in.table.integer("designed_distance", 2, length->value, "designed_distance = 7");
  if (!designed) return designed.error();
  out.designed_distance = *designed;
  const auto first = in.table.integer("first_exponent", 0, largest_length, "first_exponent = 1");
  if (!first) return first.error();
  out.first_exponent = *first;

  const field::Field& field = in.field();
  const auto t = field::multiplicative_order(field.order(), length->value);
  if (!t)
    return in.table.failure(length->line,
                            "the length " + std::to_string(length->value) + " and the order " +
                                std::to_string(field.order()) + " of the field have a common factor",
                            "a BCH code needs a length without a factor " + std::to_string(field.characteristic()));
  const std::uint64_t degree = std::uint64_t{*t} * field.degree();
  const auto root_order = power_if_fits(field.characteristic(), degree);
  if (!root_order || *root_order > largest_root_field)
    return in.table.failure(length->line,
                            "the zeros of a code of length " + std::to_string(length->value) + " lie in GF(" +
                                std::to_string(field.characteristic()) + "^" + std::to_string(degree) +
                                "), which has more than 2^32 elements",
                            "write family = \"cyclic\" with the generator polynomial itself");
  const auto prime = field::Field::prime(field.characteristic());
  if (!prime) return prime.error();
  if (const Node* written = in.table.optional("root_modulus")) {
    auto read = read_modulus(*written, *prime, in.context.source, "root_modulus");
    if (!read) return read.error();
    out.root_modulus = {std::move(read->coefficients), written->line};
    if (out.root_modulus.value.size() != degree + 1 || out.root_modulus.value.back() != 1 ||
        !field::is_irreducible(*prime, out.root_modulus.value))
      return in.table.failure(written->line,
                              "the root modulus must be a monic irreducible polynomial of degree " +
                                  std::to_string(degree) + " over GF(" + std::to_string(field.characteristic()) + ")",
                              "for example " + field::to_algebra(least_primitive(*prime, degree)));
  } else {
    out.root_modulus = {least_primitive(*prime, degree), 0};
  }
  return Family(std::move(out));
}

Result<Family> read_quadratic_residue(Reading& in) {
  const field::Field& field = in.field();
  if (field.order() > 4)
    return in.table.failure(in.description.field_line, "quadratic-residue is over GF(2), GF(3) or GF(4)",
                            "write order = 2, 3 or 4");
  const auto prime = in.table.integer("prime", 3, largest_residue_prime, "prime = 23");
  if (!prime) return prime.error();
  if (!field::is_prime(prime->value))
    return in.table.failure(prime->line, std::to_string(prime->value) + " is not a prime",
                            "write a prime such as 17, 23 or 31");
  if (prime->value == field.characteristic())
    return in.table.failure(prime->line, "the prime is the characteristic of the field", "write another prime");
  auto generator = field::quadratic_residue_generator(field, static_cast<std::uint32_t>(prime->value));
  if (!generator)
    return in.table.failure(prime->line,
                            std::to_string(field.order()) + " is not a square modulo " + std::to_string(prime->value) +
                                ", so there is no such code",
                            field.order() == 2 ? "over GF(2) write a prime of the form 8 m + 1 or 8 m - 1"
                                               : "over GF(3) write a prime of the form 12 m + 1 or 12 m - 1");
  return Family(QuadraticResidue{*prime, *std::move(generator)});
}

}  // namespace assize::sheet
