// How statements and evidence items are spelled in a certificate; private to this room.
#pragma once
#include "base/json.hpp"
#include "evidence/conclusions.hpp"

namespace assize::certificate {

Json statement_json(const evidence::Statement& statement);
Json item_json(const evidence::Item& item, std::uint32_t order);

}  // namespace assize::certificate
