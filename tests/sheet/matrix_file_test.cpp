// Good matrix files: the liberties each layout grants, and how a layout is recognised.
#include "sheet/matrix_file.hpp"

#include "sheet/matrix_support.hpp"

namespace assize::sheet {
namespace {

TEST(TextMatrix, CommentsBlanksAndLines) {
  const FileMatrix read =
      good("m.txt", "# lower cable\n\n0001111\r\n \t0 1 1\t0 0 1 1 \n\n# upper\n1010101", field::Field::binary());
  EXPECT_EQ(read.matrix, hamming());
  EXPECT_EQ(read.row_lines, (std::vector<int>{3, 4, 7}));
  EXPECT_EQ(read.format, "text");
  EXPECT_TRUE(read.notices.empty()) << joined(read.notices);
}

TEST(TextMatrix, ElementsAsInSheets) {
  EXPECT_EQ(good("m.txt", "1 x x^2+1\nx^7 6 x^5\n", field_of_8()).matrix, matrix_of({{1, 2, 5}, {1, 6, 7}}));
}

TEST(TextMatrix, OpenEndIsNoticedWhereItMatters) {
  EXPECT_NE(joined(good("m.txt", "1 200\n7 11", prime_field(257)).notices).find("no line end"), std::string::npos);
  EXPECT_NE(joined(good("m.txt", "1 x", field_of_8()).notices).find("no line end"), std::string::npos);
  EXPECT_TRUE(good("m.txt", "1 6\n0 1", prime_field(7)).notices.empty());
}

TEST(CsvMatrix, Separators) {
  const field::Matrix wanted = matrix_of({{1, 0, 2}, {2, 2, 1}});
  EXPECT_EQ(good("m.csv", "1,0,2\n2,2,1\n", prime_field(3)).matrix, wanted);
  EXPECT_EQ(good("m.CSV", "# cabin\n1 ; 0;2\r\n\r\n 2;2 ;\t1\r\n", prime_field(3)).matrix, wanted);
  EXPECT_EQ(good("m.txt", "1, 0, 2\n2, 2, 1\n", prime_field(3)).format, "csv");
  EXPECT_EQ(good("m.csv", "1\n2\n", prime_field(3)).matrix, matrix_of({{1}, {2}}));
}

TEST(MatrixMarket, BothKinds) {
  const field::Matrix wanted = matrix_of({{0, 2, 1}, {1, 0, 0}});
  const FileMatrix coordinate =
      good("m.mtx", "%%MatrixMarket Matrix Coordinate Integer General\n% pylons\n\n2 3 4\n2 1 1\n1 2 2\n1 3 1\n2 3 0\n",
           prime_field(3));
  EXPECT_EQ(coordinate.matrix, wanted);
  EXPECT_EQ(coordinate.row_lines, (std::vector<int>{0, 0}));
  EXPECT_EQ(good("m", "%%MatrixMarket matrix array integer general\n2 3\n0\n1\n2\n0\n1\n0\n", prime_field(3)).matrix,
            wanted);
  EXPECT_EQ(good("m", "%%MatrixMarket matrix coordinate pattern general\n1 2 1\n1 2\n", prime_field(3)).matrix,
            matrix_of({{0, 1}}));
}

TEST(Npy, TypesAndOrders) {
  const field::Matrix wanted = matrix_of({{1, 0, 2}, {2, 1, 0}});
  const field::Field ternary = prime_field(3);
  const std::string rows("\1\0\2\2\1\0", 6);
  EXPECT_EQ(good("m.npy", npy_of("|u1", "(2, 3)", rows), ternary).matrix, wanted);
  EXPECT_EQ(good("m.npy", npy_of("|i1", "(2,3,)", rows), ternary).matrix, wanted);
  EXPECT_EQ(good("m.npy", npy_of("|u1", "(2, 3)", std::string("\1\2\0\1\2\0", 6), "True"), ternary).matrix, wanted);
  EXPECT_EQ(good("m.npy", npy_of("|b1", "(1, 2)", std::string("\0\1", 2)), ternary).matrix, matrix_of({{0, 1}}));
  for (const std::size_t width : {2U, 4U, 8U})
    for (const char* kind : {"i", "u"}) {
      std::string little;
      std::string big;
      for (const char entry : rows) {
        const std::string zeros(width - 1, '\0');
        little += entry + zeros;
        big += zeros + entry;
      }
      const std::string type = kind + std::to_string(width);
      EXPECT_EQ(good("m", npy_of("<" + type, "(2, 3)", little), ternary).matrix, wanted);
      EXPECT_EQ(good("m", npy_of(">" + type, "(2, 3)", big), ternary).matrix, wanted);
    }
  EXPECT_EQ(good("m", npy("{\"shape\": (1, 1), 'descr':'>u2','fortran_order':False}   ", "\x01\x02"), prime_field(521))
                .matrix,
            matrix_of({{258}}));
}

TEST(Npy, VersionTwo) {
  std::string bytes = npy_of("|u1", "(1, 2)", std::string("\1\0", 2));
  bytes[6] = 2;
  bytes.insert(10, 2, '\0');
  EXPECT_EQ(good("m.npy", bytes, field::Field::binary()).matrix, matrix_of({{1, 0}}));
}

TEST(Recognition, TwoColumnsOrSparseList) {
  const field::Field field = prime_field(257);
  const std::string both = "4 3\n2 1\n1 1\n";  // four columns and three rows, or the elements 4 3
  EXPECT_NE(refusal("m.txt", both, field).find("layout = \"text\" or layout = \"sparse-list\""), std::string::npos);
  EXPECT_EQ(good("m.txt", both, field, Layout::text).matrix, matrix_of({{4, 3}, {2, 1}, {1, 1}}));
  EXPECT_EQ(good("m.txt", "# text\n" + both, field).format, "text");
  EXPECT_EQ(good("m.txt", "1 0\n0 1\n", field::Field::binary()).format, "text");  // no list has no row
  EXPECT_EQ(good("m.txt", "3 2\n200 7\n", field).format, "text");                 // nor heavier columns than rows
}

TEST(Recognition, ContentAgainstEnding) {
  const std::string array = npy_of("|u1", "(1, 1)", "\1");
  EXPECT_NE(refusal("m.csv", array, prime_field(3)).find("begins like npy, its name ends like csv"), std::string::npos);
  EXPECT_EQ(good("m.csv", array, prime_field(3), Layout::npy).format, "npy");
  EXPECT_NE(refusal("m.npy", "101\n", prime_field(2)).find("layout = \"text\""), std::string::npos);
  EXPECT_NE(refusal("m.mtx", "101\n", prime_field(2)).find("%%MatrixMarket"), std::string::npos);
}

}  // namespace
}  // namespace assize::sheet
