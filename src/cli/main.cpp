// From words to an exit code: 0 yes, 1 no, 2 cannot run, 3 undecided, 4 self-check failed.
#include <algorithm>
#include <exception>
#include <new>
#include <string>
#include <vector>

#include "base/json.hpp"
#include "cli/commands.hpp"
#include "cli/help.hpp"
#include "cli/terminal.hpp"

namespace assize::cli {
namespace {

enum ExitCode { yes = 0, no = 1, cannot_run = 2, undecided = 3, self_check_failed = 4 };

int exit_code(api::Holds holds) {
  switch (holds) {
    case api::Holds::yes:
      return yes;
    case api::Holds::no:
      return no;
    case api::Holds::undecided:
      return undecided;
  }
  return self_check_failed;
}

int print_result(std::string_view text, int code) {
  if (print(text)) return code;
  complain("assize: stdout cannot be written, so the result is lost\n");
  return cannot_run;
}

int report(const api::Problem& problem, bool json) {
  const int code = problem.self_check_failed ? self_check_failed : cannot_run;
  if (json) {
    const Json error = Json::Object{{"what", problem.what}, {"where", problem.where}, {"cure", problem.cure}};
    return print_result(Json(Json::Object{{"error", error}}).text() + "\n", code);
  }
  complain("assize: " + (problem.where.empty() ? "" : problem.where + ": ") + problem.what + "\n");
  if (!problem.cure.empty()) complain("  " + problem.cure + "\n");
  return code;
}

api::Answer<api::Reply> run(const Arguments& arguments) {
  const std::string_view name = arguments.command->name;
  if (name == "show") return run_show(arguments);
  if (name == "certify") return run_certify(arguments);
  if (name == "weights") return run_weights(arguments);
  if (name == "recheck") return run_recheck(arguments);
  if (name == "field") return run_field(arguments);
  if (name == "selftest") return run_selftest(arguments);
  return api::Problem{"", "the command " + std::string(name) + " has no function", "", true};
}

int main_with(std::vector<std::string> words) {
  turn_signals_of_writing_into_errors();
  const bool json = std::ranges::find(words, "--json") != words.end();
  if (words.empty() || words.front() == "--help" || words.front() == "-h" || words.front() == "help") {
    if (words.size() == 2 && words.front() == "help")
      if (const Command* command = find_command(words[1])) return print_result(page(*command), yes);
    return print_result(overview(), words.empty() ? cannot_run : yes);
  }
  if (words.front() == "--version") return print_result(api::program_name() + "\n", yes);
  const Command* command = find_command(words.front());
  if (command == nullptr)
    return report({"command line", "\"" + words.front() + "\" is not a command", "see assize --help", false}, json);
  words.erase(words.begin());
  const auto arguments = parse(*command, words);
  if (!arguments) return report(to_problem(arguments.error()), json);
  if (arguments->has("--help")) return print_result(page(*command), yes);
  const auto reply = run(*arguments);
  if (!reply) return report(reply.problem(), json);
  if (arguments->has("--json")) return print_result(reply->json, exit_code(reply->holds));
  if (arguments->has("--quiet"))
    return print_result(reply->text.substr(0, reply->text.find('\n') + 1), exit_code(reply->holds));
  return print_result(reply->text, exit_code(reply->holds));
}

}  // namespace
}  // namespace assize::cli

int main(int count, char** words) {
  using namespace assize::cli;
  try {
    return main_with(std::vector<std::string>(words + std::min(count, 1), words + count));
  } catch (const std::bad_alloc&) {
    complain("assize: there is not enough memory\n  see the predicted memory with --plan\n");
    return cannot_run;
  } catch (const std::exception& error) {
    complain(std::string("assize: self-check failed: unexpected exception: ") + error.what() + "\n");
    return self_check_failed;
  }
}
