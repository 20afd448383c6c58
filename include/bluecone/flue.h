/* SPDX-License-Identifier: MIT */
/* bluecone/flue.h - the flue gas of complete combustion: what a fuel and its oxidant become. */
#ifndef BLUECONE_FLUE_H
#define BLUECONE_FLUE_H

#include "bluecone/gas.h"
#include "bluecone/status.h"

#ifdef __cplusplus
extern "C" {
#endif

/* Flue gas of one mole of fuel, burnt completely: all carbon as CO2, hydrogen as H2O, sulfur as SO2, nitrogen
 * as N2, spare oxygen as O2, noble gases as they are. */
typedef struct {
    double lambda;             /* air factor, 1 and above */
    double oxidant_mol;        /* mol oxidant per mol of fuel */
    double wet_mol, dry_mol;   /* mol flue gas per mol of fuel, with and without its water */
    bc_gas wet, dry;           /* mole fractions; dry is all zero when dry_mol is (hydrogen in oxygen) */
    double fuel_kg_per_mol, oxidant_kg_per_mol;
    double wet_kg_per_mol;     /* molar mass of the wet flue gas */
    double dry_kg_per_mol;     /* of the dry one; 0 when there is none */
} bc_flue;

/* Burns a fuel with lambda times its need of an oxidant.
 *
 *   fuel, oxidant   gases (bluecone/oxidant.h)
 *   lambda          1 and above, finite; below it carbon monoxide forms: that is equilibrium's business
 *   flue            out: untouched on failure
 *
 * BC_ERR_RANGE: lambda, or a fuel that needs no oxygen; BC_ERR_INPUT: an oxidant that has none to give.
 * Source: balance of the elements. */
BC_API BC_MUST_USE bc_status bc_flue_at(const bc_gas *fuel, const bc_gas *oxidant, double lambda, bc_flue *flue,
                                        bc_error *err);

/* Carbon dioxide of the dry flue gas at lambda 1 with dry air, mole fraction: the CO2max of the trade.
 *
 *   x   out: 0 for a fuel without carbon; untouched on failure
 *
 * BC_ERR_RANGE: a fuel that needs no oxygen. */
BC_API BC_MUST_USE bc_status bc_flue_co2_max(const bc_gas *fuel, double *x, bc_error *err);

/* Volumes of the flue gas at one state. */
typedef struct {
    double wet_m3, dry_m3;  /* m3 flue gas per m3 of fuel */
    double oxidant_m3;      /* m3 oxidant at the same state per m3 of fuel */
    double wet_kg_per_m3;   /* densities */
    double dry_kg_per_m3;   /* 0 when there is no dry flue gas */
} bc_flue_volume;

/* Volumes of flue gas and oxidant as ideal gases, V = n R T/p, R = 8.31446261815324 J/(mol K) (SI, 2019).
 * Near 1 atm air is within 0.1 % of it; the fuel is taken as real as its molar volume is.
 *
 *   t_k, p_pa          state of flue gas and oxidant, above 0: a metering state, or flue temperature; all water
 *                      is counted as vapour
 *   fuel_m3_per_mol    molar volume of the fuel at its metering state (bc_value.molar_volume_m3_per_mol), above 0
 *   volume             out: untouched on failure
 *
 * BC_ERR_RANGE: a temperature, pressure or molar volume that is not above 0 and finite. */
BC_API BC_MUST_USE bc_status bc_flue_volume_at(const bc_flue *flue, double t_k, double p_pa, double fuel_m3_per_mol,
                                               bc_flue_volume *volume, bc_error *err);

/* What comes of the fuel per heat of it, kg/J (1 kg/GJ is 1e-9 kg/J). */
typedef struct {
    double carbon_dioxide, sulfur_dioxide, water;
} bc_flue_factor;

/* Emission factors of a fuel: all its carbon (CO2 and CO of the fuel included), sulfur and hydrogen (moisture of
 * the fuel included) over a heating value. What the oxidant brings is not counted.
 *
 *   heat_j_per_mol   net or gross heat of the fuel, above 0: the factor is net or gross alike
 *   factor           out: untouched on failure
 *
 * BC_ERR_RANGE: a heat that is not above 0. Source: EF = M_CO2 n_C/H, IPCC 2006 Guidelines volume 2 with an
 * oxidation factor of 1. */
BC_API BC_MUST_USE bc_status bc_flue_factor_of(const bc_gas *fuel, double heat_j_per_mol, bc_flue_factor *factor,
                                               bc_error *err);

/* Streams of a burner, kg/s and mol/s. */
typedef struct {
    double fuel_mol, oxidant_mol, wet_mol, dry_mol; /* mol/s */
    double fuel_kg, oxidant_kg, wet_kg, dry_kg;     /* kg/s */
    double carbon_dioxide_kg, water_kg, sulfur_dioxide_kg, nitrogen_kg, oxygen_kg; /* of the flue gas, kg/s */
} bc_flue_flow;

/* The streams at a fuel rate, mol/s; any finite rate. */
BC_API bc_flue_flow bc_flue_flow_at(const bc_flue *flue, double fuel_mol_per_s);

#ifdef __cplusplus
}
#endif

#endif
