// Certificates for the tests, made by brute force and by a writer of their own, so that the checker is never tested
// against itself.  Everything here is as plain and slow as possible.
#pragma once
#include <algorithm>
#include <cstdint>
#include <map>
#include <optional>
#include <string>
#include <tuple>
#include <utility>
#include <vector>

#include "base/digest.hpp"

namespace assize::recheck::test {

// ---- the spelling of section 1 -------------------------------------------------------------------------------------

/// A spelled value; `nest` tells whether it is an object or an array.
struct Value {
  std::string text;
  bool nest = false;
};

inline Value number(std::uint64_t n) { return {std::to_string(n), false}; }
inline Value text(const std::string& s) { return {"\"" + s + "\"", false}; }  // no escapes needed here

inline Value join(const std::vector<std::pair<std::string, Value>>& members, char open, char close) {
  const bool broken = std::any_of(members.begin(), members.end(), [](const auto& m) { return m.second.nest; });
  std::string out(1, open);
  for (std::size_t i = 0; i < members.size(); ++i) {
    if (i > 0) out += ",";
    if (broken) out += "\n";
    out += members[i].first + members[i].second.text;
  }
  return {out + close, true};
}

inline Value object(std::vector<std::pair<std::string, Value>> members) {
  for (auto& member : members) member.first = "\"" + member.first + "\":";
  return join(members, '{', '}');
}

inline Value array(const std::vector<Value>& items) {
  std::vector<std::pair<std::string, Value>> members;
  for (const Value& item : items) members.emplace_back("", item);
  return join(members, '[', ']');
}

inline Value texts(const std::vector<std::string>& items) {
  std::vector<Value> values;
  for (const std::string& item : items) values.push_back(text(item));
  return array(values);
}

inline Value numbers(const std::vector<std::uint64_t>& items) {
  std::vector<Value> values;
  for (const std::uint64_t item : items) values.push_back(number(item));
  return array(values);
}

// ---- arithmetic by the definition ----------------------------------------------------------------------------------

using Vector = std::vector<unsigned>;
using Rows = std::vector<Vector>;

struct PlainField {
  unsigned p = 2;
  Vector modulus;  // lowest coefficient first; {0, 1} for a prime order
  [[nodiscard]] unsigned degree() const { return static_cast<unsigned>(modulus.size()) - 1; }
  [[nodiscard]] unsigned order() const {
    unsigned q = 1;
    for (unsigned i = 0; i < degree(); ++i) q *= p;
    return q;
  }
  [[nodiscard]] unsigned add(unsigned a, unsigned b) const {
    unsigned sum = 0;
    for (unsigned w = 1; w < order(); w *= p) sum += (a / w + b / w) % p * w;
    return sum;
  }
  [[nodiscard]] unsigned negative(unsigned a) const {
    unsigned b = 0;
    while (add(a, b) != 0) ++b;
    return b;
  }
  /// Horner over the digits of b, highest first: product = product x + digit a.
  [[nodiscard]] unsigned mul(unsigned a, unsigned b) const {
    unsigned product = 0;
    for (unsigned w = order() / p; w > 0; w /= p) {
      const unsigned high = product / (order() / p);
      product = degree() == 1 ? 0 : product % (order() / p) * p;  // times x, without its highest digit
      for (unsigned t = 0; t < high && degree() > 1; ++t) product = add(product, negative(low_part()));
      for (unsigned t = 0; t < b / w % p; ++t) product = add(product, a);
    }
    return product;
  }
  [[nodiscard]] unsigned power(unsigned a, unsigned e) const {
    unsigned result = 1;
    for (; e > 0; --e) result = mul(result, a);
    return result;
  }
  [[nodiscard]] unsigned inverse(unsigned a) const {
    unsigned b = 1;
    while (mul(a, b) != 1) ++b;
    return b;
  }

