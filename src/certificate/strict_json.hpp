// JSON text -> value, refusing everything that a certificate must not contain; private to this room.
#pragma once
#include <string_view>

#include "base/json.hpp"
#include "base/result.hpp"

namespace assize::certificate {

/// Refuses duplicate keys, fractions, signs, null, nesting over 16 and anything after the value.
Result<Json> parse_strict_json(std::string_view text);

}  // namespace assize::certificate
