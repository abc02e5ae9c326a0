// Sentences that users in safety work rely on being there; common practice of the trade, no source.
#include "report/cautions.hpp"

namespace assize::report {

std::vector<std::string> cautions(const sheet::Description& description) {
  std::vector<std::string> out = {
      "The minimum distance d holds at the stated codeword length only: every pattern of 1 to d-1 wrong symbols is "
      "detected; "
      "how many heavier patterns pass undetected is told by the weights, not by d.",
      "Only substituted symbols are considered: lost or inserted symbols, bit stuffing, scrambling, line coding and "
      "synchronisation faults can defeat the distance.",
      "Code and transmission order are taken as described in the sheet; that an implementation computes this code is "
      "not "
      "verified.",
      "This certificate relates only to the code described in it and states mathematical properties of that code. It "
      "does "
      "not state that a system using the code is safe: that is for the designer and the responsible safety assessor to "
      "judge "
      "under the applicable standard and local rules.",
  };
  if (const auto* cyclic = std::get_if<sheet::Cyclic>(&description.family); cyclic != nullptr && cyclic->shortened)
    out.insert(
        out.begin() + 1,
        "All-zero frames, start values and inversions are outside this statement: they do not change distances between "
        "frames of one fixed length, but they matter for stuck lines and for frames whose length varies.");
  return out;
}

}  // namespace assize::report
