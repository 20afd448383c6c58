/* SPDX-License-Identifier: MIT */
/* apart_internal.h - work that libraries do which cannot be trusted when memory runs out: in a process of its own.
 *
 * Fontconfig 2.14 and libxlsxwriter 1.1 print to standard error, crash or wait for ever then, as tests/faults shows. What
 * happens apart stays there: the caller gets all bytes or one error. */
#ifndef APART_INTERNAL_H
#define APART_INTERNAL_H

#include "bluecone/status.h"

#include <stdio.h>

/* Writes to `out`, as a renderer does. */
typedef bc_status apart_work(void *data, FILE *out, bc_error *err);

/* Does the work in a child process and copies what it wrote to `out`, a stream into memory. Only to be called while there
 * is one thread. Where no process can be started the work is done in this one.
 *
 * Errors of the work; BC_ERR_FILE: it came to no end of its own, or not within 20 seconds. */
BC_MUST_USE bc_status apart(apart_work *work, void *data, FILE *out, bc_error *err);

#endif
