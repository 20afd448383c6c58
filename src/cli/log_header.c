/* SPDX-License-Identifier: MIT */
/* log_header.c - what the columns of a log are: time, flow, components, and what is of no use. */
#include "cli/log_header.h"

#include "base/error_internal.h"
#include "base/text.h"
#include "gas/summation.h"

#include <math.h>
#include <stdio.h>
#include <string.h>

#define SUM_OFF 0.01      /* of one: sums of an analysis within it are passed without a question; common practice */
#define VOLUMES_AT_C 15.0 /* shares of volume, as of a composition file that names no state */

static void add_remark(log_header *h, const char *text)
{
    if (h->remark_count < BC_REMARK_MAX)
        (void)snprintf(h->remarks[h->remark_count++], BC_REMARK_BYTES, "%s", text);
}

/* A heading in its parts: "flow [m3/h]", "Methane (mol %)", "CH4 %". */
typedef struct {
    char word[LOG_CELL_MAX], unit[LOG_CELL_MAX];
} heading;

static void take_apart(const char *text, heading *head)
{
    const size_t length = strlen(text);
    const char last = length > 0 ? text[length - 1] : '\0';
    const char *opens = last == ']' ? strrchr(text, '[') : last == ')' ? strrchr(text, '(') : NULL;

    head->unit[0] = '\0';
    if (!opens && last == '%')
        opens = text + length - 1;
    if (opens && last == '%')
        (void)snprintf(head->unit, sizeof head->unit, "%%");
    else if (opens)
        (void)bc_text_copy(head->unit, sizeof head->unit, opens + 1, (size_t)(text + length - 1 - (opens + 1)));
    (void)bc_text_copy(head->word, sizeof head->word, text, opens ? (size_t)(opens - text) : length);
}

static bool is_time(const char *word)
{
    static const char *const WORDS[] = {"time", "timestamp", "date", "datetime"};

    for (size_t i = 0; i < BC_COUNT(WORDS); i++)
        if (bc_text_same(word, WORDS[i]))
            return true;
    return false;
}

static bc_status take_flow(log_header *h, log_column *column, const heading *head, int line, bc_error *err)
{
    char one[LOG_CELL_MAX + 4];

    if (h->has_flow)
        return bc_fail_at(err, BC_ERR_INPUT, h->path, line, "two columns of flow; keep the one that the analyses belong to");
    (void)snprintf(one, sizeof one, "1 %s", head->unit);
    if (head->unit[0] == '\0' || bc_flow_parse(one, &column->flow, NULL) != BC_OK)
        return bc_fail_at(err, BC_ERR_INPUT, h->path, line, "the column of flow needs its unit, as flow [m3/h], [kg/h] or [kmol/h]");
    column->kind = LOG_FLOW;
    h->has_flow = true;
    return BC_OK;
}

/* A formula of several species must not be passed over as a word that nobody knows. */
static bool is_formula(const char *word)
{
    for (size_t i = 0; i < bc_species_count(); i++)
        if (bc_text_same(word, bc_species_formula(i)))
            return true;
    return false;
}

/* Mole shares may say so or not; others must. A log is on one basis. */
static bc_status take_basis(log_header *h, const log_column *column, bc_basis basis, int line, bc_error *err)
{
    if (h->has_basis && h->basis != basis)
        return bc_fail_at(err, BC_ERR_INPUT, h->path, line, "'%s' is on another basis than the components before it; shares of a log are all mole, all volume or all mass",
                          column->name);
    h->has_basis = true;
    h->basis = basis;
    return BC_OK;
}

/* What a share is written in. */
typedef struct {
    const char *word;
    double fraction;
    int basis; /* -1: that of the log */
} share_unit;

static const share_unit *find_unit(const char *word)
{
    static const share_unit UNITS[] = {{"%", 1e-2, -1}, {"ppm", 1e-6, -1}, {"1", 1.0, -1}, {"fraction", 1.0, -1},
                                       {"mol%", 1e-2, BC_BASIS_MOLE}, {"mole%", 1e-2, BC_BASIS_MOLE}, {"%mol", 1e-2, BC_BASIS_MOLE},
                                       {"mol/mol", 1.0, BC_BASIS_MOLE}, {"molppm", 1e-6, BC_BASIS_MOLE}, {"ppmmol", 1e-6, BC_BASIS_MOLE},
                                       {"vol%", 1e-2, BC_BASIS_VOLUME}, {"%vol", 1e-2, BC_BASIS_VOLUME}, {"m3/m3", 1.0, BC_BASIS_VOLUME},
                                       {"volppm", 1e-6, BC_BASIS_VOLUME}, {"ppmv", 1e-6, BC_BASIS_VOLUME},
                                       {"mass%", 1e-2, BC_BASIS_MASS}, {"wt%", 1e-2, BC_BASIS_MASS}, {"%mass", 1e-2, BC_BASIS_MASS},
                                       {"kg/kg", 1.0, BC_BASIS_MASS}, {"massppm", 1e-6, BC_BASIS_MASS}};

    for (size_t i = 0; i < BC_COUNT(UNITS); i++)
        if (bc_text_same(word, UNITS[i].word))
            return &UNITS[i];
    return NULL;
}

