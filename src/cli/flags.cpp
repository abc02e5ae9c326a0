// The records.
#include "cli/flags.hpp"

#include <algorithm>
#include <array>

#include "base/contract.hpp"

namespace assize::cli {

namespace {

constexpr std::array flags{
    Flag{"--json", "", "", "", "print one JSON document on stdout and nothing else"},
    Flag{"--quiet", "", "", "", "print the first line only, and no progress"},
    Flag{"--progress", "", "", "on a terminal only", "draw progress on stderr even where it is no terminal"},
    Flag{"--threads", "", "N", "one for each processor", "number of threads"},
    Flag{"--kernel", "", "NAME", "the best that runs here",
         "build of the hot loops; names are listed by assize selftest"},
    Flag{"--method", "", "NAME", "the plan decides", "engine: exhaust or plain"},
    Flag{"--within", "", "DURATION", "no limit", "begin no more work after this time, such as 30s, 10m or 2h"},
    Flag{"--plan", "", "", "", "print the predicted work and time, and run nothing"},
    Flag{"--at-least", "", "D", "", "decide whether the minimum distance is at least D"},
    Flag{"--claim", "", "WHAT", "distance, and weights where cheap", "what to prove: distance, weights or all"},
    Flag{"--output", "-o", "FILE", "STEM.certificate.json", "certificate file"},
    Flag{"--replace", "", "", "", "write over a file that is not an unsigned certificate of the same code"},
    Flag{"--matrix", "", "WHICH", "",
         "print one matrix as sheets can read it: reduced (or generator, the same) or parity"},
    Flag{"--layout", "", "NAME", "text", "of the matrix: text, csv, matrix-market, sparse-list or npy"},
    Flag{"--depth", "", "DEPTH", "full", "quick, spot or full: how much is enumerated again"},
    Flag{"--seed", "", "S", "1", "seed of the draw of shards at depth spot"},
    Flag{"--for", "", "SHEET", "", "reject the certificate unless it is about the code of this sheet"},
    Flag{"--modulus", "", "POLY", "", "modulus of the field, a polynomial such as \"x^3 + x + 1\""},
    Flag{"--table", "", "", "", "print the table of logarithms instead"},
    Flag{"--csv", "", "", "", "print the whole table as CSV and nothing else"},
    Flag{"--help", "-h", "", "", "print this page"},
};

constexpr std::string_view usual_exit_codes =
    "0 done   2 cannot run: usage, bad input, resources   4 self-check failed";

const std::vector<Command>& commands() {
  static const std::vector<Command> records = {
      {"show",
       "SHEET",
       "what was understood of a code sheet",
       "Reads the sheet, builds the code, and prints its parameters, every reading of its polynomial, every default\n"
       "that was filled in, and notices such as dependent rows or positions that are always zero.",
       {"--matrix", "--layout", "--json", "--quiet", "--help"},
       {{"assize show cabin-telegram.toml", "shows what the sheet means"},
        {"assize show cabin-telegram.toml --matrix parity > check.txt", "writes a matrix that a sheet can name"},
        {"assize show cabin-telegram.toml --json", "the same for programs"}},
       usual_exit_codes},
      {"certify",
       "SHEET",
       "proves bounds on the minimum distance and writes a certificate",
       "Begins with the bounds that cost nothing (a generator row from above, theorems from below) and enumerates the\n"
       "words where that is needed or cheap. A run cut short by --within or Ctrl-C still writes a certificate, which\n"
       "says less. Without --within, a job that would take more than 24 hours is not started.",
       {"--at-least", "--claim", "--output", "--replace", "--plan", "--within", "--threads", "--method", "--kernel",
        "--json", "--quiet", "--progress", "--help"},
       {{"assize certify recorder.toml", "proves the distance, writes recorder.certificate.json"},
        {"assize certify recorder.toml --at-least 8",
         "exit code 0 if d >= 8 is proved, 1 if a lighter word refutes it"},
        {"assize certify recorder.toml --plan", "what that would cost"},
        {"assize certify recorder.toml --within 10m -o draft.json", "stops after ten minutes with the bounds so far"}},
       "0 what was asked is proved: that the bounds meet, --at-least D, the weights   1 --at-least D is refuted by a "
       "word\n"
       "3 undecided   2 cannot run   4 self-check failed"},
      {"weights",
       "SHEET",
       "counts the words of each weight",
       "Enumerates all words, one of each scalar class, and prints how many have each weight.",
       {"--plan", "--within", "--threads", "--method", "--kernel", "--json", "--quiet", "--progress", "--help"},
       {{"assize weights recorder.toml", "the complete weight distribution"},
        {"assize weights recorder.toml --json", "counts as decimal strings"}},
       "0 complete   3 cut short   2 cannot run   4 self-check failed"},
      {"recheck",
       "CERT",
       "judges a certificate by an independent checker",
       "Rebuilds the code from the description in the certificate and checks every claim against its evidence, with\n"
       "arithmetic that the rest of the program does not use. Depth full enumerates every shard again, spot some of\n"
       "them, quick none. The same checker is the program assize-recheck.",
       {"--depth", "--seed", "--for", "--within", "--threads", "--json", "--quiet", "--progress", "--help"},
       {{"assize recheck recorder.certificate.json", "checks everything"},
        {"assize recheck recorder.certificate.json --depth quick", "checks all but the enumeration"},
        {"assize recheck recorder.certificate.json --for recorder.toml", "and that it is about this sheet's code"}},
       "0 PROVEN   1 REJECTED   3 CONSISTENT: nothing wrong found, not everything re-derived   2 cannot run"},
      {"field",
       "Q",
       "polynomials, primitive elements, conjugates and logarithms of GF(Q)",
       "For Q = p^m, m > 1, lists the monic irreducible polynomials of degree m over GF(p) and marks the primitive\n"
       "ones; with --modulus, the primitive elements of the field with that modulus and its classes of conjugates:\n"
       "exponents (a cyclotomic coset), order, minimal polynomial. For a prime Q, lists the primitive elements.\n"
       "Counts are checked against their formulas. Exponents and logarithms are those of x where x is primitive,\n"
       "otherwise of the least primitive element. The text shows 64 rows of a table, --csv and --json show all.",
       {"--modulus", "--table", "--csv", "--json", "--quiet", "--help"},
       {{"assize field 256", "the polynomials that a field of 256 elements can be built from"},
        {"assize field 8 --modulus \"x^3 + x + 1\"", "primitive elements and classes of conjugates"},
        {"assize field 8 --modulus \"x^3 + x + 1\" --table", "powers of x"},
        {"assize field 31 --table --csv", "logarithms modulo 31 for a spreadsheet"}},
       usual_exit_codes},
      {"selftest",
       "",
       "known answers on this machine, in under a minute",
       "Certifies codes whose weights are published, with every kernel that runs here and with the plain engine, and\n"
       "checks each certificate. Prints the kernels that were compiled and those that ran.",
       {"--threads", "--json", "--quiet", "--help"},
       {{"assize selftest", "run it after installing and before trusting a new machine"}},
       "0 all right   4 an answer was wrong: do not use this machine or build"},
  };
  return records;
}

}  // namespace

std::span<const Flag> all_flags() { return flags; }

const Flag& flag(std::string_view name) {
  const auto found = std::ranges::find(flags, name, &Flag::name);
  contract(found != flags.end(), "a command names flags that exist");
  return *found;
}

std::span<const Command> all_commands() { return commands(); }

const Command* find_command(std::string_view name) {
  const auto found = std::ranges::find(commands(), name, &Command::name);
  return found == commands().end() ? nullptr : &*found;
}

}  // namespace assize::cli
