/* SPDX-License-Identifier: MIT */
/* switch_burner_report.c - a burner on the old gas, on the new one, and set back. */
#include "cli/switch_report.h"

#include <math.h>
#include <stdio.h>
#include <string.h>

#define PERCENT 100.0
#define T0_K 273.15
#define PI 3.14159265358979323846

static void add_data(report *r, const switch_case *c)
{
    const size_t table = report_add_table(r, "burner", "Burner as set on the old gas");

    report_lead_with(r, table);
    report_add_column(r, table, "what", "what", "");
    report_add_column(r, table, "value", "value", "");
    report_add_column(r, table, "how", "how", "");
    for (size_t i = 0; i < bc_burner_key_count(); i++) {
        const bc_burner_key *key = bc_burner_key_at(i);
        char what[64];
        char value[192];

        bc_burner_key_text(&c->burner, i, value, sizeof value);
        if (value[0] == '\0')
            continue;
        (void)snprintf(what, sizeof what, "%s, %s", key->section, key->key);
        report_add_text(r, table, what);
        report_add_text(r, table, value);
        report_add_text(r, table, c->burner.stated[i] ? "stated" : "default");
    }
}

static void add_streams(const slot *where, const switch_case *c, const bc_burner_response *x)
{
    const double gas_m3 = c->s->each[where->gas].subject.value.molar_volume_m3_per_mol;
    const plain_figure figures[] = {
        {"input-net", "Heat input, net", x->input_w * 1e-3, "kW", 5, "flow of the control"},
        {"gas-flow", "Gas, metered", x->fuel_mol_per_s * gas_m3 * 3600.0, "m3/h", 5, "flow of the control"},
        {"flue-mass-flow", "Wet flue gas", x->flue_kg_per_s * 3600.0, "kg/h", 5, "atom balance"},
    };

    add_figures(where, c->a, figures, x->has_flow ? BC_COUNT(figures) : 0);
}

/* Complete combustion has what lack of air has not. */
static void add_flue(const slot *where, const switch_case *c, const bc_burner_response *x)
{
    const bc_burn *b = &x->burn;
    const plain_figure flue[] = {
        {"flue-o2-dry", "O2 in dry flue gas", PERCENT * x->o2_dry, "%", 3, "atom balance"},
        {"flue-o2-wet", "O2 in wet flue gas", PERCENT * x->o2_wet, "%", 3, "atom balance"},
    };
    const plain_figure efficiency[] = {
        {"efficiency-net", "Efficiency on net heat", PERCENT * b->yield.efficiency_net, "%", 4, "indirect"},
        {"efficiency-gross", "Efficiency on gross heat", PERCENT * b->yield.efficiency_gross, "%", 4, "indirect"},
    };
    const plain_figure dew = {"flue-dew-point", "Water dew point", b->dew.t_k - T0_K, "C", 3, "IAPWS SR1-86(1992)"};
    const plain_figure lack = {"flue-co-dry", "CO in dry flue gas", PERCENT * x->co_dry, "%", 3, "equilibrium"};

    add_figures(where, c->a, flue, 2);
    if (b->rich) {
        add_figures(where, c->a, &lack, 1);
        return;
    }
    add_figures(where, c->a, &dew, b->dew.exists ? 1 : 0);
    add_figures(where, c->a, efficiency, 2);
}

static void add_response(const slot *where, const switch_case *c, const bc_burner_response *x)
{
    const plain_figure ratios[] = {
        {"heat-input-ratio", "Heat input, of old", PERCENT * x->heat_ratio, "%", 4, "flow of the control"},
        {"air-flow-ratio", "Air flow, of old", PERCENT * x->air_ratio, "%", 4, "flow of the control"},
        {"flue-flow-ratio", "Wet flue gas, of old", PERCENT * x->flue_ratio, "%", 4, "atom balance"},
        {"lambda", "Air factor", x->lambda, "1", 4, "flow of the control"},
    };
    const plain_figure primary = {"primary-air", "Primary air, of need", PERCENT * x->primary, "%", 4, "momentum balance"};
    const plain_figure flame = {"flame-temperature-adiabatic", "Flame temperature", x->burn.flame.t_k - T0_K, "C", 4, "NASA RP-1311"};
    const plain_figure velocity = {"burning-velocity-stoichiometric", "Burning velocity", PERCENT * x->velocity_m_per_s,
                                   "cm/s", 3, "Di Sarli and Di Benedetto 2007"};

    add_streams(where, c, x);
    add_figures(where, c->a, ratios, BC_COUNT(ratios));
    add_figures(where, c->a, &primary, x->primary > 0.0 ? 1 : 0);
    add_flue(where, c, x);
    add_figures(where, c->a, &flame, 1);
    add_figures(where, c->a, &velocity, x->has_velocity ? 1 : 0);
}

static void add_orifice(const slot *where, const switch_case *c)
{
    const bc_burner_case *set = &c->set;
    const bc_burner_remedy *m = &c->remedy;
    const plain_figure factors[] = {
        {"orifice-area-factor", "Orifice area", m->area, "1", 4, "orifice equation"},
        {"orifice-diameter-factor", "Orifice diameter", m->diameter, "1", 4, "orifice equation"},
        {"gas-pressure-factor", "Or gas pressure", m->pressure, "1", 4, "orifice equation"},
    };
    const plain_figure pressure = {"gas-pressure", "Gas pressure then", set->gas_pa * m->pressure * 1e-2, "mbar", 4,
                                   "orifice equation"};

    add_figures(where, c->a, factors, m->has_pressure ? 3 : 2);
    add_figures(where, c->a, &pressure, set->has_pressure && m->has_pressure ? 1 : 0);
    if (!set->has_area)
        return;
    const double diameter_mm = 2e3 * m->diameter * sqrt(set->area_m2 / c->burner.orifices / PI);
    const plain_figure diameter = {"orifice-diameter", "Orifice diameter then", diameter_mm, "mm", 4, "orifice equation"};

    add_figures(where, c->a, &diameter, 1);
}

