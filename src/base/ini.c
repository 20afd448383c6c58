/* SPDX-License-Identifier: MIT */
/* ini.c - scanning an INI text for what iniparser would pass over in silence, then letting it read. */
#define _GNU_SOURCE /* memfd_create: hands iniparser, which reads only by path, the checked bytes */
#include "base/ini.h"

#include "base/error_internal.h"
#include "base/file_text.h"
#include "base/text.h"

#include <errno.h>
#include <iniparser/iniparser.h>
#include <stdbool.h>
#include <stdio.h>
#include <stdlib.h>
#include <string.h>
#include <sys/mman.h>
#include <unistd.h>

#define ENTRIES_MAX 512 /* a full contract has about a hundred */

struct bc_ini {
    size_t count;
    dictionary *values;
    bc_ini_entry entries[ENTRIES_MAX];
};

/* The scan in progress. */
typedef struct {
    const char *path;
    int line;
    char section[BC_INI_KEY_MAX];
    bool section_has_key;
    int section_line;
    bc_ini *ini;
    bc_error *err;
} scan;

static bc_status refuse(const scan *s, const char *what)
{
    return bc_fail_at(s->err, BC_ERR_INPUT, s->path, s->line, "%s", what);
}

static void lower_case(char *text)
{
    for (; *text != '\0'; text++)
        if (*text >= 'A' && *text <= 'Z')
            *text = (char)(*text - 'A' + 'a');
}

static bc_status close_section(const scan *s)
{
    if (s->section[0] == '\0' || s->section_has_key)
        return BC_OK;
    return bc_fail_at(s->err, BC_ERR_INPUT, s->path, s->section_line, "section [%s] is empty; give it keys or remove it",
                      s->section);
}

/* Sections are compared in lower case, as iniparser stores them; a repeated one would be merged. */
static bc_status take_section(scan *s, const char *text, size_t length)
{
    const bc_status status = close_section(s);

    if (status != BC_OK)
        return status;
    const char *end = memchr(text, ']', length);
    const char *behind = end ? bc_text_skip_space(end + 1) : "";

    if (!end || (*behind != '\0' && *behind != ';' && *behind != '#'))
        return refuse(s, "a section line is written [name]; behind it only a remark may stand");
    if (!bc_text_copy(s->section, sizeof s->section, text + 1, (size_t)(end - text - 1)) || s->section[0] == '\0'
        || strpbrk(s->section, ":="))
        return refuse(s, "the section name is empty, too long or holds ':' or '='");
    lower_case(s->section);
    for (size_t i = 0; i < s->ini->count; i++)
        if (strcmp(s->ini->entries[i].section, s->section) == 0)
            return bc_fail_at(s->err, BC_ERR_INPUT, s->path, s->line, "section [%s] stands here again (first key on line %d); join them",
                              s->section, s->ini->entries[i].line);
    s->section_has_key = false;
    s->section_line = s->line;
    return BC_OK;
}

static bc_status check_repeated(const scan *s, const bc_ini_entry *entry)
{
    for (size_t i = 0; i < s->ini->count; i++) {
        const bc_ini_entry *other = &s->ini->entries[i];

        if (strcmp(other->section, entry->section) == 0 && bc_text_same(other->key, entry->key))
            return bc_fail_at(s->err, BC_ERR_INPUT, s->path, s->line, "'%s' stands here again (first on line %d); keep one of them",
                              entry->key, other->line);
    }
    return BC_OK;
}

/* iniparser ends a quoted value at the closing quote and drops what follows; only a remark may follow. */
static bool quotes_close(const char *value)
{
    const char *start = bc_text_skip_space(value);

    if (*start != '"' && *start != '\'')
        return true;
    const char *close = strchr(start + 1, *start);

    if (!close)
        return false;
    const char *rest = bc_text_skip_space(close + 1);

    return *rest == '\0' || *rest == ';' || *rest == '#';
}

