/* SPDX-License-Identifier: MIT */
/* gases.c - gases and states of the command line, and what a report says of them. */
#include "base/error_internal.h"
#include "base/text.h"
#include "cli/cli.h"

#include <math.h>
#include <stdio.h>
#include <string.h>
#include <unistd.h>

#define WATER_TOLD  1e-6 /* relative: a gas saturated by ourselves is not more than saturated */
#define ORIGIN_TOLD 1e-6 /* a smaller mole fraction moves no figure in its fifth digit, whatever its heat */

/* A file is read as it is; only a name needs the folders of bundled gases. */
static bc_status find(const char *word, bc_composition *composition, bc_error *err)
{
    folders f = {.count = 0};

    if (access(word, F_OK) != 0)
        folders_find(&f);
    return bc_composition_find(word, f.path, f.count, composition, err);
}

bc_status gas_load(const char *word, loaded_gas *gas, bc_error *err)
{
    const bc_status status = find(word, &gas->composition, err);

    if (status != BC_OK)
        return status;
    gas->gas = gas->composition.gas;
    gas->scattered = gas->composition.has_uncertainty;
    gas->air = 0.0;
    gas->repeated = false;
    gas->recipe[0] = '\0';
    (void)snprintf(gas->name, sizeof gas->name, "%s", gas->composition.name);
    return BC_OK;
}

bc_status state_from(const arguments *a, bc_state *state, bc_error *err)
{
    bc_state s = bc_state_default();
    const char *edition = a->value[OPTION_edition];

    s.saturated = a->value[OPTION_saturated] != NULL;
    if (edition) {
        if (strcmp(edition, "1995") != 0 && strcmp(edition, "2016") != 0)
            return bc_fail(err, BC_ERR_USAGE, "--edition %.20s: ISO 6976 has the editions 1995 and 2016; write one of them", edition);
        s.edition = strcmp(edition, "1995") == 0 ? 1995 : 2016;
    }
    if (a->value[OPTION_at]) {
        const bc_status status = bc_state_parse(a->value[OPTION_at], &s, err);

        if (status != BC_OK)
            return status;
    }
    *state = s;
    return BC_OK;
}

static void warn_state(report *r, const bc_state *state)
{
    char text[256];

    if (!bc_state_standard_combustion(state)) {
        (void)snprintf(text, sizeof text, "ISO 6976:%d has no column for combustion at %.6g C: heats are from the formation balance.",
                       state->edition, state->combustion_c);
        report_add_warning(r, text);
    }
    if (!bc_state_standard_metering(state)) {
        (void)snprintf(text, sizeof text, "ISO 6976:%d has no column for metering at %.6g C: summation factors are interpolated%s.",
                       state->edition, state->metering_c, state->metering_c > 20.0 ? " (extrapolated beyond 20 C)" : "");
        report_add_warning(r, text);
    }
    if (state->edition == 1995 && fabs(state->metering_pa - BC_P0_PA) > 0.5)
        report_add_warning(r, "The 1995 edition meters at 101.325 kPa only: another pressure follows the 2016 formula.");
}

void report_state_of(report *r, const bc_state *state)
{
    char text[160];
    report_state shown = {.present = true, .combustion_c = state->combustion_c, .metering_c = state->metering_c,
                                .metering_kpa = state->metering_pa * 1e-3, .saturated = state->saturated, .edition = state->edition,
                                .text = text};

    char brief[48];

    bc_state_describe(state, text, sizeof text);
    state_text(state, brief, sizeof brief);
    (void)snprintf(shown.brief, sizeof shown.brief, "%s%s", brief, state->edition == 1995 ? " 1995" : "");
    report_set_state(r, &shown);
    warn_state(r, state);
}

/* The species of a gas whose figure has an origin, as a list; "" when there is none. */
static void list_origin(const bc_subject *s, const unsigned char origins[], bc_origin origin, char *text, size_t size)
{
    text[0] = '\0';
    for (size_t i = 0; i < bc_species_count(); i++) {
        const size_t used = strlen(text);

        if (s->gas.x[i] >= ORIGIN_TOLD && origins[i] == (unsigned char)origin && used + 40 < size)
            (void)snprintf(text + used, size - used, "%s%s", used ? ", " : "", bc_species_id(i));
    }
}

/* A warning whose format has one %s for the gas and one for the species. */
static void warn_species(report *r, const char *gas, const char *species, const char *what)
{
    char text[480];

    if (species[0] == '\0')
        return;
    (void)snprintf(text, sizeof text, "%.100s: %s %.240s.", gas, what, species);
    report_add_warning(r, text);
}

static void warn_origins(report *r, const char *gas, const bc_subject *s)
{
    const bc_reference *reference = s->reference;
    char species[240];

    if (bc_state_standard_combustion(&reference->state)) {
        list_origin(s, reference->heat_origin, BC_ORIGIN_FORMATION, species, sizeof species);
        warn_species(r, gas, species, "not in ISO 6976, heat from the formation balance:");
    }
    list_origin(s, reference->heat_origin, BC_ORIGIN_OTHER_EDITION, species, sizeof species);
    warn_species(r, gas, species, "heat from the other edition of ISO 6976:");
    list_origin(s, reference->factor_origin, BC_ORIGIN_OTHER_EDITION, species, sizeof species);
    warn_species(r, gas, species, "summation factor from the other edition of ISO 6976:");
    list_origin(s, reference->factor_origin, BC_ORIGIN_ESTIMATE, species, sizeof species);
    warn_species(r, gas, species, "summation factor estimated (virial or homologous), in no edition of ISO 6976:");
}

