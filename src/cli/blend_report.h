/* SPDX-License-Identifier: MIT */
/* blend_report.h - what is said of blends. */
#ifndef BLEND_REPORT_H
#define BLEND_REPORT_H

#include "cli/blend_case.h"

/* Adds a blend behind the parts as a gas of its own. There is room for as many as there are parts, and one. */
bc_status blend_add(blend_case *c, const double share[], const char *name, bc_error *err);

/* "80 % Pipeline gas + 20 % Hydrogen, shares of mole". */
void blend_recipe(const blend_case *c, const double share[], char *text, size_t size);

/* State, gases and their warnings, the recipe of the blend on every basis, the sheet of all gases. */
bc_status blend_sheet(report *r, const blend_case *c, const double share[], bc_error *err);

/* A table of the parts with their shares on every basis; it leads. */
void blend_recipe_table(report *r, const blend_case *c, const double share[], const char *id, const char *title);

/* Whether a part states a price or the CO2 of its making. */
bool blend_has_terms(const blend_case *c);

/* Cost and CO2 of the blend that stands behind the parts, as far as they state them; a warning where they cannot be added up. */
void blend_cost(report *r, const blend_case *c, const double share[]);

/* Judges the gas with an index of the subjects by the limits of --within: rows, and *inside. Without
 * --within nothing is done. A limit that cannot be judged is not kept. */
void blend_judge(report *r, const blend_case *c, size_t gas, bool *inside);

/* The verdict on one judged gas: within all limits, or what is broken, worst first. */
void blend_verdict(report *r, const blend_case *c, size_t gas, bool inside);

/* Answers: the report to where -o wants it, or with -o FILE.ini the blend into that file and the report to
 * standard output. Closes report and case. */
int blend_answer(report *r, blend_case *c, const double share[], int code);

/* Writes a blend as a composition file. */
bc_status blend_write_file(const blend_case *c, const double share[], const char *path, bc_error *err);

/* The bounds of every share where some are free: those of fixed ones are equal. */
void blend_free_bounds(const blend_case *c, double low[], double high[]);

/* The questions: each fills a report and answers. */
int blend_mix(blend_case *c, report *r);
int blend_sweep(blend_case *c, report *r);
int blend_aim(blend_case *c, report *r);
int blend_best(blend_case *c, report *r);

#endif
