# The drift test: writes the function reference anew and compares it with the committed one.
execute_process(COMMAND ${EXPORTER} --reference ${FRESH} COMMAND_ERROR_IS_FATAL ANY)
execute_process(COMMAND ${CMAKE_COMMAND} -E compare_files ${FRESH} ${COMMITTED}
                RESULT_VARIABLE differs)
if(differs)
  message(FATAL_ERROR "addin/help/functions.md is not what the catalogue says. "
                      "Build the target `reference` and commit the file.")
endif()
