/* SPDX-License-Identifier: MIT */
/* units.c - reading units and converting between them. */
#include "bluecone/units.h"

#include "base/error_internal.h"
#include "base/text.h"
#include "bluecone/number.h"

#include <math.h>
#include <string.h>

#define NO_STATE (-1000.0)                 /* no temperature of the trade */
#define STATE_60F ((60.0 - 32.0) / 1.8)    /* 60 F in C */

/* What a symbol measures: a base dimension, or one of the two that are not base. */
typedef enum {
    ENERGY = BC_DIM_ENERGY,
    MASS = BC_DIM_MASS,
    VOLUME = BC_DIM_VOLUME,
    AMOUNT = BC_DIM_AMOUNT,
    TIME = BC_DIM_TIME,
    PRESSURE = BC_DIM_PRESSURE,
    TEMPERATURE = BC_DIM_TEMPERATURE,
    LENGTH = BC_DIM_LENGTH,
    POWER,
    RATIO
} measure;

typedef struct {
    const char *symbol;
    measure of;
    double factor, offset, metering_c;
    const char *meaning;
} unit_row;

static const unit_row UNITS[] = {
#define UNIT(symbol, of, factor, offset, metering_c, meaning) {symbol, of, factor, offset, metering_c, meaning},
#include "data/units.def"
};

size_t bc_unit_count(void)
{
    return BC_COUNT(UNITS);
}

const char *bc_unit_symbol(size_t index)
{
    return index < BC_COUNT(UNITS) ? UNITS[index].symbol : "";
}

const char *bc_unit_meaning(size_t index)
{
    return index < BC_COUNT(UNITS) ? UNITS[index].meaning : "";
}

static const unit_row *find_symbol(const char *symbol)
{
    for (size_t i = 0; i < BC_COUNT(UNITS); i++)
        if (strcmp(UNITS[i].symbol, symbol) == 0)
            return &UNITS[i];
    return NULL;
}

static const char *nearest_symbol(const char *symbol)
{
    const char *best = UNITS[0].symbol;
    size_t best_distance = BC_WORD_MAX;

    for (size_t i = 0; i < BC_COUNT(UNITS); i++) {
        if (bc_text_same(UNITS[i].symbol, symbol))
            return UNITS[i].symbol;
        const size_t distance = bc_text_unlikeness(symbol, UNITS[i].symbol);

        if (distance < best_distance) {
            best_distance = distance;
            best = UNITS[i].symbol;
        }
    }
    return best;
}

static void apply(bc_unit *unit, const unit_row *row, int power)
{
    unit->factor = power > 0 ? unit->factor * row->factor : unit->factor / row->factor;
    if (row->of == POWER) {
        unit->power[BC_DIM_ENERGY] = (signed char)(unit->power[BC_DIM_ENERGY] + power);
        unit->power[BC_DIM_TIME] = (signed char)(unit->power[BC_DIM_TIME] - power);
    } else if (row->of != RATIO) {
        unit->power[row->of] = (signed char)(unit->power[row->of] + power);
    }
    if (row->metering_c > NO_STATE) {
        unit->has_metering = true;
        unit->metering_c = row->metering_c;
    }
}

/* Superscripts are how a page prints a power; the symbols here have plain digits. */
static bc_status refuse_symbol(const char *symbol, const char *shown, bc_error *err)
{
    char hint[BC_HINT_MAX];

    if (strstr(symbol, "\xC2\xB3") || strstr(symbol, "\xC2\xB2"))
        return bc_fail(err, BC_ERR_USAGE, "unknown unit '%s'; powers are plain digits, as m3 (bluecone list units)", shown);
    bc_text_suggest(hint, sizeof hint, "the nearest known one is", symbol, nearest_symbol(symbol));
    return bc_fail(err, BC_ERR_USAGE, "unknown unit '%s'%s (bluecone list units)", shown, hint);
}

