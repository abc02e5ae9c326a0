// Operations on one row of elements, shared by polynomials and matrices: where nearly all their time goes.
#pragma once
#include <span>

#include "field/field.hpp"

namespace assize::field {

/// target += factor * source, elementwise; equal lengths (contract).  The two may be the same row, not overlap in part.
void add_multiple(const Field& field, std::span<Element> target, Element factor, std::span<const Element> source);

/// target *= factor, elementwise.
void scale(const Field& field, std::span<Element> target, Element factor);

}  // namespace assize::field
