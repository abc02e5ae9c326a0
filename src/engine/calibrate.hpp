// How long a plan will take on this machine: measured for a few milliseconds, told to people, never used as evidence.
#pragma once
#include "code/linear_code.hpp"
#include "engine/enumerate.hpp"
#include "plan/plan.hpp"

namespace assize::engine {

struct Forecast {
  double seconds = 0;              ///< for the whole plan; 0 if too short to be worth measuring
  double messages_per_second = 0;  ///< of all threads together; 0 if not measured
};

/// Runs a little of the plan's method with the options' kernel and clock; some 10 ms as a rule, nothing for small
/// codes. Works for plans without shards too.
Forecast forecast(const code::LinearCode& code, const plan::Plan& plan, const RunOptions& options);

}  // namespace assize::engine
