// Magic, version, length, and a dictionary of exactly three entries in the notation of Python (NEP 1, 2007).
//
// Only the literals that writers really produce are taken: quoted words, True, False, tuples of decimal numbers.
#include "sheet/npy_header.hpp"

#include <array>

#include "base/integers.hpp"

namespace assize::sheet {

namespace {

constexpr std::size_t length_at = 8;

/// Walks through the dictionary.
class Dictionary {
 public:
  Dictionary(const MatrixSource& source, std::size_t begin, std::size_t end)
      : source_(source), at_(begin), text_(source.bytes.substr(0, end)) {}
  Result<void> read(NpyHeader& header);

 private:
  [[nodiscard]] Failure failure(std::size_t byte, const std::string& what) const {
    return source_.at_byte(byte, what,
                           "a header is, for example: {'descr': '|u1', 'fortran_order': False, 'shape': (3, 7), }");
  }
  void skip_blanks() {
    while (at_ < text_.size() && text_[at_] == ' ') ++at_;
  }
  bool take(std::string_view word) {
    skip_blanks();
    if (!text_.substr(at_).starts_with(word)) return false;
    at_ += word.size();
    return true;
  }
  Result<void> expect(std::string_view word) {
    if (take(word)) return {};
    return failure(at_, "the header lacks " + in_quotes(word) + " here");
  }
  Result<std::string> word();
  Result<void> read_entry(const std::string& key, NpyHeader& header);
  Result<void> read_type(NpyHeader& header);
  Result<void> read_shape(NpyHeader& header);

  const MatrixSource& source_;
  std::size_t at_;
  std::string_view text_;
};

Result<std::string> Dictionary::word() {
  skip_blanks();
  const std::size_t begin = at_;
  if (at_ == text_.size() || (text_[at_] != '\'' && text_[at_] != '"'))
    return failure(begin, "the header lacks a word in quotation marks here");
  const std::size_t end = text_.find(text_[at_], at_ + 1);
  if (end == std::string_view::npos) return failure(begin, "the quotation mark is not closed");
  at_ = end + 1;
  return std::string(text_.substr(begin + 1, end - begin - 1));
}

Result<void> Dictionary::read_type(NpyHeader& header) {
  skip_blanks();
  const std::size_t begin = at_;
  const std::string cure = source_.field.order() <= 256 ? "save it as integers: array.astype(\"uint8\")"
                                                        : "save it as integers: array.astype(\"uint16\")";
  if (take("[")) return source_.at_byte(begin, "the array holds records, not numbers", cure);
  const auto type = word();
  if (!type) return type.error();
  const auto has = [&type](std::string_view orders, std::string_view kinds, std::string_view widths) {
    return type->size() == 3 && orders.find((*type)[0]) != std::string_view::npos &&
           kinds.find((*type)[1]) != std::string_view::npos && widths.find((*type)[2]) != std::string_view::npos;
  };
  if (!has("|", "biu", "1") && !has("<>", "iu", "248"))
    return source_.at_byte(begin, "entries of type " + in_quotes(*type) + " are not read", cure);
  header.byte_order = (*type)[0];
  header.kind = (*type)[1];
  header.width = static_cast<std::size_t>((*type)[2] - '0');
  return {};
}

Result<void> Dictionary::read_shape(NpyHeader& header) {
  skip_blanks();
  const std::size_t begin = at_;
  if (const auto open = expect("("); !open) return open.error();
  std::vector<std::uint64_t> shape;
  while (!take(")")) {
    skip_blanks();
    std::size_t end = at_;
    while (end < text_.size() && text_[end] >= '0' && text_[end] <= '9') ++end;
    const auto number = parse_decimal(text_.substr(at_, end - at_));
    if (!number) return failure(at_, "the shape lacks a number here");
    shape.push_back(*number);
    at_ = end;
    if (take(",")) continue;
    if (const auto close = expect(")"); !close) return close.error();
    break;
  }
  if (shape.size() != 2)
    return source_.at_byte(begin, "the array has " + std::to_string(shape.size()) + " dimensions, a matrix has 2",
                           "save it as a matrix: array.reshape(rows, columns)");
  header.rows = shape[0];
  header.columns = shape[1];
  if (const auto objection = size_objection(shape[0], shape[1])) return source_.at_byte(begin, *objection, size_cure());
  return {};
}

Result<void> Dictionary::read_entry(const std::string& key, NpyHeader& header) {
  if (key == "descr") return read_type(header);
  if (key == "shape") return read_shape(header);
  header.fortran_order = take("True");
  if (!header.fortran_order && !take("False")) return failure(at_, "fortran_order is neither True nor False");
  return {};
}

Result<void> Dictionary::read(NpyHeader& header) {
  constexpr std::array<std::string_view, 3> keys{"descr", "fortran_order", "shape"};
  std::array<bool, 3> seen{};
  if (const auto open = expect("{"); !open) return open.error();
  while (!take("}")) {
    skip_blanks();
    const std::size_t begin = at_;
    const auto key = word();
    if (!key) return key.error();
    std::size_t which = 0;
    while (which < keys.size() && keys[which] != *key) ++which;
    if (which == keys.size()) return failure(begin, "the header has a foreign key " + in_quotes(*key));
    if (seen[which]) return failure(begin, "the header has the key " + in_quotes(*key) + " twice");
    seen[which] = true;
    if (const auto colon = expect(":"); !colon) return colon.error();
    if (const auto entry = read_entry(*key, header); !entry) return entry.error();
    if (take(",")) continue;
    if (const auto close = expect("}"); !close) return close.error();
    break;
  }
  for (std::size_t i = 0; i < keys.size(); ++i)
    if (!seen[i]) return failure(at_, "the header lacks the key " + in_quotes(keys[i]));
  skip_blanks();
  if (text_.substr(at_) != "\n") return failure(at_, "the header does not end with blanks and one line end");
  return {};
}

}  // namespace

Result<NpyHeader> read_npy_header(const MatrixSource& source) {
  const std::string_view bytes = source.bytes;
  const std::string complete = "check that the file is complete";
  if (!bytes.starts_with("\x93NUMPY"))
    return source.at_byte(0, "the file does not begin with the six bytes of an array file (93 NUMPY)",
                          "name the format in the sheet: layout = \"text\", or one of " + layout_names());
  if (bytes.size() < length_at) return source.at_byte(bytes.size(), "the file ends inside the header", complete);
  const auto byte = [bytes](std::size_t i) { return static_cast<unsigned char>(bytes[i]); };
  if ((byte(6) != 1 && byte(6) != 2) || byte(7) != 0)
    return source.at_byte(6, "version " + std::to_string(byte(6)) + "." + std::to_string(byte(7)) + " is not read",
                          "save the array in version 1.0 or 2.0");
  const std::size_t begin = length_at + (byte(6) == 1 ? 2U : 4U);
  if (bytes.size() < begin) return source.at_byte(bytes.size(), "the file ends inside the header", complete);
  std::size_t length = 0;
  for (std::size_t i = begin; i-- > length_at;) length = length * 256 + byte(i);
  if (length > bytes.size() - begin)
    return source.at_byte(length_at,
                          "the header is stated to have " + std::to_string(length) + " bytes, " +
                              std::to_string(bytes.size() - begin) + " follow",
                          complete);
  NpyHeader header;
  header.data_begin = begin + length;
  if (const auto read = Dictionary(source, begin, header.data_begin).read(header); !read) return read.error();
  return header;
}

}  // namespace assize::sheet
