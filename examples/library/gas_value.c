/* SPDX-License-Identifier: MIT */
/* gas_value.c - what a gas is worth, by the library: gas_value GAS...
 *
 * A GAS is a composition file or a literal such as methane=92,ethane=8. Compiled with
 *
 *   cc gas_value.c $(pkg-config --cflags --libs bluecone) -o gas_value */
#include <bluecone/bluecone.h>

#include <stdio.h>
#include <string.h>

static const char *const ASKED[] = {"hhv", "wobbe-gross", "relative-density", "air-demand", "flame-temperature"};

/* An error tells by itself what is wrong, where, and what to do. */
static int refuse(const char *word, const bc_error *err)
{
    fflush(stdout);
    if (err->line > 0)
        fprintf(stderr, "gas_value: %s:%d: %s\n", word, err->line, err->message);
    else
        fprintf(stderr, "gas_value: %s: %s\n", word, err->message);
    return bc_exit_code(err->status);
}

static bc_status print_quantity(const bc_subject *subject, const char *id, bc_error *err)
{
    size_t index;
    bc_figure figure;
    bc_status status = bc_quantity_find(id, &index, err);

    if (status == BC_OK)
        status = bc_quantity_evaluate(index, subject, &figure, err);
    if (status != BC_OK)
        return status;
    const bc_quantity *q = bc_quantity_at(index);

    printf("  %-18s %.*g", q->id, q->digits, figure.value);
    if (strcmp(q->unit, "1") != 0)
        printf(" %s", q->unit);
    if (figure.has_u)
        printf(", standard uncertainty %.2g", figure.u);
    printf("\n");
    return BC_OK;
}

static int print_gas(const bc_reference *reference, const char *word)
{
    static bc_composition composition; /* 160 kB: not for a small stack */
    bc_subject subject;
    bc_error err;

    if (bc_composition_find(word, NULL, 0, &composition, &err) != BC_OK)
        return refuse(word, &err);
    printf("%s\n", composition.name);
    for (size_t i = 0; i < composition.remark_count; i++)
        printf("  note: %s\n", composition.remarks[i]);
    if (bc_subject_make(reference, &composition.gas, &composition.spread, &subject, &err) != BC_OK)
        return refuse(word, &err);
    for (size_t i = 0; i < sizeof ASKED / sizeof *ASKED; i++) {
        if (print_quantity(&subject, ASKED[i], &err) != BC_OK)
            return refuse(word, &err);
    }
    return 0;
}

int main(int argc, char **argv)
{
    bc_state state = bc_state_default();
    bc_reference reference;
    bc_error err;
    char text[160];
    int code = 0;

    if (bc_state_parse("25/0", &state, &err) != BC_OK || bc_reference_at(&state, &reference, &err) != BC_OK)
        return refuse("state", &err);
    bc_state_describe(&state, text, sizeof text);
    printf("At %s:\n", text);
    for (int i = 1; i < argc && code == 0; i++)
        code = print_gas(&reference, argv[i]);
    return code;
}
