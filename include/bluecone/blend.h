/* SPDX-License-Identifier: MIT */
/* bluecone/blend.h - mixing gases by mole, volume, mass or energy.
 *
 * A mixer is made once of its parts at one reference state; after that any shares make a gas. A share is
 * a fraction of one on the basis of the mixer: of the moles, of the volumes that the parts have as real
 * gases at the metering state before they are mixed, of the mass, or of the gross heat. Only proportions
 * count. Moles, mass and heat are conserved; volumes of real gases are not, since Z is that of the mixture
 * afterwards. */
#ifndef BLUECONE_BLEND_H
#define BLUECONE_BLEND_H

#include <stddef.h>

#include "bluecone/gas.h"
#include "bluecone/iso6976.h"
#include "bluecone/status.h"

#ifdef __cplusplus
extern "C" {
#endif

#define BC_BLEND_PARTS_MAX 32 /* parts of one blend */

/* What a share is a share of. */
typedef enum {
    BC_BY_MOLE,
    BC_BY_VOLUME, /* real gas of the part alone at the metering state, without water of the state */
    BC_BY_MASS,
    BC_BY_ENERGY  /* gross heat at the combustion temperature */
} bc_blend_basis;

/* One gas that goes into a blend; the pointers are the caller's and outlive the mixer. */
typedef struct {
    const bc_gas *gas;
    const bc_spread *spread; /* NULL: no uncertainty of its composition is known */
} bc_blend_part;

/* Parts made ready for one basis and state. */
typedef struct {
    const bc_reference *reference;
    bc_blend_basis by;
    size_t count;
    bc_blend_part parts[BC_BLEND_PARTS_MAX];
    bc_value value[BC_BLEND_PARTS_MAX];   /* of each part alone, as composed */
    double per_mole[BC_BLEND_PARTS_MAX];  /* of a part on the basis: 1, m3/mol, kg/mol or J/mol */
} bc_mixer;

/* Makes a mixer.
 *
 *   parts, count   1..BC_BLEND_PARTS_MAX gases
 *   mixer          out: untouched on failure; keeps the pointers
 *
 * BC_ERR_USAGE: no part or too many; BC_ERR_RANGE: a part with less than 1 kJ/mol when mixing by energy (a
 * share of heat fixes no amount of it), or one that is no gas at the state when mixing by volume. */
BC_API BC_MUST_USE bc_status bc_mixer_make(const bc_reference *reference, bc_blend_basis by, const bc_blend_part parts[],
                                           size_t count, bc_mixer *mixer, bc_error *err);

/* Mole fractions of the parts in the blend.
 *
 *   share   mixer->count shares on the basis of the mixer, not negative, at least one above zero
 *   mole    out: mixer->count fractions of one
 *
 * n_i = w_i/a_i with the amount a_i on the basis per mole of part i; f_i = n_i/sum(n). */
BC_API void bc_mixer_moles(const bc_mixer *mixer, const double share[], double mole[]);

/* Shares of the same blend on another basis, fractions of one; all zero when the blend has no heat and
 * energy is asked for. `share` as above. */
BC_API void bc_mixer_shares(const bc_mixer *mixer, const double share[], bc_blend_basis by, double converted[]);

/* The blended gas: x_j = sum over parts f_i x_ij. `share` as above. */
BC_API bc_gas bc_mixer_gas(const bc_mixer *mixer, const double share[]);

/* Uncertainty of the blended gas from that of its parts, whose sources are independent of each other:
 *   dx_j = f_i [dx_ij - (da_i/a_i)(x_ij - x_j)],
 * where a_i moves with the composition of the part when shares are not of moles. More sources than a
 * spread holds are replaced by as many with the same covariances (pivoted Cholesky factor).
 *
 *   spread   out: count 0 when no part has a spread */
BC_API void bc_mixer_spread(const bc_mixer *mixer, const double share[], bc_spread *spread);

/* "mole", "volume", "mass", "energy": static texts. */
BC_API const char *bc_blend_basis_text(bc_blend_basis by);

#ifdef __cplusplus
}
#endif

#endif