static bc_status take_entry(scan *s, const char *text, const char *equals)
{
    if (s->section[0] == '\0')
        return refuse(s, "a key stands before the first section; write the section above it, as [components] or [burner]");
    if (s->ini->count == ENTRIES_MAX)
        return refuse(s, "the file has more keys than any gas needs (512); is it the right file?");
    bc_ini_entry *entry = &s->ini->entries[s->ini->count];

    if (!bc_text_copy(entry->key, sizeof entry->key, text, (size_t)(equals - text)))
        return refuse(s, "the key is longer than 63 characters; shorten it");
    if (entry->key[0] == '\0')
        return refuse(s, "there is no key in front of '='");
    if (strchr(entry->key, ':'))
        return refuse(s, "a key cannot hold ':'; write '=' between key and value");
    if (!quotes_close(equals + 1))
        return refuse(s, "a value that starts with a quote must end with the same quote; remove the quotes or the text behind them");
    memcpy(entry->section, s->section, sizeof entry->section);
    entry->value = "";
    entry->line = s->line;
    const bc_status status = check_repeated(s, entry);

    if (status == BC_OK) {
        s->ini->count++;
        s->section_has_key = true;
    }
    return status;
}

/* A line without its end; text is terminated. */
static bc_status take_line(scan *s, const char *text, size_t length)
{
    if (length > BC_INI_LINE_MAX)
        return refuse(s, "the line has more than 1000 bytes; shorten it");
    for (size_t i = 0; i < length; i++)
        if (((unsigned char)text[i] < 0x20 && text[i] != '\t') || text[i] == 0x7f)
            return refuse(s, "the line holds a control character; remove it");
    const char *start = bc_text_skip_space(text);

    if (length == 0 || *start == '\0')
        return BC_OK;
    if (text[length - 1] == '\\') /* of a remark, too: iniparser joins lines before it looks at them */
        return refuse(s, "the line ends in a backslash, which would join it with the next; remove it");
    if (*start == ';' || *start == '#')
        return BC_OK;
    if (*start == '[')
        return take_section(s, start, strlen(start));
    const char *equals = strchr(start, '=');

    if (!equals)
        return refuse(s, "the line is neither [section] nor key = value; put '=' between them, or ';' before a remark");
    return take_entry(s, start, equals);
}

/* Blanks at the end of a line would hide a backslash or a section's bracket. */
static size_t trimmed(const char *line, size_t length)
{
    while (length > 0 && (line[length - 1] == ' ' || line[length - 1] == '\t' || line[length - 1] == '\r'))
        length--;
    return length;
}

/* iniparser takes a section line only without a remark behind it: blank the remark. */
static void blank_section_remark(char *line, size_t length)
{
    size_t i = 0;

    while (i < length && (line[i] == ' ' || line[i] == '\t'))
        i++;
    if (i == length || line[i] != '[')
        return;
    while (i < length && line[i] != ']')
        i++;
    for (i++; i < length; i++)
        line[i] = ' ';
}

static bc_status scan_lines(scan *s, char *text, size_t length)
{
    char line[BC_INI_LINE_MAX + 2];
    char *p = text;
    const char *end = text + length;

    while (p < end) {
        const char *newline = memchr(p, '\n', (size_t)(end - p));
        const size_t raw = newline ? (size_t)(newline - p) : (size_t)(end - p);
        size_t n = trimmed(p, raw);

        s->line++;
        if (n > BC_INI_LINE_MAX || raw > BC_INI_LINE_MAX + 1) /* one more for a carriage return */
            n = BC_INI_LINE_MAX + 1;
        memcpy(line, p, n);
        line[n] = '\0';
        const bc_status status = take_line(s, line, n);

        if (status != BC_OK)
            return status;
        blank_section_remark(p, raw);
        p += raw + (newline != NULL);
    }
    if (s->ini->count == 0)
        return bc_fail_at(s->err, BC_ERR_INPUT, s->path, 0, "the file has no key = value line; see bluecone-composition(5) for an example");
    return close_section(s);
}

static bool write_all(int fd, const char *text, size_t length)
{
    while (length > 0) {
        const ssize_t n = write(fd, text, length);

        if (n < 0 && errno == EINTR)
            continue;
        if (n <= 0)
            return false;
        text += n;
        length -= (size_t)n;
    }
    return true;
}

/* For what iniparser would print: with checked text only that memory ran out, which the caller is told anyway. */
static int say_nothing(const char *format, ...)
{
    (void)format;
    return 0;
}

/* iniparser 4.1 uses the tables of a new dictionary without looking whether it got them. What it is going to need is
 * asked for here first: where that much cannot be had it is not called. */
