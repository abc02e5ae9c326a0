// What the tests of the engines share: reproducible chance, random codes over any field, a clock that tests control,
// and an enumeration by definition.
#pragma once
#include <gtest/gtest.h>

#include <atomic>
#include <iostream>
#include <random>

#include "engine/enumerate.hpp"
#include "field/number_theory.hpp"
#include "field/polynomial.hpp"
#include "plan/plan.hpp"

namespace assize::engine::testing {

using field::Element;

class Chance {
 public:
  explicit Chance(std::uint64_t seed) : engine_(seed) { std::cout << "[ seed     ] " << seed << '\n'; }
  std::uint64_t below(std::uint64_t bound) { return engine_() % bound; }

 private:
  std::mt19937_64 engine_;
};

/// Moves on by `step` seconds each time it is read.
class FakeClock final : public Clock {
 public:
  explicit FakeClock(double step = 0) : step_(step) {}
  [[nodiscard]] double seconds() const override { return step_ * static_cast<double>(readings_++); }

 private:
  double step_;
  mutable std::atomic<std::uint64_t> readings_{0};
};

/// GF(q) with the first irreducible modulus there is.
inline field::Field some_field(std::uint32_t q) {
  const auto power = field::as_prime_power(q).value();
  const field::Field ground = field::Field::prime(power.prime).value();
  if (power.exponent == 1) return ground;
  return field::Field::create(q, field::least_irreducible(ground, power.exponent)).value();
}

/// The span of these rows, each written as its symbols.
inline code::LinearCode code_of(const field::Field& field, const std::vector<std::vector<Element>>& rows) {
  field::Matrix generator(rows.size(), rows.at(0).size());
  for (std::size_t i = 0; i < rows.size(); ++i) std::ranges::copy(rows[i], generator.row(i).begin());
  return {field, code::reduce(field, generator)};
}

/// Dimension at most k, at least 1; some columns zero, repeated or proportional.
inline code::LinearCode random_code(Chance& chance, const field::Field& field, std::uint32_t n, std::uint32_t k) {
  std::vector<std::vector<Element>> rows(k, std::vector<Element>(n, 0));
  for (std::uint32_t j = 0; j < n; ++j) {
    const std::uint64_t kind = chance.below(8);
    if (kind == 0 && n > 1) continue;
    const auto factor = static_cast<Element>(1 + chance.below(field.order() - 1));
    const std::uint64_t other = chance.below(n);
    for (auto& row : rows)
      row[j] = kind == 1 ? field.multiply(factor, row[other])
                         : static_cast<Element>(chance.below(3) == 0 ? 0 : chance.below(field.order()));
  }
  auto code = code_of(field, rows);
  if (code.dimension() > 0) return code;
  rows[0][0] = 1;
  return code_of(field, rows);
}

/// The plan for a method with the shards cut in another way.
inline plan::Plan plan_for(const code::LinearCode& code, plan::Method method, std::uint32_t free_rows) {
  plan::Plan plan = plan::choose(code, {method}).value();
  plan.enumeration->free_rows = free_rows;
  plan.enumeration->shards = evidence::shard_count(code.order(), code.dimension(), free_rows).value();
  return plan;
}

inline EnumerationOutcome run(const code::LinearCode& code, const plan::Plan& plan, RunOptions options = {}) {
  static const FakeClock still;
  if (options.clock == nullptr) options.clock = &still;
  if (options.kernel == nullptr) options.kernel = &kernel::reference();
  auto outcome = enumerate(code, plan, options);
  if (!outcome) ADD_FAILURE() << outcome.error().where << ": " << outcome.error().what;
  return std::move(outcome).value();
}

inline EnumerationOutcome run(const code::LinearCode& code, plan::Method method = plan::Method::exhaust) {
  return run(code, plan::choose(code, {method}).value());
}

inline void expect_equal(const EnumerationOutcome& a, const EnumerationOutcome& b) {
  EXPECT_EQ(a.enumeration.plan, b.enumeration.plan);
  EXPECT_EQ(a.enumeration.shards, b.enumeration.shards);
  EXPECT_EQ(a.lightest, b.lightest);
  EXPECT_EQ(a.ending, b.ending);
}

/// Calls visit(message) for all q^k messages, in ascending order.
template <class Visit>
void for_each_message(const code::LinearCode& code, Visit visit) {
  std::vector<Element> message(code.dimension(), 0);
  for (bool more = true; more;) {
    visit(message);
    more = false;
    for (std::size_t place = message.size(); place != 0 && !more; --place) {
      Element& symbol = message[place - 1];
      symbol = static_cast<Element>((symbol + 1U) % code.order());
      more = symbol != 0;
    }
  }
}

/// Every word of the code by encoding its message.
inline evidence::WeightDistribution distribution_by_definition(const code::LinearCode& code) {
  evidence::WeightDistribution counts;
  for_each_message(code, [&](const auto& message) { ++counts[code::weight(code.encode(message))]; });
  return counts;
}

}  // namespace assize::engine::testing
