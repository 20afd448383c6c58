/* SPDX-License-Identifier: MIT */
/* sha256.c - FIPS 180-4 (2015), SHA-256, for messages that are whole in memory.
 *
 * Our own, since a library of cryptography would be loaded at every start, for a few lines that the
 * test vectors of the standard cover. Names of functions and variables are those of the standard. */
#include "base/sha256.h"

#include <stdint.h>
#include <stdio.h>
#include <string.h>

#define BLOCK 64
#define LENGTH_BYTES 8 /* of the message length that ends the padding */
#define WORDS 8

static const uint32_t K[BLOCK] = {
#define SHA256_K(a, b, c, d) a, b, c, d,
#include "data/sha256.def"
};

/* 5.3.3: of the square roots of the first eight primes. */
static const uint32_t H0[WORDS] = {0x6a09e667, 0xbb67ae85, 0x3c6ef372, 0xa54ff53a, 0x510e527f, 0x9b05688c, 0x1f83d9ab, 0x5be0cd19};

static uint32_t rotr(uint32_t x, unsigned n)
{
    return (x >> n) | (x << (32U - n));
}

/* 6.2.2, step 1: the message schedule. */
static void schedule(const uint8_t block[BLOCK], uint32_t w[BLOCK])
{
    for (size_t t = 0; t < 16; t++)
        w[t] = (uint32_t)block[4 * t] << 24 | (uint32_t)block[4 * t + 1] << 16 | (uint32_t)block[4 * t + 2] << 8 | block[4 * t + 3];
    for (size_t t = 16; t < BLOCK; t++) {
        const uint32_t sigma1 = rotr(w[t - 2], 17) ^ rotr(w[t - 2], 19) ^ w[t - 2] >> 10;
        const uint32_t sigma0 = rotr(w[t - 15], 7) ^ rotr(w[t - 15], 18) ^ w[t - 15] >> 3;

        w[t] = sigma1 + w[t - 7] + sigma0 + w[t - 16];
    }
}

/* 6.2.2, steps 2 to 4; v holds a to h. */
static void digest(const uint8_t block[BLOCK], uint32_t h[WORDS])
{
    uint32_t w[BLOCK], v[WORDS];

    schedule(block, w);
    memcpy(v, h, sizeof v);
    for (size_t t = 0; t < BLOCK; t++) {
        const uint32_t sum1 = rotr(v[4], 6) ^ rotr(v[4], 11) ^ rotr(v[4], 25);
        const uint32_t sum0 = rotr(v[0], 2) ^ rotr(v[0], 13) ^ rotr(v[0], 22);
        const uint32_t choice = (v[4] & v[5]) ^ (~v[4] & v[6]);
        const uint32_t majority = (v[0] & v[1]) ^ (v[0] & v[2]) ^ (v[1] & v[2]);
        const uint32_t t1 = v[7] + sum1 + choice + K[t] + w[t];

        memmove(v + 1, v, (WORDS - 1) * sizeof *v);
        v[4] += t1;
        v[0] = t1 + sum0 + majority;
    }
    for (size_t i = 0; i < WORDS; i++)
        h[i] += v[i];
}

/* 5.1.1: what is left of the message, a one, zeros, and its length in bits. One block or two. */
static void digest_end(const uint8_t *rest, size_t left, size_t count, uint32_t h[WORDS])
{
    uint8_t end[2 * BLOCK] = {0};
    const size_t blocks = left + 1 + LENGTH_BYTES <= BLOCK ? 1 : 2;
    const uint64_t bits = 8 * (uint64_t)count;

    if (left > 0)
        memcpy(end, rest, left);
    end[left] = 0x80;
    for (size_t i = 0; i < LENGTH_BYTES; i++)
        end[blocks * BLOCK - 1 - i] = (uint8_t)(bits >> 8 * i);
    for (size_t i = 0; i < blocks; i++)
        digest(end + i * BLOCK, h);
}

void bc_sha256(const void *bytes, size_t count, char text[SHA256_TEXT])
{
    const uint8_t *at = bytes;
    size_t left = count;
    uint32_t h[WORDS];

    memcpy(h, H0, sizeof h);
    for (; left >= BLOCK; left -= BLOCK, at += BLOCK)
        digest(at, h);
    digest_end(at, left, count, h);
    for (size_t i = 0; i < WORDS; i++)
        (void)snprintf(text + 8 * i, SHA256_TEXT - 8 * i, "%08x", (unsigned)h[i]);
}
