#!/bin/sh
# What is installed resists: the program is position independent; program, library and modules have all relocations
# read-only before they start, no stack and no segment that is both written and run, no path of their own to libraries;
# buffers on the stack and calls of the C library are checked; on x86, jumps land where they may. What gcc and ld of
# Debian 12 promise by -fcf-protection stands in our objects only: its own start code does not have it.
set -eu

bad=0
complain() { echo "hardening: ${file##*/} $*"; bad=1; }

# has WORDS CAUSE, lacks WORDS CAUSE: in what readelf tells about $file.
has() { grep -q -E "$1" "$WORK/told" || complain "$2"; }
lacks() { ! grep -q -E "$1" "$WORK/told" || complain "$2"; }

for file in "$OUT/bluecone" "$OUT/libbluecone.so.0" "$OUT/bluecone_chart.so" "$OUT/bluecone_workbook.so"; do
    readelf --wide --file-header --segments --dynamic "$file" >"$WORK/told"
    has 'Type: *DYN' 'is not position independent'
    has 'GNU_RELRO' 'has no read-only relocations'
    has '\(FLAGS_1\).* NOW' 'binds symbols as it goes: relocations stay writable'
    has 'GNU_STACK.* RW ' 'has a stack that can be run'
    lacks '^ *LOAD .* RWE ' 'has a segment that is both written and run'
    lacks 'TEXTREL' 'has relocations in its code'
    lacks '\((RPATH|RUNPATH)\)' 'brings a path of its own to libraries'

    nm -D --undefined-only --format=posix "$file" | sed 's/[@ ].*//' >"$WORK/told"
    has '^__stack_chk_fail$' 'does not watch its stack'
    # Without -O there is nothing to fortify with.
    grep -q -e '-O0' "$OUT/flags" || has '^__[a-z]*_chk$' 'has no call of the C library checked'
    lacks '^v?[fs]?printf$|^v?dprintf$' 'prints by unchecked calls'
done

file=$OUT/bluecone
readelf --wide --dynamic "$file" >"$WORK/told"
has '\(FLAGS_1\).* PIE' 'is no position independent program'

case $(readelf --file-header "$OUT/bluecone") in
*X86-64*)
    for file in "$OUT"/src/*/*.o; do
        readelf --wide --notes "$file" >"$WORK/told" 2>/dev/null
        has 'x86 feature: IBT, SHSTK' 'is compiled without -fcf-protection'
    done
    ;;
esac
exit $bad
