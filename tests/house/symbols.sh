#!/bin/sh
# What the library gives and takes: exports start with bc_ and are those of tests/abi/symbols; it
# neither prints nor exits nor reads the environment; the physics allocates nothing.
set -eu

nm -D --defined-only --format=posix "$OUT/libbluecone.so.0" | awk '{ print $1 }' | LC_ALL=C sort >"$WORK/exports"
bad=0
if grep -v '^bc_' "$WORK/exports"; then
    echo 'symbols: the above are exported and do not start with bc_'
    bad=1
fi
if test -e "$SRC/tests/abi/symbols" && ! diff -u --label tests/abi/symbols --label exported "$SRC/tests/abi/symbols" "$WORK/exports"; then
    echo 'symbols: the exported symbols changed; if that is meant, run make symbols'
    bad=1
fi

# forbid FLOORS NAMES: no object of these floors may need one of these names of the C library.
forbid() {
    for floor in $1; do
        for object in "$OUT/src/$floor"/*.o; do
            test -e "$object" || continue
            # __fprintf_chk is fprintf, __isoc99_sscanf is sscanf
            nm --undefined-only --format=posix "$object" | awk '{ print $1 }' |
                sed -e 's/^__\(.*\)_chk$/\1/' -e 's/^__isoc99_//' >"$WORK/imports"
            for name in $2; do
                if grep -qx "$name" "$WORK/imports"; then
                    echo "symbols: $floor/$(basename "$object") needs $name"
                    bad=1
                fi
            done
        done
    done
}
forbid 'base gas value flame supply' 'printf vprintf puts putchar perror stdout stderr exit _exit abort
    setlocale getenv secure_getenv strtok strerror localtime gmtime rand srand random'
forbid 'value flame' 'malloc calloc realloc free strdup fprintf vfprintf fputs fwrite fopen'
exit $bad
