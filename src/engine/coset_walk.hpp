// One walk over v + span of the last rows, for a kernel: the tables that it needs, in its packing of words.
//
// The last `block_rows` rows span the block table; each row above them is a digit that the walk counts with.
#pragma once
#include <cstdint>
#include <memory>
#include <span>
#include <vector>

#include "code/linear_code.hpp"
#include "kernel/kernel_set.hpp"

namespace assize::engine {

class CosetWalk {
 public:
  struct Walked {
    kernel::Lightest lightest;
    std::vector<field::Element> last_base;  ///< the base word of the last block, unpacked
  };

  virtual ~CosetWalk() = default;
  /// Walks start + span(the last `rows` rows), rows <= s; adds to n + 1 counters.
  [[nodiscard]] virtual Walked walk(std::span<const field::Element> start, std::uint32_t rows,
                                    std::span<std::uint64_t> counts) const = 0;
  [[nodiscard]] std::uint32_t block_rows() const noexcept { return block_rows_; }

 protected:
  explicit CosetWalk(std::uint32_t block_rows) noexcept : block_rows_(block_rows) {}

 private:
  std::uint32_t block_rows_;
};

/// Walks for a code over GF(2), machine words; for up to `free_rows` free rows.
std::unique_ptr<CosetWalk> make_binary_walk(const code::LinearCode& code, std::uint32_t free_rows,
                                            kernel::BinaryWalk kernel);
/// Walks for a code over GF(q), q <= 256, bytes.
std::unique_ptr<CosetWalk> make_symbol_walk(const code::LinearCode& code, std::uint32_t free_rows,
                                            kernel::SymbolWalk kernel);

/// How many of `free_rows` rows make the block, if one block word takes `bytes_per_word`: the table shall stay in the
/// first-level cache.
std::uint32_t choose_block_rows(std::uint32_t order, std::uint32_t free_rows, std::uint64_t bytes_per_word) noexcept;

}  // namespace assize::engine
