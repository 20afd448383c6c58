/* SPDX-License-Identifier: MIT */
/* burn_chart.c - a burner case swept over excess oxidant or flue gas temperature, as panels of a chart. */
#include "base/error_internal.h"
#include "base/text.h"
#include "cli/burn_report.h"

#include <stdio.h>
#include <string.h>

#define STEPS 120
#define STEPS_PER_ROW 12 /* of the table beside the curves */
#define PERCENT 100.0
#define T0_K 273.15

typedef enum { SWEEP_EXCESS = 1, SWEEP_FLUE_TEMPERATURE = 2 } sweep_kind;

/* What is swept, from where to where: per cent, or degrees Celsius. */
typedef struct {
    sweep_kind kind;
    double low, high;
} sweep;

/* One curve of a panel. A case that has no such figure leaves no point. */
typedef struct {
    const char *label;
    bool (*value)(const bc_burn *burn, double *value);
} curve;

typedef struct {
    const char *id, *title, *label, *unit;
    const curve *curves;
    size_t count;
    unsigned kinds; /* of sweeps in which the panel changes */
} panel;

#define CURVES_MAX 3

/* A panel of the chart with those of its curves that have come up so far. */
typedef struct {
    size_t chart;
    size_t series[CURVES_MAX];
    bool has[CURVES_MAX];
} open_panel;

static double dry_percent(const bc_burn *b, const char *id)
{
    size_t index = 0;

    return bc_species_find(id, &index, NULL) == BC_OK ? PERCENT * b->flue.dry.x[index] : 0.0;
}

static bool equilibrium_c(const bc_burn *b, double *value)
{
    *value = b->flame.t_k - T0_K;
    return true;
}

static bool complete_c(const bc_burn *b, double *value)
{
    *value = b->flame_complete_k - T0_K;
    return b->has_complete;
}

static bool water_dew_c(const bc_burn *b, double *value)
{
    *value = b->dew.t_k - T0_K;
    return !b->rich && b->dew.exists;
}

static bool acid_dew_c(const bc_burn *b, double *value)
{
    *value = b->acid.verhoff_banchero_k - T0_K;
    return !b->rich && b->has_acid;
}

static bool dry_oxygen(const bc_burn *b, double *value)
{
    *value = dry_percent(b, "oxygen");
    return !b->rich;
}

static bool dry_carbon_dioxide(const bc_burn *b, double *value)
{
    *value = dry_percent(b, "carbon-dioxide");
    return !b->rich && *value > 0.0;
}

static bool flame_monoxide(const bc_burn *b, double *value)
{
    for (size_t i = 0; i < bc_product_count(); i++)
        if (strcmp(bc_product_formula(i), "CO") == 0)
            *value = PERCENT * b->exit.moles[i] / b->exit.total_moles;
    return b->rich;
}

static bool efficiency_net(const bc_burn *b, double *value)
{
    *value = PERCENT * b->yield.efficiency_net;
    return !b->rich;
}

static bool efficiency_gross(const bc_burn *b, double *value)
{
    *value = PERCENT * b->yield.efficiency_gross;
    return !b->rich;
}

static bool condensate(const bc_burn *b, double *value)
{
    size_t water = 0;

    if (b->rich || bc_species_find("water", &water, NULL) != BC_OK)
        return false;
    *value = b->path.condensate_mol * bc_species_molar_mass_kg_per_mol(water) / b->flue.fuel_kg_per_mol;
    return true;
}

static const curve CONDENSATE[] = {{"water", condensate}};
static const curve FLAME[] = {{"equilibrium", equilibrium_c}, {"complete combustion", complete_c}};
static const curve DEW[] = {{"water", water_dew_c}, {"sulfuric acid", acid_dew_c}};
static const curve FLUE[] = {{"O2, dry", dry_oxygen}, {"CO2, dry", dry_carbon_dioxide}, {"CO, wet", flame_monoxide}};
static const curve EFFICIENCY[] = {{"on net heat", efficiency_net}, {"on gross heat", efficiency_gross}};

