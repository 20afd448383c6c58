/* SPDX-License-Identifier: MIT */
/* test_report.c - the report keeps what it is given, and reaches its file whole or not at all. */
#include <stdarg.h>
#include <stddef.h>
#include <setjmp.h>
#include <stdint.h>

#include <cmocka.h>

#include "output/render.h"

#include <dirent.h>
#include <fcntl.h>
#include <stdio.h>
#include <stdlib.h>
#include <string.h>
#include <sys/stat.h>
#include <unistd.h>

static const render_style STYLE = {0};

/* A folder of our own, and a report with one figure. */
typedef struct {
    char folder[64], path[96];
    report r;
} fixture;

static void add_figure(report *r, double value)
{
    char id[] = "wobbe-gross", label[] = "Wobbe index", unit[] = "MJ/m3", method[] = "ISO 6976:2016";
    const report_result figure = {.id = id,
                                  .label = label,
                                  .unit = unit,
                                  .method = method,
                                  .section = report_add_section(r, "heat", "Heating values"),
                                  .gas = REPORT_NO_GAS,
                                  .value = value,
                                  .digits = 5};

    report_add_result(r, &figure);
    memset(id, '?', sizeof id - 1);
    memset(unit, '?', sizeof unit - 1);
}

static int set_up(void **state)
{
    fixture *f = calloc(1, sizeof *f);

    if (f == NULL)
        return 1;
    *state = f;
    snprintf(f->folder, sizeof f->folder, "/tmp/bluecone-test-XXXXXX");
    if (mkdtemp(f->folder) == NULL)
        return 1;
    snprintf(f->path, sizeof f->path, "%s/out.csv", f->folder);
    report_open(&f->r, "0.1.0", "get", "Figures");
    add_figure(&f->r, 50.723);
    return 0;
}

/* Empties the folder and answers how many files there were. */
static int empty_folder(const char *folder)
{
    DIR *entries = opendir(folder);
    int count = 0;

    assert_non_null(entries);
    for (struct dirent *e = readdir(entries); e != NULL; e = readdir(entries)) {
        char path[512];

        if (strcmp(e->d_name, ".") == 0 || strcmp(e->d_name, "..") == 0)
            continue;
        snprintf(path, sizeof path, "%s/%s", folder, e->d_name);
        assert_int_equal(remove(path), 0);
        count++;
    }
    closedir(entries);
    return count;
}

static int tear_down(void **state)
{
    fixture *f = *state;

    empty_folder(f->folder);
    report_close(&f->r);
    rmdir(f->folder);
    free(f);
    return 0;
}

static void assert_file_holds(const char *path, const char *wanted)
{
    char text[512];
    FILE *file = fopen(path, "r");

    assert_non_null(file);
    text[fread(text, 1, sizeof text - 1, file)] = '\0';
    fclose(file);
    assert_string_equal(text, wanted);
}

static void write_file(const char *path, const char *text)
{
    FILE *file = fopen(path, "w");

    assert_non_null(file);
    fputs(text, file);
    fclose(file);
}

static const char CSV[] = "id,gas,value,unit,uncertainty,method,state\n"
                          "wobbe-gross,,50.723,MJ/m3,,ISO 6976:2016,\n";

static void texts_are_copied(void **state)
{
    const fixture *f = *state;

    assert_int_equal(f->r.result_count, 1);
    assert_string_equal(f->r.results[0].id, "wobbe-gross");
    assert_string_equal(f->r.results[0].unit, "MJ/m3");
    assert_null(f->r.results[0].note);
    assert_true(report_ok(&f->r));
}

static void indices_come_back_in_order_and_lists_grow(void **state)
{
    fixture *f = *state;

    for (size_t i = 0; i < 37; i++) {
        char id[16];

        snprintf(id, sizeof id, "gas-%zu", i);
        assert_int_equal(report_add_gas(&f->r, id, "file.ini", 0.9987), i);
        report_add_fraction(&f->r, i, "methane", 0.913);
        report_add_fraction(&f->r, i, "ethane", 0.087);
        report_add_fraction(&f->r, i, "nitrogen", 0.0);
    }
    assert_string_equal(f->r.gases[36].name, "gas-36");
    assert_string_equal(f->r.gases[17].fractions[1].id, "ethane");
    assert_int_equal(f->r.gases[17].fraction_count, 3);
    assert_int_equal(report_add_section(&f->r, "more", "More"), 1);
    assert_int_equal(report_add_table(&f->r, "t", "Table"), 0);
    assert_int_equal(report_add_table(&f->r, "u", "Another"), 1);
}

