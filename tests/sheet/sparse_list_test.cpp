// The sparse parity-check list: common practice of the trade, no source; the code is that of MacWilliams and Sloane.
#include "sheet/matrix_support.hpp"

namespace assize::sheet {
namespace {

const std::string hamming_list =
    "7 3\n"
    "3 4\n"
    "1 1 2 1 2 2 3\n"
    "4 4 4\n"
    "3 0 0\n2 0 0\n2 3 0\n1 0 0\n1 3 0\n1 2 0\n1 2 3\n"
    "4 5 6 7\n2 3 6 7\n1 3 5 7\n";

std::string replaced(std::string text, const std::string& old, const std::string& by) {
  const std::size_t at = text.find(old);
  EXPECT_NE(at, std::string::npos) << old;
  return text.replace(at, old.size(), by);
}

std::string refused(const std::string& list, const field::Field& field = field::Field::binary()) {
  return refusal("h.txt", list, field);
}

TEST(SparseList, Hamming) {
  const FileMatrix read = good("h.txt", hamming_list, field::Field::binary());
  EXPECT_EQ(read.matrix, hamming());
  EXPECT_EQ(read.format, "sparse-list");
  EXPECT_EQ(read.row_lines, (std::vector<int>{12, 13, 14}));
  EXPECT_TRUE(read.notices.empty()) << joined(read.notices);
  EXPECT_EQ(write_matrix(field::Field::binary(), hamming(), Layout::sparse_list), hamming_list);
}

TEST(SparseList, BlanksAndOrderDoNotMatter) {
  std::string list = replaced(hamming_list, "4 5 6 7\n", " 7  4\t5 6 \r\n");
  EXPECT_EQ(good("h.alist", list + "\n \n", field::Field::binary()).matrix, hamming());
}

TEST(SparseList, MissingPadding) {
  std::string list = replaced(hamming_list, "3 0 0\n2 0 0\n2 3 0", "3\n2 0\n2 3");
  const FileMatrix read = good("h.txt", list, field::Field::binary());
  EXPECT_EQ(read.matrix, hamming());
  EXPECT_NE(joined(read.notices).find("not filled up with zeros"), std::string::npos);
}

TEST(SparseList, EmptyListWithoutPadding) {
  const FileMatrix read = good("h.txt", "3 2\n1 2\n1 0 1\n2 0\n1\n\n1\n1 3\n\n", field::Field::binary());
  EXPECT_EQ(read.matrix, matrix_of({{1, 0, 1}, {0, 0, 0}}));
  EXPECT_NE(refused("3 2\n1 2\n1 0 1\n2 0\n1\n\n1\n1 3\n").find("h.txt:8: the file ends"), std::string::npos);
}

TEST(SparseList, Values) {
  const std::string list = "3 2 8\n2 2\n1 2 1\n2 2\n1 5 0 0\n1 7 2 1\n2 3\n1 5 2 7\n2 1 3 3\n";
  const FileMatrix read = good("h.txt", list, field_of_8());
  EXPECT_EQ(read.matrix, matrix_of({{5, 7, 0}, {0, 1, 3}}));
  EXPECT_NE(joined(read.notices).find("not as exponents"), std::string::npos);
  EXPECT_NE(refused(list, prime_field(3)).find("h.txt:1: the list is over GF(8), the sheet over GF(3)"),
            std::string::npos);
  EXPECT_NE(refused(replaced(list, "1 5 2 7", "1 5 2 6"), field_of_8())
                .find("h.txt:8: the halves disagree: row 1 gives column 2 the value 6, but column 2 (line 6) gives row "
                      "1 the value 7"),
            std::string::npos);
  EXPECT_NE(refused(replaced(list, "1 5 0 0", "1 5 0"), field_of_8()).find("column 1: 3 numbers are not pairs"),
            std::string::npos);
  EXPECT_NE(refused(replaced(list, "1 5 0 0", "1 0 0 0"), field_of_8()).find("the position 1 has the value 0"),
            std::string::npos);
  EXPECT_NE(refused(replaced(list, "1 5 0 0", "1 9 0 0"), field_of_8()).find("\"9\" is not an element of GF(8)"),
            std::string::npos);
}

TEST(SparseList, WithoutValuesOverALargerField) {
  const FileMatrix read = good("h.txt", hamming_list, prime_field(3));
  EXPECT_EQ(read.matrix, hamming());
  EXPECT_NE(joined(read.notices).find("every entry was read as 1"), std::string::npos);
}

TEST(SparseList, TheOtherWayRound) {
  const std::string sizes = refused(replaced(hamming_list, "7 3\n", "3 7\n"));
  EXPECT_NE(sizes.find("h.txt:1: the numbers of columns and of rows only fit the other way round"), std::string::npos);
  EXPECT_NE(sizes.find("exchange the two numbers of line 1"), std::string::npos);
  EXPECT_NE(refused(replaced(hamming_list, "3 4\n", "4 3\n")).find("h.txt:2: the largest column weight"),
            std::string::npos);
  EXPECT_NE(refused(replaced(hamming_list, "7 3\n3 4\n", "3 7\n4 3\n")).find("and so do"), std::string::npos);
  const std::string transposed = write_matrix(field::Field::binary(), field::transpose(hamming()), Layout::sparse_list);
  const FileMatrix read = good("h.txt", transposed, field::Field::binary());
  EXPECT_EQ(read.matrix, field::transpose(hamming()));
  EXPECT_NE(joined(read.notices).find("more rows (7) than columns (3)"), std::string::npos);
}

TEST(SparseList, HalvesThatDisagree) {
  EXPECT_NE(refused(replaced(hamming_list, "2 3 6 7", "2 4 6 7"))
                .find("h.txt:13: the halves disagree: row 2 does not list column 3, but column 3 (line 7) lists row 2"),
            std::string::npos);
  EXPECT_NE(refused(replaced(replaced(hamming_list, "1 1 2 1", "1 1 1 1"), "2 3 0", "3 0 0"))
                .find("h.txt:13: the halves disagree: row 2 lists column 3, but column 3 (line 7) does not list row 2"),
            std::string::npos);
}

TEST(SparseList, Damage) {
  const std::pair<std::pair<const char*, const char*>, const char*> table[] = {
      {{"4 4 4\n", "4 4\n"}, "h.txt:4: this line holds 2 numbers, expected are the weights of the 3 rows"},
      {{"1 1 2 1 2 2 3", "1 1 2 1 2 2 3 1"}, "h.txt:3: this line holds more than 7 numbers"},
      {{"1 1 2 1 2 2 3", "1 1 2 1 2 2 2"}, "h.txt:3: the largest column weight is 2 here and 3 in line 2"},
      {{"7 3\n3 4", "7 3\n4 4"}, "h.txt:2: the largest column weight is 4, but a column has 3 entries"},
      {{"1 1 2 1", "1 1 2 x"}, "h.txt:3: \"x\" is not a number"},
      {{"3 0 0", "4 0 0"}, "h.txt:5: column 1: \"4\" is not the number of a row"},
      {{"3 0 0", "-3 0 0"}, "h.txt:5: column 1: \"-3\" is not the number of a row"},
      {{"3 0 0", "0 3 0"}, "h.txt:5: column 1: an entry follows the zeros"},
      {{"3 0 0", "3 1 0"}, "h.txt:5: column 1 lists 2 entries, its weight in line 3 is 1"},
      {{"3 0 0", "3 0 0 0"}, "h.txt:5: column 1 lists more than 3 entries"},
      {{"2 3 0", "2 2 0"}, "h.txt:7: column 3 lists row 2 twice"},
      {{"1 3 5 7\n", "1 3 5 7\n1\n"}, "h.txt:15: text follows"},
      {{"1 3 5 7\n", ""}, "h.txt:13: the file ends after this line: the list of row 3 is missing"},
  };
  for (const auto& [edit, wanted] : table) {
    const std::string message = refused(replaced(hamming_list, edit.first, edit.second));
    EXPECT_NE(message.find(wanted), std::string::npos) << message;
    EXPECT_NE(message.find("if this is no sparse list"), std::string::npos) << message;
  }
}

TEST(SparseList, HugeSizesCostNothing) {
  EXPECT_NE(refused("1048576 128\n3 4\n1\n").find("h.txt:3: this line holds 1 numbers"), std::string::npos);
  EXPECT_NE(refused("1048576 129\n3 4\n1\n").find("is too large"), std::string::npos);
  EXPECT_NE(refused("9999999999999999999999 3\n3 4\n").find("is not"), std::string::npos);
}

}  // namespace
}  // namespace assize::sheet
