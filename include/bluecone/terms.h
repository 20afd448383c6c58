/* SPDX-License-Identifier: MIT */
/* bluecone/terms.h - what a blend costs, and the CO2 it stands for, per unit of its gross heat. */
#ifndef BLUECONE_TERMS_H
#define BLUECONE_TERMS_H

#include <stdbool.h>

#include "bluecone/blend.h"
#include "bluecone/offer.h"

#ifdef __cplusplus
extern "C" {
#endif

/* Terms of a blend per joule of its gross heat at the combustion temperature of the mixer's state. */
typedef struct {
    bool has_price;               /* every part of the blend has one, in one currency */
    double price_per_j;
    char currency[BC_CURRENCY_MAX];
    bool has_co2;                 /* every part states the CO2 of its making */
    double co2_making_per_j;      /* kg */
    double co2_burning_per_j;     /* kg: all carbon of the parts that are not biogenic, oxidation 1 */
} bc_blend_terms;

/* How much of an amount one mole of a gas is: J, kg, m3 or mol as the figure counts it. Volumes are of
 * the real gas at the metering state, or at the unit's own temperature and 101.325 kPa.
 *
 *   figure   one that is given
 *   amount   out: above zero; untouched on failure
 *
 * BC_ERR_RANGE: a gas without heat counted by energy. */
BC_API BC_MUST_USE bc_status bc_amount_per_mole(const bc_per_amount *figure, const bc_reference *reference, const bc_gas *gas, double *amount,
                                                bc_error *err);

/* Kilograms of CO2 from burning a mole of a gas: all its carbon, oxidation 1. */
BC_API double bc_co2_per_mole(const bc_gas *gas);

/* The terms of a blend.
 *
 *   offer   mixer->count terms of the parts; those of parts with a share of zero do not count
 *   share   as bc_mixer_moles()
 *
 * BC_ERR_USAGE: prices in two currencies; BC_ERR_RANGE: the blend, or a part priced by energy, has no heat. */
BC_API BC_MUST_USE bc_status bc_blend_terms_of(const bc_mixer *mixer, const bc_offer offer[], const double share[], bc_blend_terms *terms,
                                               bc_error *err);

#ifdef __cplusplus
}
#endif

#endif
