/* SPDX-License-Identifier: MIT */
/* test_burner_file.c - reading burner files: every key, every refusal with its line. */
#include "support.h"

#include "bluecone/burner.h"

#define HEAD "[burner]\ntype = premix\ncontrol = fixed\n"

static bc_burner read_ok(const char *text)
{
    bc_burner b;
    bc_error err;

    memset(&b, 0, sizeof b);
    assert_ok(bc_burner_read(write_scratch(text, strlen(text)), &b, &err), &err);
    return b;
}

static void refuse(const char *text, int line, const char *words)
{
    bc_burner b = {.lambda = 47.11};
    bc_error err;
    const bc_status status = bc_burner_read(write_scratch(text, strlen(text)), &b, &err);

    assert_refused_at(text, status, &err, BC_ERR_INPUT, words);
    assert_int_equal(err.line, line);
    assert_string_equal(err.file, scratch_path());
    assert_within(b.lambda, 47.11, 0.0);
}

static void a_full_file_is_taken_in_the_units_it_states(void **state)
{
    const bc_burner b = read_ok("[burner]\nname = Boiler 2\ntype = engine\ncontrol = trim-gas\nmetering = mass\ninput = 2.5 MW\ninput_basis = gross\n"
                                "gas_pressure = 50 mbarg\norifice = 12.5\norifices = 4\ndischarge = 0.85\nambient_pressure = 98.7 kPa\n"
                                "gas_temperature = 59 F\n[air]\nflue_o2 = 3.1 %\no2_basis = wet\ntemperature = 220 C\ndew_point = 7.5\ntrim_range = 12\n"
                                "[flue]\ntemperature = 182 C\ncasing_loss = 0.7\n[limits]\ninput_min = 93\ninput_max = 104 %\nlambda_min = 1.08\n"
                                "o2_min = 1.5\no2_max = 6\nflame_min = 1500 C\nflame_max = 1950 C\nvelocity_min = 85\nvelocity_max = 125\n"
                                "methane_number_min = 72\n");

    (void)state;
    assert_string_equal(b.name, "Boiler 2");
    assert_int_equal(b.type, BC_BURNER_ENGINE);
    assert_int_equal(b.control, BC_CONTROL_TRIM_GAS);
    assert_int_equal(b.dosing, BC_DOSING_MASS);
    assert_true(b.has_input && b.input_is_gross && b.has_pressure && b.has_orifice && b.has_air_dew);
    assert_within(b.input_w, 2.5e6, 1e-6);
    assert_within(b.gas_pa, 5000.0, 1e-9);
    assert_within(b.orifice_m, 0.0125, 1e-15);
    assert_within(b.ambient_pa, 98700.0, 1e-9);
    assert_within(b.gas_k, 288.15, 1e-9);
    assert_int_equal(b.air_setting, BC_AIR_BY_FLUE_O2);
    assert_int_equal(b.o2_basis, BC_FLUE_WET);
    assert_within(b.flue_o2, 0.031, 1e-15);
    assert_within(b.air_dew_k, 280.65, 1e-9);
    assert_within(b.trim_range, 0.12, 1e-15);
    assert_within(b.flue_k, 455.15, 1e-9);
    assert_within(b.casing_loss, 0.007, 1e-15);
    assert_within(b.input.min, 0.93, 1e-15);
    assert_within(b.input.max, 1.04, 1e-15);
    assert_within(b.co_lambda, 1.08, 1e-15);
    assert_within(b.flame.max, 2223.15, 1e-9);
    assert_within(b.velocity.max, 1.25, 1e-15);
    assert_true(b.methane_number.has_min && !b.methane_number.has_max);
    assert_within(b.methane_number.min, 72.0, 1e-12);
}

static void what_is_not_stated_has_the_documented_default(void **state)
{
    const bc_burner b = read_ok(HEAD);

    (void)state;
    assert_string_equal(b.name, "premix burner");
    assert_false(b.has_input || b.has_pressure || b.has_orifice || b.o2.has_min || b.flame.has_max || b.methane_number.has_min);
    assert_within(b.lambda, 1.2, 0.0);
    assert_within(b.gas_k, 288.15, 0.0);
    assert_within(b.flue_k, 423.15, 0.0);
    assert_within(b.input.min, 0.95, 0.0);
    assert_within(b.co_lambda, 1.05, 0.0);
}

static void a_pressure_is_above_the_atmosphere_with_and_without_its_g(void **state)
{
    (void)state;
    assert_within(read_ok(HEAD "gas_pressure = 22 mbar\n").gas_pa, 2200.0, 1e-9);
    assert_within(read_ok(HEAD "gas_pressure = 22 mbarg\n").gas_pa, 2200.0, 1e-9);
}

static void excess_and_lambda_say_the_same(void **state)
{
    (void)state;
    assert_within(read_ok(HEAD "[air]\nexcess = 17\n").lambda, 1.17, 1e-15);
    assert_within(read_ok(HEAD "[air]\nlambda = 1.17\n").lambda, 1.17, 0.0);
}

