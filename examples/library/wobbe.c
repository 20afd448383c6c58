/* SPDX-License-Identifier: MIT */
/* wobbe.c - the gross Wobbe index of a gas at 15 C / 15 C, ISO 6976:2016. */
#include <bluecone/bluecone.h>

#include <stdio.h>

int main(int argc, char **argv)
{
    static bc_composition gas; /* 160 kB: not for a small stack */
    const bc_state state = bc_state_default();
    bc_reference reference;
    bc_error err;

    if (argc != 2)
        return 2;
    if (bc_composition_find(argv[1], NULL, 0, &gas, &err) != BC_OK ||
        bc_reference_at(&state, &reference, &err) != BC_OK) {
        fprintf(stderr, "%s: %s\n", argv[1], err.message);
        return bc_exit_code(err.status);
    }
    const bc_value value = bc_value_of(&reference, &gas.gas);

    printf("%.4f MJ/m3\n", value.wobbe_gross_j_per_m3 / 1e6);
    return 0;
}
