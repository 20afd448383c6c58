/* SPDX-License-Identifier: MIT */
/* burn_report.c - sections and tables of a combustion report. */
#include "cli/burn_report.h"

#include "base/error_internal.h"

#include <math.h>
#include <stdio.h>
#include <string.h>

#define T0_K 273.15
#define PERCENT 100.0
#define TRACE 1e-8 /* mole fractions below it are not shown */

static size_t species_index(const char *id)
{
    size_t index = 0;

    return bc_species_find(id, &index, NULL) == BC_OK ? index : bc_species_count();
}

static double fraction_of(const bc_gas *gas, const char *id)
{
    const size_t index = species_index(id);

    return index < bc_species_count() ? gas->x[index] : 0.0;
}

static void add_case_row(report *r, size_t table, const char *what, const char *value, const char *how)
{
    report_add_text(r, table, what);
    report_add_text(r, table, value);
    report_add_text(r, table, how);
}

static const char *or_default(const arguments *a, int option)
{
    return a->value[option] ? "stated" : "default";
}

static void add_case(report *r, const arguments *a, const burn_case_result *c)
{
    const bc_burn_case *p = &c->setup.physics;
    const size_t table = report_add_table(r, "case", "Case");
    const char *water_from = c->setup.water_from;
    char text[64];

    report_lead_with(r, table);
    report_add_column(r, table, "what", "what", "");
    report_add_column(r, table, "value", "value", "");
    report_add_column(r, table, "how", "how", "");
    add_case_row(r, table, "oxidant", c->setup.oxidant, *water_from != '\0' ? water_from : or_default(a, OPTION_oxidant));
    (void)snprintf(text, sizeof text, "%.6g", p->lambda);
    add_case_row(r, table, "air factor lambda", text, c->setup.lambda_from);
    (void)snprintf(text, sizeof text, "%.6g C", p->fuel_k - T0_K);
    add_case_row(r, table, "fuel temperature", text, or_default(a, OPTION_fuel_temp));
    (void)snprintf(text, sizeof text, "%.6g C", p->oxidant_k - T0_K);
    add_case_row(r, table, "oxidant temperature", text, or_default(a, OPTION_oxidant_temp));
    (void)snprintf(text, sizeof text, "%.6g C", p->exit_k - T0_K);
    add_case_row(r, table, "flue gas leaves at", text, or_default(a, OPTION_flue_temp));
    (void)snprintf(text, sizeof text, "%.6g kPa", p->p_pa * 1e-3);
    add_case_row(r, table, "pressure", text, or_default(a, OPTION_pressure));
    (void)snprintf(text, sizeof text, "%.4g %% of net heat", PERCENT * p->casing_loss);
    if (!c->burn.rich)
        add_case_row(r, table, "casing loss", text, or_default(a, OPTION_casing_loss));
    (void)snprintf(text, sizeof text, "%.4g %% of SO2", PERCENT * p->so3_conversion);
    if (c->burn.has_acid)
        add_case_row(r, table, "SO3 formed", text, or_default(a, OPTION_so3));
}

static void add_oxidant(report *r, const arguments *a, const burn_case_result *c)
{
    const bc_burn *b = &c->burn;
    const double lambda = c->setup.physics.lambda;
    const slot where = {r, report_add_section(r, "oxidant", "Oxidant, volumes as ideal gases"), 0};
    const plain_figure figures[] = {
        {"oxygen-need", "Oxygen for complete combustion", b->demand.oxygen_mol, "m3/m3", 5, "atom balance"},
        {"oxygen-need-mass", "Oxygen for complete combustion, mass", b->demand.oxygen_kg, "kg/kg", 5, "atom balance"},
        {"oxidant-need", "Oxidant for complete combustion", b->demand.oxidant_mol, "m3/m3", 5, "atom balance"},
        {"oxidant-need-mass", "Oxidant for complete combustion, mass", b->demand.oxidant_kg, "kg/kg", 5, "atom balance"},
        {"oxidant-supplied", "Oxidant supplied", b->oxidant_mol, "m3/m3", 5, "atom balance"},
        {"oxidant-supplied-mass", "Oxidant supplied, mass", b->demand.oxidant_kg * lambda, "kg/kg", 5, "atom balance"},
    };

    add_figures(&where, a, figures, BC_COUNT(figures));
}

