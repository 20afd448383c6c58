/* SPDX-License-Identifier: MIT */
/* sheet.c - the full sheet of one gas, or of several side by side. */
#include "base/error_internal.h"
#include "cli/sheet.h"
#include "cli/subjects.h"
#include "cli/working.h"

#include <math.h>
#include <stdio.h>
#include <string.h>

#define GAP_WARNED_PERCENT 0.2  /* agreed limit of the two heating-value routes */
#define SHORTFALL_TOLD 0.0005   /* a missing share below it is rounding */

/* Sections of a sheet: the group of the quantities in it, and its title. */
static const struct {
    const char *group, *title;
} SECTIONS[] = {
    {"volume", "Heat per volume of real gas"}, {"density", "Density"}, {"mass", "Heat per mass"},
    {"mole", "Molar figures"},                 {"ideal", "Ideal gas"},
    {"air", "Combustion with the dry air that just suffices"}, {"flame", "Flame and flue gas, same air, all at 25 C and 101.325 kPa"},
    {"co2", "Carbon dioxide"}, {"interchange", "Burner indices of the gas alone (switch compares two gases)"}, {"safety", "In air at 25 C and 101.325 kPa (estimates)"}, {"check", "Second route"},
};

/* A figure that a gas does not have (a gap of an inert gas) leaves no row. */
static bc_status add_quantity(report *r, size_t section, const subjects *s, size_t quantity, const arguments *a, bc_error *err)
{
    for (size_t i = 0; i < s->count; i++) {
        const slot where = {r, section, i};
        const bc_status status = report_quantity(&where, quantity, &s->each[i].subject, a, err);

        if (status != BC_OK && status != BC_ERR_RANGE)
            return status;
    }
    return BC_OK;
}

bc_status sheet_sections(report *r, const subjects *s, const arguments *a, bc_error *err)
{
    for (size_t k = 0; k < BC_COUNT(SECTIONS); k++) {
        const size_t section = report_add_section(r, SECTIONS[k].group, SECTIONS[k].title);

        for (size_t q = 0; q < bc_quantity_count(); q++) {
            if (strcmp(bc_quantity_at(q)->group, SECTIONS[k].group) != 0)
                continue;
            const bc_status status = add_quantity(r, section, s, q, a, err);

            if (status != BC_OK)
                return status;
        }
    }
    return BC_OK;
}

/* The components that make up the gap, those with at least a fifth of it. */
static void name_guilty(const bc_subject *s, double gap_percent, char *text, size_t size)
{
    double share[BC_SPECIES_CAPACITY];

    bc_gap_shares(s, share);
    text[0] = '\0';
    for (size_t i = 0; i < bc_species_count(); i++) {
        const size_t used = strlen(text);

        if (share[i] * 100.0 / gap_percent > 0.2 && used + 60 < size)
            (void)snprintf(text + used, size - used, "%s%s %+.3f %%", used ? ", " : "", bc_species_id(i), 100.0 * share[i]);
    }
}

static void check_gap(report *r, const subject *each)
{
    char detail[700];
    char guilty[200];
    bc_figure gap;
    size_t quantity = 0;

    if (bc_quantity_find("formation-gap", &quantity, NULL) != BC_OK
        || bc_quantity_evaluate(quantity, &each->subject, &gap, NULL) != BC_OK)
        return;
    const bool ok = fabs(gap.value) <= GAP_WARNED_PERCENT;

    (void)snprintf(detail, sizeof detail, "%.100s: the two heating-value routes differ by %+.4f %% (limit %.1f %%)", each->loaded.name,
                   gap.value, GAP_WARNED_PERCENT);
    report_add_check(r, "formation-gap", ok, detail);
    if (ok)
        return;
    name_guilty(&each->subject, gap.value, guilty, sizeof guilty);
    (void)snprintf(detail, sizeof detail, "%.80s: the formation balance and the tables differ by %+.3f %%, from %.180s.", each->loaded.name,
                   gap.value, guilty);
    report_add_warning(r, detail);
}

/* One candidate for what was not measured: how the figures would move. */
static bc_status add_shortfall_row(report *r, size_t table, const subjects *s, const subject *each, const char *candidate, bc_error *err)
{
    bc_gas completed;
    bc_subject with;
    size_t species = 0;
    bc_status status = bc_species_find(candidate, &species, err);

    if (status == BC_OK)
        status = bc_composition_completed(&each->loaded.composition, species, &completed, err);
    if (status == BC_OK)
        status = bc_subject_make(&s->reference, &completed, NULL, &with, err);
    if (status != BC_OK)
        return status;
    const bc_value *was = &each->subject.value;
    const bc_value *now = &with.value;

    report_add_text(r, table, candidate);
    report_add_number(r, table, 100.0 * (now->gross_j_per_m3 / was->gross_j_per_m3 - 1.0), 2);
    report_add_number(r, table, 100.0 * (now->wobbe_gross_j_per_m3 / was->wobbe_gross_j_per_m3 - 1.0), 2);
    report_add_number(r, table, 100.0 * (now->relative_density / was->relative_density - 1.0), 2);
    return BC_OK;
}

