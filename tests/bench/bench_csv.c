/* SPDX-License-Identifier: MIT */
/* bench_csv.c - the cells of a log through libcsv, counted and no more: what reading alone would cost a stream. */
#include <csv.h>
#include <stdio.h>

static size_t cells;
static size_t rows;

static void on_cell(void *text, size_t length, void *data)
{
    (void)text;
    (void)length;
    (void)data;
    cells++;
}

static void on_row(int end, void *data)
{
    (void)end;
    (void)data;
    rows++;
}

int main(int argc, char **argv)
{
    static char block[1 << 18];
    struct csv_parser parser;
    FILE *file = argc > 1 ? fopen(argv[1], "rb") : NULL;
    size_t got = 0;

    if (!file || csv_init(&parser, 0) != 0)
        return 1;
    while ((got = fread(block, 1, sizeof block, file)) > 0)
        if (csv_parse(&parser, block, got, on_cell, on_row, NULL) != got)
            return 1;
    csv_fini(&parser, on_cell, on_row, NULL);
    csv_free(&parser);
    (void)fclose(file);
    printf("%zu cells in %zu rows\n", cells, rows);
    return 0;
}
