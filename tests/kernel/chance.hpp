// Reproducible chance for the tests of the kernels: a printed seed, and corner-biased machine words.
#pragma once
#include <cstdint>
#include <iostream>
#include <random>

namespace assize::kernel::testing {

class Chance {
 public:
  explicit Chance(std::uint64_t seed) : engine_(seed) { std::cout << "[ seed     ] " << seed << '\n'; }
  std::uint64_t below(std::uint64_t bound) { return engine_() % bound; }
  /// All zeros, all ones, a single bit, sparse or dense with equal probability, otherwise anything.
  std::uint64_t word() {
    switch (below(8)) {
      case 0:
        return 0;
      case 1:
        return ~std::uint64_t{0};
      case 2:
        return std::uint64_t{1} << below(64);
      case 3:
        return engine_() & engine_() & engine_();
      case 4:
        return engine_() | engine_() | engine_();
      default:
        return engine_();
    }
  }

 private:
  std::mt19937_64 engine_;
};

}  // namespace assize::kernel::testing
