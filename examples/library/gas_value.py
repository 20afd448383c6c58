#!/usr/bin/env python3
# SPDX-License-Identifier: MIT
"""What a gas is worth, by the library, with nothing but ctypes: gas_value.py GAS...

Prints what gas_value.c prints. A GAS is a composition file or a literal such as methane=92,ethane=8.
The structures below are those of the headers, member by member; BLUECONE_LIBRARY names the library
where the loader does not find it.
"""
import os
import sys
from ctypes import (CDLL, POINTER, Structure, byref, c_bool, c_char, c_char_p, c_double, c_int, c_size_t,
                    c_ubyte, create_string_buffer)

CAPACITY = 96  # BC_SPECIES_CAPACITY
PER_SPECIES = c_double * CAPACITY


class bc_error(Structure):
    _fields_ = [("status", c_int), ("file", c_char * 512), ("line", c_int), ("message", c_char * 512)]


class bc_gas(Structure):
    _fields_ = [("x", PER_SPECIES)]


class bc_spread(Structure):
    _fields_ = [("count", c_size_t), ("dx", PER_SPECIES * CAPACITY)]


class bc_state(Structure):
    _fields_ = [("combustion_c", c_double), ("metering_c", c_double), ("metering_pa", c_double), ("saturated", c_bool),
                ("edition", c_int)]


class bc_reference(Structure):
    _fields_ = [("state", bc_state)] + [
        (name, PER_SPECIES) for name in ("gross_j_per_mol", "net_j_per_mol", "u_gross_j_per_mol", "mass_kg_per_mol",
                                         "factor", "u_factor")] + [
        ("heat_origin", c_ubyte * CAPACITY), ("factor_origin", c_ubyte * CAPACITY)] + [
        (name, c_double) for name in ("vaporisation_j_per_mol", "u_vaporisation_j_per_mol", "r_j_per_mol_k",
                                      "u_r_j_per_mol_k", "air_kg_per_mol", "u_air_kg_per_mol", "air_z", "u_air_z")]


class bc_value(Structure):
    _fields_ = [(name, c_double) for name in (
        "molar_mass_kg_per_mol", "z", "gross_j_per_mol", "net_j_per_mol", "gross_j_per_kg", "net_j_per_kg",
        "gross_j_per_m3", "net_j_per_m3", "gross_ideal_j_per_m3", "net_ideal_j_per_m3", "density_kg_per_m3",
        "density_ideal_kg_per_m3", "relative_density", "relative_density_ideal", "wobbe_gross_j_per_m3",
        "wobbe_net_j_per_m3", "wobbe_gross_ideal_j_per_m3", "wobbe_net_ideal_j_per_m3", "molar_volume_m3_per_mol")]


class bc_subject(Structure):
    _fields_ = [("reference", POINTER(bc_reference)), ("spread", POINTER(bc_spread)), ("spread_scale", c_double),
                ("gas", bc_gas), ("atoms", c_double * 8), ("value", bc_value)]


class bc_quantity(Structure):
    _fields_ = [(name, c_char_p) for name in ("id", "label", "group", "unit", "method", "meaning")] + [
        ("digits", c_int), ("has_scatter", c_bool)]


class bc_figure(Structure):
    _fields_ = [("value", c_double), ("has_u", c_bool), ("u", c_double), ("u_composition", c_double),
                ("u_tables", c_double)]


class bc_per_amount(Structure):
    _fields_ = [("given", c_bool), ("si", c_double), ("of", c_int), ("net", c_bool), ("has_metering", c_bool),
                ("metering_c", c_double)]


class bc_offer(Structure):
    _fields_ = [("price", bc_per_amount), ("currency", c_char * 16), ("co2", bc_per_amount),
                ("max_flow", bc_per_amount), ("biogenic", c_bool)]


class bc_entry(Structure):
    _fields_ = [("word", c_char * 64), ("amount", c_double), ("u", c_double), ("is_rest", c_bool), ("line", c_int),
                ("parts", PER_SPECIES)]


