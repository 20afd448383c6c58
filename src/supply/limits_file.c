/* SPDX-License-Identifier: MIT */
/* limits_file.c - the contract file: its sections and keys, and the files it follows. */
#include "supply/limits_internal.h"

#include "base/error_internal.h"
#include "base/text.h"

#include <stdio.h>
#include <string.h>

#define FOLLOW_MAX 4 /* files behind each other; more is a circle */

bc_status limits_refuse(const limits_reader *r, const bc_ini_entry *e, const char *cause)
{
    return bc_fail_at(r->err, BC_ERR_INPUT, r->path, e->line, "%s", cause);
}

bc_status limits_blame(const limits_reader *r, int line)
{
    if (r->err) {
        r->err->status = BC_ERR_INPUT;
        r->err->line = line;
        (void)snprintf(r->err->file, sizeof r->err->file, "%s", r->path);
    }
    return BC_ERR_INPUT;
}

static bc_status take_text(const limits_reader *r, const bc_ini_entry *e, char *to, size_t size)
{
    if (strlen(e->value) >= size)
        return bc_fail_at(r->err, BC_ERR_INPUT, r->path, e->line, "the value of '%s' is longer than %zu bytes; shorten it", e->key, size - 1);
    memcpy(to, e->value, strlen(e->value) + 1);
    return BC_OK;
}

static bc_status take_name(limits_reader *r, const bc_ini_entry *e)
{
    return take_text(r, e, r->c->name, sizeof r->c->name);
}

static bc_status take_source(limits_reader *r, const bc_ini_entry *e)
{
    return take_text(r, e, r->c->origin, sizeof r->c->origin);
}

static bc_status take_note(limits_reader *r, const bc_ini_entry *e)
{
    return take_text(r, e, r->c->note, sizeof r->c->note);
}

static bc_status take_at(limits_reader *r, const bc_ini_entry *e)
{
    return bc_state_parse(e->value, &r->c->state, r->err) == BC_OK ? BC_OK : limits_blame(r, e->line);
}

static bc_status take_edition(limits_reader *r, const bc_ini_entry *e)
{
    if (strcmp(e->value, "1995") != 0 && strcmp(e->value, "2016") != 0)
        return limits_refuse(r, e, "edition: ISO 6976 has the editions 1995 and 2016; write one of them");
    r->c->state.edition = strcmp(e->value, "1995") == 0 ? 1995 : 2016;
    return BC_OK;
}

static bc_status take_saturated(limits_reader *r, const bc_ini_entry *e)
{
    if (strcmp(e->value, "yes") != 0 && strcmp(e->value, "no") != 0)
        return limits_refuse(r, e, "saturated: write yes or no");
    r->c->state.saturated = strcmp(e->value, "yes") == 0;
    return BC_OK;
}

static bc_status take_currency(limits_reader *r, const bc_ini_entry *e)
{
    return take_text(r, e, r->c->currency, sizeof r->c->currency);
}

static bc_status take_price(limits_reader *r, const bc_ini_entry *e)
{
    return bc_price_parse(e->value, &r->c->price, r->c->currency, r->err) == BC_OK ? BC_OK : limits_blame(r, e->line);
}

/* "220 GWh" or "20000000 m3": an amount a year is a flow, and read as one. */
static bc_status take_annual(limits_reader *r, const bc_ini_entry *e)
{
    static const double HOUR_S = 3600.0;
    char flow[BC_WORD_MAX];

    (void)snprintf(flow, sizeof flow, "%.50s/h", e->value);
    if (bc_flow_parse(flow, &r->c->annual, r->err) != BC_OK)
        return limits_blame(r, e->line);
    r->c->annual.si *= HOUR_S;
    return BC_OK;
}

/* Read before everything else. */
static bc_status take_follows(limits_reader *r, const bc_ini_entry *e)
{
    (void)r;
    (void)e;
    return BC_OK;
}

/* The keys of [contract], the one list for reading and for the message about unknown ones. */
static const struct {
    const char *key;
    bc_status (*take)(limits_reader *, const bc_ini_entry *);
} KEYS[] = {
    {"name", take_name},         {"source", take_source}, {"note", take_note},   {"at", take_at},
    {"edition", take_edition},   {"saturated", take_saturated}, {"follows", take_follows}, {"currency", take_currency},
    {"price", take_price},       {"annual_energy", take_annual}, {"annual_volume", take_annual},
};

static bc_status take_contract_key(limits_reader *r, const bc_ini_entry *e)
{
    size_t best = 0;

    for (size_t i = 0; i < BC_COUNT(KEYS); i++) {
        if (bc_text_same(KEYS[i].key, e->key))
            return KEYS[i].take(r, e);
        if (bc_text_unlikeness(e->key, KEYS[i].key) < bc_text_unlikeness(e->key, KEYS[best].key))
            best = i;
    }
    return bc_fail_at(r->err, BC_ERR_INPUT, r->path, e->line, "unknown key '%s' in [contract]; the nearest known one is '%s'", e->key,
                      KEYS[best].key);
}

