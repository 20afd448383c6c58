/* SPDX-License-Identifier: MIT */
/* flammability.c - Le Chatelier's limits and the verdict of ISO 10156. */
#include "bluecone/flammability.h"

#include "base/compiler.h"
#include "base/error_internal.h"
#include "flame/combustible_internal.h"
#include "gas/species_index.h"

#include <math.h>

#define ROUNDING 1e-9 /* of fractions that add up to one */

/* Limits by species, per cent; 0 where none is published here. */
static const struct {
    double lower, upper;
    const char *source;
} LIMITS[SPECIES_COUNT] = {
#define FLAMMABILITY(symbol, lower, upper, source) [SPECIES_##symbol] = {lower, upper, source},
#include "data/flammability.def"
};

typedef struct {
    double figure;  /* K or T_c; 0 where there is none */
    bool confirmed; /* by the worked example of the UN GHS */
} constant;

static const constant NITROGEN_EQUIVALENCE[SPECIES_COUNT] = {
#define INERT(symbol, k, confirmed, source) [SPECIES_##symbol] = {k, confirmed},
#define NITROGEN_LIMIT(symbol, tc, confirmed, source)
#include "data/iso10156.def"
};

static const constant NITROGEN_LIMITS[SPECIES_COUNT] = {
#define INERT(symbol, k, confirmed, source)
#define NITROGEN_LIMIT(symbol, tc, confirmed, source) [SPECIES_##symbol] = {tc, confirmed},
#include "data/iso10156.def"
};

double bc_le_chatelier(const double share[], const double figure[], size_t count)
{
    double sum = 0.0;

    for (size_t i = 0; i < count; i++)
        if (share[i] > 0.0)
            sum += share[i] / figure[i];
    return 1.0 / sum;
}

bool bc_flammability_pure(size_t species, double *lfl, double *ufl, const char **source)
{
    if (species >= SPECIES_COUNT || LIMITS[species].lower <= 0.0)
        return false;
    *lfl = LIMITS[species].lower / 100.0;
    *ufl = LIMITS[species].upper / 100.0;
    *source = LIMITS[species].source;
    return true;
}

/* The sums of ISO 10156, as printed and on the safe side. */
typedef struct {
    double sum;          /* sum A'/T_c with every K as the standard has it */
    double cautious_sum; /* the same with K of at most 1 where it is not confirmed */
    bool complete;       /* every combustible has a T_c */
    bool confirmed;      /* and every one of them is confirmed */
} nitrogen_balance;

/* The weight of an inert in the denominator. An unconfirmed K above 1 would talk a gas inert: it counts as
 * nitrogen. */
static double equivalence(size_t species, bool cautious)
{
    const constant k = NITROGEN_EQUIVALENCE[species];

    return cautious && !k.confirmed ? fmin(k.figure, 1.0) : k.figure;
}

/* sum A + sum K_k B_k. */
static double nitrogen_whole(const bc_gas *gas, bool cautious)
{
    double whole = 0.0;

    for (size_t i = 0; i < SPECIES_COUNT; i++)
        if (gas->x[i] != 0.0)
            whole += gas->x[i] * (combustible_is(i) ? 1.0 : equivalence(i, cautious));
    return whole;
}

/* A'_i = 100 A_i/(sum A + sum K_k B_k), summed over T_ci, which is in per cent. */
static nitrogen_balance balance_of(const bc_gas *gas)
{
    nitrogen_balance b = {0.0, 0.0, true, true};
    double sum = 0.0;

    for (size_t i = 0; i < SPECIES_COUNT; i++) {
        const constant limit = NITROGEN_LIMITS[i];

        if (gas->x[i] == 0.0 || !combustible_is(i))
            continue;
        b.complete = b.complete && limit.figure > 0.0;
        b.confirmed = b.confirmed && limit.confirmed;
        sum += limit.figure > 0.0 ? 100.0 * gas->x[i] / limit.figure : 0.0;
    }
    if (sum > 0.0) {
        b.sum = sum / nitrogen_whole(gas, false);
        b.cautious_sum = sum / nitrogen_whole(gas, true);
    }
    return b;
}

/* Le Chatelier over the combustibles that have limits, then over the share of combustibles in the gas; without any both
 * limits are infinite, which is none. */
static void mix_limits(const combustible_part *part, bc_flammability *f)
{
    double lower[BC_SPECIES_CAPACITY];
    double upper[BC_SPECIES_CAPACITY];

    for (size_t i = 0; i < part->count; i++) {
        lower[i] = LIMITS[part->species[i]].lower / 100.0;
        upper[i] = LIMITS[part->species[i]].upper / 100.0;
    }
    f->lfl = bc_le_chatelier(part->share, lower, part->count) / f->combustible;
    f->ufl = bc_le_chatelier(part->share, upper, part->count) / f->combustible;
}

/* A gas that is leaner than its lower limit before any air comes to it burns in no mixture with air. */
static bc_flammability_verdict judge(const nitrogen_balance *b, const bc_flammability *f)
{
    if (f->combustible <= 0.0 || f->lfl > 1.0 + BC_LFL_ERROR)
        return BC_NOT_FLAMMABLE;
    if (b->sum > 1.0 || !f->inert_corrected)
        return BC_FLAMMABLE;
    if (b->complete && b->confirmed && b->cautious_sum <= 1.0 && !f->with_oxygen)
        return BC_NOT_FLAMMABLE;
    return BC_FLAMMABILITY_UNDECIDED;
}

/* Limits that leave 100 % or belong to a gas that does not burn are none. */
static void drop_limits(bc_flammability *f)
{
    const bool burns = f->verdict != BC_NOT_FLAMMABLE;

    f->has_lfl = burns && f->lfl <= 1.0;
    f->has_ufl = burns && f->ufl <= 1.0;
    f->lfl = f->has_lfl ? f->lfl : 0.0;
    f->ufl = f->has_ufl ? f->ufl : 0.0;
}

/* Gases that the rule is not for, as a share of the combustibles. */
static double odd_share(const bc_gas *gas, double combustible)
{
    return (gas->x[SPECIES_hydrogen_sulfide] + gas->x[SPECIES_carbon_disulfide] + gas->x[SPECIES_ethyne]) /
           combustible;
}

static bool has_limits(size_t species)
{
    return LIMITS[species].lower > 0.0;
}

bc_status bc_flammability_of(const bc_gas *gas, bc_flammability *flammability, bc_error *err)
{
    const nitrogen_balance balance = balance_of(gas);
    const combustible_part part = combustible_part_of(gas, has_limits);
    bc_flammability f = {.combustible = part.total, .covered = part.covered, .iso10156_sum = balance.sum};

    if (part.total > 0.0 && part.covered < BC_FLAMMABILITY_COVERED_MIN)
        return bc_fail(err, BC_ERR_RANGE,
                       "no flammability limits are published here for %s: only %.4g %% of what burns in the "
                       "gas has some",
                       bc_species_id(part.missing), part.covered * 100.0);
    f.has_sum = balance.complete && part.total > 0.0;
    f.with_oxygen = gas->x[SPECIES_oxygen] > BC_FLAMMABILITY_OXYGEN_MAX;
    f.inert_corrected = part.total < 1.0 - ROUNDING;
    f.outside_rule = part.count > 1 && odd_share(gas, part.total) > BC_FLAMMABILITY_ODD_MAX;
    mix_limits(&part, &f);
    f.verdict = judge(&balance, &f);
    drop_limits(&f);
    *flammability = f;
    return BC_OK;
}
