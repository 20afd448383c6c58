/* SPDX-License-Identifier: MIT */
/* stream.h - a log of any length in, the same rows with figures out.
 *
 * One thread reads blocks of whole rows, cut where no quote is open; any number of threads make batches of results of
 * them, each row by itself; the first thread takes the batches in the order of the log, compares each row with those
 * before it, and writes. What is written depends on the log alone, not on how many threads there are. */
#ifndef STREAM_H
#define STREAM_H

#include "base/text.h"
#include "cli/cli.h"
#include "cli/log_header.h"

#include <stdint.h>

#define STREAM_BLOCK ((size_t)256 << 10)      /* bytes of rows that are worked at in one piece, at most; a longer row is no row */
#define STREAM_MEMORY ((size_t)24 << 20)      /* of all batches together, by the usual length of what a row comes to */
#define STREAM_QUOTED_MAX ((size_t)16 << 10)  /* a quote that is not closed within so many bytes is a slip */
#define STREAM_FIGURES_MAX 64
#define STREAM_STEPS 15                       /* of which the usual step is the median */
#define STREAM_NEIGHBOURS 5                   /* of whose Wobbe indices a spike differs from the median */
#define STREAM_REASON_MAX 200
#define STREAM_HEADING_MAX (2 * BC_WORD_MAX)

typedef enum { STREAM_CSV, STREAM_NDJSON } stream_form;

/* A figure that is added to each row. */
typedef struct {
    size_t quantity;
    bc_unit own, shown;
    char unit[BC_WORD_MAX];
    char heading[STREAM_HEADING_MAX];         /* "hhv [MJ/m3]" */
} stream_figure;

/* A column as a row needs it: of the components a list of what they add to which species. */
typedef struct {
    log_column_kind kind;
    double fraction;
    size_t first_share, share_count;
} stream_column;

typedef struct {
    size_t species;
    double moles;
} stream_share;

/* What is settled before the first row, and only read from then on. */
typedef struct {
    const arguments *a;
    const char *path;                         /* of the log, for messages */
    stream_form form;
    char delimiter, mark;                     /* between cells; decimal */
    const char *line_end;
    size_t mark_length;                       /* bytes of the byte-order mark */
    bool has_header;                          /* the log names its columns */
    bool has_time;                            /* there is such a column, and it is asked for */
    bc_per_amount flow;                       /* of one in the column of flow */
    size_t time_columns;                      /* a date and a time are joined */
    log_header header;
    size_t column_count, share_count;
    stream_column columns[LOG_COLUMNS_MAX];
    stream_share shares[LOG_COLUMNS_MAX * 4 + BC_SPECIES_CAPACITY];
    char names[LOG_COLUMNS_MAX][LOG_CELL_MAX]; /* NDJSON: the key of each column */
    bc_state state;
    bc_reference reference;
    size_t figure_count;
    stream_figure figures[STREAM_FIGURES_MAX];
    int digits;
    bc_contract *contract;                    /* NULL: none */
    bool has_calibration;
    bc_gas calibration;
    bool alone;                               /* rows are not compared with each other */
    bool is_part;                             /* of a log, maybe one without a row that can be used */
    bool keeps;                               /* figures of the rows are kept for a summary */
    bool drops;                               /* rows themselves are not written */
    double step_s;                            /* the usual step; 0: to be found out */
} stream_plan;

/* What is strange about a row; the words stand in stream_flags.def. */
typedef enum {
#define FLAG(name, word, meaning) STREAM_##name,
#include "cli/stream_flags.def"
    STREAM_FLAGS
} stream_flag;

/* A row as those behind it, the summary and the excursions need it. */
typedef struct {
    size_t end;                               /* in the results: behind the last flag */
    uint32_t line;                            /* of the block, from 0 */
    uint32_t flags;                           /* a bit each */
    bool good;                                /* there are results */
    bool has_time, zoned, has_power;
    double time_s, power_w;
    double wobbe;                             /* J/m3 */
    uint64_t fingerprint;                     /* of the figures of the analyser */
    uint64_t known, broken;                   /* limits of the contract */
} stream_mark;

/* A block and what was made of it. */
typedef struct {
    char *in;
    size_t in_length;
    uint32_t lines;                           /* in the block */
    char *out;
    size_t out_length, out_room;
    stream_mark *marks;
    size_t count, room;
    double *figures, *limits;                 /* by rows, stream_limits() of these each; only where they are kept */
    size_t refused;
    size_t first_refused;                     /* index of its mark */
    char reason[STREAM_REASON_MAX];           /* of the first refused row */
    bc_status status;                         /* BC_ERR_MEMORY: the batch is worth nothing */
    char day[12];                             /* the date that was read last, and its seconds */
    double last_day_s;
} stream_batch;

/* Takes what the options say: figures, state, contract. To be closed in any case. */
bc_status stream_plan_open(stream_plan *p, const arguments *a, bc_error *err);
void stream_plan_close(stream_plan *p);

/* Whether the beginning of the log holds all that stream_find_columns() looks at: the same must be made of a log however
 * it arrives. */
bool stream_has_beginning(stream_plan *p, const char *text, size_t length);

/* Makes out form, dialect and columns by the beginning of the log.
 *
 *   text     its first bytes; at least one whole row, unless no more follow
 *   last     no more bytes follow
 *   header   out: bytes of the header with what stands before it; without a header those of the byte-order mark */
