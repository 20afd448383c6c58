/* SPDX-License-Identifier: MIT */
/* burner_file.c - the burner file: its sections, keys and words, all by the table of keys. */
#include "base/compiler.h"
#include "base/error_internal.h"
#include "base/ini.h"
#include "base/text.h"
#include "bluecone/burner.h"
#include "bluecone/number.h"
#include "bluecone/units.h"
#include "supply/burner_keys.h"

#include <math.h>
#include <stdio.h>
#include <string.h>

#define LIST_MAX 256 /* bytes of all keys of a section */

/* The file being read. */
typedef struct {
    const char *path;
    bc_burner *burner;
    bc_error *err;
} reader;

/* Keeps the cause that a deeper function gave and adds the place. */
static bc_status blame(const reader *r, const bc_ini_entry *e)
{
    if (r->err) {
        r->err->status = BC_ERR_INPUT;
        r->err->line = e->line;
        (void)snprintf(r->err->file, sizeof r->err->file, "%s", r->path);
    }
    return BC_ERR_INPUT;
}

static bc_status take_text(const reader *r, const key_row *row, const bc_ini_entry *e)
{
    const size_t length = strlen(e->value);

    if (length >= row->size)
        return bc_fail_at(r->err, BC_ERR_INPUT, r->path, e->line, "the value of '%s' is longer than %zu bytes; shorten it", e->key, row->size - 1);
    memcpy((char *)r->burner + row->member, e->value, length + 1);
    return BC_OK;
}

/* Words stand for enums, or for a bool whose second word is true. */
static void put_choice(bc_burner *b, const key_row *row, unsigned choice)
{
    const bool yes = choice != 0;

    if (row->size == sizeof yes)
        memcpy((char *)b + row->member, &yes, sizeof yes);
    else
        memcpy((char *)b + row->member, &choice, sizeof choice);
}

/* "fixed, pneumatic, ...", as much as there is room for. */
static void list_words(const char *const words[], char *list, size_t size)
{
    list[0] = '\0';
    for (unsigned i = 0; words[i]; i++) {
        const size_t used = strlen(list);

        (void)snprintf(list + used, size - used, "%s%s", i ? ", " : "", words[i]);
    }
}

static bc_status take_word(const reader *r, const key_row *row, const bc_ini_entry *e)
{
    char list[LIST_MAX];
    char shown[48];

    for (unsigned i = 0; row->words[i]; i++)
        if (bc_text_same(row->words[i], e->value)) {
            put_choice(r->burner, row, i);
            return BC_OK;
        }
    list_words(row->words, list, sizeof list);
    bc_text_show(shown, sizeof shown, e->value);
    return bc_fail_at(r->err, BC_ERR_INPUT, r->path, e->line, "%s = %s is not known; write one of %s", e->key, shown, list);
}

/* A pressure above the atmosphere, so that 50 mbar and 50 mbarg are the same. */
static bc_status parse_gauge(const bc_ini_entry *e, double *si, bc_error *err)
{
    const char *rest = "";
    double number = 0.0;
    bc_unit unit;
    bc_unit pascal;
    bc_status status = bc_number_prefix(e->value, &number, &rest, err);

    if (status == BC_OK)
        status = bc_unit_parse(rest, &unit, err);
    if (status == BC_OK)
        status = bc_unit_parse("Pa", &pascal, err);
    if (status != BC_OK)
        return status;
    if (!bc_unit_matches(&unit, &pascal))
        return bc_fail(err, BC_ERR_INPUT, "'%.40s' is no pressure; write it as 50 mbar or 5 kPa", e->value);
    *si = number * unit.factor;
    return BC_OK;
}