/* Takes the condensate out of a flue gas at its exit. */
static void take_condensate_out(const burn_case_result *c, bc_flue_volume *hot)
{
    const bc_heat_path *path = &c->burn.path;

    if (!(path->condensate_mol > 0.0))
        return;
    const double condensate_kg = path->condensate_mol * bc_species_molar_mass_kg_per_mol(species_index("water"));
    const double left_kg = hot->wet_m3 * hot->wet_kg_per_m3 - condensate_kg / c->fuel->value.molar_volume_m3_per_mol;

    hot->wet_m3 *= path->condensation.exit_mol;
    hot->wet_kg_per_m3 = hot->wet_m3 > 0.0 ? left_kg / hot->wet_m3 : 0.0;
}

static bc_status add_flue(report *r, const arguments *a, const burn_case_result *c, const bc_flue_volume *metered, bc_error *err)
{
    const bc_flue *f = &c->burn.flue;
    const slot where = {r, report_add_section(r, "flue", "Flue gas, complete combustion (m3/m3: per m3 of real fuel)"), 0};
    bc_flue_volume hot;
    double co2_max = 0.0;
    bc_status status = bc_flue_volume_at(f, c->setup.physics.exit_k, c->setup.physics.p_pa, c->fuel->value.molar_volume_m3_per_mol, &hot, err);

    if (status == BC_OK)
        status = bc_flue_co2_max(&c->setup.physics.fuel, &co2_max, err);
    if (status != BC_OK)
        return status;
    take_condensate_out(c, &hot);
    const plain_figure figures[] = {
        {"flue-volume-wet", "Wet flue gas at the metering state", metered->wet_m3, "m3/m3", 5, "ideal gas"},
        {"flue-volume-dry", "Dry flue gas at the metering state", metered->dry_m3, "m3/m3", 5, "ideal gas"},
        {"flue-volume-hot", "Wet flue gas as it leaves", hot.wet_m3, "m3/m3", 5, "ideal gas"},
        {"flue-density", "Density of wet flue gas, metering state", metered->wet_kg_per_m3, "kg/m3", 5, "ideal gas"},
        {"flue-density-hot", "Density of wet flue gas as it leaves", hot.wet_kg_per_m3, "kg/m3", 5, "ideal gas"},
        {"flue-molar-mass", "Molar mass of wet flue gas", f->wet_kg_per_mol * 1e3, "g/mol", 5, "atom balance"},
        {"flue-mass", "Wet flue gas per mass of fuel", f->wet_kg_per_mol * f->wet_mol / f->fuel_kg_per_mol, "kg/kg", 5, "atom balance"},
        {"flue-o2-dry", "Oxygen in dry flue gas", PERCENT * fraction_of(&f->dry, "oxygen"), "%", 4, "atom balance"},
        {"flue-o2-wet", "Oxygen in wet flue gas", PERCENT * fraction_of(&f->wet, "oxygen"), "%", 4, "atom balance"},
        {"flue-co2-dry", "Carbon dioxide in dry flue gas", PERCENT * fraction_of(&f->dry, "carbon-dioxide"), "%", 4, "atom balance"},
        {"co2-max", "CO2 max (dry, stoichiometric dry air)", PERCENT * co2_max, "%", 4, "atom balance"},
    };

    add_figures(&where, a, figures, BC_COUNT(figures));
    return BC_OK;
}

