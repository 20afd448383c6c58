/* SPDX-License-Identifier: MIT */
/* faults.c - runs commands while calls of the C library fail, each call in its turn.
 *
 * faults LIBRARY PROGRAM COMMANDS MOST
 *
 *   LIBRARY    inject.c, built
 *   COMMANDS   a file with a command a line, words parted by blanks; `-o out.X` is watched
 *   MOST       runs for each command and kind; where there are more calls the first ones are tried, the rest is sampled
 *
 * What must hold: the answer is the one of the undisturbed run, or there is exit code 4 and one line that says why beside
 * the ordinary warnings. No file is half-written, none is left beside it, no memory is lost, nothing waits for ever.
 * Speaks the Test Anything Protocol, a test a command. Runs in the current folder. */
#define _GNU_SOURCE /* memmem */
#include <dirent.h>
#include <errno.h>
#include <fcntl.h>
#include <signal.h>
#include <stdbool.h>
#include <stdio.h>
#include <stdlib.h>
#include <string.h>
#include <sys/resource.h>
#include <sys/stat.h>
#include <sys/wait.h>
#include <unistd.h>

#define WORDS_MAX 40
#define TEXT_MAX ((size_t)1 << 20)
#define SECONDS_MAX 60 /* an undisturbed command takes less than one; the machine may be busy */
#define TOLD_MAX 6     /* failures of a command that are described */

/* What a run did. */
typedef struct {
    int code;                     /* exit code; 128 + signal */
    unsigned long counted, failed;
    long live;
    char *out, *err, *file;       /* TEXT_MAX bytes each */
    size_t out_length, err_length, file_length;
    bool has_file;
} outcome;

/* How a kind of fault may end. */
typedef struct {
    const char *word;
    bool each;      /* a run for each call; else one run in which every call is hit */
    bool harmless;  /* the answer must be the undisturbed one */
    bool is_input;  /* it looks like bad input: exit code 3 is right, too */
} kind;

static const kind KINDS[] = {
    {"malloc", true, false, false},
    {"malloc_once", true, false, false},
    {"read_short", false, true, false},
    {"read_eintr", true, true, false},
    {"read_eio", true, false, false},
    {"read_end", true, false, true},
    {"write_short", false, true, false},
    {"write_eintr", true, true, false},
    {"write_enospc", true, false, false},
    {"write_epipe", true, false, false},
    {"write_eio", true, false, false},
    {"open_emfile", true, false, false},
    {"open_enoent", true, false, true},
    {"close_eio", true, false, false},
    {"rename_eio", true, false, false},
    {"fstat_eio", true, false, false},
    {"mkstemp_enospc", true, false, false},
    {"fopen_emfile", true, false, false},
    {"fgets_eio", true, false, false},
    {"memfd_enfile", true, false, false},
    {"dlopen_none", true, false, false},
    {"thread_eagain", true, false, false},
    {"fchmod_eperm", true, false, false},
};

static const char *library, *program;
static int passed, failed_commands;

/* ---- running -------------------------------------------------------------------------------------------------------- */

static size_t read_file(const char *path, char *text)
{
    const int fd = open(path, O_RDONLY);
    size_t length = 0;

    if (fd < 0)
        return 0;
    for (ssize_t n = 0; length < TEXT_MAX - 1 && (n = read(fd, text + length, TEXT_MAX - 1 - length)) > 0;)
        length += (size_t)n;
    (void)close(fd);
    text[length] = '\0';
    return length;
}

static void become(char **words, const char *fault, rlim_t memory)
{
    const int null = open("/dev/null", O_RDONLY);
    const int out = open(".out", O_WRONLY | O_CREAT | O_TRUNC, 0600);
    const int err = open(".err", O_WRONLY | O_CREAT | O_TRUNC, 0600);
    const int report = open(".report", O_WRONLY | O_CREAT | O_TRUNC, 0600);
    const struct rlimit limit = {memory, memory};

    if (dup2(null, 0) < 0 || dup2(out, 1) < 0 || dup2(err, 2) < 0 || dup2(report, 9) < 0)
        _exit(99);
    if (fault && (setenv("FAULT", fault, 1) != 0 || setenv("FAULT_REPORT", "9", 1) != 0 || setenv("LD_PRELOAD", library, 1) != 0))
        _exit(99);
    if (memory > 0 && setrlimit(RLIMIT_AS, &limit) != 0)
        _exit(99);
    (void)alarm(SECONDS_MAX);
    (void)execv(program, words);
    _exit(98);
}

static const char *file_of(char **words)
{
    for (size_t i = 0; words[i]; i++)
        if (strcmp(words[i], "-o") == 0)
            return words[i + 1];
    return NULL;
}

