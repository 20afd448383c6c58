/* SPDX-License-Identifier: MIT */
/* iso6976.c - the figures of a reference state and the formulas of ISO 6976. */
#include "bluecone/iso6976.h"

#include "base/compiler.h"
#include "base/error_internal.h"
#include "gas/species_atoms.h"
#include "gas/summation.h"
#include "value/formation_internal.h"
#include "value/reference_internal.h"

#include <math.h>
#include <string.h>

#define SAME_C 0.01
#define F60_C ((60.0 - 32.0) / 1.8)
#define COLUMNS 5

/* Temperatures of the columns of the heat tables; the 1995 edition has no 60 F. */
static const double COLUMN_C[COLUMNS] = {0.0, 15.0, F60_C, 20.0, 25.0};

typedef struct {
    double mass;          /* g/mol as printed */
    double heat[COLUMNS]; /* kJ/mol */
    double u;
    const char *source;   /* NULL: the edition does not list the species */
} heat_row;

static const heat_row HEATS_2016[SPECIES_COUNT] = {
#define ISO2016_HEAT(symbol, m, h0, h15, h60f, h20, h25, u, source) [SPECIES_##symbol] = {m, {h0, h15, h60f, h20, h25}, u, source},
#include "data/iso6976_2016_heat.def"
};

