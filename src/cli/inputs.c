/* SPDX-License-Identifier: MIT */
/* inputs.c - the files behind an answer, identified by their SHA-256 where a report is kept. */
#include "cli/cli.h"

#include "base/file_text.h"
#include "base/sha256.h"

#include <stdlib.h>
#include <string.h>

#define INPUT_BYTES_MAX ((size_t)1 << 30) /* a log of years has some 50 MB */

void report_contract_inputs(report *r, const bc_contract *contract)
{
    report_add_input(r, contract->path);
    for (size_t i = 0; i < contract->limit_count; i++)
        report_add_input(r, contract->limits[i].path);
}

/* Where a bundled file lies is of this machine alone: what counts is its place among the others. */
static const char *name_of(const folders *f, const char *path)
{
    for (size_t i = 0; i < f->count; i++) {
        const size_t length = strlen(f->path[i]);

        if (strncmp(path, f->path[i], length) == 0 && path[length] == '/')
            return path + length + 1;
    }
    return path;
}

/* A file that has gone since it was read stays without; one that cannot be read for another reason is told of. */
bc_status inputs_identify(report *r, bc_error *err)
{
    folders f = {.count = 0};

    if (r->input_count > 0)
        folders_find(&f);
    for (size_t i = 0; i < r->input_count; i++) {
        char *bytes = NULL;
        size_t count = 0;
        char digest[SHA256_TEXT];

        const bc_status status = bc_file_text(r->inputs[i].path, INPUT_BYTES_MAX, &bytes, &count, err);

        if (status == BC_ERR_FILE || status == BC_ERR_MEMORY)
            return status;
        if (status != BC_OK)
            continue;
        bc_sha256(bytes, count, digest);
        report_identify_input(r, i, name_of(&f, r->inputs[i].path), digest);
        free(bytes);
    }
    return BC_OK;
}