 private:
  [[nodiscard]] unsigned low_part() const {  // of the modulus, as an element: x^m = -low_part
    unsigned value = 0;
    for (unsigned i = degree(); i-- > 0;) value = value * p + modulus[i];
    return value;
  }
};

inline PlainField prime(unsigned p) { return {p, {0, 1}}; }

inline std::string word(const PlainField& f, const Vector& symbols) {
  std::string out;
  for (const unsigned s : symbols) {
    if (f.order() != 2 && !out.empty()) out += " ";
    out += std::to_string(s);
  }
  return out;
}

inline Value field_value(const PlainField& f) {
  if (f.degree() == 1) return object({{"order", number(f.order())}});
  return object({{"order", number(f.order())}, {"modulus", text(word(prime(f.p), f.modulus))}});
}

inline Vector combine(const PlainField& f, const Rows& rows, const Vector& message) {
  Vector out(rows[0].size(), 0);
  for (std::size_t r = 0; r < rows.size(); ++r)
    for (std::size_t c = 0; c < out.size(); ++c) out[c] = f.add(out[c], f.mul(message[r], rows[r][c]));
  return out;
}

inline unsigned weight(const Vector& v) {
  return static_cast<unsigned>(v.size()) - static_cast<unsigned>(std::count(v.begin(), v.end(), 0U));
}

inline Rows reduced(const PlainField& f, Rows rows) {
  std::size_t rank = 0;
  for (std::size_t c = 0; c < rows[0].size() && rank < rows.size(); ++c) {
    std::size_t found = rank;
    while (found < rows.size() && rows[found][c] == 0) ++found;
    if (found == rows.size()) continue;
    std::swap(rows[rank], rows[found]);
    const unsigned scale = f.inverse(rows[rank][c]);
    for (unsigned& s : rows[rank]) s = f.mul(s, scale);
    for (std::size_t r = 0; r < rows.size(); ++r) {
      const unsigned factor = f.negative(rows[r][c]);
      for (std::size_t i = 0; r != rank && i < rows[0].size(); ++i)
        rows[r][i] = f.add(rows[r][i], f.mul(factor, rows[rank][i]));
    }
    ++rank;
  }
  rows.resize(rank);
  return rows;
}

inline std::string generator_digest(const PlainField& f, const Rows& g) {
  std::string out =
      std::to_string(f.order()) + " " + std::to_string(g[0].size()) + " " + std::to_string(g.size()) + "\n";
  std::vector<std::size_t> pivots;
  for (const Vector& row : g)
    pivots.push_back(static_cast<std::size_t>(std::find_if(row.begin(), row.end(), [](unsigned s) { return s != 0; }) -
                                              row.begin()));
  for (std::size_t i = 0; i < pivots.size(); ++i) out += (i == 0 ? "" : " ") + std::to_string(pivots[i]);
  for (const Vector& row : g) {
    Vector rest;
    for (std::size_t c = 0; c < row.size(); ++c)
      if (std::find(pivots.begin(), pivots.end(), c) == pivots.end()) rest.push_back(row[c]);
    out += "\n" + word(f, rest);
  }
  return digest_hex(out + "\n");
}

// ---- evidence ------------------------------------------------------------------------------------------------------

using Weights = std::map<unsigned, std::uint64_t>;

inline Value counts_value(const Weights& counts) {
  std::vector<std::pair<std::string, Value>> members;
  for (const auto& [w, count] : counts) members.emplace_back(std::to_string(w), text(std::to_string(count)));
  return object(members);
}

struct ShardDraft {
  std::string number;
  Weights counts;
  std::optional<std::pair<std::uint64_t, std::uint64_t>> moments;  // otherwise those of the counts
  std::optional<std::string> digest;                               // otherwise the right one

  [[nodiscard]] Value value() const {
    std::uint64_t first = 0;
    std::uint64_t second = 0;
    for (const auto& [w, count] : counts) {
      first += w * count;
      second += std::uint64_t{w} * w * count;
    }
    if (moments) std::tie(first, second) = *moments;
    std::vector<std::pair<std::string, Value>> members{
        {"number", text(number)},
        {"counts", counts_value(counts)},
        {"moments", texts({std::to_string(first), std::to_string(second)})}};
    members.emplace_back("digest", text(digest.value_or(digest_hex(object(members).text))));
    return object(members);
  }
};

struct EnumerationDraft {
  std::string generator;
  std::uint64_t free_rows = 0;
  std::string total;
  std::optional<std::string> plan_digest;
  std::vector<ShardDraft> shards;

