/* SPDX-License-Identifier: MIT */
/* minimise.c - descents by SLSQP with slopes by differences. */
#include "supply/minimise.h"

#include "supply/nlopt_library.h"

#include <math.h>
#include <string.h>

#define STEP 1e-5            /* of a share: second-order slopes are then good to about 1e-10 */
#define EVALUATIONS_MAX 300  /* of one descent */
#define TOWARDS 0.7          /* of the way from the middle to a corner: starts inside, apart from each other */
#define STOP_RELATIVE 1e-13
#define ROUNDING 1e-9        /* of a share: nearer to a bound it is on it */
#define TIDIED 1e-6          /* of the sum: farther off it the descent has failed and is left as it is */

/* Values and slopes at the point asked for last: objective and limits are asked for the same ones. */
typedef struct {
    const program *p;
    bool known, slopes_known;
    double x[PROGRAM_VARIABLES_MAX];
    double f, c[PROGRAM_LIMITS_MAX];
    double df[PROGRAM_VARIABLES_MAX], dc[PROGRAM_LIMITS_MAX][PROGRAM_VARIABLES_MAX];
} descent;

static size_t limits_of(const program *p)
{
    return p->inequalities + p->equalities;
}

/* dy/dx_i = (y1 - y-1)/2h, or (-3 y0 + 4 y1 - y2)/2h forward where a share would become negative. */
static void slope(descent *d, size_t i)
{
    const program *p = d->p;
    const bool forward = d->x[i] < p->low[i] + STEP;
    double at[PROGRAM_VARIABLES_MAX];
    double f[2];
    double c[2][PROGRAM_LIMITS_MAX];

    memcpy(at, d->x, sizeof at);
    at[i] = d->x[i] + STEP;
    p->evaluate(at, &f[0], c[0], p->data);
    at[i] = d->x[i] + (forward ? 2.0 * STEP : -STEP);
    p->evaluate(at, &f[1], c[1], p->data);
    const double now = forward ? -3.0 : 0.0;
    const double near = forward ? 4.0 : 1.0;

    d->df[i] = (now * d->f + near * f[0] - f[1]) / (2.0 * STEP);
    for (size_t k = 0; k < limits_of(p); k++)
        d->dc[k][i] = (now * d->c[k] + near * c[0][k] - c[1][k]) / (2.0 * STEP);
}

static void move_to(descent *d, const double x[], bool slopes)
{
    const size_t size = d->p->variables * sizeof *x;

    if (!d->known || memcmp(d->x, x, size) != 0) {
        memcpy(d->x, x, size);
        d->p->evaluate(x, &d->f, d->c, d->p->data);
        d->known = true;
        d->slopes_known = false;
    }
    if (!slopes || d->slopes_known)
        return;
    for (size_t i = 0; i < d->p->variables; i++)
        if (d->p->high[i] > d->p->low[i])
            slope(d, i);
    d->slopes_known = true;
}

static double objective(unsigned n, const double *x, double *slopes, void *data)
{
    descent *d = data;

    move_to(d, x, slopes != NULL);
    if (slopes)
        memcpy(slopes, d->df, n * sizeof *slopes);
    return d->f;
}

/* The limits from `first` on, m of them, with their slopes row by row. */
static void limits(const descent *d, size_t first, size_t m, double *result, double *slopes)
{
    const size_t n = d->p->variables;

    for (size_t k = 0; k < m; k++) {
        result[k] = d->c[first + k];
        if (slopes)
            memcpy(slopes + k * n, d->dc[first + k], n * sizeof *slopes);
    }
}

static void inequalities(unsigned m, double *result, unsigned n, const double *x, double *slopes, void *data)
{
    descent *d = data;

    (void)n;
    move_to(d, x, slopes != NULL);
    limits(d, 0, m, result, slopes);
}

/* The equalities of the program, and last the sum of the shares. */
static void equalities(unsigned m, double *result, unsigned n, const double *x, double *slopes, void *data)
{
    descent *d = data;

    move_to(d, x, slopes != NULL);
    limits(d, d->p->inequalities, m - 1, result, slopes);
    result[m - 1] = -d->p->sum;
    for (size_t i = 0; i < d->p->shares; i++)
        result[m - 1] += x[i];
    for (size_t i = 0; slopes && i < n; i++)
        slopes[(m - 1) * n + i] = i < d->p->shares ? 1.0 : 0.0;
}

