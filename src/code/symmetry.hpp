// Monomial maps that carry a code onto itself: a permutation of the positions with a non-zero multiplier for each.
//
// A map is kept only after it has been verified on the code, wherever it came from: the construction or the sheet.
#pragma once
#include <cstdint>
#include <optional>
#include <string>
#include <vector>

#include "code/linear_code.hpp"
#include "sheet/description.hpp"

namespace assize::code {

/// Whether the image of every generator row is a word of the code.  `permutation` must name each position once
/// (contract).
bool is_symmetry(const LinearCode& code, const MonomialMap& map);

/// Number of orbits of the positions under the group that the maps generate.
std::uint32_t orbits(std::uint32_t length, const std::vector<MonomialMap>& maps);

/// Maps that the construction suggests (cyclic and quasi-cyclic shifts, multipliers of cyclic codes, translations of
/// extended primitive BCH codes, inversion of extended quadratic residue codes), as far as they hold for the code.
std::vector<MonomialMap> known_symmetries(const sheet::Description& description, const LinearCode& code);

}  // namespace assize::code
