// The one place with threads.  It knows numbered chunks and nothing of what is in them.
#pragma once
#include <cstdint>
#include <functional>

namespace assize::engine {

/// Calls work(0), work(1), ... on up to `threads` threads, each number once, handed out in ascending order.  Before a
/// number is handed out, may_begin(number) is asked; after the first refusal no more are.  Every number handed out is
/// worked to its end, so the numbers done are 0 .. m-1, and m is returned.
///
/// may_begin is called by one thread at a time; `work` must be safe to call for different numbers at once.  If a call
/// throws, no further number is handed out, and the exception is thrown again here once all threads have ended.
std::uint64_t run_numbered(std::uint64_t count, unsigned threads, const std::function<bool(std::uint64_t)>& may_begin,
                           const std::function<void(std::uint64_t)>& work);

}  // namespace assize::engine
