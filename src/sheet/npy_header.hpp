// The header of an array file: what follows it, and where.  Numbers of bytes count from 0.
#pragma once
#include "sheet/matrix_source.hpp"

namespace assize::sheet {

struct NpyHeader {
  char byte_order = '|';  ///< '<' little endian, '>' big endian, '|' single bytes
  char kind = 'u';        ///< 'b' truth values, 'i' signed, 'u' unsigned
  std::size_t width = 1;  ///< bytes of an entry
  bool fortran_order = false;
  std::uint64_t rows = 0;
  std::uint64_t columns = 0;
  std::size_t data_begin = 0;
};

Result<NpyHeader> read_npy_header(const MatrixSource& source);

}  // namespace assize::sheet
