/* test_house.c - the rules of the house, each a script beside this file.
 *
 * SPDX-License-Identifier: MIT
 *
 * A script gets $SRC (a source tree), $OUT (where it was built) and $WORK (an empty folder), prints
 * what breaks its rule and then exits with something other than 0. mutants.sh proves that each of
 * them refuses what it is there to refuse. */
#include <setjmp.h>
#include <stdarg.h>
#include <stddef.h>
#include <stdint.h>
#include <cmocka.h>

#include <stdio.h>
#include <stdlib.h>

static void run_rule(const char *rule)
{
    char command[256];

    snprintf(command, sizeof command,
             "WORK=$(mktemp -d) && export WORK && "
             "{ \"$SRC/tests/house/%s.sh\" >&2; s=$?; rm -rf \"$WORK\"; exit $s; }",
             rule);
    assert_int_equal(system(command), 0);
}

static int set_folders(void **state)
{
    (void)state;
    return setenv("SRC", BC_SOURCE_DIR, 1) != 0 || setenv("OUT", BC_BUILD_DIR, 1) != 0;
}

static void no_file_includes_a_higher_floor(void **state)
{
    (void)state;
    run_rule("layers");
}

static void headers_do_not_include_each_other_in_a_circle(void **state)
{
    (void)state;
    run_rule("circles");
}

static void the_library_has_no_writable_object(void **state)
{
    (void)state;
    run_rule("state");
}

static void public_headers_compile_alone_as_c_and_cxx(void **state)
{
    (void)state;
    run_rule("headers");
}

static void the_library_exports_and_imports_only_what_it_may(void **state)
{
    (void)state;
    run_rule("symbols");
}

static void the_binary_interface_is_the_accepted_one(void **state)
{
    (void)state;
    run_rule("interface");
}

static void the_top_level_holds_only_what_belongs_there(void **state)
{
    (void)state;
    run_rule("toplevel");
}

static void unsafe_calls_are_not_made(void **state)
{
    (void)state;
    run_rule("banned");
}

static void file_names_are_unique_and_files_say_what_they_are(void **state)
{
    (void)state;
    run_rule("names");
}

static void what_is_installed_is_hardened(void **state)
{
    (void)state;
    run_rule("hardening");
}

static void every_rule_refuses_its_violation(void **state)
{
    (void)state;
    run_rule("mutants");
}

int main(void)
{
    const struct CMUnitTest tests[] = {
        cmocka_unit_test(no_file_includes_a_higher_floor),
        cmocka_unit_test(headers_do_not_include_each_other_in_a_circle),
        cmocka_unit_test(the_library_has_no_writable_object),
        cmocka_unit_test(public_headers_compile_alone_as_c_and_cxx),
        cmocka_unit_test(the_library_exports_and_imports_only_what_it_may),
        cmocka_unit_test(the_binary_interface_is_the_accepted_one),
        cmocka_unit_test(the_top_level_holds_only_what_belongs_there),
        cmocka_unit_test(unsafe_calls_are_not_made),
        cmocka_unit_test(file_names_are_unique_and_files_say_what_they_are),
        cmocka_unit_test(what_is_installed_is_hardened),
        cmocka_unit_test(every_rule_refuses_its_violation),
    };

    return cmocka_run_group_tests_name("house", tests, set_folders, NULL);
}
