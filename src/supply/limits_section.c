/* SPDX-License-Identifier: MIT */
/* limits_section.c - the sections [limit WHAT] and [range COMPONENT] of a contract file. */
#include "supply/limits_internal.h"

#include "base/error_internal.h"
#include "base/text.h"
#include "bluecone/number.h"

#include <stdio.h>
#include <string.h>

/* The index of a state's figures, looked up once for all limits that share it. */
static bc_status reference_for(limits_reader *r, const bc_state *state, size_t *index)
{
    bc_contract *c = r->c;

    for (size_t i = 0; i < c->reference_count; i++) {
        const bc_state *s = &c->references[i].state;

        if (s->combustion_c == state->combustion_c && s->metering_c == state->metering_c && s->metering_pa == state->metering_pa
            && s->saturated == state->saturated && s->edition == state->edition) {
            *index = i;
            return BC_OK;
        }
    }
    if (c->reference_count == BC_LIMIT_REFERENCE_MAX)
        return bc_fail(r->err, BC_ERR_INPUT, "the limits have more than %d different reference states; join some", BC_LIMIT_REFERENCE_MAX);
    *index = c->reference_count;
    return bc_reference_at(state, &c->references[c->reference_count++], r->err);
}

static bc_status take_bound(const limits_reader *r, const bc_ini_entry *e, bool *has, double *bound)
{
    if (!e)
        return BC_OK;
    *has = true;
    return bc_number_parse(e->value, bound, r->err) == BC_OK ? BC_OK : limits_blame(r, e->line);
}

/* Only these keys stand in the section that begins with entry `first`. */
static bc_status check_keys(const limits_reader *r, const char *section, const char *const keys[], size_t count)
{
    for (size_t i = 0; i < bc_ini_count(r->ini); i++) {
        const bc_ini_entry *e = bc_ini_at(r->ini, i);
        bool known = strcmp(e->section, section) != 0;

        for (size_t k = 0; k < count && !known; k++)
            known = bc_text_same(keys[k], e->key);
        if (!known)
            return bc_fail_at(r->err, BC_ERR_INPUT, r->path, e->line, "unknown key '%s' in [%s]; known are min, max, unit%s", e->key, section,
                              count > 3 ? ", at, saturated, edition, basis, note" : "");
    }
    return BC_OK;
}

static bc_status check_bounds(const limits_reader *r, const bc_limit *limit)
{
    if (!limit->has_min && !limit->has_max)
        return bc_fail_at(r->err, BC_ERR_INPUT, r->path, limit->line, "the limit on '%s' has neither min nor max; give it one", limit->id);
    if (limit->has_min && limit->has_max && limit->min > limit->max)
        return bc_fail_at(r->err, BC_ERR_INPUT, r->path, limit->line, "the limit on '%s' has a min above its max; exchange them", limit->id);
    return BC_OK;
}

static bc_status take_bounds(const limits_reader *r, const char *section, bc_limit *limit)
{
    bc_status status = take_bound(r, bc_ini_find(r->ini, section, "min"), &limit->has_min, &limit->min);

    if (status == BC_OK)
        status = take_bound(r, bc_ini_find(r->ini, section, "max"), &limit->has_max, &limit->max);
    return status == BC_OK ? check_bounds(r, limit) : status;
}

/* 500 without a unit is 500 mol %, where ppm or mg/m3 was meant: a limit that every gas keeps. */
static bc_status check_share(const limits_reader *r, const bc_limit *limit)
{
    const double least = bc_unit_to_si(&limit->shown, limit->has_min ? limit->min : limit->max);
    const double most = bc_unit_to_si(&limit->shown, limit->has_max ? limit->max : limit->min);
    const bool is_share = limit->kind == BC_LIMIT_FRACTION || limit->kind == BC_LIMIT_MASS_FRACTION || limit->kind == BC_LIMIT_VOLUME_FRACTION;

    if (is_share && !(least >= 0.0 && most <= 1.0))
        return bc_fail_at(r->err, BC_ERR_INPUT, r->path, limit->line, "a share is from 0 to 100 %%: no gas has %.6g %s of %s; mend the number, or write its unit, as ppm",
                          least >= 0.0 ? most / bc_unit_to_si(&limit->shown, 1.0) : least / bc_unit_to_si(&limit->shown, 1.0), limit->unit, limit->id);
    return BC_OK;
}

/* The state of a limit: the contract's, with its own `at`, `saturated` and `edition`. */
static bc_status take_state(limits_reader *r, const char *section, bc_state *state)
{
    const bc_ini_entry *at = bc_ini_find(r->ini, section, "at");
    const bc_ini_entry *saturated = bc_ini_find(r->ini, section, "saturated");
    const bc_ini_entry *edition = bc_ini_find(r->ini, section, "edition");
    bc_status status = BC_OK;

    *state = r->c->state;
    if (saturated)
        status = limits_take_yes(r, saturated, &state->saturated);
    if (status == BC_OK && edition)
        status = limits_take_edition(r, edition, &state->edition);
    if (status == BC_OK && at && bc_state_parse(at->value, state, r->err) != BC_OK)
        return limits_blame(r, at->line);
    return status;
}

