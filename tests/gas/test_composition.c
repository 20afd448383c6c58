/* SPDX-License-Identifier: MIT */
/* test_composition.c - from the words of a certificate to mole fractions, and what is said about it. */
#include "support.h"

#include "bluecone/composition.h"
#include "bluecone/steam.h"
#include "gas/species_index.h"
#include "gas/summation.h"

#include <limits.h>

#define FILES BC_SOURCE_DIR "/tests/gas/files/"
#define BUNDLED BC_SOURCE_DIR "/compositions"

/* Read into memory that is not clean: nothing may survive from it. */
static void soil(bc_composition *c)
{
    memset(c, 0x5A, sizeof *c);
}

static void read_file(const char *path, bc_composition *c)
{
    bc_error err;
    const int kept = hold_stderr();

    soil(c);
    const bc_status status = bc_composition_read(path, c, &err);

    assert_stderr_silent(kept, path);
    assert_ok(status, &err);
}

static void read_text(const char *text, bc_composition *c)
{
    read_file(write_scratch(text, strlen(text)), c);
}

static void parse(const char *literal, bc_composition *c)
{
    bc_error err;

    soil(c);
    assert_ok(bc_composition_parse(literal, c, &err), &err);
}

/* A file that is refused with its name, its line (0: none) and these words. */
static void assert_text_refused(const char *text, int line, const char *words)
{
    bc_composition c;
    bc_error err = {.status = BC_OK};
    const char *path = write_scratch(text, strlen(text));
    const int kept = hold_stderr();
    const bc_status status = bc_composition_read(path, &c, &err);

    assert_stderr_silent(kept, text);
    assert_refused_at(text, status, &err, BC_ERR_INPUT, words);
    assert_string_equal(err.file, path);
    if (err.line != line)
        fail_msg("line %d is blamed, not %d: %s\n%s", err.line, line, err.message, text);
}

static void assert_literal_refused(const char *literal, const char *words)
{
    bc_composition c;
    bc_error err = {.status = BC_OK};

    assert_refused_at(literal, bc_composition_parse(literal, &c, &err), &err, BC_ERR_INPUT, words);
    assert_string_equal(err.file, "");
    assert_int_equal(err.line, 0);
}

static void assert_same_gas(const char *label, const bc_gas *got, const bc_gas *want, double tolerance)
{
    for (size_t i = 0; i < BC_SPECIES_CAPACITY; i++)
        if (!(fabs(got->x[i] - want->x[i]) <= tolerance))
            fail_msg("%s: %s is %.12g, want %.12g", label, bc_species_id(i), got->x[i], want->x[i]);
}

/* Standard uncertainty of one mole fraction. */
static double u_of(const bc_composition *c, size_t species)
{
    double variance = 0.0;

    for (size_t k = 0; k < c->spread.count; k++)
        variance += c->spread.dx[k][species] * c->spread.dx[k][species];
    return sqrt(variance);
}

static bool remarks(const bc_composition *c, const char *words)
{
    for (size_t i = 0; i < c->remark_count; i++)
        if (strstr(c->remarks[i], words) != NULL)
            return true;
    return false;
}

/* ---- files -------------------------------------------------------------------------------------- */

static void a_certificate_is_read_as_it_is_written(void **state)
{
    bc_composition c;

    (void)state;
    read_file(FILES "june-certificate.ini", &c);
    assert_string_equal(c.name, "Works supply, June certificate");
    assert_string_equal(c.family, "natural");
    assert_string_equal(c.origin, "invented for the tests");
    assert_string_equal(c.path, FILES "june-certificate.ini");
    assert_int_equal(c.entry_count, 8);
    assert_string_equal(c.entries[6].word, "carbon dioxide");
    assert_int_equal(c.entries[6].line, 18);
    assert_within(c.sum, 1.0, 0.0);
    assert_within(c.gas.x[SPECIES_methane], 0.913046, 1e-15);
    assert_within(c.gas.x[SPECIES_nitrogen], 0.010542, 1e-15); /* 100 less the others, by hand */
    assert_within(c.gas.x[SPECIES_n_hexane], 0.6 * 0.000391, 1e-17);
    assert_true(c.has_uncertainty);
    assert_int_equal(c.remark_count, 1);
    assert_true(remarks(&c, "c6+ has no split of its own: taken as n-hexane 60 %, n-heptane 30 %, n-octane 10 %"));
}

static void order_of_keys_words_and_units_are_irrelevant(void **state)
{
    bc_composition a, b;

    (void)state;
    read_file(FILES "june-certificate.ini", &a);
    read_file(FILES "june-certificate-shuffled.ini", &b);
    assert_string_equal(b.name, "june-certificate-shuffled");
    assert_same_gas("shuffled", &b.gas, &a.gas, 1e-15);
    assert_int_equal(b.spread.count, a.spread.count);
    for (size_t i = 0; i < bc_species_count(); i++)
        assert_within_at(bc_species_id(i), u_of(&b, i), u_of(&a, i), 1e-16);
}

static void a_word_alone_is_a_species_a_cut_or_air(void **state)
{
    double parts[BC_SPECIES_CAPACITY];
    char remark[BC_REMARK_BYTES];
    bc_error err;
    size_t species = 0;
    const bc_gas air = bc_gas_air();

    (void)state;
    assert_ok(bc_composition_component("n-C4", parts, remark, &err), &err);
    assert_ok(bc_species_find("n-butane", &species, &err), &err);
    for (size_t i = 0; i < BC_SPECIES_CAPACITY; i++)
        assert_within(parts[i], i == species ? 1.0 : 0.0, 0.0);
    assert_string_equal(remark, "");
    assert_ok(bc_composition_component("C6+", parts, remark, &err), &err);
    assert_ok(bc_species_find("n-hexane", &species, &err), &err);
    assert_within(parts[species], 0.6, 0.0); /* src/data/cuts.def */
    assert_string_equal(remark, "C6+ has no split of its own: taken as n-hexane 60 %, n-heptane 30 %, n-octane 10 % (mole, common practice).");
    assert_ok(bc_composition_component("Air", parts, NULL, &err), &err);
    assert_memory_equal(parts, air.x, sizeof parts);
    assert_refused(bc_composition_component("c5+", parts, remark, &err), &err, BC_ERR_INPUT, "'c5+' has no default split");
    assert_refused(bc_composition_component("methan", parts, remark, &err), &err, BC_ERR_INPUT, "'methan'|'methane'");
    assert_memory_equal(parts, air.x, sizeof parts); /* untouched */
}

