/* SPDX-License-Identifier: MIT */
/* switch_verdict.c - reasons worst first, dangers and the verdict of a switch. */
#include "cli/switch_report.h"

#include "base/text.h"

#include <math.h>
#include <stdio.h>
#include <string.h>

#define REASONS_MAX 3 /* in the verdict; all stand in the table */

/* Adds to a text what fits. */
static void append(char *text, size_t size, const char *more)
{
    const size_t used = strlen(text);

    (void)snprintf(text + used, size - used, "%s", more);
}

void switch_remedy_text(const switch_case *c, char *text, size_t size)
{
    const bc_burner_remedy *m = &c->remedy;
    char air[64];

    if (!m->by_orifice)
        (void)snprintf(text, size, "set point of the gas flow x %.4f", m->gas);
    else if (m->has_pressure)
        (void)snprintf(text, size, "orifice area x %.4f (diameter x %.4f) or gas pressure x %.4f", m->area, m->diameter, m->pressure);
    else
        (void)snprintf(text, size, "orifice area x %.4f (diameter x %.4f)", m->area, m->diameter);
    (void)snprintf(air, sizeof air, ", then air flow x %.4f", m->air);
    append(text, size, air);
}

static void value_text(const bc_criterion *c, double value, char *text, size_t size)
{
    (void)snprintf(text, size, "%.*f%s%s", c->decimals, value, strcmp(c->unit, "1") == 0 ? "" : " ", strcmp(c->unit, "1") == 0 ? "" : c->unit);
}

static const char *fate_of(const bc_criterion *c)
{
    if (c->broken)
        return c->verdict == BC_VERDICT_NOT_ACCEPTABLE ? "broken" : "broken if adjusted";
    return c->verdict == BC_VERDICT_NOT_ACCEPTABLE ? "broken, adjustable" : bc_verdict_text(c->verdict);
}

static void add_reason(report *r, size_t table, const bc_criterion *c)
{
    char limits[48];
    char value[48];
    char adjusted[48] = "-";

    switch_limit_text(&c->acceptable, limits, sizeof limits);
    value_text(c, c->value, value, sizeof value);
    if (c->has_adjusted)
        value_text(c, c->adjusted, adjusted, sizeof adjusted);
    report_add_text(r, table, c->id);
    report_add_text(r, table, c->has_value ? value : "-");
    report_add_text(r, table, limits);
    report_add_text(r, table, adjusted);
    report_add_text(r, table, fate_of(c));
}

static void add_reasons(report *r, const switch_case *c)
{
    static const char *const COLUMNS[][2] = {{"criterion", "criterion"}, {"value", "value"}, {"acceptable", "acceptable"},
                                             {"adjusted", "if adjusted"}, {"verdict", "verdict"}};
    const size_t table = report_add_table(r, "reasons", "Criteria that count, worst first");

    for (size_t i = 0; i < BC_COUNT(COLUMNS); i++)
        report_add_column(r, table, COLUMNS[i][0], COLUMNS[i][1], "");
    for (size_t i = 0; i < c->result.count; i++) {
        const bc_criterion *k = &c->result.criteria[c->result.order[i]];

        if (k->counts && k->verdict != BC_VERDICT_CANNOT_JUDGE)
            add_reason(r, table, k);
    }
}

/* Every criterion for machines, those that do not count marked as such. */
static void add_limits(report *r, const switch_case *c)
{
    for (size_t i = 0; i < c->result.count; i++) {
        const bc_criterion *k = &c->result.criteria[i];
        char text[3][64];
        const report_limit limit = {.id = text[0], .unit = text[1], .verdict = text[2], .gas = NEW_GAS,
                                    .has_value = k->has_value, .has_min = k->acceptable.has_min, .has_max = k->acceptable.has_max,
                                    .value = k->value, .min = k->acceptable.min, .max = k->acceptable.max};

        (void)snprintf(text[0], sizeof text[0], "%s", k->id);
        (void)snprintf(text[1], sizeof text[1], "%s", k->unit);
        (void)snprintf(text[2], sizeof text[2], "%s", k->counts ? fate_of(k) : "does not count");
        report_add_limit(r, &limit);
    }
}

/* A flame speed out of its limits lifts on one side and flashes back on the other. */
static bool breaks(const bc_criterion *c, bc_danger danger)
{
    const unsigned both = 1U << BC_DANGER_LIFT | 1U << BC_DANGER_FLASHBACK;

    if (c->verdict != BC_VERDICT_NOT_ACCEPTABLE)
        return c->broken;
    if ((c->dangers & both) != both)
        return true;
    return danger == BC_DANGER_LIFT ? c->acceptable.has_min && c->value < c->acceptable.min : c->acceptable.has_max && c->value > c->acceptable.max;
}

static bool judges(const bc_criterion *c, bc_danger danger)
{
    return c->counts && c->verdict != BC_VERDICT_CANNOT_JUDGE && (c->dangers >> (unsigned)danger & 1U) != 0;
}

/* The id of a check: the danger in words, with a hyphen for each blank. */
static void danger_id(bc_danger danger, char *id, size_t size)
{
    (void)snprintf(id, size, "%s", bc_danger_text(danger));
    for (char *p = id; *p != '\0'; p++)
        if (*p == ' ')
            *p = '-';
}

