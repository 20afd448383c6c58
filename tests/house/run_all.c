/* run_all.c - runs every test there is and closes with one count over all of them.
 *
 * SPDX-License-Identifier: MIT
 *
 * Each argument is a command whose output follows the Test Anything Protocol: cmocka programs speak
 * it on request, tests/run_cli.sh always. First every command runs; then each test point they
 * reported becomes one cmocka test here, so that the last lines count the whole suite. A command
 * that says less than it announced, or ends badly without naming a failed test, is a failed test
 * itself: nothing that went wrong can be lost between the two steps. */
#include <setjmp.h>
#include <stdarg.h>
#include <stddef.h>
#include <stdint.h>
#include <cmocka.h>

#include <stdbool.h>
#include <stdio.h>
#include <stdlib.h>
#include <string.h>
#include <sys/wait.h>

#define TEXT_MAX 16384 /* of what a failed test may say; the rest is cut */

typedef enum { PASSED, FAILED, SKIPPED } verdict;

/* One test point as a command reported it. */
typedef struct {
    char *name; /* "command: test" */
    verdict verdict;
    char *text; /* what the command said about it */
} point;

/* All points, and what the running command has said so far. */
typedef struct {
    point *points;
    size_t count;
    long planned; /* test points the running command announced; -1: nothing announced */
    size_t first; /* its first point */
} suite;

static void *must(void *memory)
{
    if (memory == NULL) {
        fputs("run_all: out of memory\n", stderr);
        exit(EXIT_FAILURE);
    }
    return memory;
}

static void add_point(suite *s, const char *command, const char *test, verdict v)
{
    const size_t size = strlen(command) + strlen(test) + sizeof ": ";
    point *p;

    s->points = must(realloc(s->points, (s->count + 1) * sizeof *s->points));
    p = &s->points[s->count++];
    p->name = must(malloc(size));
    snprintf(p->name, size, "%s: %s", command, test);
    p->text = must(calloc(1, TEXT_MAX));
    p->verdict = v;
}

static void add_text(suite *s, const char *line)
{
    if (s->count > s->first) {
        char *text = s->points[s->count - 1].text;
        const size_t used = strlen(text);
        snprintf(text + used, TEXT_MAX - used, "%s\n", line);
    }
}

/* The name behind "ok 12 - " or "ok 12 # SKIP ". */
static const char *point_name(const char *line)
{
    line += strspn(line, "0123456789 -");
    return strncmp(line, "# SKIP ", 7) == 0 ? line + 7 : line;
}

static void take_line(suite *s, const char *command, const char *line)
{
    if (strncmp(line, "1..", 3) == 0) {
        s->planned = (s->planned < 0 ? 0 : s->planned) + strtol(line + 3, NULL, 10);
    } else if (strncmp(line, "ok ", 3) == 0) {
        add_point(s, command, point_name(line + 3), PASSED);
    } else if (strncmp(line, "not ok ", 7) == 0) {
        add_point(s, command, point_name(line + 7), strstr(line, "# SKIP") != NULL ? SKIPPED : FAILED);
    } else {
        add_text(s, line);
    }
}

static bool has_failed_point(const suite *s)
{
    for (size_t i = s->first; i < s->count; i++) {
        if (s->points[i].verdict == FAILED) {
            return true;
        }
    }
    return false;
}

/* Judges the command as a whole once it has ended. */
static void close_command(suite *s, const char *command, int status)
{
    const long seen = (long)(s->count - s->first);
    char what[120];

    if (s->planned >= 0 && s->planned != seen) {
        snprintf(what, sizeof what, "reported %ld of %ld announced tests", seen, s->planned);
        add_point(s, command, what, FAILED);
    } else if (status != 0 && !has_failed_point(s)) {
        snprintf(what, sizeof what, "ended badly (wait status %#x)", (unsigned)status);
        add_point(s, command, what, FAILED);
    } else if (seen == 0) {
        add_point(s, command, "ran to its end", PASSED);
    }
}

static void run_command(suite *s, const char *command, const char *name)
{
    char line[1024];
    int status;
    FILE *pipe;

    s->planned = -1;
    s->first = s->count;
    printf("  RUN   %s", name);
    fflush(stdout);
    pipe = popen(command, "r");
    if (pipe == NULL) {
        add_point(s, name, "could not be started", FAILED);
        return;
    }
    while (fgets(line, sizeof line, pipe) != NULL) {
        line[strcspn(line, "\n")] = '\0';
        take_line(s, name, line);
    }
    status = pclose(pipe);
    printf(", %zu test%s\n", s->count - s->first, s->count - s->first == 1 ? "" : "s");
    close_command(s, name, status);
}

/* "build/release/tests/base/test_units" is called "base/test_units", "tests/run_cli.sh -b ..." is
 * called "run_cli". */
static void short_name(const char *command, char *name, size_t size)
{
    const char *start = strstr(command, "tests/");

    start = start != NULL ? start + strlen("tests/") : command;
    snprintf(name, size, "%.*s", (int)strcspn(start, ". "), start);
}

static void report_point(void **state)
{
    const point *p = *state;

    if (p->verdict == SKIPPED) {
        skip();
    }
    if (p->verdict == FAILED) {
        fputs(p->text, stderr); /* print_error() would cut it at 1,023 bytes */
        fail();
    }
}

int main(int argc, char **argv)
{
    suite s = {0};
    struct CMUnitTest *tests;

    if (setenv("CMOCKA_MESSAGE_OUTPUT", "TAP", 1) != 0) {
        return EXIT_FAILURE;
    }
    for (int i = 1; i < argc; i++) {
        char name[128];
        short_name(argv[i], name, sizeof name);
        run_command(&s, argv[i], name);
    }
    if (unsetenv("CMOCKA_MESSAGE_OUTPUT") != 0) {
        return EXIT_FAILURE;
    }
    tests = must(calloc(s.count + 1, sizeof *tests));
    for (size_t i = 0; i < s.count; i++) {
        tests[i].name = s.points[i].name;
        tests[i].test_func = report_point;
        tests[i].initial_state = &s.points[i];
    }
    return _cmocka_run_group_tests("bluecone", tests, s.count, NULL, NULL) == 0 ? EXIT_SUCCESS : EXIT_FAILURE;
}
