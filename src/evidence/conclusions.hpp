// From evidence to statements: the only place where a claim can come into being.
//
// A Statement has no public constructor, so a claim without evidence cannot be expressed: conclude() reads the items,
// and each statement it makes carries the numbers of the items that it follows from.
#pragma once
#include <cstdint>
#include <optional>
#include <span>
#include <string_view>
#include <variant>
#include <vector>

#include "evidence/enumeration.hpp"
#include "evidence/theorem.hpp"
#include "evidence/witness.hpp"

namespace assize::evidence {

using Item = std::variant<Witness, MaximumDistanceSeparable, Concatenation, Enumeration>;

/// "witness", "theorem" or "re-run": printed beside every number that rests on the item.
std::string_view evidence_class(const Item& item) noexcept;

enum class Relation { exactly, at_least, at_most };

struct MinimumDistance {
  Relation relation;
  std::uint32_t value;
};
struct MinimumWords {
  std::uint32_t weight;
  BigInteger count;  ///< scalar multiples included
};
struct CompleteDistribution {
  WeightDistribution counts;
};

/// Something asserted, and the indexes (ascending) of the evidence items that it follows from.
class Statement {
 public:
  using Content = std::variant<MinimumDistance, MinimumWords, CompleteDistribution>;
  [[nodiscard]] const Content& content() const noexcept { return content_; }
  [[nodiscard]] std::span<const std::uint32_t> evidence() const noexcept { return evidence_; }

 private:
  friend class Conclusions;
  Statement(Content content, std::vector<std::uint32_t> evidence)
      : content_(std::move(content)), evidence_(std::move(evidence)) {}
  Content content_;
  std::vector<std::uint32_t> evidence_;
};

/// Which statements are wanted; bounds on the distance are always made.
struct Wish {
  bool minimum_words = true;
  bool distribution = true;
};

/// Everything that follows from a list of evidence items about one code.
class Conclusions {
 public:
  /// Items must be about the same code; a witness below a proved lower bound is a broken contract.
  static Conclusions from(std::span<const Item> items, Wish wish);

  [[nodiscard]] std::uint32_t at_least() const noexcept { return at_least_; }  ///< at least 1: words are not zero
  [[nodiscard]] std::optional<std::uint32_t> at_most() const noexcept { return at_most_; }
  [[nodiscard]] bool bounds_meet() const noexcept { return at_most_ && *at_most_ == at_least_; }
  [[nodiscard]] const std::optional<BigInteger>& minimum_words() const noexcept { return minimum_words_; }
  [[nodiscard]] const std::optional<WeightDistribution>& distribution() const noexcept { return distribution_; }
  [[nodiscard]] const std::vector<Statement>& statements() const noexcept { return statements_; }
  /// Item that the lower bound rests on, if it is better than the trivial 1.
  [[nodiscard]] std::optional<std::uint32_t> lower_bound_item() const noexcept { return lower_item_; }

 private:
  std::uint32_t at_least_ = 1;
  std::optional<std::uint32_t> at_most_;
  std::optional<std::uint32_t> lower_item_;
  std::optional<std::uint32_t> upper_item_;
  std::optional<BigInteger> minimum_words_;
  std::optional<WeightDistribution> distribution_;
  std::vector<Statement> statements_;
};

}  // namespace assize::evidence
