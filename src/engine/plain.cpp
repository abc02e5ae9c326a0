// The oracle: every word of a shard by field arithmetic, symbol by symbol.
//
// A recursion over the free rows adds each multiple of a row to the word so far, in ascending order of the coefficient,
// so that words come in ascending order of their messages and the first lightest one is the one to report.
#include "engine/shard_engine.hpp"

namespace assize::engine {

using field::Element;

namespace {

class Plain final : public ShardEngine {
 public:
  Plain(const code::LinearCode& code, const evidence::EnumerationPlan& plan)
      : code_(code), plan_(plan), generator_(code.generator()) {}

  using ShardEngine::run;
  [[nodiscard]] Finding run(std::uint64_t shard, const GiveUp& give_up) const override {
    Finding finding;
    if (shard > 0) {
      visit(code_.encode(message_in_shard(plan_, shard, 0)), plan_.free_rows, 0, give_up, finding);
      return finding;
    }
    std::uint64_t lead = 1;  // the tail of the message whose only symbol is the leading 1
    for (std::uint32_t below = 0; below < plan_.free_rows; ++below) {
      visit(code_.row(plan_.dimension - 1 - below), below, lead, give_up, finding);
      if (below + 1 < plan_.free_rows) lead = mul_exact(lead, plan_.order);
    }
    return finding;
  }

 private:
  /// All words of word + span(the last `rows` rows); `tail` is the tail of the message so far.
  void visit(const std::vector<Element>& word, std::uint32_t rows, std::uint64_t tail, const GiveUp& give_up,
             Finding& finding) const {
    if (finding.given_up) return;
    if (rows == 0) {
      const std::uint32_t weight = code::weight(word);
      ++finding.counts[weight];
      if (weight < finding.lightest_weight) {
        finding.lightest_weight = weight;
        finding.lightest_tail = tail;
      }
      return;
    }
    const std::uint32_t row = plan_.dimension - rows;
    const std::uint64_t place = *power_if_fits(plan_.order, rows - 1);
    if (place > messages_between_questions / 64 && give_up()) {  // a word takes some 64 times as long as in a kernel
      finding.given_up = true;
      return;
    }
    std::vector<Element> sum;
    for (std::uint32_t a = 0; a < plan_.order; ++a) {
      sum = word;
      field::add_multiple(code_.field(), sum, static_cast<Element>(a), generator_.row(row));
      visit(sum, rows - 1, tail + a * place, give_up, finding);
    }
  }

  const code::LinearCode& code_;
  evidence::EnumerationPlan plan_;
  field::Matrix generator_;
};

}  // namespace

std::unique_ptr<ShardEngine> make_plain(const code::LinearCode& code, const evidence::EnumerationPlan& plan) {
  return std::make_unique<Plain>(code, plan);
}

}  // namespace assize::engine