static void a_cut_may_bring_its_own_split(void **state)
{
    bc_composition c;

    (void)state;
    read_file(FILES "own-cut.ini", &c);
    assert_within(c.gas.x[SPECIES_n_heptane], 0.6 * 0.0257, 1e-15);
    assert_within(c.gas.x[SPECIES_toluene], 0.2 * 0.0257, 1e-15);
    assert_within(c.gas.x[SPECIES_n_octane], 0.2 * 0.0257, 1e-15);
    assert_int_equal(c.remark_count, 0);
}

static void a_saturated_gas_gets_the_water_of_its_temperature_and_pressure(void **state)
{
    bc_composition c;
    double p_pa = 0.0;

    (void)state;
    read_file(FILES "digester-saturated.ini", &c);
    assert_int_equal(bc_steam_pressure(310.15, &p_pa, NULL), BC_OK);
    assert_within(p_pa, 6282.0, 1.5); /* 37 C: 6.282 kPa, ASME steam tables (1999), value from memory */
    assert_within(c.gas.x[SPECIES_water], p_pa / 102.4e3, 1e-15);
    assert_within(c.gas.x[SPECIES_methane], 0.627 * (1.0 - p_pa / 102.4e3), 1e-15);
    assert_within(u_of(&c, SPECIES_methane), 0.0031 * (1.0 - p_pa / 102.4e3), 1e-15);
    assert_within(u_of(&c, SPECIES_water), 0.0, 0.0);
    assert_true(remarks(&c, "Saturated with water at 37 C and 102.4 kPa: 6.135 mol % water added"));
    assert_false(c.air_suspected);
}

static void water_counts_as_listed_only_when_the_file_says_so(void **state)
{
    bc_composition c;

    (void)state;
    read_text("[gas]\nmoisture = as-analysed\n[components]\nmethane = 97.6\nwater = 2.4\n", &c);
    assert_within(c.gas.x[SPECIES_water], 0.024, 1e-15);
    assert_text_refused("[gas]\nmoisture = dry\n[components]\nmethane = 97.6\nwater = 2.4\n", 0, "water is listed|moisture says dry|as-analysed");
    assert_text_refused("[components]\nmethane = 97.6\nH2O = 2.4\n", 0, "water is listed|moisture says dry");
    assert_text_refused("[gas]\nmoisture = saturated\n[components]\nmethane = 97.6\nwater = 2.4\n", 0, "moisture says saturated");
    read_text("[components]\nmethane = 100\nwater = 0\n", &c);
    assert_within(c.gas.x[SPECIES_methane], 1.0, 0.0);
}

static void a_gas_saturated_beyond_its_boiling_point_is_bad_input(void **state)
{
    (void)state;
    assert_text_refused("[gas]\nmoisture = saturated\nmeasured_at = 81 C, 40 kPa\n[components]\nmethane = 100\n", 0, "boils|higher pressure");
}

static void every_unit_of_shares_means_the_same_gas(void **state)
{
    static const char *const TEXTS[] = {
        "[components]\nmethane = 93.75\nethane = 6.2386\nH2S = 0.0114\n",
        "[gas]\nunit = percent\n[components]\nmethane = 93.75 %\nethane = 6.2386\nH2S = 114 ppm\n",
        "[gas]\nunit = fraction\n[components]\nmethane = 0.9375\nethane = 0.062386\nH2S = 1.14e-4\n",
        "[gas]\nunit = ppm\n[components]\nmethane = 937500\nethane = 6.2386%\nH2S = 114\n",
        "[gas]\nUnit = Percent\n[Components]\nmethane = +93.75\nethane = \"6.2386\"\nH2S = 0.0114 ; odorant\n",
    };
    bc_composition first, c;

    (void)state;
    read_text(TEXTS[0], &first);
    assert_within(first.gas.x[SPECIES_hydrogen_sulfide], 1.14e-4, 1e-17);
    for (size_t i = 1; i < COUNT(TEXTS); i++) {
        read_text(TEXTS[i], &c);
        assert_same_gas(TEXTS[i], &c.gas, &first.gas, 1e-15);
        assert_within_at(TEXTS[i], c.sum, 1.0, 1e-15);
    }
}

static void uncertainties_are_absolute_or_relative(void **state)
{
    bc_composition c;

    (void)state;
    read_text("[gas]\ncorrelation = none\n[components]\nmethane = 93.1\nethane = 6.9\n[uncertainty]\nmethane = 0.17\nethane = 2.3 %\n", &c);
    assert_int_equal(c.closure, BC_CLOSURE_NONE);
    assert_within(u_of(&c, SPECIES_methane), 0.0017, 1e-16);
    assert_within(u_of(&c, SPECIES_ethane), 0.023 * 0.069, 1e-16);
    read_text("[gas]\nunit = ppm\ncorrelation = none\n[components]\nmethane = 931000\nethane = 69000\n[uncertainty]\nCH4 = 1700\n", &c);
    assert_within(u_of(&c, SPECIES_methane), 0.0017, 1e-16);
    assert_within(u_of(&c, SPECIES_ethane), 0.0, 0.0);
}

/* x = y/S: the covariance is J diag(u2) J^T with J_ij = (delta_ij - x_i)/S; by hand for two components. */
static void normalising_ties_the_fractions_together(void **state)
{
    bc_composition c;
    const double s = 0.996, xm = 0.9273 / s, xe = 0.0687 / s;

    (void)state;
    read_text("[components]\nmethane = 92.73\nethane = 6.87\n[uncertainty]\nmethane = 0.17\nethane = 0.08\n", &c);
    const double want = sqrt(pow((1.0 - xm) * 0.0017 / s, 2) + pow(xm * 0.0008 / s, 2));

    assert_within(xm + xe, 1.0, 1e-15);
    assert_within(u_of(&c, SPECIES_methane), want, 1e-15);
    assert_within(u_of(&c, SPECIES_ethane), want, 1e-15); /* what one gains the other loses */
    for (size_t k = 0; k < c.spread.count; k++)
        assert_within(c.spread.dx[k][SPECIES_methane] + c.spread.dx[k][SPECIES_ethane], 0.0, 1e-17);
}

static void a_component_by_difference_takes_up_the_scatter_of_the_others(void **state)
{
    bc_composition c;

    (void)state;
    parse("methane=91.2~0.13,ethane=5.9~0.07,nitrogen=rest", &c);
    assert_within(u_of(&c, SPECIES_methane), 0.0013, 1e-16);
    assert_within(u_of(&c, SPECIES_ethane), 0.0007, 1e-16);
    assert_within(u_of(&c, SPECIES_nitrogen), sqrt(0.0013 * 0.0013 + 0.0007 * 0.0007), 1e-16);
}