static const panel PANELS[] = {
    {"flame", "Adiabatic flame temperature", "temperature", "C", FLAME, BC_COUNT(FLAME), SWEEP_EXCESS},
    {"flue", "Flue gas", "fraction", "mol %", FLUE, BC_COUNT(FLUE), SWEEP_EXCESS},
    {"dew", "Dew points of the flue gas", "temperature", "C", DEW, BC_COUNT(DEW), SWEEP_EXCESS},
    {"efficiency", "Efficiency", "efficiency", "%", EFFICIENCY, BC_COUNT(EFFICIENCY), SWEEP_EXCESS | SWEEP_FLUE_TEMPERATURE},
    {"condensate", "Condensate per mass of fuel", "condensate", "kg/kg", CONDENSATE, BC_COUNT(CONDENSATE), SWEEP_FLUE_TEMPERATURE},
};

bool burn_wants_chart(const arguments *a)
{
    render_form form = RENDER_TEXT;

    if (a->value[OPTION_sweep])
        return true;
    return a->value[OPTION_output] && render_form_of(a->value[OPTION_output], &form) && render_form_shows_charts(form);
}

/* excess=0..50 or flue-temp=40..250 */
static bc_status take_sweep(const char *text, sweep *s, bc_error *err)
{
    const char *equals = text ? strchr(text, '=') : NULL;
    const char *rest = "";
    char word[32];

    *s = (sweep){SWEEP_EXCESS, 0.0, 50.0};
    if (!text)
        return BC_OK;
    if (!equals || !bc_text_copy(word, sizeof word, text, (size_t)(equals - text)))
        return bc_fail(err, BC_ERR_USAGE, "--sweep %.40s: write it as excess=0..50 or flue-temp=40..250", text);
    s->kind = bc_text_same(word, "flue-temp") ? SWEEP_FLUE_TEMPERATURE : SWEEP_EXCESS;
    if (s->kind == SWEEP_EXCESS && !bc_text_same(word, "excess"))
        return bc_fail(err, BC_ERR_USAGE, "--sweep: '%s' is neither excess nor flue-temp", word);
    const char *dots = strstr(equals, "..");
    char low[32];

    if (!dots || !bc_text_copy(low, sizeof low, equals + 1, (size_t)(dots - equals - 1)) || bc_number_parse(low, &s->low, NULL) != BC_OK
        || bc_number_prefix(dots + 2, &s->high, &rest, NULL) != BC_OK || *rest != '\0' || !(s->low < s->high))
        return bc_fail(err, BC_ERR_USAGE, "--sweep %.40s: write two ascending numbers, as excess=0..50", text);
    return BC_OK;
}

static void set_point(bc_burn_case *c, const sweep *s, double x)
{
    if (s->kind == SWEEP_EXCESS)
        c->lambda = 1.0 + x / PERCENT;
    else
        c->exit_k = x + T0_K;
}

static bool shows(const panel *p, const sweep *s)
{
    return (p->kinds & (unsigned)s->kind) != 0;
}

/* What depends on excess and flue gas temperature is told at which of the one it is swept over the other. */
static void title_of(const panel *p, const sweep *s, const bc_burn_case *c, char *title, size_t size)
{
    if ((p->kinds & SWEEP_FLUE_TEMPERATURE) == 0)
        (void)snprintf(title, size, "%s", p->title);
    else if (s->kind == SWEEP_EXCESS)
        (void)snprintf(title, size, "%s, flue gas leaves at %.6g C", p->title, c->exit_k - T0_K);
    else
        (void)snprintf(title, size, "%s, excess oxidant %.4g %%", p->title, PERCENT * (c->lambda - 1.0));
}

static void open_panels(report *r, const sweep *s, const bc_burn_case *c, open_panel open[])
{
    const bool excess = s->kind == SWEEP_EXCESS;
    char title[100];

    for (size_t i = 0; i < BC_COUNT(PANELS); i++) {
        if (!shows(&PANELS[i], s))
            continue;
        title_of(&PANELS[i], s, c, title, sizeof title);
        open[i].chart = report_add_chart(r, PANELS[i].id, title);
        report_set_axis(r, open[i].chart, REPORT_X, excess ? "excess oxidant" : "flue gas temperature", excess ? "%" : "C");
        report_set_axis(r, open[i].chart, REPORT_Y, PANELS[i].label, PANELS[i].unit);
    }
}

/* A curve enters the chart with its first point: one that never has any stays out of the legend. */
static void add_point(report *r, open_panel *open, size_t k, const char *label, const report_point *point)
{
    if (!open->has[k]) {
        open->series[k] = report_add_series(r, open->chart, REPORT_LINE, label);
        open->has[k] = true;
    }
    report_add_point(r, open->chart, open->series[k], point->x, point->y);
}

