// The readers that a sheet is made of; private to this room.
#pragma once
#include "sheet/description.hpp"
#include "sheet/document.hpp"
#include "sheet/read_sheet.hpp"
#include "sheet/table_reader.hpp"

namespace assize::sheet {

/// How deep sub-sheets may be nested.
inline constexpr int deepest_nesting = 8;
/// How many sub-sheets there may be in all.
inline constexpr int most_sheets = 4096;

/// What readers of nested tables need to know of the whole.
struct Context {
  std::string source;
  const Fetch* fetch;
  int* sheets_left;  ///< how many more sub-sheets may be read in all
  int depth = 0;
};

/// A sheet or sub-sheet: keys title, field, code, then.
Result<Description> read_description(const Table& table, int line, const Context& context);

/// The table [field], or one of its shape.
Result<field::Field> read_field(const Node& node, const std::string& source);

/// The table [code]; `description` already has its field.
Result<Family> read_family(const Table& table, int line, const Context& context, Description& description);

/// The array [[then]]; elements of bases are read over the field that the words have at that step.
Result<std::vector<Step>> read_steps(const Node& node, const field::Field& words, const std::string& source);

/// A list of distinct positions under `key`, in the order written; that they exist is checked where the length is
/// known.
Result<std::vector<std::uint32_t>> read_positions(TableReader& table, std::string_view key);

/// The array [[symmetry]]; multipliers are read over the field of the finished words.
Result<std::vector<StatedSymmetry>> read_symmetries(const Node& node, const field::Field& words,
                                                    const std::string& source);

/// The table [transmission].
Result<Transmission> read_transmission(const Node& node, const std::string& source);

/// The field of the words of a family before any step, given [field].
field::Field family_field(const Family& family, const field::Field& field);

}  // namespace assize::sheet
