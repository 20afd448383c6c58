/* SPDX-License-Identifier: MIT */
/* burn_case.c - the options of `burn` into a burner case. */
#include "cli/burn_case.h"

#include "base/error_internal.h"
#include "base/text.h"
#include "bluecone/humidity.h"

#include <math.h>
#include <stdio.h>
#include <stdlib.h>
#include <string.h>

/* All burners of the world together take below 1e7 mol/s and 1e13 W (4e12 m3 of natural gas a year, from memory); beyond
 * these ends products overflow or vanish. */
#define RATE_MIN_MOL_PER_S 1e-9
#define RATE_MAX_MOL_PER_S 1e9
#define DUTY_MIN_W 1e-3
#define DUTY_MAX_W 1e15
#define READING_MAX 1e6 /* ppm, mg/m3 or mg/MJ: a flue gas that is nothing else */

/* Puts the option in front of a cause that a deeper function gave. */
static bc_status blame(const char *option, bc_status status, bc_error *err)
{
    char cause[BC_MESSAGE_MAX];

    if (!err)
        return status;
    (void)snprintf(cause, sizeof cause, "%s", err->message);
    return bc_fail(err, status == BC_ERR_INPUT && err->file[0] == '\0' ? BC_ERR_USAGE : status, "--%s: %.460s", option, cause);
}

/* A number with an optional '%' behind it, as a fraction; *rest is what follows. */
static bc_status take_percent(const char *option, const char *text, double *fraction, const char **rest, bc_error *err)
{
    double percent = 0.0;
    const bc_status status = bc_number_prefix(text, &percent, rest, err);

    if (status != BC_OK)
        return blame(option, status, err);
    if (**rest == '%')
        *rest = bc_text_skip_space(*rest + 1);
    *fraction = percent / 100.0;
    return BC_OK;
}

static bc_status take_share(const arguments *a, int option, const char *word, double *fraction, bc_error *err)
{
    const char *text = a->value[option];
    const char *rest = "";

    if (!text)
        return BC_OK;
    const bc_status status = take_percent(word, text, fraction, &rest, err);

    if (status == BC_OK && *rest != '\0')
        return bc_fail(err, BC_ERR_USAGE, "--%s %.40s: write a number of per cent alone", word, text);
    return status;
}

static bc_status take_temperature(const arguments *a, int option, const char *word, double *t_k, bc_error *err)
{
    if (!a->value[option])
        return BC_OK;
    const bc_status status = bc_measure_parse(a->value[option], "K", "C", t_k, err);

    return status == BC_OK ? status : blame(word, status, err);
}

static bc_status take_oxygen(const char *purity, burn_setup *s, bc_error *err)
{
    double fraction = 1.0;
    const char *rest = "";

    if (*purity == ':') {
        const bc_status status = take_percent("oxidant", purity + 1, &fraction, &rest, err);

        if (status != BC_OK)
            return status;
    }
    if (*rest != '\0')
        return bc_fail(err, BC_ERR_USAGE, "--oxidant oxygen%.40s: write the purity as oxygen:95", purity);
    const bc_status status = bc_oxidant_oxygen(fraction, 1.0, &s->physics.oxidant, err);

    if (status != BC_OK)
        return blame("oxidant", status, err);
    if (fraction < 1.0)
        (void)snprintf(s->oxidant, sizeof s->oxidant, "oxygen of %.6g %%, rest argon", 100.0 * fraction);
    else
        (void)snprintf(s->oxidant, sizeof s->oxidant, "pure oxygen");
    return BC_OK;
}

static bc_status take_enriched(const char *share, burn_setup *s, bc_error *err)
{
    double fraction = 0.0;
    const char *rest = "";

    if (*share == ':') {
        const bc_status status = take_percent("oxidant", share + 1, &fraction, &rest, err);

        if (status != BC_OK)
            return status;
    }
    if (*share == '\0' || *rest != '\0')
        return bc_fail(err, BC_ERR_USAGE, "--oxidant enriched%.40s: write the oxygen in per cent, as enriched:28", share);
    const bc_status status = bc_oxidant_enriched(fraction, &s->physics.oxidant, err);

    if (status != BC_OK)
        return blame("oxidant", status, err);
    (void)snprintf(s->oxidant, sizeof s->oxidant, "air enriched to %.6g %% oxygen", 100.0 * fraction);
    return BC_OK;
}