static void warn_range(report *r, const char *gas, const bc_subject *s)
{
    char text[300];

    if (bc_value_in_range(&s->value))
        return;
    (void)snprintf(text, sizeof text, "%.100s: the compression factor %.4f is not above 0.9, the limit of the volume formulas of ISO 6976: figures per m3 are outside its range.",
                   gas, s->value.z);
    report_add_warning(r, text);
}

/* Water that cannot stay vapour where the gas is metered: the formulas count it as vapour all the same. */
static void warn_wet(report *r, const char *gas, const bc_subject *s)
{
    const bc_state *state = &s->reference->state;
    bc_gas saturated;
    size_t water = 0;
    char text[400];

    if (bc_species_find("water", &water, NULL) != BC_OK || s->gas.x[water] <= 0.0
        || bc_gas_saturated(&s->gas, state->metering_c + 273.15, state->metering_pa, &saturated, NULL) != BC_OK
        || s->gas.x[water] <= saturated.x[water] * (1.0 + WATER_TOLD))
        return;
    (void)snprintf(text, sizeof text, "%.100s: holds %.4g mol %% water, more than the %.4g mol %% that stay vapour at the metering state: "
                   "figures per m3 count all of it as vapour; --saturated meters the gas without the excess.",
                   gas, 100.0 * s->gas.x[water], 100.0 * saturated.x[water]);
    report_add_warning(r, text);
}

static void describe_source(const loaded_gas *gas, char *text, size_t size)
{
    const bc_composition *c = &gas->composition;

    if (gas->recipe[0] != '\0')
        (void)snprintf(text, size, "%s", gas->recipe);
    else if (c->bundled[0] != '\0')
        (void)snprintf(text, size, "bundled gas %s; %s", c->bundled, c->origin[0] ? c->origin : "no source stated");
    else if (c->path[0] != '\0' && c->origin[0] != '\0')
        (void)snprintf(text, size, "%.250s; %s", c->path, c->origin);
    else
        (void)snprintf(text, size, "%s", c->path[0] != '\0' ? c->path : "literal");
}

/* What was done to the composition as read. The last remark on a gas with strange oxygen advises to take
 * the air out: where that was done, it is said instead. */
static void warn_remarks(report *r, const loaded_gas *gas)
{
    const bc_composition *c = &gas->composition;
    const size_t advice = gas->air > 0.0 && c->air_suspected ? 1 : 0;
    char text[BC_REMARK_BYTES + BC_NAME_MAX];

    for (size_t i = 0; i + advice < c->remark_count && !gas->repeated; i++) {
        (void)snprintf(text, sizeof text, "%.100s: %s", gas->name, c->remarks[i]);
        report_add_warning(r, text);
    }
    if (gas->air > 0.0) {
        (void)snprintf(text, sizeof text, "%.100s: %.3g %% of the gas taken out as air, all its oxygen with the nitrogen and argon of air.",
                       gas->name, 100.0 * gas->air);
        report_add_warning(r, text);
    }
}

/* True for a gas whose own air puts it between the limits of flammability of what is left without it, those
 * taken wider by their error; or that holds all its oxygen. */
static bool is_explosive(const bc_subject *s)
{
    bc_gas pure;
    double air = 0.0;
    bc_flammability f;

    if (s->value.net_j_per_mol < 1.0)
        return false;
    if (bc_oxygen_demand(&s->gas) <= 0.0)
        return true;
    if (bc_gas_air_free(&s->gas, &pure, &air, NULL) != BC_OK || air < 0.05 || bc_flammability_of(&pure, &f, NULL) != BC_OK || !f.has_lfl)
        return false;
    return 1.0 - air > f.lfl * (1.0 - BC_LFL_ERROR) && (!f.has_ufl || 1.0 - air < f.ufl * (1.0 + BC_UFL_ERROR));
}

/* A flammable mixture is no gas to sell or burn: nothing must read as if it were. */
static void warn_explosive(report *r, const char *gas, const bc_subject *s)
{
    char text[300];

    if (!is_explosive(s))
        return;
    (void)snprintf(text, sizeof text, "%.100s: DANGER: with the oxygen it holds the gas is a flammable mixture; it may explode as it is.", gas);
    report_add_warning(r, text);
}

size_t report_gas_of(report *r, const loaded_gas *gas, const bc_subject *subject)
{
    const bc_composition *c = &gas->composition;
    char source[BC_FILE_MAX + 64];

    describe_source(gas, source, sizeof source);
    const size_t index = report_add_gas(r, gas->name, source, c->sum);

    for (size_t i = 0; i < bc_species_count(); i++)
        if (subject->gas.x[i] > 0.0)
            report_add_fraction(r, index, bc_species_id(i), subject->gas.x[i]);
    report_add_input(r, c->path);
    warn_remarks(r, gas);
    if (!gas->repeated)
        warn_origins(r, gas->name, subject);
    warn_range(r, gas->name, subject);
    warn_explosive(r, gas->name, subject);
    warn_wet(r, gas->name, subject);
    return index;
}
