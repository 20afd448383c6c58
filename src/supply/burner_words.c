/* SPDX-License-Identifier: MIT */
/* burner_words.c - the words of a burner file, and what the controls mean. */
#include "supply/burner_words.h"

#include "base/compiler.h"
#include "bluecone/burner.h"

const char *const TYPE_WORDS[] = {"atmospheric", "premix", "nozzle-mix", "engine", NULL};
const char *const CONTROL_WORDS[] = {"fixed", "pneumatic", "electronic-volume", "electronic-mass", "trim-air", "trim-gas", "entrained", NULL};
const char *const DOSING_WORDS[] = {"orifice", "volume", "mass", NULL};
const char *const HEAT_WORDS[] = {"net", "gross", NULL};
const char *const BASIS_WORDS[] = {"dry", "wet", NULL};

_Static_assert(BC_COUNT(TYPE_WORDS) == BC_BURNER_TYPES + 1, "a type has no word");
_Static_assert(BC_COUNT(CONTROL_WORDS) == BC_CONTROLS + 1, "a control has no word");
_Static_assert(BC_COUNT(DOSING_WORDS) == BC_DOSINGS + 1, "a dosing has no word");

static const char *const MEANINGS[BC_CONTROLS] = {
    [BC_CONTROL_FIXED] = "fixed orifice and gas pressure, fixed air flow",
    [BC_CONTROL_PNEUMATIC] = "gas pressure coupled to air pressure, seen at one air flow",
    [BC_CONTROL_VOLUME] = "electronic ratio, gas by volume meter",
    [BC_CONTROL_MASS] = "electronic ratio, gas by mass meter",
    [BC_CONTROL_TRIM_AIR] = "flue oxygen held by trimming the air",
    [BC_CONTROL_TRIM_GAS] = "flue oxygen held by trimming the gas, air flow fixed",
    [BC_CONTROL_ENTRAINED] = "primary air drawn by the gas jet, secondary air by the draught",
};

const char *bc_burner_type_word(bc_burner_type type)
{
    const size_t i = (size_t)type;

    return i < BC_BURNER_TYPES ? TYPE_WORDS[i] : "";
}

const char *bc_control_word(bc_control control)
{
    const size_t i = (size_t)control;

    return i < BC_CONTROLS ? CONTROL_WORDS[i] : "";
}

const char *bc_control_meaning(bc_control control)
{
    const size_t i = (size_t)control;

    return i < BC_CONTROLS ? MEANINGS[i] : "";
}

const char *bc_dosing_word(bc_dosing dosing)
{
    const size_t i = (size_t)dosing;

    return i < BC_DOSINGS ? DOSING_WORDS[i] : "";
}
