#!/bin/bash
# The source archive is the same every time, and whole; the templates of the packages keep to the source.
# tests/package/run.sh speaks the Test Anything Protocol; exit 1 when one test fails.
#
# Building packages takes minutes, and belongs to `make deb`.
set -u
export LC_ALL=C

SRC=$(cd "$(dirname "$0")/../.." && pwd) || exit 2
cd "$SRC" || exit 2
work=$(mktemp -d) || exit 2
trap 'rm -rf "$work"' EXIT
trap 'exit 2' INT TERM

# shellcheck source=tests/tap.sh
. "$SRC/tests/tap.sh"

version=$(sed -n 's/^#define BC_VERSION "\(.*\)"/\1/p' include/bluecone/status.h)
# dist TREE FOLDER: the archive that TREE makes.
dist() { "$1/.package/dist" "$work/$2" "$version" >"$work/log" 2>&1 || cat "$work/log"; }
archive() { echo "$work/$1/bluecone-$version.tar.xz"; }

{
    dist . first
    (umask 077 && TZ=Asia/Tokyo dist . second)
    cmp "$(archive first)" "$(archive second)"
} >"$work/wrong" 2>&1
point 'the archive has the same bytes under another mask and in another zone'

{
    tar -x -C "$work" -f "$(archive first)"
    dist "$work/bluecone-$version" third
    cmp "$(archive first)" "$(archive third)"
} >"$work/wrong" 2>&1
point 'an archive unpacked, without git, makes the same archive again'

tar -t -v --numeric-owner -f "$(archive first)" | grep -v -E '^(-rw-r--r--|[-d]rwxr-xr-x) 0/0 ' >"$work/wrong"
tar -t -v --full-time -f "$(archive first)" | awk '{ print $4, $5 }' | sort -u | tail -n +2 >>"$work/wrong"
point 'it knows one owner, one time, and the modes of everybody'

if test -e .git; then
    git -c safe.directory="$SRC" ls-tree -r --name-only HEAD | sort >"$work/committed"
    tar -t -f "$(archive first)" | sed -n 's|^[^/]*/\(.*[^/]\)$|\1|p' | sort | diff "$work/committed" - >"$work/wrong"
    point 'it holds what is committed, and nothing else'
fi

# What the rules need is there: no file is asked for that the archive does not have.
(cd "$work/bluecone-$version" && env -u MAKEFLAGS -u MFLAGS make -n all 2>&1 >/dev/null | grep -v '^dist:') >"$work/wrong"
point 'make finds all it needs in the archive'

sed -n '/^Permission/,$p' LICENSE >"$work/license"
sed -n '/^License: MIT$/,$p' .package/debian/copyright | sed -n '/^ Permission/,$p' | sed -e 's/^ //' -e 's/^\.$//' |
    diff "$work/license" - >"$work/wrong"
point 'the copyright file of the packages has the words of LICENSE'

# What is loaded by soname is recommended by hand; what modules are linked to, by their shlibs.
grep -rho 'install it (Debian: [a-z0-9]*' src | sed 's/.* //' | sort -u | while read -r package; do
    grep -q "^Recommends: .*\b$package\b" .package/debian/control || echo "$package is named by a message, but not recommended"
done >"$work/wrong"
point 'the packages recommend what messages ask to install'

echo "1..$count"
test "$failed" -eq 0
