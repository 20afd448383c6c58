#!/bin/sh
# What the library gives and takes: it exports the symbols of tests/abi/symbols, which start with bc_, and
# takes from other libraries those of tests/abi/needs, each with its reason, and no others. So it neither
# prints nor ends the process, reads no environment, sets no locale; and the physics allocates nothing.
set -eu

nm -D --defined-only --format=posix "$OUT/libbluecone.so.0" | awk '{ print $1 }' | LC_ALL=C sort >"$WORK/exports"
bad=0
if grep -v '^bc_' "$WORK/exports"; then
    echo 'symbols: the above are exported and do not start with bc_'
    bad=1
fi
if ! diff -u --label tests/abi/symbols --label exported "$SRC/tests/abi/symbols" "$WORK/exports"; then
    echo 'symbols: the exported symbols changed; if that is meant, run make symbols'
    bad=1
fi

# Names as a source writes them: __fprintf_chk is fprintf, __isoc99_sscanf is sscanf.
as_written() { sed -e 's/@.*//' -e 's/^__\(.*\)_chk$/\1/' -e 's/^__isoc99_//' -e 's/^__xpg_//'; }

nm -D --undefined-only --format=posix "$OUT/libbluecone.so.0" | awk '{ print $1 }' | as_written | LC_ALL=C sort -u >"$WORK/needed"
sed -n 's/^\([a-z_0-9]*\) .*[a-z].*/\1/p' "$SRC/tests/abi/needs" | LC_ALL=C sort >"$WORK/allowed"
LC_ALL=C comm -23 "$WORK/needed" "$WORK/allowed" | grep -v -e '^_ITM_' -e '^__gmon_start__$' -e '^__cxa_finalize$' >"$WORK/foreign" || true
if test -s "$WORK/foreign"; then
    sed 's/^/symbols: the library needs /' "$WORK/foreign"
    echo 'symbols: the above is not in tests/abi/needs; do without it, or say there why the library may need it'
    bad=1
fi

# forbid FLOORS NAMES: no object of these floors may need one of these names of the C library.
forbid() {
    for floor in $1; do
        for object in "$OUT/src/$floor"/*.o; do
            test -e "$object" || continue
            nm --undefined-only --format=posix "$object" | awk '{ print $1 }' | as_written >"$WORK/imports"
            for name in $2; do
                if grep -qx "$name" "$WORK/imports"; then
                    echo "symbols: $floor/$(basename "$object") needs $name"
                    bad=1
                fi
            done
        done
    done
}
forbid 'base gas value flame supply' 'printf vprintf puts putchar perror stdout stderr exit _exit abort __assert_fail
    setlocale localeconv getenv secure_getenv strtok strerror localtime gmtime rand srand random'
forbid 'value flame' 'malloc calloc realloc free strdup qsort fprintf vfprintf fputs fwrite fopen open write'
exit $bad
