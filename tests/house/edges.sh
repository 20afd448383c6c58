#!/bin/sh
# Prints who includes whom, one "INCLUDER INCLUDED" a line, as paths below $SRC; system headers are
# left out. An include in quotes that no file answers to is printed as "INCLUDER ?NAME".
set -eu
cd "$SRC"

find src include -type f \( -name '*.[ch]' -o -name '*.def' \) | LC_ALL=C sort |
    while read -r file; do
        sed -n 's/^[[:blank:]]*#[[:blank:]]*include[[:blank:]]*\([<"][^>"]*\).*/\1/p' "$file" |
            while read -r include; do
                name=${include#?}
                for folder in "$(dirname "$file")" src include none; do
                    case $folder/$include in
                    none/\<*) ;;
                    none/*) echo "$file ?$name" ;;
                    *)
                        test -f "$folder/$name" || continue
                        # src/value/../data/x.def is src/data/x.def
                        echo "$file $(realpath --relative-to=. "$folder/$name")"
                        break
                        ;;
                    esac
                done
            done
    done