static bool has_room(size_t length)
{
    void *room = malloc(2 * length + 65536); /* keys and values of the text; tables, buffer of the file */

    free(room);
    return room != NULL;
}

static dictionary *load_values(const char *text, size_t length)
{
    if (!has_room(length))
        return NULL;
    const int fd = memfd_create("bluecone-ini", MFD_CLOEXEC);
    char path[64];
    dictionary *values = NULL;

    if (fd < 0)
        return NULL;
    (void)snprintf(path, sizeof path, "/proc/self/fd/%d", fd);
    iniparser_set_error_callback(say_nothing); /* the printer of iniparser is one for the process; it has no other way */
    if (write_all(fd, text, length))
        values = iniparser_load(path);
    (void)close(fd);
    return values;
}

/* iniparser's word for each scanned key: the first entry that it has none for, or NULL. It stores "section:key" in
 * lower case. */
static const bc_ini_entry *attach_values(bc_ini *ini)
{
    for (size_t i = 0; i < ini->count; i++) {
        bc_ini_entry *entry = &ini->entries[i];
        char name[2 * BC_INI_KEY_MAX + 2];

        (void)snprintf(name, sizeof name, "%s:%s", entry->section, entry->key);
        lower_case(name);
        entry->value = iniparser_getstring(ini->values, name, NULL);
        if (!entry->value)
            return entry;
    }
    return NULL;
}

/* Why there are no values. */
static bc_status refuse_values(const char *path, bc_error *err)
{
    if (access("/proc/self/fd", F_OK) != 0)
        return bc_fail_at(err, BC_ERR_FILE, path, 0, "cannot be parsed without /proc, through which iniparser gets its text; mount /proc");
    return bc_fail_at(err, BC_ERR_MEMORY, path, 0, "not enough memory to read the file");
}

static bc_status build(bc_ini *ini, const char *path, char *text, size_t length, bc_error *err)
{
    scan s = {.path = path, .ini = ini, .err = err};
    const bc_status status = scan_lines(&s, text, length);
    const bc_ini_entry *missing = NULL;

    if (status != BC_OK)
        return status;
    /* A line that iniparser has no memory for, or cannot read, it leaves out in silence. All that it could not make sense
     * of was refused above: what is missing twice is no fault of the file. */
    for (int attempt = 0; attempt < 2; attempt++) {
        if (ini->values)
            iniparser_freedict(ini->values);
        ini->values = load_values(text, length);
        if (!ini->values)
            return refuse_values(path, err);
        missing = attach_values(ini);
        if (!missing)
            return BC_OK;
    }
    return bc_fail_at(err, BC_ERR_FILE, path, missing->line, "'%s' did not come back from iniparser: memory is short or the system failed; try again",
                      missing->key);
}

bc_status bc_ini_open(const char *path, bc_ini **ini, bc_error *err)
{
    char *text = NULL;
    size_t length = 0;
    bc_status status = bc_file_text(path, BC_INI_BYTES_MAX, &text, &length, err);

    if (status != BC_OK)
        return status;
    bc_ini *opened = malloc(sizeof *opened);

    if (opened) { /* the entries, 70 kB, are filled one by one */
        opened->count = 0;
        opened->values = NULL;
        status = build(opened, path, text, length, err);
    } else {
        status = bc_fail_at(err, BC_ERR_MEMORY, path, 0, "not enough memory to read the file");
    }
    free(text);
    if (status == BC_OK)
        *ini = opened;
    else
        bc_ini_close(opened);
    return status;
}

void bc_ini_close(bc_ini *ini)
{
    if (!ini)
        return;
    if (ini->values)
        iniparser_freedict(ini->values);
    free(ini);
}

size_t bc_ini_count(const bc_ini *ini)
{
    return ini->count;
}

const bc_ini_entry *bc_ini_at(const bc_ini *ini, size_t index)
{
    return &ini->entries[index];
}

const bc_ini_entry *bc_ini_find(const bc_ini *ini, const char *section, const char *key)
{
    for (size_t i = 0; i < ini->count; i++)
        if (strcmp(ini->entries[i].section, section) == 0 && bc_text_same(ini->entries[i].key, key))
            return &ini->entries[i];
    return NULL;
}
