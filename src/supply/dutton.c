/* SPDX-License-Identifier: MIT */
/* dutton.c - Dutton's equivalent mixture and the two indices of the 1996 regulations of Great Britain. */
#include "bluecone/dutton.h"

#include "base/error_internal.h"
#include "gas/species_index.h"
#include "supply/index_internal.h"

#include <math.h>

#define FOREIGN_MAX 0.001 /* hydrogen or carbon monoxide: the regulations' own limit on hydrogen, SI 1996/551 */
#define WOBBE_MIN 45.7e6  /* EN 437:2021 group 2H, J/m3, value from memory: the gases that Dutton measured */
#define WOBBE_MAX 54.7e6
#define METHANE_MIN 50.0  /* % of the equivalent mixture: how we know a natural gas */

/* WN in MJ/m3 */
double bc_dutton_icf(double wobbe_gross_j_per_m3, double pn_percent)
{
    return (wobbe_gross_j_per_m3 * 1e-6 - 50.73 + 0.03 * pn_percent) / 1.56;
}

double bc_dutton_soot(double propane_percent, double nitrogen_percent)
{
    return 0.896 * atan(0.0255 * propane_percent - 0.0233 * nitrogen_percent + 0.617);
}

/* What the Wobbe index of a mixture is made of, per mole: W is h/sqrt(M Z) but for constants of the state. */
typedef struct {
    double h, m, s;
} molar;

static double orifice_heat(const molar *x)
{
    const double z = 1.0 - x->s * x->s;

    return x->h / sqrt(x->m * z);
}

static molar mixed(const molar *a, const molar *b, double share_of_b)
{
    return (molar){a->h + share_of_b * (b->h - a->h), a->m + share_of_b * (b->m - a->m), a->s + share_of_b * (b->s - a->s)};
}

static molar species_molar(const bc_reference *r, size_t species)
{
    return (molar){r->gross_j_per_mol[species], r->mass_kg_per_mol[species], r->factor[species]};
}

/* The nitrogen share x that lowers the orifice heat W of the hydrocarbons to that of the gas: Newton's root of
 * h^2 - W^2 M (1 - s^2), where h, M and s are straight lines in x. It falls and bends upwards from x = 0, where it is
 * above zero, to its root, as h^2 does, whose slope outweighs the others: the steps come from the left, halve the way at
 * least and in the end double the digits, so that behind one of 1e-12 nothing is left. */
static double nitrogen_share(const molar *fuel, const molar *nitrogen, double wanted)
{
    const molar slope = {nitrogen->h - fuel->h, nitrogen->m - fuel->m, nitrogen->s - fuel->s};
    const double w2 = wanted * wanted;
    double share = 0.0;
    double step = 1.0;

    for (int i = 0; i < 60 && fabs(step) > 1e-12; i++) {
        const molar x = mixed(fuel, nitrogen, share);
        const double z = 1.0 - x.s * x.s;

        step = (x.h * x.h - w2 * x.m * z) / (2.0 * x.h * slope.h - w2 * (slope.m * z - 2.0 * x.m * x.s * slope.s));
        share -= step;
    }
    return share;
}

/* C3H8 and CH4 for other hydrocarbons of n mol with c carbon atoms: dC3 = (c - n)/2, dCH4 = n - dC3. */
static bc_status reduce(const constituents *c, double *methane, double *propane, bc_error *err)
{
    const double n = c->hydrocarbons - c->x[PART_METHANE] - c->x[PART_PROPANE];
    const double carbon = c->hydrocarbon_c - c->x[PART_METHANE] - 3.0 * c->x[PART_PROPANE];
    const double d_propane = (carbon - n) / 2.0;

    *methane = c->x[PART_METHANE] + n - d_propane;
    *propane = c->x[PART_PROPANE] + d_propane;
    if (!(c->hydrocarbons > 0.0))
        return bc_fail(err, BC_ERR_RANGE, "a gas without hydrocarbons has no equivalent mixture after Dutton");
    if (*methane < 0.0)
        return bc_fail(err, BC_ERR_RANGE, "the gas is heavier than propane: its equivalent mixture after Dutton has a negative share of methane");
    return BC_OK;
}

static const char *outside_of(const constituents *c, const bc_dutton *d)
{
    if (c->x[PART_HYDROGEN] > FOREIGN_MAX)
        return "hydrogen above 0.1 %: the terms for it are not known";
    if (c->x[PART_CARBON_MONOXIDE] > FOREIGN_MAX)
        return "carbon monoxide above 0.1 %: the method is for natural gas";
    if (c->water > WATER_MAX)
        return WET_TEXT;
    if (d->methane_percent < METHANE_MIN)
        return "less than half methane: the method is for natural gas";
    if (d->wobbe_gross_j_per_m3 < WOBBE_MIN || d->wobbe_gross_j_per_m3 > WOBBE_MAX)
        return "a Wobbe index outside 45.7 to 54.7 MJ/m3, the natural gases of group H";
    return "";
}

