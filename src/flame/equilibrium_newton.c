/* SPDX-License-Identifier: MIT */
/* equilibrium_newton.c - Newton's iteration for the composition of least Gibbs energy.
 *
 * Unknown are the steps of the component potentials, d_i, of ln n and of ln T. Each species follows them:
 *   d ln n_j = sum_i v_ji d_i + d ln n + (H_j/RT) d ln T - alpha_j,   alpha_j = mu_j - sum_i v_ji mu_i
 * with mu_j = G_j/RT + ln n_j - ln n + ln p. The balances of components, of all moles and of enthalpy,
 * linearised, close the system (Gordon and McBride, NASA RP-1311, 1994, (2.24) to (2.26) in another basis).
 */
#include "flame/equilibrium_internal.h"

#include "bluecone/thermo.h"

#include <math.h>

/* Step control of Gordon and McBride, section 3.3: species above TRACE move by at most e^2 a step, n and T
 * by e^0.4; species below it grow to RARE at most. */
#define LN_TRACE    (-18.420681)
#define LN_RARE     (-9.2103404)
#define STEP_MAX    2.0
#define STEP_WEIGHT 5.0

/* The last step: Newton squares it, so the balances close to about 1e-12. */
#define STEP_LAST 1.0e-6

/* Steps between looks at whether the components are still the abundant species. */
#define LOOK_EVERY 5

typedef struct {
    double a[UNKNOWNS][UNKNOWNS + 1]; /* symmetric; the last column is the right-hand side */
} newton_system;

typedef struct {
    double unknown[UNKNOWNS];
    double ln_moles[PRODUCT_COUNT];
} newton_step;

/* alpha_j of every species: how far it is from equilibrium with its components. */
static void find_affinities(const equilibrium *e, double alpha[PRODUCT_COUNT])
{
    double mu[REACTING] = {0.0};
    const double shift = e->ln_p - e->ln_n;

    for (size_t i = 0; i < e->components; i++)
        mu[i] = e->g[e->component[i]] + e->ln_moles[e->component[i]] + shift;
    for (size_t j = 0; j < e->species; j++) {
        const double *v = e->v[j];

        alpha[j] = e->g[j] + e->ln_moles[j] + shift -
                   (v[0] * mu[0] + v[1] * mu[1] + v[2] * mu[2] + v[3] * mu[3] + v[4] * mu[4]);
    }
}

/* Sums over the species: sum n v v^T and, at the right, sum n (alpha - 1) v. */
static void sum_species(const equilibrium *e, const double alpha[PRODUCT_COUNT], newton_system *s)
{
    for (size_t j = 0; j < e->species; j++) {
        const double n = e->moles[j], right = n * (alpha[j] - 1.0);
        const double *v = e->v[j];

        for (int row = 0; row < UNKNOWNS; row++) {
            const double nv = n * v[row];

            for (int column = row; column < UNKNOWNS; column++)
                s->a[row][column] += nv * v[column];
            s->a[row][UNKNOWNS] += right * v[row];
        }
    }
}

static void complete_system(const equilibrium *e, newton_system *s)
{
    double cp = e->inert_cp;

    for (size_t j = 0; j < e->species; j++)
        cp += e->moles[j] * e->cp[j];
    for (size_t i = 0; i < e->components; i++)
        s->a[i][UNKNOWNS] += e->amount[i];
    for (size_t i = e->components; i < REACTING; i++)
        s->a[i][i] = 1.0;
    s->a[LN_N][LN_N] -= e->n;
    s->a[LN_N][UNKNOWNS] += e->n - e->inert_moles;
    s->a[LN_T][LN_T] += cp;
    s->a[LN_T][UNKNOWNS] += e->h_r / e->t_k - e->inert_h;
    if (e->fixed_t) {
        for (int k = 0; k < LN_T; k++)
            s->a[k][LN_T] = 0.0;
        s->a[LN_T][LN_T] = 1.0;
        s->a[LN_T][LN_N] = s->a[LN_T][UNKNOWNS] = 0.0;
    }
}

/* Rows and columns scaled by the root of the diagonal: traces of 1e-30 then weigh as much as the rest. */
static void scale_system(const equilibrium *e, newton_system *s, double scale[UNKNOWNS])
{
    for (int i = 0; i < UNKNOWNS; i++)
        scale[i] = 1.0 / sqrt(i == LN_N ? e->n : s->a[i][i]);
    for (int i = 0; i < UNKNOWNS; i++) {
        for (int k = i; k < UNKNOWNS; k++)
            s->a[i][k] *= scale[i] * scale[k];
        s->a[i][UNKNOWNS] *= scale[i];
    }
}

