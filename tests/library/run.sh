#!/bin/bash
# The package as others get it: tests/library/run.sh FOLDER_OF_THE_BUILD
#
# Installs into an empty folder, builds the examples of examples/library against what was installed, shared and
# static, as C and as C++, runs them beside the one for Python, and uninstalls.
#
# Speaks the Test Anything Protocol; exit 1 when one test fails. UPDATE=1 writes examples/library/gas_value.out anew.
set -u
export LC_ALL=C

SRC=$(cd "$(dirname "$0")/../.." && pwd) || exit 2
OUT=${1:-build/release}
cd "$SRC" || exit 2
test -e "$OUT/libbluecone.so.0" || { echo "run.sh: no library in $OUT: run make first" >&2; exit 2; }
work=$(mktemp -d) || exit 2
trap 'rm -rf "$work"' EXIT
trap 'exit 2' INT TERM
# shellcheck source=tests/library/python.sh
. tests/library/python.sh
use_python "$OUT" "$work/bin"

# shellcheck source=tests/tap.sh
. "$SRC/tests/tap.sh"

# The settings of the make that runs this go on, but not its job server, which it does not hand down.
MAKEFLAGS=$(printf '%s' "${MAKEFLAGS-}" | sed -e 's/ *--jobserver[^ ]*//g' -e 's/ *-j[0-9]*//g')
export MAKEFLAGS
own_make() { "${MAKE:-make}" --no-print-directory OUT="$OUT" DESTDIR="$work/root" V=@ "$@" >"$work/log" 2>&1 || cat "$work/log"; }

listed() { (cd "$work/root" && find . ! -type d | LC_ALL=C sort); }

own_make install >"$work/wrong"
point 'the package installs into a folder of its own'

prefix=$(sed -n 's/^prefix=//p' "$OUT/bluecone.pc")
root=$work/root$prefix
flags() { PKG_CONFIG_SYSROOT_DIR=$work/root PKG_CONFIG_LIBDIR=$root/lib/pkgconfig pkg-config "$@" bluecone; }
export LD_LIBRARY_PATH=$root/lib

{
    listed | sed -n 's|.*/man/man3/\(.*\)\.3$|\1|p' | LC_ALL=C sort >"$work/pages"
    for header in include/bluecone/*.h; do
        name=$(basename "$header" .h)
        test "$name" = bluecone && echo bluecone || echo "bluecone_$name"
    done | LC_ALL=C sort | diff - "$work/pages"
} >"$work/wrong"
point 'every public header has its page'

mandoc -T lint -W warning "$root"/share/man/man3/*.3 >"$work/wrong" 2>&1
point 'mandoc finds nothing in the pages of the headers'

for page in "$root"/share/man/man3/*.3; do groff -mdoc -ww -T utf8 -z "$page"; done >"$work/wrong" 2>&1
point 'groff finds nothing in the pages of the headers'

for page in "$root"/share/man/man3/bluecone_*.3; do
    name=$(basename "$page" .3)
    grep -q "^\.Xr $name 3" man/bluecone.3 || echo "bluecone(3) does not name $name(3)"
    mandoc -T ascii "$page" | sed "s/.$(printf '\b')//g" | awk -v name="$name" 'length > 80 { print name ": " $0 }'
done >"$work/wrong"
point 'bluecone(3) leads to every page, and every page fits a terminal'

nm -D --defined-only --format=posix "$root/lib/libbluecone.so.0" | awk '{ print $1 }' | grep '^bc_' | while read -r symbol; do
    grep -qx -e "\.Nm $symbol" -e "\.Nm $symbol ," "$root"/share/man/man3/bluecone_*.3 || echo "$symbol is on no page"
done >"$work/wrong"
point 'every exported function is named by a page'

# refuses TEXT WORDS: the maker of the pages must stop at a header with this text, and say these words.
refuses() {
    printf '/* SPDX-License-Identifier: MIT */\n/* bluecone/odd.h - odd. */\n\n%b\n' "$1" >"$work/odd.h"
    if awk -v date=today -f src/header_page.awk "$work/odd.h" >/dev/null 2>"$work/said"; then
        echo "a page was made of: $1"
    elif ! grep -q "odd.h.*$2" "$work/said"; then
        echo "$1: said $(cat "$work/said"), not $2"
    fi
}
{
    refuses '/* What? */\n\nBC_API int bc_odd(void);' 'a comment that explains nothing'
    refuses 'BC_API int bc_odd(void);' 'bc_odd is not explained'
    refuses '/* Odd. */\nBC_API int bc_odd(void);\nint odd;' 'not understood'
    refuses 'union bc_odd;' 'not understood'
    refuses '/* Odd. */\ntypedef struct {\n    int a; /* first */ int b;\n} bc_odd;' 'code behind a comment'
    refuses '/* Odd.' 'a comment without end'
} >"$work/wrong"
point 'a header that could not be shown whole makes no page'

