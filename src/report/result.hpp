// Answers of `certify` and `weights`, and the forecast of `--plan`.
#pragma once
#include <optional>
#include <string>
#include <vector>

#include "base/integers.hpp"
#include "evidence/conclusions.hpp"
#include "evidence/verdict.hpp"
#include "report/document.hpp"

namespace assize::report {

struct Parameters {
  std::uint32_t order = 2;
  std::uint32_t length = 0;
  std::uint32_t dimension = 0;
};

struct CertifyFacts {
  Parameters code;
  evidence::Verdict verdict = evidence::Verdict::undecided;
  std::optional<std::uint32_t> wanted;  ///< --at-least
  std::string witness;                  ///< spelled; empty if there is none
  std::string method;                ///< what was run: "exhaust", "plain"; or what sufficed: "theorem", "generator row"
  std::string certificate;           ///< path; empty if none was written
  bool weights_missing = false;      ///< they were asked for, and are not complete
  std::vector<std::string> notices;  ///< about the code: dependent rows, zero positions
  std::string remark;                ///< why the run ended early or did not start
  std::uint64_t shards_done = 0;
  std::uint64_t shards_planned = 0;
  double seconds = 0;
};

Document certify(const CertifyFacts& facts, const evidence::Conclusions& conclusions,
                 const std::vector<evidence::Item>& items);

struct WeightsFacts {
  Parameters code;
  std::string method;
  std::string remark;
  std::uint64_t shards_done = 0;
  std::uint64_t shards_planned = 0;
  double seconds = 0;
};

/// Complete where `complete`; otherwise `counts` is what the completed shards hold, scalar multiples included.
Document weights(const WeightsFacts& facts, bool complete, const evidence::WeightDistribution& counts);

struct PlanLine {
  std::string method;
  BigInteger messages;
  BigInteger operations;
  std::uint64_t memory_bytes = 0;
  std::uint64_t shards = 0;       ///< 0: too many messages for any machine
  std::optional<double> seconds;  ///< forecast on this machine
  bool chosen = false;
};

Document plan(const Parameters& code, const std::vector<PlanLine>& lines, unsigned threads);

}  // namespace assize::report
