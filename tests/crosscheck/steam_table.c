/* SPDX-License-Identifier: MIT */
/* steam_table.c - prints saturation figures of water for compare_steam.py: T, p, vapour and liquid density, L. */
#include "bluecone/steam.h"

#include <stdio.h>

int main(void)
{
    for (double t_k = 230.0; t_k < 640.0; t_k += 2.3) {
        double p_pa = 0.0;
        double latent = 0.0;

        if (bc_steam_pressure(t_k, &p_pa, NULL) != BC_OK)
            return 1;
        if (t_k < BC_STEAM_T_MIN_K || bc_steam_latent_heat(t_k, &latent, NULL) != BC_OK)
            latent = 0.0;
        printf("%.17g %.17g %.17g\n", t_k, p_pa, latent);
    }
    return 0;
}