bc_status stream_find_columns(stream_plan *p, const char *text, size_t length, bool last, size_t *header, bc_error *err);

/* Writes the header of the results behind that of the log: text[0..length). out: length + STREAM_HEADER_MAX bytes; returns
 * the length. */
#define STREAM_HEADER_MAX (STREAM_FIGURES_MAX * (STREAM_HEADING_MAX + 4) + 64)
size_t stream_put_header(const stream_plan *p, const char *text, size_t length, char *out);

/* Where the row that begins at text ends: behind its line feed. `last` says that no more bytes follow. 0: it does not
 * end within length. */
size_t stream_row_end(const stream_plan *p, const char *text, size_t length, bool last);

/* Whether a row ends within a quote, which would swallow what is written behind it. */
bool stream_is_open(char delimiter, const char *text, size_t length);

/* Line feeds in a text. */
uint32_t stream_count_lines(const char *text, size_t length);

typedef enum {
    STREAM_CUT_WHOLE,
    STREAM_CUT_OPEN, /* the last quote is not closed */
    STREAM_CUT_TORN  /* text follows behind a closed quote */
} stream_cut;

/* Cells of a row, unquoted; cells longer than LOG_CELL_MAX are cut. *count, the number of cells that were seen, may be
 * greater than LOG_COLUMNS_MAX, only so many are kept. */
stream_cut stream_split(char delimiter, const char *text, size_t length, char (*cells)[LOG_CELL_MAX], size_t *count);

/* Limits a row has room for; never none. */
size_t stream_limits(const stream_plan *p);

/* Makes the results of a block. */
void stream_work(const stream_plan *p, stream_batch *b);

/* One row of NDJSON. */
void stream_json_row(const stream_plan *p, stream_batch *b, const char *text, size_t length, uint32_t line);

/* What is known of the rows so far, for the rules that compare rows. */
typedef struct {
    bool has_time, zoned;
    double time_s;
    double step_s;                            /* the usual step; 0: not known yet */
    double steps[STREAM_STEPS];               /* the last ones, in turn */
    size_t step_count, step_next;
    uint64_t fingerprint;
    size_t alike;                             /* rows with this fingerprint one behind the other */
    double wobbe[STREAM_NEIGHBOURS];
    size_t wobbe_count, wobbe_next;
} stream_past;

/* Compares the rows of a batch with those before; sets their flags. */
void stream_compare(const stream_plan *p, stream_past *past, stream_batch *b);

/* The words of flags, parted by blanks; STREAM_FLAGS_TEXT bytes. Returns the length. */
#define STREAM_FLAGS_TEXT 160
size_t stream_flags_text(uint32_t flags, char text[STREAM_FLAGS_TEXT]);
const char *stream_flag_word(size_t flag);
const char *stream_flag_meaning(size_t flag);

/* Where the log comes from. */
typedef struct {
    const stream_plan *p;
    int fd;
    bool is_standard, follows, ended, regular;
    uint64_t bytes, size;                     /* read; of a regular file */
    char *rest;                               /* what was read and is in no block yet; STREAM_BLOCK bytes */
    size_t rest_length;
    bool waits;                               /* rows stand in rest that more bytes need not be read for */
    size_t block, block_max;                  /* bytes to read for the next block, unless a row is longer */
    size_t rows_max;                          /* in a block */
} stream_input;

bc_status stream_input_open(stream_input *in, const stream_plan *p, bc_error *err);
void stream_input_close(stream_input *in);

/* Reads so much into in->rest that the columns can be made out; errors as below. Some of it may then be skipped. */
bc_status stream_input_begin(stream_input *in, stream_plan *p, bc_error *err);
void stream_input_skip(stream_input *in, size_t length);

/* Fills a block with whole rows.
 *
 *   block    STREAM_BLOCK bytes
 *   length   out: bytes of whole rows; 0 at the end, or when `wait` is false and none have come
 *
 * BC_ERR_FILE: the device failed, or the file became shorter while it was followed; BC_ERR_INPUT: a row is longer than a block. */
bc_status stream_input_fill(stream_input *in, char *block, size_t *length, bool wait, bc_error *err);

/* Bounds what goes into one of so many batches, so that all of them stay within STREAM_MEMORY. */
void stream_input_share(stream_input *in, size_t batches);

/* True when no further row comes: at the end of the log, or after a signal. */
bool stream_input_over(const stream_input *in);

/* Lets SIGINT, SIGTERM and SIGHUP end the stream in order instead of at once; those that are ignored stay so. */
void stream_catch_signals(void);

/* True once SIGINT, SIGTERM or SIGHUP came. */
bool stream_interrupted(void);

/* How far the log is read, on a terminal. */
typedef struct {
    bool is_on, was_told;
    double begun_s, told_s;
} stream_progress;

void stream_progress_start(stream_progress *g, const stream_plan *p);
void stream_progress_tell(stream_progress *g, const stream_input *in, uint64_t rows);
void stream_progress_end(stream_progress *g); /* leaves the line empty */

/* A batch in the order of the log goes here. */
typedef bc_status stream_take(void *data, stream_batch *b, bc_error *err);

/* Reads the log to its end through any number of threads. BC_ERR_MEMORY; BC_ERR_FILE, BC_ERR_INPUT as
 * stream_input_fill(); what take() returns. */
bc_status stream_run(const stream_plan *p, stream_input *in, size_t jobs, stream_take *take, void *data, bc_error *err);

#endif