static const heat_row HEATS_1995[SPECIES_COUNT] = {
#define ISO1995(symbol, m, h0, h15, h20, h25, z0, z15, z20, b0, b15, b20, source) \
    [SPECIES_##symbol] = {m, {h0, h15, -1.0, h20, h25}, 0.0, source},
#include "data/iso6976_1995.def"
};

typedef struct {
    int year;
    double t_c, value, u;
} constant_row;

static const struct {
    int year;
    double r, u_r, air, u_air;
} EDITIONS[] = {
#define EDITION(year, r, u_r, air, u_air, source) {year, r, u_r, air, u_air},
#define AIR_Z(year, t_c, z, u, source)
#define VAPORISATION(year, t_c, lo, u, source)
#include "data/iso6976_constants.def"
};

static const constant_row AIR_ZS[] = {
#define EDITION(year, r, u_r, air, u_air, source)
#define AIR_Z(year, t_c, z, u, source) {year, t_c, z, u},
#define VAPORISATION(year, t_c, lo, u, source)
#include "data/iso6976_constants.def"
};

static const constant_row VAPORISATIONS[] = {
#define EDITION(year, r, u_r, air, u_air, source)
#define AIR_Z(year, t_c, z, u, source)
#define VAPORISATION(year, t_c, lo, u, source) {year, t_c, lo, u},
#include "data/iso6976_constants.def"
};

/* The row of an edition at a temperature; `count` between the columns. */
static size_t constant_at(const constant_row rows[], size_t count, int year, double t_c)
{
    size_t i = 0;

    while (i < count && (rows[i].year != year || fabs(rows[i].t_c - t_c) >= SAME_C))
        i++;
    return i;
}

static double air_z_column(int year, double t_c)
{
    return AIR_ZS[constant_at(AIR_ZS, BC_COUNT(AIR_ZS), year, t_c)].value;
}

/* Z of dry air at 101.325 kPa; between the columns 1 - Z follows the parabola through 0, 15 and 20 C. */
static double air_z0(int year, double t_c)
{
    const size_t row = constant_at(AIR_ZS, BC_COUNT(AIR_ZS), year, t_c);

    if (row < BC_COUNT(AIR_ZS))
        return AIR_ZS[row].value;
    return air_z_column(year, 0.0) * (t_c - 15.0) * (t_c - 20.0) / 300.0 - air_z_column(year, 15.0) * t_c * (t_c - 20.0) / 75.0
           + air_z_column(year, 20.0) * t_c * (t_c - 15.0) / 100.0;
}

static void look_up_constants(bc_reference *r)
{
    const bc_state *s = &r->state;
    const size_t row = constant_at(VAPORISATIONS, BC_COUNT(VAPORISATIONS), s->edition, s->combustion_c);
    const size_t e = s->edition == EDITIONS[0].year ? 0 : 1;

    r->r_j_per_mol_k = EDITIONS[e].r;
    r->u_r_j_per_mol_k = EDITIONS[e].u_r;
    r->air_kg_per_mol = EDITIONS[e].air * 1e-3;
    r->u_air_kg_per_mol = EDITIONS[e].u_air * 1e-3;
    r->vaporisation_j_per_mol = row < BC_COUNT(VAPORISATIONS) ? VAPORISATIONS[row].value * 1e3 : formation_vaporisation_j_per_mol(s->combustion_c + 273.15);
    r->u_vaporisation_j_per_mol = 4.0; /* J/mol, ISO 6976:2016 annex A, for every temperature */
    /* Z_air(t2,p2) = 1 - (p2/p0)(1 - Z_air(t2,p0)) */
    r->air_z = 1.0 - s->metering_pa / BC_P0_PA * (1.0 - air_z0(s->edition, s->metering_c));
    r->u_air_z = 0.000015; /* ISO 6976:2016 annex A */
}

/* Column of the heat tables for a combustion temperature; COLUMNS between them. */
static size_t column_at(const bc_state *s)
{
    for (size_t i = 0; i < COLUMNS; i++)
        if (fabs(COLUMN_C[i] - s->combustion_c) < SAME_C && bc_state_standard_combustion(s))
            return i;
    return COLUMNS;
}

static const heat_row *rows_of(int edition)
{
    return edition == 1995 ? HEATS_1995 : HEATS_2016;
}

/* Uncertainty of a heat that comes from formation enthalpies: 1 kJ/mol, the scatter between published
 * compilations of formation enthalpies (Active Thermochemical Tables 1.122 against the CRC Handbook). */
#define U_FORMATION_J_PER_MOL 1000.0

static void look_up_heat(bc_reference *r, size_t species, size_t column, const formation_products *products)
{
    const int edition = r->state.edition;
    const heat_row *row = &rows_of(edition)[species];
    const heat_row *other = &rows_of(edition == 1995 ? 2016 : 1995)[species];
    bc_origin origin = BC_ORIGIN_EDITION;

    if (!row->source) {
        row = other;
        origin = BC_ORIGIN_OTHER_EDITION;
    }
    r->mass_kg_per_mol[species] = row->source ? row->mass * 1e-3 : bc_species_molar_mass_kg_per_mol(species);
    if (row->source && column < COLUMNS && row->heat[column] >= 0.0) {
        r->gross_j_per_mol[species] = row->heat[column] * 1e3;
        r->u_gross_j_per_mol[species] = (row->u > 0.0 ? row->u : HEATS_2016[species].u) * 1e3;
        r->heat_origin[species] = (unsigned char)origin;
    } else {
        r->gross_j_per_mol[species] = formation_gross_with(products, species);
        r->u_gross_j_per_mol[species] = r->gross_j_per_mol[species] > 0.0 ? U_FORMATION_J_PER_MOL : 0.0;
        r->heat_origin[species] = BC_ORIGIN_FORMATION;
    }
    r->net_j_per_mol[species] = r->gross_j_per_mol[species] - SPECIES_ATOMS[species][BC_H] / 2.0 * r->vaporisation_j_per_mol;
}

/* What is not combustible has a heat of zero by definition: no table is needed to say so. */
static void mark_inert(bc_reference *r, size_t species)
{
    if (fabs(r->gross_j_per_mol[species]) < 1e-3) {
        r->gross_j_per_mol[species] = 0.0;
        r->heat_origin[species] = BC_ORIGIN_EDITION;
    }
}

static void look_up_factor(bc_reference *r, size_t species)
{
    const bc_summation factor = bc_summation_factor(species, r->state.edition, r->state.metering_c);

    r->factor[species] = factor.s;
    r->u_factor[species] = factor.u;
    r->factor_origin[species] = (unsigned char)factor.origin;
}

bc_status reference_of(const bc_state *state, const bool wanted[SPECIES_COUNT], bc_reference *reference, bc_error *err)
{
    const bc_status status = bc_state_check(state, err);

    if (status != BC_OK)
        return status;
    memset(reference, 0, sizeof *reference);
    reference->state = *state;
    look_up_constants(reference);
    const size_t column = column_at(state);
    const formation_products products = formation_products_at(state->combustion_c + 273.15);

    for (size_t i = 0; i < SPECIES_COUNT; i++) {
        if (!wanted[i])
            continue;
        look_up_heat(reference, i, column, &products);
        mark_inert(reference, i);
        look_up_factor(reference, i);
    }
    return BC_OK;
}

bc_status bc_reference_at(const bc_state *state, bc_reference *reference, bc_error *err)
{
    bool all[SPECIES_COUNT];

    for (size_t i = 0; i < SPECIES_COUNT; i++)
        all[i] = true;
    return reference_of(state, all, reference, err);
}

/* The four sums over the components that every figure is made of. */
typedef struct {
    double gross, net, mass, factor;
} sums;

static sums sum_over(const bc_reference *r, const bc_gas *gas)
{
    sums s = {0.0, 0.0, 0.0, 0.0};

    for (size_t i = 0; i < SPECIES_COUNT; i++) {
        if (gas->x[i] == 0.0) /* most species are not there */
            continue;
        s.gross += gas->x[i] * r->gross_j_per_mol[i];
        s.net += gas->x[i] * r->net_j_per_mol[i];
        s.mass += gas->x[i] * r->mass_kg_per_mol[i];
        s.factor += gas->x[i] * r->factor[i];
    }
    return s;
}

bc_value bc_value_of(const bc_reference *r, const bc_gas *gas)
{
    const sums s = sum_over(r, gas);
    const double p = r->state.metering_pa;
    const double ideal_volume = r->r_j_per_mol_k * (r->state.metering_c + 273.15) / p;
    const double z = 1.0 - p / BC_P0_PA * s.factor * s.factor;
    const double relative_ideal = s.mass / r->air_kg_per_mol;
    const double relative = relative_ideal * r->air_z / z;
    const double root_ideal = sqrt(relative_ideal);
    const double root = sqrt(relative);
    bc_value v = {.molar_mass_kg_per_mol = s.mass, .z = z, .gross_j_per_mol = s.gross, .net_j_per_mol = s.net};

    v.gross_j_per_kg = s.gross / s.mass;
    v.net_j_per_kg = s.net / s.mass;
    v.gross_ideal_j_per_m3 = s.gross / ideal_volume;
    v.net_ideal_j_per_m3 = s.net / ideal_volume;
    v.gross_j_per_m3 = v.gross_ideal_j_per_m3 / z;
    v.net_j_per_m3 = v.net_ideal_j_per_m3 / z;
    v.density_ideal_kg_per_m3 = s.mass / ideal_volume;
    v.density_kg_per_m3 = v.density_ideal_kg_per_m3 / z;
    v.relative_density_ideal = relative_ideal;
    v.relative_density = relative;
    v.wobbe_gross_j_per_m3 = v.gross_j_per_m3 / root;
    v.wobbe_net_j_per_m3 = v.net_j_per_m3 / root;
    v.wobbe_gross_ideal_j_per_m3 = v.gross_ideal_j_per_m3 / root_ideal;
    v.wobbe_net_ideal_j_per_m3 = v.net_ideal_j_per_m3 / root_ideal;
    v.molar_volume_m3_per_mol = ideal_volume * z;
    return v;
}

bool bc_value_in_range(const bc_value *value)
{
    return value->z > 0.9;
}

bc_status bc_gas_for_state(const bc_gas *gas, const bc_state *state, bc_gas *metered, bc_error *err)
{
    if (state->saturated)
        return bc_gas_saturated(gas, state->metering_c + 273.15, state->metering_pa, metered, err);
    *metered = *gas;
    return BC_OK;
}

const char *bc_reference_heat_source(size_t species, int edition)
{
    if (species >= SPECIES_COUNT)
        return "";
    const heat_row *row = &rows_of(edition)[species];
    const heat_row *other = &rows_of(edition == 1995 ? 2016 : 1995)[species];

    if (row->source)
        return row->source;
    return other->source ? other->source : "derived: formation-enthalpy balance, NASA/TP-2002-211556";
}

const char *bc_reference_factor_source(size_t species, int edition)
{
    return species < SPECIES_COUNT ? bc_summation_source(species, edition) : "";
}
