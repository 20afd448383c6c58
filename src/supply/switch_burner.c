/* SPDX-License-Identifier: MIT */
/* switch_burner.c - the limits of a burner as criteria. */
#include "bluecone/methane_number.h"
#include "supply/switch_internal.h"

#define PERCENT 100.0
#define T0_K 273.15

/* One figure of a burner, as found and adjusted, with its limits. */
typedef struct {
    const char *id, *label, *unit;
    int decimals;
    unsigned dangers;
    bool known;          /* on the new gas */
    double value, adjusted;
    bc_burner_limit limit;
    double factor, offset; /* shown = figure factor - offset */
    const char *unknown;   /* why not known */
} burner_figure;

static bc_index_limits shown_limits(const burner_figure *f)
{
    const bc_burner_limit *l = &f->limit;

    return (bc_index_limits){l->has_min, l->has_min ? l->min * f->factor - f->offset : 0.0, l->has_max,
                             l->has_max ? l->max * f->factor - f->offset : 0.0};
}

static bc_criterion criterion_of(const burner_figure *f, bool has_adjusted)
{
    const bc_index_limits limits = shown_limits(f);
    bc_criterion c = {.id = f->id, .label = f->label, .unit = f->unit, .source = "burner file, or its defaults", .decimals = f->decimals,
                      .of_burner = true, .counts = true, .dangers = f->dangers, .has_value = f->known, .preferable = limits,
                      .acceptable = limits, .verdict = BC_VERDICT_CANNOT_JUDGE, .reason = f->known ? "" : f->unknown};

    if (!f->known)
        return c;
    c.value = f->value * f->factor - f->offset;
    if (!limits.has_min && !limits.has_max) {
        c.reason = "the burner file states no limit";
        return c;
    }
    c.verdict = judge_value(c.value, &limits, &limits);
    c.outside = beyond(c.value, &limits);
    c.has_adjusted = has_adjusted;
    c.adjusted = f->adjusted * f->factor - f->offset;
    c.adjusted_verdict = has_adjusted ? judge_value(c.adjusted, &limits, &limits) : c.verdict;
    return c;
}

static bool has(const bc_burner_limit *l)
{
    return l->has_min || l->has_max;
}

static double oxygen(const bc_burner *b, const bc_burner_response *r)
{
    return b->o2_basis == BC_FLUE_WET ? r->o2_wet : r->o2_dry;
}

static burner_figure velocity_of(const bc_burner *b, const bc_burner_response *on_old, const bc_burner_response *on_new)
{
    burner_figure f = {"burning-velocity", "Burning velocity, over that of the old gas", "%", 1, 1U << BC_DANGER_LIFT | 1U << BC_DANGER_FLASHBACK,
                       on_old->has_velocity && on_new->has_velocity, 0.0, 0.0, b->velocity, PERCENT, 0.0,
                       "a gas is outside the mixing rule for burning velocities"};

    if (f.known)
        f.value = on_new->velocity_m_per_s / on_old->velocity_m_per_s;
    f.adjusted = f.value;
    return f;
}

static burner_figure methane_number_of(const switch_pair *pair)
{
    burner_figure f = {"methane-number", "Methane number, linear route", "1", 0, 1U << BC_DANGER_KNOCK, false, 0.0, 0.0,
                       pair->set->burner->methane_number, 1.0, 0.0, "the gas is outside the methane number routes"};
    bc_methane_number n;

    if (bc_methane_number_of(&pair->new_gas->gas, &n, NULL) != BC_OK)
        return f;
    f.known = n.outside[0] == '\0';
    f.unknown = f.known ? "" : n.outside;
    f.value = n.linear;
    f.adjusted = n.linear;
    return f;
}

size_t burner_criteria(const switch_pair *pair, const bc_burner_response *on_old, const bc_burner_response *on_new,
                       const bc_burner_response *adjusted, bc_criterion criteria[])
{
    const bc_burner *b = pair->set->burner;
    const bool fixed = adjusted != NULL;
    const bc_burner_response *then = fixed ? adjusted : on_new;
    const bc_burner_limit air = {.has_min = true, .min = b->co_lambda};
    const burner_figure heat = {"heat-input", "Heat input, over that on the old gas", "%", 1, 1U << BC_DANGER_HEAT, true, on_new->heat_ratio,
                                then->heat_ratio, b->input, PERCENT, 0.0, ""};
    const burner_figure lambda = {"lambda", "Air factor", "1", 3, 1U << BC_DANGER_CO, true, on_new->lambda, then->lambda, air, 1.0, 0.0, ""};
    const burner_figure o2 = {"flue-o2", b->o2_basis == BC_FLUE_WET ? "Oxygen of the wet flue gas" : "Oxygen of the dry flue gas", "%", 2, 0,
                              true, oxygen(b, on_new), oxygen(b, then), b->o2, PERCENT, 0.0, ""};
    const burner_figure flame = {"flame-temperature", "Adiabatic flame temperature", "C", 0, 1U << BC_DANGER_FLAME, true, on_new->burn.flame.t_k,
                                 then->burn.flame.t_k, b->flame, 1.0, T0_K, ""};
    const burner_figure velocity = velocity_of(b, on_old, on_new);
    const burner_figure knock = methane_number_of(pair);
    size_t n = 0;

    criteria[n++] = criterion_of(&heat, fixed);
    criteria[n++] = criterion_of(&lambda, fixed);
    if (has(&b->o2))
        criteria[n++] = criterion_of(&o2, fixed);
    if (has(&b->flame))
        criteria[n++] = criterion_of(&flame, fixed);
    if (has(&b->velocity))
        criteria[n++] = criterion_of(&velocity, false);
    if (b->type == BC_BURNER_ENGINE || has(&b->methane_number))
        criteria[n++] = criterion_of(&knock, false);
    return n;
}
