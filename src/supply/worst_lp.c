/* SPDX-License-Identifier: MIT */
/* worst_lp.c - the dual simplex method for bounded columns, on a dense tableau.
 *
 * With every column at the bound that its cost prefers the rows alone are violated: no first phase is
 * needed. Each step takes a violated row out of the basis and lets the column in that loses least. */
#include "supply/worst_lp.h"

#include <math.h>
#include <string.h>

#define PIVOT_MIN 1e-9 /* of a row scaled to one: smaller ones would be rounding */
#define NO_COLUMN LP_COLUMNS
#define NO_ROW LP_ROWS

/* Least and greatest value of a row over the bounds of the columns. */
static void activity(const lp_problem *lp, const double row[], double *least, double *most)
{
    *least = 0.0;
    *most = 0.0;
    for (size_t j = 0; j < lp->columns; j++) {
        const double a = row[j] * lp->lower[j];
        const double b = row[j] * lp->upper[j];

        *least += fmin(a, b);
        *most += fmax(a, b);
    }
}

void lp_add_row(lp_problem *lp, const double row[], double lo, double hi)
{
    double largest = 0.0;

    for (size_t j = 0; j < lp->columns; j++)
        largest = fmax(largest, fabs(row[j]));
    if (largest == 0.0 && lo <= 0.0 && hi >= 0.0)
        return;
    if (lp->rows == LP_ROWS) /* there is room for all that a space may hold; and what lacks a row still bounds it */
        return;
    const double scale = largest > 0.0 ? 1.0 / largest : 1.0;

    for (size_t j = 0; j < lp->columns; j++)
        lp->row[lp->rows][j] = row[j] * scale;
    lp->lo[lp->rows] = lo * scale;
    lp->hi[lp->rows] = hi * scale;
    lp->rows++;
}

/* An open end of a row becomes the one that the columns imply. */
static void effective_ends(const lp_problem *lp, size_t i, double *lo, double *hi)
{
    double least, most;

    *lo = lp->lo[i];
    *hi = lp->hi[i];
    if (isfinite(*lo) && isfinite(*hi))
        return;
    activity(lp, lp->row[i], &least, &most);
    if (!isfinite(*lo))
        *lo = isfinite(*hi) ? fmin(least, *hi) : least;
    if (!isfinite(*hi))
        *hi = fmax(most, *lo);
}

static void load(const lp_problem *lp, lp_work *w)
{
    const size_t n = lp->columns;

    w->plain = false;
    for (size_t j = 0; j < n; j++) {
        w->nonbasic[j] = j;
        w->low[j] = lp->lower[j];
        w->high[j] = lp->upper[j];
        w->d[j] = lp->cost[j];
        w->at[j] = w->d[j] > 0.0 ? lp->upper[j] : lp->lower[j];
    }
    for (size_t i = 0; i < lp->rows; i++) {
        w->basic[i] = n + i;
        effective_ends(lp, i, &w->low[n + i], &w->high[n + i]);
        memcpy(w->t[i], lp->row[i], n * sizeof w->t[i][0]);
    }
}

static void evaluate_basics(const lp_problem *lp, lp_work *w)
{
    for (size_t i = 0; i < lp->rows; i++) {
        double beta = 0.0;

        for (size_t j = 0; j < lp->columns; j++)
            beta += w->t[i][j] * w->at[j];
        w->beta[i] = beta;
    }
}

/* How far a basic variable is above its range (positive) or below it (negative). */
static double excess(const lp_work *w, size_t i)
{
    const size_t b = w->basic[i];

    if (w->beta[i] > w->high[b])
        return w->beta[i] - w->high[b];
    return w->beta[i] < w->low[b] ? w->beta[i] - w->low[b] : 0.0;
}

/* The row that leaves: the most violated one, or by Bland's rule that of the lowest variable. */
static size_t leaving_row(const lp_problem *lp, const lp_work *w)
{
    size_t row = NO_ROW;
    double worst = LP_TOLERANCE;

    for (size_t i = 0; i < lp->rows; i++) {
        const double e = fabs(excess(w, i));

        if (e <= LP_TOLERANCE)
            continue;
        if (w->plain ? row == NO_ROW || w->basic[i] < w->basic[row] : e > worst) {
            row = i;
            worst = e;
        }
    }
    return row;
}

/* True when a change of a nonbasic variable off its bound brings the row nearer to its range. */
static bool helps(const lp_work *w, size_t row, size_t j, double direction)
{
    const size_t id = w->nonbasic[j];
    const double slope = w->t[row][j] * direction; /* above zero: the variable has to fall */

    if (fabs(slope) < PIVOT_MIN || w->low[id] >= w->high[id])
        return false;
    return slope > 0.0 ? w->at[j] > w->low[id] : w->at[j] < w->high[id];
}

/* Least loss first; of equal losses the larger pivot, or by Bland's rule the lower variable. */
static bool comes_before(const lp_work *w, size_t row, size_t a, size_t b)
{
    if (w->ratio[a] != w->ratio[b])
        return w->ratio[a] < w->ratio[b];
    if (w->plain)
        return w->nonbasic[a] < w->nonbasic[b];
    return fabs(w->t[row][a]) > fabs(w->t[row][b]);
}

/* Candidates to enter for a row, in order; returns how many. */
static size_t candidates(const lp_problem *lp, lp_work *w, size_t row, double direction)
{
    size_t count = 0;

    for (size_t j = 0; j < lp->columns; j++) {
        if (!helps(w, row, j, direction))
            continue;
        w->ratio[j] = fabs(w->d[j] / w->t[row][j]);
        size_t k = count++;

        for (; k > 0 && comes_before(w, row, j, w->order[k - 1]); k--)
            w->order[k] = w->order[k - 1];
        w->order[k] = j;
    }
    return count;
}

