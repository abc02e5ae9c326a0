// Words over GF(q), q <= 256, for the kernels: a symbol in a byte, base words negated.
#include <algorithm>

#include "base/integers.hpp"
#include "engine/coset_walk.hpp"

namespace assize::engine {

using field::Element;

namespace {

std::uint8_t byte(Element a) noexcept { return static_cast<std::uint8_t>(a); }

class SymbolCosetWalk final : public CosetWalk {
 public:
  SymbolCosetWalk(const code::LinearCode& code, std::uint32_t free_rows, kernel::SymbolWalk kernel)
      : CosetWalk(choose_block_rows(code.order(), free_rows, code.length())), field_(code.field()), kernel_(kernel) {
    const std::size_t block_words = *power_if_fits(code.order(), block_rows());
    tables_.order = code.order();
    // Kernels take longer strides at once where there is room for them.
    const std::size_t granule =
        block_words <= 2 * kernel::symbol_granule ? kernel::symbol_granule : 4 * kernel::symbol_granule;
    tables_.stride = (block_words + granule - 1) / granule * granule;
    block_.resize(code.length() * tables_.stride);
    std::size_t size = 1;
    for (std::uint32_t i = 0; i < block_rows(); ++i, size *= code.order())
      add_to_block(code.row(code.dimension() - 1 - i), size);
    fill_steps(code, free_rows);
    sums_.resize(std::size_t{code.order()} * code.order());
    for (std::uint32_t a = 0; a < code.order(); ++a)
      for (std::uint32_t b = 0; b < code.order(); ++b)
        sums_[std::size_t{a} * code.order() + b] = byte(field_.add(static_cast<Element>(a), static_cast<Element>(b)));
    tables_.block = block_;
    tables_.steps = steps_;
    tables_.sums = sums_;
  }

  [[nodiscard]] Walked walk(std::span<const Element> start, std::uint32_t rows,
                            std::span<std::uint64_t> counts) const override {
    const std::uint32_t in_block = std::min(rows, block_rows());
    std::vector<std::uint8_t> negated(start.size());
    std::ranges::transform(start, negated.begin(), [this](Element a) { return byte(field_.negate(a)); });
    Walked walked;
    walked.lightest = kernel_(negated, tables_, *power_if_fits(field_.order(), in_block), rows - in_block, counts);
    walked.last_base.resize(start.size());
    std::ranges::transform(negated, walked.last_base.begin(), [this](std::uint8_t a) { return field_.negate(a); });
    return walked;
  }

 private:
  /// Multiplies the block by q: the word with index a * size + w is a times `row` plus the word with index w < size.
  void add_to_block(const std::vector<Element>& row, std::size_t size) {
    for (std::size_t j = 0; j < row.size(); ++j) {
      std::uint8_t* symbols = block_.data() + j * tables_.stride;
      for (std::uint32_t a = 1; a < field_.order(); ++a) {
        const Element term = field_.multiply(static_cast<Element>(a), row[j]);
        for (std::size_t w = 0; w < size; ++w) symbols[a * size + w] = byte(field_.add(term, symbols[w]));
      }
    }
  }

  /// Counting up: digit i goes from a to a + 1 while all lower ones go from q - 1 to 0; negated, as the base is.
  void fill_steps(const code::LinearCode& code, std::uint32_t free_rows) {
    const auto top = static_cast<Element>(field_.order() - 1);
    std::vector<Element> reset(code.length(), 0);
    for (std::uint32_t i = block_rows(); i < free_rows; ++i) {
      const std::vector<Element> row = code.row(code.dimension() - 1 - i);
      for (Element a = 0; a < top; ++a) {
        std::vector<Element> step = reset;
        field::add_multiple(field_, step, field_.subtract(a, static_cast<Element>(a + 1)), row);
        std::ranges::transform(step, std::back_inserter(steps_), byte);
      }
      field::add_multiple(field_, reset, top, row);
    }
  }

  field::Field field_;
  kernel::SymbolWalk kernel_;
  kernel::SymbolTables tables_;
  std::vector<std::uint8_t> block_;
  std::vector<std::uint8_t> steps_;
  std::vector<std::uint8_t> sums_;
};

}  // namespace

std::unique_ptr<CosetWalk> make_symbol_walk(const code::LinearCode& code, std::uint32_t free_rows,
                                            kernel::SymbolWalk kernel) {
  return std::make_unique<SymbolCosetWalk>(code, free_rows, kernel);
}

}  // namespace assize::engine
