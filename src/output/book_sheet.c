/* SPDX-License-Identifier: MIT */
/* book_sheet.c - sheets and their cells: names, formats and widths that a spreadsheet takes. */
#include "output/book_internal.h"

#include "output/plain_text_internal.h"

#include <stdlib.h>
#include <string.h>
#include <strings.h>

#define WIDTH_MIN   8
#define WIDTH_MAX   90
#define LINE_HEIGHT 15.0 /* points */
#define WIDTH_TIME  17
#define PAPER_A4    9
#define NAMES_MAX   10000 /* tried before a sheet is given up */

/* ---- looks ---- */

static lxw_format *new_format(book *b)
{
    lxw_format *format = workbook_add_format(b->file);

    if (format == NULL)
        b->failed = true;
    else
        format_set_align(format, LXW_ALIGN_VERTICAL_TOP);
    return format;
}

static void color(lxw_format *format, lxw_color_t ink, lxw_color_t ground)
{
    format_set_bold(format);
    format_set_font_color(format, ink);
    if (ground != 0)
        format_set_bg_color(format, ground);
}

static void color_head(lxw_format *format)
{
    color(format, 0x0F4C81, 0xEEF4FA);
    format_set_bottom(format, LXW_BORDER_THIN);
    format_set_text_wrap(format);
}

void book_looks(book *b)
{
    for (size_t i = 0; i < BOOK_LOOKS; i++)
        b->looks[i] = new_format(b);
    if (b->failed)
        return;
    color(b->looks[BOOK_TITLE], 0x0F4C81, 0);
    format_set_font_size(b->looks[BOOK_TITLE], 15);
    color_head(b->looks[BOOK_HEAD]);
    color_head(b->looks[BOOK_HEAD_RIGHT]);
    format_set_align(b->looks[BOOK_HEAD_RIGHT], LXW_ALIGN_RIGHT);
    format_set_align(b->looks[BOOK_NONE], LXW_ALIGN_RIGHT);
    format_set_indent(b->looks[BOOK_HEAD], 1);
    format_set_indent(b->looks[BOOK_PLAIN], 1); /* away from the number before it */
    format_set_text_wrap(b->looks[BOOK_WRAPPED]);
    color(b->looks[BOOK_WORD], 0x1C2733, 0);
    color(b->looks[BOOK_GOOD], 0x17603A, 0xE9F5EE);
    color(b->looks[BOOK_CARE], 0x7A4A00, 0xFDF5E3);
    color(b->looks[BOOK_BAD], 0x9B1C1C, 0xFDEEEC);
    format_set_text_wrap(b->looks[BOOK_GOOD]);
    format_set_text_wrap(b->looks[BOOK_CARE]);
    format_set_text_wrap(b->looks[BOOK_BAD]);
    format_set_num_format(b->looks[BOOK_TIME], "yyyy\\-mm\\-dd hh:mm");
}

/* The format that shows as many digits as a number printed by us: each digit becomes a 0. */
static void format_text(const char *shown, char out[NUMBER_TEXT_MAX])
{
    const size_t point = strcspn(shown, ".");
    size_t n = 0;

    out[n++] = '0';
    for (const char *c = shown + point; *c != '\0' && *c != 'e'; c++)
        out[n++] = *c == '.' ? '.' : '0';
    out[n] = '\0';
    if (strchr(shown, 'e') != NULL)
        memcpy(out + n, "E+00", sizeof "E+00");
}

static lxw_format *number_format(book *b, const char *shown)
{
    char text[NUMBER_TEXT_MAX];

    format_text(shown, text);
    for (size_t i = 0; i < b->format_count; i++)
        if (strcmp(b->formats[i].text, text) == 0)
            return b->formats[i].format;
    if (b->format_count == BOOK_FORMATS_MAX)
        return b->looks[BOOK_PLAIN];

    book_format *added = &b->formats[b->format_count];
    added->format = new_format(b);
    if (added->format == NULL)
        return NULL;
    format_set_num_format(added->format, text);
    memcpy(added->text, text, sizeof text);
    b->format_count++;
    return added->format;
}

