/* SPDX-License-Identifier: MIT */
/* workbook_internal.h - what the program and the module that writes workbooks agree on.
 *
 * libxlsxwriter is needed by nobody but who asks for a workbook: it stands in the module
 * bluecone_workbook.so, which has one function, of type workbook_write and name WORKBOOK_SYMBOL. */
#ifndef WORKBOOK_INTERNAL_H
#define WORKBOOK_INTERNAL_H

#include "output/render.h"

/* The module reads the program's report: both must have it in the same shape. The number in front is
 * raised by hand when a change leaves the sizes as they are. */
#define WORKBOOK_ABI                                                                                         \
    (1U << 28 | (unsigned)sizeof(report) << 16 |                                                             \
     (unsigned)(sizeof(report_chart) + sizeof(report_result)) << 4 |                                         \
     (unsigned)(sizeof(report_table) + sizeof(render_style)) / 16)

#define WORKBOOK_MODULE  "bluecone_workbook.so"
#define WORKBOOK_SYMBOL  "bluecone_workbook_write"
#define WORKBOOK_WHY_MAX 160

typedef enum {
    WORKBOOK_WRITTEN,
    WORKBOOK_OTHER_ABI, /* nothing was read or written */
    WORKBOOK_NO_MEMORY,
    WORKBOOK_NOT_WRITTEN /* why[] says what went wrong */
} workbook_outcome;

typedef struct {
    const report *r;
    const render_style *style;
    FILE *out;
    char why[WORKBOOK_WHY_MAX];
} workbook_order;

/* Writes order->r to order->out, if abi is the module's own WORKBOOK_ABI. */
typedef workbook_outcome workbook_write(unsigned abi, workbook_order *order);
BC_API workbook_write bluecone_workbook_write;

#endif
