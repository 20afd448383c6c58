/* SPDX-License-Identifier: MIT */
/* uncertainty.h - propagation of uncertainty through the power products of ISO 6976. */
#ifndef UNCERTAINTY_H
#define UNCERTAINTY_H

#include "bluecone/subject.h"

/* Every figure of the standard is Y = constant H^heat M^mass Z^z R^r M_air^air Z_air^air_z. */
typedef struct {
    double heat, mass, z, r, air, air_z;
    bool net; /* H is the net molar heat */
} exponents;

/* Relative standard uncertainties of Y from the composition and from the tables. */
typedef struct {
    double composition, tables;
} relative_u;

/* ISO 6976:2016 annex B. A gas without heat has no relative uncertainty of it: both are zero then. */
relative_u propagate(const bc_subject *subject, const exponents *e);

#endif
