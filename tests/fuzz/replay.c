/* SPDX-License-Identifier: MIT */
/* replay.c - a fuzz target without a fuzzer: each seed becomes a test. Speaks the Test Anything Protocol.
 *
 * fuzz_NAME FILE-OR-FOLDER... */
#include "fuzz.h"

#include <dirent.h>
#include <sys/stat.h>

#define SEED_MAX ((size_t)1 << 20)

static int count;

static void replay_file(const char *path, const char *name)
{
    uint8_t *data = malloc(SEED_MAX);
    FILE *f = fopen(path, "rb");

    fuzz_require(data != NULL && f != NULL);
    const size_t size = fread(data, 1, SEED_MAX, f);

    fuzz_require(!ferror(f) && size < SEED_MAX);
    (void)fclose(f);
    uint8_t *exact = malloc(size + 1); /* its end is the end of the memory, for who watches reads */

    fuzz_require(exact != NULL);
    memcpy(exact, data, size);
    free(data);
    exact = realloc(exact, size > 0 ? size : 1);
    fuzz_require(exact != NULL);
    (void)LLVMFuzzerTestOneInput(exact, size);
    free(exact);
    printf("ok %d - %s\n", ++count, name);
    (void)fflush(stdout);
}

static int no_dots(const struct dirent *entry)
{
    return entry->d_name[0] != '.';
}

static void replay(const char *path)
{
    struct dirent **entries = NULL;
    struct stat st;

    fuzz_require(stat(path, &st) == 0);
    if (!S_ISDIR(st.st_mode)) {
        replay_file(path, path);
        return;
    }
    const int n = scandir(path, &entries, no_dots, alphasort);

    fuzz_require(n > 0);
    for (int i = 0; i < n; i++) {
        char name[4096];

        (void)snprintf(name, sizeof name, "%s/%s", path, entries[i]->d_name);
        replay_file(name, entries[i]->d_name);
        free(entries[i]);
    }
    free(entries);
}

int main(int argc, char **argv)
{
    for (int i = 1; i < argc; i++)
        replay(argv[i]);
    printf("1..%d\n", count);
    return count > 0 ? EXIT_SUCCESS : EXIT_FAILURE;
}
