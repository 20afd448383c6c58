/* SPDX-License-Identifier: MIT */
/* allowed.c - ranges and limits of a contract as a space of compositions. */
#include "bluecone/allowed.h"

#include "base/error_internal.h"
#include "bluecone/quantity.h"
#include "gas/species_index.h"

#include <math.h>
#include <string.h>

/* The one species that weights count, fully; SPECIES_COUNT when there is none or several. */
static size_t single_species(const double weight[])
{
    size_t found = SPECIES_COUNT;

    for (size_t i = 0; i < SPECIES_COUNT; i++) {
        if (weight[i] == 0.0)
            continue;
        if (found != SPECIES_COUNT)
            return SPECIES_COUNT;
        found = i;
    }
    return found;
}

/* Share by mass or volume: sum w x / sum m x, m the mass of a mole or, in ideal volumes, Z = 1 - s^2 p/p0. */
static bc_ratio share_ratio(const bc_limit *limit, const bc_reference *reference)
{
    bc_ratio ratio = {.under_power = 1.0, .scale = 1.0 / limit->shown.factor};

    for (size_t i = 0; i < SPECIES_COUNT; i++) {
        const double s = reference->factor[i];
        const double volume = 1.0 - s * s * reference->state.metering_pa / BC_P0_PA;
        const bool by_mass = limit->kind == BC_LIMIT_MASS_FRACTION;

        ratio.under[i] = by_mass ? bc_species_molar_mass_kg_per_mol(i) : volume;
        ratio.over[i] = limit->weight[i] * (by_mass ? 1.0 : volume);
    }
    return ratio;
}

static bc_status quantity_ratio(const bc_limit *limit, const bc_reference *reference, bc_ratio *ratio, bc_error *err)
{
    bc_ratio form;
    const bc_status status = bc_ratio_of_quantity(limit->quantity, reference, &form, err);

    if (status != BC_OK)
        return status;
    if (form.proxy || limit->own.offset != 0.0)
        return bc_fail(err, BC_ERR_USAGE, "%s is no ratio of linear sums", limit->id);
    form.scale *= limit->own.factor / limit->shown.factor;
    *ratio = form;
    return BC_OK;
}

bc_status bc_limit_ratio(const bc_contract *c, size_t index, bc_ratio *ratio, bc_error *err)
{
    const bc_limit *limit = &c->limits[index];
    const bc_reference *reference = &c->references[limit->reference];

    switch (limit->kind) {
    case BC_LIMIT_FRACTION:
        *ratio = bc_ratio_of_fraction(limit->weight, 1.0 / limit->shown.factor);
        return BC_OK;
    case BC_LIMIT_CONCENTRATION:
        return bc_ratio_of_concentration(limit->weight, 1.0 / limit->shown.factor, reference, ratio, err);
    case BC_LIMIT_MASS_FRACTION:
    case BC_LIMIT_VOLUME_FRACTION:
        *ratio = share_ratio(limit, reference);
        return BC_OK;
    case BC_LIMIT_QUANTITY:
        return quantity_ratio(limit, reference, ratio, err);
    case BC_LIMIT_INDEX:
    default:
        return bc_fail(err, BC_ERR_USAGE, "%s is no ratio of linear sums", limit->id);
    }
}

/* Species that the contract names singly can occur. */
static void name_species(const bc_contract *c, size_t limit_count, bool can_occur[])
{
    for (size_t i = 0; i < limit_count; i++) {
        const bc_limit *limit = &c->limits[i];
        const size_t species = limit->kind == BC_LIMIT_QUANTITY || limit->kind == BC_LIMIT_INDEX ? SPECIES_COUNT : single_species(limit->weight);

        if (species != SPECIES_COUNT)
            can_occur[species] = true;
    }
    for (size_t i = 0; i < c->range_count; i++)
        if (single_species(c->ranges[i].weight) != SPECIES_COUNT)
            can_occur[single_species(c->ranges[i].weight)] = true;
    can_occur[SPECIES_water] = false;
}

static void add_components(const bool can_occur[], bc_space *space)
{
    for (size_t i = 0; i < SPECIES_COUNT; i++)
        if (can_occur[i])
            space->components[space->component_count++] = (bc_space_component){.species = i, .min = 0.0, .max = 1.0};
}

static bc_status add_range(const bc_range *range, bc_space *space, bc_error *err)
{
    const size_t species = single_species(range->weight);

    for (size_t k = 0; k < space->component_count; k++)
        if (space->components[k].species == species) {
            space->components[k].min = range->min;
            space->components[k].max = range->max;
            return BC_OK;
        }
    if (species != SPECIES_COUNT)
        return BC_OK; /* water: not in the space */
    if (space->group_count == BC_SPACE_GROUP_MAX)
        return bc_fail(err, BC_ERR_USAGE, "more than %d ranges on groups", BC_SPACE_GROUP_MAX);
    bc_space_group *group = &space->groups[space->group_count++];

    memcpy(group->weight, range->weight, sizeof group->weight);
    group->min = range->min;
    group->max = range->max;
    return BC_OK;
}

static bc_status add_limit(const bc_contract *c, size_t index, bc_space *space, size_t *place, bc_error *err)
{
    const bc_limit *limit = &c->limits[index];
    bc_space_limit *to = &space->limits[space->limit_count];
    const bc_status status = bc_limit_ratio(c, index, &to->ratio, err);

    *place = BC_NOT_IMPOSED;
    if (status == BC_ERR_USAGE)
        return BC_OK;
    if (status != BC_OK)
        return status;
    to->min = limit->has_min ? limit->min : -HUGE_VAL;
    to->max = limit->has_max ? limit->max : HUGE_VAL;
    *place = space->limit_count++;
    return BC_OK;
}

bc_status bc_contract_space(const bc_contract *c, size_t limit_count, const bool present[], bc_space *space, size_t place[], bc_error *err)
{
    bool can_occur[BC_SPECIES_CAPACITY];
    bc_status status = BC_OK;

    memcpy(can_occur, present, sizeof can_occur);
    space->component_count = space->group_count = space->limit_count = 0;
    name_species(c, limit_count, can_occur);
    add_components(can_occur, space);
    for (size_t i = 0; i < c->range_count && status == BC_OK; i++)
        status = add_range(&c->ranges[i], space, err);
    for (size_t i = 0; i < limit_count && status == BC_OK; i++)
        status = add_limit(c, i, space, &place[i], err);
    return status;
}
