// Threads over numbered chunks.  OpenMP in ordinary builds; std::jthread where ASSIZE_RUNNER_JTHREAD is defined,
// because the thread sanitizer sees races in the OpenMP runtime that are not there.  Both run the same worker.
#include "engine/runner.hpp"

#include <algorithm>
#include <exception>
#include <mutex>
#include <optional>

#ifdef ASSIZE_RUNNER_JTHREAD
#include <system_error>
#include <thread>
#include <vector>
#endif

namespace assize::engine {

namespace {

class Counter {
 public:
  Counter(std::uint64_t count, const std::function<bool(std::uint64_t)>& may_begin)
      : count_(count), may_begin_(may_begin) {}

  std::optional<std::uint64_t> next() {
    const std::lock_guard lock(mutex_);
    if (ended_ || next_ == count_ || !may_begin_(next_)) {
      ended_ = true;
      return std::nullopt;
    }
    return next_++;
  }

  void fail(std::exception_ptr exception) noexcept {
    const std::lock_guard lock(mutex_);
    ended_ = true;
    if (!exception_) exception_ = std::move(exception);
  }

  /// After all threads have ended.
  std::uint64_t finish() {
    if (exception_) std::rethrow_exception(exception_);
    return next_;
  }

 private:
  const std::uint64_t count_;
  const std::function<bool(std::uint64_t)>& may_begin_;
  std::mutex mutex_;
  std::uint64_t next_ = 0;
  bool ended_ = false;
  std::exception_ptr exception_;
};

/// What each thread does.  Nothing may be thrown out of a parallel region.
void worker(Counter& counter, const std::function<void(std::uint64_t)>& work) noexcept {
  try {
    while (const auto number = counter.next()) work(*number);
  } catch (...) {
    counter.fail(std::current_exception());
  }
}

}  // namespace

std::uint64_t run_numbered(std::uint64_t count, unsigned threads, const std::function<bool(std::uint64_t)>& may_begin,
                           const std::function<void(std::uint64_t)>& work) {
  Counter counter(count, may_begin);
  const auto team = static_cast<int>(std::clamp<std::uint64_t>(count, 1, std::clamp(threads, 1U, 4096U)));
  if (team == 1) {
    worker(counter, work);
    return counter.finish();
  }
#ifdef ASSIZE_RUNNER_JTHREAD
  {
    std::vector<std::jthread> helpers;
    try {
      for (int i = 1; i < team; ++i) helpers.emplace_back([&] { worker(counter, work); });
    } catch (const std::system_error&) {
      // Fewer threads than wished for; those that run do all the work.
    }
    worker(counter, work);
  }
#else
#pragma omp parallel num_threads(team)
  worker(counter, work);
#endif
  return counter.finish();
}

}  // namespace assize::engine
