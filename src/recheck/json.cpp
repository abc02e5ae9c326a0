// Writes a value in the spelling of section 1; the reader compares a whole certificate with what this file makes of it.
#include "recheck/json.hpp"

#include <algorithm>

namespace assize::recheck {
namespace {

bool is_nest(const Json& value) noexcept { return value.array() != nullptr || value.object() != nullptr; }

void write_string(const std::string& text, std::string& out) {
  static constexpr char digits[] = "0123456789abcdef";
  out += '"';
  for (const char c : text) {
    const auto byte = static_cast<unsigned char>(c);
    if (c == '"' || c == '\\') {
      out += '\\';
      out += c;
    } else if (byte < 0x20 || byte == 0x7f) {
      out += "\\u00";
      out += digits[byte >> 4];
      out += digits[byte & 15];
    } else {
      out += c;
    }
  }
  out += '"';
}

void write(const Json& value, std::string& out) {
  if (const auto* flag = std::get_if<bool>(&value.value)) {
    out += *flag ? "true" : "false";
  } else if (const auto* number = value.integer()) {
    out += std::to_string(*number);
  } else if (const auto* text = value.text()) {
    write_string(*text, out);
  } else if (const auto* array = value.array()) {
    const bool broken = std::any_of(array->begin(), array->end(), is_nest);
    out += '[';
    for (std::size_t i = 0; i < array->size(); ++i) {
      if (i > 0) out += ',';
      if (broken) out += '\n';
      write((*array)[i], out);
    }
    out += ']';
  } else if (const auto* object = value.object()) {
    const bool broken =
        std::any_of(object->begin(), object->end(), [](const Member& member) { return is_nest(member.value); });
    out += '{';
    for (std::size_t i = 0; i < object->size(); ++i) {
      if (i > 0) out += ',';
      if (broken) out += '\n';
      write_string((*object)[i].key, out);
      out += ':';
      write((*object)[i].value, out);
    }
    out += '}';
  }
}

}  // namespace

std::string spell(const Json& value) {
  std::string out;
  write(value, out);
  return out;
}

}  // namespace assize::recheck
