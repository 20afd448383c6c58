/* SPDX-License-Identifier: MIT */
/* blend_report.c - recipe, sheet and limits of a blend. */
#include "cli/blend_report.h"

#include "base/error_internal.h"
#include "cli/sheet.h"

#include <math.h>
#include <stdio.h>
#include <string.h>

void blend_recipe(const blend_case *c, const double share[], char *text, size_t size)
{
    size_t used = 0;

    text[0] = '\0';
    for (size_t i = 0; i < c->count && used + 1 < size; i++) {
        if (share[i] > 0.0)
            (void)snprintf(text + used, size - used, "%s%.6g %% %.60s", used > 0 ? " + " : "", 100.0 * share[i], blend_part_name(c, i));
        used = strlen(text);
    }
    if (used + 1 < size)
        (void)snprintf(text + used, size - used, ", shares of %s", bc_blend_basis_text(c->by));
}

bc_status blend_add(blend_case *c, const double share[], const char *name, bc_error *err)
{
    subject *each = &c->parts.each[c->parts.count];
    loaded_gas *gas = &each->loaded;
    bc_spread *spread = &gas->composition.spread;

    (void)snprintf(gas->name, sizeof gas->name, "%s", name);
    (void)snprintf(gas->composition.name, sizeof gas->composition.name, "%s", name);
    blend_recipe(c, share, gas->recipe, sizeof gas->recipe);
    gas->gas = bc_mixer_gas(&c->mixer, share);
    gas->composition.gas = gas->gas;
    gas->composition.sum = 1.0;
    bc_mixer_spread(&c->mixer, share, spread);
    gas->scattered = spread->count > 0;
    gas->composition.has_uncertainty = gas->scattered;
    c->parts.count++;
    return bc_subject_make(&c->parts.reference, &gas->gas, spread, &each->subject, err);
}

void blend_recipe_table(report *r, const blend_case *c, const double share[], const char *id, const char *title)
{
    static const bc_blend_basis BASES[] = {BC_BY_MOLE, BC_BY_VOLUME, BC_BY_MASS, BC_BY_ENERGY};
    const size_t table = report_add_table(r, id, title);
    double on[BC_COUNT(BASES)][BC_BLEND_PARTS_MAX];

    report_add_column(r, table, "part", "part", "");
    for (size_t b = 0; b < BC_COUNT(BASES); b++) {
        report_add_column(r, table, bc_blend_basis_text(BASES[b]), bc_blend_basis_text(BASES[b]), "%");
        bc_mixer_shares(&c->mixer, share, BASES[b], on[b]);
    }
    for (size_t i = 0; i < c->count; i++) {
        report_add_text(r, table, blend_part_name(c, i));
        for (size_t b = 0; b < BC_COUNT(BASES); b++)
            report_add_number(r, table, 100.0 * on[b][i], 4);
    }
    report_lead_with(r, table);
}

/* Shares that had to be scaled are told: a silent normalisation would hide a slip of the pen. */
static void warn_sum(report *r, const blend_case *c)
{
    char text[160];

    if (c->rest != NO_PART || c->free_count > 0 || fabs(c->fixed - 1.0) < 1e-9)
        return;
    (void)snprintf(text, sizeof text, "The shares add up to %.6g: each was taken as its part of that.", 100.0 * c->fixed);
    report_add_warning(r, text);
}

/* 0.2 beside a rest is 0.2 %: a fifth may have been meant. */
static void warn_fraction(report *r, const blend_case *c)
{
    char text[160];

    if (c->rest == NO_PART || !(c->fixed > 0.0) || c->fixed > 0.01)
        return;
    (void)snprintf(text, sizeof text, "Shares are per cent: the numbers add up to %.6g %%, and the rest is %.6g %%.", 100.0 * c->fixed,
                   100.0 * (1.0 - c->fixed));
    report_add_warning(r, text);
}

/* Half of a blend's scatter is none: a part that states nothing adds nothing. */
static void warn_scatter(report *r, const blend_case *c)
{
    size_t known = 0;

    for (size_t i = 0; i < c->count; i++)
        known += c->parts.each[i].loaded.scattered;
    if (known > 0 && known < c->count)
        report_add_warning(r, "Only some of the parts state uncertainties: the u of the blend counts theirs alone.");
}

bc_status blend_sheet(report *r, const blend_case *c, const double share[], bc_error *err)
{
    char title[96];

    subjects_report(&c->parts, r);
    subjects_tell_uncertainty(&c->parts, r);
    warn_sum(r, c);
    warn_fraction(r, c);
    warn_scatter(r, c);
    (void)snprintf(title, sizeof title, "Recipe, mixed by %s", bc_blend_basis_text(c->by));
    blend_recipe_table(r, c, share, "recipe", title);
    const bc_status status = sheet_sections(r, &c->parts, c->a, err);

    sheet_composition(r, &c->parts);
    report_set_caution(r, SHEET_CAUTION);
    return status;
}

int blend_mix(blend_case *c, report *r)
{
    double share[BC_BLEND_PARTS_MAX];
    bool inside = true;
    bc_error err;

    blend_fixed_shares(c, share);
    bc_status status = blend_add(c, share, "Blend", &err);

    if (status == BC_OK)
        status = blend_sheet(r, c, share, &err);
    if (status != BC_OK) {
        report_close(r);
        blend_close(c);
        return complain(&err);
    }
    if (blend_has_terms(c))
        blend_cost(r, c, share);
    blend_judge(r, c, c->count, &inside);
    blend_verdict(r, c, c->count, inside);
    return blend_answer(r, c, share, inside ? 0 : 1);
}
