// Certificates that are well-formed to the last digest and yet wrong: every one is rejected, and the place is named.
#include <gtest/gtest.h>

#include "builder.hpp"
#include "recheck/recheck.hpp"

namespace assize::recheck::test {
namespace {

void expect_rejected(const std::string& bytes, const std::string& place, Depth depth = Depth::full) {
  Options options;
  options.depth = depth;
  const Report report = recheck(bytes, options);
  EXPECT_EQ(report.outcome, Outcome::rejected) << "expected a fault at " << place;
  EXPECT_NE(report.reason.find(place), std::string::npos) << report.reason;
  EXPECT_EQ(exit_code(report.outcome), 1);
  for (const Finding& finding : report.findings)
    EXPECT_TRUE(finding.status == Status::rejected || finding.status == Status::not_checked) << finding.statement;
}

/// The [7,4] Hamming code with two free rows: shards of 3, 4, 4, 4 messages.
struct Forged {
  Draft draft = small_hamming();
  EnumerationDraft enumeration = enumerate(draft.field, draft.generator, 2);

  [[nodiscard]] std::string bytes(std::vector<Value> statements = {distance("exactly", 3, {0})}) {
    draft.evidence.insert(draft.evidence.begin(), enumeration.value());
    draft.statements = std::move(statements);
    return draft.bytes();
  }
};

TEST(Forgery, TheUnforgedCertificateIsProven) { EXPECT_EQ(recheck(Forged().bytes(), {}).outcome, Outcome::proven); }

TEST(Forgery, CountAltered) {
  Forged f;
  --f.enumeration.shards[1].counts.begin()->second;
  expect_rejected(f.bytes(), "evidence[0].shards[1].counts", Depth::quick);
}

TEST(Forgery, CountsMovedWithoutChangingTheirSum) {
  Forged f;
  Weights& counts = f.enumeration.shards[1].counts;
  counts = {{1, 1}, {7, 3}};
  expect_rejected(f.bytes(), "evidence[0].shards[1].counts", Depth::quick);
}

TEST(Forgery, MomentsThatDoNotFollow) {
  Forged f;
  f.enumeration.shards[2].moments = {{1, 1}};
  expect_rejected(f.bytes(), "evidence[0].shards[2].moments", Depth::quick);
}

TEST(Forgery, WrongShardDigest) {
  Forged f;
  f.enumeration.shards[2].digest = digest_hex("something else");
  expect_rejected(f.bytes(), "evidence[0].shards[2].digest", Depth::quick);
}

TEST(Forgery, CountsWithRightMomentsAreFoundByExecutionOnly) {
  Draft draft = golay();
  EnumerationDraft enumeration = enumerate(draft.field, draft.generator, 8);
  ASSERT_TRUE(disguise(enumeration.shards[5]));
  draft.evidence = {enumeration.value()};
  draft.statements = {distance("exactly", 7, {0})};
  Options quick;
  quick.depth = Depth::quick;
  EXPECT_EQ(recheck(draft.bytes(), quick).outcome, Outcome::consistent);
  expect_rejected(draft.bytes(), "evidence[0].shards[5].counts", Depth::full);
}

TEST(Forgery, MissingShard) {
  Forged f;
  f.enumeration.shards.erase(f.enumeration.shards.begin() + 1);
  expect_rejected(f.bytes(), "claim.statements[0]", Depth::quick);
}

TEST(Forgery, DoubledShard) {
  Forged f;
  f.enumeration.shards.insert(f.enumeration.shards.begin() + 1, f.enumeration.shards[1]);
  expect_rejected(f.bytes(), "evidence[0].shards[2].number", Depth::quick);
}

TEST(Forgery, DoubledShardInPlaceOfAnother) {
  Forged f;
  f.enumeration.shards[2] = f.enumeration.shards[1];
  expect_rejected(f.bytes(), "evidence[0].shards[2].number", Depth::quick);
}

TEST(Forgery, SwappedShards) {
  Forged f;
  std::swap(f.enumeration.shards[1], f.enumeration.shards[2]);
  expect_rejected(f.bytes(), "evidence[0].shards[2].number", Depth::quick);
}

TEST(Forgery, ShardOutsideThePlan) {
  Forged f;
  f.enumeration.shards[3].number = "4";
  expect_rejected(f.bytes(), "evidence[0].shards[3].number", Depth::quick);
}

TEST(Forgery, WrongPlan) {
  Forged digest;
  digest.enumeration.plan_digest = digest_hex("plan");
  expect_rejected(digest.bytes(), "evidence[0].plan_digest", Depth::quick);
  Forged rows;
  rows.enumeration.free_rows = 3;
  expect_rejected(rows.bytes(), "evidence[0].plan.shards", Depth::quick);
  Forged total;
  total.enumeration.total = "5";
  expect_rejected(total.bytes(), "evidence[0].plan.shards", Depth::quick);
  Forged both;
  both.enumeration.free_rows = 3;
  both.enumeration.total = "2";
  expect_rejected(both.bytes(), "evidence[0].shards[0].counts", Depth::quick);
  Forged many;
  many.enumeration.free_rows = 5;
  expect_rejected(many.bytes(), "evidence[0].plan.free_rows", Depth::quick);
  Forged other;
  other.enumeration.generator = digest_hex("another code");
  expect_rejected(other.bytes(), "evidence[0].plan.reduced_generator_digest", Depth::quick);
}

TEST(Forgery, BoundRaisedOrLowered) {
  for (const auto& [relation, value] :
       std::vector<std::pair<std::string, unsigned>>{{"exactly", 4}, {"exactly", 2}, {"at-least", 4}, {"at-most", 2}})
    expect_rejected(Forged().bytes({distance(relation, value, {0})}), "claim.statements[0]", Depth::quick);
}

TEST(Forgery, WrongCounts) {
  expect_rejected(Forged().bytes({minimum_words(3, 8, {0})}), "claim.statements[0]");
  expect_rejected(Forged().bytes({minimum_words(4, 7, {0})}), "claim.statements[0]");
  expect_rejected(Forged().bytes({distribution({{0, 1}, {3, 7}, {4, 7}}, {0})}), "claim.statements[0]");
  expect_rejected(Forged().bytes({distribution({{3, 7}, {4, 7}, {7, 1}}, {0})}), "claim.statements[0]");
  expect_rejected(Forged().bytes({distribution({{0, 1}, {3, 7}, {4, 8}, {7, 1}}, {0})}), "claim.statements[0]");
}

TEST(Forgery, StatementsBeyondTheirEvidence) {
  Forged f;
  f.draft.evidence = {witness(prime(2), 3, {0, 0, 0, 1, 0, 1, 1})};
  const std::string proven = f.bytes({distance("exactly", 3, {0, 1})});
  EXPECT_EQ(recheck(proven, {}).outcome, Outcome::proven);
  // The witness alone yields no lower bound and no count, although the certificate holds better evidence.
  f.draft.statements = {distance("exactly", 3, {1})};
  expect_rejected(f.draft.bytes(), "claim.statements[0]");
  f.draft.statements = {distance("at-least", 3, {1})};
  expect_rejected(f.draft.bytes(), "claim.statements[0]");
  f.draft.statements = {minimum_words(3, 7, {1})};
  expect_rejected(f.draft.bytes(), "claim.statements[0]");
  f.draft.statements = {distance("at-most", 3, {1})};
  EXPECT_EQ(recheck(f.draft.bytes(), {}).outcome, Outcome::proven);
}

TEST(Forgery, StatementsOutOfOrderOrWithBadIndexes) {
  Forged order;
  expect_rejected(order.bytes({minimum_words(3, 7, {0}), distance("exactly", 3, {0})}), "claim.statements[1].kind");
  expect_rejected(Forged().bytes({distance("exactly", 3, {0}), distance("at-least", 3, {0})}),
                  "claim.statements[1].kind");
  expect_rejected(Forged().bytes({distance("exactly", 3, {1})}), "claim.statements[0].evidence[0]");
  expect_rejected(Forged().bytes({distance("exactly", 3, {0, 0})}), "claim.statements[0].evidence[1]");
  expect_rejected(Forged().bytes({distance("exactly", 3, {})}), "claim.statements[0].evidence");
  expect_rejected(Forged().bytes({distance("about", 3, {0})}), "claim.statements[0].relation");
  Forged none;
  none.draft.statements.clear();
  expect_rejected(none.bytes({}), "claim.statements");
}

TEST(Forgery, BoundsThatDoNotMeet) {
  Draft draft = small_hamming();
  draft.evidence = {witness(prime(2), 3, {0, 0, 0, 1, 0, 1, 1})};
  const auto with = [&](const std::vector<Value>& statements) {
    draft.statements = statements;
    return draft.bytes();
  };
  EXPECT_EQ(recheck(with({distance("at-least", 1, {0}), distance("at-most", 3, {0})}), {}).outcome, Outcome::proven);
  EXPECT_EQ(recheck(with({distance("at-least", 1, {0})}), {}).outcome, Outcome::proven);
  expect_rejected(with({distance("at-least", 2, {0}), distance("at-most", 3, {0})}), "claim.statements[0]");
  expect_rejected(with({distance("at-most", 3, {0}), distance("at-least", 1, {0})}), "claim.statements[1].kind");
  expect_rejected(with({distance("at-least", 3, {0}), distance("at-most", 3, {0})}), "claim.statements[1].kind");
  expect_rejected(with({distance("at-most", 4, {0}), distance("at-most", 3, {0})}), "claim.statements[1].kind");
  expect_rejected(with({distance("at-most", 0, {0})}), "claim.statements[0]");
  expect_rejected(with({distance("at-least", 0, {0}), distance("at-least", 1, {0}), distance("at-most", 3, {0})}),
                  "claim.statements[1].kind");
}

TEST(Forgery, Witnesses) {
  const auto with = [](unsigned w, const Vector& symbols) {
    Draft draft = small_hamming();
    draft.evidence = {witness(prime(2), w, symbols)};
    draft.statements = {distance("at-most", w, {0})};
    return draft.bytes();
  };
  expect_rejected(with(3, {0, 0, 0, 0, 1, 1, 1}), "evidence[0].word");
  expect_rejected(with(2, {0, 0, 0, 1, 0, 1, 1}), "evidence[0].weight");
  expect_rejected(with(3, {0, 0, 0, 1, 0, 1, 1, 0}), "evidence[0].word");
  expect_rejected(with(0, {0, 0, 0, 0, 0, 0, 0}), "evidence[0].weight");
  expect_rejected(with(1, {0, 0, 0, 0, 0, 0, 2}), "evidence[0].word");
}

TEST(Forgery, CodeFacts) {
  const auto change = [](void (*alter)(Draft&), const std::string& place) {
    Draft draft = small_hamming();
    state_everything(draft, 2);
    alter(draft);
    expect_rejected(draft.bytes(), place, Depth::quick);
  };
  change([](Draft& d) { d.dimension = 3; }, "claim.code.dimension");
  change([](Draft& d) { d.length = 8; }, "claim.code.length");
  change([](Draft& d) { d.order = 3; }, "claim.code.order");
  change([](Draft& d) { d.description_digest = digest_hex("x"); }, "claim.code.description_digest");
  change([](Draft& d) { d.generator_text_digest = digest_hex("x"); }, "claim.code.reduced_generator_digest");
  change(
      [](Draft& d) {
        d.description = cyclic_description(prime(2), {1, 0, 1, 1}, 7);
      },
      "claim.code.reduced_generator_digest");
}

void expect_bad_description(const Value& description, const std::string& place) {
  Draft draft = small_hamming();
  state_everything(draft, 2);
  draft.description = description;
  expect_rejected(draft.bytes(), "claim.code.description" + place, Depth::quick);
}

TEST(Forgery, Fields) {
  const auto with = [](const Value& field) {
    return object({{"field", field}, {"code", object({{"family", text("generator-matrix")}, {"rows", texts({"1"})}})}});
  };
  const auto field = [](std::uint64_t order, const std::string& modulus) {
    return object({{"order", number(order)}, {"modulus", text(modulus)}});
  };
  expect_bad_description(with(field(4, "101")), ".field");     // (x + 1)^2
  expect_bad_description(with(field(16, "10101")), ".field");  // (x^2 + x + 1)^2
  expect_bad_description(with(field(9, "2 0 1")), ".field");   // (x + 1)(x + 2)
  expect_bad_description(with(field(4, "1101")), ".field");    // wrong degree
  expect_bad_description(with(field(9, "1 0 2")), ".field");   // not monic
  expect_bad_description(with(field(9, "3 0 1")), ".field.modulus");
  expect_bad_description(with(field(2, "11")), ".field");
  expect_bad_description(with(object({{"order", number(4)}})), ".field");
  expect_bad_description(with(object({{"order", number(6)}})), ".field");
  expect_bad_description(with(object({{"order", number(1)}})), ".field.order");
  expect_bad_description(with(field(343, "1 0 0 1")), ".field");  // 7^3 is above 256
  expect_bad_description(with(object({{"order", number(65537)}})), ".field.order");
}

TEST(Forgery, Families) {
  const auto code = [](const std::vector<std::pair<std::string, Value>>& members, const PlainField& f = prime(2)) {
    return description_value(f, members);
  };
  expect_bad_description(cyclic_description(prime(2), {1, 1, 1}, 7), ".code.generator");
  expect_bad_description(cyclic_description(prime(2), {0, 1, 1}, 7, {}, "shortened-cyclic"), ".code.generator");
  expect_bad_description(cyclic_description(prime(2), {1, 1, 0}, 7), ".code.generator");
  expect_bad_description(cyclic_description(prime(2), {1, 1, 0, 1}, 2), ".code.generator");
  expect_bad_description(code({{"family", text("turbo")}}), ".code.family");
  expect_bad_description(code({{"family", text("generator-matrix")}, {"rows", texts({})}}), ".code.rows");
  expect_bad_description(code({{"family", text("generator-matrix")}, {"rows", texts({"10", "1"})}}), ".code.rows[1]");
  expect_bad_description(code({{"family", text("generator-matrix")}, {"rows", texts({"00"})}}), "");
  expect_bad_description(code({{"family", text("generator-matrix")}, {"rows", texts({"12"})}}), ".code.rows[0]");
  expect_bad_description(code({{"family", text("generator-matrix")}, {"rows", texts({"1  2"})}}, prime(3)),
                         ".code.rows[0]");
  expect_bad_description(code({{"family", text("parity-check-matrix")}, {"rows", texts({"10", "01"})}}), "");
  expect_bad_description(code({{"family", text("reed-muller")}, {"order", number(3)}, {"variables", number(2)}}),
                         ".code.variables");
  expect_bad_description(code({{"family", text("reed-muller")}, {"order", number(1)}, {"variables", number(21)}}),
                         ".code.variables");
  expect_bad_description(code({{"family", text("random-linear")},
                               {"codeword_length", number(3)},
                               {"dimension", number(4)},
                               {"seed", number(1)}}),
                         ".code.dimension");
  expect_bad_description(reed_solomon_description(gf8, {1, 2, 1}, {1, 1, 1}, 2), ".code.evaluation_points");
  expect_bad_description(reed_solomon_description(gf8, {1, 2, 3}, {1, 0, 1}, 2), ".code.multipliers");
  expect_bad_description(reed_solomon_description(gf8, {1, 2, 3}, {1, 1, 1}, 4), ".code.dimension");
  const auto roots = [&](unsigned n, unsigned step_size, const std::string& a, const PlainField& f) {
    return code({{"family", text("reed-solomon")},
                 {"codeword_length", number(n)},
                 {"dimension", number(2)},
                 {"first_root", number(1)},
                 {"root_step", number(step_size)},
                 {"primitive_element", text(a)}},
                f);
  };
  expect_bad_description(roots(7, 1, "3", prime(7)), ".code.codeword_length");
  expect_bad_description(roots(6, 2, "3", prime(7)), ".code.root_step");
  expect_bad_description(roots(6, 1, "2", prime(7)), ".code.primitive_element");
  expect_bad_description(roots(6, 1, "7", prime(7)), ".code.primitive_element");
}

TEST(Forgery, Steps) {
  const Value turn = object({{"step", text("turn")}});
  expect_bad_description(cyclic_description(prime(2), {1, 1, 0, 1}, 7, {turn}), ".then[0].step");
  const Value image = object({{"step", text("binary-image")}, {"basis", text("1 2 3")}});
  expect_bad_description(matrix_description(gf8, {{1, 2}}, {image}), ".then[0].basis");
  expect_bad_description(matrix_description(prime(3), {{1, 2}}, {image}), ".then[0]");
  expect_bad_description(matrix_description(prime(2), {{1, 0}, {0, 1}}, {step("dual")}), "");
  const Value empty = object({{"field", field_value(prime(2))},
                              {"code", object({{"family", text("generator-matrix")}, {"rows", texts({"11"})}})},
                              {"then", array({})}});
  expect_bad_description(empty, ".then");
}

TEST(Forgery, Concatenations) {
  const Vector points{0, 1, 2, 3, 4};
  const Value outer = reed_solomon_description(gf8, points, Vector(5, 1), 2);
  const auto with = [&](const Value& inner) {
    return description_value(prime(2), {{"family", text("concatenated")}, {"outer", outer}, {"inner", inner}});
  };
  expect_bad_description(with(matrix_description(prime(2), {{1, 1, 0}, {0, 1, 1}})), ".code");
  expect_bad_description(with(matrix_description(prime(2), {{1, 1, 0}, {0, 1, 1}, {1, 0, 1}})), ".code.inner");
  expect_bad_description(with(matrix_description(prime(3), {{1, 1, 0}, {0, 1, 1}})), ".code");
  const auto extension = [&](const std::string& embedding, const std::string& basis) {
    const PlainField gf16{2, {1, 1, 0, 0, 1}};
    return description_value(gf4, {{"family", text("concatenated")},
                                   {"outer", matrix_description(gf16, {{1, 5, 7}})},
                                   {"inner", matrix_description(gf4, {{1, 0, 1}, {0, 1, 2}})},
                                   {"embedding", text(embedding)},
                                   {"symbol_basis", text(basis)}});
  };
  expect_bad_description(extension("2", "1 2"), ".code.embedding");
  expect_bad_description(extension("6", "1 6"), ".code.symbol_basis");
  expect_bad_description(extension("6", "1 2 3"), ".code.symbol_basis");
  expect_bad_description(extension("16", "1 2"), ".code.embedding");
}

TEST(Forgery, TheoremFacts) {
  const Vector points{0, 1, 2, 3, 4, 5, 6, 7};
  Draft rs{reed_solomon_description(gf8, points, Vector(8, 1), 3), gf8, evaluation_rows(gf8, points, Vector(8, 1), 3)};
  rs.evidence = {mds_fact(7)};
  rs.statements = {distance("at-least", 7, {0})};
  expect_rejected(rs.bytes(), "evidence[0].at_least", Depth::quick);
  rs.evidence = {concatenation_fact(6, "maximum-distance-separable", std::vector<std::uint64_t>(8, 1), 6)};
  rs.statements = {distance("at-least", 6, {0})};
  expect_rejected(rs.bytes(), "evidence[0]", Depth::quick);

  Draft hamming = small_hamming();
  hamming.evidence = {mds_fact(4)};
  hamming.statements = {distance("at-least", 3, {0})};
  expect_rejected(hamming.bytes(), "evidence[0]", Depth::quick);

  const std::vector<std::uint64_t> inner = justesen_inner(2);
  std::vector<std::uint64_t> ascending = inner;
  std::sort(ascending.begin(), ascending.end());
  const std::uint64_t bound = ascending[0] + ascending[1] + ascending[2] + ascending[3] + ascending[4];
  const auto just = [&](std::uint64_t outer, const std::string& from, const std::vector<std::uint64_t>& distances,
                        std::uint64_t at_least) {
    Draft draft = justesen(2, "bits");
    draft.evidence = {concatenation_fact(outer, from, distances, at_least)};
    draft.statements = {distance("at-least", at_least, {0})};
    return draft.bytes();
  };
  expect_rejected(just(6, "maximum-distance-separable", inner, bound), "evidence[0].outer_distance", Depth::quick);
  expect_rejected(just(6, "enumeration", inner, bound), "evidence[0].outer_distance", Depth::quick);
  expect_rejected(just(5, "hearsay", inner, bound), "evidence[0].outer_distance_from", Depth::quick);
  expect_rejected(just(5, "enumeration", inner, bound + 1), "evidence[0].at_least", Depth::quick);
  std::vector<std::uint64_t> raised = inner;
  ++raised[3];
  expect_rejected(just(5, "enumeration", raised, bound + 1), "evidence[0].inner_distances[3]", Depth::quick);
  raised = inner;
  raised.push_back(3);
  expect_rejected(just(5, "enumeration", raised, bound), "evidence[0].inner_distances", Depth::quick);
}

TEST(Forgery, EvidenceThatContradictsItself) {
  Draft draft = golay();
  const EnumerationDraft honest = enumerate(draft.field, draft.generator, 6);
  EnumerationDraft other = enumerate(draft.field, draft.generator, 8);
  ASSERT_TRUE(disguise(other.shards[5]));
  draft.evidence = {honest.value(), other.value()};
  draft.statements = {distance("exactly", 7, {0})};
  expect_rejected(draft.bytes(), "two complete enumerations", Depth::quick);

  // Third differences on 4, 8, 12, 16 keep all sums but pretend a word of weight 4.
  EnumerationDraft partial = enumerate(draft.field, draft.generator, 8);
  Weights& counts = partial.shards[5].counts;
  ASSERT_GT(counts.at(8), 3U);
  ASSERT_GT(counts.at(16), 1U);
  counts[4] += 1;
  counts[8] -= 3;
  counts[12] += 3;
  counts[16] -= 1;
  partial.shards.pop_back();
  draft.evidence = {honest.value(), partial.value()};
  expect_rejected(draft.bytes(), "evidence[1] has a word of weight 4", Depth::quick);
}

TEST(Forgery, WrongKeysOfEvidence) {
  Draft draft = small_hamming();
  const Value right = witness(prime(2), 3, {0, 0, 0, 1, 0, 1, 1});
  draft.statements = {distance("at-most", 3, {0})};
  const auto with = [&](const std::string& from, const std::string& to) {
    Value changed = right;
    changed.text.replace(changed.text.find(from), from.size(), to);
    draft.evidence = {changed};
    return draft.bytes();
  };
  expect_rejected(with("\"class\":\"witness\"", "\"class\":\"theorem\""), "evidence[0].class");
  expect_rejected(with("\"weight\":3", "\"weight\":\"3\""), "evidence[0].weight");
  expect_rejected(with("\"weight\":3", "\"note\":1,\"weight\":3"), "evidence[0].note");
  expect_rejected(with("\"weight\":3,", ""), "evidence[0].word");
  expect_rejected(with("}", ",\"more\":1}"), "evidence[0].more");
}

TEST(Forgery, CertificateAboutAnotherCode) {
  Draft draft = small_hamming();
  state_everything(draft, 2);
  Options options;
  options.expected_description_digest = digest_hex(draft.description.text);
  EXPECT_EQ(recheck(draft.bytes(), options).outcome, Outcome::proven);
  options.expected_description_digest = digest_hex(golay().description.text);
  const Report report = recheck(draft.bytes(), options);
  EXPECT_EQ(report.outcome, Outcome::rejected);
  EXPECT_NE(report.reason.find("another code"), std::string::npos);
}

}  // namespace
}  // namespace assize::recheck::test
