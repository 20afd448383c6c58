/* SPDX-License-Identifier: MIT */
/* fuzz_options.c - everything that reads one word: the first byte says which, the rest is the word. */
#include "fuzz_gas.h"

#include "cli/log_header.h"

static void read_number(const char *text)
{
    double value = 47.25;
    const char *rest = NULL;
    bc_error err;

    if (fuzz_answer(bc_number_parse(text, &value, &err), &err)) {
        fuzz_require(isfinite(value));
        /* the locale is that of C here */
        const double want = strtod(text, NULL);

        fuzz_require(!(value < want) && !(value > want));
    } else {
        fuzz_require(!(value < 47.25) && !(value > 47.25));
    }
    if (fuzz_answer(bc_number_prefix(text, &value, &rest, &err), &err)) {
        fuzz_require(isfinite(value));
        fuzz_require(rest > text && rest <= text + strlen(text));
    }
}

static void read_state(const char *text)
{
    bc_state state = bc_state_default();
    char words[160];
    bc_error err;

    if (!fuzz_answer(bc_state_parse(text, &state, &err), &err))
        return;
    fuzz_require(bc_state_check(&state, &err) == BC_OK);
    bc_state_describe(&state, words, sizeof words);
    fuzz_require_text(words);
}

static void read_unit(const char *text)
{
    bc_unit unit;
    bc_error err;

    if (!fuzz_answer(bc_unit_parse(text, &unit, &err), &err))
        return;
    fuzz_require(isfinite(unit.factor) && unit.factor > 0.0 && isfinite(unit.offset));
    const double back = bc_unit_from_si(&unit, bc_unit_to_si(&unit, 37.25));

    fuzz_require(fabs(back - 37.25) < 1e-9);
}

static void read_measure(const char *text)
{
    static const char *const LIKE[][2] = {{"K", "C"}, {"Pa", "kPa"}, {"MJ/m3", NULL}, {"s", NULL}, {"1", "%"}};

    for (size_t i = 0; i < sizeof LIKE / sizeof *LIKE; i++) {
        double si = 0.0;
        bc_error err;

        if (fuzz_answer(bc_measure_parse(text, LIKE[i][0], LIKE[i][1], &si, &err), &err))
            fuzz_require(isfinite(si));
    }
}

static void read_per_amount(const char *text)
{
    bc_per_amount p = {.given = false};
    char currency[BC_CURRENCY_MAX];
    bc_error err;

    if (fuzz_answer(bc_price_parse(text, &p, currency, &err), &err)) {
        fuzz_require_per_amount(&p);
        fuzz_require_text(currency);
    }
    if (fuzz_answer(bc_intensity_parse(text, &p, &err), &err))
        fuzz_require_per_amount(&p);
    if (fuzz_answer(bc_flow_parse(text, &p, &err), &err))
        fuzz_require(isfinite(p.si) && p.si > 0.0);
}

static void read_time(const char *text)
{
    double time_s = 0.0;
    double again_s = 0.0;
    bool zoned = false;
    char words[BC_LOG_TIME_TEXT];
    bc_error err;

    if (!fuzz_answer(bc_log_time_parse(text, &time_s, &zoned, &err), &err))
        return;
    fuzz_require(isfinite(time_s));
    bc_log_time_text(time_s, words);
    fuzz_require_text(words);
    if (time_s >= 0.0 && time_s < 253402300800.0) { /* up to the year 9999 */
        fuzz_require(bc_log_time_parse(words, &again_s, &zoned, &err) == BC_OK);
        fuzz_require(fabs(again_s - time_s) < 1.0); /* the text has no fractions of seconds */
    }
}

static void read_name(const char *text)
{
    size_t index = 0;
    bc_error err;

    if (fuzz_answer(bc_species_find(text, &index, &err), &err))
        fuzz_require(index < bc_species_count());
    if (fuzz_answer(bc_quantity_find(text, &index, &err), &err))
        fuzz_require(index < bc_quantity_count());
    if (fuzz_answer(bc_index_find(text, &index, &err), &err))
        fuzz_require(bc_index_at(index) != NULL);
}

/* WORD, UNIT, bounds: a limit as a caller states it, a line each. */
static void read_limit(const char *text)
{
    static bc_contract contract;
    const bc_state state = bc_state_default();
    const double min = 0.5;
    char *word = fuzz_text((const uint8_t *)text, strlen(text));
    char *unit = strchr(word, '\n');
    bc_error err;

    if (unit)
        *unit++ = '\0';
    fuzz_require(bc_contract_start(&state, &contract, &err) == BC_OK);
    if (fuzz_answer(bc_contract_add(&contract, word, unit ? unit : "", &min, NULL, &err), &err)) {
        fuzz_require(contract.limit_count == 1);
        fuzz_require_text(contract.limits[0].unit);
    } else {
        fuzz_require(contract.limit_count == 0);
    }
    free(word);
}

/* A heading of a log in the cells of a line. */
static void read_heading(const char *text)
{
    static char cells[LOG_COLUMNS_MAX][LOG_CELL_MAX];
    static log_header header;
    size_t count = 0;
    bc_error err;

    log_header_start(&header, "log");
    (void)log_header_shares(&header, text);
    log_header_start(&header, "log");
    for (const char *p = text; count < LOG_COLUMNS_MAX; p++) {
        const size_t length = strcspn(p, "\n");

        (void)snprintf(cells[count++], LOG_CELL_MAX, "%.*s", (int)length, p);
        p += length;
        if (*p == '\0')
            break;
    }
    if (!fuzz_answer(log_header_take(&header, cells, count, 1, &err), &err))
        return;
    log_header_tell_ignored(&header);
    fuzz_require(header.column_count == count && log_header_count(&header, LOG_COMPONENT) > 0);
    for (size_t i = 0; i < count; i++)
        for (size_t k = 0; k < BC_SPECIES_CAPACITY; k++)
            fuzz_require(isfinite(header.columns[i].parts[k]) && header.columns[i].parts[k] >= 0.0);
}

int LLVMFuzzerTestOneInput(const uint8_t *data, size_t size)
{
    static void (*const READERS[])(const char *) = {read_number, read_state, read_unit,  read_measure, read_per_amount,
                                                    read_time,   read_name,  read_limit, read_heading};

    if (size == 0)
        return 0;
    char *text = fuzz_text(data + 1, size - 1);

    READERS[(size_t)(data[0] - '0') % (sizeof READERS / sizeof *READERS)](text);
    free(text);
    return 0;
}
