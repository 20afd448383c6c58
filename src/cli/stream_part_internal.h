/* SPDX-License-Identifier: MIT */
/* stream_part_internal.h - putting numbers into JSON arrays, and taking them out again one by one.
 *
 * Nothing that a file says is believed: a list that is too short, too long, or has something else than what is asked
 * for is `bad` from there on, and all that is taken is zero; so only `bad` need be asked, once. */
#ifndef STREAM_PART_INTERNAL_H
#define STREAM_PART_INTERNAL_H

#include <jansson.h>

#include "base/compiler.h"
#include "supply/tally_internal.h"

/* No sum of values or heats below TALLY_VALUE_MAX comes near, nor one of their products; their squares stay finite. */
#define PART_SUM_MAX 1e140
#define PART_PRODUCT_MAX 1e240

typedef struct {
    const json_t *array;
    size_t next;
    bool bad;
} part_list;

part_list part_list_of(const json_t *array);
const json_t *part_take(part_list *l);
uint64_t part_take_count(part_list *l);
double part_take_number(part_list *l); /* finite */
int64_t part_take_time(part_list *l);  /* TALLY_NO_TIME where there is none */
tally_sum part_take_sum(part_list *l, double most); /* of a magnitude below `most` */
bool part_list_ended(const part_list *l); /* all taken, nothing bad */

void part_put(json_t *object, const char *key, json_t *value, bool *failed);
void part_append(json_t *array, json_t *value, bool *failed);
void part_append_count(json_t *array, uint64_t count, bool *failed);
void part_append_time(json_t *array, int64_t ms, bool *failed);
void part_append_sum(json_t *array, const tally_sum *s, bool *failed);

json_t *part_plan_to(const tally_plan *plan, bool *failed);
json_t *part_group_to(const tally_group *g, size_t figures, bool *failed);
json_t *part_bins_to(const tally_bins *b, bool *failed);
json_t *part_stretch_to(const tally_stretch *s, bool *failed);
json_t *part_beyond_to(const tally_beyond *b, bool *failed);

/* False: what is there cannot be. Without memory, too, and then errno is ENOMEM. */
bool part_plan_from(const json_t *from, tally_plan *plan);
bool part_group_from(const json_t *from, size_t figures, tally_group *g);
bool part_groups_from(const json_t *from, int64_t key_max, size_t most, tally_groups *s);
bool part_bins_from(const json_t *from, tally_bins *b);
bool part_stretch_from(const json_t *from, size_t limits, tally_stretch *s);
bool part_beyond_from(const json_t *from, size_t limit, tally_beyond *b);

/* All that stands behind the plan, into an empty tally; the key of what is damaged, NULL when nothing is. */
const char *part_fill(const json_t *from, tally *t);

#endif
