// What a long run tells whoever is watching.  The runner calls it; only the command line draws.
#pragma once
#include <cstdint>
#include <optional>
#include <string_view>

namespace assize {

/// A snapshot of a run: facts only, no formatting.
struct ProgressState {
  std::string_view task;                 ///< what is being done, for people
  std::uint64_t done = 0;                ///< operations finished
  std::uint64_t total = 0;               ///< operations planned
  double elapsed_seconds = 0;            ///< since the run began
  std::uint32_t at_least = 0;            ///< proved lower bound on the distance, 0 if none yet
  std::optional<std::uint32_t> at_most;  ///< weight of the lightest word seen
};

/// Calls may come from any thread, one at a time.
class Progress {
 public:
  virtual ~Progress() = default;
  virtual void update(const ProgressState& state) = 0;
};

}  // namespace assize
