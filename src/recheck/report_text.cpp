// One page for a human.  Whatever comes from the certificate is printed without control characters, so that no title
// or caution can move the cursor or forge a verdict line.
#include "base/integers.hpp"
#include "recheck/limits.hpp"
#include "recheck/recheck.hpp"

namespace assize::recheck {
namespace {

constexpr std::string_view disclaimer =
    "This certificate states mathematical properties of the code, not that a system using it is safe; the responsible\n"
    "assessor judges under the applicable standard.\n";

/// Control characters (C0, DEL, C1) and line separators become blanks.
std::string plain(std::string_view text) {
  std::string out;
  for (std::size_t i = 0; i < text.size(); ++i) {
    const auto byte = static_cast<unsigned char>(text[i]);
    const bool c1 = byte == 0xc2 && i + 1 < text.size() && static_cast<unsigned char>(text[i + 1]) < 0xa0;
    const bool format = text.substr(i, 2) == "\xe2\x80" || text.substr(i, 2) == "\xe2\x81";  // U+2000 to U+207F
    if (byte < 0x20 || byte == 0x7f) {
      out += ' ';
    } else if (c1) {
      out += ' ';
      ++i;
    } else if (format && i + 2 < text.size()) {
      const auto last = static_cast<unsigned char>(text[i + 2]);
      const bool moves = byte == 0xe2 && (static_cast<unsigned char>(text[i + 1]) == 0x80
                                              ? (last >= 0x8b && last <= 0x8f) || (last >= 0xa8 && last <= 0xae)
                                              : last >= 0xa0 && last <= 0xaf);  // directions, separators, isolates
      if (moves)
        out += ' ';
      else
        out += text.substr(i, 3);
      i += 2;
    } else {
      out += text[i];
    }
  }
  return out;
}

std::string code_name(const Report& report) {
  return "[" + std::to_string(report.length) + "," + std::to_string(report.dimension) + "] over GF(" +
         std::to_string(report.order) + ")";
}

std::string verdict_line(const Report& report) {
  std::string line(name(report.outcome));
  line += "  ";
  if (report.outcome == Outcome::rejected) return line + plain(report.reason) + "\n";
  line += code_name(report) + ": ";
  for (std::size_t i = 0; i < report.findings.size(); ++i)
    line += (i == 0 ? "" : "; ") + plain(report.findings[i].statement);
  return line + "\n";
}

std::string shard_line(const Report& report) {
  if (report.shards_present == 0 && report.shards_total == 0) return "no enumeration evidence";
  const std::string total =
      (report.shards_total >= max_integer ? "at least " : "") + grouped_decimal(report.shards_total);
  std::string line = total + " planned, " + grouped_decimal(report.shards_present) + " present, " +
                     grouped_decimal(report.shards_reexecuted) + " executed again";
  if (!report.catch_probability.empty())
    line += "; one bad shard would have been caught with probability " + report.catch_probability;
  if (report.depth == Depth::spot) line += " (seed " + std::to_string(report.seed) + ")";
  return line;
}

}  // namespace

std::string to_text(const Report& report) {
  std::string page = verdict_line(report);
  if (report.outcome != Outcome::rejected) page += "Reason:      " + plain(report.reason) + "\n";
  if (!report.title.empty()) page += "Title:       " + plain(report.title) + "\n";
  if (report.length > 0) {
    page += "Code:        " + code_name(report) + "\n";
    page += "Description: " + report.description_digest + "\n";
    page += "Sheet:       " + report.sheet_digest + " (not checked: the sheet is not part of the certificate)\n";
    page += "Depth:       " + std::string(name(report.depth)) + (report.ended_early ? ", ended early" : "") + "\n";
    page += "Shards:      " + shard_line(report) + "\n";
  }
  if (!report.findings.empty()) page += "Statements:\n";
  for (const Finding& finding : report.findings) {
    page += "  " + std::string(name(finding.status)) + ": " + plain(finding.statement) + "\n";
    page += "    " + plain(finding.because) + "\n";
  }
  if (!report.cautions.empty()) page += "Cautions that the issuer wrote into it (text, not checked):\n";
  for (const std::string& caution : report.cautions) page += "  - " + plain(caution) + "\n";
  return page + std::string(disclaimer);
}

}  // namespace assize::recheck
