/* SPDX-License-Identifier: MIT */
/* fuzz_composition.c - a composition file. */
#include "fuzz_gas.h"

static void check_other_closure(const bc_composition *c)
{
    static bc_composition other;
    bc_error err;

    other = *c;
    if (fuzz_answer(bc_composition_close(&other, c->closure == BC_CLOSURE_NONE ? BC_CLOSURE_NORMALISED : BC_CLOSURE_NONE, &err), &err))
        fuzz_require_composition(&other);
}

int LLVMFuzzerTestOneInput(const uint8_t *data, size_t size)
{
    static bc_composition c;
    bc_gas gas;
    bc_error err;

    if (!fuzz_answer(bc_composition_read(fuzz_file(data, size), &c, &err), &err)) {
        fuzz_require(err.status == BC_ERR_INPUT);
        return 0;
    }
    fuzz_require_composition(&c);
    if (c.has_uncertainty)
        check_other_closure(&c);
    if (fuzz_answer(bc_gas_air_free(&c.gas, &gas, NULL, &err), &err))
        fuzz_require_gas(&gas);
    if (fuzz_answer(bc_composition_completed(&c, 0, &gas, &err), &err))
        fuzz_require_gas(&gas);
    return 0;
}
