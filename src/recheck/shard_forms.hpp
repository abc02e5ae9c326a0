// What is known about a shard without executing it: its size, its prefix, and the closed forms of its moments
// (format text, section 5, `enumeration`).
#pragma once
#include <vector>

#include "base/integers.hpp"
#include "recheck/reduction.hpp"

namespace assize::recheck {

struct Moments {
  BigInteger first;   ///< sum of the weights
  BigInteger second;  ///< sum of the squared weights
};

class ShardForms {
 public:
  /// Whether the numbers of these shards have at most 4,096 digits, so that a certificate can name them.
  static bool expressible(std::uint64_t order, std::uint64_t exponent) noexcept;

  /// Needs expressible(q, free) and expressible(q, k - free).
  ShardForms(FieldPtr field, const Reduced& code, std::size_t free);

  [[nodiscard]] const BigInteger& shards() const noexcept { return shards_; }
  [[nodiscard]] BigInteger size(const BigInteger& number) const;
  /// The word of the prefix of a shard; the zero word for shard 0.
  [[nodiscard]] std::vector<Symbol> offset(const BigInteger& number) const;
  [[nodiscard]] Moments moments(const BigInteger& number, const std::vector<Symbol>& offset) const;
  /// The free rows g_1, ..., g_s.
  [[nodiscard]] Matrix free_rows() const;
  [[nodiscard]] std::size_t free() const noexcept { return free_; }
  [[nodiscard]] const Field& field() const noexcept { return *field_; }
  [[nodiscard]] std::size_t length() const noexcept { return code_.generator.columns; }
  [[nodiscard]] std::size_t prefix_rows() const noexcept { return code_.generator.rows - free_; }

 private:
  void group_columns();

  FieldPtr field_;
  const Reduced& code_;
  std::size_t free_;
  BigInteger shards_;
  BigInteger coset_;                 // q^s
  BigInteger zeros_of_one_;          // words of a coset with zero at a given place: q^(s-1), or 0 where s = 0
  BigInteger zeros_of_two_;          // ... at two independent places: q^(s-2), or 0 where s < 2
  std::vector<std::size_t> fixed_;   // positions where every g_j is zero
  std::vector<std::size_t> moving_;  // the others, proportional columns next to each other
  std::vector<Symbol> leading_;      // for each of `moving_`: the first non-zero symbol of its column
  std::vector<std::size_t> ends_;    // where the groups of proportional columns end in `moving_`
};

}  // namespace assize::recheck
