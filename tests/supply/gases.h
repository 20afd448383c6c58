/* SPDX-License-Identifier: MIT */
/* gases.h - gases of the interchangeability tests, from literals at a reference state. */
#ifndef GASES_H
#define GASES_H

#include "support.h"

#include "bluecone/bluecone.h"

#define NATURAL "methane=90,ethane=6,propane=2,n-butane=0.5,nitrogen=1,carbon-dioxide=0.5"
#define RICH "methane=87,ethane=9,propane=3,n-butane=1"
#define BLEND "methane=80,hydrogen=20"
#define LPG_AIR "propane=55,air=45"
#define BLAST_FURNACE "nitrogen=52,carbon-monoxide=24,carbon-dioxide=20,hydrogen=4"
#define COKE_OVEN "hydrogen=58,methane=25,carbon-monoxide=6,ethene=2.5,nitrogen=6,carbon-dioxide=2,oxygen=0.5"

static inline bc_reference reference_at(const char *state_text)
{
    bc_state state = bc_state_default();
    bc_reference reference;
    bc_error err;

    assert_ok(bc_state_parse(state_text, &state, &err), &err);
    assert_ok(bc_reference_at(&state, &reference, &err), &err);
    return reference;
}

static inline bc_gas gas_of(const char *literal)
{
    bc_composition c;
    bc_error err;

    assert_ok(bc_composition_parse(literal, &c, &err), &err);
    return c.gas;
}

static inline bc_subject subject_of(const bc_reference *reference, const char *literal)
{
    const bc_gas gas = gas_of(literal);
    bc_subject subject;
    bc_error err;

    assert_ok(bc_subject_make(reference, &gas, NULL, &subject, &err), &err);
    return subject;
}

/* An index of a pair at 15/15; old may be NULL. */
static inline bc_index index_of(const char *id, const char *old_gas, const char *new_gas)
{
    const bc_reference reference = reference_at("15/15");
    const bc_subject s = subject_of(&reference, new_gas);
    bc_subject a = s;
    bc_index index;
    bc_error err;
    size_t i = 0;

    if (old_gas)
        a = subject_of(&reference, old_gas);
    assert_ok(bc_index_find(id, &i, &err), &err);
    assert_ok(bc_index_evaluate(i, old_gas ? &a : NULL, &s, &index, &err), &err);
    return index;
}

#define assert_verdict(index, wanted) assert_string_equal(bc_verdict_text((index).verdict), bc_verdict_text(wanted))

/* Out of range, with this word in the reason. */
#define assert_outside(index, word)                        \
    do {                                                   \
        const bc_index outside_ = (index);                 \
        assert_false(outside_.in_range);                   \
        assert_verdict(outside_, BC_VERDICT_CANNOT_JUDGE); \
        assert_non_null(strstr(outside_.reason, word));    \
    } while (0)

#endif
