// Verifying maps, and the maps that a construction suggests.
#include "code/symmetry.hpp"

#include <algorithm>
#include <map>
#include <numeric>

#include "field/root_field.hpp"

namespace assize::code {

using field::Element;
using Permutation = std::vector<std::uint32_t>;

bool is_symmetry(const LinearCode& code, const MonomialMap& map) {
  contract(map.permutation.size() == code.length(), "a map moves every position");
  std::vector<Element> image(code.length());
  for (std::uint32_t i = 0; i < code.dimension(); ++i) {
    const auto row = code.row(i);
    for (std::uint32_t j = 0; j < code.length(); ++j) {
      image[j] = row[map.permutation[j]];
      if (!map.multipliers.empty()) image[j] = code.field().multiply(map.multipliers[j], image[j]);
    }
    if (!code.contains(image)) return false;
  }
  return true;
}

std::uint32_t orbits(std::uint32_t length, const std::vector<MonomialMap>& maps) {
  Permutation parent(length);
  std::iota(parent.begin(), parent.end(), 0U);
  const auto root = [&parent](std::uint32_t position) {
    while (parent[position] != position) position = parent[position] = parent[parent[position]];
    return position;
  };
  for (const MonomialMap& map : maps)
    for (std::uint32_t i = 0; i < length; ++i) parent[root(i)] = root(map.permutation[i]);
  std::uint32_t count = 0;
  for (std::uint32_t i = 0; i < length; ++i) count += parent[i] == i ? 1U : 0U;
  return count;
}

namespace {

/// Larger codes are not searched for symmetries: verifying one takes k^2 (n - k) operations.
constexpr std::uint64_t most_operations = 1ULL << 26;

/// The construction of a code whose steps are none, or one "extend": what is known of its positions.
struct Base {
  std::uint32_t length = 0;  ///< before the extension
  bool extended = false;
};

std::optional<Base> base_of(const sheet::Description& description, const LinearCode& code) {
  const std::size_t steps = description.steps.size();
  if (steps == 0) return Base{code.length(), false};
  if (steps == 1 && std::holds_alternative<sheet::Extend>(description.steps.front().what))
    return Base{code.length() - 1, true};
  return std::nullopt;
}

/// A map of coefficients, x^j -> x^target(j), as a map of positions; position i carries x^(n-1-i), an extension stays.
template <class Target>
Permutation of_coefficients(const Base& base, Target target) {
  Permutation out(base.length + (base.extended ? 1 : 0));
  std::iota(out.begin(), out.end(), 0U);
  for (std::uint64_t j = 0; j < base.length; ++j)
    out[base.length - 1 - static_cast<std::uint32_t>(target(j))] = base.length - 1 - static_cast<std::uint32_t>(j);
  return out;
}

void cyclic_maps(const Base& base, std::uint32_t q, std::vector<MonomialMap>& maps) {
  const std::uint64_t n = base.length;
  maps.push_back({"cyclic shift", of_coefficients(base, [n](std::uint64_t j) { return (j + 1) % n; }), {}});
  if (std::gcd<std::uint64_t>(n, q) == 1)
    maps.push_back({"multiplier " + std::to_string(q % n),
                    of_coefficients(base, [n, q](std::uint64_t j) { return j * q % n; }),
                    {}});
}

/// a -> a + 1 on the locators beta^j of the coefficients x^j, the extension having the locator 0.
std::optional<MonomialMap> translation(const sheet::Bch& bch, const Base& base, const field::Field& field) {
  if (!base.extended) return std::nullopt;
  const auto prime = field::Field::prime(field.characteristic());
  const field::RootField roots(*prime, bch.root_modulus.value);
  if (roots.order() - 1 != base.length) return std::nullopt;  // not primitive
  std::map<field::Polynomial, std::uint32_t> position{{{}, base.length}};
  field::Polynomial power{1};
  for (std::uint32_t j = 0; j < base.length; ++j, power = roots.multiply(power, roots.class_of_x()))
    position[power] = base.length - 1 - j;
  if (position.size() != base.length + 1U) return std::nullopt;
  Permutation out(base.length + 1);
  for (const auto& [locator, from] : position) out[position.at(field::add(*prime, locator, {1}))] = from;
  return MonomialMap{"translation", std::move(out), {}};
}

/// j -> -1/j on the positions 0 .. p-1 and infinity of an extended quadratic residue code; over GF(3) with the signs of
/// the residues.
std::vector<MonomialMap> inversions(std::uint32_t p, const Base& base, const field::Field& field) {
  std::vector<bool> square(p, false);
  for (std::uint64_t j = 1; j < p; ++j) square[j * j % p] = true;
  const auto position = [p](std::uint64_t j) {
    return j == p ? p : p - 1 - static_cast<std::uint32_t>(j);
  };  // p: infinity
  std::vector<MonomialMap> out;
  const Element minus = field.negate(1);
  // The signs at 0 and infinity depend on how the code was extended; all four are tried, and verified later.
  for (const Element at_zero : {Element{1}, minus})
    for (const Element at_infinity : {Element{1}, minus}) {
      if (minus == 1 && !out.empty()) return out;
      MonomialMap map{"inversion", Permutation(base.length + 1), std::vector<Element>(base.length + 1, 1)};
      for (std::uint64_t j = 0; j <= p; ++j) {
        std::uint64_t image = j == 0 ? p : 0;
        if (j != 0 && j != p) {
          std::uint64_t inverse = 1;
          for (std::uint32_t e = 0; e < p - 2; ++e) inverse = inverse * j % p;
          image = (p - inverse) % p;
        }
        map.permutation[position(image)] = position(j);
        map.multipliers[position(image)] = j == 0 ? at_zero : j == p ? at_infinity : square[j] ? Element{1} : minus;
      }
      if (minus == 1) map.multipliers.clear();
      out.push_back(std::move(map));
    }
  return out;
}

Permutation block_shift(std::uint32_t length, std::uint32_t block, std::uint32_t border) {
  // Every block moves by one place; the border of a bordered code stays.
  Permutation out(length);
  std::iota(out.begin(), out.end(), 0U);
  const std::uint32_t stride = block + border;
  for (std::uint32_t start = border; start + block <= length; start += stride)
    for (std::uint32_t i = 0; i < block; ++i) out[start + (i + 1) % block] = start + i;
  return out;
}

}  // namespace

std::vector<MonomialMap> known_symmetries(const sheet::Description& description, const LinearCode& code) {
  const auto base = base_of(description, code);
  const std::uint64_t k = code.dimension();
  if (!base || k * k > most_operations / (code.redundancy() + 1U)) return {};
  std::vector<MonomialMap> candidates;
  if (const auto* cyclic = std::get_if<sheet::Cyclic>(&description.family); cyclic != nullptr && !cyclic->shortened)
    cyclic_maps(*base, code.order(), candidates);
  if (const auto* bch = std::get_if<sheet::Bch>(&description.family)) {
    cyclic_maps(*base, code.order(), candidates);
    if (auto map = translation(*bch, *base, code.field())) candidates.push_back(*std::move(map));
  }
  if (std::holds_alternative<sheet::ReedSolomonByRoots>(description.family) && base->length == code.order() - 1)
    cyclic_maps(*base, code.order(), candidates);
  if (const auto* residue = std::get_if<sheet::QuadraticResidue>(&description.family)) {
    cyclic_maps(*base, code.order(), candidates);
    if (base->extended)
      for (MonomialMap& map : inversions(static_cast<std::uint32_t>(residue->prime.value), *base, code.field()))
        candidates.push_back(std::move(map));
  }
  if (const auto* blocks = std::get_if<sheet::QuasiCyclic>(&description.family); blocks != nullptr && !base->extended) {
    const bool exponents = blocks->form == sheet::QuasiCyclic::Form::exponents;
    const auto size =
        static_cast<std::uint32_t>(exponents ? blocks->lifting : blocks->first_rows.front().front().size());
    const std::uint32_t border = blocks->form == sheet::QuasiCyclic::Form::bordered ? 1 : 0;
    candidates.push_back(
        {"quasi-cyclic shift by blocks of " + std::to_string(size), block_shift(code.length(), size, border), {}});
  }
  std::vector<MonomialMap> held;
  for (MonomialMap& map : candidates)
    if (is_symmetry(code, map)) held.push_back(std::move(map));
  return held;
}

}  // namespace assize::code
