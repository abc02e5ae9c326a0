// When to end early: a stop request or the end of the time budget.
//
// Re-deriving a code polls the brake deep inside plain loops; there it ends by throwing `Ended`, which only the entry
// of the checker catches.
#pragma once
#include <chrono>

#include "recheck/recheck.hpp"

namespace assize::recheck {

/// The steady clock of the machine.
class SteadyClock final : public Clock {
 public:
  [[nodiscard]] double seconds() const override {
    return std::chrono::duration<double>(std::chrono::steady_clock::now().time_since_epoch()).count();
  }
};

/// Thrown by Brake::poll.
struct Ended {};

class Brake {
 public:
  explicit Brake(const Options& options)
      : stop_(options.stop),
        clock_(options.clock != nullptr ? options.clock : &steady_),
        start_(clock_->seconds()),
        budget_(options.budget_seconds) {}
  Brake(const Brake&) = delete;
  Brake& operator=(const Brake&) = delete;

  [[nodiscard]] double elapsed() const { return clock_->seconds() - start_; }
  [[nodiscard]] bool pulled() const {
    return (stop_ != nullptr && stop_->requested()) || (budget_ > 0 && elapsed() >= budget_);
  }
  void poll() const {
    if (pulled()) throw Ended{};
  }

 private:
  SteadyClock steady_;
  const StopFlag* stop_;
  const Clock* clock_;
  double start_;
  double budget_;
};

}  // namespace assize::recheck
