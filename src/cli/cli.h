/* SPDX-License-Identifier: MIT */
/* cli.h - what the commands share: arguments, loading of gases, answering. */
#ifndef CLI_H
#define CLI_H

#include "base/compiler.h"
#include "base/folder_list.h"
#include "bluecone/bluecone.h"
#include "output/render.h"

#include <stdbool.h>
#include <stddef.h>

#define ARGUMENTS_MAX 64

/* Options by name, for value[] below. */
enum {
#define OPTION(name, word, argument, commands, help) OPTION_##name,
#include "cli/options.def"
    OPTION_COUNT
};

/* A command line taken apart. */
typedef struct {
    const char *command;                /* its word */
    const char *value[OPTION_COUNT];    /* NULL: not given; "" for an option without argument */
    const char *argument[ARGUMENTS_MAX];
    size_t argument_count;
} arguments;

typedef struct command {
    const char *word, *usage, *help, *example;
    size_t least, most;
    unsigned bit;
    int (*run)(const arguments *); /* the exit code */
} command;

/* The commands; NULL for an index out of range. */
const command *command_at(size_t index);
const command *command_find(const char *word);

/* Takes a command line apart, argv[0] being the command's word. */
bc_status arguments_take(const command *c, int argc, char **argv, arguments *a, bc_error *err);

/* The option words of a command, one a call; NULL at the end. *argument: its argument, "" for none. */
const char *option_word(const command *c, size_t index, const char **argument, const char **help);

/* True when more than two commands take an option. */
bool option_is_common(const char *word);

void help_command(const command *c);
void help_all(void);

/* Folders of bundled gases: $BLUECONE_PATH, the source tree, the installed data folder. */
typedef bc_folders folders;

void folders_find(folders *f);

/* Folders of bundled specifications: `specifications` in each of those. */
void folders_of_specifications(folders *f);

/* Reads a contract file or a bundled specification. */
bc_status contract_load(const char *word, bc_contract *contract, bc_error *err);

#define RECIPE_MAX 480

/* A gas of the command line. */
typedef struct {
    bc_composition composition;
    bc_gas gas;            /* to compute with: as read, or free of air */
    bool scattered;        /* the spread of the composition belongs to `gas` */
    double air;            /* share of the gas as read that was taken out as air; 0 for none */
    bool repeated;         /* the gas before it in a report is the same with its air */
    char name[BC_NAME_MAX + 16];
    char recipe[RECIPE_MAX]; /* of a gas that was blended here; "" for one that was loaded */
} loaded_gas;

/* Loads one gas; prints nothing. */
bc_status gas_load(const char *word, loaded_gas *gas, bc_error *err);

/* Reference state from --at, --saturated, --edition. */
bc_status state_from(const arguments *a, bc_state *state, bc_error *err);

/* "25/0", "15/15 saturated": a state in short. */
void state_text(const bc_state *state, char *text, size_t size);

/* Puts the state, a gas and what is to be said of it into a report. The index of the gas comes back. */
void report_state_of(report *r, const bc_state *state);
size_t report_gas_of(report *r, const loaded_gas *gas, const bc_subject *subject);

/* What the seller may deliver becomes limits, too, behind those of the contract. */
bc_status contract_bind_ranges(bc_contract *contract, bc_error *err);

/* A contract and those it follows, as files that a report was made from. */
void report_contract_inputs(report *r, const bc_contract *contract);

/* Reads the files of a report again, for their SHA-256. Only for forms that are kept: it costs time. */
bc_status inputs_identify(report *r, bc_error *err);

/* Where a result goes: section and gas of a report. */
typedef struct {
    report *r;
    size_t section, gas;
} slot;

/* Adds a result, converted to the first unit of --unit that fits its own. Section and gas come from the slot. */
void report_in_units(const slot *where, const arguments *a, const report_result *result);

/* Adds a quantity of a subject in the first unit of --unit that fits, else in its own. */
bc_status report_quantity(const slot *where, size_t quantity, const bc_subject *subject, const arguments *a, bc_error *err);

/* The unit to print a figure in: the first of --unit that fits its own, else its own. */
void unit_for(const arguments *a, const char *own, char *text, size_t size);

#define QUANTITIES_MAX 64

/* Reads "hhv,wobbe-gross": quantities by their index, QUANTITIES_MAX at most. */
bc_status quantities_take(const char *list, size_t quantities[], size_t *count, bc_error *err);

/* Reads --digits; 0 when it was not given. */
bc_status digits_from(const arguments *a, int *digits, bc_error *err);

/* Checks --unit before anything is computed: every unit must exist and fit one of the quantities. */
bc_status units_check(const arguments *a, const bc_state *state, const size_t quantities[], size_t count, bc_error *err);

/* Renders a report as the options ask; `brief` is the form of `get`. Returns the exit code, `answer` when
 * everything was written. Closes the report. */
int answer(report *r, const arguments *a, bool brief, int code);

/* Prints "bluecone: FILE:LINE: cause" to stderr and returns the exit code of the error. */
int complain(const bc_error *err);

/* Prints a warning line to stderr. */
void warn(const char *format, ...) BC_PRINTF(1, 2);

int run_get(const arguments *a);
int run_sheet(const arguments *a);
int run_burn(const arguments *a);
int run_blend(const arguments *a);
int run_switch(const arguments *a);
int run_contract(const arguments *a);
int run_stream(const arguments *a);
int run_list(const arguments *a);
int run_verify(const arguments *a);

#endif
