// Which statements follow from which items, and that each lists no more evidence than it needs.
#include "evidence/conclusions.hpp"

#include <gtest/gtest.h>

namespace assize::evidence {
namespace {

/// A complete enumeration of a [3, 2] code over GF(3): up to scalars 3 words of weight 2 and 1 of weight 3.
Enumeration complete_enumeration() { return {{"", 3, 2, 2, 1}, {{0, {{2, 3}, {3, 1}}, moments_of({{2, 3}, {3, 1}})}}}; }
Witness witness(std::uint32_t weight) { return {weight, std::vector<std::uint16_t>(weight, 1)}; }
Concatenation concatenation(std::uint32_t at_least) {
  return {.outer_distance = 1, .inner_distances = {at_least}, .at_least = at_least};
}

/// "minimum-distance exactly 2 from 0 1" and so on.
std::string spell(const Statement& statement) {
  std::string text;
  if (const auto* distance = std::get_if<MinimumDistance>(&statement.content())) {
    switch (distance->relation) {
      case Relation::exactly:
        text = "exactly ";
        break;
      case Relation::at_least:
        text = "at least ";
        break;
      case Relation::at_most:
        text = "at most ";
        break;
    }
    text += std::to_string(distance->value);
  } else if (const auto* words = std::get_if<MinimumWords>(&statement.content())) {
    text = to_decimal(words->count) + " words of weight " + std::to_string(words->weight);
  } else {
    text = "distribution";
    for (const auto& [weight, count] : std::get<CompleteDistribution>(statement.content()).counts)
      text += " " + std::to_string(weight) + ":" + to_decimal(count);
  }
  text += " from";
  for (const std::uint32_t index : statement.evidence()) text += " " + std::to_string(index);
  return text;
}

std::vector<std::string> spelled(const std::vector<Item>& items, Wish wish = {}) {
  const Conclusions conclusions = Conclusions::from(items, wish);
  std::vector<std::string> texts;
  for (const Statement& statement : conclusions.statements()) texts.push_back(spell(statement));
  return texts;
}

using Texts = std::vector<std::string>;

TEST(Conclusions, ACompleteEnumerationSaysEverythingAlone) {
  const Texts everything{"exactly 2 from 0", "6 words of weight 2 from 0", "distribution 0:1 2:6 3:2 from 0"};
  EXPECT_EQ(spelled({complete_enumeration()}), everything);
  EXPECT_EQ(spelled({complete_enumeration(), witness(2), concatenation(2)}), everything);
  EXPECT_EQ(spelled({witness(2), concatenation(2), complete_enumeration()}),
            (Texts{"exactly 2 from 2", "6 words of weight 2 from 2", "distribution 0:1 2:6 3:2 from 2"}));
}

TEST(Conclusions, TheWishLeavesStatementsOut) {
  EXPECT_EQ(spelled({complete_enumeration()}, {.minimum_words = false, .distribution = false}),
            (Texts{"exactly 2 from 0"}));
  EXPECT_EQ(spelled({complete_enumeration()}, {.minimum_words = true, .distribution = false}),
            (Texts{"exactly 2 from 0", "6 words of weight 2 from 0"}));
  const std::vector<Item> items{complete_enumeration()};
  EXPECT_EQ(Conclusions::from(items, {false, false}).minimum_words(), BigInteger(6));
}

TEST(Conclusions, ATheoremAndAWitnessMeet) {
  EXPECT_EQ(spelled({witness(5), MaximumDistanceSeparable{5}}), (Texts{"exactly 5 from 0 1"}));
  EXPECT_EQ(spelled({MaximumDistanceSeparable{4}, witness(7), concatenation(5), witness(5)}),
            (Texts{"exactly 5 from 2 3"}));
}

TEST(Conclusions, BoundsThatDoNotMeetAreBothStated) {
  EXPECT_EQ(spelled({concatenation(4), witness(6), witness(9)}), (Texts{"at least 4 from 0", "at most 6 from 1"}));
  EXPECT_EQ(spelled({witness(6)}), (Texts{"at most 6 from 0"}));
  EXPECT_EQ(spelled({concatenation(4)}), (Texts{"at least 4 from 0"}));
}

TEST(Conclusions, AtLeastOneIsNoStatementButMeetsAWordOfWeightOne) {
  EXPECT_EQ(spelled({concatenation(1)}), Texts{});
  EXPECT_EQ(spelled({concatenation(1), witness(1)}), (Texts{"exactly 1 from 1"}));
  EXPECT_EQ(spelled({}), Texts{});
}

TEST(Conclusions, AnIncompleteEnumerationProvesNothing) {
  Enumeration partial{{"", 2, 2, 1, 2}, {{0, {{2, 1}}, moments_of({{2, 1}})}}};
  EXPECT_EQ(spelled({partial}), Texts{});
  EXPECT_EQ(spelled({partial, witness(2)}), (Texts{"at most 2 from 1"}));
}

TEST(Conclusions, BoundsCanBeReadOff) {
  const std::vector<Item> items{concatenation(4), witness(6)};
  const Conclusions conclusions = Conclusions::from(items, {});
  EXPECT_EQ(conclusions.at_least(), 4U);
  EXPECT_EQ(conclusions.at_most(), 6U);
  EXPECT_FALSE(conclusions.bounds_meet());
  EXPECT_EQ(conclusions.lower_bound_item(), 0U);
  EXPECT_EQ(conclusions.minimum_words(), std::nullopt);
  EXPECT_EQ(conclusions.distribution(), std::nullopt);
  EXPECT_EQ(Conclusions::from({}, {}).at_least(), 1U);
  EXPECT_EQ(Conclusions::from({}, {}).at_most(), std::nullopt);
}

TEST(ConclusionsDeathTest, AWordBelowAProvedBoundStopsTheProgram) {
  const std::vector<Item> items{concatenation(4), witness(3)};
  EXPECT_DEATH(static_cast<void>(Conclusions::from(items, {})), "no word is lighter");
}

TEST(EvidenceClass, IsKnownForEveryItem) {
  EXPECT_EQ(evidence_class(witness(1)), "witness");
  EXPECT_EQ(evidence_class(MaximumDistanceSeparable{2}), "theorem");
  EXPECT_EQ(evidence_class(concatenation(2)), "theorem");
  EXPECT_EQ(evidence_class(complete_enumeration()), "re-run");
}

}  // namespace
}  // namespace assize::evidence