class bc_printed_line(Structure):
    _fields_ = [("id", c_char * 64), ("text", c_char * 48), ("line", c_int)]


class bc_composition(Structure):
    _fields_ = [("name", c_char * 128), ("family", c_char * 32), ("origin", c_char * 256), ("path", c_char * 512),
                ("bundled", c_char * 64), ("basis", c_int), ("moisture", c_int), ("closure", c_int),
                ("measured_at_k", c_double), ("measured_at_pa", c_double), ("sum", c_double),
                ("has_uncertainty", c_bool), ("air_suspected", c_bool), ("gas", bc_gas), ("offer", bc_offer),
                ("printed_count", c_size_t), ("printed", bc_printed_line * 16), ("remark_count", c_size_t),
                ("remarks", c_char * 320 * 12), ("entry_count", c_size_t), ("entries", bc_entry * 96),
                ("spread", bc_spread)]


try:
    library = CDLL(os.environ.get("BLUECONE_LIBRARY", "libbluecone.so.0"))
except OSError as missing:
    print("gas_value: %s; name the library by its path in BLUECONE_LIBRARY" % missing, file=sys.stderr)
    sys.exit(4)
library.bc_state_default.restype = bc_state
library.bc_quantity_at.restype = POINTER(bc_quantity)
library.bc_quantity_at.argtypes = [c_size_t]
library.bc_quantity_evaluate.argtypes = [c_size_t, POINTER(bc_subject), POINTER(bc_figure), POINTER(bc_error)]


class Refused(Exception):
    """What the library would not do: its sentence, and the exit code that belongs to it."""

    def __init__(self, error):
        super().__init__(error.message.decode())
        self.line = error.line
        self.code = library.bc_exit_code(error.status)


def call(function, *arguments):
    """Calls a function of the library that returns a bc_status and takes a bc_error last."""
    error = bc_error()
    if function(*arguments, byref(error)) != 0:
        raise Refused(error)


def print_quantity(subject, word):
    index = c_size_t()
    figure = bc_figure()
    call(library.bc_quantity_find, word, byref(index))
    call(library.bc_quantity_evaluate, index, byref(subject), byref(figure))
    quantity = library.bc_quantity_at(index).contents
    unit = "" if quantity.unit == b"1" else " " + quantity.unit.decode()
    uncertainty = ", standard uncertainty %.2g" % figure.u if figure.has_u else ""
    print("  %-18s %.*g%s%s" % (quantity.id.decode(), quantity.digits, figure.value, unit, uncertainty))


def print_gas(reference, word):
    composition = bc_composition()
    subject = bc_subject()
    call(library.bc_composition_find, word.encode(), None, c_size_t(0), byref(composition))
    print(composition.name.decode())
    for remark in composition.remarks[:composition.remark_count]:
        print("  note:", remark.value.decode())
    call(library.bc_subject_make, byref(reference), byref(composition.gas), byref(composition.spread), byref(subject))
    for asked in (b"hhv", b"wobbe-gross", b"relative-density", b"air-demand", b"flame-temperature"):
        print_quantity(subject, asked)


def main(words):
    state = library.bc_state_default()
    reference = bc_reference()
    text = create_string_buffer(160)
    word = "state"
    try:
        call(library.bc_state_parse, b"25/0", byref(state))
        call(library.bc_reference_at, byref(state), byref(reference))
        library.bc_state_describe(byref(state), text, c_size_t(len(text)))
        print("At %s:" % text.value.decode())
        for word in words:
            print_gas(reference, word)
    except Refused as refused:
        sys.stdout.flush()
        line = ":%d" % refused.line if refused.line > 0 else ""
        print("gas_value: %s%s: %s" % (word, line, refused), file=sys.stderr)
        return refused.code
    return 0


if __name__ == "__main__":
    sys.exit(main(sys.argv[1:]))
