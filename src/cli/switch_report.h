/* SPDX-License-Identifier: MIT */
/* switch_report.h - the parts of a report on a switch of gas. */
#ifndef SWITCH_REPORT_H
#define SWITCH_REPORT_H

#include "bluecone/blend_in.h"
#include "bluecone/switch.h"
#include "cli/figures.h"
#include "cli/subjects.h"

enum { OLD_GAS, NEW_GAS }; /* subjects and gases of the report */

/* A switch as it was asked, and what came of it. */
typedef struct {
    const arguments *a;
    const subjects *s;
    bool has_burner;
    bc_burner burner;      /* the default one without a file: for the table of controls and the remedy in words */
    bool has_fuel_k;
    double old_k, new_k;   /* gas at the burner */
    bc_switch result;
    bc_burner_case set;    /* of `burner` on the old gas */
    bc_burner_remedy remedy;
} switch_case;

/* The temperature of the new gas that a judgement takes; 0: as the old one. */
double switch_new_k(const switch_case *c);

/* Both gases side by side: Wobbe, air index, flame, methane number. */
void switch_gases(report *r, const switch_case *c);

/* Indices with limits, range and verdict; with --working their trust and sources, and the limits of Great Britain. */
void switch_indices(report *r, const switch_case *c);

/* The burner of a file: its data, old and new gas on it, and what restores heat and air. */
void switch_burner(report *r, const switch_case *c);

/* Heat input and air factor under every control. */
void switch_controls(report *r, const switch_case *c);

/* What is to be said of gas and burner beside the figures. */
void switch_warnings(report *r, const switch_case *c);

/* Reasons worst first, dangers as checks, warnings, verdict, caution. */
void switch_conclude(report *r, const switch_case *c);

/* Shares of the new gas at which verdicts change. */
bc_status switch_shares(report *r, const switch_case *c, bc_error *err);

/* Limits in words: "0.96..1.04", "<= 0.26"; "-" without any. */
void switch_limit_text(const bc_index_limits *limits, char *text, size_t size);

/* The remedy in words. */
void switch_remedy_text(const switch_case *c, char *text, size_t size);

#endif
