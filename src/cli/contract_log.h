/* SPDX-License-Identifier: MIT */
/* contract_log.h - the parts of the answer to --log. */
#ifndef CONTRACT_LOG_H
#define CONTRACT_LOG_H

#include "cli/contract_report.h"
#include "cli/log_header.h"

#define LOG_TOLD_MAX 100   /* rows without use that are told one by one */
#define LOG_REASON_MAX 160

/* A row that could not be used. */
typedef struct {
    int line;
    char reason[LOG_REASON_MAX];
} log_refusal;

/* A log being read, and then what it came to. */
typedef struct {
    const contract_case *c;
    const char *path;
    bc_log *log;
    char delimiter;
    log_header header;
    size_t cell_count;         /* of the row at hand */
    char cells[LOG_COLUMNS_MAX][LOG_CELL_MAX];
    bool clocked, zoned;       /* a time was read; with a zone */
    size_t rows, refused;      /* behind the header; without use */
    log_refusal told[LOG_TOLD_MAX];
    size_t flows_missing;      /* rows used without their flow, and the line of the first */
    int flow_line;
    size_t sums_off;           /* rows used whose shares add up to much less or more than 100 %, and the line of the first */
    int off_line;
} log_case;

/* Reads the file into the log. BC_ERR_INPUT: what is wrong with it as a whole; BC_ERR_FILE, BC_ERR_MEMORY. */
bc_status log_read(log_case *l, bc_error *err);

/* The row at hand as an analysis: into the log, or among the refused. Fails only without memory. */
bc_status log_take_row(log_case *l, int line, bc_error *err);

/* Tables, warnings and verdict; true when no limit is broken. */
bc_status log_report(const log_case *l, report *r, bool *good, bc_error *err);

/* What a log has to be warned of; the verdict on it, true when no row breaks a limit and all can be judged. */
void log_warn(const log_case *l, report *r);
bool log_judge(const log_case *l, report *r, const bc_log_cover *cover);

/* Trend and histogram of each limited figure. */
void log_charts(const log_case *l, report *r);

#endif
