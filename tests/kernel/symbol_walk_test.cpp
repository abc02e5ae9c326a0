// Every build's walk over byte symbols against the definition, for small, prime and prime-power orders up to 256.
#include <gtest/gtest.h>

#include "kernel/chance.hpp"
#include "kernel/kernel_set.hpp"

namespace assize::kernel {
namespace {

using testing::Chance;

/// Chance tables; `sums` is addition modulo q, which is as good as any group for a kernel that only looks it up.
void compare_with_definition(const KernelSet& kernel, Chance& chance, std::size_t order, std::size_t n,
                             std::size_t block_size, std::size_t digits) {
  const auto symbol = [&] { return static_cast<std::uint8_t>(chance.below(3) == 0 ? 0 : chance.below(order)); };
  const std::size_t stride =
      (block_size + symbol_granule - 1) / symbol_granule * symbol_granule + chance.below(4) * symbol_granule;
  std::vector<std::uint8_t> block(n * stride), steps(digits * (order - 1) * n), sums(order * order), start(n);
  for (auto& s : block) s = symbol();
  for (auto& s : steps) s = symbol();
  for (auto& s : start) s = symbol();
  for (std::size_t a = 0; a < order; ++a)
    for (std::size_t b = 0; b < order; ++b) sums[a * order + b] = static_cast<std::uint8_t>((a + b) % order);

  std::vector<std::uint8_t> negated = start;
  std::vector<std::uint64_t> counts(n + 1, 3);
  Lightest lightest;
  std::uint64_t blocks = 1;
  for (std::size_t j = 0; j < digits; ++j) blocks *= order;
  for (std::uint64_t t = 0; t < blocks; ++t) {
    if (t > 0) {
      std::uint64_t before = t - 1;
      std::size_t j = 0;
      for (; before % order == order - 1; before /= order) ++j;
      for (std::size_t p = 0; p < n; ++p)
        negated[p] = sums[negated[p] * order + steps[(j * (order - 1) + before % order) * n + p]];
    }
    for (std::size_t i = 0; i < block_size; ++i) {
      std::uint32_t weight = 0;
      for (std::size_t p = 0; p < n; ++p) weight += block[p * stride + i] != negated[p] ? 1U : 0U;
      ++counts[weight];
      if (weight < lightest.weight) lightest = {weight, t * block_size + i};
    }
  }
  std::vector<std::uint8_t> walked_base = start;
  std::vector<std::uint64_t> walked_counts(n + 1, 3);
  const Lightest found =
      kernel.symbol_walk(walked_base, {order, stride, block, steps, sums}, block_size, digits, walked_counts);
  EXPECT_EQ(found, lightest) << found.weight << " at " << found.index;
  EXPECT_EQ(walked_counts, counts);
  EXPECT_EQ(walked_base, negated);
}

TEST(SymbolWalk, AgreesWithTheDefinitionForManyOrdersAndLengths) {
  Chance chance(3);
  for (const KernelSet* kernel : runnable_here())
    for (const std::size_t order : std::initializer_list<std::size_t>{3,  4,  5,  7,   8,   9,   16,  25,  27,  31,
                                                                      49, 64, 81, 101, 125, 128, 169, 243, 251, 256})
      for (const std::size_t n :
           std::initializer_list<std::size_t>{1, 2, 7, 8, 15, 16, 17, 31, 32, 33, 40, 254, 255, 256, 511, 512, 520}) {
        SCOPED_TRACE(std::string(kernel->name) + ", order " + std::to_string(order) + ", length " + std::to_string(n));
        const std::size_t digits = order <= 9 ? chance.below(3) : chance.below(2);
        compare_with_definition(*kernel, chance, order, n, order <= 9 ? order * order : order, digits);
      }
}

TEST(SymbolWalk, CountsAnyBlockSize) {
  Chance chance(4);
  for (const KernelSet* kernel : runnable_here())
    for (std::size_t block_size = 1; block_size <= 600; block_size += 1 + block_size / 70) {
      SCOPED_TRACE(std::string(kernel->name) + ", block " + std::to_string(block_size));
      compare_with_definition(*kernel, chance, 3, 1 + chance.below(60), block_size, 2);
    }
}

TEST(SymbolWalk, CountsThroughManyDigits) {
  Chance chance(5);
  for (const KernelSet* kernel : runnable_here()) {
    compare_with_definition(*kernel, chance, 3, 11, 3, 9);
    compare_with_definition(*kernel, chance, 4, 12, 1, 6);
  }
}

}  // namespace
}  // namespace assize::kernel
