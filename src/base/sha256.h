/* SPDX-License-Identifier: MIT */
/* sha256.h - the fingerprint of a file's bytes, as `sha256sum` prints it. */
#ifndef SHA256_H
#define SHA256_H

#include <stddef.h>

#define SHA256_TEXT 65 /* hexadecimal digits, with the final NUL */

/* FIPS 180-4. For telling which file a report was made from, not for secrets. */
void bc_sha256(const void *bytes, size_t count, char text[SHA256_TEXT]);

#endif
