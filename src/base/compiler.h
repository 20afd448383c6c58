/* SPDX-License-Identifier: MIT */
/* compiler.h - the only place for what a compiler offers beyond C11. */
#ifndef COMPILER_H
#define COMPILER_H

#if defined(__GNUC__)
#define BC_PRINTF(text, first) __attribute__((format(printf, text, first)))
#else
#define BC_PRINTF(text, first)
#endif

/* A large buffer that is filled as it is used need not be filled with a pattern first. */
#if defined(__has_attribute)
#if __has_attribute(uninitialized)
#define BC_UNFILLED __attribute__((uninitialized))
#endif
#endif
#ifndef BC_UNFILLED
#define BC_UNFILLED
#endif

#define BC_COUNT(array) (sizeof(array) / sizeof *(array))

#endif