static bc_status take_unit(log_header *h, log_column *column, const char *word, int line, bc_error *err)
{
    const share_unit *unit = find_unit(word);
    char shown[LOG_CELL_MAX];

    column->fraction = unit ? unit->fraction : h->unit;
    if (word[0] == '\0' || (unit && unit->basis < 0))
        return BC_OK;
    if (unit)
        return take_basis(h, column, (bc_basis)unit->basis, line, err);
    bc_text_show(shown, sizeof shown, word);
    return bc_fail_at(err, BC_ERR_INPUT, h->path, line, "a component in '%s' is not understood; write mol %%, vol %%, mass %%, ppm or fraction", shown);
}

bool log_header_shares(log_header *h, const char *word)
{
    const share_unit *unit = find_unit(word);

    if (!unit)
        return false;
    h->unit = unit->fraction;
    h->has_basis = unit->basis >= 0;
    h->basis = unit->basis >= 0 ? (bc_basis)unit->basis : BC_BASIS_MOLE;
    return true;
}

static bool is_same_component(const log_column *a, const log_column *b)
{
    for (size_t i = 0; i < BC_COUNT(a->parts); i++)
        if (a->parts[i] < b->parts[i] || a->parts[i] > b->parts[i])
            return false;
    return true;
}

static bc_status check_twice(const log_header *h, const log_column *column, int line, bc_error *err)
{
    for (size_t i = 0; i < h->column_count; i++) {
        const log_column *other = &h->columns[i];

        if (other->kind == LOG_COMPONENT && is_same_component(other, column))
            return bc_fail_at(err, BC_ERR_INPUT, h->path, line, "'%s' and '%s' are the same component; keep one of them", other->name, column->name);
    }
    return BC_OK;
}

static bc_status take_component(log_header *h, log_column *column, const heading *head, int line, bc_error *err)
{
    char remark[BC_REMARK_BYTES];
    bc_error cause;

    if (bc_composition_component(head->word, column->parts, remark, &cause) != BC_OK)
        return is_formula(head->word) ? bc_fail_at(err, BC_ERR_INPUT, h->path, line, "%s", cause.message) : BC_OK;
    column->kind = LOG_COMPONENT;
    if (remark[0] != '\0')
        add_remark(h, remark);
    const bc_status status = check_twice(h, column, line, err);

    return status == BC_OK ? take_unit(h, column, head->unit, line, err) : status;
}

static bc_status take_column(log_header *h, const char *text, int line, bc_error *err)
{
    log_column *column = &h->columns[h->column_count];
    bc_status status = BC_OK;
    heading head;

    memset(column, 0, sizeof *column);
    take_apart(text, &head);
    bc_text_show(column->name, sizeof column->name, head.word);
    if (is_time(head.word))
        column->kind = LOG_TIME;
    else if (bc_text_same(head.word, "flow"))
        status = take_flow(h, column, &head, line, err);
    else if (head.word[0] != '\0')
        status = take_component(h, column, &head, line, err);
    if (column->name[0] == '\0')
        (void)snprintf(column->name, sizeof column->name, "number %zu", h->column_count + 1);
    h->column_count++;
    return status;
}

size_t log_header_count(const log_header *h, log_column_kind kind)
{
    size_t count = 0;

    for (size_t i = 0; i < h->column_count; i++)
        count += h->columns[i].kind == kind;
    return count;
}

/* Moles in a share of one: 1, 1/Z (a volume of real gas) or 1/M, up to a common factor. */
static bc_status turn_to_moles(const log_header *h, log_column *column, int line, bc_error *err)
{
    double z = 0.0;
    double mass = 0.0;

    for (size_t i = 0; i < bc_species_count(); i++)
        if (column->parts[i] > 0.0) {
            z += column->parts[i] * bc_species_z(i, VOLUMES_AT_C);
            mass += column->parts[i] * bc_species_molar_mass_kg_per_mol(i) * 1e3;
        }
    const double share = h->basis == BC_BASIS_VOLUME ? z : mass;

    if (!(share > 0.0))
        return bc_fail_at(err, BC_ERR_INPUT, h->path, line, "'%s' is no gas at %g C, so its share cannot be one of volume; log mole or mass shares", column->name,
                          VOLUMES_AT_C);
    for (size_t i = 0; i < bc_species_count(); i++)
        column->parts[i] /= share;
    return BC_OK;
}

static bc_status take_bases(log_header *h, int line, bc_error *err)
{
    bc_status status = BC_OK;

    if (!h->has_basis || h->basis == BC_BASIS_MOLE)
        return BC_OK;
    for (size_t i = 0; i < h->column_count && status == BC_OK; i++)
        if (h->columns[i].kind == LOG_COMPONENT)
            status = turn_to_moles(h, &h->columns[i], line, err);
    return status;
}

/* The component whose name a heading all but spells; NULL for none. A slip changes a third of a word at most; formulas
 * are too short to tell. */
