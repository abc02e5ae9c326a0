// The three answers there are.  "Undecided" is an answer, not an error.
#pragma once
#include <string_view>

namespace assize::evidence {

enum class Verdict { proved, refuted, undecided };

constexpr std::string_view name(Verdict verdict) noexcept {
  switch (verdict) {
    case Verdict::proved:
      return "proved";
    case Verdict::refuted:
      return "refuted";
    case Verdict::undecided:
      return "undecided";
  }
  return "";
}

}  // namespace assize::evidence
