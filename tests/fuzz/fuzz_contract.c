/* SPDX-License-Identifier: MIT */
/* fuzz_contract.c - a contract file, and how gases stand to it. */
#include "fuzz_gas.h"

static const char *const FOLDERS[] = {BC_SOURCE_DIR "/compositions/specifications"};

static void check_limit(const bc_contract *c, size_t limit)
{
    static const char *const GASES[] = {"methane=92~0.1,ethane=5~0.05,nitrogen=3", "hydrogen=60,carbon monoxide=38,hydrogen sulphide=2", "nitrogen=100"};
    static bc_composition gases[3];
    const bc_limit *l = &c->limits[limit];
    bc_error err;

    fuzz_require_text(l->id);
    fuzz_require_text(l->unit);
    fuzz_require_text(l->note);
    fuzz_require(isfinite(l->min) && isfinite(l->max) && (l->has_min || l->has_max) && l->reference < c->reference_count);
    fuzz_require(!(l->has_min && l->has_max) || l->min <= l->max);
    fuzz_require(bc_limit_scale(l) > 0.0);
    for (size_t i = 0; i < 3; i++) {
        bc_limit_figure figure;

        if (gases[i].entry_count == 0)
            fuzz_require(bc_composition_parse(GASES[i], &gases[i], &err) == BC_OK);
        if (!fuzz_answer(bc_limit_judge(c, limit, &gases[i].gas, gases[i].spread.count > 0 ? &gases[i].spread : NULL, &figure, &err), &err))
            continue;
        fuzz_require(isfinite(figure.value) && isfinite(figure.margin));
        fuzz_require(!figure.has_u || (isfinite(figure.u) && figure.u >= 0.0));
    }
}

int LLVMFuzzerTestOneInput(const uint8_t *data, size_t size)
{
    static bc_contract c;
    bc_error err;

    if (!fuzz_answer(bc_contract_find(fuzz_file(data, size), FOLDERS, 1, &c, &err), &err)) {
        fuzz_require(bc_exit_code(err.status) == 3);
        return 0;
    }
    fuzz_require_text(c.name);
    fuzz_require_text(c.origin);
    fuzz_require_text(c.from);
    fuzz_require_text(c.until);
    fuzz_require_per_amount(&c.price);
    fuzz_require_per_amount(&c.annual);
    fuzz_require(bc_state_check(&c.state, NULL) == BC_OK);
    fuzz_require(c.limit_count <= BC_LIMIT_MAX && c.range_count <= BC_LIMIT_MAX && c.reference_count <= BC_LIMIT_REFERENCE_MAX);
    for (size_t i = 0; i < c.limit_count; i++)
        check_limit(&c, i);
    for (size_t i = 0; i < c.range_count; i++)
        fuzz_require(isfinite(c.ranges[i].min) && isfinite(c.ranges[i].max) && c.ranges[i].min <= c.ranges[i].max);
    return 0;
}
