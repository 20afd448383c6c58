/* SPDX-License-Identifier: MIT */
/* test_sha256.c - the examples of the standard, and every place where the padding can begin. */
#include "support.h"

#include "base/sha256.h"

#include <stdlib.h>

static void assert_digest(const char *message, size_t count, const char *wanted)
{
    char text[SHA256_TEXT];

    bc_sha256(message, count, text);
    assert_string_equal(text, wanted);
}

/* NIST, Examples with Intermediate Values, SHA256.pdf; the last one and the empty message: SHAVS and FIPS 180-2, B.3. */
static void the_examples_of_the_standard_are_met(void **state)
{
    static const char TWO[] = "abcdbcdecdefdefgefghfghighijhijkijkljklmklmnlmnomnopnopq";
    char *million = malloc(1000000);

    (void)state;
    assert_digest("abc", 3, "ba7816bf8f01cfea414140de5dae2223b00361a396177a9cb410ff61f20015ad");
    assert_digest("", 0, "e3b0c44298fc1c149afbf4c8996fb92427ae41e4649b934ca495991b7852b855");
    assert_digest(TWO, sizeof TWO - 1, "248d6a61d20638b8e5c026930c3e6039a33ce45964ff2167f6ecedd419db06c1");
    assert_non_null(million);
    memset(million, 'a', 1000000);
    assert_digest(million, 1000000, "cdc76e5c9914fb9281a1c7e284d73e67f1809a48a497200e046d39ccc7112cd0");
    free(million);
}

/* Digests of 0 to 130 letters, one behind the other, digested: the padding begins at every place of a block. By the
 * implementation of Python's hashlib. */
static void padding_is_right_at_every_length(void **state)
{
    char letters[131], texts[131 * (SHA256_TEXT - 1) + 1];

    (void)state;
    memset(letters, 'x', sizeof letters);
    for (size_t n = 0; n < sizeof letters; n++)
        bc_sha256(letters, n, texts + n * (SHA256_TEXT - 1));
    assert_digest(texts, sizeof texts - 1, "87aca1c44bc7ba8897768170211f0a02063de70801131ff86c7edb9ce32c6a50");
}

int main(void)
{
    const struct CMUnitTest tests[] = {
        cmocka_unit_test(the_examples_of_the_standard_are_met),
        cmocka_unit_test(padding_is_right_at_every_length),
    };

    return cmocka_run_group_tests(tests, NULL, NULL);
}
