// A matrix file takes the place of the list of rows; what was noticed about it travels along for `show`.
#include "sheet/rows_from_file.hpp"

#include <algorithm>

#include "sheet/matrix_file.hpp"

namespace assize::sheet {

namespace {

Result<std::optional<Layout>> stated_layout(TableReader& table) {
  if (!table.has("layout")) return std::optional<Layout>();
  const auto name = table.string("layout", "layout = \"sparse-list\"");
  if (!name) return name.error();
  const auto layout = find_layout(name->value);
  if (!layout)
    return table.failure(name->line, "\"" + name->value + "\" is not a layout", "write one of " + layout_names());
  return std::optional<Layout>(layout);
}

}  // namespace

Result<std::optional<MatrixRows>> rows_from_file(TableReader& table, const Context& context,
                                                 const field::Field& field) {
  const Node* rows = table.optional("rows");
  const Node* file = table.optional("file");
  const Node* stated = table.optional("layout");
  if (rows != nullptr && file != nullptr)
    return table.failure(std::max(rows->line, file->line), "rows and file are both given",
                         "keep one: rows holds the matrix, file names a file that holds it");
  if (file == nullptr && stated != nullptr)
    return table.failure(stated->line, "layout says how a matrix file is written, but no file is named",
                         "add file = \"matrix.txt\", or delete layout");
  if (file == nullptr) return std::optional<MatrixRows>();
  const auto name = table.string("file", "file = \"matrix.txt\"");
  if (!name) return name.error();
  const auto layout = stated_layout(table);
  if (!layout) return layout.error();
  const auto fetched = (*context.fetch)(name->value, context.source);
  if (!fetched)
    return table.failure(name->line, "the matrix file " + fetched.error().where + ": " + fetched.error().what,
                         fetched.error().cure);
  const auto read = read_matrix_file(fetched->source, fetched->bytes, field, *layout);
  if (!read) return read.error();
  MatrixRows out;
  for (std::size_t i = 0; i < read->matrix.rows(); ++i) {
    const auto row = read->matrix.row(i);
    out.rows.push_back({Elements(row.begin(), row.end()), name->line});
  }
  out.file = name->value;
  out.file_layout = read->format;
  out.notices = read->notices;
  return std::optional<MatrixRows>(std::move(out));
}

}  // namespace assize::sheet
