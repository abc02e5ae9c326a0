// Counting the weights of a whole code, shard by shard: the face of the engines `plain` and `exhaust`.
#pragma once
#include <cstdint>
#include <optional>

#include "base/clock.hpp"
#include "base/progress.hpp"
#include "base/result.hpp"
#include "base/stop.hpp"
#include "code/linear_code.hpp"
#include "evidence/enumeration.hpp"
#include "evidence/witness.hpp"
#include "kernel/kernel_set.hpp"
#include "plan/plan.hpp"

namespace assize::engine {

/// The world a run lives in; nothing here changes what a completed shard contains.
struct RunOptions {
  unsigned threads = 1;
  const kernel::KernelSet* kernel = nullptr;  ///< must be set
  const StopFlag* stop = nullptr;             ///< ends the run at the next shard boundary, or after two seconds
  const Clock* clock = nullptr;               ///< must be set
  double budget_seconds = 0;  ///< 0: none; otherwise no shard is begun after this time, and none goes on for long
  Progress* progress = nullptr;
  std::optional<std::uint32_t> at_least = {};  ///< stop as soon as a lighter word than this is found (refutation)
};

enum class Ending { complete, refuted, budget, interrupted };
std::string_view name(Ending ending) noexcept;

struct EnumerationOutcome {
  evidence::Enumeration enumeration;          ///< completed shards only
  std::optional<evidence::Witness> lightest;  ///< least by (weight, shard number, index in the shard) among them
  Ending ending = Ending::complete;
};

/// Runs the plan's shards.  With `at_least`, a lighter word found in shard j ends the run once all shards below j are
/// done, and shards above j are dropped, so that the outcome does not depend on threads.
/// Fault checks (size, end word, moments) are always on; a failing one is a Failure that names the shard.
Result<EnumerationOutcome> enumerate(const code::LinearCode& code, const plan::Plan& plan, const RunOptions& options);

}  // namespace assize::engine
