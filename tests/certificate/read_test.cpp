// The producer's own reader takes exactly what the writer writes.
#include "certificate/read.hpp"

#include <gtest/gtest.h>

#include "base/digest.hpp"
#include "certificate/certificate.hpp"
#include "certificate/strict_json.hpp"

namespace assize::certificate {
namespace {

Certificate sample() {
  Certificate out;
  out.title = "Line \"A\"\n\xc3\xa9";
  out.code = {Json::Object{{"field", Json::Object{{"order", Json::integer(3)}}}}, "d1", "d2", 3, 4, 2, "d3"};
  out.evidence = {evidence::Witness{3, {0, 1, 2, 2}}, evidence::MaximumDistanceSeparable{3}};
  out.statements = evidence::Conclusions::from(out.evidence, {}).statements();
  out.cautions = {"only so far"};
  out.context = {"assize", "theorem", "reference", 1, "2026-01-01T00:00:00Z", "0.100", "complete"};
  return out;
}

/// The same text with a closing digest that fits.
std::string closed_again(std::string text) {
  const std::size_t line = text.rfind("\"closing_digest\"");
  text.resize(line);
  return text + "\"closing_digest\":\"" + digest_hex(text) + "\"}\n";
}

std::string replaced(std::string text, const std::string& from, const std::string& to) {
  const std::size_t at = text.find(from);
  EXPECT_NE(at, std::string::npos) << from;
  return text.replace(at, from.size(), to);
}

TEST(Envelope, WhatWasWrittenIsRead) {
  const std::string bytes = to_bytes(sample());
  const auto value = read_envelope(bytes);
  ASSERT_TRUE(value) << value.error().what;
  EXPECT_EQ(*value->find("title")->as_string(), sample().title);
  EXPECT_EQ(*value->find("claim"), claim_json(sample()));
  EXPECT_EQ(*value->find("evidence"), evidence_json(sample()));
  EXPECT_EQ(*description_digest_of(bytes), "d1");
  EXPECT_NE(bytes.find("\"word\":\"0 1 2 2\""), std::string::npos);
}

TEST(Envelope, EverySingleChangedByteIsRefused) {
  const std::string bytes = to_bytes(sample());
  for (std::size_t i = 0; i < bytes.size(); ++i) {
    std::string changed = bytes;
    changed[i] = static_cast<char>(changed[i] ^ 1);
    EXPECT_FALSE(read_envelope(changed)) << i;
    EXPECT_FALSE(read_envelope(bytes.substr(0, i))) << i;
  }
}

TEST(Envelope, OtherSpellingsAreRefusedEvenWithAFittingDigest) {
  const std::string bytes = to_bytes(sample());
  ASSERT_TRUE(read_envelope(closed_again(bytes)));
  const std::pair<const char*, const char*> changes[] = {
      {"\"version\":1", "\"version\": 1"},
      {"\"version\":1", "\"version\":1.0"},
      {"\"version\":1", "\"version\":01"},
      {"\"version\":1", "\"version\":-1"},
      {"\"version\":1", "\"version\":null"},
      {"\"version\":1", "\"version\":2"},
      {"\"version\":1", "\"version\":1,\n\"version\":1"},
      {"\"threads\":1", "\"threads\":9007199254740992"},
      {"assize certificate", "assize\\u0020certificate"},
      {"only so far", "only so \\u0066ar"},
      {"[\n", "["},
  };
  for (const auto& [from, to] : changes) EXPECT_FALSE(read_envelope(closed_again(replaced(bytes, from, to)))) << to;
  EXPECT_FALSE(read_envelope(bytes + "\n"));
  EXPECT_FALSE(read_envelope("\xef\xbb\xbf" + bytes));
  EXPECT_FALSE(read_envelope(""));
  EXPECT_FALSE(read_envelope("{}\n"));
}

TEST(StrictJson, DepthIsLimited) {
  EXPECT_TRUE(parse_strict_json(std::string(16, '[') + std::string(16, ']')));
  EXPECT_FALSE(parse_strict_json(std::string(17, '[') + std::string(17, ']')));
  EXPECT_FALSE(parse_strict_json(std::string(1000000, '[')));
}

}  // namespace
}  // namespace assize::certificate
