/* SPDX-License-Identifier: MIT */
/* mcp.c - the maximum combustion potential and the classes that limit it. */
#include "bluecone/mcp.h"

#include "base/compiler.h"
#include "base/error_internal.h"
#include "supply/index_internal.h"

static const struct {
    bool listed;
    double s, f, alpha;
} TABLE[PART_COUNT] = {
#define MCP(group, s, f, alpha, source) [PART_##group] = {true, s, f, alpha},
#include "data/mcp.def"
};

static const bc_mcp_class CLASSES[] = {
#define MCP_CLASS(name, w_min, w_max, mcp_min, mcp_max, source) {name, source, (w_min) * 1e6, (w_max) * 1e6, mcp_min, mcp_max},
#include "data/mcp_classes.def"
};

/* Sums over the combustibles, in %. */
typedef struct {
    double sfx, fx, x, alpha_x;
} sums;

static sums sum_over(const constituents *c)
{
    sums s = {0.0, 0.0, 0.0, 0.0};

    for (size_t p = 0; p < PART_COUNT; p++) {
        const double x = 100.0 * c->x[p];

        if (!TABLE[p].listed)
            continue;
        s.sfx += TABLE[p].s * TABLE[p].f * x;
        s.fx += TABLE[p].f * x;
        s.x += x;
        s.alpha_x += TABLE[p].alpha * x;
    }
    return s;
}

/* K, the damping by inert gas; oxygen is counted out together with its air: 3.77 N2 and 4.77 air a volume. Other
 * inerts count as nitrogen. air_free is 100 - 4.77 O2, above zero. */
static double damping(const constituents *c, const sums *s, double air_free)
{
    const double oxygen = 100.0 * c->x[PART_OXYGEN];
    const double nitrogen = 100.0 * (c->x[PART_NITROGEN] + c->x[PART_INERTS]) - 3.77 * oxygen;
    const double inert = 2.5 * 100.0 * c->x[PART_CARBON_DIOXIDE] + nitrogen;

    return s->x / s->alpha_x * inert / air_free + nitrogen / air_free * (nitrogen / air_free);
}

static bc_status potential_of(const constituents *c, double *mcp, const char **outside, bc_error *err)
{
    const sums s = sum_over(c);
    const double air_free = 100.0 - 4.77 * 100.0 * c->x[PART_OXYGEN];

    if (!(s.x > 0.0) || !(air_free > 0.0))
        return bc_fail(err, BC_ERR_RANGE, "the gas holds nothing that burns beside air: it has no combustion potential");
    *mcp = s.sfx / s.fx * (1.0 - damping(c, &s, air_free));
    *outside = "";
    if (c->x[PART_FUELS] > UNLISTED_MAX)
        *outside = "more than 1 % of fuels for which the regulations give no constants";
    else if (c->water > WATER_MAX)
        *outside = WET_TEXT;
    else if (!(*mcp > 0.0))
        *outside = "so much inert gas that the formula has no flame left";
    return BC_OK;
}

bc_status bc_mcp(const bc_gas *gas, double *mcp, const char **outside, bc_error *err)
{
    const constituents c = constituents_of(gas);

    return potential_of(&c, mcp, outside, err);
}

const bc_mcp_class *bc_mcp_class_of(double wobbe_j_per_m3)
{
    for (size_t i = 0; i < BC_COUNT(CLASSES); i++)
        if (wobbe_j_per_m3 >= CLASSES[i].wobbe_min_j_per_m3 && wobbe_j_per_m3 <= CLASSES[i].wobbe_max_j_per_m3)
            return &CLASSES[i];
    return NULL;
}

/* Gross Wobbe index of a dry subject, J/m3, at 0 C / 0 C. */
static bc_status class_wobbe(const index_case *c, const bc_subject *subject, double *wobbe, bc_error *err)
{
    const bc_reference *reference = NULL;
    bc_gas dry;
    bc_status status = method_reference(c, STATE_0_0, &reference, err);

    if (status == BC_OK)
        status = bc_gas_dry(&subject->gas, &dry, err);
    if (status == BC_OK)
        *wobbe = bc_value_of(reference, &dry).wobbe_gross_j_per_m3;
    return status;
}

/* The class that judges is that of the old gas, for which the burner was built; without one, of the new gas. */
static void set_limits(double old_wobbe, double new_wobbe, reading *r)
{
    const bc_mcp_class *judge = bc_mcp_class_of(old_wobbe);

    r->own_limits = true;
    if (!judge) {
        r->outside = first_of(r->outside, "no Japanese city gas class has this Wobbe index: there is no limit");
        return;
    }
    r->preferable = (bc_index_limits){true, judge->mcp_min, true, judge->mcp_max};
    r->acceptable = r->preferable;
    r->limits_source = judge->source;
    if (new_wobbe < judge->wobbe_min_j_per_m3 || new_wobbe > judge->wobbe_max_j_per_m3)
        r->caution = "the Wobbe index leaves the range of the class that the limits of MCP belong to";
}

bc_status mcp_index(const index_case *c, reading *r, bc_error *err)
{
    const char *outside = "";
    double mcp = 0.0;
    double old_wobbe = 0.0;
    double new_wobbe = 0.0;
    bc_status status = potential_of(&c->room->new_parts, &mcp, &outside, err);

    if (status == BC_OK)
        status = class_wobbe(c, c->new_gas, &new_wobbe, err);
    old_wobbe = new_wobbe;
    if (status == BC_OK && c->old_gas)
        status = class_wobbe(c, c->old_gas, &old_wobbe, err);
    if (status != BC_OK)
        return status;
    *r = reading_of(mcp, outside);
    set_limits(old_wobbe, new_wobbe, r);
    return BC_OK;
}
