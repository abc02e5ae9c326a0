// Fields, matrices and short calls for the tests of matrix files.
#pragma once
#include <gtest/gtest.h>

#include <array>
#include <string>
#include <vector>

#include "sheet/matrix_file.hpp"
#include "sheet/write_matrix.hpp"

namespace assize::sheet {

inline constexpr std::array every_layout{Layout::text, Layout::csv, Layout::matrix_market, Layout::sparse_list,
                                         Layout::npy};

inline field::Field prime_field(std::uint32_t order) { return *field::Field::prime(order); }

/// GF(8) with x^3 + x + 1.
inline field::Field field_of_8() {
  const std::vector<field::Element> modulus{1, 1, 0, 1};
  return *field::Field::create(8, modulus);
}

inline field::Matrix matrix_of(const std::vector<std::vector<field::Element>>& rows) {
  field::Matrix matrix(rows.size(), rows.front().size());
  for (std::size_t i = 0; i < rows.size(); ++i)
    for (std::size_t j = 0; j < rows[i].size(); ++j) matrix.at(i, j) = rows[i][j];
  return matrix;
}

/// Parity-check matrix of the (7,4) Hamming code, column j being j in binary (MacWilliams and Sloane 1977, chapter 1).
inline field::Matrix hamming() {
  return matrix_of({{0, 0, 0, 1, 1, 1, 1}, {0, 1, 1, 0, 0, 1, 1}, {1, 0, 1, 0, 1, 0, 1}});
}

/// Numbers that look irregular and are always the same; about a third of them 0.
inline field::Matrix scattered(std::size_t rows, std::size_t columns, std::uint32_t order) {
  field::Matrix matrix(rows, columns);
  std::uint32_t state = 1;
  for (std::size_t i = 0; i < rows; ++i)
    for (field::Element& entry : matrix.row(i)) {
      state = state * 1664525U + 1013904223U;
      entry = static_cast<field::Element>((state >> 8) % 3 == 0 ? 0 : (state >> 10) % order);
    }
  return matrix;
}

/// Reads a file that must be good.
inline FileMatrix good(const std::string& name, const std::string& bytes, const field::Field& field,
                       std::optional<Layout> layout = std::nullopt) {
  auto read = read_matrix_file(name, bytes, field, layout);
  EXPECT_TRUE(read) << read.error().where << ": " << read.error().what;
  return read ? *std::move(read) : FileMatrix{};
}

/// Reads a file that must be refused: "where: what; cure".
inline std::string refusal(const std::string& name, const std::string& bytes, const field::Field& field,
                           std::optional<Layout> layout = std::nullopt) {
  const auto read = read_matrix_file(name, bytes, field, layout);
  EXPECT_FALSE(read) << "was accepted as " << read->format;
  return read ? "" : read.error().where + ": " + read.error().what + "; " + read.error().cure;
}

inline std::string joined(const std::vector<std::string>& notices) {
  std::string text;
  for (const std::string& notice : notices) text += notice + "\n";
  return text;
}

/// An array file of version 1.0 with that dictionary.
inline std::string npy(const std::string& dictionary, const std::string& data) {
  const std::string header = dictionary + "\n";
  std::string out = "\x93NUMPY\x01";
  out += '\0';
  out += static_cast<char>(header.size());
  out += '\0';
  return out + header + data;
}

inline std::string npy_of(const std::string& type, const std::string& shape, const std::string& data,
                          const std::string& fortran = "False") {
  return npy("{'descr': '" + type + "', 'fortran_order': " + fortran + ", 'shape': " + shape + ", }", data);
}

}  // namespace assize::sheet
