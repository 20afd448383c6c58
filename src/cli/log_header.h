/* SPDX-License-Identifier: MIT */
/* log_header.h - what the columns of a log are: time, flow, components, and what is of no use. */
#ifndef LOG_HEADER_H
#define LOG_HEADER_H

#include "bluecone/bluecone.h"

#include <stdbool.h>
#include <stddef.h>

#define LOG_COLUMNS_MAX 200
/* What a report on a log has to say where a row was outside of its limits. */
#define LOG_CAUTION "A gas outside of its limits may be dangerous to burn: carbon monoxide, flashback and explosion can kill. " \
                    "Whether to go on is for licensed people and the local code to say."

#define LOG_CELL_MAX 80    /* bytes of a cell with the final NUL; a longer one is cut, and so no number */

typedef enum { LOG_IGNORED, LOG_TIME, LOG_FLOW, LOG_COMPONENT } log_column_kind;

/* A column of the log. */
typedef struct {
    log_column_kind kind;
    char name[LOG_CELL_MAX];
    double fraction;                   /* of one, for one in the column's unit, on the basis of the log */
    double parts[BC_SPECIES_CAPACITY]; /* moles of each species for a share of one; up to a common factor */
    bc_per_amount flow;                /* of one in the column's unit */
} log_column;

/* The columns, in their order. */
typedef struct {
    const char *path;                  /* of the log, for messages */
    size_t column_count;
    log_column columns[LOG_COLUMNS_MAX];
    bool has_flow;
    bool has_basis;                    /* the caller or a unit said what shares are shares of */
    bc_basis basis;
    double unit;                       /* fraction of one that a component without a unit is in; 0.01: per cent */
    char remarks[BC_REMARK_MAX][BC_REMARK_BYTES]; /* how columns were understood */
    size_t remark_count;
} log_header;

/* A header that knows no column yet: shares in mole per cent where no unit says more. */
void log_header_start(log_header *h, const char *path);

/* Makes out the columns by their headings.
 *
 *   cells   their texts, `count` of them, each of LOG_CELL_MAX bytes
 *   line    of the log, for messages; 0 for none
 *
 * BC_ERR_INPUT: no component, the same twice, a unit that no share has, shares on different bases; BC_ERR_MEMORY. */
bc_status log_header_take(log_header *h, char (*cells)[LOG_CELL_MAX], size_t count, int line, bc_error *err);

/* Columns of a kind. */
size_t log_header_count(const log_header *h, log_column_kind kind);

/* Adds a remark that names the columns that nothing is made of, and the component that one may have been meant for. */
void log_header_tell_ignored(log_header *h);

/* What has to be known of the flow's cubic metres; NULL where there is no flow, or its unit leaves no question. */
const char *log_header_flow_note(const log_header *h);

/* Which limits are kept only since no column is the component: perhaps it was never looked for. False: none. */
#define LOG_ABSENT_TEXT 600
bool log_header_absent(const log_header *h, const bc_contract *c, char text[LOG_ABSENT_TEXT]);

/* Sets what shares without a unit are in: "mass %", "ppm". False: no such unit. */
bool log_header_shares(log_header *h, const char *word);

/* A sum of shares, of one, that is scaled to 100 %, but not passed without a word. */
bool log_sum_is_off(double sum);

/* "1.638": where commas are the decimal marks of a log, perhaps one thousand six hundred and thirty-eight. */
bool log_is_grouped(const char *cell);

/* The sign that parts the cells of a row: of ';', tab and ',' the most frequent one outside quotes. */
char log_delimiter(const char *line, size_t length);

#endif
