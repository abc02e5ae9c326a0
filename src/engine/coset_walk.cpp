// The size of the block table.
#include "engine/coset_walk.hpp"

#include "base/integers.hpp"

namespace assize::engine {

namespace {

constexpr std::uint64_t most_bytes = std::uint64_t{1} << 15U;
constexpr std::uint64_t most_words = std::uint64_t{1} << 11U;
constexpr std::uint64_t least_words = 32;  // kernels weigh so many side by side, however long they are

}  // namespace

std::uint32_t choose_block_rows(std::uint32_t order, std::uint32_t free_rows, std::uint64_t bytes_per_word) noexcept {
  std::uint32_t rows = 0;
  for (std::uint64_t words = 1; rows < free_rows; ++rows) {
    const bool enough = words >= least_words;
    words *= order;
    if (enough && (words > most_words || words * bytes_per_word > most_bytes)) break;
  }
  return rows;
}

}  // namespace assize::engine
