# lull_room(Name SOURCES a.cpp ... ROOMS Timing ... [DEPENDS target ...])
#
# A room is an object library of its own, so that it can be built and tested
# alone, and a part of libLull, the one shared library that every tool, plugin
# and test of the IR links (TypeIDs must exist once in a process). ROOMS names
# the rooms to its left, whose headers it may include (a lint holds it so).
function(lull_room name)
  cmake_parse_arguments(ARG "" "" "SOURCES;ROOMS;DEPENDS" ${ARGN})
  set(target Lull${name}Room)
  add_library(${target} STATIC ${ARG_SOURCES})
  llvm_update_compile_flags(${target})
  target_link_libraries(${target} PUBLIC fmt::fmt)
  foreach(room ${ARG_ROOMS})
    target_link_libraries(${target} PUBLIC Lull${room}Room)
  endforeach()
  if(ARG_DEPENDS)
    add_dependencies(${target} ${ARG_DEPENDS})
  endif()
  set_property(GLOBAL APPEND PROPERTY LULL_ROOMS ${target})
endfunction()

# lull_unit_test(Name SOURCES a.cpp ... LINK target ...)
function(lull_unit_test name)
  cmake_parse_arguments(ARG "" "" "SOURCES;LINK" ${ARGN})
  add_executable(${name} ${ARG_SOURCES})
  llvm_update_compile_flags(${name})
  target_link_libraries(${name} PRIVATE ${ARG_LINK} GTest::gtest_main)
  set_property(GLOBAL APPEND PROPERTY LULL_UNIT_TESTS ${name})
  add_test(NAME ${name} COMMAND ${name})
endfunction()
