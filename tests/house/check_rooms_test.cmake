# Shows that the boundary test can fail: it must accept a good tree and name what is wrong in each bad one.
#
#   cmake -DCHECK=path/to/check_rooms.cmake -DFOLDER=scratch/folder -P check_rooms_test.cmake
cmake_minimum_required(VERSION 3.25)

# Makes a tree that is good except for one file, runs the boundary test on it, and compares with what is expected.
function(expect answer file text)
  file(REMOVE_RECURSE "${FOLDER}")
  file(WRITE "${FOLDER}/base/result.hpp" "// Results.\n#include <string>\n")
  file(WRITE "${FOLDER}/engine/run.hpp" "// Runs.\n#include \"base/result.hpp\"\n#include \"engine/shard.hpp\"\n")
  file(WRITE "${FOLDER}/${file}" "${text}")
  execute_process(COMMAND "${CMAKE_COMMAND}" "-DSRC=${FOLDER}" -P "${CHECK}"
    RESULT_VARIABLE code OUTPUT_VARIABLE output ERROR_VARIABLE output)
  string(FIND "${output}" "${answer}" position)
  if(answer STREQUAL "room boundaries hold")
    set(expected_code 0)
  else()
    set(expected_code 1)
  endif()
  if(position EQUAL -1 OR NOT code EQUAL expected_code)
    message(FATAL_ERROR "${file}: expected exit code ${expected_code} and \"${answer}\", got ${code} and\n${output}")
  endif()
  file(REMOVE_RECURSE "${FOLDER}")
endfunction()

expect("room boundaries hold"
  recheck/read.cpp "// Reads.\n#include <vector>\n#include \"recheck/read.hpp\"\n  #  include \"base/result.hpp\"\n")
expect("recheck/read.cpp includes \"engine/run.hpp\", but recheck may include: base"
  recheck/read.cpp "// Reads.\n#include \"base/result.hpp\"\n#include \"engine/run.hpp\"\n")
expect("store/file.hpp includes \"code/linear_code.hpp\", but store may include: base"
  store/file.hpp "// Files.\n \t# \tinclude  \"code/linear_code.hpp\"  // indented\n")
expect("base/word.cpp includes \"field/field.hpp\", but base may include: "
  base/word.cpp "// Words.\n#include <field/field.hpp>\n")
expect("store/file.cpp includes \"file.hpp\", which is in no room"
  store/file.cpp "// Files.\n#include \"file.hpp\"\n")
expect("store/file.cpp includes \"cellar/wine.hpp\", which is in no room"
  store/file.cpp "// Files.\n#include \"cellar/wine.hpp\"\n")
expect("cellar/wine.hpp lies in no room"
  cellar/wine.hpp "// Wine.\n")
expect("loose.cpp lies in no room"
  loose.cpp "// Loose.\n")
expect("store/file.hpp does not open with a comment line"
  store/file.hpp "#pragma once\n// Files.\n")
expect("store/file.hpp does not open with a comment line"
  store/file.hpp "//\n#pragma once\n")
expect("store/file.hpp does not open with a comment line"
  store/file.hpp "")
message(STATUS "the boundary test refuses what it should")
