/* SPDX-License-Identifier: MIT */
/* fuzz_part.c - the summary of a part of a log as a file: what is taken comes back as it was, can be merged, and answers
 * every question with a number. */
#include "fuzz.h"

#include "cli/stream_part.h"

#include <sys/stat.h>

static void check_spread(const tally_spread *s)
{
    fuzz_require(isfinite(s->held) && s->held >= 0.0);
    fuzz_require(!s->has_mean || (isfinite(s->mean) && isfinite(s->sd) && s->sd >= 0.0));
    fuzz_require(!s->has_energy_mean || isfinite(s->energy_mean));
    fuzz_require(isfinite(s->min) && isfinite(s->max) && s->min <= s->max);
    fuzz_require(isfinite(s->min_s) && isfinite(s->max_s));
}

static void check_span(const tally_span *s)
{
    fuzz_require(isfinite(s->from_s) && isfinite(s->until_s) && s->from_s < s->until_s);
    fuzz_require(isfinite(s->first_s) && isfinite(s->last_s) && isfinite(s->held) && isfinite(s->energy_j));
}

static void ask_figures(const tally *t)
{
    double bars[7];
    double value = 0.0;
    double before = 0.0;
    tally_spread s;

    for (size_t i = 0; i < tally_plan_of(t)->figure_count; i++) {
        tally_spreads(t, i, &s);
        check_spread(&s);
        fuzz_require(isfinite(tally_accuracy(t, i)));
        for (int k = 0; k <= 4; k++) {
            if (!tally_percentile(t, i, 0.25 * k, &value))
                break;
            fuzz_require(isfinite(value) && (k == 0 || value >= before));
            before = value;
        }
        if (s.min < s.max)
            tally_bars(t, i, s.min, s.max, 7, bars);
        for (size_t k = 0; k < tally_period_count(t) && k < 50; k++) {
            tally_period_spread(t, k, i, &s);
            check_spread(&s);
        }
        for (size_t k = 0; k < tally_trend_count(t) && k < 50; k++) {
            tally_trend_spread(t, k, i, &s);
            check_spread(&s);
        }
    }
}

static void ask(const tally *t)
{
    tally_cover cover;
    tally_span span;

    tally_covers(t, &cover);
    fuzz_require(isfinite(cover.first_s) && isfinite(cover.last_s) && isfinite(cover.held) && isfinite(cover.outside_held));
    fuzz_require(isfinite(cover.gap_s) && isfinite(cover.energy_j));
    ask_figures(t);
    for (size_t i = 0; i < tally_period_count(t); i++) {
        tally_period_at(t, i, &span);
        check_span(&span);
    }
    for (size_t i = 0; i < tally_trend_count(t); i++) {
        tally_trend_at(t, i, &span);
        check_span(&span);
    }
    for (size_t i = 0; i < tally_plan_of(t)->limit_count; i++) {
        tally_excursions e;

        tally_outside(t, i, &e);
        fuzz_require(isfinite(e.judged_held) && isfinite(e.broken_held) && isfinite(e.broken_j) && isfinite(e.worst) && isfinite(e.longest));
    }
    for (size_t i = 0; i < tally_run_count(t); i++) {
        tally_run run;

        tally_run_at(t, i, &run);
        fuzz_require(run.limit < tally_plan_of(t)->limit_count && isfinite(run.held) && isfinite(run.worst) && isfinite(run.energy_j));
    }
}

/* The file that a tally becomes, as bytes; to be freed. */
static char *bytes_of(tally *t, size_t *length)
{
    static char path[64];
    struct stat st;
    bc_error err;

    if (path[0] == '\0')
        (void)snprintf(path, sizeof path, "/dev/shm/bluecone-fuzz-part-%ld", (long)getpid());
    fuzz_require(fuzz_answer(stream_part_write(t, path, &err), &err));
    const int file = open(path, O_RDONLY);

    fuzz_require(file >= 0 && fstat(file, &st) == 0);
    char *text = malloc((size_t)st.st_size);

    fuzz_require(text != NULL && read(file, text, (size_t)st.st_size) == st.st_size);
    (void)close(file);
    (void)unlink(path);
    *length = (size_t)st.st_size;
    return text;
}

int LLVMFuzzerTestOneInput(const uint8_t *data, size_t size)
{
    tally *t = NULL;
    tally *again = NULL;
    size_t length = 0;
    size_t length_again = 0;
    bc_error err;

    if (!fuzz_answer(stream_part_read(fuzz_file(data, size), &t, &err), &err)) {
        fuzz_require(err.status == BC_ERR_INPUT && t == NULL);
        return 0;
    }
    char *text = bytes_of(t, &length);

    fuzz_require(fuzz_answer(stream_part_read(fuzz_file((const uint8_t *)text, length), &again, &err), &err));
    char *text_again = bytes_of(again, &length_again);

    fuzz_require(length == length_again && memcmp(text, text_again, length) == 0);
    free(text);
    free(text_again);
    if (fuzz_answer(tally_merge(t, again, &err), &err) && fuzz_answer(tally_settle(t, &err), &err))
        ask(t);
    else if (err.status != BC_ERR_MEMORY && fuzz_answer(tally_settle(again, &err), &err))
        ask(again);
    tally_close(again);
    tally_close(t);
    return 0;
}
