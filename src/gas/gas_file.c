/* SPDX-License-Identifier: MIT */
/* gas_file.c - the composition file: its sections, keys and words. */
#include "base/error_internal.h"
#include "base/text.h"
#include "bluecone/number.h"
#include "bluecone/units.h"
#include "gas/gas_file_internal.h"
#include "gas/species_index.h"

#include <assert.h>
#include <math.h>
#include <stdio.h>
#include <string.h>

static bc_status refuse(const reader *r, const bc_ini_entry *e, const char *cause)
{
    return bc_fail_at(r->err, BC_ERR_INPUT, r->path, e->line, "%s", cause);
}

static bc_status take_text(const reader *r, const bc_ini_entry *e, char *to, size_t size)
{
    if (strlen(e->value) >= size)
        return bc_fail_at(r->err, BC_ERR_INPUT, r->path, e->line, "the value of '%s' is longer than %zu bytes; shorten it", e->key, size - 1);
    memcpy(to, e->value, strlen(e->value) + 1);
    return BC_OK;
}

static bc_status take_basis(reader *r, const bc_ini_entry *e)
{
    static const choice CHOICES[] = {{"mole", BC_BASIS_MOLE}, {"volume", BC_BASIS_VOLUME}, {"mass", BC_BASIS_MASS}};
    int value = 0;
    const bc_status status = gas_file_choice(r, e, CHOICES, BC_COUNT(CHOICES), &value);

    if (status == BC_OK)
        r->c->basis = (bc_basis)value;
    return status;
}

static bc_status take_unit(reader *r, const bc_ini_entry *e)
{
    static const choice CHOICES[] = {{"percent", 0}, {"fraction", 1}, {"ppm", 2}};
    static const double UNITS[] = {1e-2, 1.0, 1e-6};
    int value = 0;
    const bc_status status = gas_file_choice(r, e, CHOICES, BC_COUNT(CHOICES), &value);

    if (status == BC_OK)
        r->unit = UNITS[value];
    return status;
}

static bc_status take_moisture(reader *r, const bc_ini_entry *e)
{
    static const choice CHOICES[] = {
        {"dry", BC_MOISTURE_DRY}, {"as-analysed", BC_MOISTURE_AS_ANALYSED}, {"saturated", BC_MOISTURE_SATURATED}};
    int value = 0;
    const bc_status status = gas_file_choice(r, e, CHOICES, BC_COUNT(CHOICES), &value);

    if (status == BC_OK)
        r->c->moisture = (bc_moisture)value;
    return status;
}

static bc_status take_correlation(reader *r, const bc_ini_entry *e)
{
    static const choice CHOICES[] = {{"normalised", BC_CLOSURE_NORMALISED}, {"none", BC_CLOSURE_NONE}};
    int value = 0;
    const bc_status status = gas_file_choice(r, e, CHOICES, BC_COUNT(CHOICES), &value);

    if (status == BC_OK)
        r->c->closure = (bc_closure)value;
    return status;
}

#define END_ITSELF 1e-6 /* K, Pa: -50 C is inside, however it was rounded on its way to kelvin */

/* "15 C, 101.325 kPa"; the pressure may be left out. */
static bc_status take_measured_at(reader *r, const bc_ini_entry *e)
{
    char part[64];
    const char *comma = strchr(e->value, ',');
    const size_t length = comma ? (size_t)(comma - e->value) : strlen(e->value);

    if (strchr(e->value, '/'))
        return refuse(r, e, "measured_at is one temperature and one pressure, at which the volumes were measured; write it as 15 C, 101.325 kPa");
    if (!bc_text_copy(part, sizeof part, e->value, length))
        return refuse(r, e, "measured_at is too long; write it as 15 C, 101.325 kPa");
    if (bc_measure_parse(part, "K", "C", &r->c->measured_at_k, r->err) != BC_OK)
        return gas_file_blame(r, e);
    if (comma && bc_measure_parse(bc_text_skip_space(comma + 1), "Pa", NULL, &r->c->measured_at_pa, r->err) != BC_OK)
        return gas_file_blame(r, e);
    if (!(r->c->measured_at_k > 223.15 - END_ITSELF && r->c->measured_at_k < 373.15 + END_ITSELF))
        return refuse(r, e, "measured_at: the temperature is outside -50 to 100 C; correct it");
    if (!(r->c->measured_at_pa > 1e3 - END_ITSELF && r->c->measured_at_pa < 1e8 + END_ITSELF))
        return refuse(r, e, "measured_at: the pressure is outside 1 kPa to 1000 bar; correct it");
    r->c->measured_at_k = fmin(fmax(r->c->measured_at_k, 223.15), 373.15);
    return BC_OK;
}

