/* SPDX-License-Identifier: MIT */
/* report_judged.c - what a verdict comes to where nobody said so. */
#include "output/report.h"

report_judgement report_judged(const report *r)
{
    for (size_t i = 0; r->judgement == REPORT_UNJUDGED && i < r->check_count; i++)
        if (!r->checks[i].ok)
            return REPORT_NO;
    return r->judgement;
}
