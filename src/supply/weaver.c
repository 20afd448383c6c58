/* SPDX-License-Identifier: MIT */
/* weaver.c - Weaver's indices: the flame of a Bunsen burner, gas against gas. */
#include "bluecone/weaver.h"

#include "base/error_internal.h"
#include "supply/index_internal.h"

#include <math.h>

#define AIR_OXYGEN 0.2092 /* volume fraction of oxygen in the air of Weaver's table, RP2193, value from memory */

/* Hydrogen and carbon monoxide above which S is not used. Our own line: at 10 % hydrogen in methane S has risen by 21 %,
 * the measured burning velocity by about 8 %; at 20 % it is 46 against 20 %. */
#define RICH_MAX 0.10

static const struct {
    bool listed;
    double air, f;
} TABLE[PART_COUNT] = {
#define WEAVER(group, air, f, source) [PART_##group] = {true, air, f},
#include "data/weaver.def"
    /* any inert has the one coefficient of Z */
    [PART_CARBON_DIOXIDE] = {true, 0.0, 0.0},
    [PART_NITROGEN] = {true, 0.0, 0.0},
    [PART_INERTS] = {true, 0.0, 0.0},
};

/* Sums of the table over a gas; what has no constants burns with its own oxygen and F = 16 (A + 1), which the alkanes
 * from propane up share. */
typedef struct {
    double air, own_air, f, unlisted;
} sums;

static sums sum_over(const constituents *c)
{
    sums s = {0.0, 0.0, 0.0, 0.0};

    for (size_t p = 0; p < PART_COUNT; p++) {
        const double air = c->oxygen[p] / AIR_OXYGEN;

        if (p == PART_OXYGEN) {
            s.own_air -= TABLE[p].air * c->x[p];
        } else if (TABLE[p].listed) {
            s.air += TABLE[p].air * c->x[p];
            s.f += TABLE[p].f * c->x[p];
        } else {
            s.air += air;
            s.f += 16.0 * (air + c->x[p]);
            s.unlisted += c->x[p];
        }
    }
    return s;
}

/* S = sum F x/(A + 5 Z - 18.8 Q + 1), A of the combustibles only; 5 and 18.8 belong to fractions. */
static double speed_denominator(const constituents *c, const sums *s)
{
    const double inert = c->x[PART_CARBON_DIOXIDE] + c->x[PART_NITROGEN] + c->x[PART_INERTS];

    return s->air + 5.0 * inert - 18.8 * c->x[PART_OXYGEN] + 1.0;
}

static const char *too_foreign(const sums *s)
{
    return s->unlisted > UNLISTED_MAX ? "more than 1 % of substances for which Weaver gives no constants" : "";
}

static void mark_range(const constituents *c, const sums *s, bc_weaver_gas *g)
{
    const char *rich = "";

    g->outside = c->water > WATER_MAX ? WET_TEXT : "";
    const char *foreign = first_of(g->outside, too_foreign(s));

    if (rich_part(c) > RICH_MAX)
        rich = "hydrogen and carbon monoxide above 10 %: Weaver's flame speed factor does not follow them; MCP does";
    g->speed_outside = first_of(foreign, g->has_speed ? rich : "so much oxygen that the flame speed factor has no value");
    if (g->has_ratio)
        g->ratio_outside = first_of(foreign, rich);
    else
        g->ratio_outside = "no hydrocarbons: the ratio of hydrogen to carbon atoms has no value";
    g->yellow_outside = first_of(foreign, is_lpg_air(c) ? "LPG with air: the yellow tip index rejects every such mixture" : "");
}

static bc_status gas_of(const bc_reference *reference, const bc_gas *gas, const constituents *c, bc_weaver_gas *out, bc_error *err)
{
    bc_gas dry;
    const bc_status status = bc_gas_dry(gas, &dry, err);

    if (status != BC_OK)
        return status;
    const bc_value value = bc_value_of(reference, &dry);
    const sums s = sum_over(c);
    const double denominator = speed_denominator(c, &s);

    if (!(s.air - s.own_air > 0.0))
        return bc_fail(err, BC_ERR_RANGE, "the gas does not burn or holds the oxygen it needs: it has no Weaver index");
    bc_weaver_gas g = {.gross_j_per_m3 = value.gross_j_per_m3, .relative_density = value.relative_density, .air = s.air - s.own_air,
                       .oxygen_percent = 100.0 * c->x[PART_OXYGEN], .carbon_excess = 100.0 * (c->hydrocarbon_c - c->alkanes)};

    g.has_speed = denominator > 0.0;
    g.speed = g.has_speed ? s.f / denominator : 0.0;
    g.has_ratio = c->hydrocarbon_c > 0.0;
    g.ratio = g.has_ratio ? c->hydrogen_atoms / c->hydrocarbon_c : 0.0;
    mark_range(c, &s, &g);
    *out = g;
    return BC_OK;
}

