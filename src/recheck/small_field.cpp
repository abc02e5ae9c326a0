// Products by the definition, and the tables made from them.
#include "recheck/small_field.hpp"

#include <array>
#include <numeric>

namespace assize::recheck {

Field::Field(std::uint32_t order, std::uint32_t characteristic, std::uint32_t degree, std::vector<Symbol> modulus)
    : order_(order), characteristic_(characteristic), degree_(degree), modulus_(std::move(modulus)) {
  make_tables();
}

Symbol Field::multiply_by_definition(Symbol a, Symbol b) const noexcept {
  const std::uint64_t p = characteristic_;
  std::array<std::uint64_t, 32> product{};
  std::uint64_t rest_a = a;
  for (std::size_t i = 0; i < degree_; ++i, rest_a /= p) {
    std::uint64_t rest_b = b;
    for (std::size_t j = 0; j < degree_; ++j, rest_b /= p)
      product[i + j] = (product[i + j] + (rest_a % p) * (rest_b % p)) % p;
  }
  for (std::size_t top = 2 * std::size_t{degree_} - 2; top >= degree_; --top) {  // x^top = -(lower part) x^(top-degree)
    const std::uint64_t lead = product[top];
    for (std::size_t j = 0; j <= degree_; ++j) {
      std::uint64_t& digit = product[top - degree_ + j];
      digit = (digit + (p - lead) * modulus_[j]) % p;
    }
  }
  std::uint64_t value = 0;
  for (std::size_t i = degree_; i-- > 0;) value = value * p + product[i];
  return static_cast<Symbol>(value);
}

Symbol Field::add_by_definition(Symbol a, Symbol b) const noexcept {
  std::uint32_t value = 0;
  std::uint32_t weight = 1;
  for (std::uint32_t i = 0; i < degree_; ++i, weight *= characteristic_)
    value += ((a / weight + b / weight) % characteristic_) * weight;
  return static_cast<Symbol>(value);
}

Symbol Field::add(Symbol a, Symbol b) const noexcept {
  if (characteristic_ == 2) return static_cast<Symbol>(a ^ b);
  if (degree_ > 1) return sum_[std::size_t{a} * order_ + b];
  const std::uint32_t sum = std::uint32_t{a} + b;
  return static_cast<Symbol>(sum >= order_ ? sum - order_ : sum);
}

void Field::make_tables() {
  negative_.assign(order_, 0);
  for (std::uint32_t a = 0; a < order_; ++a) {
    std::uint32_t value = 0;
    std::uint32_t weight = 1;
    for (std::uint32_t i = 0; i < degree_; ++i, weight *= characteristic_)
      value += ((characteristic_ - a / weight % characteristic_) % characteristic_) * weight;
    negative_[a] = static_cast<Symbol>(value);
  }
  if (characteristic_ != 2 && degree_ > 1) {
    sum_.resize(std::size_t{order_} * order_);
    for (std::uint32_t a = 0; a < order_; ++a)
      for (std::uint32_t b = 0; b < order_; ++b)
        sum_[std::size_t{a} * order_ + b] = add_by_definition(static_cast<Symbol>(a), static_cast<Symbol>(b));
  }
  // The multiplicative group is cyclic: some element runs through all of it.
  for (std::uint32_t root = 1; root < order_; ++root) {
    power_of_root_.assign(1, 1);
    for (Symbol x = static_cast<Symbol>(root); x != 1; x = multiply_by_definition(x, static_cast<Symbol>(root)))
      power_of_root_.push_back(x);
    if (power_of_root_.size() == order_ - 1) break;
  }
  logarithm_.assign(order_, 0);
  for (std::size_t i = 0; i + 1 < order_; ++i) logarithm_[power_of_root_[i]] = static_cast<Symbol>(i);
  power_of_root_.reserve(2 * std::size_t{order_});
  for (std::size_t i = 0; i + 1 < order_; ++i) power_of_root_.push_back(power_of_root_[i]);
}

Symbol Field::power(Symbol a, std::uint64_t exponent) const noexcept {
  if (exponent == 0) return 1;
  if (a == 0) return 0;
  return power_of_root_[logarithm_[a] * (exponent % (order_ - 1)) % (order_ - 1)];
}

bool Field::is_primitive(Symbol a) const noexcept {
  return a != 0 && std::gcd(std::uint32_t{logarithm_[a]}, order_ - 1) == 1;
}

}  // namespace assize::recheck
