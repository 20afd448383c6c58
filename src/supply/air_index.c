/* SPDX-License-Identifier: MIT */
/* air_index.c - A/sqrt(d), the air that the gas of one orifice needs. */
#include "bluecone/air_index.h"

#include "base/error_internal.h"
#include "bluecone/oxidant.h"
#include "supply/index_internal.h"

#include <math.h>

bc_status bc_air_index(const bc_reference *reference, const bc_gas *gas, double *index, bc_error *err)
{
    const bc_value value = bc_value_of(reference, gas);
    const bc_gas air = bc_oxidant_air();
    bc_demand demand;
    const bc_status status = bc_oxidant_demand(gas, &air, &demand, err);

    if (status != BC_OK)
        return status;
    if (!(demand.oxygen_mol > 0.0))
        return bc_fail(err, BC_ERR_RANGE, "the gas needs no air to burn: it has no air index");
    /* moles of air per mole of gas, then real volumes: with them A/sqrt(d) is a/sqrt(M Z) but for constants */
    *index = demand.oxidant_mol * reference->air_z / value.z / sqrt(value.relative_density);
    return BC_OK;
}

bc_status air_index_index(const index_case *c, reading *r, bc_error *err)
{
    double index = 0.0;
    const bc_status status = bc_air_index(c->new_gas->reference, &c->new_gas->gas, &index, err);

    if (status == BC_OK)
        *r = reading_of(index, bc_value_in_range(&c->new_gas->value) ? "" : "Z is below 0.9, where ISO 6976 gives no volumes");
    return status;
}
