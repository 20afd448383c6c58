/* SPDX-License-Identifier: MIT */
/* contract_trade.c - what gases are worth under the terms of a contract, and against the present supply. */
#include "cli/contract_report.h"

#include "base/error_internal.h"
#include "cli/figures.h"

#include <stdio.h>
#include <string.h>

#define J_PER_MWH 3.6e9
#define J_PER_GJ 1e9
#define MONEY_DIGITS 6
#define METHOD "terms of the contract"

/* The terms that a gas is bought at: the present supply by its own price where it states one. */
static const bc_offer *offer_of(const contract_case *c, size_t gas)
{
    const bc_offer *own = &c->gases.each[gas].loaded.composition.offer;

    return gas >= c->judged && own->price.given ? own : NULL;
}

static bc_status trade_of(const contract_case *c, size_t gas, bc_trade *t, bc_error *err)
{
    return bc_contract_trade(c->contract, offer_of(c, gas), &c->gases.each[gas].loaded.gas, t, err);
}

static bc_status add_heat(report *r, const contract_case *c, bc_error *err)
{
    static const char *const IDS[] = {"hhv", "lhv", "wobbe-gross", "wobbe-net", "relative-density"};
    const size_t section = report_add_section(r, "heat", "Heat and density at the state of the contract");

    for (size_t q = 0; q < BC_COUNT(IDS); q++)
        for (size_t i = 0; i < c->gases.count; i++) {
            const slot where = {r, section, i};
            size_t quantity = 0;
            bc_status status = bc_quantity_find(IDS[q], &quantity, err);

            if (status == BC_OK)
                status = report_quantity(&where, quantity, &c->gases.each[i].subject, c->a, err);
            if (status != BC_OK && status != BC_ERR_RANGE)
                return status;
        }
    return BC_OK;
}

static void add_price(const slot *where, const contract_case *c, const bc_trade *t)
{
    char unit[4][BC_CURRENCY_MAX + 8];
    static const char *const PER[] = {"MWh", "GJ", "m3", "kg"};

    for (size_t i = 0; i < BC_COUNT(PER); i++)
        (void)snprintf(unit[i], sizeof unit[i], "%s/%s", t->currency, PER[i]);
    const plain_figure figures[] = {
        {"price-gross-mwh", "price of gross heat", t->price_per_gross_j * J_PER_MWH, unit[0], MONEY_DIGITS, METHOD},
        {"price-net-mwh", "price of net heat", t->price_per_net_j * J_PER_MWH, unit[0], MONEY_DIGITS, METHOD},
        {"price-gross-gj", "price of gross heat", t->price_per_gross_j * J_PER_GJ, unit[1], MONEY_DIGITS, METHOD},
        {"price-net-gj", "price of net heat", t->price_per_net_j * J_PER_GJ, unit[1], MONEY_DIGITS, METHOD},
        {"price-volume", "price of volume", t->price_per_m3, unit[2], MONEY_DIGITS, METHOD},
        {"price-mass", "price of mass", t->price_per_kg, unit[3], MONEY_DIGITS, METHOD},
    };

    add_figures(where, c->a, figures, BC_COUNT(figures));
}

static void add_year(const slot *where, const contract_case *c, const bc_trade *t)
{
    const plain_figure figures[] = {
        {"annual-energy-gross", "gross heat of a year", t->annual_gross_j / J_PER_MWH, "MWh", MONEY_DIGITS, METHOD},
        {"annual-energy-net", "net heat of a year", t->annual_net_j / J_PER_MWH, "MWh", MONEY_DIGITS, METHOD},
        {"annual-volume", "volume of a year", t->annual_m3, "m3", MONEY_DIGITS, METHOD},
        {"annual-mass", "mass of a year", t->annual_kg * 1e-3, "t", MONEY_DIGITS, METHOD},
        {"annual-co2", "CO2 of burning it", t->annual_co2_kg * 1e-3, "t", MONEY_DIGITS, METHOD},
        {"annual-cost", "cost of a year", t->annual_cost, t->currency, MONEY_DIGITS, METHOD},
    };

    add_figures(where, c->a, figures, BC_COUNT(figures) - (t->has_price ? 0 : 1));
}

static void add_carbon(const slot *where, const contract_case *c, const bc_trade *t)
{
    const plain_figure figures[] = {
        {"co2-factor-gross", "CO2 of gross heat", t->co2_kg_per_gross_j * J_PER_GJ, "kg/GJ", MONEY_DIGITS, "all carbon burnt"},
        {"co2-factor-net", "CO2 of net heat", t->co2_kg_per_net_j * J_PER_GJ, "kg/GJ", MONEY_DIGITS, "all carbon burnt"},
    };

    add_figures(where, c->a, figures, BC_COUNT(figures));
}

/* One line of the comparison. */
static void add_difference(report *r, size_t table, const char *const text[3], double present, double offered)
{
    report_add_text(r, table, text[0]);
    report_add_text(r, table, text[1]);
    report_add_text(r, table, text[2]);
    report_add_number(r, table, present, -1);
    report_add_number(r, table, offered, -1);
    report_add_number(r, table, offered - present, -1);
    if (present != 0.0)
        report_add_number(r, table, 100.0 * (offered / present - 1.0), 2);
    else
        report_add_text(r, table, "-");
}

