/* SPDX-License-Identifier: MIT */
/* blend.c - mixing gases on one basis, with what is known of their scatter. */
#include "bluecone/blend.h"

#include "base/error_internal.h"
#include "gas/species_index.h"
#include "supply/covariance.h"

#include <math.h>
#include <string.h>

/* Below it a gas is no fuel: the traces of methane in air have 1 J/mol, blast-furnace gas 70 kJ/mol. */
#define HEAT_MIN_J_PER_MOL 1e3

const char *bc_blend_basis_text(bc_blend_basis by)
{
    static const char *const TEXTS[] = {"mole", "volume", "mass", "energy"};

    return (size_t)by < BC_COUNT(TEXTS) ? TEXTS[by] : "";
}

/* Amount of one mole on a basis: 1, m3, kg or J. */
static double amount_per_mole(const bc_value *v, bc_blend_basis by)
{
    switch (by) {
    case BC_BY_VOLUME:
        return v->molar_volume_m3_per_mol;
    case BC_BY_MASS:
        return v->molar_mass_kg_per_mol;
    case BC_BY_ENERGY:
        return v->gross_j_per_mol;
    case BC_BY_MOLE:
    default:
        return 1.0;
    }
}

static bc_status check_part(bc_blend_basis by, size_t part, double per_mole, bc_error *err)
{
    if (per_mole > (by == BC_BY_ENERGY ? HEAT_MIN_J_PER_MOL : 0.0) && isfinite(per_mole))
        return BC_OK;
    if (by == BC_BY_ENERGY)
        return bc_fail(err, BC_ERR_RANGE, "part %zu has no heat, so no share of energy fixes its amount; mix by mole, volume or mass", part + 1);
    return bc_fail(err, BC_ERR_RANGE, "part %zu is no gas at the metering state, so its volume is unknown; mix by mole or mass", part + 1);
}

bc_status bc_mixer_make(const bc_reference *reference, bc_blend_basis by, const bc_blend_part parts[], size_t count, bc_mixer *mixer, bc_error *err)
{
    bc_mixer m = {.reference = reference, .by = by, .count = count};

    if (count == 0 || count > BC_BLEND_PARTS_MAX)
        return bc_fail(err, BC_ERR_USAGE, "a blend has 1 to %d parts, not %zu", BC_BLEND_PARTS_MAX, count);
    for (size_t i = 0; i < count; i++) {
        m.parts[i] = parts[i];
        m.value[i] = bc_value_of(reference, parts[i].gas);
        m.per_mole[i] = amount_per_mole(&m.value[i], by);
        const bc_status status = check_part(by, i, m.per_mole[i], err);

        if (status != BC_OK)
            return status;
    }
    *mixer = m;
    return BC_OK;
}

void bc_mixer_moles(const bc_mixer *m, const double share[], double mole[])
{
    double total = 0.0;

    for (size_t i = 0; i < m->count; i++)
        total += share[i] / m->per_mole[i];
    for (size_t i = 0; i < m->count; i++)
        mole[i] = share[i] / m->per_mole[i] / total;
}

void bc_mixer_shares(const bc_mixer *m, const double share[], bc_blend_basis by, double converted[])
{
    double total = 0.0;

    bc_mixer_moles(m, share, converted);
    for (size_t i = 0; i < m->count; i++) {
        converted[i] *= amount_per_mole(&m->value[i], by);
        total += converted[i];
    }
    for (size_t i = 0; i < m->count; i++)
        converted[i] = total > 0.0 ? converted[i] / total : 0.0;
}

bc_gas bc_mixer_gas(const bc_mixer *m, const double share[])
{
    double mole[BC_BLEND_PARTS_MAX];
    bc_gas gas = {{0.0}};
    double sum = 0.0;

    bc_mixer_moles(m, share, mole);
    for (size_t i = 0; i < m->count; i++)
        for (size_t j = 0; j < SPECIES_COUNT; j++)
            gas.x[j] += mole[i] * m->parts[i].gas->x[j];
    for (size_t j = 0; j < SPECIES_COUNT; j++)
        sum += gas.x[j];
    for (size_t j = 0; j < SPECIES_COUNT; j++) /* rounding alone: the parts add up to one */
        gas.x[j] /= sum;
    return gas;
}

/* da/a of a part when its fractions move by dx. The volume moves with Z = 1 - (p/p0) s^2. */
static double relative_move(const bc_mixer *m, size_t part, const double dx[])
{
    const bc_reference *r = m->reference;
    const bc_gas *gas = m->parts[part].gas;
    double mass = 0.0;
    double heat = 0.0;
    double factor = 0.0;
    double moved = 0.0;

    for (size_t j = 0; j < SPECIES_COUNT; j++) {
        mass += dx[j] * r->mass_kg_per_mol[j];
        heat += dx[j] * r->gross_j_per_mol[j];
        factor += gas->x[j] * r->factor[j];
        moved += dx[j] * r->factor[j];
    }
    if (m->by == BC_BY_MASS)
        return mass / m->value[part].molar_mass_kg_per_mol;
    if (m->by == BC_BY_ENERGY)
        return heat / m->value[part].gross_j_per_mol;
    if (m->by == BC_BY_VOLUME)
        return -2.0 * r->state.metering_pa / BC_P0_PA * factor * moved / m->value[part].z;
    return 0.0;
}

/* One source of scatter of a part, as the blend sees it. */
static void carry_source(const bc_mixer *m, size_t part, double mole, const bc_gas *blend, const double dx[], double to[])
{
    const double moved = relative_move(m, part, dx);

    memset(to, 0, BC_SPECIES_CAPACITY * sizeof *to);
    for (size_t j = 0; j < SPECIES_COUNT; j++)
        to[j] = mole * (dx[j] - moved * (m->parts[part].gas->x[j] - blend->x[j]));
}

static size_t count_sources(const bc_mixer *m)
{
    size_t sources = 0;

    for (size_t i = 0; i < m->count; i++)
        sources += m->parts[i].spread ? m->parts[i].spread->count : 0;
    return sources;
}

void bc_mixer_spread(const bc_mixer *m, const double share[], bc_spread *spread)
{
    const bc_gas blend = bc_mixer_gas(m, share);
    const bool fits = count_sources(m) <= BC_SPECIES_CAPACITY;
    double mole[BC_BLEND_PARTS_MAX];
    double source[BC_SPECIES_CAPACITY];
    covariance sum;

    bc_mixer_moles(m, share, mole);
    covariance_clear(&sum);
    spread->count = 0;
    for (size_t i = 0; i < m->count; i++) {
        const bc_spread *own = m->parts[i].spread;

        for (size_t k = 0; own && k < own->count && mole[i] > 0.0; k++) {
            carry_source(m, i, mole[i], &blend, own->dx[k], source);
            if (fits)
                memcpy(spread->dx[spread->count++], source, sizeof source);
            else
                covariance_add(&sum, source);
        }
    }
    if (!fits)
        covariance_factor(&sum, spread);
}
