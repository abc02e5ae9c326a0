// The checks of one shard, from the cheapest to the dearest, and those of the total.
#include "engine/fault_checks.hpp"

#include <algorithm>
#include <boost/dynamic_bitset.hpp>

namespace assize::engine {

using field::Element;

namespace {

/// The largest of 1, 2, 4 that divides all weights of a binary code by a classical argument: even rows; rows of weight
/// divisible by 4 any two of which meet in an even number of positions.
std::uint32_t binary_divisor(const code::LinearCode& code) {
  std::vector<boost::dynamic_bitset<>> rows;
  std::uint32_t divisor = 4;
  for (std::uint32_t i = 0; i < code.dimension(); ++i) {
    const std::vector<Element> row = code.row(i);
    boost::dynamic_bitset<> bits(row.size());
    for (std::size_t j = 0; j < row.size(); ++j) bits[j] = row[j] != 0;
    while (bits.count() % divisor != 0) divisor /= 2;
    rows.push_back(std::move(bits));
  }
  for (std::size_t i = 0; i < rows.size() && divisor == 4; ++i)
    for (std::size_t j = 0; j < i && divisor == 4; ++j)
      if ((rows[i] & rows[j]).count() % 2 != 0) divisor = 2;
  return divisor;
}

}  // namespace

bool is_self_check_failure(const Failure& failure) noexcept { return failure.what.starts_with(self_check_failed); }

Failure self_check_failure(std::string where, std::string_view what) {
  return {std::move(where), std::string(self_check_failed) + std::string(what),
          "run again; if it repeats, the machine or the program is faulty"};
}

FaultChecks::FaultChecks(const code::LinearCode& code, evidence::EnumerationPlan plan)
    : code_(code), plan_(std::move(plan)), moments_(code, plan_.free_rows) {
  if (code.order() != 2) return;
  divisor_ = binary_divisor(code);
  complements_ = code.contains(std::vector<Element>(code.length(), 1));
}

std::optional<std::string> FaultChecks::fault_of_shard(std::uint64_t number, const Finding& finding) const {
  if (finding.fault) return finding.fault;
  std::uint64_t words = 0;
  for (const auto& [weight, count] : finding.counts) {
    if (weight == 0) return "a word of a normalised message is zero";
    if (weight > code_.length()) return "a word is heavier than its length";
    if (count == 0) return "a count of zero is listed";
    if (weight % divisor_ != 0)
      return "a word has weight " + std::to_string(weight) + ", but all weights are divisible by " +
             std::to_string(divisor_);
    if (__builtin_add_overflow(words, count, &words)) return "the counts overflow";
  }
  const std::uint64_t size = shard_size(plan_, number);
  if (words != size)
    return "the counts add up to " + std::to_string(words) + " words instead of " + std::to_string(size);
  const auto expected =
      number == 0 ? moments_.of_normalised_span() : moments_.of_coset(code_.encode(message_in_shard(plan_, number, 0)));
  if (evidence::moments_of(finding.counts) != expected)
    return "the sums of the weights or of their squares differ from their closed forms";
  return fault_of_lightest(number, finding);
}

std::optional<std::string> FaultChecks::fault_of_lightest(std::uint64_t number, const Finding& finding) const {
  if (finding.counts.empty()) return std::nullopt;
  const std::uint32_t weight = finding.counts.begin()->first;
  const auto tails = power_if_fits(plan_.order, plan_.free_rows);
  if (finding.lightest_weight != weight || (tails && finding.lightest_tail >= *tails))
    return "the lightest word is not the one that was counted";
  if (code::weight(code_.encode(message_in_shard(plan_, number, finding.lightest_tail))) != weight)
    return "the lightest word, encoded again, has another weight";
  return std::nullopt;
}

std::optional<std::string> FaultChecks::fault_of_total(const evidence::Enumeration& enumeration) const {
  if (!enumeration.complete()) return "shards are missing or repeated";
  const evidence::WeightDistribution counts = evidence::distribution(enumeration);
  BigInteger words = 0;
  for (const auto& [weight, count] : counts) words += count;
  if (words != power(plan_.order, plan_.dimension)) return "the number of words is not q^k";
  if (complements_)
    for (const auto& [weight, count] : counts) {
      const auto mirrored = counts.find(code_.length() - weight);
      if (mirrored == counts.end() || mirrored->second != count)
        return "the code has the all-one word, but its distribution is not symmetric";
    }
  return std::nullopt;
}

}  // namespace assize::engine
