// One builder for each family; private to this room.  All sizes are checked before anything is allocated.
#pragma once
#include "base/result.hpp"
#include "code/construct.hpp"
#include "code/linear_code.hpp"
#include "sheet/description.hpp"

namespace assize::code {

Result<LinearCode> build(const sheet::MatrixRows& family, const sheet::Description& in);
Result<LinearCode> build(const sheet::Cyclic& family, const sheet::Description& in);
Result<LinearCode> build(const sheet::Bch& family, const sheet::Description& in);
Result<LinearCode> build(const sheet::QuadraticResidue& family, const sheet::Description& in);
Result<LinearCode> build(const sheet::QuasiCyclic& family, const sheet::Description& in);
Result<LinearCode> build(const sheet::Pair& family, const sheet::Description& in);
Result<LinearCode> build(const sheet::ReedMuller& family, const sheet::Description& in);
Result<LinearCode> build(const sheet::ReedSolomonByPoints& family, const sheet::Description& in);
Result<LinearCode> build(const sheet::ReedSolomonByRoots& family, const sheet::Description& in);
Result<LinearCode> build(const sheet::Concatenated& family, const sheet::Description& in);
Result<LinearCode> build(const sheet::Justesen& family, const sheet::Description& in);
Result<LinearCode> build(const sheet::RandomLinear& family, const sheet::Description& in);

/// The code of all multiples of `generator` (constant term not zero) of degree below `length`; systematic by
/// construction.
LinearCode polynomial_code(const field::Field& field, std::uint32_t length, const field::Polynomial& generator);

/// Fails if rows * columns is beyond largest_matrix.
Result<void> check_size(const sheet::Description& in, int line, std::uint64_t rows, std::uint64_t columns);

}  // namespace assize::code
