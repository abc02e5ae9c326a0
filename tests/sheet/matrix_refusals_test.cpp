// Malformed matrix files: each is refused at its place, with what stands there and what to do.
#include "sheet/matrix_support.hpp"

namespace assize::sheet {
namespace {

struct Refusal {
  const char* name;
  const char* file;
  std::uint32_t order;
  std::string bytes;
  const char* where;
  const char* what;  ///< part of the message
  const char* cure;  ///< part of the cure
};

void PrintTo(const Refusal& refusal, std::ostream* out) { *out << refusal.name; }

class MatrixRefusals : public testing::TestWithParam<Refusal> {};

TEST_P(MatrixRefusals, NameThePlaceAndTheCure) {
  const Refusal& wanted = GetParam();
  const auto read = read_matrix_file(wanted.file, wanted.bytes, prime_field(wanted.order));
  ASSERT_FALSE(read) << "was accepted as " << read->format;
  EXPECT_EQ(read.error().where, wanted.where);
  EXPECT_NE(read.error().what.find(wanted.what), std::string::npos) << read.error().what;
  EXPECT_NE(read.error().cure.find(wanted.cure), std::string::npos) << read.error().cure;
  EXPECT_FALSE(read.error().cure.empty());
}

const std::string market = "%%MatrixMarket matrix coordinate integer general\n";
const std::string columns_too_many(std::size_t{1} << 21, '1');

const Refusal text_refusals[] = {
    {"Empty", "m.txt", 2, "", "m.txt", "the file is empty", "name"},
    {"NoRow", "m.txt", 2, "# nothing\n\n", "m.txt", "holds no row", "one row"},
    {"Mark", "m.txt", 2,
     "\xef\xbb\xbf"
     "101\n",
     "m.txt:1", "byte order mark", "plain UTF-8"},
    {"ZeroByte", "m.txt", 2, std::string("101\n1\0", 6), "m.txt:2", "zero byte", "plain text"},
    {"LoneReturn", "m.txt", 2, "101\r011\r", "m.txt:1", "carriage return", "line feed"},
    {"Ragged", "m.txt", 2, "101\n\n0110\n", "m.txt:3", "row 2 has 4 symbols, row 1 (line 1) has 3", "same length"},
    {"Foreign", "m.txt", 2, "101\n021\n", "m.txt:2", "row 2, column 2: \"2\" is not an element of GF(2)", "[field]"},
    {"Grouped", "m.txt", 2, "101 110\n", "m.txt:1", "101 is not an element", "all bits of the row by blanks, or none"},
    {"OutOfRange", "m.txt", 7, "1 2\n3 7\n", "m.txt:2", "row 2, column 2: 7 is not an element of GF(7)", "0 to 6"},
    {"Unseparated", "m.txt", 7, "123\n", "m.txt:1", "123 is not an element", "separated by blanks"},
    {"Negative", "m.txt", 7, "1 -2\n", "m.txt:1", "\"-2\" is not an element", "0 to 6"},
    {"Fraction", "m.txt", 7, "1 2.0\n", "m.txt:1", "\"2.0\" is not an element", "0 to 6"},
    {"LateComment", "m.txt", 7, "1 2 # cabin\n", "m.txt:1", "\"#\"", "line of its own"},
    {"Binary", "m.txt", 7,
     "\x7f"
     "ELF\x02\n",
     "m.txt:1", "\"?ELF?\" is not an element", "0 to 6"},
    {"LongWord", "m.txt", 7, std::string(5000, 'a'), "m.txt:1", "aaa...\" is not", "0 to 6"},
    {"Wide", "m.txt", 2, columns_too_many, "m.txt:1", "more than 1048576 symbols", "1048576 columns"},
    {"TwoColumnsRagged", "m.txt", 7, "1 2\n3 8\n1\n", "m.txt:2", "3", "layout = \"text\""},
    {"LateComma", "m.txt", 7, "1 2\n3,4\n", "m.txt:2", "\"3,4\"", "layout = \"csv\""},
};

const Refusal csv_refusals[] = {
    {"Header", "m.csv", 2, "c1,c2\n1,0\n", "m.csv:1", "\"c1\" is not an element", "header line, delete it"},
    {"QuotedHeader", "m.csv", 2, "\"c1\",\"c2\"\n", "m.csv:1", "is not an element", "header line, delete it"},
    {"Quotes", "m.csv", 2, "\"1\",\"0\"\n", "m.csv:1", "is not an element", "quotation marks"},
    {"Mixed", "m.csv", 3, "1,0;2\n", "m.csv:1", "mixed", "one of them"},
    {"EmptyField", "m.csv", 3, "1,0\n1,,0\n", "m.csv:2", "row 2, column 2: there is no symbol", "between"},
    {"LastComma", "m.csv", 3, "1,0,\n", "m.csv:1", "row 1, column 3: there is no symbol", "end of a line"},
    {"Ragged", "m.csv", 3, "1,0\n1\n", "m.csv:2", "row 2 has 1 symbols", "same length"},
    {"OutOfRange", "m.csv", 3, "1,3\n", "m.csv:1", "column 2: 3 is not an element", "0 to 2"},
    {"Blanks", "m.csv", 3, "1 0 2\n", "m.csv:1", "\"1 0 2\"", "layout = \"text\""},
};

const Refusal market_refusals[] = {
    {"NoBanner", "m.mtx", 2, "%%Matrix\n", "m.mtx:1", "does not begin with %%MatrixMarket", "for example"},
    {"ShortBanner", "m", 2, "%%MatrixMarket matrix\n", "m:1", "five words", "general"},
    {"Vector", "m", 2, "%%MatrixMarket vector array integer general\n", "m:1", "five words", "matrix"},
    {"Real", "m", 2, "%%MatrixMarket matrix coordinate real general\n", "m:1", "real numbers", "integer"},
    {"Complex", "m", 2, "%%MatrixMarket matrix array complex general\n", "m:1", "complex numbers", "integer"},
    {"Symmetric", "m", 2, "%%MatrixMarket matrix coordinate integer symmetric\n", "m:1", "\"symmetric\"", "general"},
    {"Skew", "m", 2, "%%MatrixMarket matrix coordinate integer skew-symmetric\n", "m:1", "only a part", "general"},
    {"PatternArray", "m", 2, "%%MatrixMarket matrix array pattern general\n", "m:1", "no pattern", "array integer"},
    {"Kind", "m", 2, "%%MatrixMarket matrix sparse integer general\n", "m:1", "neither coordinate nor", "example"},
    {"NoSizes", "m", 2, market + "% nothing\n", "m", "ends before", "rows, columns"},
    {"TwoSizes", "m", 2, market + "2 3\n", "m:2", "does not hold 3 numbers", "rows, columns"},
    {"BadSize", "m", 2, market + "2 3 1.0\n", "m:2", "\"1.0\" is not a number", "rows, columns"},
    {"NoRows", "m", 2, market + "0 3 0\n", "m:2", "empty", "at least 1 row"},
    {"TooWide", "m", 2, market + "1 1048577 0\n", "m:2", "columns are too many", "1048576"},
    {"TooLarge", "m", 2, market + "129 1048576 0\n", "m:2", "is too large", "134217728"},
    {"CountOfLies", "m", 2, market + "1000 1000 999999\n1 1 1\n", "m:2", "more than a file of this size", "complete"},
    {"TooFew", "m", 2, market + "2 3 3\n1 1 1\n2 2 1\n", "m:2", "3 entries are stated, 2 follow", "complete"},
    {"TooMany", "m", 2, market + "2 3 1\n1 1 1\n2 2 1\n", "m:4", "more than the stated 1", "line 2"},
    {"Twice", "m", 3, market + "2 3 3\n1 1 1\n2 2 1\n1 1 2\n", "m:5", "row 1, column 1 is given a second", "once"},
    {"FromZero", "m", 2, market + "2 3 1\n0 1 1\n", "m:3", "\"0\" is not the number of a row", "from 1 to 2"},
    {"Beyond", "m", 2, market + "2 3 1\n1 4 1\n", "m:3", "\"4\" is not the number of a column", "from 1 to 3"},
    {"Value", "m", 3, market + "2 3 1\n1 2 3\n", "m:3", "\"3\" is not an element of GF(3)", "0 to 2"},
    {"Minus", "m", 3, market + "2 3 1\n1 2 -1\n", "m:3", "\"-1\" is not an element", "0 to 2"},
    {"NoValue", "m", 3, market + "2 3 1\n1 2\n", "m:3", "is not an entry", "row column value"},
    {"ArrayShort", "m", 3, "%%MatrixMarket matrix array integer general\n2 2\n1\n0\n0\n", "m:2", "4 entries",
     "complete"},
    {"ArrayLong", "m", 3, "%%MatrixMarket matrix array integer general\n1 1\n1\n0\n", "m:4", "more than 1", "line 2"},
    {"ArrayLies", "m", 3, "%%MatrixMarket matrix array integer general\n9999 9999\n1\n", "m:2", "file of this",
     "check"},
    {"ArrayRow", "m", 3, "%%MatrixMarket matrix array integer general\n1 2\n1 2\n", "m:3", "several entries",
     "one entry a line"},
};

const Refusal npy_refusals[] = {
    {"NoMagic", "m.npy", 2, "101\n", "m.npy, byte 0", "does not begin", "layout = \"text\""},
    {"Cut", "m.npy", 2, "\x93NUMPY\x01", "m.npy, byte 7", "inside the header", "complete"},
    {"Version", "m", 2, std::string("\x93NUMPY\x03\0\x01\0\0\0\n", 13), "m, byte 6", "version 3.0", "1.0 or 2.0"},
    {"LongHeader", "m", 2, std::string("\x93NUMPY\x01\0\xff\xff{}", 12), "m, byte 8", "65535 bytes, 2 follow",
     "complete"},
    {"LongHeaderTwo", "m", 2, std::string("\x93NUMPY\x02\0\xff\xff\xff\xff{}", 14), "m, byte 8", "4294967295",
     "complete"},
    {"Float", "m", 2, npy_of("<f8", "(1, 1)", std::string(8, '\0')), "m, byte 20", "\"<f8\"", "astype(\"uint8\")"},
    {"WideField", "m", 257, npy_of("<f8", "(1, 1)", ""), "m, byte 20", "\"<f8\"", "astype(\"uint16\")"},
    {"Text", "m", 2, npy_of("<U1", "(1, 1)", "1"), "m, byte 20", "\"<U1\"", "astype"},
    {"Native", "m", 2, npy_of("=u2", "(1, 1)", "12"), "m, byte 20", "\"=u2\"", "astype"},
    {"Records", "m", 2, npy("{'descr': [('a', '<i4')], 'fortran_order': False, 'shape': (1, 1), }", ""), "m, byte 20",
     "records", "astype"},
    {"Vector", "m", 2, npy_of("|u1", "(3,)", "111"), "m, byte 60", "1 dimensions", "reshape"},
    {"Scalar", "m", 2, npy_of("|u1", "()", "1"), "m, byte 60", "0 dimensions", "reshape"},
    {"Cube", "m", 2, npy_of("|u1", "(1, 1, 1)", "1"), "m, byte 60", "3 dimensions", "reshape"},
    {"NoRows", "m", 2, npy_of("|u1", "(0, 3)", ""), "m, byte 60", "empty", "at least 1 row"},
    {"Huge", "m", 2, npy_of("|u1", "(18446744073709551615, 1048576)", ""), "m, byte 60", "too large", "134217728"},
    {"Overflow", "m", 2, npy_of("|u1", "(99999999999999999999, 2)", ""), "m, byte 61", "lacks a number", "example"},
    {"NegativeSize", "m", 2, npy_of("|u1", "(-1, 2)", ""), "m, byte 61", "lacks a number", "example"},
    {"Short", "m", 2, npy_of("|u1", "(2, 2)", std::string(3, '\0')), "m, byte 70", "4 bytes, 3 follow", "cut off"},
    {"Long", "m", 2, npy_of("|u1", "(2, 2)", std::string(5, '\0')), "m, byte 70", "4 bytes, 5 follow", "added"},
    {"Value", "m", 2, npy_of("|u1", "(2, 2)", std::string("\0\0\2\0", 4)), "m, byte 72", "row 2, column 1: 2 is",
     "0 to 1"},
    {"Minus", "m", 3, npy_of("|i1", "(1, 2)", "\1\xff"), "m, byte 71", "row 1, column 2: -1 is", "0 to 2"},
    {"Least", "m", 3, npy_of("<i8", "(1, 1)", std::string("\0\0\0\0\0\0\0\x80", 8)), "m, byte 70",
     "-9223372036854775808 is", "0 to 2"},
    {"Truth", "m", 3, npy_of("|b1", "(1, 1)", "\2"), "m, byte 70", "2 is not a truth value", "0 and 1"},
    {"Fortran", "m", 3, npy_of("|u1", "(1, 1)", "\1", "1"), "m, byte 44", "neither True nor False", "example"},
    {"NoDictionary", "m", 3, npy("[1]", ""), "m, byte 10", "lacks \"{\"", "example"},
    {"ForeignKey", "m", 3, npy("{'descr': '|u1', 'order': 1}", ""), "m, byte 27", "foreign key \"order\"", "example"},
    {"KeyTwice", "m", 3, npy("{'descr': '|u1', 'descr': '|u1'}", ""), "m, byte 27", "\"descr\" twice", "example"},
    {"KeyMissing", "m", 3, npy("{'descr': '|u1', 'shape': (1, 1)}", "1"), "m, byte 43", "\"fortran_order\"", "example"},
    {"OpenQuote", "m", 3, npy("{'descr", ""), "m, byte 11", "not closed", "example"},
    {"Rest", "m", 3, npy("{'descr': '|u1', 'fortran_order': False, 'shape': (1, 1)} x", "\1"), "m, byte 68",
     "one line end", "example"},
};

const auto name_of = [](const auto& each) { return std::string(each.param.name); };
INSTANTIATE_TEST_SUITE_P(Text, MatrixRefusals, testing::ValuesIn(text_refusals), name_of);
INSTANTIATE_TEST_SUITE_P(Csv, MatrixRefusals, testing::ValuesIn(csv_refusals), name_of);
INSTANTIATE_TEST_SUITE_P(MatrixMarket, MatrixRefusals, testing::ValuesIn(market_refusals), name_of);
INSTANTIATE_TEST_SUITE_P(Npy, MatrixRefusals, testing::ValuesIn(npy_refusals), name_of);

}  // namespace
}  // namespace assize::sheet
