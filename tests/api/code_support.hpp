// From sheet text to counted weights, in tests.
#pragma once
#include <gtest/gtest.h>

#include <string>

#include "api/subject.hpp"
#include "api/world.hpp"
#include "engine/enumerate.hpp"

namespace assize::api {

inline Subject subject(const std::string& sheet) {
  auto loaded = load_text(sheet, "test.toml");
  if (!loaded) {
    ADD_FAILURE() << loaded.error().where << ": " << loaded.error().what << "\n" << sheet;
    return *load_text("[code]\nfamily = \"generator-matrix\"\nrows = [\"1\"]\n", "fallback.toml");
  }
  return *std::move(loaded);
}

inline evidence::WeightDistribution weights_of(const code::LinearCode& code, std::optional<plan::Method> method = {},
                                               unsigned threads = 2) {
  const SteadyClock clock;
  engine::RunOptions options;
  options.threads = threads;
  options.kernel = kernel::runnable_here().front();
  options.clock = &clock;
  const auto plan = plan::choose(code, {.method = method});
  const auto outcome = engine::enumerate(code, *plan, options);
  if (!outcome) {
    ADD_FAILURE() << outcome.error().what;
    return {};
  }
  return evidence::distribution(outcome->enumeration);
}

inline evidence::WeightDistribution weights_of(const std::string& sheet) { return weights_of(subject(sheet).code); }

inline std::uint32_t distance_of(const evidence::WeightDistribution& weights) {
  return std::next(weights.begin())->first;
}

/// Half of a symmetric distribution, A_w = A_{n-w}, made whole.
inline evidence::WeightDistribution symmetric(std::uint32_t length, evidence::WeightDistribution half) {
  half[0] = 1;
  for (const auto& [weight, count] : evidence::WeightDistribution(half)) half[length - weight] = count;
  return half;
}

}  // namespace assize::api
