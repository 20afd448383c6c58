/* SPDX-License-Identifier: MIT */
/* stream_part_list.c - numbers in JSON arrays. */
#include "cli/stream_part_internal.h"

#include "supply/tally_calendar.h"

#include <math.h>

part_list part_list_of(const json_t *array)
{
    return (part_list){.array = array, .bad = !json_is_array(array)};
}

const json_t *part_take(part_list *l)
{
    const json_t *value = l->bad ? NULL : json_array_get(l->array, l->next++);

    l->bad = l->bad || !value;
    return value;
}

uint64_t part_take_count(part_list *l)
{
    const json_t *value = part_take(l);

    l->bad = l->bad || !json_is_integer(value) || json_integer_value(value) < 0;
    return l->bad ? 0 : (uint64_t)json_integer_value(value);
}

double part_take_number(part_list *l)
{
    const json_t *value = part_take(l);
    const double number = json_number_value(value);

    l->bad = l->bad || !json_is_number(value) || !isfinite(number);
    return l->bad ? 0.0 : number;
}

int64_t part_take_time(part_list *l)
{
    const json_t *value = part_take(l);
    const json_int_t ms = json_integer_value(value);

    l->bad = l->bad || !json_is_integer(value) || ms < -1 || ms > TALLY_LATEST_MS;
    return l->bad || ms < 0 ? TALLY_NO_TIME : ms;
}

tally_sum part_take_sum(part_list *l, double most)
{
    tally_sum s = {.sum = part_take_number(l)};

    s.error = part_take_number(l);
    l->bad = l->bad || fabs(s.sum) >= most || fabs(s.error) >= most;
    return s;
}

bool part_list_ended(const part_list *l)
{
    return !l->bad && l->next == json_array_size(l->array);
}

void part_put(json_t *object, const char *key, json_t *value, bool *failed)
{
    if (json_object_set_new(object, key, value) != 0)
        *failed = true;
}

void part_append(json_t *array, json_t *value, bool *failed)
{
    if (json_array_append_new(array, value) != 0)
        *failed = true;
}

void part_append_count(json_t *array, uint64_t count, bool *failed)
{
    part_append(array, json_integer((json_int_t)count), failed);
}

void part_append_time(json_t *array, int64_t ms, bool *failed)
{
    part_append(array, json_integer(ms == TALLY_NO_TIME ? -1 : ms), failed);
}

void part_append_sum(json_t *array, const tally_sum *s, bool *failed)
{
    part_append(array, json_real(s->sum), failed);
    part_append(array, json_real(s->error), failed);
}
