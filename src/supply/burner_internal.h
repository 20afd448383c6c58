/* SPDX-License-Identifier: MIT */
/* burner_internal.h - what the parts of the burner model share. */
#ifndef BURNER_INTERNAL_H
#define BURNER_INTERNAL_H

#include "bluecone/burner.h"
#include "supply/burner_flow.h"

/* Whether a pressure is too high for Bernoulli's equation. */
static inline bool expands(double gas_pa, double ambient_pa)
{
    return gas_pa > ORIFICE_INCOMPRESSIBLE_MAX * (ambient_pa + gas_pa);
}

/* The temperature of a new gas; 0 stands for that of the old one. */
static inline double gas_temperature(const bc_burner_case *set, double new_gas_k)
{
    return new_gas_k > 0.0 ? new_gas_k : set->burner->gas_k;
}

/* Air of the case that a gas needs, mol/mol; BC_ERR_RANGE when it needs none. */
bc_status need_of(const bc_burner_case *set, const bc_subject *gas, double *need, bc_error *err);

/* theta (gas over air temperature) and d (gas over air molar mass) of a jet. */
void jet_of(const bc_burner_case *set, const bc_subject *gas, double gas_k, double *theta, double *d);

/* Flows on a gas, amounts over those of the old gas on the setting as found. */
typedef struct {
    double fuel, air;     /* ratios */
    double lambda;
    double primary;       /* mol/mol over the need; 0 without a jet */
    bool trim_at_end;
} burner_flows;

/* The flows; without `trimmed` as the trim found them. */
bc_status burner_flow_of(const bc_burner_case *set, const bc_subject *gas, const bc_burner_setting *setting, bool trimmed,
                         burner_flows *flows, bc_error *err);

/* The air factor that the setting of the old gas means for a new one: the same, or with a trim that of the same
 * flue oxygen. */
bc_status burner_lambda_target(const bc_burner_case *set, const bc_subject *gas, double *lambda, bc_error *err);

#endif
