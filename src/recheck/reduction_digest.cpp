// The text of a reduced generator, digested while it is made.
#include "base/digest.hpp"
#include "recheck/reduction.hpp"
#include "recheck/word.hpp"

namespace assize::recheck {

std::string reduced_generator_digest(const Field& field, const Reduced& reduced) {
  const Matrix& g = reduced.generator;
  Digest digest;
  digest.absorb(std::to_string(field.order()) + " " + std::to_string(g.columns) + " " + std::to_string(g.rows) + "\n");
  std::string line;
  std::vector<bool> is_pivot(g.columns, false);
  for (std::size_t i = 0; i < reduced.pivots.size(); ++i) {
    line += (i == 0 ? "" : " ") + std::to_string(reduced.pivots[i]);
    is_pivot[reduced.pivots[i]] = true;
  }
  digest.absorb(line + "\n");
  for (std::size_t r = 0; r < g.rows; ++r) {
    line.clear();
    for (std::size_t c = 0; c < g.columns; ++c)
      if (!is_pivot[c]) append_symbol(line, g.row(r)[c], field.order(), line.empty());
    digest.absorb(line + "\n");
  }
  return digest.hex();
}

}  // namespace assize::recheck
