/* SPDX-License-Identifier: MIT */
/* blend_shares.c - the words in front of the gases: numbers, rest, a range, free. */
#include "base/error_internal.h"
#include "base/text.h"
#include "bluecone/number.h"
#include "cli/blend_case.h"

#include <math.h>
#include <stdlib.h>
#include <string.h>

#define POINTS_MAX 100000   /* of a sweep */
#define DEFAULT_STEPS 10.0
#define ROUNDING 1e-9       /* of a sum of shares that should be one */

/* A number in per cent, a % behind it allowed; *rest is what follows. */
static bc_status take_percent(const char *text, double *fraction, const char **rest, bc_error *err)
{
    double percent = 0.0;
    const bc_status status = bc_number_prefix(text, &percent, rest, err);

    if (status != BC_OK) {
        if (err)
            err->status = BC_ERR_USAGE;
        return BC_ERR_USAGE;
    }
    if (percent < 0.0)
        return bc_fail(err, BC_ERR_USAGE, "the share '%.40s' is negative; correct it", text);
    *rest += **rest == '%';
    *fraction = percent / 100.0;
    return BC_OK;
}

static bc_status refuse_share(const char *word, bc_error *err)
{
    char shown[BC_WORD_MAX];

    bc_text_show(shown, sizeof shown, word);
    return bc_fail(err, BC_ERR_USAGE, "'%s' stands where a share belongs, in front of its gas; write per cent as 20, rest, free, or a range as 0..30/5", shown);
}

static bc_status check_range(const share_word *s, const char *word, bc_error *err)
{
    if (!(s->high > s->low) || s->high > 1.0 + ROUNDING)
        return bc_fail(err, BC_ERR_USAGE, "the range '%.40s' does not rise within 0 to 100 %%; correct it", word);
    if (!(s->step > 0.0) || (s->high - s->low) / s->step > POINTS_MAX)
        return bc_fail(err, BC_ERR_USAGE, "the step of '%.40s' makes no table of up to %d rows; correct it", word, POINTS_MAX);
    return BC_OK;
}

/* A decimal point eats one of the two dots of "0..30": the number in front is cut out by hand. */
static bc_status take_range(share_word *s, const char *word, const char *dots, bc_error *err)
{
    char low[BC_WORD_MAX];
    const char *rest = NULL;
    bc_status status = BC_OK;

    if (!bc_text_copy(low, sizeof low, word, (size_t)(dots - word)) || low[0] == '\0')
        return refuse_share(word, err);
    status = take_percent(low, &s->low, &rest, err);
    if (status == BC_OK && *rest != '\0')
        return refuse_share(word, err);
    if (status == BC_OK)
        status = take_percent(dots + 2, &s->high, &rest, err);
    s->step = (s->high - s->low) / DEFAULT_STEPS;
    if (status == BC_OK && *rest == '/')
        status = take_percent(rest + 1, &s->step, &rest, err);
    if (status == BC_OK && *rest != '\0')
        return refuse_share(word, err);
    s->kind = SHARE_RANGE;
    return status == BC_OK ? check_range(s, word, err) : status;
}

static bc_status take_share(share_word *s, const char *word, bc_error *err)
{
    const char *dots = strstr(word, "..");
    const char *rest = NULL;

    *s = (share_word){.kind = SHARE_FIXED};
    if (strcmp(word, "rest") == 0) {
        s->kind = SHARE_REST;
        return BC_OK;
    }
    if (strcmp(word, "free") == 0) {
        s->kind = SHARE_FREE;
        return BC_OK;
    }
    if (dots)
        return take_range(s, word, dots, err);
    if (bc_number_prefix(word, &s->value, &rest, NULL) != BC_OK)
        return refuse_share(word, err);
    const bc_status status = take_percent(word, &s->value, &rest, err);

    return status == BC_OK && *rest != '\0' ? refuse_share(word, err) : status;
}

/* Keeps what kinds of shares there are; each of `rest` and a range stands once. */
static bc_status count_share(blend_case *c, size_t i, bc_error *err)
{
    const share_word *s = &c->share[i];

    if (s->kind == SHARE_REST && c->rest != NO_PART)
        return bc_fail(err, BC_ERR_USAGE, "'rest' stands twice; at most one part can be the rest");
    if (s->kind == SHARE_RANGE && c->swept != NO_PART)
        return bc_fail(err, BC_ERR_USAGE, "there are two ranges; one share can be swept at a time");
    if (s->kind == SHARE_REST)
        c->rest = i;
    if (s->kind == SHARE_RANGE)
        c->swept = i;
    c->free_count += s->kind == SHARE_FREE;
    c->fixed += s->kind == SHARE_FIXED ? s->value : 0.0;
    return BC_OK;
}

/* Which kinds of shares go together. */
static bc_status check_kinds(const blend_case *c, bc_error *err)
{
    if (c->swept != NO_PART && c->free_count > 0)
        return bc_fail(err, BC_ERR_USAGE, "a range and free shares cannot stand together; fix one of them");
    if (c->swept != NO_PART && c->rest == NO_PART)
        return bc_fail(err, BC_ERR_USAGE, "a range needs a part that gives way; write rest as the share of one");
    if (c->free_count == 1 && c->rest == NO_PART)
        return bc_fail(err, BC_ERR_USAGE, "a single free share has no freedom; write free or rest for a second part");
    return BC_OK;
}

static bc_status check_sum(const blend_case *c, bc_error *err)
{
    const double most = c->fixed + (c->swept != NO_PART ? c->share[c->swept].high : 0.0);
    const bool open = c->rest != NO_PART || c->free_count > 0;

    if (open && most > 1.0 + ROUNDING)
        return bc_fail(err, BC_ERR_USAGE, "the shares add up to %.6g %%, which leaves nothing for the rest; correct them", 100.0 * most);
    if (!open && !(c->fixed > 0.0))
        return bc_fail(err, BC_ERR_USAGE, "all shares are zero; give one of them a number above zero");
    return BC_OK;
}

bc_status blend_take_shares(blend_case *c, bc_error *err)
{
    c->swept = NO_PART;
    c->rest = NO_PART;
    for (size_t i = 0; i < c->count; i++) {
        bc_status status = take_share(&c->share[i], c->a->argument[2 * i], err);

        if (status == BC_OK)
            status = count_share(c, i, err);
        if (status != BC_OK)
            return status;
    }
    const bc_status status = check_kinds(c, err);

    return status == BC_OK ? check_sum(c, err) : status;
}

void blend_fixed_shares(const blend_case *c, double share[])
{
    for (size_t i = 0; i < c->count; i++)
        share[i] = c->share[i].value;
    if (c->rest != NO_PART)
        share[c->rest] = fmax(1.0 - c->fixed, 0.0);
    for (size_t i = 0; c->rest == NO_PART && i < c->count; i++)
        share[i] /= c->fixed;
}
