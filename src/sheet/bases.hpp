// Bases of GF(2^m) over GF(2) as sheets name them; private to this room.
#pragma once
#include "sheet/description.hpp"
#include "sheet/document.hpp"

namespace assize::sheet {

/// "polynomial", { normal = ELEMENT }, { dual_of = BASIS }, or m listed elements; that they are a basis is checked
/// where they are used.
Result<BinaryImage> read_basis(const Node& node, const field::Field& words, const std::string& source);

}  // namespace assize::sheet
