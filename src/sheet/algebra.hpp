// "x^3 + 2*x + 1" as coefficients: the one parser behind polynomials and field elements written in x.
#pragma once
#include <string_view>

#include "base/result.hpp"
#include "field/polynomial.hpp"

namespace assize::sheet {

/// Terms `c`, `x`, `x^e`, `c*x`, `c*x^e` joined by `+`, in any order, each power at most once; coefficients are element
/// numbers below `order`, exponents at most `largest_degree`.  The failure's `where` is empty.
Result<field::Polynomial> parse_algebra(std::string_view text, std::uint32_t order, std::uint64_t largest_degree);

}  // namespace assize::sheet
