/* SPDX-License-Identifier: MIT */
/* text.c - trimming, folding, likeness and safe showing of words. */
#include "base/text.h"

#include <locale.h>
#include <stdio.h>
#include <string.h>

/* This thread's locale while the C library writes for us: uselocale() changes that of no other thread. */
typedef struct {
    locale_t plain, kept;
} locale_aside;

static locale_aside put_locale_aside(void)
{
    const locale_t plain = newlocale(LC_ALL_MASK, "C", (locale_t)0); /* there without allocation or file */

    return (locale_aside){plain, uselocale(plain)}; /* no locale would change none */
}

static void take_locale_back(locale_aside locale)
{
    (void)uselocale(locale.kept);
    if (locale.plain != (locale_t)0)
        freelocale(locale.plain);
}

int bc_text_vformat(char *to, size_t size, const char *format, va_list arguments)
{
    const locale_aside locale = put_locale_aside();
    const int length = vsnprintf(to, size, format, arguments);

    take_locale_back(locale);
    return length;
}

void bc_text_of_errno(char *to, size_t size, int number)
{
    const locale_aside locale = put_locale_aside();

    if (strerror_r(number, to, size) != 0)
        (void)snprintf(to, size, "error %d", number);
    take_locale_back(locale);
}

int bc_text_format(char *to, size_t size, const char *format, ...)
{
    va_list arguments;

    va_start(arguments, format);
    const int length = bc_text_vformat(to, size, format, arguments);

    va_end(arguments);
    return length;
}

const char *bc_text_skip_space(const char *text)
{
    while (*text == ' ' || *text == '\t' || *text == '\r')
        text++;
    return text;
}

static bool is_blank(char c)
{
    return c == ' ' || c == '\t' || c == '\r' || c == '\n';
}

bool bc_text_copy(char *to, size_t size, const char *text, size_t length)
{
    while (length > 0 && is_blank(text[0])) {
        text++;
        length--;
    }
    while (length > 0 && is_blank(text[length - 1]))
        length--;
    if (length >= size)
        return false;
    memcpy(to, text, length);
    to[length] = '\0';
    return true;
}

void bc_text_show(char *to, size_t size, const char *text)
{
    size_t n = 0;

    while (text[n] != '\0' && n + 1 < size) {
        const unsigned char c = (unsigned char)text[n];

        to[n] = c < 0x20 || c == 0x7f ? '?' : (char)c;
        n++;
    }
    if (text[n] != '\0' && size > 4) {
        memcpy(to + size - 4, "...", 3);
        n = size - 1;
    }
    to[n] = '\0';
}

static char lower(char c)
{
    return c >= 'A' && c <= 'Z' ? (char)(c - 'A' + 'a') : c;
}

bool bc_text_fold(char *to, size_t size, const char *word)
{
    size_t n = 0;

    for (; *word != '\0'; word++) {
        if (is_blank(*word) || *word == '-' || *word == '_')
            continue;
        if (n + 1 >= size)
            return false;
        to[n++] = lower(*word);
    }
    to[n] = '\0';
    return true;
}

static const char *skip_ignored(const char *word)
{
    while (is_blank(*word) || *word == '-' || *word == '_')
        word++;
    return word;
}

bool bc_text_same(const char *a, const char *b)
{
    a = skip_ignored(a);
    b = skip_ignored(b);
    while (*a != '\0' && lower(*a) == lower(*b)) {
        a = skip_ignored(a + 1);
        b = skip_ignored(b + 1);
    }
    return *a == *b;
}

static size_t smallest(size_t a, size_t b, size_t c)
{
    const size_t ab = a < b ? a : b;

    return ab < c ? ab : c;
}

/* Three rows of the edit table: the one to fill and the two above it. */
typedef struct {
    const size_t *before, *last;
    size_t *row;
} edit_rows;

/* Row i: the word a up to its i-th character against every beginning of b. */
static void fill_row(const char *a, size_t i, const char *b, size_t n, const edit_rows *r)
{
    r->row[0] = i;
    for (size_t j = 1; j <= n; j++) {
        const size_t cost = a[i - 1] == b[j - 1] ? 0 : 1;

        r->row[j] = smallest(r->last[j] + 1, r->row[j - 1] + 1, r->last[j - 1] + cost);
        if (i > 1 && j > 1 && a[i - 1] == b[j - 2] && a[i - 2] == b[j - 1])
            r->row[j] = smallest(r->row[j], r->before[j - 2] + 1, r->row[j]);
    }
}

size_t bc_text_distance(const char *a, const char *b)
{
    size_t rows[3][BC_WORD_MAX + 1] = {{0}};
    const size_t m = strlen(a);
    const size_t n = strlen(b);

    if (m > BC_WORD_MAX || n > BC_WORD_MAX)
        return BC_WORD_MAX;
    for (size_t j = 0; j <= n; j++)
        rows[0][j] = j;
    for (size_t i = 1; i <= m; i++) {
        const edit_rows around = {rows[(i + 1) % 3], rows[(i - 1) % 3], rows[i % 3]};

        fill_row(a, i, b, n, &around);
    }
    return rows[m % 3][n];
}

size_t bc_text_unlikeness(const char *word, const char *candidate)
{
    char folded[BC_WORD_MAX] = "";
    char whole[BC_WORD_MAX] = "";

    if (!bc_text_fold(folded, sizeof folded, word) || !bc_text_fold(whole, sizeof whole, candidate))
        return BC_WORD_MAX;
    const size_t length = strlen(folded);
    const size_t distance = bc_text_distance(folded, whole);

    if (length < 3 || strlen(whole) <= length)
        return distance;
    whole[length] = '\0';
    const size_t beginning = bc_text_distance(folded, whole) + 1;

    return beginning < distance ? beginning : distance;
}

/* A third of the letters may be wrong, and one, but then not the first letter, which people get right: natural-gas is not
 * water-gas. Of a word of three letters only one, else anything is near. */
bool bc_text_is_near(const char *word, const char *candidate)
{
    const size_t length = strlen(word);
    const size_t allowed = length > 3 && lower(word[0]) == lower(candidate[0]) ? 1 + length / 3 : 1;

    return bc_text_unlikeness(word, candidate) <= allowed;
}

void bc_text_suggest(char *to, size_t size, const char *lead, const char *word, const char *candidate)
{
    to[0] = '\0';
    if (bc_text_is_near(word, candidate))
        (void)snprintf(to, size, "; %s '%s'", lead, candidate);
}