static void add_flue_table(report *r, const burn_case_result *c)
{
    const bc_flue *f = &c->burn.flue;
    const bool condenses = c->burn.path.condensate_mol > 0.0;
    const size_t table = report_add_table(r, "flue-composition", "Flue gas composition, complete combustion");

    report_add_column(r, table, "species", "species", "");
    report_add_column(r, table, "wet", "wet", "mol %");
    report_add_column(r, table, "dry", "dry", "mol %");
    report_add_column(r, table, "mass", "per fuel", "kg/kg");
    if (condenses)
        report_add_column(r, table, "exit", "as it leaves", "mol %");
    for (size_t i = 0; i < bc_species_count(); i++) {
        if (f->wet.x[i] < TRACE)
            continue;
        report_add_text(r, table, bc_species_id(i));
        report_add_number(r, table, PERCENT * f->wet.x[i], 4);
        if (f->dry.x[i] > 0.0)
            report_add_number(r, table, PERCENT * f->dry.x[i], 4);
        else
            report_add_text(r, table, "-");
        report_add_number(r, table, f->wet.x[i] * f->wet_mol * bc_species_molar_mass_kg_per_mol(i) / f->fuel_kg_per_mol, 5);
        if (condenses)
            report_add_number(r, table, PERCENT * c->burn.path.condensation.exit.x[i], 4);
    }
}

/* Products of an equilibrium, the frequent ones first by nature of the list. */
static void add_mixture(report *r, const char *id, const char *title, const bc_mixture *m)
{
    const size_t table = report_add_table(r, id, title);

    report_add_column(r, table, "species", "species", "");
    report_add_column(r, table, "fraction", "wet", "mol %");
    report_add_column(r, table, "ppm", "wet", "ppm");
    for (size_t i = 0; i < bc_product_count(); i++) {
        const double x = m->moles[i] / m->total_moles;

        if (x < TRACE)
            continue;
        report_add_text(r, table, bc_product_formula(i));
        report_add_number(r, table, PERCENT * x, 5);
        report_add_number(r, table, 1e6 * x, 2);
    }
}

static bc_status add_emissions(report *r, const arguments *a, const burn_case_result *c, bc_error *err)
{
    const slot where = {r, report_add_section(r, "emission", "Emission factors of the fuel"), 0};
    const bc_gas *fuel = &c->setup.physics.fuel;
    bc_flue_factor net;
    bc_flue_factor gross;
    bc_status status = bc_flue_factor_of(fuel, c->fuel->value.net_j_per_mol, &net, err);

    if (status == BC_OK)
        status = bc_flue_factor_of(fuel, c->fuel->value.gross_j_per_mol, &gross, err);
    if (status != BC_OK)
        return status;
    const plain_figure figures[] = {
        {"co2-factor-net", "Carbon dioxide per net heat", net.carbon_dioxide * 1e9, "kg/GJ", 5, "IPCC 2006, oxidation 1"},
        {"co2-factor-gross", "Carbon dioxide per gross heat", gross.carbon_dioxide * 1e9, "kg/GJ", 5, "IPCC 2006, oxidation 1"},
        {"so2-factor-net", "Sulfur dioxide per net heat", net.sulfur_dioxide * 1e9, "kg/GJ", 5, "atom balance"},
        {"so2-factor-gross", "Sulfur dioxide per gross heat", gross.sulfur_dioxide * 1e9, "kg/GJ", 5, "atom balance"},
        {"water-factor-net", "Water per net heat", net.water * 1e9, "kg/GJ", 5, "atom balance"},
        {"water-factor-gross", "Water per gross heat", gross.water * 1e9, "kg/GJ", 5, "atom balance"},
    };

    const bool sulfur = net.sulfur_dioxide > 0.0;

    add_figures(&where, a, figures, 2);
    add_figures(&where, a, figures + 2, sulfur ? 2 : 0);
    add_figures(&where, a, figures + 4, 2);
    return BC_OK;
}

