// Words over GF(q), q <= 256, in plain C++: one byte comparison for each symbol, many words side by side.
//
// Weights are counted down from n in bytes, which the compiler keeps in vector registers' worth of neighbours; words
// longer than 255 are taken in pieces of 255 positions.
#include <array>

#include "kernel/reference.hpp"
#include "kernel/tally.hpp"

namespace assize::kernel {

namespace {

constexpr std::size_t longest_piece = 255;  // what a byte can count

/// Weights of `lanes` block words on the positions first .. last - 1, at most 255 of them.
template <std::size_t lanes>
void weigh_piece(std::span<const std::uint8_t> negated_base, const std::uint8_t* block, std::size_t stride,
                 std::size_t first, std::size_t last, std::array<std::uint8_t, lanes>& result) noexcept {
  std::array<std::uint8_t, lanes> weights;  // local, so that nothing else can be the same memory
  weights.fill(static_cast<std::uint8_t>(last - first));
  for (std::size_t j = first; j < last; ++j) {
    const std::uint8_t vanishing = negated_base[j];
    const std::uint8_t* symbols = block + j * stride;
    for (std::size_t i = 0; i < lanes; ++i)
      weights[i] = static_cast<std::uint8_t>(weights[i] - (symbols[i] == vanishing ? 1 : 0));
  }
  result = weights;
}

/// Weighs and counts `size` <= lanes block words from `block`.
template <std::size_t lanes>
void count_lanes(std::span<const std::uint8_t> negated_base, const std::uint8_t* block, std::size_t stride,
                 std::size_t size, std::uint64_t first_index, Tally& tally) noexcept {
  const std::size_t n = negated_base.size();
  std::array<std::uint8_t, lanes> piece;
  if (n <= longest_piece) {
    weigh_piece(negated_base, block, stride, 0, n, piece);
    tally.add(std::span<const std::uint8_t>(piece).first(size), first_index);
    return;
  }
  std::array<std::uint32_t, lanes> weights{};
  for (std::size_t first = 0; first < n; first += longest_piece) {
    weigh_piece(negated_base, block, stride, first, std::min(n, first + longest_piece), piece);
    for (std::size_t i = 0; i < lanes; ++i) weights[i] += piece[i];
  }
  tally.add(std::span<const std::uint32_t>(weights).first(size), first_index);
}

}  // namespace

Lightest reference_symbol_walk(std::span<std::uint8_t> negated_base, const SymbolTables& tables, std::size_t block_size,
                               std::size_t step_digits, std::span<std::uint64_t> counts) noexcept {
  constexpr std::size_t wide = 4 * symbol_granule;
  Tally tally(counts);
  const std::size_t n = negated_base.size();
  std::array<std::uint8_t, 64> digits{};
  for (std::uint64_t first_index = 0;; first_index += block_size) {
    std::size_t i = 0;
    for (; i + wide / 2 < block_size && i + wide <= tables.stride; i += wide)
      count_lanes<wide>(negated_base, tables.block.data() + i, tables.stride, std::min(wide, block_size - i),
                        first_index + i, tally);
    for (; i < block_size; i += symbol_granule)
      count_lanes<symbol_granule>(negated_base, tables.block.data() + i, tables.stride,
                                  std::min(symbol_granule, block_size - i), first_index + i, tally);
    std::size_t j = 0;
    while (j < step_digits && digits[j] == tables.order - 1) digits[j++] = 0;
    if (j == step_digits) break;
    const std::uint8_t* step = tables.steps.data() + (j * (tables.order - 1) + digits[j]) * n;
    ++digits[j];
    for (std::size_t p = 0; p < n; ++p) negated_base[p] = tables.sums[negated_base[p] * tables.order + step[p]];
  }
  return tally.finish();
}

}  // namespace assize::kernel
