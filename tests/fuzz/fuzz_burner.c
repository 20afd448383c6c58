/* SPDX-License-Identifier: MIT */
/* fuzz_burner.c - a burner file, and what the burner does when its gas changes. */
#include "fuzz_gas.h"

static bc_subject subject_of(const char *literal)
{
    static bc_composition c;
    const bc_state state = bc_state_default();
    static bc_reference reference; /* a subject points to it */
    bc_subject subject;
    bc_error err;

    fuzz_require(bc_composition_parse(literal, &c, &err) == BC_OK);
    fuzz_require(bc_reference_at(&state, &reference, &err) == BC_OK);
    fuzz_require(bc_subject_make(&reference, &c.gas, NULL, &subject, &err) == BC_OK);
    return subject;
}

static void check_response(const bc_burner_response *r)
{
    fuzz_require(isfinite(r->fuel_ratio) && r->fuel_ratio >= 0.0);
    fuzz_require(isfinite(r->air_ratio) && isfinite(r->flue_ratio) && isfinite(r->heat_ratio));
    fuzz_require(isfinite(r->lambda) && r->lambda >= 0.0 && isfinite(r->primary));
    fuzz_require(r->o2_dry >= 0.0 && r->o2_dry <= 1.0 && r->o2_wet >= 0.0 && r->o2_wet <= 1.0 && r->co_dry >= 0.0 && r->co_dry <= 1.0);
    fuzz_require(!r->has_velocity || isfinite(r->velocity_m_per_s));
    fuzz_require(!r->has_flow || (isfinite(r->input_w) && isfinite(r->fuel_mol_per_s) && isfinite(r->flue_kg_per_s)));
}

static void check_change(const bc_burner *b, const bc_subject *old_gas, const bc_subject *new_gas)
{
    const bc_burner_setting as_found = bc_burner_setting_as_found();
    bc_burner_case set;
    bc_burner_response response;
    bc_burner_remedy remedy;
    bc_switch verdict;
    bc_error err;

    if (!fuzz_answer(bc_burner_set(b, old_gas, &set, &err), &err))
        return;
    fuzz_require(isfinite(set.lambda) && isfinite(set.need) && isfinite(set.o2));
    if (fuzz_answer(bc_burner_respond(&set, new_gas, &as_found, &response, &err), &err))
        check_response(&response);
    if (fuzz_answer(bc_burner_restore(&set, new_gas, 0.0, &remedy, &err), &err)) {
        fuzz_require(isfinite(remedy.heat_as_found) && isfinite(remedy.area) && isfinite(remedy.diameter) && isfinite(remedy.gas));
        fuzz_require(!remedy.has_pressure || isfinite(remedy.pressure));
        fuzz_require(isfinite(remedy.lambda_target) && isfinite(remedy.air) && isfinite(remedy.air_alone));
    }
    if (fuzz_answer(bc_switch_judge(old_gas, new_gas, b, 0.0, &verdict, &err), &err))
        fuzz_require(verdict.verdict <= BC_SWITCH_NO);
}

int LLVMFuzzerTestOneInput(const uint8_t *data, size_t size)
{
    static bc_subject old_gas, new_gas;
    static bool made;
    bc_burner b;
    bc_error err;

    if (!made) {
        old_gas = subject_of("methane=92,ethane=5,nitrogen=3");
        new_gas = subject_of("methane=78,hydrogen=20,carbon dioxide=2");
        made = true;
    }
    if (!fuzz_answer(bc_burner_read(fuzz_file(data, size), &b, &err), &err)) {
        fuzz_require(err.status == BC_ERR_INPUT);
        return 0;
    }
    for (size_t i = 0; i < bc_burner_key_count(); i++) {
        char text[64];

        bc_burner_key_text(&b, i, text, sizeof text);
        fuzz_require_text(text);
        if (strcmp(bc_burner_key_at(i)->key, "name") != 0 && strcmp(bc_burner_key_at(i)->key, "source") != 0)
            fuzz_require(strstr(text, "nan") == NULL && strstr(text, "inf") == NULL);
    }
    check_change(&b, &old_gas, &new_gas);
    return 0;
}
