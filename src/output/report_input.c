/* SPDX-License-Identifier: MIT */
/* report_input.c - the files that a report was made from, and what identifies them. */
#include "output/report.h"

#include "output/report_internal.h"

#include <assert.h>
#include <stdlib.h>
#include <string.h>

void report_free_input(report_input *input)
{
    free(input->path);
    free(input->name);
    free(input->sha256);
}

void report_add_input(report *r, const char *path)
{
    for (size_t i = 0; i < r->input_count; i++)
        if (strcmp(r->inputs[i].path, path) == 0)
            return;

    report_input *inputs = *path == '\0' ? NULL : report_grow(r, r->inputs, r->input_count, sizeof *inputs);
    if (inputs == NULL)
        return;
    r->inputs = inputs;

    const report_input input = {.path = report_copy(r, path)};
    if (input.path != NULL)
        inputs[r->input_count++] = input;
}

void report_identify_input(report *r, size_t input, const char *name, const char *sha256)
{
    assert(input < r->input_count && r->inputs[input].sha256 == NULL);
    report_input *to = &r->inputs[input];

    to->name = report_copy(r, name);
    to->sha256 = report_copy(r, sha256);
}
