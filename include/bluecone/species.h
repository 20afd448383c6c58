/* SPDX-License-Identifier: MIT */
/* bluecone/species.h - the pure substances that a gas is made of, and the words they answer to. */
#ifndef BLUECONE_SPECIES_H
#define BLUECONE_SPECIES_H

#include <stddef.h>

#include "bluecone/status.h"

#ifdef __cplusplus
extern "C" {
#endif

/* Slots in every array over species. Larger than the table, so that a new species does not change
 * the size of a gas; slots from bc_species_count() on are always zero. */
#define BC_SPECIES_CAPACITY 96

/* Chemical elements of the table; also the order of atom counts. */
typedef enum { BC_C, BC_H, BC_N, BC_O, BC_S, BC_HE, BC_NE, BC_AR, BC_ELEMENTS } bc_element;

/* Where a tabulated figure of a species comes from. */
typedef enum {
    BC_ORIGIN_EDITION,       /* the table of the edition of ISO 6976 asked for */
    BC_ORIGIN_OTHER_EDITION, /* the table of the other edition */
    BC_ORIGIN_FORMATION,     /* an enthalpy-of-formation balance (heats) */
    BC_ORIGIN_ESTIMATE       /* a virial or homologous estimate (summation factors) */
} bc_origin;

/* Number of species in use. */
BC_API size_t bc_species_count(void);

/* Finds a species by id, formula, IUPAC name or a usual name of the trade; case, blanks, '-' and '_'
 * do not matter.
 *
 *   word    the word as written
 *   index   out: 0..bc_species_count()-1; untouched on failure
 *   err     out: a known word that is near, or all candidates of an ambiguous formula; may be NULL
 *
 * BC_ERR_INPUT: unknown, or a formula of several species (C4H10). */
BC_API BC_MUST_USE bc_status bc_species_find(const char *word, size_t *index, bc_error *err);

/* Texts of a species: id ("n-butane"), English name, formula, CAS registry number, source of the row.
 * Static, never NULL; "" for an index out of range. */
BC_API const char *bc_species_id(size_t index);
BC_API const char *bc_species_name(size_t index);
BC_API const char *bc_species_formula(size_t index);
BC_API const char *bc_species_cas(size_t index);
BC_API const char *bc_species_source(size_t index);

/* A usual name of a species; index counts through all names of all species until NULL comes back.
 *
 *   species   out: the species that the name stands for */
BC_API const char *bc_species_alias(size_t index, size_t *species);

/* Atoms of an element in a molecule; 0 for an index out of range. */
BC_API int bc_species_atoms(size_t index, bc_element element);

/* Molar mass, kg/mol: the sum of the atomic masses of ISO 6976:2016. 0 for an index out of range. */
BC_API double bc_species_molar_mass_kg_per_mol(size_t index);

/* Atomic mass g/mol, its standard uncertainty, the symbol and the source (ISO 6976:2016). */
BC_API double bc_element_mass_g_per_mol(bc_element element);
BC_API double bc_element_mass_u_g_per_mol(bc_element element);
BC_API const char *bc_element_symbol(bc_element element);
BC_API const char *bc_element_source(bc_element element);

#ifdef __cplusplus
}
#endif

#endif