static void run(char **words, const char *fault, rlim_t memory, outcome *o)
{
    const char *file = file_of(words);
    char report[80 + 1] = "";
    struct stat st;
    int status = 0;

    if (file)
        (void)unlink(file);
    const pid_t child = fork();

    if (child == 0)
        become(words, fault, memory);
    if (child < 0 || waitpid(child, &status, 0) != child)
        exit(EXIT_FAILURE);
    o->code = WIFEXITED(status) ? WEXITSTATUS(status) : 128 + WTERMSIG(status);
    o->out_length = read_file(".out", o->out);
    o->err_length = read_file(".err", o->err);
    o->has_file = file && stat(file, &st) == 0;
    o->file_length = o->has_file ? read_file(file, o->file) : 0;
    FILE *f = fopen(".report", "r");

    if (f && fgets(report, (int)sizeof report, f))
        (void)sscanf(report, "%lu %lu %ld", &o->counted, &o->failed, &o->live);
    if (f)
        (void)fclose(f);
}

/* ---- judging -------------------------------------------------------------------------------------------------------- */

/* Lines of stderr that the undisturbed run does not have. */
static size_t new_lines(const char *text, const char *before)
{
    size_t count = 0;

    for (const char *p = text; *p != '\0';) {
        const size_t length = strcspn(p, "\n");
        bool known = false;

        for (const char *q = before; *q != '\0' && !known; q += strcspn(q, "\n"), q += *q == '\n')
            known = strcspn(q, "\n") == length && strncmp(p, q, length) == 0;
        count += !known;
        p += length;
        p += *p == '\n';
    }
    return count;
}

/* Files that nobody asked for. */
static bool has_leftover(const char *file)
{
    DIR *folder = opendir(".");
    bool found = false;

    for (const struct dirent *e = NULL; folder && (e = readdir(folder)) != NULL;)
        if (strncmp(e->d_name, ".out.", 5) == 0 || (file && e->d_name[0] == '.' && strncmp(e->d_name + 1, file, strlen(file)) == 0)) {
            found = true;
            (void)unlink(e->d_name);
        }
    if (folder)
        (void)closedir(folder);
    return found;
}

static bool same_answer(const outcome *a, const outcome *b)
{
    return a->code == b->code && a->out_length == b->out_length && memcmp(a->out, b->out, a->out_length) == 0 && a->has_file == b->has_file
           && a->file_length == b->file_length && memcmp(a->file, b->file, a->file_length) == 0;
}

/* What is wrong with a run; NULL: nothing. */
static const char *judge(const kind *k, const outcome *o, const outcome *usual, const char *file)
{
    const size_t lines = new_lines(o->err, usual->err);
    const bool answered = same_answer(o, usual);

    if (o->code >= 128)
        return o->code == 128 + SIGALRM ? "it hangs" : "it is killed by a signal";
    if (has_leftover(file))
        return "it leaves a file behind";
    if (o->failed == 0 && (!answered || lines > 0))
        return "nothing failed, and yet the answer is another one";
    if (k->harmless && (!answered || lines > 0))
        return "the answer is another one";
    const bool refused = o->code == 4 || (k->is_input && o->code == 3);

    if (!refused && o->code != usual->code)
        return "the exit code is neither 4 nor the usual one";
    if (refused && lines != 1)
        return "there is not one line that tells of it";
    /* a file that went after it was read: the report is without its SHA-256 */
    if (!refused && !k->is_input && (!answered || lines > 0))
        return "the exit code is that of success, and the answer is another one";
    if (refused && o->has_file && (o->file_length != usual->file_length || memcmp(o->file, usual->file, o->file_length) != 0))
        return "it leaves half a file";
    if (refused && o->live > usual->live + 1) /* a message may leave a buffer of stdio behind */
        return "memory is lost";
    return NULL;
}

static void describe(const char *what, const char *fault, const outcome *o, const outcome *usual)
{
    printf("# %s: %s (exit %d, usually %d; %ld blocks, usually %ld)\n", fault, what, o->code, usual->code, o->live, usual->live);
    for (const char *p = o->err; *p != '\0';) {
        const size_t length = strcspn(p, "\n");

        printf("#   %.*s\n", (int)(length < 160 ? length : 160), p);
        p += length;
        p += *p == '\n';
    }
}

/* ---- one command ----------------------------------------------------------------------------------------------------- */

typedef struct {
    char **words;
    outcome usual, now;
    size_t runs, bad;
    unsigned long most;
} trial;

static void try_fault(trial *t, const kind *k, unsigned long n)
{
    char fault[64];

    (void)snprintf(fault, sizeof fault, "%s:%lu", k->word, n);
    run(t->words, fault, 0, &t->now);
    t->runs++;
    const char *what = judge(k, &t->now, &t->usual, file_of(t->words));

    if (what && t->bad++ < TOLD_MAX)
        describe(what, fault, &t->now, &t->usual);
}