/* Dual ratio test: a candidate whose whole range does not mend the row goes to its other bound, and the
 * next is tried. NO_COLUMN: all of them together do not, nothing meets the rows. */
static size_t entering_column(const lp_problem *lp, lp_work *w, size_t row)
{
    const double direction = excess(w, row) > 0.0 ? 1.0 : -1.0;
    const size_t count = candidates(lp, w, row, direction);
    double missing = fabs(excess(w, row));

    for (size_t k = 0; k < count; k++) {
        const size_t j = w->order[k];
        const size_t id = w->nonbasic[j];
        const double gain = fabs(w->t[row][j]) * (w->high[id] - w->low[id]);

        if (gain >= missing || (w->plain && k == 0))
            return j;
        missing -= gain;
        w->at[j] = w->at[j] == w->low[id] ? w->high[id] : w->low[id];
    }
    return missing > LP_TOLERANCE || count == 0 ? NO_COLUMN : w->order[count - 1];
}

static void pivot(const lp_problem *lp, lp_work *w, size_t row, size_t column)
{
    const double over = 1.0 / w->t[row][column];
    double *pivot_row = w->t[row];
    const size_t id = w->basic[row];

    for (size_t j = 0; j < lp->columns; j++)
        pivot_row[j] *= -over;
    pivot_row[column] = over;
    for (size_t i = 0; i <= lp->rows; i++) {
        double *t = i < lp->rows ? w->t[i] : w->d; /* the cost is one more row */
        const double factor = t[column];

        if (i == row || factor == 0.0)
            continue;
        t[column] = 0.0;
        for (size_t j = 0; j < lp->columns; j++)
            t[j] += factor * pivot_row[j];
    }
    w->at[column] = w->beta[row] > w->high[id] ? w->high[id] : w->low[id];
    w->basic[row] = w->nonbasic[column];
    w->nonbasic[column] = id;
}

double lp_proven_bound(const lp_problem *lp, const double cost[], const double y[])
{
    double d[LP_COLUMNS];
    double bound = 0.0;

    for (size_t j = 0; j < lp->columns; j++)
        d[j] = cost ? cost[j] : 0.0;
    for (size_t i = 0; i < lp->rows; i++) {
        double lo, hi;

        if (y[i] == 0.0)
            continue;
        effective_ends(lp, i, &lo, &hi);
        bound += fmax(y[i] * lo, y[i] * hi);
        for (size_t j = 0; j < lp->columns; j++)
            d[j] -= y[i] * lp->row[i][j];
    }
    for (size_t j = 0; j < lp->columns; j++)
        bound += fmax(d[j] * lp->lower[j], d[j] * lp->upper[j]);
    return bound;
}

/* Multipliers of the rows: the costs of those that are not basic. */
static void read_optimum(const lp_problem *lp, const lp_work *w, lp_answer *answer)
{
    const size_t n = lp->columns;

    memset(answer->y, 0, sizeof answer->y);
    for (size_t j = 0; j < n; j++) {
        if (w->nonbasic[j] < n)
            answer->x[w->nonbasic[j]] = w->at[j];
        else
            answer->y[w->nonbasic[j] - n] = w->d[j];
    }
    for (size_t i = 0; i < lp->rows; i++)
        if (w->basic[i] < n) {
            const size_t j = w->basic[i];

            answer->x[j] = fmin(fmax(w->beta[i], lp->lower[j]), lp->upper[j]);
        }
    answer->value = 0.0;
    for (size_t j = 0; j < n; j++)
        answer->value += lp->cost[j] * answer->x[j];
    answer->bound = lp_proven_bound(lp, lp->cost, answer->y);
}

/* A row that cannot be mended says basic - sum t nonbasic = 0 with a left side that is not: in terms of
 * the rows these are the multipliers of a proof. */
static lp_status prove_infeasible(const lp_problem *lp, const lp_work *w, size_t row, lp_answer *answer)
{
    const size_t n = lp->columns;
    const double sign = excess(w, row) > 0.0 ? -1.0 : 1.0;

    memset(answer->y, 0, sizeof answer->y);
    for (size_t j = 0; j < n; j++)
        if (w->nonbasic[j] >= n)
            answer->y[w->nonbasic[j] - n] = sign * w->t[row][j];
    if (w->basic[row] >= n)
        answer->y[w->basic[row] - n] = -sign;
    /* a tenth: what rounding could add to a violation of at least the tolerance is far below it */
    return lp_proven_bound(lp, NULL, answer->y) < -0.1 * LP_TOLERANCE ? LP_INFEASIBLE : LP_UNSOLVED;
}

void lp_maximise(const lp_problem *lp, lp_work *w, lp_answer *answer)
{
    const size_t patience = 20 + 2 * (lp->rows + lp->columns);

    load(lp, w);
    answer->status = LP_UNSOLVED;
    for (size_t step = 0; step < 10 * patience; step++) {
        w->plain = step >= patience;
        evaluate_basics(lp, w);
        const size_t row = leaving_row(lp, w);

        if (row == NO_ROW) {
            answer->status = LP_OPTIMAL;
            break;
        }
        const size_t column = entering_column(lp, w, row);

        if (column == NO_COLUMN) {
            evaluate_basics(lp, w);
            answer->status = prove_infeasible(lp, w, row, answer);
            if (answer->status == LP_INFEASIBLE)
                return;
            break;
        }
        pivot(lp, w, row, column);
    }
    read_optimum(lp, w, answer);
}
