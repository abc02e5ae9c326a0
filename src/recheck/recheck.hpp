// The independent checker: reads a certificate and decides whether its statements hold.
//
// It is written from certs/FORMAT.md alone and shares nothing with the programs that produce certificates except a few
// plain tools (digest, big integers, failures as values).  A defect of the producer therefore has no twin here.
#pragma once
#include <cstdint>
#include <optional>
#include <string>
#include <string_view>
#include <vector>

#include "base/clock.hpp"
#include "base/progress.hpp"
#include "base/result.hpp"
#include "base/stop.hpp"

namespace assize::recheck {

/// How much of the enumeration evidence is executed again (format text, section 5, "Depths").
enum class Depth { quick, spot, full };

/// The verdict on a certificate.
enum class Outcome { proven, consistent, rejected };

/// 0 proven, 3 consistent, 1 rejected.
int exit_code(Outcome outcome) noexcept;
/// "PROVEN", "CONSISTENT", "REJECTED".
std::string_view name(Outcome outcome) noexcept;
/// "quick", "spot", "full".
std::string_view name(Depth depth) noexcept;

struct Options {
  Depth depth = Depth::full;
  std::uint64_t seed = 1;          ///< draws the shards of a spot check
  unsigned threads = 1;            ///< over shards; the report does not depend on it
  const StopFlag* stop = nullptr;  ///< ends the run early when set
  const Clock* clock = nullptr;    ///< the steady clock of the machine if absent
  double budget_seconds = 0;       ///< 0: none
  Progress* progress = nullptr;
  std::optional<std::string> expected_description_digest;  ///< a certificate about another code is rejected
};

/// What became of one statement.
enum class Status { proven, consistent, rejected, not_checked };
/// "proven", "consistent", "rejected", "not checked".
std::string_view name(Status status) noexcept;

struct Finding {
  std::string statement;  ///< plain sentence: "minimum distance exactly 7"
  Status status = Status::not_checked;
  std::string because;  ///< the evidence and what was done with it, or why the statement is wrong
};

struct Report {
  Outcome outcome = Outcome::rejected;
  std::string reason;  ///< one sentence; for a rejected certificate what is wrong and where
  std::string title;
  std::uint64_t order = 0;
  std::uint64_t length = 0;
  std::uint64_t dimension = 0;
  std::vector<Finding> findings;
  std::string description_digest;
  std::string sheet_digest;
  std::uint64_t shards_total = 0;  ///< in all plans together; at most 2^53 - 1, then "that many or more"
  std::uint64_t shards_present = 0;
  std::uint64_t shards_reexecuted = 0;
  std::uint64_t seed = 1;
  Depth depth = Depth::full;
  std::string catch_probability;  ///< that one bad shard would have been caught, "12/64"; empty without shards
  std::vector<std::string> cautions;
  bool ended_early = false;
};

/// Checks one certificate.  Never throws; malicious bytes lead to a rejected report.
Report recheck(std::string_view certificate_bytes, const Options& options) noexcept;

/// Reads a certificate file of at most 16 MiB.
Result<std::string> read_certificate_file(const std::string& path);

/// One page for a human; the first line is the verdict.
std::string to_text(const Report& report);

/// One JSON document, ended by a line break.
std::string to_json(const Report& report);

}  // namespace assize::recheck
