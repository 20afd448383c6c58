/* SPDX-License-Identifier: MIT */
/* stream_part_plan.c - the plan of a tally to and from a part file. */
#include "cli/stream_part_internal.h"

#include <limits.h>
#include <math.h>
#include <string.h>

static const char *const PERIODS[] = {"whole", "hour", "day", "month"};

static json_t *bound_to(bool there, double bound)
{
    return there ? json_real(bound) : json_null();
}

static json_t *names_to(const tally_plan *plan, const char *what, bool *failed)
{
    json_t *a = json_array();

    if (strcmp(what, "figures") == 0)
        for (size_t i = 0; i < plan->figure_count; i++) {
            const tally_figure_name *n = &plan->figures[i];

            part_append(a, json_pack("[sss]", n->id, n->label, n->unit), failed);
        }
    if (strcmp(what, "limits") == 0)
        for (size_t i = 0; i < plan->limit_count; i++) {
            const tally_limit_name *n = &plan->limits[i];

            part_append(a, json_pack("[sssoo]", n->id, n->unit, n->state, bound_to(n->has_min, n->min), bound_to(n->has_max, n->max)),
                        failed);
        }
    if (strcmp(what, "flags") == 0)
        for (size_t i = 0; i < plan->flag_count; i++)
            part_append(a, json_pack("[ss]", plan->flags[i].id, plan->flags[i].label), failed);
    return a;
}

json_t *part_plan_to(const tally_plan *plan, bool *failed)
{
    json_t *o = json_object();

    part_put(o, "by", json_string(PERIODS[plan->by]), failed);
    part_put(o, "step_s", json_real(plan->step_s), failed);
    part_put(o, "zoned", json_boolean(plan->zoned), failed);
    part_put(o, "state", json_pack("[fffbi]", plan->at.combustion_c, plan->at.metering_c, plan->at.metering_pa, (int)plan->at.saturated,
                                plan->at.edition), failed);
    part_put(o, "contract", json_string(plan->contract), failed);
    part_put(o, "figures", names_to(plan, "figures", failed), failed);
    part_put(o, "limits", names_to(plan, "limits", failed), failed);
    part_put(o, "flags", names_to(plan, "flags", failed), failed);
    return o;
}

static bool text_from(const json_t *from, char to[], size_t size)
{
    const char *text = json_string_value(from);

    if (!text || json_string_length(from) >= size || strlen(text) != json_string_length(from))
        return false;
    memcpy(to, text, strlen(text) + 1);
    return true;
}

static bool bound_from(const json_t *from, bool *there, double *bound)
{
    *there = json_is_number(from);
    *bound = *there ? json_number_value(from) : 0.0;
    return (*there || json_is_null(from)) && isfinite(*bound);
}

static bool figure_from(const json_t *from, tally_figure_name *n)
{
    part_list l = part_list_of(from);

    return text_from(part_take(&l), n->id, sizeof n->id) && text_from(part_take(&l), n->label, sizeof n->label)
           && text_from(part_take(&l), n->unit, sizeof n->unit) && part_list_ended(&l);
}

static bool limit_from(const json_t *from, tally_limit_name *n)
{
    part_list l = part_list_of(from);

    return text_from(part_take(&l), n->id, sizeof n->id) && text_from(part_take(&l), n->unit, sizeof n->unit)
           && text_from(part_take(&l), n->state, sizeof n->state) && bound_from(part_take(&l), &n->has_min, &n->min)
           && bound_from(part_take(&l), &n->has_max, &n->max) && (n->has_min || n->has_max) && part_list_ended(&l);
}

static bool state_from(const json_t *from, tally_plan *plan)
{
    part_list l = part_list_of(from);
    bc_state *at = &plan->at;

    at->combustion_c = part_take_number(&l);
    at->metering_c = part_take_number(&l);
    at->metering_pa = part_take_number(&l);
    const json_t *saturated = part_take(&l);

    at->saturated = json_is_true(saturated);
    const uint64_t edition = part_take_count(&l);

    at->edition = edition < INT_MAX ? (int)edition : 0;
    bc_state_describe(at, plan->state, sizeof plan->state);
    return json_is_boolean(saturated) && part_list_ended(&l) && bc_state_check(at, NULL) == BC_OK;
}

static bool flag_from(const json_t *from, tally_flag_name *n)
{
    part_list l = part_list_of(from);

    return text_from(part_take(&l), n->id, sizeof n->id) && text_from(part_take(&l), n->label, sizeof n->label) && part_list_ended(&l);
}

static bool counted(const json_t *array, size_t most, size_t *count)
{
    *count = json_array_size(array);
    return json_is_array(array) && *count <= most;
}

static bool names_from(const json_t *from, tally_plan *plan)
{
    const json_t *figures = json_object_get(from, "figures");
    const json_t *limits = json_object_get(from, "limits");
    const json_t *flags = json_object_get(from, "flags");
    bool good = counted(figures, TALLY_FIGURE_MAX, &plan->figure_count) && counted(limits, TALLY_LIMIT_MAX, &plan->limit_count)
                && counted(flags, TALLY_FLAG_MAX, &plan->flag_count);

    for (size_t i = 0; good && i < plan->figure_count; i++)
        good = figure_from(json_array_get(figures, i), &plan->figures[i]);
    for (size_t i = 0; good && i < plan->limit_count; i++)
        good = limit_from(json_array_get(limits, i), &plan->limits[i]);
    for (size_t i = 0; good && i < plan->flag_count; i++)
        good = flag_from(json_array_get(flags, i), &plan->flags[i]);
    return good;
}

static bool period_from(const json_t *from, tally_period *by)
{
    const char *word = json_string_value(from);
    unsigned i = 0;

    while (word && i < BC_COUNT(PERIODS) && strcmp(word, PERIODS[i]) != 0)
        i++;
    *by = (tally_period)i;
    return word && i < BC_COUNT(PERIODS);
}

bool part_plan_from(const json_t *from, tally_plan *plan)
{
    const json_t *step = json_object_get(from, "step_s");
    const json_t *zoned = json_object_get(from, "zoned");

    memset(plan, 0, sizeof *plan);
    plan->step_s = json_number_value(step);
    plan->zoned = json_is_true(zoned);
    return json_is_number(step) && json_is_boolean(zoned) && period_from(json_object_get(from, "by"), &plan->by)
           && state_from(json_object_get(from, "state"), plan)
           && text_from(json_object_get(from, "contract"), plan->contract, sizeof plan->contract) && names_from(from, plan);
}