static void an_uncertainty_must_belong_to_a_stated_share(void **state)
{
    (void)state;
    assert_text_refused("[components]\nmethane = 91\nethane = 9\n[uncertainty]\npropane = 0.1\n", 5, "'propane'|does not stand in [components]|add or remove");
    assert_text_refused("[components]\nmethane = 91\nethane = rest\n[uncertainty]\nethane = 0.1\n", 5, "is the rest|remove this line");
    assert_text_refused("[components]\nmethane = 91\nethane = 9\n[uncertainty]\nmethane = -0.1\n", 5, "cannot be negative");
    assert_text_refused("[components]\nmethane = 91\nethane = 9\n[uncertainty]\nmethane = 0,1\n", 5, "decimal comma");
    assert_text_refused("[components]\nmethane = 91\nethane = 9\n[uncertainty]\nmethane = 500 ppm\n", 5, "only % (relative)");
    assert_text_refused("[components]\nmethane = 91\nethane = 9\n[uncertainty]\nmethane = nan\n", 5, "not a number");
}

/* ---- bases --------------------------------------------------------------------------------------- */

/* A random gas of up to a dozen components; some traces. Water stays out: files call it by name. */
static bc_gas random_gas(chance *c)
{
    double amounts[BC_SPECIES_CAPACITY] = {0.0};
    bc_gas gas;

    amounts[SPECIES_methane] = 0.1 + chance_uniform(c);
    for (int k = 0; k < 11; k++) {
        const size_t i = chance_below(c, bc_species_count());

        if (i != SPECIES_water)
            amounts[i] = pow(chance_uniform(c), 4);
    }
    assert_int_equal(bc_gas_from_amounts(amounts, &gas, NULL), BC_OK);
    return gas;
}

/* Writes a gas on another basis, each mole fraction weighted, and reads the text back. */
static void assert_round_trip(const char *basis, const bc_gas *gas, const double weight[])
{
    char text[8192];
    double sum = 0.0;
    size_t n = (size_t)snprintf(text, sizeof text, "[gas]\nbasis = %s\nunit = fraction\n[components]\n", basis);
    bc_composition c;

    for (size_t i = 0; i < bc_species_count(); i++)
        sum += gas->x[i] * weight[i];
    for (size_t i = 0; i < bc_species_count(); i++)
        if (gas->x[i] > 0.0)
            n += (size_t)snprintf(text + n, sizeof text - n, "%s = %.17g\n", bc_species_id(i), gas->x[i] * weight[i] / sum);
    read_text(text, &c);
    assert_same_gas(text, &c.gas, gas, 1e-14);
    assert_within_at(text, c.sum, 1.0, 1e-14);
}

static void mole_mass_and_volume_shares_of_random_gases_read_back_as_the_same_gas(void **state)
{
    chance c = {271828};

    (void)state;
    for (int k = 0; k < 150; k++) {
        const bc_gas gas = random_gas(&c);
        double mole[BC_SPECIES_CAPACITY], mass[BC_SPECIES_CAPACITY], volume[BC_SPECIES_CAPACITY];

        for (size_t i = 0; i < bc_species_count(); i++) {
            mole[i] = 1.0;
            mass[i] = bc_species_molar_mass_kg_per_mol(i);
            volume[i] = bc_species_z(i, 15.0);
        }
        assert_round_trip("mole", &gas, mole);
        assert_round_trip("mass", &gas, mass);
        assert_round_trip("volume", &gas, volume);
    }
}

static void mass_shares_convert_as_on_paper(void **state)
{
    bc_composition c;
    const double ch4 = 40.0 / 16.04246, co2 = 60.0 / 44.0095; /* molar masses of ISO 6976:2016 */

    (void)state;
    parse("mass:methane=40,carbon-dioxide=60", &c);
    assert_int_equal(c.basis, BC_BASIS_MASS);
    assert_within(c.gas.x[SPECIES_methane], ch4 / (ch4 + co2), 1e-12);
}

static void volume_shares_convert_with_the_compression_factors_of_the_pure_gases(void **state)
{
    bc_composition c, cold;
    const double ch4 = 87.0 / (1.0 - 0.04452 * 0.04452), c3h8 = 13.0 / (1.0 - 0.1344 * 0.1344); /* s of ISO 6976:2016, 15 C */

    (void)state;
    parse("volume:methane=87,propane=13", &c); /* EN 437 test gas G 21 */
    assert_within(c.gas.x[SPECIES_propane], c3h8 / (ch4 + c3h8), 1e-12);
    read_text("[gas]\nbasis = volume\nmeasured_at = 0 C\n[components]\nmethane = 87\npropane = 13\n", &cold);
    assert_true(cold.gas.x[SPECIES_propane] > c.gas.x[SPECIES_propane] + 1e-4);
}

static void a_cut_and_air_convert_with_the_mean_of_their_parts(void **state)
{
    bc_composition c;
    const double cut = 0.6 * 86.17536 + 0.3 * 100.20194 + 0.1 * 114.22852; /* molar masses of ISO 6976:2016 */

    (void)state;
    parse("mass:methane=97,c6+=3", &c);
    const double want = 3.0 / cut / (3.0 / cut + 97.0 / 16.04246);

    assert_within(c.gas.x[SPECIES_n_hexane], 0.6 * want, 1e-12);
    assert_within(c.gas.x[SPECIES_n_octane], 0.1 * want, 1e-12);
    parse("methane=53,air=47", &c);
    assert_within(c.gas.x[SPECIES_oxygen], 0.47 * bc_gas_air().x[SPECIES_oxygen], 1e-15);
}

static void volume_shares_of_what_is_no_gas_there_are_refused_and_never_infinite(void **state)
{
    bc_composition c;
    bc_error err = {.status = BC_OK};
    const char *text = "[gas]\nbasis = volume\nmeasured_at = -45 C\n[components]\nmethane = 99.3\nn-tridecane = 0.7\n";

    (void)state;
    if (bc_composition_read(write_scratch(text, strlen(text)), &c, &err) == BC_OK)
        for (size_t i = 0; i < bc_species_count(); i++)
            assert_true(c.gas.x[i] >= 0.0 && c.gas.x[i] <= 1.0);
    else
        assert_refused(err.status, &err, BC_ERR_INPUT, "n-tridecane|no gas");
    parse("volume:methane=99.93,naphthalene=0.07", &c);
    assert_true(c.gas.x[SPECIES_naphthalene] < 0.0035);
}

/* Z of a pure gas by the virial form falls with temperature until it is below zero: no gas. The refusal names the state. */
static void a_liquid_is_refused_at_the_temperature_of_the_volumes(void **state)
{
    (void)state;
    assert_text_refused("[gas]\nbasis = volume\nmeasured_at = -49 C\n[components]\nn-pentadecane = 1\nmethane = rest\n", 5,
                        "'n-pentadecane' is no gas at -49 C");
}

