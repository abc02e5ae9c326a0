// Binary words in plain C++: population counts inside machine words, several words side by side.
//
// No instruction beyond the baseline is assumed: bits are added in fields of 2, 4 and 8 (the classical scheme), which
// the compiler does for neighbouring words in vector registers.  Machine words of one word are added while still in
// byte sums.
#include <array>
#include <bit>

#include "kernel/reference.hpp"
#include "kernel/tally.hpp"

namespace assize::kernel {

namespace {

constexpr std::size_t lanes = binary_granule;  // words side by side

/// Eight bytes, each the number of ones in that byte of `x`.
std::uint64_t byte_sums(std::uint64_t x) noexcept {
  x -= (x >> 1U) & 0x5555555555555555U;
  x = (x & 0x3333333333333333U) + ((x >> 2U) & 0x3333333333333333U);
  return (x + (x >> 4U)) & 0x0f0f0f0f0f0f0f0fU;
}

/// The sum of eight bytes, each at most 248.
std::uint64_t sum_of_bytes(std::uint64_t x) noexcept {
  x = (x & 0x00ff00ff00ff00ffU) + ((x >> 8U) & 0x00ff00ff00ff00ffU);
  x += x >> 32U;
  x += x >> 16U;
  return x & 0xffffU;
}

/// The same if the result is below 256.
std::uint8_t short_sum_of_bytes(std::uint64_t x) noexcept {
  x += x >> 32U;
  x += x >> 16U;
  x += x >> 8U;
  return static_cast<std::uint8_t>(x);
}

constexpr std::size_t words_in_byte_sums = 31;  // 31 * 8 = 248

/// Weights of base + block word for `lanes` block words from `block`; fixed > 0 states the number of machine words.
template <std::size_t fixed, class Weight>
void weigh(std::span<const std::uint64_t> base, const std::uint64_t* block, std::size_t stride,
           std::array<Weight, lanes>& weights) noexcept {
  if constexpr (fixed > 0) {
    static_assert(fixed <= words_in_byte_sums);
    for (std::size_t i = 0; i < lanes; ++i) {
      std::uint64_t sums = 0;
      for (std::size_t j = 0; j < fixed; ++j) sums += byte_sums(base[j] ^ block[j * stride + i]);
      if constexpr (sizeof(Weight) == 1)
        weights[i] = short_sum_of_bytes(sums);
      else
        weights[i] = static_cast<Weight>(sum_of_bytes(sums));
    }
  } else {
    weights.fill(0);
    for (std::size_t first = 0; first < base.size(); first += words_in_byte_sums) {
      const std::size_t last = std::min(base.size(), first + words_in_byte_sums);
      std::array<std::uint64_t, lanes> sums{};
      for (std::size_t j = first; j < last; ++j)
        for (std::size_t i = 0; i < lanes; ++i) sums[i] += byte_sums(base[j] ^ block[j * stride + i]);
      for (std::size_t i = 0; i < lanes; ++i) weights[i] += static_cast<Weight>(sum_of_bytes(sums[i]));
    }
  }
}

template <std::size_t fixed, class Weight>
Lightest walk(std::span<std::uint64_t> base, const BinaryTables& tables, std::size_t block_size,
              std::size_t step_digits, std::span<std::uint64_t> counts) noexcept {
  Tally tally(counts);
  std::array<Weight, lanes> weights{};
  const std::uint64_t blocks = std::uint64_t{1} << step_digits;
  for (std::uint64_t t = 0;;) {
    for (std::size_t i = 0; i < block_size; i += lanes) {
      weigh<fixed>(base, tables.block.data() + i, tables.stride, weights);
      tally.add(std::span<const Weight>(weights).first(std::min(lanes, block_size - i)), t * block_size + i);
    }
    if (++t == blocks) break;
    const std::uint64_t* step = tables.steps.data() + static_cast<std::size_t>(std::countr_zero(t)) * tables.words;
    for (std::size_t j = 0; j < base.size(); ++j) base[j] ^= step[j];
  }
  return tally.finish();
}

}  // namespace

Lightest reference_binary_walk(std::span<std::uint64_t> base, const BinaryTables& tables, std::size_t block_size,
                               std::size_t step_digits, std::span<std::uint64_t> counts) noexcept {
  switch (tables.words) {
    case 1:
      return walk<1, std::uint8_t>(base, tables, block_size, step_digits, counts);
    case 2:
      return walk<2, std::uint8_t>(base, tables, block_size, step_digits, counts);
    case 3:
      return walk<3, std::uint8_t>(base, tables, block_size, step_digits, counts);
    case 4:
      return walk<4, std::uint16_t>(base, tables, block_size, step_digits, counts);
  }
  return walk<0, std::uint32_t>(base, tables, block_size, step_digits, counts);
}

}  // namespace assize::kernel
