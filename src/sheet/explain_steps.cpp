// Steps in words.
#include "base/overloaded.hpp"
#include "sheet/explain.hpp"

namespace assize::sheet {

namespace {

std::string listed(const std::vector<std::uint32_t>& positions) {
  constexpr std::size_t shown = 16;
  std::string out;
  for (std::size_t i = 0; i < positions.size() && i < shown; ++i) out += " " + std::to_string(positions[i]);
  return positions.size() > shown ? out + " ... (" + std::to_string(positions.size()) + " in all)" : out;
}

}  // namespace

std::string explain_steps(const Description& description) {
  std::string text;
  for (const Step& step : description.steps) {
    if (!text.empty()) text += '\n';
    text += std::visit(
        Overloaded{
            [](const Extend&) -> std::string { return "extend: append minus the sum of all symbols"; },
            [](const Dual&) -> std::string { return "dual"; },
            [](const Puncture& each) -> std::string {
              return "puncture: leave out the positions" + listed(each.positions);
            },
            [](const Shorten& each) -> std::string {
              return "shorten: keep the words that are zero at, and then leave out, the positions" +
                     listed(each.positions);
            },
            [](const Expurgate&) -> std::string { return "expurgate: keep the words whose symbols sum to zero"; },
            [](const Augment&) -> std::string { return "augment: add the all-one word"; },
            [](const BinaryImage& image) -> std::string {
              std::string basis;
              for (const Element element : image.basis) basis += " " + std::to_string(element);
              return "binary-image, basis " + image.as_written + ":" + basis;
            },
            [](const SubfieldSubcode& each) -> std::string {
              return "subfield-subcode: keep the words over GF(" + std::to_string(each.field.order()) + ")";
            },
            [](const Permute& each) -> std::string {
              return "permute: new positions take the old positions" + listed(each.order);
            },
            [](const Repeat& each) -> std::string { return "repeat: " + std::to_string(each.times) + " times"; },
        },
        step.what);
  }
  return text;
}

}  // namespace assize::sheet
