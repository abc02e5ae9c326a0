# Installs the library into a scratch folder, then builds and runs the project beside this file against it.
#
#   cmake -DBUILD=build/folder -DCONFIG=Release -DGENERATOR=Ninja -DCOMPILER=g++ -DFLAGS= \
#     -DSHEET=some/sheet.toml -DFOLDER=scratch/folder -P try.cmake
cmake_minimum_required(VERSION 3.25)
file(REMOVE_RECURSE "${FOLDER}")
foreach(step install configure build run)
  set(install "${CMAKE_COMMAND}" --install "${BUILD}" --config "${CONFIG}" --prefix "${FOLDER}/installed")
  set(configure "${CMAKE_COMMAND}" -S "${CMAKE_CURRENT_LIST_DIR}" -B "${FOLDER}/build" -G "${GENERATOR}"
    "-DCMAKE_BUILD_TYPE=${CONFIG}" "-DCMAKE_CXX_COMPILER=${COMPILER}" "-DCMAKE_CXX_FLAGS=${FLAGS}"
    "-DCMAKE_PREFIX_PATH=${FOLDER}/installed")
  set(build "${CMAKE_COMMAND}" --build "${FOLDER}/build")
  set(run "${FOLDER}/build/consumer" "${SHEET}")
  execute_process(COMMAND ${${step}} RESULT_VARIABLE code)
  if(NOT code EQUAL 0)
    message(FATAL_ERROR "could not ${step} (${code})")
  endif()
endforeach()
file(REMOVE_RECURSE "${FOLDER}")
