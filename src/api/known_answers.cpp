// The table.  Sources: F. J. MacWilliams, N. J. A. Sloane, The Theory of Error-Correcting Codes, 1977; N. J. A. Sloane,
// E. R. Berlekamp, IEEE Trans. Inf. Theory 16, 1970; the weight formula of maximum distance separable codes.
#include "api/known_answers.hpp"

namespace assize::api {

namespace {

constexpr std::string_view book = "MacWilliams, Sloane 1977";

}  // namespace

std::span<const KnownAnswer> known_answers() {
  static const std::vector<KnownAnswer> answers = {
      {"binary Golay [23,12]",
       book,
       R"([code]
family = "cyclic"
codeword_length = 23
generator = { algebra = "x^11 + x^9 + x^7 + x^6 + x^5 + x + 1" }
)",
       {{7, 253}, {8, 506}, {11, 1288}, {12, 1288}, {15, 506}, {16, 253}, {23, 1}}},
      {"ternary Golay [11,6]",
       book,
       R"([field]
order = 3
[code]
family = "cyclic"
codeword_length = 11
generator = { algebra = "x^5 + x^4 + 2*x^3 + x^2 + 2" }
)",
       {{5, 132}, {6, 132}, {8, 330}, {9, 110}, {11, 24}}},
      {"hexacode [6,3] over GF(4)",
       book,
       R"([field]
order = 4
modulus = "x^2 + x + 1"
[code]
family = "generator-matrix"
rows = ["1 0 0 1 2 2", "0 1 0 2 1 2", "0 0 1 2 2 1"]
)",
       {{4, 45}, {6, 18}}},
      {"Reed-Solomon [7,3] over GF(8)",
       "weights of maximum distance separable codes",
       R"([field]
order = 8
modulus = "x^3 + x + 1"
[code]
family = "reed-solomon"
codeword_length = 7
dimension = 3
first_root = 1
root_step = 1
primitive_element = 2
)",
       {{5, 147}, {6, 147}, {7, 217}}},
      {"Reed-Muller of order 2, length 64",
       "Sloane, Berlekamp 1970",
       R"([code]
family = "reed-muller"
order = 2
variables = 6
)",
       {{16, 2604}, {24, 291648}, {28, 888832}, {32, 1828134}, {36, 888832}, {40, 291648}, {48, 2604}, {64, 1}}},
  };
  return answers;
}

}  // namespace assize::api