/* What the figure is of: its basis, its unit and a note. */
static bc_status fill_words(limits_reader *r, const char *section, const bc_state *state, bc_limit *limit)
{
    const bc_ini_entry *unit = bc_ini_find(r->ini, section, "unit");
    const bc_ini_entry *basis = bc_ini_find(r->ini, section, "basis");
    const bc_ini_entry *note = bc_ini_find(r->ini, section, "note");

    if (note && strlen(note->value) >= sizeof limit->note)
        return limits_refuse(r, note, "the note of a limit is longer than 159 bytes; shorten it");
    (void)snprintf(limit->note, sizeof limit->note, "%s", note ? note->value : "");
    if (basis && limit_take_basis(basis->value, limit, r->err) != BC_OK)
        return limits_blame(r, basis->line);
    if (limit_take_unit(unit ? unit->value : "", state, limit, r->err) != BC_OK)
        return limits_blame(r, unit ? unit->line : limit->line);
    limit->unit_assumed = !unit && strcmp(limit->unit, "1") != 0;
    return check_share(r, limit);
}

static bc_status fill_limit(limits_reader *r, const char *section, bc_limit *limit)
{
    bc_state state;
    bc_status status = take_state(r, section, &state);

    limit->state_assumed = !r->c->state_stated && !bc_ini_find(r->ini, section, "at");
    if (status == BC_OK)
        status = take_bounds(r, section, limit);
    if (status != BC_OK)
        return status;
    if (reference_for(r, &state, &limit->reference) != BC_OK)
        return limits_blame(r, limit->line);
    return fill_words(r, section, &state, limit);
}

/* The limit with an id that a followed file set, which is replaced as a whole, or a new one. */
static bc_limit *place_of(bc_contract *c, const char *id)
{
    for (size_t i = 0; i < c->limit_count; i++)
        if (strcmp(c->limits[i].id, id) == 0)
            return &c->limits[i];
    return c->limit_count < BC_LIMIT_MAX ? &c->limits[c->limit_count] : NULL;
}

bc_status limits_take_limit(limits_reader *r, const bc_ini_entry *e)
{
    static const char *const LIMIT_KEYS[] = {"min", "max", "unit", "at", "saturated", "edition", "basis", "note"};
    bc_limit limit;
    bc_status status = check_keys(r, e->section, LIMIT_KEYS, BC_COUNT(LIMIT_KEYS));

    memset(&limit, 0, sizeof limit);
    limit.line = e->line;
    (void)snprintf(limit.path, sizeof limit.path, "%s", r->path);
    if (status == BC_OK && limit_find(e->section + strlen("limit "), &limit, r->err) != BC_OK)
        status = limits_blame(r, e->line);
    if (status == BC_OK)
        status = fill_limit(r, e->section, &limit);
    if (status != BC_OK)
        return status;
    bc_limit *place = place_of(r->c, limit.id);

    if (!place)
        return limits_refuse(r, e, "the contract has more than 64 limits; join some");
    if (place == &r->c->limits[r->c->limit_count])
        r->c->limit_count++;
    else if (strcmp(place->path, limit.path) == 0)
        return bc_fail_at(r->err, BC_ERR_INPUT, r->path, e->line, "[%s] limits what line %d limits already; join them", e->section, place->line);
    *place = limit;
    return BC_OK;
}

/* The range on a word that a followed file set, which is replaced, or a new one; NULL when there is no room. */
static bc_range *range_place(bc_contract *c, const char *id)
{
    for (size_t i = 0; i < c->range_count; i++)
        if (bc_text_same(c->ranges[i].id, id))
            return &c->ranges[i];
    return c->range_count < BC_LIMIT_MAX ? &c->ranges[c->range_count] : NULL;
}

static bc_status keep_range(const limits_reader *r, const bc_ini_entry *e, const bc_range *range)
{
    bc_range *place = range_place(r->c, range->id);

    if (!place)
        return limits_refuse(r, e, "the contract has more than 64 ranges; join some");
    if (place == &r->c->ranges[r->c->range_count])
        r->c->range_count++;
    *place = *range;
    return BC_OK;
}

/* The window of a component in mole fractions, from bounds read as those of a limit. */
static bc_status fill_range(const limits_reader *r, const bc_ini_entry *e, bc_range *range)
{
    const bc_ini_entry *unit = bc_ini_find(r->ini, e->section, "unit");
    bc_limit bounds;

    memset(&bounds, 0, sizeof bounds);
    bounds.line = e->line;
    bounds.kind = BC_LIMIT_FRACTION;
    memcpy(bounds.id, range->id, sizeof bounds.id);
    const bc_status status = take_bounds(r, e->section, &bounds);

    if (status != BC_OK)
        return status;
    if (limit_take_unit(unit ? unit->value : "", &r->c->state, &bounds, r->err) != BC_OK)
        return limits_blame(r, e->line);
    if (bounds.kind != BC_LIMIT_FRACTION)
        return limits_refuse(r, e, "a range is one of mole fractions; write mol %, ppm or 1 as its unit");
    range->min = bounds.has_min ? bc_unit_to_si(&bounds.shown, bounds.min) : 0.0;
    range->max = bounds.has_max ? bc_unit_to_si(&bounds.shown, bounds.max) : 1.0;
    return check_share(r, &bounds);
}

/* A window of the composition, mol % unless a unit is written. */
bc_status limits_take_range(limits_reader *r, const bc_ini_entry *e)
{
    static const char *const RANGE_KEYS[] = {"min", "max", "unit"};
    bc_range range = {.min = 0.0, .max = 0.0};
    bc_status status = check_keys(r, e->section, RANGE_KEYS, BC_COUNT(RANGE_KEYS));

    (void)snprintf(range.id, sizeof range.id, "%s", e->section + strlen("range "));
    if (status == BC_OK && !limit_members(range.id, range.weight))
        return bc_fail_at(r->err, BC_ERR_INPUT, r->path, e->line, "'%s' is no component or group (bluecone list species)", range.id);
    if (status == BC_OK)
        status = fill_range(r, e, &range);
    if (status == BC_OK)
        return keep_range(r, e, &range);
    return status;
}
