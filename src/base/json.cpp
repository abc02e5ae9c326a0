// The canonical spelling of a JSON value.
#include "base/json.hpp"

#include <algorithm>
#include <cstdio>

namespace assize {

std::string json_quoted(std::string_view text) {
  static constexpr char digits[] = "0123456789abcdef";
  std::string out = "\"";
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
  return out += '"';
}

Json Json::fixed(double value, int digits) {
  char text[64];
  std::snprintf(text, sizeof text, "%.*f", digits, value);
  return Json(Value(Literal{text}));
}

const Json* Json::find(std::string_view key) const noexcept {
  const Object* object = as_object();
  if (object == nullptr) return nullptr;
  const auto member =
      std::ranges::find(*object, key, [](const auto& entry) -> std::string_view { return entry.first; });
  return member == object->end() ? nullptr : &member->second;
}

std::string Json::text() const {
  std::string out;
  append_to(out);
  return out;
}

void Json::append_to(std::string& out) const {
  const auto append_members = [&out](const auto& members, bool broken, char open, char close, auto append_one) {
    out += open;
    if (broken) out += '\n';
    bool first = true;
    for (const auto& member : members) {
      if (!first) out += broken ? ",\n" : ",";
      first = false;
      append_one(member);
    }
    out += close;
  };
  if (std::holds_alternative<std::monostate>(value_)) {
    out += "null";
  } else if (const bool* flag = std::get_if<bool>(&value_)) {
    out += *flag ? "true" : "false";
  } else if (const std::uint64_t* number = as_integer()) {
    out += std::to_string(*number);
  } else if (const std::string* string = as_string()) {
    out += json_quoted(*string);
  } else if (const Literal* literal = std::get_if<Literal>(&value_)) {
    out += literal->text;
  } else if (const Array* array = as_array()) {
    append_members(*array, std::ranges::any_of(*array, &Json::is_container), '[', ']',
                   [&out](const Json& value) { value.append_to(out); });
  } else if (const Object* object = as_object()) {
    append_members(*object, std::ranges::any_of(*object, [](const auto& entry) { return entry.second.is_container(); }),
                   '{', '}', [&out](const auto& entry) {
                     out += json_quoted(entry.first) + ":";
                     entry.second.append_to(out);
                   });
  }
}

}  // namespace assize
