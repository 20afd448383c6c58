/* SPDX-License-Identifier: MIT */
/* siegert.c - Siegert's estimate of the stack loss. */
#include "bluecone/heatload.h"

#include "base/compiler.h"
#include "base/error_internal.h"

#include <math.h>
#include <string.h>

#define OXYGEN_OF_AIR 21.0 /* %, as the estimate takes it: 1. BImSchV annex 2 */

static const bc_siegert ROWS[] = {
#define SIEGERT(id, fuels, families, a1, a2, b, source) {id, fuels, families, a1, a2, b, source},
#include "data/siegert.def"
};

size_t bc_siegert_count(void)
{
    return BC_COUNT(ROWS);
}

const bc_siegert *bc_siegert_at(size_t index)
{
    return index < BC_COUNT(ROWS) ? &ROWS[index] : NULL;
}

/* True when a word stands in a list with blanks between. */
static bool lists(const char *words, const char *word)
{
    const size_t length = strlen(word);

    while (length > 0 && *words != '\0') {
        const size_t n = strcspn(words, " ");

        if (n == length && strncmp(words, word, n) == 0)
            return true;
        words += n + strspn(words + n, " ");
    }
    return false;
}

const bc_siegert *bc_siegert_of_family(const char *family)
{
    for (size_t i = 0; i < BC_COUNT(ROWS); i++)
        if (lists(ROWS[i].families, family))
            return &ROWS[i];
    return NULL;
}

static bc_status check_temperatures(double flue_k, double air_k, bc_error *err)
{
    if (air_k > 0.0 && flue_k >= air_k && isfinite(flue_k))
        return BC_OK;
    return bc_fail(
        err, BC_ERR_RANGE,
        "a flue gas of %.6g K and air of %.6g K: Siegert's estimate wants the flue gas at least as warm",
        flue_k, air_k);
}

bc_status bc_siegert_loss(const bc_siegert *row, double flue_k, double air_k, double x_oxygen, double *loss,
                          bc_error *err)
{
    const double spare = OXYGEN_OF_AIR - 100.0 * x_oxygen;
    const bc_status status = check_temperatures(flue_k, air_k, err);

    if (status != BC_OK)
        return status;
    if (!(x_oxygen >= 0.0 && spare > 0.0))
        return bc_fail(err, BC_ERR_RANGE,
                       "Siegert's estimate takes 0 to below %g %% oxygen in the dry flue gas, not %.6g %%",
                       OXYGEN_OF_AIR, x_oxygen * 100.0);
    *loss = (flue_k - air_k) * (row->a2 / spare + row->b) / 100.0;
    return BC_OK;
}

bc_status bc_siegert_loss_co2(const bc_siegert *row, double flue_k, double air_k, double x_co2, double *loss,
                              bc_error *err)
{
    const bc_status status = check_temperatures(flue_k, air_k, err);

    if (status != BC_OK)
        return status;
    if (!(x_co2 > 0.0 && x_co2 <= 1.0))
        return bc_fail(err, BC_ERR_RANGE, "Siegert's estimate takes carbon dioxide above 0 %%, not %.6g %%",
                       x_co2 * 100.0);
    *loss = (flue_k - air_k) * (row->a1 / (100.0 * x_co2) + row->b) / 100.0;
    return BC_OK;
}