typedef bc_status taker(limits_reader *, const bc_ini_entry *);

/* Calls `take` for the first entry of each section whose name starts so. */
static bc_status each_section(limits_reader *r, const char *start, taker *take)
{
    const char *before = "";

    for (size_t i = 0; i < bc_ini_count(r->ini); i++) {
        const bc_ini_entry *e = bc_ini_at(r->ini, i);
        const bool first = strcmp(e->section, before) != 0;

        before = e->section;
        if (!first || strncmp(e->section, start, strlen(start)) != 0)
            continue;
        const bc_status status = take(r, e);

        if (status != BC_OK)
            return status;
    }
    return BC_OK;
}

static bc_status take_contract_keys(limits_reader *r)
{
    for (size_t i = 0; i < bc_ini_count(r->ini); i++) {
        const bc_ini_entry *e = bc_ini_at(r->ini, i);
        const bool known = strcmp(e->section, "contract") == 0 || strncmp(e->section, "limit ", 6) == 0 || strncmp(e->section, "range ", 6) == 0;
        bc_status status = BC_OK;

        if (!known)
            status = bc_fail_at(r->err, BC_ERR_INPUT, r->path, e->line, "unknown section [%s]; known are [contract], [limit WHAT] and [range COMPONENT]",
                                e->section);
        else if (strcmp(e->section, "contract") == 0)
            status = take_contract_key(r, e);
        if (status != BC_OK)
            return status;
    }
    return BC_OK;
}

static bc_status read_file(const char *path, bc_contract *c, int depth, bc_error *err);

/* `follows` names a file beside this one; its limits come first, so that ours replace them. */
static bc_status follow(const limits_reader *r)
{
    const bc_ini_entry *e = bc_ini_find(r->ini, "contract", "follows");
    const char *slash = strrchr(r->path, '/');
    char path[BC_FILE_MAX];

    if (!e)
        return BC_OK;
    if (r->depth == FOLLOW_MAX)
        return limits_refuse(r, e, "contracts follow each other more than four times, or in a circle; break it");
    const int folder = slash && e->value[0] != '/' ? (int)(slash - r->path) + 1 : 0;
    const int length = snprintf(path, sizeof path, "%.*s%s", folder, r->path, e->value);

    if (length < 0 || (size_t)length >= sizeof path)
        return limits_refuse(r, e, "the path of the contract to follow is too long");
    const bc_status status = read_file(path, r->c, r->depth + 1, r->err);

    if (status == BC_OK) { /* what is changed here is no longer what that file says it is */
        (void)snprintf(r->c->name, sizeof r->c->name, "%.100s", r->path);
        r->c->origin[0] = '\0';
        r->c->note[0] = '\0';
    }
    return status;
}

static bc_status read_document(limits_reader *r)
{
    bc_status status = follow(r);

    if (status == BC_OK)
        status = take_contract_keys(r);
    if (status == BC_OK)
        status = each_section(r, "limit ", limits_take_limit);
    return status == BC_OK ? each_section(r, "range ", limits_take_range) : status;
}

static bc_status read_file(const char *path, bc_contract *c, int depth, bc_error *err)
{
    bc_ini *ini = NULL;
    bc_status status = bc_ini_open(path, &ini, err);

    if (status != BC_OK)
        return status;
    limits_reader r = {.path = path, .ini = ini, .c = c, .depth = depth, .err = err};

    status = read_document(&r);
    bc_ini_close(ini);
    return status;
}

bc_status bc_contract_read(const char *path, bc_contract *c, bc_error *err)
{
    memset(c, 0, sizeof *c);
    c->state = bc_state_default();
    (void)snprintf(c->name, sizeof c->name, "%.100s", path);
    const bc_status status = read_file(path, c, 0, err);

    if (status != BC_OK)
        return status;
    (void)snprintf(c->path, sizeof c->path, "%s", path);
    if (c->limit_count == 0)
        return bc_fail_at(err, BC_ERR_INPUT, path, 0, "the contract has no limit; write one as [limit wobbe-gross] with min, max, unit");
    return BC_OK;
}

bc_status bc_contract_start(const bc_state *state, bc_contract *c, bc_error *err)
{
    memset(c, 0, sizeof *c);
    c->state = *state;
    c->reference_count = 1;
    return bc_reference_at(state, &c->references[0], err);
}

bc_status bc_contract_add(bc_contract *c, const char *word, const char *unit, const double *min, const double *max, bc_error *err)
{
    bc_limit limit;

    if (c->limit_count == BC_LIMIT_MAX)
        return bc_fail(err, BC_ERR_USAGE, "more than %d limits", BC_LIMIT_MAX);
    memset(&limit, 0, sizeof limit);
    limit.has_min = min != NULL;
    limit.has_max = max != NULL;
    limit.min = min ? *min : 0.0;
    limit.max = max ? *max : 0.0;
    bc_status status = limit_find(word, &limit, err);

    if (status == BC_OK)
        status = limit_take_unit(unit, &c->state, &limit, err);
    if (status == BC_OK)
        c->limits[c->limit_count++] = limit;
    return status;
}