static bool set_up(const nlopt_library *l, nlopt_opt opt, descent *d)
{
    const program *p = d->p;
    double tolerance[PROGRAM_LIMITS_MAX + 1];

    for (size_t i = 0; i <= PROGRAM_LIMITS_MAX; i++)
        tolerance[i] = 0.1 * PROGRAM_TOLERANCE;
    return l->set_min_objective(opt, objective, d) > 0 && l->set_lower_bounds(opt, p->low) > 0 && l->set_upper_bounds(opt, p->high) > 0
           && (p->inequalities == 0 || l->add_inequality_mconstraint(opt, (unsigned)p->inequalities, inequalities, d, tolerance) > 0)
           && l->add_equality_mconstraint(opt, (unsigned)p->equalities + 1, equalities, d, tolerance) > 0
           && l->set_ftol_rel(opt, STOP_RELATIVE) > 0 && l->set_xtol_rel(opt, STOP_RELATIVE) > 0 && l->set_maxeval(opt, EVALUATIONS_MAX) > 0;
}

/* Shares a rounding off their bounds are put on them, and what that takes from the sum goes to the largest. */
static void tidy(const program *p, double x[])
{
    double left = p->sum;
    size_t largest = 0;

    for (size_t i = 0; i < p->variables; i++) {
        x[i] = x[i] < p->low[i] + ROUNDING ? p->low[i] : x[i];
        x[i] = x[i] > p->high[i] - ROUNDING ? p->high[i] : x[i];
    }
    for (size_t i = 0; i < p->shares; i++) {
        left -= x[i];
        if (p->high[i] > p->low[i] && (p->high[largest] <= p->low[largest] || x[i] > x[largest]))
            largest = i;
    }
    if (fabs(left) < TIDIED)
        x[largest] = fmin(x[largest] + left, p->high[largest]);
}

bool program_descend(nlopt_library *l, const program *p, double x[])
{
    descent d;
    double f = 0.0;
    nlopt_opt opt = l->create(NLOPT_LD_SLSQP, (unsigned)p->variables);

    if (!opt) {
        l->starved = true;
        return false;
    }
    memset(&d, 0, sizeof d); /* slopes along shares that are fixed stay zero */
    d.p = p;
    const bool ready = set_up(l, opt, &d); /* nothing that NLopt could refuse: what it lacks is memory */

    /* A descent that stops early is judged by where it stopped, but for that reason. */
    if (!ready || l->optimize(opt, x, &f) == NLOPT_OUT_OF_MEMORY)
        l->starved = true;
    l->destroy(opt);
    tidy(p, x);
    return ready;
}

double program_value(const program *p, const double x[])
{
    double c[PROGRAM_LIMITS_MAX];
    double f = 0.0;

    p->evaluate(x, &f, c, p->data);
    return f;
}

double program_violation(const program *p, const double x[])
{
    double c[PROGRAM_LIMITS_MAX];
    double f = 0.0;
    double sum = -p->sum;

    p->evaluate(x, &f, c, p->data);
    for (size_t i = 0; i < p->shares; i++)
        sum += x[i];
    double worst = fabs(sum) - PROGRAM_TOLERANCE;

    for (size_t k = 0; k < limits_of(p); k++)
        worst = fmax(worst, k < p->inequalities ? c[k] : fabs(c[k]));
    return worst;
}

/* All shares at their lower bound but as much as there is in one of them, what is left over in the others. */
static void corner(const program *p, size_t which, double x[])
{
    double left = p->sum;

    for (size_t i = 0; i < p->shares; i++) {
        x[i] = p->low[i];
        left -= p->low[i];
    }
    for (size_t k = 0; k < p->shares && left > 0.0; k++) {
        const size_t i = (which + k) % p->shares;
        const double more = fmin(left, p->high[i] - p->low[i]);

        x[i] += more;
        left -= more;
    }
}

bool program_start(const program *p, size_t number, double x[])
{
    const size_t n = p->shares;
    double middle[PROGRAM_VARIABLES_MAX] = {0.0};
    double at[PROGRAM_VARIABLES_MAX];

    if (n == 0 || number > 2 * n)
        return false;
    for (size_t k = 0; k < n; k++) {
        corner(p, k, at);
        for (size_t i = 0; i < n; i++)
            middle[i] += at[i] / (double)n;
    }
    corner(p, number == 0 ? 0 : (number - 1) % n, at);
    const double towards = number <= n ? TOWARDS : 1.0;
    const double weight = number == 0 ? 0.0 : towards;

    for (size_t i = 0; i < n; i++)
        x[i] = (1.0 - weight) * middle[i] + weight * at[i];
    return true;
}
