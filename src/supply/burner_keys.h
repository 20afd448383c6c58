/* SPDX-License-Identifier: MIT */
/* burner_keys.h - the keys of a burner file as a table: where each value lies in a burner, and what it may be. */
#ifndef BURNER_KEYS_H
#define BURNER_KEYS_H

#include "bluecone/burner.h"

typedef enum { KEY_TEXT, KEY_WORD, KEY_MEASURE, KEY_GAUGE } key_kind;

#define NO_FLAG ((size_t)-1)

typedef struct {
    bc_burner_key shown;
    key_kind kind;
    size_t member, size, flag;      /* places in a bc_burner */
    const char *const *words;       /* KEY_WORD */
    const char *like, *bare, *unit; /* of a measure, as the range */
    double least, most, added;
} key_row;

/* The rows; NULL out of range. */
const key_row *burner_key_row(size_t index);

/* The row of a key in a section (in lower case); bc_burner_key_count() when there is none. */
size_t burner_key_find(const char *section, const char *key);

/* Whether the file stated a key. */
bool burner_states(const bc_burner *b, const char *section, const char *key);

/* A value in the unit that it is shown in. */
double burner_key_shown(const key_row *row, double si);

#endif
