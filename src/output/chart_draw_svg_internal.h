/* SPDX-License-Identifier: MIT */
/* chart_draw_svg_internal.h - what Cairo's SVG lacks. */
#ifndef CHART_DRAW_SVG_INTERNAL_H
#define CHART_DRAW_SVG_INTERNAL_H

#include <stdbool.h>
#include <stdio.h>

#include "output/report.h"

/* Writes an SVG of Cairo's, with the words of the charts as its title and description: the letters
 * in it are outlines, which neither a search nor a screen reader can read. What differs from one
 * drawing to the next is left out. False when there was no memory. */
bool chart_write_svg(const report *r, const char *svg, FILE *out);

#endif
