// The library's face: what the program `assize` can do, for other programs.  Needs the standard library only.
//
// Functions take the name of a sheet or certificate and settings, and return a reply or the problem that prevented one.
// They never write to the terminal and never end the process; files are written only where a request says so.
#pragma once
#include <atomic>
#include <cstdint>
#include <functional>
#include <optional>
#include <string>
#include <string_view>
#include <variant>
#include <vector>

namespace assize::api {

/// Why there is no reply, in words that the person who wrote the input can act on.
struct Problem {
  std::string where;  ///< "cabin.toml:7"; may be empty
  std::string what;
  std::string cure;                ///< may be empty
  bool self_check_failed = false;  ///< a defect of this program or of the machine, not of the input
};

/// A reply or a problem.
template <class T>
class [[nodiscard]] Answer {
 public:
  Answer(T value) : held_(std::in_place_index<0>, std::move(value)) {}            // NOLINT: implicit on purpose
  Answer(Problem problem) : held_(std::in_place_index<1>, std::move(problem)) {}  // NOLINT: implicit on purpose
  explicit operator bool() const noexcept { return held_.index() == 0; }
  /// The value; throws std::bad_variant_access if there is a problem instead.
  [[nodiscard]] const T& value() const { return std::get<0>(held_); }
  [[nodiscard]] const T* operator->() const { return &value(); }
  [[nodiscard]] const T& operator*() const { return value(); }
  [[nodiscard]] const Problem& problem() const { return std::get<1>(held_); }

 private:
  std::variant<T, Problem> held_;
};

/// Whether what was asked holds.
enum class Holds { yes, no, undecided };

/// The same answer for people and for machines; both end with a line break.
struct Reply {
  Holds holds = Holds::yes;
  std::string text;  ///< the first line stands by itself
  std::string json;  ///< one document
};

/// A snapshot of a long run.
struct Progress {
  std::string_view task;
  std::uint64_t done = 0;  ///< messages
  std::uint64_t total = 0;
  double elapsed_seconds = 0;
  std::uint32_t at_least = 0;            ///< proved lower bound on the distance; 0: none yet
  std::optional<std::uint32_t> at_most;  ///< weight of the lightest word seen
};

/// How a run is done.  Nothing here changes what is found.
struct Run {
  unsigned threads = 0;                              ///< 0: one for each processor
  std::string kernel;                                ///< empty: the best that runs here
  std::string method;                                ///< empty: the plan decides
  std::optional<double> within_seconds;              ///< no work is begun after this time
  const std::atomic<bool>* stop = nullptr;           ///< set it to end the run at the next shard boundary
  std::function<void(const Progress&)> on_progress;  ///< called from any thread, one call at a time
};

struct ShowRequest {
  std::string sheet;
  std::string matrix;  ///< "generator" (reduced) or "parity": the matrix alone; empty: everything else
  std::string layout;  ///< of the matrix: "text" (if empty), "csv", "matrix-market", "sparse-list" or "npy"
};
/// What a sheet describes: parameters, readings, defaults, structure, digests; or one of its matrices.
Answer<Reply> show(const ShowRequest& request);

enum class Claim { automatic, distance, weights, all };

struct CertifyRequest {
  std::string sheet;
  std::optional<std::uint32_t> at_least;  ///< decide this bound only
  Claim claim = Claim::automatic;
  std::string output;  ///< certificate file; empty: STEM.certificate.json in the working folder
  bool replace = false;
  bool plan_only = false;
  Run run;
};
struct CertifyReply : Reply {
  std::uint32_t order = 0;
  std::uint32_t length = 0;
  std::uint32_t dimension = 0;
  std::uint32_t at_least = 1;
  std::optional<std::uint32_t> at_most;
  std::optional<std::string> minimum_words;  ///< decimal, where the evidence covers it
  std::string certificate;                   ///< file that was written; empty if none
};
/// Proves bounds on the minimum distance and writes a certificate.
Answer<CertifyReply> certify(const CertifyRequest& request);

struct WeightsRequest {
  std::string sheet;
  bool plan_only = false;
  Run run;
};
/// Counts the words of each weight.
Answer<Reply> weights(const WeightsRequest& request);

enum class Depth { quick, spot, full };

struct RecheckRequest {
  std::string certificate;
  Depth depth = Depth::full;
  std::uint64_t seed = 1;
  std::string for_sheet;  ///< the certificate must be about this code; empty: any
  Run run;                ///< threads, within_seconds, stop and on_progress
};
/// Judges a certificate by the independent checker.
Answer<Reply> recheck(const RecheckRequest& request);

/// Known answers on this machine, with every kernel that runs here.
Answer<Reply> selftest(const Run& run);

struct FieldRequest {
  std::string order;    ///< decimal
  std::string modulus;  ///< polynomial over GF(p), such as "x^3 + x + 1"; empty: none is chosen
  bool table = false;   ///< the table of logarithms instead
  bool csv = false;     ///< the reply's text is the table as CSV
};
/// What is known of a finite field: irreducible polynomials, primitive elements, conjugates, logarithms.
Answer<Reply> field(const FieldRequest& request);

/// "assize 0.1.0"
std::string program_name();
std::vector<std::string> method_names();
/// Kernels that this machine can run, best first.
std::vector<std::string> kernel_names();

}  // namespace assize::api
