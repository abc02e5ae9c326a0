// Plain text pages.
#include "report/document.hpp"

#include <algorithm>
#include <cmath>
#include <cstdint>
#include <cstdio>

namespace assize::report {

namespace {

/// Free text of a sheet must not steer the terminal: control characters and changes of the writing direction are
/// replaced.
std::string printable(std::string_view text) {
  std::string out;
  for (std::size_t i = 0; i < text.size(); ++i) {
    const auto byte = static_cast<unsigned char>(text[i]);
    const std::string_view three = text.substr(i, 3);
    const bool turns = three >= "\xe2\x80\xaa" && three <= "\xe2\x80\xae";
    const bool isolates = three >= "\xe2\x81\xa6" && three <= "\xe2\x81\xa9";
    if (three.size() == 3 && (turns || isolates)) {
      out += '?';
      i += 2;
    } else {
      out += (byte < 0x20 && text[i] != '\n') || byte == 0x7f ? '?' : text[i];
    }
  }
  return out;
}

}  // namespace

Page& Page::line(std::string_view name, std::string_view value) {
  if (!value.empty()) lines_.emplace_back(name, value);
  return *this;
}

std::string Page::text() const {
  std::size_t width = 0;
  for (const auto& [name, value] : lines_) width = std::max(width, name.size());
  std::string out = headline_ + "\n";
  for (const auto& [name, value] : lines_) {
    const std::string margin(width + 4, ' ');
    out += "  " + name + std::string(width - name.size() + 2, ' ');
    for (const char c : printable(value)) {
      out += c;
      if (c == '\n') out += margin;
    }
    out += '\n';
  }
  return out;
}

std::string parameters(std::uint32_t order, std::uint32_t length, std::uint32_t dimension) {
  return "[" + std::to_string(length) + "," + std::to_string(dimension) + "] over GF(" + std::to_string(order) + ")";
}

std::string joined(const std::vector<std::string>& lines) {
  std::string text;
  for (const std::string& line : lines) text += (text.empty() ? "" : "\n") + line;
  return text;
}

Json strings(const std::vector<std::string>& lines) {
  Json::Array array;
  for (const std::string& line : lines) array.emplace_back(line);
  return array;
}

std::string readable(const BigInteger& count) {
  const std::string digits = to_decimal(count);
  return digits.size() <= 24 ? grouped_decimal(count) : "about 10^" + std::to_string(digits.size() - 1);
}

std::string duration_text(double seconds) {
  if (!std::isfinite(seconds)) return "longer than can be counted";
  constexpr double minute = 60;
  constexpr double hour = 60 * minute;
  constexpr double day = 24 * hour;
  constexpr double year = 365.25 * day;
  const auto pair = [](double whole, const char* unit, double rest, const char* small) {
    char text[64];
    std::snprintf(text, sizeof text, "%.0f %s %.0f %s", whole, unit, rest, small);
    return std::string(text);
  };
  char text[64];
  if (seconds < 10) {
    std::snprintf(text, sizeof text, "%.2f s", seconds);
  } else if (seconds < 2 * minute) {
    std::snprintf(text, sizeof text, "%.0f s", seconds);
  } else if (seconds < 2 * hour) {
    return pair(std::floor(seconds / minute), "min", std::fmod(seconds, minute), "s");
  } else if (seconds < 2 * day) {
    return pair(std::floor(seconds / hour), "h", std::fmod(seconds, hour) / minute, "min");
  } else if (seconds < 2 * year) {
    std::snprintf(text, sizeof text, "%.0f days", seconds / day);
  } else if (seconds < 1e4 * year) {
    std::snprintf(text, sizeof text, "%.0f years", seconds / year);
  } else {
    std::snprintf(text, sizeof text, "about 10^%.0f years", std::floor(std::log10(seconds / year)));
  }
  return text;
}

}  // namespace assize::report