/* ISO 6976:2016 holds for Z above 0.9; each gas of the table is asked a little below and above the temperature of that. */
static void a_volume_of_a_gas_just_outside_of_iso_6976_is_remarked(void **state)
{
    size_t species = 0;
    double cold = -40.0, warm = 50.0;
    bc_composition c;
    bc_error err;

    (void)state;
    assert_int_equal(bc_species_find("n-pentane", &species, NULL), BC_OK);
    assert_true(bc_species_z(species, cold) < 0.9 && bc_species_z(species, warm) > 0.9);
    while (warm - cold > 1e-6)
        *(bc_species_z(species, 0.5 * (cold + warm)) < 0.9 ? &cold : &warm) = 0.5 * (cold + warm);
    for (int side = 0; side < 2; side++) {
        char text[160];
        const int n = snprintf(text, sizeof text, "[gas]\nbasis = volume\nmeasured_at = %.3f C\n[components]\nmethane = 98\nn-pentane = 2\n",
                               cold + (side ? 0.1 : -0.1));

        assert_ok(bc_composition_read(write_scratch(text, (size_t)n), &c, &err), &err);
        assert_int_equal(remarks(&c, "Volume share of n-pentane"), side == 0);
    }
}

/* 0 to 50 C, as remarked; the ends are inside. */
static void volumes_outside_of_0_to_50_c_are_remarked(void **state)
{
    static const struct {
        const char *at, *words;
    } ROWS[] = {{"0", NULL}, {"50", NULL}, {"-1.5", "Volume shares at -1.5 C"}, {"51", "Volume shares at 51 C"}};
    bc_composition c;
    bc_error err;

    (void)state;
    for (size_t i = 0; i < COUNT(ROWS); i++) {
        char text[160];
        const int n = snprintf(text, sizeof text, "[gas]\nbasis = volume\nmeasured_at = %s C\n[components]\nmethane = 98\nethane = 2\n", ROWS[i].at);

        assert_ok(bc_composition_read(write_scratch(text, (size_t)n), &c, &err), &err);
        assert_int_equal(remarks(&c, ROWS[i].words ? ROWS[i].words : "Volume shares at"), ROWS[i].words != NULL);
    }
}

static void a_split_may_stand_in_front_of_the_components(void **state)
{
    const char *text = "[cut c6+]\nn-hexane = 1\nn-octane = 1\n[components]\nmethane = 97\nc6+ = 3\n";
    bc_composition c;
    bc_error err;

    (void)state;
    assert_ok(bc_composition_read(write_scratch(text, strlen(text)), &c, &err), &err);
    assert_within(c.gas.x[SPECIES_n_hexane], 0.015, 1e-15);
    assert_within(c.gas.x[SPECIES_n_octane], 0.015, 1e-15);
}

/* ---- sums ---------------------------------------------------------------------------------------- */

static void a_sum_outside_98_to_102_per_cent_is_refused_with_the_sum(void **state)
{
    bc_composition c;

    (void)state;
    assert_text_refused("[components]\nmethane = 91.3\nethane = 6.6\n", 0, "add up to 97.9 %|98 to 102 %|write one of them as rest");
    assert_text_refused("[components]\nmethane = 91.3\nethane = 10.8\n", 0, "102.1 %");
    assert_literal_refused("methane=91,ethane=3", "add up to 94 %");
    parse("methane=91.5,ethane=6.5", &c);
    parse("methane=95.5,ethane=6.5", &c);
}

static void fractions_written_as_per_cent_and_the_reverse_are_recognised(void **state)
{
    (void)state;
    assert_literal_refused("methane=0.913,ethane=0.087", "look like fractions of one|unit = fraction");
    assert_text_refused("[gas]\nunit = fraction\n[components]\nmethane = 91.3\nethane = 8.7\n", 0, "look like per cent|unit = percent");
}

static void a_normalisation_is_remarked_from_0_05_per_cent_on(void **state)
{
    bc_composition c;

    (void)state;
    parse("methane=91.30,ethane=8.66", &c);
    assert_int_equal(c.remark_count, 0);
    assert_within(c.sum, 0.9996, 1e-12);
    parse("methane=91.30,ethane=8.64", &c);
    assert_int_equal(c.remark_count, 1);
    assert_true(remarks(&c, "99.94 %: normalised to 100 %"));
    assert_within(c.gas.x[SPECIES_methane], 91.30 / 99.94, 1e-14);
    parse("methane=91.30,ethane=8.76", &c);
    assert_true(remarks(&c, "100.06 %"));
}

static void the_scale_of_the_shares_does_not_move_the_gas(void **state)
{
    bc_composition a, b;

    (void)state;
    parse("methane=91.3,ethane=5.2,propane=1.7,nitrogen=1.8", &a);
    parse("methane=92.213,ethane=5.252,propane=1.717,nitrogen=1.818", &b); /* 1 % more of each */
    assert_same_gas("scaled", &b.gas, &a.gas, 1e-15);
    assert_within(b.sum, 1.01, 1e-14);
}

static void the_rest_fills_up_to_one_hundred_and_stands_once(void **state)
{
    bc_composition c;

    (void)state;
    parse("methane=91.3,nitrogen=rest,ethane=5.2", &c);
    assert_within(c.gas.x[SPECIES_nitrogen], 0.035, 1e-15);
    parse("methane=94.8,nitrogen=rest,ethane=5.2", &c);
    assert_within(c.gas.x[SPECIES_nitrogen], 0.0, 1e-12);
    assert_literal_refused("methane=95.8,nitrogen=rest,ethane=5.2", "add up to 101 %|'nitrogen = rest' would be negative");
    assert_literal_refused("methane=rest,nitrogen=rest", "'rest' stands twice");
    assert_text_refused("[components]\nmethane = 90\nethane = rest\nnitrogen = Rest\n", 4, "'rest' stands twice");
    assert_text_refused("[components]\nmethane = 100.7\nethane = rest\n", 3, "would be negative");
}

