#!/bin/sh
# A file name is there once in src and include, and every source opens with what it is or its licence.
set -eu
cd "$SRC"

find src include -type f \( -name '*.[ch]' -o -name '*.def' \) | LC_ALL=C sort >"$WORK/files"
bad=0
for name in $(sed 's|.*/||' "$WORK/files" | LC_ALL=C sort | uniq -d); do
    echo "names: $name is there more than once: $(grep "/$name\$" "$WORK/files" | tr '\n' ' ')"
    bad=1
done
while read -r file; do
    case $(head -n 1 "$file") in
    '/*'* | '//'*) ;;
    *)
        echo "names: $file does not open with a comment"
        bad=1
        ;;
    esac
done <"$WORK/files"
exit $bad
