# What the tests of the substances of plant practice need beside their programs.
add_test(NAME unit.heat_capacity_data_refusals
  COMMAND Python3::Interpreter -B ${CMAKE_CURRENT_LIST_DIR}/plant_data_refusals.py ${PROJECT_SOURCE_DIR}/registry)
set_tests_properties(unit.heat_capacity_data_refusals PROPERTIES LABELS unit)