static bc_status take_name(reader *r, const bc_ini_entry *e)
{
    return take_text(r, e, r->c->name, sizeof r->c->name);
}

static bc_status take_family(reader *r, const bc_ini_entry *e)
{
    return take_text(r, e, r->c->family, sizeof r->c->family);
}

static bc_status take_origin(reader *r, const bc_ini_entry *e)
{
    return take_text(r, e, r->c->origin, sizeof r->c->origin);
}

/* The keys of [gas], the one list for reading and for the message about unknown ones. */
static const file_key GAS_KEYS[] = {
    {"name", take_name},         {"family", take_family},           {"source", take_origin},
    {"basis", take_basis},       {"unit", take_unit},               {"moisture", take_moisture},
    {"measured_at", take_measured_at}, {"correlation", take_correlation},
};

static bc_status take_gas_key(reader *r, const bc_ini_entry *e)
{
    return gas_file_key(r, e, GAS_KEYS, BC_COUNT(GAS_KEYS));
}

/* A share with an optional unit of its own behind it: "4.85", "120 ppm". */
static bc_status take_share(const reader *r, const bc_ini_entry *e, double *share)
{
    const char *rest = NULL;
    double value = 0.0;
    double unit = r->unit;

    if (bc_number_prefix(e->value, &value, &rest, r->err) != BC_OK)
        return gas_file_blame(r, e);
    if (strcmp(rest, "%") == 0)
        unit = 1e-2;
    else if (strcmp(rest, "ppm") == 0)
        unit = 1e-6;
    else if (*rest != '\0')
        return bc_fail_at(r->err, BC_ERR_INPUT, r->path, e->line, "'%.40s' is not a number alone; behind it only %% or ppm may stand", e->value);
    if (value < 0.0)
        return bc_fail_at(r->err, BC_ERR_INPUT, r->path, e->line, "the share of '%s' is negative; correct it", e->key);
    *share = value * unit;
    return BC_OK;
}

static bc_status check_same(const reader *r, const bc_entry *entry)
{
    for (size_t i = 0; i < r->c->entry_count; i++) {
        const bc_entry *other = &r->c->entries[i];

        for (size_t j = 0; j < SPECIES_COUNT; j++)
            if (entry->parts[j] == 1.0 && other->parts[j] == 1.0)
                return bc_fail_at(r->err, BC_ERR_INPUT, r->path, entry->line, "'%s' is the same component as '%s' on line %d; keep one of them",
                                  entry->word, other->word, other->line);
    }
    return BC_OK;
}

static bc_status take_component(reader *r, const bc_ini_entry *e)
{
    bc_composition *c = r->c;
    bc_entry *entry = &c->entries[c->entry_count];

    if (c->entry_count == BC_ENTRY_MAX)
        return refuse(r, e, "there are more than 96 components; join some");
    memset(entry, 0, sizeof *entry);
    memcpy(entry->word, e->key, sizeof entry->word);
    entry->line = e->line;
    char section[BC_INI_KEY_MAX + 8];
    int carbon = 0;
    const bool own_split = cut_word(e->key, &carbon);
    bc_status status = BC_OK;

    (void)snprintf(section, sizeof section, "cut c%d+", carbon);
    bool stated = false;

    for (size_t i = 0; own_split && i < bc_ini_count(r->ini); i++)
        stated = stated || bc_text_same(bc_ini_at(r->ini, i)->section, section);
    if (!stated) /* a stated split is filled in by take_cut() */
        status = composition_resolve(c, entry, r->err);
    if (status == BC_OK)
        status = check_same(r, entry);
    if (status != BC_OK)
        return status;
    if (bc_text_same(e->value, "rest")) {
        for (size_t i = 0; i < c->entry_count; i++)
            if (c->entries[i].is_rest)
                return refuse(r, e, "'rest' stands twice; at most one component can be the rest");
        entry->is_rest = true;
    } else {
        status = take_share(r, e, &entry->amount);
    }
    if (status == BC_OK)
        c->entry_count++;
    return status;
}

