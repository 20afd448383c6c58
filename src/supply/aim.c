/* SPDX-License-Identifier: MIT */
/* aim.c - shares for aims: along a line, or by descents and Newton's method. */
#include "bluecone/aim.h"

#include "base/error_internal.h"
#include "bluecone/sweep.h"
#include "supply/linear.h"
#include "supply/minimise.h"

#include <math.h>
#include <string.h>

#define STEP 1e-6           /* of a share, for the slopes of Newton's method */
#define NEWTON_MAX 30
#define REACHED 1e-12       /* of an aim: what is left is rounding */
#define OUTSIDE 1e-9        /* of a share below zero: rounding */
#define SAME 1e-6           /* of a share: solutions nearer to each other are one */
#define UNDEFINED 10.0      /* (figure - aim)/aim where the gas has no such figure */

typedef struct {
    const bc_aim_problem *p;
    size_t free_count;
    size_t free_part[BC_BLEND_PARTS_MAX];
    double left; /* what the fixed shares leave to the free ones */
} question;

static bc_status ask(const bc_aim_problem *p, question *q, bc_error *err)
{
    *q = (question){.p = p, .left = 1.0};
    for (size_t i = 0; i < p->mixer->count; i++) {
        if (p->high[i] > p->low[i])
            q->free_part[q->free_count++] = i;
        else
            q->left -= p->low[i];
    }
    if (q->free_count == p->aims->limit_count + 1)
        return BC_OK;
    return bc_fail(err, BC_ERR_USAGE, "%zu free shares can reach %zu aims, not %zu; free as many gases as there are aims, and one more",
                   q->free_count, q->free_count > 0 ? q->free_count - 1 : 0, p->aims->limit_count);
}

static void keep(bc_aim *aim, const double share[], size_t parts)
{
    for (size_t i = 0; i < aim->count; i++) {
        double apart = 0.0;

        for (size_t k = 0; k < parts; k++)
            apart = fmax(apart, fabs(share[k] - aim->share[i][k]));
        if (apart < SAME)
            return;
    }
    if (aim->count < BC_AIM_SOLUTIONS_MAX)
        memcpy(aim->share[aim->count++], share, parts * sizeof *share);
}

static bc_status refuse_figure(const bc_aim_problem *p, bc_error *err)
{
    return bc_fail(err, BC_ERR_RANGE, "no blend of these gases has the figure %s; ask for another one", p->aims->limits[0].id);
}

static bc_status along_line(const question *q, bc_aim *aim, bc_error *err)
{
    const bc_aim_problem *p = q->p;
    bc_blend_line line = {.mixer = p->mixer};
    double t[BC_AIM_SOLUTIONS_MAX];
    double share[BC_BLEND_PARTS_MAX];

    memcpy(line.from, p->low, sizeof line.from);
    memcpy(line.to, p->low, sizeof line.to);
    line.from[q->free_part[0]] = line.to[q->free_part[1]] = 0.0;
    line.from[q->free_part[1]] = line.to[q->free_part[0]] = q->left;
    const size_t found = bc_line_crossings(&line, p->aims, 0, p->aims->limits[0].min, t, BC_AIM_SOLUTIONS_MAX);

    aim->reached = found > 0;
    if (found == 0 && !bc_line_nearest(&line, p->aims, 0, p->aims->limits[0].min, &t[0]))
        return refuse_figure(p, err);
    for (size_t i = 0; i < (found > 0 ? found : 1); i++) {
        bc_line_shares(&line, t[i], share);
        keep(aim, share, p->mixer->count);
    }
    return BC_OK;
}

/* (figure - aim)/aim of every aim. */
static void residuals(const bc_aim_problem *p, const double share[], double r[])
{
    const bc_gas gas = bc_mixer_gas(p->mixer, share);

    for (size_t k = 0; k < p->aims->limit_count; k++) {
        const bc_limit *limit = &p->aims->limits[k];
        double value;
        const bool has = bc_limit_value(p->aims, k, &gas, &value, NULL) == BC_OK;

        r[k] = has ? (value - limit->min) / bc_limit_scale(limit) : UNDEFINED;
    }
}

/* As a program: the sum of squares, no limits but the bounds. */
static void sum_of_squares(const double x[], double *f, double c[], void *data)
{
    const bc_aim_problem *p = data;
    double r[BC_BLEND_PARTS_MAX];

    (void)c;
    residuals(p, x, r);
    *f = 0.0;
    for (size_t k = 0; k < p->aims->limit_count; k++)
        *f += r[k] * r[k];
}