/* Calls of a kind in an undisturbed run: which of them fail, each in its turn. */
static void try_kind(trial *t, const kind *k)
{
    char fault[64];

    (void)snprintf(fault, sizeof fault, "%s:0", k->word);
    run(t->words, fault, 0, &t->now);
    t->usual.live = t->now.live;
    const unsigned long calls = t->now.counted;

    if (calls == 0 && strcmp(k->word, "malloc") == 0) {
        printf("# no call is seen: is %s loaded?\n", library);
        t->bad++;
    }
    if (calls == 0)
        return;
    if (!k->each) {
        try_fault(t, k, 1);
        return;
    }
    const unsigned long first = calls <= t->most ? calls : t->most / 2;

    for (unsigned long n = 1; n <= first; n++)
        try_fault(t, k, n);
    for (unsigned long i = 1; calls > first && i <= t->most - first; i++)
        try_fault(t, k, first + i * (calls - first) / (t->most - first));
}

/* Less and less room for everything. Below some size the program cannot even be loaded. */
static void try_memory_limits(trial *t)
{
    static const kind K = {"RLIMIT_AS", true, false, false};
    unsigned long step = t->most < 20 ? 8 : 1;

    for (unsigned long mib = 64; mib >= 2; mib -= step < mib ? step : mib) {
        char fault[64];

        (void)snprintf(fault, sizeof fault, "RLIMIT_AS:%lu MiB", mib);
        run(t->words, NULL, (rlim_t)mib << 20, &t->now);
        t->runs++;
        if (t->now.code == 127 || (t->now.code == 98 && t->now.err_length == 0) || (t->now.code == 128 + SIGSEGV && mib < 6)
            || t->now.code == 128 + SIGKILL) /* not loaded: nothing of ours ran */
            break;
        t->now.failed = 1;
        t->now.live = 0;
        const char *what = judge(&K, &t->now, &t->usual, file_of(t->words));

        if (what && t->bad++ < TOLD_MAX)
            describe(what, fault, &t->now, &t->usual);
    }
}

static void make_room(outcome *o)
{
    o->out = calloc(3, TEXT_MAX);
    if (!o->out)
        exit(EXIT_FAILURE);
    o->err = o->out + TEXT_MAX;
    o->file = o->err + TEXT_MAX;
}

static void try_command(char *line, unsigned long most)
{
    static trial t;
    static char own_name[] = "bluecone";
    char name[200];
    char *words[WORDS_MAX + 1] = {NULL};
    char *rest = NULL;
    size_t count = 1;

    if (!t.usual.out) {
        make_room(&t.usual);
        make_room(&t.now);
    }
    (void)snprintf(name, sizeof name, "%.*s", (int)sizeof name - 1, line);
    words[0] = own_name;
    for (char *word = strtok_r(line, " \n", &rest); word && count < WORDS_MAX; word = strtok_r(NULL, " \n", &rest))
        words[count++] = word;
    t.words = words;
    t.most = most;
    t.runs = 0;
    t.bad = 0;
    run(words, NULL, 0, &t.usual);
    if (t.usual.code > 1) {
        describe("it does not work at all", "no fault", &t.usual, &t.usual);
        t.bad++;
    }
    for (size_t i = 0; t.usual.code <= 1 && i < sizeof KINDS / sizeof *KINDS; i++)
        try_kind(&t, &KINDS[i]);
    if (t.usual.code <= 1)
        try_memory_limits(&t);
    name[strcspn(name, "\n")] = '\0';
    if (t.bad > 0)
        printf("# %zu of %zu runs are bad\n", t.bad, t.runs);
    passed += t.bad == 0;
    failed_commands += t.bad > 0;
    printf("%sok %d - %s (%zu faults)\n", t.bad > 0 ? "not " : "", passed + failed_commands, name, t.runs);
    (void)fflush(stdout);
}

int main(int argc, char **argv)
{
    char line[1024];

    if (argc != 5) {
        (void)fputs("faults LIBRARY PROGRAM COMMANDS MOST\n", stderr);
        return EXIT_FAILURE;
    }
    library = argv[1];
    program = argv[2];
    FILE *f = fopen(argv[3], "r");

    while (f && fgets(line, (int)sizeof line, f))
        if (line[0] != '#' && line[0] != '\n')
            try_command(line, strtoul(argv[4], NULL, 10));
    if (f)
        (void)fclose(f);
    printf("1..%d\n", passed + failed_commands);
    return failed_commands == 0 && passed > 0 ? EXIT_SUCCESS : EXIT_FAILURE;
}
