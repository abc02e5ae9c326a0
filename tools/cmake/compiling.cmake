# How our own targets are compiled.

# Warnings for one target, and messages that name files as src/..., wherever the tree lies.
function(assize_compile_strictly target)
  target_compile_options(${target} PRIVATE
    -Wall -Wextra -Wpedantic -Wconversion -Wsign-conversion -Wshadow -Werror=switch
    "-fmacro-prefix-map=${PROJECT_SOURCE_DIR}/=")
  if(CMAKE_CXX_COMPILER_ID STREQUAL "GNU" AND CMAKE_CXX_COMPILER_VERSION VERSION_LESS 13)
    # g++ 12 raises it falsely on std::string::insert and replace (GCC bug 105651).
    target_compile_options(${target} PRIVATE -Wno-restrict)
  endif()
  set_target_properties(${target} PROPERTIES COMPILE_WARNING_AS_ERROR ${ASSIZE_WARNINGS_AS_ERRORS})
endfunction()

# Headers of a library that is nothing but headers, as system headers; an installed room does not ask for them again.
function(assize_use_headers target visibility)
  foreach(library IN LISTS ARGN)
    target_include_directories(${target} SYSTEM ${visibility}
      "$<BUILD_INTERFACE:$<TARGET_PROPERTY:${library},INTERFACE_INCLUDE_DIRECTORIES>>")
  endforeach()
endfunction()
