/* SPDX-License-Identifier: MIT */
/* bluecone/mcp.h - maximum combustion potential of the Japanese city gas regulations: a burning velocity scale. */
#ifndef BLUECONE_MCP_H
#define BLUECONE_MCP_H

#include <stddef.h>

#include "bluecone/gas.h"
#include "bluecone/status.h"

#ifdef __cplusplus
extern "C" {
#endif

/* MCP (cm/s in kind, methane 36, hydrogen 282) of a dry gas:
 *
 *   MCP = [sum S f X/sum f X](1 - K),
 *   K = [sum X/sum alpha X][(2.5 CO2 + N2 - 3.77 O2)/(100 - 4.77 O2)]
 *     + [(N2 - 3.77 O2)/(100 - 4.77 O2)]^2,
 *
 * X combustibles, all in mol %.
 *
 *   mcp       out: untouched on failure
 *   outside   out: "" in range, else why the figure says nothing; static
 *
 * BC_ERR_RANGE: nothing that burns, or nothing but air beside it (O2 above 20.9 %). It follows the measured burning
 * velocity of hydrogen in methane. Source: Japanese gas business regulations, annex on combustion speed and Wobbe
 * index; constants in data/mcp.def. */
BC_API BC_MUST_USE bc_status bc_mcp(const bc_gas *gas, double *mcp, const char **outside, bc_error *err);

/* A city gas class: ranges of the gross Wobbe index (0 C / 0 C, J/m3) and of MCP. */
typedef struct {
    const char *name, *source;
    double wobbe_min_j_per_m3, wobbe_max_j_per_m3;
    double mcp_min, mcp_max;
} bc_mcp_class;

/* The class of a gross Wobbe index (0 C / 0 C, 101.325 kPa, J/m3), NULL when none holds it; classes overlap: 13A first.
 * Source: as the class says. */
BC_API const bc_mcp_class *bc_mcp_class_of(double wobbe_j_per_m3);

#ifdef __cplusplus
}
#endif

#endif
