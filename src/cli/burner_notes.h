/* SPDX-License-Identifier: MIT */
/* burner_notes.h - what is to be said of the data of a burner, whatever gas comes. */
#ifndef BURNER_NOTES_H
#define BURNER_NOTES_H

#include "bluecone/burner.h"
#include "output/report.h"

/* Data that contradict each other, and pressures at which heat leaves the Wobbe index. */
void burner_note_orifice(report *r, const bc_burner_case *set);

/* An air factor that the file left to the default. */
void burner_note_air(report *r, const bc_burner *burner);

#endif
