// Arithmetic by polynomials; it runs once for each code, so clarity comes before speed.
#include "field/root_field.hpp"

#include <numeric>

#include "base/integers.hpp"
#include "field/number_theory.hpp"

namespace assize::field {

RootField::RootField(Field prime, Polynomial modulus)
    : prime_(std::move(prime)), modulus_(std::move(modulus)), order_(0) {
  contract(prime_.degree() == 1 && modulus_.size() >= 2 && modulus_.back() == 1, "a root field extends a prime field");
  const auto order = power_if_fits(prime_.order(), modulus_.size() - 1);
  contract(order && *order <= (1ULL << 32), "a root field has at most 2^32 elements");
  order_ = *order;
}

RootField::Value RootField::class_of_x() const { return remainder(prime_, {0, 1}, modulus_); }

RootField::Value RootField::multiply(const Value& a, const Value& b) const {
  return remainder(prime_, field::multiply(prime_, a, b), modulus_);
}

RootField::Value RootField::power(const Value& a, std::uint64_t exponent) const {
  return power_modulo(prime_, a, exponent, modulus_);
}

std::uint64_t RootField::order_of(const Value& a) const {
  contract(!a.empty(), "zero has no order");
  std::uint64_t order = order_ - 1;
  for (const std::uint64_t factor : prime_factors(order_ - 1))
    while (order % factor == 0 && power(a, order / factor) == Value{1}) order /= factor;
  return order;
}

std::optional<SubfieldOfRoots> SubfieldOfRoots::find(const Field& small, const RootField& roots) {
  SubfieldOfRoots out(small, roots);
  const Field& prime = roots.prime_;
  if (small.characteristic() != prime.order() || (roots.modulus_.size() - 1) % small.degree() != 0) return std::nullopt;
  RootField::Value image{1};
  if (small.degree() > 1) {
    // Powers X^e in GF(q) are those with X^(e(q-1)) = 1.
    const std::uint64_t group = small.order() - 1;
    const std::uint64_t order = roots.order_of(roots.class_of_x());
    const std::uint64_t common = std::gcd(order, group);
    const RootField::Value step = roots.power(roots.class_of_x(), order / common);
    bool found = false;
    for (std::uint64_t j = 0; j < common && !found; ++j) {
      if (j > 0) image = roots.multiply(image, step);
      RootField::Value value;
      for (std::size_t i = small.modulus().size(); i-- > 0;)
        value = add(prime, roots.multiply(value, image),
                    small.modulus()[i] == 0 ? Polynomial{} : Polynomial{small.modulus()[i]});
      found = value.empty();
    }
    if (!found) return std::nullopt;
  }
  for (std::uint32_t element = 0; element < small.order(); ++element) {
    RootField::Value sum;
    RootField::Value power{1};
    for (const Element digit : small.digits(static_cast<Element>(element))) {
      if (digit != 0) sum = add(prime, sum, field::multiply(prime, {digit}, power));
      power = roots.multiply(power, image);
    }
    out.preimages_.emplace(std::move(sum), static_cast<Element>(element));
  }
  return out;
}

Polynomial SubfieldOfRoots::minimal_polynomial(const RootField::Value& zero) const {
  const Field& prime = roots_->prime_;
  std::vector<RootField::Value> product{{1}};  // coefficients in the root field, lowest first
  RootField::Value conjugate = zero;
  do {
    std::vector<RootField::Value> next(product.size() + 1);
    for (std::size_t i = 0; i < product.size(); ++i) {
      next[i + 1] = add(prime, next[i + 1], product[i]);
      next[i] = subtract(prime, next[i], roots_->multiply(conjugate, product[i]));
    }
    product = std::move(next);
    conjugate = roots_->power(conjugate, small_.order());
  } while (conjugate != zero);
  Polynomial out;
  for (const RootField::Value& coefficient : product) {
    const auto preimage = preimages_.find(coefficient);
    contract(preimage != preimages_.end(), "a minimal polynomial has its coefficients in the small field");
    out.push_back(preimage->second);
  }
  return out;
}

}  // namespace assize::field
