/* SPDX-License-Identifier: MIT */
/* section_internal.h - which results of a section share a row, a method or a note. */
#ifndef SECTION_INTERNAL_H
#define SECTION_INTERNAL_H

#include "output/report.h"

#define SECTION_NONE ((size_t)-1)

typedef struct {
    const report *r;
    size_t index;
    size_t single_count; /* results that stand alone in their row */
    size_t row_count;    /* rows that hold the results of several gases */
    size_t *row_of;      /* a result's row; SECTION_NONE: it stands alone, or is not of this section */
    size_t *note_of;     /* the number of a result's note, from 1; 0: none */
    size_t note_count;
    const char *method; /* of all results; NULL: they differ */
} section;

/* Sorts the results of a section, with their notes if asked; false when there is no memory. To be
 * closed either way; it must not outlive the report. */
bool section_open(section *s, const report *r, size_t index, bool with_notes);
void section_close(section *s);

/* Whether a result belongs to the section and stands alone. */
bool section_has_single(const section *s, size_t result);

/* Whether a gas has a result in any row; the result of a row and gas, or SECTION_NONE; the first
 * result of a row. */
bool section_has_gas(const section *s, size_t gas);
size_t section_find(const section *s, size_t row, size_t gas);
size_t section_first(const section *s, size_t row);

/* The label of a result (or of its row) with the marks of all notes; a note with the letters of the
 * gases it is about, where it is not about all. NULL when there is no memory; the caller frees. */
char *section_label(const section *s, size_t result);
char *section_note(const section *s, size_t number);

#endif
