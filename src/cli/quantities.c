/* SPDX-License-Identifier: MIT */
/* quantities.c - a list of quantities as users write it. */
#include "base/error_internal.h"
#include "base/text.h"
#include "cli/cli.h"

#include <string.h>

bc_status quantities_take(const char *list, size_t quantities[], size_t *count, bc_error *err)
{
    *count = 0;
    for (;;) {
        char id[BC_WORD_MAX];
        const size_t length = strcspn(list, ",");

        if (!bc_text_copy(id, sizeof id, list, length) || id[0] == '\0')
            return bc_fail(err, BC_ERR_USAGE, "a quantity is empty or too long; write them as hhv,wobbe-gross");
        if (*count == QUANTITIES_MAX)
            return bc_fail(err, BC_ERR_USAGE, "more than %d quantities", QUANTITIES_MAX);
        const bc_status status = bc_quantity_find(id, &quantities[*count], err);

        if (status != BC_OK)
            return status;
        (*count)++;
        if (list[length] == '\0')
            return BC_OK;
        list += length + 1;
    }
}
