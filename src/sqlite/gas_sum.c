/* SPDX-License-Identifier: MIT */
/* gas_sum.c - from the shares of a row to a gas, by the rules of `bluecone stream`. */
#include "sqlite/gas_sum.h"

#include "base/error_internal.h"
#include "base/text.h"

#include <string.h>

void gas_sum_start(gas_sum *s)
{
    memset(s, 0, sizeof *s);
}

void gas_sum_add(gas_sum *s, const component *what, double percent)
{
    const double share = percent * 1e-2;

    s->sum += share;
    for (size_t i = 0; i < what->part_count; i++)
        s->amounts[what->parts[i].species] += share * what->parts[i].moles;
}

bc_status share_from_text(const char *text, const char *name, double *percent, bc_error *err)
{
    const char *first = bc_text_skip_space(text);
    const bool below = *first == '<';
    double value = 0.0;
    char shown[40];

    if (*first != '\0' && bc_number_parse(below ? first + 1 : first, &value, NULL) != BC_OK) {
        bc_text_show(shown, sizeof shown, first);
        return bc_fail(err, BC_ERR_INPUT, "the share of '%s' reads '%s', which is no number; correct it, or give NULL", name, shown);
    }
    *percent = below && value > 0.0 ? 0.0 : value;
    return BC_OK;
}

bc_status share_check(double percent, const char *name, bc_error *err)
{
    if (percent >= 0.0)
        return BC_OK;
    return bc_fail(err, BC_ERR_INPUT, "the share of '%s' is %.6g, and no share is negative; correct it", name, percent);
}

bc_status gas_sum_finish(const gas_sum *s, bc_gas *gas, bc_error *err)
{
    const bool fractions = s->sum > 1e-2 * BC_SUM_MIN && s->sum < 1e-2 * BC_SUM_MAX;

    if (s->sum >= BC_SUM_MIN && s->sum <= BC_SUM_MAX)
        return bc_gas_from_amounts(s->amounts, gas, err);
    return bc_fail(err, BC_ERR_INPUT, "the components add up to %.6g %%, outside 98 to 102 %%; %s", 100.0 * s->sum,
                   fractions ? "these look like fractions of one: multiply them by 100" : "give all of them, in mole per cent");
}
