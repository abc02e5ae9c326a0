// std::visit with one lambda for each alternative.
#pragma once

namespace assize {

template <class... Cases>
struct Overloaded : Cases... {
  using Cases::operator()...;
};

}  // namespace assize
