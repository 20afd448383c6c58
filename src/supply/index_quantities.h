/* SPDX-License-Identifier: MIT */
/* index_quantities.h - the indices of a gas alone, for the list of quantities. */
#ifndef INDEX_QUANTITIES_H
#define INDEX_QUANTITIES_H

#include "value/value_quantities.h"

/* A gas outside of a method's range has no such quantity. */
quantity_source index_quantities(void);

#endif
