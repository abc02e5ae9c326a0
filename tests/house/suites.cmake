# Read by CTest before it runs: registers each suite of the test program `program` as the test <folder>/<suite>.
#
# By suite and not by case, since hundreds of cases that each start a program of their own take a hundred times as long.
execute_process(COMMAND "${program}" --gtest_list_tests
  OUTPUT_VARIABLE listing RESULT_VARIABLE code ERROR_QUIET TIMEOUT 60)
string(REGEX MATCHALL "(^|\n)[A-Za-z0-9_/]+\\." suites "${listing}")
if(NOT code EQUAL 0 OR NOT suites)
  add_test("${folder}/cannot-list-its-suites" "${cmake}" -E false)  # never a silent gap
endif()
foreach(suite IN LISTS suites)
  string(REGEX REPLACE "[\n.]" "" suite "${suite}")
  add_test("${folder}/${suite}" "${program}" "--gtest_filter=${suite}.*")
  set_tests_properties("${folder}/${suite}" PROPERTIES TIMEOUT 300 LABELS "${folder}")
endforeach()
