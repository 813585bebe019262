# What the tests of the water models need beside their programs: reference values by python3-iapws and python3-gsw.
# Included from tests/CMakeLists.txt after the test programs are defined.
set(water_reference_file ${CMAKE_CURRENT_BINARY_DIR}/water_reference.csv)
add_custom_command(
  OUTPUT ${water_reference_file}
  COMMAND Python3::Interpreter -B ${CMAKE_CURRENT_LIST_DIR}/water_reference.py ${water_reference_file}
  DEPENDS ${CMAKE_CURRENT_LIST_DIR}/water_reference.py
  COMMENT "Computing reference values for water" VERBATIM)
add_custom_target(water_reference_values DEPENDS ${water_reference_file})
foreach(suffix IN ITEMS "" LISTS core_variants)
  add_dependencies(published_water_reference${suffix} water_reference_values)
  target_compile_definitions(published_water_reference${suffix} PRIVATE WATER_REFERENCE_FILE="${water_reference_file}")
endforeach()

add_test(NAME published.water_coefficients
  COMMAND Python3::Interpreter -B ${CMAKE_CURRENT_LIST_DIR}/water_coefficients.py ${PROJECT_SOURCE_DIR})
set_tests_properties(published.water_coefficients PROPERTIES LABELS published)
