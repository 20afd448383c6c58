/* SPDX-License-Identifier: MIT */
/* contract_log_row.c - one row of a log: an analysis, or the reason why not. */
#include "cli/contract_log.h"

#include "base/error_internal.h"
#include "base/text.h"
#include "bluecone/number.h"

#include <stdio.h>
#include <string.h>

#define SUM_MIN 0.98 /* as of a composition file: what is outside is no whole analysis */
#define SUM_MAX 1.02

/* Where cells are not parted by commas, one is a decimal mark. */
static bc_status take_number(const log_case *l, size_t i, double *value, bc_error *err)
{
    char text[LOG_CELL_MAX];

    (void)snprintf(text, sizeof text, "%s", l->cells[i]);
    for (char *p = text; *p != '\0' && l->delimiter != ','; p++)
        if (*p == ',')
            *p = '.';
    if (*bc_text_skip_space(text) == '\0')
        return bc_fail(err, BC_ERR_INPUT, "'%s' is empty", l->header.columns[i].name);
    if (bc_number_parse(text, value, NULL) == BC_OK)
        return BC_OK;
    char shown[40];

    bc_text_show(shown, sizeof shown, l->cells[i]);
    return bc_fail(err, BC_ERR_INPUT, "'%s' of '%s' is no number", shown, l->header.columns[i].name);
}

/* A date and a time in two columns are joined. A clock with a zone and one without do not mix. */
static bc_status take_time(const log_case *l, double *time_s, bool *has_zone, bc_error *err)
{
    char text[2 * LOG_CELL_MAX] = "";
    bool zoned = false;

    for (size_t i = 0; i < l->header.column_count; i++) {
        const size_t used = strlen(text);

        if (l->header.columns[i].kind == LOG_TIME)
            (void)snprintf(text + used, sizeof text - used, "%s%s", used > 0 ? " " : "", l->cells[i]);
    }
    const bc_status status = bc_log_time_parse(text, time_s, &zoned, err);

    if (status != BC_OK)
        return status;
    *has_zone = zoned;
    if (l->clocked && zoned != l->zoned)
        return bc_fail(err, BC_ERR_INPUT, "its time is %s a zone, unlike those before", zoned ? "with" : "without");
    return BC_OK;
}

static bc_status take_gas(const log_case *l, bc_gas *gas, double *total, bc_error *err)
{
    double amounts[BC_SPECIES_CAPACITY] = {0.0};
    double sum = 0.0;

    for (size_t i = 0; i < l->header.column_count; i++) {
        const log_column *column = &l->header.columns[i];
        double value = 0.0;

        if (column->kind != LOG_COMPONENT)
            continue;
        const bc_status status = take_number(l, i, &value, err);

        if (status != BC_OK)
            return status;
        if (value < 0.0)
            return bc_fail(err, BC_ERR_INPUT, "the share of '%s' is negative", column->name);
        sum += value * column->fraction;
        for (size_t s = 0; s < bc_species_count(); s++)
            amounts[s] += value * column->fraction * column->parts[s];
    }
    if (!(sum >= SUM_MIN && sum <= SUM_MAX))
        return bc_fail(err, BC_ERR_INPUT, "its components add up to %.6g %%, not to 100 %%", 100.0 * sum);
    *total = sum;
    return bc_gas_from_amounts(amounts, gas, err);
}

/* Whether a share of the row has a decimal comma. */
static bool has_commas(const log_case *l)
{
    for (size_t i = 0; i < l->header.column_count; i++)
        if (l->header.columns[i].kind == LOG_COMPONENT && strchr(l->cells[i], ','))
            return true;
    return false;
}

/* An analysis is worth reading without its flow, too; only its heat is not counted then. */
static void take_flow(log_case *l, bc_per_amount *flow, int line)
{
    *flow = (bc_per_amount){.given = false};
    for (size_t i = 0; i < l->header.column_count; i++) {
        double value = 0.0;

        if (l->header.columns[i].kind != LOG_FLOW)
            continue;
        if (take_number(l, i, &value, NULL) != BC_OK || value < 0.0 || (log_is_grouped(l->cells[i]) && has_commas(l))) {
            l->flow_line = l->flows_missing++ == 0 ? line : l->flow_line;
            return;
        }
        *flow = l->header.columns[i].flow;
        flow->si *= value;
    }
}

static bc_status check_cells(const log_case *l, bc_error *err)
{
    size_t count = l->cell_count;

    while (count > l->header.column_count && l->cells[count - 1][0] == '\0')
        count--;
    if (count != l->header.column_count)
        return bc_fail(err, BC_ERR_INPUT, "it has %zu cells, but the header names %zu", count, l->header.column_count);
    return BC_OK;
}

static bc_status take_row(log_case *l, int line, bc_error *err)
{
    bc_log_row row;
    bool zoned = false;
    double sum = 1.0;
    bc_status status = check_cells(l, err);

    if (status == BC_OK)
        status = take_time(l, &row.time_s, &zoned, err);
    if (status == BC_OK)
        status = take_gas(l, &row.gas, &sum, err);
    if (status != BC_OK)
        return status;
    const size_t missing = l->flows_missing;

    take_flow(l, &row.flow, line);
    status = bc_log_add(l->log, &row, err);
    if (status != BC_OK) {
        l->flows_missing = missing;
        return status;
    }
    if (log_sum_is_off(sum))
        l->off_line = l->sums_off++ == 0 ? line : l->off_line;
    l->clocked = true;
    l->zoned = zoned;
    return BC_OK;
}

bc_status log_take_row(log_case *l, int line, bc_error *err)
{
    bc_error cause = {.message = ""};
    const bc_status status = take_row(l, line, &cause);

    l->rows++;
    if (status == BC_OK)
        return BC_OK;
    if (status == BC_ERR_MEMORY || status == BC_ERR_USAGE) {
        if (err)
            *err = cause;
        return status;
    }
    if (l->refused < LOG_TOLD_MAX) {
        log_refusal *told = &l->told[l->refused];

        told->line = line;
        (void)snprintf(told->reason, sizeof told->reason, "%.*s", LOG_REASON_MAX - 1, cause.message);
    }
    l->refused++;
    return BC_OK;
}