static void the_same_warning_is_kept_once(void **state)
{
    fixture *f = *state;

    report_add_warning(&f->r, "normalised from 99.3 %");
    report_add_warning(&f->r, "oxygen: air in the sample?");
    report_add_warning(&f->r, "normalised from 99.3 %");
    assert_int_equal(f->r.warning_count, 2);
    assert_string_equal(f->r.warnings[1], "oxygen: air in the sample?");
}

static void a_verdict_given_again_replaces_the_first(void **state)
{
    fixture *f = *state;

    report_set_verdict(&f->r, "acceptable");
    report_set_verdict(&f->r, "not acceptable");
    assert_string_equal(f->r.verdict, "not acceptable");
    report_set_verdict(&f->r, NULL);
    assert_null(f->r.verdict);
}

static void a_failed_report_takes_more_items_and_is_not_rendered(void **state)
{
    fixture *f = *state;
    bc_error err = {0};

    f->r.failed = true;
    report_add_fraction(&f->r, REPORT_NO_GAS, "methane", 0.913);
    report_add_text(&f->r, (size_t)-1, "cell");
    report_add_column(&f->r, (size_t)-1, "x", "x", "%");
    assert_false(report_ok(&f->r));
    for (int form = RENDER_TEXT; form <= RENDER_BRIEF; form++)
        assert_int_equal(render_to(&f->r, (render_form)form, &STYLE, f->path, &err), BC_ERR_MEMORY);
    assert_int_equal(err.status, BC_ERR_MEMORY);
    assert_int_equal(access(f->path, F_OK), -1);
}

static void the_ending_picks_the_form(void **state)
{
    render_form form = RENDER_BRIEF;

    (void)state;
    assert_true(render_form_of("a.b/x.JSON", &form));
    assert_int_equal(form, RENDER_JSON);
    assert_true(render_form_of("x.csv", &form));
    assert_int_equal(form, RENDER_CSV);
    assert_true(render_form_of("x.txt", &form));
    assert_int_equal(form, RENDER_TEXT);
    assert_false(render_form_of("x.csvx", &form));
    assert_false(render_form_of("json", &form));
    assert_int_equal(form, RENDER_TEXT);
}

static void a_new_file_has_the_rights_the_mask_leaves_and_no_file_beside_it(void **state)
{
    fixture *f = *state;
    const mode_t mask = umask(027);
    struct stat there;

    assert_int_equal(render_to(&f->r, RENDER_CSV, &STYLE, f->path, NULL), BC_OK);
    umask(mask);
    assert_file_holds(f->path, CSV);
    assert_int_equal(stat(f->path, &there), 0);
    assert_int_equal(there.st_mode & 0777, 0640);
    assert_int_equal(empty_folder(f->folder), 1);
}

static void a_file_that_is_there_is_replaced_and_keeps_its_rights(void **state)
{
    fixture *f = *state;
    struct stat there;

    write_file(f->path, "a much longer text that stood here before, of several words and more\n");
    assert_int_equal(chmod(f->path, 0600), 0);
    assert_int_equal(render_to(&f->r, RENDER_CSV, &STYLE, f->path, NULL), BC_OK);
    assert_file_holds(f->path, CSV);
    assert_int_equal(stat(f->path, &there), 0);
    assert_int_equal(there.st_mode & 0777, 0600);
}

static void behind_a_link_the_file_is_replaced_and_not_the_link(void **state)
{
    fixture *f = *state;
    char link[96];
    struct stat there;

    snprintf(link, sizeof link, "%s/link.csv", f->folder);
    write_file(f->path, "old\n");
    assert_int_equal(symlink("out.csv", link), 0);
    assert_int_equal(render_to(&f->r, RENDER_CSV, &STYLE, link, NULL), BC_OK);
    assert_int_equal(lstat(link, &there), 0);
    assert_true(S_ISLNK(there.st_mode));
    assert_file_holds(f->path, CSV);
}

/* Renders to a device as a user who cannot replace it: should the code under test take it for a
 * file, root would lose the device. */
static bc_status render_to_device(const report *r, const char *path, bc_error *err)
{
    const uid_t user = geteuid();
    const uid_t nobody = 65534;

    if (user == 0 && seteuid(nobody) != 0)
        skip();
    const bc_status status = render_to(r, RENDER_CSV, &STYLE, path, err);
    assert_int_equal(seteuid(user), 0);
    return status;
}

