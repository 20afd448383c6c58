/* SPDX-License-Identifier: MIT */
/* linear.h - a small dense system of linear equations. */
#ifndef LINEAR_H
#define LINEAR_H

#include <stdbool.h>
#include <stddef.h>

#define LINEAR_MAX 33

/* a x = b, n of each. */
typedef struct {
    size_t n; /* 1..LINEAR_MAX */
    double a[LINEAR_MAX][LINEAR_MAX], b[LINEAR_MAX];
} linear_system;

/* Gaussian elimination with partial pivoting; b becomes x, a is used up. False when a is singular. */
bool linear_solve(linear_system *s);

#endif
