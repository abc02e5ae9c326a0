// Where the program meets the machine's clock and processors.
#include "api/world.hpp"

#include <chrono>
#include <ctime>
#include <thread>

#include "base/version.hpp"

namespace assize::api {

double SteadyClock::seconds() const {
  return std::chrono::duration<double>(std::chrono::steady_clock::now().time_since_epoch()).count();
}

void ForwardedProgress::update(const ProgressState& state) {
  if (!*function_) return;
  (*function_)({state.task, state.done, state.total, state.elapsed_seconds, state.at_least, state.at_most});
}

Result<void> settle(const Run& run, World& world) {
  constexpr unsigned most_threads = 4096;
  if (run.threads > most_threads)
    return Failure{"--threads", std::to_string(run.threads) + " threads are too many",
                   "write a number from 1 to " + std::to_string(most_threads)};
  world.threads = run.threads > 0 ? run.threads : std::max(1U, std::thread::hardware_concurrency());
  world.kernel = run.kernel.empty() ? kernel::runnable_here().front() : kernel::find(run.kernel);
  if (world.kernel == nullptr) {
    std::string names;
    for (const std::string& name : kernel_names()) names += (names.empty() ? "" : ", ") + name;
    return Failure{"--kernel", "the kernel \"" + run.kernel + "\" is not known or does not run on this machine",
                   "here run: " + names};
  }
  if (!run.method.empty()) {
    world.goal.method = plan::find_method(run.method);
    if (!world.goal.method) {
      std::string names;
      for (const std::string& name : method_names()) names += (names.empty() ? "" : ", ") + name;
      return Failure{"--method", "\"" + run.method + "\" is not a method", "write one of " + names};
    }
  }
  return {};
}

std::string utc_now() {
  const std::time_t now = std::time(nullptr);
  std::tm parts{};
  gmtime_r(&now, &parts);
  char text[32];
  std::strftime(text, sizeof text, "%Y-%m-%dT%H:%M:%SZ", &parts);
  return text;
}

Problem to_problem(const Failure& failure) {
  return {failure.where, failure.what, failure.cure, failure.what.starts_with("self-check failed")};
}

std::string program_name() { return "assize " + std::string(version); }

std::vector<std::string> method_names() {
  std::vector<std::string> names;
  for (const std::string_view name : plan::method_names()) names.emplace_back(name);
  return names;
}

std::vector<std::string> kernel_names() {
  std::vector<std::string> names;
  for (const kernel::KernelSet* set : kernel::runnable_here()) names.emplace_back(set->name);
  return names;
}

}  // namespace assize::api
