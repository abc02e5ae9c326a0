// A forecast is a rate times a number of messages; small codes are not measured at all.
#include "engine/calibrate.hpp"

#include <gtest/gtest.h>

#include "engine/engine_support.hpp"

namespace assize::engine {
namespace {

using namespace testing;
using plan::Method;

TEST(Forecast, SmallCodesAreNotMeasured) {
  Chance chance(51);
  const FakeClock clock(1);
  const auto code = random_code(chance, field::Field::binary(), 30, 12);
  const Forecast none =
      forecast(code, plan::choose(code, {}).value(), {.kernel = &kernel::reference(), .clock = &clock});
  EXPECT_EQ(none.seconds, 0);
  EXPECT_EQ(none.messages_per_second, 0);
  EXPECT_EQ(clock.seconds(), 0) << "the clock was read";
}

TEST(Forecast, IsMessagesOverRateForAnyMethodAndThreads) {
  Chance chance(52);
  for (const std::uint32_t q : {2U, 3U, 256U}) {
    const auto code = random_code(chance, some_field(q), 200, q == 2 ? 90 : q == 3 ? 40 : 20);
    for (const Method method : {Method::plain, Method::exhaust}) {
      const auto plan = plan::choose(code, {method}).value();
      EXPECT_FALSE(plan.enumeration.has_value());
      const FakeClock one(0.003);
      const Forecast alone = forecast(code, plan, {.threads = 1, .kernel = &kernel::reference(), .clock = &one});
      const FakeClock four(0.003);
      const Forecast shared = forecast(code, plan, {.threads = 4, .kernel = &kernel::reference(), .clock = &four});
      EXPECT_GT(alone.messages_per_second, 0);
      EXPECT_DOUBLE_EQ(alone.seconds, plan.messages.convert_to<double>() / alone.messages_per_second);
      EXPECT_DOUBLE_EQ(shared.messages_per_second, 4 * alone.messages_per_second);
    }
  }
}

TEST(Forecast, AClockThatStandsStillGivesNone) {
  Chance chance(53);
  const FakeClock still(0);
  const auto code = random_code(chance, some_field(3), 40, 20);
  EXPECT_EQ(forecast(code, plan::choose(code, {}).value(), {.kernel = &kernel::reference(), .clock = &still}).seconds,
            0);
}

}  // namespace
}  // namespace assize::engine