static bc_status take_oxidant_gas(const char *word, burn_setup *s, bc_error *err)
{
    loaded_gas *gas = calloc(1, sizeof *gas);

    if (!gas)
        return bc_fail(err, BC_ERR_MEMORY, "not enough memory");
    const bc_status status = gas_load(word, gas, err);

    if (status == BC_OK) {
        s->physics.oxidant = gas->gas;
        (void)snprintf(s->oxidant, sizeof s->oxidant, "%.120s", gas->name);
        (void)snprintf(s->oxidant_path, sizeof s->oxidant_path, "%s", gas->composition.path);
        s->remark_count = gas->composition.remark_count;
        memcpy(s->remarks, gas->composition.remarks, sizeof s->remarks);
    }
    free(gas);
    if (status == BC_OK || !err || err->file[0] != '\0')
        return status;
    char cause[BC_MESSAGE_MAX];

    (void)snprintf(cause, sizeof cause, "%s", err->message);
    return bc_fail(err, status, "--oxidant: %.460s", cause);
}

static bc_status take_oxidant(const arguments *a, burn_setup *s, bc_error *err)
{
    const char *word = a->value[OPTION_oxidant];

    (void)snprintf(s->oxidant, sizeof s->oxidant, "dry air");
    s->is_air = !word || strcmp(word, "air") == 0;
    if (s->is_air)
        return BC_OK;
    if (strcmp(word, "oxygen") == 0 || strncmp(word, "oxygen:", 7) == 0)
        return take_oxygen(word + 6, s, err);
    if (strcmp(word, "enriched") == 0 || strncmp(word, "enriched:", 9) == 0)
        return take_enriched(word + 8, s, err);
    return take_oxidant_gas(word, s, err);
}

/* 60% (relative), dew:12C, wet-bulb:18C. */
static bc_status water_of(const char *text, burn_setup *s, double *x_water, bc_error *err)
{
    const bc_burn_case *c = &s->physics;
    double t_k = 0.0;
    double relative = 0.0;
    const char *rest = "";
    bc_status status = BC_OK;

    if (strncmp(text, "dew:", 4) == 0) {
        status = bc_measure_parse(text + 4, "K", "C", &t_k, err);
        if (status == BC_OK && t_k > c->oxidant_k)
            return bc_fail(err, BC_ERR_USAGE, "a dew point of %.6g C is warmer than the air, %.6g C, which would drop its water", t_k - 273.15,
                           c->oxidant_k - 273.15);
        (void)snprintf(s->water_from, sizeof s->water_from, "from a dew point of %.6g C", t_k - 273.15);
        return status == BC_OK ? bc_humidity_dew_point(t_k, c->p_pa, x_water, err) : status;
    }
    if (strncmp(text, "wet-bulb:", 9) == 0) {
        status = bc_measure_parse(text + 9, "K", "C", &t_k, err);
        (void)snprintf(s->water_from, sizeof s->water_from, "from a wet bulb at %.6g C", t_k - 273.15);
        return status == BC_OK ? bc_humidity_wet_bulb(c->oxidant_k, t_k, c->p_pa, x_water, err) : status;
    }
    status = bc_number_prefix(text, &relative, &rest, err);
    if (status != BC_OK && strpbrk(text, "0123456789"))
        return status;
    if (status != BC_OK || (strcmp(rest, "%") != 0 && *rest != '\0'))
        return bc_fail(err, BC_ERR_USAGE, "'%.40s' is not understood; write 60%%, dew:12C or wet-bulb:18C", text);
    (void)snprintf(s->water_from, sizeof s->water_from, "from %.6g %% relative humidity", relative);
    return bc_humidity_relative(relative / 100.0, c->oxidant_k, c->p_pa, x_water, err);
}

static bc_status take_humidity(const arguments *a, burn_setup *s, bc_error *err)
{
    const char *text = a->value[OPTION_humidity];
    double x_water = 0.0;
    bc_gas wet;

    if (!text)
        return BC_OK;
    bc_status status = water_of(text, s, &x_water, err);

    if (status == BC_OK)
        status = bc_humidity_apply(&s->physics.oxidant, x_water, &wet, err);
    if (status != BC_OK)
        return blame("humidity", status, err);
    s->physics.oxidant = wet;
    const size_t used = s->is_air ? 0 : strlen(s->oxidant);

    (void)snprintf(s->oxidant + used, sizeof s->oxidant - used, "%s %.4g mol %% water", used ? "," : "air with", 100.0 * x_water);
    return BC_OK;
}

