// A JSON value with one spelling: what descriptions, certificates and --json documents are written from.
//
// Writing only; each reader has its own.  The spelling is that of certs/FORMAT.md section 1: containers of scalars on
// one line, all others with one member a line, no other blank.  Values are integers, strings, booleans, arrays,
// objects, null.
#pragma once
#include <cstdint>
#include <string>
#include <string_view>
#include <utility>
#include <variant>
#include <vector>

namespace assize {

class Json {
 public:
  using Array = std::vector<Json>;
  using Object = std::vector<std::pair<std::string, Json>>;  ///< in the order of writing

  Json() = default;                                           ///< null
  Json(std::string text) : value_(std::move(text)) {}         // NOLINT: implicit on purpose
  Json(std::string_view text) : value_(std::string(text)) {}  // NOLINT: implicit on purpose
  Json(const char* text) : value_(std::string(text)) {}       // NOLINT: implicit on purpose
  Json(Array array) : value_(std::move(array)) {}             // NOLINT: implicit on purpose
  Json(Object object) : value_(std::move(object)) {}          // NOLINT: implicit on purpose
  static Json integer(std::uint64_t value) { return Json(Value(value)); }
  static Json boolean(bool value) { return Json(Value(value)); }
  static Json null() { return {}; }
  /// A number with `digits` digits after the point: times and rates in --json documents, never in a certificate.
  static Json fixed(double value, int digits);
  /// Array of integers.
  template <class Range>
  static Json integers(const Range& range) {
    Array array;
    for (const auto value : range) array.push_back(integer(static_cast<std::uint64_t>(value)));
    return array;
  }

  [[nodiscard]] const std::string* as_string() const noexcept { return std::get_if<std::string>(&value_); }
  [[nodiscard]] const std::uint64_t* as_integer() const noexcept { return std::get_if<std::uint64_t>(&value_); }
  [[nodiscard]] const Array* as_array() const noexcept { return std::get_if<Array>(&value_); }
  [[nodiscard]] const Object* as_object() const noexcept { return std::get_if<Object>(&value_); }
  /// Member of an object; null pointer if this is no object or has no such key.
  [[nodiscard]] const Json* find(std::string_view key) const noexcept;
  [[nodiscard]] bool is_container() const noexcept { return as_array() != nullptr || as_object() != nullptr; }

  /// The one spelling, without a final line break.
  [[nodiscard]] std::string text() const;

  friend bool operator==(const Json&, const Json&) = default;

 private:
  struct Literal {
    std::string text;
    friend bool operator==(const Literal&, const Literal&) = default;
  };
  using Value = std::variant<std::monostate, bool, std::uint64_t, std::string, Array, Object, Literal>;
  explicit Json(Value value) : value_(std::move(value)) {}
  void append_to(std::string& out) const;
  Value value_;
};

/// Text in double quotes with the escapes of certs/FORMAT.md.
std::string json_quoted(std::string_view text);

}  // namespace assize