static void every_key_tells_its_value_in_words(void **state)
{
    const bc_burner b = read_ok(HEAD "gas_pressure = 22 mbar\n[air]\nexcess = 17\n");
    char text[64];
    size_t told = 0;

    (void)state;
    for (size_t i = 0; i < bc_burner_key_count(); i++) {
        const bc_burner_key *key = bc_burner_key_at(i);

        bc_burner_key_text(&b, i, text, sizeof text);
        told += text[0] != '\0';
        if (strcmp(key->key, "gas_pressure") == 0)
            assert_string_equal(text, "22 mbar");
        if (strcmp(key->key, "excess") == 0)
            assert_string_equal(text, "17 %");
        if (strcmp(key->key, "lambda") == 0 || strcmp(key->key, "flue_o2") == 0 || strcmp(key->key, "trim_range") == 0)
            assert_string_equal(text, "");
        if (strcmp(key->key, "control") == 0)
            assert_string_equal(text, "fixed");
        assert_true(strlen(key->meaning) > 5);
    }
    assert_in_range(told, 10, bc_burner_key_count());
    assert_null(bc_burner_key_at(bc_burner_key_count()));
}

static void what_is_wrong_is_refused_with_its_line(void **state)
{
    (void)state;
    refuse("[burner]\ntype = premix\n", 0, "control");
    refuse("[burner]\ncontrol = fixed\n", 0, "type");
    refuse("[burner]\ntype = premixed-ish\ncontrol = fixed\n", 2, "premixed-ish|nozzle-mix");
    refuse(HEAD "input = 2.5\n", 4, "unit");
    refuse(HEAD "input = 2.5 kg\n", 4, "kg");
    refuse(HEAD "input = -2 MW\n", 4, "outside");
    refuse(HEAD "gas_pressure = 5 mm\n", 4, "pressure");
    refuse(HEAD "imput = 2 MW\n", 4, "imput|input");
    refuse(HEAD "[aer]\nlambda = 1.2\n", 5, "section [aer]");
    refuse(HEAD "[air]\nlambda = 1.2\nexcess = 20\n", 5, "keep one");
    refuse(HEAD "[air]\nlambda = 0.2\n", 5, "outside 0.5 to 10");
    refuse(HEAD "[air]\nexcess = nan\n", 5, "nan");
    refuse(HEAD "[air]\ntrim_range = 10\n", 5, "trim|fixed");
    refuse(HEAD "metering = mass\n", 4, "trim|fixed");
    refuse(HEAD "[air]\nprimary = 50\n", 5, "entrained|fixed");
    refuse(HEAD "[limits]\no2_min = 5\no2_max = 3\n", 6, "o2_max is below");
    refuse(HEAD "control = pneumatic\n", 4, "again");
    refuse("[burner]\nname = 0123456789012345678901234567890123456789012345678901234567890123456789012345678901234567890123456789\n", 2, "longer");
}

static void a_file_that_is_not_there_is_named(void **state)
{
    bc_burner b;
    bc_error err;

    (void)state;
    assert_refused(bc_burner_read("/nonexistent/burner.ini", &b, &err), &err, BC_ERR_INPUT, "cannot be opened");
    assert_string_equal(err.file, "/nonexistent/burner.ini");
}

/* Bytes changed, dropped and doubled at random: refused or read, never a crash and never a burner out of its ranges. */
static void random_damage_never_crashes_and_never_passes_a_wrong_value(void **state)
{
    static const char WHOLE[] = HEAD "input = 2.5 MW\ngas_pressure = 50 mbarg\norifice = 12.5\n[air]\nexcess = 17 %\ndew_point = 8\n"
                                "[limits]\no2_min = 1.5\nflame_max = 1950 C\n";
    chance c = {.state = 20141};

    (void)state;
    for (int round = 0; round < 2000; round++) {
        char text[sizeof WHOLE];
        bc_burner b;
        bc_error err;

        memcpy(text, WHOLE, sizeof WHOLE);
        for (size_t hits = 1 + chance_below(&c, 4); hits > 0; hits--)
            text[chance_below(&c, sizeof WHOLE - 1)] = (char)(chance_below(&c, 255) + 1);
        if (bc_burner_read(write_scratch(text, sizeof WHOLE - 1), &b, &err) != BC_OK) {
            assert_true(strlen(err.message) > 15);
            continue;
        }
        assert_true(b.lambda >= 0.5 && b.lambda <= 11.0 && b.ambient_pa > 0.0 && (!b.has_input || b.input_w >= 1.0));
    }
}

int main(void)
{
    const struct CMUnitTest tests[] = {
        cmocka_unit_test(a_full_file_is_taken_in_the_units_it_states),
        cmocka_unit_test(what_is_not_stated_has_the_documented_default),
        cmocka_unit_test(a_pressure_is_above_the_atmosphere_with_and_without_its_g),
        cmocka_unit_test(excess_and_lambda_say_the_same),
        cmocka_unit_test(every_key_tells_its_value_in_words),
        cmocka_unit_test(what_is_wrong_is_refused_with_its_line),
        cmocka_unit_test(a_file_that_is_not_there_is_named),
        cmocka_unit_test(random_damage_never_crashes_and_never_passes_a_wrong_value),
    };

    return cmocka_run_group_tests_name("burner file", tests, NULL, remove_scratch);
}
