// The minimum distance of a code small enough to be enumerated on the side: inner codes, small outer codes.
#pragma once
#include <cstdint>
#include <optional>

#include "field/matrix.hpp"

namespace assize::bound {

/// Most words that are enumerated on the side (certs/FORMAT.md, concatenation).
inline constexpr std::uint64_t most_side_words = 1ULL << 24;

/// Least weight of a non-zero combination of the rows, which must be independent; nothing if there are too many words.
std::optional<std::uint32_t> small_distance(const field::Field& field, const field::Matrix& rows);

}  // namespace assize::bound
