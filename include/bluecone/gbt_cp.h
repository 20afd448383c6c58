/* SPDX-License-Identifier: MIT */
/* bluecone/gbt_cp.h - combustion potential of GB/T 13611, the flame speed scale of Chinese city gas classes. */
#ifndef BLUECONE_GBT_CP_H
#define BLUECONE_GBT_CP_H

#include "bluecone/gas.h"
#include "bluecone/iso6976.h"
#include "bluecone/status.h"

#ifdef __cplusplus
extern "C" {
#endif

/* CP = K [H2 + 0.6 (CmHn + CO) + 0.3 CH4]/sqrt(d), K = 1 + 0.0054 O2^2 (1), of a dry gas.
 *
 *   reference   state of d; the standard's is 15 C and 101.325 kPa. Shares are % of real-gas volume at 15 C; CmHn
 *               without methane
 *   cp          out: untouched on failure
 *   outside     out: "" in range, else why the figure says nothing; static
 *
 * BC_ERR_RANGE: nothing that burns. Its limits by class are not known to us.
 * Source: GB/T 13611, value from memory; meets the CP of reference gases 12T-0 and 12T-2. */
BC_API BC_MUST_USE bc_status bc_gbt_cp(const bc_reference *reference, const bc_gas *gas, double *cp, const char **outside,
                                       bc_error *err);

#ifdef __cplusplus
}
#endif

#endif
