/* SPDX-License-Identifier: MIT */
/* stream_progress.c - a line on a terminal that tells how far the log is read; nothing anywhere else. */
#include "cli/stream.h"

#include <stdio.h>
#include <string.h>
#include <time.h>
#include <unistd.h>

#define EVERY_S 0.5
#define ERASE "\r\033[K" /* ECMA-48: to the begin of the line, and erase it */

static double now_s(void)
{
    struct timespec t = {0, 0};

    (void)clock_gettime(CLOCK_MONOTONIC, &t);
    return (double)t.tv_sec + 1e-9 * (double)t.tv_nsec;
}

/* Rows on the same terminal would be torn by it. */
void stream_progress_start(stream_progress *g, const stream_plan *p)
{
    const bool rows_shown = !p->drops && !p->a->value[OPTION_output] && isatty(STDOUT_FILENO);

    *g = (stream_progress){.is_on = isatty(STDERR_FILENO) && !p->a->value[OPTION_quiet] && !rows_shown};
    g->begun_s = g->is_on ? now_s() : 0.0;
    g->told_s = g->begun_s;
}

void stream_progress_tell(stream_progress *g, const stream_input *in, uint64_t rows)
{
    char left[64] = "";

    if (!g->is_on)
        return;
    const double now = now_s();

    if (now - g->told_s < EVERY_S)
        return;
    const double spent = now - g->begun_s;
    const double bytes = (double)in->bytes;

    if (in->size > in->bytes && !in->follows)
        (void)snprintf(left, sizeof left, ", %.0f %%, %.0f s left", 100.0 * bytes / (double)in->size, spent * ((double)in->size / bytes - 1.0));
    (void)fprintf(stderr, ERASE "%.1f MB, %.2f million rows, %.0f rows/s%s", bytes * 1e-6, (double)rows * 1e-6, (double)rows / spent, left);
    g->told_s = now;
    g->was_told = true;
}

void stream_progress_end(stream_progress *g)
{
    if (g->was_told)
        (void)fputs(ERASE, stderr);
    g->was_told = false;
}