static bool is_own_state(const bc_state *s)
{
    return fabs(s->combustion_c - 15.0) < 0.01 && fabs(s->metering_c - 15.0) < 0.01 && fabs(s->metering_pa - BC_P0_PA) < 1.0;
}

static void find_mixture(const bc_reference *r, const bc_value *value, double methane, double propane, bc_dutton *d)
{
    const molar ch4 = species_molar(r, SPECIES_methane);
    const molar c3h8 = species_molar(r, SPECIES_propane);
    const molar nitrogen = species_molar(r, SPECIES_nitrogen);
    const molar fuel = mixed(&ch4, &c3h8, propane / (methane + propane));
    const double wanted = value->gross_j_per_mol / sqrt(value->molar_mass_kg_per_mol * value->z);
    double share = 0.0;

    d->clamped = orifice_heat(&fuel) <= wanted;
    d->wobbe_gap = d->clamped ? orifice_heat(&fuel) / wanted - 1.0 : 0.0;
    if (!d->clamped)
        share = nitrogen_share(&fuel, &nitrogen, wanted);
    d->methane_percent = 100.0 * (1.0 - share) * methane / (methane + propane);
    d->propane_percent = 100.0 * (1.0 - share) * propane / (methane + propane);
    d->nitrogen_percent = 100.0 * share;
    d->pn_percent = d->propane_percent + d->nitrogen_percent;
}

static bc_status dutton_of(const bc_reference *reference, const bc_gas *gas, const constituents *c, bc_dutton *out, bc_error *err)
{
    bc_gas dry;
    double methane = 0.0;
    double propane = 0.0;
    bc_status status = bc_gas_dry(gas, &dry, err);

    if (status == BC_OK && !is_own_state(&reference->state))
        status = bc_fail(err, BC_ERR_USAGE, "Dutton's figures are those of 15/15 at 101.325 kPa; give that reference state");
    if (status == BC_OK)
        status = reduce(c, &methane, &propane, err);
    if (status != BC_OK)
        return status;
    const bc_value value = bc_value_of(reference, &dry);
    bc_dutton d = {.wobbe_gross_j_per_m3 = value.wobbe_gross_j_per_m3};

    find_mixture(reference, &value, methane, propane, &d);
    d.icf = bc_dutton_icf(d.wobbe_gross_j_per_m3, d.pn_percent);
    d.soot = bc_dutton_soot(d.propane_percent, d.nitrogen_percent);
    d.outside = outside_of(c, &d);
    *out = d;
    return BC_OK;
}

bc_status bc_dutton_of(const bc_reference *reference, const bc_gas *gas, bc_dutton *out, bc_error *err)
{
    const constituents c = constituents_of(gas);

    return dutton_of(reference, gas, &c, out, err);
}

/* A gas that cannot be reduced has no value; that is told, not failed. */
static bc_status read_gas(const index_case *c, index_room *room, const char **none, bc_error *err)
{
    const bc_reference *reference = NULL;
    double methane = 0.0;
    double propane = 0.0;

    *none = "";
    if (room->has_dutton)
        return BC_OK;
    if (reduce(&room->new_parts, &methane, &propane, NULL) != BC_OK) {
        *none = "the gas is no mixture of methane with some propane: Dutton's equivalent mixture does not exist";
        return BC_OK;
    }
    bc_status status = method_reference(c, STATE_15_15, &reference, err);

    if (status == BC_OK)
        status = dutton_of(reference, &c->new_gas->gas, &room->new_parts, &room->dutton, err);
    room->has_dutton = status == BC_OK;
    return status;
}

bc_status dutton_icf_index(const index_case *c, reading *r, bc_error *err)
{
    const char *none = "";
    const bc_status status = read_gas(c, c->room, &none, err);

    if (status == BC_OK)
        *r = none[0] != '\0' ? reading_none(none) : reading_of(c->room->dutton.icf, c->room->dutton.outside);
    return status;
}

bc_status dutton_soot_index(const index_case *c, reading *r, bc_error *err)
{
    const char *none = "";
    const bc_status status = read_gas(c, c->room, &none, err);

    if (status == BC_OK)
        *r = none[0] != '\0' ? reading_none(none) : reading_of(c->room->dutton.soot, c->room->dutton.outside);
    return status;
}
