// What an engine does: enumerate one shard.  Everything around it (threads, checks, folding) is common to all engines.
#pragma once
#include <cstdint>
#include <functional>
#include <memory>
#include <optional>
#include <string>
#include <vector>

#include "code/linear_code.hpp"
#include "evidence/enumeration.hpp"
#include "kernel/kernel_set.hpp"

namespace assize::engine {

/// What an engine found in one shard.
struct Finding {
  evidence::WeightCounts counts;
  std::uint32_t lightest_weight = UINT32_MAX;  ///< UINT32_MAX if the shard is empty
  std::uint64_t lightest_tail = 0;             ///< the last s digits of the least message of that weight, as a number
  std::optional<std::string> fault;            ///< what went wrong on the way, if anything did
  bool given_up = false;                       ///< the shard was left half-way; the rest says nothing
};

/// Asked from time to time inside a shard; true: leave it.
using GiveUp = std::function<bool()>;

/// Some hundredths of a second's work: how often an engine asks whether to give up.
inline constexpr std::uint64_t messages_between_questions = 1ULL << 24;

/// Immutable once made, so that any number of threads may use it.
class ShardEngine {
 public:
  virtual ~ShardEngine() = default;
  [[nodiscard]] virtual Finding run(std::uint64_t shard, const GiveUp& give_up) const = 0;
  /// To the end, however long that takes.
  [[nodiscard]] Finding run(std::uint64_t shard) const {
    return run(shard, [] { return false; });
  }
};

/// The message of k symbols in a shard whose last s digits form the number `tail`.
std::vector<field::Element> message_in_shard(const evidence::EnumerationPlan& plan, std::uint64_t shard,
                                             std::uint64_t tail);

/// Field arithmetic symbol by symbol, any q: the oracle.  The code must outlive the engine.
std::unique_ptr<ShardEngine> make_plain(const code::LinearCode& code, const evidence::EnumerationPlan& plan);

/// Table-driven walks through a kernel, q <= 256 (contract).  Code and kernel must outlive the engine.
std::unique_ptr<ShardEngine> make_exhaust(const code::LinearCode& code, const evidence::EnumerationPlan& plan,
                                          const kernel::KernelSet& kernel);

}  // namespace assize::engine
