#!/bin/sh
# Calls that cannot report an error or a length, outside comments.
set -eu
cd "$SRC"

find src include -type f \( -name '*.[ch]' -o -name '*.def' \) | LC_ALL=C sort |
    while read -r file; do
        ${CC:-gcc} -fpreprocessed -dD -E -P -x c "$file" 2>/dev/null | sed "s|^|$file: |"
    done >"$WORK/code"
if grep -E '[^[:alnum:]_](atof|atoi|atoll?|strcpy|strcat|v?sprintf|gets|strtok)[[:blank:]]*\(' "$WORK/code"; then
    echo 'banned: the above calls are not for this house'
    exit 1
fi
