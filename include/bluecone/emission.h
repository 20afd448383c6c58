/* SPDX-License-Identifier: MIT */
/* bluecone/emission.h - one reading of a pollutant in every form in which limits are written. */
#ifndef BLUECONE_EMISSION_H
#define BLUECONE_EMISSION_H

#include "bluecone/flue.h"
#include "bluecone/status.h"

#ifdef __cplusplus
extern "C" {
#endif

/* Pollutants by the mass that the trade counts them with. */
typedef enum {
    BC_POLLUTANT_NOX, /* NO and NO2, all as NO2 */
    BC_POLLUTANT_CO,
    BC_POLLUTANT_SO2,
    BC_POLLUTANTS
} bc_pollutant;

/* How the oxygen of the undiluted oxidant enters the reference-oxygen rule E_ref = E (x - O_ref)/(x - O). */
#define BC_EMISSION_AIR_EU 0.21  /* 21 %: 13. BImSchV annex 4 */
#define BC_EMISSION_AIR_US 0.209 /* 20.9 %: 40 CFR 60 appendix A, Method 19 */

/* A pollutant in a dry flue gas, four ways. Volumes at 0 C and 101.325 kPa, dry, ideal gas. */
typedef struct {
    double fraction;         /* mol/mol at the oxygen measured; 1 ppm is 1e-6 */
    double kg_per_m3;        /* at the oxygen measured */
    double kg_per_m3_at_ref; /* at the reference oxygen */
    double kg_per_j;         /* per heat of the fuel; 1 mg/MJ is 1e-12 kg/J */
} bc_emission;

/* Which of the four is known. */
typedef enum { BC_EMISSION_FRACTION, BC_EMISSION_DENSITY, BC_EMISSION_DENSITY_AT_REF, BC_EMISSION_PER_HEAT } bc_emission_form;

/* What the conversion rests on. */
typedef struct {
    bc_pollutant pollutant;
    double o2_measured;      /* oxygen of the dry flue gas, mole fraction */
    double o2_reference;     /* oxygen that limits are written for: 0.03 gas boilers, 0.15 gas turbines */
    double o2_air;           /* BC_EMISSION_AIR_EU, BC_EMISSION_AIR_US, or that of the dry oxidant, which is exact */
    double dry_mol;          /* dry flue gas at lambda 1 without spare oxygen, mol per mol of fuel (bc_flue.dry_mol) */
    double heat_j_per_mol;   /* of the fuel, net or gross: kg_per_j is on it */
} bc_emission_basis;

/* Converts a reading into all four forms:
 *
 *   mg/m3 = ppm M/22.414,  E_ref = E (x - O_ref)/(x - O),  mg/MJ = E_ref V x/(x - O_ref)/H
 *
 * with x of o2_air and V the volume of dry_mol.
 *
 *   form, value   the figure that is known, not negative
 *   emission      out: untouched on failure
 *
 * BC_ERR_RANGE: an oxygen of 0 to below o2_air broken, a value that is negative or not finite, a dry_mol or
 * heat that is not above 0. BC_ERR_USAGE: no such pollutant or form.
 * Source: 13. BImSchV annex 4 (reference oxygen), 40 CFR 60 Method 19 (per heat). Molar volume 22.41396954 L/mol
 * (SI 2019); real SO2 has 2.3 % less, which no rule counts. */
BC_API BC_MUST_USE bc_status bc_emission_convert(const bc_emission_basis *basis, bc_emission_form form, double value,
                                                 bc_emission *emission, bc_error *err);

#ifdef __cplusplus
}
#endif

#endif
