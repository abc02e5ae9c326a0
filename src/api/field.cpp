// `field`: counts are compared with their formulas before anything is shown, and a difference is a failed self-check.
#include <iterator>

#include "api/assize.hpp"
#include "api/world.hpp"
#include "base/integers.hpp"
#include "field/conjugates.hpp"
#include "field/number_theory.hpp"
#include "report/field_page.hpp"
#include "sheet/algebra.hpp"
#include "sheet/polynomial_notation.hpp"

namespace assize::api {

namespace {

using field::Element;
using field::Field;
using field::Polynomial;

Result<std::uint32_t> read_order(const std::string& text) {
  if (const auto order = parse_decimal(text, UINT32_MAX)) return static_cast<std::uint32_t>(*order);
  if (parse_big_decimal(text))
    return Failure{
        "", text + " is above the largest order of a field that can be worked in",
        "use a prime power up to 256, or a prime or a power of 2 up to " + std::to_string(field::largest_order)};
  return Failure{"", "\"" + text + "\" is not the order of a field",
                 "write a prime power in plain digits, for example 8"};
}

/// A field of this order whose modulus does not matter.
Result<Field> some_field(std::uint32_t order) {
  const auto power = field::as_prime_power(order);
  if (!power || power->exponent == 1 || order > field::largest_order) return Field::create(order, {});
  const auto ground = Field::prime(power->prime);
  if (!ground) return ground.error();
  return Field::create(order, field::least_irreducible(*ground, power->exponent));
}

/// The field with this modulus; none is filled in.
Result<Field> stated_field(std::uint32_t order, const std::string& modulus) {
  Polynomial polynomial;
  const auto power = field::as_prime_power(order);
  if (!modulus.empty() && power) {
    auto read = sheet::parse_algebra(modulus, power->prime, sheet::largest_polynomial_degree);
    if (!read) return read.error();
    polynomial = *std::move(read);
    if (polynomial.empty()) polynomial.push_back(0);
  }
  return Field::create(order, polynomial);
}

Polynomial polynomial_of(const Field& in, Element a) {
  Polynomial polynomial = in.digits(a);
  field::trim(polynomial);
  return polynomial;
}

report::FieldFacts facts_of(const Field& in) {
  report::FieldFacts facts{in.order(), in.characteristic(), in.degree(), ""};
  if (in.degree() > 1) facts.modulus = field::to_algebra({in.modulus().begin(), in.modulus().end()});
  return facts;
}

/// The class of x if it is primitive, otherwise the least primitive element.
report::BaseFacts base_of(const Field& in) {
  report::BaseFacts facts;
  facts.is_x = in.degree() > 1 && in.is_primitive(in.class_of_x());
  facts.element = facts.is_x ? in.class_of_x() : in.least_primitive_element();
  facts.polynomial = field::to_algebra(polynomial_of(in, static_cast<Element>(facts.element)));
  if (in.degree() > 1) facts.order_of_x = in.order_of(in.class_of_x());
  return facts;
}

/// What was counted, beside its formula; or a failed self-check.
Result<report::CountFacts> checked_count(std::uint64_t found, std::uint64_t expected, const std::string& what,
                                         const std::string& formula) {
  const std::string equation = formula + " = " + std::to_string(expected);
  if (found == expected) return report::CountFacts{found, equation};
  return Failure{
      "", "self-check failed: " + std::to_string(found) + " " + what + " were found, but the formula says " + equation,
      "do not use this machine or build; try assize selftest"};
}

/// "(2^6 - 2^3 - 2^2 + 2)/6"
std::string necklace_formula(std::uint32_t p, std::uint32_t degree) {
  std::string sum;
  for (std::uint32_t d = 1; d <= degree; ++d) {
    if (degree % d != 0 || field::moebius(d) == 0) continue;
    if (d > 1) sum += field::moebius(d) > 0 ? " + " : " - ";
    sum += std::to_string(p) + (d == degree ? "" : "^" + std::to_string(degree / d));
  }
  return "(" + sum + ")/" + std::to_string(degree);
}

/// "phi(15)"
std::string phi_formula(std::uint32_t order) { return "phi(" + std::to_string(order - 1) + ")"; }

Result<report::FieldDocument> polynomials_page(const Field& in) {
  report::IrreducibleFacts facts;
  facts.field = {in.order(), in.characteristic(), in.degree(), ""};
  std::uint64_t primitive = 0;
  for (const field::IrreduciblePolynomial& one : field::irreducible_polynomials(in)) {
    const bool is_primitive = one.order == in.order() - 1;
    primitive += is_primitive ? 1U : 0U;
    facts.polynomials.push_back(
        {field::to_algebra(one.polynomial), {one.polynomial.begin(), one.polynomial.end()}, one.order, is_primitive});
  }
  auto irreducible = checked_count(facts.polynomials.size(),
                                   field::number_of_irreducible_polynomials(in.characteristic(), in.degree()),
                                   "irreducible polynomials", necklace_formula(in.characteristic(), in.degree()));
  if (!irreducible) return irreducible.error();
  auto primitives = checked_count(primitive, field::euler_phi(in.order() - 1) / in.degree(), "primitive polynomials",
                                  phi_formula(in.order()) + "/" + std::to_string(in.degree()));
  if (!primitives) return primitives.error();
  facts.irreducible = *std::move(irreducible);
  facts.primitive = *std::move(primitives);
  return report::irreducible_polynomials(facts);
}

Result<report::FieldDocument> elements_page(const Field& in) {
  report::ElementsFacts facts;
  facts.field = facts_of(in);
  facts.base = base_of(in);
  const std::vector<Element> primitive = in.primitive_elements();
  facts.primitive_elements.assign(primitive.begin(), primitive.end());
  auto count =
      checked_count(primitive.size(), field::euler_phi(in.order() - 1), "primitive elements", phi_formula(in.order()));
  if (!count) return count.error();
  facts.primitive = *std::move(count);
  if (in.degree() > 1)
    for (const auto& coset : field::cyclotomic_cosets(in.characteristic(), in.order() - 1)) {
      report::ClassFacts one;
      one.exponents = coset;
      for (const std::uint32_t exponent : coset)
        one.elements.push_back(in.power(static_cast<Element>(facts.base.element), exponent));
      const auto first = static_cast<Element>(one.elements.front());
      one.order = in.order_of(first);
      one.minimal_polynomial = field::to_algebra(field::minimal_polynomial(in, first));
      one.primitive = in.is_primitive(first);
      facts.classes.push_back(std::move(one));
    }
  return report::field_elements(facts);
}

report::FieldDocument logarithms_page(const Field& in) {
  report::TableFacts facts;
  facts.field = facts_of(in);
  facts.base = base_of(in);
  for (std::uint32_t e = 0; e + 1 < in.order(); ++e) {
    const Element element = in.power(static_cast<Element>(facts.base.element), e);
    const std::vector<Element> digits = in.digits(element);
    facts.powers.push_back({element, field::to_algebra(polynomial_of(in, element)), {digits.begin(), digits.end()}});
  }
  return report::table_of_logarithms(facts);
}

Result<report::FieldDocument> page(const FieldRequest& request) {
  const auto order = read_order(request.order);
  if (!order) return order.error();
  auto any = some_field(*order);
  if (!any) return any.error();
  if (request.modulus.empty() && any->degree() > 1 && !request.table) return polynomials_page(*any);
  const auto stated = stated_field(*order, request.modulus);
  if (!stated) return Failure{"--modulus", stated.error().what, stated.error().cure};
  if (request.table) return logarithms_page(*stated);
  return elements_page(*stated);
}

}  // namespace

Answer<Reply> field(const FieldRequest& request) {
  const auto document = page(request);
  if (!document) return to_problem(document.error());
  return Reply{Holds::yes, request.csv ? document->csv : document->text, document->json};
}

}  // namespace assize::api
