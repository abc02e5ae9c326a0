// Random descriptions of every family and step, built by the producer and replayed by the checker: both must arrive at
// the same reduced generator.  The two share no arithmetic, so a defect would have to be made twice.
#include <gtest/gtest.h>

#include <array>
#include <map>
#include <numeric>
#include <random>

#include "api/subject.hpp"
#include "certificate/certificate.hpp"
#include "recheck/recheck.hpp"
#include "sheet/canonical.hpp"

namespace assize::recheck {
namespace {

class Chance {
 public:
  explicit Chance(std::uint64_t seed) : random_(seed) {}
  std::uint64_t below(std::uint64_t limit) { return random_() % limit; }
  std::uint64_t between(std::uint64_t least, std::uint64_t largest) { return least + below(largest - least + 1); }
  template <class Range>
  auto pick(const Range& range) {
    return *(std::begin(range) + static_cast<std::ptrdiff_t>(below(std::size(range))));
  }

 private:
  std::mt19937_64 random_;
};

struct FieldText {
  std::uint32_t order;
  const char* modulus;  ///< null for prime fields
};

constexpr FieldText fields[] = {{2, nullptr},
                                {3, nullptr},
                                {4, "x^2 + x + 1"},
                                {5, nullptr},
                                {7, nullptr},
                                {8, "x^3 + x + 1"},
                                {8, "x^3 + x^2 + 1"},
                                {9, "x^2 + 1"},
                                {9, "x^2 + x + 2"},
                                {13, nullptr},
                                {16, "x^4 + x + 1"},
                                {16, "x^4 + x^3 + x^2 + x + 1"},
                                {25, "x^2 + x + 2"},
                                {27, "x^3 + 2*x + 1"},
                                {31, nullptr},
                                {64, "x^6 + x + 1"},
                                {256, "x^8 + x^4 + x^3 + x + 1"}};

std::string field_text(const FieldText& field, const std::string& table = "field") {
  std::string out = "[" + table + "]\norder = " + std::to_string(field.order) + "\n";
  if (field.modulus != nullptr) out += "modulus = \"" + std::string(field.modulus) + "\"\n";
  return out;
}

std::string number_list(const std::vector<std::uint64_t>& numbers) {
  std::string out = "[";
  for (const std::uint64_t number : numbers) out += (out.size() == 1 ? "" : ", ") + std::to_string(number);
  return out + "]";
}

std::vector<std::uint64_t> random_elements(Chance& chance, std::uint32_t order, std::size_t count) {
  std::vector<std::uint64_t> out(count);
  for (auto& element : out) element = chance.below(order);
  return out;
}

std::vector<std::uint64_t> distinct(Chance& chance, std::uint64_t limit, std::size_t count) {
  std::vector<std::uint64_t> all(limit);
  std::iota(all.begin(), all.end(), std::uint64_t{0});
  for (std::size_t i = 0; i < count; ++i) std::swap(all[i], all[i + chance.below(limit - i)]);
  all.resize(count);
  return all;
}

/// The body of a [code] table over GF(order); many of them describe no code and are skipped.
std::string random_family(Chance& chance, const FieldText& field, int kind) {
  const std::uint32_t q = field.order;
  const auto text = [](std::uint64_t number) { return std::to_string(number); };
  const std::uint64_t n = chance.between(2, 14);
  switch (kind) {
    case 0:
    case 1: {
      std::string rows;
      for (std::uint64_t i = chance.between(1, 6); i > 0; --i)
        rows += number_list(random_elements(chance, q, n)) + ", ";
      return "family = \"" + std::string(kind == 0 ? "generator" : "parity-check") + "-matrix\"\nrows = [" + rows +
             "]\n";
    }
    case 2:
    case 3: {
      auto coefficients = random_elements(chance, q, chance.between(1, 5));
      coefficients.push_back(chance.between(1, q - 1));
      if (kind == 2)
        coefficients = chance.below(2) == 0 ? std::vector<std::uint64_t>(n, 1) : std::vector<std::uint64_t>{1, 1};
      return "family = \"" + std::string(kind == 2 ? "cyclic" : "shortened-cyclic") +
             "\"\ncodeword_length = " + text(n) + "\ngenerator = { coefficients = " + number_list(coefficients) +
             " }\n";
    }
    case 4: {
      const std::uint64_t m = chance.between(0, 5);
      return "family = \"reed-muller\"\norder = " + text(chance.between(0, m)) + "\nvariables = " + text(m) + "\n";
    }
    case 5: {
      const std::uint64_t length = chance.between(1, std::min(q, 12U));
      std::string out = "family = \"reed-solomon\"\ncodeword_length = " + text(length) +
                        "\ndimension = " + text(chance.between(1, length)) +
                        "\nevaluation_points = " + number_list(distinct(chance, q, length)) + "\n";
      if (chance.below(2) == 0) {
        std::vector<std::uint64_t> multipliers(length);
        for (auto& multiplier : multipliers) multiplier = chance.between(1, q - 1);
        out += "multipliers = " + number_list(multipliers) + "\n";
      }
      return out;
    }
    case 6: {
      if (q < 3) return "";
      const std::uint64_t length = chance.between(1, std::min(q - 1, 12U));
      return "family = \"reed-solomon\"\ncodeword_length = " + text(length) +
             "\ndimension = " + text(chance.between(1, length)) + "\nfirst_root = " + text(chance.below(20)) +
             "\nroot_step = " + text(chance.between(1, q)) + "\nprimitive_element = " + text(chance.between(1, q - 1)) +
             "\n";
    }
    case 7: {
      const std::uint64_t length = chance.pick(std::array<std::uint64_t, 10>{3, 5, 7, 8, 10, 11, 13, 15, 21, 26});
      return "family = \"bch\"\ncodeword_length = " + text(length) +
             "\ndesigned_distance = " + text(chance.between(2, length)) +
             "\nfirst_exponent = " + text(chance.below(length)) + "\n";
    }
    case 8:
      return "family = \"quadratic-residue\"\nprime = " +
             text(chance.pick(std::array<std::uint64_t, 9>{5, 7, 11, 13, 17, 19, 23, 31, 37})) + "\n";
    case 9: {
      const std::uint64_t size = chance.between(1, 5);
      const std::string shift = chance.below(2) == 0 ? "right" : "left";
      std::string out = "family = \"quasi-cyclic\"\nshift = \"" + shift + "\"\n";
      const std::uint64_t form = chance.below(4);
      if (form == 0) {
        out += "form = \"blocks\"\nfirst_rows = [";
        const std::uint64_t across = chance.between(1, 3);
        for (std::uint64_t i = chance.between(1, 2); i > 0; --i) {
          out += "[";
          for (std::uint64_t j = 0; j < across; ++j) out += number_list(random_elements(chance, q, size)) + ", ";
          out += "], ";
        }
        return out + "]\n";
      }
      if (form == 3) {
        out += "lifting = " + text(size) + "\nshift_exponents = [";
        const std::uint64_t across = chance.between(2, 4);
        for (std::uint64_t i = chance.between(1, 2); i > 0; --i) {
          out += "[";
          for (std::uint64_t j = 0; j < across; ++j)
            out += (chance.below(4) == 0 ? "-1" : text(chance.below(size))) + ", ";
          out += "], ";
        }
        return out + "]\n";
      }
      out += "form = \"" + std::string(form == 1 ? "double" : "bordered") + "\"\nfirst_rows = [[" +
             number_list(random_elements(chance, q, size)) + "]]\n";
      if (form == 2) out += "corner = " + text(chance.below(q)) + "\nborder = " + text(chance.below(q)) + "\n";
      return out;
    }
    case 10: {
      if (q != 4 && q != 8 && q != 16) return "";
      const std::uint64_t length = chance.between(1, std::min(q, 8U));
      return "family = \"justesen\"\nouter_length = " + text(length) +
             "\nouter_dimension = " + text(chance.between(1, std::min<std::uint64_t>(length, 4))) +
             "\nevaluation_points = " + number_list(distinct(chance, q, length)) +
             "\nprimitive_element = " + text(chance.between(2, q - 1)) + "\nfirst_exponent = " + text(chance.below(9)) +
             "\nimage = \"" + (chance.below(2) == 0 ? "bits" : "symbols") + "\"\n";
    }
    default:
      return "family = \"random-linear\"\ncodeword_length = " + text(n) +
             "\ndimension = " + text(chance.between(1, std::min<std::uint64_t>(n, 7))) +
             "\nseed = " + text(chance.below(1000000)) + "\n";
  }
}
constexpr int plain_families = 12;

/// A sub-sheet under the table `name`.
std::string random_part(Chance& chance, const FieldText& field, const std::string& name) {
  return field_text(field, name + ".field") + "[" + name + ".code]\n" +
         random_family(chance, field, static_cast<int>(chance.pick(std::array<int, 6>{0, 1, 3, 5, 9, 11})));
}

std::string random_composed(Chance& chance, int kind) {
  const FieldText field = fields[chance.below(6)];
  constexpr const char* pairs[] = {"product", "direct-sum", "plotkin-sum"};
  if (kind < 3)
    return "[code]\nfamily = \"" + std::string(pairs[kind]) + "\"\n" + random_part(chance, field, "code.first") +
           random_part(chance, field, "code.second");
  // Outer symbols of GF(q^k): inner codes of dimension k over GF(q).
  const bool quaternary = chance.below(3) == 0;
  const FieldText outer = quaternary ? FieldText{16, "x^4 + x + 1"} : FieldText{8, "x^3 + x^2 + 1"};
  const std::uint32_t inner_order = quaternary ? 4 : 2;
  const std::size_t inner_dimension = quaternary ? 2 : 3;
  const auto inner_rows = [&] {
    std::string rows;
    const std::size_t length = chance.between(inner_dimension, 6);
    for (std::size_t i = 0; i < inner_dimension; ++i) {
      auto row = random_elements(chance, inner_order, length);
      for (std::size_t j = 0; j < inner_dimension; ++j) row[j] = i == j ? 1 : 0;
      rows += number_list(row) + ", ";
    }
    return "[" + rows + "]";
  };
  const std::string inner_field = quaternary ? "order = 4, modulus = \"x^2 + x + 1\"" : "order = 2";
  const std::uint64_t length = chance.between(2, 6);
  std::string out = "[code]\nfamily = \"concatenated\"\n";
  if (quaternary)
    out += "embedding = " + std::string(chance.below(2) == 0 ? "6" : "7") +
           "\nsymbol_basis = " + number_list(random_elements(chance, 16, 2)) + "\n";
  const auto inner_sheet = [&] {
    return "{ field = { " + inner_field + " }, code = { family = \"generator-matrix\", rows = " + inner_rows() + " } }";
  };
  if (kind == 3) {
    out += "inner = " + inner_sheet() + "\n";
  } else {
    out += "inner_by_position = [";
    for (std::uint64_t i = 0; i < length; ++i) out += inner_sheet() + ", ";
    out += "]\n";
  }
  return out + field_text(outer, "code.outer.field") +
         "[code.outer.code]\nfamily = \"random-linear\"\ncodeword_length = " + std::to_string(length) +
         "\ndimension = " + std::to_string(chance.between(1, 2)) + "\nseed = " + std::to_string(chance.below(100)) +
         "\n";
}

std::string random_step(Chance& chance, std::uint32_t length) {
  const auto positions = [&] {
    return number_list(distinct(chance, length, chance.between(1, std::max(1U, length / 3))));
  };
  switch (chance.below(10)) {
    case 0:
      return "step = \"extend\"\n";
    case 1:
      return "step = \"dual\"\n";
    case 2:
      return "step = \"puncture\"\npositions = " + positions() + "\n";
    case 3:
      return "step = \"shorten\"\npositions = " + positions() + "\n";
    case 4:
      return "step = \"expurgate\"\n";
    case 5:
      return "step = \"augment\"\n";
    case 6:
      return "step = \"binary-image\"\nbasis = " +
             std::string(chance.below(2) == 0 ? "\"polynomial\"" : "{ dual_of = \"polynomial\" }") + "\n";
    case 7:
      return "step = \"permute\"\norder = " + number_list(distinct(chance, length, length)) + "\n";
    case 8:
      return "step = \"repeat\"\ntimes = " + std::to_string(chance.between(1, 3)) + "\n";
    default:
      return "step = \"subfield-subcode\"\nsubfield = " + std::string(chance.below(2) == 0 ? "2" : "3") + "\n";
  }
}

std::string certificate_for(const api::Subject& subject) {
  const code::LinearCode& code = subject.code;
  certificate::Certificate out;
  out.code = {sheet::to_json(subject.description),
              sheet::description_digest(subject.description),
              subject.sheet_digest,
              code.order(),
              code.length(),
              code.dimension(),
              code.reduced_generator_digest()};
  out.evidence = {evidence::Witness{code::weight(code.row(0)), code.row(0)}};
  out.statements = evidence::Conclusions::from(out.evidence, {}).statements();
  out.context = {"test", "none", "reference", 1, "2026-01-01T00:00:00Z", "0.000", "complete"};
  return certificate::to_bytes(out);
}

/// Adds steps to a sheet as long as it describes a code, and compares after each.
void compare(std::string sheet, Chance& chance, std::map<std::string, int>& compared) {
  for (int steps = 0; steps < 4; ++steps) {
    const auto subject = api::load_text(sheet, "random.toml");
    if (!subject) return;
    Options options;
    options.depth = Depth::quick;
    const Report report = recheck(certificate_for(*subject), options);
    ASSERT_EQ(report.outcome, Outcome::proven) << report.reason << "\n" << sheet;
    ++compared[std::string(sheet::family_name(subject->description.family))];
    for (const sheet::Step& step : subject->description.steps) ++compared["step " + std::to_string(step.what.index())];
    if (subject->code.length() > 200) return;
    sheet += "[[then]]\n" + random_step(chance, subject->code.length());
  }
}

TEST(Differential, ProducerAndCheckerBuildTheSameCode) {
  constexpr std::uint64_t seed = 20260201;
  constexpr int rounds = 250;
  std::printf("seed %llu\n", static_cast<unsigned long long>(seed));
  Chance chance(seed);
  std::map<std::string, int> compared;
  for (int round = 0; round < rounds; ++round) {
    for (int kind = 0; kind < plain_families; ++kind) {
      FieldText field = fields[chance.below(std::size(fields))];
      if (kind == 4) field = fields[0];
      if (kind == 8) field = fields[chance.below(3)];
      if (kind == 10) field = fields[chance.pick(std::array<int, 4>{2, 5, 6, 10})];
      compare(field_text(field) + "[code]\n" + random_family(chance, field, kind), chance, compared);
    }
    for (int kind = 0; kind < 5; ++kind) compare(random_composed(chance, kind), chance, compared);
  }
  for (const char* family : {"generator-matrix", "parity-check-matrix", "cyclic", "shortened-cyclic", "reed-muller",
                             "reed-solomon", "bch", "quadratic-residue", "quasi-cyclic", "justesen", "random-linear",
                             "product", "direct-sum", "plotkin-sum", "concatenated"})
    EXPECT_GE(compared[family], 10) << family;
  for (std::size_t step = 0; step < std::variant_size_v<decltype(sheet::Step::what)>; ++step)
    EXPECT_GE(compared["step " + std::to_string(step)], 10) << step;
}

}  // namespace
}  // namespace assize::recheck
