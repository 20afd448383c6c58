/* SPDX-License-Identifier: MIT */
/* list_species.c - the species table, and one species with each datum and its source. */
#include "cli/list.h"

#include <stdio.h>
#include <string.h>

static void list_all(report *r)
{
    static const char *const COLUMNS[] = {"id", "formula", "name", "CAS", "also"};
    const size_t table = report_add_table(r, "species", "Species");

    list_columns(r, table, COLUMNS, BC_COUNT(COLUMNS));
    for (size_t i = 0; i < bc_species_count(); i++) {
        char also[200] = "";
        size_t species = 0;

        for (size_t j = 0;; j++) {
            const char *alias = bc_species_alias(j, &species);
            const size_t used = strlen(also);

            if (!alias)
                break;
            if (species == i && used + strlen(alias) + 3 < sizeof also)
                (void)snprintf(also + used, sizeof also - used, "%s%s", used ? ", " : "", alias);
        }
        const char *const cells[] = {bc_species_id(i), bc_species_formula(i), bc_species_name(i), bc_species_cas(i), also};

        list_row(r, table, cells, BC_COUNT(cells));
    }
}

static void add_datum(report *r, size_t table, const char *what, double value, const char *unit, const char *source)
{
    report_add_text(r, table, what);
    report_add_number(r, table, value, -1);
    report_add_text(r, table, unit);
    report_add_text(r, table, source);
}

static const char *source_of_origin(unsigned char origin, const char *source)
{
    return origin == BC_ORIGIN_FORMATION ? "derived: formation balance, NASA/TP-2002-211556" : source;
}

/* Heat and summation factor at the temperatures of one edition. */
static bc_status add_edition(report *r, size_t table, size_t i, int edition, bc_error *err)
{
    static const double COLUMNS_C[] = {0.0, 15.0, (60.0 - 32.0) / 1.8, 20.0, 25.0};
    bc_reference reference;
    char what[80];

    for (size_t k = 0; k < BC_COUNT(COLUMNS_C); k++) {
        bc_state state = bc_state_default();

        state.edition = edition;
        state.combustion_c = COLUMNS_C[k];
        state.metering_c = COLUMNS_C[k] > 20.0 ? 20.0 : COLUMNS_C[k];
        if (!bc_state_standard_combustion(&state))
            continue;
        const bc_status status = bc_reference_at(&state, &reference, err);

        if (status != BC_OK)
            return status;
        (void)snprintf(what, sizeof what, "gross heat at %.4g C, edition %d", COLUMNS_C[k], edition);
        add_datum(r, table, what, reference.gross_j_per_mol[i] * 1e-3, "kJ/mol",
                  source_of_origin(reference.heat_origin[i], bc_reference_heat_source(i, edition)));
        if (state.metering_c < COLUMNS_C[k])
            continue;
        (void)snprintf(what, sizeof what, "summation factor at %.4g C, edition %d", COLUMNS_C[k], edition);
        add_datum(r, table, what, reference.factor[i], "1", bc_reference_factor_source(i, edition));
    }
    return BC_OK;
}

static bc_status add_uncertainties(report *r, size_t table, size_t i, bc_error *err)
{
    const bc_state state = bc_state_default();
    bc_reference reference;
    const bc_status status = bc_reference_at(&state, &reference, err);

    if (status != BC_OK)
        return status;
    add_datum(r, table, "standard uncertainty of the heat", reference.u_gross_j_per_mol[i] * 1e-3, "kJ/mol", bc_reference_heat_source(i, 2016));
    add_datum(r, table, "standard uncertainty of the factor", reference.u_factor[i], "1", bc_reference_factor_source(i, 2016));
    return BC_OK;
}

static void add_thermo(report *r, size_t table, size_t i)
{
    static const char *const NAMES[] = {"a1", "a2", "a3", "a4", "a5", "a6", "a7", "b1", "b2"};
    static const char *const RANGES[] = {"to 1000 K", "above 1000 K"};
    char what[80];

    add_datum(r, table, "formation enthalpy at 298.15 K", bc_thermo_formation_j_per_mol(i) * 1e-3, "kJ/mol", bc_thermo_source(i));
    for (int range = 0; range < 2; range++)
        for (size_t k = 0; k < BC_COUNT(NAMES); k++) {
            (void)snprintf(what, sizeof what, "NASA-9 %s, %s", NAMES[k], RANGES[range]);
            add_datum(r, table, what, bc_thermo_coefficients(i, range)[k], "", bc_thermo_source(i));
        }
}

static bc_status list_one(report *r, const char *name, bc_error *err)
{
    static const char *const COLUMNS[] = {"datum", "value", "unit", "source"};
    char title[160];
    size_t i = 0;
    bc_status status = bc_species_find(name, &i, err);

    if (status != BC_OK)
        return status;
    (void)snprintf(title, sizeof title, "%s, %s, CAS %s (%s)", bc_species_name(i), bc_species_formula(i), bc_species_cas(i), bc_species_source(i));
    const size_t table = report_add_table(r, bc_species_id(i), title);

    list_columns(r, table, COLUMNS, BC_COUNT(COLUMNS));
    add_datum(r, table, "molar mass", bc_species_molar_mass_kg_per_mol(i) * 1e3, "g/mol", bc_element_source(BC_C));
    status = add_edition(r, table, i, 2016, err);
    if (status == BC_OK)
        status = add_edition(r, table, i, 1995, err);
    if (status == BC_OK)
        status = add_uncertainties(r, table, i, err);
    add_thermo(r, table, i);
    return status;
}

bc_status list_species(report *r, const char *name, bc_error *err)
{
    if (name)
        return list_one(r, name, err);
    list_all(r);
    return BC_OK;
}
