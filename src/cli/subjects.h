/* SPDX-License-Identifier: MIT */
/* subjects.h - the gases of a command line, loaded and evaluated at one state. */
#ifndef SUBJECTS_H
#define SUBJECTS_H

#include "cli/cli.h"

/* One gas with what was made of it. */
typedef struct {
    loaded_gas loaded;
    bc_subject subject;
    bool air_free; /* this is the gas before it, without its air */
} subject;

/* All of them, on the heap: a composition with its scatter is 150 kB. Not to be copied. */
typedef struct {
    bc_state state;
    bc_reference reference;
    size_t count;
    subject *each;
} subjects;

/* Loads the gases words[0..count). With --air-free a gas that holds oxygen is followed (`both`) or
 * replaced by itself without air. The caller closes in any case. */
bc_status subjects_open(subjects *s, const arguments *a, const char *const words[], size_t count, bool both, bc_error *err);
/* The same at a state that no option gives. */
bc_status subjects_open_at(subjects *s, const bc_state *state, const arguments *a, const char *const words[], size_t count, bc_error *err);
void subjects_close(subjects *s);

/* State, gases and their warnings into a report. */
void subjects_report(const subjects *s, report *r);

/* Says of each gas without stated uncertainties that its u is that of the tables alone. */
void subjects_tell_uncertainty(const subjects *s, report *r);

#endif
