// The closed forms.  Two places of a coset depend on each other only if their columns are proportional; the places are
// therefore grouped by the direction of their columns once, and each shard needs one pass over them.
#include "recheck/shard_forms.hpp"

#include <algorithm>
#include <bit>

namespace assize::recheck {

bool ShardForms::expressible(std::uint64_t order, std::uint64_t exponent) noexcept {
  const auto bits = static_cast<std::uint64_t>(std::bit_width(order)) - 1;  // order >= 2^bits
  return exponent * bits <= 13700;                                          // 10^4096 < 2^13607, times 2^20 weights
}

ShardForms::ShardForms(FieldPtr field, const Reduced& code, std::size_t free)
    : field_(std::move(field)), code_(code), free_(free) {
  const std::uint64_t q = field_->order();
  shards_ = 1 + (power(q, prefix_rows()) - 1) / (q - 1);
  coset_ = power(q, free_);
  zeros_of_one_ = free_ >= 1 ? power(q, free_ - 1) : BigInteger(0);
  zeros_of_two_ = free_ >= 2 ? power(q, free_ - 2) : BigInteger(0);
  group_columns();
}

Matrix ShardForms::free_rows() const {
  const Matrix& g = code_.generator;
  Matrix rows(free_, g.columns);
  for (std::size_t r = 0; r < free_; ++r)
    std::copy(g.row(prefix_rows() + r).begin(), g.row(prefix_rows() + r).end(), rows.row(r).begin());
  return rows;
}

void ShardForms::group_columns() {
  const Matrix& g = code_.generator;
  const std::size_t first = prefix_rows();
  std::vector<Symbol> lead(g.columns, 0);
  std::vector<Symbol> scale(g.columns, 0);
  for (std::size_t c = 0; c < g.columns; ++c) {
    for (std::size_t r = first; r < g.rows && lead[c] == 0; ++r) lead[c] = g.row(r)[c];
    if (lead[c] == 0) {
      fixed_.push_back(c);
    } else {
      moving_.push_back(c);
      scale[c] = field_->inverse(lead[c]);
    }
  }
  const auto compare = [&](std::size_t a, std::size_t b) {  // of the columns scaled to leading symbol 1
    for (std::size_t r = first; r < g.rows; ++r) {
      const Symbol x = field_->multiply(g.row(r)[a], scale[a]);
      const Symbol y = field_->multiply(g.row(r)[b], scale[b]);
      if (x != y) return x < y ? -1 : 1;
    }
    return 0;
  };
  std::sort(moving_.begin(), moving_.end(), [&](std::size_t a, std::size_t b) { return compare(a, b) < 0; });
  for (std::size_t i = 0; i < moving_.size(); ++i) {
    leading_.push_back(lead[moving_[i]]);
    if (i + 1 == moving_.size() || compare(moving_[i], moving_[i + 1]) != 0) ends_.push_back(i + 1);
  }
}

BigInteger ShardForms::size(const BigInteger& number) const {
  return number == 0 ? BigInteger((coset_ - 1) / (field_->order() - 1)) : coset_;
}

std::vector<Symbol> ShardForms::offset(const BigInteger& number) const {
  std::vector<Symbol> word(length(), 0);
  if (number == 0) return word;
  const std::uint32_t q = field_->order();
  BigInteger before = 0;  // normalised prefixes with fewer digits
  BigInteger with = 1;    // normalised prefixes with as many digits as `with` has
  while (number > before + with) {
    before += with;
    with *= q;
  }
  BigInteger prefix = with + (number - 1 - before);
  for (std::size_t r = prefix_rows(); r-- > 0 && prefix != 0;) {
    add_multiple(*field_, word, static_cast<Symbol>(static_cast<std::uint32_t>(prefix % q)), code_.generator.row(r));
    prefix /= q;
  }
  return word;
}

Moments ShardForms::moments(const BigInteger& number, const std::vector<Symbol>& offset) const {
  // Place i of the coset is offset_i + lead_i <t, direction>: zero for the same t as its neighbour in the group exactly
  // if offset/lead agree.
  BigInteger fixed = 0;
  for (const std::size_t c : fixed_) fixed += offset[c] != 0 ? 1 : 0;
  const BigInteger moving = moving_.size();
  std::vector<std::uint64_t> same(field_->order(), 0);
  std::uint64_t agreeing = 0;  // ordered pairs; at most 2^40
  std::uint64_t in_groups = 0;
  std::size_t begin = 0;
  for (const std::size_t end : ends_) {
    const auto ratio = [&](std::size_t i) {
      return field_->multiply(offset[moving_[i]], field_->inverse(leading_[i]));
    };
    for (std::size_t i = begin; i < end; ++i) agreeing += 2 * same[ratio(i)]++ + 1;
    for (std::size_t i = begin; i < end; ++i) same[ratio(i)] = 0;
    in_groups += std::uint64_t{end - begin} * (end - begin);
    begin = end;
  }
  const BigInteger one = coset_ - zeros_of_one_;  // words that are non-zero at a moving place
  Moments result;
  result.first = fixed * coset_ + moving * one;
  result.second = fixed * fixed * coset_ + 2 * fixed * moving * one + agreeing * one +
                  BigInteger(in_groups - agreeing) * (coset_ - 2 * zeros_of_one_) +
                  (moving * moving - in_groups) * (coset_ - 2 * zeros_of_one_ + zeros_of_two_);
  if (number == 0) {
    result.first /= field_->order() - 1;
    result.second /= field_->order() - 1;
  }
  return result;
}

}  // namespace assize::recheck
