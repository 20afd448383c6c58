/* SPDX-License-Identifier: MIT */
/* burn_safety.c - limits in air and burning velocity of a combustion report: where the rules reach, and a
 * warning where they do not. */
#include "bluecone/flammability.h"
#include "cli/burn_report.h"

#include <stdio.h>

#define PERCENT 100.0

static void warn_missing(report *r, const char *what, const bc_error *err)
{
    char text[BC_MESSAGE_MAX + 32];

    (void)snprintf(text, sizeof text, "%s: %s.", what, err->message);
    report_add_warning(r, text);
}

void burn_safety(report *r, const arguments *a, const burn_case_result *c)
{
    const slot where = {r, report_add_section(r, "safety", "In air at 25 C, 101.325 kPa (estimates)"), 0};
    bc_flammability f;
    bc_burning_velocity v;
    bc_error err;

    if (bc_flammability_of(&c->setup.physics.fuel, &f, &err) != BC_OK)
        warn_missing(r, "Flammability limits", &err);
    else if (f.verdict == BC_NOT_FLAMMABLE)
        report_add_warning(r, "By Le Chatelier's rule and ISO 10156 the gas is not flammable in air at 25 C; it may still burn preheated.");
    else {
        const plain_figure limits[] = {{"lfl", "Lower flammability limit", PERCENT * f.lfl, "%", 3, "Le Chatelier, USBM Bulletin 627"},
                                       {"ufl", "Upper flammability limit", PERCENT * f.ufl, "%", 3, "Le Chatelier, USBM Bulletin 627"}};

        add_figures(&where, a, limits, f.has_lfl ? 1 : 0);
        add_figures(&where, a, limits + 1, f.has_ufl ? 1 : 0);
        if (f.outside_rule)
            report_add_warning(r, "The gas holds hydrogen sulfide, carbon disulfide or ethyne, for which Le Chatelier's rule fails: its flammability limits are unsure.");
        if (f.with_oxygen)
            report_add_warning(r, "The gas holds more than 3 % oxygen: it may itself be near an explosive mixture.");
    }
    if (bc_burning_velocity_of(&c->setup.physics.fuel, &v, &err) != BC_OK) {
        warn_missing(r, "Burning velocity", &err);
        return;
    }
    const plain_figure velocity = {"burning-velocity", "Laminar burning velocity", PERCENT * v.value_m_per_s, "cm/s", 3,
                                   "Di Sarli and Di Benedetto 2007"};

    if (v.in_range)
        add_figures(&where, a, &velocity, 1);
    else
        report_add_warning(r, "Burning velocity: the gas has over 50 % hydrogen in its combustibles, outside the mixing rule; none is given.");
}
