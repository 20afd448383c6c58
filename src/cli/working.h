/* SPDX-License-Identifier: MIT */
/* working.h - the calculation of a sheet term by term. */
#ifndef WORKING_H
#define WORKING_H

#include "bluecone/quantity.h"
#include "output/report.h"

/* Adds two tables for a gas: what each component contributes, and the steps from the sums to the
 * results. The printed contributions add up to the sums in the first line of the steps. */
void report_working(report *r, const char *gas_name, const bc_subject *subject);

#endif
