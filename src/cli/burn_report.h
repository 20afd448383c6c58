/* SPDX-License-Identifier: MIT */
/* burn_report.h - the parts of a combustion report. */
#ifndef BURN_REPORT_H
#define BURN_REPORT_H

#include "cli/burn_case.h"
#include "cli/figures.h"

/* A case with what came of it. */
typedef struct {
    burn_setup setup;
    bc_burn burn;
    const bc_subject *fuel;
    const char *family; /* of the composition file; "" when not stated */
} burn_case_result;

/* Sections, tables, warnings and cautions of a case. */
bc_status burn_report(report *r, const arguments *a, const burn_case_result *c, bc_error *err);

/* Limits in air and burning velocity of the fuel. */
void burn_safety(report *r, const arguments *a, const burn_case_result *c);

/* The heat path term by term (--working). */
void burn_working(report *r, const burn_case_result *c);

/* True when the output is a chart, or --sweep asks for the curves behind one. */
bool burn_wants_chart(const arguments *a);

/* Flame temperature, flue gas, dew points and efficiency against excess oxidant or flue gas temperature. */
bc_status burn_chart(report *r, const arguments *a, const burn_case_result *c, bc_error *err);

#endif
