/* SPDX-License-Identifier: MIT */
/* blend_case.h - what the command line of `blend` asks for. */
#ifndef BLEND_CASE_H
#define BLEND_CASE_H

#include "cli/subjects.h"

#define NO_PART ((size_t)-1)

typedef enum { SHARE_FIXED, SHARE_REST, SHARE_RANGE, SHARE_FREE } share_kind;

/* A SHARE of the command line; fractions of one. */
typedef struct {
    share_kind kind;
    double value;           /* SHARE_FIXED */
    double low, high, step; /* SHARE_RANGE */
} share_word;

/* The parts, their shares and what is asked of them. Not to be copied: the mixer points into it. */
typedef struct {
    const arguments *a;
    bc_blend_basis by;
    size_t count;
    const char *word[BC_BLEND_PARTS_MAX]; /* GAS as typed */
    share_word share[BC_BLEND_PARTS_MAX];
    size_t swept, rest;  /* NO_PART: none */
    size_t free_count;   /* shares written `free` */
    double fixed;        /* sum of the numbers, fraction of one */
    subjects parts;      /* first the parts, behind them blends that were added */
    bc_mixer mixer;
    bc_contract *within; /* NULL: no --within */
    bc_contract *aims;   /* NULL: no --aim; bounds of a limit are equal */
    bc_offer offer[BC_BLEND_PARTS_MAX];
} blend_case;

/* Reads words, options and files. The caller closes in any case. */
bc_status blend_open(blend_case *c, const arguments *a, bc_error *err);
void blend_close(blend_case *c);

/* Reads the shares alone (blend_shares.c): kinds, values, swept, rest, free_count, fixed. */
bc_status blend_take_shares(blend_case *c, bc_error *err);

/* Prices, CO2 and flows of the files, with those of the options over them (blend_terms.c). */
bc_status blend_take_terms(blend_case *c, bc_error *err);

/* Which part a word of --price or --least means: its GAS word, its name, or its place counted from 1. */
bc_status blend_find_part(const blend_case *c, const char *option, const char *word, size_t *part, bc_error *err);

/* The next "key=value" of a comma-separated list; false at its end. A piece without '=' or too long: BC_ERR_USAGE. */
bc_status blend_next_pair(const char **list, const char *option, char key[BC_NAME_MAX], char value[BC_NAME_MAX], bool *more, bc_error *err);

/* Shares for the parts when all are numbers or rest. */
void blend_fixed_shares(const blend_case *c, double share[]);

/* A short name of a part for tables. */
const char *blend_part_name(const blend_case *c, size_t part);

#endif
