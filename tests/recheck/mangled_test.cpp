// Descriptions of every compound family and step with any one character changed: whatever they now say, the checker
// comes to a verdict.
#include <set>

#include "expect.hpp"

namespace assize::recheck::test {
namespace {

std::vector<std::string> descriptions() {
  using Members = std::vector<std::pair<std::string, Value>>;
  const auto over = [](const PlainField& f, const Members& code, const std::vector<Value>& steps = {}) {
    return description_value(f, code, steps).text;
  };
  const Value even = matrix_description(prime(2), {{1, 1, 0}, {0, 1, 1}});
  const Value field = field_value(gf4);
  return {
      over(gf4, {{"family", text("bch")},
                 {"codeword_length", number(15)},
                 {"designed_distance", number(3)},
                 {"first_exponent", number(1)},
                 {"root_modulus", text("11001")}}),
      over(gf4, {{"family", text("quadratic-residue")}, {"prime", number(5)}, {"generator", text("1 2 1")}}),
      over(prime(3), {{"family", text("quasi-cyclic")},
                      {"form", text("blocks")},
                      {"first_rows", array({texts({"1 2", "0 1"}), texts({"1 1", "2 1"})})},
                      {"shift", text("left")}}),
      over(prime(2), {{"family", text("quasi-cyclic")},
                      {"form", text("bordered")},
                      {"corner", text("0")},
                      {"border", text("1")},
                      {"first_row", text("110")},
                      {"shift", text("right")}}),
      over(prime(2), {{"family", text("quasi-cyclic")},
                      {"form", text("exponents")},
                      {"lifting", number(3)},
                      {"shift_exponents", texts({"0 1 -", "2 - 0"})},
                      {"shift", text("right")}}),
      over(prime(2), {{"family", text("plotkin-sum")}, {"first", even}, {"second", even}}),
      over(prime(2), {{"family", text("product")}, {"first", even}, {"second", even}}),
      over(prime(2), {{"family", text("concatenated")},
                      {"outer", matrix_description(gf4, {{1, 2}})},
                      {"inner_by_position", array({even, even})}}),
      matrix_description(gf4, {{1, 0, 3, 1, 2}, {0, 1, 1, 1, 3}},
                         {object({{"step", text("puncture")}, {"positions", numbers({4})}}),
                          object({{"step", text("permute")}, {"order", numbers({3, 0, 1, 2})}}), step("augment"),
                          object({{"step", text("shorten")}, {"positions", numbers({0})}}), step("expurgate"),
                          object({{"step", text("repeat")}, {"times", number(2)}}),
                          object({{"step", text("subfield-subcode")}, {"field", field}})})
          .text,
  };
}

TEST(Mangled, EveryCharacterOfADescription) {
  for (const std::string& description : descriptions()) {
    Draft draft = small_hamming();
    draft.evidence = {witness(prime(2), 3, {0, 0, 0, 1, 0, 1, 1})};
    draft.statements = {distance("at-most", 3, {0})};
    draft.description = {description, true};
    std::set<std::string> reasons{recheck(draft.bytes(), {}).reason};
    // The original is a description of another code than the one claimed, and nothing worse.
    EXPECT_NE(reasons.begin()->find("claim.code."), std::string::npos) << *reasons.begin();
    EXPECT_EQ(reasons.begin()->find("claim.code.description."), std::string::npos) << *reasons.begin();
    for (std::size_t i = 0; i < description.size(); ++i)
      for (const char c : {'0', '1', '3', '9', '-', ' ', '"', ',', '['}) {
        draft.description.text = description;
        draft.description.text[i] = c;
        const Report report = recheck(draft.bytes(), {});
        EXPECT_EQ(report.outcome, Outcome::rejected) << draft.description.text;
        reasons.insert(report.reason);
      }
    EXPECT_GT(reasons.size(), 10U);
  }
}

}  // namespace
}  // namespace assize::recheck::test
