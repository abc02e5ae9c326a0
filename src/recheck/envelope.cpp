// Parses, spells again, compares, and only then believes the closing digest.
#include "recheck/envelope.hpp"

#include <algorithm>

#include "base/digest.hpp"
#include "recheck/keys.hpp"

namespace assize::recheck {
namespace {

Result<void> compare_spelling(std::string_view bytes, const Json& whole) {
  const std::string expected = spell(whole) + "\n";
  if (bytes == expected) return {};
  const auto [found, wanted] = std::mismatch(bytes.begin(), bytes.end(), expected.begin(), expected.end());
  return Failure{"byte " + std::to_string(found - bytes.begin()),
                 "the text departs from the one spelling of section 1 of the format", ""};
}

bool is_moment(std::string_view text) {
  constexpr std::string_view shape = "0000-00-00T00:00:00Z";
  if (text.size() != shape.size()) return false;
  for (std::size_t i = 0; i < shape.size(); ++i)
    if (shape[i] == '0' ? text[i] < '0' || text[i] > '9' : text[i] != shape[i]) return false;
  return true;
}

Result<void> check_context(const Json& context) {
  Keys keys(context, "context");
  keys.text("program");
  keys.text("method");
  keys.text("kernel");
  keys.integer("threads");
  if (!is_moment(keys.text("started"))) keys.refuse("started", "a moment like 2025-01-31T09:30:00Z is expected here");
  keys.text("seconds");
  const std::string ended = keys.text("ended");
  if (ended != "complete" && ended != "refuted" && ended != "budget" && ended != "interrupted")
    keys.refuse("ended", "complete, refuted, budget or interrupted is expected here");
  return keys.end();
}

Result<void> check_closing_digest(std::string_view bytes, const std::string& digest) {
  // The spelling has been checked, so the last line has exactly this length.
  const std::size_t last_line = std::string_view("\"closing_digest\":\"\"}\n").size() + digest.size();
  if (digest_hex(bytes.substr(0, bytes.size() - last_line)) == digest) return {};
  return Failure{"closing_digest", "the digest is not that of the bytes before its line", ""};
}

}  // namespace

Result<Envelope> read_envelope(std::string_view bytes) {
  auto parsed = parse(bytes);
  if (!parsed) return parsed.error();
  if (auto same = compare_spelling(bytes, *parsed); !same) return same.error();
  Envelope envelope{std::move(*parsed), {}, {}};
  Keys keys(envelope.whole, "");
  if (keys.text("format") != "assize certificate") keys.refuse("format", "\"assize certificate\" is expected here");
  if (keys.integer("version") != 1) keys.refuse("version", "this checker knows version 1 only");
  envelope.title = keys.text("title");
  keys.object("claim");
  keys.array("evidence");
  const Json::Array& cautions = keys.array("cautions");
  const Json& context = keys.object("context");
  const std::string digest = keys.digest("closing_digest");
  if (auto end = keys.end(); !end) return end.error();
  for (std::size_t i = 0; i < cautions.size(); ++i) {
    if (cautions[i].text() == nullptr)
      return Failure{"cautions[" + std::to_string(i) + "]", "a string is expected here", ""};
    envelope.cautions.push_back(*cautions[i].text());
  }
  if (auto right = check_context(context); !right) return right.error();
  if (auto right = check_closing_digest(bytes, digest); !right) return right.error();
  return envelope;
}

}  // namespace assize::recheck
