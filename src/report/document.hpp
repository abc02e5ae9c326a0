// What a command answers: the same facts once for people and once for machines.
#pragma once
#include <string>
#include <string_view>
#include <vector>

#include "base/integers.hpp"
#include "base/json.hpp"

namespace assize::report {

/// `text` ends with a line break and its first line stands by itself; `json` is one document, ended by a line break.
struct Document {
  std::string text;
  std::string json;
};

/// Lines of "name   value" under a headline, the values aligned.
class Page {
 public:
  explicit Page(std::string headline) : headline_(std::move(headline)) {}
  /// A value of several lines is indented below its first.  Empty values are left out.
  Page& line(std::string_view name, std::string_view value);
  [[nodiscard]] std::string text() const;

 private:
  std::string headline_;
  std::vector<std::pair<std::string, std::string>> lines_;
};

/// "[23,12] over GF(2)"
std::string parameters(std::uint32_t order, std::uint32_t length, std::uint32_t dimension);

/// One a line; and as a JSON array.
std::string joined(const std::vector<std::string>& lines);
Json strings(const std::vector<std::string>& lines);

/// All digits up to 10^24, "about 10^540" beyond.
std::string readable(const BigInteger& count);

/// "0.42 s", "12 s", "3 min 20 s", "5 h 10 min", "12 days", "about 10^9 years": rough on purpose.
std::string duration_text(double seconds);

}  // namespace assize::report