/* The entry of [components] that another section speaks of, by word or by what the word stands for. */
static bc_entry *entry_named(const reader *r, const char *word)
{
    size_t species = 0;
    const bool known = bc_species_find(word, &species, NULL) == BC_OK;

    for (size_t i = 0; i < r->c->entry_count; i++)
        if (bc_text_same(r->c->entries[i].word, word) || (known && r->c->entries[i].parts[species] == 1.0))
            return &r->c->entries[i];
    return NULL;
}

/* Standard uncertainties in the unit of the shares; `%` behind the number makes it relative. */
static bc_status take_uncertainty(reader *r, const bc_ini_entry *e)
{
    const char *rest = NULL;
    double value = 0.0;
    bc_entry *entry = entry_named(r, e->key);

    if (!entry)
        return bc_fail_at(r->err, BC_ERR_INPUT, r->path, e->line, "'%s' has an uncertainty but does not stand in [components]; add or remove it", e->key);
    if (entry->is_rest)
        return bc_fail_at(r->err, BC_ERR_INPUT, r->path, e->line, "'%s' is the rest: its uncertainty follows from the others; remove this line", e->key);
    if (bc_number_prefix(e->value, &value, &rest, r->err) != BC_OK)
        return gas_file_blame(r, e);
    if (value < 0.0)
        return refuse(r, e, "an uncertainty cannot be negative; correct it");
    if (strcmp(rest, "%") == 0)
        entry->u = value * 1e-2 * entry->amount;
    else if (*rest == '\0')
        entry->u = value * r->unit;
    else
        return refuse(r, e, "behind an uncertainty only % (relative) may stand");
    r->c->has_uncertainty = true;
    return BC_OK;
}

/* One line of [cut c6+]: a species and its mole share of the cut, normalised by finish_cuts(). */
static bc_status take_cut(reader *r, const bc_ini_entry *e, const char *word)
{
    size_t species = 0;
    double share = 0.0;
    bc_entry *entry = entry_named(r, word);

    if (!entry)
        return bc_fail_at(r->err, BC_ERR_INPUT, r->path, e->line, "the cut '%s' does not stand in [components]; add or remove it", word);
    if (bc_species_find(e->key, &species, r->err) != BC_OK)
        return gas_file_blame(r, e);
    if (bc_number_parse(e->value, &share, r->err) != BC_OK)
        return gas_file_blame(r, e);
    if (share < 0.0)
        return refuse(r, e, "the share of a cut cannot be negative; correct it");
    entry->parts[species] += share;
    return BC_OK;
}

static bc_status finish_cuts(const reader *r)
{
    for (size_t i = 0; i < r->c->entry_count; i++) {
        bc_entry *entry = &r->c->entries[i];
        double sum = 0.0;

        for (size_t j = 0; j < SPECIES_COUNT; j++)
            sum += entry->parts[j];
        if (!(sum > 0.0) || !isfinite(sum))
            return bc_fail_at(r->err, BC_ERR_INPUT, r->path, entry->line, "the split of the cut '%s' adds up to nothing; correct [cut %s]",
                              entry->word, entry->word);
        for (size_t j = 0; j < SPECIES_COUNT; j++)
            entry->parts[j] /= sum;
    }
    return BC_OK;
}

/* Passes over the file: settings first, since [components] depends on them wherever [gas] stands. */
typedef bc_status taker(reader *, const bc_ini_entry *);

static bc_status take_section(reader *r, const char *section, taker *take)
{
    for (size_t i = 0; i < bc_ini_count(r->ini); i++) {
        const bc_ini_entry *e = bc_ini_at(r->ini, i);

        if (strcmp(e->section, section) != 0)
            continue;
        const bc_status status = take(r, e);

        if (status != BC_OK)
            return status;
    }
    return BC_OK;
}

