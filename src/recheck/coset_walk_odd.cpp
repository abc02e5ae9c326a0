// The walk in odd characteristic: m planes of digits modulo p, one digit to a byte (or to 32 bits for large p).
#include <algorithm>
#include <array>
#include <cstring>
#include <numeric>

#include "recheck/coset_walk.hpp"

namespace assize::recheck {
namespace {

/// Positions are handled in blocks of this many, padded with zeros, so that compilers can use wide registers.
constexpr std::size_t block = 16;

template <class Digit>
class OddWalk final : public CosetWalk {
 public:
  OddWalk(const Field& field, const Matrix& rows)
      : p_(field.characteristic()),
        planes_(field.degree()),
        padded_((rows.columns + block - 1) / block * block),
        length_(rows.columns) {
    std::vector<Symbol> multiple(rows.columns);
    for (std::size_t r = rows.rows; r-- > 0;) {
      std::uint32_t x_power = 1;
      for (std::size_t t = 0; t < planes_; ++t, x_power *= p_) {
        for (std::size_t c = 0; c < rows.columns; ++c)
          multiple[c] = field.multiply(rows.row(r)[c], static_cast<Symbol>(x_power));
        unpack(multiple, steps_);
      }
    }
  }

  bool count(std::span<const Symbol> offset, std::size_t free, std::vector<std::uint64_t>& counts,
             const Stopped& stopped) const override {
    std::vector<Digit> word;
    unpack(offset, word);
    std::vector<std::uint32_t> odometer(free * planes_, 0);
    const std::vector<Digit> nothing(word.size(), 0);
    ++counts[add(word.data(), nothing.data())];
    for (std::uint64_t done = 0;; ++done) {
      if ((done & 0xfff) == 0 && stopped()) return false;
      // Counting up by one carries through `place` digits; the modular Gray code then adds row `place` once.
      std::size_t place = 0;
      while (place < odometer.size() && odometer[place] == p_ - 1) odometer[place++] = 0;
      if (place == odometer.size()) return true;
      ++odometer[place];
      ++counts[add(word.data(), steps_.data() + place * word.size())];
    }
  }

 private:
  void unpack(std::span<const Symbol> symbols, std::vector<Digit>& out) const {
    const std::size_t begin = out.size();
    out.resize(begin + planes_ * padded_, 0);
    std::uint32_t divisor = 1;
    for (std::size_t t = 0; t < planes_; ++t, divisor *= p_)
      for (std::size_t c = 0; c < length_; ++c)
        out[begin + t * padded_ + c] = static_cast<Digit>(symbols[c] / divisor % p_);
  }

  using Block = std::array<Digit, block>;

  static Block load(const Digit* from) {
    Block digits;
    std::memcpy(digits.data(), from, sizeof digits);
    return digits;
  }

  /// word += step; returns the weight of the sum.
  std::size_t add(Digit* word, const Digit* step) const {
    const auto p = static_cast<Digit>(p_);
    const std::size_t planes = planes_;
    const std::size_t padded = padded_;
    std::size_t weight = 0;
    for (std::size_t start = 0; start < padded; start += block) {
      Block any{};
      for (std::size_t at = start; at < planes * padded; at += padded) {
        Block digits = load(word + at);
        const Block summand = load(step + at);
        for (std::size_t i = 0; i < block; ++i) {
          const auto sum = static_cast<Digit>(digits[i] + summand[i]);  // below 2p, which fits
          digits[i] = std::min(sum, static_cast<Digit>(sum - p));       // wraps to a large number below p
        }
        for (std::size_t i = 0; i < block; ++i) any[i] = static_cast<Digit>(any[i] | digits[i]);
        std::memcpy(word + at, digits.data(), sizeof digits);
      }
      for (std::size_t i = 0; i < block; ++i) any[i] = std::min(any[i], Digit{1});
      weight += ones(any);
    }
    return weight;
  }

  /// Number of ones in a block of zeros and ones.
  static std::size_t ones(const Block& flags) {
    if constexpr (sizeof(Digit) == 1) {
      std::array<std::uint64_t, block / 8> lanes;
      std::memcpy(lanes.data(), flags.data(), sizeof lanes);
      std::uint64_t sum = 0;
      for (const std::uint64_t lane : lanes) sum += lane;
      return static_cast<std::size_t>(sum * 0x0101010101010101U >> 56);  // adds up the eight bytes
    } else {
      return std::accumulate(flags.begin(), flags.end(), std::size_t{0});
    }
  }

  std::uint32_t p_;
  std::size_t planes_;
  std::size_t padded_;
  std::size_t length_;
  std::vector<Digit> steps_;
};

}  // namespace

std::unique_ptr<CosetWalk> make_odd_walk(const Field& field, const Matrix& rows) {
  if (field.characteristic() < 128) return std::make_unique<OddWalk<std::uint8_t>>(field, rows);
  return std::make_unique<OddWalk<std::uint32_t>>(field, rows);
}

}  // namespace assize::recheck
