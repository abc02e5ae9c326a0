// GF(Q) as a vector space over a subfield GF(q): the coordinates of every element with respect to a basis.
#pragma once
#include <span>
#include <vector>

#include "base/result.hpp"
#include "field/field.hpp"

namespace assize::code {

/// For Q = q^m, every element of GF(Q) as m elements of GF(q).
class Coordinates {
 public:
  /// `embedding` is the image in `large` of GF(q)'s x (any value if q is prime); `basis` has m elements of `large`.
  /// Fails, with an empty `where`, if the embedding is no root of GF(q)'s modulus or the basis is none.
  static Result<Coordinates> create(const field::Field& small, const field::Field& large, field::Element embedding,
                                    std::span<const field::Element> basis);
  /// The basis p^0, p^1, ... of element numbers, whose coordinates over GF(p) are the digits.
  static Coordinates digits(const field::Field& large);
  /// The trivial case Q = q: one coordinate, the element itself.
  static Coordinates identity(const field::Field& field);

  [[nodiscard]] std::uint32_t count() const noexcept { return static_cast<std::uint32_t>(basis_.size()); }
  [[nodiscard]] std::span<const field::Element> basis() const noexcept { return basis_; }
  [[nodiscard]] std::span<const field::Element> of(field::Element element) const noexcept {
    return {table_.data() + element * basis_.size(), basis_.size()};
  }

 private:
  std::vector<field::Element> basis_;
  std::vector<field::Element> table_;
};

}  // namespace assize::code
