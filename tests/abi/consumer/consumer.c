/* A project of its own that uses an installed Busbar. */
#include <busbar.h>
#include <math.h>
#include <stdio.h>
#include <string.h>

int main(void) {
  const char* name = "STEAM_ENTHALPY";
  busbar_value* pressure = busbar_number(30);
  busbar_value* temperature = busbar_number(26.85);
  const busbar_value* arguments[2];
  busbar_value* result = NULL;
  double enthalpy;

  arguments[0] = pressure;
  arguments[1] = temperature;
  if (busbar_abi_version() != BUSBAR_ABI_VERSION) return 1;
  if (busbar_call_by_name(name, strlen(name), arguments, 2, &result) != BUSBAR_OK) return 2;
  enthalpy = busbar_get_number(result, 0, 0);
  busbar_value_free(result);
  busbar_value_free(temperature);
  busbar_value_free(pressure);
  printf("%.6f\n", enthalpy);
  /* IAPWS R7-97(2012), Table 5: 115.331273 kJ/kg at 300 K and 3 MPa */
  return fabs(enthalpy - 115.331273) < 5e-7 ? 0 : 3;
}
