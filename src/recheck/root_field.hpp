// The root field of a BCH code (format text, section 4): polynomials over GF(p) modulo an irreducible one, kept as
// digits and multiplied digit by digit.  It may have 2^32 elements, so there are no tables.
#pragma once
#include <optional>

#include "recheck/brake.hpp"
#include "recheck/small_field.hpp"

namespace assize::recheck {

class RootField {
 public:
  using Element = std::vector<Symbol>;  ///< one digit below p for each power of X, lowest first

  /// The modulus is monic and irreducible over GF(p), of degree 1 to 32; p^degree is at most 2^32.
  RootField(std::uint32_t p, std::vector<Symbol> modulus);

  [[nodiscard]] std::size_t degree() const noexcept { return modulus_.size() - 1; }
  [[nodiscard]] std::uint64_t order() const noexcept { return order_; }
  [[nodiscard]] Element one() const;
  [[nodiscard]] Element x() const;
  [[nodiscard]] Element multiply(const Element& a, const Element& b) const;
  [[nodiscard]] Element power(const Element& a, std::uint64_t exponent) const;
  /// The least e >= 1 with a^e = 1; 0 for the zero element.
  [[nodiscard]] std::uint64_t multiplicative_order(const Element& a) const;
  /// The least power X^e, e = 0, 1, 2, ..., that is a root of the modulus of GF(q); q - 1 must divide order() - 1.
  [[nodiscard]] std::optional<Element> least_power_rooting(const Field& small, const Brake& brake) const;

 private:
  std::uint64_t p_;
  std::uint64_t order_ = 1;
  std::vector<Symbol> modulus_;
};

}  // namespace assize::recheck
