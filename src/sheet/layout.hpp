// The ways in which a file may hold a matrix, and their names: the values of the key `layout`.
#pragma once
#include <optional>
#include <string>
#include <string_view>

namespace assize::sheet {

enum class Layout { text, csv, matrix_market, sparse_list, npy };

/// "text", "csv", "matrix-market", "sparse-list", "npy".
std::string_view layout_name(Layout layout) noexcept;
/// The inverse; nothing for any other name.
std::optional<Layout> find_layout(std::string_view name) noexcept;
/// All names with commas between, for messages.
std::string layout_names();

}  // namespace assize::sheet
