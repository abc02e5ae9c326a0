// The reduced generator and everything that is read off it.
#include "code/linear_code.hpp"

#include <algorithm>

#include "base/digest.hpp"
#include "base/word.hpp"

namespace assize::code {

using field::Element;
using field::Matrix;

namespace {

std::vector<std::uint32_t> positions_outside(std::uint32_t length, const std::vector<std::uint32_t>& pivots) {
  std::vector<std::uint32_t> others;
  others.reserve(length - pivots.size());
  auto next = pivots.begin();
  for (std::uint32_t position = 0; position < length; ++position) {
    if (next != pivots.end() && *next == position)
      ++next;
    else
      others.push_back(position);
  }
  return others;
}

}  // namespace

ReducedGenerator reduce(const field::Field& field, Matrix generator) {
  ReducedGenerator reduced;
  reduced.length = static_cast<std::uint32_t>(generator.columns());
  for (const std::size_t pivot : field::reduce_rows(field, generator))
    reduced.pivots.push_back(static_cast<std::uint32_t>(pivot));
  reduced.others = positions_outside(reduced.length, reduced.pivots);
  reduced.tail = Matrix(reduced.pivots.size(), reduced.others.size());
  for (std::size_t i = 0; i < reduced.tail.rows(); ++i)
    for (std::size_t j = 0; j < reduced.others.size(); ++j) reduced.tail.at(i, j) = generator.at(i, reduced.others[j]);
  return reduced;
}

std::vector<Element> LinearCode::row(std::uint32_t i) const {
  contract(i < dimension(), "a row of the reduced generator exists");
  std::vector<Element> word(length(), 0);
  word[reduced_.pivots[i]] = 1;
  for (std::size_t j = 0; j < reduced_.others.size(); ++j) word[reduced_.others[j]] = reduced_.tail.at(i, j);
  return word;
}

Matrix LinearCode::generator() const {
  Matrix full(dimension(), length());
  for (std::uint32_t i = 0; i < dimension(); ++i) std::ranges::copy(row(i), full.row(i).begin());
  return full;
}

Matrix LinearCode::parity_check() const {
  Matrix check(redundancy(), length());
  for (std::size_t j = 0; j < reduced_.others.size(); ++j) {
    check.at(j, reduced_.others[j]) = 1;
    for (std::uint32_t i = 0; i < dimension(); ++i)
      check.at(j, reduced_.pivots[i]) = field_.negate(reduced_.tail.at(i, j));
  }
  return check;
}

std::vector<Element> LinearCode::encode(std::span<const Element> message) const {
  contract(message.size() == dimension(), "a message has one symbol for each row");
  std::vector<Element> tail(redundancy(), 0);
  for (std::uint32_t i = 0; i < dimension(); ++i) field::add_multiple(field_, tail, message[i], reduced_.tail.row(i));
  std::vector<Element> word(length(), 0);
  for (std::uint32_t i = 0; i < dimension(); ++i) word[reduced_.pivots[i]] = message[i];
  for (std::size_t j = 0; j < tail.size(); ++j) word[reduced_.others[j]] = tail[j];
  return word;
}

bool LinearCode::contains(std::span<const Element> word) const {
  if (word.size() != length()) return false;
  if (std::ranges::any_of(word, [this](Element symbol) { return !field_.contains(symbol); })) return false;
  std::vector<Element> message(dimension());
  for (std::uint32_t i = 0; i < dimension(); ++i) message[i] = word[reduced_.pivots[i]];
  return std::ranges::equal(encode(message), word);
}

std::string LinearCode::reduced_generator_digest() const {
  Digest digest;
  digest.absorb(std::to_string(order()) + " " + std::to_string(length()) + " " + std::to_string(dimension()) + "\n");
  std::string pivots;
  for (const std::uint32_t pivot : reduced_.pivots) {
    if (!pivots.empty()) pivots += ' ';
    pivots += std::to_string(pivot);
  }
  digest.absorb(pivots + "\n");
  for (std::uint32_t i = 0; i < dimension(); ++i) digest.absorb(spell_word(order(), reduced_.tail.row(i)) + "\n");
  return digest.hex();
}

std::uint32_t weight(std::span<const Element> word) noexcept {
  return static_cast<std::uint32_t>(word.size() - static_cast<std::size_t>(std::ranges::count(word, Element{0})));
}

LinearCode dual(const LinearCode& code) { return {code.field(), reduce(code.field(), code.parity_check())}; }

}  // namespace assize::code
