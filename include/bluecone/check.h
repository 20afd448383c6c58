/* SPDX-License-Identifier: MIT */
/* bluecone/check.h - published check values and what the library computes for them now. */
#ifndef BLUECONE_CHECK_H
#define BLUECONE_CHECK_H

#include <stdbool.h>
#include <stddef.h>

#include "bluecone/status.h"

#ifdef __cplusplus
extern "C" {
#endif

/* One check, computed. Texts are static; `subject` says what was computed: a composition, a species. */
typedef struct {
    const char *area;     /* "iso6976", "en437", "thermo", "steam", "formation" ... */
    const char *id;       /* case of the source; several quantities may share one */
    const char *subject;
    const char *with;     /* oxidant of a flame, gas compared with; "" where there is none */
    const char *quantity;
    const char *unit;
    const char *why;      /* why this tolerance */
    const char *source;   /* published document */
    double combustion_c, metering_c, metering_kpa; /* state; 0 where it has no meaning */
    double t_k;           /* temperature of thermodynamic and steam checks, of the fuel of a flame; 0 otherwise */
    double oxidant_k;     /* temperature of the oxidant of a flame; 0 otherwise */
    double lambda;        /* air factor of a flame; 0 otherwise */
    int edition;          /* of ISO 6976; 0 where it has no meaning */
    bool of_uncertainty;  /* the standard uncertainty of the quantity is compared */
    double expected, computed, tolerance; /* in unit */
    bool ok;              /* |computed - expected| <= tolerance */
} bc_check;

/* Number of checks. */
BC_API size_t bc_check_count(void);

/* The area of a check, without computing it; "" for an index out of range. */
BC_API const char *bc_check_area(size_t index);

/* Computes one check. A check that cannot be computed is an error, never a pass. */
BC_API BC_MUST_USE bc_status bc_check_run(size_t index, bc_check *check, bc_error *err);

#ifdef __cplusplus
}
#endif

#endif
