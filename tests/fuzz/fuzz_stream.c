/* SPDX-License-Identifier: MIT */
/* fuzz_stream.c - a log of any bytes: as many rows out as in, each with its cells, no figure that is none, and the same
 * bytes however the log arrives.
 *
 * Bytes: two of options, one for the length of the pieces in which the log arrives, then the log. */
#include "fuzz.h"

#include "cli/stream.h"

#include <jansson.h>

#define LOG_MAX 60000 /* a pipe holds 64 KiB */

/* What came out: rows with their header. */
typedef struct {
    bool refused;
    bc_status status;
    char *text;
    size_t length, room, header;
    size_t rows;
} result;

static void put(result *r, const char *text, size_t length)
{
    if (r->length + length > r->room) {
        r->room = 2 * (r->length + length);
        r->text = realloc(r->text, r->room);
        fuzz_require(r->text != NULL);
    }
    if (length > 0)
        memcpy(r->text + r->length, text, length);
    r->length += length;
}

/* ---- plans: one for each set of options, opened once --------------------------------------------------------------- */

#define PLANS 512

static const stream_plan *plan_of(unsigned bits)
{
    static stream_plan *plans[PLANS];
    static arguments a[PLANS];
    const unsigned at = bits % PLANS;

    if (plans[at])
        return plans[at];
    char text[] = "stream -";
    char *words[] = {text, text + 7, NULL};
    bc_error err;

    text[6] = '\0';
    plans[at] = malloc(sizeof *plans[at]);
    fuzz_require(plans[at] != NULL);
    fuzz_require(arguments_take(command_find("stream"), 2, words, &a[at], &err) == BC_OK);
    a[at].value[OPTION_form] = at & 1 ? (at & 2 ? "csv" : "ndjson") : NULL;
    if (at & 4) {
        a[at].value[OPTION_no_header] = "";
        a[at].value[OPTION_columns] = "time,methane,ethane,c6+,nitrogen,flow [m3/h]";
    }
    a[at].value[OPTION_shares] = at & 8 ? "vol %" : NULL;
    a[at].value[OPTION_rows_alone] = at & 16 ? "" : NULL;
    a[at].value[OPTION_contract] = at & 32 ? BC_SOURCE_DIR "/examples/contract-marrowfen.ini" : NULL;
    a[at].value[OPTION_against] = at & 32 ? "methane=92,ethane=5,nitrogen=3" : NULL;
    a[at].value[OPTION_calibration] = at & 64 ? "methane=90,ethane=10" : NULL;
    a[at].value[OPTION_add] = at & 128 ? "hhv,wobbe-gross,methane-number,lfl,flue-dew-point" : NULL;
    a[at].value[OPTION_digits] = at & 128 ? "15" : NULL;
    a[at].value[OPTION_decimal] = at & 256 ? "comma" : NULL;
    fuzz_require(stream_plan_open(plans[at], &a[at], &err) == BC_OK);
    return plans[at];
}

/* ---- the log through a pipe ------------------------------------------------------------------------------------------ */

/* The pieces: each holds a line feed, for a reader waits for one. */
typedef struct {
    const char *text;
    size_t length, at, piece;
    int to;
} feeder;

static void feed(feeder *f)
{
    if (f->to < 0)
        return;
    size_t length = f->piece < f->length - f->at ? f->piece : f->length - f->at;
    const char *feed_at = NULL;

    if (length > 0 && !memchr(f->text + f->at, '\n', length)) {
        feed_at = memchr(f->text + f->at, '\n', f->length - f->at);
        length = feed_at ? (size_t)(feed_at + 1 - (f->text + f->at)) : f->length - f->at;
    }
    if (length > 0)
        fuzz_require(write(f->to, f->text + f->at, length) == (ssize_t)length);
    f->at += length;
    if (f->at == f->length) {
        (void)close(f->to);
        f->to = -1;
    }
}

