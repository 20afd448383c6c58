/* SPDX-License-Identifier: MIT */
/* gas_file_keys.c - keys of a composition file by their tables, words by their choices; section [supply]. */
#include "base/error_internal.h"
#include "base/text.h"
#include "gas/gas_file_internal.h"

#include <stdio.h>
#include <string.h>

bc_status gas_file_blame(const reader *r, const bc_ini_entry *e)
{
    if (r->err) {
        r->err->status = BC_ERR_INPUT;
        r->err->line = e->line;
        (void)snprintf(r->err->file, sizeof r->err->file, "%s", r->path);
    }
    return BC_ERR_INPUT;
}

bc_status gas_file_choice(const reader *r, const bc_ini_entry *e, const choice *choices, size_t count, int *value)
{
    char list[128] = "";

    for (size_t i = 0; i < count; i++) {
        if (bc_text_same(choices[i].word, e->value)) {
            *value = choices[i].value;
            return BC_OK;
        }
        const size_t used = strlen(list);

        (void)snprintf(list + used, sizeof list - used, "%s%s", i ? ", " : "", choices[i].word);
    }
    char shown[48];

    bc_text_show(shown, sizeof shown, e->value);
    return bc_fail_at(r->err, BC_ERR_INPUT, r->path, e->line, "%s = %s is not known; write one of %s", e->key, shown, list);
}

static bc_status refuse_key(const reader *r, const bc_ini_entry *e, const file_key keys[], size_t count)
{
    char list[160] = "";

    for (size_t i = 0; i < count; i++) {
        const size_t used = strlen(list);

        (void)snprintf(list + used, sizeof list - used, "%s%s", i ? ", " : "", keys[i].key);
    }
    return bc_fail_at(r->err, BC_ERR_INPUT, r->path, e->line, "unknown key '%s' in [%s]; known are %s", e->key, e->section, list);
}

bc_status gas_file_key(reader *r, const bc_ini_entry *e, const file_key keys[], size_t count)
{
    for (size_t i = 0; i < count; i++)
        if (bc_text_same(keys[i].key, e->key))
            return keys[i].take(r, e);
    return refuse_key(r, e, keys, count);
}

static bc_status take_price(reader *r, const bc_ini_entry *e)
{
    bc_offer *o = &r->c->offer;

    return bc_price_parse(e->value, &o->price, o->currency, r->err) == BC_OK ? BC_OK : gas_file_blame(r, e);
}

static bc_status take_co2(reader *r, const bc_ini_entry *e)
{
    return bc_intensity_parse(e->value, &r->c->offer.co2, r->err) == BC_OK ? BC_OK : gas_file_blame(r, e);
}

static bc_status take_max_flow(reader *r, const bc_ini_entry *e)
{
    return bc_flow_parse(e->value, &r->c->offer.max_flow, r->err) == BC_OK ? BC_OK : gas_file_blame(r, e);
}

static bc_status take_carbon(reader *r, const bc_ini_entry *e)
{
    static const choice CHOICES[] = {{"fossil", 0}, {"biogenic", 1}};
    int value = 0;
    const bc_status status = gas_file_choice(r, e, CHOICES, BC_COUNT(CHOICES), &value);

    if (status == BC_OK)
        r->c->offer.biogenic = value == 1;
    return status;
}

/* The keys of [supply]. */
static const file_key SUPPLY_KEYS[] = {
    {"price", take_price}, {"co2", take_co2}, {"max_flow", take_max_flow}, {"carbon", take_carbon},
};

bc_status gas_file_supply_key(reader *r, const bc_ini_entry *e)
{
    return gas_file_key(r, e, SUPPLY_KEYS, BC_COUNT(SUPPLY_KEYS));
}
