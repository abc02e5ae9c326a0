// Families made of other codes: sub-sheets inline or by file name, one of them or one for each position.
#include "sheet/elements.hpp"
#include "sheet/family_reading.hpp"

namespace assize::sheet {

namespace {

/// A sub-sheet: a table of the shape of a sheet, or the name of another file.
Result<SubDescription> read_sub_sheet(Reading& in, const Node& node, std::string_view key) {
  Context inner = in.context;
  ++inner.depth;
  const auto share = [](Result<Description> read) -> Result<SubDescription> {
    if (!read) return read.error();
    return SubDescription(std::make_shared<const Description>(*std::move(read)));
  };
  if (const auto* table = std::get_if<Table>(&node.value)) return share(read_description(*table, node.line, inner));
  const auto* name = std::get_if<std::string>(&node.value);
  if (name == nullptr)
    return in.table.failure(node.line, std::string(key) + " is " + std::string(kind_of(node)),
                            "name a file, or write a table [code." + std::string(key) + ".code]");
  const auto fetched = (*in.context.fetch)(*name, in.context.source);
  if (!fetched)
    return in.table.failure(node.line, "the sub-sheet " + fetched.error().where + ": " + fetched.error().what,
                            fetched.error().cure);
  const auto document = parse_document(fetched->bytes, fetched->source);
  if (!document) return document.error();
  inner.source = fetched->source;
  return share(read_description(std::get<Table>(document->value), 1, inner));
}

Result<SubDescription> required_sub_sheet(Reading& in, std::string_view key) {
  const auto node = in.table.required(
      key, std::string(key) + " = \"" + std::string(key) + ".toml\", or a table [code." + std::string(key) + ".code]");
  if (!node) return node.error();
  return read_sub_sheet(in, **node, key);
}

/// The words of the parts are those of the whole.
Result<void> take_field(Reading& in, const field::Field& words) {
  if (in.description.field_stated && !(in.description.field == words))
    return in.table.failure(in.description.field_line, "[field] is not the field of the parts",
                            "leave [field] out: a code made of others has the field of its words");
  in.description.field = words;
  return {};
}

/// inner_by_position = [...]: sheets by name or inline, all over one field.
Result<std::vector<SubDescription>> read_inner_by_position(Reading& in, const Node& node) {
  const auto* array = std::get_if<Array>(&node.value);
  if (array == nullptr || array->empty())
    return in.table.failure(node.line, "inner_by_position is not a list of sheets",
                            "write one for each outer position: inner_by_position = [\"a.toml\", \"b.toml\"]");
  std::vector<SubDescription> out;
  for (const Node& entry : *array) {
    auto inner = read_sub_sheet(in, entry, "inner_by_position");
    if (!inner) return inner.error();
    if (!out.empty() && !(word_field(**inner) == word_field(*out.front())))
      return in.table.failure(entry.line, "the inner codes are over different fields", "use one field for all of them");
    out.push_back(*std::move(inner));
  }
  return out;
}

}  // namespace

Result<Family> read_concatenated(Reading& in) {
  Concatenated out;
  auto outer = required_sub_sheet(in, "outer");
  if (!outer) return outer.error();
  out.outer = *std::move(outer);
  if (const Node* list = in.table.optional("inner_by_position")) {
    if (const Node* both = in.table.optional("inner"))
      return in.table.failure(both->line, "inner and inner_by_position are both given", "keep one");
    auto inner = read_inner_by_position(in, *list);
    if (!inner) return inner.error();
    out.inner = *std::move(inner);
    out.by_position = true;
    out.inner_line = list->line;
  } else {
    const auto node = in.table.required("inner", "inner = \"inner.toml\", or a table [code.inner.code]");
    if (!node) return node.error();
    auto inner = read_sub_sheet(in, **node, "inner");
    if (!inner) return inner.error();
    out.inner.push_back(*std::move(inner));
    out.inner_line = (*node)->line;
  }
  const field::Field words = word_field(*out.inner.front());
  if (const auto fits = take_field(in, words); !fits) return fits.error();
  if (words.degree() > 1) {
    const field::Field symbols = word_field(*out.outer);
    const auto embedding = located_element(in, "embedding", symbols, "embedding = \"x^5\"");
    if (!embedding) return embedding.error();
    out.embedding = *embedding;
    auto basis = located_elements(in, "symbol_basis", symbols, "symbol_basis = [1, 2]");
    if (!basis) return basis.error();
    out.symbol_basis = *std::move(basis);
  }
  return Family(std::move(out));
}

Result<Family> read_pair(Reading& in, Pair::Kind kind) {
  Pair out;
  out.kind = kind;
  auto first = required_sub_sheet(in, "first");
  if (!first) return first.error();
  out.first = *std::move(first);
  auto second = required_sub_sheet(in, "second");
  if (!second) return second.error();
  out.second = *std::move(second);
  out.second_line = in.table.optional("second")->line;
  if (!(word_field(*out.first) == word_field(*out.second)))
    return in.table.failure(out.second_line, "the two codes are over different fields", "use one field for both");
  if (const auto fits = take_field(in, word_field(*out.first)); !fits) return fits.error();
  return Family(std::move(out));
}

}  // namespace assize::sheet