/* ---- texts ---- */

/* Bytes of a plain text's first UTF-16 units: a character of four bytes takes two of them. */
static size_t unit_bytes(const char *text, size_t units)
{
    size_t bytes = 0;

    for (size_t taken = 0; text[bytes] != '\0'; bytes++) {
        const unsigned char byte = (unsigned char)text[bytes];

        taken += (byte & 0xC0) == 0x80 ? 0 : byte >= 0xF0 ? 2 : 1;
        if (taken > units)
            break;
    }
    return bytes;
}

char *book_text(book *b, const char *text, size_t units)
{
    char *plain = plain_text(text, PLAIN_LINE);

    if (plain == NULL)
        b->failed = true;
    else
        plain[unit_bytes(plain, units)] = '\0';
    return plain;
}

/* ---- sheets ---- */

/* What Excel forbids in names becomes a blank; blanks become one or, at the ends, none. */
static void clean_name(char *name)
{
    size_t n = 0;

    for (const char *c = name; *c != '\0'; c++) {
        const char kept = strchr("[]:*?/\\'", *c) != NULL ? ' ' : *c;

        if (kept != ' ' || (n > 0 && name[n - 1] != ' '))
            name[n++] = kept;
    }
    while (n > 0 && name[n - 1] == ' ')
        n--;
    name[n] = '\0';
}

static bool is_free(const book *b, const char *name)
{
    return *name != '\0' && strcasecmp(name, "History") != 0 &&
           workbook_validate_sheet_name(b->file, name) == LXW_NO_ERROR;
}

/* The name itself, else the first free one of "name 2", "name 3", ...; false when there is none. */
static bool choose_name(const book *b, const char *wanted, char name[BOOK_NAME_BYTES])
{
    char tail[16] = "";

    for (int number = 2; number < NAMES_MAX; number++) {
        const size_t kept = unit_bytes(wanted, BOOK_NAME_MAX - strlen(tail));

        (void)snprintf(name, BOOK_NAME_BYTES, "%.*s%s", (int)kept, *wanted == '\0' ? "Sheet" : wanted, tail);
        clean_name(name);
        if (is_free(b, name))
            return true;
        (void)snprintf(tail, sizeof tail, " %d", number);
    }
    return false;
}

/* A title too long for a name ends with its last whole word, unless little would be left. */
static void shorten(char *title)
{
    size_t kept = unit_bytes(title, BOOK_NAME_MAX);
    size_t word = kept;

    if (title[kept] == '\0')
        return;
    while (word > 0 && title[word] != ' ')
        word--;
    if (word > kept / 2)
        kept = word;
    while (kept > 0 && strchr(" ,;:", title[kept - 1]) != NULL)
        kept--;
    title[kept] = '\0';
}

bool book_open_sheet(book *b, book_sheet *s, const char *name, size_t columns)
{
    char *wanted = book_text(b, *name == '\0' ? "Sheet" : name, BOOK_TEXT_MAX);

    if (wanted != NULL)
        shorten(wanted);
    *s = (book_sheet){.b = b, .columns = (lxw_col_t)columns};
    s->widths = calloc(columns + 1, sizeof *s->widths);
    if (wanted != NULL && s->widths != NULL && choose_name(b, wanted, s->name))
        s->at = workbook_add_worksheet(b->file, s->name);
    b->failed = b->failed || s->at == NULL;
    free(wanted);
    return !b->failed;
}

