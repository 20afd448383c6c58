/* SPDX-License-Identifier: MIT */
/* own_path.h - where the file of this module is. */
#ifndef OWN_PATH_H
#define OWN_PATH_H

#include <stdbool.h>
#include <stddef.h>

/* The absolute path of the module that this function is in; false when nobody knows, or it does not fit. */
bool own_path(char *path, size_t size);

#endif
