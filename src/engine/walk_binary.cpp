// Words over GF(2) for the kernels: 64 symbols in a machine word, symbol i at bit i modulo 64.
#include <algorithm>

#include "engine/coset_walk.hpp"

namespace assize::engine {

using field::Element;

namespace {

constexpr std::size_t word_bits = 64;

std::vector<std::uint64_t> pack(std::span<const Element> symbols) {
  std::vector<std::uint64_t> words((symbols.size() + word_bits - 1) / word_bits, 0);
  for (std::size_t i = 0; i < symbols.size(); ++i)
    words[i / word_bits] |= static_cast<std::uint64_t>(symbols[i]) << (i % word_bits);
  return words;
}

std::vector<Element> unpack(std::span<const std::uint64_t> words, std::size_t length) {
  std::vector<Element> symbols(length);
  for (std::size_t i = 0; i < length; ++i)
    symbols[i] = static_cast<Element>((words[i / word_bits] >> (i % word_bits)) & 1U);
  return symbols;
}

class BinaryCosetWalk final : public CosetWalk {
 public:
  BinaryCosetWalk(const code::LinearCode& code, std::uint32_t free_rows, kernel::BinaryWalk kernel)
      : CosetWalk(choose_block_rows(2, free_rows, (code.length() + word_bits - 1) / word_bits * sizeof(std::uint64_t))),
        kernel_(kernel) {
    tables_.words = (code.length() + word_bits - 1) / word_bits;
    const std::size_t block_words = std::size_t{1} << block_rows();
    tables_.stride = (block_words + kernel::binary_granule - 1) / kernel::binary_granule * kernel::binary_granule;
    block_.resize(tables_.words * tables_.stride);
    for (std::uint32_t i = 0; i < block_rows(); ++i) add_to_block(pack(code.row(code.dimension() - 1 - i)), i);
    // Counting up: the step into bit i sets it and clears all lower ones.
    std::vector<std::uint64_t> step(tables_.words, 0);
    for (std::uint32_t i = block_rows(); i < free_rows; ++i) {
      const std::vector<std::uint64_t> row = pack(code.row(code.dimension() - 1 - i));
      for (std::size_t j = 0; j < step.size(); ++j) step[j] ^= row[j];
      steps_.insert(steps_.end(), step.begin(), step.end());
    }
    tables_.block = block_;
    tables_.steps = steps_;
  }

  [[nodiscard]] Walked walk(std::span<const Element> start, std::uint32_t rows,
                            std::span<std::uint64_t> counts) const override {
    const std::uint32_t in_block = std::min(rows, block_rows());
    std::vector<std::uint64_t> base = pack(start);
    Walked walked;
    walked.lightest = kernel_(base, tables_, std::size_t{1} << in_block, rows - in_block, counts);
    walked.last_base = unpack(base, start.size());
    return walked;
  }

 private:
  /// Doubles the block: words with bit i of their index set contain `row`.
  void add_to_block(const std::vector<std::uint64_t>& row, std::uint32_t i) {
    const std::size_t half = std::size_t{1} << i;
    for (std::size_t j = 0; j < row.size(); ++j)
      for (std::size_t w = 0; w < half; ++w)
        block_[j * tables_.stride + half + w] = block_[j * tables_.stride + w] ^ row[j];
  }

  kernel::BinaryWalk kernel_;
  kernel::BinaryTables tables_;
  std::vector<std::uint64_t> block_;
  std::vector<std::uint64_t> steps_;
};

}  // namespace

std::unique_ptr<CosetWalk> make_binary_walk(const code::LinearCode& code, std::uint32_t free_rows,
                                            kernel::BinaryWalk kernel) {
  return std::make_unique<BinaryCosetWalk>(code, free_rows, kernel);
}

}  // namespace assize::engine
