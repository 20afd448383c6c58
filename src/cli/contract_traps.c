/* SPDX-License-Identifier: MIT */
/* contract_traps.c - how far figures and verdicts would move under the usual confusions. */
#include "cli/contract_report.h"

#include "base/error_internal.h"

#include <math.h>
#include <stdio.h>
#include <stdlib.h>
#include <string.h>

#define TRAPS_MAX 40
#define MOVE_TOLD 1e-6 /* relative: a smaller move is none */

/* What a trap makes of one limit. */
typedef struct {
    bool there; /* the limit has a figure, as it is and in the trap */
    double was, value;
} move;

/* All traps of one gas. */
typedef struct {
    move each[TRAPS_MAX][BC_LIMIT_MAX];
    bool applies[TRAPS_MAX];
    bool moved[BC_LIMIT_MAX];
} moves;

static bool is_moved(const move *m)
{
    return m->there && fabs(m->value - m->was) > MOVE_TOLD * fmax(fabs(m->was), fabs(m->value));
}

static void work_out(const contract_case *c, const subject *gas, moves *m)
{
    const bc_trap_gas words = {&gas->loaded.composition, &gas->loaded.gas};

    memset(m, 0, sizeof *m);
    for (size_t i = 0; i < c->contract->limit_count; i++) {
        double was = 0.0;
        const bool there = bc_limit_value(c->contract, i, &gas->loaded.gas, &was, NULL) == BC_OK;

        for (size_t t = 0; there && t < bc_trap_count() && t < TRAPS_MAX; t++) {
            move *one = &m->each[t][i];
            bc_trapped trapped = {.applies = false};

            one->was = was;
            one->there = bc_trap_value(t, c->contract, i, &words, &trapped, NULL) == BC_OK && trapped.applies;
            one->value = trapped.value;
            m->applies[t] = m->applies[t] || is_moved(one);
            m->moved[i] = m->moved[i] || is_moved(one);
        }
    }
}

/* "wobbe-gross outside": the verdicts that would be others. */
static void changes(const contract_case *c, const move all[], char *text, size_t size)
{
    text[0] = '\0';
    for (size_t i = 0; i < c->contract->limit_count; i++) {
        const bc_limit *limit = &c->contract->limits[i];
        const double edge = -BC_LIMIT_ROUNDING * bc_limit_scale(limit);
        const bool was = bc_limit_margin(limit, all[i].was) >= edge;
        const bool now = bc_limit_margin(limit, all[i].value) >= edge;
        const size_t used = strlen(text);

        if (all[i].there && was != now)
            (void)snprintf(text + used, size - used, "%s%s %s", used > 0 ? ", " : "", limit->id, now ? "would seem kept" : "would seem broken");
    }
}

static void add_shift(report *r, size_t table, const move *m)
{
    if (!is_moved(m))
        report_add_text(r, table, "-");
    else if (m->was != 0.0)
        report_add_number(r, table, 100.0 * (m->value / m->was - 1.0), 2);
    else
        report_add_text(r, table, "from 0");
}

static void add_table(report *r, const contract_case *c, const subject *gas, const moves *m)
{
    char title[BC_NAME_MAX + 100];
    char text[600];

    (void)snprintf(title, sizeof title, "Confusions, and by how many per cent each would move the figures of %.120s", gas->loaded.name);
    const size_t table = report_add_table(r, "traps", title);

    report_add_column(r, table, "confusion", "confusion", "");
    report_add_column(r, table, "verdicts", "verdicts", "");
    for (size_t i = 0; i < c->contract->limit_count; i++)
        if (m->moved[i])
            report_add_column(r, table, c->contract->limits[i].id, c->contract->limits[i].id, "%");
    for (size_t t = 0; t < bc_trap_count() && t < TRAPS_MAX; t++) {
        if (!m->applies[t])
            continue;
        report_add_text(r, table, bc_trap_text(t));
        changes(c, m->each[t], text, sizeof text);
        report_add_text(r, table, text[0] ? text : "same");
        for (size_t i = 0; i < c->contract->limit_count; i++)
            if (m->moved[i])
                add_shift(r, table, &m->each[t][i]);
    }
}

bc_status contract_traps(report *r, const contract_case *c, bc_error *err)
{
    moves *m = malloc(sizeof *m);

    if (!m)
        return bc_fail(err, BC_ERR_MEMORY, "not enough memory for the confusions");
    for (size_t i = 0; i < c->judged; i++) {
        work_out(c, &c->gases.each[i], m);
        add_table(r, c, &c->gases.each[i], m);
    }
    free(m);
    return BC_OK;
}