static bc_status take_flue_o2(const char *text, burn_setup *s, bc_error *err)
{
    double oxygen = 0.0;
    const char *rest = "";
    bc_status status = take_percent("flue-o2", text, &oxygen, &rest, err);

    if (status != BC_OK)
        return status;
    if (*rest != '\0' && strcmp(rest, "wet") != 0 && strcmp(rest, "dry") != 0)
        return bc_fail(err, BC_ERR_USAGE, "--flue-o2 %.40s: write the reading as 3, 3dry or 3wet", text);
    const bc_flue_basis basis = strcmp(rest, "wet") == 0 ? BC_FLUE_WET : BC_FLUE_DRY;

    status = bc_lambda_from_flue_oxygen(&s->physics.fuel, &s->physics.oxidant, oxygen, basis, &s->physics.lambda, err);
    if (status != BC_OK)
        return blame("flue-o2", status, err);
    (void)snprintf(s->lambda_from, sizeof s->lambda_from, "from %.6g %% O2 in %s flue gas", 100.0 * oxygen, basis == BC_FLUE_WET ? "wet" : "dry");
    return BC_OK;
}

static bc_status take_lambda(const arguments *a, burn_setup *s, bc_error *err)
{
    const char *excess = a->value[OPTION_excess];
    const char *lambda = a->value[OPTION_lambda];
    const char *oxygen = a->value[OPTION_flue_o2];
    bc_status status = BC_OK;

    if ((excess != NULL) + (lambda != NULL) + (oxygen != NULL) > 1)
        return bc_fail(err, BC_ERR_USAGE, "--excess, --lambda and --flue-o2 exclude each other; keep one of them");
    (void)snprintf(s->lambda_from, sizeof s->lambda_from, excess || lambda ? "stated" : "stoichiometric, nothing was stated");
    if (oxygen)
        return take_flue_o2(oxygen, s, err);
    if (lambda) {
        status = bc_number_parse(lambda, &s->physics.lambda, err);
        return status == BC_OK ? status : blame("lambda", status, err);
    }
    if (!excess)
        return BC_OK;
    double fraction = 0.0;

    status = take_share(a, OPTION_excess, "excess", &fraction, err);
    s->physics.lambda = 1.0 + fraction;
    (void)snprintf(s->lambda_from, sizeof s->lambda_from, "from %.6g %% excess", 100.0 * fraction);
    return status;
}

/* A fuel flow in kg/h, m3/h or kmol/h as mol/s; a volume is one at the metering state. */
static bc_status fuel_rate(const char *text, const bc_subject *fuel, double *mol_per_s, bc_error *err)
{
    static const char *const LIKE[] = {"kg/s", "m3/s", "mol/s"};
    const double per_mol[] = {fuel->value.molar_mass_kg_per_mol, fuel->value.molar_volume_m3_per_mol, 1.0};
    const char *rest = "";
    double value = 0.0;
    bc_unit unit;
    bc_unit power;
    bc_status status = bc_number_prefix(text, &value, &rest, err);

    if (status != BC_OK)
        return status;
    status = bc_unit_parse(rest, &unit, err);
    if (status == BC_ERR_USAGE)
        return bc_fail(err, BC_ERR_USAGE, "'%.40s' is no fuel flow; write it as 120kg/h, 300m3/h, 10000scf/h or 10kmol/h", text);
    if (status != BC_OK)
        return status;
    if (!(value > 0.0))
        return bc_fail(err, BC_ERR_USAGE, "a fuel rate is above zero");
    if (unit.has_metering && fabs(unit.metering_c - fuel->reference->state.metering_c) > 0.01)
        return bc_fail(err, BC_ERR_USAGE, "'%.20s' counts gas metered at %.4g C, but the state meters at %.6g C; use --at, or m3/h", rest,
                       unit.metering_c, fuel->reference->state.metering_c);
    for (size_t i = 0; i < BC_COUNT(LIKE); i++) {
        bc_unit like;

        if (bc_unit_parse(LIKE[i], &like, NULL) == BC_OK && bc_unit_matches(&unit, &like)) {
            *mol_per_s = bc_unit_to_si(&unit, value) / per_mol[i];
            if (!(*mol_per_s >= RATE_MIN_MOL_PER_S && *mol_per_s <= RATE_MAX_MOL_PER_S))
                return bc_fail(err, BC_ERR_USAGE, "'%.40s' is %.3g mol/s: no burner takes that; correct the number", text, *mol_per_s);
            return BC_OK;
        }
    }
    if (bc_unit_parse("W", &power, NULL) == BC_OK && bc_unit_matches(&unit, &power))
        return bc_fail(err, BC_ERR_USAGE, "'%.40s' is a power, no fuel flow; state useful heat by --duty, or the fuel as 300m3/h", text);
    return bc_fail(err, BC_ERR_USAGE, "'%.40s' is no fuel flow; write it as 120kg/h, 300m3/h, 10000scf/h or 10kmol/h", text);
}

