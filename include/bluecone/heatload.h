/* SPDX-License-Identifier: MIT */
/* bluecone/heatload.h - the heat of a flame by a path that can be checked by hand, and what of it is useful.
 *
 * Reactants go to 298.15 K, react there (water stays vapour), the products go to the exit temperature, and
 * what condenses there condenses. Every figure is an enthalpy change of the stream, J per mole of fuel: negative
 * is heat given off. */
#ifndef BLUECONE_HEATLOAD_H
#define BLUECONE_HEATLOAD_H

#include <stdbool.h>
#include <stddef.h>

#include "bluecone/dewpoint.h"
#include "bluecone/flue.h"
#include "bluecone/gas.h"
#include "bluecone/status.h"

#ifdef __cplusplus
extern "C" {
#endif

#define BC_HEAT_T0_K 298.15 /* where the reaction takes place: the reference of formation enthalpies */

/* What burns, how, and how cold it leaves. */
typedef struct {
    const bc_gas *fuel, *oxidant;
    double lambda;                   /* 1 and above */
    double fuel_k, oxidant_k, exit_k; /* temperatures, 200..6000 K */
    double p_pa;                     /* of the flue gas where it leaves: only condensation asks for it */
    bool condensing;                 /* false: all water leaves as vapour, as in a dry stack */
} bc_heat_case;

/* One species on the path. */
typedef struct {
    double mol;                /* per mol of fuel */
    double formation_j_per_mol; /* H(298.15 K) of it, formation enthalpy */
    double increment_j_per_mol; /* H(T) - H(298.15 K), T of its stream */
} bc_heat_term;

/* The path. Sums of the terms:
 *
 *   fuel_j, oxidant_j = - sum mol increment
 *   reaction_j        = sum mol formation of products - of reactants
 *   products_j        = sum mol increment
 *   condensation_j    = - condensate_mol (H vapour - H liquid)
 *
 * Reactants go to 298.15 K, products to the exit temperature, all water as vapour; there it condenses. */
typedef struct {
    bc_flue flue;
    bc_condensation condensation; /* per mole of wet flue gas */
    double condensate_mol;        /* per mole of fuel */
    bc_heat_term fuel[BC_SPECIES_CAPACITY], oxidant[BC_SPECIES_CAPACITY], products[BC_SPECIES_CAPACITY];
    double fuel_j, oxidant_j, reaction_j, products_j, condensation_j;
    double total_j;               /* sum of the five; the heat released is - total_j */
    double net_j, gross_j;        /* heats of the fuel at 298.15 K on the same data: -reaction_j, and with its water liquid */
} bc_heat_path;

/* Walks the path.
 *
 *   path   out: untouched on failure
 *
 * Errors of bc_flue_at() and bc_condense(); BC_ERR_RANGE: a temperature outside the thermodynamic data, or
 * condensation outside those of liquid water, 273.16..600 K.
 * Source: enthalpies of bluecone/thermo.h, NASA/TP-2002-211556. Latent heat from the same data, so that the
 * path closes with net_j and gross_j: as the ideal gas that the flue gas is taken for, 0.04 % above
 * bc_steam_latent_heat() at 25 C. */
BC_API BC_MUST_USE bc_status bc_heat_path_of(const bc_heat_case *heat_case, bc_heat_path *path, bc_error *err);

/* Where the heat goes. Fractions of the net or of the gross heat of the fuel alone: heat that preheated
 * streams bring counts as a credit and raises the efficiency, and a condensing exit may pass 1 on the net basis. */
typedef struct {
    double released_j, casing_j, useful_j;       /* per mol of fuel: path, lost by the casing, what is left */
    double efficiency_net, efficiency_gross;     /* useful over the heat of the fuel */
    double stack_loss_net, stack_loss_gross;     /* 1 - released over the heat; on gross it holds the latent heat */
    double casing_loss_net, casing_loss_gross;
    double released_per_oxidant_j;               /* J per mol of oxidant: how a burner limited by its air sees a gas */
} bc_heat_yield;

/* Splits the heat of a path.
 *
 *   casing_loss   heat lost by radiation and convection, fraction of the net heat of the fuel, 0..1; 0.005 to
 *                 0.02 for boilers of some MW, value from memory
 *   yield         out: untouched on failure
 *
 * BC_ERR_RANGE: casing_loss; a fuel without net heat. Source: indirect method of EN 12952-15 (net) and ASME PTC 4
 * (gross) in outline: exit gas and casing, nothing unburnt. */
BC_API BC_MUST_USE bc_status bc_heat_yield_of(const bc_heat_path *path, double casing_loss, bc_heat_yield *yield, bc_error *err);

/* Fuel rate for a duty, mol/s = W/useful_j.
 *
 *   duty_w   useful heat, not negative
 *   rate     out: mol/s of fuel; untouched on failure
 *
 * BC_ERR_RANGE: a negative duty, or a case that yields no useful heat. */
BC_API BC_MUST_USE bc_status bc_heat_rate(const bc_heat_yield *yield, double duty_w, double *fuel_mol_per_s, bc_error *err);

/* Duty of a fuel rate, W; any finite rate. */
BC_API double bc_heat_duty_w(const bc_heat_yield *yield, double fuel_mol_per_s);

/* A row of Siegert's coefficients. Static texts. */
typedef struct {
    const char *id, *fuels;
    const char *families; /* of composition files, blanks between; "" for none */
    double a1, a2, b;     /* % , %, 1: as printed */
    const char *source;
} bc_siegert;

/* The rows; NULL for an index out of range, a family or id that has none. */
BC_API size_t bc_siegert_count(void);
BC_API const bc_siegert *bc_siegert_at(size_t index);
BC_API const bc_siegert *bc_siegert_of_family(const char *family);

/* Siegert's estimate of the stack loss from the oxygen of the dry flue gas,
 * q = (t_A - t_L) (A2/(21 - O2) + B), fraction of the net heat.
 *
 *   flue_k, air_k   exit and air temperature, finite
 *   x_oxygen        mole fraction, 0 to below 0.21
 *   loss            out: untouched on failure
 *
 * BC_ERR_RANGE outside of it, or a flue gas colder than the air. Only for dry, not condensing operation.
 * Source: 1. BImSchV annex 2, with the row's coefficients. */
BC_API BC_MUST_USE bc_status bc_siegert_loss(const bc_siegert *row, double flue_k, double air_k, double x_oxygen, double *loss,
                                             bc_error *err);

/* The same from carbon dioxide, q = (t_A - t_L) (A1/CO2 + B); x_co2 above 0 and at most 1. */
BC_API BC_MUST_USE bc_status bc_siegert_loss_co2(const bc_siegert *row, double flue_k, double air_k, double x_co2, double *loss,
                                                 bc_error *err);

#ifdef __cplusplus
}
#endif

#endif
