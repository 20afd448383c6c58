/* SPDX-License-Identifier: MIT */
/* burn_case.h - a burner case as the options of `burn` state it. */
#ifndef BURN_CASE_H
#define BURN_CASE_H

#include "bluecone/burn.h"
#include "bluecone/emission.h"
#include "cli/subjects.h"

#define READINGS_MAX 8

/* A pollutant reading of --reading. */
typedef struct {
    bc_pollutant pollutant;
    bc_emission_form form;
    double value; /* SI: fraction, kg/m3 or kg/J */
    const char *name;
} reading;

/* A rate is stated by fuel flow or by useful heat. */
typedef enum { RATE_NONE, RATE_FUEL, RATE_DUTY } rate_kind;

typedef struct {
    bc_burn_case physics;
    char oxidant[160];      /* in words */
    char oxidant_path[BC_FILE_MAX]; /* of the file it comes from; "" for none */
    char water_from[48];    /* "from 60 % relative humidity"; "" without --humidity */
    bool is_air;            /* dry or humid air, nothing else */
    size_t remark_count;    /* what was changed in the composition of the oxidant, or is strange about it */
    char remarks[BC_REMARK_MAX][BC_REMARK_BYTES];
    char lambda_from[64];   /* "stated", "from 3 % O2 in dry flue gas" */
    rate_kind rate;
    double fuel_mol_per_s;  /* RATE_FUEL */
    double duty_w;          /* RATE_DUTY */
    double reference_o2;    /* mole fraction */
    size_t reading_count;
    reading readings[READINGS_MAX];
} burn_setup;

/* Reads the options into a case for a gas. BC_ERR_USAGE, BC_ERR_RANGE with the option's name. */
bc_status burn_setup_from(const arguments *a, const bc_subject *fuel, burn_setup *setup, bc_error *err);

#endif