test "$(objdump -p "$root/lib/libbluecone.so.0" | awk '$1 == "SONAME" { print $2 }')" = libbluecone.so.0 || echo 'not libbluecone.so.0' >"$work/wrong"
point 'the shared library has its versioned name'

test -e "$(flags --variable=compositions)/g20.ini" || flags --variable=compositions >"$work/wrong"
point 'pkg-config leads to the bundled gases'

# ---- the examples ---------------------------------------------------------------------------------
GASES='present-supply.ini new-supply-offer.ini hydrogen-blend.ini'
STRICT='-Wall -Wextra -Wpedantic -Werror'

# check PROGRAM...: prints what is stored for the gases of the scenario, and refuses as the library does.
check() {
    # shellcheck disable=SC2086 # lists of words
    (cd examples && "$@" $GASES) >"$work/got" 2>&1 || echo "exit $?" >>"$work/got"
    test "${UPDATE:-0}" = 0 || cp "$work/got" examples/library/gas_value.out
    diff -u --label examples/library/gas_value.out --label printed examples/library/gas_value.out "$work/got"
    printf '[components]\nmethane = 92\nethan = 8\n' >"$work/bad.ini"
    (cd "$work" && "$@" bad.ini) >"$work/got" 2>&1
    echo "exit $?" >>"$work/got"
    diff -u --label wanted --label printed - "$work/got" <<'END'
At combustion 25 C, metering 0 C and 101.325 kPa, water as stated, ISO 6976:2016:
gas_value: bad.ini:3: unknown component 'ethan'; the nearest known one is 'ethane' (bluecone list species)
exit 3
END
}

# build_c FLAGS...: builds and checks gas_value.c.
build_c() {
    # shellcheck disable=SC2086 # a list of words
    "${CC:-gcc}" -std=c11 $STRICT examples/library/gas_value.c "$@" -o "$work/gas_value" 2>&1 && check "$work/gas_value"
}

# shellcheck disable=SC2046,SC2086 # flags are lists of words
{
    build_c $(flags --cflags --libs) >"$work/wrong"
    point 'the C example builds with pkg-config and prints what is stored'

    build_c $(flags --static --cflags --libs | sed 's/-lbluecone/-Wl,-Bstatic -lbluecone -Wl,-Bdynamic/') >"$work/wrong"
    ldd "$work/gas_value" | grep libbluecone >>"$work/wrong"
    point 'it does so with the static library'

    "${CXX:-g++}" -std=c++11 $STRICT -x c++ examples/library/gas_value.c -x none $(flags --cflags --libs) -o "$work/gas_value_cpp" >"$work/wrong" 2>&1 &&
        check "$work/gas_value_cpp" >"$work/wrong"
    point 'it does so as C++'
}

check python3 "$SRC/examples/library/gas_value.py" >"$work/wrong" 2>&1
point 'the Python example prints the same'

{
    (cd "$work" && BLUECONE_LIBRARY=./none.so python3 "$SRC/examples/library/gas_value.py" g20) >"$work/got" 2>&1
    echo "exit $?" >>"$work/got"
    diff -u --label wanted --label printed - "$work/got" <<'END'
gas_value: ./none.so: cannot open shared object file: No such file or directory; name the library by its path in BLUECONE_LIBRARY
exit 4
END
} >"$work/wrong"
point 'without a library it says how to name one'

PYTHONDONTWRITEBYTECODE=1 python3 - "$SRC" >"$work/wrong" 2>&1 <<'END'
import ctypes, re, sys
sys.path.insert(0, sys.argv[1] + "/examples/library")
import gas_value

size = None
layout = {}
for line in open(sys.argv[1] + "/tests/abi/interface"):
    if match := re.match(r"struct (\w+) (\d+),", line):
        size = layout[match[1]] = {"": int(match[2])}
    elif match := re.match(r"  (\d+)\+(\d+) .*?(\w+)(\[.*)?$", line):
        size[match[3]] = (int(match[1]), int(match[2]))
for name, structure in vars(gas_value).items():
    if isinstance(structure, type) and issubclass(structure, ctypes.Structure) and structure is not ctypes.Structure:
        wanted = layout[name]
        if ctypes.sizeof(structure) != wanted[""]:
            print(f"{name}: {ctypes.sizeof(structure)} bytes, not {wanted['']}")
        members = [member for member in wanted if member]
        if members != [field[0] for field in structure._fields_]:
            print(f"{name}: members {[field[0] for field in structure._fields_]}, not {members}")
        for member in members:
            place = getattr(structure, member)
            if (place.offset, place.size) != wanted[member]:
                print(f"{name}.{member}: {place.offset}+{place.size}, not {wanted[member]}")
END
point 'its structures are those of the accepted interface'

# ---- the end --------------------------------------------------------------------------------------
own_make uninstall >"$work/wrong"
listed >>"$work/wrong"
point 'uninstall takes all of it away'

echo "1..$count"
test "$failed" -eq 0
