/* SPDX-License-Identifier: MIT */
/* result_text.c - a result's figures as people read them. */
#include "output/result_text_internal.h"

#include <string.h>

result_text result_text_of(const report_result *result, const render_style *style)
{
    const int own = result->digits > 0 ? result->digits : REPORT_DIGITS;
    result_text text = {.unit = strcmp(result->unit, "1") == 0 ? "" : result->unit};

    if (result->has_uncertainty)
        number_uncertain(result->value, result->uncertainty, own, text.value, text.u);
    if (style->digits > 0)
        number_significant(result->value, style->digits, text.value);
    else if (!result->has_uncertainty)
        number_significant(result->value, own, text.value);
    return text;
}