static bc_status compare_quantities(report *r, size_t table, const contract_case *c, size_t gas, bc_error *err)
{
    static const char *const IDS[] = {"hhv", "lhv", "wobbe-gross", "wobbe-net", "relative-density", "air-demand", "co2-factor-net"};

    for (size_t i = 0; i < BC_COUNT(IDS); i++) {
        size_t q = 0;
        double present = 0.0;
        double offered = 0.0;
        bc_status status = bc_quantity_find(IDS[i], &q, err);

        if (status == BC_OK)
            status = bc_quantity_value(q, &c->gases.each[c->judged].subject, &present, err);
        if (status == BC_OK)
            status = bc_quantity_value(q, &c->gases.each[gas].subject, &offered, err);
        if (status != BC_OK && status != BC_ERR_RANGE)
            return status;
        const char *unit = strcmp(bc_quantity_at(q)->unit, "1") == 0 ? "" : bc_quantity_at(q)->unit;
        const char *const text[] = {bc_quantity_at(q)->id, c->gases.each[gas].loaded.name, unit};

        if (status == BC_OK)
            add_difference(r, table, text, present, offered);
    }
    return BC_OK;
}

static void compare_terms(report *r, size_t table, const char *name, const bc_trade *present, const bc_trade *offered)
{
    char unit[BC_CURRENCY_MAX + 8];

    (void)snprintf(unit, sizeof unit, "%s/MWh", offered->currency);
    const struct {
        const char *id, *unit;
        double present, offered;
        bool there;
    } ROWS[] = {
        {"price-net-mwh", unit, present->price_per_net_j * J_PER_MWH, offered->price_per_net_j * J_PER_MWH, offered->has_price},
        {"annual-volume", "m3", present->annual_m3, offered->annual_m3, offered->has_annual},
        {"annual-energy-net", "MWh", present->annual_net_j / J_PER_MWH, offered->annual_net_j / J_PER_MWH, offered->has_annual},
        {"annual-co2", "t", present->annual_co2_kg * 1e-3, offered->annual_co2_kg * 1e-3, offered->has_annual},
        {"annual-cost", offered->currency, present->annual_cost, offered->annual_cost, offered->has_annual && offered->has_price},
    };
    const bool comparable = present->has_price && strcmp(present->currency, offered->currency) == 0;

    for (size_t i = 0; i < BC_COUNT(ROWS); i++) {
        const char *const text[] = {ROWS[i].id, name, ROWS[i].unit};
        const bool is_money = i == 0 || i + 1 == BC_COUNT(ROWS);

        if (ROWS[i].there && (comparable || !is_money))
            add_difference(r, table, text, ROWS[i].present, ROWS[i].offered);
    }
}

static bc_status add_comparison(report *r, const contract_case *c, const bc_trade trades[], bc_error *err)
{
    const struct {
        const char *id, *heading, *unit;
    } COLUMNS[] = {{"figure", "figure", ""}, {"gas", "gas", ""}, {"unit", "unit", ""}, {"present", "present", ""}, {"offered", "offered", ""},
                   {"difference", "difference", ""}, {"percent", "change", "%"}};
    char title[BC_NAME_MAX + 60];

    if (!c->has_present)
        return BC_OK;
    (void)snprintf(title, sizeof title, "Against the present supply, %.120s", c->gases.each[c->judged].loaded.name);
    const size_t table = report_add_table(r, "difference", title);

    for (size_t i = 0; i < BC_COUNT(COLUMNS); i++)
        report_add_column(r, table, COLUMNS[i].id, COLUMNS[i].heading, COLUMNS[i].unit);
    for (size_t i = 0; i < c->judged; i++) {
        const bc_status status = compare_quantities(r, table, c, i, err);

        if (status != BC_OK)
            return status;
        compare_terms(r, table, c->gases.each[i].loaded.name, &trades[c->judged], &trades[i]);
    }
    return BC_OK;
}

/* Whose price a figure rests on, where it is not the contract's. */
static void tell_price(report *r, const contract_case *c)
{
    if (c->has_present && offer_of(c, c->judged))
        report_add_warning(r, "The present supply is counted at the price of its own file, the others at that of the contract.");
    else if (c->has_present && c->contract->price.given)
        report_add_warning(r, "The file of the present supply states no price: it is counted at that of the contract.");
}

/* Sections of a report that terms go into. */
typedef struct {
    size_t price, year, carbon;
} trade_sections;

/* A gas without heat has no figures here. */
static bc_status add_terms(report *r, const contract_case *c, size_t gas, const trade_sections *s, bc_trade *t, bc_error *err)
{
    const bc_status status = trade_of(c, gas, t, err);

    if (status != BC_OK)
        return status == BC_ERR_RANGE ? BC_OK : status;
    if (t->has_price && c->contract->price.given)
        add_price(&(slot){r, s->price, gas}, c, t);
    if (t->has_annual)
        add_year(&(slot){r, s->year, gas}, c, t);
    add_carbon(&(slot){r, s->carbon, gas}, c, t);
    return BC_OK;
}

bc_status contract_trade_report(report *r, const contract_case *c, bc_error *err)
{
    bc_trade trades[ARGUMENTS_MAX + 1];
    bc_status status = add_heat(r, c, err);
    trade_sections sections = {.price = 0};

    if (c->contract->price.given)
        sections.price = report_add_section(r, "price", "Price");
    if (c->contract->annual.given)
        sections.year = report_add_section(r, "year", "A year");
    sections.carbon = report_add_section(r, "carbon", "Carbon dioxide");
    memset(trades, 0, sizeof trades);
    for (size_t i = 0; i < c->gases.count && status == BC_OK; i++)
        status = add_terms(r, c, i, &sections, &trades[i], err);
    tell_price(r, c);
    return status == BC_OK ? add_comparison(r, c, trades, err) : status;
}
