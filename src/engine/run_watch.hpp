// The clock side of a run: when it must end, and telling whoever watches how far it is.
#pragma once
#include <cstdint>
#include <mutex>
#include <optional>

#include "engine/enumerate.hpp"

namespace assize::engine {

/// Shared by the threads of one run.
class RunWatch {
 public:
  /// `total` messages are planned.  The options must outlive the watch.
  RunWatch(const RunOptions& options, std::uint64_t total);

  /// Asked to stop, or out of budget.  The first reason is kept.
  [[nodiscard]] bool must_end();
  /// The run must end and a shard in hand takes too long to be finished first.
  [[nodiscard]] bool must_give_up();
  [[nodiscard]] std::optional<Ending> reason() const noexcept { return reason_; }  ///< once all threads have ended

  /// Notes finished messages and the lightest weight among them; passed on at most 20 times a second.
  void finished(std::uint64_t messages, std::uint32_t lightest_weight);
  /// Passes the final state on.
  void close();

 private:
  void report(double now);

  const RunOptions& options_;
  const double start_;
  std::mutex mutex_;
  std::optional<Ending> reason_;
  double reason_seen_ = 0;  ///< when the reason was first noticed
  std::uint64_t done_ = 0;
  std::uint64_t total_;
  std::optional<std::uint32_t> lightest_;
  double last_report_;
};

}  // namespace assize::engine
