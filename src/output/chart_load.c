/* SPDX-License-Identifier: MIT */
/* chart_load.c - the program's side of charts: the module is loaded when one is asked for. */
#include "output/render.h"

#include "base/error_internal.h"
#include "output/chart_internal.h"

#include <assert.h>
#include <dlfcn.h>
#include <stdlib.h>
#include <string.h>
#include <unistd.h>

#define PATH_SIZE 4096 /* PATH_MAX of Linux, which POSIX does not promise */

#ifndef BC_LIB_DIR
#define BC_LIB_DIR "/usr/local/lib"
#endif

static bc_status open_module(const char *path, chart_draw **draw, bc_error *err)
{
    void *module = dlopen(path, RTLD_NOW | RTLD_LOCAL);
    void *symbol = module == NULL ? NULL : dlsym(module, CHART_SYMBOL);

    if (symbol == NULL) {
        const char *reason = dlerror();

        if (module != NULL)
            dlclose(module);
        return bc_fail(err, BC_ERR_FILE, "cannot load the module for charts: %.400s",
                       reason == NULL ? path : reason);
    }
    /* ISO C knows no cast between pointers to objects and to functions; POSIX wants them alike. */
    memcpy(draw, &symbol, sizeof symbol);
    return BC_OK;
}

bc_status chart_load(const char *const folders[], size_t count, chart_draw **draw, bc_error *err)
{
    char path[PATH_SIZE];

    for (size_t i = 0; i < count; i++) {
        const int length = snprintf(path, sizeof path, "%s/%s", folders[i], CHART_MODULE);

        if (length > 0 && (size_t)length < sizeof path && access(path, F_OK) == 0)
            return open_module(path, draw, err);
    }
    return bc_fail(err, BC_ERR_FILE, "the module for charts, %s, is missing in %.160s: install bluecone anew",
                   CHART_MODULE, count == 0 ? "every folder" : folders[count - 1]);
}

/* The folder of the running program, as a build tree has it all in one; "" when nobody knows. */
static void find_own_folder(char folder[PATH_SIZE])
{
    const ssize_t length = readlink("/proc/self/exe", folder, PATH_SIZE - 1);

    folder[length < 0 ? 0 : length] = '\0';
    char *slash = strrchr(folder, '/');
    folder[slash == NULL ? 0 : slash - folder] = '\0';
}

static bc_status load(chart_draw **draw, bc_error *err)
{
    char own[PATH_SIZE];
    const char *const folders[] = {own, BC_LIB_DIR "/bluecone"};

    find_own_folder(own);
    return *own == '\0' ? chart_load(folders + 1, 1, draw, err) : chart_load(folders, 2, draw, err);
}

static bc_status render(const report *r, chart_form form, FILE *out, bc_error *err)
{
    chart_draw *draw = NULL;

    if (!report_ok(r))
        return bc_fail(err, BC_ERR_MEMORY, "no memory for the report");
    if (r->chart_count == 0)
        return bc_fail(err, BC_ERR_USAGE,
                       "there is no chart in this answer of '%.40s': write it to .txt, .json or .csv",
                       r->command);

    const bc_status status = load(&draw, err);
    if (status != BC_OK)
        return status;
    assert(draw != NULL);

    chart_order order = {.r = r, .form = form, .out = out};
    switch (draw(CHART_ABI, &order)) {
    case CHART_DRAWN:
        return ferror(out) ? bc_fail(err, BC_ERR_FILE, "cannot write the chart") : BC_OK;
    case CHART_OTHER_ABI:
        return bc_fail(err, BC_ERR_FILE,
                       "the module for charts, %s, belongs to another version: install bluecone anew",
                       CHART_MODULE);
    case CHART_NO_MEMORY:
        return bc_fail(err, BC_ERR_MEMORY, "no memory for the chart");
    case CHART_NOT_DRAWN:
    default:
        return bc_fail(err, BC_ERR_FILE, "cannot draw the chart: %s", order.why);
    }
}

bc_status render_svg(const report *r, const render_style *style, FILE *out, bc_error *err)
{
    (void)style; /* a chart has no digits, warnings or escape sequences */
    return render(r, CHART_SVG, out, err);
}

bc_status render_png(const report *r, const render_style *style, FILE *out, bc_error *err)
{
    (void)style;
    return render(r, CHART_PNG, out, err);
}

bc_status render_pdf(const report *r, const render_style *style, FILE *out, bc_error *err)
{
    (void)style;
    return render(r, CHART_PDF, out, err);
}