static void a_shortfall_completed_with_a_species_is_what_it_would_have_been(void **state)
{
    bc_composition c, whole;
    bc_gas completed;
    bc_error err = {.status = BC_OK};

    (void)state;
    parse("methane=92.4,ethane=4.1,nitrogen=2.2", &c);
    parse("methane=92.4,ethane=4.1,nitrogen=2.2,hydrogen=1.3", &whole);
    assert_ok(bc_composition_completed(&c, SPECIES_hydrogen, &completed, &err), &err);
    assert_same_gas("mole", &completed, &whole.gas, 1e-15);
    parse("mass:methane=92.4,ethane=4.1,nitrogen=2.2", &c);
    parse("mass:methane=92.4,ethane=4.1,nitrogen=2.2,n-hexane=1.3", &whole);
    assert_ok(bc_composition_completed(&c, SPECIES_n_hexane, &completed, &err), &err);
    assert_same_gas("mass", &completed, &whole.gas, 1e-15);
    read_text("[gas]\nmoisture = saturated\nmeasured_at = 20 C\n[components]\nmethane = 98.7\n", &c);
    read_text("[gas]\nmoisture = saturated\nmeasured_at = 20 C\n[components]\nmethane = 98.7\nhydrogen = 1.3\n", &whole);
    assert_ok(bc_composition_completed(&c, SPECIES_hydrogen, &completed, &err), &err);
    assert_same_gas("saturated", &completed, &whole.gas, 1e-15);
    parse("methane=92.4,ethane=rest", &c);
    assert_refused(bc_composition_completed(&c, SPECIES_hydrogen, &completed, &err), &err, BC_ERR_USAGE, "nothing is missing");
    parse("methane=96.4,ethane=2.4", &c);
    assert_refused(bc_composition_completed(&c, bc_species_count(), &completed, &err), &err, BC_ERR_USAGE, "nothing is missing");
    parse("methane=96.4,ethane=4.4", &c);
    assert_refused(bc_composition_completed(&c, SPECIES_hydrogen, &completed, &err), &err, BC_ERR_USAGE, "nothing is missing");
}

static void closing_the_fractions_another_way_changes_the_scatter_and_not_the_gas(void **state)
{
    bc_composition c;
    bc_error err;

    (void)state;
    parse("methane=92.73~0.17,ethane=6.87~0.08", &c);
    const bc_gas before = c.gas;
    const double tied = u_of(&c, SPECIES_methane);

    assert_ok(bc_composition_close(&c, BC_CLOSURE_NONE, &err), &err);
    assert_within(u_of(&c, SPECIES_methane), 0.0017 / 0.996, 1e-15);
    assert_true(memcmp(&before, &c.gas, sizeof before) == 0);
    assert_ok(bc_composition_close(&c, BC_CLOSURE_NORMALISED, &err), &err);
    assert_within(u_of(&c, SPECIES_methane), tied, 1e-17);
}

/* ---- hostile words -------------------------------------------------------------------------------- */

static void hostile_shares_are_refused_with_their_line(void **state)
{
    static const struct {
        const char *value, *words;
    } ROWS[] = {
        {"nan", "not a number"},      {"inf", "not a number"},         {"-inf", "not a number"},     {"1e999", "outside the range"},
        {"1e-999", "outside the range"}, {"-1", "'ethane' is negative"}, {"-0.0001", "is negative"}, {"0x10", "not a number alone"},
        {"", "a number is missing"},  {"8,7", "decimal comma"},        {"1.234,5", "decimal comma"}, {"8.7 MJ", "only % or ppm"},
        {"8.7 8.7", "only % or ppm"}, {"eight", "not a number"},       {"8.7e", "only % or ppm"},    {"rests", "not a number"},
        {"'nan'", "not a number"},    {"++8.7", "not a number"},       {"8.7%%", "only % or ppm"},   {"8.7 PPM", "only % or ppm"},
    };

    (void)state;
    for (size_t i = 0; i < COUNT(ROWS); i++) {
        char text[160];

        (void)snprintf(text, sizeof text, "[components]\nmethane = 91.3\nethane = %s\n", ROWS[i].value);
        assert_text_refused(text, 3, ROWS[i].words);
    }
}

static void one_component_under_two_names_is_refused_with_both_lines(void **state)
{
    (void)state;
    assert_text_refused("[components]\nmethane = 91\nethane = 5\nCH4 = 4\n", 4, "'CH4' is the same component as 'methane' on line 2|keep one");
    assert_text_refused("[components]\niC4 = 91\n2-methylpropane = 9\n", 3, "same component as 'iC4'");
    assert_text_refused("[components]\nmethane = 91\nmethane = 9\n", 3, "stands here again");
    assert_literal_refused("methane=91,CH4=9", "'methane' and 'CH4' are the same component");
}

static void unknown_and_ambiguous_components_are_refused_with_their_line(void **state)
{
    (void)state;
    assert_text_refused("[components]\nmethane = 91\nethan = 9\n", 3, "unknown component 'ethan'|'ethane'");
    assert_text_refused("[components]\nmethane = 91\nC4H10 = 9\n", 3, "several species|n-butane, isobutane");
    assert_text_refused("[components]\nmethane = 91\nc5+ = 9\n", 3, "'c5+' has no default split|[cut c5+]");
}

static void unknown_sections_keys_and_choices_suggest_what_there_is(void **state)
{
    (void)state;
    assert_text_refused("[gas]\nname = x\n[component]\nmethane = 100\n", 4, "unknown section [component]|[components]");
    assert_text_refused("[gas]\nfamly = natural\n[components]\nmethane = 100\n", 2, "unknown key 'famly'|known are name, family");
    assert_text_refused("[gas]\nbasis = weight\n[components]\nmethane = 100\n", 2, "basis = weight|mole, volume, mass");
    assert_text_refused("[gas]\nunit = permille\n[components]\nmethane = 100\n", 2, "percent, fraction, ppm");
    assert_text_refused("[gas]\nmoisture = wet\n[components]\nmethane = 100\n", 2, "dry, as-analysed, saturated");
    assert_text_refused("[gas]\ncorrelation = full\n[components]\nmethane = 100\n", 2, "normalised, none");
    assert_text_refused("[gas]\nbasis =\n[components]\nmethane = 100\n", 2, "is not known");
    assert_text_refused("[gas]\nname = x\n", 0, "no section [components]|list the components");
}

static void a_measuring_state_without_sense_is_refused(void **state)
{
    static const struct {
        const char *value, *words;
    } ROWS[] = {
        {"25/0", "one temperature and one pressure"}, {"15,5 C", "does not fit"}, {"warm", "not a number"}, {"-60 C", "-50 to 100 C"}, {"15 kPa", "does not fit"},
        {"15 C, 101", "no unit"},   {"15 C, 0.5 kPa", "1 kPa to 1000 bar"}, {"120 C", "-50 to 100 C"}, {"15 C, 2000 bar", "1 kPa to 1000 bar"},
        {"15 C, 101.325 kPa, dry", "unknown unit"}, {"", "missing"}, {"288.15 M", "unknown unit"}, {"-50.1 C", "-50 to 100 C"},
        {"100.1 C", "-50 to 100 C"}, {"15 C, 0.999 kPa", "1 kPa to 1000 bar"}, {"15 C, 1000.1 bar", "1 kPa to 1000 bar"},
    };

    (void)state;
    for (size_t i = 0; i < COUNT(ROWS); i++) {
        char text[160];

        (void)snprintf(text, sizeof text, "[gas]\nmeasured_at = %s\n[components]\nmethane = 100\n", ROWS[i].value);
        assert_text_refused(text, 2, ROWS[i].words);
    }
}

