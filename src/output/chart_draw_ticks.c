/* SPDX-License-Identifier: MIT */
/* chart_draw_ticks.c - ticks at round numbers. */
#include "output/chart_scale_internal.h"

#include "output/number_text_internal.h"

#include <math.h>
#include <stdio.h>

#define CLOSE         1e-9 /* of a step: what rounding may do to a tick on the edge */
#define FIXED_BELOW   1e7  /* greater numbers need an exponent to fit beside an axis */
#define DECIMALS_MOST 6
#define MINUS         "\xE2\x88\x92" /* U+2212, as long as a plus */

double chart_step(double span, int wanted)
{
    const double raw = span / wanted;
    const double power = pow(10.0, floor(log10(raw)));
    const double parts = raw / power * (1.0 - CLOSE);

    return power * (parts <= 1.0 ? 1.0 : parts <= 2.0 ? 2.0 : parts <= 5.0 ? 5.0 : 10.0);
}

/* The digits that tell neighbouring ticks apart. */
static void write_number(double value, double step, double greatest, char text[NUMBER_TEXT_MAX])
{
    const int decimals = step >= 1.0 ? 0 : (int)ceil(-log10(step) - CLOSE);

    if (greatest < FIXED_BELOW && decimals <= DECIMALS_MOST)
        number_decimals(value, decimals, text);
    else
        number_plain(value, 1 + (int)ceil(fmax(log10(greatest / step), 0.0)), text);
}

static double first_of(chart_range range, double step)
{
    return ceil(range.low / step - CLOSE);
}

static double last_of(chart_range range, double step)
{
    return floor(range.high / step + CLOSE);
}

/* One tick alone gives no scale. */
static double step_of_two_ticks(chart_range range, int wanted)
{
    double step = chart_step(range.high - range.low, wanted);

    for (int more = 2 * wanted; more <= 4 * CHART_TICKS_MAX && last_of(range, step) <= first_of(range, step);
         more *= 2)
        step = chart_step(range.high - range.low, more);
    return step;
}

size_t chart_number_ticks(chart_range range, int wanted, chart_tick ticks[CHART_TICKS_MAX])
{
    const double step = step_of_two_ticks(range, wanted);
    const double first = first_of(range, step), last = last_of(range, step);
    const double greatest = fmax(fabs(range.low), fabs(range.high));
    size_t count = 0;

    while (count < CHART_TICKS_MAX && first + (double)count <= last) {
        const double at = (first + (double)count) * step;
        char text[NUMBER_TEXT_MAX];

        write_number(at, step, greatest, text);
        ticks[count] = (chart_tick){.at = at};
        snprintf(ticks[count].text, sizeof ticks[count].text, "%s%s", *text == '-' ? MINUS : "",
                 *text == '-' ? text + 1 : text);
        count++;
    }
    return count;
}
