// What is known of all words from the generator rows alone: a divisor of every weight, orthogonality to themselves.
#pragma once
#include <optional>

#include "code/linear_code.hpp"

namespace assize::code {

struct Properties {
  std::uint32_t divisor = 1;  ///< divides the weight of every word
  bool self_orthogonal = false;
  bool self_dual = false;
  bool hermitian_self_orthogonal = false;  ///< over GF(4), GF(9), ...: with conjugation a -> a^sqrt(q)
  bool hermitian_self_dual = false;
  bool all_one = false;  ///< the all-one word belongs to the code
};

/// Takes k^2 n operations; nothing where that is more than some seconds' worth.
std::optional<Properties> properties(const LinearCode& code);

}  // namespace assize::code
