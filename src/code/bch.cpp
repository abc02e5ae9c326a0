// Cyclic codes given by their zeros: BCH codes and quadratic residue codes.
#include "code/families.hpp"
#include "field/number_theory.hpp"
#include "field/polynomial.hpp"
#include "field/root_field.hpp"

namespace assize::code {

using field::Polynomial;

Result<LinearCode> build(const sheet::Bch& family, const sheet::Description& in) {
  const std::uint64_t n = family.codeword_length.value;
  const field::Field& small = in.field;
  const auto prime = field::Field::prime(small.characteristic());
  if (!prime) return prime.error();
  const field::RootField roots(*prime, family.root_modulus.value);
  const std::string where = in.place(family.root_modulus.line);
  const auto beta = roots.power(roots.class_of_x(), (roots.order() - 1) / n);
  if (roots.order_of(beta) != n)
    return Failure{where,
                   "with this root modulus, x^((q^t-1)/n) has order " + std::to_string(roots.order_of(beta)) +
                       ", not " + std::to_string(n),
                   "state a root modulus that is primitive, or leave it out"};
  const auto subfield = field::SubfieldOfRoots::find(small, roots);
  if (!subfield)
    return Failure{
        where, "no power of the root field's x is a root of the modulus of GF(" + std::to_string(small.order()) + ")",
        "state a root modulus that is primitive, or leave it out"};
  // One minimal polynomial for each cyclotomic coset that holds one of the exponents.
  std::vector<bool> covered(n, false);
  Polynomial generator{1};
  for (std::uint64_t i = 0; i + 1 < family.designed_distance.value; ++i) {
    const std::uint64_t exponent = (family.first_exponent.value + i) % n;
    if (covered[exponent]) continue;
    for (std::uint64_t e = exponent; !covered[e]; e = e * small.order() % n) covered[e] = true;
    generator = field::multiply(small, generator, subfield->minimal_polynomial(roots.power(beta, exponent)));
  }
  const std::uint64_t r = generator.size() - 1;
  if (r == n)
    return Failure{in.place(family.designed_distance.line), "these zeros leave no word but the zero word",
                   "write a smaller designed_distance"};
  if (const auto fits = check_size(in, family.codeword_length.line, n - r, n); !fits) return fits.error();
  return polynomial_code(small, static_cast<std::uint32_t>(n), generator);
}

Result<LinearCode> build(const sheet::QuadraticResidue& family, const sheet::Description& in) {
  const std::uint64_t n = family.prime.value;
  if (const auto fits = check_size(in, family.prime.line, (n + 1) / 2, n); !fits) return fits.error();
  return polynomial_code(in.field, static_cast<std::uint32_t>(n), family.generator);
}

}  // namespace assize::code
