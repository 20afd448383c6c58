/* SPDX-License-Identifier: MIT */
/* contract_limits.c - gases against the limits of a contract, and the verdict. */
#include "cli/contract_report.h"

#include <math.h>
#include <stdio.h>
#include <string.h>

/* One limit and one gas, judged or not. */
typedef struct {
    bool judged;
    bc_limit_figure figure;
    bc_assessment assessment;
    bc_error err;
} judgement;

/* What the verdict counts. */
typedef struct {
    size_t kept, likely, unlikely, broken, not_judged;
} tally;

static judgement judge(const contract_case *c, size_t limit, const subject *gas)
{
    const bc_spread *spread = gas->loaded.scattered ? &gas->loaded.composition.spread : NULL;
    judgement j = {.judged = false, .err = {.status = BC_OK}};

    j.judged = bc_limit_judge(c->contract, limit, &gas->loaded.gas, spread, &j.figure, &j.err) == BC_OK;
    if (j.judged)
        j.assessment = bc_limit_assess(&c->contract->limits[limit], &j.figure, c->k);
    return j;
}

static void count_judgement(tally *t, const judgement *j)
{
    size_t *const counts[] = {&t->kept, &t->likely, &t->unlikely, &t->broken};

    if (j->judged)
        (*counts[j->assessment.conformity])++;
    else
        t->not_judged++;
}

static void add_row(report *r, const contract_case *c, size_t index, size_t gas, const judgement *j)
{
    const bc_limit *limit = &c->contract->limits[index];
    char id[BC_LIMIT_ID_MAX];
    char unit[BC_LIMIT_ID_MAX];
    char state[64];
    char verdict[BC_MESSAGE_MAX + 16] = "";
    report_limit row = {.id = id, .unit = unit, .state = state, .verdict = verdict, .gas = gas, .has_min = limit->has_min, .has_max = limit->has_max,
                        .min = limit->min, .max = limit->max};

    (void)snprintf(id, sizeof id, "%s", limit->id);
    (void)snprintf(unit, sizeof unit, "%s", limit->unit);
    contract_state_text(c->contract, limit, state, sizeof state);
    if (j && j->judged) {
        row.has_value = row.has_percent = true;
        row.value = j->figure.value;
        row.margin = j->figure.margin;
        row.percent = 100.0 * j->figure.margin / bc_limit_scale(limit);
        row.has_uncertainty = row.has_probability = j->figure.has_u;
        row.uncertainty = j->figure.u;
        row.probability = j->assessment.probability;
        (void)snprintf(verdict, sizeof verdict, "%s", bc_conformity_text(j->assessment.conformity));
    } else if (j) {
        (void)snprintf(verdict, sizeof verdict, "not judged: %s", j->err.message);
    }
    report_add_limit(r, &row);
}

static void set_title(report *r, const contract_case *c)
{
    char title[BC_NAME_MAX + 16];

    (void)snprintf(title, sizeof title, "Limits: %s", c->contract->name);
    report_set_limits_title(r, title);
    report_lead_with_limits(r);
}

void contract_limits_alone(report *r, const contract_case *c)
{
    set_title(r, c);
    for (size_t i = 0; i < c->contract->limit_count; i++)
        add_row(r, c, i, REPORT_NO_GAS, NULL);
}

/* Whether a limit on a component or group is kept only since the analysis lists nothing of it. */
static bool is_absent(const bc_limit *limit, const subject *gas)
{
    double there = 0.0;

    if (limit->kind == BC_LIMIT_QUANTITY || limit->kind == BC_LIMIT_INDEX || limit->has_min)
        return false;
    for (size_t s = 0; s < bc_species_count(); s++)
        there += limit->weight[s] * gas->loaded.gas.x[s];
    return there <= 0.0;
}

/* An analysis without a component shows compliance only if the component was looked for. */
static void warn_absent(report *r, const contract_case *c, const subject *gas)
{
    char list[300] = "";
    char text[600];

    for (size_t i = 0; i < c->contract->limit_count; i++) {
        const bc_limit *limit = &c->contract->limits[i];
        const size_t used = strlen(list);

        if (is_absent(limit, gas))
            (void)snprintf(list + used, sizeof list - used, "%s%s", used > 0 ? ", " : "", limit->id);
    }
    if (list[0] == '\0')
        return;
    (void)snprintf(text, sizeof text, "%.100s: the analysis lists nothing of %s: counted as zero, which shows that a limit is kept only if it was looked for.",
                   gas->loaded.name, list);
    report_add_warning(r, text);
}

/* "wobbe-gross is 0.31 MJ/m3 above its maximum of 51.41". */
static void describe(const bc_limit *limit, const judgement *j, char *text, size_t size)
{
    const bool low = limit->has_min && j->figure.value - limit->min <= j->figure.margin;
    const char *unit = strcmp(limit->unit, "1") == 0 ? "" : limit->unit;
    const char *bound = low ? "minimum" : "maximum";

    if (!j->judged)
        (void)snprintf(text, size, "%s cannot be judged", limit->id);
    else if (j->figure.margin < 0.0)
        (void)snprintf(text, size, "%s is %.4g%s%s %s its %s of %.6g", limit->id, -j->figure.margin, unit[0] ? " " : "", unit, low ? "below" : "above", bound,
                       low ? limit->min : limit->max);
    else
        (void)snprintf(text, size, "%s, %.4g%s%s from its %s", limit->id, j->figure.margin, unit[0] ? " " : "", unit, bound);
}

