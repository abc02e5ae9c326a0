// The keys `file` and `layout`: how a sheet names a matrix file, and what becomes of it.
#include <map>

#include "sheet/canonical.hpp"
#include "sheet/explain.hpp"
#include "sheet/matrix_support.hpp"
#include "sheet/read_sheet.hpp"

namespace assize::sheet {
namespace {

Result<Description> read_with_files(const std::string& code) {
  const std::map<std::string, std::string> files = {
      {"m.txt", "# main rope\n0001111\n0110011\n1010101\n"},
      {"list", "7 3\n3 4\n1 1 2 1 2 2 3\n4 4 4\n3\n2\n2 3\n1\n1 3\n1 2\n1 2 3\n4 5 6 7\n2 3 6 7\n1 3 5 7\n"},
      {"bad.txt", "101\n012\n"},
  };
  const Fetch fetch = [&files](const std::string& name, const std::string& from) -> Result<Fetched> {
    EXPECT_EQ(from, "sheets/t.toml");
    const auto found = files.find(name);
    if (found == files.end()) return Failure{"sheets/" + name, "there is no such file", "check the name"};
    return Fetched{"sheets/" + name, found->second};
  };
  return read_sheet("[code]\nfamily = \"parity-check-matrix\"\n" + code, "sheets/t.toml", fetch);
}

std::string message(const std::string& code) {
  const auto read = read_with_files(code);
  EXPECT_FALSE(read) << "was accepted";
  return read ? "" : read.error().where + ": " + read.error().what + "; " + read.error().cure;
}

TEST(MatrixInSheet, SameAsRows) {
  const auto from_file = read_with_files("file = \"m.txt\"\n");
  const auto from_rows = read_with_files("rows = [\"0001111\", \"0110011\", \"1010101\"]\n");
  ASSERT_TRUE(from_file && from_rows) << from_file.error().what;
  EXPECT_EQ(to_json(*from_file), to_json(*from_rows));
  const auto& family = std::get<MatrixRows>(from_file->family);
  EXPECT_TRUE(family.parity_check);
  EXPECT_EQ(family.rows.front().line, 3);
  EXPECT_EQ(family.file, "m.txt");
  EXPECT_EQ(family.file_layout, "text");
}

TEST(MatrixInSheet, IsExplained) {
  const auto read = read_with_files("file = \"list\"\nlayout = \"sparse-list\"\n");
  ASSERT_TRUE(read) << read.error().what;
  std::string text;
  for (const auto& [name, value] : explain(*read)) text += name + ": " + value + "\n";
  EXPECT_NE(text.find("matrix file: list, read as sparse-list\nsome lists are shorter"), std::string::npos) << text;
}

TEST(MatrixInSheet, Refusals) {
  EXPECT_EQ(message("rows = [\"101\"]\nfile = \"m.txt\"\n"),
            "sheets/t.toml:4: rows and file are both given; keep one: rows holds the matrix, file names a file that "
            "holds it");
  EXPECT_EQ(message(""),
            "sheets/t.toml:1: [code] lacks the key \"rows\"; write, for example: rows = [\"1 0 1\", \"0 1 1\"] or file "
            "= \"matrix.txt\"");
  EXPECT_NE(message("rows = [\"101\"]\nlayout = \"text\"\n").find("sheets/t.toml:4: layout says"), std::string::npos);
  EXPECT_NE(message("layout = \"text\"\n").find("add file = \"matrix.txt\""), std::string::npos);
  EXPECT_NE(message("file = 3\n").find("sheets/t.toml:3: \"file\" is an integer"), std::string::npos);
  EXPECT_NE(
      message("file = \"m.txt\"\nlayout = \"tsv\"\n")
          .find("sheets/t.toml:4: \"tsv\" is not a layout; write one of text, csv, matrix-market, sparse-list, npy"),
      std::string::npos);
  EXPECT_EQ(message("file = \"other.txt\"\n"),
            "sheets/t.toml:3: the matrix file sheets/other.txt: there is no such file; check the name");
  EXPECT_NE(message("file = \"bad.txt\"\n").find("sheets/bad.txt:2: row 2, column 3: \"2\""), std::string::npos);
  EXPECT_NE(message("file = \"m.txt\"\nlayout = \"npy\"\n").find("sheets/m.txt, byte 0"), std::string::npos);
}

}  // namespace
}  // namespace assize::sheet
