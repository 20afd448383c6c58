/* SPDX-License-Identifier: MIT */
/* hostile.h - a report that has everything, with one text in every place that takes one. */
#ifndef HOSTILE_H
#define HOSTILE_H

#include "support.h"

#include "output/render.h"

/* What users could write into a file or a command line, and what it must not become. */
static const char *const HOSTILE[] = {
    "</script><script>alert(1)</script>",
    "\" onload=\"alert(1)\" x='",
    "' onload='alert(1)' x=\"",
    "javascript:alert(1)",
    "<img src=x onerror=alert(1)>",
    "--><!--",
    "</style></title></svg>]]>",
    "&lt;&#0;&nosuch;&",
    "\342\200\256drowkcab\342\201\247",      /* runs backwards: U+202E, U+2067 */
    "\033[2J\007\001\177\302\233",           /* orders for a terminal */
    "\300\257\355\240\200\377\364\220\200\200", /* no UTF-8 at all, in four ways */
    "\357\277\276\357\277\277",              /* U+FFFE, U+FFFF: in no XML file */
    "=HYPERLINK(\"http://x\",\"y\")",
    "+1+1",
    "@SUM(A1)",
    "_x0041_",
    "[a]:b*c?d/e\\f'",
    "",
};

static inline void add_figure(report *r, size_t section, size_t gas, const char *text, double value)
{
    char copy[256];

    (void)snprintf(copy, sizeof copy, "%s", text);
    const report_result result = {.id = copy,
                                  .label = copy,
                                  .unit = copy,
                                  .method = copy,
                                  .note = copy,
                                  .section = section,
                                  .gas = gas,
                                  .value = value,
                                  .has_uncertainty = true,
                                  .uncertainty = 0.0173};
    report_add_result(r, &result);
}

static inline void add_table(report *r, const char *text, bool leads)
{
    const size_t table = report_add_table(r, text, text);

    for (int column = 0; column < 3; column++)
        report_add_column(r, table, text, text, text);
    for (int row = 0; row < 2; row++) {
        report_add_text(r, table, text);
        report_add_number(r, table, 17.25 + row, 3);
        report_add_text(r, table, text);
    }
    if (leads)
        report_lead_with(r, table);
}

static inline void add_chart(report *r, const char *text)
{
    const size_t chart = report_add_chart(r, text, text);
    const size_t line = report_add_series(r, chart, REPORT_LINE, text);
    const size_t points = report_add_series(r, chart, REPORT_POINTS, text);

    report_set_axis(r, chart, REPORT_X, text, text);
    report_set_axis(r, chart, REPORT_Y, text, text);
    for (int i = 0; i < 5; i++) {
        report_add_point(r, chart, line, 1.3 * i, 40.1 + 0.7 * i);
        report_add_point(r, chart, points, 1.1 * i, 41.2 - 0.4 * i);
    }
    report_add_mark(r, chart, REPORT_MARK_X, 2.2, 0.0, text);
    report_add_mark(r, chart, REPORT_MARK_POINT, 2.2, 41.0, text);
}

/* Opens a report with `gases` gases and one text everywhere. */
static inline void open_full(report *r, const char *text, size_t gases, bool charts)
{
    char copy[256];

    (void)snprintf(copy, sizeof copy, "%s", text);
    const report_state state = {.present = true, .edition = 2016, .text = copy};
    report_open(r, text, text, text);
    report_set_state(r, &state);
    const size_t section = report_add_section(r, text, text);
    for (size_t gas = 0; gas < gases; gas++) {
        (void)report_add_gas(r, text, "a file", 1.0);
        add_figure(r, section, gas, text, 37.7791 + (double)gas);
    }
    add_figure(r, section, REPORT_NO_GAS, text, 11.3);
    add_table(r, text, true);
    add_table(r, text, false);
    report_add_input(r, text);
    if (*text != '\0')
        report_identify_input(r, 0, text, text);
    report_add_check(r, text, true, text);
    report_add_check(r, text, false, text);
    report_add_warning(r, text);
    report_set_verdict(r, text);
    report_set_caution(r, text);
    if (charts)
        add_chart(r, text);
    assert_true(report_ok(r));
}

#endif
