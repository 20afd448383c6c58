/* SPDX-License-Identifier: MIT */
/* bluecone/composition.h - a composition as a laboratory states it, read from a file or a literal and
 * turned into a gas, with everything that had to be changed said in words. */
#ifndef BLUECONE_COMPOSITION_H
#define BLUECONE_COMPOSITION_H

#include <stdbool.h>
#include <stddef.h>

#include "bluecone/gas.h"
#include "bluecone/offer.h"
#include "bluecone/status.h"

#ifdef __cplusplus
extern "C" {
#endif

/* What a share is a share of. */
typedef enum {
    BC_BASIS_MOLE,
    BC_BASIS_VOLUME, /* of the real gases at the temperature of measured_at */
    BC_BASIS_MASS
} bc_basis;

/* How the water of the gas stands to the figures. */
typedef enum {
    BC_MOISTURE_DRY,         /* the gas is dry */
    BC_MOISTURE_AS_ANALYSED, /* water counts as listed */
    BC_MOISTURE_SATURATED    /* figures are of the dry gas; the gas is saturated at measured_at */
} bc_moisture;

/* Closure of the fractions in the propagation of uncertainty. */
typedef enum {
    BC_CLOSURE_NORMALISED, /* raw amounts were normalised to one: each fraction moves all others */
    BC_CLOSURE_NONE        /* uncorrelated fractions: the unit correlation matrix of ISO 6976:2016 */
} bc_closure;

#define BC_ENTRY_MAX 96        /* lines of [components] */
#define BC_COMPONENT_MAX 64    /* bytes of a component's word with the final NUL */
#define BC_NAME_MAX 128        /* bytes of the name of a gas with the final NUL */
#define BC_REMARK_MAX 12       /* remarks kept */
#define BC_REMARK_BYTES 320    /* bytes of one remark with the final NUL */
#define BC_PRINTED_MAX 16      /* lines of [printed] */
#define BC_PRINTED_BYTES 48    /* bytes of the figure of one with the final NUL */

#define BC_SUM_MIN 0.98        /* what the shares of a whole analysis add up to: outside it is refused, within normalised */
#define BC_SUM_MAX 1.02

/* One line of [components]. */
typedef struct {
    char word[BC_COMPONENT_MAX]; /* as written */
    double amount;               /* fraction of one on the basis of the composition, before normalising */
    double u;                    /* standard uncertainty of it, fraction of one; 0: not stated */
    bool is_rest;                /* by difference */
    int line;                    /* of the file; 0 for a literal */
    double parts[BC_SPECIES_CAPACITY]; /* mole fractions of what the word stands for: one species, a cut, air */
} bc_entry;

/* A figure that is printed beside a composition, as written: bluecone/printed.h makes sense of it. */
typedef struct {
    char id[BC_COMPONENT_MAX];   /* "wobbe-gross" */
    char text[BC_PRINTED_BYTES]; /* "15.08 kWh/m3" */
    int line;
} bc_printed_line;

/* A composition read. All texts are terminated. */
typedef struct {
    char name[BC_NAME_MAX];   /* from the file, else the bundled name or the literal */
    char family[32];          /* kind of gas (natural, lng, town ...), "" when not stated */
    char origin[256];         /* where the figures come from, as the file says; may be "" */
    char path[BC_FILE_MAX];   /* file it was read from; "" for a literal */
    char bundled[BC_COMPONENT_MAX]; /* name of a bundled gas; "" for others */
    bc_basis basis;
    bc_moisture moisture;
    bc_closure closure;
    double measured_at_k;     /* temperature of volume shares and of saturation, K */
    double measured_at_pa;
    double sum;               /* of the entries before normalising, fraction of one */
    bool has_uncertainty;     /* [uncertainty] was given */
    bool air_suspected;       /* oxygen where this kind of gas has none */
    bc_gas gas;               /* what all values are computed from */
    bc_offer offer;           /* section [supply]; all zero without one */
    size_t printed_count;     /* section [printed] */
    bc_printed_line printed[BC_PRINTED_MAX];
    size_t remark_count;
    char remarks[BC_REMARK_MAX][BC_REMARK_BYTES]; /* what was changed or is strange, as sentences */
    size_t entry_count;
    bc_entry entries[BC_ENTRY_MAX];
    bc_spread spread;         /* its uncertainty; count 0 when none was stated */
} bc_composition;

/* Reads a composition file (bluecone-composition(5)).
 *
 * BC_ERR_INPUT: what is wrong with the file, with its line; BC_ERR_FILE, BC_ERR_MEMORY.
 * Nothing of *composition is to be used after a failure. */
BC_API BC_MUST_USE bc_status bc_composition_read(const char *path, bc_composition *composition, bc_error *err);

/* Reads a literal: `methane=92,ethane=5,nitrogen=3` in mole per cent, or with `volume:` or `mass:` in
 * front in per cent of volume (15 C) or mass. `rest` is allowed once, `~U` behind a number is its
 * standard uncertainty in the same unit (`methane=92~0.1`). A comma inside a name (1,3-butadiene) is
 * written as '-'. */
BC_API BC_MUST_USE bc_status bc_composition_parse(const char *literal, bc_composition *composition, bc_error *err);

/* Finds what a GAS argument of the command line means: a file, else a bundled name NAME (DIR/NAME.ini),
 * else a literal.
 *
 *   folders        folders with bundled gases, looked through in order; the one that was installed is
 *                  printed by `pkg-config --variable=compositions bluecone`
 *   folder_count   their number
 *
 * BC_ERR_INPUT with the nearest bundled name when nothing fits. */
BC_API BC_MUST_USE bc_status bc_composition_find(const char *word, const char *const folders[], size_t folder_count,
                                                 bc_composition *composition, bc_error *err);

/* What a component's word stands for: a species by any of its names, a cut (`c6+`) with its default split, or `air`.
 *
 *   parts    out: BC_SPECIES_CAPACITY mole fractions; untouched on failure
 *   remark   out: BC_REMARK_BYTES; what was assumed, as a sentence, "" for nothing; may be NULL
 *
 * BC_ERR_INPUT with a known word that is near. */
BC_API BC_MUST_USE bc_status bc_composition_component(const char *word, double parts[], char remark[], bc_error *err);

/* The gas if the share that is missing from the sum (1 - composition->sum) had been measured as one
 * species instead of being normalised away; on the basis of the composition.
 *
 * BC_ERR_USAGE when nothing is missing. */
BC_API BC_MUST_USE bc_status bc_composition_completed(const bc_composition *composition, size_t species, bc_gas *gas,
                                                      bc_error *err);

/* Propagates the uncertainties again with another closure; *composition is one that was read. */
BC_API BC_MUST_USE bc_status bc_composition_close(bc_composition *composition, bc_closure closure, bc_error *err);

/* Calls visit(name, path, data) for each bundled gas in a folder, sorted by name; a folder that does
 * not exist has none. */
BC_API BC_MUST_USE bc_status bc_composition_each(const char *folder, void (*visit)(const char *name, const char *path, void *data),
                                                 void *data, bc_error *err);

#ifdef __cplusplus
}
#endif

#endif
