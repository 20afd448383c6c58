/* SPDX-License-Identifier: MIT */
/* aga36.c - the three indices of AGA Bulletin 36. */
#include "bluecone/aga36.h"

#include "base/error_internal.h"
#include "supply/index_internal.h"

#include <math.h>

#define BTU_PER_FT3 (1055.05585262 / 0.028316846592) /* J/m3; Btu of the International Table, ISO 31-4:1992 */
#define H_MIN_BTU 800.0  /* range of adjustment gases of the Bulletin, Btu/ft3, value from memory */
#define H_MAX_BTU 1200.0
#define RICH_MAX 0.20    /* at 20 % hydrogen in methane IF is at its limit; beyond it the method extrapolates, derived */
#define OXYGEN_MAX 0.01  /* the lifting constant of oxygen is from memory with low confidence: it may not decide */

/* A part as the Bulletin lists it. */
typedef struct {
    bool listed;
    double air, lifting, yellow;
} table_row;

static const table_row TABLE[PART_COUNT] = {
#define AGA36(group, air, k, t, source) [PART_##group] = {true, air, k, t},
#include "data/aga36.def"
};

static const struct {
    double lifting_prefer, lifting_object, flashback_prefer, flashback_object, yellow_prefer, yellow_object;
    const char *source;
} LIMITS[BC_AGA_CLASSES] = {
#define AGA36_LIMITS(class, name, lp, lo, fp, fo, yp, yo, source) [class] = {lp, lo, fp, fo, yp, yo, source},
#include "data/aga36_limits.def"
};

typedef struct {
    double air, own_air, lifting, yellow, unlisted;
} sums;

/* What has no constants counts as the butane that burns with the same oxygen: K/d of the alkanes stays at 1.27 from
 * propane up, and C4H10 takes 6.5 O2. Other inerts count as nitrogen. */
static void add_unlisted(const constituents *c, size_t p, sums *s)
{
    const double butane = c->oxygen[p] / 6.5;

    s->unlisted += c->x[p];
    if (p == PART_INERTS)
        s->lifting += TABLE[PART_NITROGEN].lifting * c->x[p];
    s->air += TABLE[PART_BUTANES].air * butane;
    s->lifting += TABLE[PART_BUTANES].lifting * butane;
    s->yellow += TABLE[PART_BUTANES].yellow * butane;
}

static sums sum_over(const constituents *c)
{
    sums s = {0.0, 0.0, 0.0, 0.0, 0.0};

    for (size_t p = 0; p < PART_COUNT; p++) {
        const table_row *row = &TABLE[p];

        if (!row->listed) {
            add_unlisted(c, p, &s);
            continue;
        }
        if (p == PART_OXYGEN)
            s.own_air -= row->air * c->x[p];
        else
            s.air += row->air * c->x[p];
        s.lifting += row->lifting * c->x[p];
        s.yellow += row->yellow * c->x[p];
    }
    return s;
}

static double inert_part(const constituents *c)
{
    return c->x[PART_CARBON_DIOXIDE] + c->x[PART_NITROGEN] + c->x[PART_INERTS];
}

static bc_aga_class class_of(const constituents *c, double h_btu)
{
    if (inert_part(c) > 0.10 && h_btu < 1000.0)
        return BC_AGA_HIGH_INERT;
    return h_btu >= 1100.0 ? BC_AGA_HIGH_BTU : BC_AGA_HIGH_METHANE;
}

static const char *outside_both(const constituents *c, const sums *s)
{
    if (rich_part(c) > RICH_MAX * (1.0 + 1e-9)) /* 20 % itself is inside, however it was rounded */
        return "hydrogen and carbon monoxide above 20 %: the Bulletin's flashback index extrapolates";
    if (c->x[PART_OXYGEN] > OXYGEN_MAX)
        return is_lpg_air(c) ? "LPG with air: the Bulletin's constants of oxygen are not known well enough to judge it"
                             : "oxygen above 1 %: the Bulletin's constants of it are not known well enough to judge it";
    if (s->unlisted > UNLISTED_MAX)
        return "more than 1 % of substances for which the Bulletin gives no constants";
    return c->water > WATER_MAX ? WET_TEXT : "";
}

/* The Bulletin starts from natural gas; we know it by its methane, more than half. */
static const char *outside_old(const constituents *c, double h_btu)
{
    if (c->x[PART_METHANE] <= 0.5)
        return "the old gas is no natural gas, from which the Bulletin starts";
    if (h_btu < H_MIN_BTU || h_btu > H_MAX_BTU)
        return "the old gas is outside 800 to 1200 Btu/ft3, the Bulletin's range";
    return "";
}

/* Y = 100 sum T x/(A + 7 I - 26.3 O2), A of the combustibles; air of 7 I = 26.3 O2 changes nothing. */
static double yellow_tip_limit(const constituents *c, const sums *s)
{
    const double denominator = s->air + 7.0 * inert_part(c) - 26.3 * c->x[PART_OXYGEN];

    return denominator > 0.0 ? 100.0 * s->yellow / denominator : 0.0;
}

