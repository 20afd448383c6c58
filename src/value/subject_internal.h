/* SPDX-License-Identifier: MIT */
/* subject_internal.h - what a subject knows of its gas, worked out again where a gas is moved a little. */
#ifndef SUBJECT_INTERNAL_H
#define SUBJECT_INTERNAL_H

#include "bluecone/subject.h"

/* Sets atoms and value of a subject whose reference and gas are set. */
void subject_weigh(bc_subject *subject);

#endif