/* BC_PRINTED_BYTES with the final NUL: 47 are kept whole, 48 refused. */
static void a_printed_figure_is_kept_whole_or_refused(void **state)
{
    char figure[BC_PRINTED_BYTES + 1], text[200];
    bc_composition c;

    (void)state;
    for (int longer = 0; longer < 2; longer++) {
        (void)snprintf(figure, sizeof figure, "41.2%0*d MJ/m3", BC_PRINTED_BYTES - 1 + longer - 10, 0);
        (void)snprintf(text, sizeof text, "[components]\nmethane = 100\n[printed]\nhhv = %s\n", figure);
        assert_int_equal(strlen(figure), BC_PRINTED_BYTES - 1 + longer);
        if (longer) {
            assert_text_refused(text, 4, "shorten it");
            continue;
        }
        read_text(text, &c);
        assert_string_equal(c.printed[0].text, figure);
    }
    (void)snprintf(text, sizeof text, "[components]\nmethane = 100\n[printed]\nh%0*d = 41.2 MJ/m3\n", BC_COMPONENT_MAX - 2, 0);
    read_text(text, &c);
    assert_int_equal(strlen(c.printed[0].id), BC_COMPONENT_MAX - 1);
    (void)snprintf(text, sizeof text, "[components]\nmethane = 100\n[printed]\nh%0*d = 41.2 MJ/m3\n", BC_COMPONENT_MAX - 1, 0);
    assert_text_refused(text, 4, "shorten it");
}

static void the_ends_that_a_measuring_state_may_have_are_inside(void **state)
{
    static const struct {
        const char *value;
        double t_k, p_pa;
    } ROWS[] = {{"-50 C", 223.15, 101325.0}, {"-58 F", 223.15, 101325.0}, {"100 C", 373.15, 101325.0}, {"212 F", 373.15, 101325.0},
                {"15 C, 1 kPa", 288.15, 1e3}, {"15 C, 1000 bar", 288.15, 1e8}};

    (void)state;
    for (size_t i = 0; i < COUNT(ROWS); i++) {
        char text[160];
        bc_composition c;

        (void)snprintf(text, sizeof text, "[gas]\nmeasured_at = %s\n[components]\nmethane = 100\n", ROWS[i].value);
        read_text(text, &c);
        assert_within_at(text, c.measured_at_k, ROWS[i].t_k, 1e-9);
        assert_within_at(text, c.measured_at_pa, ROWS[i].p_pa, 1e-7);
        if (ROWS[i].t_k < 300.0 && ROWS[i].p_pa > 5e4) { /* and can be saturated there */
            (void)snprintf(text, sizeof text, "[gas]\nmoisture = saturated\nmeasured_at = %s\n[components]\nmethane = 100\n", ROWS[i].value);
            read_text(text, &c);
            assert_true(c.gas.x[SPECIES_water] > 0.0);
        }
    }
}

static void a_cut_needs_an_entry_and_a_sensible_split(void **state)
{
    (void)state;
    assert_text_refused("[components]\nmethane = 100\n[cut c6+]\nn-hexane = 1\n", 4, "the cut 'c6+' does not stand in [components]");
    assert_text_refused("[components]\nmethane = 97\nc6+ = 3\n[cut c6+]\nn-hexane = 0\n", 3, "adds up to nothing");
    assert_text_refused("[components]\nmethane = 97\nc6+ = 3\n[cut c6+]\nn-hexane = -1\nn-octane = 2\n", 5, "cannot be negative");
    assert_text_refused("[components]\nmethane = 97\nc6+ = 3\n[cut c6+]\nn-hexan = 1\n", 5, "unknown component|'n-hexane'");
    assert_text_refused("[components]\nmethane = 97\nc6+ = 3\n[cut c6+]\nn-hexane = 1\nnC6 = 1e999\n", 6, "outside the range");
}

/* Cuts with a split of their own are the only way to more components than there are species. */
static void many_components(char *text, size_t size, int cuts)
{
    size_t n = (size_t)snprintf(text, size, "[components]\n");

    for (size_t i = 0; i < 7; i++)
        n += (size_t)snprintf(text + n, size - n, "%s = 1\n", bc_species_id(i));
    for (int k = 0; k < cuts; k++)
        n += (size_t)snprintf(text + n, size - n, "c%d+ = %.17g\n", 10 + k, 93.0 / cuts);
    for (int k = 0; k < cuts; k++)
        n += (size_t)snprintf(text + n, size - n, "[cut c%d+]\nn-octane = 1\n", 10 + k);
}

static void ninety_six_components_are_read_and_ninety_seven_refused(void **state)
{
    char text[8192];
    bc_composition c;

    (void)state;
    many_components(text, sizeof text, 89);
    read_text(text, &c);
    assert_int_equal(c.entry_count, BC_ENTRY_MAX);
    assert_within(c.gas.x[SPECIES_n_octane], 0.93, 1e-12);
    many_components(text, sizeof text, 90);
    assert_text_refused(text, 98, "more than 96 components");
}

/* ---- literals ------------------------------------------------------------------------------------ */

static void literals_accept_digits_in_names_and_blanks(void **state)
{
    bc_composition c;

    (void)state;
    parse("methane=92,1-butene=5,1-3-butadiene=2,2-methylpentane=1", &c);
    assert_within(c.gas.x[SPECIES_butene_1], 0.05, 1e-15);
    assert_within(c.gas.x[SPECIES_butadiene_1_3], 0.02, 1e-15);
    parse(" methane = 92 , n butane = 8 ~ 0.3 ", &c);
    assert_within(c.gas.x[SPECIES_n_butane], 0.08, 1e-15);
    assert_within(c.entries[1].u, 0.003, 1e-17);
    assert_string_equal(c.path, "");
    assert_int_equal(c.entries[0].line, 0);
}

