/* SPDX-License-Identifier: MIT */
/* stream_part.h - a tally as a file, so that parts of a log can be summed up apart and merged.
 *
 * One JSON object: "tool", "part" (the version of this format), "version", "plan", then what the tally keeps. Times and
 * weights are whole milliseconds (weights are rows where no usual step is known), -1 is no time; doubles have 17
 * digits and so read back as they were; a sum stands with its rounding error behind it. Whoever reads the figures wants
 * --merge --json; this file is for merging. */
#ifndef STREAM_PART_H
#define STREAM_PART_H

#include "supply/tally.h"

#define STREAM_PART_VERSION 1
#define STREAM_PART_BYTES_MAX ((size_t)128 << 20)

/* Writes an unsettled tally; it can still be added to and settled afterwards.
 *
 *   path   NULL: standard output; a file is written as a whole or stays as it was
 *
 * BC_ERR_FILE; BC_ERR_MEMORY; errors of tally_flush() */
BC_MUST_USE bc_status stream_part_write(tally *t, const char *path, bc_error *err);

/* Reads a part.
 *
 *   t   out: to be closed; untouched on failure
 *
 * BC_ERR_INPUT: no part file, damaged, or of a later version; BC_ERR_FILE; BC_ERR_MEMORY. */
BC_MUST_USE bc_status stream_part_read(const char *path, tally **t, bc_error *err);

#endif
