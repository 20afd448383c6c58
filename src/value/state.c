/* SPDX-License-Identifier: MIT */
/* state.c - reading, checking and telling reference states. */
#include "bluecone/state.h"

#include "base/compiler.h"
#include "base/error_internal.h"
#include "base/text.h"
#include "bluecone/units.h"

#include <math.h>
#include <stdio.h>
#include <string.h>

#define SAME_C 0.01 /* 15.55 C and 60 F = 15.5556 C are one column of the standard */
#define F60_C ((60.0 - 32.0) / 1.8)

bc_state bc_state_default(void)
{
    return (bc_state){.combustion_c = 15.0, .metering_c = 15.0, .metering_pa = BC_P0_PA, .saturated = false, .edition = 2016};
}

static bool is_one_of(double t_c, const double columns[], size_t count)
{
    for (size_t i = 0; i < count; i++)
        if (fabs(t_c - columns[i]) < SAME_C)
            return true;
    return false;
}

bool bc_state_standard_combustion(const bc_state *state)
{
    static const double COLUMNS[] = {0.0, 15.0, 20.0, 25.0, F60_C};

    return is_one_of(state->combustion_c, COLUMNS, state->edition == 2016 ? 5 : 4);
}

bool bc_state_standard_metering(const bc_state *state)
{
    static const double COLUMNS[] = {0.0, 15.0, 20.0, F60_C};

    return is_one_of(state->metering_c, COLUMNS, state->edition == 2016 ? 4 : 3);
}

bc_status bc_state_check(const bc_state *s, bc_error *err)
{
    if (s->edition != 1995 && s->edition != 2016)
        return bc_fail(err, BC_ERR_USAGE, "ISO 6976 has the editions 1995 and 2016, not %d", s->edition);
    if (!(s->combustion_c >= 0.0 && s->combustion_c <= 100.0))
        return bc_fail(err, BC_ERR_RANGE, "the combustion temperature %.6g C is outside 0 to 100 C", s->combustion_c);
    if (!(s->metering_c >= BC_METERING_T_MIN_C && s->metering_c <= BC_METERING_T_MAX_C))
        return bc_fail(err, BC_ERR_RANGE, "the metering temperature %.6g C is outside %g to %g C, the range of the summation factors; Fahrenheit is written 60F",
                       s->metering_c, BC_METERING_T_MIN_C, BC_METERING_T_MAX_C);
    if (!(s->metering_pa >= BC_METERING_P_MIN_PA && s->metering_pa <= BC_METERING_P_MAX_PA))
        return bc_fail(err, BC_ERR_RANGE, "the metering pressure %.6g kPa is outside 90 to 110 kPa, the range of ISO 6976",
                       s->metering_pa * 1e-3);
    return BC_OK;
}

static bc_status take_temperature(const char *text, size_t length, double *t_c, bc_error *err)
{
    char part[BC_WORD_MAX];
    double t_k = 0.0;

    if (!bc_text_copy(part, sizeof part, text, length) || part[0] == '\0')
        return bc_fail(err, BC_ERR_USAGE, "a reference state is written combustion/metering temperature, as 15/15 or 60F/60F@14.73psi (bluecone list states)");
    const bc_status status = bc_measure_parse(part, "K", "C", &t_k, err);

    if (status != BC_OK)
        return bc_fail(err, BC_ERR_USAGE, "'%s' in the reference state is not a temperature; write it as 15, 60F or 288.15K", part);
    *t_c = t_k - 273.15;
    if (fabs(*t_c - round(*t_c)) < 1e-9) /* 288.15 K - 273.15 K is 15 C and not 14.99999999999998 */
        *t_c = round(*t_c);
    return status;
}

bc_status bc_state_parse(const char *text, bc_state *state, bc_error *err)
{
    bc_state s = *state;
    const char *at = strchr(text, '@');
    const size_t length = at ? (size_t)(at - text) : strlen(text);
    const char *slash = memchr(text, '/', length);

    if (!slash)
        return bc_fail(err, BC_ERR_USAGE, "a reference state is written combustion/metering temperature, as 15/15 or 60F/60F@14.73psi (bluecone list states)");
    bc_status status = take_temperature(text, (size_t)(slash - text), &s.combustion_c, err);

    if (status == BC_OK)
        status = take_temperature(slash + 1, length - (size_t)(slash - text) - 1, &s.metering_c, err);
    if (status != BC_OK)
        return status;
    s.metering_pa = BC_P0_PA;
    if (at && bc_measure_parse(at + 1, "Pa", "kPa", &s.metering_pa, err) != BC_OK)
        return bc_fail(err, BC_ERR_USAGE, "'%.40s' in the reference state is not a pressure; write it as 101.325kPa or 14.73psi", at + 1);
    status = bc_state_check(&s, err);
    if (status == BC_OK)
        *state = s;
    return status;
}

static void describe_temperature(double t_c, char *text, size_t size)
{
    if (fabs(t_c - F60_C) < 1e-3)
        (void)snprintf(text, size, "60 F");
    else
        (void)bc_text_format(text, size, "%.6g C", t_c);
}

void bc_state_describe(const bc_state *state, char *text, size_t size)
{
    char combustion[32];
    char metering[32];

    describe_temperature(state->combustion_c, combustion, sizeof combustion);
    describe_temperature(state->metering_c, metering, sizeof metering);
    (void)bc_text_format(text, size, "combustion %s, metering %s and %.7g kPa, %s, ISO 6976:%d", combustion, metering,
                   state->metering_pa * 1e-3, state->saturated ? "saturated with water" : "water as stated", state->edition);
}
