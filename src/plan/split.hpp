// How many rows run freely inside a shard: the size of the pieces that an enumeration is cut into.
#pragma once
#include <cstdint>

namespace assize::plan {

/// The number of free rows for an [n, k] code over GF(q), 1 <= k.  A function of these three alone: shards big enough
/// to be worth handing out, small enough to share between processors and to stop quickly, and few enough to write down.
std::uint32_t free_rows(std::uint32_t order, std::uint32_t length, std::uint32_t dimension) noexcept;

}  // namespace assize::plan
