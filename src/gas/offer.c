/* SPDX-License-Identifier: MIT */
/* offer.c - prices, intensities and flows as people write them. */
#include "bluecone/offer.h"

#include "base/compiler.h"
#include "base/error_internal.h"
#include "base/text.h"
#include "bluecone/number.h"

#include <math.h>
#include <string.h>

#define MOST_SI 1e60 /* in SI units: products of a price and a flow stay finite, and far beyond any supply */

/* Which amount of gas a unit counts: the one dimension with power 1 while all others are zero but `time`. */
static bool amount_of(const bc_unit *unit, int time, bc_per_amount *figure)
{
    static const bc_dimension AMOUNTS[] = {BC_DIM_ENERGY, BC_DIM_MASS, BC_DIM_VOLUME, BC_DIM_AMOUNT};

    for (size_t i = 0; i < BC_COUNT(AMOUNTS); i++) {
        bc_unit wanted = {.factor = 1.0};

        wanted.power[AMOUNTS[i]] = 1;
        wanted.power[BC_DIM_TIME] = (signed char)time;
        if (bc_unit_matches(unit, &wanted)) {
            figure->of = AMOUNTS[i];
            figure->has_metering = unit->has_metering;
            figure->metering_c = unit->metering_c;
            return true;
        }
    }
    return false;
}

/* Cuts `net` or `gross` off the end of a unit; `net` is told. */
static bool take_basis(char *unit)
{
    static const struct {
        const char *word;
        bool net;
    } WORDS[] = {{" net", true}, {" gross", false}};

    for (size_t i = 0; i < BC_COUNT(WORDS); i++) {
        const size_t length = strlen(unit);
        const size_t word = strlen(WORDS[i].word);

        if (length > word && strcmp(unit + length - word, WORDS[i].word) == 0) {
            unit[length - word] = '\0';
            return WORDS[i].net;
        }
    }
    return false;
}

/* Number and what stands behind it, blanks trimmed. */
static bc_status take_number(const char *text, double *value, char unit[BC_WORD_MAX], bc_error *err)
{
    const char *rest = NULL;
    const bc_status status = bc_number_prefix(text, value, &rest, err);

    if (status != BC_OK)
        return status;
    if (!bc_text_copy(unit, BC_WORD_MAX, rest, strlen(rest)))
        return bc_fail(err, BC_ERR_USAGE, "the unit behind the number is longer than %d characters", BC_WORD_MAX - 1);
    return BC_OK;
}

/* The unit behind '/' of a figure per amount. */
static bc_status take_divisor(const char *text, double value, bool net, bc_per_amount *figure, bc_error *err)
{
    bc_unit unit;
    bc_per_amount f = {.given = true, .net = net};
    const bc_status status = bc_unit_parse(text, &unit, err);

    if (status != BC_OK)
        return status;
    if (!amount_of(&unit, 0, &f))
        return bc_fail(err, BC_ERR_USAGE, "'%s' measures no amount of gas; write MWh, GJ, kg, m3 or kmol", text);
    f.si = value / unit.factor;
    if (!(fabs(f.si) <= MOST_SI))
        return bc_fail(err, BC_ERR_RANGE, "%.6g per %.40s is more than can be computed with; correct the number", value, text);
    *figure = f;
    return BC_OK;
}

bc_status bc_price_parse(const char *text, bc_per_amount *price, char currency[BC_CURRENCY_MAX], bc_error *err)
{
    char unit[BC_WORD_MAX];
    char word[BC_CURRENCY_MAX];
    double value = 0.0;
    bc_per_amount parsed;
    bc_status status = take_number(text, &value, unit, err);

    if (status != BC_OK)
        return status;
    const bool net = take_basis(unit);
    const char *slash = strchr(unit, '/');

    if (!slash || slash == unit || !bc_text_copy(word, sizeof word, unit, (size_t)(slash - unit)))
        return bc_fail(err, BC_ERR_USAGE, "a price is written as 32 EUR/MWh: number, currency (up to %d letters), '/', amount of gas",
                       BC_CURRENCY_MAX - 1);
    status = take_divisor(slash + 1, value, net, &parsed, err);
    if (status != BC_OK)
        return status;
    *price = parsed;
    memcpy(currency, word, sizeof word);
    return BC_OK;
}

bc_status bc_intensity_parse(const char *text, bc_per_amount *intensity, bc_error *err)
{
    char unit[BC_WORD_MAX];
    char mass[BC_WORD_MAX];
    double value = 0.0;
    bc_unit counted;
    bc_unit kilogram;
    bc_status status = take_number(text, &value, unit, err);

    if (status != BC_OK)
        return status;
    const bool net = take_basis(unit);
    const char *slash = strchr(unit, '/');

    if (!slash || !bc_text_copy(mass, sizeof mass, unit, (size_t)(slash - unit)))
        return bc_fail(err, BC_ERR_USAGE, "an intensity is written as 12 kg/MWh: number, mass of CO2, '/', amount of gas");
    status = bc_unit_parse(mass, &counted, err);
    if (status == BC_OK)
        status = bc_unit_parse("kg", &kilogram, err);
    if (status != BC_OK)
        return status;
    if (!bc_unit_matches(&counted, &kilogram))
        return bc_fail(err, BC_ERR_USAGE, "'%s' is no mass of CO2; write kg, g or t", mass);
    return take_divisor(slash + 1, value * counted.factor, net, intensity, err);
}

bc_status bc_flow_parse(const char *text, bc_per_amount *flow, bc_error *err)
{
    char word[BC_WORD_MAX];
    bc_unit unit;
    bc_per_amount f = {.given = true};
    bc_status status = take_number(text, &f.si, word, err);

    if (status != BC_OK)
        return status;
    f.net = take_basis(word);
    status = bc_unit_parse(word, &unit, err);
    if (status != BC_OK)
        return status;
    if (!amount_of(&unit, -1, &f))
        return bc_fail(err, BC_ERR_USAGE, "'%.40s' is no flow of gas; write m3/h, kg/h, kmol/h or MW", text);
    f.si *= unit.factor;
    if (!(f.si >= 1.0 / MOST_SI && f.si <= MOST_SI))
        return bc_fail(err, BC_ERR_RANGE, "the flow '%.40s' is not above zero, or more than can be computed with; correct the number", text);
    *flow = f;
    return BC_OK;
}