/* Elimination without exchanges: the block of the components and ln T is positive definite, and what it
 * leaves of ln n is negative near the solution. Of a pivot lost in rounding (components that are no longer
 * independent in the abundant species) comes a large step, which the step control bounds, or none that is finite:
 * then the iteration is lost, and the search starts elsewhere. */
static void solve_system(newton_system *s, double x[UNKNOWNS])
{
    for (int p = 0; p < UNKNOWNS; p++) {
        double *pivot = s->a[p];

        for (int row = p + 1; row < UNKNOWNS; row++) {
            const double factor = pivot[row] / pivot[p];

            for (int column = row; column <= UNKNOWNS; column++)
                s->a[row][column] -= factor * pivot[column];
        }
    }
    for (int p = UNKNOWNS; p-- > 0;) {
        double sum = s->a[p][UNKNOWNS];

        for (int column = p + 1; column < UNKNOWNS; column++)
            sum -= s->a[p][column] * x[column];
        x[p] = sum / s->a[p][p];
    }
}

static void find_step(const equilibrium *e, newton_step *step)
{
    newton_system s = {{{0.0}}};
    double alpha[PRODUCT_COUNT], scale[UNKNOWNS], d[UNKNOWNS] = {0.0};

    find_affinities(e, alpha);
    sum_species(e, alpha, &s);
    complete_system(e, &s);
    scale_system(e, &s, scale);
    solve_system(&s, d);
    for (int i = 0; i < UNKNOWNS; i++)
        step->unknown[i] = d[i] *= scale[i];
    for (size_t j = 0; j < e->species; j++) {
        const double *v = e->v[j];

        step->ln_moles[j] = v[0] * d[0] + v[1] * d[1] + v[2] * d[2] + v[3] * d[3] + v[4] * d[4] +
                            v[5] * d[5] + v[6] * d[6] - alpha[j];
    }
}

/* Share of the step that is taken, at most 1. */
static double damping(const equilibrium *e, const newton_step *step)
{
    const double dn = step->unknown[LN_N];
    double most = STEP_WEIGHT * fmax(fabs(dn), fabs(step->unknown[LN_T])), share = 1.0;

    for (size_t j = 0; j < e->species; j++) {
        const double ln_x = e->ln_moles[j] - e->ln_n, d = step->ln_moles[j];

        if (ln_x > LN_TRACE)
            most = fmax(most, fabs(d));
        else if (d - dn > 0.0 && ln_x + d - dn > LN_RARE)
            share = fmin(share, (LN_RARE - ln_x) / (d - dn));
    }
    return most > STEP_MAX ? fmin(share, STEP_MAX / most) : share;
}

/* Moves the state; returns the largest change of a logarithm that Newton asks for. */
static double take_step(equilibrium *e, const newton_step *step, double share)
{
    double largest = fmax(fabs(step->unknown[LN_T]), fabs(step->unknown[LN_N]));

    for (size_t j = 0; j < e->species; j++) {
        equilibrium_set_moles(e, j, e->ln_moles[j] + share * step->ln_moles[j]);
        largest = fmax(largest, fabs(step->ln_moles[j]));
    }
    e->ln_n += share * step->unknown[LN_N];
    e->n = exp(e->ln_n);
    if (!e->fixed_t)
        e->t_k = fmin(fmax(e->t_k * exp(share * step->unknown[LN_T]), BC_THERMO_T_MIN_K), BC_THERMO_T_MAX_K);
    return largest;
}

typedef enum { GO_ON, ARRIVED, LOST } progress;

/* Of a step, one of whose unknowns is not finite, no amount is. fmax() would pass over it. */
static bool is_finite(const newton_step *step)
{
    double sum = 0.0;

    for (int i = 0; i < UNKNOWNS; i++)
        sum += fabs(step->unknown[i]);
    return isfinite(sum);
}

/* One step, whole only where Newton's iteration squares its error. */
static progress move(equilibrium *e)
{
    newton_step step;

    if (e->factors.t_k != e->t_k)
        equilibrium_evaluate(e);
    find_step(e, &step);
    e->iterations++;
    if (!is_finite(&step))
        return LOST;
    const double share = damping(e, &step);
    const double change = take_step(e, &step, share);

    return share == 1.0 && change < STEP_LAST ? ARRIVED : GO_ON;
}

bool equilibrium_iterate(equilibrium *e, int steps)
{
    e->range_changes = 0;
    for (int i = 1; i <= steps; i++) {
        const progress state = move(e);

        if (state == LOST)
            return false;
        if (state == GO_ON && i % LOOK_EVERY != 0)
            continue;
        const bool poor = equilibrium_components_are_poor(e);

        if (state == ARRIVED && !poor)
            return true;
        if (poor)
            equilibrium_choose_components(e);
    }
    return false;
}
