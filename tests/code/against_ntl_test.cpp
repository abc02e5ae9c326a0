// Encoding and weights against NTL, an outside library for algebra: random codes, random messages.
#include <NTL/GF2E.h>
#include <NTL/GF2X.h>
#include <NTL/ZZ_p.h>
#include <NTL/mat_GF2E.h>
#include <NTL/mat_ZZ_p.h>
#include <gtest/gtest.h>

#include <random>

#include "code/construct.hpp"
#include "sheet/sheet_support.hpp"

namespace assize::code {
namespace {

using field::Element;

/// A random linear code of the field that is written in TOML.
LinearCode random_code(const std::string& field, std::uint32_t length, std::uint32_t dimension, int seed) {
  const auto description = sheet::read_text(
      "[field]\n" + field + "\n[code]\nfamily = \"random-linear\"\ncodeword_length = " + std::to_string(length) +
      "\ndimension = " + std::to_string(dimension) + "\nseed = " + std::to_string(seed) + "\n");
  EXPECT_TRUE(description);
  auto code = construct(*description);
  EXPECT_TRUE(code);
  return *std::move(code);
}

std::vector<Element> random_message(const LinearCode& code, std::mt19937_64& random) {
  std::vector<Element> message(code.dimension());
  for (Element& symbol : message) symbol = static_cast<Element>(random() % code.order());
  return message;
}

constexpr int messages = 50;

TEST(AgainstNtl, WordsOverPrimeFields) {
  std::mt19937_64 random(20260101);
  for (const long p : {2L, 3L, 5L, 7L, 31L, 127L, 251L, 257L, 65521L}) {
    NTL::ZZ_p::init(NTL::ZZ(p));
    const LinearCode code = random_code("order = " + std::to_string(p), 24, 7, 5);
    NTL::mat_ZZ_p generator;
    generator.SetDims(code.dimension(), code.length());
    for (std::uint32_t i = 0; i < code.dimension(); ++i)
      for (std::uint32_t j = 0; j < code.length(); ++j) generator[i][j] = static_cast<long>(code.row(i)[j]);
    for (int trial = 0; trial < messages; ++trial) {
      const auto message = random_message(code, random);
      NTL::vec_ZZ_p vector;
      vector.SetLength(code.dimension());
      for (std::uint32_t i = 0; i < code.dimension(); ++i) vector[i] = static_cast<long>(message[i]);
      const NTL::vec_ZZ_p product = vector * generator;
      const auto word = code.encode(message);
      std::uint32_t heavy = 0;
      for (std::uint32_t j = 0; j < code.length(); ++j) {
        long symbol = 0;
        NTL::conv(symbol, NTL::rep(product[j]));
        EXPECT_EQ(word[j], symbol) << "p = " << p;
        heavy += NTL::IsZero(product[j]) ? 0U : 1U;
      }
      EXPECT_EQ(weight(word), heavy);
      EXPECT_TRUE(code.contains(word));
    }
  }
}

NTL::GF2E to_ntl(Element element) {
  NTL::GF2X polynomial;
  for (long bit = 0; bit < 16; ++bit)
    if ((element >> bit) & 1) NTL::SetCoeff(polynomial, bit);
  return NTL::to_GF2E(polynomial);
}

TEST(AgainstNtl, WordsOverExtensionFields) {
  std::mt19937_64 random(20260102);
  struct Case {
    const char* field;
    std::vector<long> modulus;  // exponents
  };
  const Case cases[] = {{"order = 4\nmodulus = \"x^2 + x + 1\"", {2, 1, 0}},
                        {"order = 8\nmodulus = \"x^3 + x^2 + 1\"", {3, 2, 0}},
                        {"order = 16\nmodulus = \"x^4 + x^3 + x^2 + x + 1\"", {4, 3, 2, 1, 0}},
                        {"order = 256\nmodulus = \"x^8 + x^4 + x^3 + x + 1\"", {8, 4, 3, 1, 0}},
                        {"order = 4096\nmodulus = \"x^12 + x^6 + x^4 + x + 1\"", {12, 6, 4, 1, 0}},
                        {"order = 65536\nmodulus = \"x^16 + x^12 + x^3 + x + 1\"", {16, 12, 3, 1, 0}}};
  for (const Case& one : cases) {
    NTL::GF2X modulus;
    for (const long exponent : one.modulus) NTL::SetCoeff(modulus, exponent);
    NTL::GF2E::init(modulus);
    const LinearCode code = random_code(one.field, 20, 6, 9);
    NTL::mat_GF2E generator;
    generator.SetDims(code.dimension(), code.length());
    for (std::uint32_t i = 0; i < code.dimension(); ++i)
      for (std::uint32_t j = 0; j < code.length(); ++j) generator[i][j] = to_ntl(code.row(i)[j]);
    for (int trial = 0; trial < messages; ++trial) {
      const auto message = random_message(code, random);
      NTL::vec_GF2E vector;
      vector.SetLength(code.dimension());
      for (std::uint32_t i = 0; i < code.dimension(); ++i) vector[i] = to_ntl(message[i]);
      const NTL::vec_GF2E product = vector * generator;
      const auto word = code.encode(message);
      std::uint32_t heavy = 0;
      for (std::uint32_t j = 0; j < code.length(); ++j) {
        EXPECT_EQ(to_ntl(word[j]), product[j]) << one.field;
        heavy += NTL::IsZero(product[j]) ? 0U : 1U;
      }
      EXPECT_EQ(weight(word), heavy);
    }
  }
}

}  // namespace
}  // namespace assize::code
