/* SPDX-License-Identifier: MIT */
/* text.h - the few things that words of files and options need: trimming, likeness, showing. */
#ifndef TEXT_H
#define TEXT_H

#include "base/compiler.h"

#include <stdarg.h>
#include <stdbool.h>
#include <stddef.h>

#define BC_WORD_MAX 64 /* bytes of one word (an id, a component, a unit), with the final NUL */
#define BC_HINT_MAX 128 /* bytes of a suggestion: a lead of a few words, and one word */

/* snprintf() that writes a decimal point in every locale: whatever holds a double goes through here. */
int bc_text_format(char *to, size_t size, const char *format, ...) BC_PRINTF(3, 4);
int bc_text_vformat(char *to, size_t size, const char *format, va_list arguments) BC_PRINTF(3, 0);

/* What the system says of an errno, in English. */
void bc_text_of_errno(char *to, size_t size, int number);

/* The first character that is no blank, tab or carriage return. */
const char *bc_text_skip_space(const char *text);

/* Copies text[0..length) without leading and trailing blanks; false when it does not fit. */
bool bc_text_copy(char *to, size_t size, const char *text, size_t length);

/* Copies a text for a message: control characters become '?', a long text ends in "...". */
void bc_text_show(char *to, size_t size, const char *text);

/* Folds a word for comparing: ASCII lower case, without blanks, '-', '_'. False when it does not fit. */
bool bc_text_fold(char *to, size_t size, const char *word);

/* True when both words fold to the same. */
bool bc_text_same(const char *a, const char *b);

/* Number of single-character edits (insert, delete, replace, swap of neighbours) between two folded
 * words; at most BC_WORD_MAX. Damerau-Levenshtein distance, optimal string alignment. */
size_t bc_text_distance(const char *a, const char *b);

/* How unlike a word and a candidate for it are, for suggesting the nearest: the distance of both when
 * folded, or one more than that to the beginning of the candidate, since people type beginnings. */
size_t bc_text_unlikeness(const char *word, const char *candidate);

/* True when a candidate is near enough to a word that suggesting it helps. A wrong suggestion misleads more than none. */
bool bc_text_is_near(const char *word, const char *candidate);

/* "; LEAD 'CANDIDATE'" when the candidate is near enough to the word to be suggested, else nothing. */
void bc_text_suggest(char *to, size_t size, const char *lead, const char *word, const char *candidate);

#endif
