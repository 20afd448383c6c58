/* SPDX-License-Identifier: MIT */
/* stream.c - a log in, the same rows with figures out. */
#include "cli/stream_sum.h"

#include "base/error_internal.h"
#include "bluecone/number.h"
#include "output/output_file_internal.h"

#include <math.h>
#include <stdio.h>
#include <stdlib.h>
#include <string.h>
#include <unistd.h>

#define JOBS_MAX 64
#define ANSWER_NO 1

/* A stream under way. */
typedef struct {
    stream_plan plan;
    stream_input in;
    output_stream out;
    bool is_open;             /* out is */
    stream_past past;
    stream_progress progress;
    stream_sum sum;
    tally_period by;
    int code;                 /* of the exit */
    uint64_t lines;           /* of the log before the batch at hand */
    uint64_t rows, refused, flagged[STREAM_FLAGS], outside, unjudged;
    uint64_t first_refused;   /* its line */
    char reason[STREAM_REASON_MAX];
    char *patched;            /* results with their flags put in */
    size_t patched_room;
} stream_case;

static bc_status take_jobs(const arguments *a, size_t *jobs, bc_error *err)
{
    const char *text = a->value[OPTION_jobs];
    const long cores = sysconf(_SC_NPROCESSORS_ONLN);
    double n = cores > 0 ? (double)cores : 1.0;

    if (text && (bc_number_parse(text, &n, NULL) != BC_OK || !(n >= 1.0 && n <= JOBS_MAX) || n > floor(n)))
        return bc_fail(err, BC_ERR_USAGE, "--jobs %.20s: write how many threads work, 1 to %d", text, JOBS_MAX);
    *jobs = n > JOBS_MAX ? JOBS_MAX : (size_t)n;
    return BC_OK;
}

/* ---- batches in the order of the log -------------------------------------------------------------------------------- */

/* A good row that some limit has no figure for: it is not known to keep the contract. */
static bool is_unjudged(const stream_plan *p, const stream_mark *mark)
{
    const size_t limits = p->contract ? p->contract->limit_count : 0;
    const uint64_t all = limits == 64 ? UINT64_MAX : ((uint64_t)1 << limits) - 1;

    return mark->good && mark->broken == 0 && mark->known != all;
}

static void count(stream_case *s, const stream_batch *b)
{
    for (size_t i = 0; i < b->count; i++) {
        const stream_mark *mark = &b->marks[i];

        for (size_t k = 0; mark->flags >> k; k++)
            s->flagged[k] += mark->flags >> k & 1U;
        s->outside += mark->broken != 0;
        s->unjudged += is_unjudged(&s->plan, mark);
    }
    s->rows += b->count;
    if (b->refused > 0 && s->refused == 0) {
        s->first_refused = s->lines + b->marks[b->first_refused].line + 1;
        memcpy(s->reason, b->reason, sizeof s->reason);
    }
    s->refused += b->refused;
}

static bool is_flagged(const stream_batch *b)
{
    for (size_t i = 0; i < b->count; i++)
        if (b->marks[i].flags)
            return true;
    return false;
}

/* Flags stand at the end of a row, so that the threads need not know them. */
static bc_status write_flagged(stream_case *s, const stream_batch *b, bc_error *err)
{
    const size_t needed = b->out_length + b->count * STREAM_FLAGS_TEXT;
    size_t from = 0;
    char *to = s->patched;

    if (needed > s->patched_room) {
        to = realloc(s->patched, needed);
        if (!to)
            return bc_fail(err, BC_ERR_MEMORY, "not enough memory for the flags of a block");
        s->patched = to;
        s->patched_room = needed;
    }
    for (size_t i = 0; i < b->count; i++) {
        const size_t end = b->marks[i].end;

        memcpy(to, b->out + from, end - from);
        to += end - from;
        from = end;
        to += stream_flags_text(b->marks[i].flags, to);
    }
    memcpy(to, b->out + from, b->out_length - from);
    to += b->out_length - from;
    return output_put(&s->out, s->patched, (size_t)(to - s->patched), err);
}

static bc_status take_batch(void *data, stream_batch *b, bc_error *err)
{
    stream_case *s = data;
    bc_status status = BC_OK;

    if (!s->plan.alone)
        stream_compare(&s->plan, &s->past, b);
    count(s, b);
    if (s->plan.a->value[OPTION_strict] && s->refused > 0)
        return bc_fail_at(err, BC_ERR_INPUT, s->plan.path, (int)s->first_refused, "%s", s->reason);
    s->lines += b->lines;
    if (s->plan.keeps)
        status = stream_sum_add(&s->sum, b, err);
    if (status == BC_OK && !s->plan.drops)
        status = is_flagged(b) ? write_flagged(s, b, err) : output_put(&s->out, b->out, b->out_length, err);
    stream_progress_tell(&s->progress, &s->in, s->rows);
    return status;
}

/* ---- begin and end ---------------------------------------------------------------------------------------------------- */

static bc_status write_header(stream_case *s, size_t length, bc_error *err)
{
    char *text = malloc(length + STREAM_HEADER_MAX);
    bc_status status = BC_OK;

    if (!text)
        return bc_fail(err, BC_ERR_MEMORY, "not enough memory for the header");
    if (s->plan.form == STREAM_CSV && s->plan.has_header)
        status = output_put(&s->out, text, stream_put_header(&s->plan, s->in.rest, length, text), err);
    else
        status = output_put(&s->out, s->in.rest, length, err);
    free(text);
    return status;
}

