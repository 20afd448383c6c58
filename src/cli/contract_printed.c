/* SPDX-License-Identifier: MIT */
/* contract_printed.c - which reference state explains the figures printed with a gas. */
#include "cli/contract_report.h"

#include "base/error_internal.h"
#include "base/text.h"

#include <math.h>
#include <stdio.h>
#include <string.h>

/* "hhv=41.2MJ/m3,wobbe-gross=50.7MJ/m3" */
static bc_status take_list(const char *list, bc_printed *p, bc_error *err)
{
    bc_status status = BC_OK;

    while (status == BC_OK && *list != '\0') {
        const size_t length = strcspn(list, ",");
        const char *equals = memchr(list, '=', length);
        char id[BC_WORD_MAX];
        char text[BC_PRINTED_BYTES];

        if (!equals || !bc_text_copy(id, sizeof id, list, (size_t)(equals - list))
            || !bc_text_copy(text, sizeof text, equals + 1, length - (size_t)(equals - list) - 1))
            return bc_fail(err, BC_ERR_USAGE, "--printed: write figures as hhv=41.21MJ/m3,relative-density=0.609, with decimal points");
        status = bc_printed_add(p, id, text, err);
        list += length + (list[length] == ',');
    }
    if (status == BC_ERR_INPUT && err)
        err->status = BC_ERR_USAGE;
    return status == BC_ERR_INPUT ? BC_ERR_USAGE : status;
}

static bc_status take_lines(const bc_composition *c, bc_printed *p, bc_error *err)
{
    for (size_t i = 0; i < c->printed_count; i++) {
        if (bc_printed_add(p, c->printed[i].id, c->printed[i].text, err) == BC_OK)
            continue;
        if (err) {
            err->status = BC_ERR_INPUT;
            err->line = c->printed[i].line;
            (void)snprintf(err->file, sizeof err->file, "%s", c->path);
        }
        return BC_ERR_INPUT;
    }
    return BC_OK;
}

static void describe(const bc_fit *f, char *text, size_t size)
{
    char state[64];

    state_text(&f->state, state, sizeof state);
    (void)snprintf(text, size, "%s, %d%s%s", state, f->state.edition, f->ideal ? ", ideal gas" : "", f->exchanged ? ", gross and net exchanged" : "");
}

/* One decimal more than the figure was printed with. */
static int decimals_of(const bc_printed_figure *f)
{
    const double decimals = 1.0 - log10(2.0 * f->half);

    return decimals > 0.0 ? (int)(decimals + 0.5) : 0;
}

static void add_rows(report *r, const bc_printed *p, const bc_fits *fits, const char *gas)
{
    static const char *const CLASSES[] = {"within digits", "within uncertainty", "no"};
    char title[BC_NAME_MAX + 100];

    (void)snprintf(title, sizeof title, "Which state fits the printed figures of %.120s: computed less printed", gas);
    const size_t table = report_add_table(r, "printed", title);

    report_add_column(r, table, "state", "state", "");
    report_add_column(r, table, "explains", "explains", "");
    for (size_t i = 0; i < p->count; i++) {
        const char *id = bc_quantity_at(p->figures[i].quantity)->id;
        const char *unit = strcmp(p->figures[i].unit, "1") == 0 ? "" : p->figures[i].unit;

        report_add_column(r, table, id, id, unit);
    }
    report_add_column(r, table, "worst", "worst, halves of last digit", "");
    for (size_t k = 0; k < fits->count; k++) {
        char text[140];

        describe(&fits->best[k], text, sizeof text);
        report_add_text(r, table, text);
        report_add_text(r, table, CLASSES[fits->best[k].fit]);
        for (size_t i = 0; i < p->count; i++)
            report_add_number(r, table, fits->best[k].residual[i], decimals_of(&p->figures[i]));
        report_add_number(r, table, fits->best[k].worst, 1);
    }
}

