/* SPDX-License-Identifier: MIT */
/* quantity_meant.h - the id that a word of the trade stands for. */
#ifndef QUANTITY_MEANT_H
#define QUANTITY_MEANT_H

/* Ids, each in quotes, that a word such as "NCV", "Hu" or "SG" stands for; NULL for a word that is none. By its letters
 * alone a word for the net heat may be nearest to the id of the gross one. */
const char *quantity_meant(const char *word);

#endif
