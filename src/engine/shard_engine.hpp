// What an engine does: enumerate one shard.  Everything around it (threads, checks, folding) is common to all engines.
#pragma once
#include <cstdint>
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
};

/// Immutable once made, so that any number of threads may use it.
class ShardEngine {
 public:
  virtual ~ShardEngine() = default;
  [[nodiscard]] virtual Finding run(std::uint64_t shard) const = 0;
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