static bc_status add_shortfall(report *r, const subjects *s, const subject *each, bc_error *err)
{
    static const char *const CANDIDATES[] = {"hydrogen", "nitrogen", "carbon-dioxide", "n-hexane"};
    const double missing = 1.0 - each->loaded.composition.sum;
    char title[240];

    if (missing <= SHORTFALL_TOLD || each->air_free || each->subject.value.gross_j_per_m3 <= 0.0)
        return BC_OK;
    (void)snprintf(title, sizeof title, "What the missing %.3g %% would mean, %.120s", 100.0 * missing, each->loaded.name);
    const size_t table = report_add_table(r, "shortfall", title);

    report_add_column(r, table, "component", "if it was", "");
    report_add_column(r, table, "hhv", "HHV", "%");
    report_add_column(r, table, "wobbe-gross", "Wobbe gross", "%");
    report_add_column(r, table, "relative-density", "rel. density", "%");
    for (size_t i = 0; i < BC_COUNT(CANDIDATES); i++) {
        const bc_status status = add_shortfall_row(r, table, s, each, CANDIDATES[i], err);

        if (status != BC_OK)
            return status;
    }
    return BC_OK;
}

static void add_share(report *r, size_t table, double x)
{
    if (x > 0.0)
        report_add_number(r, table, 100.0 * x, 4);
    else
        report_add_text(r, table, "-");
}

void sheet_composition(report *r, const subjects *s)
{
    const size_t table = report_add_table(r, "composition", "Composition used");

    report_add_column(r, table, "component", "component", "");
    for (size_t i = 0; i < s->count; i++) {
        char id[40];

        (void)snprintf(id, sizeof id, "gas-%zu", i + 1);
        report_add_column(r, table, id, s->each[i].loaded.name, "mol %");
    }
    for (size_t j = 0; j < bc_species_count(); j++) {
        bool any = false;

        for (size_t i = 0; i < s->count; i++)
            any = any || s->each[i].subject.gas.x[j] > 0.0;
        if (!any)
            continue;
        report_add_text(r, table, bc_species_id(j));
        for (size_t i = 0; i < s->count; i++)
            add_share(r, table, s->each[i].subject.gas.x[j]);
    }
}

/* A row that is not there tells nobody that a method ends: the figures whose methods hold for some gases only. */
static void tell_left_out(report *r, const subject *each)
{
    bool wanted[QUANTITIES_MAX] = {false};
    double value[QUANTITIES_MAX];
    char text[700];
    const int named = snprintf(text, sizeof text, "%.100s: left out, since their methods do not hold for this gas: ", each->loaded.name);
    size_t used = (size_t)named;
    const size_t start = used;

    if (bc_quantity_count() > QUANTITIES_MAX)
        return;
    for (size_t q = 0; q < bc_quantity_count(); q++)
        wanted[q] = strcmp(bc_quantity_at(q)->group, "interchange") == 0 || strcmp(bc_quantity_at(q)->group, "safety") == 0;
    bc_quantity_values(wanted, &each->subject, value);
    for (size_t q = 0; q < bc_quantity_count(); q++)
        if (wanted[q] && isnan(value[q]) && used + 120 < sizeof text)
            used += (size_t)snprintf(text + used, sizeof text - used, "%s%s", used > start ? ", " : "", bc_quantity_at(q)->id);
    if (used == start)
        return;
    (void)snprintf(text + used, sizeof text - used, " (bluecone get ID GAS tells why).");
    report_add_warning(r, text);
}

static bc_status fill(report *r, const subjects *s, const arguments *a, bc_error *err)
{
    subjects_report(s, r);
    subjects_tell_uncertainty(s, r);
    bc_status status = sheet_sections(r, s, a, err);

    sheet_composition(r, s);
    for (size_t i = 0; i < s->count && status == BC_OK; i++) {
        check_gap(r, &s->each[i]);
        tell_left_out(r, &s->each[i]);
        status = add_shortfall(r, s, &s->each[i], err);
        if (a->value[OPTION_working])
            report_working(r, s->each[i].loaded.name, &s->each[i].subject);
    }
    report_set_caution(r, SHEET_CAUTION);
    return status;
}

int run_sheet(const arguments *a)
{
    size_t every[64];
    const size_t count = bc_quantity_count() < BC_COUNT(every) ? bc_quantity_count() : BC_COUNT(every);
    subjects s = {.count = 0};
    report r;
    bc_error err;

    for (size_t i = 0; i < count; i++)
        every[i] = i;
    report_open(&r, BC_VERSION, "sheet", "Gas sheet");
    bc_status status = subjects_open(&s, a, a->argument, a->argument_count, true, &err);

    if (status == BC_OK)
        status = units_check(a, &s.state, every, count, &err);
    if (status == BC_OK)
        status = fill(&r, &s, a, &err);
    subjects_close(&s);
    if (status == BC_OK)
        return answer(&r, a, false, 0);
    report_close(&r);
    return complain(&err);
}
