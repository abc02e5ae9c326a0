// Promises between rooms.
//
// A broken promise is a bug in this program, never a fault of the input, so it stops the program in every
// build type: a wrong statement about a code would be worse than none.
#pragma once
#include <source_location>
#include <string_view>

namespace assize {

/// Exit code of a program that found itself to be wrong (design: 4, "self-check failed").
inline constexpr int exit_self_check_failed = 4;

/// Prints what was promised and where, then ends the process with exit code 4.
[[noreturn]] void broken_contract(std::string_view promise, std::source_location where) noexcept;

/// Stops the program unless `held`; `promise` says in words what should have been true.
inline void contract(bool held, std::string_view promise,
                     std::source_location where = std::source_location::current()) noexcept {
  if (!held) [[unlikely]]
    broken_contract(promise, where);
}

}  // namespace assize
