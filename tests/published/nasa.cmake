# What the tests of the NASA Glenn set need beside their programs: values by SciPy's quadrature.
# Included from tests/CMakeLists.txt after the test programs are defined.
execute_process(COMMAND ${Python3_EXECUTABLE} -c "import scipy.integrate" RESULT_VARIABLE scipy_missing OUTPUT_QUIET ERROR_QUIET)
if(NOT scipy_missing EQUAL 0)
  message(FATAL_ERROR "The tests need the Python package scipy (Debian: python3-scipy)")
endif()

set(nasa_independent_file ${CMAKE_CURRENT_BINARY_DIR}/nasa_independent.tsv)
set(nasa_data_file ${PROJECT_SOURCE_DIR}/registry/data/nasa-glenn.txt)
add_custom_command(
  OUTPUT ${nasa_independent_file}
  COMMAND Python3::Interpreter -B ${CMAKE_CURRENT_LIST_DIR}/nasa_independent.py ${nasa_data_file} ${nasa_independent_file}
  DEPENDS ${CMAKE_CURRENT_LIST_DIR}/nasa_independent.py ${nasa_data_file}
  COMMENT "Evaluating the NASA Glenn set by quadrature" VERBATIM)
add_custom_target(nasa_independent_values DEPENDS ${nasa_independent_file})
foreach(suffix IN ITEMS "" LISTS core_variants)
  add_dependencies(published_nasa_set${suffix} nasa_independent_values)
  target_compile_definitions(published_nasa_set${suffix} PRIVATE NASA_INDEPENDENT_FILE="${nasa_independent_file}")
endforeach()

add_test(NAME unit.property_data_refusals
  COMMAND Python3::Interpreter -B ${CMAKE_CURRENT_LIST_DIR}/nasa_data_refusals.py ${PROJECT_SOURCE_DIR}/registry)
set_tests_properties(unit.property_data_refusals PROPERTIES LABELS unit)
