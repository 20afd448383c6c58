/* SPDX-License-Identifier: MIT */
/* test_ranges.c - every range of a flame's inputs ends where its header says, to the last bits, and a refusal names the figure.
 *
 * The ends are those of the headers; what a refusal says is the value asked for in the unit of the sentence. */
#include "equilibrium_support.h"

#include "bluecone/burn.h"
#include "bluecone/dewpoint.h"
#include "bluecone/emission.h"
#include "bluecone/flammability.h"
#include "bluecone/flue.h"
#include "bluecone/heatload.h"
#include "bluecone/humidity.h"
#include "bluecone/oxidant.h"
#include "bluecone/steam.h"

#define ATM_PA 101325.0

/* A call with one of its arguments at a value, the others well inside. */
typedef bc_status probe(double value, bc_error *err);

typedef struct {
    const char *label;
    probe *at;
    double low, high; /* infinite: not asked */
    bool low_open, high_open; /* the end itself is outside */
    double bad;
    const char *words; /* of the refusal of `bad` */
} range;

static bc_status acid_water(double x, bc_error *err)
{
    bc_acid_dew dew;

    return bc_acid_dew_point(x, 0.25, ATM_PA, &dew, err);
}

static bc_status acid_so3(double x, bc_error *err)
{
    bc_acid_dew dew;

    return bc_acid_dew_point(0.25, x, ATM_PA, &dew, err);
}

/* At half a megapascal the mole fraction is what ends first, at half an atmosphere the partial pressure. */
static bc_status acid_so3_dense(double x, bc_error *err)
{
    bc_acid_dew dew;

    return bc_acid_dew_point(0.25, x, 5e5, &dew, err);
}

static bc_status acid_so3_thin(double x, bc_error *err)
{
    bc_acid_dew dew;

    return bc_acid_dew_point(0.25, x, ATM_PA / 2.0, &dew, err);
}

static bc_status acid_pressure(double p_pa, bc_error *err)
{
    bc_acid_dew dew;

    return bc_acid_dew_point(0.0, 0.0, p_pa, &dew, err);
}

static bc_status conversion(double share, bc_error *err)
{
    const bc_gas flue = equilibrium_gas("nitrogen=86,water=13,sulfur-dioxide=1");
    bc_acid_dew dew;

    return bc_acid_dew_point_of(&flue, share, ATM_PA, &dew, err);
}

static bc_status burn(const bc_burn_case *c, bc_error *err)
{
    bc_burn b;

    return bc_burn_of(c, &b, err);
}

static bc_burn_case methane_case(void)
{
    const bc_gas methane = equilibrium_gas("methane=100");
    bc_burn_case c = bc_burn_case_default(&methane);

    c.lambda = 1.1;
    return c;
}

#define BURN_PROBE(name, member)                     \
    static bc_status name(double value, bc_error *err) \
    {                                                \
        bc_burn_case c = methane_case();             \
                                                     \
        c.member = value;                            \
        return burn(&c, err);                        \
    }

BURN_PROBE(burn_lambda, lambda)
BURN_PROBE(burn_fuel, fuel_k)
BURN_PROBE(burn_oxidant, oxidant_k)
BURN_PROBE(burn_exit, exit_k)
BURN_PROBE(burn_pressure, p_pa)
BURN_PROBE(burn_conversion, so3_conversion)
BURN_PROBE(burn_casing, casing_loss)

static bc_status dew_water(double x, bc_error *err)
{
    bc_dew dew;

    return bc_dew_point(x, 1e5, &dew, err);
}

static bc_status dew_pressure(double p_pa, bc_error *err)
{
    bc_dew dew;

    return bc_dew_point(0.0, p_pa, &dew, err);
}

static bc_status condense_temperature(double t_k, bc_error *err)
{
    const bc_gas wet = equilibrium_gas("nitrogen=70,water=30");
    bc_condensation c;

    return bc_condense(&wet, t_k, 1e5, &c, err);
}

