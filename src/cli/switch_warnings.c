/* SPDX-License-Identifier: MIT */
/* switch_warnings.c - what is to be said of the new gas and of the burner beside the figures. */
#include "cli/burner_notes.h"
#include "cli/switch_report.h"

#include <stdio.h>

#define RICH_TOLD 0.10       /* hydrogen and carbon monoxide: from here Weaver's indices do not follow */
#define CO_TOLD 0.001        /* carbon monoxide that makes a leak poisonous before it burns */

static double fraction_of(const bc_subject *s, const char *id)
{
    size_t species = 0;

    return bc_species_find(id, &species, NULL) == BC_OK ? s->gas.x[species] : 0.0;
}

static void warn_gas(report *r, const switch_case *c)
{
    const bc_subject *s = &c->s->each[NEW_GAS].subject;
    const double hydrogen = fraction_of(s, "hydrogen");
    const double monoxide = fraction_of(s, "carbon-monoxide");
    char text[400];

    if (hydrogen + monoxide > RICH_TOLD) {
        (void)snprintf(text, sizeof text, "The new gas holds %.3g %% hydrogen and %.3g %% carbon monoxide: the indices made for natural gas do not "
                       "follow it; Wobbe ratio, air index and MCP lead, and a Wobbe index that hardly moves hides a faster flame.",
                       100.0 * hydrogen, 100.0 * monoxide);
        report_add_warning(r, text);
    }
    if (hydrogen > RICH_TOLD)
        report_add_warning(r, "Hydrogen: the flame is nearly invisible and flashes back first at low load and light-up; check seals, flame and gas detectors.");
    if (monoxide > CO_TOLD) {
        (void)snprintf(text, sizeof text, "The new gas holds %.3g %% carbon monoxide: a leak poisons before it can burn.", 100.0 * monoxide);
        report_add_warning(r, text);
    }
}

/* A danger that nobody judged keeps the gas from being cleared: say what would help. */
static void warn_open(report *r, const switch_case *c)
{
    const bc_switch *s = &c->result;

    if (s->cleared || s->same_gas)
        return;
    if (!c->has_burner)
        report_add_warning(r, "A danger that no method could judge keeps the gas from being cleared; --burner FILE lets the limits of the burner itself judge.");
    else if (!s->covered[BC_DANGER_LIFT] || !s->covered[BC_DANGER_FLASHBACK])
        report_add_warning(r, "velocity_min and velocity_max in the burner file let the burning velocity judge lifting and flashback, where both gases are in its range.");
    if (c->has_burner && c->burner.type == BC_BURNER_ENGINE && !s->covered[BC_DANGER_KNOCK])
        report_add_warning(r, "Knock: state methane_number_min in the burner file, and ask the engine's maker where the gas is outside the methane number routes.");
}

static void warn_air(report *r, const switch_case *c)
{
    const bc_burner_response *x = &c->result.on_new;
    char text[300];

    if (x->burn.rich) {
        (void)snprintf(text, sizeof text, "On the new gas the burner lacks air (lambda %.3f): carbon monoxide %.2g %% of the dry flue gas at equilibrium.",
                       x->lambda, 100.0 * x->co_dry);
        report_add_warning(r, text);
    }
    if (x->trim_at_end) {
        (void)snprintf(text, sizeof text, "The trim is at the end of its range of %.3g %%: the flue oxygen is not held.", 100.0 * c->burner.trim_range);
        report_add_warning(r, text);
    }
    if (!x->burn.rich && x->burn.dew.exists && x->burn.dew.t_k > c->burner.flue_k)
        report_add_warning(r, "On the new gas the flue gas leaves below its water dew point: condensate forms.");
}

void switch_warnings(report *r, const switch_case *c)
{
    warn_gas(r, c);
    warn_open(r, c);
    if (c->has_fuel_k && !c->has_burner)
        report_add_warning(r, "--fuel-temp enters no verdict without --burner: the published indices compare gases of one temperature.");
    if (c->has_burner) {
        warn_air(r, c);
        burner_note_orifice(r, &c->set);
        burner_note_air(r, &c->burner);
    }
    report_add_warning(r, "No single index clears a gas: each compares two gases on one kind of burner, mostly old domestic ones.");
}
