// Exhaustive enumeration through a kernel: one scalar multiple of each word.
//
// Shard 0 is cut into levels by the place of the leading 1; every other shard is a single coset.  Each walk ends at a
// word that is known in closed form and is compared with it: a wrong step anywhere on the way would show there.
#include <algorithm>

#include "engine/coset_walk.hpp"
#include "engine/shard_engine.hpp"

namespace assize::engine {

using field::Element;

namespace {

constexpr std::uint32_t largest_order = 256;

class Exhaust final : public ShardEngine {
 public:
  Exhaust(const code::LinearCode& code, const evidence::EnumerationPlan& plan, const kernel::KernelSet& kernel)
      : code_(code),
        plan_(plan),
        long_shards_(*power_if_fits(plan.order, plan.free_rows) > messages_between_questions),
        walk_(code.order() == 2 ? make_binary_walk(code, plan.free_rows, kernel.binary_walk)
                                : make_symbol_walk(code, plan.free_rows, kernel.symbol_walk)) {}

  using ShardEngine::run;
  [[nodiscard]] Finding run(std::uint64_t shard, const GiveUp& give_up) const override {
    Finding finding;
    std::vector<std::uint64_t> counts(std::size_t{code_.length()} + 1, 0);
    if (shard > 0) {
      walk_in_pieces(message_in_shard(plan_, shard, 0), plan_.free_rows, 0, counts, give_up, finding);
    } else {
      std::uint64_t lead = 1;
      for (std::uint32_t below = 0; below < plan_.free_rows; ++below) {
        walk_in_pieces(message_in_shard(plan_, 0, lead), below, lead, counts, give_up, finding);
        if (below + 1 < plan_.free_rows) lead = mul_exact(lead, plan_.order);
      }
    }
    for (std::uint32_t weight = 0; weight < counts.size(); ++weight)
      if (counts[weight] != 0) finding.counts.emplace_hint(finding.counts.end(), weight, counts[weight]);
    return finding;
  }

 private:
  /// All messages that begin with `message` and end with any `rows` symbols; `tail` is the tail of `message`.
  /// Long walks are cut by their first symbol, in ascending order.
  void walk_in_pieces(std::vector<Element> message, std::uint32_t rows, std::uint64_t tail,
                      std::span<std::uint64_t> counts, const GiveUp& give_up, Finding& finding) const {
    if (finding.given_up) return;
    const std::uint64_t messages = *power_if_fits(plan_.order, rows);
    if (messages <= messages_between_questions) {
      finding.given_up = long_shards_ && give_up();
      if (!finding.given_up) walk(std::move(message), rows, tail, counts, finding);
      return;
    }
    for (std::uint32_t a = 0; a < plan_.order; ++a) {
      message[plan_.dimension - rows] = static_cast<Element>(a);
      walk_in_pieces(message, rows - 1, tail + a * (messages / plan_.order), counts, give_up, finding);
    }
  }

  /// The same in one go.
  void walk(std::vector<Element> message, std::uint32_t rows, std::uint64_t tail, std::span<std::uint64_t> counts,
            Finding& finding) const {
    const CosetWalk::Walked walked = walk_->walk(code_.encode(message), rows, counts);
    if (walked.lightest.weight < finding.lightest_weight) {
      finding.lightest_weight = walked.lightest.weight;
      finding.lightest_tail = tail + walked.lightest.index;
    }
    for (std::uint32_t row = walk_->block_rows(); row < rows; ++row)
      message[plan_.dimension - 1 - row] = static_cast<Element>(plan_.order - 1);
    if (!std::ranges::equal(code_.encode(message), walked.last_base))
      finding.fault = "the walk did not end at the word of its last message";
  }

  const code::LinearCode& code_;
  evidence::EnumerationPlan plan_;
  bool long_shards_;
  std::unique_ptr<CosetWalk> walk_;
};

}  // namespace

std::unique_ptr<ShardEngine> make_exhaust(const code::LinearCode& code, const evidence::EnumerationPlan& plan,
                                          const kernel::KernelSet& kernel) {
  contract(code.order() <= largest_order, "exhaust works on symbols that fit a byte");
  return std::make_unique<Exhaust>(code, plan, kernel);
}

}  // namespace assize::engine
