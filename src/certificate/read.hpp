// Reading a certificate strictly enough to know what it is about: before it is replaced, and before it is signed.
#pragma once
#include <string>
#include <string_view>

#include "base/json.hpp"
#include "base/result.hpp"

namespace assize::certificate {

/// The value of a certificate whose bytes are exactly as written by to_bytes: strict JSON, canonical spelling, right
/// closing digest, known format and version.  Whether its claims hold is not asked here; that is `recheck`.
Result<Json> read_envelope(std::string_view bytes);

/// Digest of the description that a certificate is about.
Result<std::string> description_digest_of(std::string_view bytes);

}  // namespace assize::certificate
