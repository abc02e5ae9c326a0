// Evaluation codes, as the Justesen construction needs them too; private to this room.
#pragma once
#include <span>
#include <string>

#include "base/result.hpp"
#include "code/linear_code.hpp"

namespace assize::code {

/// Words (v_i f(x_i)), deg f < k, k <= n; points distinct, multipliers not zero.  Systematic in the first k positions.
LinearCode evaluation_code(const field::Field& field, std::uint32_t k, std::span<const field::Element> points,
                           std::span<const field::Element> multipliers);

/// As many points as wanted, all different.
Result<void> check_points(const field::Field& field, std::span<const field::Element> points, std::uint64_t wanted,
                          const std::string& where);

}  // namespace assize::code