static bc_status take_rate(const arguments *a, const bc_subject *fuel, burn_setup *s, bc_error *err)
{
    const char *rate = a->value[OPTION_rate];
    const char *duty = a->value[OPTION_duty];
    bc_status status = BC_OK;

    if (rate && duty)
        return bc_fail(err, BC_ERR_USAGE, "--rate and --duty exclude each other; keep one of them");
    if (rate) {
        s->rate = RATE_FUEL;
        status = fuel_rate(rate, fuel, &s->fuel_mol_per_s, err);
        return status == BC_OK ? status : blame("rate", status, err);
    }
    if (!duty)
        return BC_OK;
    s->rate = RATE_DUTY;
    status = bc_measure_parse(duty, "W", NULL, &s->duty_w, err);
    if (status != BC_OK)
        return blame("duty", status, err);
    if (!(s->duty_w > 0.0))
        return bc_fail(err, BC_ERR_USAGE, "--duty: the useful heat is above zero");
    if (s->duty_w < DUTY_MIN_W || s->duty_w > DUTY_MAX_W)
        return bc_fail(err, BC_ERR_USAGE, "--duty: '%.40s' is %.3g W: no burner gives that; correct the number", duty, s->duty_w);
    return BC_OK;
}

static bc_status take_reading_unit(const char *text, const char *unit, reading *r, bc_error *err)
{
    static const struct {
        const char *unit;
        bc_emission_form form;
        double si;
    } FORMS[] = {{"ppm", BC_EMISSION_FRACTION, 1e-6},
                 {"mg/m3", BC_EMISSION_DENSITY, 1e-6},
                 {"mg/m3ref", BC_EMISSION_DENSITY_AT_REF, 1e-6},
                 {"mg/MJ", BC_EMISSION_PER_HEAT, 1e-12}};

    for (size_t i = 0; i < BC_COUNT(FORMS); i++)
        if (strcmp(FORMS[i].unit, unit) == 0) {
            r->form = FORMS[i].form;
            r->value *= FORMS[i].si;
            return BC_OK;
        }
    return bc_fail(err, BC_ERR_USAGE, "--reading %.40s: write ppm, mg/m3, mg/m3ref (at the reference oxygen) or mg/MJ behind the number", text);
}

/* One of nox=120ppm, co=50mg/m3 ... */
static bc_status take_reading(const char *text, reading *r, bc_error *err)
{
    static const struct {
        const char *word, *name;
        bc_pollutant pollutant;
    } POLLUTANTS[] = {{"nox", "NOx as NO2", BC_POLLUTANT_NOX}, {"co", "CO", BC_POLLUTANT_CO}, {"so2", "SO2", BC_POLLUTANT_SO2}};
    const char *equals = strchr(text, '=');
    char word[16];
    const char *rest = "";

    if (!equals || !bc_text_copy(word, sizeof word, text, (size_t)(equals - text)))
        return bc_fail(err, BC_ERR_USAGE, "--reading %.40s: write a reading as nox=120ppm or co=50mg/m3", text);
    for (size_t i = 0; i < BC_COUNT(POLLUTANTS); i++) {
        if (!bc_text_same(POLLUTANTS[i].word, word))
            continue;
        r->pollutant = POLLUTANTS[i].pollutant;
        r->name = POLLUTANTS[i].name;
        const bc_status status = bc_number_prefix(equals + 1, &r->value, &rest, err);

        if (status != BC_OK)
            return blame("reading", status, err);
        if (r->value < 0.0 || r->value > READING_MAX)
            return bc_fail(err, BC_ERR_USAGE, "--reading %.40s: a reading is neither negative nor above 1e6", text);
        return take_reading_unit(text, rest, r, err);
    }
    return bc_fail(err, BC_ERR_USAGE, "--reading: '%s' is none of nox, co, so2", word);
}

