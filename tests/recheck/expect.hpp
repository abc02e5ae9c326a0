// What the tests of families and steps expect of a description: everything about it proven, or refused at its place.
#pragma once
#include <gtest/gtest.h>

#include "builder.hpp"
#include "recheck/recheck.hpp"

namespace assize::recheck::test {

/// States everything by brute force; the checker must agree with all of it.
inline void expect_code(Draft draft, std::uint64_t dimension, std::uint64_t least, const std::string& what) {
  EXPECT_EQ(draft.dimension, dimension) << what;
  state_everything(draft, draft.generator.size() / 2);
  EXPECT_EQ(draft.statements[0].text, distance("exactly", least, {0}).text) << what;
  const Report report = recheck(draft.bytes(), {});
  EXPECT_EQ(report.outcome, Outcome::proven) << what << ": " << report.reason;
}

/// The code has this dimension and this reduced generator; nothing of interest is said about its distance.
inline void expect_replayed(Draft draft, std::uint64_t dimension, const std::string& what) {
  EXPECT_EQ(draft.dimension, dimension) << what;
  const Vector& row = draft.generator.back();
  draft.evidence = {witness(draft.field, weight(row), row)};
  draft.statements = {distance("at-most", weight(row), {0})};
  const Report report = recheck(draft.bytes(), {});
  EXPECT_EQ(report.outcome, Outcome::proven) << what << ": " << report.reason;
}

/// The description is refused at this place (a JSON path below the description) for this reason.
inline void expect_refused(const Value& description, const std::string& place, const std::string& why) {
  Draft draft = small_hamming();
  state_everything(draft, 2);
  draft.description = description;
  const Report report = recheck(draft.bytes(), {});
  EXPECT_EQ(report.outcome, Outcome::rejected) << place << ", " << why;
  EXPECT_NE(report.reason.find("description" + place + ":"), std::string::npos) << report.reason;
  EXPECT_NE(report.reason.find(why), std::string::npos) << report.reason;
}

/// The code is another one than the description says, of the same shape: the reduced generator gives it away.
inline void expect_other_code(Draft draft) {
  const Vector& row = draft.generator.back();
  draft.evidence = {witness(draft.field, weight(row), row)};
  draft.statements = {distance("at-most", weight(row), {0})};
  const Report report = recheck(draft.bytes(), {});
  EXPECT_EQ(report.outcome, Outcome::rejected);
  EXPECT_NE(report.reason.find("reduced_generator_digest"), std::string::npos) << report.reason;
}

/// The product of (x - beta^i) over the zeros, in the root field, taken back to GF(q) by the images of its elements.
inline Vector polynomial_of_zeros(const PlainField& roots, unsigned beta, const std::vector<unsigned>& zeros,
                                  const std::vector<unsigned>& images) {
  Vector product{1};
  for (const unsigned zero : zeros) {
    const unsigned minus = roots.negative(roots.power(beta, zero));
    Vector next(product.size() + 1, 0);
    for (std::size_t i = 0; i < product.size(); ++i) {
      next[i + 1] = roots.add(next[i + 1], product[i]);
      next[i] = roots.add(next[i], roots.mul(minus, product[i]));
    }
    product = next;
  }
  for (unsigned& c : product) {
    const auto found = std::find(images.begin(), images.end(), c);
    EXPECT_NE(found, images.end()) << "a coefficient outside GF(q)";
    c = static_cast<unsigned>(found - images.begin());
  }
  return product;
}

/// The images of the elements of GF(q): its x goes to the first power of X that is a root of its modulus.
inline std::vector<unsigned> images_of(const PlainField& f, const PlainField& roots) {
  const unsigned x = roots.degree() == 1 ? roots.negative(roots.modulus[0]) : roots.p;
  unsigned image = 1;
  const auto value = [&](const Vector& digits) {
    unsigned sum = 0;
    for (unsigned i = 0; i < digits.size(); ++i) sum = roots.add(sum, roots.mul(digits[i], roots.power(image, i)));
    return sum;
  };
  if (f.degree() > 1)
    while (value(f.modulus) != 0) image = roots.mul(image, x);
  std::vector<unsigned> images;
  for (unsigned a = 0; a < f.order(); ++a) {
    Vector digits;
    for (unsigned i = 0, rest = a; i < f.degree(); ++i, rest /= f.p) digits.push_back(rest % f.p);
    images.push_back(value(digits));
  }
  return images;
}

}  // namespace assize::recheck::test
