// Array files: the numbers after the header, whichever their width, byte order and order of the axes.
#include "sheet/matrix_readers.hpp"
#include "sheet/npy_header.hpp"

namespace assize::sheet {

namespace {

/// The entry at `begin` as it was meant, with its sign apart.
struct Number {
  bool negative = false;
  std::uint64_t magnitude = 0;
};

Number number_at(std::string_view bytes, std::size_t begin, const NpyHeader& header) {
  std::uint64_t value = 0;
  for (std::size_t i = 0; i < header.width; ++i) {
    const std::size_t offset = header.byte_order == '>' ? i : header.width - 1 - i;
    value = value << 8 | static_cast<unsigned char>(bytes[begin + offset]);
  }
  const std::uint64_t sign = 1ULL << (8 * header.width - 1);
  if (header.kind != 'i' || (value & sign) == 0) return {false, value};
  return {true, sign - (value & (sign - 1))};  // two's complement
}

std::string spelled(const Number& number) { return (number.negative ? "-" : "") + std::to_string(number.magnitude); }

}  // namespace

Result<FileMatrix> read_npy(const MatrixSource& source) {
  const auto header = read_npy_header(source);
  if (!header) return header.error();
  const std::uint64_t count = header->rows * header->columns;  // at most largest_matrix
  const std::uint64_t wanted = count * header->width;
  const std::uint64_t present = source.bytes.size() - header->data_begin;
  if (wanted != present)
    return source.at_byte(header->data_begin,
                          std::to_string(header->rows) + " x " + std::to_string(header->columns) + " entries of " +
                              std::to_string(header->width) + " bytes are " + std::to_string(wanted) + " bytes, " +
                              std::to_string(present) + " follow the header",
                          "save the array again: the file was cut off or something was added to it");
  FileMatrix out;
  out.matrix = field::Matrix(header->rows, header->columns);
  out.row_lines.assign(header->rows, 0);
  for (std::uint64_t i = 0; i < count; ++i) {
    const std::size_t begin = header->data_begin + i * header->width;
    const std::uint64_t row = header->fortran_order ? i % header->rows : i / header->columns;
    const std::uint64_t column = header->fortran_order ? i / header->rows : i % header->columns;
    const Number number = number_at(source.bytes, begin, *header);
    const auto place = [row, column] {
      return "row " + std::to_string(row + 1) + ", column " + std::to_string(column + 1) + ": ";
    };
    if (header->kind == 'b' && number.magnitude > 1)
      return source.at_byte(begin, place() + spelled(number) + " is not a truth value", "truth values are 0 and 1");
    if (number.negative || !source.field.contains(number.magnitude))
      return source.at_byte(
          begin, place() + spelled(number) + " is not an element of GF(" + std::to_string(source.field.order()) + ")",
          "elements are here the numbers 0 to " + std::to_string(source.field.order() - 1));
    out.matrix.at(row, column) = static_cast<Element>(number.magnitude);
  }
  return out;
}

}  // namespace assize::sheet
