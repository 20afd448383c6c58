/* SPDX-License-Identifier: MIT */
/* page.c - the report as one page of HTML that needs nothing beside itself, and no script. */
#include "output/page_internal.h"

#include "base/error_internal.h"

/* A report about one gas is named after it. */
static void put_title(page *p)
{
    page_text(p, p->r->title);
    if (p->r->gas_count == 1) {
        fputs(": ", p->out);
        page_text(p, p->r->gases[0].name);
    } else if (p->r->gas_count > 1) {
        fprintf(p->out, ": %zu gases", p->r->gas_count);
    }
}

/* The policy forbids whatever a browser might still fetch or run, should a text ever slip through. */
static void put_head(page *p)
{
    fputs("<!DOCTYPE html>\n<html lang=\"en\" dir=\"ltr\">\n<head>\n<meta charset=\"utf-8\">\n"
          "<meta http-equiv=\"Content-Security-Policy\" content=\"default-src 'none'; style-src "
          "'unsafe-inline'\">\n"
          "<meta name=\"viewport\" content=\"width=device-width, initial-scale=1\">\n"
          "<meta name=\"referrer\" content=\"no-referrer\">\n<meta name=\"generator\" content=\"bluecone ",
          p->out);
    page_text(p, p->r->version);
    fputs("\">\n<title>", p->out);
    put_title(p);
    fputs("</title>\n<style>\n", p->out);
    page_style(p->out);
    fputs("</style>\n</head>\n<body>\n", p->out);
}

static void put_main(page *p)
{
    fputs("<main>\n", p->out);
    page_tables(p, true);
    page_sections(p);
    page_checks(p);
    page_warnings(p);
    page_tables(p, false);
    page_charts(p);
    fputs("</main>\n", p->out);
}

bc_status render_html(const report *r, const render_style *style, FILE *out, bc_error *err)
{
    page p = {.out = out, .r = r, .style = style, .failed = !report_ok(r)};

    if (!p.failed) {
        put_head(&p);
        fputs("<header>\n<h1>", out);
        put_title(&p);
        fputs("</h1>\n", out);
        page_banner(&p);
        fputs("</header>\n", out);
        put_main(&p);
        page_foot(&p);
        fputs("</body>\n</html>\n", out);
    }
    if (p.failed)
        return bc_fail(err, BC_ERR_MEMORY, "no memory for the report");
    return ferror(out) ? bc_fail(err, BC_ERR_FILE, "cannot write the report") : BC_OK;
}
