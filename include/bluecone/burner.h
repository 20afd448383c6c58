/* SPDX-License-Identifier: MIT */
/* bluecone/burner.h - a burner as it was set on one gas, and what it does on another.
 *
 * Read or fill a bc_burner, set it on the old gas, ask for its response to a new one, then for the setting that
 * would restore heat input and air. Flows follow from one steady throughput each: orifice, meter, trim or jet.
 * Source: Bernoulli's equation, St. Venant and Wantzel for high pressures, a momentum balance for entrained air,
 * balances of elements and enthalpy for the flue gas; own derivation where no document is named. */
#ifndef BLUECONE_BURNER_H
#define BLUECONE_BURNER_H

#include <stdbool.h>
#include <stddef.h>

#include "bluecone/burn.h"
#include "bluecone/status.h"
#include "bluecone/subject.h"

#ifdef __cplusplus
extern "C" {
#endif

/* Kinds of burner: they decide which dangers there are. */
typedef enum {
    BC_BURNER_ATMOSPHERIC, /* partly aerated, open ports: all dangers of the published indices */
    BC_BURNER_PREMIX,      /* fan, gas and air mixed before the ports */
    BC_BURNER_NOZZLE_MIX,  /* gas and air meet in the furnace: nothing to flash back into */
    BC_BURNER_ENGINE,      /* spark ignition: knock */
    BC_BURNER_TYPES
} bc_burner_type;

/* What keeps gas and air together. */
typedef enum {
    BC_CONTROL_FIXED,     /* fixed orifice and gas pressure, fixed air flow */
    BC_CONTROL_PNEUMATIC, /* gas and air pressure coupled by a ratio regulator; seen at one air flow */
    BC_CONTROL_VOLUME,    /* electronic ratio, gas by volume meter brought to the metering state */
    BC_CONTROL_MASS,      /* electronic ratio, gas by mass meter */
    BC_CONTROL_TRIM_AIR,  /* oxygen of the flue gas held by the air; gas as `dosing` says */
    BC_CONTROL_TRIM_GAS,  /* oxygen held by the gas, air flow fixed */
    BC_CONTROL_ENTRAINED, /* the gas jet draws its primary air */
    BC_CONTROLS
} bc_control;

/* How the gas flow answers to the gas. */
typedef enum { BC_DOSING_ORIFICE, BC_DOSING_VOLUME, BC_DOSING_MASS, BC_DOSINGS } bc_dosing;

/* The words of a burner file, and what they mean in a line; "" out of range. */
BC_API const char *bc_burner_type_word(bc_burner_type type);
BC_API const char *bc_control_word(bc_control control);
BC_API const char *bc_control_meaning(bc_control control);
BC_API const char *bc_dosing_word(bc_dosing dosing);

/* Limits with each side on its own. */
typedef struct {
    bool has_min, has_max;
    double min, max;
} bc_burner_limit;

/* How the air was set on the old gas. */
typedef enum { BC_AIR_BY_LAMBDA, BC_AIR_BY_FLUE_O2 } bc_air_setting;

#define BC_BURNER_KEYS_MAX 40 /* room for the keys of a burner file */

/* A burner. Every member has a default (bc_burner_default()); those with a `has_` may be missing. */
typedef struct {
    char name[96], source[160], path[BC_FILE_MAX];
    bc_burner_type type;
    bc_control control;
    bc_dosing dosing;           /* of a trim; the other controls imply theirs */
    bool has_input;
    double input_w;             /* heat input on the old gas, W */
    bool input_is_gross;        /* else net */
    bool has_pressure;
    double gas_pa;              /* in front of the orifice, above the atmosphere, Pa */
    bool has_orifice;
    double orifice_m;           /* diameter of one, m */
    double orifices;            /* their number */
    double discharge;           /* coefficient, 1 */
    double ambient_pa;          /* atmosphere, Pa absolute */
    double gas_k, air_k, flue_k; /* gas and air at the burner, flue gas where it leaves, K */
    bc_air_setting air_setting;
    double lambda;              /* on the old gas, BC_AIR_BY_LAMBDA */
    double flue_o2;             /* mole fraction, BC_AIR_BY_FLUE_O2 */
    bc_flue_basis o2_basis;     /* of the reading, of a trim's probe and of the limits */
    bool has_air_dew;
    double air_dew_k;           /* dew point of the air; without it the air is dry */
    double primary;             /* entrained air: primary air over the need of the gas, 1 */
    double trim_range;          /* most that a trim moves its flow, fraction */
    double casing_loss;         /* fraction of the net heat */
    double co_lambda;           /* below this air factor carbon monoxide is to be feared, 1 */
    bc_burner_limit input;      /* of the heat input on the old gas, fraction */
    bc_burner_limit o2;         /* of the flue gas on o2_basis, mole fraction */
    bc_burner_limit flame;      /* adiabatic flame temperature, K */
    bc_burner_limit velocity;   /* burning velocity over that of the old gas, fraction */
    bc_burner_limit methane_number; /* 1 */
    bool stated[BC_BURNER_KEYS_MAX]; /* by index of bc_burner_key_at() */
} bc_burner;

/* A nozzle-mixing burner with fixed orifice and air: lambda 1.2, gas at 15 C, air at 25 C, both dry, flue gas at 150 C,
 * discharge 0.8, trims within 15 %, no casing loss, CO feared below lambda 1.05, heat input 95 to 105 %, else no
 * limits. Defaults are common practice, value from memory; the heat limits are those of Weaver's JH. */
BC_API bc_burner bc_burner_default(void);

/* Reads a burner file (bluecone-burner(5)).
 *
 *   burner   out: untouched on failure
 *
 * BC_ERR_INPUT: what is wrong with the file, with its line; BC_ERR_FILE, BC_ERR_MEMORY. */
BC_API BC_MUST_USE bc_status bc_burner_read(const char *path, bc_burner *burner, bc_error *err);

/* A key of the burner file. Static texts. */
typedef struct {
    const char *section, *key, *meaning;
} bc_burner_key;

/* The keys in the order of the manual; NULL out of range. */
BC_API size_t bc_burner_key_count(void);
BC_API const bc_burner_key *bc_burner_key_at(size_t index);

/* The value of a key in words, in the unit of the manual ("1.2", "150 C"); "" when it has none, or no say with the
 * control of the burner. */
BC_API void bc_burner_key_text(const bc_burner *burner, size_t index, char *text, size_t size);

/* A burner set on its old gas. Holds pointers to both, which must outlive it. */
typedef struct {
    const bc_burner *burner;
    const bc_subject *old_gas;
    bc_gas air;             /* as it comes to the burner */
    double need;            /* mol of this air per mol of old gas */
    double lambda;          /* on the old gas */
    double o2;              /* of its flue gas on o2_basis, mole fraction: what a trim holds */
    double jet;             /* entrained air: (1 + r/theta)(1 + r/d), r mol/mol, of the setting */
    double secondary;       /* entrained air: air beside the primary, mol per mol of old gas */
    double fuel_mol_per_s;  /* on the old gas, with has_flow */
    double input_w;         /* net, with has_flow */
    double gas_pa;          /* with has_pressure */
    double area_m2;         /* of all orifices, with has_area */
    double implied_discharge; /* with has_implied: makes input, pressure and orifice agree */
    bc_dosing dosing;       /* that of the control */
    bool has_flow;          /* the heat input is known */
    bool has_pressure;      /* stated, or from input and orifice */
    bool has_area;          /* stated, or from input and pressure */
    bool has_implied;       /* input, pressure and orifice are all stated */
} bc_burner_case;

/* Sets a burner on a gas.
 *
 *   set   out: untouched on failure
 *
 * BC_ERR_RANGE: a gas that does not burn, a flue oxygen or a humidity that cannot be; BC_ERR_INPUT: primary air above
 * the air in all. */
BC_API BC_MUST_USE bc_status bc_burner_set(const bc_burner *burner, const bc_subject *old_gas, bc_burner_case *set, bc_error *err);

/* What was changed at the burner since it was set, as factors; 1 leaves a thing as it was. */
typedef struct {
    double area;     /* of the orifice */
    double pressure; /* of the gas above the atmosphere */
    double gas;      /* set point of a metered gas flow */
    double air;      /* air flow, or its set point; for entrained air primary and secondary alike */
    double gas_k;    /* temperature of the new gas at the burner, K; 0: as the old one */
} bc_burner_setting;

/* Nothing changed: all factors 1. */
BC_API bc_burner_setting bc_burner_setting_as_found(void);

/* What the burner does on a gas. Ratios are to the old gas on the setting as found. */
typedef struct {
    double fuel_ratio, air_ratio, flue_ratio; /* amounts a second; flue gas wet */
    double heat_ratio;      /* net heat input */
    bool trim_at_end;       /* the trim is out of range: the oxygen moves after all */
    double lambda;
    double primary;         /* entrained air: primary air over the need; 0 otherwise */
    double o2_dry, o2_wet;  /* of the flue gas, mole fractions */
    double co_dry;          /* carbon monoxide of the dry flue gas at lack of air, equilibrium; 0 with air enough */
    bc_burn burn;           /* all else: flame, dew points, efficiency (not filled at lack of air) */
    bool has_velocity;      /* the gas is within the mixing rule */
    double velocity_m_per_s;
    bool has_flow;          /* the three below are known */
    double input_w, fuel_mol_per_s, flue_kg_per_s;
} bc_burner_response;

/* Works out the response. With the orifice dosing:  n ~ area sqrt(p p_abs/(M Z T)), above 3 % of the absolute
 * pressure the isentropic nozzle with the gas's own cp/cv, choked or not; by volume meter n ~ 1/V, by mass
 * meter n ~ 1/M. Entrained primary air: (1 + r/theta)(1 + r/d) = const, theta = T_gas/T_air. The secondary air
 * beside it keeps its flow.
 *
 *   response   out: untouched on failure
 *
 * BC_ERR_RANGE: a gas that does not burn, an air factor or flame beyond bc_burn_of(), an oxygen that the new gas
 * cannot give. */
BC_API BC_MUST_USE bc_status bc_burner_respond(const bc_burner_case *set, const bc_subject *new_gas, const bc_burner_setting *setting,
                                               bc_burner_response *response, bc_error *err);

/* What restores heat input and air ratio of the old gas on a new one. Factors on the setting as found. */
typedef struct {
    double heat_as_found;     /* heat input ratio with the gas side left alone and no trim */
    bool by_orifice;          /* else by set point of the gas flow */
    double area, diameter;    /* orifice at the old pressure */
    bool has_pressure;        /* such a pressure exists */
    double pressure;          /* gas pressure at the old orifice */
    double gas;               /* set point of a metered gas */
    double lambda_target;     /* air factor of the old setting; with a trim that of the oxygen it holds */
    double air;               /* air flow, with the heat restored by orifice or set point */
    double air_by_pressure;   /* the same with the heat restored by pressure; differs with entrained air alone */
    double air_alone;         /* air flow, with the gas side left alone */
} bc_burner_remedy;

/* Errors as bc_burner_respond(). */
BC_API BC_MUST_USE bc_status bc_burner_restore(const bc_burner_case *set, const bc_subject *new_gas, double new_gas_k,
                                               bc_burner_remedy *remedy, bc_error *err);

/* The setting of a remedy: by pressure where asked for and possible, else by orifice or set point. */
BC_API bc_burner_setting bc_burner_setting_of(const bc_burner_remedy *remedy, bool by_pressure, double new_gas_k);

#ifdef __cplusplus
}
#endif

#endif
