// Counting words by weight without waiting for memory: neighbours of equal weight go to different counters.
//
// A counter that is raised twice in a row has to be stored before it can be loaded again.  Four sets of counters, taken
// in turn, keep those waits apart; they are added up at the end.
#pragma once
#include <algorithm>
#include <array>
#include <cstddef>
#include <cstdint>
#include <span>

#include "kernel/kernel_set.hpp"

namespace assize::kernel {

class Tally {
 public:
  /// Counts are added to `counts`, some of them only by finish().
  explicit Tally(std::span<std::uint64_t> counts) noexcept : counts_(counts), interleaved_(counts.size() <= room) {
    if (!interleaved_) return;
    for (auto& bins : bins_) std::fill_n(bins.begin(), counts.size(), std::uint64_t{0});
  }

  /// The weights of the words with indexes `first`, `first + 1`, ...; each is below counts.size().
  template <class Weight>
  void add(std::span<const Weight> weights, std::uint64_t first) noexcept {
    Lightest lightest = lightest_;  // a local copy stays in registers
    const auto count = [&lightest](std::uint64_t* bins, std::uint32_t weight, std::uint64_t index) {
      ++bins[weight];
      if (weight < lightest.weight) lightest = {weight, index};
    };
    std::size_t i = 0;
    if (interleaved_)
      for (; i + ways <= weights.size(); i += ways)
        for (std::size_t way = 0; way < ways; ++way) count(bins_[way].data(), weights[i + way], first + i + way);
    for (; i < weights.size(); ++i) count(counts_.data(), weights[i], first + i);
    lightest_ = lightest;
  }

  Lightest finish() noexcept {
    if (interleaved_)
      for (const auto& bins : bins_)
        for (std::size_t weight = 0; weight < counts_.size(); ++weight) counts_[weight] += bins[weight];
    return lightest_;
  }

 private:
  static constexpr std::size_t ways = 4;
  static constexpr std::size_t room = 512;
  std::span<std::uint64_t> counts_;
  bool interleaved_;
  Lightest lightest_;
  std::array<std::array<std::uint64_t, room>, ways> bins_;  ///< the first counts_.size() of each are in use
};

}  // namespace assize::kernel
