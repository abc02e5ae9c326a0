// Everything that touches the outside of the process: stdout, stderr, signals.
#pragma once
#include <atomic>
#include <functional>
#include <string>
#include <string_view>

#include "api/assize.hpp"

namespace assize::cli {

/// Writes all of `text` to stdout; false if it cannot be written.
bool print(std::string_view text);
/// Writes to stderr, as well as it can.
void complain(std::string_view text);

/// A broken pipe, or a file that may not grow, becomes an error of write() instead of a signal.
void turn_signals_of_writing_into_errors();

/// From now on the first SIGINT or SIGTERM sets the returned flag, and a second one ends the process with 128 + its
/// number.
const std::atomic<bool>& watch_signals();

/// A line on stderr that is drawn over and over while a run goes on.
class ProgressBar {
 public:
  /// `wanted`: --progress; otherwise only where stderr is a terminal.
  ProgressBar(bool wanted, bool quiet);
  ~ProgressBar();
  ProgressBar(const ProgressBar&) = delete;
  ProgressBar& operator=(const ProgressBar&) = delete;
  /// The function to hand to a run.
  [[nodiscard]] std::function<void(const api::Progress&)> listener();

 private:
  void draw(const api::Progress& progress);
  bool on_;
  bool colour_;
  bool terminal_;
  bool drawn_ = false;
};

/// One line for a snapshot, `width` characters at most: share done, rate, time left, bounds.
std::string progress_line(const api::Progress& progress, std::size_t width);

}  // namespace assize::cli
