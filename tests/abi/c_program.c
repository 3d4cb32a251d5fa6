/* The C interface, used from C. Every check prints its line when it fails; the program then ends
 * with status 1. */
#include <math.h>
#include <stdio.h>
#include <stdlib.h>
#include <string.h>

#include "busbar.h"

static int failures = 0;

#define CHECK(condition)                                                        \
  do {                                                                          \
    if (!(condition)) {                                                         \
      fprintf(stderr, "%s:%d: not true: %s\n", __FILE__, __LINE__, #condition); \
      ++failures;                                                               \
    }                                                                           \
  } while (0)

static busbar_value* call2(const char* name, double x, double y) {
  busbar_value* first = busbar_number(x);
  busbar_value* second = busbar_number(y);
  const busbar_value* arguments[2];
  busbar_value* result = NULL;
  arguments[0] = first;
  arguments[1] = second;
  CHECK(busbar_call_by_name(name, strlen(name), arguments, 2, &result) == BUSBAR_OK);
  busbar_value_free(first);
  busbar_value_free(second);
  return result;
}

static void library(void) {
  CHECK(busbar_abi_version() == BUSBAR_ABI_VERSION);
  CHECK(strlen(busbar_version()) >= 5);
  CHECK(busbar_catalogue_fingerprint() != 0);
  CHECK(busbar_catalogue_fingerprint() == busbar_catalogue_fingerprint());
  CHECK(busbar_cell_limit() >= 1048576);
  CHECK(busbar_text_limit() >= 32768);
}

static void cells(void) {
  busbar_value* grid = busbar_value_create(2, 3);
  size_t length = 99;
  CHECK(grid != NULL);
  CHECK(busbar_rows(grid) == 2 && busbar_columns(grid) == 3);
  CHECK(busbar_kind(grid, 1, 2) == BUSBAR_BLANK);
  CHECK(busbar_set_number(grid, 0, 0, 1.5) == BUSBAR_OK);
  CHECK(busbar_set_text(grid, 0, 1, "a\0b", 3) == BUSBAR_OK);
  CHECK(busbar_set_logical(grid, 0, 2, 7) == BUSBAR_OK);
  CHECK(busbar_set_error(grid, 1, 0, BUSBAR_ERROR_MISSING) == BUSBAR_OK);
  CHECK(busbar_set_text(grid, 1, 1, NULL, 0) == BUSBAR_OK);

  CHECK(busbar_kind(grid, 0, 0) == BUSBAR_NUMBER);
  CHECK(busbar_get_number(grid, 0, 0) == 1.5);
  CHECK(busbar_kind(grid, 0, 1) == BUSBAR_TEXT);
  CHECK(memcmp(busbar_get_text(grid, 0, 1, &length), "a\0b", 4) == 0);
  CHECK(length == 3);
  CHECK(busbar_kind(grid, 0, 2) == BUSBAR_LOGICAL);
  CHECK(busbar_get_logical(grid, 0, 2) == 1);
  CHECK(busbar_kind(grid, 1, 0) == BUSBAR_ERROR);
  CHECK(busbar_get_error(grid, 1, 0) == BUSBAR_ERROR_MISSING);
  CHECK(busbar_kind(grid, 1, 1) == BUSBAR_TEXT);
  CHECK(strcmp(busbar_get_text(grid, 1, 1, NULL), "") == 0);

  /* A cell of another kind reads as nothing. */
  CHECK(busbar_get_number(grid, 0, 1) == 0);
  CHECK(busbar_get_text(grid, 0, 0, &length) == NULL && length == 0);
  CHECK(busbar_get_logical(grid, 0, 0) == 0);
  CHECK(busbar_get_error(grid, 0, 0) == BUSBAR_ERROR_NONE);
  CHECK(busbar_get_reason(grid, 0, 0, NULL, 0) == 0);

  CHECK(busbar_set_blank(grid, 0, 0) == BUSBAR_OK);
  CHECK(busbar_kind(grid, 0, 0) == BUSBAR_BLANK);
  busbar_value_free(grid);
}

static void nothing_where_something_is_needed(void) {
  char buffer[4] = "abc";
  busbar_value* one = busbar_number(1);
  busbar_value* result = one;
  const busbar_value* arguments[1];
  arguments[0] = NULL;

  busbar_value_free(NULL);
  CHECK(busbar_rows(NULL) == 0 && busbar_columns(NULL) == 0);
  CHECK(busbar_kind(NULL, 0, 0) == BUSBAR_BLANK);
  CHECK(busbar_get_number(NULL, 0, 0) == 0);
  CHECK(busbar_get_text(NULL, 0, 0, NULL) == NULL);
  CHECK(busbar_get_logical(NULL, 0, 0) == 0);
  CHECK(busbar_get_error(NULL, 0, 0) == BUSBAR_ERROR_NONE);
  CHECK(busbar_get_reason(NULL, 0, 0, buffer, sizeof buffer) == 0 && buffer[0] == '\0');
  CHECK(busbar_set_number(NULL, 0, 0, 1) == BUSBAR_BAD_HANDLE);
  CHECK(busbar_set_text(NULL, 0, 0, "x", 1) == BUSBAR_BAD_HANDLE);
  CHECK(busbar_set_text(one, 0, 0, NULL, 1) == BUSBAR_BAD_HANDLE);
  CHECK(busbar_set_logical(NULL, 0, 0, 1) == BUSBAR_BAD_HANDLE);
  CHECK(busbar_set_blank(NULL, 0, 0) == BUSBAR_BAD_HANDLE);
  CHECK(busbar_set_error(NULL, 0, 0, BUSBAR_ERROR_VALUE) == BUSBAR_BAD_HANDLE);
  CHECK(busbar_set_error(one, 0, 0, BUSBAR_ERROR_NONE) == BUSBAR_BAD_HANDLE);
  CHECK(busbar_set_error(one, 0, 0, 1234) == BUSBAR_BAD_HANDLE);
  CHECK(busbar_kind(one, 0, 0) == BUSBAR_NUMBER);
  CHECK(busbar_text(NULL, 1) == NULL);

  CHECK(busbar_find(NULL, 5) == NULL);
  CHECK(busbar_find("STEAM", 0) == NULL);
  CHECK(busbar_call(NULL, arguments, 1, &result) == BUSBAR_BAD_HANDLE && result == NULL);
  CHECK(busbar_call(NULL, arguments, 1, NULL) == BUSBAR_BAD_HANDLE);
  CHECK(busbar_call(busbar_find("CARNOT", 6), NULL, 2, &result) == BUSBAR_BAD_HANDLE);
  CHECK(busbar_call(busbar_find("CARNOT", 6), arguments, 1, NULL) == BUSBAR_BAD_HANDLE);
  CHECK(busbar_explain(NULL, NULL, 0, &result) == BUSBAR_BAD_HANDLE && result == NULL);
  CHECK(busbar_call_by_name(NULL, 3, NULL, 0, &result) == BUSBAR_OK);
  CHECK(busbar_get_error(result, 0, 0) == BUSBAR_ERROR_VALUE);
  busbar_value_free(result);
  CHECK(busbar_call(busbar_find("CARNOT", 6), NULL, 0, &result) == BUSBAR_OK);
  CHECK(busbar_get_error(result, 0, 0) == BUSBAR_ERROR_MISSING);
  busbar_value_free(result);

  CHECK(busbar_function_text(NULL, BUSBAR_FUNCTION_NAME) == NULL);
  CHECK(busbar_function_text(busbar_function_at(0), 10) == NULL);
  CHECK(busbar_function_text(busbar_function_at(0), -1) == NULL);
  CHECK(busbar_argument_count(NULL) == 0);
  CHECK(busbar_argument_text(NULL, 0, BUSBAR_ARGUMENT_NAME) == NULL);
  CHECK(busbar_argument_text(busbar_function_at(0), 99, BUSBAR_ARGUMENT_NAME) == NULL);
  CHECK(busbar_argument_text(busbar_function_at(0), 0, 2) == NULL);
  CHECK(busbar_argument_kind(NULL, 0) == -1);
  CHECK(busbar_argument_optional(NULL, 0) == 0);
  CHECK(busbar_argument_range(NULL, 0, "si", NULL, 0) == 0);
  CHECK(busbar_argument_range(busbar_function_at(0), 0, NULL, NULL, 0) == 0);
  CHECK(busbar_argument_range(busbar_function_at(0), 0, "furlong", NULL, 0) == 0);
  CHECK(busbar_function_at(busbar_function_count()) == NULL);
  busbar_value_free(one);
}

static void places_and_sizes(void) {
  busbar_value* grid = busbar_value_create(2, 2);
  CHECK(busbar_set_number(grid, 2, 0, 1) == BUSBAR_BAD_HANDLE);
  CHECK(busbar_set_number(grid, 0, 2, 1) == BUSBAR_BAD_HANDLE);
  CHECK(busbar_set_text(grid, (size_t)-1, 0, "x", 1) == BUSBAR_BAD_HANDLE);
  CHECK(busbar_kind(grid, 2, 2) == BUSBAR_BLANK);
  CHECK(busbar_get_number(grid, (size_t)-1, (size_t)-1) == 0);
  busbar_value_free(grid);
  CHECK(busbar_value_create(0, 1) == NULL);
  CHECK(busbar_value_create(1, 0) == NULL);
  CHECK(busbar_value_create((size_t)-1, 2) == NULL);
  CHECK(busbar_value_create((size_t)1 << 33, (size_t)1 << 33) == NULL);
  CHECK(busbar_value_create(busbar_cell_limit() + 1, 1) == NULL);
  grid = busbar_value_create(1048576, 1);
  CHECK(grid != NULL);
  busbar_value_free(grid);
}

static void long_texts(void) {
  const size_t limit = busbar_text_limit();
  char* text = malloc(limit + 1);
  busbar_value* value = busbar_value_create(1, 1);
  size_t length = 0;
  if (text == NULL) exit(2);
  memset(text, 'x', limit + 1);
  CHECK(busbar_set_text(value, 0, 0, text, limit) == BUSBAR_OK);
  CHECK(busbar_get_text(value, 0, 0, &length) != NULL && length == limit);
  CHECK(busbar_set_text(value, 0, 0, text, limit + 1) == BUSBAR_TOO_LARGE);
  CHECK(busbar_text(text, limit + 1) == NULL);
  busbar_value_free(value);
  free(text);
}

static void numbers_and_reasons(void) {
  char small[8];
  char large[400];
  size_t length;
  /* IAPWS R7-97(2012), Table 5 */
  busbar_value* result = call2("STEAM_ENTHALPY", 30, 26.85);
  CHECK(fabs(busbar_get_number(result, 0, 0) - 115.331273) < 5e-7);
  busbar_value_free(result);

  result = call2("STEAM", 1200, 540);
  CHECK(busbar_get_error(result, 0, 0) == BUSBAR_ERROR_RANGE);
  length = busbar_get_reason(result, 0, 0, large, sizeof large);
  CHECK(length == strlen(large));
  CHECK(strncmp(large, "STEAM: pressure 1200 bar is above 1000 bar", 42) == 0);
  CHECK(busbar_get_reason(result, 0, 0, small, sizeof small) == length);
  CHECK(strcmp(small, "STEAM: ") == 0);
  CHECK(busbar_get_reason(result, 0, 0, small, 1) == length && small[0] == '\0');
  small[0] = 'k';
  CHECK(busbar_get_reason(result, 0, 0, small, 0) == length && small[0] == 'k');
  CHECK(busbar_get_reason(result, 0, 0, NULL, 5) == length);
  busbar_value_free(result);

  result = call2("no such thing", 1, 2);
  CHECK(busbar_get_error(result, 0, 0) == BUSBAR_ERROR_VALUE);
  busbar_get_reason(result, 0, 0, large, sizeof large);
  CHECK(strstr(large, "no such thing") != NULL);
  busbar_value_free(result);
}

/* "°" has two bytes: a reason is never cut inside it. */
static void reasons_are_cut_between_characters(void) {
  char whole[400];
  char part[400];
  size_t capacity;
  busbar_value* result = call2("STEAM", 100, 5000);
  const size_t length = busbar_get_reason(result, 0, 0, whole, sizeof whole);
  int seen = 0;
  CHECK(strstr(whole, "\xC2\xB0") != NULL);
  for (capacity = 1; capacity <= length + 1; ++capacity) {
    size_t size;
    CHECK(busbar_get_reason(result, 0, 0, part, capacity) == length);
    size = strlen(part);
    CHECK(size < capacity && strncmp(part, whole, size) == 0);
    CHECK(size == 0 || (unsigned char)part[size - 1] != 0xC2);
    if (size + 2 == capacity) ++seen;
  }
  CHECK(seen > 0);
  busbar_value_free(result);
}

static void tables(void) {
  const char* text = "STREAM_TABLE";
  busbar_value* streams = busbar_value_create(2, 1);
  busbar_value* table = NULL;
  const busbar_value* arguments[1];
  size_t row;
  for (row = 0; row < 2; ++row) {
    busbar_value* stream = call2("STEAM", 100, 500 + 40 * (double)row);
    size_t length = 0;
    const char* cell = busbar_get_text(stream, 0, 0, &length);
    CHECK(busbar_set_text(streams, row, 0, cell, length) == BUSBAR_OK);
    busbar_value_free(stream);
  }
  arguments[0] = streams;
  CHECK(busbar_call_by_name(text, strlen(text), arguments, 1, &table) == BUSBAR_OK);
  CHECK(busbar_rows(table) == 3 && busbar_columns(table) == 8);
  CHECK(busbar_kind(table, 0, 0) == BUSBAR_TEXT);
  CHECK(busbar_get_number(table, 1, 3) == 500 && busbar_get_number(table, 2, 3) == 540);
  busbar_value_free(table);
  busbar_value_free(streams);
}

static void catalogue(void) {
  size_t i;
  char range[100];
  for (i = 0; i < busbar_function_count(); ++i) {
    const busbar_function* function = busbar_function_at(i);
    const char* name = busbar_function_text(function, BUSBAR_FUNCTION_NAME);
    int32_t field;
    size_t argument;
    CHECK(busbar_find(name, strlen(name)) == function);
    CHECK(busbar_function_index(function) == i);
    for (field = BUSBAR_FUNCTION_NAME; field <= BUSBAR_FUNCTION_RESULT; ++field) {
      CHECK(busbar_function_text(function, field) != NULL);
    }
    for (argument = 0; argument < busbar_argument_count(function); ++argument) {
      const int32_t kind = busbar_argument_kind(function, argument);
      CHECK(strlen(busbar_argument_text(function, argument, BUSBAR_ARGUMENT_NAME)) > 0);
      CHECK(strlen(busbar_argument_text(function, argument, BUSBAR_ARGUMENT_MEANING)) > 0);
      CHECK(kind >= BUSBAR_ARGUMENT_NUMBER && kind <= BUSBAR_ARGUMENT_COMPOSITION);
    }
  }
  CHECK(busbar_find("steam", 5) == busbar_find("STEAM", 5));
  busbar_argument_range(busbar_find("STEAM", 5), 1, "us", range, sizeof range);
  CHECK(strstr(range,
               "\xC2\xB0"
               "F") != NULL);
}

static void too_many_arguments(void) {
  const busbar_value* arguments[256] = {0};
  busbar_value* result = NULL;
  CHECK(busbar_call(busbar_find("CARNOT", 6), arguments, 255, &result) == BUSBAR_OK);
  CHECK(busbar_get_error(result, 0, 0) == BUSBAR_ERROR_VALUE);
  busbar_value_free(result);
  CHECK(busbar_call(busbar_find("CARNOT", 6), arguments, 256, &result) == BUSBAR_TOO_LARGE);
  CHECK(result == NULL);
}

int main(void) {
  library();
  cells();
  nothing_where_something_is_needed();
  places_and_sizes();
  long_texts();
  numbers_and_reasons();
  reasons_are_cut_between_characters();
  tables();
  catalogue();
  too_many_arguments();
  if (failures == 0) printf("every check held\n");
  return failures == 0 ? 0 : 1;
}
