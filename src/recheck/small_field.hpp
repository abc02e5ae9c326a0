// Arithmetic of GF(q), from the definition in section 1 of the format: base-p digits are the coefficients of a
// polynomial, products are reduced modulo the field's modulus.
//
// The plain schoolbook product is the definition; logarithm tables are made from it and from nothing else.
#pragma once
#include <cstdint>
#include <memory>
#include <string>
#include <vector>

#include "base/result.hpp"

namespace assize::recheck {

/// An element of a field, below its order.
using Symbol = std::uint16_t;

class Field {
 public:
  /// Checks the order and the modulus (lowest coefficient first; empty for a prime order).
  static Result<std::shared_ptr<const Field>> make(std::uint64_t order, std::vector<Symbol> modulus,
                                                   const std::string& where);

  [[nodiscard]] std::uint32_t order() const noexcept { return order_; }
  [[nodiscard]] std::uint32_t characteristic() const noexcept { return characteristic_; }
  [[nodiscard]] std::uint32_t degree() const noexcept { return degree_; }
  /// Lowest coefficient first; empty for a prime order.
  [[nodiscard]] const std::vector<Symbol>& modulus() const noexcept { return modulus_; }
  [[nodiscard]] bool same_as(const Field& other) const noexcept {
    return order_ == other.order_ && modulus_ == other.modulus_;
  }

  [[nodiscard]] Symbol add(Symbol a, Symbol b) const noexcept;
  [[nodiscard]] Symbol negate(Symbol a) const noexcept { return negative_[a]; }
  [[nodiscard]] Symbol subtract(Symbol a, Symbol b) const noexcept { return add(a, negative_[b]); }
  [[nodiscard]] Symbol multiply(Symbol a, Symbol b) const noexcept {
    return a == 0 || b == 0 ? Symbol{0} : power_of_root_[std::size_t{logarithm_[a]} + logarithm_[b]];
  }
  [[nodiscard]] Symbol inverse(Symbol a) const noexcept {  // of a non-zero element
    return power_of_root_[order_ - 1 - logarithm_[a]];
  }
  /// a^exponent; 0^0 is 1.
  [[nodiscard]] Symbol power(Symbol a, std::uint64_t exponent) const noexcept;
  /// The powers of `a` are all non-zero elements.
  [[nodiscard]] bool is_primitive(Symbol a) const noexcept;
  /// The definition of the product, slow.
  [[nodiscard]] Symbol multiply_by_definition(Symbol a, Symbol b) const noexcept;

 private:
  Field(std::uint32_t order, std::uint32_t characteristic, std::uint32_t degree, std::vector<Symbol> modulus);
  [[nodiscard]] Symbol add_by_definition(Symbol a, Symbol b) const noexcept;
  void make_tables();

  std::uint32_t order_;
  std::uint32_t characteristic_;
  std::uint32_t degree_;
  std::vector<Symbol> modulus_;
  std::vector<Symbol> negative_;
  std::vector<Symbol> sum_;            // order x order, only for odd prime powers that are not primes
  std::vector<Symbol> power_of_root_;  // twice the cycle, so that a sum of two logarithms is an index
  std::vector<Symbol> logarithm_;
};

using FieldPtr = std::shared_ptr<const Field>;

/// A monic polynomial of degree >= 1 over GF(p) has no divisor of a lower degree >= 1; tries all up to half its degree.
bool irreducible(const std::vector<Symbol>& modulus, std::uint64_t p);

}  // namespace assize::recheck
