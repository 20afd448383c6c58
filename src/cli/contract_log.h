/* SPDX-License-Identifier: MIT */
/* contract_log.h - the parts of the answer to --log. */
#ifndef CONTRACT_LOG_H
#define CONTRACT_LOG_H

#include "cli/contract_report.h"

#define LOG_COLUMNS_MAX 200
#define LOG_CELL_MAX 80    /* bytes of a cell with the final NUL; a longer one is cut, and so no number */
#define LOG_TOLD_MAX 100   /* rows without use that are told one by one */
#define LOG_REASON_MAX 160

typedef enum { LOG_IGNORED, LOG_TIME, LOG_FLOW, LOG_COMPONENT } log_column_kind;

/* A column of the log. */
typedef struct {
    log_column_kind kind;
    char name[LOG_CELL_MAX];
    double fraction;                   /* of one, for one in the column's unit */
    double parts[BC_SPECIES_CAPACITY]; /* mole fractions of what the component stands for */
    bc_per_amount flow;                /* of one in the column's unit */
} log_column;

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
    size_t column_count;
    log_column columns[LOG_COLUMNS_MAX];
    size_t cell_count;         /* of the row at hand */
    char cells[LOG_COLUMNS_MAX][LOG_CELL_MAX];
    bool has_flow;
    bool clocked, zoned;       /* a time was read; with a zone */
    size_t rows, refused;      /* behind the header; without use */
    log_refusal told[LOG_TOLD_MAX];
    size_t flows_missing;      /* rows used without their flow, and the line of the first */
    int flow_line;
    char remarks[BC_REMARK_MAX][BC_REMARK_BYTES]; /* how columns were understood */
    size_t remark_count;
} log_case;

/* Reads the file into the log. BC_ERR_INPUT: what is wrong with it as a whole; BC_ERR_FILE, BC_ERR_MEMORY. */
bc_status log_read(log_case *l, bc_error *err);

/* The row at hand as the header. */
bc_status log_take_header(log_case *l, int line, bc_error *err);

/* The row at hand as an analysis: into the log, or among the refused. Fails only without memory. */
bc_status log_take_row(log_case *l, int line, bc_error *err);

/* A text for a message that is kept; dropped when there are too many. */
void log_remark(log_case *l, const char *text);

/* Tables, warnings and verdict; true when no limit is broken. */
bc_status log_report(const log_case *l, report *r, bool *good, bc_error *err);

/* What a log has to be warned of; the verdict on it, true when no row breaks a limit and all can be judged. */
void log_warn(const log_case *l, report *r);
bool log_judge(const log_case *l, report *r, const bc_log_cover *cover);

/* Trend and histogram of each limited figure. */
void log_charts(const log_case *l, report *r);

#endif
