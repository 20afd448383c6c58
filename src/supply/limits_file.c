/* SPDX-License-Identifier: MIT */
/* limits_file.c - the contract file: its sections and keys, and the files it follows. */
#include "supply/limits_internal.h"

#include "base/error_internal.h"
#include "base/text.h"
#include "gas/nearest.h"

#include <stdio.h>
#include <string.h>
#include <sys/stat.h>

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
            status = limits_take_term(r, e);
        if (status != BC_OK)
            return status;
    }
    return BC_OK;
}

static bc_status read_file(const limits_reader *from, const char *path, bc_error *err);

static bool exists(const char *path)
{
    struct stat st;

    return stat(path, &st) == 0;
}

/* The file of a word of the command line or of `follows`: NAME.ini in one of the folders. */
static bool find_bundled(const limits_folders *f, const char *word, char path[BC_FILE_MAX])
{
    for (size_t i = 0; i < f->count && !strchr(word, '/'); i++) {
        const int length = snprintf(path, BC_FILE_MAX, "%s/%s.ini", f->path[i], word);

        if (length > 0 && length < BC_FILE_MAX && exists(path))
            return true;
    }
    return false;
}

/* Two files that follow each other would be read for ever. */
static bc_status check_circle(const limits_reader *r, const bc_ini_entry *e, const char *path)
{
    for (const limits_reader *at = r; at; at = at->from)
        if (strcmp(at->path, path) == 0)
            return bc_fail_at(r->err, BC_ERR_INPUT, r->path, e->line, "'%.200s' follows itself: the contracts stand in a circle; break it", e->value);
    if (r->depth == FOLLOW_MAX)
        return limits_refuse(r, e, "contracts follow each other more than four times, or in a circle; break it");
    return BC_OK;
}

/* `follows` names a bundled specification, or a file beside this one; its limits come first, so that ours replace them. */
static bc_status follow(const limits_reader *r)
{
    const bc_ini_entry *e = bc_ini_find(r->ini, "contract", "follows");
    const char *slash = strrchr(r->path, '/');
    char path[BC_FILE_MAX];

    if (!e)
        return BC_OK;
    const int folder = slash && e->value[0] != '/' ? (int)(slash - r->path) + 1 : 0;
    const int length = snprintf(path, sizeof path, "%.*s%s", folder, r->path, e->value);

    if (length < 0 || (size_t)length >= sizeof path)
        return limits_refuse(r, e, "the path of the contract to follow is too long");
    if (!exists(path) && !find_bundled(r->folders, e->value, path))
        return bc_fail_at(r->err, BC_ERR_INPUT, r->path, e->line,
                          "no file or bundled specification '%.200s' to follow (bluecone list specifications)", e->value);
    bc_status status = check_circle(r, e, path);

    if (status == BC_OK)
        status = read_file(r, path, r->err);
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

static bc_status read_file(const limits_reader *from, const char *path, bc_error *err)
{
    bc_ini *ini = NULL;
    bc_status status = bc_ini_open(path, &ini, err);

    if (status != BC_OK)
        return status;
    limits_reader r = {.path = path, .ini = ini, .c = from->c, .folders = from->folders, .depth = from->depth + 1, .err = err};

    r.from = from->depth > 0 ? from : NULL;
    status = read_document(&r);
    bc_ini_close(ini);
    return status;
}

static bc_status read_contract(const char *path, const limits_folders *folders, bc_contract *c, bc_error *err)
{
    const limits_reader before = {.path = "", .c = c, .folders = folders};

    memset(c, 0, sizeof *c);
    c->state = bc_state_default();
    (void)snprintf(c->name, sizeof c->name, "%.100s", path);
    const bc_status status = read_file(&before, path, err);

    if (status != BC_OK)
        return status;
    (void)snprintf(c->path, sizeof c->path, "%s", path);
    if (c->limit_count == 0)
        return bc_fail_at(err, BC_ERR_INPUT, path, 0, "the contract has no limit; write one as [limit wobbe-gross] with min, max, unit");
    return BC_OK;
}

bc_status bc_contract_read(const char *path, bc_contract *c, bc_error *err)
{
    const limits_folders none = {.count = 0};

    return read_contract(path, &none, c, err);
}

static bc_status refuse_word(const char *word, const limits_folders *f, bc_error *err)
{
    const bc_nearest n = bc_nearest_bundled(word, f->path, strchr(word, '/') ? 0 : f->count);
    char shown[BC_WORD_MAX];

    bc_text_show(shown, sizeof shown, word);
    if (!bc_nearest_helps(&n))
        return bc_fail(err, BC_ERR_INPUT, "there is no contract file or bundled specification '%s' (bluecone list specifications)", shown);
    return bc_fail(err, BC_ERR_INPUT, "there is no contract file or bundled specification '%s'; the nearest is '%s' (bluecone list specifications)",
                   shown, n.name);
}

bc_status bc_contract_find(const char *word, const char *const folders[], size_t folder_count, bc_contract *c, bc_error *err)
{
    const limits_folders f = {folders, folder_count};
    char path[BC_FILE_MAX];

    if (word[0] == '\0')
        return bc_fail(err, BC_ERR_INPUT, "the name of the contract is empty; give a file or a bundled specification");
    if (exists(word))
        return read_contract(word, &f, c, err);
    return find_bundled(&f, word, path) ? read_contract(path, &f, c, err) : refuse_word(word, &f, err);
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
