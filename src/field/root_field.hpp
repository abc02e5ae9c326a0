// The field in which a cyclic code has its zeros: GF(p)[X] modulo a stated polynomial, up to 2^32 elements, no tables.
#pragma once
#include <cstdint>
#include <map>
#include <optional>

#include "base/result.hpp"
#include "field/polynomial.hpp"

namespace assize::field {

class RootField {
 public:
  using Value = Polynomial;  ///< over GF(p), of lower degree than the modulus

  /// `modulus` must be monic and irreducible over `prime`, a prime field, and p^degree at most 2^32 (contract).
  RootField(Field prime, Polynomial modulus);

  [[nodiscard]] std::uint64_t order() const noexcept { return order_; }
  [[nodiscard]] Value class_of_x() const;
  [[nodiscard]] Value multiply(const Value& a, const Value& b) const;
  [[nodiscard]] Value power(const Value& a, std::uint64_t exponent) const;
  [[nodiscard]] std::uint64_t order_of(const Value& a) const;  ///< a != 0 (contract)

 private:
  friend class SubfieldOfRoots;
  Field prime_;
  Polynomial modulus_;
  std::uint64_t order_;
};

/// GF(q) inside a root field: x goes to the least power of the root field's x that is a root of GF(q)'s modulus.
class SubfieldOfRoots {
 public:
  /// Nothing if no power of the root field's x is such a root, or GF(q) is no subfield.
  static std::optional<SubfieldOfRoots> find(const Field& small, const RootField& roots);

  /// The monic polynomial over GF(q) whose zeros are zero, zero^q, zero^(q^2), ...
  [[nodiscard]] Polynomial minimal_polynomial(const RootField::Value& zero) const;

 private:
  SubfieldOfRoots(const Field& small, const RootField& roots) : small_(small), roots_(&roots) {}
  Field small_;
  const RootField* roots_;
  std::map<RootField::Value, Element> preimages_;
};

}  // namespace assize::field
