/* SPDX-License-Identifier: MIT */
/* partner_quantity.c - pairs of quantities that the trade confuses. */
#include "supply/partner_quantity.h"

#include "base/compiler.h"
#include "bluecone/quantity.h"

#include <string.h>

/* Each stands for the other: gross and net. */
static const char *const HEATS[][2] = {
    {"hhv", "lhv"},           {"hhv-ideal", "lhv-ideal"},     {"hhv-mole", "lhv-mole"}, {"hhv-mass", "lhv-mass"},
    {"wobbe-gross", "wobbe-net"}, {"wobbe-gross-ideal", "wobbe-net-ideal"}, {"co2-factor-gross", "co2-factor-net"},
};

/* The second is taken for the first, or the first for the second. */
static const char *const IDEALS[][2] = {
    {"hhv", "hhv-ideal"}, {"lhv", "lhv-ideal"}, {"wobbe-gross", "wobbe-gross-ideal"}, {"wobbe-net", "wobbe-net-ideal"},
    {"relative-density", "relative-density-ideal"},
};

static size_t other_of(size_t quantity, const char *const pairs[][2], size_t count)
{
    const char *id = bc_quantity_at(quantity)->id;
    size_t other = quantity;

    for (size_t i = 0; i < count; i++)
        for (size_t side = 0; side < 2; side++)
            if (strcmp(pairs[i][side], id) == 0 && bc_quantity_find(pairs[i][1 - side], &other, NULL) == BC_OK)
                return other;
    return quantity;
}

size_t partner_quantity(size_t quantity, partner_kind kind)
{
    if (kind == PARTNER_HEAT)
        return other_of(quantity, HEATS, BC_COUNT(HEATS));
    return kind == PARTNER_IDEAL ? other_of(quantity, IDEALS, BC_COUNT(IDEALS)) : quantity;
}

double partner_power_of_sum(const char *id)
{
    static const char *const LINEAR[] = {"hhv", "lhv", "hhv-mole", "lhv-mole", "hhv-ideal", "lhv-ideal", "molar-mass", "density", "relative-density",
                                         "relative-density-ideal", "oxygen-demand", "air-demand"};

    if (strncmp(id, "wobbe", 5) == 0)
        return 0.5;
    for (size_t i = 0; i < BC_COUNT(LINEAR); i++)
        if (strcmp(LINEAR[i], id) == 0)
            return 1.0;
    return 0.0;
}
