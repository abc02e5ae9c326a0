// stdout, stderr and signals.
#include "cli/terminal.hpp"

#include <unistd.h>

#include <cerrno>
#include <csignal>

namespace assize::cli {

namespace {

std::atomic<bool> stop_requested{false};
static_assert(std::atomic<bool>::is_always_lock_free);

extern "C" void on_signal(int number) {
  if (stop_requested.exchange(true)) _exit(128 + number);
  constexpr std::string_view notice = "\nending within a few seconds; once more ends at once\n";
  if (isatty(STDERR_FILENO) == 1) static_cast<void>(!write(STDERR_FILENO, notice.data(), notice.size()));
}

bool write_all(int file, std::string_view text) {
  while (!text.empty()) {
    const ssize_t written = write(file, text.data(), text.size());
    if (written < 0 && errno == EINTR) continue;
    if (written < 0) return false;
    text.remove_prefix(static_cast<std::size_t>(written));
  }
  return true;
}

}  // namespace

bool print(std::string_view text) { return write_all(STDOUT_FILENO, text); }

void complain(std::string_view text) { static_cast<void>(write_all(STDERR_FILENO, text)); }

const std::atomic<bool>& watch_signals() {
  struct sigaction action {};
  action.sa_handler = on_signal;
  sigemptyset(&action.sa_mask);
  sigaction(SIGINT, &action, nullptr);
  sigaction(SIGTERM, &action, nullptr);
  return stop_requested;
}

void turn_signals_of_writing_into_errors() {
  struct sigaction action {};
  action.sa_handler = SIG_IGN;
  sigemptyset(&action.sa_mask);
  sigaction(SIGPIPE, &action, nullptr);
  sigaction(SIGXFSZ, &action, nullptr);
}

}  // namespace assize::cli
