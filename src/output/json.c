/* SPDX-License-Identifier: MIT */
/* json.c - the report as one JSON object; its keys are binding and never change. */
#include "output/render.h"

#include "base/error_internal.h"
#include "output/json_internal.h"

#define DIGITS 12 /* significant digits of every number */

static json_t *state_of(const report_state *state, bool *failed)
{
    if (!state->present)
        return json_null();

    json_t *object = json_object();
    put(object, "combustion_c", number_of(state->combustion_c), failed);
    put(object, "metering_c", number_of(state->metering_c), failed);
    put(object, "metering_kpa", number_of(state->metering_kpa), failed);
    put(object, "saturated", json_boolean(state->saturated), failed);
    put(object, "edition", json_integer(state->edition), failed);
    return object;
}

static json_t *composition_of(const report_gas *gas, bool *failed)
{
    json_t *object = json_object();

    for (size_t i = 0; i < gas->fraction_count; i++) {
        char *id = plain_text(gas->fractions[i].id, PLAIN_ESCAPED);

        put(object, id, number_of(gas->fractions[i].x), failed);
        free(id);
    }
    return object;
}

static json_t *gases_of(const report *r, bool *failed)
{
    json_t *array = json_array();

    for (size_t i = 0; i < r->gas_count; i++) {
        json_t *object = json_object();

        put(object, "name", text_of(r->gases[i].name), failed);
        put(object, "source", text_of(r->gases[i].source), failed);
        put(object, "composition", composition_of(&r->gases[i], failed), failed);
        put(object, "sum_before", number_of(r->gases[i].sum_before), failed);
        append(array, object, failed);
    }
    return array;
}

/* Those that are identified. */
static json_t *inputs_of(const report *r, bool *failed)
{
    json_t *array = json_array();

    for (size_t i = 0; i < r->input_count; i++) {
        if (r->inputs[i].sha256 == NULL)
            continue;
        json_t *object = json_object();

        put(object, "name", text_of(r->inputs[i].name), failed);
        put(object, "sha256", text_of(r->inputs[i].sha256), failed);
        append(array, object, failed);
    }
    return array;
}

static json_t *result_of(const report *r, const report_result *result, bool *failed)
{
    const bool has_gas = result->gas != REPORT_NO_GAS;
    json_t *object = json_object();

    put(object, "id", text_of(result->id), failed);
    put(object, "gas", text_of(has_gas ? r->gases[result->gas].name : NULL), failed);
    put(object, "value", number_of(result->value), failed);
    put(object, "unit", text_of(result->unit), failed);
    put(object, "uncertainty", result->has_uncertainty ? number_of(result->uncertainty) : json_null(),
        failed);
    put(object, "method", text_of(result->method), failed);
    put(object, "label", text_of(result->label), failed);
    if (result->note != NULL)
        put(object, "note", text_of(result->note), failed);
    return object;
}

static json_t *results_of(const report *r, bool *failed)
{
    json_t *array = json_array();

    for (size_t i = 0; i < r->result_count; i++)
        append(array, result_of(r, &r->results[i], failed), failed);
    return array;
}

static json_t *columns_of(const report_table *table, bool *failed)
{
    json_t *array = json_array();

    for (size_t i = 0; i < table->column_count; i++) {
        const report_column *column = &table->columns[i];
        json_t *object = json_object();

        put(object, "id", text_of(column->id), failed);
        put(object, "heading", text_of(column->heading), failed);
        put(object, "unit", *column->unit == '\0' ? json_null() : text_of(column->unit), failed);
        append(array, object, failed);
    }
    return array;
}

/* A row that breaks off ends in null, so that all rows are of one length; a figure that is not there is null, too. */
static json_t *row_of(const report_table *table, size_t first, bool *failed)
{
    json_t *array = json_array();

    for (size_t i = first; i < first + table->column_count; i++) {
        if (i >= table->cell_count || report_is_none(&table->cells[i]))
            append(array, json_null(), failed);
        else if (table->cells[i].is_number)
            append(array, number_of(table->cells[i].number), failed);
        else
            append(array, text_of(table->cells[i].text), failed);
    }
    return array;
}

static json_t *tables_of(const report *r, bool *failed)
{
    json_t *array = json_array();

    for (size_t i = 0; i < r->table_count; i++) {
        const report_table *table = &r->tables[i];
        json_t *object = json_object();
        json_t *rows = json_array();

        for (size_t cell = 0; table->column_count > 0 && cell < table->cell_count;
             cell += table->column_count)
            append(rows, row_of(table, cell, failed), failed);
        put(object, "id", text_of(table->id), failed);
        put(object, "title", text_of(table->title), failed);
        put(object, "columns", columns_of(table, failed), failed);
        put(object, "rows", rows, failed);
        append(array, object, failed);
    }
    return array;
}

