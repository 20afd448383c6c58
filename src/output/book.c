/* SPDX-License-Identifier: MIT */
/* book.c - the module's one function: a workbook from the cover to the charts. */
#define _XOPEN_SOURCE 700 /* uselocale() */

#include "output/book_internal.h"

#include "output/workbook_internal.h"

#include <locale.h>
#include <stdlib.h>
#include <string.h>

#define COPY_BYTES 16384
#define ZIP_EPOCH  315532800 /* 1980-01-01: the date that libxlsxwriter gives the parts of the file, too */
#define TITLE_MAX  200

void book_check(book *b, lxw_error error)
{
    if (b->error == LXW_NO_ERROR)
        b->error = error;
}

/* No author and no date of today: the same report makes the same file. */
static void describe(book *b)
{
    char *title = book_text(b, b->r->title, TITLE_MAX);
    char *version = book_text(b, b->r->version, TITLE_MAX);
    char maker[80] = "";

    if (title != NULL && version != NULL) {
        (void)snprintf(maker, sizeof maker, "bluecone %.60s", version);
        lxw_doc_properties properties = {.title = title, .comments = maker, .created = ZIP_EPOCH};
        book_check(b, workbook_set_properties(b->file, &properties));
    }
    free(title);
    free(version);
}

static void put_tables(book *b, bool leading)
{
    for (size_t i = 0; i < b->r->table_count; i++)
        if (b->r->tables[i].leads == leading)
            book_table(b, &b->r->tables[i]);
}

static void fill(book *b)
{
    book_looks(b);
    describe(b);
    book_cover(b);
    put_tables(b, true);
    for (size_t i = 0; i < b->r->section_count; i++)
        book_section(b, i);
    put_tables(b, false);
    for (size_t i = 0; i < b->r->chart_count; i++)
        book_chart(b, &b->r->charts[i]);
}

/* The workbook goes to a file without a name, since libxlsxwriter knows files only. */
static void write_to(book *b, int descriptor)
{
    char path[32];
    lxw_workbook_options options = {.constant_memory = LXW_FALSE};

    (void)snprintf(path, sizeof path, "/dev/fd/%d", descriptor);
    b->file = workbook_new_opt(path, &options);
    if (b->file == NULL) {
        b->failed = true;
        return;
    }
    fill(b);
    if (b->failed || b->error != LXW_NO_ERROR)
        lxw_workbook_free(b->file);
    else
        book_check(b, workbook_close(b->file));
}

/* False when not all of it could be read; what could not be written, `to` knows. */
static bool copy(FILE *from, FILE *to)
{
    char bytes[COPY_BYTES];
    size_t count = 0;

    rewind(from);
    while ((count = fread(bytes, 1, sizeof bytes, from)) > 0)
        fwrite(bytes, 1, count, to);
    return !ferror(from);
}

static workbook_outcome outcome_of(const book *b, const char *trouble, workbook_order *order)
{
    if (b->failed || b->error == LXW_ERROR_MEMORY_MALLOC_FAILED)
        return WORKBOOK_NO_MEMORY;
    if (b->error == LXW_NO_ERROR && trouble == NULL)
        return WORKBOOK_WRITTEN;
    (void)snprintf(order->why, sizeof order->why, "%s", trouble == NULL ? lxw_strerror(b->error) : trouble);
    return WORKBOOK_NOT_WRITTEN;
}

/* libxlsxwriter prints numbers as the locale has them, which no spreadsheet could read. */
static workbook_outcome write_book(workbook_order *order)
{
    book b = {.r = order->r, .style = order->style};
    FILE *file = tmpfile();
    const char *trouble = NULL;

    if (file == NULL)
        return outcome_of(&b, "no temporary file can be made", order);
    write_to(&b, fileno(file));
    if (!b.failed && b.error == LXW_NO_ERROR && !copy(file, order->out))
        trouble = "the temporary file cannot be read";
    (void)fclose(file);
    return outcome_of(&b, trouble, order);
}

workbook_outcome bluecone_workbook_write(unsigned abi, workbook_order *order)
{
    if (abi != WORKBOOK_ABI)
        return WORKBOOK_OTHER_ABI;

    const locale_t neutral = newlocale(LC_ALL_MASK, "C", (locale_t)0);
    if (neutral == (locale_t)0)
        return WORKBOOK_NO_MEMORY;
    const locale_t before = uselocale(neutral);
    const workbook_outcome outcome = write_book(order);
    uselocale(before);
    freelocale(neutral);
    return outcome;
}
