# Installs the engine under a fresh prefix, then builds and runs a project in C against it, once with
# find_package and once with pkg-config.
cmake_minimum_required(VERSION 3.25)
function(run)
  execute_process(COMMAND ${ARGN} RESULT_VARIABLE status OUTPUT_VARIABLE output
                  ERROR_VARIABLE output)
  if(NOT status EQUAL 0)
    message(FATAL_ERROR "${ARGN}\n${output}")
  endif()
endfunction()

file(REMOVE_RECURSE ${WORK})
file(MAKE_DIRECTORY ${WORK})
set(prefix ${WORK}/prefix)
run(${CMAKE_COMMAND} --install ${BUILD}/engine --prefix ${prefix} --config "${CONFIG}")

run(${CMAKE_COMMAND} -G ${GENERATOR} -S ${CONSUMER} -B ${WORK}/with-cmake
    -DCMAKE_PREFIX_PATH=${prefix} -DCMAKE_C_COMPILER=${C_COMPILER} "-DCMAKE_C_FLAGS=${FLAGS}")
run(${CMAKE_COMMAND} --build ${WORK}/with-cmake)
run(${WORK}/with-cmake/consumer)

find_program(PKG_CONFIG NAMES pkg-config pkgconf)
if(NOT PKG_CONFIG)
  message(FATAL_ERROR "pkg-config is missing: apt-get install pkgconf")
endif()
file(GLOB_RECURSE pc ${prefix}/*/busbar.pc)
get_filename_component(pc_folder "${pc}" DIRECTORY)
set(ENV{PKG_CONFIG_PATH} ${pc_folder})
# The file names the prefix of the build; this copy was installed somewhere else.
execute_process(
  COMMAND ${PKG_CONFIG} --define-variable=prefix=${prefix} --cflags --libs busbar
  OUTPUT_VARIABLE flags OUTPUT_STRIP_TRAILING_WHITESPACE COMMAND_ERROR_IS_FATAL ANY)
separate_arguments(flags UNIX_COMMAND "${flags} ${FLAGS}")
run(${C_COMPILER} ${CONSUMER}/consumer.c -o ${WORK}/with-pkg-config ${flags} -lm)
get_filename_component(library_folder "${pc_folder}" DIRECTORY)
set(ENV{LD_LIBRARY_PATH} ${library_folder})
run(${WORK}/with-pkg-config)
