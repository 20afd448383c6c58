/* SPDX-License-Identifier: MIT */
/* composition.c - from the shares of a certificate to mole fractions and their uncertainty. */
#include "bluecone/composition.h"

#include "base/error_internal.h"
#include "base/text.h"
#include "gas/composition_internal.h"
#include "gas/species_index.h"
#include "gas/summation.h"

#include <math.h>
#include <stdarg.h>
#include <stdio.h>
#include <string.h>

#define SUM_TOLD 0.0005         /* a normalisation that moves the sum more than this is told */
#define SUM_ROUNDING 1e-9       /* of a `rest` that comes out at minus nothing */

void composition_clear(bc_composition *c)
{
    /* entries and scatter are 150 kB and come last: they are cleared one by one as they are used */
    memset(c, 0, offsetof(bc_composition, entries));
    c->spread.count = 0;
    c->measured_at_k = 288.15;
    c->measured_at_pa = 101325.0;
}

void composition_remark(bc_composition *c, const char *format, ...)
{
    va_list arguments;

    if (c->remark_count == BC_REMARK_MAX)
        return;
    va_start(arguments, format);
    (void)bc_text_vformat(c->remarks[c->remark_count], BC_REMARK_BYTES, format, arguments);
    va_end(arguments);
    c->remark_count++;
}

/* The unknown word itself is told by bc_species_find(); the place is known only here. */
static bc_status blame(const bc_composition *c, int line, bc_status status, bc_error *err)
{
    if (err) {
        (void)snprintf(err->file, sizeof err->file, "%s", c->path);
        err->line = line;
    }
    return status;
}

bc_status composition_resolve(bc_composition *c, bc_entry *entry, bc_error *err)
{
    char remark[BC_REMARK_BYTES];
    const bc_status status = bc_composition_component(entry->word, entry->parts, remark, err);

    if (status != BC_OK)
        return blame(c, entry->line, status, err);
    if (remark[0] != '\0')
        composition_remark(c, "%s", remark);
    return BC_OK;
}

/* Moles per unit of an entry's share: 1, 1/Z (a volume of real gas) or 1/M, up to a common factor. */
static double moles_per_share(const bc_composition *c, const bc_entry *entry)
{
    double z = 0.0;
    double mass = 0.0;

    if (c->basis == BC_BASIS_MOLE)
        return 1.0;
    for (size_t i = 0; i < SPECIES_COUNT; i++) {
        if (entry->parts[i] <= 0.0)
            continue;
        z += entry->parts[i] * bc_species_z(i, c->measured_at_k - 273.15);
        mass += entry->parts[i] * bc_species_molar_mass_kg_per_mol(i) * 1e3;
    }
    return c->basis == BC_BASIS_VOLUME ? 1.0 / z : 1.0 / mass;
}

/* A volume of what would be a liquid is no amount of gas: the virial form gives it no Z above zero. */
static bc_status check_volumes(const bc_composition *c, bc_error *err)
{
    for (size_t i = 0; i < c->entry_count && c->basis == BC_BASIS_VOLUME; i++) {
        const double moles = moles_per_share(c, &c->entries[i]);

        if (!(moles > 0.0) || !isfinite(moles))
            return blame(c, c->entries[i].line,
                         bc_fail(err, BC_ERR_INPUT, "'%s' is no gas at %.6g C, so its share cannot be one of volume; state mole or mass shares",
                                 c->entries[i].word, c->measured_at_k - 273.15), err);
    }
    return BC_OK;
}

/* What a volume of real gas holds is known best where the factors are tabulated and the gas is near ideal. */
static void remark_volumes(bc_composition *c)
{
    const double t_c = c->measured_at_k - 273.15;

    if (c->basis != BC_BASIS_VOLUME)
        return;
    if (t_c < 0.0 || t_c > 50.0)
        composition_remark(c, "Volume shares at %.4g C: outside 0 to 50 C the compression factors are extrapolated too far.", t_c);
    for (size_t i = 0; i < c->entry_count; i++)
        if (moles_per_share(c, &c->entries[i]) > 1.0 / 0.9) {
            composition_remark(c, "Volume share of %s: as a pure gas it would be outside ISO 6976 (Z below 0.9); mole shares are safer.",
                               c->entries[i].word);
            return;
        }
}

/* Sets the amount of the entry by difference and c->sum. */
static bc_status close_sum(bc_composition *c, bc_error *err)
{
    bc_entry *rest = NULL;
    double sum = 0.0;

    for (size_t i = 0; i < c->entry_count; i++) {
        if (c->entries[i].is_rest)
            rest = &c->entries[i];
        else
            sum += c->entries[i].amount;
    }
    c->sum = sum;
    if (!rest)
        return BC_OK;
    if (sum > 1.0 + SUM_ROUNDING) {
        const bc_status status = bc_fail(err, BC_ERR_INPUT, "the other components add up to %.6g %%, so that '%s = rest' would be negative; correct them",
                                         100.0 * sum, rest->word);

        return blame(c, rest->line, status, err);
    }
    rest->amount = fmax(0.0, 1.0 - sum);
    c->sum = 1.0;
    return BC_OK;
}

