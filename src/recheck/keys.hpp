// Reads the members of one object in the order the format gives, and remembers the first thing that is wrong.
//
// Every getter returns a harmless value after a failure, so a reader asks for all keys and looks once at `end()`.
#pragma once
#include <cstdint>
#include <string>
#include <string_view>

#include "base/integers.hpp"
#include "recheck/json.hpp"
#include "recheck/limits.hpp"

namespace assize::recheck {

class Keys {
 public:
  Keys(const Json& value, std::string path);

  /// The next member has this key (for optional keys).
  [[nodiscard]] bool next_is(std::string_view key) const noexcept;

  std::uint64_t integer(std::string_view key, std::uint64_t smallest = 0, std::uint64_t largest = max_integer);
  std::string text(std::string_view key);
  std::string digest(std::string_view key);
  BigInteger count(std::string_view key);
  const Json::Array& array(std::string_view key);
  const Json& object(std::string_view key);

  /// No member is left and none was wrong.
  Result<void> end();
  /// None was wrong so far.
  [[nodiscard]] bool ok() const noexcept { return !failure_; }
  [[nodiscard]] Failure failure() const { return failure_.value_or(Failure{}); }
  void refuse(std::string_view key, std::string what);

  [[nodiscard]] const std::string& path() const noexcept { return path_; }
  [[nodiscard]] std::string at(std::string_view key) const;

 private:
  const Json* take(std::string_view key);

  const Json::Object* object_ = nullptr;
  std::size_t next_ = 0;
  std::string path_;
  std::optional<Failure> failure_;
};

/// 64 lower-case hexadecimal digits.
bool is_digest(std::string_view text) noexcept;

}  // namespace assize::recheck