void book_close_sheet(book_sheet *s, lxw_row_t head)
{
    for (lxw_col_t i = 0; s->at != NULL && i < s->columns; i++) {
        const int width = s->widths[i] < WIDTH_MIN ? WIDTH_MIN : s->widths[i] + 2;

        book_check(s->b, worksheet_set_column(s->at, i, i, width > WIDTH_MAX ? WIDTH_MAX : width, NULL));
    }
    if (s->at != NULL) {
        worksheet_freeze_panes(s->at, head, head > 0 ? 1 : 0);
        worksheet_set_paper(s->at, PAPER_A4);
        worksheet_set_landscape(s->at);
        worksheet_fit_to_pages(s->at, 1, 0);
        worksheet_set_footer(s->at, "&L&A&R&P / &N");
        if (head > 0)
            book_check(s->b, worksheet_repeat_rows(s->at, 0, head - 1));
    }
    free(s->widths);
    s->widths = NULL;
}

/* ---- cells ---- */

static void widen(book_sheet *s, size_t column, int width)
{
    if (s->widths != NULL && column < s->columns && width > s->widths[column])
        s->widths[column] = width;
}

/* Whether a text begins with what a spreadsheet takes for the code of a character, as _x0041_. */
static bool is_code(const char *text)
{
    return text[0] == '_' && text[1] == 'x' && strspn(text + 2, "0123456789ABCDEFabcdef") >= 4 &&
           text[6] == '_';
}

/* The same text with such codes escaped; NULL without memory. Takes `text` over. */
static char *escape_codes(book *b, char *text)
{
    char *escaped = malloc(2 * strlen(text) + 1);
    size_t n = 0;

    for (const char *c = text; escaped != NULL && *c != '\0'; c++) {
        if (is_code(c)) {
            memcpy(escaped + n, "_x005F", 6);
            n += 6;
        }
        escaped[n++] = *c;
    }
    if (escaped == NULL)
        b->failed = true;
    else
        escaped[n] = '\0';
    free(text);
    return escaped;
}

/* A heading may fold; a title reaches over its neighbours. */
static void put_width(book_sheet *s, size_t column, book_look look, int columns)
{
    const bool is_head = look == BOOK_HEAD || look == BOOK_HEAD_RIGHT;

    if (look != BOOK_TITLE)
        widen(s, column, is_head && columns > BOOK_HEAD_WIDTH ? BOOK_HEAD_WIDTH : columns);
    s->most = columns > s->most ? columns : s->most;
}

void book_put_text(book_sheet *s, size_t column, book_look look, const char *text)
{
    char *plain = book_text(s->b, text, BOOK_TEXT_MAX);

    if (plain != NULL && strstr(plain, "_x") != NULL)
        plain = escape_codes(s->b, plain);
    if (plain != NULL && *plain != '\0' && s->at != NULL) {
        book_check(s->b, worksheet_write_string(s->at, s->row, (lxw_col_t)column, plain, s->b->looks[look]));
        put_width(s, column, look, plain_columns(plain, strlen(plain)));
    }
    free(plain);
}

void book_put_head(book_sheet *s, size_t column, bool over_numbers, const char *text)
{
    book_put_text(s, column, over_numbers ? BOOK_HEAD_RIGHT : BOOK_HEAD, *text == '\0' ? " " : text);
}

void book_end_row(book_sheet *s, int width)
{
    const int lines = (s->most + width - 1) / width;

    if (s->at != NULL && lines > 1)
        book_check(s->b, worksheet_set_row(s->at, s->row, lines * LINE_HEIGHT, NULL));
    s->most = 0;
    s->row++;
}

void book_put_number(book_sheet *s, size_t column, double number, const char *shown)
{
    if (s->at == NULL)
        return;
    book_check(s->b,
               worksheet_write_number(s->at, s->row, (lxw_col_t)column, number, number_format(s->b, shown)));
    widen(s, column, (int)strlen(shown));
}

void book_put_time(book_sheet *s, size_t column, double seconds)
{
    const double epoch = 25569.0; /* days from 1899-12-30, where spreadsheets begin, to 1970-01-01 */

    if (s->at == NULL)
        return;
    book_check(s->b, worksheet_write_number(s->at, s->row, (lxw_col_t)column,
                                            epoch + seconds / BOOK_SECONDS_A_DAY, s->b->looks[BOOK_TIME]));
    widen(s, column, WIDTH_TIME);
}
