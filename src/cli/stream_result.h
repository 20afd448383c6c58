/* SPDX-License-Identifier: MIT */
/* stream_result.h - from the amounts of a row to the text behind it. */
#ifndef STREAM_RESULT_H
#define STREAM_RESULT_H

#include "cli/stream.h"

/* What was read of a row. */
typedef struct {
    double amounts[BC_SPECIES_CAPACITY]; /* of substance, up to a common factor */
    double sum;                          /* of the shares as written, fraction of one */
    uint64_t fingerprint;
    uint32_t flags;
    bool has_time, zoned;
    double time_s;
    double flow;                         /* in the unit of its column; negative: not given */
    size_t empty_count;
    unsigned char empty[LOG_COLUMNS_MAX]; /* columns of components without a value */
    char reason[STREAM_REASON_MAX];      /* why there are no results; "" when there are */
} stream_reading;

/* The values of all components of a row, and what they are together. */
void stream_reading_start(stream_reading *r);
void stream_reading_add(const stream_plan *p, stream_reading *r, size_t column, double value);
void stream_reading_miss(stream_reading *r, size_t column);

/* Makes room for the results of a row of so many bytes, and a mark; false without memory. */
bool stream_make_room(const stream_plan *p, stream_batch *b, size_t length);

/* Works out the figures of a reading: the mark, the figures kept, and the reason where there are none. cells: the text
 * of each figure, "" where it has none. verdict: the column of the contract. */
#define VERDICT_MAX (BC_LIMIT_MAX * BC_LIMIT_ID_MAX + 16) /* every limit of a contract by its id */

typedef struct {
    char figure[STREAM_FIGURES_MAX][24];
    unsigned char length[STREAM_FIGURES_MAX];
    char verdict[VERDICT_MAX];
} stream_cells;

void stream_evaluate(const stream_plan *p, stream_batch *b, stream_reading *r, stream_mark *mark, stream_cells *cells);

/* Reads the time of a row, "2026-03-01T12:00" and so on; false when it is none. */
bool stream_read_time(stream_batch *b, stream_reading *r, const char *text, size_t length);

/* The cells of a row, one a column, into a reading. is_cell: which of them there are; NULL for all. */
void stream_read_cells(const stream_plan *p, stream_batch *b, stream_reading *r, char (*cells)[LOG_CELL_MAX], const bool is_cell[]);

/* Adds bytes to the results; there is room. */
void stream_put(stream_batch *b, const char *text, size_t length);

/* Adds the mark of a row to the batch. */
void stream_add_mark(stream_batch *b, stream_mark *mark, const stream_reading *r);

#endif
