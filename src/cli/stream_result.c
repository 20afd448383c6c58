/* SPDX-License-Identifier: MIT */
/* stream_result.c - from the amounts of a row to its figures, and the room for them. */
#include "cli/stream_result.h"

#include "base/digits.h"
#include "base/error_internal.h"
#include "supply/row.h"

#include <math.h>
#include <stdio.h>
#include <stdlib.h>
#include <string.h>

#define CALIBRATION_NEAR 5e-4 /* mole fraction: analysers reproduce their calibration gas to a few hundredths of a per cent */
#define MIX 0x9E3779B97F4A7C15U /* 2^64 over the golden ratio, as of Knuth's multiplicative hashing */

void stream_put(stream_batch *b, const char *text, size_t length)
{
    memcpy(b->out + b->out_length, text, length);
    b->out_length += length;
}

/* What the results of a row take at most, behind the row itself: figures, verdict, reason with every sign doubled, headings
 * of NDJSON. */
static size_t most_of(const stream_plan *p)
{
    return p->column_count + p->figure_count * (sizeof ((stream_cells *)0)->figure[0] + STREAM_HEADING_MAX + 8) + sizeof ((stream_cells *)0)->verdict
        + 6 * STREAM_REASON_MAX + 512;
}

static bool grow(void **items, size_t size, size_t count)
{
    void *more = realloc(*items, size * count);

    if (!more)
        return false;
    *items = more;
    return true;
}

size_t stream_limits(const stream_plan *p)
{
    return p->contract && p->contract->limit_count > 0 ? p->contract->limit_count : 1;
}

static bool grow_rows(const stream_plan *p, stream_batch *b)
{
    const size_t room = b->room > 0 ? 2 * b->room : 1024;

    if (!grow((void **)&b->marks, sizeof *b->marks, room))
        return false;
    if (p->keeps && !grow((void **)&b->figures, sizeof *b->figures, room * p->figure_count))
        return false;
    if (p->contract && !grow((void **)&b->limits, sizeof *b->limits, room * stream_limits(p)))
        return false;
    b->room = room;
    return true;
}

bool stream_make_room(const stream_plan *p, stream_batch *b, size_t length)
{
    const size_t needed = b->out_length + 2 * length + most_of(p); /* NDJSON escapes what is no JSON */

    if (b->count == b->room && !grow_rows(p, b))
        return false;
    if (needed <= b->out_room)
        return true;
    if (!grow((void **)&b->out, 1, 2 * needed))
        return false;
    b->out_room = 2 * needed;
    return true;
}

void stream_reading_start(stream_reading *r)
{
    memset(r->amounts, 0, sizeof r->amounts);
    r->sum = 0.0;
    r->fingerprint = 0;
    r->flags = 0;
    r->has_time = false;
    r->zoned = false;
    r->time_s = 0.0;
    r->flow = -1.0;
    r->empty_count = 0;
    r->reason[0] = '\0';
}

void stream_reading_miss(stream_reading *r, size_t column)
{
    r->flags |= 1U << STREAM_empty;
    r->empty[r->empty_count++] = (unsigned char)column;
}

void stream_reading_add(const stream_plan *p, stream_reading *r, size_t column, double value)
{
    const stream_column *c = &p->columns[column];
    const double share = value * c->fraction;
    uint64_t bits = 0;

    r->sum += share;
    for (size_t i = 0; i < c->share_count; i++) {
        const stream_share *to = &p->shares[c->first_share + i];

        r->amounts[to->species] += share * to->moles;
    }
    memcpy(&bits, &value, sizeof bits);
    r->fingerprint = (r->fingerprint ^ bits) * MIX;
    r->fingerprint ^= r->fingerprint >> 32;
}

static bool is_calibration(const stream_plan *p, const bc_gas *gas)
{
    for (size_t i = 0; i < bc_species_count(); i++)
        if (fabs(gas->x[i] - p->calibration.x[i]) > CALIBRATION_NEAR)
            return false;
    return true;
}

/* The first figure that a gas does not have is told of. */
static void add_reason(stream_reading *r, const char *id, const bc_error *err)
{
    const bool named = strncmp(err->message, id, strlen(id)) == 0;

    if (r->reason[0] == '\0')
        (void)snprintf(r->reason, sizeof r->reason, "%.40s%s%.150s", named ? "" : id, named ? "" : ": ", err->message);
}

static void add_figure(const stream_plan *p, size_t i, const bc_subject *subject, stream_cells *cells, double *kept, stream_reading *r)
{
    const stream_figure *f = &p->figures[i];
    double value = 0.0;
    bc_error err BC_UNFILLED;

    if (bc_quantity_value(f->quantity, subject, &value, &err) != BC_OK) {
        add_reason(r, bc_quantity_at(f->quantity)->id, &err);
        *kept = (double)NAN;
        return;
    }
    value = bc_unit_from_si(&f->shown, bc_unit_to_si(&f->own, value));
    *kept = value;
    if (isfinite(value) && !p->drops)
        cells->length[i] = (unsigned char)bc_digits_print(value, p->digits, p->mark, cells->figure[i]);
}

