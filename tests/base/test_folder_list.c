/* SPDX-License-Identifier: MIT */
/* test_folder_list.c - folders from search paths and from where a file is; what is too much is left out. */
#include "support.h"

#include "base/folder_list.h"

static void a_path_gives_each_folder_and_its_compositions(void **state)
{
    bc_folders f = {.count = 0};

    (void)state;
    bc_folders_add_path(&f, NULL);
    bc_folders_add_path(&f, "");
    bc_folders_add_path(&f, ":/a::b/c:");
    assert_int_equal(f.count, 4);
    assert_string_equal(f.path[0], "/a");
    assert_string_equal(f.path[1], "/a/compositions");
    assert_string_equal(f.path[2], "b/c");
    assert_string_equal(f.path[3], "b/c/compositions");
}

static void a_folder_above_a_file_is_found_as_far_as_there_is_one(void **state)
{
    bc_folders f = {.count = 0};

    (void)state;
    bc_folders_add_above(&f, "/usr/lib/bluecone/module.so", 1, "");
    bc_folders_add_above(&f, "/usr/lib/bluecone/module.so", 3, "/share");
    bc_folders_add_above(&f, "/usr/module.so", 2, "/share");
    bc_folders_add_above(&f, "/usr/module.so", 3, "/share");
    bc_folders_add_above(&f, "module.so", 1, "/share");
    assert_int_equal(f.count, 3);
    assert_string_equal(f.path[0], "/usr/lib/bluecone");
    assert_string_equal(f.path[1], "/usr/share");
    assert_string_equal(f.path[2], "/share");
}

static void what_does_not_fit_is_left_out(void **state)
{
    static char path[3 * BC_FOLDER_BYTES];
    bc_folders f = {.count = 0};

    (void)state;
    memset(path, 'x', BC_FOLDER_BYTES - 1);
    bc_folders_add_path(&f, path); /* itself fits, /compositions does not */
    assert_int_equal(f.count, 1);
    assert_int_equal(strlen(f.path[0]), BC_FOLDER_BYTES - 1);
    memset(path, 'x', sizeof path - 1);
    bc_folders_add_path(&f, path);
    assert_int_equal(f.count, 1);
    for (int i = 0; i < 100; i++)
        bc_folders_add(&f, "/a", 2, "/b");
    assert_int_equal(f.count, BC_FOLDERS_MAX);
}

int main(void)
{
    const struct CMUnitTest tests[] = {
        cmocka_unit_test(a_path_gives_each_folder_and_its_compositions),
        cmocka_unit_test(a_folder_above_a_file_is_found_as_far_as_there_is_one),
        cmocka_unit_test(what_does_not_fit_is_left_out),
    };

    return cmocka_run_group_tests(tests, NULL, NULL);
}
