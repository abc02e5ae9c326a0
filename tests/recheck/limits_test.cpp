// Input made to crash, hang or exhaust the checker is rejected at once.
#include <gtest/gtest.h>

#include "base/integers.hpp"
#include "builder.hpp"
#include "recheck/json.hpp"
#include "recheck/recheck.hpp"

namespace assize::recheck::test {
namespace {

Report check_description(const Value& description) {
  Draft draft = small_hamming();
  state_everything(draft, 2);
  draft.description = description;
  return recheck(draft.bytes(), {});
}

void expect_too_large(const Value& description) {
  const Report report = check_description(description);
  EXPECT_EQ(report.outcome, Outcome::rejected);
  EXPECT_TRUE(report.reason.find("2^27") != std::string::npos || report.reason.find("2^20") != std::string::npos ||
              report.reason.find("1048576") != std::string::npos)
      << report.reason;
}

TEST(Limits, SizesOfCodes) {
  const auto random = [](std::uint64_t n, std::uint64_t k) {
    return description_value(prime(2), {{"family", text("random-linear")},
                                        {"codeword_length", number(n)},
                                        {"dimension", number(k)},
                                        {"seed", number(1)}});
  };
  expect_too_large(random(std::uint64_t{1} << 52, 1));
  expect_too_large(random((1U << 20) + 1, 1));
  expect_too_large(random(1U << 20, 1U << 20));
  expect_too_large(cyclic_description(prime(2), {1, 1}, 1U << 20));
  expect_too_large(
      description_value(prime(2), {{"family", text("reed-muller")}, {"order", number(10)}, {"variables", number(20)}}));
  Value wide = matrix_description(prime(2), {Vector(1U << 16, 1)}, {step("dual")});
  expect_too_large(wide);
  const PlainField gf65536{2, {1, 0, 1, 1, 0, 1, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 1}};
  expect_too_large(description_value(gf65536, {{"family", text("reed-solomon")},
                                               {"codeword_length", number(65535)},
                                               {"dimension", number(32768)},
                                               {"first_root", number(1)},
                                               {"root_step", number(1)},
                                               {"primitive_element", text("2")}}));
}

TEST(Limits, NestedConcatenations) {
  Value inner = matrix_description(prime(2), {{1}});
  for (int i = 0; i < 6; ++i)
    inner = description_value(prime(2), {{"family", text("concatenated")},
                                         {"outer", matrix_description(prime(2), {Vector(200, 1)})},
                                         {"inner", inner}});
  EXPECT_EQ(check_description(inner).outcome, Outcome::rejected);
}

TEST(Limits, EnumerationsWithGiantNumbers) {
  Draft small = small_hamming();
  small.statements = {distance("at-least", 1, {0})};
  for (const std::string& total : {std::string(4096, '9'), std::string(5000, '9'), std::string("18446744073709551616"),
                                   std::string("-1"), std::string("01"), std::string(""), std::string("1e3")}) {
    EnumerationDraft enumeration{generator_digest(prime(2), small.generator), 2, total, {}, {}};
    small.evidence = {enumeration.value()};
    EXPECT_EQ(recheck(small.bytes(), {}).outcome, Outcome::rejected);
  }
  EnumerationDraft enumeration = enumerate(prime(2), small.generator, 2);
  enumeration.shards[1].number = std::string(4000, '9');
  small.evidence = {enumeration.value()};
  EXPECT_EQ(recheck(small.bytes(), {}).outcome, Outcome::rejected);
}

/// The whole space of length 2^11 as a Reed-Muller code; one shard with a number of 617 digits.
TEST(Limits, ShardNumbersBeyond64Bits) {
  std::string generator = "2 2048 2048\n";
  for (unsigned i = 0; i < 2048; ++i) generator += (i == 0 ? "" : " ") + std::to_string(i);
  generator += std::string(2049, '\n');
  Draft draft{
      description_value(prime(2), {{"family", text("reed-muller")}, {"order", number(11)}, {"variables", number(11)}}),
      prime(2),
      {{1}}};
  draft.length = 2048;
  draft.dimension = 2048;
  draft.generator_text_digest = digest_hex(generator);
  const BigInteger words = power(2, 2048);
  EnumerationDraft enumeration{*draft.generator_text_digest, 0, to_decimal(words), {}, {}};
  enumeration.shards = {{"0", {}, {}, {}}, {"1", {{1, 1}}, {}, {}}, {to_decimal(words - 1), {{2048, 1}}, {}, {}}};
  Vector unit(2048, 0);
  unit[100] = 1;
  draft.evidence = {enumeration.value(), witness(prime(2), 1, unit)};
  draft.statements = {distance("at-most", 1, {1})};
  const Report report = recheck(draft.bytes(), {});
  EXPECT_EQ(report.outcome, Outcome::proven) << report.reason;
  EXPECT_EQ(report.shards_total, (std::uint64_t{1} << 53) - 1);
  EXPECT_EQ(report.shards_reexecuted, 3U);
  enumeration.shards[2].counts = {{2047, 1}};
  draft.evidence[0] = enumeration.value();
  EXPECT_EQ(recheck(draft.bytes(), {}).outcome, Outcome::rejected);
}

TEST(Limits, PlansBeyondTheLongestCount) {
  const PlainField gf256{2, {1, 0, 1, 1, 1, 0, 0, 0, 1}};
  std::string generator = "256 2000 2000\n";
  for (unsigned i = 0; i < 2000; ++i) generator += (i == 0 ? "" : " ") + std::to_string(i);
  generator += std::string(2001, '\n');
  Draft draft{description_value(
                  gf256, {{"family", text("parity-check-matrix")}, {"rows", texts({word(gf256, Vector(2000, 0))})}}),
              gf256,
              {{1}}};
  draft.length = 2000;
  draft.dimension = 2000;
  draft.generator_text_digest = digest_hex(generator);
  for (const std::uint64_t free_rows : {0U, 2000U}) {
    EnumerationDraft enumeration{*draft.generator_text_digest, free_rows, std::string(4096, '9'), {}, {}};
    draft.evidence = {enumeration.value()};
    draft.statements = {distance("at-most", 1, {0})};
    const Report report = recheck(draft.bytes(), {});
    EXPECT_EQ(report.outcome, Outcome::rejected);
    EXPECT_NE(report.reason.find("4096 digits"), std::string::npos) << report.reason;
  }
}

TEST(Limits, ManyItems) {
  Draft draft = small_hamming();
  draft.statements = {distance("at-most", 3, {0})};
  draft.evidence.assign(64, witness(prime(2), 3, {0, 0, 0, 1, 0, 1, 1}));
  EXPECT_EQ(recheck(draft.bytes(), {}).outcome, Outcome::proven);
  draft.evidence.push_back(draft.evidence[0]);
  EXPECT_EQ(recheck(draft.bytes(), {}).outcome, Outcome::rejected);
}

TEST(Limits, JsonThatIsNoCertificate) {
  const auto refused = [](const std::string& bytes, const std::string& what) {
    const auto parsed = parse(bytes);
    ASSERT_FALSE(parsed.has_value()) << bytes.substr(0, 40);
    EXPECT_NE(parsed.error().what.find(what), std::string::npos) << parsed.error().what;
    EXPECT_EQ(recheck(bytes, {}).outcome, Outcome::rejected);
  };
  refused("", "empty");
  refused("\xef\xbb\xbf{}", "byte order mark");
  refused("{\"a\":1.0}", "integers");
  refused("{\"a\":-1}", "sign");
  refused("{\"a\":-0}", "sign");
  refused("{\"a\":1e2}", "integers");
  refused("{\"a\":9007199254740992}", "2^53");
  refused("{\"a\":99999999999999999999999}", "integers");
  refused("{\"a\":null}", "null");
  refused("{\"a\":1,\"b\":2,\"a\":3}", "twice");
  refused("{\"\xc3\xa9\":1}", "ASCII");
  refused("{\"a\":\"\xff\"}", "UTF-8");
  refused("{\"a\":\"\xed\xa0\x80\"}", "UTF-8");  // a surrogate
  refused("{} {}", "JSON");
  refused("{\"a\":01}", "JSON");
  refused("[1,]", "JSON");
  refused("{\"a\":\"\n\"}", "JSON");
  refused(std::string(1000000, '['), "16 levels");
  refused(std::string(17, '[') + std::string(17, ']'), "16 levels");
  refused("[" + std::string(5000000, '0'), "JSON");
  std::string many = "[0";
  for (int i = 0; i < (1 << 21); ++i) many += ",0";
  refused(many + "]", "2^21");
  refused(std::string((16U << 20) + 1, ' '), "16 MiB");
  EXPECT_TRUE(parse(std::string(16, '[') + std::string(16, ']')).has_value());
}

TEST(Limits, OtherTopValues) {
  for (const char* bytes : {"[]\n", "{}\n", "\"x\"\n", "1\n", "true\n", "{\"format\":\"assize certificate\"}\n"})
    EXPECT_EQ(recheck(bytes, {}).outcome, Outcome::rejected);
}

}  // namespace
}  // namespace assize::recheck::test
