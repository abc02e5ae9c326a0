// Catching the faults of machines and programs: every shard, and the total, must agree with what is known beforehand.
//
// The checks are cheap closed forms that share no arithmetic with the kernels: a count moved from one weight to another
// changes a moment, a lost word changes the size, and a wrong word is seldom in the right structure.
#pragma once
#include <cstdint>
#include <optional>
#include <string>
#include <string_view>

#include "base/result.hpp"
#include "code/linear_code.hpp"
#include "engine/moments.hpp"
#include "engine/shard_engine.hpp"
#include "evidence/enumeration.hpp"

namespace assize::engine {

/// How the `what` of a failed check begins; no other failure begins so.
inline constexpr std::string_view self_check_failed = "self-check failed: ";

/// The failure blames this program or this machine, not its input (exit code 4).
bool is_self_check_failure(const Failure& failure) noexcept;
Failure self_check_failure(std::string where, std::string_view what);

class FaultChecks {
 public:
  /// The code must outlive the checks.
  FaultChecks(const code::LinearCode& code, evidence::EnumerationPlan plan);

  /// What is wrong with the finding of a shard; nothing if all is well.
  [[nodiscard]] std::optional<std::string> fault_of_shard(std::uint64_t number, const Finding& finding) const;
  /// What is wrong with a complete enumeration of sound shards.
  [[nodiscard]] std::optional<std::string> fault_of_total(const evidence::Enumeration& enumeration) const;

 private:
  [[nodiscard]] std::optional<std::string> fault_of_lightest(std::uint64_t number, const Finding& finding) const;

  const code::LinearCode& code_;
  evidence::EnumerationPlan plan_;
  CosetMoments moments_;
  std::uint32_t divisor_ = 1;  ///< divides every weight
  bool complements_ = false;   ///< binary, and the all-one word belongs to the code
};

}  // namespace assize::engine