static bc_status add_reading(report *r, size_t table, const burn_case_result *c, const reading *read, bc_error *err)
{
    const bc_flue *f = &c->burn.flue;
    const double oxygen = fraction_of(&f->dry, "oxygen");
    const double air = BC_EMISSION_AIR_EU;
    /* dry flue gas without the oxidant above the need, per mole of fuel: the dilution taken out exactly */
    const bc_gas dry_air = bc_oxidant_air();
    bc_flue stoichiometric;
    bc_emission e;
    bc_status status = bc_flue_at(&c->setup.physics.fuel, &dry_air, 1.0, &stoichiometric, err);

    if (status != BC_OK)
        return status;
    const bc_emission_basis basis = {read->pollutant, oxygen, c->setup.reference_o2, air, stoichiometric.dry_mol, c->fuel->value.net_j_per_mol};

    status = bc_emission_convert(&basis, read->form, read->value, &e, err);
    if (status != BC_OK)
        return status;
    report_add_text(r, table, read->name);
    report_add_number(r, table, e.fraction * 1e6, 2);
    report_add_number(r, table, e.kg_per_m3 * 1e6, 2);
    report_add_number(r, table, e.kg_per_m3_at_ref * 1e6, 2);
    report_add_number(r, table, e.kg_per_j * 1e12, 2);
    return BC_OK;
}

static bc_status add_readings(report *r, const burn_case_result *c, bc_error *err)
{
    char title[120];

    if (c->setup.reading_count == 0)
        return BC_OK;
    (void)snprintf(title, sizeof title, "Readings in dry flue gas (m3 at 0 C, 101.325 kPa; reference oxygen %.4g %%; per net heat)",
                   PERCENT * c->setup.reference_o2);
    const size_t table = report_add_table(r, "readings", title);

    report_add_column(r, table, "pollutant", "pollutant", "");
    report_add_column(r, table, "ppm", "measured", "ppm");
    report_add_column(r, table, "density", "measured", "mg/m3");
    report_add_column(r, table, "density-at-reference", "at reference O2", "mg/m3");
    report_add_column(r, table, "per-heat", "per heat", "mg/MJ");
    for (size_t i = 0; i < c->setup.reading_count; i++) {
        const bc_status status = add_reading(r, table, c, &c->setup.readings[i], err);

        if (status != BC_OK)
            return status;
    }
    return BC_OK;
}

static void add_dew_points(report *r, const arguments *a, const burn_case_result *c)
{
    const bc_burn *b = &c->burn;
    const slot where = {r, report_add_section(r, "dew", "Dew points of the flue gas"), 0};
    const bc_heat_path *path = &b->path;
    const double fuel_kg = b->flue.fuel_kg_per_mol;
    const plain_figure water = {"water-dew-point", "Water dew point", b->dew.t_k - T0_K, "C", 4, "IAPWS SR1-86(1992)"};
    const plain_figure acid[] = {
        {"acid-dew-point-least", "Acid dew point, least of three", b->acid.min_k - T0_K, "C", 4, "three correlations"},
        {"acid-dew-point-verhoff", "Acid dew point", b->acid.verhoff_banchero_k - T0_K, "C", 4, "Verhoff-Banchero 1974"},
        {"acid-dew-point-okkes", "Acid dew point", b->acid.okkes_k - T0_K, "C", 4, "Okkes 1987"},
        {"acid-dew-point-zarenezhad", "Acid dew point", b->acid.zarenezhad_k - T0_K, "C", 4, "ZareNezhad 2009"},
        {"acid-dew-point-most", "Acid dew point, most of three", b->acid.max_k - T0_K, "C", 4, "three correlations"},
    };
    const plain_figure condensate[] = {
        {"condensate", "Condensate per mass of fuel", path->condensate_mol * bc_species_molar_mass_kg_per_mol(species_index("water")) / fuel_kg,
         "kg/kg", 4, "water balance"},
        {"latent-heat", "Latent heat recovered, of the fuel's net heat", -PERCENT * path->condensation_j / path->net_j, "%", 4, "enthalpy path"},
    };

    if (b->dew.exists)
        add_figures(&where, a, &water, 1);
    if (b->has_acid)
        add_figures(&where, a, acid, BC_COUNT(acid));
    if (path->condensate_mol > 0.0)
        add_figures(&where, a, condensate, BC_COUNT(condensate));
}

