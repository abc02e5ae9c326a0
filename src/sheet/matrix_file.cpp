// Chooses the reader of a matrix file.
#include "sheet/matrix_file.hpp"

#include "sheet/matrix_readers.hpp"
#include "sheet/recognise_layout.hpp"

namespace assize::sheet {

namespace {

Result<FileMatrix> read_as(const MatrixSource& source, Layout layout) {
  switch (layout) {
    case Layout::text:
      return read_text_matrix(source);
    case Layout::csv:
      return read_csv_matrix(source);
    case Layout::matrix_market:
      return read_matrix_market(source);
    case Layout::sparse_list:
      return read_sparse_list(source);
    case Layout::npy:
      return read_npy(source);
  }
  return Failure{source.name, "there is no such layout", ""};
}

}  // namespace

Result<FileMatrix> read_matrix_file(const std::string& name, std::string_view bytes, const field::Field& field) {
  return read_matrix_file(name, bytes, field, std::nullopt);
}

Result<FileMatrix> read_matrix_file(const std::string& name, std::string_view bytes, const field::Field& field,
                                    std::optional<Layout> layout) {
  const MatrixSource source{name, bytes, field};
  if (bytes.empty()) return Failure{name, "the file is empty", "check the name of the file"};
  if (bytes.size() > largest_matrix_file)
    return Failure{name, "the file is larger than " + std::to_string(largest_matrix_file) + " bytes", size_cure()};
  bool doubtful = false;
  if (!layout) {
    const auto recognised = recognise_layout(source);
    if (!recognised) return recognised.error();
    layout = recognised->layout;
    doubtful = *layout == Layout::sparse_list && !recognised->by_ending;
  }
  auto read = read_as(source, *layout);
  if (!read) {
    Failure failure = read.error();
    if (doubtful) failure.cure += "; if this is no sparse list, name the format in the sheet: layout = \"text\"";
    return failure;
  }
  read->format = std::string(layout_name(*layout));
  return read;
}

}  // namespace assize::sheet
