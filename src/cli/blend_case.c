/* SPDX-License-Identifier: MIT */
/* blend_case.c - from the words of `blend` to parts, mixer, limits and aims. */
#include "cli/blend_case.h"

#include "base/error_internal.h"
#include "base/text.h"
#include "bluecone/number.h"

#include <stdlib.h>
#include <string.h>

static bc_status take_basis(blend_case *c, bc_error *err)
{
    static const bc_blend_basis BASES[] = {BC_BY_MOLE, BC_BY_VOLUME, BC_BY_MASS, BC_BY_ENERGY};
    const char *word = c->a->value[OPTION_by];

    c->by = BC_BY_MOLE;
    for (size_t i = 0; word && i < BC_COUNT(BASES); i++)
        if (strcmp(word, bc_blend_basis_text(BASES[i])) == 0) {
            c->by = BASES[i];
            return BC_OK;
        }
    return word ? bc_fail(err, BC_ERR_USAGE, "--by %.20s: shares are of mole, volume, mass or energy; write one of them", word) : BC_OK;
}

static bc_status open_contract(bc_contract **contract, bc_error *err)
{
    *contract = malloc(sizeof **contract);
    return *contract ? BC_OK : bc_fail(err, BC_ERR_MEMORY, "not enough memory for the limits");
}

static bc_status take_within(blend_case *c, bc_error *err)
{
    const char *path = c->a->value[OPTION_within];

    if (!path)
        return BC_OK;
    const bc_status status = open_contract(&c->within, err);

    return status == BC_OK ? contract_load(path, c->within, err) : status;
}

/* "50.72MJ/m3": the number, and a unit that may be left out. */
static bc_status take_aim(blend_case *c, const char *what, const char *text, bc_error *err)
{
    double value = 0.0;
    const char *unit = NULL;
    bc_status status = bc_number_prefix(text, &value, &unit, err);

    if (status == BC_OK)
        status = bc_contract_add(c->aims, what, unit, &value, &value, err);
    if (status == BC_OK || status == BC_ERR_MEMORY)
        return status;
    if (err)
        err->status = BC_ERR_USAGE;
    return BC_ERR_USAGE;
}

static bc_status take_aims(blend_case *c, bc_error *err)
{
    const char *list = c->a->value[OPTION_aim];
    bool more = true;
    bc_status status = BC_OK;

    if (!list)
        return BC_OK;
    status = open_contract(&c->aims, err);
    if (status == BC_OK)
        status = bc_contract_start(&c->parts.state, c->aims, err);
    while (status == BC_OK && more) {
        char what[BC_NAME_MAX];
        char value[BC_NAME_MAX];

        status = blend_next_pair(&list, "aim", what, value, &more, err);
        if (status == BC_OK && more)
            status = take_aim(c, what, value, err);
    }
    if (status == BC_OK && c->aims->limit_count == 0)
        status = bc_fail(err, BC_ERR_USAGE, "--aim needs what=value, as wobbe-gross=50.72MJ/m3");
    return status;
}

static bc_status make_mixer(blend_case *c, bc_error *err)
{
    bc_blend_part parts[BC_BLEND_PARTS_MAX];

    for (size_t i = 0; i < c->count; i++) {
        const loaded_gas *gas = &c->parts.each[i].loaded;

        parts[i] = (bc_blend_part){&gas->gas, gas->scattered ? &gas->composition.spread : NULL};
    }
    return bc_mixer_make(&c->parts.reference, c->by, parts, c->count, &c->mixer, err);
}

/* What options ask must fit the shares. */
static bc_status check_question(const blend_case *c, bc_error *err)
{
    const arguments *a = c->a;
    const bool is_free = c->free_count > 0;

    if (a->value[OPTION_least] && !is_free)
        return bc_fail(err, BC_ERR_USAGE, "--least needs free shares; write free in front of the gases that may vary");
    if (a->value[OPTION_aim] && !is_free)
        return bc_fail(err, BC_ERR_USAGE, "--aim needs free shares; write free in front of the gases that may vary");
    if (is_free && !a->value[OPTION_aim] && !a->value[OPTION_least])
        return bc_fail(err, BC_ERR_USAGE, "free shares need --aim, or --least with --within; see bluecone blend --help");
    if (a->value[OPTION_show] && c->swept == NO_PART)
        return bc_fail(err, BC_ERR_USAGE, "--show is of a sweep; write a range as 0..30/5 in front of a gas, or use bluecone get");
    if ((a->value[OPTION_flow] || a->value[OPTION_max_flow]) && !a->value[OPTION_least])
        return bc_fail(err, BC_ERR_USAGE, "--flow and --max-flow count with --least alone: together they limit the share of a part");
    if ((a->value[OPTION_price] || a->value[OPTION_co2]) && c->swept != NO_PART)
        return bc_fail(err, BC_ERR_USAGE, "--price and --co2 are of one blend, not of a sweep; write one share in the place of the range");
    return BC_OK;
}

bc_status blend_open(blend_case *c, const arguments *a, bc_error *err)
{
    memset(c, 0, sizeof *c);
    c->a = a;
    c->count = a->argument_count / 2;
    if (a->argument_count % 2 != 0 || c->count > BC_BLEND_PARTS_MAX)
        return bc_fail(err, BC_ERR_USAGE, "shares and gases stand in pairs, up to %d of them: bluecone blend 80 pipeline-h 20 hydrogen", BC_BLEND_PARTS_MAX);
    if (c->count < 2)
        return bc_fail(err, BC_ERR_USAGE, "one gas alone is no blend; add the other, as rest pipeline-h");
    for (size_t i = 0; i < c->count; i++)
        c->word[i] = a->argument[2 * i + 1];
    bc_status status = blend_take_shares(c, err);

    if (status == BC_OK)
        status = take_basis(c, err);
    if (status == BC_OK)
        status = check_question(c, err);
    if (status == BC_OK)
        status = subjects_open(&c->parts, a, c->word, c->count, false, err);
    if (status == BC_OK)
        status = make_mixer(c, err);
    if (status == BC_OK)
        status = blend_take_terms(c, err);
    if (status == BC_OK)
        status = take_within(c, err);
    return status == BC_OK ? take_aims(c, err) : status;
}

void blend_close(blend_case *c)
{
    subjects_close(&c->parts);
    free(c->within);
    free(c->aims);
    c->within = NULL;
    c->aims = NULL;
}

const char *blend_part_name(const blend_case *c, size_t part)
{
    return c->parts.each[part].loaded.name;
}