static void a_full_device_is_named_with_its_reason(void **state)
{
    fixture *f = *state;
    bc_error err = {0};

    assert_int_equal(render_to_device(&f->r, "/dev/full", &err), BC_ERR_FILE);
    assert_string_equal(err.message, "cannot write to /dev/full: No space left on device");
    assert_int_equal(render_to_device(&f->r, "/dev/null", &err), BC_OK);
}

static void standard_output_on_a_full_device_is_an_error(void **state)
{
    fixture *f = *state;
    bc_error err = {0};
    const int full = open("/dev/full", O_WRONLY);
    const int kept = dup(STDOUT_FILENO);

    fflush(stdout);
    assert_true(full >= 0 && kept >= 0 && dup2(full, STDOUT_FILENO) >= 0);
    const bc_status status = render_to(&f->r, RENDER_CSV, &STYLE, NULL, &err);
    const int restored = dup2(kept, STDOUT_FILENO);
    clearerr(stdout);
    close(full);
    close(kept);
    assert_true(restored >= 0);
    assert_int_equal(status, BC_ERR_FILE);
    assert_string_equal(err.message, "cannot write to standard output: No space left on device");
}

static void a_folder_that_is_not_there_leaves_nothing_behind(void **state)
{
    fixture *f = *state;
    bc_error err = {0};
    char path[96], wanted[192];

    snprintf(path, sizeof path, "%s/none/out.csv", f->folder);
    snprintf(wanted, sizeof wanted, "cannot write to %s: No such file or directory", path);
    assert_int_equal(render_to(&f->r, RENDER_CSV, &STYLE, path, &err), BC_ERR_FILE);
    assert_string_equal(err.message, wanted);
    assert_int_equal(render_to(&f->r, RENDER_CSV, &STYLE, f->folder, &err), BC_ERR_FILE);
    assert_int_equal(empty_folder(f->folder), 0);
}

static void a_fifo_is_written_to_and_stays_one(void **state)
{
    fixture *f = *state;
    char text[256] = "";
    struct stat there;

    assert_int_equal(mkfifo(f->path, 0600), 0);
    const int reader = open(f->path, O_RDONLY | O_NONBLOCK);
    assert_true(reader >= 0);
    assert_int_equal(render_to(&f->r, RENDER_CSV, &STYLE, f->path, NULL), BC_OK);
    assert_int_equal(read(reader, text, sizeof text - 1), sizeof CSV - 1);
    close(reader);
    assert_string_equal(text, CSV);
    assert_int_equal(lstat(f->path, &there), 0);
    assert_true(S_ISFIFO(there.st_mode));
}

static void a_name_as_long_as_a_folder_allows_can_be_written(void **state)
{
    fixture *f = *state;
    char path[400];

    snprintf(path, sizeof path, "%s/%0251d.csv", f->folder, 7);
    assert_int_equal(render_to(&f->r, RENDER_CSV, &STYLE, path, NULL), BC_OK);
    assert_file_holds(path, CSV);
}

#define FILE_TEST(name) cmocka_unit_test_setup_teardown(name, set_up, tear_down)

int main(void)
{
    const struct CMUnitTest tests[] = {
        FILE_TEST(texts_are_copied),
        FILE_TEST(indices_come_back_in_order_and_lists_grow),
        FILE_TEST(the_same_warning_is_kept_once),
        FILE_TEST(a_verdict_given_again_replaces_the_first),
        FILE_TEST(a_failed_report_takes_more_items_and_is_not_rendered),
        cmocka_unit_test(the_ending_picks_the_form),
        FILE_TEST(a_new_file_has_the_rights_the_mask_leaves_and_no_file_beside_it),
        FILE_TEST(a_file_that_is_there_is_replaced_and_keeps_its_rights),
        FILE_TEST(behind_a_link_the_file_is_replaced_and_not_the_link),
        FILE_TEST(a_full_device_is_named_with_its_reason),
        FILE_TEST(standard_output_on_a_full_device_is_an_error),
        FILE_TEST(a_folder_that_is_not_there_leaves_nothing_behind),
        FILE_TEST(a_fifo_is_written_to_and_stays_one),
        FILE_TEST(a_name_as_long_as_a_folder_allows_can_be_written),
    };

    return cmocka_run_group_tests(tests, NULL, NULL);
}
