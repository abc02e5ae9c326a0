// Certificates of well-known codes, one for each family and step: all proven at full depth.
#include <gtest/gtest.h>

#include "builder.hpp"
#include "recheck/recheck.hpp"

namespace assize::recheck::test {
namespace {

void expect_proven(const Draft& draft, const char* what) {
  const std::string bytes = draft.bytes();
  const Report report = recheck(bytes, {});
  EXPECT_EQ(report.outcome, Outcome::proven) << what << ": " << report.reason;
  EXPECT_EQ(report.order, draft.order);
  EXPECT_EQ(report.length, draft.length);
  EXPECT_EQ(report.dimension, draft.dimension);
  for (const Finding& finding : report.findings) EXPECT_EQ(finding.status, Status::proven) << finding.statement;
}

/// Whatever the number of free rows, the enumeration must be accepted.
void expect_proven_for_all_plans(Draft draft, const char* what) {
  for (std::size_t s = 0; s <= draft.generator.size(); ++s) {
    draft.evidence.clear();
    state_everything(draft, s);
    expect_proven(draft, what);
  }
}

TEST(Codes, BinaryGolay) {
  Draft draft = golay();
  state_everything(draft, 6);
  const EnumerationDraft enumeration = enumerate(draft.field, draft.generator, 6);
  // F. J. MacWilliams, N. J. A. Sloane, The Theory of Error-Correcting Codes, chapter 2.
  const Weights known{{0, 1}, {7, 253}, {8, 506}, {11, 1288}, {12, 1288}, {15, 506}, {16, 253}, {23, 1}};
  EXPECT_EQ(all_weights(draft.field, enumeration), known);
  expect_proven(draft, "Golay");
}

TEST(Codes, EveryPlanOfASmallCode) {
  expect_proven_for_all_plans(small_hamming(), "Hamming");
  expect_proven_for_all_plans({matrix_description(gf4, hexacode()), gf4, hexacode()}, "hexacode");
  const Rows nine{{1, 0, 3, 5, 0, 0, 8}, {0, 1, 2, 7, 0, 0, 4}};
  expect_proven_for_all_plans({matrix_description(gf9, nine), gf9, nine}, "over GF(9)");
  const Rows seven{{1, 0, 3, 5, 6, 0}, {0, 1, 2, 4, 4, 0}, {1, 1, 5, 2, 3, 1}};
  expect_proven_for_all_plans({matrix_description(prime(7), seven), prime(7), seven}, "over GF(7)");
  const Rows large{{1, 2, 3, 256, 0}, {5, 10, 16, 9, 1}};
  Draft draft{matrix_description(prime(257), large), prime(257), large};
  state_everything(draft, 1);
  expect_proven(draft, "over GF(257)");
}

TEST(Codes, TernaryGolay) {
  Draft draft{matrix_description(prime(3), ternary_golay()), prime(3), ternary_golay()};
  const EnumerationDraft enumeration = enumerate(draft.field, draft.generator, 3);
  const Weights known{{0, 1}, {5, 132}, {6, 132}, {8, 330}, {9, 110}, {11, 24}};
  EXPECT_EQ(all_weights(draft.field, enumeration), known);
  state_everything(draft, 3);
  expect_proven(draft, "ternary Golay");
}

TEST(Codes, DependentRowsCountOnce) {
  Rows rows = hexacode();
  rows.push_back(rows[0]);
  rows.push_back(Vector(6, 0));
  Draft draft{matrix_description(gf4, rows), gf4, rows};
  EXPECT_EQ(draft.dimension, 3U);
  state_everything(draft, 1);
  expect_proven(draft, "dependent rows");
}

TEST(Codes, ReedSolomonByPointsIsMaximumDistanceSeparable) {
  const Vector points{0, 1, 2, 3, 4, 5, 6, 7};
  const Vector multipliers{1, 2, 3, 4, 5, 6, 7, 1};
  Draft draft{reed_solomon_description(gf8, points, multipliers, 3), gf8, evaluation_rows(gf8, points, multipliers, 3)};
  state_everything(draft, 2);
  expect_proven(draft, "Reed-Solomon, enumerated");
  draft.evidence = {mds_fact(6)};
  draft.statements = {distance("at-least", 6, {0})};
  expect_proven(draft, "Reed-Solomon, theorem");
  draft.evidence.push_back(witness(gf8, 7, evaluation_rows(gf8, points, multipliers, 2)[1]));
  draft.statements = {distance("at-most", 7, {1})};
  expect_proven(draft, "Reed-Solomon, witness");
}

TEST(Codes, ReedSolomonByRoots) {
  const unsigned a = 3;
  const unsigned step_size = 2;
  Vector generator{1};
  for (unsigned j = 5; j < 5 + 3; ++j) {  // n = 6, k = 3, first root 5
    const unsigned root = gf8.power(gf8.power(a, step_size), j);
    Vector next(generator.size() + 1, 0);
    for (std::size_t i = 0; i < generator.size(); ++i) {
      next[i + 1] = gf8.add(next[i + 1], generator[i]);
      next[i] = gf8.add(next[i], gf8.mul(gf8.negative(root), generator[i]));
    }
    generator = next;
  }
  Draft draft{description_value(gf8, {{"family", text("reed-solomon")},
                                      {"codeword_length", number(6)},
                                      {"dimension", number(3)},
                                      {"first_root", number(5)},
                                      {"root_step", number(step_size)},
                                      {"primitive_element", text("3")}}),
              gf8, multiples(generator, 6)};
  state_everything(draft, 2);
  draft.evidence.push_back(mds_fact(4));
  draft.statements[0] = distance("exactly", 4, {0, 1});
  expect_proven(draft, "Reed-Solomon by roots");
}

TEST(Codes, ShortenedCyclicAndSteps) {
  const Vector crc{1, 1, 0, 0, 1};  // x^4 + x + 1
  Draft plain{cyclic_description(prime(2), crc, 11, {}, "shortened-cyclic"), prime(2), multiples(crc, 11)};
  state_everything(plain, 4);
  expect_proven(plain, "shortened cyclic");

  Rows extended = multiples(crc, 11);
  for (Vector& row : extended) row.push_back(weight(row) % 2);
  Draft parity{cyclic_description(prime(2), crc, 11, {step("extend")}, "shortened-cyclic"), prime(2), extended};
  state_everything(parity, 3);
  expect_proven(parity, "extend");
}

/// All words orthogonal to the rows, found by trying every vector.
Rows orthogonal(const PlainField& f, const Rows& rows) {
  Rows found;
  Vector v(rows[0].size(), 0);
  while (true) {
    std::size_t i = 0;
    while (i < v.size() && v[i] == f.order() - 1) v[i++] = 0;
    if (i == v.size()) return found;
    ++v[i];
    if (std::all_of(rows.begin(), rows.end(), [&](const Vector& row) {
          unsigned sum = 0;
          for (std::size_t c = 0; c < v.size(); ++c) sum = f.add(sum, f.mul(row[c], v[c]));
          return sum == 0;
        }))
      found.push_back(v);
  }
}

TEST(Codes, DualAndParityChecks) {
  const Rows rows{{1, 2, 0, 1, 1}, {0, 1, 1, 2, 0}};
  const Rows dual = orthogonal(prime(3), rows);
  Draft draft{matrix_description(prime(3), rows, {step("dual")}), prime(3), dual};
  EXPECT_EQ(draft.dimension, 3U);
  state_everything(draft, 1);
  expect_proven(draft, "dual");
  Draft checks{description_value(prime(3), {{"family", text("parity-check-matrix")},
                                            {"rows", texts({word(prime(3), rows[0]), word(prime(3), rows[1])})}}),
               prime(3), dual};
  state_everything(checks, 2);
  expect_proven(checks, "parity checks");
  Draft twice{matrix_description(prime(3), rows, {step("dual"), step("dual")}), prime(3), rows};
  state_everything(twice, 2);
  expect_proven(twice, "dual of the dual");
}

TEST(Codes, ReedMuller) {
  Rows rows;  // degree <= 1 in 4 bits: the constant and the bits of the position
  rows.emplace_back(16, 1);
  for (unsigned bit = 0; bit < 4; ++bit) {
    Vector row;
    for (unsigned i = 0; i < 16; ++i) row.push_back(i >> bit & 1);
    rows.push_back(row);
  }
  Draft draft{
      description_value(prime(2), {{"family", text("reed-muller")}, {"order", number(1)}, {"variables", number(4)}}),
      prime(2), rows};
  state_everything(draft, 2);
  expect_proven(draft, "Reed-Muller");
  EXPECT_EQ(draft.statements[0].text, distance("exactly", 8, {0}).text);
}

TEST(Codes, BinaryImage) {
  const Vector basis{3, 5, 2};
  Rows rows;
  const Rows outer{{1, 0, 3, 7}, {0, 1, 6, 2}};
  for (const Vector& row : outer)
    for (const unsigned scalar : {1U, 2U, 4U}) {
      Vector image;
      for (const unsigned symbol : row) {
        const unsigned element = gf8.mul(scalar, symbol);
        for (unsigned set = 0; set < 8; ++set) {
          unsigned sum = 0;
          for (unsigned t = 0; t < 3; ++t)
            if ((set >> t & 1) != 0) sum ^= basis[t];
          if (sum == element)
            for (unsigned t = 0; t < 3; ++t) image.push_back(set >> t & 1);
        }
      }
      rows.push_back(image);
    }
  Draft draft{
      matrix_description(gf8, outer, {object({{"step", text("binary-image")}, {"basis", text(word(gf8, basis))}})}),
      prime(2), rows};
  EXPECT_EQ(draft.dimension, 6U);
  state_everything(draft, 2);
  expect_proven(draft, "binary image");
}

TEST(Codes, JustesenDistancesComputedIndependently) {
  const std::map<unsigned, unsigned> known{{2, 12}, {4, 13}, {6, 12}, {3, 13}, {7, 12}, {5, 11}};
  for (const auto& [g, d] : known) {
    Draft draft = justesen(g, "bits");
    state_everything(draft, 4);
    EXPECT_EQ(draft.statements[0].text, distance("exactly", d, {0}).text) << g;
    std::vector<std::uint64_t> inner = justesen_inner(g);
    std::vector<std::uint64_t> ascending = inner;
    std::sort(ascending.begin(), ascending.end());
    std::uint64_t bound = 0;
    for (std::size_t i = 0; i < 5; ++i) bound += ascending[i];
    draft.evidence.push_back(concatenation_fact(5, "maximum-distance-separable", inner, bound));
    expect_proven(draft, "Justesen");
    draft.evidence = {concatenation_fact(5, "enumeration", inner, bound)};
    draft.statements = {distance("at-least", bound, {0})};
    expect_proven(draft, "Justesen by theorem");
  }
  Draft symbols = justesen(2, "symbols");
  state_everything(symbols, 2);
  symbols.evidence.push_back(concatenation_fact(5, "maximum-distance-separable", std::vector<std::uint64_t>(7, 2), 10));
  expect_proven(symbols, "Justesen with symbols");
}

/// Outer code over GF(8) as given, every symbol replaced by its digits times the rows of a binary inner matrix.
Draft concatenated(const Value& outer_description, const Rows& outer, const Rows& inner) {
  Rows rows;
  for (const Vector& row : outer)
    for (unsigned t = 0; t < 3; ++t) {
      Vector image;
      for (const unsigned symbol : row)
        for (const unsigned bit : combine(prime(2), inner, bits_of(gf8.mul(1U << t, symbol), 3))) image.push_back(bit);
      rows.push_back(image);
    }
  return {description_value(prime(2), {{"family", text("concatenated")},
                                       {"outer", outer_description},
                                       {"inner", matrix_description(prime(2), inner)}}),
          prime(2), rows};
}

TEST(Codes, ConcatenatedOverAPrimeField) {
  const Rows inner{{0, 1, 0, 1}, {1, 0, 0, 1}, {1, 1, 1, 1}};  // as written, not reduced
  const Vector points{0, 1, 2, 3, 4};
  Draft draft = concatenated(reed_solomon_description(gf8, points, Vector(5, 1), 2),
                             evaluation_rows(gf8, points, Vector(5, 1), 2), inner);
  state_everything(draft, 3);
  const std::vector<std::uint64_t> twos(5, 2);
  draft.evidence.push_back(concatenation_fact(4, "maximum-distance-separable", twos, 8));
  draft.evidence.push_back(concatenation_fact(4, "enumeration", twos, 8));
  expect_proven(draft, "concatenated");
}

TEST(Codes, ConcatenatedOverAnExtensionField) {
  const PlainField gf16{2, {1, 1, 0, 0, 1}};
  const unsigned embedding = 6;  // x^2 + x, a root of x^2 + x + 1
  ASSERT_EQ(gf16.add(gf16.add(gf16.mul(embedding, embedding), embedding), 1), 0U);
  const Vector basis{2, 9};
  const Rows inner{{1, 0, 1}, {0, 1, 2}};
  const Rows outer{{1, 5, 7}};
  Rows rows;
  for (const unsigned scalar : {1U, 2U, 4U, 8U}) {
    Vector image;
    for (const unsigned symbol : outer[0])
      for (unsigned pair = 0; pair < 16; ++pair) {
        const Vector digits{pair % 4, pair / 4};
        unsigned sum = 0;
        for (unsigned j = 0; j < 2; ++j)
          sum = gf16.add(sum, gf16.mul(gf16.add(digits[j] & 1, gf16.mul(digits[j] >> 1, embedding)), basis[j]));
        if (sum == gf16.mul(scalar, symbol))
          for (const unsigned s : combine(gf4, inner, digits)) image.push_back(s);
      }
    rows.push_back(image);
  }
  Draft draft{description_value(gf4, {{"family", text("concatenated")},
                                      {"outer", matrix_description(gf16, outer)},
                                      {"inner", matrix_description(gf4, inner)},
                                      {"embedding", text("6")},
                                      {"symbol_basis", text("2 9")}}),
              gf4, rows};
  EXPECT_EQ(draft.dimension, 2U);
  state_everything(draft, 1);
  draft.evidence.push_back(concatenation_fact(3, "enumeration", {2, 2, 2}, 6));
  draft.statements[0] = distance("exactly", 6, {0, 1});
  expect_proven(draft, "concatenated over GF(4)");
}

TEST(Codes, RandomLinearFollowsTheStream) {
  // Two blocks written out here, by the text of the format.
  for (const unsigned q : {2U, 3U, 5U}) {
    const unsigned length = 8;
    std::string stream;
    for (unsigned block = 0; block < 2; ++block) {
      std::string input = "assize random-linear";
      input += std::string("\x39\x05\0\0\0\0\0\0", 8);  // 1337
      input += static_cast<char>(block);
      input += std::string(7, '\0');
      stream += Digest{}.absorb(input).raw();
    }
    Rows rows;
    std::size_t at = 0;
    for (unsigned r = 0; r < 3; ++r) {
      Vector row;
      while (row.size() < length) {
        const unsigned number =
            static_cast<unsigned char>(stream[at]) + 256U * static_cast<unsigned char>(stream[at + 1]);
        at += 2;
        if (number < 65536 / q * q) row.push_back(number % q);
      }
      rows.push_back(row);
    }
    Draft draft{description_value(prime(q), {{"family", text("random-linear")},
                                             {"codeword_length", number(length)},
                                             {"dimension", number(3)},
                                             {"seed", number(1337)}}),
                prime(q), rows};
    state_everything(draft, 1);
    expect_proven(draft, "random linear");
  }
}

TEST(Codes, RepetitionAndWholeSpace) {
  Draft repetition{matrix_description(prime(2), {Vector(9, 1)}), prime(2), {Vector(9, 1)}};
  state_everything(repetition, 1);
  expect_proven(repetition, "repetition");
  const Rows all{{1, 0}, {0, 1}};
  Draft space{matrix_description(gf4, all), gf4, all};
  state_everything(space, 1);
  expect_proven(space, "whole space");
}

}  // namespace
}  // namespace assize::recheck::test
