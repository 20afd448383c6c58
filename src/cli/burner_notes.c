/* SPDX-License-Identifier: MIT */
/* burner_notes.c - what is to be said of the data of a burner, whatever gas comes. */
#include "cli/burner_notes.h"

#include <stdio.h>
#include <string.h>

#define DISCHARGE_LEAST 0.5  /* below it no orifice has a coefficient, value from memory */
#define EXPANDS 0.03         /* of the absolute pressure: Bernoulli's equation holds to 1 % below it */

void burner_note_orifice(report *r, const bc_burner_case *set)
{
    char text[300];

    if (set->has_implied && !(set->implied_discharge > DISCHARGE_LEAST && set->implied_discharge < 1.0)) {
        (void)snprintf(text, sizeof text, "Heat input, gas pressure and orifice of the burner file agree only with a discharge coefficient of %.3g: check them.",
                       set->implied_discharge);
        report_add_warning(r, text);
    }
    if (set->has_pressure && set->gas_pa > EXPANDS * (set->gas_pa + set->burner->ambient_pa))
        report_add_warning(r, "The gas pressure is above 3 % of the absolute one: the isentropic nozzle is used, and heat goes only nearly with the Wobbe index.");
}

void burner_note_air(report *r, const bc_burner *burner)
{
    char text[300] = "";

    for (size_t i = 0; i < bc_burner_key_count(); i++) {
        const bc_burner_key *key = bc_burner_key_at(i);
        char value[64];

        bc_burner_key_text(burner, i, value, sizeof value);
        if (strcmp(key->section, "air") == 0 && strcmp(key->key, "lambda") == 0 && value[0] != '\0' && !burner->stated[i])
            (void)snprintf(text, sizeof text, "The burner file states no air: lambda %s on the old gas is assumed, and the air figures rest on it.", value);
    }
    if (text[0] != '\0')
        report_add_warning(r, text);
}
