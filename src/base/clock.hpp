// Time as an argument, so that plans stay reproducible and tests do not wait.
#pragma once

namespace assize {

/// Seconds since some fixed moment, never going back.
class Clock {
 public:
  virtual ~Clock() = default;
  [[nodiscard]] virtual double seconds() const = 0;
};

}  // namespace assize
