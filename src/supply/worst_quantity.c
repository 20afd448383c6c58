/* SPDX-License-Identifier: MIT */
/* worst_quantity.c - extremes of a quantity by its number: certified where its form is known. */
#include "supply/worst_internal.h"

#include "bluecone/quantity.h"

#include <math.h>

typedef struct {
    size_t quantity;
    const bc_reference *reference;
} question;

static bc_status figure_of(const question *q, const bc_gas *gas, double *value, bc_error *err)
{
    bc_subject subject;
    bc_figure figure;
    bc_status status = bc_subject_make(q->reference, gas, NULL, &subject, err);

    if (status == BC_OK)
        status = bc_quantity_evaluate(q->quantity, &subject, &figure, err);
    if (status == BC_OK)
        *value = figure.value;
    return status;
}

/* A bc_objective. */
static double objective(const bc_gas *gas, void *context)
{
    double value = HUGE_VAL;

    return figure_of(context, gas, &value, NULL) == BC_OK ? value : HUGE_VAL;
}

/* What rises with a ratio is extreme where the ratio is. */
static bc_status translate(const question *q, bc_extreme *extreme, bc_error *err)
{
    const bc_status status = figure_of(q, &extreme->gas, &extreme->value, err);

    extreme->bound = extreme->value;
    return status;
}

bc_status bc_worst_quantity(bc_worst *w, size_t quantity, const bc_reference *reference, bc_extremes *extremes, bc_error *err)
{
    question q = {quantity, reference};
    bc_extremes found;
    bc_ratio ratio;
    worst_term term;

    /* no ratio, or one over a window of water: then nothing but its values is known */
    if (bc_quantity_at(quantity) &&
        (bc_ratio_of_quantity(quantity, reference, &ratio, NULL) != BC_OK || worst_term_of(w, &ratio, &term, NULL) != BC_OK))
        return bc_worst_search(w, objective, &q, extremes, err);
    bc_status status = bc_ratio_of_quantity(quantity, reference, &ratio, err);

    if (status == BC_OK)
        status = bc_worst_ratio(w, &ratio, &found, err);
    if (status == BC_OK && ratio.proxy)
        status = translate(&q, &found.min, err);
    if (status == BC_OK && ratio.proxy)
        status = translate(&q, &found.max, err);
    if (status == BC_OK)
        *extremes = found;
    return status;
}
