/* SPDX-License-Identifier: MIT */
/* bluecone/state.h - the reference state that a heating value or a volume refers to. */
#ifndef BLUECONE_STATE_H
#define BLUECONE_STATE_H

#include <stdbool.h>
#include <stddef.h>

#include "bluecone/status.h"

#ifdef __cplusplus
extern "C" {
#endif

#define BC_P0_PA 101325.0        /* standard pressure of ISO 6976, exact */
#define BC_METERING_P_MIN_PA 90e3  /* range of the formula for Z, ISO 6976:2016 */
#define BC_METERING_P_MAX_PA 110e3
#define BC_METERING_T_MIN_C 0.0  /* the standard's columns end at 20 C; up to 25 C the factors are extrapolated */
#define BC_METERING_T_MAX_C 25.0

/* A reference state, as a plain value. */
typedef struct {
    double combustion_c; /* temperature of combustion, C, 0..100 */
    double metering_c;   /* temperature of metering, C, BC_METERING_T_MIN_C..BC_METERING_T_MAX_C */
    double metering_pa;  /* pressure of metering, Pa, BC_METERING_P_MIN_PA..BC_METERING_P_MAX_PA */
    bool saturated;      /* the gas is metered saturated with water vapour */
    int edition;         /* of ISO 6976: 1995 or 2016 */
} bc_state;

/* 15 C / 15 C, 101.325 kPa, dry, ISO 6976:2016: the standard reference conditions of ISO 13443. */
BC_API bc_state bc_state_default(void);

/* Reads "T1/T2" or "T1/T2@P" into a state, leaving `saturated` and `edition` as they are.
 *
 *   text    combustion/metering temperature, C unless F or K is written; pressure kPa unless a unit
 *           is written: "15/15", "25/0", "60F/60F@14.73psi"
 *   state   in and out: untouched on failure
 *
 * BC_ERR_USAGE: not of this form; BC_ERR_RANGE: a temperature or pressure that the method excludes. */
BC_API BC_MUST_USE bc_status bc_state_parse(const char *text, bc_state *state, bc_error *err);

/* Checks the ranges above and the edition. */
BC_API BC_MUST_USE bc_status bc_state_check(const bc_state *state, bc_error *err);

/* The state in words for a report, at most size - 1 bytes: "combustion 15 C, metering 15 C and
 * 101.325 kPa, water as stated, ISO 6976:2016". 60 F is written as such. */
BC_API void bc_state_describe(const bc_state *state, char *text, size_t size);

/* True when the temperature is a column of the edition's table (15.55 C stands for 60 F). */
BC_API bool bc_state_standard_combustion(const bc_state *state);
BC_API bool bc_state_standard_metering(const bc_state *state);

#ifdef __cplusplus
}
#endif

#endif
