// A certificate as a value, and its exact bytes (certs/FORMAT.md).
//
// This room copies claims; it never computes or strengthens one.
#pragma once
#include <string>
#include <vector>

#include "base/json.hpp"
#include "evidence/conclusions.hpp"
#include "sheet/description.hpp"

namespace assize::certificate {

/// Which code the claims are about.
struct CodeIdentity {
  Json description;  ///< canonical
  std::string description_digest;
  std::string sheet_digest;
  std::uint32_t order = 2;
  std::uint32_t length = 0;
  std::uint32_t dimension = 0;
  std::string reduced_generator_digest;
};

/// When and how; not part of the claim.
struct Context {
  std::string program;
  std::string method;
  std::string kernel;
  unsigned threads = 1;
  std::string started;  ///< UTC, YYYY-MM-DDThh:mm:ssZ
  std::string seconds;  ///< decimal text
  std::string ended;    ///< complete, refuted, budget or interrupted
};

struct Certificate {
  std::string title;
  CodeIdentity code;
  std::vector<evidence::Statement> statements;  ///< their evidence indexes point into `evidence`
  std::vector<evidence::Item> evidence;
  std::vector<std::string> cautions;
  Context context;
};

/// Largest certificate, in bytes.
inline constexpr std::uint64_t largest_certificate = 16U << 20;

/// The bytes, closing digest included.
std::string to_bytes(const Certificate& certificate);

/// The parts that must not depend on threads, kernels or time, as they stand in the bytes.
Json claim_json(const Certificate& certificate);
Json evidence_json(const Certificate& certificate);

}  // namespace assize::certificate
