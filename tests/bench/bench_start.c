/* SPDX-License-Identifier: MIT */
/* bench_start.c - wall time of whole processes, several commands in turn so that noise hits all alike.
 *
 * usage: bench_start ROUNDS BASELINE-COMMAND -- COMMAND [-- COMMAND...]
 * Each command is given as words; standard output and error go to /dev/null. Prints the median and the
 * fastest time of each and the ratio of the medians to the first. */
#include <fcntl.h>
#include <spawn.h>
#include <stdio.h>
#include <stdlib.h>
#include <string.h>
#include <sys/wait.h>
#include <time.h>
#include <unistd.h>

#define COMMANDS_MAX 8
#define ROUNDS_MAX 5000

extern char **environ;

static double now_us(void)
{
    struct timespec t;

    (void)clock_gettime(CLOCK_MONOTONIC, &t);
    return (double)t.tv_sec * 1e6 + (double)t.tv_nsec * 1e-3;
}

static double run_us(char **command, posix_spawn_file_actions_t *quiet)
{
    pid_t pid = 0;
    int status = 0;
    const double start = now_us();

    if (posix_spawnp(&pid, command[0], quiet, NULL, command, environ) != 0 || waitpid(pid, &status, 0) != pid
        || !WIFEXITED(status) || WEXITSTATUS(status) != 0) {
        fprintf(stderr, "bench_start: %s failed\n", command[0]);
        exit(1);
    }
    return now_us() - start;
}

static int by_size(const void *a, const void *b)
{
    const double x = *(const double *)a;
    const double y = *(const double *)b;

    return (x > y) - (x < y);
}

static size_t split(int argc, char **argv, char **commands[])
{
    size_t count = 0;

    commands[count++] = argv + 2;
    for (int i = 2; i < argc; i++)
        if (strcmp(argv[i], "--") == 0) {
            argv[i] = NULL;
            if (count < COMMANDS_MAX)
                commands[count++] = argv + i + 1;
        }
    return count;
}

int main(int argc, char **argv)
{
    static double times[COMMANDS_MAX][ROUNDS_MAX];
    char **commands[COMMANDS_MAX];
    posix_spawn_file_actions_t quiet;
    const int rounds = argc > 2 ? (int)strtol(argv[1], NULL, 10) : 0;

    if (rounds < 1 || rounds > ROUNDS_MAX)
        return 2;
    const size_t count = split(argc, argv, commands);

    (void)posix_spawn_file_actions_init(&quiet);
    (void)posix_spawn_file_actions_addopen(&quiet, 1, "/dev/null", O_WRONLY, 0);
    (void)posix_spawn_file_actions_addopen(&quiet, 2, "/dev/null", O_WRONLY, 0);
    for (int i = 0; i < rounds; i++)
        for (size_t k = 0; k < count; k++)
            times[k][i] = run_us(commands[k], &quiet);
    for (size_t k = 0; k < count; k++) {
        qsort(times[k], (size_t)rounds, sizeof times[k][0], by_size);
        printf("  %-34.34s median %7.0f us   fastest %7.0f us   %.2f x\n", strrchr(commands[k][0], '/') ? strrchr(commands[k][0], '/') + 1 : commands[k][0],
               times[k][rounds / 2], times[k][0], times[k][rounds / 2] / times[0][rounds / 2]);
    }
    (void)posix_spawn_file_actions_destroy(&quiet);
    return 0;
}
