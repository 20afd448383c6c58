/* SPDX-License-Identifier: MIT */
/* bluecone/air_index.h - the air that a burner's orifice draws its gas to need: A/sqrt(d). */
#ifndef BLUECONE_AIR_INDEX_H
#define BLUECONE_AIR_INDEX_H

#include "bluecone/gas.h"
#include "bluecone/iso6976.h"
#include "bluecone/status.h"

#ifdef __cplusplus
extern "C" {
#endif

/* Air index (combustion air requirement index) A/sqrt(d), m3 dry air per m3 gas.
 *
 *   reference   state of the volumes; its edition of ISO 6976 gives Z and d
 *   gas         as metered
 *   index       out: untouched on failure
 *
 * With one orifice, one gas pressure and one air flow the air factor changes as index(old)/index(new): exact for any
 * two gases, while the Wobbe ratio is not where hydrogen or carbon monoxide burn.
 * BC_ERR_RANGE: the gas needs no air. Source: Bernoulli's equation and the stoichiometric balance of
 * bluecone/oxidant.h, whose dry air it takes. Volumes are real ones: A is `air-demand`, which is molar, times Z(air)/Z. */
BC_API BC_MUST_USE bc_status bc_air_index(const bc_reference *reference, const bc_gas *gas, double *index, bc_error *err);

#ifdef __cplusplus
}
#endif

#endif
