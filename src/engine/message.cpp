// From the place of a word in the enumeration back to its message.
#include "engine/shard_engine.hpp"

namespace assize::engine {

std::vector<field::Element> message_in_shard(const evidence::EnumerationPlan& plan, std::uint64_t shard,
                                             std::uint64_t tail) {
  std::vector<field::Element> message = evidence::shard_prefix(plan, shard);
  message.resize(plan.dimension, 0);
  for (std::size_t i = plan.dimension; i > plan.dimension - plan.free_rows; tail /= plan.order)
    message[--i] = static_cast<field::Element>(tail % plan.order);
  contract(tail == 0, "a message lies in its shard");
  return message;
}

}  // namespace assize::engine
