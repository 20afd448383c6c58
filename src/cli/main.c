/* SPDX-License-Identifier: MIT */
/* main.c - from the first word to its command. */
#include "base/error_internal.h"
#include "base/text.h"
#include "cli/cli.h"
#include "cli/json_memory.h"

#include <errno.h>
#include <signal.h>
#include <stdio.h>
#include <string.h>

static int refuse_command(const char *word)
{
    const command *best = command_at(0);
    bc_error err;

    for (size_t i = 0; command_at(i); i++)
        if (bc_text_unlikeness(word, command_at(i)->word) < bc_text_unlikeness(word, best->word))
            best = command_at(i);
    char shown[BC_WORD_MAX];
    char hint[BC_HINT_MAX];

    bc_text_show(shown, sizeof shown, word);
    bc_text_suggest(hint, sizeof hint, "the nearest is", word, best->word);
    if (word[0] == '-')
        (void)bc_fail(&err, BC_ERR_USAGE, "'%s' stands where the command belongs; options come behind it: bluecone COMMAND [OPTIONS] ARGUMENTS", shown);
    else
        (void)bc_fail(&err, BC_ERR_USAGE, "unknown command '%s'%s; see bluecone --help", shown, hint);
    return complain(&err);
}

/* What was printed must have arrived: a full disk is a failure, not an answer. A renderer that found it
 * out has told already. */
static int finish(int code)
{
    bc_error err;

    if ((fflush(stdout) == 0 && !ferror(stdout)) || code == bc_exit_code(BC_ERR_FILE))
        return code;
    (void)bc_fail(&err, BC_ERR_FILE, "cannot write to standard output: %s", strerror(errno));
    return complain(&err);
}

/* The short help, or that of a command whose name stands behind it. */
static int help(const char *word)
{
    const command *c = word ? command_find(word) : NULL;

    if (word && !c)
        return refuse_command(word);
    if (c)
        help_command(c);
    else
        help_all();
    return finish(0);
}

static int run(const command *c, int argc, char **argv)
{
    arguments a;
    bc_error err;

    if (arguments_take(c, argc, argv, &a, &err) != BC_OK)
        return complain(&err);
    if (a.value[OPTION_help]) {
        help_command(c);
        return 0;
    }
    if (a.value[OPTION_version]) {
        puts("bluecone " BC_VERSION);
        return 0;
    }
    return c->run(&a);
}

int main(int argc, char **argv)
{
    /* a closed pipe is then an error of write() that is told, with its own exit code */
    (void)signal(SIGPIPE, SIG_IGN);
    /* a file over the size limit likewise: else a half-written one would be left behind */
    (void)signal(SIGXFSZ, SIG_IGN);
    json_memory_watch();
    if (argc < 2) {
        (void)fputs("bluecone: no command given; see bluecone --help\n", stderr);
        return bc_exit_code(BC_ERR_USAGE);
    }
    if (strcmp(argv[1], "--help") == 0 || strcmp(argv[1], "-h") == 0 || strcmp(argv[1], "help") == 0)
        return help(argc > 2 ? argv[2] : NULL);
    if (strcmp(argv[1], "--version") == 0) {
        puts("bluecone " BC_VERSION);
        return finish(0);
    }
    const command *c = command_find(argv[1]);

    return c ? finish(run(c, argc - 1, argv + 1)) : refuse_command(argv[1]);
}
