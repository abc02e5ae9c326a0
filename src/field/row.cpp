// One loop for each kind of addition, chosen outside the loop.
//
// Over GF(2), and wherever the factor is 1 in characteristic 2, elements are added four at a time in a 64-bit word.
#include "field/row.hpp"

#include <algorithm>
#include <cstring>

namespace assize::field {

namespace {

void exclusive_or(std::span<Element> target, std::span<const Element> source) noexcept {
  constexpr std::size_t step = sizeof(std::uint64_t) / sizeof(Element);
  std::size_t i = 0;
  for (; i + step <= target.size(); i += step) {
    std::uint64_t a = 0;
    std::uint64_t b = 0;
    std::memcpy(&a, target.data() + i, sizeof a);
    std::memcpy(&b, source.data() + i, sizeof b);
    a ^= b;
    std::memcpy(target.data() + i, &a, sizeof a);
  }
  for (; i < target.size(); ++i) target[i] ^= source[i];
}

}  // namespace

void add_multiple(const Field& field, std::span<Element> target, Element factor, std::span<const Element> source) {
  contract(target.size() == source.size(), "rows that are added have equal lengths");
  if (factor == 0) return;
  if (field.characteristic() == 2 && factor == 1) return exclusive_or(target, source);
  const Multiplier times_factor = field.multiplier(factor);
  if (field.characteristic() == 2) {
    for (std::size_t i = 0; i < target.size(); ++i) target[i] ^= times_factor(source[i]);
  } else if (field.degree() == 1) {
    const std::uint32_t p = field.order();
    for (std::size_t i = 0; i < target.size(); ++i) {
      const std::uint32_t sum = std::uint32_t{target[i]} + times_factor(source[i]);
      target[i] = static_cast<Element>(sum < p ? sum : sum - p);
    }
  } else {
    for (std::size_t i = 0; i < target.size(); ++i) target[i] = field.add(target[i], times_factor(source[i]));
  }
}

void scale(const Field& field, std::span<Element> target, Element factor) {
  if (factor == 1) return;
  if (factor == 0) return std::fill(target.begin(), target.end(), Element{0});
  const Multiplier times_factor = field.multiplier(factor);
  for (Element& element : target) element = times_factor(element);
}

}  // namespace assize::field
