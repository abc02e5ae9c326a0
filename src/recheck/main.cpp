// The program assize-recheck: one certificate in, one report out, the verdict as exit code.
#include <unistd.h>

#include <csignal>
#include <cstdio>
#include <exception>

#include "base/integers.hpp"
#include "base/version.hpp"
#include "recheck/brake.hpp"
#include "recheck/command_line.hpp"
#include "recheck/json.hpp"

namespace {

using namespace assize::recheck;

constexpr int exit_cannot_run = 2;

assize::StopFlag stop_flag;
std::atomic<bool> stop_seen{false};

/// The first signal ends the run in good order; the second one ends it at once.
extern "C" void on_signal(int number) {
  if (stop_seen.exchange(true)) std::_Exit(128 + number);
  stop_flag.request();
}

void listen_to_signals() {
  struct sigaction action {};
  action.sa_handler = on_signal;
  sigemptyset(&action.sa_mask);
  sigaction(SIGINT, &action, nullptr);
  sigaction(SIGTERM, &action, nullptr);
  std::signal(SIGPIPE, SIG_IGN);  // a closed pipe is an error of writing, reported as such
}

bool write_result(std::string_view text) {
  return std::fwrite(text.data(), 1, text.size(), stdout) == text.size() && std::fflush(stdout) == 0;
}

int cannot_run(const assize::Failure& failure, bool json) {
  if (json) {
    const Json error{
        Json::Object{{"what", Json{failure.what}}, {"where", Json{failure.where}}, {"cure", Json{failure.cure}}}};
    write_result(spell(Json{Json::Object{{"error", error}}}) + "\n");
    return exit_cannot_run;
  }
  std::string message = "assize-recheck: " + (failure.where.empty() ? "" : failure.where + ": ") + failure.what;
  if (!failure.cure.empty()) message += "; " + failure.cure;
  std::fprintf(stderr, "%s\n", message.c_str());
  return exit_cannot_run;
}

/// One line on a terminal, rewritten at most once a second.
class ProgressLine final : public assize::Progress {
 public:
  void update(const assize::ProgressState& state) override {
    if (state.elapsed_seconds < next_) return;
    next_ = state.elapsed_seconds + 1;
    const std::uint64_t percent =
        state.total == 0 ? 100 : static_cast<std::uint64_t>(assize::Uint128{state.done} * 100 / state.total);
    std::fprintf(stderr, "\r%.*s: %u %%  %.0f s ", static_cast<int>(state.task.size()), state.task.data(),
                 static_cast<unsigned>(percent), state.elapsed_seconds);
    drawn_ = true;
  }
  void clear() const {
    if (drawn_) std::fprintf(stderr, "\r\033[K");
  }

 private:
  double next_ = 1;
  bool drawn_ = false;
};

int check(CommandLine line) {
  const auto bytes = read_certificate_file(line.certificate);
  if (!bytes) return cannot_run(bytes.error(), line.json);
  ProgressLine progress;
  const SteadyClock clock;
  line.options.stop = &stop_flag;
  line.options.clock = &clock;
  if (!line.quiet && isatty(STDERR_FILENO) != 0) line.options.progress = &progress;
  const Report report = recheck(*bytes, line.options);
  progress.clear();
  std::string result = line.json ? to_json(report) : to_text(report);
  if (line.quiet && !line.json) result.resize(result.find('\n') + 1);
  if (!write_result(result))
    return cannot_run(assize::Failure{"standard output", "the report cannot be written", ""}, false);
  return exit_code(report.outcome);
}

int run(const std::vector<std::string>& arguments) {
  const auto line = read_command_line(arguments);
  if (!line) {
    bool json = false;
    for (const std::string& argument : arguments) json = json || argument == "--json";
    return cannot_run(line.error(), json);
  }
  if (line->help || line->version) {
    const std::string version = "assize-recheck " + std::string(assize::version) + ", certificates of version 1\n";
    const std::string_view text = line->help ? help_page() : version;
    if (write_result(text)) return 0;
    return cannot_run(assize::Failure{"standard output", "the text cannot be written", ""}, false);
  }
  return check(*line);
}

}  // namespace

int main(int argc, char** argv) {
  listen_to_signals();
  try {
    return run(std::vector<std::string>(argv + (argc > 0 ? 1 : 0), argv + argc));
  } catch (const std::exception& error) {
    return cannot_run(assize::Failure{"", error.what(), ""}, false);
  }
}
