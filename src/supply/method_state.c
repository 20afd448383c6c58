/* SPDX-License-Identifier: MIT */
/* method_state.c - what the methods of interchangeability share, and the reference states they were published for. */
#include "gas/species_index.h"
#include "supply/index_internal.h"
#include "value/reference_internal.h"

#define F60_C ((60.0 - 32.0) / 1.8)
#define INHG_PA 3386.389 /* conventional inch of mercury, NIST SP 811 (2008) appendix B */

/* By its oxygen demand: the gross heat would count the water that only condenses. */
static bool burns(const constituents *c)
{
    double oxygen = 0.0;

    for (size_t p = 0; p < PART_COUNT; p++)
        oxygen += c->oxygen[p];
    return oxygen > 0.0;
}

void open_case(index_case *c, const bc_subject *old_gas, const bc_subject *new_gas, index_room *room)
{
    for (size_t i = 0; i < METHOD_STATES; i++)
        room->has_reference[i] = false;
    room->has_weaver_old = false;
    room->has_weaver_new = false;
    room->has_aga = false;
    room->has_dutton = false;
    if (old_gas)
        room->old_parts = constituents_of(&old_gas->gas);
    room->new_parts = constituents_of(&new_gas->gas);
    *c = (index_case){old_gas, new_gas, old_gas && burns(&room->old_parts), burns(&room->new_parts), room};
}

/* The species of both gases, and what Dutton's equivalent mixture is made of: looking up all takes longer than all else
 * that an index does. */
static void want(const index_case *c, bool wanted[SPECIES_COUNT])
{
    for (size_t i = 0; i < SPECIES_COUNT; i++)
        wanted[i] = c->new_gas->gas.x[i] != 0.0 || (c->old_gas && c->old_gas->gas.x[i] != 0.0);
    wanted[SPECIES_methane] = wanted[SPECIES_propane] = wanted[SPECIES_nitrogen] = true;
}

bc_status method_reference(const index_case *c, method_state state, const bc_reference **reference, bc_error *err)
{
    static const bc_state STATES[METHOD_STATES] = {
        [STATE_60F_30INHG] = {F60_C, F60_C, 30.0 * INHG_PA, false, 0},
        [STATE_15_15] = {15.0, 15.0, BC_P0_PA, false, 0},
        [STATE_0_0] = {0.0, 0.0, BC_P0_PA, false, 0},
    };
    bc_state s = STATES[state];

    *reference = &c->room->reference[state];
    if (c->room->has_reference[state])
        return BC_OK;
    bool wanted[SPECIES_COUNT];

    want(c, wanted);
    s.edition = c->new_gas->reference->state.edition;
    const bc_status status = reference_of(&s, wanted, &c->room->reference[state], err);

    c->room->has_reference[state] = status == BC_OK;
    return status;
}
