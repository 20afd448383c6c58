/* SPDX-License-Identifier: MIT */
/* bluecone/subject.h - a gas at a reference state, and the figures that can be asked of it. */
#ifndef BLUECONE_SUBJECT_H
#define BLUECONE_SUBJECT_H

#include <stdbool.h>
#include <stddef.h>

#include "bluecone/gas.h"
#include "bluecone/iso6976.h"
#include "bluecone/status.h"

#ifdef __cplusplus
extern "C" {
#endif

/* A gas at a reference state, evaluated once for all quantities asked of it. Holds pointers to the
 * caller's reference and spread, which must outlive it. */
typedef struct {
    const bc_reference *reference;
    const bc_spread *spread; /* NULL: no uncertainty of the composition is known */
    double spread_scale;     /* of the spread, when the state adds water to the gas */
    bc_gas gas;              /* as metered */
    double atoms[BC_ELEMENTS]; /* per molecule of it, by bc_element */
    bc_value value;
} bc_subject;

/* Makes a subject: the gas as the state of the reference meters it, and its ISO 6976 values.
 *
 *   spread   uncertainty of the composition; NULL when none was stated
 *
 * BC_ERR_RANGE when the gas cannot be saturated at the state, or is no gas there (Z up to 0.05). */
BC_API BC_MUST_USE bc_status bc_subject_make(const bc_reference *reference, const bc_gas *gas, const bc_spread *spread,
                                             bc_subject *subject, bc_error *err);

/* A quantity: what `bluecone list quantities` prints of it. The texts are static. */
typedef struct {
    const char *id;      /* "wobbe-gross" */
    const char *label;   /* "Wobbe index, gross" */
    const char *group;   /* section of a sheet: "volume", "mass", "mole", "density", "check" */
    const char *unit;    /* "MJ/m3" */
    const char *method;  /* published method; "ISO 6976" stands for the edition of the state */
    const char *meaning; /* one sentence */
    int digits;          /* significant digits worth printing when no uncertainty decides */
    bool has_scatter;    /* the uncertainty of the composition says something about it */
} bc_quantity;

/* A figure with its standard uncertainty (k = 1), both in the unit of the quantity. */
typedef struct {
    double value;
    bool has_u;
    double u;             /* combined */
    double u_composition; /* share of the stated uncertainty of the composition; 0 without one */
    double u_tables;      /* share of the tabulated heats, masses, factors and constants */
} bc_figure;

/* How much a component is to blame for the gap between the two heating-value routes.
 *
 *   share   out: x_i (q_formation,i - q_table,i) / sum of x q_table, for every species; BC_SPECIES_CAPACITY */
BC_API void bc_gap_shares(const bc_subject *subject, double share[]);

#ifdef __cplusplus
}
#endif

#endif