/* One symbol of the quotient; `alone` when the unit consists of it, so that an offset has a meaning. */
static bc_status take_symbol(bc_unit *unit, const char *symbol, int power, bool alone, bc_error *err)
{
    const unit_row *row = find_symbol(symbol);
    char shown[BC_WORD_MAX];

    bc_text_show(shown, sizeof shown, symbol);
    if (strcmp(symbol, "MBtu") == 0)
        return bc_fail(err, BC_ERR_USAGE, "'MBtu' is read as a thousand and as a million Btu; write kBtu or MMBtu");
    if (!row)
        return refuse_symbol(symbol, shown, err);
    apply(unit, row, power);
    if (alone)
        unit->offset = row->offset;
    return BC_OK;
}

bc_status bc_unit_parse(const char *text, bc_unit *unit, bc_error *err)
{
    bc_unit u = {.factor = 1.0};
    const char *p = text;
    int power = 1;

    if (strlen(text) >= BC_WORD_MAX)
        return bc_fail(err, BC_ERR_USAGE, "the unit is longer than %d characters", BC_WORD_MAX - 1);
    while (*p != '\0') {
        const size_t length = strcspn(p, "/");
        char symbol[BC_WORD_MAX];

        if (!bc_text_copy(symbol, sizeof symbol, p, length) || symbol[0] == '\0')
            return bc_fail(err, BC_ERR_USAGE, "the unit '%s' has an empty part", text);
        const bool alone = power > 0 && p[length] == '\0';
        const bc_status status = take_symbol(&u, symbol, power, alone, err);

        if (status != BC_OK)
            return status;
        power = -1;
        p += length;
        if (*p == '/' && p[1] == '\0')
            return bc_fail(err, BC_ERR_USAGE, "the unit '%s' has an empty part", text);
        p += *p == '/';
    }
    *unit = u;
    return BC_OK;
}

bool bc_unit_matches(const bc_unit *a, const bc_unit *b)
{
    return memcmp(a->power, b->power, sizeof a->power) == 0;
}

double bc_unit_to_si(const bc_unit *unit, double value)
{
    return value * unit->factor + unit->offset;
}

double bc_unit_from_si(const bc_unit *unit, double si)
{
    return (si - unit->offset) / unit->factor;
}

/* The unit that people write where the SI one is meant, for an example. */
static const char *usual_unit(const char *like)
{
    static const char *const USUAL[][2] = {{"Pa", "kPa"}, {"W", "kW"}, {"K", "C"}, {"m", "mm"}};

    for (size_t i = 0; i < BC_COUNT(USUAL); i++)
        if (strcmp(USUAL[i][0], like) == 0)
            return USUAL[i][1];
    return like;
}

bc_status bc_measure_parse(const char *text, const char *like, const char *bare, double *si, bc_error *err)
{
    const char *rest = NULL;
    double value = 0.0;
    bc_unit wanted = {.factor = 1.0};
    bc_unit unit = {.factor = 1.0};
    bc_status status = bc_number_prefix(text, &value, &rest, err);

    if (status != BC_OK)
        return status;
    if (*rest == '\0' && !bare)
        return bc_fail(err, BC_ERR_USAGE, "'%s' has no unit; write one right behind the number, as %s%s", text, text, usual_unit(like));
    status = bc_unit_parse(like, &wanted, err);
    if (status != BC_OK)
        return status;
    status = bc_unit_parse(*rest == '\0' ? bare : rest, &unit, err);
    if (status != BC_OK)
        return status;
    if (!bc_unit_matches(&unit, &wanted))
        return bc_fail(err, BC_ERR_USAGE, "the unit of '%s' does not fit here; write one that converts to %s", text, like);
    value = bc_unit_to_si(&unit, value);
    if (!isfinite(value))
        return bc_fail(err, BC_ERR_INPUT, "'%s' is beyond the range of numbers; correct it", text);
    *si = value;
    return BC_OK;
}
