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

# In the library a double is written by bc_text_format(), which minds no locale.
find src/base src/gas src/value src/flame src/supply -name '*.c' ! -path src/base/text.c 2>/dev/null | LC_ALL=C sort |
    while read -r file; do
        ${CC:-gcc} -fpreprocessed -dD -E -P -x c "$file" 2>/dev/null | tr '\n' ' ' | tr ';' '\n' | sed "s|^|$file: |"
    done >"$WORK/statements"
if grep -E 'snprintf *\([^"]*("[^"]*"[^"]*)*"[^"]*%[-+ #0-9.*]*l?[aefgAEFG]' "$WORK/statements"; then
    echo 'banned: the above write a double as the locale wants it; take bc_text_format()'
    exit 1
fi
