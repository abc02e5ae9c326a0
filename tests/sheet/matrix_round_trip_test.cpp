// What is written is read back equal, in every layout and over fields of every kind.
#include "sheet/matrix_support.hpp"

namespace assize::sheet {
namespace {

class RoundTrip : public testing::TestWithParam<Layout> {};

void expect_round_trip(const field::Field& field, const field::Matrix& matrix, Layout layout) {
  const std::string bytes = write_matrix(field, matrix, layout);
  SCOPED_TRACE(std::string(layout_name(layout)) + ", GF(" + std::to_string(field.order()) + "), " +
               std::to_string(matrix.rows()) + " x " + std::to_string(matrix.columns()));
  const FileMatrix forced = good("ropeway.dat", bytes, field, layout);
  EXPECT_EQ(forced.matrix, matrix);
  EXPECT_EQ(forced.format, layout_name(layout));
  EXPECT_EQ(forced.row_lines.size(), matrix.rows());
  EXPECT_EQ(good("ropeway.dat", bytes, field).matrix, matrix) << "recognised by content";
}

TEST_P(RoundTrip, EveryField) {
  for (const field::Field& field : {prime_field(2), prime_field(3), field_of_8(), prime_field(257)})
    for (const auto& [rows, columns] : {std::pair<std::size_t, std::size_t>{4, 9}, {1, 1}, {1, 12}, {5, 2}, {6, 3}})
      expect_round_trip(field, scattered(rows, columns, field.order()), GetParam());
}

TEST_P(RoundTrip, ZeroRowsAndColumns) {
  expect_round_trip(prime_field(2), matrix_of({{0, 0, 0}, {0, 1, 0}}), GetParam());
  expect_round_trip(prime_field(3), matrix_of({{0, 2, 0}, {0, 0, 0}}), GetParam());
  expect_round_trip(prime_field(5), matrix_of({{0, 0}, {0, 0}}), GetParam());
}

TEST_P(RoundTrip, LargestElements) {
  expect_round_trip(prime_field(65521), matrix_of({{65520, 0, 256, 255}}), GetParam());
  expect_round_trip(prime_field(257), matrix_of({{256, 255}, {2, 1}}), GetParam());
}

INSTANTIATE_TEST_SUITE_P(MatrixFile, RoundTrip, testing::ValuesIn(every_layout), [](const auto& each) {
  std::string name(layout_name(each.param));
  std::erase(name, '-');
  return name;
});

TEST(WriteMatrix, Hamming) {
  const field::Field& binary = field::Field::binary();
  EXPECT_EQ(write_matrix(binary, hamming(), Layout::text), "# 3 x 7 over GF(2)\n0001111\n0110011\n1010101\n");
  EXPECT_EQ(write_matrix(binary, hamming(), Layout::csv), "0,0,0,1,1,1,1\n0,1,1,0,0,1,1\n1,0,1,0,1,0,1\n");
  EXPECT_EQ(write_matrix(binary, matrix_of({{0, 1}, {1, 0}}), Layout::matrix_market),
            "%%MatrixMarket matrix coordinate pattern general\n2 2 2\n1 2\n2 1\n");
  EXPECT_EQ(write_matrix(prime_field(3), matrix_of({{0, 2}}), Layout::matrix_market),
            "%%MatrixMarket matrix coordinate integer general\n1 2 1\n1 2 2\n");
  EXPECT_EQ(write_matrix(prime_field(3), matrix_of({{1, 2, 0}, {0, 1, 1}}), Layout::sparse_list),
            "3 2 3\n2 2\n1 2 1\n2 2\n1 1 0 0\n1 2 2 1\n2 1 0 0\n1 1 2 2\n2 1 3 1\n");
  const std::string array = write_matrix(prime_field(257), matrix_of({{1, 256}}), Layout::npy);
  EXPECT_EQ(array.size(), 132U);
  EXPECT_EQ(array.substr(128), std::string("\x01\x00\x00\x01", 4));
}

}  // namespace
}  // namespace assize::sheet
