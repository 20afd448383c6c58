/* SPDX-License-Identifier: MIT */
/* limits_terms.c - the section [contract] of a contract file: name, dates, state and terms of trade. */
#include "supply/limits_internal.h"

#include "base/error_internal.h"
#include "base/text.h"

#include <stdio.h>
#include <string.h>

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

/* "2015", "2015-04" or "2015-04-06": digits, and '-' where ISO 8601 has it. */
static bool is_date(const char *text)
{
    static const char FORM[] = "dddd-dd-dd";
    const size_t length = strlen(text);

    for (size_t i = 0; i < length && i < sizeof FORM - 1; i++) {
        const bool digit = text[i] >= '0' && text[i] <= '9';

        if (FORM[i] == 'd' ? !digit : text[i] != FORM[i])
            return false;
    }
    return length == 4 || length == 7 || length == 10;
}

static bc_status take_date(const limits_reader *r, const bc_ini_entry *e, char to[BC_DATE_MAX])
{
    if (!is_date(e->value))
        return bc_fail_at(r->err, BC_ERR_INPUT, r->path, e->line, "%s: write a date as 2025-04-06, 2025-04 or 2025", e->key);
    return take_text(r, e, to, BC_DATE_MAX);
}

static bc_status take_from(limits_reader *r, const bc_ini_entry *e)
{
    return take_date(r, e, r->c->from);
}

static bc_status take_until(limits_reader *r, const bc_ini_entry *e)
{
    return take_date(r, e, r->c->until);
}

static bc_status take_at(limits_reader *r, const bc_ini_entry *e)
{
    r->c->state_stated = true;
    return bc_state_parse(e->value, &r->c->state, r->err) == BC_OK ? BC_OK : limits_blame(r, e->line);
}

bc_status limits_take_edition(const limits_reader *r, const bc_ini_entry *e, int *edition)
{
    if (strcmp(e->value, "1995") != 0 && strcmp(e->value, "2016") != 0)
        return limits_refuse(r, e, "edition: ISO 6976 has the editions 1995 and 2016; write one of them");
    *edition = strcmp(e->value, "1995") == 0 ? 1995 : 2016;
    return BC_OK;
}

bc_status limits_take_yes(const limits_reader *r, const bc_ini_entry *e, bool *yes)
{
    if (strcmp(e->value, "yes") != 0 && strcmp(e->value, "no") != 0)
        return bc_fail_at(r->err, BC_ERR_INPUT, r->path, e->line, "%s: write yes or no", e->key);
    *yes = strcmp(e->value, "yes") == 0;
    return BC_OK;
}

static bc_status take_edition(limits_reader *r, const bc_ini_entry *e)
{
    return limits_take_edition(r, e, &r->c->state.edition);
}

static bc_status take_saturated(limits_reader *r, const bc_ini_entry *e)
{
    return limits_take_yes(r, e, &r->c->state.saturated);
}

/* A price names its currency itself; the key of that name may only agree. */
static bc_status take_currency(limits_reader *r, const bc_ini_entry *e)
{
    const bc_ini_entry *price = bc_ini_find(r->ini, "contract", "price");

    if (price && !strstr(price->value, e->value))
        return limits_refuse(r, e, "the price is in another currency; keep one of them");
    return take_text(r, e, r->c->currency, sizeof r->c->currency);
}

static bc_status take_price(limits_reader *r, const bc_ini_entry *e)
{
    return bc_price_parse(e->value, &r->c->price, r->c->currency, r->err) == BC_OK ? BC_OK : limits_blame(r, e->line);
}

/* "220 GWh", "220 GWh net" or "20000000 m3": an amount a year is a flow, and read as one. */
static bc_status take_annual(limits_reader *r, const bc_ini_entry *e, bc_dimension of)
{
    static const double HOUR_S = 3600.0;
    const char *net = strstr(e->value, " net");
    const int length = (int)(net ? net - e->value : (ptrdiff_t)strlen(e->value));
    char flow[BC_WORD_MAX];
    bc_per_amount annual;

    (void)snprintf(flow, sizeof flow, "%.*s/h%s", length > 40 ? 40 : length, e->value, net ? " net" : "");
    if (bc_flow_parse(flow, &annual, r->err) != BC_OK)
        return limits_blame(r, e->line);
    if (annual.of != of)
        return bc_fail_at(r->err, BC_ERR_INPUT, r->path, e->line, "%s: '%.40s' is no %s", e->key, e->value,
                          of == BC_DIM_ENERGY ? "energy; write GWh, MWh or TJ" : "volume of gas; write m3, Nm3 or MMcf");
    annual.si *= HOUR_S;
    r->c->annual = annual;
    return BC_OK;
}

static bc_status take_annual_energy(limits_reader *r, const bc_ini_entry *e)
{
    if (bc_ini_find(r->ini, "contract", "annual_volume"))
        return limits_refuse(r, e, "annual_energy and annual_volume both stand here; keep the one that the contract fixes");
    return take_annual(r, e, BC_DIM_ENERGY);
}

static bc_status take_annual_volume(limits_reader *r, const bc_ini_entry *e)
{
    return take_annual(r, e, BC_DIM_VOLUME);
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
    {"name", take_name},         {"source", take_source},       {"note", take_note},
    {"from", take_from},         {"until", take_until},         {"at", take_at},
    {"edition", take_edition},   {"saturated", take_saturated}, {"follows", take_follows},
    {"currency", take_currency}, {"price", take_price},         {"annual_energy", take_annual_energy},
    {"annual_volume", take_annual_volume},
};

bc_status limits_take_term(limits_reader *r, const bc_ini_entry *e)
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
