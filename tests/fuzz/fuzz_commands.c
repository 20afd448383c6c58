/* SPDX-License-Identifier: MIT */
/* fuzz_commands.c - whole command lines, a word a line, run in this process: every option reaches the code that takes it.
 *
 * `stream` has a target of its own; files are not written. */
#include "fuzz.h"

#include "cli/cli.h"

#define WORDS_MAX 40
#define BYTES_MAX 1500

static size_t split(char *text, char *words[])
{
    size_t count = 0;

    for (char *p = text; p && count < WORDS_MAX; count++) {
        words[count] = p;
        p = strchr(p, '\n');
        if (p)
            *p++ = '\0';
    }
    return count;
}

/* A word that names a file would read what happens to be on this machine. */
static bool is_file(const char *word)
{
    return strchr(word, '/') != NULL && strstr(word, "=") == NULL && access(word, F_OK) == 0;
}

static void run_quietly(const command *c, const arguments *a)
{
    static int null = -1;
    const int out = dup(STDOUT_FILENO);
    const int err = dup(STDERR_FILENO);

    if (null < 0)
        null = open("/dev/null", O_WRONLY);
    fuzz_require(null >= 0 && out >= 0 && err >= 0);
    (void)fflush(stdout);
    fuzz_require(dup2(null, STDOUT_FILENO) >= 0 && dup2(null, STDERR_FILENO) >= 0);
    const int code = c->run(a);

    (void)fflush(stdout);
    fuzz_require(dup2(out, STDOUT_FILENO) >= 0 && dup2(err, STDERR_FILENO) >= 0);
    (void)close(out);
    (void)close(err);
    fuzz_require(code >= 0 && code <= 3);
}

static void run_words(size_t count, char *words[])
{
    const command *c = command_find(words[0]);
    arguments a;
    bc_error err;

    if (!c || strcmp(words[0], "stream") == 0 || !fuzz_answer(arguments_take(c, (int)count, words, &a, &err), &err))
        return;
    if (a.value[OPTION_help] || a.value[OPTION_version] || a.value[OPTION_log])
        return;
    a.value[OPTION_output] = NULL;
    for (size_t i = 0; i < a.argument_count; i++)
        if (is_file(a.argument[i]))
            return;
    run_quietly(c, &a);
}

int LLVMFuzzerTestOneInput(const uint8_t *data, size_t size)
{
    char *words[WORDS_MAX + 1] = {NULL};

    if (size > BYTES_MAX)
        return 0;
    (void)setenv("BLUECONE_PATH", BC_SOURCE_DIR "/compositions", 1);
    char *text = fuzz_text(data, size);
    const size_t count = split(text, words);

    run_words(count, words);
    free(text);
    return 0;
}