/* Slopes of all residuals, and of the sum of the shares in the last row. */
static void fill_system(const question *q, const double share[], const double r[], linear_system *s)
{
    const size_t n = q->free_count;

    s->n = n;
    for (size_t j = 0; j < n; j++) {
        double moved[BC_BLEND_PARTS_MAX];
        double up[BC_BLEND_PARTS_MAX];

        memcpy(moved, share, sizeof moved);
        moved[q->free_part[j]] += STEP;
        residuals(q->p, moved, up);
        for (size_t k = 0; k + 1 < n; k++)
            s->a[k][j] = (up[k] - r[k]) / STEP;
        s->a[n - 1][j] = 1.0;
    }
    s->b[n - 1] = q->left;
    for (size_t j = 0; j < n; j++)
        s->b[n - 1] -= share[q->free_part[j]];
    for (size_t k = 0; k + 1 < n; k++)
        s->b[k] = -r[k];
}

static bool is_reached(const question *q, const double share[], const double r[])
{
    for (size_t j = 0; j < q->free_count; j++)
        if (share[q->free_part[j]] < -OUTSIDE)
            return false;
    for (size_t k = 0; k < q->p->aims->limit_count; k++)
        if (fabs(r[k]) > REACHED)
            return false;
    return true;
}

/* Newton's method; slopes of a forward difference leave it linear at the end, with a factor of 1e-6 a step. */
static bool close_in(const question *q, double share[])
{
    double r[BC_BLEND_PARTS_MAX];
    linear_system s;

    for (int step = 0; step < NEWTON_MAX; step++) {
        residuals(q->p, share, r);
        if (is_reached(q, share, r))
            return true;
        fill_system(q, share, r, &s);
        if (!linear_solve(&s))
            return false;
        for (size_t j = 0; j < q->free_count; j++) {
            share[q->free_part[j]] += s.b[j];
            if (!(fabs(share[q->free_part[j]]) < 2.0))
                return false;
        }
    }
    return false;
}

static void tidy(const question *q, double share[])
{
    for (size_t j = 0; j < q->free_count; j++)
        share[q->free_part[j]] = fmax(share[q->free_part[j]], 0.0);
}

static bc_status by_descents(const question *q, nlopt_library *l, bc_aim *aim, bc_error *err)
{
    bc_aim_problem copy = *q->p;
    double nearest[BC_BLEND_PARTS_MAX] = {0.0};
    double least = HUGE_VAL;
    double x[PROGRAM_VARIABLES_MAX] = {0.0};
    program p = {.variables = copy.mixer->count, .shares = copy.mixer->count, .sum = 1.0, .evaluate = sum_of_squares, .data = &copy};

    memcpy(p.low, copy.low, sizeof copy.low);
    memcpy(p.high, copy.high, sizeof copy.high);
    for (size_t start = 0; program_start(&p, start, x); start++) {
        if (!program_descend(l, &p, x) || program_violation(&p, x) > PROGRAM_TOLERANCE)
            continue;
        if (program_value(&p, x) < least) {
            least = program_value(&p, x);
            memcpy(nearest, x, sizeof nearest);
        }
        if (close_in(q, x)) {
            tidy(q, x);
            keep(aim, x, copy.mixer->count);
        }
    }
    aim->reached = aim->count > 0;
    if (!aim->reached && !(least < UNDEFINED * UNDEFINED))
        return refuse_figure(q->p, err);
    if (!aim->reached)
        keep(aim, nearest, copy.mixer->count);
    return BC_OK;
}

bc_status bc_aim_find(const bc_aim_problem *problem, bc_aim *aim, bc_error *err)
{
    bc_aim found = {.reached = false, .count = 0};
    nlopt_library *library = NULL;
    question q;
    bc_status status = ask(problem, &q, err);

    if (status == BC_OK && q.free_count == 2)
        status = along_line(&q, &found, err);
    else if (status == BC_OK)
        status = nlopt_library_open(&library, err);
    if (status == BC_OK && library)
        status = nlopt_library_fed(library, by_descents(&q, library, &found, err), err);
    nlopt_library_close(library);
    if (status == BC_OK)
        *aim = found;
    return status;
}
