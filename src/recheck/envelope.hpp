// The top object of a certificate (format text, section 2), checked down to its last byte.
#pragma once
#include <string>
#include <string_view>
#include <vector>

#include "recheck/json.hpp"

namespace assize::recheck {

struct Envelope {
  Json whole;  ///< owns what `claim` and `evidence` return
  std::string title;
  std::vector<std::string> cautions;

  [[nodiscard]] const Json& claim() const { return (*whole.object())[3].value; }
  [[nodiscard]] const Json::Array& evidence() const { return *(*whole.object())[4].value.array(); }
};

Result<Envelope> read_envelope(std::string_view bytes);

}  // namespace assize::recheck
