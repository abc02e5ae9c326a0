// The one table of costs that plans are made from.
//
// One unit is the exclusive or and population count of a machine word.  The numbers are ratios that were measured once
// and rounded; they are part of the source, so that every machine makes the same plan.
#pragma once
#include <cstdint>

#include "plan/plan.hpp"

namespace assize::plan {

/// Raising the counter of a weight, for each message.
inline constexpr std::uint64_t cost_of_counting = 1;
/// Bits of a machine word over GF(2), symbols over other fields that are weighed for one unit.
inline constexpr std::uint64_t bits_per_unit = 64;
inline constexpr std::uint64_t symbols_per_unit = 32;
/// Field operations of the engine `plain`, for each symbol of a word.
inline constexpr std::uint64_t plain_cost_of_symbol = 4;

/// Units for each message of a code over GF(order) of this length.
constexpr std::uint64_t cost_per_message(Method method, std::uint32_t order, std::uint32_t length) noexcept {
  const std::uint64_t per_unit = order == 2 ? bits_per_unit : symbols_per_unit;
  switch (method) {
    case Method::plain:
      return cost_of_counting + plain_cost_of_symbol * length;
    case Method::exhaust:
      return cost_of_counting + (length + per_unit - 1) / per_unit;
  }
  return 0;
}

}  // namespace assize::plan
