// Planning and running an enumeration, with the rule that nobody's machine is taken for a day unasked.
#pragma once
#include <optional>
#include <string>

#include "api/subject.hpp"
#include "api/world.hpp"
#include "engine/calibrate.hpp"
#include "engine/enumerate.hpp"

namespace assize::api {

/// What came of it.
struct Enumerated {
  std::optional<engine::EnumerationOutcome> outcome;  ///< nothing if the run was not started
  std::string remark;                                 ///< why it was not started, or ended early
};

/// Runs the plan unless it is out of reach or forecast to take more than 24 hours without a budget.
Result<Enumerated> run_enumeration(const Subject& subject, const plan::Plan& plan, World& world, const Run& run,
                                   std::optional<std::uint32_t> at_least);

/// The answer to --plan.
report::Document forecast_document(const Subject& subject, const plan::Plan& chosen, World& world);

}  // namespace assize::api
