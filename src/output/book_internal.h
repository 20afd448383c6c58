/* SPDX-License-Identifier: MIT */
/* book_internal.h - what the parts of the module that writes workbooks share.
 *
 * Errors of libxlsxwriter and a lack of memory are kept in the book and asked for once, at the end. */
#ifndef BOOK_INTERNAL_H
#define BOOK_INTERNAL_H

#include <xlsxwriter.h>

#include "output/number_text_internal.h"
#include "output/render.h"

#define BOOK_FORMATS_MAX   48 /* ways to print numbers; further ones are left to the spreadsheet */
#define BOOK_NAME_MAX      31 /* UTF-16 units of a sheet's name, as Excel has it */
#define BOOK_NAME_BYTES    (4 * BOOK_NAME_MAX + 1)
#define BOOK_TEXT_MAX      16000 /* UTF-16 units: half of what a cell holds, since escapes grow */
#define BOOK_SECONDS_A_DAY 86400.0

typedef enum {
    BOOK_PLAIN,
    BOOK_TITLE,
    BOOK_HEAD,
    BOOK_HEAD_RIGHT, /* over numbers */
    BOOK_NONE,       /* for a number that is not there */
    BOOK_WRAPPED,
    BOOK_WORD, /* in front of a remark */
    BOOK_GOOD,
    BOOK_CARE,
    BOOK_BAD,
    BOOK_TIME,
    BOOK_LOOKS
} book_look;

typedef struct {
    char text[NUMBER_TEXT_MAX]; /* as "0.000" */
    lxw_format *format;
} book_format;

typedef struct {
    const report *r;
    const render_style *style;
    lxw_workbook *file;
    lxw_format *looks[BOOK_LOOKS];
    book_format formats[BOOK_FORMATS_MAX];
    size_t format_count;
    bool failed;     /* no memory */
    lxw_error error; /* the first of libxlsxwriter */
} book;

/* A sheet that is filled row by row. */
typedef struct {
    book *b;
    lxw_worksheet *at;
    char name[BOOK_NAME_BYTES];
    lxw_row_t row;
    lxw_col_t columns;
    int *widths; /* of the columns, in characters */
    int most;    /* characters of the longest text in the current row */
} book_sheet;

void book_looks(book *b);
void book_check(book *b, lxw_error error);

/* A text as a spreadsheet takes it, at most so many UTF-16 units; NULL without memory. The caller
 * frees it. */
char *book_text(book *b, const char *text, size_t units);

/* A new sheet under the next legal name that is free; false when the book has failed. To be closed
 * either way: that sets widths and the way it is printed, `head` rows on each page. */
bool book_open_sheet(book *b, book_sheet *s, const char *name, size_t columns);
void book_close_sheet(book_sheet *s, lxw_row_t head);

/* A cell of the current row. A text is never taken for a formula; a number shows the digits that
 * `shown` has. */
void book_put_text(book_sheet *s, size_t column, book_look look, const char *text);
void book_put_number(book_sheet *s, size_t column, double number, const char *shown);
void book_put_time(book_sheet *s, size_t column, double seconds); /* since 1970-01-01 */
void book_put_head(book_sheet *s, size_t column, bool over_numbers, const char *text);

/* Goes on to the next row, and makes this one as high as its texts want when they fold at `width`. */
void book_end_row(book_sheet *s, int width);

#define BOOK_HEAD_WIDTH 18 /* where headings fold */

/* The sheets. */
void book_cover(book *b);
void book_section(book *b, size_t section);
void book_table(book *b, const report_table *table);
void book_chart(book *b, const report_chart *chart);

#endif
