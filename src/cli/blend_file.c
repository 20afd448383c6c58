/* SPDX-License-Identifier: MIT */
/* blend_file.c - a blend as a composition file, and the answer that may be one. */
#include "base/error_internal.h"
#include "output/memory_stream_internal.h"
#include "base/text.h"
#include "cli/blend_report.h"
#include "output/output_file_internal.h"

#include <math.h>
#include <stdio.h>
#include <stdlib.h>
#include <string.h>
#include <strings.h>

/* Words of users become values of ours: what would end or quote a value is left out. */
static void put_value(FILE *f, const char *text, size_t most)
{
    for (size_t i = 0; i < most && text[i] != '\0'; i++) {
        const unsigned char c = (unsigned char)text[i];

        (void)fputc(c < 0x20 || c == 0x7f || strchr(";#\"'\\=", c) ? ' ' : c, f);
    }
}

static void put_recipe(FILE *f, const blend_case *c, const double share[])
{
    char state[160];

    bc_state_describe(&c->parts.state, state, sizeof state);
    (void)fprintf(f, "; Made by bluecone %s blend. Recipe by %s:\n", BC_VERSION, bc_blend_basis_text(c->by));
    for (size_t i = 0; i < c->count; i++) {
        const bc_composition *part = &c->parts.each[i].loaded.composition;

        if (!(share[i] > 0.0))
            continue;
        (void)fprintf(f, ";   %.10g %% ", 100.0 * share[i]);
        put_value(f, part->name, 100);
        (void)fputs(", ", f);
        put_value(f, part->path[0] != '\0' && part->bundled[0] == '\0' ? part->path : c->word[i], 200);
        (void)fputc('\n', f);
    }
    (void)fprintf(f, "; State of volumes and heats: %s.\n", state);
}

static bool is_wet(const bc_gas *gas)
{
    size_t water = 0;

    return bc_species_find("water", &water, NULL) == BC_OK && gas->x[water] > 0.0;
}

static void put_gas(FILE *f, const blend_case *c, const double share[], const bc_gas *gas)
{
    char recipe[BC_NAME_MAX + 100];

    blend_recipe(c, share, recipe, sizeof recipe);
    (void)fputs("[gas]\nname     = ", f);
    put_value(f, recipe, 100);
    (void)fputs("\nsource   = blended by bluecone, ", f);
    put_value(f, recipe, sizeof recipe);
    (void)fprintf(f, "\nbasis    = mole\nunit     = percent\nmoisture = %s\n", is_wet(gas) ? "as-analysed" : "dry");
}

static void put_components(FILE *f, const bc_gas *gas)
{
    (void)fputs("\n[components]\n", f);
    for (size_t i = 0; i < bc_species_count(); i++)
        if (gas->x[i] > 0.0)
            (void)fprintf(f, "%-24s = %.12g\n", bc_species_id(i), 100.0 * gas->x[i]);
}

/* The standard uncertainty of each fraction; a file cannot say how they go together. */
static void put_uncertainty(FILE *f, const bc_spread *spread)
{
    if (spread->count == 0)
        return;
    (void)fputs("\n; of each component alone: the file does not keep how they vary together\n[uncertainty]\n", f);
    for (size_t j = 0; j < bc_species_count(); j++) {
        double variance = 0.0;

        for (size_t k = 0; k < spread->count; k++)
            variance += spread->dx[k][j] * spread->dx[k][j];
        if (variance > 0.0)
            (void)fprintf(f, "%-24s = %.4g\n", bc_species_id(j), 100.0 * sqrt(variance));
    }
}

/* Price and CO2 of making per gross heat, where every part in the recipe states its own. */
static void put_supply(FILE *f, const blend_case *c, const double share[])
{
    bc_blend_terms terms;

    if (bc_blend_terms_of(&c->mixer, c->offer, share, &terms, NULL) != BC_OK || !(terms.has_price || terms.has_co2))
        return;
    (void)fputs("\n[supply]\n", f);
    if (terms.has_price)
        (void)fprintf(f, "price = %.10g %s/MWh\n", terms.price_per_j * 3.6e9, terms.currency);
    if (terms.has_co2)
        (void)fprintf(f, "co2   = %.10g kg/MWh\n", terms.co2_making_per_j * 3.6e9);
}

bc_status blend_write_file(const blend_case *c, const double share[], const char *path, bc_error *err)
{
    char *bytes = NULL;
    size_t count = 0;
    FILE *f = bc_memory_stream_open(&bytes, &count);
    bc_spread *spread = malloc(sizeof *spread);
    bc_status status = BC_OK;

    if (f && spread) {
        const bc_gas gas = bc_mixer_gas(&c->mixer, share);

        bc_mixer_spread(&c->mixer, share, spread);
        put_recipe(f, c, share);
        put_gas(f, c, share, &gas);
        put_components(f, &gas);
        put_uncertainty(f, spread);
        put_supply(f, c, share);
    }
    const bool kept = f && bc_memory_stream_close(f);

    if (!kept || !spread)
        status = bc_fail(err, BC_ERR_MEMORY, "not enough memory for the blend");
    if (status == BC_OK)
        status = output_write(path, bytes, count, err);
    free(spread);
    free(bytes);
    return status;
}

static bool is_composition(const char *path)
{
    const char *dot = path ? strrchr(path, '.') : NULL;

    return dot && strcasecmp(dot, ".ini") == 0;
}

int blend_answer(report *r, blend_case *c, const double share[], int code)
{
    arguments a = *c->a;
    bc_error err;
    bc_status status = BC_OK;

    if (is_composition(a.value[OPTION_output])) {
        status = share ? blend_write_file(c, share, a.value[OPTION_output], &err)
                       : bc_fail(&err, BC_ERR_USAGE, "-o %.200s: there is no single blend to write; ask for one", a.value[OPTION_output]);
        a.value[OPTION_output] = NULL;
    }
    blend_close(c);
    if (status == BC_OK)
        return answer(r, &a, false, code);
    report_close(r);
    return complain(&err);
}
