/* SPDX-License-Identifier: MIT */
/* burner_words.h - the words of a burner file, in the order of their enums, each list closed by NULL. */
#ifndef BURNER_WORDS_H
#define BURNER_WORDS_H

extern const char *const TYPE_WORDS[], *const CONTROL_WORDS[], *const DOSING_WORDS[], *const HEAT_WORDS[], *const BASIS_WORDS[];

#endif
