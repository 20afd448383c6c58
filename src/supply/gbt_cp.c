/* SPDX-License-Identifier: MIT */
/* gbt_cp.c - combustion potential of GB/T 13611. */
#include "bluecone/gbt_cp.h"

#include "base/error_internal.h"
#include "gas/species_index.h"
#include "gas/summation.h"
#include "supply/index_internal.h"

#include <math.h>

#define T_VOLUME_C 15.0

/* Mole fractions to fractions of real-gas volume at 15 C: phi = x Z/sum x Z. */
static bc_gas by_volume(const bc_gas *gas)
{
    bc_gas volume = {{0.0}};
    double sum = 0.0;

    for (size_t i = 0; i < SPECIES_COUNT; i++)
        if (gas->x[i] > 0.0) {
            volume.x[i] = gas->x[i] * bc_species_z(i, T_VOLUME_C);
            sum += volume.x[i];
        }
    for (size_t i = 0; i < SPECIES_COUNT; i++)
        volume.x[i] /= sum;
    return volume;
}

bc_status bc_gbt_cp(const bc_reference *reference, const bc_gas *gas, double *cp, const char **outside, bc_error *err)
{
    bc_gas dry;
    const bc_status status = bc_gas_dry(gas, &dry, err);

    if (status != BC_OK)
        return status;
    const bc_gas volume = by_volume(&dry);
    const constituents c = constituents_of(&volume);
    const double others = c.hydrocarbons - c.x[PART_METHANE] + c.x[PART_CARBON_MONOXIDE];
    const double sum = 100.0 * (c.x[PART_HYDROGEN] + 0.6 * others + 0.3 * c.x[PART_METHANE]);
    const double oxygen = 100.0 * c.x[PART_OXYGEN];

    if (!(sum > 0.0))
        return bc_fail(err, BC_ERR_RANGE, "the gas holds nothing that burns: it has no combustion potential");
    *cp = (1.0 + 0.0054 * oxygen * oxygen) * sum / sqrt(bc_value_of(reference, &dry).relative_density);
    *outside = "";
    if (c.x[PART_FUELS] > UNLISTED_MAX)
        *outside = "more than 1 % of fuels for which the standard gives no coefficient";
    else if (gas->x[SPECIES_water] > WATER_MAX)
        *outside = WET_TEXT;
    return BC_OK;
}

bc_status gbt_cp_index(const index_case *c, reading *r, bc_error *err)
{
    const bc_reference *reference = NULL;
    double cp = 0.0;
    const char *outside = "";
    bc_status status = method_reference(c, STATE_15_15, &reference, err);

    if (status == BC_OK)
        status = bc_gbt_cp(reference, &c->new_gas->gas, &cp, &outside, err);
    if (status == BC_OK)
        *r = reading_of(cp, outside);
    return status;
}
