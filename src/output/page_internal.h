/* SPDX-License-Identifier: MIT */
/* page_internal.h - what the parts of a page in HTML share.
 *
 * Whatever comes from a report goes through page_text(); only words of ours are written as they are. */
#ifndef PAGE_INTERNAL_H
#define PAGE_INTERNAL_H

#include "output/number_text_internal.h"
#include "output/render.h"

typedef struct {
    FILE *out;
    const report *r;
    const render_style *style;
    bool failed; /* an allocation failed: something is missing on the page */
} page;

/* Text of a report, for an element or a quoted attribute: nothing in it is taken for HTML. */
void page_text(page *p, const char *text);

/* "NAME" with its text inside, as <li>text</li>; the name may bring attributes. */
void page_element(page *p, const char *name, const char *text);

/* A heading that a link "#IDn" finds, and the beginning of its section. */
void page_open_block(page *p, char id, size_t n, const char *title);
void page_close_block(page *p);

/* A table in a box of its own, which scrolls where the paper is too narrow; the caption is for who
 * cannot see the heading, `gases` the number of columns that are a gas each. */
void page_open_table(page *p, const char *kind, const char *caption, size_t gases);
void page_close_table(page *p);

/* The head of a column, "" for none: its unit, and the kind of its cells. */
void page_column_head(page *p, const char *kind, const char *heading, const char *unit);

/* A column whose numbers have longer fractions is not aligned at the point. */
#define PAGE_FRACTION_MAX 9

/* Characters from the decimal point of a number on. */
int page_fraction(const char *number);

/* A cell with a number and, unless "", its uncertainty below; `fraction` is the most of its column,
 * so that all points stand below each other. */
void page_number(page *p, const char *number, const char *u, int fraction);

/* "Gas", or "Gas B" where there are several. */
void page_gas_word(page *p, size_t gas);

/* The parts, in the order of the page; each is nothing where the report has nothing of it. */
void page_style(FILE *out);
void page_banner(page *p); /* title, verdict, caution, state and gases, contents */
bool page_has_results(const page *p, size_t index);
void page_sections(page *p);
void page_tables(page *p, bool leading);
void page_charts(page *p);
void page_checks(page *p);
void page_warnings(page *p);
void page_foot(page *p);

#endif
