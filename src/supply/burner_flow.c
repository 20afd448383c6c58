/* SPDX-License-Identifier: MIT */
/* burner_flow.c - throughput of an orifice, and air drawn by a jet. */
#include "supply/burner_flow.h"

#include "bluecone/thermo.h"

#include <math.h>

#define R_J_PER_MOL_K 8.31446261815324 /* SI, 2019 */
#define P_HIGHEST_PA 1e8

double jet_cp(const bc_gas *gas, double t_k)
{
    double sum = 0.0;

    for (size_t i = 0; i < bc_species_count(); i++) {
        double cp = 0.0;

        if (gas->x[i] > 0.0 && bc_thermo_cp(i, t_k, &cp, NULL) == BC_OK)
            sum += gas->x[i] * cp;
    }
    return sum;
}

double jet_kappa(double cp)
{
    return cp / (cp - R_J_PER_MOL_K);
}

jet_gas jet_gas_of(const bc_subject *subject, double t_k)
{
    return (jet_gas){subject->value.molar_mass_kg_per_mol, subject->value.z, t_k, jet_kappa(jet_cp(&subject->gas, t_k))};
}

/* St. Venant and Wantzel: psi2 = 2k/(k - 1) [r^(2/k) - r^((k + 1)/k)], r = p_ambient/p, not below the critical
 * ratio (2/(k + 1))^(k/(k - 1)), where the jet chokes. */
static double outflow_squared(double ratio, double kappa)
{
    const double critical = pow(2.0 / (kappa + 1.0), kappa / (kappa - 1.0));
    const double r = fmax(ratio, critical);

    return 2.0 * kappa / (kappa - 1.0) * (pow(r, 2.0 / kappa) - pow(r, (kappa + 1.0) / kappa));
}

/* n/(Cd a) = sqrt(2 p p_abs/(M Z R T)), or p_abs psi/sqrt(M Z R T) where the gas expands. */
double orifice_flux(const jet_gas *gas, double gas_pa, double ambient_pa, bool expands)
{
    const double p_abs = ambient_pa + gas_pa;
    const double mzrt = gas->m_kg_per_mol * gas->z * R_J_PER_MOL_K * gas->t_k;

    if (!expands)
        return sqrt(2.0 * gas_pa * p_abs / mzrt);
    return p_abs * sqrt(outflow_squared(ambient_pa / p_abs, gas->kappa) / mzrt);
}

bool orifice_pressure(const jet_gas *gas, double gas_pa, double ambient_pa, bool expands, double ratio, double *wanted_pa)
{
    const double wanted = ratio * orifice_flux(gas, gas_pa, ambient_pa, expands);
    double low = 0.0;
    double high = P_HIGHEST_PA;

    if (orifice_flux(gas, high, ambient_pa, expands) < wanted)
        return false;
    for (int i = 0; i < 200 && high - low > 1e-13 * high; i++) {
        const double middle = low > 0.0 && high > 4.0 * low ? sqrt(low * high) : 0.5 * (low + high);

        if (orifice_flux(gas, middle, ambient_pa, expands) < wanted)
            low = middle;
        else
            high = middle;
    }
    *wanted_pa = 0.5 * (low + high);
    return true;
}

/* Momentum of the gas jet goes into the mixture: m_g v_g = (m_g + m_a) v, v = (V_g + V_a)/A_throat; divided by
 * m_g V_g the left side is the ratio of throat to jet area, which stays. */
double jet_constant(double r, double theta, double d)
{
    return (1.0 + r / theta) * (1.0 + r / d);
}

/* The positive root of r2/(theta d) + r (1/theta + 1/d) + 1 - constant = 0. */
double jet_air(double constant, double theta, double d)
{
    const double a = 1.0 / (theta * d);
    const double b = 1.0 / theta + 1.0 / d;
    const double c = 1.0 - constant;

    return -2.0 * c / (b + sqrt(b * b - 4.0 * a * c));
}
