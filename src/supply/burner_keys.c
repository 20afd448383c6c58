/* SPDX-License-Identifier: MIT */
/* burner_keys.c - the keys of a burner file, and their values in words. */
#include "supply/burner_keys.h"

#include "base/compiler.h"
#include "base/text.h"
#include "bluecone/units.h"
#include "supply/burner_words.h"

#include <stdio.h>
#include <string.h>

#define AT(member) offsetof(bc_burner, member), sizeof(((bc_burner *)0)->member)

static const key_row ROWS[] = {
#define TEXT(section, key, member, meaning) {{section, key, meaning}, KEY_TEXT, AT(member), NO_FLAG, NULL, "", "", "", 0.0, 0.0, 0.0},
#define WORD(section, key, member, words, meaning) {{section, key, meaning}, KEY_WORD, AT(member), NO_FLAG, words, "", "", "", 0.0, 0.0, 0.0},
#define MEASURE(section, key, member, like, bare, unit, least, most, added, meaning) \
    {{section, key, meaning}, KEY_MEASURE, AT(member), NO_FLAG, NULL, like, bare, unit, least, most, added},
#define OPTIONAL(section, key, member, flag, like, bare, unit, least, most, added, meaning) \
    {{section, key, meaning}, KEY_MEASURE, AT(member), offsetof(bc_burner, flag), NULL, like, bare, unit, least, most, added},
#define GAUGE(section, key, member, flag, like, bare, unit, least, most, added, meaning) \
    {{section, key, meaning}, KEY_GAUGE, AT(member), offsetof(bc_burner, flag), NULL, like, bare, unit, least, most, added},
#include "data/burner_keys.def"
};

_Static_assert(BC_COUNT(ROWS) <= BC_BURNER_KEYS_MAX, "BC_BURNER_KEYS_MAX has no room for all keys");

size_t bc_burner_key_count(void)
{
    return BC_COUNT(ROWS);
}

const bc_burner_key *bc_burner_key_at(size_t index)
{
    return index < BC_COUNT(ROWS) ? &ROWS[index].shown : NULL;
}

const key_row *burner_key_row(size_t index)
{
    return index < BC_COUNT(ROWS) ? &ROWS[index] : NULL;
}

size_t burner_key_find(const char *section, const char *key)
{
    size_t i = 0;

    while (i < BC_COUNT(ROWS) && (strcmp(ROWS[i].shown.section, section) != 0 || !bc_text_same(ROWS[i].shown.key, key)))
        i++;
    return i;
}

bool burner_states(const bc_burner *b, const char *section, const char *key)
{
    const size_t i = burner_key_find(section, key);

    return i < BC_COUNT(ROWS) && b->stated[i];
}

double burner_key_shown(const key_row *row, double si)
{
    bc_unit unit;

    if (bc_unit_parse(row->unit, &unit, NULL) != BC_OK)
        return si;
    return bc_unit_from_si(&unit, si);
}

static unsigned choice_of(const bc_burner *b, const key_row *row)
{
    unsigned choice = 0;
    bool yes = false;

    if (row->size == sizeof yes)
        memcpy(&yes, (const char *)b + row->member, sizeof yes);
    else
        memcpy(&choice, (const char *)b + row->member, sizeof choice);
    return row->size == sizeof yes ? (unsigned)yes : choice;
}

static bool is_key(const key_row *row, const char *key)
{
    return strcmp(row->shown.key, key) == 0;
}

/* Whether a key has a say for this burner: the air is stated one way, and some keys belong to some controls. */
static bool in_force(const bc_burner *b, const key_row *row)
{
    const bool trim = b->control == BC_CONTROL_TRIM_AIR || b->control == BC_CONTROL_TRIM_GAS;
    const bool excess = burner_states(b, "air", "excess");

    if (is_key(row, "excess"))
        return excess;
    if (is_key(row, "flue_o2"))
        return b->air_setting == BC_AIR_BY_FLUE_O2;
    if (is_key(row, "lambda"))
        return !excess && b->air_setting == BC_AIR_BY_LAMBDA;
    if (is_key(row, "metering") || is_key(row, "trim_range"))
        return trim;
    return !is_key(row, "primary") || b->control == BC_CONTROL_ENTRAINED;
}

static void measure_text(const bc_burner *burner, const key_row *row, char *text, size_t size)
{
    const char *unit = strcmp(row->unit, "1") == 0 ? "" : row->unit;
    double si = 0.0;
    bool there = true;

    if (row->flag != NO_FLAG)
        memcpy(&there, (const char *)burner + row->flag, sizeof there);
    memcpy(&si, (const char *)burner + row->member, sizeof si);
    if (there)
        (void)bc_text_format(text, size, "%.6g%s%s", burner_key_shown(row, si - row->added), unit[0] ? " " : "", unit);
}

void bc_burner_key_text(const bc_burner *burner, size_t index, char *text, size_t size)
{
    const key_row *row = burner_key_row(index);

    text[0] = '\0';
    if (!row || !in_force(burner, row))
        return;
    if (row->kind == KEY_TEXT) {
        (void)snprintf(text, size, "%s", (const char *)burner + row->member);
        return;
    }
    if (row->kind == KEY_WORD) {
        (void)snprintf(text, size, "%s", row->words[choice_of(burner, row)]);
        return;
    }
    measure_text(burner, row, text, size);
}
