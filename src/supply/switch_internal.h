/* SPDX-License-Identifier: MIT */
/* switch_internal.h - criteria one by one, for the judgement and for shares of the new gas. */
#ifndef SWITCH_INTERNAL_H
#define SWITCH_INTERNAL_H

#include "bluecone/switch.h"

/* A pair of gases on burners in general or on one burner; new_gas changes from share to share. */
typedef struct {
    const bc_subject *old_gas, *new_gas;
    const bc_burner_case *set; /* NULL: burners in general */
    double new_gas_k;
} switch_pair;

/* The value against the limits, with the least rounding forgiven. */
bc_verdict judge_value(double value, const bc_index_limits *preferable, const bc_index_limits *acceptable);

/* How far a value is beyond limits, over the limit (over 1 where that is 0). */
double beyond(double value, const bc_index_limits *limits);

/* The criteria of indices, from all indices of the pair. Returns their number. */
size_t index_criteria(const switch_pair *pair, const bc_index indices[], bc_criterion criteria[]);

/* How many of those there are, and the index that one belongs to. */
size_t index_criterion_count(void);
size_t index_of_criterion(size_t criterion);

/* The limits of a burner, from its response; `adjusted` may be NULL. Returns their number. */
size_t burner_criteria(const switch_pair *pair, const bc_burner_response *on_old, const bc_burner_response *on_new,
                       const bc_burner_response *adjusted, bc_criterion criteria[]);

#endif
