// The small tools that everything rests on: digests, numbers, words, the one spelling of JSON.
#include <gtest/gtest.h>

#include "base/digest.hpp"
#include "base/integers.hpp"
#include "base/json.hpp"
#include "base/result.hpp"
#include "base/word.hpp"

namespace assize {
namespace {

// FIPS 180-4, examples of SHA-256 (NIST Cryptographic Standards and Guidelines, example values).
TEST(Digest, AgreesWithThePublishedExamples) {
  EXPECT_EQ(digest_hex("abc"), "ba7816bf8f01cfea414140de5dae2223b00361a396177a9cb410ff61f20015ad");
  EXPECT_EQ(digest_hex("abcdbcdecdefdefgefghfghighijhijkijkljklmklmnlmnomnopnopq"),
            "248d6a61d20638b8e5c026930c3e6039a33ce45964ff2167f6ecedd419db06c1");
  EXPECT_EQ(digest_hex(""), "e3b0c44298fc1c149afbf4c8996fb92427ae41e4649b934ca495991b7852b855");
}

TEST(Digest, DoesNotDependOnHowTheBytesArrive) {
  EXPECT_EQ(Digest{}.absorb("ab").absorb("").absorb("c").hex(), digest_hex("abc"));
}

TEST(Integers, DecimalTextIsReadStrictly) {
  EXPECT_EQ(parse_decimal("0"), 0U);
  EXPECT_EQ(parse_decimal("18446744073709551615"), UINT64_MAX);
  EXPECT_EQ(parse_decimal("12", 12), 12U);
  for (const char* bad : {"", " 1", "1 ", "+1", "-1", "01", "00", "1.0", "0x1", "18446744073709551616", "1e3"})
    EXPECT_FALSE(parse_decimal(bad)) << bad;
  EXPECT_FALSE(parse_decimal("13", 12));
  EXPECT_FALSE(parse_big_decimal(std::string(5000, '1')));
  EXPECT_EQ(to_decimal(*parse_big_decimal("340282366920938463463374607431768211456")),
            "340282366920938463463374607431768211456");
}

TEST(Integers, PowersSayWhenTheyDoNotFit) {
  EXPECT_EQ(power_if_fits(2, 63), 1ULL << 63);
  EXPECT_FALSE(power_if_fits(2, 64));
  EXPECT_EQ(power_if_fits(1, 1000000), 1U);
  EXPECT_EQ(power_if_fits(0, 0), 1U);
  EXPECT_EQ(to_decimal(power(3, 50)), "717897987691852588770249");
}

TEST(Integers, GroupsOfThree) {
  EXPECT_EQ(grouped_decimal(0), "0");
  EXPECT_EQ(grouped_decimal(999), "999");
  EXPECT_EQ(grouped_decimal(1000), "1,000");
  EXPECT_EQ(grouped_decimal(BigInteger("1234567890")), "1,234,567,890");
}

TEST(Integers, OverflowStopsTheProgram) {
  EXPECT_EXIT(static_cast<void>(add_exact(UINT64_MAX, 1)), testing::ExitedWithCode(4), "a sum fits 64 bits");
  EXPECT_EXIT(static_cast<void>(mul_exact(1ULL << 32, 1ULL << 32)), testing::ExitedWithCode(4), "a product fits");
}

TEST(Result, TheWrongSideStopsTheProgram) {
  const Result<int> failed = Failure{"here", "no", "yes"};
  EXPECT_FALSE(failed);
  EXPECT_EQ(failed.error().cure, "yes");
  EXPECT_EXIT(static_cast<void>(failed.value()), testing::ExitedWithCode(4), "a failed result has no value");
}

TEST(Word, HasOneSpelling) {
  EXPECT_EQ(spell_word(2, std::vector<std::uint16_t>{0, 1, 1}), "011");
  EXPECT_EQ(spell_word(13, std::vector<std::uint16_t>{0, 12, 3}), "0 12 3");
  EXPECT_EQ(parse_word(2, "011"), (std::vector<std::uint16_t>{0, 1, 1}));
  EXPECT_EQ(parse_word(13, "0 12 3"), (std::vector<std::uint16_t>{0, 12, 3}));
  for (const char* bad : {"0  1", " 1", "1 ", "13", "1,2", "01", "-1"}) EXPECT_FALSE(parse_word(13, bad)) << bad;
  for (const char* bad : {"0 1", "2", "0a"}) EXPECT_FALSE(parse_word(2, bad)) << bad;
}

TEST(Json, ContainersOfScalarsAreFlatAllOthersBroken) {
  const Json value = Json::Object{{"a", Json::integer(1)},
                                  {"b", Json::Array{"x", Json::boolean(true)}},
                                  {"c", Json::Object{{"d", Json::Object{}}, {"e", Json::null()}}}};
  EXPECT_EQ(value.text(), "{\n\"a\":1,\n\"b\":[\"x\",true],\n\"c\":{\n\"d\":{},\n\"e\":null}}");
  EXPECT_EQ(Json(Json::Array{Json::integer(1), Json::integer(2)}).text(), "[1,2]");
}

TEST(Json, EscapesOnlyWhatItMust) {
  EXPECT_EQ(json_quoted("a\"b\\c\n\x7f\xc3\xa9/"), "\"a\\\"b\\\\c\\u000a\\u007f\xc3\xa9/\"");
}

}  // namespace
}  // namespace assize
