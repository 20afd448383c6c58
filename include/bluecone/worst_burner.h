/* SPDX-License-Identifier: MIT */
/* bluecone/worst_burner.h - what the gases of a contract can do to a burner that is set on one of them.
 *
 * Open a space (bluecone/worst.h), set a burner (bluecone/burner.h), ask for each figure. The burner is left as
 * found and the gas reaches it at the temperature of the old one. Heat input, air factor and travel of a trim are
 * certified: through an orifice the gas flow goes with 1/sqrt(M Z), by volume meter with 1/Z, by mass meter with 1/M,
 * all ratios of linear sums; behind a nozzle (gas above 3 % of the absolute pressure) it has a factor that cp decides,
 * which slices of cp enclose. A trim holds the oxygen within its range and stands at an end outside of it: each part is
 * certified by itself, behind a nozzle only if it holds on every gas. The air factor of a burner that draws its air,
 * oxygen that no trim holds, the flame, and the last two figures are searched for. */
#ifndef BLUECONE_WORST_BURNER_H
#define BLUECONE_WORST_BURNER_H

#include "bluecone/burner.h"
#include "bluecone/status.h"
#include "bluecone/worst.h"

#ifdef __cplusplus
extern "C" {
#endif

/* Figures of a burner on a new gas, those of bc_burner_respond(). */
typedef enum {
    BC_BURNER_HEAT,    /* net heat input over that on the old gas, 1 */
    BC_BURNER_LAMBDA,  /* air factor, 1 */
    BC_BURNER_TRIM,    /* what holding the oxygen asks of the flow that a trim moves, over that flow untrimmed, 1 */
    BC_BURNER_FLUE_O2, /* oxygen of the flue gas on the burner's o2_basis, mole fraction; 0 at lack of air */
    BC_BURNER_FLAME,   /* adiabatic flame temperature in equilibrium, K */
    BC_BURNER_VELOCITY, /* laminar burning velocity over that of the old gas, 1; whatever the setting */
    BC_BURNER_METHANE_NUMBER, /* by the linear route, 1; whatever the setting */
    BC_BURNER_FIGURES
} bc_burner_figure;

/* Extremes of a figure over all allowed gases.
 *
 *   set        the burner on its old gas; the reference of that gas is the state that volumes are metered at
 *   extremes   out: untouched on failure
 *
 * The bound of a figure that a trim holds on every gas is the figure itself.
 * BC_ERR_USAGE: no such figure, or BC_BURNER_TRIM of a burner without trim; BC_ERR_INPUT: nothing is allowed;
 * BC_ERR_RANGE: an allowed gas has no such figure, since it does not burn or its method does not cover it; or as
 * bc_worst_ratio(). Source: own derivation from the equations of bluecone/burner.h. */
BC_API BC_MUST_USE bc_status bc_worst_burner(bc_worst *worst, const bc_burner_case *set, bc_burner_figure figure, bc_extremes *extremes,
                                             bc_error *err);

#ifdef __cplusplus
}
#endif

#endif
