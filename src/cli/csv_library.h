/* SPDX-License-Identifier: MIT */
/* csv_library.h - libcsv, loaded when a log is read. */
#ifndef CSV_LIBRARY_H
#define CSV_LIBRARY_H

#include "bluecone/status.h"

#include <csv.h>

/* Its functions, without their prefix. */
typedef struct {
    void *handle;
    int (*init)(struct csv_parser *, unsigned char);
    size_t (*parse)(struct csv_parser *, const void *, size_t, void (*)(void *, size_t, void *), void (*)(int, void *), void *);
    int (*fini)(struct csv_parser *, void (*)(void *, size_t, void *), void (*)(int, void *), void *);
    void (*free)(struct csv_parser *);
    int (*error)(struct csv_parser *);
    void (*set_delim)(struct csv_parser *, unsigned char);
} csv_library;

/* BC_ERR_FILE: it is not there. The caller closes after success. */
BC_MUST_USE bc_status csv_library_open(csv_library *library, bc_error *err);
void csv_library_close(csv_library *library);

#endif
