/* SPDX-License-Identifier: MIT */
/* switch_indices.c - the indices of a switch with limits, range and verdict. */
#include "bluecone/dutton.h"
#include "cli/switch_report.h"

#include <stdio.h>
#include <string.h>

void switch_limit_text(const bc_index_limits *l, char *text, size_t size)
{
    if (l->has_min && l->has_max)
        (void)snprintf(text, size, "%.5g..%.5g", l->min, l->max);
    else if (l->has_min)
        (void)snprintf(text, size, ">= %.5g", l->min);
    else if (l->has_max)
        (void)snprintf(text, size, "<= %.5g", l->max);
    else
        (void)snprintf(text, size, "-");
}

static const char *range_text(const bc_index *i)
{
    if (!i->has_value)
        return "-";
    return i->in_range ? "yes" : "NO";
}

static bool has_limit(const bc_index *i)
{
    return i->preferable.has_min || i->preferable.has_max || i->acceptable.has_min || i->acceptable.has_max;
}

static void add_index(report *r, size_t table, const bc_index_row *row, const bc_index *i)
{
    char preferable[48];
    char acceptable[48];

    switch_limit_text(&i->preferable, preferable, sizeof preferable);
    switch_limit_text(&i->acceptable, acceptable, sizeof acceptable);
    report_add_text(r, table, row->id);
    if (i->has_value)
        report_add_number(r, table, i->value, row->digits);
    else
        report_add_text(r, table, "-");
    report_add_text(r, table, preferable);
    report_add_text(r, table, acceptable);
    report_add_text(r, table, range_text(i));
    report_add_text(r, table, i->in_range && !has_limit(i) ? "no limits" : bc_verdict_text(i->verdict));
}

static void add_indices(report *r, const switch_case *c)
{
    static const char *const COLUMNS[][2] = {{"index", "index"},       {"value", "value"}, {"preferable", "preferable"},
                                             {"acceptable", "acceptable"}, {"range", "in range"}, {"verdict", "verdict"}};
    const size_t table = report_add_table(r, "indices", "Interchangeability of the new gas, burners set on the old one");

    for (size_t i = 0; i < BC_COUNT(COLUMNS); i++)
        report_add_column(r, table, COLUMNS[i][0], COLUMNS[i][1], "");
    for (size_t i = 0; i < bc_index_count(); i++)
        add_index(r, table, bc_index_at(i), &c->result.indices[i]);
}

/* The formula and limits of an index, and how far each is to be trusted. */
static void add_trust(report *r)
{
    static const char *const COLUMNS[] = {"index", "holds for", "trust", "source", "limits from"};
    const size_t table = report_add_table(r, "trust", "Working: what the indices hold for, and how far they are trusted");

    for (size_t i = 0; i < BC_COUNT(COLUMNS); i++)
        report_add_column(r, table, COLUMNS[i], COLUMNS[i], "");
    for (size_t i = 0; i < bc_index_count(); i++) {
        const bc_index_row *row = bc_index_at(i);

        report_add_text(r, table, row->id);
        report_add_text(r, table, row->range);
        report_add_text(r, table, row->trust);
        report_add_text(r, table, row->source);
        report_add_text(r, table, row->limits_source);
    }
}

static void add_side(report *r, size_t table, bool has, double value)
{
    if (has)
        report_add_number(r, table, value, -1);
    else
        report_add_text(r, table, "-");
}

/* What the law of Great Britain asks of network gas, for comparison. */
static void add_gb_limits(report *r)
{
    static const char *const COLUMNS[] = {"quantity", "unit", "min", "max", "supply", "valid", "source"};
    const size_t table = report_add_table(r, "gb-limits", "Working: limits of Great Britain for network gas");

    for (size_t i = 0; i < BC_COUNT(COLUMNS); i++)
        report_add_column(r, table, COLUMNS[i], COLUMNS[i], "");
    for (size_t i = 0; i < bc_gb_limit_count(); i++) {
        const bc_gb_limit *l = bc_gb_limit_at(i);

        report_add_text(r, table, l->quantity);
        report_add_text(r, table, l->unit);
        add_side(r, table, l->has_min, l->min);
        add_side(r, table, l->has_max, l->max);
        report_add_text(r, table, l->supply);
        report_add_text(r, table, l->valid);
        report_add_text(r, table, l->source);
    }
}

static bool is_blind(const bc_index *i)
{
    return !i->in_range && i->reason[0] != '\0';
}

static bool is_cautious(const bc_index *i)
{
    return i->in_range && i->verdict != BC_VERDICT_CANNOT_JUDGE && i->reason[0] != '\0';
}

/* Methods with the reason that they share, as a list of ids. */
static void names_with(const bc_index all[], const char *reason, bool (*asked)(const bc_index *), char *names, size_t size)
{
    names[0] = '\0';
    for (size_t i = 0; i < bc_index_count(); i++) {
        const size_t used = strlen(names);

        if (asked(&all[i]) && strcmp(all[i].reason, reason) == 0)
            (void)snprintf(names + used, size - used, "%s%s", used ? ", " : "", bc_index_at(i)->id);
    }
}

static bool was_told(const bc_index all[], size_t index, bool (*asked)(const bc_index *))
{
    for (size_t i = 0; i < index; i++)
        if (asked(&all[i]) && strcmp(all[i].reason, all[index].reason) == 0)
            return true;
    return false;
}

/* The same reason for several methods is told once. */
static void add_whys(report *r, const switch_case *c, const char *id, const char *title, bool (*asked)(const bc_index *))
{
    const bc_index *all = c->result.indices;
    size_t table = (size_t)-1;

    for (size_t i = 0; i < bc_index_count(); i++) {
        char names[400];

        if (!asked(&all[i]) || was_told(all, i, asked))
            continue;
        if (table == (size_t)-1) {
            table = report_add_table(r, id, title);
            report_add_column(r, table, "methods", "methods", "");
            report_add_column(r, table, "why", "why", "");
        }
        names_with(all, all[i].reason, asked, names, sizeof names);
        report_add_text(r, table, names);
        report_add_text(r, table, all[i].reason);
    }
}

void switch_indices(report *r, const switch_case *c)
{
    add_indices(r, c);
    add_whys(r, c, "out-of-range", "Methods that could not judge, and clear nothing", is_blind);
    add_whys(r, c, "remarks", "Methods that judged, with a remark", is_cautious);
    if (!c->a->value[OPTION_working])
        return;
    add_trust(r);
    add_gb_limits(r);
}