static json_t *limit_of(const report *r, const report_limit *limit, bool *failed)
{
    const bool has_gas = limit->gas != REPORT_NO_GAS;
    json_t *object = json_object();

    put(object, "id", text_of(limit->id), failed);
    put(object, "gas", text_of(has_gas ? r->gases[limit->gas].name : NULL), failed);
    put(object, "value", limit->has_value ? number_of(limit->value) : json_null(), failed);
    put(object, "min", limit->has_min ? number_of(limit->min) : json_null(), failed);
    put(object, "max", limit->has_max ? number_of(limit->max) : json_null(), failed);
    put(object, "unit", text_of(limit->unit), failed);
    put(object, "margin", limit->has_value && (limit->has_min || limit->has_max) ? number_of(limit->margin) : json_null(), failed);
    if (limit->has_uncertainty)
        put(object, "uncertainty", number_of(limit->uncertainty), failed);
    if (limit->has_percent)
        put(object, "margin_percent", number_of(limit->percent), failed);
    if (limit->has_probability)
        put(object, "probability", number_of(limit->probability), failed);
    put(object, "verdict", text_of(limit->verdict), failed);
    put(object, "state", text_of(limit->state), failed);
    return object;
}

static json_t *limits_of(const report *r, bool *failed)
{
    json_t *array = json_array();

    for (size_t i = 0; i < r->limit_count; i++)
        append(array, limit_of(r, &r->limits[i], failed), failed);
    return array;
}

static json_t *fractions_of(const report_fraction fractions[], size_t count, bool *failed)
{
    json_t *object = json_object();

    for (size_t i = 0; i < count; i++)
        put(object, fractions[i].id, number_of(fractions[i].x), failed);
    return object;
}

static json_t *worst_of(const report *r, bool *failed)
{
    json_t *array = json_array();

    for (size_t i = 0; i < r->worst_count; i++) {
        const report_worst *w = &r->worst[i];
        json_t *object = json_object();

        put(object, "id", text_of(w->id), failed);
        put(object, "unit", text_of(w->unit), failed);
        put(object, "state", text_of(w->state), failed);
        put(object, "min", number_of(w->min), failed);
        put(object, "max", number_of(w->max), failed);
        put(object, "at_min", fractions_of(w->at_min, w->at_min_count, failed), failed);
        put(object, "at_max", fractions_of(w->at_max, w->at_max_count, failed), failed);
        put(object, "proof", json_string(w->min_exact && w->max_exact ? "exact" : "searched"), failed);
        append(array, object, failed);
    }
    return array;
}

static json_t *checks_of(const report *r, bool *failed)
{
    json_t *array = json_array();

    for (size_t i = 0; i < r->check_count; i++) {
        json_t *object = json_object();

        put(object, "id", text_of(r->checks[i].id), failed);
        put(object, "ok", json_boolean(r->checks[i].ok), failed);
        put(object, "detail", text_of(r->checks[i].detail), failed);
        append(array, object, failed);
    }
    return array;
}

static json_t *warnings_of(const report *r, bool *failed)
{
    json_t *array = json_array();

    for (size_t i = 0; i < r->warning_count; i++)
        append(array, text_of(r->warnings[i]), failed);
    return array;
}

static json_t *report_of(const report *r, bool *failed)
{
    json_t *object = json_object();

    put(object, "tool", json_string("bluecone"), failed);
    put(object, "version", text_of(r->version), failed);
    put(object, "command", text_of(r->command), failed);
    put(object, "state", state_of(&r->state, failed), failed);
    put(object, "gases", gases_of(r, failed), failed);
    if (r->input_count > 0)
        put(object, "inputs", inputs_of(r, failed), failed);
    put(object, "results", results_of(r, failed), failed);
    put(object, "tables", tables_of(r, failed), failed);
    if (r->limit_count > 0)
        put(object, "limits", limits_of(r, failed), failed);
    if (r->worst_count > 0)
        put(object, "worst", worst_of(r, failed), failed);
    put(object, "checks", checks_of(r, failed), failed);
    if (r->chart_count > 0)
        put(object, "charts", json_charts(r, failed), failed);
    put(object, "warnings", warnings_of(r, failed), failed);
    put(object, "verdict", text_of(r->verdict), failed);
    if (r->caution != NULL)
        put(object, "caution", text_of(r->caution), failed);
    return object;
}

bc_status render_json(const report *r, const render_style *style, FILE *out, bc_error *err)
{
    const size_t flags = JSON_INDENT(2) | JSON_PRESERVE_ORDER | JSON_REAL_PRECISION(DIGITS);
    bool failed = !report_ok(r);
    json_t *object = failed ? NULL : report_of(r, &failed);
    bc_status status = BC_OK;

    (void)style; /* nothing of it is for machines */
    if (failed || object == NULL)
        status = bc_fail(err, BC_ERR_MEMORY, "no memory for the report");
    else if (json_dumpf(object, out, flags) != 0 || fputc('\n', out) == EOF)
        status = ferror(out) ? bc_fail(err, BC_ERR_FILE, "cannot write the report")
                             : bc_fail(err, BC_ERR_MEMORY, "no memory for the report");
    json_decref(object);
    return status;
}
