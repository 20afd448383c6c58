/* SPDX-License-Identifier: MIT */
/* contract_burner_limits.c - do all gases that a contract allows keep the limits of a burner? */
#include "cli/contract_burner.h"

#include <math.h>
#include <stdio.h>
#include <string.h>

static void append(char *text, size_t size, const char *more)
{
    const size_t used = strlen(text);

    (void)snprintf(text + used, size - used, "%s", more);
}

static void add_bound(report *r, size_t table, bool stated, double value)
{
    if (stated)
        report_add_number(r, table, value, -1);
    else
        report_add_text(r, table, "-");
}

bool burner_beyond(double value, double bound, double sign)
{
    return sign * (value - bound) > BC_WORST_EXACT * fabs(bound);
}

bool burner_has_limit(const burner_row *row)
{
    return row->limit.has_min || row->limit.has_max;
}

bc_extremes burner_shown(const burner_row *row, const bc_extremes *e)
{
    bc_extremes s = *e;

    s.min.value = e->min.value * row->factor - row->offset;
    s.max.value = e->max.value * row->factor - row->offset;
    return s;
}

/* How far a side is broken, in the unit that it is shown in. */
typedef struct {
    const char *of, *where;
    double by, bound;
} breach;

static void add_breach(const burner_row *row, const breach *b, burner_tally *t)
{
    const char *unit = strcmp(row->unit, "1") == 0 ? "" : row->unit;
    char text[200];

    (void)snprintf(text, sizeof text, "%s%s is %.3g%s%s %s its %s of %.6g", t->broken++ > 0 ? ", " : ": ", row->id, b->by, unit[0] ? " " : "", unit, b->where, b->of,
                   b->bound);
    append(t->breaches, sizeof t->breaches, text);
}

static void judge(const burner_row *row, const bc_extremes *e, burner_tally *t, char *verdict, size_t size)
{
    const bc_burner_limit *l = &row->limit;
    const bool low = l->has_min && burner_beyond(e->min.value, l->min, -1.0);
    const bool high = l->has_max && burner_beyond(e->max.value, l->max, 1.0);
    const bool proven = (!l->has_min || e->min.exact) && (!l->has_max || e->max.exact);
    const breach below = {"minimum", "below", (l->min - e->min.value) * row->factor, l->min * row->factor - row->offset};
    const breach above = {"maximum", "above", (e->max.value - l->max) * row->factor, l->max * row->factor - row->offset};

    if (low)
        add_breach(row, &below, t);
    if (high)
        add_breach(row, &above, t);
    if (low && high)
        (void)snprintf(verdict, size, "broken: %.3g below, %.3g above", below.by, above.by);
    else if (low || high)
        (void)snprintf(verdict, size, "broken: %.3g %s", low ? below.by : above.by, low ? "below" : "above");
    else
        (void)snprintf(verdict, size, "%s", proven ? "kept by every allowed gas" : "kept by all gases that were found");
    t->searched += !low && !high && !proven;
}

static void add_limit(report *r, size_t table, const burner_row *row, const char *verdict)
{
    const bc_burner_limit *l = &row->limit;

    report_add_text(r, table, row->id);
    report_add_text(r, table, strcmp(row->unit, "1") == 0 ? "" : row->unit);
    add_bound(r, table, l->has_min, l->min * row->factor - row->offset);
    add_bound(r, table, l->has_max, l->max * row->factor - row->offset);
    report_add_text(r, table, verdict);
}

void burner_judge(report *r, size_t table, const burner_row *row, const bc_extremes *e, burner_tally *t)
{
    char verdict[120] = "not judged: some allowed gas has no such figure";

    if (e) {
        judge(row, e, t, verdict, sizeof verdict);
    } else {
        append(t->open, sizeof t->open, t->not_judged++ > 0 ? ", " : "; not judged: ");
        append(t->open, sizeof t->open, row->id);
    }
    add_limit(r, table, row, verdict);
}

size_t burner_limits_table(report *r, const contract_case *c)
{
    static const char *const COLUMNS[][2] = {{"figure", "figure"}, {"unit", "unit"}, {"min", "min"}, {"max", "max"}, {"verdict", "verdict"}};
    char title[300];

    (void)snprintf(title, sizeof title, "Limits of the burner, from its file or by default: %.80s, control %.30s, set on %.80s",
                   c->burner.name, bc_control_word(c->burner.control), c->gases.each[c->judged].loaded.name);
    const size_t table = report_add_table(r, "burner-limits", title);

    for (size_t i = 0; i < BC_COUNT(COLUMNS); i++)
        report_add_column(r, table, COLUMNS[i][0], COLUMNS[i][1], "");
    return table;
}

/* What could not be judged is not kept, as with the limits of a contract. */
static void describe(const burner_tally *t, char *text, size_t size)
{
    if (t->broken > 0)
        append(text, size, "NOT every gas that the contract allows keeps the limits of the burner");
    else if (t->not_judged > 0)
        append(text, size, "NOT every gas that the contract allows is known to keep the limits of the burner");
    else
        append(text, size, "every gas that the contract allows keeps the limits of the burner");
    append(text, size, t->breaches);
    append(text, size, t->open);
    if (t->broken + t->not_judged == 0 && t->searched > 0)
        append(text, size, ", as far as was searched");
    append(text, size, ".");
}

void burner_conclude(report *r, const burner_tally *t, bool *good)
{
    const bool kept = t->broken + t->not_judged == 0;
    const report_judgement own = !kept ? REPORT_NO : t->searched > 0 ? REPORT_CARE : REPORT_YES;
    const report_judgement before = r->verdict ? r->judgement : REPORT_YES;
    char text[7000] = "";

    if (r->verdict)
        (void)snprintf(text, sizeof text, "%.6000s The burner: ", r->verdict);
    describe(t, text, sizeof text);
    report_set_verdict(r, text);
    report_judge(r, own > before ? own : before); /* from good to bad, as they are declared */
    *good = *good && kept;
}