static void literals_that_are_none_are_refused(void **state)
{
    static const struct {
        const char *literal, *words;
    } ROWS[] = {
        {"", "composition is empty"},      {"mass:", "composition is empty"},  {"methane", "name=share"},
        {"methane=92,", "no name=share"},  {"=100", "empty or longer"},        {"methane=92,5,ethane=8", "',5,ethane=8'|decimal point"},
        {"methane=", "number is missing"}, {"methane=92;ethane=8", "not understood|commas"}, {"methane=92,ethane=8%", "'%' behind the share"},
        {"methane=92,1,3-butadiene=8", "'-' for a comma"}, {"methane=92~,ethane=8", "number is missing"},
        {"methane=92~-1,ethane=8", "negative"}, {"methane=-92,ethane=192", "negative"}, {"methane=nan,ethane=8", "not a number"},
        {"methane=1e999,ethane=8", "outside the range"}, {"methane=0x5C,ethane=8", "not understood"}, {"vol:methane=100", "unknown component"},
        {"methane=92,ethane=rest~0.1", "not a number"}, {"methane=92,,ethane=8", "no name=share"},
        {"methane=00000000000000000000000000000000000000000000000000000000000000000000000000000000000000000000092", "more than 63 characters"},
    };

    (void)state;
    for (size_t i = 0; i < COUNT(ROWS); i++)
        assert_literal_refused(ROWS[i].literal, ROWS[i].words);
}

static void a_german_locale_changes_neither_file_nor_literal(void **state)
{
    bc_composition before, after;

    (void)state;
    read_file(FILES "june-certificate.ini", &before);
    use_german_numbers();
    read_file(FILES "june-certificate.ini", &after);
    assert_same_gas("locale", &after.gas, &before.gas, 0.0);
    parse("methane=92.5,ethane=7.5", &after);
    assert_within(after.gas.x[SPECIES_ethane], 0.075, 1e-16);
    assert_text_refused("[components]\nmethane = 92,5\nethane = 7.5\n", 2, "decimal comma");
}

/* ---- air ------------------------------------------------------------------------------------------ */

static void oxygen_is_suspicious_only_where_the_family_makes_it_so(void **state)
{
    static const struct {
        const char *family;
        bool suspected;
    } ROWS[] = {{"natural", true},  {"Natural", true}, {"lng", true},     {"biomethane", true}, {"lpg", true},      {"hydrogen", true},
                {"lpg-air", false}, {"town", false},   {"landfill", false}, {"biogas", false},  {"coke-oven", false}, {"producer", false}};

    (void)state;
    for (size_t i = 0; i < COUNT(ROWS); i++) {
        char text[200];
        bc_composition c;

        (void)snprintf(text, sizeof text, "[gas]\nfamily = %s\n[components]\nmethane = 94.3\nnitrogen = 5.1\noxygen = 0.6\n", ROWS[i].family);
        read_text(text, &c);
        if (c.air_suspected != ROWS[i].suspected)
            fail_msg("family %s", ROWS[i].family);
        assert_int_equal(remarks(&c, "--air-free"), ROWS[i].suspected);
    }
}

static void without_a_family_the_gas_itself_tells_whether_oxygen_is_strange(void **state)
{
    static const struct {
        const char *literal, *why;
        bool suspected;
    } ROWS[] = {
        {"methane=96.2,nitrogen=3.3,oxygen=0.5", "a supply gas", true},
        {"methane=96.2,nitrogen=3.785,oxygen=0.015", "a trace as pipelines print it", false},
        {"propane=56,air=44", "mixed on purpose", false},
        {"methane=55,carbon-dioxide=43.5,nitrogen=0.9,oxygen=0.6", "digester gas", false},
        {"hydrogen=50,methane=30,carbon-monoxide=10,nitrogen=9,oxygen=1", "manufactured gas", false},
        /* one mark at a time of a gas that is no supply gas */
        {"methane=69.4,hydrogen=30,oxygen=0.6", "less than 70 % hydrocarbons", false},
        {"methane=95,nitrogen=1.9,oxygen=3.1", "oxygen of several per cent", false},
        {"methane=97,carbon-monoxide=0.6,nitrogen=1.9,oxygen=0.5", "carbon monoxide", false},
        {"methane=85,carbon-dioxide=10.1,nitrogen=4.4,oxygen=0.5", "much carbon dioxide", false},
        {"methane=85,methanol=5,nitrogen=9.5,oxygen=0.5", "a supply gas with methanol", true},
        {"methane=69,methanol=20,nitrogen=10.5,oxygen=0.5", "what holds oxygen is no hydrocarbon", false},
        {"methane=70.4,hydrogen=29,oxygen=0.6", "just enough hydrocarbons", true},
        {"methane=95,nitrogen=2.1,oxygen=2.9", "just little enough oxygen", true},
        {"methane=97,carbon-monoxide=0.4,nitrogen=2.1,oxygen=0.5", "a trace of carbon monoxide", true},
        {"methane=85,carbon-dioxide=9.9,nitrogen=4.6,oxygen=0.5", "some carbon dioxide", true},
        {"methane=96.2,nitrogen=3.775,oxygen=0.025", "just more than a trace", true},
    };
    bc_composition c;

    (void)state;
    for (size_t i = 0; i < COUNT(ROWS); i++) {
        parse(ROWS[i].literal, &c);
        if (c.air_suspected != ROWS[i].suspected)
            fail_msg("%s: %s", ROWS[i].literal, ROWS[i].why);
    }
    parse("methane=96.2,nitrogen=3.3,oxygen=0.5", &c);
    assert_true(remarks(&c, "0.5 % oxygen"));
    assert_true(remarks(&c, "about 2.39 % air")); /* 0.5/0.20939 */
}

/* ---- bundled gases and finding them ---------------------------------------------------------------- */

typedef struct {
    size_t count;
    char last[BC_FILE_MAX];
} walk;

/* Remarks of bundled gases are known; any other is a surprise. */
static bool is_expected_remark(const char *name, const char *remark)
{
    static const struct {
        const char *name, *start;
    } EXPECTED[] = {{"associated-gas", "The shares add up to 99.84 %"}, {"biogas", "Saturated with water at 35 C"}};

    for (size_t i = 0; i < COUNT(EXPECTED); i++)
        if (strcmp(EXPECTED[i].name, name) == 0 && strncmp(EXPECTED[i].start, remark, strlen(EXPECTED[i].start)) == 0)
            return true;
    return false;
}

static void check_bundled(const char *name, const char *path, void *data)
{
    walk *w = data;
    bc_composition c;

    read_file(path, &c);
    for (size_t i = 0; i < c.remark_count; i++)
        if (!is_expected_remark(name, c.remarks[i]))
            fail_msg("%s: %s", name, c.remarks[i]);
    if (c.family[0] == '\0' || c.origin[0] == '\0' || strcmp(c.name, name) == 0)
        fail_msg("%s has no name, family or source", name);
    assert_false(c.air_suspected);
    assert_true(strcmp(w->last, name) < 0); /* sorted */
    (void)snprintf(w->last, sizeof w->last, "%s", name);
    w->count++;
}