bc_status bc_weaver_gas_of(const bc_reference *reference, const bc_gas *gas, bc_weaver_gas *out, bc_error *err)
{
    const constituents c = constituents_of(gas);

    return gas_of(reference, gas, &c, out, err);
}

bc_weaver bc_weaver_compare(const bc_weaver_gas *a, const bc_weaver_gas *s)
{
    const double q = sqrt(a->relative_density / s->relative_density);
    bc_weaver w = {.heat = s->gross_j_per_m3 / a->gross_j_per_m3 * q, .air = s->air / a->air * q};

    w.has_speed = a->has_speed && s->has_speed;
    if (w.has_speed) {
        const double speed = s->speed / a->speed;

        w.lifting = w.air * speed * (100.0 - s->oxygen_percent) / (100.0 - a->oxygen_percent);
        w.flashback = speed - 1.4 * w.air + 0.4;
    }
    w.has_incomplete = a->has_ratio && s->has_ratio;
    if (w.has_incomplete)
        w.incomplete = w.air - 0.366 * s->ratio / a->ratio - 0.634;
    w.yellow_tip = w.air + (s->carbon_excess - a->carbon_excess) / 110.0 - 1.0;
    return w;
}

/* Both gases of a case and their comparison. */
typedef struct {
    const bc_weaver_gas *a, *s;
    bc_weaver index;
} comparison;

static bc_status read_gas(const index_case *c, bool is_new, bc_error *err)
{
    index_room *room = c->room;
    bool *has = is_new ? &room->has_weaver_new : &room->has_weaver_old;
    const bc_reference *reference = NULL;

    if (*has)
        return BC_OK;
    bc_status status = method_reference(c, STATE_60F_30INHG, &reference, err);

    if (status == BC_OK)
        status = is_new ? gas_of(reference, &c->new_gas->gas, &room->new_parts, &room->weaver_new, err)
                        : gas_of(reference, &c->old_gas->gas, &room->old_parts, &room->weaver_old, err);
    *has = status == BC_OK;
    return status;
}

static bc_status compare(const index_case *c, comparison *v, bc_error *err)
{
    const index_room *room = c->room;
    bc_status status = read_gas(c, false, err);

    if (status == BC_OK)
        status = read_gas(c, true, err);
    if (status == BC_OK)
        *v = (comparison){&room->weaver_old, &room->weaver_new, bc_weaver_compare(&room->weaver_old, &room->weaver_new)};
    return status;
}

bc_status weaver_heat_index(const index_case *c, reading *r, bc_error *err)
{
    comparison v;
    const bc_status status = compare(c, &v, err);

    if (status == BC_OK)
        *r = reading_of(v.index.heat, first_of(v.a->outside, v.s->outside));
    return status;
}

bc_status weaver_air_index(const index_case *c, reading *r, bc_error *err)
{
    comparison v;
    const bc_status status = compare(c, &v, err);

    if (status == BC_OK)
        *r = reading_of(v.index.air, first_of(v.a->outside, v.s->outside));
    return status;
}

/* An index that rests on S. */
static reading speed_reading(const comparison *v, double value)
{
    const char *outside = first_of(v->a->speed_outside, v->s->speed_outside);

    return v->index.has_speed ? reading_of(value, outside) : reading_none(outside);
}

bc_status weaver_lifting_index(const index_case *c, reading *r, bc_error *err)
{
    comparison v;
    const bc_status status = compare(c, &v, err);

    if (status == BC_OK)
        *r = speed_reading(&v, v.index.lifting);
    return status;
}

bc_status weaver_flashback_index(const index_case *c, reading *r, bc_error *err)
{
    comparison v;
    const bc_status status = compare(c, &v, err);

    if (status == BC_OK)
        *r = speed_reading(&v, v.index.flashback);
    return status;
}

bc_status weaver_incomplete_index(const index_case *c, reading *r, bc_error *err)
{
    comparison v;
    const bc_status status = compare(c, &v, err);

    if (status != BC_OK)
        return status;
    const char *outside = first_of(v.a->ratio_outside, v.s->ratio_outside);

    *r = v.index.has_incomplete ? reading_of(v.index.incomplete, outside) : reading_none(outside);
    return BC_OK;
}

bc_status weaver_yellow_tip_index(const index_case *c, reading *r, bc_error *err)
{
    comparison v;
    const bc_status status = compare(c, &v, err);

    if (status == BC_OK)
        *r = reading_of(v.index.yellow_tip, first_of(v.a->yellow_outside, v.s->yellow_outside));
    return status;
}

bc_status weaver_speed_index(const index_case *c, reading *r, bc_error *err)
{
    const bc_weaver_gas *g = &c->room->weaver_new;
    const bc_status status = read_gas(c, true, err);

    if (status == BC_OK)
        *r = g->has_speed ? reading_of(g->speed, g->speed_outside) : reading_none(g->speed_outside);
    return status;
}
