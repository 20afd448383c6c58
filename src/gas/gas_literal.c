/* SPDX-License-Identifier: MIT */
/* gas_literal.c - a composition written on the command line. */
#include "base/error_internal.h"
#include "base/text.h"
#include "bluecone/number.h"
#include "gas/composition_internal.h"

#include <stdio.h>
#include <string.h>

static const char *take_basis(bc_composition *c, const char *text)
{
    static const struct {
        const char *prefix;
        bc_basis basis;
    } PREFIXES[] = {{"mole:", BC_BASIS_MOLE}, {"volume:", BC_BASIS_VOLUME}, {"mass:", BC_BASIS_MASS}};

    for (size_t i = 0; i < BC_COUNT(PREFIXES); i++) {
        const size_t length = strlen(PREFIXES[i].prefix);

        if (strncmp(text, PREFIXES[i].prefix, length) == 0) {
            c->basis = PREFIXES[i].basis;
            return text + length;
        }
    }
    return text;
}

static bc_status check_word(const bc_composition *c, const bc_entry *entry, bc_error *err)
{
    for (size_t i = 0; i < c->entry_count; i++)
        for (size_t j = 0; j < BC_SPECIES_CAPACITY; j++)
            if (entry->parts[j] == 1.0 && c->entries[i].parts[j] == 1.0)
                return bc_fail(err, BC_ERR_INPUT, "'%s' and '%s' are the same component; keep one of them", c->entries[i].word, entry->word);
    return BC_OK;
}

static bc_status take_rest(const bc_composition *c, bc_entry *entry, bc_error *err)
{
    for (size_t i = 0; i < c->entry_count; i++)
        if (c->entries[i].is_rest)
            return bc_fail(err, BC_ERR_INPUT, "'rest' stands twice; at most one component can be the rest");
    entry->is_rest = true;
    return BC_OK;
}

static bc_status take_percent(const bc_entry *entry, const char *text, double *fraction, const char **rest, bc_error *err)
{
    double percent = 0.0;
    const bc_status status = bc_number_prefix(text, &percent, rest, err);

    if (status != BC_OK)
        return status;
    if (percent < 0.0)
        return bc_fail(err, BC_ERR_INPUT, "the share or uncertainty of '%s' is negative; correct it", entry->word);
    *fraction = percent / 100.0;
    return BC_OK;
}

/* The text between '=' and ',': a number or `rest`, and an uncertainty behind '~'. */
static bc_status take_amount(bc_composition *c, bc_entry *entry, const char *text, bc_error *err)
{
    char shown[32];
    const char *rest = NULL;

    if (strcmp(text, "rest") == 0)
        return take_rest(c, entry, err);
    bc_status status = take_percent(entry, text, &entry->amount, &rest, err);

    if (status == BC_OK && *rest == '~') {
        c->has_uncertainty = true;
        status = take_percent(entry, rest + 1, &entry->u, &rest, err);
    }
    if (status != BC_OK || *rest == '\0')
        return status;
    bc_text_show(shown, sizeof shown, rest);
    return bc_fail(err, BC_ERR_INPUT, "'%s' behind the share of '%s' is not understood; shares are per cent, parted by commas", shown,
                   entry->word);
}

/* A comma inside a number leaves a piece without '=' behind it. */
static bc_status check_comma(const char *comma, bc_error *err)
{
    const char *next = strchr(comma + 1, ',');
    const char *equals = strchr(comma + 1, '=');
    char shown[24];

    if (equals && (!next || equals < next))
        return BC_OK;
    bc_text_show(shown, sizeof shown, comma);
    return bc_fail(err, BC_ERR_INPUT, "'%s' is no name=share; write numbers with a decimal point and '-' for a comma inside a name", shown);
}

static bc_status take_entry(bc_composition *c, const char **p, bc_error *err)
{
    const char *equals = strchr(*p, '=');
    bc_entry *entry = &c->entries[c->entry_count];

    if (c->entry_count == BC_ENTRY_MAX)
        return bc_fail(err, BC_ERR_INPUT, "more than %d components; join some", BC_ENTRY_MAX);
    memset(entry, 0, sizeof *entry);
    if (!equals || !bc_text_copy(entry->word, sizeof entry->word, *p, (size_t)(equals - *p)))
        return bc_fail(err, BC_ERR_INPUT, "a component is written name=share, as in methane=92,ethane=8");
    bc_status status = composition_resolve(c, entry, err);

    if (status == BC_OK)
        status = check_word(c, entry, err);
    if (status != BC_OK)
        return status;
    const size_t length = strcspn(equals + 1, ",");
    char amount[BC_COMPONENT_MAX + 32];

    if (!bc_text_copy(amount, sizeof amount, equals + 1, length))
        return bc_fail(err, BC_ERR_INPUT, "the share of '%s' is too long; shorten it", entry->word);
    status = take_amount(c, entry, amount, err);
    *p = equals + 1 + length;
    if (status == BC_OK && **p == ',')
        status = check_comma(*p, err);
    if (status != BC_OK)
        return status;
    c->entry_count++;
    return BC_OK;
}

bc_status bc_composition_parse(const char *literal, bc_composition *c, bc_error *err)
{
    const char *p = NULL;

    composition_clear(c);
    bc_text_show(c->name, sizeof c->name, literal);
    /* a literal with water is a wet gas as written: there is no other word for it here */
    c->moisture = BC_MOISTURE_AS_ANALYSED;
    p = take_basis(c, literal);
    if (*bc_text_skip_space(p) == '\0')
        return bc_fail(err, BC_ERR_INPUT, "the composition is empty; write it as methane=92,ethane=8");
    for (;;) {
        const bc_status status = take_entry(c, &p, err);

        if (status != BC_OK)
            return status;
        if (*p == '\0')
            return composition_finish(c, err);
        p++;
    }
}
