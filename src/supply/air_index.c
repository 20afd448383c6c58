/* SPDX-License-Identifier: MIT */
/* air_index.c - A/sqrt(d), the air that the gas of one orifice needs. */
#include "bluecone/air_index.h"

#include "base/error_internal.h"
#include "flame/oxidant_internal.h"
#include "supply/index_internal.h"

#include <math.h>
#include <string.h>

/* Of a pair whose fuel is set: moles of air per mole of gas, then real volumes; with them A/sqrt(d) is a/sqrt(M Z) but
 * for constants. */
static bc_status index_of(const bc_reference *reference, const bc_value *value, oxidant_pair *pair, double *index, bc_error *err)
{
    oxidant_air_atoms(pair->oxidant);
    if (oxidant_pair_balance(pair, NULL) != BC_OK)
        return bc_fail(err, BC_ERR_RANGE, "the gas needs no air to burn: it has no air index");
    *index = pair->ratio * reference->air_z / value->z / sqrt(value->relative_density);
    return BC_OK;
}

bc_status bc_air_index(const bc_reference *reference, const bc_gas *gas, double *index, bc_error *err)
{
    const bc_value value = bc_value_of(reference, gas);
    oxidant_pair pair;

    oxidant_atoms(gas, pair.fuel);
    return index_of(reference, &value, &pair, index, err);
}

bc_status air_index_index(const index_case *c, reading *r, bc_error *err)
{
    double index = 0.0;
    oxidant_pair pair;

    memcpy(pair.fuel, c->new_gas->atoms, sizeof pair.fuel);
    const bc_status status = index_of(c->new_gas->reference, &c->new_gas->value, &pair, &index, err);

    if (status == BC_OK)
        *r = reading_of(index, bc_value_in_range(&c->new_gas->value) ? "" : "Z is below 0.9, where ISO 6976 gives no volumes");
    return status;
}
