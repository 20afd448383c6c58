/* SPDX-License-Identifier: MIT */
/* result_text_internal.h - a result's figures as people read them. */
#ifndef RESULT_TEXT_INTERNAL_H
#define RESULT_TEXT_INTERNAL_H

#include "output/number_text_internal.h"
#include "output/render.h"

typedef struct {
    char value[NUMBER_TEXT_MAX];
    char u[NUMBER_TEXT_MAX]; /* standard uncertainty; "" if there is none */
    const char *unit;        /* the result's; "" for a pure number, whose unit is 1 */
} result_text;

/* The digits that the style asks for, else those that the uncertainty leaves, else the result's. */
result_text result_text_of(const report_result *result, const render_style *style);

#endif
