// The size of the block table.
#include "engine/coset_walk.hpp"

#include "base/integers.hpp"

namespace assize::engine {

namespace {

constexpr std::uint64_t most_bytes = std::uint64_t{1} << 15U;
constexpr std::uint64_t most_words = std::uint64_t{1} << 11U;

}  // namespace

std::uint32_t choose_block_rows(std::uint32_t order, std::uint32_t free_rows, std::uint64_t bytes_per_word) noexcept {
  std::uint32_t rows = free_rows < 1 ? 0 : 1;  // one row even if it is too long: stepping costs more than a block word
  std::uint64_t words = order;
  while (rows < free_rows) {
    words *= order;
    if (words > most_words || words * bytes_per_word > most_bytes) break;
    ++rows;
  }
  return rows;
}

}  // namespace assize::engine
