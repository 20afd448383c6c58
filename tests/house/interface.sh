#!/bin/sh
# The binary interface is the accepted one, tests/abi/interface: constants, structures member by member, prototypes.
# With the argument "print" it writes the interface that the headers have now.
#
# What is compared is that of machines with 64-bit pointers and long; others have nothing accepted.
set -eu

here=$(cd "$(dirname "$0")" && pwd)
accepted=$SRC/tests/abi/interface

print_interface() {
    LC_ALL=C awk -f "$here/interface.awk" "$SRC"/include/bluecone/*.h >"$WORK/interface.c"
    "${CC:-gcc}" -std=c11 -w -I "$SRC/include" "$WORK/interface.c" -o "$WORK/interface"
    "$WORK/interface"
}

if test "${1-}" = print; then
    print_interface
elif test "$(getconf LONG_BIT)" = 64; then
    print_interface >"$WORK/now"
    if ! diff -u --label tests/abi/interface --label now "$accepted" "$WORK/now"; then
        echo 'interface: the binary interface changed; if that is meant, run make symbols'
        exit 1
    fi
fi