static bc_status steam(double t_k, bc_error *err)
{
    double p_pa;

    return bc_steam_pressure(t_k, &p_pa, err);
}

static bc_status steam_latent(double t_k, bc_error *err)
{
    double j_per_kg;

    return bc_steam_latent_heat(t_k, &j_per_kg, err);
}

static const bc_emission_basis BASIS = {BC_POLLUTANT_CO, 0.04, 0.03, 0.21, 8.5, 8e5};

#define EMISSION_PROBE(name, member)                                    \
    static bc_status name(double value, bc_error *err)                  \
    {                                                                   \
        bc_emission_basis b = BASIS;                                    \
        bc_emission e;                                                  \
                                                                        \
        b.member = value;                                               \
        return bc_emission_convert(&b, BC_EMISSION_FRACTION, 1e-4, &e, err); \
    }

EMISSION_PROBE(emission_measured, o2_measured)
EMISSION_PROBE(emission_reference, o2_reference)
EMISSION_PROBE(emission_dry, dry_mol)
EMISSION_PROBE(emission_heat, heat_j_per_mol)

static bc_status emission_air(double x, bc_error *err)
{
    bc_emission_basis b = BASIS;
    bc_emission e;

    b.o2_measured = b.o2_reference = 0.0;
    b.o2_air = x;
    return bc_emission_convert(&b, BC_EMISSION_FRACTION, 1e-4, &e, err);
}

static bc_status emission_value(double value, bc_error *err)
{
    bc_emission e;

    return bc_emission_convert(&BASIS, BC_EMISSION_DENSITY, value, &e, err);
}

static bc_status flue_lambda(double lambda, bc_error *err)
{
    const bc_gas methane = equilibrium_gas("methane=100"), air = bc_oxidant_air();
    bc_flue flue;

    return bc_flue_at(&methane, &air, lambda, &flue, err);
}

static bc_status flue_state(double t_k, double p_pa, double m3, bc_error *err)
{
    const bc_flue flue = {.wet_mol = 10.0, .dry_mol = 8.0};
    bc_flue_volume v;

    return bc_flue_volume_at(&flue, t_k, p_pa, m3, &v, err);
}

static bc_status flue_temperature(double t_k, bc_error *err)
{
    return flue_state(t_k, 1e5, 0.024, err);
}

static bc_status flue_pressure(double p_pa, bc_error *err)
{
    return flue_state(300.0, p_pa, 0.024, err);
}

static bc_status flue_fuel(double m3, bc_error *err)
{
    return flue_state(300.0, 1e5, m3, err);
}

static bc_status factor_heat(double heat, bc_error *err)
{
    const bc_gas methane = equilibrium_gas("methane=100");
    bc_flue_factor f;

    return bc_flue_factor_of(&methane, heat, &f, err);
}

static bc_status heat_path(double fuel_k, double oxidant_k, double exit_k, bc_error *err)
{
    const bc_gas methane = equilibrium_gas("methane=100"), air = bc_oxidant_air();
    const bc_heat_case c = {&methane, &air, 1.2, fuel_k, oxidant_k, exit_k, ATM_PA, false};
    bc_heat_path path;

    return bc_heat_path_of(&c, &path, err);
}

static bc_status heat_fuel(double t_k, bc_error *err)
{
    return heat_path(t_k, 290.0, 400.0, err);
}

static bc_status heat_oxidant(double t_k, bc_error *err)
{
    return heat_path(290.0, t_k, 400.0, err);
}

static bc_status heat_exit(double t_k, bc_error *err)
{
    return heat_path(290.0, 290.0, t_k, err);
}

/* At 200 MPa water condenses beyond the end of its data, 600 K. */
static bc_status heat_condensing(double t_k, bc_error *err)
{
    const bc_gas methane = equilibrium_gas("methane=100"), air = bc_oxidant_air();
    const bc_heat_case c = {&methane, &air, 1.2, 290.0, 290.0, t_k, 2e8, true};
    bc_heat_path path;

    return bc_heat_path_of(&c, &path, err);
}

