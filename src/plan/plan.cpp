// Plans for the methods there are, and the choice among them.
#include "plan/plan.hpp"

#include <algorithm>
#include <array>

#include "plan/cost.hpp"
#include "plan/split.hpp"

namespace assize::plan {

namespace {

constexpr std::array all_methods{Method::exhaust, Method::plain};

/// Symbols are bytes there.
constexpr std::uint32_t largest_order_of_exhaust = 256;
/// More messages than this are out of reach of any machine.
const BigInteger most_messages = BigInteger(1) << 62U;

constexpr std::uint64_t bytes_of_block = std::uint64_t{1} << 15U;
constexpr std::uint64_t bytes_of_shard_result = 128;
constexpr std::uint64_t bytes_of_count = 64;

bool applies(Method method, std::uint32_t order) noexcept {
  switch (method) {
    case Method::plain:
      return true;
    case Method::exhaust:
      return order <= largest_order_of_exhaust;
  }
  return false;
}

/// Upper bound for tables and results, saturating: a prediction for people.
std::uint64_t predicted_memory(const code::LinearCode& code, Method method,
                               const std::optional<evidence::EnumerationPlan>& enumeration) {
  BigInteger bytes = BigInteger(2) * code.dimension() * code.length();
  const std::uint64_t order = code.order();
  if (method == Method::exhaust)
    bytes += std::max(bytes_of_block, order * (code.length() + 63)) +
             BigInteger(code.dimension()) * (order - 1) * code.length() + order * order;
  if (enumeration) {
    const std::uint64_t largest = shard_size(*enumeration, enumeration->shards - 1);
    const std::uint64_t counts = std::min<std::uint64_t>(largest, std::uint64_t{code.length()} + 1);
    bytes += BigInteger(enumeration->shards) * (bytes_of_shard_result + bytes_of_count * counts);
  }
  return bytes > UINT64_MAX ? UINT64_MAX : static_cast<std::uint64_t>(bytes);
}

std::optional<evidence::EnumerationPlan> enumeration_plan(const code::LinearCode& code, const BigInteger& messages) {
  if (messages > most_messages) return std::nullopt;
  evidence::EnumerationPlan plan;
  plan.reduced_generator_digest = code.reduced_generator_digest();
  plan.order = code.order();
  plan.dimension = code.dimension();
  plan.free_rows = free_rows(code.order(), code.length(), code.dimension());
  plan.shards = evidence::shard_count(plan.order, plan.dimension, plan.free_rows).value();
  return plan;
}

}  // namespace

std::string_view name(Method method) noexcept {
  switch (method) {
    case Method::plain:
      return "plain";
    case Method::exhaust:
      return "exhaust";
  }
  return "";
}

std::optional<Method> find_method(std::string_view name) noexcept {
  for (const Method method : all_methods)
    if (plan::name(method) == name) return method;
  return std::nullopt;
}

std::vector<std::string_view> method_names() {
  std::vector<std::string_view> names;
  for (const Method method : all_methods) names.push_back(name(method));
  return names;
}

std::vector<Plan> applicable(const code::LinearCode& code) {
  const BigInteger messages = (power(code.order(), code.dimension()) - 1) / (code.order() - 1);
  const auto enumeration = enumeration_plan(code, messages);
  std::vector<Plan> plans;
  for (const Method method : all_methods) {
    if (!applies(method, code.order())) continue;
    plans.push_back({.method = method,
                     .messages = messages,
                     .operations = messages * cost_per_message(method, code.order(), code.length()),
                     .memory_bytes = predicted_memory(code, method, enumeration),
                     .enumeration = enumeration});
  }
  std::ranges::stable_sort(plans, [](const Plan& a, const Plan& b) { return a.operations < b.operations; });
  return plans;
}

Result<Plan> choose(const code::LinearCode& code, const Goal& goal) {
  std::vector<Plan> plans = applicable(code);
  if (!goal.method) return std::move(plans.front());
  for (Plan& plan : plans)
    if (plan.method == *goal.method) return std::move(plan);
  return Failure{"flag --method",
                 "method " + std::string(name(*goal.method)) + " works over fields of at most " +
                     std::to_string(largest_order_of_exhaust) + " elements, and this code is over GF(" +
                     std::to_string(code.order()) + ")",
                 "use --method plain"};
}

}  // namespace assize::plan
