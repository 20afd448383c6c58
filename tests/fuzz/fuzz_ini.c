/* SPDX-License-Identifier: MIT */
/* fuzz_ini.c - the guard in front of iniparser: what it lets through stands so in the file, and iniparser would read it
 * alike. */
#include "fuzz.h"

#include "base/ini.h"
#include "base/text.h"

#include <iniparser/iniparser.h>

static int say_nothing(const char *format, ...)
{
    (void)format;
    return 0;
}

/* What the reader of iniparser makes of the file: it takes a section line only without a remark behind it. */
static dictionary *read_by_iniparser(const uint8_t *data, size_t size)
{
    char *text = fuzz_text(data, size);

    for (char *p = text; *p != '\0'; p += strcspn(p, "\n"), p += *p == '\n') {
        char *end = p + strspn(p, " \t");

        if (*end != '[')
            continue;
        end += strcspn(end, "]\n");
        if (*end == ']')
            memset(end + 1, ' ', strcspn(end + 1, "\n"));
    }
    dictionary *d = iniparser_load(fuzz_file((const uint8_t *)text, size));

    free(text);
    return d;
}

static void check_same(const dictionary *theirs, const bc_ini_entry *e)
{
    char name[2 * BC_INI_KEY_MAX + 2];

    (void)snprintf(name, sizeof name, "%s:%s", e->section, e->key);
    const char *value = iniparser_getstring(theirs, name, NULL);

    fuzz_require(value != NULL && strcmp(value, e->value) == 0);
}

/* The text of a line, from 1. */
static const char *line_at(const char *text, int line, size_t *length)
{
    for (; line > 1; line--)
        text = strchr(text, '\n') + 1;
    *length = strcspn(text, "\n");
    return text;
}

static bool stands_in(const char *word, const char *text, size_t length)
{
    const size_t n = strlen(word);

    for (size_t i = 0; i + n <= length; i++)
        if (memcmp(text + i, word, n) == 0)
            return true;
    return false;
}

/* Key and value are those of the line that is named, and of no other. */
static void check_entry(const bc_ini *ini, const bc_ini_entry *e, const char *text)
{
    size_t length = 0;
    const char *line = line_at(text, e->line, &length);
    const char *equals = memchr(line, '=', length);

    fuzz_require(equals != NULL);
    fuzz_require(stands_in(e->key, line, (size_t)(equals - line)));
    fuzz_require(stands_in(e->value, equals + 1, length - (size_t)(equals + 1 - line)));
    fuzz_require(bc_ini_find(ini, e->section, e->key) == e);
    const char *first = bc_text_skip_space(equals + 1);

    /* an empty value is one that was not written, or is a remark */
    fuzz_require(e->value[0] != '\0' || first >= line + length || strchr(";#\"'=", *first) != NULL);
}

int LLVMFuzzerTestOneInput(const uint8_t *data, size_t size)
{
    bc_ini *ini = NULL;
    bc_error err;

    iniparser_set_error_callback(say_nothing);
    if (!fuzz_answer(bc_ini_open(fuzz_file(data, size), &ini, &err), &err)) {
        fuzz_require(err.status == BC_ERR_INPUT && ini == NULL);
        return 0;
    }
    char *text = fuzz_text(data, size);

    fuzz_require(bc_ini_count(ini) > 0);
    dictionary *theirs = read_by_iniparser(data, size);

    fuzz_require(theirs != NULL);
    for (size_t i = 0; i < bc_ini_count(ini); i++) {
        check_entry(ini, bc_ini_at(ini, i), text);
        check_same(theirs, bc_ini_at(ini, i));
    }
    iniparser_freedict(theirs);
    bc_ini_close(ini);
    free(text);
    return 0;
}