static void check_batch(const stream_plan *p, const stream_batch *b)
{
    for (size_t i = 0; i < b->count; i++) {
        const stream_mark *mark = &b->marks[i];

        fuzz_require(!mark->good || (isfinite(mark->wobbe) && mark->wobbe >= 0.0));
        fuzz_require(!mark->has_time || isfinite(mark->time_s));
        fuzz_require((mark->broken & ~mark->known) == 0);
        fuzz_require(mark->end <= b->out_length && (i == 0 || b->marks[i - 1].end < mark->end));
        fuzz_require(p->contract || mark->known == 0);
    }
}

static void take(const stream_plan *p, stream_past *past, stream_batch *b, result *r)
{
    size_t from = 0;

    fuzz_require(b->status == BC_OK);
    check_batch(p, b);
    if (!p->alone)
        stream_compare(p, past, b);
    for (size_t i = 0; i < b->count; i++) {
        char flags[STREAM_FLAGS_TEXT];

        put(r, b->out + from, b->marks[i].end - from);
        from = b->marks[i].end;
        put(r, flags, stream_flags_text(b->marks[i].flags, flags));
    }
    if (b->out)
        put(r, b->out + from, b->out_length - from);
    r->rows += b->count;
}

static void begin(stream_plan *p, stream_input *in, result *r, feeder *f)
{
    char *header = NULL;
    size_t length = 0;
    bc_error err;

    while (f->to >= 0 && !stream_has_beginning(p, f->text, f->at)) /* else the reader would wait for ever */
        feed(f);
    r->status = stream_input_begin(in, p, &err);
    fuzz_require(fuzz_answer(r->status, &err));
    r->status = stream_find_columns(p, in->rest, in->rest_length, in->ended, &length, &err);
    r->refused = !fuzz_answer(r->status, &err);
    if (r->refused)
        return;
    fuzz_require(length <= in->rest_length && p->column_count > 0);
    header = malloc(length + STREAM_HEADER_MAX);
    fuzz_require(header != NULL);
    if (p->form == STREAM_CSV && p->has_header)
        put(r, header, stream_put_header(p, in->rest, length, header));
    else
        put(r, in->rest, length);
    r->header = r->length;
    free(header);
    stream_input_skip(in, length);
}

static result run(stream_plan *p, const char *text, size_t length, size_t piece)
{
    static char block[STREAM_BLOCK], rest[STREAM_BLOCK];
    stream_batch b;
    stream_past past;
    result r = {.refused = false};
    bc_error err;
    int ends[2];

    fuzz_require(pipe(ends) == 0);
    feeder f = {text, length, 0, piece, ends[1]};
    stream_input in = {.p = p, .fd = ends[0], .rest = rest};

    memset(&past, 0, sizeof past);
    memset(&b, 0, sizeof b);
    begin(p, &in, &r, &f);
    size_t taken = f.at - in.rest_length; /* once all that was fed is read: the header */

    if (!r.refused)
        stream_input_share(&in, 1);
    if (piece < length)
        in.rows_max = 1 + piece % 5; /* blocks of few rows, too */
    while (!r.refused && !stream_input_over(&in)) {
        feed(&f);
        while (f.to >= 0 && stream_row_end(p, text + taken, f.at - taken, false) == 0) /* else the reader would wait for ever */
            feed(&f);
        r.status = stream_input_fill(&in, block, &b.in_length, true, &err);
        fuzz_require(fuzz_answer(r.status, &err));
        b.in = block;
        taken += b.in_length;
        stream_work(p, &b);
        take(p, &past, &b, &r);
    }
    if (f.to >= 0)
        (void)close(f.to);
    (void)close(ends[0]);
    free(b.out);
    free(b.marks);
    free(b.figures);
    free(b.limits);
    return r;
}

/* ---- what the rows must be -------------------------------------------------------------------------------------------- */

static bool is_blank(const char *text, size_t length)
{
    for (size_t i = 0; i < length; i++)
        if (!strchr(" \t\r\n", text[i]) || text[i] == '\0')
            return false;
    return true;
}

