// Strict reading: whatever the writer would not have written is refused.
#include "certificate/read.hpp"

#include "base/digest.hpp"
#include "certificate/certificate.hpp"
#include "certificate/strict_json.hpp"

namespace assize::certificate {

Result<Json> read_envelope(std::string_view bytes) {
  if (bytes.size() > largest_certificate)
    return Failure{"", "the file is larger than any certificate", "name a certificate written by assize certify"};
  const std::string_view key = "\"closing_digest\":\"";
  const std::size_t last_line = bytes.size() < 2 ? 0 : bytes.rfind('\n', bytes.size() - 2) + 1;
  if (!bytes.ends_with("\"}\n") || bytes.substr(last_line, key.size()) != key)
    return Failure{"", "the file does not end with a closing digest", "it is not a certificate, or it was cut short"};
  auto value = parse_strict_json(bytes.substr(0, bytes.size() - 1));
  if (!value) return value.error();
  const Json* format = value->find("format");
  const Json* version = value->find("version");
  if (format == nullptr || format->as_string() == nullptr || *format->as_string() != "assize certificate")
    return Failure{"", "the file is not a certificate", "name a certificate written by assize certify"};
  if (version == nullptr || version->as_integer() == nullptr || *version->as_integer() != 1)
    return Failure{"", "the certificate has an unknown version", "use the program that wrote it"};
  const Json* digest = value->find("closing_digest");
  if (digest == nullptr || digest->as_string() == nullptr ||
      *digest->as_string() != digest_hex(bytes.substr(0, last_line)))
    return Failure{"", "the closing digest does not match: the file was altered", ""};
  if (value->text() + "\n" != bytes) return Failure{"", "the file is not in the one spelling of a certificate", ""};
  return value;
}

Result<std::string> description_digest_of(std::string_view bytes) {
  const auto value = read_envelope(bytes);
  if (!value) return value.error();
  const Json* claim = value->find("claim");
  const Json* code = claim == nullptr ? nullptr : claim->find("code");
  const Json* digest = code == nullptr ? nullptr : code->find("description_digest");
  if (digest == nullptr || digest->as_string() == nullptr) return Failure{"", "the certificate names no code", ""};
  return *digest->as_string();
}

}  // namespace assize::certificate