/* Rows in a file that is called a page or a workbook would be taken for a spoilt one. */
static bc_status check_ending(const stream_plan *p, bc_error *err)
{
    const char *path = p->a->value[OPTION_output];
    const render_form own = p->form == STREAM_CSV ? RENDER_CSV : RENDER_JSON;
    render_form form = own;

    if (p->drops || !path || !render_form_of(path, &form) || form == own || form == RENDER_TEXT)
        return BC_OK;
    return bc_fail(err, BC_ERR_USAGE, "-o %.200s: rows come out in the form of the log, so name it %s; with --summary the ending gives the form", path,
                   own == RENDER_CSV ? ".csv" : ".ndjson");
}

static bc_status begin(stream_case *s, bc_error *err)
{
    size_t header = 0;
    bc_status status = stream_input_begin(&s->in, &s->plan, err);

    if (status == BC_OK)
        status = stream_find_columns(&s->plan, s->in.rest, s->in.rest_length, s->in.ended, &header, err);
    if (status == BC_OK)
        status = check_ending(&s->plan, err);
    if (status == BC_OK && s->plan.keeps)
        status = stream_sum_open(&s->sum, &s->plan, s->by, err);
    if (status == BC_OK && !s->plan.drops) {
        status = output_open(&s->out, s->plan.a->value[OPTION_output], err);
        s->is_open = status == BC_OK;
        status = s->is_open ? write_header(s, header, err) : status;
    }
    s->lines = stream_count_lines(s->in.rest, header);
    stream_input_skip(&s->in, header);
    return status;
}

static void tell(const stream_case *s)
{
    char state[160];
    char absent[LOG_ABSENT_TEXT];

    if (s->plan.a->value[OPTION_quiet])
        return;
    bc_state_describe(&s->plan.state, state, sizeof state);
    warn("state: %s", state);
    for (size_t i = 0; i < s->plan.header.remark_count; i++)
        warn("%s", s->plan.header.remarks[i]);
    for (size_t i = 0; i < STREAM_FLAGS; i++)
        if (s->flagged[i] > 0)
            warn("%llu row%s flagged %s: %s", (unsigned long long)s->flagged[i], s->flagged[i] > 1 ? "s" : "", stream_flag_word(i), stream_flag_meaning(i));
    if (s->plan.contract && log_header_absent(&s->plan.header, s->plan.contract, absent))
        warn("%s", absent);
    if (s->plan.contract)
        warn("%llu of %llu rows are outside of %s", (unsigned long long)s->outside, (unsigned long long)(s->rows - s->refused), s->plan.contract->name);
    if (s->unjudged > 0)
        warn("%llu row%s cannot be judged by every limit of it", (unsigned long long)s->unjudged, s->unjudged > 1 ? "s" : "");
}

/* Told in any case: rows without results are not to be found by chance. */
static void tell_refused(const stream_case *s)
{
    if (s->refused > 0)
        warn("%llu of %llu rows have no results; the first, line %llu: %s", (unsigned long long)s->refused, (unsigned long long)s->rows,
             (unsigned long long)s->first_refused, s->reason);
}

static bc_status check_end(const stream_case *s, bc_error *err)
{
    const bool follows = s->plan.a->value[OPTION_follow] != NULL;

    if (stream_interrupted() && !follows)
        return bc_fail(err, BC_ERR_FILE, "stopped by a signal; %llu rows were read", (unsigned long long)s->rows);
    return BC_OK;
}

/* What the rows as a whole come to. */
static bc_status answer_log(const stream_case *s, bc_error *err)
{
    if (s->rows == 0 && !s->plan.is_part && !s->plan.a->value[OPTION_follow])
        return bc_fail_at(err, BC_ERR_INPUT, s->plan.path, 0, "the log has no row behind its header");
    return BC_OK;
}

static bc_status finish(stream_case *s, bc_error *err)
{
    bc_status status = check_end(s, err);

    if (status == BC_OK && s->is_open)
        status = output_finish(&s->out, err);
    if (status != BC_OK)
        return status;
    s->code = s->refused == s->rows && !s->plan.is_part ? bc_exit_code(BC_ERR_INPUT) : s->outside + s->unjudged > 0 ? ANSWER_NO : 0;
    if (!s->plan.a->value[OPTION_summary])
        tell(s);
    tell_refused(s);
    status = answer_log(s, err);
    if (status == BC_OK && s->plan.keeps && (s->rows > s->refused || s->plan.is_part))
        status = stream_sum_end(&s->sum, &s->code, err);
    return status;
}

static bc_status go(stream_case *s, const arguments *a, bc_error *err)
{
    size_t jobs = 1;
    bc_status status = take_jobs(a, &jobs, err);

    if (status == BC_OK)
        status = stream_plan_open(&s->plan, a, err);
    if (status == BC_OK)
        status = stream_sum_ask(&s->plan, &s->by, err);
    if (status == BC_OK)
        status = stream_input_open(&s->in, &s->plan, err);
    if (status == BC_OK)
        status = begin(s, err);
    if (status != BC_OK)
        return status;
    stream_progress_start(&s->progress, &s->plan);
    status = stream_run(&s->plan, &s->in, jobs, take_batch, s, err);
    stream_progress_end(&s->progress);
    return status == BC_OK ? finish(s, err) : status;
}

int run_stream(const arguments *a)
{
    stream_case *s = a->value[OPTION_merge] ? NULL : calloc(1, sizeof *s);
    bc_error err;

    if (a->value[OPTION_merge])
        return stream_merge(a);
    if (!s) {
        (void)bc_fail(&err, BC_ERR_MEMORY, "not enough memory for a log");
        return complain(&err);
    }
    stream_catch_signals();
    s->in.fd = -1;
    const int code = go(s, a, &err) == BC_OK ? s->code : complain(&err);

    if (s->is_open)
        output_discard(&s->out);
    stream_input_close(&s->in);
    stream_sum_close(&s->sum);
    stream_plan_close(&s->plan);
    free(s->patched);
    free(s);
    return code;
}
