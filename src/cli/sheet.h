/* SPDX-License-Identifier: MIT */
/* sheet.h - the parts of a sheet that other commands show, too. */
#ifndef SHEET_H
#define SHEET_H

#include "cli/subjects.h"

#define SHEET_CAUTION "Changing the gas or the setting of a burner is work for licensed people under the local code: carbon monoxide, " \
                      "flashback and explosion can kill."

/* Every quantity of every gas, section by section; a figure that a gas does not have leaves no row. */
bc_status sheet_sections(report *r, const subjects *s, const arguments *a, bc_error *err);

/* The compositions as they were computed with: what the reader compares with the certificate. */
void sheet_composition(report *r, const subjects *s);

#endif
