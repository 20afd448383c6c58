/* SPDX-License-Identifier: MIT */
/* contract_case.c - from the words of `contract` to limits, gases and coverage. */
#include "cli/contract_report.h"

#include "base/error_internal.h"
#include "bluecone/number.h"

#include <stdio.h>
#include <stdlib.h>
#include <string.h>

static bc_status take_coverage(contract_case *c, bc_error *err)
{
    const char *text = c->a->value[OPTION_coverage];
    double percent = 100.0 * BC_COVERAGE_DEFAULT;

    if (text && bc_number_parse(text, &percent, NULL) != BC_OK)
        return bc_fail(err, BC_ERR_USAGE, "--coverage %.20s: write per cent, as 95", text);
    c->coverage = percent / 100.0;
    if (bc_coverage_factor(c->coverage, &c->k, err) == BC_OK)
        return BC_OK;
    if (err)
        err->status = BC_ERR_USAGE;
    return BC_ERR_USAGE;
}

/* What the seller may deliver is a limit on the gas, too. */
static bc_status add_range(bc_contract *c, const bc_range *range, bc_error *err)
{
    const double low = 100.0 * range->min;
    const double high = 100.0 * range->max;
    const bool has_min = range->min > 0.0;
    const bool has_max = range->max < 1.0;

    if (!has_min && !has_max)
        return BC_OK;
    const bc_status status = bc_contract_add(c, range->id, "mol %", has_min ? &low : NULL, has_max ? &high : NULL, err);

    char id[BC_LIMIT_ID_MAX];

    (void)snprintf(id, sizeof id, "range %.50s", range->id);
    if (status == BC_OK)
        memcpy(c->limits[c->limit_count - 1].id, id, sizeof id);
    return status;
}

bc_status contract_bind_ranges(bc_contract *contract, bc_error *err)
{
    bc_status status = BC_OK;

    for (size_t i = 0; i < contract->range_count && status == BC_OK; i++)
        status = add_range(contract, &contract->ranges[i], err);
    return status;
}

static bc_status load_gases(contract_case *c, bc_error *err)
{
    const char *words[ARGUMENTS_MAX + 1];
    size_t count = 0;

    for (size_t i = 1; i < c->a->argument_count; i++)
        words[count++] = c->a->argument[i];
    c->judged = count;
    if (c->a->value[OPTION_against])
        words[count++] = c->a->value[OPTION_against];
    const bc_status status = subjects_open_at(&c->gases, &c->contract->state, c->a, words, count, err);

    if (status != BC_OK || count == c->judged)
        return status;
    c->has_present = true;
    c->contract->has_present = true;
    c->contract->present = c->gases.each[c->judged].loaded.gas;
    return BC_OK;
}

/* A log stands in the place of gases; what asks about single ones, or about none, has no meaning then. */
static bc_status check_log(const contract_case *c, bc_error *err)
{
    static const size_t OTHERS[] = {OPTION_air_free, OPTION_coverage, OPTION_traps, OPTION_worst, OPTION_printed, OPTION_burner};
    static const char *const WORDS[] = {"air-free", "coverage", "traps", "worst", "printed", "burner"};

    if (!c->a->value[OPTION_log])
        return BC_OK;
    for (size_t i = 0; i < BC_COUNT(OTHERS); i++)
        if (c->a->value[OTHERS[i]])
            return bc_fail(err, BC_ERR_USAGE, "--log and --%s exclude each other; ask one after the other", WORDS[i]);
    if (c->a->argument_count > 1)
        return bc_fail(err, BC_ERR_USAGE, "--log judges the gases of the log; name none behind the contract");
    return BC_OK;
}

/* Options that ask about gases need some. */
static bc_status check_question(const contract_case *c, bc_error *err)
{
    static const size_t ASKING[] = {OPTION_against, OPTION_traps, OPTION_printed};
    static const char *const WORDS[] = {"against", "traps", "printed"};

    for (size_t i = 0; i < BC_COUNT(ASKING); i++)
        if (c->a->value[ASKING[i]] && c->a->argument_count < 2 && !(ASKING[i] == OPTION_against && (c->a->value[OPTION_worst] || c->a->value[OPTION_log])))
            return bc_fail(err, BC_ERR_USAGE, "--%s is about a gas: name one behind the contract", WORDS[i]);
    if (c->a->value[OPTION_printed] && c->a->argument_count != 2)
        return bc_fail(err, BC_ERR_USAGE, "--printed belongs to one gas; write [printed] into the files of several");
    return contract_burner_check(c->a, err);
}

bc_status contract_open(contract_case *c, const arguments *a, bc_error *err)
{
    memset(c, 0, sizeof *c);
    c->a = a;
    bc_status status = check_log(c, err);

    if (status == BC_OK)
        status = check_question(c, err);
    if (status == BC_OK)
        status = take_coverage(c, err);
    if (status != BC_OK)
        return status;
    c->contract = malloc(sizeof *c->contract);
    if (!c->contract)
        return bc_fail(err, BC_ERR_MEMORY, "not enough memory for the contract");
    status = contract_load(a->argument[0], c->contract, err);
    c->own_limits = status == BC_OK ? c->contract->limit_count : 0;
    if (status == BC_OK)
        status = contract_bind_ranges(c->contract, err);
    if (status == BC_OK)
        status = load_gases(c, err);
    return status == BC_OK ? contract_burner_load(c, err) : status;
}

void contract_close(contract_case *c)
{
    subjects_close(&c->gases);
    free(c->contract);
    c->contract = NULL;
}
