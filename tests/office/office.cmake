# Tests in a real office; the Python must be that of the system, which has the `uno` module.
if(ENTROPY_LEDGER_EXTENSION)
  file(GLOB office_tests CONFIGURE_DEPENDS ${CMAKE_CURRENT_LIST_DIR}/test_*.py)
  foreach(file IN LISTS office_tests)
    cmake_path(GET file STEM name)
    string(REGEX REPLACE "^test_" "office." name ${name})
    add_test(NAME ${name} COMMAND Python3::Interpreter -B ${file} -v WORKING_DIRECTORY ${CMAKE_CURRENT_LIST_DIR})
    set(environment
      ENTROPY_LEDGER_OFFICE=${ENTROPY_LEDGER_OFFICE}
      ENTROPY_LEDGER_PACKAGE=${PROJECT_BINARY_DIR}/entropy-ledger.oxt
      ENTROPY_LEDGER_EXTENSIONS=${PROJECT_BINARY_DIR}/extension/unpacked)
    set_tests_properties(${name} PROPERTIES LABELS office TIMEOUT 900 ENVIRONMENT "${environment}")
  endforeach()
endif()
