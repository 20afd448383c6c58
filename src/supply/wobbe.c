/* SPDX-License-Identifier: MIT */
/* wobbe.c - heat input through one orifice, gas against gas and temperature against temperature. */
#include "bluecone/wobbe.h"

#include "base/error_internal.h"
#include "supply/index_internal.h"

#include <math.h>

/* Hydrogen and carbon monoxide beyond which equal heat hides another flame: 5 mol % of change. Our own line: at 5 %
 * hydrogen in methane the burning velocity has risen by 4 %, the Wobbe index fallen by 1.2 %. */
#define RICH_CHANGE_MAX 0.05

static bc_status check_positive(double value, const char *what, bc_error *err)
{
    if (value > 0.0 && isfinite(value))
        return BC_OK;
    return bc_fail(err, BC_ERR_RANGE, "%s must be above zero, not %.6g", what, value);
}

static bc_status check_temperature(double t_k, bc_error *err)
{
    if (t_k >= BC_FUEL_T_MIN_K && t_k <= BC_FUEL_T_MAX_K)
        return BC_OK;
    return bc_fail(err, BC_ERR_RANGE, "a fuel temperature of %.6g K is outside %g to %g K", t_k, BC_FUEL_T_MIN_K, BC_FUEL_T_MAX_K);
}

bc_status bc_wobbe_ratio(double old_j_per_m3, double new_j_per_m3, double *ratio, bc_error *err)
{
    bc_status status = check_positive(old_j_per_m3, "the Wobbe index of the old gas", err);

    if (status == BC_OK)
        status = check_positive(new_j_per_m3, "the Wobbe index of the new gas", err);
    if (status == BC_OK)
        *ratio = new_j_per_m3 / old_j_per_m3;
    return status;
}

bc_status bc_wobbe_corrected(double wobbe_j_per_m3, double t_metering_k, double t_fuel_k, double *corrected, bc_error *err)
{
    bc_status status = check_positive(wobbe_j_per_m3, "a Wobbe index", err);

    if (status == BC_OK)
        status = check_temperature(t_metering_k, err);
    if (status == BC_OK)
        status = check_temperature(t_fuel_k, err);
    if (status == BC_OK)
        *corrected = wobbe_j_per_m3 * sqrt(t_metering_k / t_fuel_k);
    return status;
}

bc_status bc_wobbe_modified(double net_j_per_m3, double relative_density, double t_fuel_k, double *modified, bc_error *err)
{
    bc_status status = check_positive(net_j_per_m3, "a lower heating value", err);

    if (status == BC_OK)
        status = check_positive(relative_density, "a relative density", err);
    if (status == BC_OK)
        status = check_temperature(t_fuel_k, err);
    if (status == BC_OK)
        *modified = net_j_per_m3 / sqrt(relative_density * t_fuel_k);
    return status;
}

bc_status wobbe_ratio_index(const index_case *c, reading *r, bc_error *err)
{
    const bool holds = bc_value_in_range(&c->old_gas->value) && bc_value_in_range(&c->new_gas->value);
    double ratio = 0.0;
    const bc_status status = bc_wobbe_ratio(c->old_gas->value.wobbe_gross_j_per_m3, c->new_gas->value.wobbe_gross_j_per_m3, &ratio, err);

    if (status != BC_OK)
        return status;
    *r = reading_of(ratio, holds ? "" : "Z is below 0.9, where ISO 6976 gives no volumes");
    if (fabs(rich_part(&c->room->new_parts) - rich_part(&c->room->old_parts)) > RICH_CHANGE_MAX)
        r->caution = "hydrogen and carbon monoxide change by more than 5 %: equal heat input hides another burning velocity";
    return BC_OK;
}
