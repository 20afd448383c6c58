/* SPDX-License-Identifier: MIT */
/* bluecone/limits.h - what a contract allows a gas to be, and how a gas stands to it.
 *
 * A contract file (bluecone-contract(5)) is read once; each of its limits keeps its own reference state and
 * unit, so any gas is judged by the figures that the text means, whatever state a report is printed at. */
#ifndef BLUECONE_LIMITS_H
#define BLUECONE_LIMITS_H

#include <stdbool.h>
#include <stddef.h>

#include "bluecone/composition.h"
#include "bluecone/offer.h"
#include "bluecone/subject.h"

#ifdef __cplusplus
extern "C" {
#endif

#define BC_LIMIT_MAX 64           /* limits of one contract, followed ones included */
#define BC_LIMIT_REFERENCE_MAX 12 /* different reference states of one contract */
#define BC_LIMIT_ID_MAX 64        /* bytes of an id or unit with the final NUL */
#define BC_LIMIT_NOTE_MAX 160     /* bytes of a note with the final NUL */
#define BC_DATE_MAX 12            /* bytes of a date with the final NUL */
#define BC_LIMIT_ROUNDING 1e-9    /* relative: a figure this near to a bound is on it, not beyond */

/* What a limit is on. */
typedef enum {
    BC_LIMIT_QUANTITY,      /* a quantity of `bluecone list quantities` */
    BC_LIMIT_FRACTION,      /* mole fraction of a component or a group */
    BC_LIMIT_CONCENTRATION, /* its mass per volume of real gas at the metering state */
    BC_LIMIT_INDEX,         /* an index of interchangeability: bluecone/index.h */
    BC_LIMIT_MASS_FRACTION, /* mass of a component or a group per mass of gas */
    BC_LIMIT_VOLUME_FRACTION /* its volume as a gas alone, per sum of such volumes, at the metering state */
} bc_limit_kind;

/* One limit. A bound that is not stated is not there: has_min or has_max is false and its value 0. */
typedef struct {
    char id[BC_LIMIT_ID_MAX];        /* "wobbe-gross", "hydrogen", "c4+", "inerts", "total-sulphur" */
    char unit[BC_LIMIT_ID_MAX];      /* of the bounds, as written; that of the quantity or "mol %" when not */
    bc_limit_kind kind;
    size_t quantity;                 /* BC_LIMIT_QUANTITY, BC_LIMIT_INDEX: its index */
    double weight[BC_SPECIES_CAPACITY]; /* else: what a mole of each species adds, mol or (concentration, mass) kg */
    bc_unit own, shown;              /* units of the figure as computed, and of the bounds */
    bool has_min, has_max;
    double min, max;                 /* in `unit` */
    size_t reference;                /* of the contract's references */
    char path[BC_FILE_MAX];          /* file and line it stands on */
    int line;
    char note[BC_LIMIT_NOTE_MAX];    /* where and when it holds, as the file says; may be "" */
    bool unit_assumed;               /* a file states none: `unit` is the default */
    bool state_assumed;              /* neither it nor the contract states one: the default of bc_state_default() */
} bc_limit;

/* A window of [range COMPONENT]: mole fractions. */
typedef struct {
    double weight[BC_SPECIES_CAPACITY]; /* 1 for the species meant */
    char id[BC_LIMIT_ID_MAX];
    double min, max;
} bc_range;

/* A contract read. The terms of trade are kept as they were read. */
typedef struct {
    char name[BC_NAME_MAX];
    char path[BC_FILE_MAX];
    char origin[256];                /* key `source`; "" when not stated */
    char note[256];
    char from[BC_DATE_MAX], until[BC_DATE_MAX]; /* when the text came and went; "" when not stated */
    char currency[BC_CURRENCY_MAX];
    bc_per_amount price;
    bc_per_amount annual;            /* amount a year: si is J, kg, m3 or mol per year */
    bc_state state;                  /* of limits that name none */
    bool state_stated;               /* by a file; else it is the default */
    size_t reference_count;
    bc_reference references[BC_LIMIT_REFERENCE_MAX];
    size_t limit_count;
    bc_limit limits[BC_LIMIT_MAX];
    size_t range_count;
    bc_range ranges[BC_LIMIT_MAX];
    bool has_present;                /* `present` is the gas that indices of two gases compare with */
    bc_gas present;
} bc_contract;

/* How a gas stands to a limit, in the unit of the limit. */
typedef struct {
    double value;
    bool has_u;
    double u;        /* standard uncertainty, where it is known */
    double margin;   /* to the nearer bound, negative when that is broken */
    bool inside;
} bc_limit_figure;

/* Reads a contract file and those it follows.
 *
 *   path       the file
 *   contract   out: 200 kB; nothing of it is to be used after a failure
 *
 * BC_ERR_INPUT: what is wrong with the file, with its line; BC_ERR_FILE, BC_ERR_MEMORY. */
BC_API BC_MUST_USE bc_status bc_contract_read(const char *path, bc_contract *contract, bc_error *err);

/* Finds what a CONTRACT word means: a file, else a bundled specification NAME (DIR/NAME.ini); `follows` inside of it
 * looks through the same folders.
 *
 *   folders        folders with specifications, looked through in order
 *   folder_count   their number
 *
 * BC_ERR_INPUT with the nearest bundled name when nothing fits; else as bc_contract_read(). */
BC_API BC_MUST_USE bc_status bc_contract_find(const char *word, const char *const folders[], size_t folder_count, bc_contract *contract,
                                              bc_error *err);

/* A contract without limits, to be filled by bc_contract_add(): what a caller asks by itself, such as an
 * aim. `state` is that of all its limits; errors as bc_reference_at(). */
BC_API BC_MUST_USE bc_status bc_contract_start(const bc_state *state, bc_contract *contract, bc_error *err);

/* Adds a limit.
 *
 *   word       a quantity, component or group, as behind [limit
 *   unit       of the bounds; "" for that of the quantity, or mol %
 *   min, max   the bounds; NULL where there is none, at least one is there; equal ones are an aim
 *
 * BC_ERR_INPUT as bc_contract_read(), without a line; BC_ERR_USAGE: no room. */
BC_API BC_MUST_USE bc_status bc_contract_add(bc_contract *contract, const char *word, const char *unit, const double *min, const double *max,
                                             bc_error *err);

/* The figure of a gas that a limit is on, in the unit of the limit; no uncertainty is worked out.
 *
 *   limit   0..contract->limit_count - 1
 *   gas     as composed: the state of the limit may saturate it
 *   value   out: untouched on failure
 *
 * BC_ERR_RANGE: the gas has no such figure; BC_ERR_USAGE: an index of two gases, and has_present is false. */
BC_API BC_MUST_USE bc_status bc_limit_value(const bc_contract *contract, size_t limit, const bc_gas *gas, double *value, bc_error *err);

/* Judges a gas by a limit: value, uncertainty, margin. Bounds belong to what is allowed.
 *
 *   spread   uncertainty of the composition; NULL when none was stated
 *
 * BC_ERR_RANGE: the gas has no such figure, so the limit cannot be judged; BC_ERR_USAGE as above. */
BC_API BC_MUST_USE bc_status bc_limit_judge(const bc_contract *contract, size_t limit, const bc_gas *gas, const bc_spread *spread,
                                            bc_limit_figure *figure, bc_error *err);

/* Margin of a value to the nearer bound of a limit, in its unit, negative outside. */
BC_API double bc_limit_margin(const bc_limit *limit, double value);

/* What differences of a limit's figure are measured by: the window, else the magnitude of the bound. Above zero. */
BC_API double bc_limit_scale(const bc_limit *limit);

#ifdef __cplusplus
}
#endif

#endif
