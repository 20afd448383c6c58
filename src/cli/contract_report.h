/* SPDX-License-Identifier: MIT */
/* contract_report.h - what is said of a contract and of gases under it. */
#ifndef CONTRACT_REPORT_H
#define CONTRACT_REPORT_H

#include "cli/subjects.h"

/* The contract and the gases of a command line. Not to be copied: gases and burner point into it. */
typedef struct {
    const arguments *a;
    bc_contract *contract;
    size_t own_limits;     /* of the contract; behind them its ranges, judged as limits */
    subjects gases;        /* those to be judged, at the contract's state, and behind them the present one */
    size_t judged;         /* their number without the present one */
    bool has_present;
    bool has_burner;       /* set on the present gas */
    bc_burner burner;
    bc_burner_case set;
    double coverage, k;    /* one-sided, 0.5..1, and its factor */
} contract_case;

/* Reads words, options and files. The caller closes in any case. */
bc_status contract_open(contract_case *c, const arguments *a, bc_error *err);
void contract_close(contract_case *c);

/* The state of a limit in short: "" where none counts; "by mass" and the like of shares. */
void contract_state_text(const bc_contract *c, const bc_limit *limit, char *text, size_t size);

/* What the contract itself has to be told of: superseded, its note. */
void contract_warn(report *r, const bc_contract *c);

/* The limits without a gas. */
void contract_limits_alone(report *r, const contract_case *c);

/* The rows of all gases, and the verdict; true when every limit is kept by every gas. */
bool contract_judge(report *r, const contract_case *c);

/* Heat, price, year and CO2 of each gas; differences to the present supply. */
bc_status contract_trade_report(report *r, const contract_case *c, bc_error *err);

/* What each usual confusion would do. */
bc_status contract_traps(report *r, const contract_case *c, bc_error *err);

/* A log of analyses instead of gases; *good turns false when a limit was broken. */
bc_status contract_log(report *r, const contract_case *c, bool *good, bc_error *err);

/* The worst gas that ranges and limits let in; *good turns false when none is let in at all. */
bc_status contract_worst(report *r, const contract_case *c, bool *good, bc_error *err);

/* Whether --burner has what it needs; BC_ERR_USAGE otherwise. */
bc_status contract_burner_check(const arguments *a, bc_error *err);

/* Reads the burner, if there is one, and sets it on the present gas. */
bc_status contract_burner_load(contract_case *c, bc_error *err);

/* Which reference state explains the printed figures of each gas that has some. */
bc_status contract_printed(report *r, const contract_case *c, bc_error *err);

/* Margins as bars, and the plane of Wobbe index and relative density. */
bc_status contract_charts(report *r, const contract_case *c, bc_error *err);

#endif
