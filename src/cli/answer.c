/* SPDX-License-Identifier: MIT */
/* answer.c - a report to where the options want it, in the form they want. */
#include "base/error_internal.h"
#include "bluecone/number.h"
#include "cli/cli.h"

#include <math.h>
#include <stdio.h>
#include <stdlib.h>
#include <string.h>
#include <unistd.h>

#define ANSWER_NO 1 /* exit code: answered, and the answer is no */

static bc_status choose_form(const arguments *a, bool brief, render_form *form, bc_error *err)
{
    const char *path = a->value[OPTION_output];

    *form = brief ? RENDER_BRIEF : RENDER_TEXT;
    if (path && *path == '\0')
        return bc_fail(err, BC_ERR_USAGE, "--output needs a file name");
    if (path && !a->value[OPTION_json] && !a->value[OPTION_csv] && !render_form_of(path, form)) {
        const char *slash = strrchr(path, '/');

        if (strrchr(slash ? slash : path, '.'))
            return bc_fail(err, BC_ERR_USAGE, "-o %.200s: the ending is none of .txt .json .csv .html .xlsx .svg .png .pdf, which give the form; or add --json or --csv", path);
    }
    if (a->value[OPTION_json])
        *form = RENDER_JSON;
    if (a->value[OPTION_csv])
        *form = RENDER_CSV;
    return BC_OK;
}

bc_status digits_from(const arguments *a, int *digits, bc_error *err)
{
    const char *text = a->value[OPTION_digits];
    double n = 0.0;

    *digits = 0;
    if (!text)
        return BC_OK;
    if (bc_number_parse(text, &n, NULL) != BC_OK || !(n >= 2.0 && n <= 15.0) || n != floor(n))
        return bc_fail(err, BC_ERR_USAGE, "--digits %.20s: write a whole number from 2 to 15", text);
    *digits = (int)n;
    return BC_OK;
}

static bc_status choose_style(const arguments *a, render_style *style, bc_error *err)
{
    *style = (render_style){.bare = a->value[OPTION_bare] != NULL, .quiet = a->value[OPTION_quiet] != NULL, .width = 80};
    style->color = !a->value[OPTION_no_color] && !a->value[OPTION_output] && !getenv("NO_COLOR") && isatty(STDOUT_FILENO);
    return digits_from(a, &style->digits, err);
}

/* Lines of several quantities look alike, gross and net heat above all: their ids in the order of the lines of a gas. */
static void tell_order(const report *r)
{
    char text[1024] = "";
    size_t used = 0;

    for (size_t i = 0; i < r->result_count && used < sizeof text; i++)
        if (r->results[i].gas == r->results[0].gas)
            used += (size_t)snprintf(text + used, sizeof text - used, "%s%s", used > 0 ? ", " : "", r->results[i].id);
    if (used < sizeof text && strchr(text, ','))
        warn("lines: %s%s", text, r->gas_count > 1 ? ", for each gas" : "");
}

/* A number alone, rows of figures and a picture have no room for state and warnings: they go where messages go. */
static void tell_aside(const report *r, const render_style *style)
{
    if (style->bare || style->quiet)
        return;
    if (r->state.present)
        warn("state: %s", r->state.text);
    for (size_t i = 0; i < r->warning_count; i++)
        warn("%s", r->warnings[i]);
}

/* A text passes; these are kept, and must tell later what they were made from. */
static bool tells_inputs(render_form form)
{
    return form == RENDER_JSON || form == RENDER_HTML || form == RENDER_XLSX;
}

static bc_status render(report *r, const arguments *a, bool brief, bc_error *err)
{
    render_form form = RENDER_TEXT;
    render_style style;
    bc_status status = choose_form(a, brief, &form, err);

    if (status == BC_OK)
        status = choose_style(a, &style, err);
    if (status != BC_OK)
        return status;
    if (tells_inputs(form))
        status = inputs_identify(r, err);
    if (status != BC_OK)
        return status;
    if (!report_ok(r))
        return bc_fail(err, BC_ERR_MEMORY, "not enough memory for the report");
    if (form == RENDER_BRIEF) {
        tell_aside(r, &style);
        if (!style.bare && !style.quiet)
            tell_order(r);
        style.digits = style.digits ? style.digits : REPORT_DIGITS;
    } else if (form == RENDER_CSV || render_form_is_chart(form)) {
        tell_aside(r, &style);
    }
    return render_to(r, form, &style, a->value[OPTION_output], err);
}

int answer(report *r, const arguments *a, bool brief, int code)
{
    bc_error err;

    if (r->judgement == REPORT_UNJUDGED)
        report_judge(r, code == ANSWER_NO || report_judged(r) == REPORT_NO ? REPORT_NO : REPORT_YES);
    const bc_status status = render(r, a, brief, &err);

    report_close(r);
    return status == BC_OK ? code : complain(&err);
}
