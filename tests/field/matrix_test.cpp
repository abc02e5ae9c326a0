// Row reduction, products and null spaces by their defining properties, over fields of every kind of addition.
#include "field_support.hpp"

namespace assize::field::testing {
namespace {

struct Shape {
  std::size_t rows;
  std::size_t columns;
  std::size_t rank;
};
constexpr Shape shapes[] = {{1, 1, 1},   {3, 7, 3},  {7, 3, 3},    {8, 8, 8},    {12, 20, 7},
                            {20, 12, 9}, {5, 40, 0}, {30, 41, 30}, {33, 64, 20}, {1, 9, 1}};
constexpr std::uint32_t orders[] = {2, 3, 4, 5, 8, 9, 16, 27, 49, 251, 256, 1024, 65521, 65536};

bool is_zero(const Matrix& a) { return a == Matrix(a.rows(), a.columns()); }

/// Visits random matrices over every kind of field.
template <class Visit>
void for_matrices(std::uint64_t seed, Visit visit) {
  Chance chance(seed);
  for (const std::uint32_t q : orders) {
    const Field field = some_field(q);
    for (const auto& [rows, columns, rank] : shapes)
      for (int repetition = 0; repetition < 3; ++repetition) visit(field, chance.matrix(field, rows, columns, rank));
  }
}

// Common practice, no source: the definition of the reduced row echelon form, and that the row space stays the same.
TEST(Matrices, ReduceRowsGivesTheReducedEchelonFormOfTheSameSpace) {
  for_matrices(20240521, [](const Field& f, const Matrix& original) {
    Matrix reduced = original;
    const std::vector<std::size_t> pivots = reduce_rows(f, reduced);
    ASSERT_EQ(reduced.rows(), pivots.size());
    for (std::size_t i = 0; i < pivots.size(); ++i) {
      if (i > 0) {
        ASSERT_LT(pivots[i - 1], pivots[i]);
      }
      for (std::size_t j = 0; j < pivots[i]; ++j) ASSERT_EQ(reduced.at(i, j), 0);
      for (std::size_t k = 0; k < pivots.size(); ++k) ASSERT_EQ(reduced.at(k, pivots[i]), i == k ? 1 : 0);
    }
    // Every original row is the combination that its entries at the pivots tell: original = original[pivots] * reduced.
    Matrix at_pivots(original.rows(), pivots.size());
    for (std::size_t i = 0; i < original.rows(); ++i)
      for (std::size_t k = 0; k < pivots.size(); ++k) at_pivots.at(i, k) = original.at(i, pivots[k]);
    ASSERT_EQ(multiply(f, at_pivots, reduced), original);
    // And the space has not grown: row rank equals column rank.
    Matrix transposed = transpose(original);
    ASSERT_EQ(reduce_rows(f, transposed).size(), pivots.size());
    // Idempotent.
    Matrix again = reduced;
    ASSERT_EQ(reduce_rows(f, again), pivots);
    ASSERT_EQ(again, reduced);
  });
}

// Common practice, no source: rank-nullity, orthogonality, and that the null space of the null space is the row space.
TEST(Matrices, NullSpace) {
  for_matrices(20240522, [](const Field& f, const Matrix& original) {
    Matrix reduced = original;
    const std::size_t rank = reduce_rows(f, reduced).size();
    const Matrix null = null_space(f, original);
    ASSERT_EQ(null.rows(), original.columns() - rank);
    ASSERT_EQ(null.columns(), original.columns());
    ASSERT_TRUE(is_zero(multiply(f, original, transpose(null))));
    Matrix null_reduced = null;
    ASSERT_EQ(reduce_rows(f, null_reduced).size(), null.rows());
    Matrix back = null_space(f, null);
    reduce_rows(f, back);
    ASSERT_EQ(back, reduced);
  });
}

// Common practice, no source: products are associative, and each entry is the sum of products.
TEST(Matrices, Products) {
  Chance chance(20240523);
  for (const std::uint32_t q : orders) {
    const Field f = some_field(q);
    const Matrix a = chance.matrix(f, 6, 9, 6);
    const Matrix b = chance.matrix(f, 9, 11, 9);
    const Matrix c = chance.matrix(f, 11, 5, 5);
    const Matrix ab = multiply(f, a, b);
    EXPECT_EQ(multiply(f, ab, c), multiply(f, a, multiply(f, b, c)));
    EXPECT_EQ(transpose(ab), multiply(f, transpose(b), transpose(a)));
    for (std::size_t i = 0; i < ab.rows(); ++i)
      for (std::size_t j = 0; j < ab.columns(); ++j) {
        Element sum = 0;
        for (std::size_t k = 0; k < a.columns(); ++k) sum = f.add(sum, f.multiply(a.at(i, k), b.at(k, j)));
        ASSERT_EQ(ab.at(i, j), sum);
      }
  }
}

// Independent computation: the operation on rows, element by element, at every length around the word size.
TEST(Rows, AddMultipleAndScale) {
  Chance chance(20240524);
  for (const std::uint32_t q : orders) {
    const Field f = some_field(q);
    for (std::size_t length = 0; length < 20; ++length)
      for (int repetition = 0; repetition < 20; ++repetition) {
        const Element factor = repetition == 0 ? Element{0} : repetition == 1 ? Element{1} : chance.element(f);
        std::vector<Element> target(length);
        std::vector<Element> source(length);
        for (Element& element : target) element = chance.element(f);
        for (Element& element : source) element = chance.element(f);
        std::vector<Element> sum(length);
        std::vector<Element> scaled(length);
        for (std::size_t i = 0; i < length; ++i) {
          sum[i] = f.add(target[i], f.multiply(factor, source[i]));
          scaled[i] = f.multiply(factor, source[i]);
        }
        add_multiple(f, target, factor, source);
        ASSERT_EQ(target, sum);
        scale(f, source, factor);
        ASSERT_EQ(source, scaled);
      }
    std::vector<Element> row(9, 1);
    add_multiple(f, row, f.negate(1), row);  // a row minus itself
    ASSERT_EQ(row, std::vector<Element>(9));
  }
}

// Common practice, no source: matrices without rows or columns are matrices.
TEST(Matrices, EmptyOnes) {
  const Field& f = Field::binary();
  Matrix none(0, 5);
  EXPECT_TRUE(reduce_rows(f, none).empty());
  EXPECT_EQ(null_space(f, none).rows(), 5U);
  Matrix thin(5, 0);
  EXPECT_TRUE(reduce_rows(f, thin).empty());
  EXPECT_EQ(null_space(f, thin), Matrix(0, 0));
  EXPECT_EQ(multiply(f, Matrix(2, 0), Matrix(0, 3)), Matrix(2, 3));
}

// Common practice, no source: promises between rooms end the program with exit code 4.
TEST(MatrixDeathTest, BrokenContracts) {
  const Field& f = Field::binary();
  std::vector<Element> three(3);
  const std::vector<Element> four(4);
  EXPECT_EXIT(add_multiple(f, three, 1, four), ::testing::ExitedWithCode(4), "equal lengths");
  EXPECT_EXIT(multiply(f, Matrix(2, 3), Matrix(2, 3)), ::testing::ExitedWithCode(4), "shapes");
}

}  // namespace
}  // namespace assize::field::testing