static void add_flame(report *r, const arguments *a, const burn_case_result *c)
{
    const bc_burn *b = &c->burn;
    const slot where = {r, report_add_section(r, "flame", "Adiabatic flame"), 0};
    const plain_figure equilibrium = {"flame-temperature", "Flame temperature, equilibrium", b->flame.t_k - T0_K, "C", 5, "NASA RP-1311"};
    const plain_figure complete = {"flame-temperature-complete", "Flame temperature, complete combustion", b->flame_complete_k - T0_K, "C", 5,
                                   "enthalpy balance"};

    add_figures(&where, a, &equilibrium, 1);
    if (b->has_complete)
        add_figures(&where, a, &complete, 1);
}

/* The heat path, positive when heat is given off. */
static void add_heat(report *r, const arguments *a, const burn_case_result *c, const bc_flue_volume *metered)
{
    const bc_heat_path *p = &c->burn.path;
    const bc_heat_yield *y = &c->burn.yield;
    const double fuel_volume = c->fuel->value.molar_volume_m3_per_mol;
    const slot where = {r, report_add_section(r, "heat", "Enthalpy path in steps (minus is heat given off)"), 0};
    const plain_figure figures[] = {
        {"path-fuel", "Fuel to 25 C", p->fuel_j * 1e-3, "kJ/mol", 6, "NASA/TP-2002-211556"},
        {"path-oxidant", "Oxidant to 25 C", p->oxidant_j * 1e-3, "kJ/mol", 6, "NASA/TP-2002-211556"},
        {"path-reaction", "Reaction at 25 C, water as vapour", p->reaction_j * 1e-3, "kJ/mol", 6, "NASA/TP-2002-211556"},
        {"path-products", "Products to the exit temperature", p->products_j * 1e-3, "kJ/mol", 6, "NASA/TP-2002-211556"},
        {"path-condensation", "Condensation at the exit temperature", p->condensation_j * 1e-3, "kJ/mol", 6, "NASA/TP-2002-211556"},
        {"path-total", "Sum", p->total_j * 1e-3, "kJ/mol", 6, "NASA/TP-2002-211556"},
        {"heat-released", "Heat given off per volume of fuel", y->released_j / fuel_volume * 1e-6, "MJ/m3", 5, "NASA/TP-2002-211556"},
        {"heat-per-oxidant", "Heat given off per volume of oxidant", y->released_j / fuel_volume / metered->oxidant_m3 * 1e-6, "MJ/m3", 5, "NASA/TP-2002-211556"},
    };

    add_figures(&where, a, figures, BC_COUNT(figures));
}

static void add_efficiency(report *r, const arguments *a, const burn_case_result *c)
{
    const bc_heat_yield *y = &c->burn.yield;
    const bc_burn_case *p = &c->setup.physics;
    const slot where = {r, report_add_section(r, "efficiency", "Losses and efficiency"), 0};
    const bc_siegert *row = bc_siegert_of_family(c->family);
    double siegert = 0.0;
    const plain_figure figures[] = {
        {"stack-loss-net", "Stack loss, of net heat", PERCENT * y->stack_loss_net, "%", 4, "enthalpy path"},
        {"stack-loss-gross", "Stack loss, of gross heat", PERCENT * y->stack_loss_gross, "%", 4, "enthalpy path"},
        {"casing-loss-net", "Casing loss, of net heat", PERCENT * y->casing_loss_net, "%", 4, or_default(a, OPTION_casing_loss)},
        {"casing-loss-gross", "Casing loss, of gross heat", PERCENT * y->casing_loss_gross, "%", 4, or_default(a, OPTION_casing_loss)},
        {"efficiency-net", "Efficiency on net heat", PERCENT * y->efficiency_net, "%", 4, "indirect"},
        {"efficiency-gross", "Efficiency on gross heat", PERCENT * y->efficiency_gross, "%", 4, "indirect"},
    };

    add_figures(&where, a, figures, BC_COUNT(figures));
    if (!row || !c->setup.is_air || c->burn.path.condensate_mol > 0.0
        || bc_siegert_loss(row, p->exit_k, p->oxidant_k, fraction_of(&c->burn.flue.dry, "oxygen"), &siegert, NULL) != BC_OK)
        return;
    const plain_figure estimate = {"stack-loss-siegert", "Stack loss by Siegert, for comparison", PERCENT * siegert, "%", 4, "Siegert"};

    add_figures(&where, a, &estimate, 1);
}

