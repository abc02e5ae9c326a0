// The values a certificate consists of, and their one spelling (format text, section 1).
#pragma once
#include <cstdint>
#include <string>
#include <string_view>
#include <variant>
#include <vector>

#include "base/result.hpp"

namespace assize::recheck {

struct Member;

/// One value: true/false, an integer, a string, an array or an object whose keys keep their order.
struct Json {
  using Array = std::vector<Json>;
  using Object = std::vector<Member>;
  std::variant<bool, std::uint64_t, std::string, Array, Object> value = false;

  [[nodiscard]] const std::string* text() const noexcept { return std::get_if<std::string>(&value); }
  [[nodiscard]] const std::uint64_t* integer() const noexcept { return std::get_if<std::uint64_t>(&value); }
  [[nodiscard]] const Array* array() const noexcept { return std::get_if<Array>(&value); }
  [[nodiscard]] const Object* object() const noexcept { return std::get_if<Object>(&value); }
};

struct Member {
  std::string key;
  Json value;
};

/// The spelling of section 1, without a line break at the end.
std::string spell(const Json& value);

/// Parses strictly: no repeated key, nothing but the values of section 1, within the limits.
Result<Json> parse(std::string_view bytes);

}  // namespace assize::recheck