static void add_points(report *r, const sweep *s, open_panel open[], double x, const bc_burn *b)
{
    for (size_t i = 0; i < BC_COUNT(PANELS); i++)
        for (size_t k = 0; k < PANELS[i].count && shows(&PANELS[i], s); k++) {
            report_point point = {x, 0.0};

            if (PANELS[i].curves[k].value(b, &point.y))
                add_point(r, &open[i], k, PANELS[i].curves[k].label, &point);
        }
}

static size_t open_table(report *r, const sweep *s)
{
    const size_t table = report_add_table(r, "sweep", "Sweep");

    if (s->kind == SWEEP_EXCESS)
        report_add_column(r, table, "excess", "excess", "%");
    else
        report_add_column(r, table, "flue-temperature", "flue gas", "C");
    for (size_t i = 0; i < BC_COUNT(PANELS); i++)
        for (size_t k = 0; k < PANELS[i].count && shows(&PANELS[i], s); k++) {
            char id[64];

            (void)snprintf(id, sizeof id, "%s, %s", PANELS[i].id, PANELS[i].curves[k].label);
            report_add_column(r, table, id, id, PANELS[i].unit);
        }
    return table;
}

static void add_row(report *r, size_t table, const sweep *s, double x, const bc_burn *b)
{
    report_add_number(r, table, x, 1);
    for (size_t i = 0; i < BC_COUNT(PANELS); i++)
        for (size_t k = 0; k < PANELS[i].count && shows(&PANELS[i], s); k++) {
            double y = 0.0;

            if (PANELS[i].curves[k].value(b, &y))
                report_add_number(r, table, y, 2);
            else
                report_add_text(r, table, "-");
        }
}

/* Vertical lines: the case itself, and where condensation begins. */
static void add_marks(report *r, const burn_case_result *c, const sweep *s, const open_panel open[])
{
    const bool excess = s->kind == SWEEP_EXCESS;
    const double here = excess ? PERCENT * (c->setup.physics.lambda - 1.0) : c->setup.physics.exit_k - T0_K;
    const double dew = c->burn.dew.t_k - T0_K;

    for (size_t i = 0; i < BC_COUNT(PANELS); i++) {
        if (!shows(&PANELS[i], s))
            continue;
        if (here > s->low && here < s->high)
            report_add_mark(r, open[i].chart, REPORT_MARK_X, here, 0.0, "case");
        if (!excess && c->burn.dew.exists && dew > s->low && dew < s->high)
            report_add_mark(r, open[i].chart, REPORT_MARK_X, dew, 0.0, "water dew point");
    }
}

static bc_status burn_at(bc_burn_case *swept, const sweep *s, double x, bc_burn *b, bc_error *err)
{
    set_point(swept, s, x);
    return bc_burn_of(swept, b, err);
}

/* The efficiency has a corner where condensation begins, which steps would cut off. */
static bool has_corner(const burn_case_result *c, const sweep *s, double before, double x)
{
    const double dew = c->burn.dew.t_k - T0_K;

    return s->kind == SWEEP_FLUE_TEMPERATURE && c->burn.dew.exists && dew > before && dew < x;
}

bc_status burn_chart(report *r, const arguments *a, const burn_case_result *c, bc_error *err)
{
    bc_burn_case swept = c->setup.physics;
    open_panel open[BC_COUNT(PANELS)];
    bc_burn b;
    sweep s;
    bc_status status = take_sweep(a->value[OPTION_sweep], &s, err);

    if (status != BC_OK)
        return status;
    memset(open, 0, sizeof open);
    open_panels(r, &s, &c->setup.physics, open);
    const size_t table = open_table(r, &s);

    for (size_t i = 0; i <= STEPS; i++) {
        const double x = s.low + (s.high - s.low) * (double)i / STEPS;

        if (i > 0 && has_corner(c, &s, x - (s.high - s.low) / STEPS, x)) {
            status = burn_at(&swept, &s, c->burn.dew.t_k - T0_K, &b, err);
            if (status == BC_OK)
                add_points(r, &s, open, c->burn.dew.t_k - T0_K, &b);
        }
        if (status == BC_OK)
            status = burn_at(&swept, &s, x, &b, err);
        if (status != BC_OK)
            return status;
        add_points(r, &s, open, x, &b);
        if (i % STEPS_PER_ROW == 0)
            add_row(r, table, &s, x, &b);
    }
    add_marks(r, c, &s, open);
    return BC_OK;
}