static void add_verdict(const stream_plan *p, const stream_mark *mark, char *verdict)
{
    const bc_contract *c = p->contract;
    const uint64_t all = c->limit_count == 64 ? UINT64_MAX : ((uint64_t)1 << c->limit_count) - 1;
    const uint64_t told = mark->broken ? mark->broken : all & ~mark->known;
    size_t used = (size_t)snprintf(verdict, VERDICT_MAX, "%s", mark->broken ? "outside:" : told ? "not judged:" : "inside");

    for (size_t i = 0; i < c->limit_count; i++)
        if (told >> i & 1U)
            used += (size_t)snprintf(verdict + used, VERDICT_MAX - used, " %s", c->limits[i].id);
}

static bool counts(const stream_plan *p, const bc_limit *limit, size_t column)
{
    const stream_column *c = &p->columns[column];

    if (limit->kind == BC_LIMIT_QUANTITY || limit->kind == BC_LIMIT_INDEX)
        return false;
    for (size_t i = 0; i < c->share_count; i++)
        if (limit->weight[p->shares[c->first_share + i].species] > 0.0)
            return true;
    return false;
}

/* What was not measured may have been anything: a limit that counts it stays open, unless the rest alone is above its
 * maximum. Quantities are left: what is missing from their sum is flagged. */
static void leave_open(const stream_plan *p, const stream_reading *r, const double values[], stream_mark *mark)
{
    for (size_t i = 0; i < p->contract->limit_count; i++) {
        const bc_limit *limit = &p->contract->limits[i];
        const uint64_t bit = (uint64_t)1 << i;
        const bool above = (mark->broken & bit) != 0 && limit->has_max && values[i] > limit->max;
        bool missing = false;

        for (size_t k = 0; k < r->empty_count && !missing; k++)
            missing = counts(p, limit, r->empty[k]);
        if (!missing || above)
            continue;
        mark->known &= ~bit;
        mark->broken &= ~bit;
    }
}

static bc_status judge(const stream_plan *p, stream_batch *b, const stream_reading *r, const bc_gas *gas, stream_mark *mark, bc_error *err)
{
    double *values = b->limits + b->count * stream_limits(p);
    const bc_status status = row_judge(p->contract, gas, values, &mark->known, &mark->broken, err);

    if (status == BC_OK)
        leave_open(p, r, values, mark);
    return status;
}

static bool make_gas(const stream_plan *p, const stream_reading *r, bc_gas *gas, bc_subject *subject, bc_error *err)
{
    if (r->reason[0] != '\0') {
        (void)bc_fail(err, BC_ERR_INPUT, "%s", r->reason);
        return false;
    }
    if (!(r->sum >= BC_SUM_MIN && r->sum <= BC_SUM_MAX)) {
        const bool fractions = 100.0 * r->sum >= BC_SUM_MIN && 100.0 * r->sum <= BC_SUM_MAX;

        (void)bc_fail(err, BC_ERR_INPUT, "its components add up to %.6g %%, not to 100 %%%s", 100.0 * r->sum,
                      fractions ? "; if they are fractions of one, add --shares fraction" : "");
        return false;
    }
    return bc_gas_from_amounts(r->amounts, gas, err) == BC_OK && bc_subject_make(&p->reference, gas, NULL, subject, err) == BC_OK;
}

/* A flow of nothing carries no heat; a row is good without its flow, too. */
static void take_power(const stream_plan *p, double flow, const bc_gas *gas, stream_mark *mark)
{
    bc_per_amount amount = p->flow;

    amount.si *= flow;
    mark->has_power = amount.si > 0.0 && row_power_w(&p->reference, gas, &amount, &mark->power_w, NULL) == BC_OK;
}

void stream_evaluate(const stream_plan *p, stream_batch *b, stream_reading *r, stream_mark *mark, stream_cells *cells)
{
    bc_gas gas BC_UNFILLED;
    bc_subject subject BC_UNFILLED;
    bc_error err BC_UNFILLED;
    double kept = 0.0;

    memset(cells->length, 0, p->figure_count);
    cells->verdict[0] = '\0';
    mark->good = make_gas(p, r, &gas, &subject, &err) && (!p->contract || judge(p, b, r, &gas, mark, &err) == BC_OK);
    if (!mark->good) {
        (void)snprintf(r->reason, sizeof r->reason, "%.*s", STREAM_REASON_MAX - 1, err.message);
        return;
    }
    if (p->contract)
        add_verdict(p, mark, cells->verdict);
    if (p->keeps && r->flow >= 0.0)
        take_power(p, r->flow, &gas, mark);
    if (log_sum_is_off(r->sum))
        r->flags |= 1U << STREAM_off;
    if (p->has_calibration && is_calibration(p, &gas))
        r->flags |= 1U << STREAM_calibration;
    mark->wobbe = subject.value.wobbe_gross_j_per_m3;
    for (size_t i = 0; i < p->figure_count; i++)
        add_figure(p, i, &subject, cells, p->keeps ? &b->figures[b->count * p->figure_count + i] : &kept, r);
}

void stream_add_mark(stream_batch *b, stream_mark *mark, const stream_reading *r)
{
    mark->flags = r->flags;
    mark->has_time = r->has_time;
    mark->zoned = r->zoned;
    mark->time_s = r->time_s;
    mark->fingerprint = r->fingerprint;
    if (!mark->good && b->refused++ == 0) {
        b->first_refused = b->count;
        memcpy(b->reason, r->reason, sizeof b->reason);
    }
    b->marks[b->count++] = *mark;
}
