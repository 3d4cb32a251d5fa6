/* Busbar's C interface: the one header that a program outside the engine includes.
 *
 * A value is a grid of cells; a single cell is a grid of 1 x 1. A cell is blank or holds a number,
 * a text (UTF-8), a logical or an error. Values are opaque; whoever creates or receives one frees
 * it.
 *
 * Every function may be called on any thread at any time; a value that is being changed must not be
 * used by two threads at once. Nothing here throws, prints, or touches a file or the network.
 * Numbers are in the units of the unit set that the call's `options` argument names ("metric" when
 * it is omitted). The same arguments give the same result, always.
 */
#ifndef BUSBAR_H
#define BUSBAR_H

#include <stddef.h>
#include <stdint.h>

#if defined(_WIN32)
#define BUSBAR_API __declspec(dllexport)
#else
#define BUSBAR_API __attribute__((visibility("default")))
#endif

#ifdef __cplusplus
extern "C" {
#endif

/* Grows by one when a program built against an older header would no longer work. */
#define BUSBAR_ABI_VERSION 1

typedef struct busbar_value busbar_value;
typedef struct busbar_function busbar_function;

/* What a call of this interface itself can answer. */
#define BUSBAR_OK 0
#define BUSBAR_OUT_OF_MEMORY 1
#define BUSBAR_BAD_HANDLE 2 /* a null pointer, or a row, column or field that does not exist */
#define BUSBAR_TOO_LARGE 3  /* beyond busbar_cell_limit() or busbar_text_limit() */

/* What a cell holds. */
#define BUSBAR_BLANK 0
#define BUSBAR_NUMBER 1
#define BUSBAR_TEXT 2
#define BUSBAR_LOGICAL 3
#define BUSBAR_ERROR 4

/* Kinds of error, each with the error that Calc shows for it. */
#define BUSBAR_ERROR_NONE 0
#define BUSBAR_ERROR_MISSING 1 /* #N/A: a value is missing */
#define BUSBAR_ERROR_VALUE 2   /* #VALUE!: wrong kind, unknown word, wrong shape, damaged text */
#define BUSBAR_ERROR_RANGE 3   /* Err:502: outside the published range, or impossible */
#define BUSBAR_ERROR_CONVERGENCE 4 /* Err:523: an iteration reached its cap */
#define BUSBAR_ERROR_INTERNAL 5    /* #VALUE!: a defect of the engine; please report it */

/* --- The library ------------------------------------------------------------------------------ */

/* BUSBAR_ABI_VERSION of the library that is loaded. */
BUSBAR_API uint32_t busbar_abi_version(void);

/* "major.minor.patch" of the library that is loaded. */
BUSBAR_API const char* busbar_version(void);

/* A number that depends on every function name and argument of the catalogue: what was generated
 * from another catalogue must not be used with this library. */
BUSBAR_API uint64_t busbar_catalogue_fingerprint(void);

/* Most cells that one value may hold, and most bytes of one text. */
BUSBAR_API size_t busbar_cell_limit(void);
BUSBAR_API size_t busbar_text_limit(void);

/* --- Values ----------------------------------------------------------------------------------- */

/* A grid of blank cells. NULL when rows or columns is zero, when the grid is too large, or when
 * memory is out. */
BUSBAR_API busbar_value* busbar_value_create(size_t rows, size_t columns);

/* Frees a value; NULL is allowed. */
BUSBAR_API void busbar_value_free(busbar_value* value);

/* Fill one cell. Rows and columns count from 0. Return BUSBAR_OK or what went wrong. A text is
 * copied; it needs no terminating zero. `kind` is one of BUSBAR_ERROR_... */
BUSBAR_API int32_t busbar_set_number(busbar_value* value, size_t row, size_t column, double number);
BUSBAR_API int32_t busbar_set_text(busbar_value* value, size_t row, size_t column, const char* text,
                                   size_t length);
BUSBAR_API int32_t busbar_set_logical(busbar_value* value, size_t row, size_t column,
                                      int32_t logical);
BUSBAR_API int32_t busbar_set_blank(busbar_value* value, size_t row, size_t column);
BUSBAR_API int32_t busbar_set_error(busbar_value* value, size_t row, size_t column, int32_t kind);

/* A grid of one cell that holds a number or a text. NULL when memory is out. */
BUSBAR_API busbar_value* busbar_number(double number);
BUSBAR_API busbar_value* busbar_text(const char* text, size_t length);

/* The shape of a value, 0 for NULL. */
BUSBAR_API size_t busbar_rows(const busbar_value* value);
BUSBAR_API size_t busbar_columns(const busbar_value* value);

/* What one cell holds: BUSBAR_BLANK for a cell that does not exist. */
BUSBAR_API int32_t busbar_kind(const busbar_value* value, size_t row, size_t column);

/* The content of one cell: 0, NULL or BUSBAR_ERROR_NONE when it holds something else. A text lives
 * until the value is changed or freed, ends in a zero, and may hold further zeros before; its
 * length goes to *length where length is not NULL. */
BUSBAR_API double busbar_get_number(const busbar_value* value, size_t row, size_t column);
BUSBAR_API const char* busbar_get_text(const busbar_value* value, size_t row, size_t column,
                                       size_t* length);
BUSBAR_API int32_t busbar_get_logical(const busbar_value* value, size_t row, size_t column);
BUSBAR_API int32_t busbar_get_error(const busbar_value* value, size_t row, size_t column);

/* The reason for the error in one cell, in words and in the units of the call. Writes at most
 * `capacity` bytes including the ending zero, cut at a character boundary, and returns the number
 * of bytes of the whole sentence without the zero; 0 when the cell holds no error. */
BUSBAR_API size_t busbar_get_reason(const busbar_value* value, size_t row, size_t column,
                                    char* buffer, size_t capacity);

/* --- Calls ------------------------------------------------------------------------------------ */

/* The function of that name, capitals or not; NULL when there is none. Functions live as long as
 * the library. */
BUSBAR_API const busbar_function* busbar_find(const char* name, size_t length);

/* Calls a function. arguments[i] may be NULL for an argument that is left out. What fails inside is
 * an error cell in *result; a status other than BUSBAR_OK (and *result NULL) means that there was
 * no call at all. */
BUSBAR_API int32_t busbar_call(const busbar_function* function,
                               const busbar_value* const* arguments, size_t count,
                               busbar_value** result);

/* The same by name. An unknown name is an error cell that says so. */
BUSBAR_API int32_t busbar_call_by_name(const char* name, size_t length,
                                       const busbar_value* const* arguments, size_t count,
                                       busbar_value** result);

/* Explains a call in words: why it fails (for a table: its first failing cell), or which equation,
 * region and validity answered. *result holds one text. */
BUSBAR_API int32_t busbar_explain(const busbar_function* function,
                                  const busbar_value* const* arguments, size_t count,
                                  busbar_value** result);

/* --- The catalogue ---------------------------------------------------------------------------- */

BUSBAR_API size_t busbar_function_count(void);
BUSBAR_API const busbar_function* busbar_function_at(size_t index);
/* Position in the catalogue, busbar_function_count() for NULL. */
BUSBAR_API size_t busbar_function_index(const busbar_function* function);

/* Texts of a function, never NULL for a field that exists; they live as long as the library. */
#define BUSBAR_FUNCTION_NAME 0
#define BUSBAR_FUNCTION_CHAPTER 1
#define BUSBAR_FUNCTION_SUMMARY 2
#define BUSBAR_FUNCTION_NOTES 3
#define BUSBAR_FUNCTION_SOURCE 4         /* document, edition and place, as one text */
#define BUSBAR_FUNCTION_EXAMPLE 5        /* a formula without the equals sign */
#define BUSBAR_FUNCTION_EXAMPLE_GIVEN 6  /* cells it reads: "B2=STEAM(10;300) | B3=7", often "" */
#define BUSBAR_FUNCTION_EXAMPLE_ANSWER 7 /* what the cell shows, to the digits printed */
#define BUSBAR_FUNCTION_SINCE 8
#define BUSBAR_FUNCTION_RESULT 9 /* what comes back */
BUSBAR_API const char* busbar_function_text(const busbar_function* function, int32_t field);

/* Arguments, `options` included, count from 0. */
BUSBAR_API size_t busbar_argument_count(const busbar_function* function);
#define BUSBAR_ARGUMENT_NAME 0
#define BUSBAR_ARGUMENT_MEANING 1
BUSBAR_API const char* busbar_argument_text(const busbar_function* function, size_t argument,
                                            int32_t field);

/* How an argument is taken. */
#define BUSBAR_ARGUMENT_NUMBER 0
#define BUSBAR_ARGUMENT_STREAM 1
#define BUSBAR_ARGUMENT_WORD 2
#define BUSBAR_ARGUMENT_NUMBERS 3 /* a whole range of numbers */
#define BUSBAR_ARGUMENT_STREAMS 4 /* a whole range of streams */
#define BUSBAR_ARGUMENT_CELL 5    /* a reference to one cell, which the host explains itself */
#define BUSBAR_ARGUMENT_REST 6    /* any further arguments, of any kind; always the last one */
#define BUSBAR_ARGUMENT_OPTIONS 7
#define BUSBAR_ARGUMENT_COMPOSITION 8 /* a text, or a table of two columns or two rows */
BUSBAR_API int32_t busbar_argument_kind(const busbar_function* function, size_t argument);
/* 1 when the argument may be left out, else 0. */
BUSBAR_API int32_t busbar_argument_optional(const busbar_function* function, size_t argument);

/* Unit and allowed range of an argument in a unit set ("metric", "us", "si"), such as
 * "°C, 0 to 2000"; written like busbar_get_reason, "" where there is nothing to say. */
BUSBAR_API size_t busbar_argument_range(const busbar_function* function, size_t argument,
                                        const char* unit_set, char* buffer, size_t capacity);

#ifdef __cplusplus
}
#endif

#endif
