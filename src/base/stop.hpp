// The one flag by which a run is asked to end at its next shard boundary.
#pragma once
#include <atomic>

namespace assize {

/// Set from a signal handler or another thread, read by the runner.  Setting it is lock-free, so safe in a handler.
class StopFlag {
 public:
  StopFlag() = default;
  virtual ~StopFlag() = default;
  StopFlag(const StopFlag&) = delete;
  StopFlag& operator=(const StopFlag&) = delete;
  void request() noexcept { stop_.store(true, std::memory_order_relaxed); }
  [[nodiscard]] virtual bool requested() const noexcept { return stop_.load(std::memory_order_relaxed); }

 private:
  std::atomic<bool> stop_{false};
  static_assert(std::atomic<bool>::is_always_lock_free);
};

}  // namespace assize
