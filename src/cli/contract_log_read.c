/* SPDX-License-Identifier: MIT */
/* contract_log_read.c - the file of a log, line by line through libcsv, so that every row knows its line. */
#include "cli/contract_log.h"
#include "cli/csv_library.h"

#include "base/error_internal.h"
#include "base/file_text.h"
#include "base/text.h"

#include <errno.h>
#include <stdio.h>
#include <stdlib.h>
#include <string.h>

#define BOM "\xEF\xBB\xBF"

/* What stands between the file and the rows. */
typedef struct {
    log_case *l;
    csv_library csv;
    struct csv_parser parser;
    FILE *file;
    int line;         /* being fed */
    int row_line;     /* where the row at hand begins */
    bool in_row;      /* it goes on in the next line: a quoted cell with a line break */
    bool has_header;
    bc_status status; /* of what a row came to; nothing is done after a failure */
    bc_error *err;
} log_file;

static void on_cell(void *text, size_t length, void *data)
{
    log_file *f = data;
    log_case *l = f->l;
    const size_t kept = length < LOG_CELL_MAX ? length : LOG_CELL_MAX - 1;

    if (l->cell_count == LOG_COLUMNS_MAX && f->status == BC_OK)
        f->status = bc_fail_at(f->err, BC_ERR_INPUT, l->path, f->row_line, "more than %d cells in a row; is it a log?", LOG_COLUMNS_MAX);
    if (f->status != BC_OK)
        return;
    memcpy(l->cells[l->cell_count], text, kept);
    l->cells[l->cell_count][kept] = '\0';
    l->cell_count++;
}

/* Hours and excursions need the time. */
static bc_status take_header(log_file *f)
{
    log_case *l = f->l;

    log_header_start(&l->header, l->path);
    const bc_status status = log_header_take(&l->header, l->cells, l->cell_count, f->row_line, f->err);

    if (status == BC_OK && log_header_count(&l->header, LOG_TIME) == 0)
        return bc_fail_at(f->err, BC_ERR_INPUT, l->path, f->row_line, "no column is the time; name it time, timestamp or date");
    if (status == BC_OK)
        log_header_tell_ignored(&l->header);
    return status;
}

static void on_row(int end, void *data)
{
    log_file *f = data;

    (void)end;
    if (f->status == BC_OK)
        f->status = f->has_header ? log_take_row(f->l, f->row_line, f->err) : take_header(f);
    f->has_header = true;
    f->in_row = false;
    f->l->cell_count = 0;
}

static bc_status refuse_csv(log_file *f)
{
    if (f->csv.error(&f->parser) != CSV_EPARSE)
        return bc_fail(f->err, BC_ERR_MEMORY, "not enough memory for a row of the log");
    return bc_fail_at(f->err, BC_ERR_INPUT, f->l->path, f->row_line, "a quote opens or stands inside of a cell here and does not close it; double a quote that is meant");
}

static bc_status feed(log_file *f, const char *line, size_t length)
{
    const bool blank = *bc_text_skip_space(line) == '\n' || *bc_text_skip_space(line) == '\0';

    if (memchr(line, '\0', length))
        return bc_fail_at(f->err, BC_ERR_INPUT, f->l->path, f->line, "the line holds a NUL byte: not a text file, or UTF-16; save it as UTF-8");
    if (!f->in_row)
        f->row_line = f->line;
    if (!f->has_header && !blank && !f->in_row) {
        f->l->delimiter = log_delimiter(line, length);
        f->csv.set_delim(&f->parser, (unsigned char)f->l->delimiter);
    }
    f->in_row = f->in_row || !blank;
    if (f->csv.parse(&f->parser, line, length, on_cell, on_row, f) != length)
        return refuse_csv(f);
    return f->status;
}

/* The next line goes to the parser; the mark that some programs put in front of a text does not. */
static bc_status take_line(log_file *f, const char *line, size_t length)
{
    const size_t skip = f->line++ == 0 && strncmp(line, BOM, strlen(BOM)) == 0 ? strlen(BOM) : 0;

    return feed(f, line + skip, length - skip);
}

/* Behind the last line: was it the end of the file, and of the last row? */
static bc_status finish(log_file *f)
{
    const bool folder = errno == EISDIR;

    if (!feof(f->file))
        return bc_fail_at(f->err, folder ? BC_ERR_INPUT : BC_ERR_FILE, f->l->path, 0, "the log cannot be read: %s",
                          folder ? "it is a directory" : "the device failed, or memory is short");
    if (f->csv.fini(&f->parser, on_cell, on_row, f) != 0)
        return refuse_csv(f);
    return f->status;
}

static bc_status read_lines(log_file *f)
{
    char *line = NULL;
    size_t size = 0;
    bc_status status = BC_OK;

    while (status == BC_OK) {
        const ssize_t got = getline(&line, &size, f->file);

        if (got < 0)
            break;
        status = take_line(f, line, (size_t)got);
    }
    if (status == BC_OK)
        status = finish(f);
    free(line);
    return status;
}

static bc_status read_file(log_file *f)
{
    f->file = fopen(f->l->path, "re");
    if (!f->file)
        return bc_fail_at(f->err, bc_file_is_misnamed(errno) ? BC_ERR_INPUT : BC_ERR_FILE, f->l->path, 0, "the log cannot be opened; is the name right?");
    const bc_status status = read_lines(f);

    (void)fclose(f->file);
    if (status == BC_OK && !f->has_header)
        return bc_fail_at(f->err, BC_ERR_INPUT, f->l->path, 0, "the log is empty; its first row names the columns");
    return status;
}

/* A log without one row of use has no answer. */
static bc_status check_use(const log_case *l, bc_error *err)
{
    if (l->rows == 0)
        return bc_fail_at(err, BC_ERR_INPUT, l->path, 0, "the log has no row behind its header");
    if (l->refused < l->rows)
        return BC_OK;
    return bc_fail_at(err, BC_ERR_INPUT, l->path, l->told[0].line, "no row of the log can be used (%zu read); this is the first: %s", l->rows, l->told[0].reason);
}

bc_status log_read(log_case *l, bc_error *err)
{
    log_file f = {.l = l, .status = BC_OK, .err = err};
    bc_status status = csv_library_open(&f.csv, err);

    if (status != BC_OK)
        return status;
    if (f.csv.init(&f.parser, CSV_STRICT | CSV_STRICT_FINI) == 0) {
        status = read_file(&f);
        f.csv.free(&f.parser);
    }
    csv_library_close(&f.csv);
    return status == BC_OK ? check_use(l, err) : status;
}