static const bc_heat_path PATH = {.net_j = 8e5, .gross_j = 9e5, .total_j = -7e5, .flue = {.oxidant_mol = 9.5}};

static bc_status casing(double loss, bc_error *err)
{
    bc_heat_yield y;

    return bc_heat_yield_of(&PATH, loss, &y, err);
}

static bc_status net_heat(double net_j, bc_error *err)
{
    bc_heat_path path = PATH;
    bc_heat_yield y;

    path.net_j = net_j;
    return bc_heat_yield_of(&path, 0.0, &y, err);
}

static bc_status duty(double w, bc_error *err)
{
    const bc_heat_yield y = {.useful_j = 7e5};
    double rate;

    return bc_heat_rate(&y, w, &rate, err);
}

static bc_status useful(double j, bc_error *err)
{
    const bc_heat_yield y = {.useful_j = j};
    double rate;

    return bc_heat_rate(&y, 1e6, &rate, err);
}

static bc_status humid_relative(double share, bc_error *err)
{
    double x;

    return bc_humidity_relative(share, 300.0, ATM_PA, &x, err);
}

static bc_status humid_temperature(double t_k, bc_error *err)
{
    double x;

    return bc_humidity_relative(0.0, t_k, ATM_PA, &x, err);
}

static bc_status humid_pressure(double p_pa, bc_error *err)
{
    double x;

    return bc_humidity_relative(0.0, 300.0, p_pa, &x, err);
}

static bc_status humid_bulb(double t_wet_k, bc_error *err)
{
    double x;

    return bc_humidity_wet_bulb(300.0, t_wet_k, ATM_PA, &x, err);
}

static bc_status humid_water(double x, bc_error *err)
{
    const bc_gas air = bc_oxidant_air();
    bc_gas wet;

    return bc_humidity_apply(&air, x, &wet, err);
}

static bc_status altitude(double m, bc_error *err)
{
    double p_pa;

    return bc_altitude_pressure(m, &p_pa, err);
}

static bc_status enriched(double x, bc_error *err)
{
    bc_gas oxidant;

    return bc_oxidant_enriched(x, &oxidant, err);
}

static bc_status purity(double x, bc_error *err)
{
    bc_gas oxidant;

    return bc_oxidant_oxygen(x, 0.5, &oxidant, err);
}

static bc_status argon(double share, bc_error *err)
{
    bc_gas oxidant;

    return bc_oxidant_oxygen(0.95, share, &oxidant, err);
}

static bc_status excess(double share, bc_error *err)
{
    double lambda;

    return bc_lambda_from_excess(share, &lambda, err);
}

static bc_status siegert_flue(double t_k, bc_error *err)
{
    double loss;

    return bc_siegert_loss(bc_siegert_at(0), t_k, 300.0, 0.03, &loss, err);
}

static bc_status siegert_air(double t_k, bc_error *err)
{
    double loss;

    return bc_siegert_loss(bc_siegert_at(0), 400.0, t_k, 0.03, &loss, err);
}

static bc_status siegert_oxygen(double x, bc_error *err)
{
    double loss;

    return bc_siegert_loss(bc_siegert_at(0), 400.0, 300.0, x, &loss, err);
}

static bc_status siegert_co2(double x, bc_error *err)
{
    double loss;

    return bc_siegert_loss_co2(bc_siegert_at(0), 400.0, 300.0, x, &loss, err);
}

static bc_status flame_lambda(double lambda, bc_error *err)
{
    const bc_gas methane = equilibrium_gas("methane=100"), air = bc_oxidant_air();
    double per_fuel;

    return bc_oxidant_for_lambda(&methane, &air, lambda, &per_fuel, err);
}

