// What will be done, decided before anything runs: a pure function of the code and the wish.
//
// Engines are chosen by operation counts and a fixed table of costs, never by a measured rate, so the plan, which is
// evidence, is the same on every machine.
#pragma once
#include <cstdint>
#include <optional>
#include <string>
#include <string_view>
#include <vector>

#include "base/integers.hpp"
#include "base/result.hpp"
#include "code/linear_code.hpp"
#include "evidence/enumeration.hpp"

namespace assize::plan {

enum class Method { plain, exhaust };
std::string_view name(Method method) noexcept;
std::optional<Method> find_method(std::string_view name) noexcept;
/// All names, for messages and help.
std::vector<std::string_view> method_names();

struct Goal {
  std::optional<Method> method;  ///< the user's choice; otherwise the cheapest
};

/// One way of doing the job and what it costs.
struct Plan {
  Method method = Method::exhaust;
  BigInteger messages;             ///< normalised messages to be encoded: (q^k - 1)/(q - 1)
  BigInteger operations;           ///< in units of the cost table: one XOR and population count of a machine word
  std::uint64_t memory_bytes = 0;  ///< predicted peak of the tables and results
  /// The shards; nothing when there are too many messages for any machine (more than 2^62).
  std::optional<evidence::EnumerationPlan> enumeration;
};

/// Plans for every applicable method, cheapest first.  Never fails for a valid code.
std::vector<Plan> applicable(const code::LinearCode& code);

/// The plan to follow: the wished method, or the cheapest.
Result<Plan> choose(const code::LinearCode& code, const Goal& goal);

}  // namespace assize::plan
