// Failure as a value, for what is expected to fail: sheets, files, certificates.
//
// Shaped like std::expected so that a later standard can take its place.  A Failure always says where, what, and
// what to write instead, because the reader of the message is the person who has to mend the input.
#pragma once
#include <optional>
#include <string>
#include <utility>
#include <variant>

#include "base/contract.hpp"

namespace assize {

/// Why something could not be done, in words that a user can act on.
struct Failure {
  std::string where;  ///< the place: "cabin.toml:7", "flag --within"; empty if there is none
  std::string what;   ///< what is wrong, one sentence without a full stop
  std::string cure;   ///< what to do instead; empty if nothing can be done
};

/// A value or the reason why there is none.  Reading the wrong side is a broken contract.
template <class T>
class [[nodiscard]] Result {
 public:
  Result(T value) : held_(std::in_place_index<0>, std::move(value)) {}            // NOLINT: implicit on purpose
  Result(Failure failure) : held_(std::in_place_index<1>, std::move(failure)) {}  // NOLINT: implicit on purpose

  [[nodiscard]] bool has_value() const noexcept { return held_.index() == 0; }
  explicit operator bool() const noexcept { return has_value(); }

  [[nodiscard]] T& value() & {
    contract(has_value(), "a failed result has no value");
    return *std::get_if<0>(&held_);
  }
  [[nodiscard]] const T& value() const& {
    contract(has_value(), "a failed result has no value");
    return *std::get_if<0>(&held_);
  }
  [[nodiscard]] T&& value() && {
    contract(has_value(), "a failed result has no value");
    return std::move(*std::get_if<0>(&held_));
  }
  [[nodiscard]] T& operator*() & { return value(); }
  [[nodiscard]] const T& operator*() const& { return value(); }
  [[nodiscard]] T&& operator*() && { return std::move(*this).value(); }
  [[nodiscard]] T* operator->() { return &value(); }
  [[nodiscard]] const T* operator->() const { return &value(); }

  [[nodiscard]] const Failure& error() const {
    contract(!has_value(), "a result with a value has no error");
    return *std::get_if<1>(&held_);
  }

  /// Calls `next` with the value, or hands the failure on.
  template <class Next>
  auto and_then(Next&& next) && -> decltype(next(std::declval<T&&>())) {
    if (!has_value()) return error();
    return std::forward<Next>(next)(std::move(*this).value());
  }

 private:
  std::variant<T, Failure> held_;
};

/// Done, or the reason why not.
template <>
class [[nodiscard]] Result<void> {
 public:
  Result() = default;
  Result(Failure failure) : failure_(std::move(failure)) {}  // NOLINT: implicit on purpose
  [[nodiscard]] bool has_value() const noexcept { return !failure_.has_value(); }
  explicit operator bool() const noexcept { return has_value(); }
  [[nodiscard]] const Failure& error() const {
    contract(failure_.has_value(), "a result that succeeded has no error");
    return *failure_;
  }

 private:
  std::optional<Failure> failure_;
};

}  // namespace assize
