/* SPDX-License-Identifier: MIT */
/* report.h - what a command has to say, free of any format.
 *
 * A command fills one report and hands it to one renderer; a renderer knows nothing of gases.
 * Every text is copied. An allocation that fails sets `failed` and drops the item: callers add
 * everything first and ask once, with report_ok(). */
#ifndef REPORT_H
#define REPORT_H

#include <stdbool.h>
#include <stddef.h>
#include <string.h>

#include "bluecone/status.h"

#define REPORT_NO_GAS ((size_t)-1)
#define REPORT_DIGITS 6 /* significant digits where nothing better is known */

/* One mole fraction of a gas. */
typedef struct {
    char *id;
    double x;
} report_fraction;

/* One gas of the report, as it was computed with. */
typedef struct {
    char *name;
    char *source;             /* file, bundled name or literal */
    char *role;               /* a word in small letters for it, as "old"; NULL: its letter stands for it */
    report_fraction *fractions;
    size_t fraction_count;
    double sum_before;        /* of the entries as written, as a fraction of one */
} report_gas;

/* A file that the report was made from. */
typedef struct {
    char *path;
    char *name, *sha256;      /* NULL: not identified, since the form does not show it */
} report_input;

/* The reference state of all results that do not name another one in their note. */
typedef struct {
    bool present;
    double combustion_c, metering_c, metering_kpa;
    bool saturated;
    int edition;              /* of ISO 6976 */
    char *text;               /* the same in one line, for people */
    char brief[64];           /* and as it is typed, "25/0" */
} report_state;

/* One figure. */
typedef struct {
    char *id, *label, *unit, *method, *note;
    size_t section;           /* index into sections */
    size_t gas;               /* index into gases, or REPORT_NO_GAS */
    double value;
    bool has_uncertainty;
    double uncertainty;       /* standard uncertainty, k = 1, same unit */
    int digits;               /* significant digits when no uncertainty decides */
} report_result;

typedef struct {
    char *id, *title;
} report_section;

/* A cell of a table: text, or a number with the decimals to print (-1: significant digits decide). The text "-" stands
 * for a figure that is not there. */
typedef struct {
    bool is_number;
    double number;
    int decimals;
    char *text;               /* NULL: empty cell */
} report_cell;

static inline bool report_is_none(const report_cell *cell)
{
    return !cell->is_number && cell->text != NULL && strcmp(cell->text, "-") == 0;
}

typedef struct {
    char *id, *heading, *unit;
} report_column;

/* What is no single figure: rows of cells under named columns. */
typedef struct {
    char *id, *title;
    report_column *columns;
    size_t column_count;
    report_cell *cells;       /* row by row */
    size_t cell_count;
    bool leads;               /* text: stands before the sections, since they rest on it */
} report_table;

typedef struct {
    char *id, *detail;
    bool ok;
} report_check;

/* How a gas stands to one limit. A bound, or the value, that is not there is no number. */
typedef struct {
    char *id, *unit;
    char *state;              /* the limit's own reference state in short; may be "" */
    char *verdict;            /* "inside", "outside", or why it cannot be judged */
    size_t gas;               /* index into gases, or REPORT_NO_GAS */
    bool has_value, has_min, has_max;
    double value, min, max;
    double margin;            /* to the nearer bound, negative outside; set by report_add_limit() */
    bool has_uncertainty;
    double uncertainty;       /* standard uncertainty, k = 1, same unit */
    bool has_percent;
    double percent;           /* margin in per cent of the window, or of the bound where there is one */
    bool has_probability;
    double probability;       /* that the limit is kept, 0..1 */
} report_limit;

typedef enum { REPORT_MIN, REPORT_MAX } report_end;

/* What a figure can be over all allowed compositions, and the ones that attain it. */
typedef struct {
    char *id, *unit;
    char *state;              /* reference state in short; may be "" */
    double min, max;
    bool min_exact, max_exact; /* proven; else the best that was found */
    report_fraction *at_min;  size_t at_min_count;
    report_fraction *at_max;  size_t at_max_count;
} report_worst;

typedef enum { REPORT_X, REPORT_Y } report_axis_id;

/* One axis of a chart; without names and time its values are plain numbers. */
typedef struct {
    char *label, *unit;       /* unit "": none */
    bool fixed;               /* from low to high; else the data decide */
    double low, high;
    bool is_time;             /* x only: seconds since 1970-01-01 00:00 of the data's own clock */
    char **names;             /* names[i] stands at the value i: categories, on y from above */
    size_t name_count;
} report_axis;

typedef enum {
    REPORT_LINE,   /* joined in the order of the points */
    REPORT_POINTS,
    REPORT_BARS,   /* from zero: along y, along x where the y axis has names; points ascending */
    REPORT_REGION, /* a filled polygon */
    REPORT_OUTLINE,/* a closed curve, such as an ellipse of uncertainty */
    REPORT_SPANS   /* each two points are the ends of a span: an uncertainty, a range */
} report_series_kind;