static const char *nearly_named(const char *name)
{
    const size_t slip = strlen(name) / 3;
    const char *best = NULL;
    size_t least = slip + 1;

    for (size_t i = 0; i < bc_species_count(); i++) {
        const size_t unlikeness = bc_text_unlikeness(name, bc_species_id(i));

        if (unlikeness < least) {
            least = unlikeness;
            best = bc_species_id(i);
        }
    }
    return best;
}

void log_header_tell_ignored(log_header *h)
{
    char text[BC_REMARK_BYTES] = "Columns of the log that are ignored: ";
    size_t told = 0;

    for (size_t i = 0; i < h->column_count; i++) {
        const size_t used = strlen(text);

        if (h->columns[i].kind != LOG_IGNORED)
            continue;
        const char *meant = nearly_named(h->columns[i].name);
        char one[2 * LOG_CELL_MAX];

        (void)snprintf(one, sizeof one, "%s%s%s%s", h->columns[i].name, meant ? " (is it " : "", meant ? meant : "", meant ? "?)" : "");
        if (used + strlen(one) + 8 < sizeof text)
            (void)snprintf(text + used, sizeof text - used, "%s%s", told > 0 ? ", " : "", one);
        else if (strcmp(text + used - 3, "...") != 0)
            (void)snprintf(text + used, sizeof text - used, " ...");
        told++;
    }
    if (told > 0)
        add_remark(h, text);
}

const char *log_header_flow_note(const log_header *h)
{
    for (size_t i = 0; i < h->column_count; i++)
        if (h->columns[i].kind == LOG_FLOW && h->columns[i].flow.of == BC_DIM_VOLUME && !h->columns[i].flow.has_metering)
            return "The flow is counted in cubic metres of the metering state above: those of an uncorrected meter, or of another state, "
                   "give another heat; flow [Nm3/h] or [kg/h] leaves no question.";
    return NULL;
}

static bool has_column(const log_header *h, const bc_limit *limit)
{
    double there = 0.0;

    for (size_t i = 0; i < h->column_count; i++)
        for (size_t s = 0; s < bc_species_count(); s++)
            there += limit->weight[s] * h->columns[i].parts[s];
    return there > 0.0;
}

bool log_header_absent(const log_header *h, const bc_contract *c, char text[LOG_ABSENT_TEXT])
{
    char list[300] = "";

    for (size_t i = 0; i < c->limit_count; i++) {
        const bc_limit *limit = &c->limits[i];
        const size_t used = strlen(list);

        if (limit->kind == BC_LIMIT_QUANTITY || limit->kind == BC_LIMIT_INDEX || limit->has_min || has_column(h, limit))
            continue;
        (void)snprintf(list + used, sizeof list - used, "%s%s", used > 0 ? ", " : "", limit->id);
    }
    (void)snprintf(text, LOG_ABSENT_TEXT, "The log has no column for %s: counted as zero, which shows that a limit is kept only if it was looked for.", list);
    return list[0] != '\0';
}

void log_header_start(log_header *h, const char *path)
{
    memset(h, 0, sizeof *h);
    h->path = path;
    h->unit = 1e-2;
}

bc_status log_header_take(log_header *h, char (*cells)[LOG_CELL_MAX], size_t count, int line, bc_error *err)
{
    bc_status status = BC_OK;

    if (count > LOG_COLUMNS_MAX)
        return bc_fail_at(err, BC_ERR_INPUT, h->path, line, "more than %d cells in a row; is it a log?", LOG_COLUMNS_MAX);
    for (size_t i = 0; i < count && status == BC_OK; i++)
        status = take_column(h, cells[i], line, err);
    if (status != BC_OK)
        return status;
    if (log_header_count(h, LOG_COMPONENT) == 0)
        return bc_fail_at(err, BC_ERR_INPUT, h->path, line, "no column is a component; the first row of a log names them, as in time,methane,ethane; for one without that row: stream --no-header --columns");
    if (log_header_count(h, LOG_TIME) > 2)
        return bc_fail_at(err, BC_ERR_INPUT, h->path, line, "more than two columns of time; keep one, or a date and a time");
    return take_bases(h, line, err);
}

bool log_sum_is_off(double sum)
{
    return fabs(sum - 1.0) > SUM_OFF + 1e-9; /* 99 and 101 % themselves, as added up, are within */
}

bool log_is_grouped(const char *cell)
{
    const char *text = bc_text_skip_space(cell);
    const size_t before = strspn(text, "0123456789");

    if (before < 1 || before > 3 || text[0] == '0' || text[before] != '.')
        return false;
    const char *group = text + before + 1;

    return strspn(group, "0123456789") == 3 && *bc_text_skip_space(group + 3) == '\0';
}

char log_delimiter(const char *line, size_t length)
{
    static const char SIGNS[] = ";\t,";
    size_t count[sizeof SIGNS] = {0};
    bool quoted = false;
    size_t best = 2;

    for (const char *p = line; p < line + length && *p != '\0'; p++) {
        const char *sign = strchr(SIGNS, *p);

        quoted = quoted != (*p == '"');
        if (sign && !quoted)
            count[sign - SIGNS]++;
    }
    for (size_t i = 0; i < 2; i++)
        if (count[i] > count[best])
            best = i;
    return SIGNS[best];
}