static bc_status take_measure(const reader *r, const key_row *row, const bc_ini_entry *e)
{
    double si = 0.0;
    const bc_status status = row->kind == KEY_GAUGE ? parse_gauge(e, &si, r->err) : bc_measure_parse(e->value, row->like, row->bare, &si, r->err);

    if (status != BC_OK)
        return blame(r, e);
    si += row->added;
    if (!(si >= row->least && si <= row->most))
        return bc_fail_at(r->err, BC_ERR_INPUT, r->path, e->line, "%s = %.40s is outside %.6g to %.6g %s; correct it", e->key, e->value,
                          burner_key_shown(row, row->least - row->added), burner_key_shown(row, row->most - row->added), row->unit);
    memcpy((char *)r->burner + row->member, &si, sizeof si);
    if (row->flag != NO_FLAG) {
        const bool there = true;

        memcpy((char *)r->burner + row->flag, &there, sizeof there);
    }
    return BC_OK;
}

/* The keys of a section; "" when there is no such section. */
static void list_keys(const char *section, char *list, size_t size)
{
    list[0] = '\0';
    for (size_t i = 0; i < bc_burner_key_count(); i++) {
        const bc_burner_key *key = bc_burner_key_at(i);
        const size_t used = strlen(list);

        if (strcmp(key->section, section) == 0)
            (void)snprintf(list + used, size - used, "%s%s", used ? ", " : "", key->key);
    }
}

/* The sections that have such a key, as "[air] or [flue]"; "" when there is none. */
static void list_sections(const char *key, char *list, size_t size)
{
    list[0] = '\0';
    for (size_t i = 0; i < bc_burner_key_count(); i++) {
        const size_t used = strlen(list);

        if (bc_text_same(bc_burner_key_at(i)->key, key))
            (void)snprintf(list + used, size - used, "%s[%s]", used ? " or " : "", bc_burner_key_at(i)->section);
    }
}

/* Names are not guessed by their looks: 'power' is nearer to 'name' than to 'input'. */
static bc_status refuse_key(const reader *r, const bc_ini_entry *e)
{
    char list[LIST_MAX];
    char elsewhere[64];

    list_keys(e->section, list, sizeof list);
    list_sections(e->key, elsewhere, sizeof elsewhere);
    if (list[0] == '\0')
        return bc_fail_at(r->err, BC_ERR_INPUT, r->path, e->line, "unknown section [%s]; known are [burner], [air], [flue] and [limits]", e->section);
    if (elsewhere[0] != '\0')
        return bc_fail_at(r->err, BC_ERR_INPUT, r->path, e->line, "'%s' stands in [%s]; it belongs to %s", e->key, e->section, elsewhere);
    return bc_fail_at(r->err, BC_ERR_INPUT, r->path, e->line, "unknown key '%s' in [%s]; known are %s", e->key, e->section, list);
}

static bc_status take_entry(const reader *r, const bc_ini_entry *e)
{
    const size_t i = burner_key_find(e->section, e->key);
    const key_row *row = burner_key_row(i);

    if (!row)
        return refuse_key(r, e);
    r->burner->stated[i] = true;
    switch (row->kind) {
    case KEY_TEXT:
        return take_text(r, row, e);
    case KEY_WORD:
        return take_word(r, row, e);
    case KEY_MEASURE:
    case KEY_GAUGE:
    default:
        return take_measure(r, row, e);
    }
}

static bc_status check_air(const reader *r, const bc_ini *ini)
{
    static const char *const WAYS[] = {"excess", "lambda", "flue_o2"};
    const bc_ini_entry *first = NULL;

    for (size_t i = 0; i < BC_COUNT(WAYS); i++) {
        const bc_ini_entry *e = bc_ini_find(ini, "air", WAYS[i]);

        if (e && first)
            return bc_fail_at(r->err, BC_ERR_INPUT, r->path, e->line, "'%s' and '%s' (line %d) both state the air; keep one of them", e->key,
                              first->key, first->line);
        first = e ? e : first;
    }
    if (first && bc_text_same(first->key, "flue_o2"))
        r->burner->air_setting = BC_AIR_BY_FLUE_O2;
    return BC_OK;
}