typedef struct {
    double x, y;
} report_point;

/* Series of a chart with the same label are one thing to the eye: one style, one entry of the
 * legend (a curve with a gap; a point and its ellipse). */
typedef struct {
    char *label;
    report_series_kind kind;
    report_point *points;
    size_t point_count;
} report_series;

typedef enum {
    REPORT_MARK_X,    /* a vertical line at x: a limit, a crossing */
    REPORT_MARK_Y,    /* a horizontal line at y */
    REPORT_MARK_POINT /* a point to look at */
} report_mark_kind;

typedef struct {
    char *label;
    report_mark_kind kind;
    double x, y;              /* of a line only one counts; the other is 0 */
} report_mark;

/* One panel. Panels that follow each other with the same x label and unit share their x axis. */
typedef struct {
    char *id, *title;
    report_axis x, y;
    report_series *series;    size_t series_count;
    report_mark *marks;       size_t mark_count;
} report_chart;

/* What a verdict comes to, for a colour and a word beside its text. */
typedef enum {
    REPORT_UNJUDGED, /* nobody said: a failed check is a no */
    REPORT_YES,
    REPORT_CARE,     /* neither: something to look at first */
    REPORT_NO
} report_judgement;

typedef struct {
    char *version, *command, *title;
    report_state state;
    report_gas *gases;          size_t gas_count;
    report_input *inputs;       size_t input_count;
    report_section *sections;   size_t section_count;
    report_result *results;     size_t result_count;
    report_table *tables;       size_t table_count;
    report_check *checks;       size_t check_count;
    report_limit *limits;       size_t limit_count;
    char *limits_title;       /* whose limits these are; NULL: for machines alone, people get another table */
    bool limits_lead;         /* text: they stand before the sections, since they are what was asked */
    report_worst *worst;        size_t worst_count;
    report_chart *charts;       size_t chart_count;
    char **warnings;            size_t warning_count;
    char *verdict;            /* NULL: nothing was asked that has a verdict */
    report_judgement judgement; /* of the verdict */
    char *caution;            /* NULL: nothing here leads to a change of plant */
    bool failed;              /* an allocation failed */
} report;

/* Building. The index of the item added comes back where others refer to it. */
void report_open(report *r, const char *version, const char *command, const char *title);
void report_close(report *r);
bool report_ok(const report *r);
void report_set_state(report *r, const report_state *state);
size_t report_add_gas(report *r, const char *name, const char *source, double sum_before);
void report_name_role(report *r, size_t gas, const char *role); /* in the place of its letter; once */
void report_add_fraction(report *r, size_t gas, const char *id, double x);
void report_add_input(report *r, const char *path); /* the same path twice is kept once; "" is none */
void report_identify_input(report *r, size_t input, const char *name, const char *sha256); /* once */
size_t report_add_section(report *r, const char *id, const char *title);
/* Adds a result; the texts of *result are copied, section and gas must exist. */
void report_add_result(report *r, const report_result *result);
size_t report_add_table(report *r, const char *id, const char *title);
void report_lead_with(report *r, size_t table);
void report_add_column(report *r, size_t table, const char *id, const char *heading, const char *unit);
void report_add_text(report *r, size_t table, const char *text);       /* next cell */
void report_add_number(report *r, size_t table, double number, int decimals); /* next cell */
void report_add_check(report *r, const char *id, bool ok, const char *detail);
void report_add_limit(report *r, const report_limit *limit); /* the texts of *limit are copied */
void report_set_limits_title(report *r, const char *title);
void report_lead_with_limits(report *r);
size_t report_add_worst(report *r, const char *id, const char *unit, const char *state);
void report_set_worst(report *r, size_t worst, report_end end, double value, bool exact);
void report_add_worst_fraction(report *r, size_t worst, report_end end, const char *id, double x);
void report_add_warning(report *r, const char *text); /* the same text twice is kept once */
void report_set_verdict(report *r, const char *text);
void report_judge(report *r, report_judgement judgement);
report_judgement report_judged(const report *r); /* the checks heeded */
void report_set_caution(report *r, const char *text);

/* Charts. All numbers must be finite. Labels may be empty; a chart may stay without points. */
size_t report_add_chart(report *r, const char *id, const char *title);
void report_set_axis(report *r, size_t chart, report_axis_id axis, const char *label, const char *unit);
void report_set_range(report *r, size_t chart, report_axis_id axis, double low, double high); /* low < high */
void report_set_time(report *r, size_t chart);                                        /* the x axis */
void report_add_name(report *r, size_t chart, report_axis_id axis, const char *name); /* next category */
size_t report_add_series(report *r, size_t chart, report_series_kind kind, const char *label);
void report_add_point(report *r, size_t chart, size_t series, double x, double y);
void report_add_mark(report *r, size_t chart, report_mark_kind kind, double x, double y, const char *label);

#endif
