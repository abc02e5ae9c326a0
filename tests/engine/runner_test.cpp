// Each number once, in ascending order, none after a refusal, and exceptions on the caller's side.
#include "engine/runner.hpp"

#include <gtest/gtest.h>

#include <atomic>
#include <stdexcept>
#include <vector>

namespace assize::engine {
namespace {

TEST(Runner, WorksEachNumberOnce) {
  for (const unsigned threads : {0U, 1U, 2U, 3U, 7U, 50U})
    for (const std::uint64_t count : {0U, 1U, 2U, 5U, 1000U}) {
      std::vector<int> worked(count, 0);
      std::uint64_t asked = 0;
      const auto done = run_numbered(
          count, threads,
          [&](std::uint64_t number) {
            EXPECT_EQ(number, asked++);
            return true;
          },
          [&](std::uint64_t number) { ++worked[number]; });
      EXPECT_EQ(done, count);
      EXPECT_EQ(worked, std::vector<int>(count, 1));
    }
}

TEST(Runner, WorksNothingAfterARefusal) {
  for (const unsigned threads : {1U, 2U, 7U}) {
    std::vector<int> worked(100, 0);
    int refusals = 0;
    const auto done = run_numbered(
        100, threads,
        [&](std::uint64_t number) {
          if (number < 40) return true;
          ++refusals;
          return false;
        },
        [&](std::uint64_t number) { ++worked[number]; });
    EXPECT_EQ(done, 40U);
    EXPECT_EQ(refusals, 1);
    for (std::size_t i = 0; i < 100; ++i) EXPECT_EQ(worked[i], i < 40 ? 1 : 0);
  }
}

TEST(Runner, HandsExceptionsToTheCaller) {
  for (const unsigned threads : {1U, 2U, 7U}) {
    std::atomic<std::uint64_t> worked = 0;
    EXPECT_THROW(run_numbered(
                     1000000, threads, [](std::uint64_t) { return true; },
                     [&](std::uint64_t number) {
                       ++worked;
                       if (number == 5) throw std::runtime_error("five");
                     }),
                 std::runtime_error);
    EXPECT_LT(worked, 1000000U);
    EXPECT_THROW(
        run_numbered(
            10, threads, [](std::uint64_t) -> bool { throw std::runtime_error("asked"); }, [](std::uint64_t) {}),
        std::runtime_error);
  }
}

}  // namespace
}  // namespace assize::engine
