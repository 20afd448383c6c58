/* SPDX-License-Identifier: MIT */
/* bluecone/iso6976.h - heating values, density, compression factor and Wobbe index after ISO 6976.
 *
 * Two steps: bc_reference_at() looks up the figures of every species at one reference state; then
 * bc_value_of() evaluates any number of gases with them. Both editions, 1995 and 2016. Where the
 * edition has no figure for a species the other edition, a formation balance or an estimate stands in,
 * and the origin arrays say so. */
#ifndef BLUECONE_ISO6976_H
#define BLUECONE_ISO6976_H

#include "bluecone/gas.h"
#include "bluecone/state.h"
#include "bluecone/status.h"

#ifdef __cplusplus
extern "C" {
#endif

/* Figures of all species at one reference state. */
typedef struct {
    bc_state state;
    double gross_j_per_mol[BC_SPECIES_CAPACITY]; /* ideal-gas gross heat at the combustion temperature */
    double net_j_per_mol[BC_SPECIES_CAPACITY];   /* gross less Lo h/2 */
    double u_gross_j_per_mol[BC_SPECIES_CAPACITY];
    double mass_kg_per_mol[BC_SPECIES_CAPACITY];
    double factor[BC_SPECIES_CAPACITY];          /* summation factor s at the metering temperature and 101.325 kPa */
    double u_factor[BC_SPECIES_CAPACITY];
    unsigned char heat_origin[BC_SPECIES_CAPACITY];   /* bc_origin */
    unsigned char factor_origin[BC_SPECIES_CAPACITY]; /* bc_origin */
    double vaporisation_j_per_mol, u_vaporisation_j_per_mol; /* Lo of water at the combustion temperature */
    double r_j_per_mol_k, u_r_j_per_mol_k;
    double air_kg_per_mol, u_air_kg_per_mol;     /* molar mass of dry air */
    double air_z, u_air_z;                       /* compression factor of dry air at the metering state */
} bc_reference;

/* Looks up the figures of a state. BC_ERR_RANGE, BC_ERR_USAGE as bc_state_check(); *reference is
 * untouched then. Combustion temperatures between the columns of the edition use the formation route;
 * metering temperatures between them a parabola through 0, 15 and 20 C. */
BC_API BC_MUST_USE bc_status bc_reference_at(const bc_state *state, bc_reference *reference, bc_error *err);

/* What ISO 6976 makes of a gas at a state; SI units. Gross heats count the condensation of all water,
 * net ones of none. Volumes are of the gas at the metering state. */
typedef struct {
    double molar_mass_kg_per_mol;
    double z;                       /* compression factor, 1 - (p/p0)(sum x s)^2 */
    double gross_j_per_mol, net_j_per_mol;
    double gross_j_per_kg, net_j_per_kg;
    double gross_j_per_m3, net_j_per_m3;             /* real gas */
    double gross_ideal_j_per_m3, net_ideal_j_per_m3; /* ideal gas */
    double density_kg_per_m3, density_ideal_kg_per_m3;
    double relative_density, relative_density_ideal;
    double wobbe_gross_j_per_m3, wobbe_net_j_per_m3;
    double wobbe_gross_ideal_j_per_m3, wobbe_net_ideal_j_per_m3;
    double molar_volume_m3_per_mol; /* real gas, Z R T/p */
} bc_value;

/* Evaluates a gas; cannot fail on a gas whose fractions add up to one. A state with `saturated` needs a
 * gas that was saturated before (bc_gas_for_state()). Volume figures hold for Z > 0.9 (the standard's
 * limit): below it they are computed all the same and bc_value_in_range() says no.
 * Source: ISO 6976:2016 clauses 5 to 10, value from memory; ISO 6976:1995. */
BC_API bc_value bc_value_of(const bc_reference *reference, const bc_gas *gas);

/* True while Z > 0.9, the limit of the standard's volume formulas. */
BC_API bool bc_value_in_range(const bc_value *value);

/* The gas as the state meters it: as it is, or saturated with water at the metering state. */
BC_API BC_MUST_USE bc_status bc_gas_for_state(const bc_gas *gas, const bc_state *state, bc_gas *metered, bc_error *err);

/* The sources of the figures of one species: heat and molar mass, summation factor. Static texts. */
BC_API const char *bc_reference_heat_source(size_t species, int edition);
BC_API const char *bc_reference_factor_source(size_t species, int edition);

#ifdef __cplusplus
}
#endif

#endif