static size_t count_rows(const stream_plan *p, const char *text, size_t length)
{
    size_t rows = 0;

    for (size_t at = 0; at < length;) {
        const size_t row = stream_row_end(p, text + at, length - at, true);

        rows += !is_blank(text + at, row);
        at += row;
    }
    return rows;
}

/* Nothing, or a number that is one. */
static void check_figure(const stream_plan *p, const char *cell)
{
    char text[LOG_CELL_MAX];
    double value = 0.0;

    if (*cell == '\0')
        return;
    (void)snprintf(text, sizeof text, "%s", cell);
    for (char *c = text; *c != '\0'; c++)
        if (*c == p->mark)
            *c = '.';
    fuzz_require(bc_number_parse(text, &value, NULL) == BC_OK && isfinite(value));
}

static void check_csv_row(const stream_plan *p, const char *text, size_t length)
{
    static char cells[LOG_COLUMNS_MAX][LOG_CELL_MAX];
    const size_t behind = p->figure_count + (p->contract ? 1 : 0) + 2;
    size_t count = 0;

    while (length > 0 && (text[length - 1] == '\n' || text[length - 1] == '\r'))
        length--;
    if (stream_split(p->delimiter, text, length, cells, &count) != STREAM_CUT_WHOLE || count > LOG_COLUMNS_MAX)
        return;
    fuzz_require(count >= p->column_count + behind);
    if (count > p->column_count + behind) /* a row of too many cells */
        return;
    for (size_t i = 0; i < p->figure_count; i++)
        check_figure(p, cells[p->column_count + i]);
}

static void check_json_row(const stream_plan *p, const char *text, size_t length)
{
    json_error_t cause;
    json_t *object = json_loadb(text, length, 0, &cause);

    if (!json_is_object(object))
        (void)fprintf(stderr, "%s in: %.*s\n", cause.text, (int)length, text);
    fuzz_require(json_is_object(object));
    fuzz_require(json_is_string(json_object_get(object, "reason")) && json_is_string(json_object_get(object, "flags")));
    for (size_t i = 0; i < p->figure_count; i++) {
        const json_t *figure = json_object_get(object, p->figures[i].heading);

        fuzz_require(json_is_null(figure) || json_is_number(figure));
    }
    json_decref(object);
}

static void check_rows(const stream_plan *p, const result *r)
{
    size_t rows = 0;

    for (size_t at = r->header; at < r->length;) {
        const size_t row = stream_row_end(p, r->text + at, r->length - at, true);

        if (!is_blank(r->text + at, row)) {
            rows++;
            if (p->form == STREAM_NDJSON)
                check_json_row(p, r->text + at, row);
            else
                check_csv_row(p, r->text + at, row);
        }
        at += row;
    }
    fuzz_require(rows == r->rows);
}

int LLVMFuzzerTestOneInput(const uint8_t *data, size_t size)
{
    static stream_plan whole, pieces;
    fuzz_bytes b = {data, size};
    const stream_plan *plan = plan_of(fuzz_short(&b));
    const size_t piece = 1 + fuzz_byte(&b);

    if (b.left == 0 || b.left > LOG_MAX)
        return 0;
    const char *text = (const char *)b.at;

    whole = *plan;
    pieces = *plan;
    result one = run(&whole, text, b.left, b.left);
    result many = run(&pieces, text, b.left, piece);

    fuzz_require(one.refused == many.refused && one.status == many.status);
    fuzz_require(one.length == many.length && (one.length == 0 || memcmp(one.text, many.text, one.length) == 0));
    if (!one.refused) {
        const size_t header = whole.has_header && whole.form == STREAM_CSV ? 1 : 0;

        fuzz_require(one.rows + header == count_rows(&whole, text + whole.mark_length, b.left - whole.mark_length));
        check_rows(&whole, &one);
    }
    free(one.text);
    free(many.text);
    return 0;
}
