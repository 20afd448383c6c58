/* SPDX-License-Identifier: MIT */
/* compiler.h - the only place for what a compiler offers beyond C11. */
#ifndef COMPILER_H
#define COMPILER_H

#if defined(__GNUC__)
#define BC_PRINTF(text, first) __attribute__((format(printf, text, first)))
#else
#define BC_PRINTF(text, first)
#endif

#define BC_COUNT(array) (sizeof(array) / sizeof *(array))

#endif
