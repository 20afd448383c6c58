/* SPDX-License-Identifier: MIT */
/* subjects.c - loading and evaluating the gases of a command line. */
#include "cli/subjects.h"

#include "base/error_internal.h"

#include <stdio.h>
#include <stdlib.h>
#include <string.h>

static bc_status evaluate(const subjects *s, subject *each, bc_error *err)
{
    const bc_spread *spread = each->loaded.scattered ? &each->loaded.composition.spread : NULL;

    return bc_subject_make(&s->reference, &each->loaded.gas, spread, &each->subject, err);
}

/* The scatter of the gas with air is not that of the gas without: none is claimed for it. */
static bc_status take_air_out(subject *each, bc_error *err)
{
    char name[sizeof each->loaded.name];
    bc_gas pure;
    const bc_status status = bc_gas_air_free(&each->loaded.gas, &pure, &each->loaded.air, err);

    if (status != BC_OK)
        return status;
    each->loaded.gas = pure;
    each->air_free = true;
    each->loaded.scattered = false;
    (void)snprintf(name, sizeof name, "air-free: %.120s", each->loaded.name);
    memcpy(each->loaded.name, name, sizeof name);
    return BC_OK;
}

static bool holds_oxygen(const loaded_gas *gas)
{
    size_t oxygen = 0;

    return bc_species_find("oxygen", &oxygen, NULL) == BC_OK && gas->gas.x[oxygen] > 0.0;
}

/* Certificates from one form bear one name: what tells their figures apart in an answer is then a number behind it. */
static void part_names(const subjects *s, loaded_gas *last)
{
    size_t same = 1;

    for (size_t i = 0; i + 1 < s->count; i++)
        if (!s->each[i].loaded.repeated && strcmp(s->each[i].loaded.composition.name, last->composition.name) == 0)
            same++;
    if (same > 1)
        (void)snprintf(last->name, sizeof last->name, "%s (%zu)", last->composition.name, same);
}

static bc_status load(subjects *s, const char *word, bool air_free, bool both, bc_error *err)
{
    subject *each = &s->each[s->count++];
    bc_status status = gas_load(word, &each->loaded, err);

    if (status == BC_OK) {
        part_names(s, &each->loaded);
        status = evaluate(s, each, err);
    }
    if (status != BC_OK || !air_free || !holds_oxygen(&each->loaded))
        return status;
    if (both) {
        s->each[s->count] = *each;
        each = &s->each[s->count++];
        each->loaded.repeated = true;
    }
    status = take_air_out(each, err);
    return status == BC_OK ? evaluate(s, each, err) : status;
}

static bc_status open_gases(subjects *s, const arguments *a, const char *const words[], size_t count, bool both, bc_error *err);

bc_status subjects_open(subjects *s, const arguments *a, const char *const words[], size_t count, bool both, bc_error *err)
{
    memset(s, 0, sizeof *s);
    const bc_status status = state_from(a, &s->state, err);

    return status == BC_OK ? open_gases(s, a, words, count, both, err) : status;
}

bc_status subjects_open_at(subjects *s, const bc_state *state, const arguments *a, const char *const words[], size_t count, bc_error *err)
{
    memset(s, 0, sizeof *s);
    s->state = *state;
    return open_gases(s, a, words, count, false, err);
}

static bc_status open_gases(subjects *s, const arguments *a, const char *const words[], size_t count, bool both, bc_error *err)
{
    bc_status status = bc_reference_at(&s->state, &s->reference, err);

    if (status != BC_OK)
        return status;
    s->each = calloc(2 * count + 1, sizeof *s->each); /* each gas may be followed by itself without air */
    if (!s->each)
        return bc_fail(err, BC_ERR_MEMORY, "not enough memory for %zu gases", count);
    for (size_t i = 0; i < count && status == BC_OK; i++)
        status = load(s, words[i], a->value[OPTION_air_free] != NULL, both, err);
    return status;
}

void subjects_close(subjects *s)
{
    free(s->each);
    s->each = NULL;
    s->count = 0;
}

/* A stated composition uncertainty or only that of the tables: a figure alone does not tell. */
void subjects_tell_uncertainty(const subjects *s, report *r)
{
    char text[400] = "No uncertainty of the composition is stated for ";
    size_t told = 0;

    for (size_t i = 0; i < s->count; i++) {
        const size_t used = strlen(text);

        if (!s->each[i].subject.spread && used + 150 < sizeof text)
            (void)snprintf(text + used, sizeof text - used, "%s%.100s", told++ ? ", " : "", s->each[i].loaded.name);
    }
    if (told == 0)
        return;
    const size_t used = strlen(text);

    (void)snprintf(text + used, sizeof text - used, ": u is that of the tables alone.");
    report_add_warning(r, text);
}

void subjects_report(const subjects *s, report *r)
{
    report_state_of(r, &s->state);
    for (size_t i = 0; i < s->count; i++)
        (void)report_gas_of(r, &s->each[i].loaded, &s->each[i].subject);
}
