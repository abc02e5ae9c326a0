// The real world behind the interfaces of `base`: clock, stop flag, progress; and the settings of a run made definite.
#pragma once
#include <string>

#include "api/assize.hpp"
#include "base/clock.hpp"
#include "base/progress.hpp"
#include "base/result.hpp"
#include "base/stop.hpp"
#include "kernel/kernel_set.hpp"
#include "plan/plan.hpp"

namespace assize::api {

class SteadyClock final : public Clock {
 public:
  [[nodiscard]] double seconds() const override;
};

/// Asks the caller's atomic.
class ForwardedStop final : public StopFlag {
 public:
  explicit ForwardedStop(const std::atomic<bool>* flag) : flag_(flag) {}
  [[nodiscard]] bool requested() const noexcept override {
    return flag_ != nullptr && flag_->load(std::memory_order_relaxed);
  }

 private:
  const std::atomic<bool>* flag_;
};

/// Hands progress to the caller's function.
class ForwardedProgress final : public assize::Progress {
 public:
  explicit ForwardedProgress(const std::function<void(const api::Progress&)>& function) : function_(&function) {}
  void update(const ProgressState& state) override;

 private:
  const std::function<void(const api::Progress&)>* function_;
};

/// A run with every default filled in.
struct World {
  unsigned threads = 1;
  const kernel::KernelSet* kernel = nullptr;
  plan::Goal goal;
  SteadyClock clock;
  ForwardedStop stop;
  ForwardedProgress progress;
  double started = 0;  ///< by the clock

  explicit World(const Run& run) : stop(run.stop), progress(run.on_progress), started(clock.seconds()) {}
  [[nodiscard]] double elapsed() const { return clock.seconds() - started; }
};

/// Checks threads, kernel and method.
Result<void> settle(const Run& run, World& world);

/// Now, in UTC, YYYY-MM-DDThh:mm:ssZ.
std::string utc_now();

Problem to_problem(const Failure& failure);

}  // namespace assize::api
