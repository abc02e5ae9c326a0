// Which shards a spot check executes again.
#pragma once
#include <cstdint>
#include <string_view>
#include <vector>

namespace assize::recheck {

/// How many of `present` shards a spot check takes: 12, or one in sixteen if that is more.
std::size_t spot_size(std::size_t present) noexcept;

/// `wanted` different numbers below `present`, ascending, every choice equally likely.  The certificate's closing
/// digest takes part, so that a draw says nothing about the draw for another certificate.
std::vector<std::size_t> draw(std::size_t present, std::size_t wanted, std::uint64_t seed,
                              std::string_view closing_digest);

}  // namespace assize::recheck
