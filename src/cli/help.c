/* SPDX-License-Identifier: MIT */
/* help.c - the short help, made of the tables of commands and options. */
#include "cli/cli.h"

#include <stdio.h>
#include <string.h>

void help_all(void)
{
    puts("usage: bluecone COMMAND [OPTIONS] ARGUMENTS\n\n"
         "What a fuel gas is worth, how it burns, and whether burner and contract take it.\n"
         "Heating values and Wobbe index after ISO 6976, checked by formation enthalpies.\n");
    for (size_t i = 0; command_at(i); i++)
        printf("  %-8s %s\n", command_at(i)->word, command_at(i)->help);
    puts("\nA GAS is a composition file, a bundled name (bluecone list gases) or a literal\n"
         "in per cent by mole; the state of --at is combustion/metering temperature:\n"
         "  bluecone get wobbe-gross methane=92,ethane=5,nitrogen=3\n"
         "  bluecone sheet pipeline-h --at 25/0\n\n"
         "bluecone COMMAND --help tells the options; man bluecone tells all.");
}

#define HELP_LINES_MAX 16 /* options on a line each; with more the common ones share lines, so that a screen holds it */

static size_t count_options(const command *c)
{
    const char *argument = NULL;
    const char *help = NULL;
    size_t n = 0;

    while (option_word(c, n, &argument, &help))
        n++;
    return n;
}

static void print_line(const char *word, const char *argument, const char *help)
{
    char left[40];

    (void)snprintf(left, sizeof left, "--%s%s%s", word, argument[0] ? " " : "", argument);
    printf("  %-19s %s\n", left, help);
}

#define LINE 78 /* columns */

/* Adds a word to a paragraph, *column being where it stands; a long one goes on in the next line. */
static void add_word(int *column, const char *word, const char *argument)
{
    const char *gap = argument[0] ? " " : "";

    if (*column + (int)(strlen(word) + strlen(gap) + strlen(argument)) + 3 > LINE)
        *column = printf("\n         ") - 1;
    *column += printf(" --%s%s%s", word, gap, argument);
}

/* Options that their argument explains, in one paragraph. */
static void print_plain(const command *c)
{
    const char *argument = NULL;
    const char *help = NULL;
    const char *word = NULL;
    int column = 0;

    for (size_t i = 0; (word = option_word(c, i, &argument, &help)) != NULL; i++)
        if (help[0] == '\0') {
            column = column > 0 ? column : printf("  more:  ");
            add_word(&column, word, argument);
        }
    if (column > 0)
        putchar('\n');
}

/* Options that several other commands take, too: their words alone. */
static void print_common(const command *c)
{
    const char *argument = NULL;
    const char *help = NULL;
    const char *word = NULL;
    int column = printf("  common:");

    for (size_t i = 0; (word = option_word(c, i, &argument, &help)) != NULL; i++)
        if (option_is_common(word))
            add_word(&column, word, "");
    putchar('\n');
}

void help_command(const command *c)
{
    const bool crowded = count_options(c) > HELP_LINES_MAX;
    const char *argument = NULL;
    const char *help = NULL;

    printf("usage: bluecone %s [OPTIONS] %s\n\n%s\n\n", c->word, c->usage, c->help);
    const char *word = NULL;

    for (size_t i = 0; (word = option_word(c, i, &argument, &help)) != NULL; i++)
        if (help[0] != '\0' && (!crowded || !option_is_common(word)))
            print_line(word, argument, help);
    print_plain(c);
    if (crowded)
        print_common(c);
    printf("\n  bluecone %s\nman bluecone-%s tells more.\n", c->example, c->word);
}
