// The walk in characteristic 2: m planes of bits, 64 positions to a machine word, exclusive or, population count.
#include <algorithm>
#include <bit>

#include "recheck/coset_walk.hpp"

namespace assize::recheck {
namespace {

using Word = std::uint64_t;

/// Population count in plain arithmetic: without a processor-specific build std::popcount would be a call.
inline std::size_t ones(Word x) noexcept {
  x -= x >> 1 & 0x5555555555555555U;
  x = (x & 0x3333333333333333U) + (x >> 2 & 0x3333333333333333U);
  x = (x + (x >> 4)) & 0x0f0f0f0f0f0f0f0fU;
  return static_cast<std::size_t>(x * 0x0101010101010101U >> 56);
}

class BinaryWalk final : public CosetWalk {
 public:
  BinaryWalk(const Field& field, const Matrix& rows)
      : planes_(field.degree()), width_((rows.columns + 63) / 64), length_(rows.columns) {
    std::vector<Symbol> multiple(rows.columns);
    for (std::size_t r = rows.rows; r-- > 0;)  // last row first: the walk of fewer rows uses a beginning of the table
      for (std::uint32_t t = 0; t < planes_; ++t) {
        for (std::size_t c = 0; c < rows.columns; ++c)
          multiple[c] = field.multiply(rows.row(r)[c], static_cast<Symbol>(1U << t));
        pack(multiple, steps_);
      }
  }

  bool count(std::span<const Symbol> offset, std::size_t free, std::vector<std::uint64_t>& counts,
             const Stopped& stopped) const override {
    std::vector<Word> word;
    pack(offset, word);
    const std::uint64_t size = std::uint64_t{1} << (free * planes_);
    ++counts[add(word.data(), std::vector<Word>(word.size(), 0).data())];
    for (std::uint64_t start = 1; start < size; start += slice) {
      if (stopped()) return false;
      const std::uint64_t end = std::min(size, start + slice);
      if (planes_ * width_ == 1)
        narrow(word[0], start, end, counts);
      else
        wide(word, start, end, counts);
    }
    return true;
  }

 private:
  static constexpr std::uint64_t slice = std::uint64_t{1} << 14;

  void pack(std::span<const Symbol> symbols, std::vector<Word>& out) const {
    const std::size_t begin = out.size();
    out.resize(begin + planes_ * width_, 0);
    for (std::size_t t = 0; t < planes_; ++t)
      for (std::size_t c = 0; c < length_; ++c)
        out[begin + t * width_ + c / 64] |= Word{symbols[c]} >> t << 63 >> (63 - c % 64);
  }

  void narrow(Word& held, std::uint64_t start, std::uint64_t end, std::vector<std::uint64_t>& counts) const {
    Word word = held;
    const Word* const steps = steps_.data();
    std::uint64_t* const count = counts.data();
    for (std::uint64_t i = start; i < end; ++i) {
      word ^= steps[std::countr_zero(i)];
      ++count[ones(word)];
    }
    held = word;
  }

  void wide(std::vector<Word>& word, std::uint64_t start, std::uint64_t end, std::vector<std::uint64_t>& counts) const {
    for (std::uint64_t i = start; i < end; ++i) {
      const auto row = static_cast<std::size_t>(std::countr_zero(i));
      ++counts[add(word.data(), steps_.data() + row * word.size())];
    }
  }

  /// word += step; returns the weight of the sum.
  std::size_t add(Word* word, const Word* step) const {
    const std::size_t width = width_;
    const std::size_t all = planes_ * width;
    std::size_t weight = 0;
    for (std::size_t w = 0; w < width; ++w) {
      Word any = 0;
      for (std::size_t at = w; at < all; at += width) any |= word[at] ^= step[at];
      weight += ones(any);
    }
    return weight;
  }

  std::size_t planes_;
  std::size_t width_;
  std::size_t length_;
  std::vector<Word> steps_;
};

}  // namespace

std::unique_ptr<CosetWalk> make_binary_walk(const Field& field, const Matrix& rows) {
  return std::make_unique<BinaryWalk>(field, rows);
}

}  // namespace assize::recheck
