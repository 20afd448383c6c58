/* SPDX-License-Identifier: MIT */
/* nlopt_library.h - the functions of NLopt that are used, found when the program runs. */
#ifndef NLOPT_LIBRARY_H
#define NLOPT_LIBRARY_H

#include <nlopt.h>
#include <stdbool.h>

struct nlopt_library {
    void *handle;
    bool starved; /* a descent lacked memory */
    nlopt_opt (*create)(nlopt_algorithm algorithm, unsigned n);
    void (*destroy)(nlopt_opt opt);
    nlopt_result (*optimize)(nlopt_opt opt, double *x, double *f);
    nlopt_result (*set_min_objective)(nlopt_opt opt, nlopt_func f, void *data);
    nlopt_result (*set_lower_bounds)(nlopt_opt opt, const double *low);
    nlopt_result (*set_upper_bounds)(nlopt_opt opt, const double *high);
    nlopt_result (*add_inequality_mconstraint)(nlopt_opt opt, unsigned m, nlopt_mfunc c, void *data, const double *tolerance);
    nlopt_result (*add_equality_mconstraint)(nlopt_opt opt, unsigned m, nlopt_mfunc c, void *data, const double *tolerance);
    nlopt_result (*set_ftol_rel)(nlopt_opt opt, double tolerance);
    nlopt_result (*set_xtol_rel)(nlopt_opt opt, double tolerance);
    nlopt_result (*set_maxeval)(nlopt_opt opt, int most);
};

#endif
