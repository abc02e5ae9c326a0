// GF(p^m), q = p^m up to 2^16, with the modulus always stated.
//
// An element is an integer below q whose base-p digits, lowest first, are its coefficients in the polynomial basis
// 1, x, x^2, ... modulo the field's modulus (for m = 1 simply a residue).  The tables are built once; a Field is
// immutable afterwards, cheap to copy (tables are shared) and safe to use from many threads.  Arithmetic sits in the
// inner loops of everything else, so it is inline and does not check that its arguments are below q.
#pragma once
#include <cstddef>
#include <cstdint>
#include <memory>
#include <span>
#include <utility>
#include <vector>

#include "base/contract.hpp"
#include "base/result.hpp"

namespace assize::field {

using Element = std::uint16_t;

/// Largest order for which a Field can be made: every prime power up to 256, primes and powers of 2 up to this.
inline constexpr std::uint32_t largest_order = 1U << 16;

class Multiplier;

class Field {
 public:
  /// GF(p), p prime.
  static Result<Field> prime(std::uint32_t p);
  /// GF(p^m).  `modulus` has m + 1 coefficients below p, lowest first, leading coefficient 1; it must be irreducible
  /// over GF(p).  For m = 1 the modulus must be empty.  Failures say what is wrong and give the cure; `where` is empty.
  static Result<Field> create(std::uint32_t order, std::span<const Element> modulus);
  /// GF(2), for code that needs a field to begin with.
  static const Field& binary();

  // A Field is never empty: moving copies, which costs one reference count.
  Field(const Field&) noexcept = default;
  Field& operator=(const Field&) noexcept = default;
  ~Field() = default;

  [[nodiscard]] std::uint32_t order() const noexcept { return tables_->order; }                    ///< q
  [[nodiscard]] std::uint32_t characteristic() const noexcept { return tables_->characteristic; }  ///< p
  [[nodiscard]] std::uint32_t degree() const noexcept { return tables_->degree; }                  ///< m
  /// m + 1 coefficients, empty for m = 1.
  [[nodiscard]] std::span<const Element> modulus() const noexcept { return tables_->modulus; }

  [[nodiscard]] Element add(Element a, Element b) const noexcept;
  [[nodiscard]] Element subtract(Element a, Element b) const noexcept;
  [[nodiscard]] Element negate(Element a) const noexcept;
  [[nodiscard]] Element multiply(Element a, Element b) const noexcept;
  [[nodiscard]] Element inverse(Element a) const noexcept;                        ///< a != 0 (contract)
  [[nodiscard]] Element divide(Element a, Element b) const noexcept;              ///< b != 0 (contract)
  [[nodiscard]] Element power(Element a, std::uint64_t exponent) const noexcept;  ///< 0^0 = 1
  /// Multiplication by one fixed factor, which must not be 0 (contract), for long rows.
  [[nodiscard]] Multiplier multiplier(Element factor) const noexcept;

  /// Base-p digits of an element, lowest first, m of them; and back (at most m digits below p: contract).
  [[nodiscard]] std::vector<Element> digits(Element a) const;
  [[nodiscard]] Element from_digits(std::span<const Element> digits) const;
  /// The class of x; 1 has no such meaning for m = 1, where this is a broken contract.
  [[nodiscard]] Element class_of_x() const noexcept;

  /// Multiplicative order of a, which must not be 0 (contract).
  [[nodiscard]] std::uint32_t order_of(Element a) const noexcept;
  [[nodiscard]] bool is_primitive(Element a) const noexcept;  ///< false for 0
  /// All phi(q-1) primitive elements, ascending.
  [[nodiscard]] std::vector<Element> primitive_elements() const;
  /// The least primitive element: base of the logarithm table.
  [[nodiscard]] Element least_primitive_element() const noexcept { return tables_->least_primitive; }
  /// Exponent e < q-1 with least_primitive_element()^e = a; a must not be 0 (contract).
  [[nodiscard]] std::uint32_t logarithm(Element a) const noexcept;

  [[nodiscard]] bool contains(std::uint64_t number) const noexcept { return number < order(); }
  friend bool operator==(const Field& a, const Field& b) noexcept;  ///< same order and same modulus

 private:
  struct Tables {
    std::uint32_t order = 0;
    std::uint32_t characteristic = 0;
    std::uint32_t degree = 0;
    Element least_primitive = 1;
    std::vector<Element> modulus;
    std::vector<Element> logarithm;  ///< by element; the entry of 0 is unused
    std::vector<Element> antilog;    ///< 2(q-1) entries, so that the sum of two logarithms needs no reduction
    std::vector<Element> inverse;    ///< by element; the entry of 0 is unused
    std::vector<Element> sum;        ///< q x q; only where addition is neither exclusive or nor modulo p
    std::vector<Element> negative;   ///< by element; only together with `sum`
  };
  explicit Field(std::shared_ptr<const Tables> tables) noexcept : tables_(std::move(tables)) {}
  /// Parameters that have already been checked: p prime, modulus irreducible of degree m (empty for m = 1).
  static Field from_checked(std::uint32_t p, std::uint32_t m, std::span<const Element> modulus);

  std::shared_ptr<const Tables> tables_;
};

/// a -> factor * a, with the logarithm of the factor looked up once.  Valid while a copy of its Field lives.
class Multiplier {
 public:
  [[nodiscard]] Element operator()(Element a) const noexcept { return a == 0 ? a : shifted_antilog_[logarithm_[a]]; }

 private:
  friend class Field;
  Multiplier(const Element* logarithm, const Element* shifted_antilog) noexcept
      : logarithm_(logarithm), shifted_antilog_(shifted_antilog) {}
  const Element* logarithm_;
  const Element* shifted_antilog_;
};

inline Element Field::add(Element a, Element b) const noexcept {
  const Tables& t = *tables_;
  if (t.characteristic == 2) return a ^ b;
  if (t.degree > 1) return t.sum[std::size_t{a} * t.order + b];
  const std::uint32_t sum = std::uint32_t{a} + b;
  return static_cast<Element>(sum < t.order ? sum : sum - t.order);
}

inline Element Field::negate(Element a) const noexcept {
  const Tables& t = *tables_;
  if (t.characteristic == 2 || a == 0) return a;
  if (t.degree > 1) return t.negative[a];
  return static_cast<Element>(t.order - a);
}

inline Element Field::subtract(Element a, Element b) const noexcept { return add(a, negate(b)); }

inline Element Field::multiply(Element a, Element b) const noexcept {
  const Tables& t = *tables_;
  if (a == 0 || b == 0) return 0;
  return t.antilog[std::size_t{t.logarithm[a]} + t.logarithm[b]];
}

inline Element Field::inverse(Element a) const noexcept {
  contract(a != 0, "only a nonzero element is inverted");
  return tables_->inverse[a];
}

inline Element Field::divide(Element a, Element b) const noexcept { return multiply(a, inverse(b)); }

inline Multiplier Field::multiplier(Element factor) const noexcept {
  contract(factor != 0, "a multiplier is not 0");
  return {tables_->logarithm.data(), tables_->antilog.data() + tables_->logarithm[factor]};
}

inline std::uint32_t Field::logarithm(Element a) const noexcept {
  contract(a != 0, "only a nonzero element has a logarithm");
  return tables_->logarithm[a];
}

}  // namespace assize::field
