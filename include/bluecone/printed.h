/* SPDX-License-Identifier: MIT */
/* bluecone/printed.h - which reference state, basis and edition explain the figures printed with a composition.
 *
 * A certificate may misprint its own state: "Nm3" over figures at 20 C, a gross heat under a net heading. Every
 * state of the trade is tried, and ranked by how well it explains all figures within their printed digits. */
#ifndef BLUECONE_PRINTED_H
#define BLUECONE_PRINTED_H

#include <stdbool.h>
#include <stddef.h>

#include "bluecone/composition.h"
#include "bluecone/state.h"
#include "bluecone/units.h"

#ifdef __cplusplus
extern "C" {
#endif

/* One figure as printed. */
typedef struct {
    size_t quantity;      /* index of bc_quantity_at() */
    double value;         /* in `shown` */
    double half;          /* half of its last printed digit, in `shown`; above zero */
    bc_unit own, shown;   /* unit of the quantity, and the printed one; what a scf or Nm3 counts is not believed */
    char unit[BC_PRINTED_BYTES];
} bc_printed_figure;

typedef struct {
    size_t count;
    bc_printed_figure figures[BC_PRINTED_MAX];
} bc_printed;

/* Adds a figure.
 *
 *   id     a quantity
 *   text   number and unit; without a unit that of the quantity: "41.2 MJ/m3", "0.6089"
 *
 * BC_ERR_USAGE: no such quantity or unit, or no room; BC_ERR_INPUT: no number. */
BC_API BC_MUST_USE bc_status bc_printed_add(bc_printed *printed, const char *id, const char *text, bc_error *err);

/* How well figures printed belong to a state. */
typedef enum {
    BC_FIT_DIGITS,      /* every figure within half of its last digit */
    BC_FIT_UNCERTAINTY, /* within that and twice the standard uncertainty of composition and tables */
    BC_FIT_NONE
} bc_fit_class;

/* A state, and what it makes of the figures. */
typedef struct {
    bc_state state;
    bool ideal;           /* figures of the ideal gas */
    bool exchanged;       /* net heats stand under gross headings, and gross under net ones */
    int oddity;           /* how uncommon it is, 0 being the commonest: of equal fits the plainer leads */
    double residual[BC_PRINTED_MAX]; /* computed less printed, in the printed unit */
    double worst;         /* the largest residual, in halves of its last digit */
    bc_fit_class fit;
} bc_fit;

#define BC_FIT_MAX 8 /* states of a ranking that are kept */

/* The best states, best first. */
typedef struct {
    size_t count;
    bc_fit best[BC_FIT_MAX];
    size_t explain;       /* states that explain all figures as well as the first one, by its class; may exceed count */
} bc_fits;

/* Tries combustion and metering at 0, 15, 20, 25 C and 60 F, 101.325 kPa and 14.73 psia, both editions, dry and saturated,
 * real and ideal, heats as headed and exchanged.
 *
 *   spread    uncertainty of the composition; NULL when none was stated
 *   fits      out: untouched on failure
 *
 * BC_ERR_USAGE: no figures; BC_ERR_RANGE: the gas has no such figure at any state. */
BC_API BC_MUST_USE bc_status bc_printed_fit(const bc_printed *printed, const bc_gas *gas, const bc_spread *spread, bc_fits *fits,
                                            bc_error *err);

#ifdef __cplusplus
}
#endif

#endif