static bc_status check_sum(bc_composition *c, bc_error *err)
{
    const double percent = 100.0 * c->sum;

    if (c->sum < BC_SUM_MIN || c->sum > BC_SUM_MAX) {
        const char *remedy = "correct the shares, or write one of them as rest";
        const bool fractions = c->sum > 0.01 * BC_SUM_MIN && c->sum < 0.01 * BC_SUM_MAX;
        const bool percents = c->sum > 100.0 * BC_SUM_MIN && c->sum < 100.0 * BC_SUM_MAX;

        if (fractions)
            remedy = "these look like fractions of one: write per cent, or unit = fraction";
        else if (percents)
            remedy = "these look like per cent: write unit = percent";
        return blame(c, 0, bc_fail(err, BC_ERR_INPUT, "the shares add up to %.6g %%, outside 98 to 102 %%; %s", percent, remedy), err);
    }
    if (fabs(c->sum - 1.0) > SUM_TOLD)
        composition_remark(c, "The shares add up to %.6g %%: normalised to 100 %%.", percent);
    return BC_OK;
}

/* x_j = sum_e y_e w_e E_ej / N with N = sum_e y_e w_e gives dx_j/dy_e = (w_e/N)(E_ej - x_j). */
static void add_slope(const bc_composition *c, const bc_gas *gas, const bc_entry *entry, double dy_over_n, double dx[])
{
    const double w = moles_per_share(c, entry) * dy_over_n;
    const double closed = c->closure == BC_CLOSURE_NONE ? 0.0 : 1.0;

    for (size_t j = 0; j < SPECIES_COUNT; j++)
        dx[j] += w * (entry->parts[j] - closed * gas->x[j]);
}

/* dx of one entry; a component by difference moves the other way. */
static void add_source(bc_composition *c, const bc_gas *gas, const bc_entry *entry, const bc_entry *rest, double total)
{
    double *dx = c->spread.dx[c->spread.count++];

    memset(dx, 0, sizeof c->spread.dx[0]);
    add_slope(c, gas, entry, entry->u / total, dx);
    if (rest)
        add_slope(c, gas, rest, -entry->u / total, dx);
}

static void make_spread(bc_composition *c, const bc_gas *gas, double total)
{
    const bc_entry *rest = NULL;

    for (size_t i = 0; i < c->entry_count; i++)
        if (c->entries[i].is_rest)
            rest = &c->entries[i];
    for (size_t i = 0; i < c->entry_count; i++)
        if (c->entries[i].u > 0.0 && !c->entries[i].is_rest)
            add_source(c, gas, &c->entries[i], rest, total);
}

/* A wet gas holds (1 - x_w) of each dry fraction, and of its scatter. */
static void shrink_spread(bc_composition *c)
{
    for (size_t k = 0; k < c->spread.count; k++)
        for (size_t j = 0; j < SPECIES_COUNT; j++)
            c->spread.dx[k][j] *= 1.0 - c->gas.x[SPECIES_water];
}

/* Fractions of the dry gas become fractions of the wet one: all but the water shrink alike. */
static bc_status add_moisture(bc_composition *c, bc_error *err)
{
    bc_gas wet;

    if (c->moisture != BC_MOISTURE_AS_ANALYSED && c->gas.x[SPECIES_water] > 0.0)
        return blame(c, 0, bc_fail(err, BC_ERR_INPUT, "water is listed although moisture says %s; write moisture = as-analysed, or remove it",
                                   c->moisture == BC_MOISTURE_DRY ? "dry" : "saturated"), err);
    if (c->moisture != BC_MOISTURE_SATURATED)
        return BC_OK;
    const bc_status status = bc_gas_saturated(&c->gas, c->measured_at_k, c->measured_at_pa, &wet, err);

    if (status != BC_OK) { /* the state comes from the file, so it is the data that are bad */
        if (err)
            err->status = BC_ERR_INPUT;
        return blame(c, 0, BC_ERR_INPUT, err);
    }
    c->gas = wet;
    shrink_spread(c);
    composition_remark(c, "Saturated with water at %.6g C and %.6g kPa: %.4g mol %% water added.", c->measured_at_k - 273.15,
                       c->measured_at_pa * 1e-3, 100.0 * wet.x[SPECIES_water]);
    return BC_OK;
}

