/* SPDX-License-Identifier: MIT */
/* bluecone/units.h - units of the gas trade, read from text and converted by their definitions.
 *
 * A unit is a quotient of symbols: `MJ/m3`, `Btu/scf`, `kWh/kg`, `kg/h`, `%`. Symbols are those of
 * `bluecone list units` and are case-sensitive, since mbar and Mbar would differ. */
#ifndef BLUECONE_UNITS_H
#define BLUECONE_UNITS_H

#include <stdbool.h>
#include <stddef.h>

#include "bluecone/status.h"

#ifdef __cplusplus
extern "C" {
#endif

/* Base dimensions of the trade; volume stands beside mass and amount since a gas is sold by each. */
typedef enum {
    BC_DIM_ENERGY,      /* J */
    BC_DIM_MASS,        /* kg */
    BC_DIM_VOLUME,      /* m3 at a stated metering state */
    BC_DIM_AMOUNT,      /* mol */
    BC_DIM_TIME,        /* s */
    BC_DIM_PRESSURE,    /* Pa, absolute */
    BC_DIM_TEMPERATURE, /* K */
    BC_DIM_LENGTH,      /* m; a volume of gas is not its cube here */
    BC_DIMENSIONS
} bc_dimension;

/* A unit as a plain value: SI value = value * factor + offset. */
typedef struct {
    double factor;
    double offset;                      /* only for single temperature and gauge pressure units */
    signed char power[BC_DIMENSIONS];   /* exponent of each base dimension */
    bool has_metering;                  /* the unit fixes a metering temperature (scf, Nm3, Sm3) */
    double metering_c;                  /* that temperature, C; 0 otherwise */
} bc_unit;

/* Reads a unit.
 *
 *   text   the unit alone, such as "MJ/m3"; "" and "1" are the unit one
 *   unit   out: the unit; untouched on failure
 *   err    out: cause, with a known symbol that is near; may be NULL
 *
 * BC_ERR_USAGE: unknown symbol, more than one '/' part beyond a quotient of products, or the symbol
 * MBtu, which half of the trade reads as a thousand and the other half as a million. */
BC_API BC_MUST_USE bc_status bc_unit_parse(const char *text, bc_unit *unit, bc_error *err);

/* True when values convert between the two units: all dimensions agree. */
BC_API bool bc_unit_matches(const bc_unit *a, const bc_unit *b);

/* A value in a unit, in SI units. Range: any finite value. */
BC_API double bc_unit_to_si(const bc_unit *unit, double value);

/* An SI value in a unit. Range: any finite value. */
BC_API double bc_unit_from_si(const bc_unit *unit, double si);

/* Reads a number with its unit right behind it ("15C", "101.325 kPa", "60F").
 *
 *   text       the number and the unit, nothing else
 *   like       a unit of the dimension that is wanted, as text ("K", "Pa")
 *   bare       the unit of a number without one; NULL when a unit must be written
 *   si         out: the value in SI units; untouched on failure
 *
 * BC_ERR_INPUT: no number; BC_ERR_USAGE: unknown unit, unit of another dimension, or none. */
BC_API BC_MUST_USE bc_status bc_measure_parse(const char *text, const char *like, const char *bare,
                                              double *si, bc_error *err);

/* The rows of the unit table, for listing. Index 0..bc_unit_count()-1; the texts are static. */
BC_API size_t bc_unit_count(void);
BC_API const char *bc_unit_symbol(size_t index);
BC_API const char *bc_unit_meaning(size_t index);

#ifdef __cplusplus
}
#endif

#endif
