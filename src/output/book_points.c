/* SPDX-License-Identifier: MIT */
/* book_points.c - the points of a chart as numbers on a sheet. */
#include "output/book_chart_internal.h"

#include <math.h>

#define DIGITS       6 /* of the greatest value */
#define DECIMALS_MAX 15

static bool same_x(const report_series *a, const report_series *b)
{
    if (a->kind != b->kind || a->kind == REPORT_SPANS || a->point_count != b->point_count)
        return false;
    for (size_t i = 0; i < a->point_count; i++)
        if (a->points[i].x < b->points[i].x || a->points[i].x > b->points[i].x)
            return false;
    return true;
}

void book_range(const report_chart *chart, bool of_x, double *low, double *high)
{
    const report_axis *axis = of_x ? &chart->x : &chart->y;

    *low = HUGE_VAL;
    *high = -HUGE_VAL;
    for (size_t i = 0; i < chart->series_count; i++)
        for (size_t k = 0; k < chart->series[i].point_count; k++) {
            const report_point *point = &chart->series[i].points[k];

            *low = fmin(*low, of_x ? point->x : point->y);
            *high = fmax(*high, of_x ? point->x : point->y);
        }
    for (size_t i = 0; i < chart->mark_count; i++) {
        const report_mark *mark = &chart->marks[i];

        if (mark->kind == (of_x ? REPORT_MARK_Y : REPORT_MARK_X)) /* lies across the other axis */
            continue;
        *low = fmin(*low, of_x ? mark->x : mark->y);
        *high = fmax(*high, of_x ? mark->x : mark->y);
    }
    if (axis->fixed || *low > *high) {
        *low = axis->low;
        *high = axis->high;
    }
}

int book_decimals(const report_chart *chart, bool of_x)
{
    double low = 0.0, high = 0.0;

    book_range(chart, of_x, &low, &high);
    const double most = fmax(fabs(low), fabs(high));
    const double before_point = most > 0.0 && isfinite(most) ? floor(log10(most)) + 1.0 : 1.0;
    return (int)fmax(0.0, fmin(DECIMALS_MAX, DIGITS - before_point));
}

static void put_heads(book_points *t, size_t column, const report_axis *axis, const char *series)
{
    const char *const heads[BOOK_CHART_HEAD] = {axis->label, axis->unit, series};

    for (lxw_row_t i = 0; i < BOOK_CHART_HEAD; i++) {
        t->s.row = i;
        book_put_head(&t->s, column, true, heads[i]);
    }
}

static void put_value(book_points *t, size_t column, const report_axis *axis, double value)
{
    const bool named = axis->name_count > 0 && value >= 0.0 && value < (double)axis->name_count;
    char shown[NUMBER_TEXT_MAX];

    number_decimals(value, axis == &t->chart->x ? t->decimals_x : t->decimals_y, shown);
    if (t->is_bars && named)
        book_put_text(&t->s, column, BOOK_PLAIN, axis->names[(size_t)value]);
    else if (axis->is_time)
        book_put_time(&t->s, column, value);
    else
        book_put_number(&t->s, column, value, shown);
}

/* A row of a point: spans stay apart by an empty row behind each two points. */
static lxw_row_t row_of(const report_series *series, size_t point)
{
    const size_t gaps = series->kind == REPORT_SPANS ? point / 2 : 0;

    return (lxw_row_t)(BOOK_CHART_HEAD + point + gaps);
}

static void put_points(book_points *t, const report_series *series, const report_axis *axis, lxw_col_t column)
{
    const bool closed = series->kind == REPORT_OUTLINE || series->kind == REPORT_REGION;
    const size_t count = series->point_count + (closed && series->point_count > 0);

    for (size_t i = 0; i < count; i++) {
        const report_point *point = &series->points[i % series->point_count];

        t->s.row = row_of(series, i);
        put_value(t, column, axis, axis == &t->chart->x ? point->x : point->y);
    }
}

book_place book_put_series(book_points *t, size_t index, book_place before)
{
    const report_series *series = &t->chart->series[index];
    const bool closed = series->kind == REPORT_OUTLINE || series->kind == REPORT_REGION;
    book_place at = before;

    if (index == 0 || !same_x(series, series - 1)) {
        at.x = (lxw_col_t)t->next++;
        put_heads(t, at.x, &t->chart->x, "");
        put_points(t, series, &t->chart->x, at.x);
    }
    at.y = (lxw_col_t)t->next++;
    at.last = series->point_count == 0 ? BOOK_CHART_HEAD : row_of(series, series->point_count - 1) + closed;
    put_heads(t, at.y, &t->chart->y, series->label);
    put_points(t, series, &t->chart->y, at.y);
    return at;
}

book_place book_put_extra(book_points *t, const report_series *series)
{
    const book_place at = {(lxw_col_t)t->next, (lxw_col_t)(t->next + 1),
                           (lxw_row_t)(BOOK_CHART_HEAD + series->point_count - 1)};

    t->next += 2;
    put_heads(t, at.x, &t->chart->x, "");
    put_points(t, series, &t->chart->x, at.x);
    put_heads(t, at.y, &t->chart->y, series->label);
    put_points(t, series, &t->chart->y, at.y);
    return at;
}
