/* SPDX-License-Identifier: MIT */
/* gas_json_plain.c - the JSON that databases hold by the million, read in one pass: names without escapes, plain numbers.
 *
 * It says yes only to what the general reader (gas_json.c) would say yes to with the same figures; everything else,
 * be it right or wrong, is left to that one. */
#include "sqlite/gas_json_internal.h"

#include "base/digits.h"

typedef struct {
    const char *at, *end;
} scan;

static void skip_blanks(scan *s)
{
    while (s->at < s->end && (*s->at == ' ' || *s->at == '\n' || *s->at == '\t' || *s->at == '\r'))
        s->at++;
}

static bool take_sign(scan *s, char sign)
{
    skip_blanks(s);
    if (s->at == s->end || *s->at != sign)
        return false;
    s->at++;
    return true;
}

/* A text of printable ASCII without a backslash. */
static bool take_name(scan *s, word *name)
{
    if (!take_sign(s, '"'))
        return false;
    name->text = s->at;
    while (s->at < s->end && *s->at >= 0x20 && *s->at < 0x7f && *s->at != '"' && *s->at != '\\')
        s->at++;
    name->length = (size_t)(s->at - name->text);
    return take_sign(s, '"') && name->text[name->length] == '"';
}

/* JSON allows neither a sign in front, nor 01, .5 or 5. as others do. */
static bool take_number(scan *s, double *value)
{
    skip_blanks(s);
    if (s->end - s->at < 2 || *s->at < '0' || *s->at > '9' || (*s->at == '0' && s->at[1] >= '0' && s->at[1] <= '9'))
        return false;
    s->at = bc_digits_scan(s->at, s->end, '.', value);
    return s->at && s->at[-1] != '.';
}

static bool take_members(connection *c, scan *s, gas_sum *sum, json_taken *taken)
{
    for (int count = 0; count < BC_ENTRY_MAX; count++) {
        double percent = 0.0;
        size_t index = 0;
        word name;

        if (!take_name(s, &name) || !take_sign(s, ':') || !take_number(s, &percent))
            return false;
        if (connection_component(c, &name, &index, NULL) != BC_OK || !json_take(taken, &c->components[index]))
            return false;
        gas_sum_add(sum, &c->components[index], percent);
        if (!take_sign(s, ','))
            return true;
    }
    return false;
}

bool gas_json_plain(connection *c, const word *w, gas_sum *sum)
{
    scan s = {w->text, w->text + w->length};
    json_taken taken = {{false}};

    gas_sum_start(sum);
    connection_start_gas(c);
    if (!take_sign(&s, '{') || !take_members(c, &s, sum, &taken) || !take_sign(&s, '}'))
        return false;
    skip_blanks(&s);
    return s.at == s.end;
}