static bc_status reactants(double fuel_k, double oxidant_k, double per_fuel, double p_pa, bc_error *err)
{
    const bc_reactants r = {.fuel = equilibrium_gas("methane=100"), .oxidant = bc_oxidant_air(), .fuel_t_k = fuel_k,
                            .oxidant_t_k = oxidant_k, .oxidant_per_fuel = per_fuel, .p_pa = p_pa};
    double elements[BC_ELEMENTS], h_j;

    return bc_reactants_sum(&r, elements, &h_j, err);
}

static bc_status flame_fuel(double t_k, bc_error *err)
{
    return reactants(t_k, 300.0, 10.0, 1e5, err);
}

static bc_status flame_oxidant(double t_k, bc_error *err)
{
    return reactants(300.0, t_k, 10.0, 1e5, err);
}

static bc_status flame_per_fuel(double moles, bc_error *err)
{
    return reactants(300.0, 300.0, moles, 1e5, err);
}

static bc_status flame_pressure(double p_pa, bc_error *err)
{
    return reactants(300.0, 300.0, 10.0, p_pa, err);
}

static const double WATER_GAS[BC_ELEMENTS] = {1.0, 2.0, 0.0, 2.0, 0.0, 0.0, 0.0, 0.0};

static bc_status equilibrium_temperature(double t_k, bc_error *err)
{
    bc_mixture m;

    return bc_equilibrium_tp(WATER_GAS, t_k, 1e5, &m, err);
}

static bc_status equilibrium_pressure(double p_pa, bc_error *err)
{
    bc_mixture m;

    return bc_equilibrium_tp(WATER_GAS, 1400.0, p_pa, &m, err);
}

static bc_status equilibrium_amount(double moles, bc_error *err)
{
    const double elements[BC_ELEMENTS] = {[BC_AR] = moles};
    bc_mixture m;

    return bc_equilibrium_tp(elements, 1400.0, 1e5, &m, err);
}

static bc_status equilibrium_atoms(double moles, bc_error *err)
{
    double elements[BC_ELEMENTS] = {1.0, 4.0, 0.0, 4.0, 0.0, 0.0, 0.0, 0.0};
    bc_mixture m;

    elements[BC_N] = moles;
    return bc_equilibrium_tp(elements, 1400.0, 1e5, &m, err);
}

static const double TINY = 5e-324, GREAT = 1.7976931348623157e308;

/* Two steps, since the sum of two fractions may round the first away. */
static double beyond(double end, double where)
{
    return nextafter(nextafter(end, where), where);
}

static bool accepts(const range *r, double value)
{
    bc_error err = {.status = BC_OK};
    const bc_status status = r->at(value, &err);

    if (status != BC_OK)
        assert_int_equal(err.status, status);
    return status == BC_OK;
}

