/* SPDX-License-Identifier: MIT */
/* subject.c - a gas made ready at a reference state, and the gap between its two heating values. */
#include "bluecone/subject.h"

#include "base/compiler.h"
#include "base/error_internal.h"
#include "gas/species_atoms.h"
#include "value/formation_internal.h"
#include "value/subject_internal.h"

void subject_weigh(bc_subject *subject)
{
    for (size_t k = 0; k < BC_ELEMENTS; k++)
        subject->atoms[k] = 0.0;
    for (size_t i = 0; i < SPECIES_COUNT; i++) {
        if (subject->gas.x[i] == 0.0)
            continue;
        for (size_t k = 0; k < BC_ELEMENTS; k++)
            subject->atoms[k] += subject->gas.x[i] * SPECIES_ATOMS[i][k];
    }
    subject->value = bc_value_of(subject->reference, &subject->gas);
}

bc_status bc_subject_make(const bc_reference *reference, const bc_gas *gas, const bc_spread *spread, bc_subject *subject, bc_error *err)
{
    bc_gas metered BC_UNFILLED;
    const bc_status status = bc_gas_for_state(gas, &reference->state, &metered, err);

    if (status != BC_OK)
        return status;
    subject->reference = reference;
    subject->spread = spread && spread->count > 0 ? spread : NULL;
    subject->spread_scale = 1.0;
    if (reference->state.saturated)
        subject->spread_scale = (1.0 - metered.x[SPECIES_water]) / (1.0 - gas->x[SPECIES_water]);
    subject->gas = metered;
    subject_weigh(subject);
    /* below it the summation formula means nothing, and at 0 its roots are no numbers */
    if (!(subject->value.z > 0.05))
        return bc_fail(err, BC_ERR_RANGE, "at %.4g C the mixture is no gas: its compression factor by ISO 6976 would be %.2g",
                       reference->state.metering_c, subject->value.z);
    return BC_OK;
}

void bc_gap_shares(const bc_subject *s, double share[])
{
    const double t_k = s->reference->state.combustion_c + 273.15;

    for (size_t i = 0; i < BC_SPECIES_CAPACITY; i++) {
        share[i] = 0.0;
        if (i < SPECIES_COUNT && s->gas.x[i] > 0.0 && s->value.gross_j_per_mol > 0.0)
            share[i] = s->gas.x[i] * (formation_gross_j_per_mol(i, t_k) - s->reference->gross_j_per_mol[i]) / s->value.gross_j_per_mol;
    }
}
