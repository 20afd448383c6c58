/* SPDX-License-Identifier: MIT */
/* bluecone/bluecone.h - the whole library in one include.
 *
 * A gas goes through it in this order: read it (composition.h), choose a reference state (state.h), look
 * up the figures of that state (iso6976.h), ask for quantities (quantity.h), and compare it with another
 * gas (index.h).
 *
 * The caller owns every buffer; what a function returns is a value; only types with _open and _close
 * hold anything. The library keeps no state, prints nothing and never ends the process. */
#ifndef BLUECONE_BLUECONE_H
#define BLUECONE_BLUECONE_H

#include "bluecone/aga36.h"
#include "bluecone/aim.h"
#include "bluecone/air_index.h"
#include "bluecone/allowed.h"
#include "bluecone/assess.h"
#include "bluecone/blend.h"
#include "bluecone/blend_in.h"
#include "bluecone/burn.h"
#include "bluecone/burner.h"
#include "bluecone/check.h"
#include "bluecone/composition.h"
#include "bluecone/dewpoint.h"
#include "bluecone/dutton.h"
#include "bluecone/emission.h"
#include "bluecone/equilibrium.h"
#include "bluecone/flame.h"
#include "bluecone/flammability.h"
#include "bluecone/flue.h"
#include "bluecone/formation.h"
#include "bluecone/gas.h"
#include "bluecone/gbt_cp.h"
#include "bluecone/heatload.h"
#include "bluecone/humidity.h"
#include "bluecone/index.h"
#include "bluecone/iso6976.h"
#include "bluecone/limits.h"
#include "bluecone/log.h"
#include "bluecone/mcp.h"
#include "bluecone/methane_number.h"
#include "bluecone/number.h"
#include "bluecone/offer.h"
#include "bluecone/optimum.h"
#include "bluecone/oxidant.h"
#include "bluecone/printed.h"
#include "bluecone/quantity.h"
#include "bluecone/ratio.h"
#include "bluecone/species.h"
#include "bluecone/state.h"
#include "bluecone/status.h"
#include "bluecone/steam.h"
#include "bluecone/subject.h"
#include "bluecone/sweep.h"
#include "bluecone/switch.h"
#include "bluecone/terms.h"
#include "bluecone/thermo.h"
#include "bluecone/trade.h"
#include "bluecone/trap.h"
#include "bluecone/units.h"
#include "bluecone/weaver.h"
#include "bluecone/wobbe.h"
#include "bluecone/worst.h"
#include "bluecone/worst_burner.h"

#endif