/* Kinds of gas that carry no oxygen of their own when they reach the customer. */
static bool family_without_air(const bc_composition *c)
{
    static const char *const FAMILIES[] = {"natural", "lng", "biomethane", "lpg", "hydrogen"};

    for (size_t i = 0; i < BC_COUNT(FAMILIES); i++)
        if (bc_text_same(c->family, FAMILIES[i]))
            return true;
    return false;
}

/* Without a stated family: a gas of hydrocarbons with a trace of oxygen. Several per cent of oxygen were
 * put there on purpose (LPG-air, town gas); CO or much CO2 marks a manufactured, digester or landfill gas. */
static bool looks_like_supply_gas(const bc_gas *gas)
{
    double hydrocarbons = 0.0;

    for (size_t i = 0; i < SPECIES_COUNT; i++)
        if (bc_species_atoms(i, BC_C) > 0 && bc_species_atoms(i, BC_H) > 0 && bc_species_atoms(i, BC_O) == 0)
            hydrocarbons += gas->x[i];
    return hydrocarbons > 0.7 && gas->x[SPECIES_oxygen] < 0.03 && gas->x[SPECIES_carbon_monoxide] < 0.005
           && gas->x[SPECIES_carbon_dioxide] < 0.10;
}

static void suspect_air(bc_composition *c)
{
    const double oxygen = c->gas.x[SPECIES_oxygen];
    const bool strange = c->family[0] != '\0' ? family_without_air(c) : looks_like_supply_gas(&c->gas);

    /* 0.02 %: twice what the driest published pipeline analyses print for oxygen */
    if (!strange || oxygen <= 0.0002)
        return;
    c->air_suspected = true;
    composition_remark(c, "%.4g %% oxygen in a gas of this kind: probably air in the sample (about %.3g %% air); compare --air-free.",
                       100.0 * oxygen, 100.0 * oxygen / bc_gas_air().x[SPECIES_oxygen]);
}

/* Moles of each species in the entries, up to a common factor; returns their sum. */
static double add_up(const bc_composition *c, double amounts[BC_SPECIES_CAPACITY])
{
    double total = 0.0;

    for (size_t i = 0; i < c->entry_count; i++) {
        const bc_entry *entry = &c->entries[i];
        const double moles = entry->amount * moles_per_share(c, entry);

        total += moles;
        for (size_t j = 0; j < SPECIES_COUNT; j++)
            amounts[j] += moles * entry->parts[j];
    }
    return total;
}

static bc_status make_gas(bc_composition *c, bc_error *err)
{
    double amounts[BC_SPECIES_CAPACITY] = {0.0};
    const double total = add_up(c, amounts);
    const bc_status status = bc_gas_from_amounts(amounts, &c->gas, err);

    if (status != BC_OK)
        return blame(c, 0, status, err);
    make_spread(c, &c->gas, total);
    return BC_OK;
}

bc_status composition_finish(bc_composition *c, bc_error *err)
{
    bc_status status = close_sum(c, err);

    if (status == BC_OK)
        status = check_sum(c, err);
    if (status == BC_OK)
        status = check_volumes(c, err);
    if (status == BC_OK)
        status = make_gas(c, err);
    if (status == BC_OK)
        status = add_moisture(c, err);
    if (status != BC_OK)
        return status;
    remark_volumes(c);
    suspect_air(c);
    return BC_OK;
}

bc_status bc_composition_completed(const bc_composition *c, size_t species, bc_gas *gas, bc_error *err)
{
    double amounts[BC_SPECIES_CAPACITY] = {0.0};
    bc_entry missing = {.amount = 1.0 - c->sum};
    bc_gas dry;

    if (!(missing.amount > 0.0) || species >= SPECIES_COUNT)
        return bc_fail(err, BC_ERR_USAGE, "nothing is missing from the sum of the components");
    missing.parts[species] = 1.0;
    (void)add_up(c, amounts);
    amounts[species] += missing.amount * moles_per_share(c, &missing);
    const bc_status status = bc_gas_from_amounts(amounts, &dry, err);

    if (status == BC_OK && c->moisture == BC_MOISTURE_SATURATED)
        return bc_gas_saturated(&dry, c->measured_at_k, c->measured_at_pa, gas, err);
    if (status == BC_OK)
        *gas = dry;
    return status;
}

bc_status bc_composition_close(bc_composition *c, bc_closure closure, bc_error *err)
{
    double amounts[BC_SPECIES_CAPACITY] = {0.0};
    const double total = add_up(c, amounts);
    bc_gas dry;
    const bc_status status = bc_gas_from_amounts(amounts, &dry, err);

    if (status != BC_OK)
        return status;
    c->closure = closure;
    c->spread.count = 0;
    make_spread(c, &dry, total);
    if (c->moisture == BC_MOISTURE_SATURATED)
        shrink_spread(c);
    return BC_OK;
}
