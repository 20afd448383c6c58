/* SPDX-License-Identifier: MIT */
/* value_quantities.h - how a floor offers its quantities to the one list of them all. */
#ifndef VALUE_QUANTITIES_H
#define VALUE_QUANTITIES_H

#include "bluecone/subject.h"

/* The quantities of one floor: their number, what they are, and their evaluation. Indices are valid.
 * `value` leaves the uncertainty out; NULL where evaluate() works out none. `values` fills in those that are wanted and
 * that the gas has; NULL where they share nothing that is worth it. */
typedef struct {
    size_t count;
    const bc_quantity *(*at)(size_t index);
    bc_status (*evaluate)(size_t index, const bc_subject *subject, bc_figure *figure, bc_error *err);
    bc_status (*value)(size_t index, const bc_subject *subject, double *value, bc_error *err);
    void (*values)(const bc_subject *subject, const bool wanted[], double value[]);
} quantity_source;

quantity_source value_quantities(void);

#endif