bc_status bc_aga_gas_of(const bc_reference *reference, const bc_gas *gas, bc_aga_gas *out, bc_error *err)
{
    bc_gas dry;
    const bc_status status = bc_gas_dry(gas, &dry, err);

    if (status != BC_OK)
        return status;
    const constituents c = constituents_of(gas);
    const bc_value value = bc_value_of(reference, &dry);
    const sums s = sum_over(&c);
    const double h_btu = value.gross_j_per_m3 / BTU_PER_FT3;

    if (!(s.air - s.own_air > 0.0))
        return bc_fail(err, BC_ERR_RANGE, "the gas does not burn or holds the oxygen it needs: it has no index of Bulletin 36");
    *out = (bc_aga_gas){.gross_j_per_m3 = value.gross_j_per_m3, .relative_density = value.relative_density, .air = s.air - s.own_air,
                        .lifting_constant = s.lifting / value.relative_density, .yellow_tip_limit = yellow_tip_limit(&c, &s),
                        .gas_class = class_of(&c, h_btu), .outside_substitute = outside_both(&c, &s)};
    out->outside_adjustment = first_of(out->outside_substitute, outside_old(&c, h_btu));
    return BC_OK;
}

bc_aga bc_aga_compare(const bc_aga_gas *a, const bc_aga_gas *s)
{
    const double h_a = a->gross_j_per_m3 / BTU_PER_FT3;
    const double h_s = s->gross_j_per_m3 / BTU_PER_FT3;
    const double f = sqrt(a->relative_density / s->relative_density) * h_s / h_a; /* f_a/f_s */
    const double fa = f * (s->air / h_s) / (a->air / h_a);                       /* f_a a_s/(f_s a_a) */
    const double lift = s->lifting_constant - log10(f);
    bc_aga index = {.has_lifting = lift > 0.0};

    if (index.has_lifting)
        index.lifting = a->lifting_constant / (fa * lift);
    index.flashback = s->lifting_constant / (a->lifting_constant * f) * sqrt(h_s / 1000.0);
    index.has_yellow_tip = a->yellow_tip_limit > 0.0 && s->yellow_tip_limit > 0.0;
    if (index.has_yellow_tip)
        index.yellow_tip = a->yellow_tip_limit / (fa * s->yellow_tip_limit);
    return index;
}

static bc_status read_gases(const index_case *c, index_room *room, bc_error *err)
{
    const bc_reference *reference = NULL;

    if (room->has_aga)
        return BC_OK;
    bc_status status = method_reference(c, STATE_60F_30INHG, &reference, err);

    if (status == BC_OK)
        status = bc_aga_gas_of(reference, &c->old_gas->gas, &room->aga_old, err);
    if (status == BC_OK)
        status = bc_aga_gas_of(reference, &c->new_gas->gas, &room->aga_new, err);
    room->has_aga = status == BC_OK;
    return status;
}

/* The comparison of both gases of a case, and what makes it void. */
typedef struct {
    bc_aga index;
    bc_aga_class old_class;
    const char *outside;
} comparison;

static bc_status compare(const index_case *c, comparison *v, bc_error *err)
{
    const bc_aga_gas *a = &c->room->aga_old;
    const bc_aga_gas *s = &c->room->aga_new;
    const bc_status status = read_gases(c, c->room, err);

    if (status == BC_OK)
        *v = (comparison){bc_aga_compare(a, s), a->gas_class, first_of(a->outside_adjustment, s->outside_substitute)};
    return status;
}

static reading limited(reading r, const comparison *v, bc_index_limits preferable, bc_index_limits acceptable)
{
    r.own_limits = true;
    r.preferable = preferable;
    r.acceptable = acceptable;
    r.limits_source = LIMITS[v->old_class].source;
    return r;
}

static bc_index_limits below(double max)
{
    return (bc_index_limits){.has_max = true, .max = max};
}

static bc_index_limits above(double min)
{
    return (bc_index_limits){.has_min = true, .min = min};
}

bc_status aga_lifting_index(const index_case *c, reading *r, bc_error *err)
{
    comparison v;
    const bc_status status = compare(c, &v, err);

    if (status != BC_OK)
        return status;
    *r = v.index.has_lifting ? reading_of(v.index.lifting, v.outside)
                             : reading_none("the new gas carries so much more heat that its lifting limit falls below zero");
    *r = limited(*r, &v, below(LIMITS[v.old_class].lifting_prefer), below(LIMITS[v.old_class].lifting_object));
    return BC_OK;
}

bc_status aga_flashback_index(const index_case *c, reading *r, bc_error *err)
{
    comparison v;
    const bc_status status = compare(c, &v, err);

    if (status == BC_OK)
        *r = limited(reading_of(v.index.flashback, v.outside), &v, below(LIMITS[v.old_class].flashback_prefer),
                     below(LIMITS[v.old_class].flashback_object));
    return status;
}

bc_status aga_yellow_tip_index(const index_case *c, reading *r, bc_error *err)
{
    comparison v;
    const bc_status status = compare(c, &v, err);

    if (status != BC_OK)
        return status;
    *r = v.index.has_yellow_tip ? reading_of(v.index.yellow_tip, v.outside)
                                : reading_none("a gas without hydrocarbons has no yellow tip limit");
    *r = limited(*r, &v, above(LIMITS[v.old_class].yellow_prefer), above(LIMITS[v.old_class].yellow_object));
    return BC_OK;
}
