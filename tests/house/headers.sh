#!/bin/sh
# Every public header compiles alone, as C11 and as C++.
set -eu
cd "$SRC"

bad=0
for header in include/bluecone/*.h; do
    name=${header#include/}
    warnings='-Wall -Wextra -Wpedantic -Wundef -Werror -fsyntax-only -I include'
    # shellcheck disable=SC2086 # a list of words
    echo "#include \"$name\"" | ${CC:-gcc} -std=c11 -Wstrict-prototypes $warnings -x c - ||
        { echo "headers: $name does not compile alone as C11"; bad=1; }
    # shellcheck disable=SC2086
    echo "#include \"$name\"" | ${CXX:-g++} -std=c++11 $warnings -x c++ - ||
        { echo "headers: $name does not compile alone as C++"; bad=1; }
done
exit $bad
