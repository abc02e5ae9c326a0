// Every build's binary walk against the definition, bit by bit, on all short lengths and around the lane boundaries.
#include <gtest/gtest.h>

#include <bit>

#include "kernel/chance.hpp"
#include "kernel/kernel_set.hpp"

namespace assize::kernel {
namespace {

using testing::Chance;

struct Job {
  std::size_t length;
  std::size_t block_size;
  std::size_t step_digits;
  std::size_t stride;
  std::vector<std::uint64_t> base, block, steps;
};

/// Tables of chance words of `length` bits; they need not be linear, since a walk is defined by its tables.
Job make_job(Chance& chance, std::size_t length, std::size_t block_size, std::size_t step_digits) {
  const std::size_t words = (length + 63) / 64;
  Job job{length, block_size, step_digits, (block_size + binary_granule - 1) / binary_granule * binary_granule,
          {},     {},         {}};
  const std::uint64_t last = length % 64 == 0 ? ~std::uint64_t{0} : (std::uint64_t{1} << (length % 64)) - 1;
  const auto word = [&](std::size_t j) { return chance.word() & (j + 1 == words ? last : ~std::uint64_t{0}); };
  job.block.resize(words * job.stride);
  for (std::size_t j = 0; j < words; ++j) {
    job.base.push_back(word(j));
    for (std::size_t i = 1; i < job.stride; ++i) job.block[j * job.stride + i] = word(j);
  }
  for (std::size_t t = 0; t < step_digits; ++t)
    for (std::size_t j = 0; j < words; ++j) job.steps.push_back(word(j));
  return job;
}

void compare_with_definition(const KernelSet& kernel, const Job& job) {
  const std::size_t words = job.base.size();
  std::vector<std::uint64_t> base = job.base;
  std::vector<std::uint64_t> counts(job.length + 1, 7);  // counts are added to what is there
  Lightest lightest;
  for (std::uint64_t t = 0; t < std::uint64_t{1} << job.step_digits; ++t) {
    if (t > 0)
      for (std::size_t j = 0; j < words; ++j)
        base[j] ^= job.steps[static_cast<std::size_t>(std::countr_zero(t)) * words + j];
    for (std::size_t i = 0; i < job.block_size; ++i) {
      std::uint32_t weight = 0;
      for (std::size_t j = 0; j < words; ++j)
        weight += static_cast<std::uint32_t>(std::popcount(base[j] ^ job.block[j * job.stride + i]));
      ++counts[weight];
      if (weight < lightest.weight) lightest = {weight, t * job.block_size + i};
    }
  }
  std::vector<std::uint64_t> walked_base = job.base;
  std::vector<std::uint64_t> walked_counts(job.length + 1, 7);
  const Lightest found = kernel.binary_walk(walked_base, {words, job.stride, job.block, job.steps}, job.block_size,
                                            job.step_digits, walked_counts);
  EXPECT_EQ(found, lightest) << found.weight << " at " << found.index;
  EXPECT_EQ(walked_counts, counts);
  EXPECT_EQ(walked_base, base);
}

TEST(BinaryWalk, AgreesWithTheDefinitionOnAllShortLengthsAndLaneBoundaries) {
  Chance chance(1);
  std::vector<std::size_t> lengths;
  for (std::size_t n = 1; n <= 40; ++n) lengths.push_back(n);
  for (const std::size_t n : std::initializer_list<std::size_t>{63, 64, 65, 127, 128, 129, 191, 192, 193, 255, 256, 257,
                                                                511, 512, 513, 1983, 1984, 2048})
    lengths.push_back(n);
  for (const KernelSet* kernel : runnable_here())
    for (const std::size_t n : lengths)
      for (const std::size_t block_size : std::initializer_list<std::size_t>{1, 2, 16, 32, 64, 128}) {
        SCOPED_TRACE(std::string(kernel->name) + ", length " + std::to_string(n) + ", block " +
                     std::to_string(block_size));
        compare_with_definition(*kernel, make_job(chance, n, block_size, chance.below(5)));
      }
}

TEST(BinaryWalk, CountsAnyBlockSize) {
  Chance chance(2);
  for (const KernelSet* kernel : runnable_here())
    for (std::size_t block_size = 1; block_size <= 140; ++block_size) {
      SCOPED_TRACE(std::string(kernel->name) + ", block " + std::to_string(block_size));
      compare_with_definition(*kernel, make_job(chance, 1 + chance.below(300), block_size, 2));
    }
}

TEST(BinaryWalk, ReportsTheFirstOfEquallyLightWords) {
  for (const KernelSet* kernel : runnable_here()) {
    const std::vector<std::uint64_t> block(64, 0);
    const std::vector<std::uint64_t> steps{0b11, 0b11};
    std::vector<std::uint64_t> base{0b0001};
    std::vector<std::uint64_t> counts(5);
    EXPECT_EQ(kernel->binary_walk(base, {1, 64, block, steps}, 64, 2, counts), (Lightest{1, 0}));
    EXPECT_EQ(counts, (std::vector<std::uint64_t>{0, 256, 0, 0, 0}));
  }
}

TEST(BinaryWalk, WeighsWordsOfOnesAtEveryLength) {
  for (const KernelSet* kernel : runnable_here())
    for (std::size_t n = 64; n <= 64 * 70; n += 64) {
      const std::vector<std::uint64_t> block(n, 0);  // n / 64 machine words, stride 64
      std::vector<std::uint64_t> base(n / 64, ~std::uint64_t{0});
      std::vector<std::uint64_t> counts(n + 1);
      const Lightest found = kernel->binary_walk(base, {n / 64, 64, block, {}}, 1, 0, counts);
      EXPECT_EQ(found, (Lightest{static_cast<std::uint32_t>(n), 0}));
      EXPECT_EQ(counts[n], 1U);
    }
}

}  // namespace
}  // namespace assize::kernel