static bc_status add_rates(report *r, const arguments *a, const burn_case_result *c, bc_error *err)
{
    const bc_burn *b = &c->burn;
    double rate = c->setup.fuel_mol_per_s;

    if (c->setup.rate == RATE_NONE)
        return BC_OK;
    if (c->setup.rate == RATE_DUTY) {
        const bc_status status = bc_heat_rate(&b->yield, c->setup.duty_w, &rate, err);

        if (status != BC_OK)
            return status;
    }
    const slot where = {r, report_add_section(r, "rate", "Rates"), 0};
    const bc_flue_flow flow = bc_flue_flow_at(&b->flue, rate);
    const double hour = 3600.0;
    const bool condenses = b->path.condensate_mol > 0.0;
    const plain_figure figures[] = {
        {"duty", "Useful heat", bc_heat_duty_w(&b->yield, rate) * 1e-3, "kW", 5, "indirect"},
        {"input-net", "Heat input, net", rate * c->fuel->value.net_j_per_mol * 1e-3, "kW", 5, "ISO 6976"},
        {"input-gross", "Heat input, gross", rate * c->fuel->value.gross_j_per_mol * 1e-3, "kW", 5, "ISO 6976"},
        {"fuel-volume-rate", "Fuel at the metering state", rate * c->fuel->value.molar_volume_m3_per_mol * hour, "m3/h", 5, "ISO 6976"},
        {"fuel-mass-rate", "Fuel", flow.fuel_kg * hour, "kg/h", 5, "atom balance"},
        {"oxidant-mass-rate", "Oxidant", flow.oxidant_kg * hour, "kg/h", 5, "atom balance"},
        {"flue-mass-rate", condenses ? "Wet flue gas before condensation" : "Wet flue gas", flow.wet_kg * hour, "kg/h", 5, "atom balance"},
        {"co2-mass-rate", "Carbon dioxide", flow.carbon_dioxide_kg * hour, "kg/h", 5, "atom balance"},
        {"water-mass-rate", condenses ? "Water before condensation" : "Water in the flue gas", flow.water_kg * hour, "kg/h", 5, "atom balance"},
    };
    const plain_figure others[] = {
        {"so2-mass-rate", "Sulfur dioxide", flow.sulfur_dioxide_kg * hour, "kg/h", 5, "atom balance"},
        {"condensate-mass-rate", "Condensate", b->path.condensate_mol * bc_species_molar_mass_kg_per_mol(species_index("water")) * rate * hour,
         "kg/h", 5, "water balance"},
    };

    add_figures(&where, a, figures, BC_COUNT(figures));
    add_figures(&where, a, others, flow.sulfur_dioxide_kg > 0.0 ? 1 : 0);
    add_figures(&where, a, others + 1, condenses ? 1 : 0);
    return BC_OK;
}

static void add_rich(report *r, const arguments *a, const burn_case_result *c)
{
    const bc_burn *b = &c->burn;
    const slot where = {r, report_add_section(r, "heat", "Heat with lack of oxidant"), 0};
    const plain_figure figures[] = {
        {"heat-released-mole", "Heat given off down to the exit temperature", b->released_j * 1e-3, "kJ/mol", 6, "NASA/TP-2002-211556"},
        {"heat-released", "Heat given off per volume of fuel", b->released_j / c->fuel->value.molar_volume_m3_per_mol * 1e-6, "MJ/m3", 5,
         "NASA/TP-2002-211556"},
    };

    add_figures(&where, a, figures, BC_COUNT(figures));
    add_mixture(r, "flue-equilibrium", "Flue gas as it leaves: equilibrium, frozen below 1227 C", &b->exit);
    report_add_warning(r, "The burner lacks oxidant: the flue gas holds carbon monoxide and hydrogen; soot and condensation are not modelled.");
    report_set_verdict(r, "lack of oxidant: carbon monoxide forms");
    report_judge(r, REPORT_CARE);
}

