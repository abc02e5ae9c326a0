// Drawing progress: only on a terminal unless asked, without colour where NO_COLOR is set.
#include <sys/ioctl.h>
#include <unistd.h>

#include <algorithm>
#include <cstdio>
#include <cstdlib>

#include "cli/terminal.hpp"

namespace assize::cli {

namespace {

std::string clock_text(double seconds) {
  char text[32];
  if (seconds < 60)
    std::snprintf(text, sizeof text, "%.0f s", seconds);
  else if (seconds < 3600)
    std::snprintf(text, sizeof text, "%d:%02d min", static_cast<int>(seconds) / 60, static_cast<int>(seconds) % 60);
  else
    std::snprintf(text, sizeof text, "%.1f h", seconds / 3600);
  return text;
}

std::size_t terminal_width() {
  winsize size{};
  if (ioctl(STDERR_FILENO, TIOCGWINSZ, &size) != 0 || size.ws_col < 20) return 80;
  return size.ws_col;
}

}  // namespace

std::string progress_line(const api::Progress& progress, std::size_t width) {
  const double share =
      progress.total == 0 ? 0 : static_cast<double>(progress.done) / static_cast<double>(progress.total);
  constexpr std::size_t cells = 24;
  const auto filled = static_cast<std::size_t>(share * static_cast<double>(cells));
  char percent[16];
  std::snprintf(percent, sizeof percent, "%5.1f %%", 100 * share);
  std::string line(progress.task);
  line += " [" + std::string(filled, '#') + std::string(cells - filled, '.') + "]" + percent;
  if (progress.done > 0 && progress.elapsed_seconds > 0) {
    const double rate = static_cast<double>(progress.done) / progress.elapsed_seconds;
    char text[48];
    std::snprintf(text, sizeof text, "  %.3g words/s", rate);
    line += text;
    line += "  left " + clock_text(static_cast<double>(progress.total - progress.done) / rate);
  }
  if (progress.at_most) {
    line += progress.at_least > 0 ? "  " + std::to_string(progress.at_least) + " <= d" : "  d";
    line += " <= " + std::to_string(*progress.at_most);
  }
  if (line.size() > width) line.resize(width);
  return line;
}

ProgressBar::ProgressBar(bool wanted, bool quiet)
    : on_(!quiet && (wanted || isatty(STDERR_FILENO) == 1)),
      colour_(isatty(STDERR_FILENO) == 1 && std::getenv("NO_COLOR") == nullptr),
      terminal_(isatty(STDERR_FILENO) == 1) {}

ProgressBar::~ProgressBar() {
  if (drawn_ && terminal_) complain("\r\x1b[K");  // leaves the line empty for the result
}

std::function<void(const api::Progress&)> ProgressBar::listener() {
  if (!on_) return {};
  return [this](const api::Progress& progress) { draw(progress); };
}

void ProgressBar::draw(const api::Progress& progress) {
  // A run that is over at once needs no bar.
  if (!drawn_ && terminal_ && progress.elapsed_seconds < 0.2) return;
  drawn_ = true;
  const std::string line = progress_line(progress, terminal_width() - 1);
  if (!terminal_)
    complain(line + "\n");
  else
    complain("\r" + (colour_ ? "\x1b[36m" + line + "\x1b[0m" : line) + "\x1b[K");
}

}  // namespace assize::cli