static void every_bundled_gas_reads_without_an_unexpected_remark_and_names_its_source(void **state)
{
    walk w = {0, ""};
    bc_error err;

    (void)state;
    assert_ok(bc_composition_each(BUNDLED, check_bundled, &w, &err), &err);
    assert_in_range(w.count, 24, 500);
}

static void a_folder_that_is_not_there_has_no_gases(void **state)
{
    walk w = {0, ""};

    (void)state;
    assert_int_equal(bc_composition_each("/nowhere/at/all", check_bundled, &w, NULL), BC_OK);
    assert_int_equal(w.count, 0);
}

static void a_gas_is_found_as_file_as_bundled_name_and_as_literal(void **state)
{
    static const char *const FOLDERS[] = {"/nowhere", BUNDLED};
    bc_composition c;
    bc_error err = {.status = BC_OK};

    (void)state;
    assert_ok(bc_composition_find(FILES "own-cut.ini", FOLDERS, 2, &c, &err), &err);
    assert_string_equal(c.name, "Cut split by the laboratory");
    assert_ok(bc_composition_find("g20", FOLDERS, 2, &c, &err), &err);
    assert_within(c.gas.x[SPECIES_methane], 1.0, 1e-15);
    assert_ok(bc_composition_find("methane=93,ethane=7", FOLDERS, 2, &c, &err), &err);
    assert_within(c.gas.x[SPECIES_ethane], 0.07, 1e-15);
    assert_refused(bc_composition_find("landfil-gas", FOLDERS, 2, &c, &err), &err, BC_ERR_INPUT, "no file or bundled gas 'landfil-gas'|'landfill-gas'");
    assert_refused(bc_composition_find("g20", FOLDERS, 1, &c, &err), &err, BC_ERR_INPUT, "no bundled gases were found|BLUECONE_PATH");
    assert_refused(bc_composition_find("g20", NULL, 0, &c, &err), &err, BC_ERR_INPUT, "no file 'g20'|no folder of bundled gases was given|methane=92");
    assert_null(strstr(err.message, "BLUECONE_PATH")); /* which the library does not read */
    assert_refused(bc_composition_find("", FOLDERS, 2, &c, &err), &err, BC_ERR_INPUT, "empty");
    assert_refused(bc_composition_find("../compositions/g20", FOLDERS, 2, &c, &err), &err, BC_ERR_INPUT, "there is no file");
    assert_refused(bc_composition_find("/tmp", FOLDERS, 2, &c, &err), &err, BC_ERR_INPUT, "directory");
}

int main(void)
{
    const struct CMUnitTest tests[] = {
        cmocka_unit_test(a_certificate_is_read_as_it_is_written),
        cmocka_unit_test(order_of_keys_words_and_units_are_irrelevant),
        cmocka_unit_test(a_word_alone_is_a_species_a_cut_or_air),
        cmocka_unit_test(a_cut_may_bring_its_own_split),
        cmocka_unit_test(a_saturated_gas_gets_the_water_of_its_temperature_and_pressure),
        cmocka_unit_test(water_counts_as_listed_only_when_the_file_says_so),
        cmocka_unit_test(a_gas_saturated_beyond_its_boiling_point_is_bad_input),
        cmocka_unit_test(every_unit_of_shares_means_the_same_gas),
        cmocka_unit_test(uncertainties_are_absolute_or_relative),
        cmocka_unit_test(normalising_ties_the_fractions_together),
        cmocka_unit_test(a_component_by_difference_takes_up_the_scatter_of_the_others),
        cmocka_unit_test(an_uncertainty_must_belong_to_a_stated_share),
        cmocka_unit_test(mole_mass_and_volume_shares_of_random_gases_read_back_as_the_same_gas),
        cmocka_unit_test(mass_shares_convert_as_on_paper),
        cmocka_unit_test(volume_shares_convert_with_the_compression_factors_of_the_pure_gases),
        cmocka_unit_test(a_cut_and_air_convert_with_the_mean_of_their_parts),
        cmocka_unit_test(volume_shares_of_what_is_no_gas_there_are_refused_and_never_infinite),
        cmocka_unit_test(a_sum_outside_98_to_102_per_cent_is_refused_with_the_sum),
        cmocka_unit_test(fractions_written_as_per_cent_and_the_reverse_are_recognised),
        cmocka_unit_test(a_normalisation_is_remarked_from_0_05_per_cent_on),
        cmocka_unit_test(the_scale_of_the_shares_does_not_move_the_gas),
        cmocka_unit_test(a_liquid_is_refused_at_the_temperature_of_the_volumes),
        cmocka_unit_test(a_volume_of_a_gas_just_outside_of_iso_6976_is_remarked),
        cmocka_unit_test(volumes_outside_of_0_to_50_c_are_remarked),
        cmocka_unit_test(a_split_may_stand_in_front_of_the_components),
        cmocka_unit_test(the_rest_fills_up_to_one_hundred_and_stands_once),
        cmocka_unit_test(a_shortfall_completed_with_a_species_is_what_it_would_have_been),
        cmocka_unit_test(closing_the_fractions_another_way_changes_the_scatter_and_not_the_gas),
        cmocka_unit_test(hostile_shares_are_refused_with_their_line),
        cmocka_unit_test(one_component_under_two_names_is_refused_with_both_lines),
        cmocka_unit_test(unknown_and_ambiguous_components_are_refused_with_their_line),
        cmocka_unit_test(unknown_sections_keys_and_choices_suggest_what_there_is),
        cmocka_unit_test(a_measuring_state_without_sense_is_refused),
        cmocka_unit_test(a_printed_figure_is_kept_whole_or_refused),
        cmocka_unit_test(the_ends_that_a_measuring_state_may_have_are_inside),
        cmocka_unit_test(a_cut_needs_an_entry_and_a_sensible_split),
        cmocka_unit_test(ninety_six_components_are_read_and_ninety_seven_refused),
        cmocka_unit_test(literals_accept_digits_in_names_and_blanks),
        cmocka_unit_test(literals_that_are_none_are_refused),
        cmocka_unit_test_teardown(a_german_locale_changes_neither_file_nor_literal, use_c_numbers),
        cmocka_unit_test(oxygen_is_suspicious_only_where_the_family_makes_it_so),
        cmocka_unit_test(without_a_family_the_gas_itself_tells_whether_oxygen_is_strange),
        cmocka_unit_test(every_bundled_gas_reads_without_an_unexpected_remark_and_names_its_source),
        cmocka_unit_test(a_folder_that_is_not_there_has_no_gases),
        cmocka_unit_test(a_gas_is_found_as_file_as_bundled_name_and_as_literal),
    };

    return cmocka_run_group_tests(tests, NULL, remove_scratch);
}