/* A key that the control does not ask for would be passed over in silence. */
static bc_status check_use(const reader *r, const bc_ini *ini)
{
    const bool trim = r->burner->control == BC_CONTROL_TRIM_AIR || r->burner->control == BC_CONTROL_TRIM_GAS;
    const bool jet = r->burner->control == BC_CONTROL_ENTRAINED;
    const struct {
        const char *section, *key, *where;
        bool used;
    } KEYS[] = {{"burner", "metering", "a trim (trim-air, trim-gas)", trim},
                {"air", "trim_range", "a trim (trim-air, trim-gas)", trim},
                {"air", "primary", "entrained air", jet}};

    for (size_t i = 0; i < BC_COUNT(KEYS); i++) {
        const bc_ini_entry *e = bc_ini_find(ini, KEYS[i].section, KEYS[i].key);

        if (e && !KEYS[i].used)
            return bc_fail_at(r->err, BC_ERR_INPUT, r->path, e->line, "'%s' has a meaning only with %s, but the control is %s; remove one of them",
                              e->key, KEYS[i].where, bc_control_word(r->burner->control));
    }
    return BC_OK;
}

static bc_status check_order(const reader *r, const bc_ini *ini)
{
    const struct {
        const char *least, *most;
        const bc_burner_limit *limit;
    } PAIRS[] = {{"o2_min", "o2_max", &r->burner->o2}, {"flame_min", "flame_max", &r->burner->flame}};

    for (size_t i = 0; i < BC_COUNT(PAIRS); i++) {
        const bc_burner_limit *l = PAIRS[i].limit;

        if (l->has_min && l->has_max && l->min > l->max)
            return bc_fail_at(r->err, BC_ERR_INPUT, r->path, bc_ini_find(ini, "limits", PAIRS[i].most)->line, "%s is below %s; correct one of them",
                              PAIRS[i].most, PAIRS[i].least);
    }
    return BC_OK;
}

static bc_status check_orifices(const reader *r, const bc_ini *ini)
{
    if (r->burner->orifices - floor(r->burner->orifices) <= 0.0)
        return BC_OK;
    const bc_ini_entry *e = bc_ini_find(ini, "burner", "orifices");

    return bc_fail_at(r->err, BC_ERR_INPUT, r->path, e->line, "orifices = %.40s is no whole number; count them", e->value);
}

/* Without them nothing can be said, and no default would be right for most. */
static bc_status check_stated(const reader *r, const char *key)
{
    char list[LIST_MAX];

    if (burner_states(r->burner, "burner", key))
        return BC_OK;
    list_words(burner_key_row(burner_key_find("burner", key))->words, list, sizeof list);
    return bc_fail_at(r->err, BC_ERR_INPUT, r->path, 0, "[burner] does not state its %s; write '%s = ' and one of %s (bluecone-burner(5))", key, key, list);
}

static bc_status read_document(const reader *r, const bc_ini *ini)
{
    static const char *const NEEDED[] = {"type", "control"};
    bc_status status = BC_OK;

    for (size_t i = 0; i < bc_ini_count(ini) && status == BC_OK; i++)
        status = take_entry(r, bc_ini_at(ini, i));
    for (size_t i = 0; i < BC_COUNT(NEEDED) && status == BC_OK; i++)
        status = check_stated(r, NEEDED[i]);
    if (status == BC_OK)
        status = check_air(r, ini);
    if (status == BC_OK)
        status = check_use(r, ini);
    if (status == BC_OK)
        status = check_orifices(r, ini);
    return status == BC_OK ? check_order(r, ini) : status;
}

bc_status bc_burner_read(const char *path, bc_burner *burner, bc_error *err)
{
    bc_burner b = bc_burner_default();
    const reader r = {path, &b, err};
    bc_ini *ini = NULL;
    bc_status status = bc_ini_open(path, &ini, err);

    if (status != BC_OK)
        return status;
    (void)snprintf(b.path, sizeof b.path, "%s", path);
    status = read_document(&r, ini);
    bc_ini_close(ini);
    if (status != BC_OK)
        return status;
    if (b.name[0] == '\0')
        (void)snprintf(b.name, sizeof b.name, "%s burner", bc_burner_type_word(b.type));
    *burner = b;
    return BC_OK;
}
