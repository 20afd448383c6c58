/* SPDX-License-Identifier: MIT */
/* bluecone/switch.h - may a burner that was set on one gas take another?
 *
 * Every published index and every limit of the burner is one criterion. Each danger that the kind of burner knows must
 * be judged by at least one method that covers both gases: no single index clears a gas, and one out of its range
 * clears nothing. */
#ifndef BLUECONE_SWITCH_H
#define BLUECONE_SWITCH_H

#include <stdbool.h>
#include <stddef.h>

#include "bluecone/burner.h"
#include "bluecone/index.h"
#include "bluecone/status.h"
#include "bluecone/subject.h"

#ifdef __cplusplus
extern "C" {
#endif

/* What can go wrong with another gas. */
typedef enum {
    BC_DANGER_HEAT,       /* too much or too little heat input */
    BC_DANGER_CO,         /* incomplete combustion */
    BC_DANGER_LIFT,       /* the flame leaves the port */
    BC_DANGER_FLASHBACK,  /* the flame enters the burner */
    BC_DANGER_YELLOW_TIP, /* soot */
    BC_DANGER_KNOCK,      /* of an engine */
    BC_DANGER_FLAME,      /* the flame too hot or too cold for the furnace */
    BC_DANGERS
} bc_danger;

/* The danger in words; "" out of range. */
BC_API const char *bc_danger_text(bc_danger danger);

/* Whether a kind of burner knows a danger: an atmospheric one, and burners in general, all of the published
 * indices; a nozzle-mixing one nothing to flash back into; an engine knock. BC_BURNER_TYPES stands for no burner. */
BC_API bool bc_danger_matters(bc_danger danger, bc_burner_type type);

#define BC_CRITERIA_MAX 24
#define BC_INDICES_MAX 24

/* One criterion on the new gas. Texts are static. */
typedef struct {
    const char *id, *label, *unit, *source;
    int decimals;
    bool of_burner;            /* a limit of the burner file, else a published index */
    bool counts;               /* for this kind of burner; else it is shown only */
    unsigned dangers;          /* bits 1 << bc_danger */
    bool has_value;
    double value;
    bc_index_limits preferable, acceptable;
    bc_verdict verdict;
    const char *reason;        /* why cautious or without verdict; "" otherwise */
    bool has_adjusted;         /* known once heat input and air ratio are set back */
    double adjusted;
    bc_verdict adjusted_verdict;
    bool broken;               /* for good: found or adjusted, whichever it is to be */
    double outside;            /* how far the value is beyond the acceptable limit, over that limit; 0 within */
} bc_criterion;

typedef enum { BC_SWITCH_TAKES, BC_SWITCH_AFTER_ADJUSTMENT, BC_SWITCH_NO } bc_switch_verdict;

/* The judgement. */
typedef struct {
    bool same_gas;                    /* both gases are one: there is nothing to judge */
    bc_index indices[BC_INDICES_MAX]; /* by bc_index_at() */
    size_t count;
    bc_criterion criteria[BC_CRITERIA_MAX];
    size_t order[BC_CRITERIA_MAX];    /* worst first */
    bool covered[BC_DANGERS];         /* judged by a criterion that counts */
    bool adjusts;                     /* a limit is broken that an adjustment restores */
    bool cleared;                     /* every danger that matters is covered */
    bool has_burner;
    bc_burner_case set;
    bc_burner_response on_old, on_new, on_adjusted; /* as found, and with the remedy */
    bc_burner_remedy remedy;
    bc_switch_verdict verdict;
} bc_switch;

/* Judges a pair of gases. A limit is broken for good when it stays broken once heat input and air ratio are set back:
 * Weaver's and AGA's indices are then read with JA = JH = 1 in their formulas, burner limits at the restored setting. A
 * limit of one gas that the old gas breaks as well says nothing. With a burner its own heat limits take the place of those
 * of the Wobbe ratio, and indices made for atmospheric burners count only there.
 *
 *   burner      NULL: burners in general
 *   new_gas_k   temperature of the new gas at the burner, K; 0: as the old one
 *   result      out: untouched on failure; holds pointers to gases and burner
 *
 * Takes it: no limit broken, every danger covered. After adjustment: none stays broken. Else, and where a danger is
 * covered by no method, it does not take it.
 * BC_ERR_USAGE: gases at different states; errors of bc_burner_set() and bc_burner_respond(). */
BC_API BC_MUST_USE bc_status bc_switch_judge(const bc_subject *old_gas, const bc_subject *new_gas, const bc_burner *burner, double new_gas_k,
                                             bc_switch *result, bc_error *err);

/* "the burner takes the new gas", the same with "after adjustment", or "the burner does not take the new gas"; never NULL. */
BC_API const char *bc_switch_text(bc_switch_verdict verdict);

#ifdef __cplusplus
}
#endif

#endif
