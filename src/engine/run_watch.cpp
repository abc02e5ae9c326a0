// Budget, stop flag and progress.
#include "engine/run_watch.hpp"

#include <algorithm>

namespace assize::engine {

namespace {

constexpr double seconds_between_reports = 0.05;
/// A shard that is being worked on when the run must end is finished if that takes no longer than this.
constexpr double seconds_to_finish = 2;

}  // namespace

RunWatch::RunWatch(const RunOptions& options, std::uint64_t total)
    : options_(options), start_(options.clock->seconds()), total_(total), last_report_(start_) {}

bool RunWatch::must_end() {
  const std::lock_guard lock(mutex_);
  if (reason_) return true;
  if (options_.stop != nullptr && options_.stop->requested())
    reason_ = Ending::interrupted;
  else if (options_.budget_seconds > 0 && options_.clock->seconds() - start_ >= options_.budget_seconds)
    reason_ = Ending::budget;
  if (reason_) reason_seen_ = options_.clock->seconds();
  return reason_.has_value();
}

bool RunWatch::must_give_up() {
  const bool ending = must_end();
  const double now = options_.clock->seconds();
  if (ending) return now - reason_seen_ >= seconds_to_finish;
  const std::lock_guard lock(mutex_);
  if (options_.progress != nullptr && now - last_report_ >= seconds_between_reports) report(now);
  return false;
}

void RunWatch::finished(std::uint64_t messages, std::uint32_t lightest_weight) {
  const std::lock_guard lock(mutex_);
  done_ += messages;
  if (messages > 0) lightest_ = std::min(lightest_.value_or(UINT32_MAX), lightest_weight);
  if (options_.progress == nullptr) return;
  const double now = options_.clock->seconds();
  if (now - last_report_ >= seconds_between_reports) report(now);
}

void RunWatch::close() {
  const std::lock_guard lock(mutex_);
  if (options_.progress != nullptr) report(options_.clock->seconds());
}

void RunWatch::report(double now) {
  last_report_ = now;
  options_.progress->update({.task = "enumerating words",
                             .done = done_,
                             .total = total_,
                             .elapsed_seconds = now - start_,
                             .at_least = 0,
                             .at_most = lightest_});
}

}  // namespace assize::engine
