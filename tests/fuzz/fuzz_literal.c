/* SPDX-License-Identifier: MIT */
/* fuzz_literal.c - a gas written on the command line. */
#include "fuzz_gas.h"

int LLVMFuzzerTestOneInput(const uint8_t *data, size_t size)
{
    static bc_composition c;
    char *text = fuzz_text(data, size);
    bc_error err;

    if (fuzz_answer(bc_composition_parse(text, &c, &err), &err))
        fuzz_require_composition(&c);
    else
        fuzz_require(bc_exit_code(err.status) == 2 || bc_exit_code(err.status) == 3);
    free(text);
    return 0;
}
