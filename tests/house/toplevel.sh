#!/bin/sh
# The top level is fixed; dot files and what is built are free.
set -eu

bad=0
for path in "$SRC"/*; do
    case ${path##*/} in
    README.md | DEVELOPERS.md | LICENSE | Makefile | src | include | compositions | tests | examples | man | build) ;;
    *)
        echo "toplevel: ${path##*/} has no place there"
        bad=1
        ;;
    esac
done
exit $bad
