// The envelope: keys in the order of certs/FORMAT.md, closed by a digest of everything before.
#include "certificate/certificate.hpp"

#include "base/digest.hpp"
#include "certificate/spelling.hpp"

namespace assize::certificate {

namespace {

Json code_json(const CodeIdentity& code) {
  return Json::Object{{"description", code.description},
                      {"description_digest", code.description_digest},
                      {"sheet_digest", code.sheet_digest},
                      {"order", Json::integer(code.order)},
                      {"length", Json::integer(code.length)},
                      {"dimension", Json::integer(code.dimension)},
                      {"reduced_generator_digest", code.reduced_generator_digest}};
}

Json context_json(const Context& context) {
  return Json::Object{{"program", context.program}, {"method", context.method},
                      {"kernel", context.kernel},   {"threads", Json::integer(context.threads)},
                      {"started", context.started}, {"seconds", context.seconds},
                      {"ended", context.ended}};
}

}  // namespace

Json claim_json(const Certificate& certificate) {
  Json::Array statements;
  for (const evidence::Statement& statement : certificate.statements) statements.push_back(statement_json(statement));
  return Json::Object{{"code", code_json(certificate.code)}, {"statements", statements}};
}

Json evidence_json(const Certificate& certificate) {
  Json::Array items;
  for (const evidence::Item& item : certificate.evidence) items.push_back(item_json(item, certificate.code.order));
  return items;
}

std::string to_bytes(const Certificate& certificate) {
  Json::Array cautions;
  for (const std::string& caution : certificate.cautions) cautions.emplace_back(caution);
  const Json body = Json::Object{{"format", "assize certificate"},
                                 {"version", Json::integer(1)},
                                 {"title", certificate.title},
                                 {"claim", claim_json(certificate)},
                                 {"evidence", evidence_json(certificate)},
                                 {"cautions", cautions},
                                 {"context", context_json(certificate.context)}};
  std::string bytes = body.text();
  contract(bytes.ends_with('}'), "a certificate is an object");
  bytes.pop_back();
  bytes += ",\n";
  const std::string digest = digest_hex(bytes);
  return bytes + "\"closing_digest\":\"" + digest + "\"}\n";
}

}  // namespace assize::certificate
