/* SPDX-License-Identifier: MIT */
/* flame_quantities.h - the combustion figures that depend on the gas alone, for the list of quantities. */
#ifndef FLAME_QUANTITIES_H
#define FLAME_QUANTITIES_H

#include "value/value_quantities.h"

/* Figures of the gas burnt with stoichiometric dry air, everything in at 25 C and 1 atm. */
quantity_source flame_quantities(void);

#endif