static void ranges_end_where_the_headers_say(void **state)
{
    const range ranges[] = {
        {"water of the acid", acid_water, 0.0, 0.75, false, false, 0.875, "0.875 of water|0.25 of SO3"},
        {"SO3", acid_so3, BC_SO3_MIN, 0.75, false, false, 6e-9, "0.006 ppm SO3|(0.006 ppm at 1 atm)|below 0.01 ppm"},
        {"SO3, dense", acid_so3_dense, BC_SO3_MIN, 0.75, false, false, 5e-9, "0.005 ppm SO3|(0.02467 ppm at 1 atm)"},
        {"SO3, thin", acid_so3_thin, 2.0 * BC_SO3_MIN, 0.75, false, false, 1.6e-8, "0.016 ppm SO3|(0.008 ppm at 1 atm)"},
        {"pressure of the acid", acid_pressure, TINY, GREAT, false, false, -4.0, "is -4 Pa"},
        {"conversion", conversion, 0.0, 1.0, false, false, 1.5, "of 150 %"},
        {"air factor", burn_lambda, BC_BURN_LAMBDA_MIN, BC_BURN_LAMBDA_MAX, false, false, 0.25, "air factor 0.25|0.3 to 20"},
        {"fuel", burn_fuel, 250.0, 3000.0, false, false, 240.0, "the fuel, -33.15 C|-23.15 to 2726.85 C"},
        {"oxidant", burn_oxidant, 250.0, 3000.0, false, false, 3100.0, "the oxidant, 2826.85 C"},
        {"exit", burn_exit, 250.0, 3000.0, false, false, 240.0, "the flue gas, -33.15 C"},
        {"pressure of a case", burn_pressure, 5e3, 1e7, false, false, 4e3, "4 kPa|5 to 10000 kPa"},
        {"conversion of a case", burn_conversion, 0.0, 1.0, false, false, 1.01, "SO3 conversion"},
        {"casing of a case", burn_casing, 0.0, 1.0, false, false, -0.01, "casing loss"},
        {"water of the dew point", dew_water, 0.0, 1.0, false, false, 1.25, "water of 1.25"},
        {"pressure of the dew point", dew_pressure, TINY, GREAT, false, false, -4.0, "is -4 Pa"},
        {"condensing", condense_temperature, BC_STEAM_T_MIN_K, GREAT, false, false, 260.0, "at 260 K|freezes"},
        {"saturation line", steam, BC_FROST_T_MIN_K, BC_STEAM_T_MAX_K, false, false, 49.0, "49 K|50 to 647.096 K"},
        {"liquid water", steam_latent, BC_STEAM_T_MIN_K, BC_STEAM_T_MAX_K, false, false, 700.0, "700 K|273.16 to 647.096 K"},
        {"oxygen of the air", emission_air, 0.0, 1.0, true, false, 1.25, "125 % oxygen"},
        {"oxygen measured", emission_measured, 0.0, 0.21, false, true, 0.25, "25 % oxygen measured|the 21 %"},
        {"oxygen of reference", emission_reference, 0.0, 0.21, false, true, 0.25, "of 25 %|the 21 %"},
        {"dry flue gas", emission_dry, TINY, GREAT, false, false, -2.0, "-2 mol"},
        {"heat of an emission", emission_heat, TINY, GREAT, false, false, -2.0, "-2 J/mol"},
        {"emission", emission_value, 0.0, GREAT, false, false, -2.0, "of -2 "},
        {"lambda of a flue gas", flue_lambda, 1.0, 1e300, false, false, 0.75, "lambda is 0.75"},
        {"temperature of a flue gas", flue_temperature, TINY, GREAT, false, false, -2.0, "-2 K"},
        {"pressure of a flue gas", flue_pressure, TINY, GREAT, false, false, -2.0, "-2 Pa"},
        {"volume of the fuel", flue_fuel, TINY, GREAT, false, false, -2.0, "-2 m3/mol"},
        {"heat of a factor", factor_heat, TINY, GREAT, false, false, -2.0, "-2 J/mol"},
        {"fuel of a path", heat_fuel, 200.0, 6000.0, false, false, 199.0, "of the fuel of 199 K|200 to 6000 K"},
        {"oxidant of a path", heat_oxidant, 200.0, 6000.0, false, false, 6001.0, "of the oxidant of 6001 K"},
        {"exit of a path", heat_exit, 200.0, 6000.0, false, false, 6001.0, "of the flue gas of 6001 K"},
        {"condensation of a path", heat_condensing, BC_STEAM_T_MIN_K, 600.0, false, false, 610.0, "610 K|600 K"},
        {"casing loss", casing, 0.0, 1.0, false, false, 1.25, "of 125 %"},
        {"net heat", net_heat, TINY, HUGE_VAL, false, false, -2.0, "-2 J/mol"},
        {"duty", duty, 0.0, GREAT, false, false, -2.0, "-2 W"},
        {"useful heat", useful, TINY, HUGE_VAL, false, false, -2.0, "-2 J/mol"},
        {"relative humidity", humid_relative, 0.0, 1.0, false, false, 1.25, "at 125 %"},
        {"temperature of humid air", humid_temperature, 223.15, 373.15, false, false, 223.0, "-50.15 C|-50 to 100 C"},
        {"pressure of humid air", humid_pressure, 0.0, GREAT, true, false, -4.0, "is -4 Pa"},
        {"wet bulb", humid_bulb, -HUGE_VAL, 300.0, false, false, 310.15, "wet bulb of 37 C|the air, 26.85 C"},
        {"water of humid air", humid_water, 0.0, 1.0, false, true, -0.25, "of -0.25 "},
        {"altitude", altitude, -5000.0, 11000.0, false, false, 11500.0, "11500 m|-5000 to 11000 m"},
        {"enriched air", enriched, 0.20946, 1.0, false, false, 0.2, "20.946 to 100 %|not 20 %"},
        {"purity", purity, BC_OXYGEN_PURITY_MIN, 1.0, false, false, 0.25, "between 50 and 100 %|at 25 %"},
        {"argon of the rest", argon, 0.0, 1.0, false, false, 1.25, "is 1.25;"},
        {"excess", excess, -1.0, GREAT, true, false, -1.25, "-125 %"},
        {"flue gas of Siegert", siegert_flue, 300.0, GREAT, false, false, 290.0, "290 K|300 K"},
        {"air of Siegert", siegert_air, TINY, 400.0, false, false, 410.0, "400 K|410 K"},
        {"oxygen of Siegert", siegert_oxygen, 0.0, 0.21, false, true, 0.25, "below 21 %|not 25 %"},
        {"carbon dioxide of Siegert", siegert_co2, 0.0, 1.0, true, false, 1.25, "not 125 %"},
        {"lambda of a flame", flame_lambda, 0.0, GREAT / 10.0, false, false, -2.0, "lambda of -2 "},
        {"fuel of a flame", flame_fuel, 200.0, 6000.0, false, false, 199.0, "the fuel at 199 K|200 to 6000 K"},
        {"oxidant of a flame", flame_oxidant, 200.0, 6000.0, false, false, 6001.0, "the oxidant at 6001 K"},
        {"oxidant per fuel", flame_per_fuel, 0.0, 1e300, false, false, -2.0, "-2 mol"},
        {"pressure of a flame", flame_pressure, 1e2, 1e8, false, false, 50.0, "50 Pa|100 to 1e+08 Pa"},
        {"temperature of an equilibrium", equilibrium_temperature, 200.0, 6000.0, false, false, 199.0, "199 K|200 to 6000 K"},
        {"pressure of an equilibrium", equilibrium_pressure, 1e2, 1e8, false, false, 50.0, "50 Pa|100 to 1e+08 Pa"},
        {"amount of an equilibrium", equilibrium_amount, 1e-200, 1e200, false, false, 1e-201, "1e-201 mol|1e-200 to 1e+200 mol"},
        {"atoms of an equilibrium", equilibrium_atoms, 0.0, 1e200, false, false, -2.0, "amount of N is -2 mol"},
    };

    (void)state;
    for (size_t i = 0; i < COUNT(ranges); i++) {
        const range *r = &ranges[i];
        const double below = r->low_open ? r->low : beyond(r->low, -HUGE_VAL);
        const double above = r->high_open ? r->high : r->high > 1e299 ? HUGE_VAL : beyond(r->high, HUGE_VAL);
        bc_error err = {.status = BC_OK};

        if (isfinite(r->low) && (accepts(r, below) || (!r->low_open && !accepts(r, r->low))))
            fail_msg("%s does not begin with %.17g", r->label, r->low);
        if (isfinite(r->high) && (accepts(r, above) || (!r->high_open && !accepts(r, r->high))))
            fail_msg("%s does not end with %.17g", r->label, r->high);
        if (accepts(r, (double)NAN))
            fail_msg("%s may be no number", r->label);
        const bc_status status = r->at(r->bad, &err);

        assert_refused_at(r->label, status, &err, status == BC_ERR_INPUT ? BC_ERR_INPUT : BC_ERR_RANGE, r->words);
    }
}

int main(void)
{
    const struct CMUnitTest tests[] = {
        cmocka_unit_test(ranges_end_where_the_headers_say),
    };

    return cmocka_run_group_tests(tests, NULL, NULL);
}
