/* SPDX-License-Identifier: MIT */
/* arguments.c - taking a command line apart by the table of options. */
#include "base/error_internal.h"
#include "base/text.h"
#include "cli/cli.h"

#include <string.h>

enum {
#define COMMAND(name, word, usage, help, example, least, most) COMMAND_##name,
#include "cli/commands.def"
    COMMAND_COUNT
};

#define GET (1U << COMMAND_get)
#define SHEET (1U << COMMAND_sheet)
#define BURN (1U << COMMAND_burn)
#define BLEND (1U << COMMAND_blend)
#define SWITCH (1U << COMMAND_switch)
#define CONTRACT (1U << COMMAND_contract)
#define STREAM (1U << COMMAND_stream)
#define LIST (1U << COMMAND_list)
#define VERIFY (1U << COMMAND_verify)

static const command COMMANDS[] = {
#define COMMAND(name, word, usage, help, example, least, most) {word, usage, help, example, least, most, 1U << COMMAND_##name, run_##name},
#include "cli/commands.def"
};

typedef struct {
    const char *word, *argument, *help;
    unsigned commands;
} option_row;

static const option_row OPTIONS[OPTION_COUNT] = {
#define OPTION(name, word, argument, commands, help) {word, argument, help, commands},
#include "cli/options.def"
};

const command *command_at(size_t index)
{
    return index < BC_COUNT(COMMANDS) ? &COMMANDS[index] : NULL;
}

const command *command_find(const char *word)
{
    for (size_t i = 0; i < BC_COUNT(COMMANDS); i++)
        if (strcmp(COMMANDS[i].word, word) == 0)
            return &COMMANDS[i];
    return NULL;
}

const char *option_word(const command *c, size_t index, const char **argument, const char **help)
{
    for (size_t i = 0; i < OPTION_COUNT; i++) {
        if (!(OPTIONS[i].commands & c->bit))
            continue;
        if (index-- == 0) {
            *argument = OPTIONS[i].argument;
            *help = OPTIONS[i].help;
            return OPTIONS[i].word;
        }
    }
    return NULL;
}

bool option_is_common(const char *word)
{
    for (size_t i = 0; i < OPTION_COUNT; i++) {
        const unsigned but_one = OPTIONS[i].commands & (OPTIONS[i].commands - 1U);

        if (strcmp(OPTIONS[i].word, word) == 0) /* more than two bits are set */
            return (but_one & (but_one - 1U)) != 0;
    }
    return false;
}

/* What other commands ask on the line, and a contract says itself: the key; NULL for no such option. */
static const char *key_of_contract(const command *c, const char *word)
{
    static const struct {
        const char *word, *key;
    } KEYS[] = {{"at", "at = 25/0"}, {"saturated", "saturated = yes"}, {"edition", "edition = 1995"}, {"unit", "unit = kWh/m3 at each limit"}};
    const size_t length = strcspn(word, "=");

    for (size_t i = 0; i < BC_COUNT(KEYS); i++)
        if (strcmp(c->word, "contract") == 0 && strlen(KEYS[i].word) == length && strncmp(word, KEYS[i].word, length) == 0)
            return KEYS[i].key;
    return NULL;
}

static bc_status refuse_option(const command *c, const char *word, bc_error *err)
{
    const char *best = NULL;
    char shown[BC_WORD_MAX];

    bc_text_show(shown, sizeof shown, word);
    if (key_of_contract(c, word))
        return bc_fail(err, BC_ERR_USAGE, "'contract' has no option --%s: the file of the contract says it, as %s", shown, key_of_contract(c, word));
    for (size_t i = 0; i < OPTION_COUNT; i++)
        if ((OPTIONS[i].commands & c->bit) && (!best || bc_text_unlikeness(word, OPTIONS[i].word) < bc_text_unlikeness(word, best)))
            best = OPTIONS[i].word;
    if (!best || !bc_text_is_near(word, best))
        return bc_fail(err, BC_ERR_USAGE, "'%s' has no option --%s; see bluecone %s --help", c->word, shown, c->word);
    return bc_fail(err, BC_ERR_USAGE, "'%s' has no option --%s; the nearest is --%s; see bluecone %s --help", c->word, shown, best, c->word);
}

/* The option of a word that may go on with "=value"; OPTION_COUNT when there is none. */
static size_t find_option(const command *c, const char *word, size_t length)
{
    for (size_t i = 0; i < OPTION_COUNT; i++)
        if ((OPTIONS[i].commands & c->bit) && strlen(OPTIONS[i].word) == length && strncmp(OPTIONS[i].word, word, length) == 0)
            return i;
    return OPTION_COUNT;
}

/* Where an option's value may stand: behind its word, or as the next word of the line (NULL: none). */
typedef struct {
    const char *behind, *next;
    bool used; /* the next word was taken */
} place;

static bool takes_list(const option_row *row)
{
    return strstr(row->argument, ",...") || strcmp(row->argument, "LIST") == 0 || strncmp(row->argument, "GAS=", 4) == 0
           || strncmp(row->argument, "WHAT=", 5) == 0;
}