static void add_remedy(report *r, const switch_case *c)
{
    const bc_burner_remedy *m = &c->remedy;
    const slot where = {r, report_add_section(r, "remedy", "What restores heat input and air factor: factors on the setting as found"), NEW_GAS};
    const plain_figure gas = {"gas-set-point-factor", "Set point of the gas flow", m->gas, "1", 4, "flow of the meter"};
    const bool two_airs = m->by_orifice && m->has_pressure && fabs(m->air - m->air_by_pressure) > 1e-6;
    const plain_figure airs[] = {
        {"air-factor", two_airs ? "Air flow, heat by the orifice" : "Air flow then", m->air, "1", 4, "atom balance"},
        {"air-factor-by-pressure", "Air flow, heat by the pressure", m->air_by_pressure, "1", 4, "atom balance"},
        {"air-factor-alone", "Or air alone, heat as it comes", m->air_alone, "1", 4, "atom balance"},
        {"lambda-target", "Air factor restored", m->lambda_target, "1", 4, "atom balance"},
    };

    if (m->by_orifice)
        add_orifice(&where, c);
    else
        add_figures(&where, c->a, &gas, 1);
    add_figures(&where, c->a, airs, 1);
    add_figures(&where, c->a, airs + 1, two_airs ? 1 : 0);
    add_figures(&where, c->a, airs + 2, 2);
}

static void add_adjusted(report *r, const switch_case *c)
{
    const bc_burner_response *x = &c->result.on_adjusted;
    const slot where = {r, report_add_section(r, "adjusted", "New gas once heat input and air factor are restored"), NEW_GAS};
    const plain_figure figures[] = {
        {"adjusted-heat-input-ratio", "Heat input, of old", PERCENT * x->heat_ratio, "%", 4, "flow of the control"},
        {"adjusted-lambda", "Air factor", x->lambda, "1", 4, "flow of the control"},
        {"adjusted-flue-o2-dry", "O2 in dry flue gas", PERCENT * x->o2_dry, "%", 3, "atom balance"},
        {"adjusted-flame-temperature", "Flame temperature", x->burn.flame.t_k - T0_K, "C", 4, "NASA RP-1311"},
        {"adjusted-flue-flow-ratio", "Wet flue gas, of old", PERCENT * x->flue_ratio, "%", 4, "atom balance"},
    };

    add_figures(&where, c->a, figures, BC_COUNT(figures));
}

void switch_burner(report *r, const switch_case *c)
{
    char title[160];

    if (!c->has_burner)
        return;
    add_data(r, c);
    (void)snprintf(title, sizeof title, "On the burner, %.60s: %s", bc_control_word(c->burner.control), bc_control_meaning(c->burner.control));
    const size_t section = report_add_section(r, "response", title);
    const slot old_gas = {r, section, OLD_GAS};
    const slot new_gas = {r, section, NEW_GAS};

    add_response(&old_gas, c, &c->result.on_old);
    add_response(&new_gas, c, &c->result.on_new);
    add_remedy(r, c);
    add_adjusted(r, c);
}

/* The burner as it is, but under another control: gas by orifice where that control leaves it open. */
static bc_status respond_under(const switch_case *c, bc_control control, bc_burner_response *x)
{
    bc_burner_setting found = bc_burner_setting_as_found();
    bc_burner b = c->burner;
    bc_burner_case set;

    found.gas_k = switch_new_k(c);
    b.control = control;
    b.primary = b.primary > c->set.lambda ? c->set.lambda : b.primary;
    const bc_status status = bc_burner_set(&b, &c->s->each[OLD_GAS].subject, &set, NULL);

    return status == BC_OK ? bc_burner_respond(&set, &c->s->each[NEW_GAS].subject, &found, x, NULL) : status;
}

/* A control under which the gas burns no more (or not within the range of lambda) has no figures. */
static void add_control(report *r, size_t table, const switch_case *c, bc_control control)
{
    bc_burner_response x;
    char meaning[160];
    const bool responds = respond_under(c, control, &x) == BC_OK;

    report_add_text(r, table, bc_control_word(control));
    (void)snprintf(meaning, sizeof meaning, "%s", bc_control_meaning(control));
    if (responds && x.trim_at_end)
        (void)snprintf(meaning, sizeof meaning, "trim of the %s at its end of %.3g %%: flue oxygen not held", control == BC_CONTROL_TRIM_AIR ? "air" : "gas",
                       PERCENT * c->burner.trim_range);
    if (responds) {
        report_add_number(r, table, PERCENT * x.heat_ratio, 2);
        report_add_number(r, table, x.lambda, 3);
        report_add_number(r, table, PERCENT * x.o2_dry, 2);
    } else {
        for (int i = 0; i < 3; i++)
            report_add_text(r, table, "-");
    }
    report_add_text(r, table, meaning);
}

void switch_controls(report *r, const switch_case *c)
{
    char title[120];

    (void)snprintf(title, sizeof title, "Heat input and air on the new gas by kind of control (lambda %.4g on the old gas)", c->set.lambda);
    const size_t table = report_add_table(r, "controls", title);

    report_add_column(r, table, "control", "control", "");
    report_add_column(r, table, "heat-input", "heat, of old", "%");
    report_add_column(r, table, "lambda", "lambda", "");
    report_add_column(r, table, "flue-o2", "dry O2", "%");
    report_add_column(r, table, "meaning", "which is", "");
    for (int k = 0; k < (int)BC_CONTROLS; k++)
        add_control(r, table, c, (bc_control)k);
}
