/* SPDX-License-Identifier: MIT */
/* brief.c - the report as bare lines, for a shell: value and unit. */
#include "output/render.h"

#include "base/error_internal.h"
#include "output/plain_text_internal.h"
#include "output/result_text_internal.h"

#include <stdlib.h>

/* Writes a separator and a text, or nothing for an empty text; false when there is no memory. */
static bool put_behind(FILE *out, char separator, const char *text)
{
    char *plain = plain_text(text, PLAIN_LINE);

    if (plain != NULL && *plain != '\0')
        fprintf(out, "%c%s", separator, plain);
    free(plain);
    return plain != NULL;
}

/* One result; false when there is no memory. */
static bool put_result(FILE *out, const report *r, const report_result *result, const render_style *style)
{
    const result_text text = result_text_of(result, style);
    const bool named = r->gas_count > 1 && result->gas != REPORT_NO_GAS;
    bool ok = true;

    fputs(text.value, out);
    if (!style->bare) {
        ok = put_behind(out, ' ', text.unit);
        if (named)
            ok = put_behind(out, '\t', r->gases[result->gas].name) && ok;
    }
    fputc('\n', out);
    return ok;
}

/* A report of tables alone, bare: the first column, a name a line. */
static bool put_names(FILE *out, const report *r)
{
    bool ok = true;

    for (size_t i = 0; i < r->table_count; i++) {
        const report_table *t = &r->tables[i];

        for (size_t j = 0; ok && j < t->cell_count; j += t->column_count) {
            char *plain = plain_text(t->cells[j].text, PLAIN_LINE);

            ok = plain != NULL;
            fprintf(out, "%s\n", ok ? plain : "");
            free(plain);
        }
    }
    return ok;
}

bc_status render_brief(const report *r, const render_style *style, FILE *out, bc_error *err)
{
    bool ok = report_ok(r);

    for (size_t i = 0; ok && i < r->result_count; i++)
        ok = put_result(out, r, &r->results[i], style);
    if (ok && r->result_count == 0)
        ok = put_names(out, r);
    if (!ok)
        return bc_fail(err, BC_ERR_MEMORY, "no memory for the report");
    return ferror(out) ? bc_fail(err, BC_ERR_FILE, "cannot write the report") : BC_OK;
}
