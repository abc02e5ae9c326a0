// Names of layouts; the order is that of messages.
#include "sheet/layout.hpp"

#include <array>

namespace assize::sheet {

namespace {

constexpr std::array all_layouts{Layout::text, Layout::csv, Layout::matrix_market, Layout::sparse_list, Layout::npy};

}  // namespace

std::string_view layout_name(Layout layout) noexcept {
  switch (layout) {
    case Layout::text:
      return "text";
    case Layout::csv:
      return "csv";
    case Layout::matrix_market:
      return "matrix-market";
    case Layout::sparse_list:
      return "sparse-list";
    case Layout::npy:
      return "npy";
  }
  return "";
}

std::optional<Layout> find_layout(std::string_view name) noexcept {
  for (const Layout layout : all_layouts)
    if (layout_name(layout) == name) return layout;
  return std::nullopt;
}

std::string layout_names() {
  std::string names;
  for (const Layout layout : all_layouts) names += (names.empty() ? "" : ", ") + std::string(layout_name(layout));
  return names;
}

}  // namespace assize::sheet
