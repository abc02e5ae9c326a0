# Holds the arrows between the rooms: reads every source file and names each line that steps out of line.
#
#   cmake -DSRC=path/to/src -P tools/cmake/check_rooms.cmake
#
# Refused: a source file outside the rooms; an include of a room that rooms.cmake does not allow, or, in quotes, of
# anything that is not a room; and a file that does not open with a comment saying why it exists.
cmake_minimum_required(VERSION 3.25)
include("${CMAKE_CURRENT_LIST_DIR}/rooms.cmake")

get_filename_component(SRC "${SRC}" ABSOLUTE)
if(NOT IS_DIRECTORY "${SRC}")
  message(FATAL_ERROR "-DSRC=\"${SRC}\" is not a folder")
endif()
file(GLOB_RECURSE files "${SRC}/*.hpp" "${SRC}/*.cpp" "${SRC}/*.h" "${SRC}/*.hpp.in")
if(NOT files)
  message(FATAL_ERROR "no source file in ${SRC}")
endif()

set(faults 0)
macro(report_fault)
  message("${ARGV}")
  math(EXPR faults "${faults}+1")
endmacro()

foreach(file IN LISTS files)
  file(RELATIVE_PATH path "${SRC}" "${file}")
  string(REGEX REPLACE "/.*" "" room "${path}")
  if(NOT room IN_LIST assize_rooms)
    report_fault("${path} lies in no room")
    continue()
  endif()

  file(READ "${file}" opening LIMIT 100)
  if(NOT opening MATCHES "^// *[^ \n]")
    report_fault("${path} does not open with a comment line saying why it exists")
  endif()

  string(REPLACE ";" " " allowed "${assize_allow_${room}}")
  file(STRINGS "${file}" lines REGEX "^[ \t]*#[ \t]*include[ \t]*[<\"]")
  foreach(line IN LISTS lines)
    string(REGEX REPLACE "^[ \t]*#[ \t]*include[ \t]*([<\"])([^>\"]+).*" "\\1\\2" target "${line}")
    string(SUBSTRING "${target}" 0 1 bracket)
    string(SUBSTRING "${target}" 1 -1 target)
    string(REGEX REPLACE "/.*" "" target_room "${target}")
    if(target_room STREQUAL room OR target_room IN_LIST assize_allow_${room})
      continue()
    endif()
    if(target MATCHES "/" AND target_room IN_LIST assize_rooms)
      report_fault("${path} includes \"${target}\", but ${room} may include: ${allowed}")
    elseif(bracket STREQUAL "\"")
      report_fault("${path} includes \"${target}\", which is in no room; write \"room/file.hpp\", or <...> for a library")
    endif()
  endforeach()
endforeach()

if(faults)
  message(FATAL_ERROR "${faults} fault(s) at the room boundaries")
endif()
message(STATUS "room boundaries hold")