static bc_status take_readings(const arguments *a, burn_setup *s, bc_error *err)
{
    const char *list = a->value[OPTION_reading];

    while (list && *list != '\0') {
        const size_t length = strcspn(list, ",");
        char one[48];

        if (s->reading_count == READINGS_MAX || !bc_text_copy(one, sizeof one, list, length))
            return bc_fail(err, BC_ERR_USAGE, "--reading: more than %d readings, or one too long", READINGS_MAX);
        const bc_status status = take_reading(one, &s->readings[s->reading_count], err);

        if (status != BC_OK)
            return status;
        s->reading_count++;
        list += length + (list[length] == ',');
    }
    if (s->reading_count > 0 && !a->value[OPTION_flue_o2] && !a->value[OPTION_excess] && !a->value[OPTION_lambda])
        return bc_fail(err, BC_ERR_USAGE, "--reading belongs to the oxygen it was read at; state that, as --flue-o2 3.2 (or --excess, --lambda)");
    return BC_OK;
}

static bc_status take_conditions(const arguments *a, burn_setup *s, bc_error *err)
{
    bc_burn_case *c = &s->physics;
    bc_status status = take_temperature(a, OPTION_fuel_temp, "fuel-temp", &c->fuel_k, err);

    if (status == BC_OK)
        status = take_temperature(a, OPTION_oxidant_temp, "oxidant-temp", &c->oxidant_k, err);
    if (status == BC_OK)
        status = take_temperature(a, OPTION_flue_temp, "flue-temp", &c->exit_k, err);
    if (status == BC_OK && a->value[OPTION_pressure]) {
        status = bc_measure_parse(a->value[OPTION_pressure], "Pa", NULL, &c->p_pa, err);
        if (status != BC_OK)
            return blame("pressure", status, err);
    }
    if (status == BC_OK)
        status = take_share(a, OPTION_so3, "so3", &c->so3_conversion, err);
    if (status == BC_OK)
        status = take_share(a, OPTION_casing_loss, "casing-loss", &c->casing_loss, err);
    if (status == BC_OK)
        status = take_share(a, OPTION_reference_o2, "reference-o2", &s->reference_o2, err);
    if (status == BC_OK && !(s->reference_o2 >= 0.0 && s->reference_o2 < BC_EMISSION_AIR_EU))
        return bc_fail(err, BC_ERR_USAGE, "--reference-o2: %.6g %% is not from 0 to below %g %%, the oxygen of air", 100.0 * s->reference_o2,
                       100.0 * BC_EMISSION_AIR_EU);
    return status;
}

/* Lack of oxidant has no useful heat and no flue gas of complete combustion that these could apply to. */
static bc_status check_rich(const arguments *a, double lambda, bc_error *err)
{
    static const struct {
        int option;
        const char *word;
    } COMPLETE[] = {{OPTION_rate, "rate"}, {OPTION_duty, "duty"}, {OPTION_casing_loss, "casing-loss"}, {OPTION_so3, "so3"},
                    {OPTION_reading, "reading"}, {OPTION_reference_o2, "reference-o2"}, {OPTION_working, "working"}};

    for (size_t i = 0; i < BC_COUNT(COMPLETE) && lambda < 1.0; i++)
        if (a->value[COMPLETE[i].option])
            return bc_fail(err, BC_ERR_USAGE, "--%s needs complete combustion, but the air factor is %.6g; leave it out, or state 1 or more",
                           COMPLETE[i].word, lambda);
    return BC_OK;
}

bc_status burn_setup_from(const arguments *a, const bc_subject *fuel, burn_setup *setup, bc_error *err)
{
    burn_setup s = {.physics = bc_burn_case_default(&fuel->gas), .reference_o2 = 0.03};
    bc_status status = take_conditions(a, &s, err);

    if (status == BC_OK)
        status = take_oxidant(a, &s, err);
    if (status == BC_OK)
        status = take_humidity(a, &s, err);
    if (status == BC_OK)
        status = take_lambda(a, &s, err);
    if (status == BC_OK)
        status = check_rich(a, s.physics.lambda, err);
    if (status == BC_OK)
        status = take_rate(a, fuel, &s, err);
    if (status == BC_OK)
        status = take_readings(a, &s, err);
    if (status == BC_OK)
        *setup = s;
    return status;
}