static bc_status store(const command *c, arguments *a, size_t option, place *p, bc_error *err)
{
    const option_row *row = &OPTIONS[option];
    const bool wants = row->argument[0] != '\0';

    if (a->value[option])
        return bc_fail(err, BC_ERR_USAGE, takes_list(row) ? "--%s stands twice; write its parts into one, parted by commas"
                                                          : "--%s stands twice; keep one of them", row->word);
    if (!wants && p->behind)
        return bc_fail(err, BC_ERR_USAGE, "--%s takes no value", row->word);
    if (wants && !p->behind && !p->next)
        return bc_fail(err, BC_ERR_USAGE, "--%s needs a value, %s; see bluecone %s --help", row->word, row->argument, c->word);
    p->used = wants && !p->behind;
    if (!wants)
        a->value[option] = "";
    else
        a->value[option] = p->behind ? p->behind : p->next;
    return BC_OK;
}

static bc_status take_long(const command *c, arguments *a, const char *word, place *p, bc_error *err)
{
    const char *equals = strchr(word, '=');
    const size_t option = find_option(c, word, equals ? (size_t)(equals - word) : strlen(word));

    if (option == OPTION_COUNT)
        return refuse_option(c, word, err);
    p->behind = equals ? equals + 1 : NULL;
    return store(c, a, option, p, err);
}

/* -o FILE and -h are the only short ones. */
static bc_status take_short(const command *c, arguments *a, const char *word, place *p, bc_error *err)
{
    if (word[0] == 'o') {
        p->behind = word[1] != '\0' ? word + 1 : NULL;
        return store(c, a, OPTION_output, p, err);
    }
    if (strcmp(word, "h") == 0)
        return store(c, a, OPTION_help, p, err);
    char shown[BC_WORD_MAX];

    bc_text_show(shown, sizeof shown, word);
    return bc_fail(err, BC_ERR_USAGE, "'%s' has no option -%s; the short ones are -o FILE and -h; see bluecone %s --help", c->word, shown, c->word);
}

static bc_status take_word(arguments *a, const char *word, bc_error *err)
{
    if (a->argument_count == ARGUMENTS_MAX)
        return bc_fail(err, BC_ERR_USAGE, "more than %d arguments", ARGUMENTS_MAX);
    a->argument[a->argument_count++] = word;
    return BC_OK;
}

/* Said before anything is computed: a form that the command has not, or that another option contradicts. */
static bc_status check_output(const command *c, const arguments *a, bc_error *err)
{
    const char *path = a->value[OPTION_output];
    render_form form = RENDER_TEXT;

    if (!path || !render_form_of(path, &form))
        return BC_OK;
    if (render_form_is_chart(form) && !(c->bit & (BURN | BLEND | SWITCH | CONTRACT | STREAM)))
        return bc_fail(err, BC_ERR_USAGE, "-o %.200s: '%s' has no charts; write it to .txt .json .csv .html or .xlsx", path, c->word);
    if ((a->value[OPTION_json] && form != RENDER_JSON) || (a->value[OPTION_csv] && form != RENDER_CSV))
        return bc_fail(err, BC_ERR_USAGE, "-o %.200s: the ending contradicts --%s; keep one of them", path, a->value[OPTION_json] ? "json" : "csv");
    return BC_OK;
}

/* Names the first word of the usage line that is not there, without what may follow it in brackets. */
static bc_status refuse_lack(const command *c, size_t given, bc_error *err)
{
    const char *lacking = c->usage;

    for (size_t i = 0; i < given; i++)
        lacking += strcspn(lacking, " ") + 1;
    return bc_fail(err, BC_ERR_USAGE, "%.*s is missing: bluecone %s %s; see bluecone %s --help", (int)strcspn(lacking, " [.,"), lacking, c->word, c->usage,
                   c->word);
}

static bc_status check_count(const command *c, const arguments *a, bc_error *err)
{
    if (a->value[OPTION_help] || a->value[OPTION_version])
        return BC_OK;
    if (a->argument_count < c->least)
        return refuse_lack(c, a->argument_count, err);
    if (a->argument_count > c->most)
        return bc_fail(err, BC_ERR_USAGE, "'%s' is one argument too many: bluecone %s %s", a->argument[c->most], c->word, c->usage);
    if (a->value[OPTION_json] && a->value[OPTION_csv])
        return bc_fail(err, BC_ERR_USAGE, "--json and --csv exclude each other; keep one of them");
    if (a->value[OPTION_bare] && (a->value[OPTION_json] || a->value[OPTION_csv]))
        return bc_fail(err, BC_ERR_USAGE, "--bare and --%s exclude each other; keep one of them", a->value[OPTION_json] ? "json" : "csv");
    return check_output(c, a, err);
}

bc_status arguments_take(const command *c, int argc, char **argv, arguments *a, bc_error *err)
{
    bool words_only = false;

    memset(a, 0, sizeof *a);
    a->command = c->word;
    for (int i = 1; i < argc; i++) {
        const char *word = argv[i];
        place p = {NULL, i + 1 < argc ? argv[i + 1] : NULL, false};
        bc_status status = BC_OK;

        if (words_only || word[0] != '-' || word[1] == '\0')
            status = take_word(a, word, err);
        else if (strcmp(word, "--") == 0)
            words_only = true;
        else if (word[1] == '-')
            status = take_long(c, a, word + 2, &p, err);
        else
            status = take_short(c, a, word + 1, &p, err);
        if (status != BC_OK)
            return status;
        i += p.used;
    }
    return check_count(c, a, err);
}