static bc_status take_cuts(reader *r)
{
    for (size_t i = 0; i < bc_ini_count(r->ini); i++) {
        const bc_ini_entry *e = bc_ini_at(r->ini, i);

        if (strncmp(e->section, "cut ", 4) != 0)
            continue;
        const bc_status status = take_cut(r, e, e->section + 4);

        if (status != BC_OK)
            return status;
    }
    return finish_cuts(r);
}

static bc_status check_sections(const reader *r)
{
    for (size_t i = 0; i < bc_ini_count(r->ini); i++) {
        const bc_ini_entry *e = bc_ini_at(r->ini, i);

        if (strcmp(e->section, "gas") != 0 && strcmp(e->section, "components") != 0 && strcmp(e->section, "uncertainty") != 0
            && strcmp(e->section, "supply") != 0 && strcmp(e->section, "printed") != 0 && strncmp(e->section, "cut ", 4) != 0)
            return bc_fail_at(r->err, BC_ERR_INPUT, r->path, e->line,
                              "unknown section [%s]; known are [gas], [components], [uncertainty], [printed], [supply] and [cut NAME]", e->section);
    }
    return BC_OK;
}

/* A figure printed on the certificate: kept as it is, for who asks which state it belongs to. */
static bc_status take_printed(reader *r, const bc_ini_entry *e)
{
    bc_composition *c = r->c;
    bc_printed_line *p = &c->printed[c->printed_count];

    if (c->printed_count == BC_PRINTED_MAX)
        return refuse(r, e, "there are more than 16 printed figures; leave some out");
    static_assert(sizeof e->key <= sizeof p->id, "a key fits");
    if (strlen(e->value) >= sizeof p->text)
        return refuse(r, e, "a printed figure is a number and its unit, as 41.21 MJ/m3; shorten it");
    (void)snprintf(p->id, sizeof p->id, "%s", e->key);
    (void)snprintf(p->text, sizeof p->text, "%s", e->value);
    p->line = e->line;
    c->printed_count++;
    return BC_OK;
}

static bc_status read_document(reader *r)
{
    bc_status status = check_sections(r);

    if (status == BC_OK)
        status = take_section(r, "gas", take_gas_key);
    if (status == BC_OK)
        status = take_section(r, "components", take_component);
    if (status == BC_OK && r->c->entry_count == 0)
        status = bc_fail_at(r->err, BC_ERR_INPUT, r->path, 0, "there is no section [components]; list the components in one");
    if (status == BC_OK)
        status = take_cuts(r);
    if (status == BC_OK)
        status = take_section(r, "uncertainty", take_uncertainty);
    if (status == BC_OK)
        status = take_section(r, "supply", gas_file_supply_key);
    if (status == BC_OK)
        status = take_section(r, "printed", take_printed);
    return status == BC_OK ? composition_finish(r->c, r->err) : status;
}

/* The name of a gas that states none: the file's, without folder and ending. */
static void name_after_file(bc_composition *c, const char *path)
{
    const char *slash = strrchr(path, '/');
    const char *base = slash ? slash + 1 : path;
    const size_t length = strlen(base);
    const size_t stem = length > 4 && strcmp(base + length - 4, ".ini") == 0 ? length - 4 : length;

    (void)snprintf(c->name, sizeof c->name, "%.*s", (int)(stem < sizeof c->name ? stem : sizeof c->name - 1), base);
}

bc_status bc_composition_read(const char *path, bc_composition *c, bc_error *err)
{
    bc_ini *ini = NULL;
    bc_status status = bc_ini_open(path, &ini, err);

    if (status != BC_OK)
        return status;
    composition_clear(c);
    name_after_file(c, path);
    (void)snprintf(c->path, sizeof c->path, "%s", path);
    reader r = {.path = path, .ini = ini, .c = c, .unit = 1e-2, .err = err};

    status = read_document(&r);
    bc_ini_close(ini);
    return status;
}
