// Every step that changes words or positions, against its definition applied to all words; and steps that cannot be.
#include <functional>

#include "expect.hpp"

namespace assize::recheck::test {
namespace {

using Members = std::vector<std::pair<std::string, Value>>;

Value step_with(const std::string& name, Members rest) {
  rest.insert(rest.begin(), {"step", text(name)});
  return object(rest);
}

Value positions(const std::string& name, const std::vector<std::uint64_t>& list) {
  return step_with(name, {{"positions", numbers(list)}});
}

Rows all_words(const PlainField& f, const Rows& rows) {
  Rows words;
  std::uint64_t total = 1;
  for (std::size_t i = 0; i < rows.size(); ++i) total *= f.order();
  for (std::uint64_t value = 0; value < total; ++value) {
    Vector message;
    for (std::uint64_t rest = value; message.size() < rows.size(); rest /= f.order())
      message.push_back(static_cast<unsigned>(rest % f.order()));
    words.push_back(combine(f, rows, message));
  }
  return words;
}

unsigned sum_of(const PlainField& f, const Vector& v) {
  unsigned sum = 0;
  for (const unsigned s : v) sum = f.add(sum, s);
  return sum;
}

/// What the step makes of one word; an empty result means that the word is not taken.
using Effect = std::function<Vector(const Vector&)>;

void expect_step(const PlainField& f, const Rows& rows, const Value& one_step, std::uint64_t k, std::uint64_t d,
                 const Effect& effect, const PlainField* result = nullptr) {
  Rows words;
  for (const Vector& v : all_words(f, rows)) {
    const Vector after = effect(v);
    if (!after.empty()) words.push_back(after);
  }
  const PlainField& over = result != nullptr ? *result : f;
  expect_code({matrix_description(f, rows, {one_step}), over, words}, k, d, one_step.text);
}

const Rows seventh = multiples({1, 1, 0, 1}, 7);
const Rows ternary{{1, 0, 0, 2, 1, 1}, {0, 1, 0, 1, 2, 1}, {0, 0, 1, 1, 1, 2}};

Vector without(const Vector& v, const std::vector<std::size_t>& out) {
  Vector rest;
  for (std::size_t i = 0; i < v.size(); ++i)
    if (std::find(out.begin(), out.end(), i) == out.end()) rest.push_back(v[i]);
  return rest;
}

TEST(Steps, Puncture) {
  expect_step(prime(2), seventh, positions("puncture", {2}), 4, 2, [](const Vector& v) { return without(v, {2}); });
  expect_step(prime(2), seventh, positions("puncture", {0, 1, 6}), 4, 1, [](const Vector& v) {
    return without(v, {0, 1, 6});
  });
  // The dimension falls where a whole word is left out.
  expect_step(prime(2), {{1, 1, 0, 0, 0}, {0, 0, 1, 1, 1}}, positions("puncture", {0, 1}), 1, 3, [](const Vector& v) {
    return without(v, {0, 1});
  });
  expect_step(gf4, hexacode(), positions("puncture", {5}), 3, 3, [](const Vector& v) { return without(v, {5}); });
  expect_step(gf4, hexacode(), positions("puncture", {}), 3, 4, [](const Vector& v) { return v; });
}

TEST(Steps, Shorten) {
  const auto shortened = [](const std::vector<std::size_t>& at) {
    return [at](const Vector& v) {
      return std::all_of(at.begin(), at.end(), [&](std::size_t i) { return v[i] == 0; }) ? without(v, at) : Vector{};
    };
  };
  expect_step(prime(2), seventh, positions("shorten", {0}), 3, 3, shortened({0}));
  expect_step(prime(2), seventh, positions("shorten", {4, 6}), 2, 3, shortened({4, 6}));
  expect_step(prime(2), seventh, positions("shorten", {}), 4, 3, shortened({}));
  expect_step(prime(3), ternary, positions("shorten", {1, 5}), 1, 3, shortened({1, 5}));
  expect_step(gf4, hexacode(), positions("shorten", {3}), 2, 4, shortened({3}));
  // A position that is always zero costs no dimension.
  expect_step(prime(2), {{1, 0, 1, 1}, {0, 0, 1, 0}}, positions("shorten", {1}), 2, 1, shortened({1}));
}

TEST(Steps, Expurgate) {
  const auto sum_zero = [](const PlainField& f) {
    return [f](const Vector& v) { return sum_of(f, v) == 0 ? v : Vector{}; };
  };
  expect_step(prime(2), seventh, step("expurgate"), 3, 4, sum_zero(prime(2)));
  expect_step(prime(3), ternary, step("expurgate"), 2, 4, sum_zero(prime(3)));
  expect_step(prime(3), {{1, 2, 0}, {0, 1, 2}}, step("expurgate"), 2, 2, sum_zero(prime(3)));
  const Rows quaternary{{1, 0, 2, 3, 3}, {0, 1, 1, 0, 2}, {0, 0, 1, 1, 3}};
  expect_step(gf4, quaternary, step("expurgate"), 2, 3, sum_zero(gf4));
  expect_step(gf9, {{1, 3, 5}, {0, 2, 8}}, step("expurgate"), 1, 2, sum_zero(gf9));
}

TEST(Steps, Augment) {
  Rows simplex{{1, 0, 1, 0, 1, 0, 1}, {0, 1, 1, 0, 0, 1, 1}, {0, 0, 0, 1, 1, 1, 1}};
  Rows more = simplex;
  more.emplace_back(7, 1);
  expect_code({matrix_description(prime(2), simplex, {step("augment")}), prime(2), more}, 4, 3, "simplex");
  expect_code({matrix_description(prime(2), seventh, {step("augment")}), prime(2), seventh}, 4, 3, "already there");
  expect_code({matrix_description(prime(3), ternary, {step("augment")}), prime(3), ternary}, 3, 3, "already there");
  const Rows two{{1, 0, 0, 2, 1, 1}, {0, 1, 0, 1, 2, 1}};
  Rows third = two;
  third.emplace_back(6, 1);
  expect_code({matrix_description(prime(3), two, {step("augment")}), prime(3), third}, 3, 3, "ternary");
  expect_code({matrix_description(gf4, {{2, 2, 2}}, {step("augment")}), gf4, {{1, 1, 1}}}, 1, 3, "a multiple");
  // The whole space has no dual but the zero word; the all-one word makes a code of it again.
  expect_code({matrix_description(prime(3), {{1, 0}, {0, 1}}, {step("dual"), step("augment")}), prime(3), {{1, 1}}}, 1,
              2, "zero code");
}

TEST(Steps, PermuteAndRepeat) {
  const std::vector<std::uint64_t> order{3, 0, 6, 5, 1, 2, 4};
  expect_step(prime(2), seventh, step_with("permute", {{"order", numbers(order)}}), 4, 3, [&](const Vector& v) {
    Vector moved;
    for (const std::uint64_t old : order) moved.push_back(v[old]);
    return moved;
  });
  for (const std::uint64_t times : {1U, 3U})
    expect_step(prime(3), ternary, step_with("repeat", {{"times", number(times)}}), 3, 3 * times, [&](const Vector& v) {
      Vector out;
      for (std::uint64_t i = 0; i < times; ++i) out.insert(out.end(), v.begin(), v.end());
      return out;
    });
}

TEST(Steps, PermutedTheOtherWayRound) {
  const std::vector<std::uint64_t> order{1, 2, 3, 0};
  const Rows rows{{1, 1, 0, 0}, {0, 0, 0, 1}};
  Draft wrong{matrix_description(prime(2), rows, {step_with("permute", {{"order", numbers(order)}})}),
              prime(2),
              {{0, 1, 1, 0}, {1, 0, 0, 0}}};  // old position i to new position order[i]
  expect_other_code(wrong);
}

Value subfield(const PlainField& small) { return step_with("subfield-subcode", {{"field", field_value(small)}}); }

/// The images in the large field of the elements of the small one; the x of that goes to the least root.
Vector images_by_least_root(const PlainField& small, const PlainField& large) {
  unsigned root = 0;
  const auto value = [&](const Vector& digits) {
    unsigned sum = 0;
    for (unsigned i = 0; i < digits.size(); ++i) sum = large.add(sum, large.mul(digits[i], large.power(root, i)));
    return sum;
  };
  while (small.degree() > 1 && value(small.modulus) != 0) ++root;
  Vector images;
  for (unsigned a = 0; a < small.order(); ++a) {
    Vector digits;
    for (unsigned i = 0, rest = a; i < small.degree(); ++i, rest /= small.p) digits.push_back(rest % small.p);
    images.push_back(value(digits));
  }
  return images;
}

void expect_subcode(const PlainField& large, const PlainField& small, const Rows& rows, std::uint64_t k,
                    std::uint64_t d) {
  const Vector images = images_by_least_root(small, large);
  expect_step(
      large, rows, subfield(small), k, d,
      [&](const Vector& v) {
        Vector out;
        for (const unsigned s : v) {
          const auto found = std::find(images.begin(), images.end(), s);
          if (found == images.end()) return Vector{};
          out.push_back(static_cast<unsigned>(found - images.begin()));
        }
        return out;
      },
      &small);
}

TEST(Steps, SubfieldSubcodes) {
  const PlainField gf16{2, {1, 1, 0, 0, 1}};
  Vector points;
  for (unsigned i = 0; i < 7; ++i) points.push_back(gf8.power(2, i));
  expect_subcode(gf8, prime(2), evaluation_rows(gf8, points, Vector(7, 1), 5), 4, 3);  // a Hamming code
  expect_subcode(gf8, prime(2), evaluation_rows(gf8, points, Vector(7, 1), 3), 1, 7);
  const Rows over16 = evaluation_rows(gf16, {1, 2, 4, 8, 3, 6, 12, 11}, {1, 1, 1, 1, 1, 1, 1, 1}, 4);
  expect_subcode(gf16, gf4, over16, 1, 8);
  expect_subcode(gf16, gf4, {{1, 6, 0, 7, 2}, {0, 1, 1, 6, 4}, {0, 0, 0, 1, 7}}, 2, 2);
  expect_subcode(gf16, prime(2), {{1, 0, 1, 1, 6}, {0, 1, 1, 0, 7}, {0, 0, 0, 0, 1}}, 3, 1);
  expect_subcode(gf9, prime(3), {{1, 0, 3, 1}, {0, 1, 6, 2}, {0, 0, 1, 1}}, 2, 2);
}

TEST(Steps, SubfieldThatIsTheWholeField) {
  const Rows rows{{1, 0, 3, 7, 4}, {0, 1, 6, 2, 5}};
  expect_subcode(gf8, gf8, rows, 2, 4);
  expect_subcode(gf8, {2, {1, 0, 1, 1}}, rows, 2, 4);                       // another modulus: the least root decides
  expect_subcode(gf9, {3, {1, 0, 1}}, {{1, 0, 3, 7}, {0, 1, 6, 2}}, 2, 3);  // its x is not primitive
}

TEST(Steps, SubfieldsThatAreNone) {
  const auto refused = [](const PlainField& f, const Value& field_object, const std::string& place,
                          const std::string& why) {
    expect_refused(matrix_description(f, {{1, 1}}, {step_with("subfield-subcode", {{"field", field_object}})}),
                   ".then[0].field" + place, why);
  };
  refused(gf8, field_value(gf4), "", "not a power");
  refused(gf4, field_value(gf8), "", "not a power");
  refused(gf4, field_value(prime(3)), "", "not a power");
  refused(gf4, object({{"order", number(6)}}), "", "power of a prime");
  refused(gf4, object({{"order", number(1)}}), ".order", "from 2");
  refused(gf4, object({{"order", number(4)}}), "", "monic of degree 2");
  refused(gf4, object({{"order", number(4)}, {"modulus", text("101")}}), "", "reducible");
  refused(gf4, object({{"order", number(2)}, {"root", number(1)}}), ".root", "unknown");
  // No word but zero.
  expect_refused(matrix_description(gf4, {{1, 2}}, {subfield(prime(2))}), "", "dimension 0");
}

TEST(Steps, SeveralAfterOneAnother) {
  // [7,4,3]: extended, shortened at the new position, its sum made zero (already so), all-one added, doubled.
  Rows even;
  for (const Vector& v : all_words(prime(2), seventh))
    if (weight(v) % 2 == 0) even.push_back(v);
  even.push_back(Vector(7, 1));
  for (Vector& v : even) v.insert(v.end(), v.begin(), v.end());
  expect_code({matrix_description(prime(2), seventh,
                                  {step("extend"), positions("shorten", {7}), step("expurgate"), step("augment"),
                                   step_with("repeat", {{"times", number(2)}})}),
               prime(2), even},
              4, 6, "five steps");
}

TEST(Steps, PositionsThatAreNone) {
  for (const char* name : {"puncture", "shorten"}) {
    const auto refused = [&](const Value& one_step, const std::string& place, const std::string& why) {
      expect_refused(matrix_description(prime(2), seventh, {step("dual"), one_step}), ".then[1]" + place, why);
    };
    refused(positions(name, {7}), ".positions[0]", "below 7");
    refused(positions(name, {0, (std::uint64_t{1} << 53) - 1}), ".positions[1]", "below 7");
    refused(positions(name, {3, 3}), ".positions[1]", "twice");
    refused(positions(name, {1, 4, 2}), ".positions[2]", "not ascending");
    refused(positions(name, {0, 1, 2, 3, 4, 5, 6}), ".positions", "not all positions");
    refused(step_with(name, {{"positions", texts({"1"})}}), ".positions[0]", "a position");
    refused(step_with(name, {{"positions", number(1)}}), ".positions", "an array");
    refused(step_with(name, {}), ".positions", "missing");
    refused(step_with(name, {{"positions", numbers({1})}, {"times", number(1)}}), ".times", "unknown");
  }
  // Every word with zeros there is zero.
  expect_refused(matrix_description(prime(2), {{1, 1, 1}}, {positions("shorten", {1})}), "", "dimension 0");
  expect_refused(matrix_description(prime(2), {{1, 0, 0}}, {positions("puncture", {0})}), "", "dimension 0");
  expect_refused(matrix_description(prime(2), {{1, 0, 0}}, {step("expurgate")}), "", "dimension 0");
}

TEST(Steps, OrdersAndTimesThatAreNone) {
  const auto refused = [](const Value& one_step, const std::string& place, const std::string& why) {
    expect_refused(matrix_description(prime(2), {{1, 0, 1}, {0, 1, 1}}, {one_step}), ".then[0]" + place, why);
  };
  const auto permuted = [](const std::vector<std::uint64_t>& order) {
    return step_with("permute", {{"order", numbers(order)}});
  };
  refused(permuted({0, 1}), ".order", "every position");
  refused(permuted({}), ".order", "every position");
  refused(permuted({0, 1, 1}), ".order[2]", "twice");
  refused(permuted({0, 1, 3}), ".order[2]", "below 3");
  refused(permuted({2, 1, 0, 0}), ".order[3]", "twice");
  const auto repeated = [](std::uint64_t times) { return step_with("repeat", {{"times", number(times)}}); };
  refused(repeated(0), ".times", "from 1 to 1048576");
  refused(repeated((std::uint64_t{1} << 53) - 1), ".times", "from 1 to 1048576");
  refused(repeated(1U << 20), "", "2^20");
  refused(step_with("expurgate", {{"positions", numbers({0})}}), ".positions", "unknown");
  refused(step_with("augment", {{"word", text("111")}}), ".word", "unknown");
  refused(step("lengthen"), ".step", "unknown");
}

TEST(Steps, TooLarge) {
  const Value again = description_value(prime(2),
                                        {{"family", text("random-linear")},
                                         {"codeword_length", number(1 << 10)},
                                         {"dimension", number(512)},
                                         {"seed", number(1)}},
                                        {step_with("repeat", {{"times", number(1 << 9)}})});
  expect_refused(again, ".then[0]", "2^27");
}

}  // namespace
}  // namespace assize::recheck::test