/* The first unit that names another metering temperature than the state that explains the figures; NULL for none. */
static const char *misprinted(const bc_printed *p, const bc_fit *fit)
{
    for (size_t i = 0; i < p->count; i++)
        if (p->figures[i].shown.has_metering && fabs(p->figures[i].shown.metering_c - fit->state.metering_c) > 0.01)
            return p->figures[i].unit;
    return NULL;
}

static void conclude(report *r, const bc_printed *p, const bc_fits *fits, const char *gas)
{
    const bc_fit *first = &fits->best[0];
    const char *unit = first->fit != BC_FIT_NONE ? misprinted(p, first) : NULL;
    char text[600];
    char state[140];
    char others[100] = "and no other state";

    describe(first, state, sizeof state);
    if (fits->explain > 1)
        (void)snprintf(others, sizeof others, "but %zu other state%s as well: more figures or digits would tell", fits->explain - 1,
                       fits->explain > 2 ? "s" : "");
    if (first->fit == BC_FIT_NONE)
        (void)snprintf(text, sizeof text, "%.100s: no state explains all printed figures; the nearest, %s, misses one by %.3g halves of its last digit",
                       gas, state, first->worst);
    else if (first->fit == BC_FIT_UNCERTAINTY)
        (void)snprintf(text, sizeof text, "%.100s: the printed figures fit %s within the uncertainty of the analysis, %s", gas, state, others);
    else
        (void)snprintf(text, sizeof text, "%.100s: the printed figures fit %s within their digits, %s", gas, state, others);
    const size_t used = strlen(text);

    if (unit)
        (void)snprintf(text + used, sizeof text - used, "; the unit %.40s printed over it counts gas metered at another temperature", unit);
    report_add_check(r, "printed-state", first->fit != BC_FIT_NONE, text);
}

/* A page may change its basis from line to line: where no state explains all figures, one is named for each alone. */
static bc_status add_each(report *r, const bc_printed *p, const loaded_gas *gas, bc_error *err)
{
    char title[BC_NAME_MAX + 60];

    (void)snprintf(title, sizeof title, "Each printed figure of %.120s alone", gas->name);
    const size_t table = report_add_table(r, "printed-alone", title);

    report_add_column(r, table, "figure", "figure", "");
    report_add_column(r, table, "state", "plainest state that explains it", "");
    report_add_column(r, table, "states", "states that do", "");
    for (size_t i = 0; i < p->count; i++) {
        const bc_printed one = {.count = 1, .figures = {p->figures[i]}};
        bc_fits fits;
        char text[140] = "none";
        const bc_status status = bc_printed_fit(&one, &gas->gas, gas->scattered ? &gas->composition.spread : NULL, &fits, err);

        if (status != BC_OK)
            return status;
        if (fits.best[0].fit != BC_FIT_NONE)
            describe(&fits.best[0], text, sizeof text);
        report_add_text(r, table, bc_quantity_at(p->figures[i].quantity)->id);
        report_add_text(r, table, text);
        report_add_number(r, table, (double)fits.explain, 0);
    }
    return BC_OK;
}

static bc_status fit_gas(report *r, const contract_case *c, const loaded_gas *gas, bc_error *err)
{
    const char *list = c->a->value[OPTION_printed];
    bc_printed p = {.count = 0};
    bc_fits fits;
    bc_status status = list ? take_list(list, &p, err) : take_lines(&gas->composition, &p, err);

    if (status != BC_OK || (p.count == 0 && !list))
        return status;
    status = bc_printed_fit(&p, &gas->gas, gas->scattered ? &gas->composition.spread : NULL, &fits, err);
    if (status != BC_OK)
        return status;
    add_rows(r, &p, &fits, gas->name);
    conclude(r, &p, &fits, gas->name);
    return fits.best[0].fit == BC_FIT_NONE && p.count > 1 ? add_each(r, &p, gas, err) : BC_OK;
}

bc_status contract_printed(report *r, const contract_case *c, bc_error *err)
{
    bc_status status = BC_OK;

    for (size_t i = 0; i < c->judged && status == BC_OK; i++)
        status = fit_gas(r, c, &c->gases.each[i].loaded, err);
    return status;
}