  [[nodiscard]] Value value() const {
    const Value plan = object(
        {{"reduced_generator_digest", text(generator)}, {"free_rows", number(free_rows)}, {"shards", text(total)}});
    std::vector<Value> all;
    for (const ShardDraft& shard : shards) all.push_back(shard.value());
    return object({{"kind", text("enumeration")},
                   {"version", number(1)},
                   {"class", text("re-run")},
                   {"plan", plan},
                   {"plan_digest", text(plan_digest.value_or(digest_hex(plan.text)))},
                   {"shards", array(all)}});
  }
};

/// Every normalised message goes to the shard of its prefix.
inline EnumerationDraft enumerate(const PlainField& f, const Rows& g, std::size_t free_rows) {
  std::map<std::uint64_t, Weights> by_prefix;
  by_prefix[0] = {};
  const std::uint64_t q = f.order();
  std::uint64_t messages = 1;
  for (std::size_t i = 0; i < g.size(); ++i) messages *= q;
  std::uint64_t span = 1;
  for (std::size_t i = 0; i < free_rows; ++i) span *= q;
  for (std::uint64_t value = 1; value < messages; ++value) {
    Vector message(g.size());
    std::uint64_t rest = value;
    for (std::size_t i = g.size(); i-- > 0; rest /= q) message[i] = static_cast<unsigned>(rest % q);
    if (*std::find_if(message.begin(), message.end(), [](unsigned s) { return s != 0; }) != 1) continue;
    ++by_prefix[value / span][weight(combine(f, g, message))];
  }
  EnumerationDraft draft{generator_digest(f, g), free_rows, std::to_string(by_prefix.size()), {}, {}};
  for (const auto& [prefix, counts] : by_prefix)
    draft.shards.push_back({std::to_string(draft.shards.size()), counts, {}, {}});
  return draft;
}

inline Value witness(const PlainField& f, unsigned w, const Vector& symbols) {
  return object({{"kind", text("witness")},
                 {"version", number(1)},
                 {"class", text("witness")},
                 {"weight", number(w)},
                 {"word", text(word(f, symbols))}});
}

inline Value mds_fact(std::uint64_t at_least) {
  return object({{"kind", text("maximum-distance-separable")},
                 {"version", number(1)},
                 {"class", text("theorem")},
                 {"at_least", number(at_least)}});
}

inline Value concatenation_fact(std::uint64_t outer, const std::string& from, const std::vector<std::uint64_t>& inner,
                                std::uint64_t at_least) {
  return object({{"kind", text("concatenation")},
                 {"version", number(1)},
                 {"class", text("theorem")},
                 {"outer_distance", number(outer)},
                 {"outer_distance_from", text(from)},
                 {"inner_distances", numbers(inner)},
                 {"at_least", number(at_least)}});
}

// ---- statements ----------------------------------------------------------------------------------------------------

inline Value distance(const std::string& relation, std::uint64_t value, const std::vector<std::uint64_t>& evidence) {
  return object({{"kind", text("minimum-distance")},
                 {"relation", text(relation)},
                 {"value", number(value)},
                 {"evidence", numbers(evidence)}});
}

inline Value minimum_words(std::uint64_t w, std::uint64_t count, const std::vector<std::uint64_t>& evidence) {
  return object({{"kind", text("minimum-words")},
                 {"weight", number(w)},
                 {"count", text(std::to_string(count))},
                 {"evidence", numbers(evidence)}});
}

inline Value distribution(const Weights& counts, const std::vector<std::uint64_t>& evidence) {
  return object({{"kind", text("weight-distribution")},
                 {"extent", text("complete")},
                 {"counts", counts_value(counts)},
                 {"evidence", numbers(evidence)}});
}

// ---- the whole -----------------------------------------------------------------------------------------------------

struct Draft {
  std::string title = "cabin telegram";
  Value description;
  PlainField field;  // of the code's words
  Rows generator;    // reduced
  std::uint64_t order = 0;
  std::uint64_t length = 0;
  std::uint64_t dimension = 0;
  std::optional<std::string> description_digest;
  std::optional<std::string> generator_text_digest;
  std::vector<Value> statements;
  std::vector<Value> evidence;
  std::vector<std::string> cautions;

  Draft(Value described, PlainField f, const Rows& spanning)
      : description(std::move(described)), field(std::move(f)), generator(reduced(field, spanning)) {
    order = field.order();
    length = generator[0].size();
    dimension = generator.size();
  }

