/* SPDX-License-Identifier: MIT */
/* extension.h - SQLite as a loaded extension sees it: through the table of functions that its loader hands over. */
#ifndef EXTENSION_H
#define EXTENSION_H

#include <sqlite3ext.h>

/* The one object of this module that is written: by every load, with the same address, perhaps while another connection
 * is at work. SQLite's own SQLITE_EXTENSION_INIT1 would be a race then. */
extern const sqlite3_api_routines *_Atomic sqlite3_api;

#endif
