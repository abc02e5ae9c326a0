// The one JSON spelling of a description (certs/FORMAT.md section 4), and its digest.
#pragma once
#include <string>

#include "base/json.hpp"
#include "sheet/description.hpp"

namespace assize::sheet {

Json to_json(const Description& description);
std::string description_digest(const Description& description);

/// "cyclic", "reed-solomon", ...: the name of a family as it stands in sheets.
std::string_view family_name(const Family& family) noexcept;
/// "blocks", "double", "bordered" or "exponents".
std::string_view form_name(QuasiCyclic::Form form) noexcept;

}  // namespace assize::sheet
