# Finds the LibreOffice SDK and the office that it belongs to.
#
#   LibreOfficeSDK_FOUND
#   LIBREOFFICE_SDK_HOME     folder of the SDK (set it, or the environment's OO_SDK_HOME, to choose)
#   LIBREOFFICE_PROGRAM      folder of the office's programs and type libraries
#   LIBREOFFICE_TYPES        the office's type libraries
#   LibreOfficeSDK::uno      headers and libraries of the UNO runtime for C++ components

find_path(
  LIBREOFFICE_SDK_HOME bin/cppumaker
  HINTS ENV OO_SDK_HOME
  PATHS /usr/lib/libreoffice/sdk /usr/lib64/libreoffice/sdk /opt/libreoffice/sdk
  DOC "LibreOffice SDK")
if(LIBREOFFICE_SDK_HOME)
  find_path(
    LIBREOFFICE_PROGRAM types.rdb
    HINTS ${LIBREOFFICE_SDK_HOME}/../program
    NO_DEFAULT_PATH
    DOC "Programs of the office")
  get_filename_component(LIBREOFFICE_PROGRAM "${LIBREOFFICE_PROGRAM}" REALPATH)
  set(LIBREOFFICE_TYPES ${LIBREOFFICE_PROGRAM}/types.rdb ${LIBREOFFICE_PROGRAM}/types/offapi.rdb)
endif()

include(FindPackageHandleStandardArgs)
find_package_handle_standard_args(LibreOfficeSDK REQUIRED_VARS LIBREOFFICE_SDK_HOME
                                                               LIBREOFFICE_PROGRAM)
mark_as_advanced(LIBREOFFICE_SDK_HOME LIBREOFFICE_PROGRAM)

if(LibreOfficeSDK_FOUND AND NOT TARGET LibreOfficeSDK::uno)
  add_library(LibreOfficeSDK::uno INTERFACE IMPORTED)
  set_target_properties(
    LibreOfficeSDK::uno
    PROPERTIES INTERFACE_SYSTEM_INCLUDE_DIRECTORIES ${LIBREOFFICE_SDK_HOME}/include
               INTERFACE_INCLUDE_DIRECTORIES ${LIBREOFFICE_SDK_HOME}/include
               INTERFACE_COMPILE_DEFINITIONS "UNX;GCC;LINUX;CPPU_ENV=gcc3"
               INTERFACE_LINK_DIRECTORIES ${LIBREOFFICE_SDK_HOME}/lib
               INTERFACE_LINK_LIBRARIES "uno_cppu;uno_cppuhelpergcc3;uno_sal")
endif()