/* Which of the judgements a list of the verdict takes. */
typedef bool picker(const judgement *j);

static bool is_broken(const judgement *j)
{
    return j->judged && j->assessment.conformity == BC_CONFORM_OUTSIDE;
}

static bool is_unlikely(const judgement *j)
{
    return j->judged && j->assessment.conformity == BC_CONFORM_UNLIKELY;
}

static bool is_likely(const judgement *j)
{
    return j->judged && j->assessment.conformity == BC_CONFORM_LIKELY;
}

static bool is_not_judged(const judgement *j)
{
    return !j->judged;
}

static void append(char *text, size_t size, const contract_case *c, const judgement all[], picker *pick)
{
    size_t told = 0;

    for (size_t i = 0; i < c->contract->limit_count; i++) {
        const size_t used = strlen(text);
        char one[200];

        if (!pick(&all[i]))
            continue;
        describe(&c->contract->limits[i], &all[i], one, sizeof one);
        (void)snprintf(text + used, size - used, "%s%s", told++ > 0 ? ", " : "", one);
    }
}

/* The limit with the least margin for its scale, of those that are judged. */
static size_t nearest(const contract_case *c, const judgement all[])
{
    size_t best = BC_LIMIT_MAX;
    double least = HUGE_VAL;

    for (size_t i = 0; i < c->contract->limit_count; i++) {
        const double closeness = all[i].judged ? all[i].figure.margin / bc_limit_scale(&c->contract->limits[i]) : HUGE_VAL;

        if (closeness < least) {
            least = closeness;
            best = i;
        }
    }
    return best;
}

/* A sentence on one gas: what is broken first, then what is not proven. */
static void describe_gas(const contract_case *c, const subject *gas, const judgement all[], const tally *t, char *text, size_t size)
{
    const struct {
        size_t count;
        const char *lead;
        picker *pick;
    } LISTS[] = {
        {t->broken, "; broken: ", is_broken},
        {t->unlikely, "; broken, though within uncertainty: ", is_unlikely},
        {t->not_judged, "; not judged: ", is_not_judged},
        {t->likely, "; kept, though within uncertainty: ", is_likely},
    };

    size_t absent = 0;

    for (size_t i = 0; i < c->contract->limit_count; i++)
        absent += is_absent(&c->contract->limits[i], gas);
    const int kept = snprintf(text, size, "%.100s keeps %zu of %zu limits", gas->loaded.name, t->kept + t->likely, c->contract->limit_count);

    if (absent > 0 && kept > 0)
        (void)snprintf(text + kept, size - (size_t)kept, ", %zu of them on what the analysis does not list", absent);
    for (size_t i = 0; i < sizeof LISTS / sizeof *LISTS; i++) {
        const size_t used = strlen(text);

        if (LISTS[i].count == 0)
            continue;
        (void)snprintf(text + used, size - used, "%s", LISTS[i].lead);
        append(text, size, c, all, LISTS[i].pick);
    }
    const size_t used = strlen(text);
    const size_t at = nearest(c, all);
    char one[200];

    if (t->kept != c->contract->limit_count || at == BC_LIMIT_MAX)
        return;
    describe(&c->contract->limits[at], &all[at], one, sizeof one);
    (void)snprintf(text + used, size - used, "; the nearest is %s", one);
}

/* How one gas stands to the whole contract: what is kept but not proven wants a second look. */
static report_judgement judge_gas(report *r, const contract_case *c, size_t gas, char *text, size_t size)
{
    judgement all[BC_LIMIT_MAX];
    tally t = {0};

    for (size_t i = 0; i < c->contract->limit_count; i++) {
        all[i] = judge(c, i, &c->gases.each[gas]);
        count_judgement(&t, &all[i]);
        add_row(r, c, i, gas, &all[i]);
    }
    warn_absent(r, c, &c->gases.each[gas]);
    describe_gas(c, &c->gases.each[gas], all, &t, text, size);
    if (t.unlikely + t.broken + t.not_judged > 0)
        return REPORT_NO;
    return t.likely > 0 ? REPORT_CARE : REPORT_YES;
}

bool contract_judge(report *r, const contract_case *c)
{
    char text[6000];
    report_judgement worst = REPORT_YES;
    size_t used = 0;

    set_title(r, c);
    text[0] = '\0';
    for (size_t i = 0; i < c->judged; i++) {
        if (i > 0)
            (void)snprintf(text + used, sizeof text - used, ". ");
        used = strlen(text);
        const report_judgement one = judge_gas(r, c, i, text + used, sizeof text - used);

        worst = one > worst ? one : worst; /* from good to bad, as they are declared */
        used = strlen(text);
    }
    const bool good = worst != REPORT_NO;
    char verdict[sizeof text + 80];

    (void)snprintf(verdict, sizeof verdict, "%s at %.4g %% coverage. %s.", good ? "within the contract" : "NOT within the contract", 100.0 * c->coverage, text);
    report_set_verdict(r, verdict);
    report_judge(r, worst);
    return good;
}