static void warn_case(report *r, const burn_case_result *c)
{
    const bc_burn *b = &c->burn;
    char text[BC_REMARK_BYTES + 16];

    for (size_t i = 0; i < c->setup.remark_count; i++) {
        (void)snprintf(text, sizeof text, "Oxidant: %s", c->setup.remarks[i]);
        report_add_warning(r, text);
    }
    if (c->setup.physics.exit_k > b->flame.t_k) {
        (void)snprintf(text, sizeof text, "The flue gas leaves at %.5g C, hotter than the adiabatic flame, %.5g C: heat would have to be added; check --flue-temp.",
                       c->setup.physics.exit_k - T0_K, b->flame.t_k - T0_K);
        report_add_warning(r, text);
    }
    if (!b->rich && b->dew.exists && c->setup.physics.exit_k < b->dew.t_k && !(b->path.condensate_mol > 0.0))
        report_add_warning(r, "The flue gas leaves below 0 C: water would come out as ice, which is not computed; all of it is counted as vapour.");
    if (b->has_acid && !b->acid.in_range)
        report_add_warning(r, "Acid dew points: SO3 or water is outside the range of the correlations (SO3 0.1 to 200 ppm, water 3 to 30 %).");
    if (!b->rich && b->path.condensate_mol > 0.0)
        report_add_warning(r, "The flue gas leaves below its water dew point: condensate forms, acid by carbon dioxide (pH 3 to 5); efficiency on net heat may pass 100 %.");
    if (b->has_acid && c->setup.physics.exit_k < b->acid.max_k)
        report_add_warning(r, "The flue gas leaves below an acid dew point: sulfuric acid condenses on surfaces colder than it.");
}

static bc_status add_complete(report *r, const arguments *a, const burn_case_result *c, bc_error *err)
{
    const bc_state *state = &c->fuel->reference->state;
    bc_flue_volume metered;
    bc_status status = bc_flue_volume_at(&c->burn.flue, state->metering_c + T0_K, state->metering_pa, c->fuel->value.molar_volume_m3_per_mol,
                                         &metered, err);

    if (status == BC_OK)
        status = add_flue(r, a, c, &metered, err);
    if (status != BC_OK)
        return status;
    add_flue_table(r, c);
    status = add_readings(r, c, err);
    if (status != BC_OK)
        return status;
    add_dew_points(r, a, c);
    add_heat(r, a, c, &metered);
    add_efficiency(r, a, c);
    return add_rates(r, a, c, err);
}

bc_status burn_report(report *r, const arguments *a, const burn_case_result *c, bc_error *err)
{
    bc_status status = BC_OK;

    add_case(r, a, c);
    add_oxidant(r, a, c);
    add_flame(r, a, c);
    add_mixture(r, "flame-composition", "Flame in equilibrium, at its temperature (not what leaves the stack)", &c->burn.flame);
    if (c->burn.rich)
        add_rich(r, a, c);
    else
        status = add_complete(r, a, c, err);
    if (status == BC_OK)
        status = add_emissions(r, a, c, err);
    if (status != BC_OK)
        return status;
    burn_safety(r, a, c);
    warn_case(r, c);
    if (a->value[OPTION_working] && !c->burn.rich)
        burn_working(r, c);
    report_set_caution(r, c->burn.rich ? "Carbon monoxide kills without warning: never run a burner with lack of air outside a plant built for it. "
                                         "Work on burners is for licensed people under the local code."
                                       : "Changing the gas or the setting of a burner is work for licensed people under the local code: carbon monoxide, "
                                         "flashback and explosion can kill.");
    return BC_OK;
}
