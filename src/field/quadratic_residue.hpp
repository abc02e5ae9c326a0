// Generators of the quadratic residue codes.
#pragma once
#include <optional>

#include "field/polynomial.hpp"

namespace assize::field {

/// The lesser (monic, coefficients compared as numbers from the top) of the two factors of degree (p-1)/2 of
/// (x^p - 1)/(x - 1) over GF(2), GF(3) or GF(4) whose zeros are the powers of a p-th root of unity with residues, or
/// non-residues, as exponents.  Nothing if the field's order is no square modulo p.  p must be an odd prime, not the
/// characteristic (contract).  F. J. MacWilliams, N. J. A. Sloane, The Theory of Error-Correcting Codes, 1977, ch. 16.
std::optional<Polynomial> quadratic_residue_generator(const Field& field, std::uint32_t p);

}  // namespace assize::field
