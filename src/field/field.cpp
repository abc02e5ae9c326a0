// Making a Field: every wrong order or modulus is refused in words, with an example of what would do.
//
// The program never chooses a modulus on its own; an example in a cure is there for the reader to copy or replace.
#include "field/field.hpp"

#include <numeric>
#include <string>

#include "field/number_theory.hpp"
#include "field/polynomial.hpp"

namespace assize::field {

namespace {

constexpr std::uint32_t largest_general_order = 256;

std::string gf(std::uint32_t order) { return "GF(" + std::to_string(order) + ")"; }

/// "GF(8) = GF(2^3)"
std::string gf(const PrimePower& power, std::uint32_t order) {
  return gf(order) + " = GF(" + std::to_string(power.prime) + "^" + std::to_string(power.exponent) + ")";
}

std::string state_irreducible(const Field& ground, std::uint32_t degree) {
  return "state a monic irreducible polynomial of degree " + std::to_string(degree) + " over " + gf(ground.order()) +
         ", for example " + to_algebra(least_irreducible(ground, degree));
}

/// Whether a Field of this order can be made.
bool is_covered(std::uint32_t order) {
  const auto power = as_prime_power(order);
  if (!power || order > largest_order) return false;
  return order <= largest_general_order || power->prime == 2 || power->exponent == 1;
}

std::string use_covered() {
  return "use a prime power up to " + std::to_string(largest_general_order) + ", or a prime or a power of 2 up to " +
         std::to_string(largest_order);
}

/// A refusal of orders that are no prime power, naming the nearest fields there are.
Failure not_a_prime_power(std::uint32_t order) {
  if (order < 2)
    return {"", std::to_string(order) + " is not the order of a field", "give a prime power from 2 up, for example 2"};
  const std::string what = std::to_string(order) + " is not a prime power";
  if (order > largest_order) return {"", what, use_covered()};
  std::uint32_t below = order - 1;
  while (!is_covered(below)) --below;
  std::uint32_t above = order + 1;
  while (!is_covered(above)) ++above;
  return {"", what,
          "give the order of a field; the nearest ones are " + std::to_string(below) + " and " + std::to_string(above)};
}

Failure order_not_covered(const PrimePower& power, std::uint32_t order) {
  const std::string name = power.exponent == 1 ? gf(order) : gf(power, order);
  return {"", name + " is not among the fields that can be worked in", use_covered()};
}

/// Everything a modulus can have wrong, the cheapest question first.
Result<void> check_modulus(const Field& ground, std::uint32_t order, std::uint32_t m,
                           std::span<const Element> modulus) {
  const std::uint32_t p = ground.order();
  const PrimePower power{p, m};
  if (modulus.empty())
    return Failure{"", gf(power, order) + " needs a modulus and none is given", state_irreducible(ground, m)};
  for (const Element coefficient : modulus)
    if (!ground.contains(coefficient))
      return Failure{"",
                     "the modulus has the coefficient " + std::to_string(coefficient) + ", which is not in " + gf(p),
                     "write coefficients from 0 to " + std::to_string(p - 1)};
  Polynomial polynomial(modulus.begin(), modulus.end());
  trim(polynomial);
  const std::string spelled = to_algebra(polynomial);
  const auto actual = degree(polynomial);
  if (!actual) return Failure{"", "the modulus is the zero polynomial", state_irreducible(ground, m)};
  if (*actual != m)
    return Failure{"",
                   "the modulus " + spelled + " has degree " + std::to_string(*actual) + ", but " + gf(power, order) +
                       " needs degree " + std::to_string(m),
                   state_irreducible(ground, m)};
  if (polynomial.size() != modulus.size())
    return Failure{"",
                   "the modulus " + spelled + " is given with " + std::to_string(modulus.size()) +
                       " coefficients, some of them leading zeros",
                   "give exactly " + std::to_string(m + 1) + " coefficients, the leading one being 1"};
  if (polynomial.back() != 1)
    return Failure{"", "the modulus " + spelled + " is not monic",
                   "divide it by its leading coefficient: " + to_algebra(monic(ground, polynomial))};
  if (!is_irreducible(ground, polynomial))
    return Failure{"",
                   "the modulus " + spelled + " is reducible over " + gf(p) + ": it is divisible by " +
                       to_algebra(least_factor(ground, polynomial)),
                   state_irreducible(ground, m)};
  return {};
}

}  // namespace

Result<Field> Field::prime(std::uint32_t p) {
  const auto power = as_prime_power(p);
  if (!power) return not_a_prime_power(p);
  if (power->exponent > 1)
    return Failure{"", std::to_string(p) + " is not prime, but a power of " + std::to_string(power->prime),
                   "give a prime, or the modulus of " + gf(*power, p)};
  if (!is_covered(p)) return order_not_covered(*power, p);
  return from_checked(p, 1, {});
}

Result<Field> Field::create(std::uint32_t order, std::span<const Element> modulus) {
  const auto power = as_prime_power(order);
  if (!power) return not_a_prime_power(order);
  if (!is_covered(order)) return order_not_covered(*power, order);
  if (power->exponent == 1) {
    if (!modulus.empty())
      return Failure{"", gf(order) + " is a prime field and takes no modulus", "leave the modulus out"};
    return from_checked(order, 1, {});
  }
  const Field ground = from_checked(power->prime, 1, {});
  const Result<void> checked = check_modulus(ground, order, power->exponent, modulus);
  if (!checked) return checked.error();
  return from_checked(power->prime, power->exponent, modulus);
}

const Field& Field::binary() {
  static const Field field = from_checked(2, 1, {});
  return field;
}

Element Field::power(Element a, std::uint64_t exponent) const noexcept {
  if (exponent == 0) return 1;
  if (a == 0) return 0;
  const std::uint64_t group_order = order() - 1;
  return tables_->antilog[exponent % group_order * tables_->logarithm[a] % group_order];
}

std::vector<Element> Field::digits(Element a) const {
  std::vector<Element> result(degree());
  for (Element& digit : result) {
    digit = static_cast<Element>(a % characteristic());
    a = static_cast<Element>(a / characteristic());
  }
  return result;
}

Element Field::from_digits(std::span<const Element> digits) const {
  contract(digits.size() <= degree(), "an element has at most m digits");
  std::uint32_t number = 0;
  for (std::size_t i = digits.size(); i-- > 0;) {
    contract(digits[i] < characteristic(), "a digit of an element is below p");
    number = number * characteristic() + digits[i];
  }
  return static_cast<Element>(number);
}

Element Field::class_of_x() const noexcept {
  contract(degree() > 1, "only an extension field has a class of x");
  return static_cast<Element>(characteristic());
}

std::uint32_t Field::order_of(Element a) const noexcept {
  const std::uint32_t group_order = order() - 1;
  return group_order / std::gcd(group_order, logarithm(a));
}

bool Field::is_primitive(Element a) const noexcept { return a != 0 && order_of(a) == order() - 1; }

std::vector<Element> Field::primitive_elements() const {
  std::vector<Element> result;
  for (std::uint32_t a = 1; a < order(); ++a)
    if (is_primitive(static_cast<Element>(a))) result.push_back(static_cast<Element>(a));
  return result;
}

bool operator==(const Field& a, const Field& b) noexcept {
  return a.tables_ == b.tables_ || (a.order() == b.order() && a.tables_->modulus == b.tables_->modulus);
}

}  // namespace assize::field
