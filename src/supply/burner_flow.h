/* SPDX-License-Identifier: MIT */
/* burner_flow.h - throughput of an orifice, and air drawn by a jet. Arguments are in range. */
#ifndef BURNER_FLOW_H
#define BURNER_FLOW_H

#include <stdbool.h>

#include "bluecone/subject.h"

/* Above this share of the absolute pressure a gas expands in the orifice enough to matter: 1 %. */
#define ORIFICE_INCOMPRESSIBLE_MAX 0.03

/* A gas in front of an orifice. */
typedef struct {
    double m_kg_per_mol, z, t_k;
    double kappa; /* cp/cv of the ideal gas */
} jet_gas;

/* Heat capacity of the ideal gas, J/(mol K), linear in the mole fractions, and cp/cv of it. */
double jet_cp(const bc_gas *gas, double t_k);
double jet_kappa(double cp);

jet_gas jet_gas_of(const bc_subject *subject, double t_k);

/* Throughput per area and discharge coefficient, mol/(m2 s).
 *
 *   gas_pa, ambient_pa   pressure above the atmosphere, and the atmosphere
 *   expands              the isentropic nozzle instead of Bernoulli's equation */
double orifice_flux(const jet_gas *gas, double gas_pa, double ambient_pa, bool expands);

/* The pressure above the atmosphere that gives `ratio` times the throughput; false when none below 1000 bar does. */
bool orifice_pressure(const jet_gas *gas, double gas_pa, double ambient_pa, bool expands, double ratio, double *wanted_pa);

/* The constant of a jet, (1 + r/theta)(1 + r/d): r air over gas, mol/mol, d molar masses, theta temperatures, gas over air. */
double jet_constant(double r, double theta, double d);

/* The air that a jet of that constant (above 1) draws, mol/mol. */
double jet_air(double constant, double theta, double d);

#endif
