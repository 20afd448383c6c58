/* SPDX-License-Identifier: MIT */
/* json_internal.h - putting values into JSON, and the parts of a report that have a file of their own.
 *
 * Jansson passes a failure on: a value that could not be made is NULL, and putting NULL somewhere
 * fails. So only `failed` need be asked, once. */
#ifndef JSON_INTERNAL_H
#define JSON_INTERNAL_H

#include <jansson.h>

#include <math.h>
#include <stdbool.h>
#include <stdlib.h>

#include "output/plain_text_internal.h"
#include "output/report.h"

static inline void put(json_t *object, const char *key, json_t *value, bool *failed)
{
    if (json_object_set_new(object, key, value) != 0)
        *failed = true;
}

static inline void append(json_t *array, json_t *value, bool *failed)
{
    if (json_array_append_new(array, value) != 0)
        *failed = true;
}

/* Jansson takes valid UTF-8 only. NULL becomes null. */
static inline json_t *text_of(const char *text)
{
    char *plain = NULL;
    json_t *value = NULL;

    if (text == NULL)
        return json_null();
    plain = plain_text(text, PLAIN_ESCAPED);
    value = plain == NULL ? NULL : json_string(plain);
    free(plain);
    return value;
}

static inline json_t *number_of(double number)
{
    return isfinite(number) ? json_real(number) : json_null();
}

/* The charts of a report as an array. */
json_t *json_charts(const report *r, bool *failed);

#endif