  [[nodiscard]] std::string bytes() const {
    const Value code = object(
        {{"description", description},
         {"description_digest", text(description_digest.value_or(digest_hex(description.text)))},
         {"sheet_digest", text(digest_hex("sheet"))},
         {"order", number(order)},
         {"length", number(length)},
         {"dimension", number(dimension)},
         {"reduced_generator_digest", text(generator_text_digest.value_or(generator_digest(field, generator)))}});
    const Value context = object({{"program", text("test builder")},
                                  {"method", text("brute force")},
                                  {"kernel", text("none")},
                                  {"threads", number(1)},
                                  {"started", text("2025-01-31T09:30:00Z")},
                                  {"seconds", text("0.1")},
                                  {"ended", text("complete")}});
    const std::string whole = object({{"format", text("assize certificate")},
                                      {"version", number(1)},
                                      {"title", text(title)},
                                      {"claim", object({{"code", code}, {"statements", array(statements)}})},
                                      {"evidence", array(evidence)},
                                      {"cautions", texts(cautions)},
                                      {"context", context}})
                                  .text;
    const std::string body = whole.substr(0, whole.size() - 1) + ",\n";
    return body + "\"closing_digest\":\"" + digest_hex(body) + "\"}\n";
  }
};

/// All words' weights, by brute force over an enumeration.
inline Weights all_weights(const PlainField& f, const EnumerationDraft& enumeration) {
  Weights all{{0, 1}};
  for (const ShardDraft& shard : enumeration.shards)
    for (const auto& [w, count] : shard.counts) all[w] += count * (f.order() - 1);
  return all;
}

/// Alters the counts of a shard of the Golay code so that number, first and second moment stay right: third differences
/// on the weights 10, 12, 14, 16.  False if the shard has too few words for it.
inline bool disguise(ShardDraft& shard) {
  Weights& counts = shard.counts;
  if (!counts.contains(12) || !counts.contains(16) || counts[12] < 4 || counts[16] < 2) return false;
  counts[10] += 1;
  counts[12] -= 3;
  counts[14] += 3;
  counts[16] -= 1;
  return true;
}

/// Adds a complete enumeration and everything that follows from it.
inline void state_everything(Draft& draft, std::size_t free_rows) {
  const EnumerationDraft enumeration = enumerate(draft.field, draft.generator, free_rows);
  const Weights all = all_weights(draft.field, enumeration);
  const std::uint64_t index = draft.evidence.size();
  draft.evidence.push_back(enumeration.value());
  const auto least = std::next(all.begin());
  draft.statements = {distance("exactly", least->first, {index}), minimum_words(least->first, least->second, {index}),
                      distribution(all, {index})};
}

// ---- codes ---------------------------------------------------------------------------------------------------------

inline Value description_value(const PlainField& f, const std::vector<std::pair<std::string, Value>>& code,
                               const std::vector<Value>& steps = {}) {
  std::vector<std::pair<std::string, Value>> members{{"field", field_value(f)}, {"code", object(code)}};
  if (!steps.empty()) members.emplace_back("then", array(steps));
  return object(members);
}

inline Value step(const std::string& name) { return object({{"step", text(name)}}); }

inline Value matrix_description(const PlainField& f, const Rows& rows, const std::vector<Value>& steps = {}) {
  std::vector<std::string> words;
  for (const Vector& row : rows) words.push_back(word(f, row));
  return description_value(f, {{"family", text("generator-matrix")}, {"rows", texts(words)}}, steps);
}

/// Multiples of a polynomial, highest coefficient at position 0.
inline Rows multiples(const Vector& generator, std::size_t length) {
  Rows rows;
  for (std::size_t shift = 0; shift + generator.size() <= length; ++shift) {
    Vector row(length, 0);
    for (std::size_t i = 0; i < generator.size(); ++i) row[length - 1 - shift - i] = generator[i];
    rows.push_back(row);
  }
  return rows;
}

inline const Vector golay_generator{1, 1, 0, 0, 0, 1, 1, 1, 0, 1, 0, 1};  // 1+x+x^5+x^6+x^7+x^9+x^11

inline Value cyclic_description(const PlainField& f, const Vector& generator, std::size_t length,
                                const std::vector<Value>& steps = {}, const std::string& family = "cyclic") {
  return description_value(
      f, {{"family", text(family)}, {"codeword_length", number(length)}, {"generator", text(word(f, generator))}},
      steps);
}

inline Draft golay() {
  return {cyclic_description(prime(2), golay_generator, 23), prime(2), multiples(golay_generator, 23)};
}

/// A small [7,4] certificate for tests that change every bit.
inline Draft small_hamming() {
  return {cyclic_description(prime(2), {1, 1, 0, 1}, 7), prime(2), multiples({1, 1, 0, 1}, 7)};
}

inline const PlainField gf4{2, {1, 1, 1}};
inline const PlainField gf8{2, {1, 1, 0, 1}};
inline const PlainField gf9{3, {2, 1, 1}};  // x^2 + x + 2

inline Rows hexacode() { return {{1, 0, 0, 1, 2, 3}, {0, 1, 0, 1, 3, 2}, {0, 0, 1, 1, 1, 1}}; }

inline Rows ternary_golay() {
  return {{1, 0, 0, 0, 0, 0, 1, 1, 1, 1, 1}, {0, 1, 0, 0, 0, 0, 0, 1, 2, 2, 1}, {0, 0, 1, 0, 0, 0, 1, 0, 1, 2, 2},
          {0, 0, 0, 1, 0, 0, 2, 1, 0, 1, 2}, {0, 0, 0, 0, 1, 0, 2, 2, 1, 0, 1}, {0, 0, 0, 0, 0, 1, 1, 2, 2, 1, 0}};
}

/// Rows j = 0..k-1: multipliers times j-th powers of the points.
inline Rows evaluation_rows(const PlainField& f, const Vector& points, const Vector& multipliers, unsigned k) {
  Rows rows;
  for (unsigned j = 0; j < k; ++j) {
    Vector row;
    for (std::size_t i = 0; i < points.size(); ++i) row.push_back(f.mul(multipliers[i], f.power(points[i], j)));
    rows.push_back(row);
  }
  return rows;
}

inline Value reed_solomon_description(const PlainField& f, const Vector& points, const Vector& multipliers, unsigned k,
                                      const std::vector<Value>& steps = {}) {
  return description_value(f,
                           {{"family", text("reed-solomon")},
                            {"codeword_length", number(points.size())},
                            {"dimension", number(k)},
                            {"evaluation_points", text(word(f, points))},
                            {"multipliers", text(word(f, multipliers))}},
                           steps);
}

inline Vector bits_of(unsigned a, unsigned m) {
  Vector bits;
  for (unsigned t = 0; t < m; ++t) bits.push_back(a >> t & 1);
  return bits;
}

/// The Justesen code over GF(8), N = 7, K = 3, points x^i, first exponent 0.
inline Draft justesen(unsigned g, const std::string& image) {
  Vector points;
  for (unsigned i = 0; i < 7; ++i) points.push_back(gf8.power(2, i));
  Rows rows;
  for (const Vector& outer : evaluation_rows(gf8, points, Vector(7, 1), 3))
    for (unsigned t = 0; t < (image == "bits" ? 3U : 1U); ++t) {
      Vector row;
      for (unsigned i = 0; i < 7; ++i) {
        const unsigned b = gf8.mul(outer[i], 1U << t);
        const unsigned partner = gf8.mul(gf8.power(g, i), b);
        if (image == "bits") {
          for (const unsigned bit : bits_of(b, 3)) row.push_back(bit);
          for (const unsigned bit : bits_of(partner, 3)) row.push_back(bit);
        } else {
          row.push_back(b);
          row.push_back(partner);
        }
      }
      rows.push_back(row);
    }
  return {description_value(gf8, {{"family", text("justesen")},
                                  {"outer_length", number(7)},
                                  {"outer_dimension", number(3)},
                                  {"evaluation_points", text(word(gf8, points))},
                                  {"primitive_element", text(std::to_string(g))},
                                  {"first_exponent", number(0)},
                                  {"image", text(image)}}),
          image == "bits" ? prime(2) : gf8, rows};
}

/// Least distances of the pairs (b, g^i b) as 6 bits, by trying all b.
inline std::vector<std::uint64_t> justesen_inner(unsigned g) {
  std::vector<std::uint64_t> result;
  for (unsigned i = 0; i < 7; ++i) {
    unsigned least = 6;
    for (unsigned b = 1; b < 8; ++b)
      least = std::min(least, weight(bits_of(b, 3)) + weight(bits_of(gf8.mul(gf8.power(g, i), b), 3)));
    result.push_back(least);
  }
  return result;
}

}  // namespace assize::recheck::test
