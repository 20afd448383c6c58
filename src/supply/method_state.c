/* SPDX-License-Identifier: MIT */
/* method_state.c - the reference states that the methods of interchangeability were published for. */
#include "supply/index_internal.h"

#define F60_C ((60.0 - 32.0) / 1.8)
#define INHG_PA 3386.389 /* conventional inch of mercury, NIST SP 811 (2008) appendix B */

void open_room(index_room *room)
{
    for (size_t i = 0; i < METHOD_STATES; i++)
        room->has_reference[i] = false;
    room->has_weaver_old = false;
    room->has_weaver_new = false;
    room->has_aga = false;
    room->has_dutton = false;
}

bc_status method_reference(const index_case *c, method_state state, const bc_reference **reference, bc_error *err)
{
    static const bc_state STATES[METHOD_STATES] = {
        [STATE_60F_30INHG] = {F60_C, F60_C, 30.0 * INHG_PA, false, 0},
        [STATE_15_15] = {15.0, 15.0, BC_P0_PA, false, 0},
        [STATE_0_0] = {0.0, 0.0, BC_P0_PA, false, 0},
    };
    bc_state s = STATES[state];
    bc_status status = BC_OK;

    s.edition = c->new_gas->reference->state.edition;
    if (!c->room->has_reference[state])
        status = bc_reference_at(&s, &c->room->reference[state], err);
    c->room->has_reference[state] = status == BC_OK;
    *reference = &c->room->reference[state];
    return status;
}
