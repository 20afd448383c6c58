/* SPDX-License-Identifier: MIT */
/* fuzz_gas.h - what every composition that was read must be. */
#ifndef FUZZ_GAS_H
#define FUZZ_GAS_H

#include "fuzz.h"

#include "bluecone/bluecone.h"

static inline bool fuzz_terminated(const char *text, size_t size)
{
    return memchr(text, '\0', size) != NULL;
}

#define fuzz_require_text(array) fuzz_require(fuzz_terminated(array, sizeof(array)))

static inline void fuzz_require_gas(const bc_gas *gas)
{
    double sum = 0.0;

    for (size_t i = 0; i < BC_SPECIES_CAPACITY; i++) {
        fuzz_require(gas->x[i] >= 0.0 && gas->x[i] <= 1.0 + 1e-12);
        fuzz_require(i < bc_species_count() || !(gas->x[i] > 0.0));
        sum += gas->x[i];
    }
    fuzz_require(fabs(sum - 1.0) < 1e-12); /* a hundred roundings */
}

static inline void fuzz_require_per_amount(const bc_per_amount *p)
{
    fuzz_require(!p->given || isfinite(p->si));
}

/* Figures of a gas: each is finite, or there is a reason why there is none. They cost more than all else: every gas is
 * asked at one state, and one in eight for flame temperatures and what rests on them. */
static inline void fuzz_require_figures(const bc_composition *c)
{
    static const bc_state STATES[] = {{15.0, 15.0, BC_P0_PA, false, 2016}, {25.0, 0.0, 100e3, true, 1995}};
    static bc_reference references[2];
    const size_t chance = (size_t)(fabs(c->sum) * 1e6) % 16;
    bc_subject subject;
    bc_error err;

    for (size_t s = chance % 2; s <= chance % 2; s++) {
        if (references[s].state.edition == 0)
            fuzz_require(bc_reference_at(&STATES[s], &references[s], &err) == BC_OK);
        if (!fuzz_answer(bc_subject_make(&references[s], &c->gas, c->spread.count > 0 ? &c->spread : NULL, &subject, &err), &err))
            continue;
        for (size_t i = 0; i < bc_quantity_count(); i++) {
            double value = 0.0;

            if (chance > 1 && strncmp(bc_quantity_at(i)->id, "flame", 5) == 0)
                continue;
            if (fuzz_answer(bc_quantity_value(i, &subject, &value, &err), &err))
                fuzz_require(isfinite(value));
        }
    }
}

static inline void fuzz_require_composition(const bc_composition *c)
{
    fuzz_require_text(c->name);
    fuzz_require_text(c->family);
    fuzz_require_text(c->origin);
    fuzz_require_text(c->path);
    fuzz_require_gas(&c->gas);
    fuzz_require(isfinite(c->sum) && isfinite(c->measured_at_k) && isfinite(c->measured_at_pa));
    fuzz_require(c->entry_count > 0 && c->entry_count <= BC_ENTRY_MAX && c->remark_count <= BC_REMARK_MAX);
    for (size_t i = 0; i < c->entry_count; i++) {
        fuzz_require_text(c->entries[i].word);
        fuzz_require(isfinite(c->entries[i].amount) && isfinite(c->entries[i].u) && c->entries[i].u >= 0.0);
    }
    for (size_t i = 0; i < c->remark_count; i++)
        fuzz_require_text(c->remarks[i]);
    for (size_t k = 0; k < c->spread.count; k++)
        for (size_t i = 0; i < BC_SPECIES_CAPACITY; i++)
            fuzz_require(isfinite(c->spread.dx[k][i]));
    fuzz_require_per_amount(&c->offer.price);
    fuzz_require_per_amount(&c->offer.co2);
    fuzz_require_per_amount(&c->offer.max_flow);
    fuzz_require_figures(c);
}

#endif