/* A danger with the methods that judged it. */
static void add_danger(report *r, const bc_switch *s, bc_danger danger)
{
    char detail[400];
    char id[BC_WORD_MAX];
    bool ok = s->covered[danger] || s->same_gas;
    size_t judges_told = 0;

    (void)snprintf(detail, sizeof detail, "%s: ", bc_danger_text(danger));
    for (size_t i = 0; i < s->count; i++) {
        const bc_criterion *c = &s->criteria[s->order[i]];

        if (!judges(c, danger))
            continue;
        ok = ok && !breaks(c, danger);
        append(detail, sizeof detail, judges_told++ ? ", " : "judged by ");
        append(detail, sizeof detail, c->id);
    }
    if (judges_told == 0)
        append(detail, sizeof detail, s->same_gas ? "the gas is the one that the burner is set on" : "no method could judge it");
    danger_id(danger, id, sizeof id);
    report_add_check(r, id, ok, detail);
}

static void add_dangers(report *r, const switch_case *c)
{
    const bc_burner_type type = c->has_burner ? c->burner.type : BC_BURNER_TYPES;

    for (int d = 0; d < (int)BC_DANGERS; d++)
        if (bc_danger_matters((bc_danger)d, type) || c->result.covered[d])
            add_danger(r, &c->result, (bc_danger)d);
}

static void reason_phrase(const bc_criterion *c, char *text, size_t size)
{
    char value[48];
    char limits[48];

    value_text(c, c->verdict == BC_VERDICT_NOT_ACCEPTABLE ? c->value : c->adjusted, value, sizeof value);
    switch_limit_text(&c->acceptable, limits, sizeof limits);
    (void)snprintf(text, size, "%s %s, acceptable %s%s", c->id, value, limits, c->verdict == BC_VERDICT_NOT_ACCEPTABLE ? "" : " (once adjusted)");
}

static size_t add_broken(const bc_switch *s, char *text, size_t size)
{
    size_t told = 0;

    for (size_t i = 0; i < s->count && told < REASONS_MAX; i++) {
        const bc_criterion *k = &s->criteria[s->order[i]];
        char phrase[200];

        if (!k->broken)
            continue;
        reason_phrase(k, phrase, sizeof phrase);
        append(text, size, told++ ? "; " : ": ");
        append(text, size, phrase);
    }
    return told;
}

/* The worst reasons of a no: broken limits, then dangers that nobody judged. */
static void add_no(const switch_case *c, char *text, size_t size)
{
    const bc_switch *s = &c->result;
    const bc_burner_type type = c->has_burner ? c->burner.type : BC_BURNER_TYPES;
    size_t told = add_broken(s, text, size);
    size_t open = 0;

    for (int d = 0; d < (int)BC_DANGERS && !s->same_gas; d++) {
        if (!bc_danger_matters((bc_danger)d, type) || s->covered[d])
            continue;
        if (open++ == 0)
            append(text, size, told++ ? "; no method could judge " : ": no method could judge ");
        else
            append(text, size, ", ");
        append(text, size, bc_danger_text((bc_danger)d));
    }
}

static void add_cautions(const bc_switch *s, char *text, size_t size)
{
    size_t told = 0;

    for (size_t i = 0; i < s->count; i++) {
        const bc_criterion *k = &s->criteria[s->order[i]];

        if (!k->counts || k->verdict != BC_VERDICT_CAUTION || k->broken)
            continue;
        append(text, size, told++ ? ", " : "; caution: ");
        append(text, size, k->id);
    }
}

/* A burner that takes the gas without a remark is a yes. */
static report_judgement judgement_of(const switch_case *c, bool with_cautions)
{
    if (c->result.verdict == BC_SWITCH_NO)
        return REPORT_NO;
    return c->result.verdict == BC_SWITCH_TAKES && !with_cautions ? REPORT_YES : REPORT_CARE;
}

static void set_verdict(report *r, const switch_case *c)
{
    char text[900];
    char remedy[200];

    (void)snprintf(text, sizeof text, "%s", bc_switch_text(c->result.verdict));
    switch_remedy_text(c, remedy, sizeof remedy);
    if (c->result.verdict == BC_SWITCH_NO)
        add_no(c, text, sizeof text);
    if (c->result.verdict == BC_SWITCH_AFTER_ADJUSTMENT) {
        append(text, sizeof text, ": ");
        append(text, sizeof text, remedy);
    }
    const size_t used = strlen(text);
    const bool same_gas = c->result.same_gas && c->result.verdict == BC_SWITCH_TAKES;

    if (same_gas)
        append(text, sizeof text, ": it is the gas that the burner is set on");
    else
        add_cautions(&c->result, text, sizeof text);
    report_set_verdict(r, text);
    report_judge(r, judgement_of(c, !same_gas && strlen(text) > used));
}

void switch_conclude(report *r, const switch_case *c)
{
    add_reasons(r, c);
    add_limits(r, c);
    add_dangers(r, c);
    switch_warnings(r, c);
    set_verdict(r, c);
    report_set_caution(r, "Changing the gas or the setting of a burner is work for licensed people under the local code: carbon monoxide, "
                          "flashback and explosion can kill.");
}
