/* SPDX-License-Identifier: MIT */
/* state_text.c - reference states in short, as --at takes them. */
#include "cli/contract_report.h"

#include <math.h>
#include <stdio.h>

/* A temperature as people write it: 15.5556 C is 60 F. */
static void temperature_text(double t_c, char *text, size_t size)
{
    if (fabs(t_c - (60.0 - 32.0) / 1.8) < 1e-6)
        (void)snprintf(text, size, "60F");
    else
        (void)snprintf(text, size, "%.6g", t_c);
}

void state_text(const bc_state *state, char *text, size_t size)
{
    char burnt[24];
    char metered[24];
    char pressure[24] = "";

    temperature_text(state->combustion_c, burnt, sizeof burnt);
    temperature_text(state->metering_c, metered, sizeof metered);
    if (fabs(state->metering_pa - BC_P0_PA) > 0.5)
        (void)snprintf(pressure, sizeof pressure, "@%.6g", state->metering_pa * 1e-3);
    (void)snprintf(text, size, "%s/%s%s%s", burnt, metered, pressure, state->saturated ? " saturated" : "");
}

void contract_state_text(const bc_contract *c, const bc_limit *limit, char *text, size_t size)
{
    if (limit->kind == BC_LIMIT_FRACTION || limit->kind == BC_LIMIT_INDEX)
        (void)snprintf(text, size, "%s", "");
    else if (limit->kind == BC_LIMIT_MASS_FRACTION)
        (void)snprintf(text, size, "by mass");
    else if (limit->kind == BC_LIMIT_VOLUME_FRACTION)
        (void)snprintf(text, size, "by volume");
    else
        state_text(&c->references[limit->reference].state, text, size);
}
