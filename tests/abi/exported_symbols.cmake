# The dynamic symbols of the library against its header and its version script.
cmake_minimum_required(VERSION 3.25)
set(failed FALSE)
function(complain message)
  message(STATUS "${message}")
  set(failed TRUE PARENT_SCOPE)
endfunction()

execute_process(COMMAND ${NM} -D --defined-only ${LIBRARY}
                OUTPUT_VARIABLE listing COMMAND_ERROR_IS_FATAL ANY)
string(REGEX MATCHALL "[^\n]+" lines "${listing}")
set(exported)
foreach(line IN LISTS lines)
  if(line MATCHES " T (busbar_[a-z_]+)@@BUSBAR_1$")
    list(APPEND exported ${CMAKE_MATCH_1})
  elseif(NOT line MATCHES " A BUSBAR_1(@@BUSBAR_1)?$")
    complain("exported beyond the C interface: ${line}")
  endif()
endforeach()

file(READ ${HEADER} header)
string(REGEX MATCHALL "BUSBAR_API[^;]*[ *](busbar_[a-z_]+)\\(" declarations "${header}")
set(declared)
foreach(declaration IN LISTS declarations)
  string(REGEX REPLACE ".*[ *](busbar_[a-z_]+)\\($" "\\1" name "${declaration}")
  list(APPEND declared ${name})
endforeach()
list(LENGTH declared count)
if(count LESS 25)
  complain("only ${count} declarations were found in the header: this check is broken")
endif()
foreach(name IN LISTS declared)
  if(NOT name IN_LIST exported)
    complain("declared but not exported: ${name}")
  endif()
endforeach()
foreach(name IN LISTS exported)
  if(NOT name IN_LIST declared)
    complain("exported but not declared: ${name}")
  endif()
endforeach()

# The engine prints nothing, opens nothing and does not end the process.
if(NOT SANITIZE)
  execute_process(COMMAND ${NM} -D --undefined-only ${LIBRARY} OUTPUT_VARIABLE wanted
                  COMMAND_ERROR_IS_FATAL ANY)
  foreach(forbidden IN ITEMS printf fprintf vprintf puts fputs putchar fwrite write fopen open open64
                             socket connect system execve exit _exit getenv setlocale localeconv
                             rand srand time)
    if(wanted MATCHES " U ${forbidden}(@[A-Za-z0-9_.]+)?\n")
      complain("the engine calls ${forbidden}")
    endif()
  endforeach()
endif()

execute_process(COMMAND ${READELF} -d ${LIBRARY} OUTPUT_VARIABLE dynamic
                COMMAND_ERROR_IS_FATAL ANY)
if(NOT dynamic MATCHES "SONAME[^\n]*\\[${SONAME}\\]")
  complain("the soname is not ${SONAME}")
endif()

if(failed)
  message(FATAL_ERROR "the exported symbols are not those of the C interface")
endif()
