// A file that was cut off is refused, or read as what is left of it; never as another matrix without a word.
#include <algorithm>

#include "sheet/matrix_support.hpp"

namespace assize::sheet {
namespace {

struct Case {
  field::Field field;
  field::Matrix matrix;
};

std::vector<Case> cases() {
  std::vector<Case> out{{prime_field(2), hamming()}};
  for (const field::Field& field : {prime_field(3), field_of_8(), prime_field(257)})
    out.push_back({field, scattered(4, 12, field.order())});
  return out;
}

bool begins_with(const field::Matrix& whole, const field::Matrix& rows) {
  if (rows.columns() != whole.columns() || rows.rows() > whole.rows()) return false;
  for (std::size_t i = 0; i < rows.rows(); ++i)
    if (!std::ranges::equal(rows.row(i), whole.row(i))) return false;
  return true;
}

class Truncation : public testing::TestWithParam<Layout> {};

TEST_P(Truncation, AtEveryByte) {
  const Layout layout = GetParam();
  const bool by_rows = layout == Layout::text || layout == Layout::csv;
  for (const Case& each : cases()) {
    const std::string bytes = write_matrix(each.field, each.matrix, layout);
    for (std::size_t length = 0; length < bytes.size(); ++length) {
      SCOPED_TRACE(std::to_string(length) + " of " + std::to_string(bytes.size()) + " bytes, GF(" +
                   std::to_string(each.field.order()) + ")");
      const auto read = read_matrix_file("m.dat", std::string_view(bytes).substr(0, length), each.field, layout);
      if (!read) {
        EXPECT_FALSE(read.error().what.empty() || read.error().cure.empty());
        continue;
      }
      if (read->matrix == each.matrix || !read->notices.empty()) continue;
      ASSERT_TRUE(by_rows);
      // A shorter first row has nothing to be compared with; all else must be whole rows.
      EXPECT_TRUE(read->matrix.rows() == 1 || begins_with(each.matrix, read->matrix));
    }
  }
}

TEST_P(Truncation, RecognisedFilesNeverChange) {
  const Layout layout = GetParam();
  const field::Field& binary = field::Field::binary();
  const std::string bytes = write_matrix(binary, hamming(), layout);
  for (std::size_t length = 0; length < bytes.size(); ++length) {
    const auto read = read_matrix_file("m.dat", std::string_view(bytes).substr(0, length), binary);
    if (!read || read->matrix == hamming() || read->matrix.rows() == 1) continue;
    EXPECT_TRUE(begins_with(hamming(), read->matrix)) << length;
  }
}

TEST_P(Truncation, DamagedBytesAreNoDanger) {
  const Layout layout = GetParam();
  for (const Case& each : cases()) {
    const std::string bytes = write_matrix(each.field, each.matrix, layout);
    for (std::size_t at = 0; at < bytes.size(); ++at)
      for (const char damage : {'\0', '9', ' ', '\n', ',', '-', '\xff'}) {
        std::string damaged = bytes;
        damaged[at] = damage;
        for (const auto& as : {std::optional<Layout>(), std::optional<Layout>(layout)}) {
          const auto read = read_matrix_file("m.dat", damaged, each.field, as);
          if (read) {
            EXPECT_EQ(read->row_lines.size(), read->matrix.rows());
          } else {
            EXPECT_FALSE(read.error().where.empty() || read.error().what.empty());
          }
        }
      }
  }
}

INSTANTIATE_TEST_SUITE_P(MatrixFile, Truncation, testing::ValuesIn(every_layout), [](const auto& each) {
  std::string name(layout_name(each.param));
  std::erase(name, '-');
  return name;
});

}  // namespace
}  // namespace assize::sheet
