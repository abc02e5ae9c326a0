// What is known of a finite field, as pages, as CSV and as JSON.
//
// Polynomials and elements arrive spelled, since this room does no algebra.  Tables are whole in CSV and JSON and are
// cut after 64 rows in the text, which says how many rows are left out.
#pragma once
#include <cstdint>
#include <string>
#include <vector>

#include "report/document.hpp"

namespace assize::report {

/// `csv` has one header line.
struct FieldDocument : Document {
  std::string csv;
};

struct FieldFacts {
  std::uint32_t order = 2;
  std::uint32_t characteristic = 2;
  std::uint32_t degree = 1;
  std::string modulus;  ///< empty for prime fields, and where none is chosen
};

/// A number of things and how a formula gives the same number: "(2^4 - 2^2)/4 = 3".
struct CountFacts {
  std::uint64_t count = 0;
  std::string formula;
};

struct PolynomialFacts {
  std::string polynomial;
  std::vector<std::uint32_t> coefficients;  ///< lowest first
  std::uint32_t order_of_x = 0;
  bool primitive = false;
};

/// Every monic irreducible polynomial of degree m over GF(p).
struct IrreducibleFacts {
  FieldFacts field;
  CountFacts irreducible;
  CountFacts primitive;
  std::vector<PolynomialFacts> polynomials;
};
FieldDocument irreducible_polynomials(const IrreducibleFacts& facts);

/// The primitive element whose exponents are meant.
struct BaseFacts {
  std::uint32_t element = 1;
  std::string polynomial;
  bool is_x = false;             ///< otherwise it is the least primitive element
  std::uint32_t order_of_x = 0;  ///< 0 in prime fields
};

/// A class of conjugates among the nonzero elements.
struct ClassFacts {
  std::vector<std::uint32_t> exponents;
  std::vector<std::uint32_t> elements;  ///< in the order of `exponents`
  std::uint32_t order = 1;
  std::string minimal_polynomial;
  bool primitive = false;
};

struct ElementsFacts {
  FieldFacts field;
  BaseFacts base;
  CountFacts primitive;
  std::vector<std::uint32_t> primitive_elements;
  std::vector<ClassFacts> classes;  ///< none in prime fields, where no element has other conjugates
};
FieldDocument field_elements(const ElementsFacts& facts);

struct LogarithmFacts {
  std::uint32_t element = 1;
  std::string polynomial;
  std::vector<std::uint32_t> digits;  ///< lowest first
};

/// The powers of the base, from exponent 0 to q-2.
struct TableFacts {
  FieldFacts field;
  BaseFacts base;
  std::vector<LogarithmFacts> powers;
};
FieldDocument table_of_logarithms(const TableFacts& facts);

}  // namespace assize::report
