/* SPDX-License-Identifier: MIT */
/* ini.h - an INI file as a checked list of entries with their lines.
 *
 * iniparser reads the values; this guards what reaches it. It keeps the last of two equal keys,
 * cuts long lines, prints to stderr by itself and takes a directory for an empty file, so the text
 * is read and checked here first and iniparser is given exactly the bytes that were checked. */
#ifndef INI_H
#define INI_H

#include "bluecone/status.h"

#include <stddef.h>

#define BC_INI_BYTES_MAX (256 * 1024) /* a file of ours has a few kB; more is a wrong file */
#define BC_INI_LINE_MAX 1000          /* bytes of a line; iniparser 4.1 cuts at 1022 */
#define BC_INI_KEY_MAX 64             /* bytes of a section or key with the final NUL */

/* One key with its value. The texts live as long as the document. */
typedef struct {
    char section[BC_INI_KEY_MAX]; /* lower case */
    char key[BC_INI_KEY_MAX];     /* as written */
    const char *value;            /* without quotes and comment; "" when nothing stands there */
    int line;
} bc_ini_entry;

typedef struct bc_ini bc_ini;

/* Reads and checks a file; *ini is to be closed. Errors name file, line, cause and remedy.
 * BC_ERR_INPUT: what the file holds; BC_ERR_FILE: it cannot be read; BC_ERR_MEMORY. */
BC_MUST_USE bc_status bc_ini_open(const char *path, bc_ini **ini, bc_error *err);
void bc_ini_close(bc_ini *ini);

/* Entries in the order of the file. */
size_t bc_ini_count(const bc_ini *ini);
const bc_ini_entry *bc_ini_at(const bc_ini *ini, size_t index);

/* The value of a key in a section (both in lower case), or NULL. */
const bc_ini_entry *bc_ini_find(const bc_ini *ini, const char *section, const char *key);

#endif
