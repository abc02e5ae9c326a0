// Reads the code part and the statements of a claim.
#include "recheck/claim.hpp"

#include "recheck/keys.hpp"

namespace assize::recheck {
namespace {

void read_minimum_distance(Keys& keys, Statement& statement) {
  statement.kind = StatementKind::minimum_distance;
  const std::string relation = keys.text("relation");
  if (relation == "exactly")
    statement.relation = Relation::exactly;
  else if (relation == "at-least")
    statement.relation = Relation::at_least;
  else if (relation == "at-most")
    statement.relation = Relation::at_most;
  else
    keys.refuse("relation", "exactly, at-least or at-most is expected here");
  statement.value = keys.integer("value");
}

Result<void> read_weight_distribution(Keys& keys, std::uint64_t length, Statement& statement) {
  statement.kind = StatementKind::weight_distribution;
  if (keys.text("extent") != "complete") keys.refuse("extent", "complete is expected here");
  const Json& json = keys.object("counts");
  if (!keys.ok()) return keys.failure();
  auto counts = read_counts(json, keys.at("counts"), 0, length);
  if (!counts) return counts.error();
  statement.counts = std::move(*counts);
  return {};
}

Result<void> read_indexes(Keys& keys, std::size_t items, Statement& statement) {
  const Json::Array& indexes = keys.array("evidence");
  if (auto end = keys.end(); !end) return end.error();
  if (indexes.empty()) return Failure{keys.at("evidence"), "a statement rests on at least one item", ""};
  for (std::size_t i = 0; i < indexes.size(); ++i) {
    const std::string at = keys.at("evidence") + "[" + std::to_string(i) + "]";
    const std::uint64_t* index = indexes[i].integer();
    if (index == nullptr || *index >= items) return Failure{at, "this is not the index of an evidence item", ""};
    if (i > 0 && *index <= statement.evidence.back()) return Failure{at, "the indexes do not ascend", ""};
    statement.evidence.push_back(static_cast<std::size_t>(*index));
  }
  return {};
}

Result<Statement> read_statement(const Json& json, const std::string& path, std::uint64_t length, std::size_t items) {
  Statement statement;
  statement.path = path;
  Keys keys(json, path);
  const std::string kind = keys.text("kind");
  if (!keys.ok()) return keys.failure();
  if (kind == "minimum-distance") {
    read_minimum_distance(keys, statement);
  } else if (kind == "minimum-words") {
    statement.kind = StatementKind::minimum_words;
    statement.value = keys.integer("weight");
    statement.count = keys.count("count");
  } else if (kind == "weight-distribution") {
    if (auto read = read_weight_distribution(keys, length, statement); !read) return read.error();
  } else {
    return Failure{keys.at("kind"), "this kind of statement is unknown", ""};
  }
  if (auto read = read_indexes(keys, items, statement); !read) return read.error();
  return statement;
}

/// Each kind once and in order, but two distance bounds that do not meet may stand side by side.
bool may_follow(const Statement& before, const Statement& after) {
  if (after.kind != before.kind) return after.kind > before.kind;
  return after.kind == StatementKind::minimum_distance && before.relation == Relation::at_least &&
         after.relation == Relation::at_most && before.value < after.value;
}

}  // namespace

std::string Statement::sentence() const {
  switch (kind) {
    case StatementKind::minimum_distance:
      switch (relation) {
        case Relation::exactly:
          return "minimum distance exactly " + std::to_string(value);
        case Relation::at_least:
          return "minimum distance at least " + std::to_string(value);
        case Relation::at_most:
          return "minimum distance at most " + std::to_string(value);
      }
      break;
    case StatementKind::minimum_words:
      return "exactly " + grouped_decimal(count) + (count == 1 ? " word" : " words") + " of the minimum weight " +
             std::to_string(value);
    case StatementKind::weight_distribution:
      return "complete weight distribution " + describe(counts);
  }
  return {};
}

Result<Claim> read_claim(const Json& json, std::size_t items) {
  Claim claim;
  Keys keys(json, "claim");
  const Json& code_json = keys.object("code");
  const Json::Array& statements = keys.array("statements");
  if (auto end = keys.end(); !end) return end.error();

  Keys code(code_json, "claim.code");
  claim.description = &code.object("description");
  claim.description_digest = code.digest("description_digest");
  claim.sheet_digest = code.digest("sheet_digest");
  claim.order = code.integer("order", 2, 65536);
  claim.length = code.integer("length", 1, max_length);
  claim.dimension = code.integer("dimension", 1, claim.length);
  claim.reduced_generator_digest = code.digest("reduced_generator_digest");
  if (auto end = code.end(); !end) return end.error();

  if (statements.empty()) return Failure{"claim.statements", "a claim has at least one statement", ""};
  for (std::size_t i = 0; i < statements.size(); ++i) {
    const std::string path = "claim.statements[" + std::to_string(i) + "]";
    auto statement = read_statement(statements[i], path, claim.length, items);
    if (!statement) return statement.error();
    if (i > 0 && !may_follow(claim.statements.back(), *statement))
      return Failure{path + ".kind", "the statements do not stand in the order and number of section 3", ""};
    claim.statements.push_back(std::move(*statement));
  }
  return claim;
}

}  // namespace assize::recheck
